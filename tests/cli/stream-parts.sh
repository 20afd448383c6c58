# a part of a log may be one long outage, or nothing at all: rows and counts are still those of the whole
names=time,methane,ethane,nitrogen
awk 'BEGIN { for (i = 0; i < 72; i++) printf "2026-03-%02dT%02d:00Z,%s,3.125,1.5\n", 7 + i / 24, i % 24, (int(i / 24) == 1 ? "0" : 95.25 + i % 5 / 50) }' >log.csv
split -l 24 log.csv part.
: >part.ad
for part in part.a?; do
    bluecone stream --no-header --columns $names --add hhv --rows-alone --quiet "$part"
    echo "exit $?" >&2
    bluecone stream --no-header --columns $names --add hhv --step 1h --rows-alone --summary-part --quiet -o "$part.json" "$part"
    echo "exit $?" >&2
done >rows
bluecone stream --no-header --columns $names --add hhv --rows-alone --quiet log.csv 2>/dev/null | cmp - rows && wc -l <rows
bluecone stream --no-header --columns $names --add hhv --step 1h --rows-alone --summary --json log.csv >whole.json
bluecone stream --merge part.a?.json --json >merged.json
# the state of the merged one stands in a warning
for file in whole merged; do sed -n '/"tables"/,/"warnings"/{/"warnings"/d;p}' "$file.json" >"$file.tables"; done
cmp whole.tables merged.tables && echo the same
bluecone stream --merge part.ad.json part.ab.json part.aa.json part.ac.json --quiet | sed -n '/^Log/,/usual/p'
# but not every part
bluecone stream --merge part.ab.json part.ad.json
echo "exit $?" >&2
bluecone stream --no-header --columns $names --rows-alone --summary part.ad
echo "exit $?" >&2
