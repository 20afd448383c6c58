# what comes out does not depend on the number of threads, nor on how the bytes come in
awk 'BEGIN { srand(3); print "time,methane,ethane,nitrogen,note"
    for (i = 0; i < 40000; i++) {
        n = 1 + rand(); e = 2 + rand()
        printf "2026-%02d-%02dT%02d:%02d,%.3f,%s,%.3f,%s\n", i / 1440 / 28 + 1, i / 1440 % 28 + 1, i / 60 % 24, i % 60,
            i % 997 ? 100 - n - e : 7, i % 313 ? sprintf("%.3f", e) : "<0.01", n, i % 501 ? "" : "\"two\nlines, \"\"quoted\"\"\""
    } }' >log.csv
for jobs in 1 2 3 8; do bluecone stream --jobs $jobs --quiet log.csv >rows.$jobs 2>err.$jobs; cmp rows.1 rows.$jobs && echo equal; done
cmp err.1 err.8 && cat err.1 >&2
dd if=log.csv bs=777 2>/dev/null | bluecone stream --jobs 2 --quiet 2>/dev/null | cmp - rows.1 && echo equal
wc -l <rows.1
# a last row without a line feed is one, though it is the only one and nothing more comes
for jobs in 1 2; do printf 'CH4,N2\n90,10' | bluecone stream --jobs $jobs --quiet --add hhv; echo; done
# rows so short that a block has room for more than are worked at in one piece
awk 'BEGIN { for (i = 0; i < 30000; i++) print i % 10 + 90 "," (i % 7 ? 10 - i % 10 : 40) }' >short.csv
for jobs in 1 2 64; do bluecone stream --no-header --columns methane,nitrogen --add hhv --jobs $jobs --quiet short.csv >short.$jobs 2>err.$jobs; wc -l <short.$jobs; done
cmp short.1 short.2 && cmp short.1 short.64 && cmp err.1 err.64 && cat err.1 >&2
