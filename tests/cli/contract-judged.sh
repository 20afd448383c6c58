# limits of a works' contract, terms, and the present supply beside the offer
cp -r "$SRC/examples" . && bluecone contract examples/contract-marrowfen.ini examples/new-supply-offer.ini --against examples/present-supply.ini
