# the same two rows in every dialect that is read; what comes out is in the same one
show() { echo "-- $1"; shift; bluecone stream --quiet --add hhv --digits 6 "$@" | sed 's/\r$/\\r/; s/\t/\\t/g; s/^\xEF\xBB\xBF/BOM/'; }
printf 'time,methane,nitrogen\n2026-03-01T00:00,98.5,1.5\n2026-03-01T01:00,97.25,2.75\n' | show comma
printf 'time;methane;nitrogen\n2026-03-01 00:00;98,5;1,5\n2026-03-01 01:00;97,25;2,75\n' | show 'semicolon, decimal comma'
printf 'time;methane;nitrogen\n2026-03-01 00:00;98.5;1.5\n2026-03-01 01:00;97.25;2.75\n' | show 'semicolon, decimal point'
printf 'time\tmethane\tnitrogen\n2026-03-01\t98.5\t1.5\n2026-03-02\t97.25\t2.75\n' | show tab
printf 'time;methane;nitrogen\n2026-03-01;98;2\n2026-03-02;97,25;2,75\n' | show 'semicolon, no mark in the first row'
printf 'time;methane;nitrogen\n2026-03-01;98;2\n2026-03-02;97.25;2.75\n' | show 'the same, a point all the same' --decimal point
printf '"time","methane","nitrogen","remark"\n"2026-03-01","98.5","1.5","cold, ""wet"""\n"2026-03-02","97.25","2.75","two\nlines"\n' | show quoted
printf 'time,methane,nitrogen\r\n2026-03-01,98.5,1.5\r\n2026-03-02,97.25,2.75' | show 'CRLF, no end of the last line'
printf '\357\273\277methane,nitrogen\n98.5,1.5\n' | show 'byte-order mark'
printf '2026-03-01,98.5,1.5\n' | show 'no header' --no-header --columns 'time,methane,nitrogen'
printf '\n  \nmethane,nitrogen\n\n98.5,1.5\n' | show 'blank lines'
printf 'methane,nitrogen\n0.985,0.015\n' | show fractions --shares fraction
printf 'methane,nitrogen [ppm]\n98.5,15000\n' | show ppm
printf 'methane [mass %%],nitrogen [mass %%]\n97.41,2.59\n' | show mass
printf 'methane,nitrogen\n97.41,2.59\n' | show 'mass by an option' --shares 'mass %'
printf 'methane [vol %%],nitrogen [vol %%]\n98.5,1.5\n' | show volume
printf 'date,time,methane,nitrogen\n2026-03-01,00:00,98.5,1.5\n2026-03-01,00:00,98.5,1.5\n' | show 'date and time'
printf 'date;CH4;N2\n24.12.2026 00:00;98,5;1,5\n24.12.2026 01:00;97,25;2,75\n24.12.2026 01:00;97,25;2,75\n' | show 'day, month, year'
