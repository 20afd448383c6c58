# The terms of --working add up to the steps, and the steps to the sum: preheated, enriched, condensing.
bluecone burn --working --json --oxidant enriched:28 --oxidant-temp 180C --fuel-temp 60C --excess 12 --flue-temp 41C pipeline-h >case.json
python3 -c 'import json
d = json.load(open("case.json"))
t = {x["id"]: x for x in d["tables"]}
terms = t["working-terms"]["rows"]
steps = [s[2] for s in t["working-path"]["rows"]]
figures = {r["id"]: r["value"] for r in d["results"]}
increment = {}
for stream, species, n, hf, part, dh, dpart in terms:
    assert abs(abs(part) - abs(n * hf)) < 1e-9 and abs(abs(dpart) - abs(n * dh)) < 1e-9, species
    increment[stream] = increment.get(stream, 0.0) + dpart
formation = sum(x[4] for x in terms)
close = lambda a, b: "%.4f %s" % (a, "ok" if abs(a - b) < 1e-7 else b)
print("fuel", close(increment["fuel"], figures["path-fuel"]), close(steps[0], figures["path-fuel"]))
print("oxidant", close(increment["oxidant"], figures["path-oxidant"]), close(steps[1], figures["path-oxidant"]))
print("reaction", close(formation, figures["path-reaction"]), close(steps[2], figures["path-reaction"]))
print("products", close(increment["products"], figures["path-products"]), close(steps[3], figures["path-products"]))
print("condensation", close(steps[4], figures["path-condensation"]))
print("sum", close(sum(steps[:5]), figures["path-total"]), close(steps[5], figures["path-total"]))
'
