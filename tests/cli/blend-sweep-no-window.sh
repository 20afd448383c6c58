# No share keeps all limits: exit 1.
bluecone blend 40..60/10 hydrogen rest pipeline-h --within "$SRC/examples/contract-marrowfen.ini" >out
code=$?
sed -n '/^Crossings/,$p' out
exit $code
