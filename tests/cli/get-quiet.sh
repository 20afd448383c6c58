# Value and unit without the talk beside them.
cp "$SRC/examples/new-supply-offer.ini" .
bluecone get hhv --quiet new-supply-offer.ini
