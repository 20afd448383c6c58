/* SPDX-License-Identifier: MIT */
/* csv.c - the report for spreadsheets: RFC 4180 with line feeds, and no cell that is a formula.
 *
 * Blocks with an empty line between, so that the figures come first and alone up to it. A table behind figures
 * has a row `table,ID,TITLE` above its headings, since several may have the same ones; tables without figures
 * are what was asked for, and start with their headings. */
#include "output/render.h"

#include "base/error_internal.h"
#include "output/number_text_internal.h"
#include "output/plain_text_internal.h"

#include <stdlib.h>
#include <string.h>

/* Where cells go, and how. */
typedef struct {
    FILE *out;
    int digits;
    bool failed; /* an allocation failed */
} csv_page;

static size_t skip_digits(const char *text, size_t from)
{
    return from + strspn(text + from, "0123456789");
}

/* Whether a text is one decimal number, such as a cell of the user's own table may hold. */
static bool is_number(const char *text)
{
    const size_t start = strspn(text, "+-") > 0 ? 1 : 0;
    size_t end = skip_digits(text, start);

    if (end == start)
        return false;
    if (text[end] == '.')
        end = skip_digits(text, end + 1);
    if (text[end] == 'e' || text[end] == 'E') {
        const size_t digits = end + 1 + (strspn(text + end + 1, "+-") > 0 ? 1 : 0);
        end = skip_digits(text, digits) > digits ? skip_digits(text, digits) : end;
    }
    return text[end] == '\0';
}

/* Spreadsheets take such a text for a formula, and formulas can reach files and the network. */
static bool is_formula(const char *text)
{
    /* a dash alone stands for a figure that is not there */
    return *text != '\0' && strchr("=+-@\t", *text) != NULL && strcmp(text, "-") != 0 && !is_number(text);
}

/* render_csv() holds the stream: one lock, not one a character. */
static void put_char(const csv_page *page, char c)
{
    (void)putc_unlocked(c, page->out);
}

/* Text of our own: no quotes are needed. */
static void put(const csv_page *page, const char *text)
{
    for (; *text != '\0'; text++)
        put_char(page, *text);
}

static void put_text(csv_page *page, const char *text)
{
    char *plain = plain_text(text, PLAIN_CELL);

    if (plain == NULL) {
        page->failed = true;
        return;
    }
    const bool quoted = plain[strcspn(plain, ",\"\n")] != '\0';

    if (quoted)
        put_char(page, '"');
    if (is_formula(plain))
        put_char(page, '\'');
    for (const char *c = plain; *c != '\0'; c++) {
        if (*c == '"')
            put_char(page, '"');
        put_char(page, *c);
    }
    if (quoted)
        put_char(page, '"');
    free(plain);
}

static void put_number(const csv_page *page, double number)
{
    char text[NUMBER_TEXT_MAX];

    number_plain(number, page->digits, text);
    put(page, text);
}

/* With its state in every row: heat per volume means nothing without, and a file has no other place for it. */
static void put_result(csv_page *page, const report *r, const report_result *result)
{
    put_text(page, result->id);
    put_char(page, ',');
    put_text(page, result->gas == REPORT_NO_GAS ? "" : r->gases[result->gas].name);
    put_char(page, ',');
    put_number(page, result->value);
    put_char(page, ',');
    put_text(page, result->unit);
    put_char(page, ',');
    if (result->has_uncertainty)
        put_number(page, result->uncertainty);
    put_char(page, ',');
    put_text(page, result->method);
    put_char(page, ',');
    put_text(page, r->state.present ? r->state.brief : "");
    put_char(page, '\n');
}

/* The id of a column, with its unit: a file of numbers without units would be a trap. */
static void put_heading(csv_page *page, const report_column *column)
{
    const size_t size = strlen(column->id) + strlen(column->unit) + sizeof " []";
    char *heading = malloc(size);

    if (heading == NULL) {
        page->failed = true;
        return;
    }
    if (*column->unit == '\0')
        snprintf(heading, size, "%s", column->id);
    else
        snprintf(heading, size, "%s [%s]", column->id, column->unit);
    put_text(page, heading);
    free(heading);
}

