/* SPDX-License-Identifier: MIT */
/* text_table.c - the tables of a report as grids. */
#include "output/text_internal.h"

#include "output/grid_internal.h"
#include "output/number_text_internal.h"

#define INDENT    2
#define CELL_FOLD 16 /* words in a cell are not folded narrower than this */

/* Numbers alone stand point under point; words among them would push the points apart. */
static grid_align align_of(const report_table *table, size_t column)
{
    bool has_number = false, has_text = false;

    for (size_t i = column; i < table->cell_count; i += table->column_count) {
        const report_cell *cell = &table->cells[i];

        has_number = has_number || cell->is_number;
        has_text = has_text || (!cell->is_number && cell->text != NULL && *cell->text != '\0');
    }
    if (has_number)
        return has_text ? GRID_RIGHT : GRID_POINT;
    return GRID_LEFT;
}

static void add_number(grid *g, const report_cell *cell, const render_style *style)
{
    char text[NUMBER_TEXT_MAX];

    if (cell->decimals >= 0)
        number_decimals(cell->number, cell->decimals, text);
    else
        number_significant(cell->number, style->digits > 0 ? style->digits : REPORT_DIGITS, text);
    grid_add_cell(g, text);
}

static void print_table(text_page *page, const report_table *table)
{
    grid g;

    fputc('\n', page->out);
    text_title(page, table->title, NULL);
    grid_open(&g, INDENT, 1);
    for (size_t i = 0; i < table->column_count; i++) {
        const report_column *column = &table->columns[i];
        grid_add_column(&g, align_of(table, i), CELL_FOLD, column->heading, column->unit);
    }
    for (size_t i = 0; table->column_count > 0 && i < table->cell_count; i++) {
        if (table->cells[i].is_number)
            add_number(&g, &table->cells[i], page->style);
        else
            grid_add_cell(&g, table->cells[i].text);
    }
    grid_print(&g, page);
}

void text_tables(text_page *page, const report *r, bool leading)
{
    for (size_t i = 0; i < r->table_count; i++)
        if (r->tables[i].leads == leading)
            print_table(page, &r->tables[i]);
}
