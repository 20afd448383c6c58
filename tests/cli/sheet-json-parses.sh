# JSON is read by another program, and its figures are those of get.
cp "$SRC/examples/new-supply-offer.ini" "$SRC/examples/present-supply.ini" .
bluecone sheet --json new-supply-offer.ini present-supply.ini >sheet.json
python3 -c 'import json, sys
d = json.load(open("sheet.json"))
print(sorted(d))
print(d["tool"], d["command"], d["state"])
for g in d["gases"]:
    print(g["name"], "%.6f" % g["sum_before"], "%.9f" % sum(g["composition"].values()))
for r in d["results"]:
    if r["id"] == "hhv":
        print(r["id"], r["gas"], "%.6g" % r["value"], r["unit"], r["method"])
'
bluecone get hhv --quiet new-supply-offer.ini present-supply.ini
