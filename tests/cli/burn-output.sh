# Files by their endings; quiet takes the warnings out, not the caution.
bluecone burn --lambda 0.93 -o case.txt g20
bluecone burn --lambda 0.93 -o case.json g20
bluecone burn --lambda 0.93 --output case.csv g20
head -n 1 case.txt
head -n 2 case.json
head -n 2 case.csv
bluecone burn --lambda 0.93 --quiet g20 | sed -n '/^Flue gas as it leaves/,$p'
