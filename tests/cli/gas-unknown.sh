# Words that are no gas and no species, each with the nearest known one.
bluecone get hhv pipelin-h
echo "exit $?" >&2
bluecone get hhv g-20x
echo "exit $?" >&2
bluecone get hhv missing-file.ini
echo "exit $?" >&2
bluecone get hhv methan=97,etane=3
echo "exit $?" >&2
bluecone get hhv C4H10=100
echo "exit $?" >&2
bluecone get hhv ""
echo "exit $?" >&2
