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
