# A species with each datum and its source.
bluecone list species nC4
