#!/bin/bash
# The module against a real database, through the shell of SQLite: a log of analyses is imported, and every row must have
# the figures that `bluecone stream` puts behind it and `bluecone get` gives for it. Wants $SRC and bluecone in PATH.
#
# Speaks the Test Anything Protocol; exit 1 when one test fails.
set -u
export LC_ALL=C
unset BLUECONE_PATH

PATH=$SRC/tests/sqlite/bin:$PATH
work=$(mktemp -d) || exit 2
trap 'rm -rf "$work"' EXIT
cp "$SRC/examples/log-of-two-weeks.csv" "$SRC/tests/sqlite/columns.sql" "$work" && cd "$work" || exit 2

count=0
failed=0
# is NAME WANTED GOT
is() {
    count=$((count + 1))
    if test "$2" = "$3"; then
        echo "ok $count - $1"
    else
        failed=$((failed + 1))
        echo "not ok $count - $1"
        printf 'wanted: %s\ngot: %s\n' "$2" "$3" | sed 's/^/# /'
    fi
}
sql() { sqlite3 -batch -cmd '.load bluecone_sqlite' analyses.db "$@" 2>&1; }

bluecone stream --add hhv --digits 15 --quiet log-of-two-weeks.csv >stream.csv 2>/dev/null
bluecone stream --add wobbe-gross --at 25/0 --digits 15 --quiet log-of-two-weeks.csv >stream25.csv 2>/dev/null
is 'the log is imported' '' "$(sql '.import --csv log-of-two-weeks.csv log' '.import --csv stream.csv stream' \
    '.import --csv stream25.csv stream25' '.read columns.sql')"
rows=$(($(wc -l <log-of-two-weeks.csv) - 1))
is 'it has every row' "$rows $rows" "$(sql "SELECT (SELECT count(*) FROM log) || ' ' || (SELECT count(*) FROM stream)")"

# Rows that stream refuses are NULL here; 1e-13 is a hundred times what the two decimal conversions may lose.
against() {
    sql "SELECT count(*) || ' compared, ' || sum(f.$3 IS NULL) || ' without a figure' FROM $1 f JOIN $2 s ON s.rowid = f.row
         WHERE CASE WHEN f.$3 IS NULL THEN s.\"$4\" = '' ELSE s.\"$4\" <> '' AND abs(f.$3 - CAST(s.\"$4\" AS REAL)) <= 1e-13 * f.$3 END"
}
refused=$(sql "SELECT count(*) FROM stream WHERE \"hhv [MJ/m3]\" = ''")
is 'stream refuses some rows, so that both kinds are compared' 1 "$((refused > 0 && refused < rows))"
for form in by_columns by_numbers by_json by_text; do
    is "every row has the heating value of bluecone stream, $form" "$rows compared, $refused without a figure" \
        "$(against $form stream hhv 'hhv [MJ/m3]')"
done
is 'every row has the Wobbe index of bluecone stream at 25/0' "$rows compared, $refused without a figure" \
    "$(against by_columns stream25 wobbe 'wobbe-gross [MJ/m3]')"

# The sheet of SQL is the sheet of the program; uncertainties of flames are slopes, good to four digits.
gas='methane=88~0.1,ethane=5~0.05,propane=1,hydrogen=3,nitrogen=rest'
bluecone sheet --at 25/0 --quiet --json "$gas" >sheet.json
quantities=$(bluecone list quantities --bare | wc -l)
is 'gas_sheet has what bluecone sheet has' "$quantities rows, all the same" \
    "$(sql "CREATE TABLE sheet AS SELECT value ->> 'id' AS id, value ->> 'value' AS value, value ->> 'unit' AS unit, value ->> 'uncertainty' AS u,
                value ->> 'method' AS method FROM json_each(readfile('sheet.json'), '\$.results');
            SELECT count(*) || ' rows, ' || iif(sum(iif(s.id IS NULL, g.value IS NULL, abs(g.value - s.value) <= 1e-11 * abs(s.value) AND g.unit = s.unit
                AND g.method = s.method AND (g.uncertainty IS s.u OR abs(g.uncertainty - s.u) <= 1e-4 * s.u))) = count(*), 'all the same', 'some differ')
            FROM gas_sheet('$gas', '25/0') g LEFT JOIN sheet s ON s.id = g.id")"
is 'and as many figures' "$(sql 'SELECT count(*) FROM sheet')" "$(sql "SELECT count(value) FROM gas_sheet('$gas', '25/0')")"

is 'a bundled gas is found from the build tree' 1 "$(sql "SELECT abs(gas_value('hhv', 'g20') - $(bluecone get hhv --bare --digits 9 --quiet g20)) < 1e-7")"
is 'BLUECONE_PATH adds gases' "$(bluecone get hhv --bare --digits 9 --quiet hydrogen)" \
    "$(mkdir gases && printf '[gas]\nname = Own\n[components]\nhydrogen = 100\n' >gases/own.ini &&
        BLUECONE_PATH=$work/gases sql "SELECT printf('%.9g', gas_value('hhv', 'own'))")"
is 'a file is not read, whoever asks for it' 1 \
    "$(sql "SELECT gas_value('hhv', 'gases/own.ini')" | grep -c 'gas_value: the text is no composition; write {"methane": 92, "ethane": 8}, methane=92,ethane=8 or the name of a bundled gas')"
is 'nor by a name in the folder at hand' 1 "$(cp gases/own.ini own; sql "SELECT gas_value('hhv', 'own')" | grep -c "no bundled gas 'own'")"

# A column that SQLite works out itself, with an index over it: only functions that are deterministic may.
is 'a generated column and an index rest on gas_value' '3|1' "$(sql "CREATE TABLE g(methane REAL, ethane REAL, wobbe AS (gas_value_or_null('wobbe-gross', '15/15', 'methane', methane, 'ethane', ethane)));
    CREATE INDEX by_wobbe ON g(wobbe); INSERT INTO g VALUES (100, 0), (90, 10), (1, 1);
    SELECT count(*), sum(wobbe IS NULL) FROM g; " | head -1)"
is 'the index is used' 1 "$(sql "EXPLAIN QUERY PLAN SELECT * FROM g WHERE wobbe > 50" | grep -c 'USING INDEX by_wobbe')"
is 'a view of an untrusted schema may call it' '50.7240' "$(sql 'PRAGMA trusted_schema = off' "CREATE VIEW v AS SELECT printf('%.4f', gas_value('wobbe-gross', 'methane=100')) AS w" 'SELECT w FROM v')"
is 'and gas_sheet' '50.7240' "$(sql 'PRAGMA trusted_schema = off' "CREATE VIEW u AS SELECT printf('%.4f', value) AS w FROM gas_sheet('methane=100') WHERE id = 'wobbe-gross'" 'SELECT w FROM u')"
is 'more arguments than SQLite takes are refused by it' 1 "$(sql "SELECT gas_value('hhv', '15/15'$(for i in $(seq 1 500); do printf ", 'x%d', 1" "$i"; done))" | grep -c 'too many arguments')"
is 'nothing but the entry is exported' sqlite3_blueconesqlite_init "$(nm -D --defined-only --format=posix "$(dirname "$(command -v bluecone)")/bluecone_sqlite.so" |
    awk '$1 !~ /^(__asan|__odr_asan|__ubsan|__gcov|__llvm|mangle_path)/ { print $1 }')"

echo "1..$count"
test "$failed" -eq 0
