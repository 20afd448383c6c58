# the picture is a whole document
bluecone contract gb-gsmr-2025 pipeline-h --against g20 -o chart.svg --quiet; echo $?
grep -o 'Margins of [^<]*' chart.svg | head -1
tail -c 7 chart.svg
