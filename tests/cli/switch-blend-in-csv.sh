# The bounds as rows for a script.
bluecone switch "$SRC/examples/present-supply.ini" hydrogen --burner "$SRC/examples/kiln.ini" --blend-in --csv --digits 7 | grep "^share-"
