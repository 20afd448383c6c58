# The sheet as rows; nine digits, since the twelfth of a flame temperature is where its solver stops.
cp "$SRC/examples/new-supply-offer.ini" .
bluecone sheet --csv --digits 9 new-supply-offer.ini
