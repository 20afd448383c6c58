bluecone blend --by mass 12.5 propane rest biomethane | sed -n '/^Recipe/,/^$/p'
