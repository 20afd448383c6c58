# Oxygen is strange in pipeline gas, and at home in LPG-air.
cp "$SRC/examples/lpg-air-standby.ini" .
bluecone get wobbe-gross methane=94.5,ethane=4,nitrogen=1.2,oxygen=0.3
bluecone get wobbe-gross --air-free methane=94.5,ethane=4,nitrogen=1.2,oxygen=0.3
bluecone get wobbe-gross lpg-air-standby.ini
