# Keys, sections and words that are not known or stand twice.
printf '[gas]\nbasis = molar\n[components]\nmethane = 100\n' >sample.ini
bluecone get hhv sample.ini
echo "exit $?" >&2
printf '[gas]\nmoistur = dry\n[components]\nmethane = 100\n' >sample.ini
bluecone get hhv sample.ini
echo "exit $?" >&2
printf '[gas]\nmeasured_at = 25/0\n[components]\nmethane = 100\n' >sample.ini
bluecone get hhv sample.ini
echo "exit $?" >&2
printf '[gass]\nname = x\n[components]\nmethane = 100\n' >sample.ini
bluecone get hhv sample.ini
echo "exit $?" >&2
printf '[components]\nmethane = 92\netane = 8\n' >sample.ini
bluecone get hhv sample.ini
echo "exit $?" >&2
printf '[components]\nmethane = 92\nethane = 4\nMethane = 4\n' >sample.ini
bluecone get hhv sample.ini
echo "exit $?" >&2
printf '[components]\nmethane = 92\nCH4 = 8\n' >sample.ini
bluecone get hhv sample.ini
echo "exit $?" >&2
printf '[components]\nmethane = 100\n[components]\nethane = 0\n' >sample.ini
bluecone get hhv sample.ini
echo "exit $?" >&2
printf '[components]\n[gas]\nname = x\n' >sample.ini
bluecone get hhv sample.ini
echo "exit $?" >&2
printf '[gas]\nname = x\n' >sample.ini
bluecone get hhv sample.ini
echo "exit $?" >&2
printf 'methane = 100\n' >sample.ini
bluecone get hhv sample.ini
echo "exit $?" >&2
printf '[components]\nmethane: 100\n' >sample.ini
bluecone get hhv sample.ini
echo "exit $?" >&2
printf '[components]\nC4H10 = 100\n' >sample.ini
bluecone get hhv sample.ini
echo "exit $?" >&2
printf '[components]\nmethane = 100\n[uncertainty]\nethane = 1\n' >sample.ini
bluecone get hhv sample.ini
echo "exit $?" >&2
printf '[components]\nmethane = 98\nc9+ = 2\n' >sample.ini
bluecone get hhv sample.ini
echo "exit $?" >&2
printf '[components]\nmethane = 98\n[cut c6+]\nn-hexane = 1\n' >sample.ini
bluecone get hhv sample.ini
echo "exit $?" >&2
printf '[components]\nmethane = 98\nwater = 2\n' >sample.ini
bluecone get hhv sample.ini
echo "exit $?" >&2
printf '[gas]\nmeasured_at = 15, 1 furlong\n[components]\nmethane = 100\n' >sample.ini
bluecone get hhv sample.ini
echo "exit $?" >&2
