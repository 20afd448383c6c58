# Words that are no gas and no species, each with the nearest known one.
bluecone get hhv pipelin-h
echo "exit $?" >&2
bluecone get hhv g-20x
echo "exit $?" >&2
bluecone get hhv ethane
echo "exit $?" >&2
bluecone get hhv natural-gas
echo "exit $?" >&2
bluecone get hhv missing-file.ini
echo "exit $?" >&2
bluecone get hhv methan=97,etane=3
echo "exit $?" >&2
bluecone get hhv C4H10=100
echo "exit $?" >&2
bluecone get hhv ""
echo "exit $?" >&2
# Of equally near names the first is told; a name may be one letter.
mkdir compositions
printf '[components]\nmethane = 100\n' | tee compositions/marrowfen-a.ini compositions/marrowfen-b.ini >compositions/y.ini
BLUECONE_PATH=$PWD bluecone get hhv marrowfen-c
echo "exit $?" >&2
BLUECONE_PATH=$PWD bluecone get hhv z
echo "exit $?" >&2
