bluecone stream --help
