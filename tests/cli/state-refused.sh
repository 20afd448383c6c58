# States that the methods do not cover, or that are no states.
bluecone get hhv --at 15 g20
echo "exit $?" >&2
bluecone get hhv --at 15/40 g20
echo "exit $?" >&2
bluecone get hhv --at=-5/0 g20
echo "exit $?" >&2
bluecone get hhv --at 15/15@500kPa g20
echo "exit $?" >&2
bluecone get hhv --at 15/15@5furlong g20
echo "exit $?" >&2
bluecone get hhv --at warm/15 g20
echo "exit $?" >&2
bluecone get hhv --at nan/15 g20
echo "exit $?" >&2
bluecone get hhv --at '' g20
echo "exit $?" >&2
