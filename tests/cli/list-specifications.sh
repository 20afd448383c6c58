# bundled specifications, and one with its limits
bluecone list specifications --bare
bluecone list specifications gb-gsmr-1996
bluecone list specifications nothing-like-it