static void put_cell(csv_page *page, const report_table *table, size_t index)
{
    if (index >= table->cell_count || report_is_none(&table->cells[index]))
        return; /* empty: programs take a dash for a text, and with it the whole column */
    if (table->cells[index].is_number)
        put_number(page, table->cells[index].number);
    else
        put_text(page, table->cells[index].text);
}

static void put_table(csv_page *page, const report_table *table)
{
    const size_t count = table->column_count;

    for (size_t i = 0; i < count; i++) {
        if (i > 0)
            put_char(page, ',');
        put_heading(page, &table->columns[i]);
    }
    put_char(page, '\n');
    for (size_t first = 0; count > 0 && first < table->cell_count; first += count) {
        for (size_t i = 0; i < count; i++) {
            if (i > 0)
                put_char(page, ',');
            put_cell(page, table, first + i);
        }
        put_char(page, '\n');
    }
}

/* A number that may not be there: an empty cell. */
static void put_maybe(csv_page *page, bool there, double number)
{
    if (there)
        put_number(page, number);
    put_char(page, ',');
}

static void put_limit(csv_page *page, const report *r, const report_limit *limit)
{
    put_text(page, limit->id);
    put_char(page, ',');
    put_text(page, limit->gas == REPORT_NO_GAS ? "" : r->gases[limit->gas].name);
    put_char(page, ',');
    put_text(page, limit->unit);
    put_char(page, ',');
    put_text(page, limit->state);
    put_char(page, ',');
    put_maybe(page, limit->has_min, limit->min);
    put_maybe(page, limit->has_max, limit->max);
    put_maybe(page, limit->has_value, limit->value);
    put_maybe(page, limit->has_uncertainty, limit->uncertainty);
    put_maybe(page, limit->has_value, limit->margin);
    put_maybe(page, limit->has_percent, limit->percent);
    put_maybe(page, limit->has_probability, limit->probability);
    put_text(page, limit->verdict);
    put_char(page, '\n');
}

static void put_limits(csv_page *page, const report *r)
{
    if (r->limit_count == 0)
        return;
    put(page, "\nlimit,gas,unit,state,min,max,value,uncertainty,margin,margin_percent,probability,verdict\n");
    for (size_t i = 0; i < r->limit_count; i++)
        put_limit(page, r, &r->limits[i]);
}

static bool has_figures(const report *r)
{
    return r->result_count > 0 || r->table_count == 0;
}

static void put_named_tables(csv_page *page, const report *r)
{
    for (size_t i = 0; i < r->table_count; i++) {
        put(page, "\ntable,");
        put_text(page, r->tables[i].id);
        put_char(page, ',');
        put_text(page, r->tables[i].title);
        put_char(page, '\n');
        put_table(page, &r->tables[i]);
    }
}

static void put_report(csv_page *page, const report *r)
{
    if (has_figures(r)) {
        put(page, "id,gas,value,unit,uncertainty,method,state\n");
        for (size_t i = 0; i < r->result_count; i++)
            put_result(page, r, &r->results[i]);
        return;
    }
    for (size_t i = 0; i < r->table_count; i++) {
        if (i > 0)
            put_char(page, '\n');
        put_table(page, &r->tables[i]);
    }
}

bc_status render_csv(const report *r, const render_style *style, FILE *out, bc_error *err)
{
    csv_page page = {.out = out, .digits = style->digits, .failed = !report_ok(r)};

    flockfile(out);
    if (!page.failed)
        put_report(&page, r);
    if (!page.failed)
        put_limits(&page, r);
    if (!page.failed && has_figures(r))
        put_named_tables(&page, r);
    funlockfile(out);
    if (page.failed)
        return bc_fail(err, BC_ERR_MEMORY, "no memory for the report");
    return ferror(out) ? bc_fail(err, BC_ERR_FILE, "cannot write the report") : BC_OK;
}
