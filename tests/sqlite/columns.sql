-- columns.sql - the log of the works as .import makes it (all TEXT), and the forms in which a gas can be asked for.
CREATE VIEW by_columns AS SELECT rowid AS row, time,
    gas_value_or_null('hhv', '15/15', 'methane', methane, 'ethane', ethane, 'propane', propane, 'isobutane', isobutane, 'n-butane', "n-butane",
        'isopentane', isopentane, 'n-pentane', "n-pentane", 'n-hexane', "n-hexane", 'nitrogen', nitrogen, 'carbon dioxide', "carbon dioxide",
        'hydrogen', hydrogen, 'oxygen', oxygen) AS hhv,
    gas_value_or_null('wobbe-gross', '25/0', 'methane', methane, 'ethane', ethane, 'propane', propane, 'isobutane', isobutane, 'n-butane', "n-butane",
        'isopentane', isopentane, 'n-pentane', "n-pentane", 'n-hexane', "n-hexane", 'nitrogen', nitrogen, 'carbon dioxide', "carbon dioxide",
        'hydrogen', hydrogen, 'oxygen', oxygen) AS wobbe
    FROM log;

-- The same shares as numbers.
CREATE TABLE numbers AS SELECT rowid AS row, time, CAST(methane AS REAL) AS methane, CAST(ethane AS REAL) AS ethane, CAST(propane AS REAL) AS propane,
    CAST(isobutane AS REAL) AS isobutane, CAST("n-butane" AS REAL) AS n_butane, CAST(isopentane AS REAL) AS isopentane,
    CAST("n-pentane" AS REAL) AS n_pentane, CAST("n-hexane" AS REAL) AS n_hexane, CAST(nitrogen AS REAL) AS nitrogen,
    CAST("carbon dioxide" AS REAL) AS carbon_dioxide, CAST(hydrogen AS REAL) AS hydrogen, CAST(oxygen AS REAL) AS oxygen FROM log;

CREATE VIEW by_numbers AS SELECT row,
    gas_value_or_null('hhv', '15/15', 'methane', methane, 'ethane', ethane, 'propane', propane, 'isobutane', isobutane, 'n-butane', n_butane,
        'isopentane', isopentane, 'n-pentane', n_pentane, 'n-hexane', n_hexane, 'nitrogen', nitrogen, 'carbon dioxide', carbon_dioxide,
        'hydrogen', hydrogen, 'oxygen', oxygen) AS hhv FROM numbers;

CREATE VIEW by_json AS SELECT row, gas_value_or_null('hhv', json_object('methane', methane, 'ethane', ethane, 'propane', propane, 'isobutane', isobutane,
    'nC4', n_butane, 'iC5', isopentane, 'nC5', n_pentane, 'n-hexane', n_hexane, 'N2', nitrogen, 'CO2', carbon_dioxide, 'H2', hydrogen, 'O2', oxygen)) AS hhv
    FROM numbers;

CREATE VIEW by_text AS SELECT rowid AS row, gas_value_or_null('hhv', 'methane=' || methane || ',ethane=' || ethane || ',propane=' || propane
    || ',isobutane=' || isobutane || ',n-butane=' || "n-butane" || ',isopentane=' || isopentane || ',n-pentane=' || "n-pentane" || ',n-hexane=' || "n-hexane"
    || ',nitrogen=' || nitrogen || ',carbon dioxide=' || "carbon dioxide" || ',hydrogen=' || hydrogen || ',oxygen=' || oxygen, '15/15') AS hhv FROM log;
