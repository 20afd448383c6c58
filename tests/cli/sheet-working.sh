# The calculation term by term: the terms add up to the result.
bluecone sheet --working methane=92,ethane=5,nitrogen=3
