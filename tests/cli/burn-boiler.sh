# A boiler as an engineer states it: oxygen read, humid air, useful heat, readings.
cp "$SRC/examples/present-supply.ini" .
bluecone burn --flue-o2 3.2dry --humidity 60% --oxidant-temp 22C --fuel-temp 12C --flue-temp 142C --casing-loss 0.7 \
    --duty 4.3MW --reading nox=71ppm,co=12mg/m3 present-supply.ini
