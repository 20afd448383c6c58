# every confusion that moves a figure
cp -r "$SRC/examples" . && bluecone contract gb-gsmr-2025 examples/new-supply-offer.ini --traps --quiet
