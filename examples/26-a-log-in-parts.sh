#!/bin/sh
# Marrowfen Glass and Tile Works, step 26: the log on several machines, or on all cores of one.
#
# A works has one chromatograph; a grid has thousands, and years of rows of each. A row of a log knows nothing of the
# others, so that any tool which deals out lines can have the work done elsewhere. Here it is GNU parallel over a log
# that was split by lines, which may be done where no quoted cell holds a line feed; with --sshlogin the jobs go to
# other machines. fleet/spark_pipe.py does the same with Apache Spark.
set -eu
cd "$(dirname "$0")"
PATH=$PATH:$PWD/../build/release # a bluecone that was installed goes first
log=$PWD/log-of-two-weeks.csv
contract=$PWD/contract-marrowfen.ini
work=$(mktemp -d)
trap 'rm -rf "$work"' EXIT
cd "$work"

names=$(head -n 1 "$log")
tail -n +2 "$log" | split -l 60 - part.
echo "Parts:" part.??

# parts OPTION...: what each part has to say, in the order of the parts. Exit 1 says that rows are outside of the
# contract, which is an answer; anything above is a failure. -q leaves the blanks in the names alone.
parts() {
    parallel --keep-order --quote sh -c '"$@" || test $? -eq 1' sh \
        bluecone stream --no-header --columns "$names" --contract "$contract" --rows-alone --quiet "$@" ::: part.??
}

bluecone stream "$log" --contract "$contract" --rows-alone --quiet >whole.csv 2>whole.err || test $? -eq 1
{
    head -n 1 whole.csv
    parts 2>parts.err
} >together.csv
cmp whole.csv together.csv && echo "Rows: $(($(wc -l <together.csv) - 1)), byte for byte those of one machine"

bluecone stream "$log" --contract "$contract" --rows-alone --quiet --summary --step 1h --by day >whole.txt 2>/dev/null || test $? -eq 1
parts --summary-part --step 1h --by day >summary.parts 2>/dev/null
split -l 1 summary.parts summary. # a part is a line
bluecone stream --merge summary.?? --quiet >together.txt || test $? -eq 1
cmp whole.txt together.txt && echo 'Summary: digit for digit that of one machine'
echo
sed -n '/^Log/,/^$/p; /^Outside/,/^$/p' together.txt
