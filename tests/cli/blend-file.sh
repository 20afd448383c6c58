# The blend as a composition file, and read again: the same gas.
bluecone blend 80 "$SRC/examples/present-supply.ini" 20 hydrogen -o mix.ini >sheet
sed -n '/^Higher heating value  MJ/p' sheet
cat mix.ini
bluecone get hhv,wobbe-gross,relative-density mix.ini --quiet
bluecone blend 80 "$SRC/examples/present-supply.ini" 20 hydrogen --json | sed -n '/"id": "hhv"/,/"value"/p' | tail -n 1
