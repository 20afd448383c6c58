bluecone blend 0..30/10 hydrogen rest g20 -o mix.ini
