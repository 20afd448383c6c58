# A gas against itself: every index neutral, the verdict yes.
bluecone switch pipeline-h pipeline-h | sed -n "/^Interchangeability/,/^$/p; /^Checks/,\$p"
bluecone switch hydrogen hydrogen | tail -n 8
echo "exit $?"
