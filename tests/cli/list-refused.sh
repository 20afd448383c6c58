# Unknown topics and names, each with the nearest known one or where to look.
bluecone list
echo "exit $?" >&2
bluecone list gasses
echo "exit $?" >&2
bluecone list species mehtane
echo "exit $?" >&2
bluecone list species C4H10
echo "exit $?" >&2
bluecone list quantities whobbe
echo "exit $?" >&2
bluecone list units MBtu
echo "exit $?" >&2
bluecone list methods iso
echo "exit $?" >&2
bluecone list states 15/17
echo "exit $?" >&2
bluecone list gases g2o
echo "exit $?" >&2
bluecone list options
echo "exit $?" >&2
bluecone list areas vapour
echo "exit $?" >&2
bluecone list gases g20 g21
echo "exit $?" >&2
bluecone list pipeline-h
echo "exit $?" >&2
