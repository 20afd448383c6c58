/* SPDX-License-Identifier: MIT */
/* limits_table.c - the limits of a report as one more of its tables, for forms that have no other place for them. */
#include "output/limits_table_internal.h"

#include "output/number_text_internal.h"
#include "output/text_internal.h"

#include <stdlib.h>
#include <string.h>

#define BOUND_DIGITS 9
#define MARGIN_DIGITS 4
#define UNCERTAINTY_DIGITS 2
#define PERCENT_DIGITS 3

/* Decimals that show as many digits as the text; -1 for a number so great that it has a power of ten. */
static int decimals_in(const char *text, int digits)
{
    const char *point = strchr(text, '.');
    const char *power = strchr(text, 'e');

    if (power)
        return power[1] == '-' ? digits - 1 + (int)strtol(power + 2, NULL, 10) : -1;
    return point ? (int)strlen(point + 1) : 0;
}

/* A number with so many significant digits; a bound as it was written, without the zeros that they would add. */
static void put_number(report *made, size_t table, bool there, double number, int digits)
{
    char text[NUMBER_TEXT_MAX];
    size_t length = 0;

    if (!there) {
        report_add_text(made, table, "-");
        return;
    }
    number_significant(number, digits, text);
    length = strlen(text);
    while (digits == BOUND_DIGITS && strchr(text, '.') && !strchr(text, 'e') && text[length - 1] == '0')
        text[--length] = '\0';
    report_add_number(made, table, number, decimals_in(text, digits));
}

/* Columns that only some reports fill. */
typedef struct {
    bool judged, uncertainty, percent; /* without a gas there is nothing but bounds */
} columns;

static void put_limit(report *made, size_t table, const report *r, const report_limit *limit, columns c)
{
    char letter[TEXT_LETTERS_MAX] = "";

    if (limit->gas != REPORT_NO_GAS)
        text_letter(r, limit->gas, letter);
    report_add_text(made, table, limit->id);
    if (c.judged)
        report_add_text(made, table, letter);
    report_add_text(made, table, strcmp(limit->unit, "1") == 0 ? "" : limit->unit);
    report_add_text(made, table, limit->state);
    put_number(made, table, limit->has_min, limit->min, BOUND_DIGITS);
    put_number(made, table, limit->has_max, limit->max, BOUND_DIGITS);
    if (!c.judged)
        return;
    put_number(made, table, limit->has_value, limit->value, REPORT_DIGITS);
    if (c.uncertainty)
        put_number(made, table, limit->has_uncertainty, limit->uncertainty, UNCERTAINTY_DIGITS);
    put_number(made, table, limit->has_value, limit->margin, MARGIN_DIGITS);
    if (c.percent)
        put_number(made, table, limit->has_percent, limit->percent, PERCENT_DIGITS);
    report_add_text(made, table, limit->verdict);
}

static void add_columns(report *made, size_t table, columns c)
{
    static const struct {
        const char *id, *heading, *unit;
    } COLUMNS[] = {{"limit", "limit", ""}, {"gas", "gas", ""}, {"unit", "unit", ""}, {"state", "at", ""}, {"min", "min", ""}, {"max", "max", ""}};

    for (size_t i = 0; i < sizeof COLUMNS / sizeof *COLUMNS; i++)
        if (c.judged || strcmp(COLUMNS[i].id, "gas") != 0)
            report_add_column(made, table, COLUMNS[i].id, COLUMNS[i].heading, COLUMNS[i].unit);
    if (!c.judged)
        return;
    report_add_column(made, table, "value", "value", "");
    if (c.uncertainty)
        report_add_column(made, table, "uncertainty", "u (k = 1)", "");
    report_add_column(made, table, "margin", "margin", "");
    if (c.percent)
        report_add_column(made, table, "margin_percent", "margin", "% of window");
    report_add_column(made, table, "verdict", "verdict", "");
}

static void make_table(report *made, const report *r)
{
    const size_t table = report_add_table(made, "limits", r->limits_title);
    columns c = {false, false, false};

    for (size_t i = 0; i < r->limit_count; i++) {
        c.judged = c.judged || r->limits[i].gas != REPORT_NO_GAS;
        c.uncertainty = c.uncertainty || r->limits[i].has_uncertainty;
        c.percent = c.percent || r->limits[i].has_percent;
    }
    add_columns(made, table, c);
    for (size_t i = 0; i < r->limit_count; i++)
        put_limit(made, table, r, &r->limits[i], c);
    if (r->limits_lead)
        report_lead_with(made, table);
}

bool limits_view_open(limits_view *v, const report *r)
{
    v->shown = *r;
    v->tables = NULL;
    report_open(&v->made, r->version, r->command, r->title);
    if (r->limit_count == 0 || r->limits_title == NULL)
        return report_ok(&v->made);
    make_table(&v->made, r);
    v->tables = calloc(r->table_count + 1, sizeof *v->tables);
    if (v->tables == NULL || !report_ok(&v->made))
        return false;
    v->tables[0] = v->made.tables[0];
    if (r->table_count > 0)
        memcpy(v->tables + 1, r->tables, r->table_count * sizeof *v->tables);
    v->shown.tables = v->tables;
    v->shown.table_count = r->table_count + 1;
    return true;
}

void limits_view_close(limits_view *v)
{
    free(v->tables);
    report_close(&v->made);
}
