bluecone blend --by energy 7 hydrogen rest g20 | sed -n '/^Recipe/,/^$/p'
