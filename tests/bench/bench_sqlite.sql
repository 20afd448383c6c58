-- bench_sqlite.sql - a million analyses of twelve components, asked for one quantity; run by run.sh, which loads the module.
CREATE TABLE analysis(methane REAL, ethane REAL, propane REAL, isobutane REAL, n_butane REAL, isopentane REAL, n_pentane REAL,
                      n_hexane REAL, nitrogen REAL, carbon_dioxide REAL, hydrogen REAL, oxygen REAL);
WITH RECURSIVE n(i) AS (SELECT 1 UNION ALL SELECT i + 1 FROM n WHERE i < 1000000)
INSERT INTO analysis SELECT 88.0 + i % 1000 * 1e-3, 4.2 + i % 700 * 1e-3, 0.94, 0.16, 0.18, 0.04, 0.03, 0.05, 1.143, 1.305, 3.0, 0.01 FROM n;
CREATE TABLE document AS SELECT json_object('methane', methane, 'ethane', ethane, 'propane', propane, 'isobutane', isobutane, 'n-butane', n_butane,
    'isopentane', isopentane, 'n-pentane', n_pentane, 'n-hexane', n_hexane, 'nitrogen', nitrogen, 'carbon-dioxide', carbon_dioxide,
    'hydrogen', hydrogen, 'oxygen', oxygen) AS gas FROM analysis;
CREATE VIEW by_columns AS SELECT gas_value('wobbe-gross', '15/15', 'methane', methane, 'ethane', ethane, 'propane', propane, 'isobutane', isobutane,
    'n-butane', n_butane, 'isopentane', isopentane, 'n-pentane', n_pentane, 'n-hexane', n_hexane, 'nitrogen', nitrogen,
    'carbon-dioxide', carbon_dioxide, 'hydrogen', hydrogen, 'oxygen', oxygen) AS value FROM analysis;
CREATE VIEW by_json AS SELECT gas_value('wobbe-gross', gas) AS value FROM document;
.timer on
.print row: a column for each component
SELECT sum(value) FROM by_columns;
.print row: a JSON object
SELECT sum(value) FROM by_json;
.print row: for comparison, the columns added up
SELECT sum(methane + ethane + propane + isobutane + n_butane + isopentane + n_pentane + n_hexane + nitrogen + carbon_dioxide + hydrogen + oxygen) FROM analysis;
.print row: for comparison, json_valid()
SELECT sum(json_valid(gas)) FROM document;
.print row: a column for each component
SELECT sum(value) FROM by_columns;
.print row: a JSON object
SELECT sum(value) FROM by_json;
.print row: for comparison, the columns added up
SELECT sum(methane + ethane + propane + isobutane + n_butane + isopentane + n_pentane + n_hexane + nitrogen + carbon_dioxide + hydrogen + oxygen) FROM analysis;
.print row: for comparison, json_valid()
SELECT sum(json_valid(gas)) FROM document;
.print row: a column for each component
SELECT sum(value) FROM by_columns;
.print row: a JSON object
SELECT sum(value) FROM by_json;
.print row: for comparison, the columns added up
SELECT sum(methane + ethane + propane + isobutane + n_butane + isopentane + n_pentane + n_hexane + nitrogen + carbon_dioxide + hydrogen + oxygen) FROM analysis;
.print row: for comparison, json_valid()
SELECT sum(json_valid(gas)) FROM document;
