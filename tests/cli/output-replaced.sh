# A file that is there is replaced whole, and a link keeps pointing.
echo old >value.csv
chmod 640 value.csv
ln -s value.csv link.csv
bluecone get hhv --quiet -o link.csv g20
cat value.csv
test -L link.csv && stat -c %a value.csv
