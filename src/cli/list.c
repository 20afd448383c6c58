/* SPDX-License-Identifier: MIT */
/* list.c - what there is: species, quantities, units, methods, states. */
#include "cli/list.h"

#include "base/error_internal.h"
#include "base/text.h"

#include <stdio.h>
#include <string.h>

void list_columns(report *r, size_t table, const char *const ids[], size_t count)
{
    for (size_t i = 0; i < count; i++)
        report_add_column(r, table, ids[i], ids[i], "");
}

void list_row(report *r, size_t table, const char *const cells[], size_t count)
{
    for (size_t i = 0; i < count; i++)
        report_add_text(r, table, cells[i]);
}

bool list_has(const report *r, size_t table, const char *name)
{
    if (!report_ok(r)) /* without memory a table, or a column, may not be there */
        return false;
    const report_table *t = &r->tables[table];

    for (size_t i = 0; i < t->cell_count; i += t->column_count)
        if (t->cells[i].text && strcmp(t->cells[i].text, name) == 0)
            return true;
    return false;
}

static bc_status list_quantities(report *r, const char *name, bc_error *err)
{
    static const char *const COLUMNS[] = {"id", "unit", "meaning", "method"};
    size_t only = bc_quantity_count();

    if (name && bc_quantity_find(name, &only, err) != BC_OK)
        return BC_ERR_USAGE;
    const size_t table = report_add_table(r, "quantities", "Quantities");

    list_columns(r, table, COLUMNS, BC_COUNT(COLUMNS));
    for (size_t i = 0; i < bc_quantity_count(); i++) {
        const bc_quantity *q = bc_quantity_at(i);
        char meaning[320]; /* the trade's name first: an id such as mcp says nothing by itself */

        (void)snprintf(meaning, sizeof meaning, "%s: %s", q->label, q->meaning);
        const char *const cells[] = {q->id, q->unit, meaning, q->method};

        if (!name || i == only)
            list_row(r, table, cells, BC_COUNT(cells));
    }
    return BC_OK;
}

/* True when a unit, or a part of the quotient that it is, is the symbol. */
static bool unit_has(const char *unit, const char *symbol)
{
    const size_t length = strlen(symbol);

    for (const char *part = unit; part; part = strchr(part, '/') ? strchr(part, '/') + 1 : NULL)
        if (strcspn(part, "/") == length && strncmp(part, symbol, length) == 0)
            return true;
    return false;
}

static bc_status list_units(report *r, const char *name, bc_error *err)
{
    static const char *const COLUMNS[] = {"unit", "meaning and source"};
    bc_unit unit;

    if (name && bc_unit_parse(name, &unit, err) != BC_OK)
        return BC_ERR_USAGE; /* of a quotient, each of its symbols */
    const size_t table = report_add_table(r, "units", "Units; quotients are written with '/', as MJ/m3");

    list_columns(r, table, COLUMNS, BC_COUNT(COLUMNS));
    for (size_t i = 0; i < bc_unit_count(); i++) {
        const char *const cells[] = {bc_unit_symbol(i), bc_unit_meaning(i)};

        if (!name || unit_has(name, cells[0]))
            list_row(r, table, cells, BC_COUNT(cells));
    }
    return BC_OK;
}

/* Rows of texts under a first column that is their name. */
typedef struct {
    const char *cells[5];
} text_row;

typedef struct {
    const text_row *rows;
    size_t count, columns;
} text_rows;

static bc_status list_texts(report *r, size_t table, const text_rows *texts, const char *name, bc_error *err)
{
    bool found = false;

    for (size_t i = 0; i < texts->count; i++)
        if (!name || bc_text_same(texts->rows[i].cells[0], name)) {
            list_row(r, table, texts->rows[i].cells, texts->columns);
            found = true;
        }
    return found ? BC_OK : bc_fail(err, BC_ERR_USAGE, "there is no '%.40s' in this list; see the whole list without a name", name);
}

static bc_status list_methods(report *r, const char *name, bc_error *err)
{
    static const char *const COLUMNS[] = {"id", "method", "equation", "range", "source"};
    static const text_row ROWS[] = {
#define METHOD(id, title, equation, range, source) {{id, title, equation, range, source}},
#include "data/methods.def"
    };
    const size_t table = report_add_table(r, "methods", "Methods");

    list_columns(r, table, COLUMNS, BC_COUNT(COLUMNS));
    const text_rows texts = {ROWS, BC_COUNT(ROWS), BC_COUNT(COLUMNS)};

    return list_texts(r, table, &texts, name, err);
}

static bc_status list_states(report *r, const char *name, bc_error *err)
{
    static const char *const COLUMNS[] = {"state", "where", "source"};
    static const text_row ROWS[] = {
#define STATE(text, where, source) {{text, where, source, NULL, NULL}},
#include "data/states.def"
    };
    const size_t table = report_add_table(r, "states", "Reference states: combustion/metering temperature in C, metering at 101.325 kPa unless written");

    list_columns(r, table, COLUMNS, BC_COUNT(COLUMNS));
    const text_rows texts = {ROWS, BC_COUNT(ROWS), BC_COUNT(COLUMNS)};

    return list_texts(r, table, &texts, name, err);
}

