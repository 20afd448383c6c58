# One JSON object on standard output; warnings are in it.
cp "$SRC/examples/new-supply-offer.ini" .
bluecone get hhv,wobbe-gross --json new-supply-offer.ini
