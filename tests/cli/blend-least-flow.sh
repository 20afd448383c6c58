# What there is of a part limits it at a stated flow of the blend.
bluecone blend free biomethane free pipeline-h free hydrogen --least cost --flow 20MW --max-flow 2=1500m3/h,hydrogen=0.5MW \
    --price 1=61EUR/MWh,2=34EUR/MWh,3=8EUR/MWh | sed -n '/^Recipe/,/^Heat/p; /^Verdict/,/^Caution/p'
