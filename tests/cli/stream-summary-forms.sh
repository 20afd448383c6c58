# a page, a workbook, a chart; rows without a clock weigh the same
cd "$SRC/examples" || exit
for ending in html xlsx svg json csv; do bluecone stream log-of-two-weeks.csv --summary --quiet -o "$OLDPWD/s.$ending" 2>/dev/null; echo "$ending $?"; done
cd "$OLDPWD" || exit
xmllint --noout s.svg && unzip -tq s.xlsx && grep -c '<svg' s.html
printf 'methane,nitrogen\n100,0\n98,2\n96,4\n' | bluecone stream --summary --add hhv --quiet
