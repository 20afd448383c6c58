# Every kind of oxidant; each is told in the case and has its own need and flame.
for oxidant in air oxygen oxygen:95 oxygen:95% enriched:28 oxygen=16.1,nitrogen=76.4,carbon-dioxide=2.3,water=5.2; do
    bluecone burn --oxidant $oxidant --lambda 1.07 pipeline-h | sed -n '/^  oxidant  /p; /Oxidant for complete combustion  /p; /Flame temperature, eq/p; /Oxygen in dry/p; /Stack loss by/p'
done
