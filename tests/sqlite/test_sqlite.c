/* SPDX-License-Identifier: MIT */
/* test_sqlite.c - the module through the C interface of SQLite: values against the library, refusals, tables, chance. */
#include "support.h"

#include "bluecone/bluecone.h"

#include <pthread.h>
#include <sqlite3.h>

#define MODULE BC_BUILD_DIR "/bluecone_sqlite"

static sqlite3 *open_with_module(void)
{
    sqlite3 *db = NULL;
    char *message = NULL;

    assert_int_equal(sqlite3_open(":memory:", &db), SQLITE_OK);
    assert_int_equal(sqlite3_db_config(db, SQLITE_DBCONFIG_ENABLE_LOAD_EXTENSION, 1, NULL), SQLITE_OK);
    if (sqlite3_load_extension(db, MODULE, NULL, &message) != SQLITE_OK)
        fail_msg("%s", message);
    return db;
}

static int open_db(void **state)
{
    *state = open_with_module();
    return 0;
}

static int close_db(void **state)
{
    return sqlite3_close(*state) != SQLITE_OK;
}

/* The first column of the first row as text, "NULL", or the message of an error; "none" without a row. */
static const char *ask(sqlite3 *db, const char *sql)
{
    static _Thread_local char text[1024];
    sqlite3_stmt *s = NULL;
    int code = sqlite3_prepare_v2(db, sql, -1, &s, NULL);

    if (code == SQLITE_OK)
        code = sqlite3_step(s);
    if (code == SQLITE_ROW)
        (void)snprintf(text, sizeof text, "%s", sqlite3_column_type(s, 0) == SQLITE_NULL ? "NULL" : (const char *)sqlite3_column_text(s, 0));
    else
        (void)snprintf(text, sizeof text, "%s", code == SQLITE_DONE ? "none" : sqlite3_errmsg(db));
    (void)sqlite3_finalize(s);
    return text;
}

static double number(sqlite3 *db, const char *sql)
{
    sqlite3_stmt *s = NULL;

    assert_int_equal(sqlite3_prepare_v2(db, sql, -1, &s, NULL), SQLITE_OK);
    if (sqlite3_step(s) != SQLITE_ROW)
        fail_msg("%s: %s", sql, sqlite3_errmsg(db));
    assert_int_equal(sqlite3_column_type(s, 0), SQLITE_FLOAT);
    const double value = sqlite3_column_double(s, 0);

    (void)sqlite3_finalize(s);
    return value;
}

static double by_library(const char *quantity, const char *literal, const char *at, bool saturated, int edition)
{
    bc_composition *c = malloc(sizeof *c);
    bc_state s = bc_state_default();
    bc_reference r;
    bc_subject subject;
    bc_error err;
    size_t index = 0;
    double value = 0.0;

    assert_non_null(c);
    assert_ok(bc_state_parse(at, &s, &err), &err);
    s.saturated = saturated;
    s.edition = edition;
    assert_ok(bc_reference_at(&s, &r, &err), &err);
    assert_ok(bc_composition_parse(literal, c, &err), &err);
    assert_ok(bc_subject_make(&r, &c->gas, NULL, &subject, &err), &err);
    assert_ok(bc_quantity_find(quantity, &index, &err), &err);
    assert_ok(bc_quantity_value(index, &subject, &value, &err), &err);
    free(c);
    return value;
}

/* Rounding apart: the order of additions differs between a literal and columns. */
#define assert_same(db, sql, want) assert_within_at(sql, number(db, sql), want, 1e-14 * fabs(want))

