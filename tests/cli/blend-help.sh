bluecone blend --help
