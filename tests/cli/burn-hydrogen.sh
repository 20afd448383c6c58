# Hydrogen: no carbon anywhere.
bluecone burn --excess 22 hydrogen=100
