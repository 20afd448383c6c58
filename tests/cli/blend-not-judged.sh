# A figure that the blend does not have cannot be judged, so it is not kept.
printf '[limit hydrogen-carbon-ratio]\nmax = 4.1\n' >contract.ini
bluecone blend 70 hydrogen 30 nitrogen=100 --within contract.ini >out
code=$?
sed -n '/^Limits/,/^$/p; /^Verdict/,$p' out
exit $code