static void a_gas_has_the_figures_of_the_library_in_every_form(void **state)
{
    sqlite3 *db = *state;
    const double usual = by_library("wobbe-gross", "methane=92,ethane=8", "15/15", false, 2016);

    assert_same(db, "SELECT gas_value('wobbe-gross', 'methane=92,ethane=8')", usual);
    assert_same(db, "SELECT gas_value('Wobbe_Gross', '  {\"CH4\": 92, \"C2\": 8.0}')", usual);
    assert_same(db, "SELECT gas_value('wobbe-gross', '{\"m\\u0065thane\": 92, \"ethane\": 8}')", usual);
    assert_same(db, "SELECT gas_value('wobbe-gross', '{\"methane\": \"92\", \"ethane\": 0.8e1, \"argon\": null, \"helium\": \"<0.01\", \"neon\": \"\"}')", usual);
    assert_same(db, "SELECT gas_value('wobbe-gross', '15/15', 'methane', 92, 'ethane', 8.0)", usual);
    assert_same(db, "SELECT gas_value('wobbe-gross', '15/15', 'methane', '92', 'ethane', ' 8.0', 'argon', NULL, 'helium', '<0.01', 'neon', '')", usual);
    assert_same(db, "SELECT gas_value('wobbe-gross', 'mass:methane=92,ethane=8')", by_library("wobbe-gross", "mass:methane=92,ethane=8", "15/15", false, 2016));
    assert_same(db, "SELECT gas_value('hhv', '25/0', 'methane', 91.5, 'c6+', 0.5, 'air', 8)", by_library("hhv", "methane=91.5,c6+=0.5,air=8", "25/0", false, 2016));
    assert_same(db, "SELECT gas_value('methane-number', '0/0', 'methane', 97, 'ethane', 3)", by_library("methane-number", "methane=97,ethane=3", "0/0", false, 2016));
}

static void a_state_may_say_saturated_and_the_edition(void **state)
{
    sqlite3 *db = *state;

    assert_same(db, "SELECT gas_value('hhv', 'methane=100', '60F/60F@14.73psi')", by_library("hhv", "methane=100", "60F/60F@14.73psi", false, 2016));
    assert_same(db, "SELECT gas_value('hhv', 'methane=100', '15 C/15 C saturated')", by_library("hhv", "methane=100", "15/15", true, 2016));
    assert_same(db, "SELECT gas_value('hhv', ' 25/0 1995 ', 'methane', 100)", by_library("hhv", "methane=100", "25/0", false, 1995));
    assert_same(db, "SELECT gas_value('hhv', '15/15 saturated 1995', 'methane', 100)", by_library("hhv", "methane=100", "15/15", true, 1995));
}

static void null_in_is_null_out_but_a_null_share_is_zero(void **state)
{
    static const char *const NULLS[] = {"gas_value(NULL, 'g20')", "gas_value('hhv', NULL)", "gas_value('hhv', 'g20', NULL)", "gas_value(NULL, '15/15', 'methane', 100)",
                                        "gas_value('hhv', NULL, 'methane', 100)", "gas_value('hhv', '15/15', 'methane', NULL, 'ethane', NULL)",
                                        "gas_unit(NULL)", "gas_value_or_null('hhv', NULL)"};
    char sql[256];

    for (size_t i = 0; i < COUNT(NULLS); i++) {
        (void)snprintf(sql, sizeof sql, "SELECT %s", NULLS[i]);
        assert_string_equal(ask(*state, sql), "NULL");
    }
    assert_string_equal(ask(*state, "SELECT count(*) FROM gas_sheet(NULL)"), "0");
    assert_string_equal(ask(*state, "SELECT count(*) FROM gas_sheet('g20', NULL)"), "0");
    assert_same(*state, "SELECT gas_value('hhv', '15/15', 'methane', 100, 'ethane', NULL)", by_library("hhv", "methane=100", "15/15", false, 2016));
}

