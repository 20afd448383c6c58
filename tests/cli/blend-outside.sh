# A broken limit: exit 1, worst first.
bluecone blend 70 pipeline-h 30 hydrogen --within "$SRC/examples/contract-marrowfen.ini" >out
code=$?
sed -n '/^Limits/,/^$/p; /^Verdict/,$p' out
exit $code
