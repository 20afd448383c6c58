# Other ways to ask for help.
bluecone help | head -n 1
bluecone -h | head -n 1
bluecone get -h | head -n 1
bluecone sheet --help g20 --bogus
echo "exit $?" >&2
