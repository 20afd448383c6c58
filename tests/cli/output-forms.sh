# The ending of the file gives the form; nothing on standard output.
bluecone get hhv --quiet -o value.txt g20
bluecone get hhv --quiet -o value.json g20
bluecone get hhv --quiet --output=value.CSV g20
bluecone get hhv --quiet --csv -o value.dat g20
ls
head -n 4 value.txt
head -n 3 value.json
cat value.CSV
cmp value.CSV value.dat && echo the same
