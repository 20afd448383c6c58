# Names alone, for the shell.
bluecone list gases --bare
bluecone list states --bare
bluecone list methods --bare
bluecone list commands --bare
bluecone list options list --bare
bluecone list areas --bare
