# Numbers in a file that are none, or that would be read wrongly elsewhere.
printf '[components]\nmethane = 92,5\nethane = 7,5\n' >sample.ini
bluecone get hhv sample.ini
echo "exit $?" >&2
printf '[components]\nmethane = nan\n' >sample.ini
bluecone get hhv sample.ini
echo "exit $?" >&2
printf '[components]\nmethane = 1e999\n' >sample.ini
bluecone get hhv sample.ini
echo "exit $?" >&2
printf '[components]\nmethane = -3\nethane = 103\n' >sample.ini
bluecone get hhv sample.ini
echo "exit $?" >&2
printf '[components]\nmethane = 92 vol\nethane = 8\n' >sample.ini
bluecone get hhv sample.ini
echo "exit $?" >&2
printf '[components]\nmethane =\nethane = 8\n' >sample.ini
bluecone get hhv sample.ini
echo "exit $?" >&2
printf '[components]\nmethane = 92 5\n' >sample.ini
bluecone get hhv sample.ini
echo "exit $?" >&2
