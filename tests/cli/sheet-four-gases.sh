# Four gases beside each other still fit the page.
cp "$SRC/examples/digester-gas.ini" "$SRC/examples/hydrogen-blend.ini" "$SRC/examples/lpg-air-standby.ini" "$SRC/examples/present-supply.ini" .
bluecone sheet present-supply.ini hydrogen-blend.ini lpg-air-standby.ini digester-gas.ini
