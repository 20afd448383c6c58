# One entry of each list, with its source.
bluecone list quantities wobbe-gross
bluecone list units Btu
bluecone list units kWh/Nm3
bluecone list methods virial
bluecone list states 25/0
bluecone list gases g20
bluecone list commands get
bluecone list options verify
bluecone list areas steam
