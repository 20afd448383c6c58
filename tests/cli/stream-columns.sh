# a column that nothing is made of is named, and what it may have been meant for
log() { printf 'time,CH4,%s,C02,N2,SG,HHV\n2026-03-01T00:00,93,0.5,0.5,6.5,0.61,39\n' "$1"; }
log propain | bluecone stream --add hhv
log Ethan | bluecone stream --add hhv --summary | sed -n '/^Warnings/,$p'
log station | bluecone stream --add hhv --quiet
# fractions of one, and a log without its first row
printf 'CH4,N2\n0.98,0.02\n' | bluecone stream --add hhv; echo "exit $?" >&2
printf 'CH4,N2\n0.98,0.02\n' | bluecone stream --add hhv --shares fraction
printf '2026-03-01,98,2\n' | bluecone stream --add hhv; echo "exit $?" >&2
# a time that cannot be read
printf 'time,CH4\n03/13/2026 12:00,100\n' | bluecone stream --add z
