# every rule about a row beside those before it
{
    echo 'time,methane,ethane,nitrogen'
    for minute in 00 01 02 03 04 05 06; do echo "2026-03-02T00:$minute,9$((${minute#0} % 3)).0,3.0,$((7 - ${minute#0} % 3)).0"; done
    echo '2026-03-02T00:06,91.5,3.0,5.5'
    echo '2026-03-02T00:05,91.4,3.0,5.6'
    echo '2026-03-02T00:20,91.3,3.0,5.7'
    echo '2026-03-02T00:21,80.0,3.0,17.0'
    echo '2026-03-02T00:22,91.2,3.0,5.8'
    for minute in 23 24 25 26 27 28 29 30 31 32 33 34; do echo "2026-03-02T00:$minute,91.1,3.0,5.9"; done
    echo 'yesterday,91.0,3.0,6.0'
    echo '2026-03-02T00:35,100,0,0'
    echo '2026-03-02T00:36,91.1,3.0,4.9'
    echo '2026-03-02T00:37,91.1,3.0,4.8'
    echo '2026-03-02T00:38,92.2,3.0,5.9'
} >log.csv
bluecone stream --add wobbe-gross --digits 5 --calibration methane=100 log.csv
# the night when the clock is put back, and that when it is put on; a clock with a zone has no such hour
printf 'time,methane\n2026-10-25 01:00,100\n2026-10-25 01:30,100\n2026-10-25 02:00,100\n2026-10-25 02:30,100\n2026-10-25 02:00,100\n2026-10-25 02:30,100\n' |
    bluecone stream --add z --quiet
printf 'time,methane\n2026-03-29 00:30,100\n2026-03-29 01:00,100\n2026-03-29 01:30,100\n2026-03-29 02:00,100\n2026-03-29 03:30,100\n' |
    bluecone stream --add z --quiet
printf 'time,methane\n2026-03-29T00:30Z,100\n2026-03-29T01:00Z,100\n2026-03-29T01:30Z,100\n2026-03-29T02:00Z,100\n2026-03-29T03:30Z,100\n' |
    bluecone stream --add z --quiet --step 30min
# rows alone: nothing is compared
bluecone stream --add wobbe-gross --rows-alone --quiet log.csv | cut -d, -f7 | sort | uniq -c
