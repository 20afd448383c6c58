# The version, three ways.
bluecone --version
bluecone get --version
bluecone sheet --version
