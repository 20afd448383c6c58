# Several gases: each line names its gas.
cp "$SRC/examples/new-supply-offer.ini" "$SRC/examples/present-supply.ini" .
bluecone get wobbe-gross,hhv present-supply.ini new-supply-offer.ini
