# Nearest reachable, exit 1.
bluecone blend free hydrogen rest g20 --aim wobbe-gross=40MJ/m3 >out
code=$?
sed -n '/^Nearest/,/^Heat/p; /^Verdict/,/^Caution/p' out
exit $code
