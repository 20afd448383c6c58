# Charts in three forms: the picture says what its axes are, and a command without charts says so.
bluecone burn --quiet -o case.svg --excess 15 g20 && grep -c '<svg' case.svg
python3 - <<'P'
import re
text = open("case.svg").read()
for word in ("excess oxidant", "temperature", "fraction", "efficiency", "case", "water"):
    print(word, "shown" if word in re.sub(r"<[^>]+>", "", text) else "MISSING")
P
bluecone burn --quiet -o case.png g20 && head -c 8 case.png | od -An -c | tr -d ' '
bluecone burn --quiet -o case.pdf g20 && head -c 5 case.pdf && echo
bluecone sheet --quiet -o sheet.svg g20
echo "exit $?"
ls
# what a swept figure depends on besides stands in its title; the corner at the dew point is a point of the curve
bluecone burn g20 --excess 10 --sweep flue-temp=40..250 --quiet --json >swept.json
python3 - <<'P'
import json
answer = json.load(open("swept.json"))
for chart in answer["charts"]:
    print(chart["title"])
    dew = [mark["x"] for mark in chart["marks"] if mark["label"] == "water dew point"][0]
    print("corner", any(abs(point[0] - dew) < 1e-9 for point in chart["series"][0]["points"]))
P
