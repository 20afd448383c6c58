bluecone blend 0..30/5 hydrogen rest pipeline-h
