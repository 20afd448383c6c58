# A gas that does not burn has a sheet, too.
bluecone sheet nitrogen=80,carbon-dioxide=20
