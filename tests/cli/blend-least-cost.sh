# The cheapest blend: what holds it, with shadow prices.
bluecone blend free biomethane free pipeline-h free hydrogen free nitrogen=100 --within "$SRC/examples/contract-marrowfen.ini" \
    --least cost --price biomethane=61EUR/MWh,pipeline-h=34EUR/MWh,hydrogen=88EUR/MWh,4=0.05EUR/m3 |
    sed -n '/^Recipe/,/^Heat/p; /^Cost/,/^$/p; /^Limits/,/^$/p; /^Verdict/,/^Caution/p'
