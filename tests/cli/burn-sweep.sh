# A case swept over excess air into lack of air, and over the flue gas temperature; the table beside the curves.
bluecone burn --quiet --sweep excess=-20..60 --excess 15 g20 | sed -n '/^Sweep/,/^Caution/p'
bluecone burn --quiet --sweep flue-temp=30..150 --excess 15 landfill-gas | sed -n '/^Sweep/,/^Caution/p'
for bad in excess=5 excess=9..1 depth=0..5 excess=0..x; do
    bluecone burn --sweep "$bad" g20
    echo "exit $?"
done
