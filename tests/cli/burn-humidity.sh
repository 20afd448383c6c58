# One air, its water stated three ways: the same figures.
for humidity in 62.5% dew:16.685762C wet-bulb:19.238881C; do
    bluecone burn --humidity $humidity --oxidant-temp 24.3C --excess 15 g20 | sed -n '/^  oxidant  /p; /Oxidant supplied  /p; /Water dew/p; /Flame temperature/p'
done
bluecone burn --humidity 62.5 --oxidant-temp 75.74F --excess 15 g20 | sed -n '/^  oxidant  /p'
bluecone burn --humidity dew:40C --oxidant-temp 350 --oxidant enriched:31 g20 | sed -n '/^  oxidant  /p'
bluecone burn --humidity dew:-8C --oxidant-temp -3C g20 | sed -n '/^  oxidant  /p'
# What was written stands beside what came of it: 1.15 may have been meant as lambda, 0.6 as a fraction.
bluecone burn --humidity 0.6 --excess 1.15 g20 | sed -n '/^Case/,/^  fuel/p'
