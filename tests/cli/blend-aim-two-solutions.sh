bluecone blend free hydrogen rest g20 --aim wobbe-gross=45.5MJ/m3 | sed -n '/^Solutions/,/^Heat/p; /^Verdict/,/^Caution/p'
