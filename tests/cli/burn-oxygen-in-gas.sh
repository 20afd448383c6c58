# A gas that brings oxygen needs less of it; it is warned of. Without its air it is another gas.
cp "$SRC/examples/lpg-air-standby.ini" .
bluecone burn --flue-o2 4 lpg-air-standby.ini | sed -n '/^Oxidant/,/^$/p; /^Flue gas, complete/,/^$/p; /^In air/,/^$/p; /^Warnings/,$p'
bluecone burn --flue-o2 4 --air-free lpg-air-standby.ini | sed -n '/^Gas/,/^Case/p; /^Oxidant/,/^$/p; /^Warnings/,/^$/p'
