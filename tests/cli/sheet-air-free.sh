# Air in the sample: the gas as analysed beside the gas without it.
cp "$SRC/examples/new-supply-offer.ini" .
bluecone sheet --air-free new-supply-offer.ini
