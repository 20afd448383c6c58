# A file that cannot be written: exit 4, and nothing is left.
mkdir locked.ini
bluecone blend 1 g20 1 g25 -o locked.ini >out
code=$?
ls -A .
cat out
exit $code
