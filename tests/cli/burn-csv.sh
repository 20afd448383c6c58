# A row a figure; the digits are those asked for.
bluecone burn --csv --digits 5 --excess 8 --rate 120kg/h pipeline-h