/* What is wrong with a row is NULL of gas_value_or_null(); what is wrong with the query stays an error. */
static const struct {
    const char *arguments, *words;
    bool of_row;
} REFUSALS[] = {
    {"'hhv', '{\"methane\": 92}'", "gas_value: the components add up to 92 %|outside 98 to 102 %", true},
    {"'hhv', '15/15', 'methane', 0.92, 'ethane', 0.08", "add up to 1 %|fractions of one", true},
    {"'hhv', '15/15', 'methane', 'n/a', 'ethane', 8", "'methane' reads 'n/a', which is no number", true},
    {"'hhv', '15/15', 'methane', '92,5', 'ethane', 8", "'92,5'", true},
    {"'hhv', '15/15', 'methane', 101, 'ethane', -1", "'ethane' is -1|negative", true},
    {"'hhv', '15/15', 'methane', 101, 'ethane', '-1'", "'ethane' is -1|negative", true},
    {"'hhv', '15/15', 'methane', x'39', 'ethane', 1", "'methane' is a blob", true},
    {"'hhv', '15/15', 'methane', 9e999, 'ethane', 1", "add up to inf %", true},
    {"'hhv', '{\"methane\": 101, \"ethane\": -1}'", "'ethane' is -1|negative", true},
    {"'hhv', '{\"methane\": true}'", "'methane' is no number", true},
    {"'hhv', '{\"methane\": [92]}'", "'methane' is no number", true},
    {"'hhv', '{\"methane\": 92, \"ethane\": 08}'", "JSON", true},
    {"'hhv', '{\"methane\": 92 \"ethane\": 8}'", "JSON", true},
    {"'hhv', '{\"methane\": 100, }'", "JSON", true},
    {"'hhv', '{\"methane\": 100} x'", "JSON", true},
    {"'hhv', '{\"methane\": 50, \"methane\": 50}'", "duplicate", true},
    {"'hhv', '{\"methane\": 50, \"CH4\": 50}'", "'CH4'|there already", true},
    {"'hhv', '{\"methane\": 50, \"C2H6\": 25, \"ethane\": 25}'", "'ethane'|there already", true},
    {"'hhv', '{\"methan\": 100}'", "unknown component 'methan'; the nearest known one is 'methane'", true},
    {"'hhv', '{\"C4H10\": 100}'", "formula of several species", true},
    {"'hhv', '{}'", "add up to 0 %", true},
    {"'hhv', ''", "no composition", true},
    {"'hhv', 'g2O'", "no bundled gas 'g2O'; the nearest one is 'g20'", true},
    {"'hhv', '/etc/passwd'", "no composition", true},
    {"'hhv', '../compositions/g20'", "no composition", true},
    {"'hhv', x'7B7D'", "the composition is no text", true},
    {"'hhv', 100", "the composition is no text", true},
    {"'hhv', printf('%070000d', 7)", "70000 bytes is no composition", true},
    {"'hhv', 'methane=1' || char(0) || '00'", "NUL", true},
    {"'hydrogen-carbon-ratio', 'nitrogen=100'", "no carbon", true},
    {"'hhv', '15/15', 'methane', 60, 'nonane', 'x'", "'nonane' reads 'x'", true},
    {"'wobbe', 'g20'", "unknown quantity 'wobbe'; write 'wobbe-gross' or 'wobbe-net'", false},
    {"17, 'g20'", "the quantity is no text", false},
    {"x'686876', 'g20'", "the quantity is no text", false},
    {"'hhv', 'g20', '15'", "15", false},
    {"'hhv', 'g20', ''", "", false},
    {"'hhv', 'g20', 15", "the reference state is no text", false},
    {"'hhv', 'g20', '15/15 wet'", "15 wet", false},
    {"'hhv', 'g20', '15/99'", "99", false},
    {"'hhv', 'methane', 'ethane', 8", "a reference state is written", false},
    {"'hhv', '15/15', 'methane', 92.0, 'ethane'", "takes a quantity, a composition", false},
    {"'hhv'", "takes a quantity, a composition", false},
    {"", "takes a quantity, a composition", false},
    {"'hhv', '15/15', 'methane', 50, 'CH4', 50", "'methane' and 'CH4' are the same component", false},
    {"'hhv', '15/15', 'methane', 50, 'ethane', 25, 'C2H6', 25", "'ethane' and 'C2H6' are the same component", false},
    {"'hhv', '15/15', 'methan', 100", "unknown component 'methan'; the nearest known one is 'methane'", false},
    {"'hhv', '15/15', NULL, 100", "component 1 is NULL", false},
    {"'hhv', '15/15', 92.0, 'methane'", "the name of a component is no text", false},
    {"'hhv', '15/15', printf('%0100d', 7), 100", "longer than", false},
};

static void assert_says(const char *said, const char *sql, const char *words)
{
    char list[256];

    (void)snprintf(list, sizeof list, "%s", words);
    for (char *p = strtok(list, "|"); p; p = strtok(NULL, "|"))
        if (!strstr(said, p))
            fail_msg("%s\nsaid: %s\nwithout: %s", sql, said, p);
}

