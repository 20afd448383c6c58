# Lists for other programs.
bluecone list states --csv
bluecone list areas --json >areas.json
python3 -c 'import json; print(sorted(json.load(open("areas.json"))))'
