# The sheet as rows.
cp "$SRC/examples/new-supply-offer.ini" .
bluecone sheet --csv new-supply-offer.ini
