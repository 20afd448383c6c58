# More or fewer digits than the default six.
bluecone get hhv --digits 12 --quiet g20
bluecone get hhv --digits 2 --quiet g20
