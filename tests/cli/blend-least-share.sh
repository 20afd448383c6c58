bluecone blend free propane free biogas free air --least share:propane --within "$SRC/examples/contract-gb-gsmr-2025.ini" >out
code=$?
sed -n '/^Limits that/,/^Heat/p; /^Verdict/,/^Caution/p' out
exit $code
