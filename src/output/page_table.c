/* SPDX-License-Identifier: MIT */
/* page_table.c - the tables of a report on a page. */
#include "output/page_internal.h"

#include <stdlib.h>
#include <string.h>

#define LONG 24 /* bytes of a word */
#define UNIT 8  /* bytes of a text that no line may break: "mol %" */
#define WIDE 12 /* columns that want a sheet of paper across */

static void cell_number(const page *p, const report_cell *cell, char text[NUMBER_TEXT_MAX])
{
    if (cell->decimals >= 0)
        number_decimals(cell->number, cell->decimals, text);
    else
        number_significant(cell->number, p->style->digits > 0 ? p->style->digits : REPORT_DIGITS, text);
}

/* The longest fraction of a column; -1 where no cell is a number. */
static int column_fraction(const page *p, const report_table *table, size_t column)
{
    int most = -1;

    for (size_t i = column; i < table->cell_count; i += table->column_count) {
        char text[NUMBER_TEXT_MAX];

        if (!table->cells[i].is_number)
            continue;
        cell_number(p, &table->cells[i], text);
        most = page_fraction(text) > most ? page_fraction(text) : most;
    }
    return most;
}

static void put_head(page *p, const report_table *table, const int *fraction)
{
    fputs("<thead><tr>", p->out);
    for (size_t i = 0; i < table->column_count; i++)
        page_column_head(p, fraction[i] < 0 ? "" : "n", table->columns[i].heading, table->columns[i].unit);
    fputs("</tr></thead>\n<tbody>\n", p->out);
}

/* Whether a word is so long that it must break anywhere, lest the table become wider than any paper. */
static bool has_long_word(const char *text)
{
    for (const char *at = text; at != NULL && *at != '\0'; at += strcspn(at, " "), at += strspn(at, " "))
        if (strcspn(at, " ") > LONG)
            return true;
    return false;
}

static const char *text_cell(const report_cell *cell, bool first, int fraction)
{
    if (first)
        return fraction < 0 ? "th scope=\"row\"" : "th scope=\"row\" class=\"n\"";
    if (fraction >= 0)
        return "td class=\"n\"";
    if (cell->text != NULL && strlen(cell->text) <= UNIT && strchr(cell->text, ' ') != NULL)
        return "td class=\"q\"";
    return has_long_word(cell->text) ? "td class=\"l\"" : "td";
}

/* A cell; the first of a row names the row. */
static void put_cell(page *p, const report_cell *cell, bool first, int fraction)
{
    char text[NUMBER_TEXT_MAX];

    if (cell->is_number)
        cell_number(p, cell, text);
    if (cell->is_number && !first)
        page_number(p, text, "", fraction);
    else
        page_element(p, text_cell(cell, first, fraction), cell->is_number ? text : cell->text);
}

static void put_rows(page *p, const report_table *table, const int *fraction)
{
    for (size_t i = 0; i < table->cell_count; i++) {
        const size_t column = i % table->column_count;

        if (column == 0)
            fputs("<tr>", p->out);
        put_cell(p, &table->cells[i], column == 0, fraction[column]);
        if (column + 1 == table->column_count || i + 1 == table->cell_count)
            fputs("</tr>\n", p->out);
    }
}

static void put_table(page *p, size_t index)
{
    const report_table *table = &p->r->tables[index];
    int *fraction = calloc(table->column_count + 1, sizeof *fraction);

    if (fraction == NULL) {
        p->failed = true;
        return;
    }
    for (size_t i = 0; i < table->column_count; i++)
        fraction[i] = column_fraction(p, table, i);
    page_open_block(p, 't', index, table->title);
    if (table->column_count > 0) {
        page_open_table(p, table->column_count >= WIDE ? "table wide" : "table", table->title, 0);
        put_head(p, table, fraction);
        put_rows(p, table, fraction);
        page_close_table(p);
    }
    page_close_block(p);
    free(fraction);
}

void page_tables(page *p, bool leading)
{
    for (size_t i = 0; i < p->r->table_count; i++)
        if (p->r->tables[i].leads == leading)
            put_table(p, i);
}
