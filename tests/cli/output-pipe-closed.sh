# A reader that went away: told on stderr, exit 4, never a signal.
{ sleep 0.2; bluecone sheet g20; echo "exit $?" >&2; } | :
