# Chosen quantities in a unit, tables as CSV; crossings of the limits all the same; a step that does not meet the end.
bluecone blend 0..10/4 hydrogen 3 nitrogen=100 rest g20 --by volume --at 25/0 --unit kWh/Nm3 --show wobbe-gross,hhv,relative-density \
    --within "$SRC/examples/contract-marrowfen.ini" --csv
