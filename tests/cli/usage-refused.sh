# Wrong usage: one line, exit 2, nothing on standard output.
bluecone
echo "exit $?" >&2
bluecone gett hhv g20
echo "exit $?" >&2
bluecone get
echo "exit $?" >&2
bluecone get hhv
echo "exit $?" >&2
bluecone get hvh g20
echo "exit $?" >&2
bluecone get hhv,,lhv g20
echo "exit $?" >&2
bluecone get --bogus hhv g20
echo "exit $?" >&2
bluecone get --untis kWh/m3 hhv g20
echo "exit $?" >&2
bluecone get -q hhv g20
echo "exit $?" >&2
bluecone get hhv g20 --unit
echo "exit $?" >&2
bluecone get --json --csv hhv g20
echo "exit $?" >&2
bluecone get hhv g20 --csv --bare
echo "exit $?" >&2
bluecone list gases --bare --json
echo "exit $?" >&2
bluecone get --bare=yes hhv g20
echo "exit $?" >&2
bluecone get --at 15/15 --at 25/0 hhv g20
echo "exit $?" >&2
bluecone get --digits 99 hhv g20
echo "exit $?" >&2
bluecone sheet --bare g20
echo "exit $?" >&2
bluecone verify steam thermo
echo "exit $?" >&2
# Words of the trade lead to the id; what is like nothing gets no suggestion; the order is told.
bluecone get Hi g20
echo "exit $?" >&2
bluecone get wobbe-index g20
echo "exit $?" >&2
bluecone get wobbe-ratio g20
echo "exit $?" >&2
bluecone get g20 hhv
echo "exit $?" >&2
bluecone get foo g20
echo "exit $?" >&2
bluecone compare g20
echo "exit $?" >&2
bluecone --json get hhv g20
echo "exit $?" >&2
bluecone help frobnicate
echo "exit $?" >&2
bluecone verify frobnicate
echo "exit $?" >&2
bluecone get hhv --unit MJ/m³ g20
echo "exit $?" >&2