/* Commands, options and areas of checks are listed for the completion of the shell. */
static bc_status list_commands(report *r, const char *name, bc_error *err)
{
    static const char *const COLUMNS[] = {"command", "arguments", "meaning"};
    const size_t table = report_add_table(r, "commands", "Commands");

    if (name && !command_find(name))
        return bc_fail(err, BC_ERR_USAGE, "there is no command '%.40s'; see bluecone list commands", name);
    list_columns(r, table, COLUMNS, BC_COUNT(COLUMNS));
    for (size_t i = 0; command_at(i); i++) {
        const char *const cells[] = {command_at(i)->word, command_at(i)->usage, command_at(i)->help};

        if (!name || strcmp(name, cells[0]) == 0)
            list_row(r, table, cells, BC_COUNT(cells));
    }
    return BC_OK;
}

static bc_status list_options(report *r, const char *name, bc_error *err)
{
    static const char *const COLUMNS[] = {"option", "argument", "meaning"};
    const command *c = name ? command_find(name) : NULL;
    const size_t table = report_add_table(r, "options", "Options");

    if (!c)
        return bc_fail(err, BC_ERR_USAGE, "options are listed for a command: bluecone list options get");
    list_columns(r, table, COLUMNS, BC_COUNT(COLUMNS));
    for (size_t i = 0;; i++) {
        const char *argument = "";
        const char *help = "";
        const char *word = option_word(c, i, &argument, &help);
        char option[BC_WORD_MAX];

        if (!word)
            return BC_OK;
        (void)snprintf(option, sizeof option, "--%s", word);
        const char *const cells[] = {option, argument, help};

        list_row(r, table, cells, BC_COUNT(cells));
    }
}

/* The areas of `verify`, in the order of the list of checks, whose rows of an area need not stand together. */
static bc_status list_areas(report *r, const char *name, bc_error *err)
{
    static const char *const COLUMNS[] = {"area", "values"};
    const size_t table = report_add_table(r, "areas", "Areas of bluecone verify");
    bool found = false;

    list_columns(r, table, COLUMNS, BC_COUNT(COLUMNS));
    for (size_t i = 0; i < bc_check_count(); i++) {
        size_t first = 0;
        size_t values = 0;

        for (size_t j = bc_check_count(); j-- > 0;)
            if (strcmp(bc_check_area(j), bc_check_area(i)) == 0) {
                first = j;
                values++;
            }
        if (first != i || (name && strcmp(name, bc_check_area(i)) != 0))
            continue;
        report_add_text(r, table, bc_check_area(i));
        report_add_number(r, table, (double)values, 0);
        found = true;
    }
    return found ? BC_OK : bc_fail(err, BC_ERR_USAGE, "there is no area '%.40s' of checks; see bluecone list areas", name);
}

static const struct {
    const char *word;
    bc_status (*list)(report *, const char *, bc_error *);
} TOPICS[] = {
    {"gases", list_gases},   {"species", list_species}, {"quantities", list_quantities}, {"units", list_units},
    {"methods", list_methods}, {"states", list_states}, {"commands", list_commands},     {"options", list_options},
    {"areas", list_areas},   {"specifications", list_specifications},
};

static bc_status run_topic(report *r, const arguments *a, bc_error *err)
{
    const char *name = a->argument_count > 1 ? a->argument[1] : NULL;
    size_t best = 0;
    char shown[BC_WORD_MAX];
    char hint[BC_HINT_MAX];

    for (size_t i = 0; i < BC_COUNT(TOPICS); i++) {
        if (strcmp(TOPICS[i].word, a->argument[0]) == 0)
            return TOPICS[i].list(r, name, err);
        if (bc_text_unlikeness(a->argument[0], TOPICS[i].word) < bc_text_unlikeness(a->argument[0], TOPICS[best].word))
            best = i;
    }
    bc_text_show(shown, sizeof shown, a->argument[0]);
    bc_text_suggest(hint, sizeof hint, "the nearest is", a->argument[0], TOPICS[best].word);
    return bc_fail(err, BC_ERR_USAGE, "there is no list '%s'%s: bluecone list gases|specifications|species|quantities|units|methods|states",
                   shown, hint);
}

int run_list(const arguments *a)
{
    report r;
    bc_error err;

    report_open(&r, BC_VERSION, "list", "List");
    bc_status status = run_topic(&r, a, &err);

    if (status == BC_ERR_INPUT && err.file[0] == '\0') /* a name that does not exist, not data */
        status = err.status = BC_ERR_USAGE;

    if (status == BC_OK)
        return answer(&r, a, a->value[OPTION_bare] != NULL, 0);
    report_close(&r);
    return complain(&err);
}
