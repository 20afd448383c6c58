# LPG-air with the Wobbe index of natural gas.
bluecone blend --by volume free propane free air --aim wobbe-gross=50.72MJ/m3 | sed -n '/^Recipe/,/^Heat/p; /^Verdict/,/^Caution/p'
