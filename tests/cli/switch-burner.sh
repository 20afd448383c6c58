# A burner file: on both gases, and what sets it back.
bluecone switch "$SRC/examples/present-supply.ini" "$SRC/examples/hydrogen-blend.ini" --burner "$SRC/examples/kiln.ini"
echo "exit $?"
