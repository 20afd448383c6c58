# JSON is read by another program; ids, units and columns of every figure and table.
bluecone burn --json --flue-o2 3 --duty 2.7MW --reading nox=71ppm --working --flue-temp 52 methane=60.3,carbon-dioxide=39.65,hydrogen-sulfide=0.05 >case.json
python3 -c 'import json
d = json.load(open("case.json"))
print(sorted(d))
print(d["command"], d["state"], d["verdict"])
for r in d["results"]:
    assert sorted(r) == ["gas", "id", "label", "method", "uncertainty", "unit", "value"], r
    print("%s %.6g %s" % (r["id"], r["value"], r["unit"]))
assert len(set(r["id"] for r in d["results"])) == len(d["results"])
for t in d["tables"]:
    print(t["id"], t["columns"], len(t["rows"]))
print(len(d["warnings"]))
'
