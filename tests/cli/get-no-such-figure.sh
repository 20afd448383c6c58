# A figure that the gas does not have is refused, not invented.
bluecone get hydrogen-carbon-ratio hydrogen
echo "exit $?" >&2
bluecone get formation-gap nitrogen=100
echo "exit $?" >&2
