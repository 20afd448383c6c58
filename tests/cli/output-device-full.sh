# A full disk behind standard output is a failure, not an answer.
tell() { "$@"; echo "exit $?" >&2; }
tell bluecone get hhv --quiet g20 >/dev/full
tell bluecone sheet g20 >/dev/full
tell bluecone --help >/dev/full
