# A burner file: on both gases, and what sets it back.
cp -r "$SRC/examples" . && bluecone switch examples/present-supply.ini examples/hydrogen-blend.ini --burner examples/kiln.ini
echo "exit $?"
