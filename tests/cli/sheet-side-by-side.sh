# The offer beside the present supply.
cp "$SRC/examples/new-supply-offer.ini" "$SRC/examples/present-supply.ini" .
bluecone sheet present-supply.ini new-supply-offer.ini
