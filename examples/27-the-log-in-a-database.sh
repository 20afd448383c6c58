#!/bin/sh
# Marrowfen Glass and Tile Works, step 27: the analyses live in a database.
#
# The works keep the rows of the chromatograph in SQLite, beside the flow. With the module of bluecone the database itself
# knows what a row is worth: daily means, weighted with the gas that flowed, and the hours that broke the contract,
# without a file in between.
set -eu
cd "$(dirname "$0")"
PATH=$PATH:../build/release # a bluecone that was installed goes first

bin=$(dirname "$(command -v bluecone)")
for module in "$bin/bluecone_sqlite.so" "$bin"/../lib/bluecone/bluecone_sqlite.so "$bin"/../lib/*/bluecone/bluecone_sqlite.so; do
    test ! -e "$module" || break # in a build tree, below /usr/local, of a Debian package
done

sqlite3 -batch <<END
.load '$module'
.import --csv log-of-two-weeks.csv log

-- a column that no row stores and every query has; the state is that of the contract
CREATE VIEW analyses AS SELECT *, date(time) AS day, CAST("flow [m3/h]" AS REAL) AS flow, gas_value_or_null('wobbe-gross', '25/0',
    'methane', methane, 'ethane', ethane, 'propane', propane, 'isobutane', isobutane, 'n-butane', "n-butane",
    'isopentane', isopentane, 'n-pentane', "n-pentane", 'n-hexane', "n-hexane", 'nitrogen', nitrogen,
    'carbon dioxide', "carbon dioxide", 'hydrogen', hydrogen, 'oxygen', oxygen) / 3.6 AS wobbe FROM log;

.print The Wobbe index by day, kWh/m3 at 25/0
.print
.mode column
SELECT day, count(wobbe) AS hours, count(*) - count(wobbe) AS unusable, printf('%.3f', min(wobbe)) AS least,
    printf('%.3f', sum(wobbe * flow) / sum(flow) FILTER (WHERE wobbe IS NOT NULL)) AS mean, printf('%.3f', max(wobbe)) AS most
    FROM analyses GROUP BY day;

.print
.print The hours with more than 10 % hydrogen, the limit of the contract, and what they lack against the mean of the log
.print
SELECT time, hydrogen, printf('%.3f', wobbe) AS wobbe, printf('%+.2f %%', 100 * (wobbe / (SELECT avg(wobbe) FROM analyses) - 1)) AS difference
    FROM analyses WHERE wobbe IS NOT NULL AND CAST(hydrogen AS REAL) > 10;

.print
.print The rows that no figure can be made of, and why
.print
.mode list
.headers off
SELECT time || ': ' || methane || ' % methane, components add up to ' || round(methane + ethane + propane + isobutane + "n-butane" + isopentane
    + "n-pentane" + "n-hexane" + nitrogen + "carbon dioxide" + hydrogen + oxygen, 2) || ' %' FROM analyses WHERE wobbe IS NULL;
END
echo
echo 'The five hours are those of the claim in step 23: one source of figures, asked in two places.'
