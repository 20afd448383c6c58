# Wrong words, counts and gases.
bluecone switch g20
echo "exit $?" >&2
bluecone switch g20 g25 g21
echo "exit $?" >&2
bluecone switch g20 g2O
echo "exit $?" >&2
bluecone switch g20 nitrogen=100
echo "exit $?" >&2
bluecone switch nitrogen=100 g20
echo "exit $?" >&2
bluecone switch g20 g25 --fuel-temp 9000
echo "exit $?" >&2
bluecone switch g20 g25 --fuel-temp warm
echo "exit $?" >&2
bluecone switch g20 g25 --blendin
echo "exit $?" >&2
bluecone switch g20 g25 --unit furlong
echo "exit $?" >&2
