# A heavy cut with the split of the file, and with the default one.
cp "$SRC/examples/new-supply-offer.ini" .
bluecone get hhv new-supply-offer.ini
sed '/^\[cut/,/^benzene/d' new-supply-offer.ini >default.ini
bluecone get hhv default.ini
