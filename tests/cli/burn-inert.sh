# What does not burn has no case.
bluecone burn nitrogen=80,carbon-dioxide=20
echo "exit $?" >&2
bluecone burn air
echo "exit $?" >&2
bluecone burn water=100
echo "exit $?" >&2