static void what_is_wrong_is_said_in_a_sentence(void **state)
{
    char sql[400];

    for (size_t i = 0; i < COUNT(REFUSALS); i++) {
        (void)snprintf(sql, sizeof sql, "SELECT gas_value(%s)", REFUSALS[i].arguments);
        const char *said = ask(*state, sql);

        assert_says(said, sql, "gas_value: ");
        assert_says(said, sql, REFUSALS[i].words);
        (void)snprintf(sql, sizeof sql, "SELECT gas_value_or_null(%s)", REFUSALS[i].arguments);
        said = ask(*state, sql);
        assert_says(said, sql, REFUSALS[i].of_row ? "NULL" : "gas_value_or_null: ");
    }
    assert_says(ask(*state, "SELECT gas_unit('wobbe')"), "gas_unit", "gas_unit: unknown quantity 'wobbe'");
    assert_says(ask(*state, "SELECT gas_unit(x'00')"), "gas_unit", "gas_unit: the quantity is no text");
    assert_says(ask(*state, "SELECT * FROM gas_sheet"), "gas_sheet", "gas_sheet: a sheet needs a composition");
    assert_says(ask(*state, "SELECT * FROM gas_sheet('g2O')"), "gas_sheet", "gas_sheet: no bundled gas 'g2O'");
    assert_says(ask(*state, "SELECT * FROM gas_sheet('g20', '15')"), "gas_sheet", "gas_sheet: ");
    assert_says(ask(*state, "SELECT * FROM gas_sheet(7)"), "gas_sheet", "gas_sheet: the composition is no text");
}

/* The arguments that are settled once must not stick when they change from row to row. */
static void arguments_may_change_from_row_to_row(void **state)
{
    sqlite3 *db = *state;
    const double methane = by_library("hhv", "methane=100", "15/15", false, 2016);
    const double ethane = by_library("hhv", "ethane=100", "15/15", false, 2016);
    const double cold = by_library("hhv", "methane=100", "25/0", false, 2016);
    const double net = by_library("lhv", "methane=100", "15/15", false, 2016);

    assert_same(db, "SELECT sum(gas_value('hhv', '15/15', column1, 100)) FROM (VALUES ('methane'), ('ethane'), ('methane'))", 2.0 * methane + ethane);
    assert_same(db, "SELECT sum(gas_value('hhv', column1, 'methane', 100)) FROM (VALUES ('15/15'), ('25/0'), ('15/15'))", 2.0 * methane + cold);
    assert_same(db, "SELECT sum(gas_value(column1, '15/15', 'methane', 100)) FROM (VALUES ('hhv'), ('lhv'), ('hhv'))", 2.0 * methane + net);
    assert_same(db, "SELECT sum(gas_value('hhv', 'methane=100', column1)) FROM (VALUES ('15/15'), ('25/0'), ('15/15'))", 2.0 * methane + cold);
    assert_same(db, "SELECT sum(gas_value('hhv', column1)) FROM (VALUES ('methane=100'), ('{\"ethane\": 100}'), (NULL), ('methane=100'))", 2.0 * methane + ethane);
    assert_string_equal(ask(db, "SELECT count(DISTINCT gas_value('hhv', 'methane=100', s)) FROM (WITH RECURSIVE n(i) AS (SELECT 0 UNION ALL SELECT i + 1 FROM n WHERE i < 19)"
                                "SELECT '15/' || i AS s FROM n)"), "20");
}

/* More words than are remembered: each spelling of a name counts as one. */
static void a_thousand_spellings_of_a_name_are_all_understood(void **state)
{
    sqlite3_stmt *s = NULL;

    assert_int_equal(sqlite3_prepare_v2(*state, "SELECT gas_value('hhv', '15/15', ?1, 60, ?2, 40), gas_value('hhv', '{\"' || ?1 || '\": 60, \"' || ?2 || '\": 40}')", -1, &s, NULL), SQLITE_OK);
    const double want = by_library("hhv", "methane=60,ethane=40", "15/15", false, 2016);

    for (unsigned i = 0; i < 1000; i++) {
        char names[2][40];

        for (unsigned k = 0; k < 2; k++) {
            size_t used = 0;

            for (const char *p = k == 0 ? "methane" : "ethane"; *p != '\0'; p++) {
                names[k][used] = (char)(i >> (used % 6) & 1U ? *p - 'a' + 'A' : *p);
                used++;
                if (i >> 6 & 1U << (used % 4))
                    names[k][used++] = '-';
            }
            names[k][used] = '\0';
            assert_int_equal(sqlite3_bind_text(s, (int)k + 1, names[k], -1, SQLITE_TRANSIENT), SQLITE_OK);
        }
        if (sqlite3_step(s) != SQLITE_ROW)
            fail_msg("%s %s: %s", names[0], names[1], sqlite3_errmsg(*state));
        assert_within_at(names[0], sqlite3_column_double(s, 0), want, 1e-13 * want);
        assert_within_at(names[0], sqlite3_column_double(s, 1), want, 1e-13 * want);
        (void)sqlite3_reset(s);
    }
    (void)sqlite3_finalize(s);
}

