# What stands behind -- is no option.
bluecone get --quiet -- hhv g20
bluecone get hhv --quiet -- --json
