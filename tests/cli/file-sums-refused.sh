# Sums that say that something is wrong with the certificate.
printf '[components]\nmethane = 92\nethane = 5\n' >sample.ini
bluecone get hhv sample.ini
echo "exit $?" >&2
printf '[components]\nmethane = 0.92\nethane = 0.08\n' >sample.ini
bluecone get hhv sample.ini
echo "exit $?" >&2
printf '[gas]\nunit = fraction\n[components]\nmethane = 92\nethane = 8\n' >sample.ini
bluecone get hhv sample.ini
echo "exit $?" >&2
printf '[components]\nmethane = 99\nethane = 3\nnitrogen = rest\n' >sample.ini
bluecone get hhv sample.ini
echo "exit $?" >&2
printf '[components]\nmethane = rest\nnitrogen = rest\n' >sample.ini
bluecone get hhv sample.ini
echo "exit $?" >&2