static void a_sheet_has_every_quantity_with_value_unit_uncertainty_and_method(void **state)
{
    sqlite3 *db = *state;
    char count[24];

    (void)snprintf(count, sizeof count, "%zu", bc_quantity_count());
    assert_string_equal(ask(db, "SELECT count(*) FROM gas_sheet('g20')"), count);
    assert_string_equal(ask(db, "SELECT count(*) FROM gas_sheet('g20') WHERE unit = gas_unit(id)"), count);
    for (size_t i = 0; i < bc_quantity_count(); i++) {
        char sql[300];

        (void)snprintf(sql, sizeof sql, "SELECT value IS gas_value_or_null(id, 'methane=95,hydrogen=5', '25/0') AND label = '%s' FROM gas_sheet('methane=95,hydrogen=5', '25/0') WHERE rowid = %zu",
                       bc_quantity_at(i)->label, i + 1);
        assert_string_equal(ask(db, sql), "1");
    }
    assert_string_equal(ask(db, "SELECT method FROM gas_sheet('g20', '15/15 1995') WHERE id = 'hhv'"), "ISO 6976:1995");
    /* the scatter of the composition is in it, and only where it was stated */
    assert_string_equal(ask(db, "SELECT (SELECT uncertainty FROM gas_sheet('methane=92~0.5,ethane=8~0.5') WHERE id = 'hhv') >"
                                "5 * (SELECT uncertainty FROM gas_sheet('methane=92,ethane=8') WHERE id = 'hhv')"), "1");
    assert_string_equal(ask(db, "SELECT value FROM gas_sheet('nitrogen=100') WHERE id = 'hydrogen-carbon-ratio'"), "NULL");
    assert_string_equal(ask(db, "SELECT uncertainty FROM gas_sheet('nitrogen=100') WHERE id = 'hydrogen-carbon-ratio'"), "NULL");
}

static void a_sheet_joins_with_a_table_in_any_order(void **state)
{
    sqlite3 *db = *state;
    const double want = by_library("hhv", "methane=100", "15/15", false, 2016) + by_library("hhv", "ethane=100", "15/15", false, 2016);

    assert_int_equal(sqlite3_exec(db, "CREATE TABLE t(gas); INSERT INTO t VALUES ('methane=100'), ('ethane=100')", NULL, NULL, NULL), SQLITE_OK);
    assert_same(db, "SELECT sum(value) FROM t, gas_sheet(t.gas) WHERE id = 'hhv'", want);
    assert_same(db, "SELECT sum(value) FROM gas_sheet(t.gas) JOIN t WHERE id = 'hhv'", want);
    assert_same(db, "SELECT sum(value) FROM gas_sheet JOIN t ON composition = gas AND id = 'hhv'", want);
    assert_same(db, "SELECT sum(g.value) FROM t, gas_sheet(t.gas) g, gas_sheet(g.composition) h WHERE g.id = 'hhv' AND h.id = g.id", want);
    assert_string_equal(ask(db, "SELECT state FROM gas_sheet('g20', '25/0')"), "25/0");
    assert_string_equal(ask(db, "SELECT state FROM gas_sheet('g20')"), "NULL");
    assert_string_equal(ask(db, "SELECT composition FROM gas_sheet('g20')"), "g20");
}

/* ---- chance: nothing that can be written in SQL may end otherwise than in a figure, NULL or a sentence ------------- */

