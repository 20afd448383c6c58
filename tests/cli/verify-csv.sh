# What a laboratory files: one row a value.
bluecone verify en437 --csv | cut -d, -f2-
