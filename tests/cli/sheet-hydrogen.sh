# No carbon: no hydrogen-carbon ratio, and Z from the tables.
bluecone sheet hydrogen