static void bind_anything(sqlite3_stmt *s, int place, chance *c)
{
    static const char *const TEXTS[] = {"hhv", "methane-number", "flame-temperature", "15/15", "25/0 saturated", "methane", "CH4", "c6+", "air", "C4H10", "g20",
                                        "{\"methane\": 100}", "methane=100", "methane=rest", "{\"", "", "92", "<3", "-1", "1e999", "\xff\xfe", "{\"a\":{\"b\":[[[[1]]]]}}"};
    static const double NUMBERS[] = {0.0, -0.0, 100.0, 50.0, 1e308, -1e308, 5e-324, HUGE_VAL, -HUGE_VAL, 92.5};
    unsigned char blob[32];

    switch (chance_below(c, 6)) {
    case 0: assert_int_equal(sqlite3_bind_null(s, place), SQLITE_OK); break;
    case 1: assert_int_equal(sqlite3_bind_double(s, place, NUMBERS[chance_below(c, COUNT(NUMBERS))]), SQLITE_OK); break;
    case 2: assert_int_equal(sqlite3_bind_int64(s, place, (sqlite3_int64)chance_bits(c)), SQLITE_OK); break;
    case 3:
        for (size_t i = 0; i < sizeof blob; i++)
            blob[i] = (unsigned char)chance_bits(c);
        if (chance_below(c, 2) == 0)
            assert_int_equal(sqlite3_bind_blob(s, place, blob, (int)chance_below(c, sizeof blob), SQLITE_TRANSIENT), SQLITE_OK);
        else
            assert_int_equal(sqlite3_bind_text(s, place, (const char *)blob, (int)chance_below(c, sizeof blob), SQLITE_TRANSIENT), SQLITE_OK);
        break;
    default: assert_int_equal(sqlite3_bind_text(s, place, TEXTS[chance_below(c, COUNT(TEXTS))], -1, SQLITE_STATIC), SQLITE_OK); break;
    }
}

static void assert_answered(sqlite3_stmt *s, sqlite3 *db)
{
    for (int code = sqlite3_step(s); code != SQLITE_DONE; code = sqlite3_step(s)) {
        if (code == SQLITE_ROW) {
            assert_true(sqlite3_column_type(s, 0) != SQLITE_FLOAT || isfinite(sqlite3_column_double(s, 0)));
            continue;
        }
        assert_int_equal(code, SQLITE_ERROR);
        assert_non_null(strstr(sqlite3_errmsg(db), ": "));
        break;
    }
}

static void arguments_of_any_kind_and_number_are_answered(void **state)
{
    sqlite3 *db = *state;
    chance c = {20260301};

    for (int round = 0; round < 4000; round++) {
        const int count = (int)chance_below(&c, round % 10 == 0 ? 127 : 9);
        const bool sheet = count > 0 && count < 3 && chance_below(&c, 2) == 0;
        char sql[700];
        size_t used = (size_t)snprintf(sql, sizeof sql, "%s(", sheet ? "SELECT value FROM gas_sheet" : round % 2 == 0 ? "SELECT gas_value" : "SELECT gas_value_or_null");
        sqlite3_stmt *s = NULL;

        for (int i = 0; i < count; i++)
            used += (size_t)snprintf(sql + used, sizeof sql - used, i == 0 ? "?" : ",?");
        (void)snprintf(sql + used, sizeof sql - used, ")");
        assert_int_equal(sqlite3_prepare_v2(db, sql, -1, &s, NULL), SQLITE_OK);
        for (int i = 1; i <= count; i++)
            bind_anything(s, i, &c);
        if (chance_below(&c, 2) == 0 && count > 1 && !sheet) { /* on to the shares */
            assert_int_equal(sqlite3_bind_text(s, 1, "hhv", -1, SQLITE_STATIC), SQLITE_OK);
            if (count > 3)
                assert_int_equal(sqlite3_bind_text(s, 2, "15/15", -1, SQLITE_STATIC), SQLITE_OK);
        }
        assert_answered(s, db);
        (void)sqlite3_finalize(s);
    }
}

