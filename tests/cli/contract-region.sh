# what allowed gases can reach on the plane: each corner within the limits, and no allowed gas outside of the outline
printf '[limit wobbe-gross]\nmin = 47\nmax = 52\n[limit relative-density]\nmax = 0.65\n[range methane]\nmin = 80\n[range ethane]\nmax = 11\n[range propane]\nmax = 3\n[range nitrogen]\nmax = 7\n' >window.ini
bluecone contract window.ini g20 --worst --json >answer.json; echo $?
python3 - <<'P'
import csv, json, random, subprocess

plane = next(c for c in json.load(open("answer.json"))["charts"] if c["id"] == "plane")
corners = next(s for s in plane["series"] if s["label"] == "reachable")["points"]
print(len(corners), "corners; relative density %.4f to %.4f, Wobbe index %.3f to %.3f" % (
    min(x for x, y in corners), max(x for x, y in corners), min(y for x, y in corners), max(y for x, y in corners)))
lower, upper = corners[:len(corners) // 2], corners[:len(corners) // 2 - 1:-1]


def on(line, x):
    """The line at x: between its corners."""
    for (x0, y0), (x1, y1) in zip(line, line[1:]):
        if x0 <= x <= x1:
            return y0 + (y1 - y0) * (x - x0) / (x1 - x0)
    return None


random.seed(5)
gases = []
while len(gases) < 60:
    ethane, propane, nitrogen = random.uniform(0, 11), random.uniform(0, 3), random.uniform(0, 7)
    if ethane + propane + nitrogen <= 20:
        gases.append("methane=%.5f,ethane=%.5f,propane=%.5f,nitrogen=%.5f" % (100 - ethane - propane - nitrogen, ethane, propane, nitrogen))
rows = list(csv.DictReader(subprocess.run(["bluecone", "get", "relative-density,wobbe-gross", "--csv", *gases],
                                          capture_output=True, text=True, check=True).stdout.splitlines()))
allowed = outside = 0
for gas in gases:
    x, y = (float(next(r["value"] for r in rows if r["gas"] == gas and r["id"] == i)) for i in ("relative-density", "wobbe-gross"))
    if x <= 0.65 and 47 <= y <= 52:
        allowed += 1
        low, high = on(lower, x), on(upper, x)
        # a chord cuts off what bulges between two slices; the ends are half a slice short
        outside += low is not None and not low - 0.01 <= y <= high + 0.01
print(allowed, "of 60 random gases are allowed,", outside, "of them outside")
P
# without a gas, the plane alone
bluecone contract window.ini --worst -o plane.svg --quiet; echo $?
grep -o 'reachable' plane.svg | head -1
