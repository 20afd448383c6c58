# wrong use, and logs that are none
try() { "$@" >/dev/null; echo "exit $?" >&2; }
log="$SRC/examples/log-of-two-weeks.csv"
try bluecone stream missing.csv
try bluecone stream .
try bluecone stream "$log" "$log"
try bluecone stream "$log" --jobs 0
try bluecone stream "$log" --jobs two
try bluecone stream "$log" --form xml
try bluecone stream "$log" --decimal dot
try bluecone stream "$log" --decimal comma
try bluecone stream "$log" --shares stones
try bluecone stream "$log" --step often
try bluecone stream "$log" --step 5
try bluecone stream "$log" --no-header
try bluecone stream "$log" --columns methane
try bluecone stream "$log" --add hvv
try bluecone stream "$log" --unit kWh/kg
try bluecone stream "$log" --calibration no-such-gas
try bluecone stream "$log" --contract no-such-contract
try bluecone stream "$log" --against g20
try bluecone stream "$log" -o rows.html; ls
try bluecone stream "$log" -o rows.json
printf '{"methane":100}' | try bluecone stream -o rows.csv
printf '' | try bluecone stream
printf 'time,pressure\n1,2\n' | try bluecone stream
printf 'methane,CH4\n1,2\n' | try bluecone stream
printf 'methane [mass %%],ethane [vol %%]\n1,2\n' | try bluecone stream
printf 'm\0e\0' | try bluecone stream
printf 'methane\n100\n' | try bluecone stream --follow
