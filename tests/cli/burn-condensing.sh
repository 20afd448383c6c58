# A condensing boiler: condensate, latent heat, the gas that is left, efficiency over 100 % on net heat.
cp "$SRC/examples/present-supply.ini" .
bluecone burn --flue-o2 3.4 --flue-temp 38.5 --duty 620kW present-supply.ini
