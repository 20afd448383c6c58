# Limits as columns, each at its own state; crossings exact; the window as verdict.
bluecone blend 0..30/5 hydrogen rest pipeline-h --within "$SRC/examples/contract-marrowfen.ini"
