# Every quantity, one row a share.
bluecone blend 0..20/10 hydrogen rest g20 --show all --csv --digits 4 | sed -n 1,2p | cut -c 1-300
