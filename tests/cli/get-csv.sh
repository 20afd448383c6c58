# The same as rows for a spreadsheet.
cp "$SRC/examples/present-supply.ini" .
bluecone get hhv,wobbe-gross --csv present-supply.ini g20
