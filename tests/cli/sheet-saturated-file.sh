# Digester gas: analysed dry, delivered saturated.
cp "$SRC/examples/digester-gas.ini" .
bluecone sheet digester-gas.ini
