# Figures as rows.
bluecone switch g20 g25 --csv --quiet