/* JSON that is plain is read in one pass, all other by the library for JSON. An escape in a name forces the latter. */
static void both_readers_of_json_agree(void **state)
{
    static const char *const SHARES[] = {"0.3", "0.85", "1", "0.0", "0", "0.0285", "01", "1.", ".5", "1e1", "-1", "1E-1", "null", "\"3\"", "1.23456789012345678", " 5 "};
    static const char *const NAMES[] = {"ethane", "propane", "C2H6", "n-butane", "nitrogen", "air", "c6+", "x", "", " CO 2 ", "eth\\u0061ne"};
    sqlite3 *db = *state;
    sqlite3_stmt *s = NULL;
    chance c = {77};
    int good = 0;

    assert_int_equal(sqlite3_prepare_v2(db, "SELECT gas_value_or_null('hhv', ?1), gas_value_or_null('hhv', replace(?1, '\"methane\"', '\"\\u006dethane\"'))", -1, &s, NULL), SQLITE_OK);
    for (int round = 0; round < 20000; round++) {
        char text[300];
        size_t used = (size_t)snprintf(text, sizeof text, "{\"methane\": %d.%u", 97 + (int)chance_below(&c, 3), (unsigned)chance_below(&c, 1000));
        const size_t members = chance_below(&c, 5);

        for (size_t i = 0; i < members; i++)
            used += (size_t)snprintf(text + used, sizeof text - used, ",%s\"%s\":%s", i % 2 == 0 ? " \n" : "", NAMES[chance_below(&c, COUNT(NAMES))], SHARES[chance_below(&c, COUNT(SHARES))]);
        used += (size_t)snprintf(text + used, sizeof text - used, "}");
        if (round % 2 == 0) /* a byte gone wrong, behind the name that is replaced */
            text[10 + chance_below(&c, used - 10)] = "{}[]\",:0159.eE+-\\ \tx"[chance_below(&c, 21)];
        assert_int_equal(sqlite3_bind_text(s, 1, text, -1, SQLITE_TRANSIENT), SQLITE_OK);
        assert_int_equal(sqlite3_step(s), SQLITE_ROW);
        if (sqlite3_column_type(s, 0) != sqlite3_column_type(s, 1) || sqlite3_column_double(s, 0) < sqlite3_column_double(s, 1)
            || sqlite3_column_double(s, 0) > sqlite3_column_double(s, 1))
            fail_msg("%s: %.17g and %.17g", text, sqlite3_column_double(s, 0), sqlite3_column_double(s, 1));
        good += sqlite3_column_type(s, 0) == SQLITE_FLOAT;
        (void)sqlite3_reset(s);
    }
    (void)sqlite3_finalize(s);
    assert_true(good > 1000 && good < 19000); /* both kinds were tried */
}

static void huge_and_deep_texts_are_refused(void **state)
{
    sqlite3 *db = *state;

    assert_says(ask(db, "SELECT gas_value('hhv', '{\"a\": ' || printf('%.*c', 60000, '[') || '}')"), "deep", "JSON");
    assert_says(ask(db, "SELECT gas_value('hhv', printf('{%.*c', 100000000, ' '))"), "huge", "100000001 bytes is no composition");
    assert_says(ask(db, "WITH RECURSIVE n(i) AS (SELECT 1 UNION ALL SELECT i + 1 FROM n WHERE i < 3000) SELECT gas_value('hhv', json_group_object('x' || i, 0)) FROM n"),
                "wide", "more than 96 components");
    assert_says(ask(db, "WITH RECURSIVE n(i) AS (SELECT 1 UNION ALL SELECT i + 1 FROM n WHERE i < 200) SELECT gas_value('hhv', group_concat('air=0.5')) FROM n"), "wide", "gas_value: ");
    assert_says(ask(db, "SELECT gas_value(printf('%0100000d', 0), 'g20')"), "long", "unknown quantity");
    assert_says(ask(db, "SELECT gas_value('hhv', 'g20', printf('%0100000d', 0))"), "long", "too long");
    assert_says(ask(db, "SELECT gas_value('hhv', '15/15', 'methane', printf('%0100000d', 0))"), "long", "no number");
}

/* ---- several connections, little memory ------------------------------------------------------------------------- */

static void *work(void *data)
{
    sqlite3 *db = open_with_module();

    (void)snprintf(data, 1024, "%s", ask(db, "WITH RECURSIVE n(i) AS (SELECT 0 UNION ALL SELECT i + 1 FROM n WHERE i < 4000)"
                                             "SELECT sum(gas_value('wobbe-gross', '15/15', 'methane', 90 + i * 1e-3, 'ethane', 10 - i * 1e-3))"
                                             "+ sum(gas_value('lhv', json_object('methane', 90 + i * 1e-3, 'ethane', 10 - i * 1e-3), '25/0')) FROM n"));
    (void)sqlite3_close(db);
    return NULL;
}

