# The number alone, for a shell; nothing on stderr.
cp "$SRC/examples/new-supply-offer.ini" .
bluecone get hhv,wobbe-gross --bare new-supply-offer.ini
