# one object a line, its own members kept; the first one names the columns
cat >log.ndjson <<'LOG'
{"time":"2026-03-01T00:00","site":"Marrowfen","methane":95.0,"ethane":3,"nitrogen":2}
{"nitrogen":2,"ethane":"<0.01","methane":98.0,"time":"2026-03-01T01:00","extra":[1,{"a":"}"}]}
{"time":"2026-03-01T02:00","methane":95.0,"ethane":null,"nitrogen":5 }
{"methane":50}
{}
[1,2]
no "json" at all
{"methane":"much","ethane":3,"nitrogen":2}
{"methane":true,"ethane":3,"nitrogen":2}
{"time":7,"methane":95.0,"ethane":3,"nitrogen":2}
LOG
bluecone stream --add hhv,relative-density --digits 6 log.ndjson; echo "exit $?" >&2
# each line is still an object
bluecone stream --quiet log.ndjson 2>/dev/null | grep -vc '^{.*"flags":"[a-z -]*"}$'
printf '{"a":95,"b":5}\n' | bluecone stream --no-header --columns methane,nitrogen --add hhv --quiet; echo "exit $?" >&2
printf 'methane\n' | bluecone stream --form ndjson; echo "exit $?" >&2