static void connections_in_threads_give_what_one_gives(void **state)
{
    static char said[4][1024];
    pthread_t threads[3];

    (void)state;
    (void)work(said[3]);
    assert_true(strtod(said[3], NULL) > 1e5);
    for (size_t i = 0; i < COUNT(threads); i++)
        assert_int_equal(pthread_create(&threads[i], NULL, work, said[i]), 0);
    for (size_t i = 0; i < COUNT(threads); i++) {
        assert_int_equal(pthread_join(threads[i], NULL), 0);
        assert_string_equal(said[i], said[3]);
    }
}

/* SQLite's memory comes to an end at ever later requests: each call answers, and the connection goes on. */
static void a_call_without_memory_fails_and_the_next_one_does_not(void **state)
{
    static const char *const CALLS[] = {"SELECT gas_value('hhv', '15/15', 'methane', 100)", "SELECT gas_value('hhv', '{\"methane\": 100}', '25/0')",
                                        "SELECT sum(value) FROM gas_sheet('methane=100')"};
    sqlite3 *db = *state;
    int refused = 0;

    for (size_t i = 0; i < COUNT(CALLS); i++) {
        for (sqlite3_int64 room = 0; room < 200000; room += 1000) {
            (void)sqlite3_db_release_memory(db);
            (void)sqlite3_hard_heap_limit64(sqlite3_memory_used() + room + 1);
            refused += strstr(ask(db, CALLS[i]), "memory") != NULL;
            (void)sqlite3_hard_heap_limit64(0);
        }
        assert_true(number(db, CALLS[i]) > 30.0);
    }
    assert_true(refused > 3);
}

static void versions_and_units_are_told(void **state)
{
    assert_string_equal(ask(*state, "SELECT gas_version()"), bc_version());
    assert_string_equal(ask(*state, "SELECT gas_unit('wobbe-gross')"), "MJ/m3");
    assert_string_equal(ask(*state, "SELECT gas_unit('air-demand') = unit FROM gas_sheet('g20') WHERE id = 'air-demand'"), "1");
}

static void a_database_in_utf_16_is_read_as_well(void **state)
{
    assert_int_equal(sqlite3_exec(*state, "PRAGMA encoding = 'UTF-16'; CREATE TABLE w(q, s, n, g); INSERT INTO w VALUES ('hhv', '15/15', 'methane', '{\"methane\": 100}')", NULL, NULL, NULL), SQLITE_OK);
    assert_string_equal(ask(*state, "PRAGMA encoding"), "UTF-16le");
    assert_same(*state, "SELECT gas_value(q, s, n, 100) FROM w", by_library("hhv", "methane=100", "15/15", false, 2016));
    assert_same(*state, "SELECT gas_value(q, g) FROM w", by_library("hhv", "methane=100", "15/15", false, 2016));
}

#define with_db(test) cmocka_unit_test_setup_teardown(test, open_db, close_db)

int main(void)
{
    const struct CMUnitTest tests[] = {
        with_db(a_gas_has_the_figures_of_the_library_in_every_form),
        with_db(a_state_may_say_saturated_and_the_edition),
        with_db(null_in_is_null_out_but_a_null_share_is_zero),
        with_db(what_is_wrong_is_said_in_a_sentence),
        with_db(arguments_may_change_from_row_to_row),
        with_db(a_thousand_spellings_of_a_name_are_all_understood),
        with_db(a_sheet_has_every_quantity_with_value_unit_uncertainty_and_method),
        with_db(a_sheet_joins_with_a_table_in_any_order),
        with_db(arguments_of_any_kind_and_number_are_answered),
        with_db(both_readers_of_json_agree),
        with_db(huge_and_deep_texts_are_refused),
        cmocka_unit_test(connections_in_threads_give_what_one_gives),
        with_db(a_call_without_memory_fails_and_the_next_one_does_not),
        with_db(versions_and_units_are_told),
        with_db(a_database_in_utf_16_is_read_as_well),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
