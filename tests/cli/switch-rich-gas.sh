# The richest test gas: every limit that breaks comes back with heat and air.
bluecone switch g20 g21 | sed -n "/^Criteria/,\$p"
