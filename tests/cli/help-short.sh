# Other ways to ask for help.
bluecone help | sed -n 1p
bluecone -h | sed -n 1p
bluecone get -h | sed -n 1p
bluecone help get | sed -n 1p
bluecone sheet --help g20 --bogus
echo "exit $?" >&2
