# Sulfur: three acid dew points and their spread, with the conversion stated.
cp "$SRC/examples/digester-gas.ini" .
bluecone burn --flue-o2 5.2 --flue-temp 118 --rate 140m3/h digester-gas.ini
bluecone burn --flue-o2 5.2 --flue-temp 180 --so3 4.5 digester-gas.ini | sed -n '/^Case/,/^$/p; /^Dew/,/^$/p; /^Warnings/,/^$/p'
bluecone burn --flue-o2 5.2 --so3 0 digester-gas.ini | sed -n '/^Case/,/^$/p; /^Dew/,/^$/p'
bluecone burn methane=70,hydrogen-sulfide=30 | sed -n '/^Dew/,/^$/p; /^Warnings/,/^$/p'
