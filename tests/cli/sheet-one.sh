# The full sheet of a gas with stated uncertainties.
cp "$SRC/examples/present-supply.ini" .
bluecone sheet present-supply.ini
