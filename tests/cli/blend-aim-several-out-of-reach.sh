bluecone blend free nitrogen=100 free hydrogen rest g20 --aim wobbe-gross=60MJ/m3,relative-density=0.4 >out
code=$?
sed -n '/^Nearest/,/^Heat/p; /^Verdict/,/^Caution/p' out
exit $code
