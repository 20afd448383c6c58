/* SPDX-License-Identifier: MIT */
/* book_table.c - a table of a report as a sheet. */
#include "output/book_internal.h"

static bool has_units(const report_table *table)
{
    for (size_t i = 0; i < table->column_count; i++)
        if (*table->columns[i].unit != '\0')
            return true;
    return false;
}

static bool has_numbers(const report_table *table, size_t column)
{
    for (size_t i = column; i < table->cell_count; i += table->column_count)
        if (table->cells[i].is_number)
            return true;
    return false;
}

/* One row of headings, and one of units where there are any; answers how many. */
static lxw_row_t put_heads(book_sheet *s, const report_table *table)
{
    for (size_t i = 0; i < table->column_count; i++)
        book_put_head(s, i, has_numbers(table, i),
                      *table->columns[i].heading == '\0' ? table->columns[i].id : table->columns[i].heading);
    book_end_row(s, BOOK_HEAD_WIDTH);
    if (!has_units(table))
        return 1;
    for (size_t i = 0; i < table->column_count; i++)
        book_put_head(s, i, has_numbers(table, i), table->columns[i].unit);
    book_end_row(s, BOOK_HEAD_WIDTH);
    return 2;
}

static void put_cell(book_sheet *s, size_t column, const report_cell *cell)
{
    const int digits = s->b->style->digits > 0 ? s->b->style->digits : REPORT_DIGITS;
    char text[NUMBER_TEXT_MAX];

    if (!cell->is_number) {
        book_put_text(s, column, report_is_none(cell) ? BOOK_NONE : BOOK_PLAIN, cell->text);
        return;
    }
    if (cell->decimals >= 0)
        number_decimals(cell->number, cell->decimals, text);
    else
        number_significant(cell->number, digits, text);
    book_put_number(s, column, cell->number, text);
}

void book_table(book *b, const report_table *table)
{
    const size_t columns = table->column_count;
    lxw_row_t head = 0;
    book_sheet s;

    if (book_open_sheet(b, &s, table->title, columns) && columns > 0) {
        head = put_heads(&s, table);
        for (size_t i = 0; i < table->cell_count; i++) {
            put_cell(&s, i % columns, &table->cells[i]);
            s.row += (i + 1) % columns == 0;
        }
        if (s.row > head)
            book_check(b, worksheet_autofilter(s.at, head - 1, 0, s.row - 1, (lxw_col_t)(columns - 1)));
    }
    book_close_sheet(&s, head);
}
