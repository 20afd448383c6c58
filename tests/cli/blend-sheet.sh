# The blend beside its parts, with its recipe on every basis.
bluecone blend 80 pipeline-h 20 hydrogen
