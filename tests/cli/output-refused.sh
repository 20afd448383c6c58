# Where nothing can be written: exit 4, nothing left behind. An unknown ending: exit 2.
tell() { "$@"; echo "exit $?" >&2; }
tell bluecone get hhv -o no/such/folder/value.csv g20
tell bluecone get hhv -o value.docx g20
tell bluecone get hhv -o '' g20
tell bluecone get hhv --quiet -o /dev/full g20
mkdir folder.csv
tell bluecone get hhv -o folder.csv g20
ls
