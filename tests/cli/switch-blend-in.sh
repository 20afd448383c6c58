# Shares from which a verdict holds, exact.
bluecone switch "$SRC/examples/present-supply.ini" hydrogen --burner "$SRC/examples/boiler.ini" --blend-in | sed -n "/^Share/,/^$/p"
bluecone switch g20 g25 --blend-in | sed -n "/^Share/,/^$/p"
