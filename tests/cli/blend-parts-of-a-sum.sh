# Shares that do not make 100 are parts of their sum, and that is told.
bluecone blend 3 propane 2 air | sed -n '/^Recipe/,/^$/p; /^Warnings/,/^$/p'
