/* SPDX-License-Identifier: MIT */
/* grid.c - the cells of a grid and the widths of its columns. */
#include "output/grid_internal.h"

#include "output/plain_text_internal.h"

#include <stdint.h>
#include <stdlib.h>
#include <string.h>

#define HEADING_FOLD 14 /* headings are folded, but not narrower than this */
#define HEADING_MAX  32 /* a word of a heading that is longer than this is broken */
#define POINT_MAX    20 /* wider columns of numbers are not aligned at the point: it costs too much */
#define BLOCK_ROOM   24 /* columns of a line that fixed columns leave to the others */

void grid_open(grid *g, int indent, size_t fixed)
{
    memset(g, 0, sizeof *g);
    g->indent = indent;
    g->fixed = fixed;
}

void grid_close(grid *g)
{
    for (size_t i = 0; i < g->column_count; i++) {
        free(g->columns[i].heading);
        free(g->columns[i].unit);
    }
    for (size_t i = 0; i < g->cell_count; i++)
        free(g->cells[i]);
    free(g->columns);
    free(g->cells);
    memset(g, 0, sizeof *g);
}

/* Room for one more item; a list is full when its length is 0 or a power of two. */
static void *grow(grid *g, void *items, size_t count, size_t size)
{
    void *grown = items;

    if ((count & (count - 1)) == 0) {
        const size_t capacity = count == 0 ? 1 : 2 * count;
        grown = count <= SIZE_MAX / 2 / size ? realloc(items, capacity * size) : NULL;
    }
    g->failed = g->failed || grown == NULL;
    return grown;
}

void grid_add_column(grid *g, grid_align align, int fold, const char *heading, const char *unit)
{
    grid_column *columns = grow(g, g->columns, g->column_count, sizeof *columns);

    if (columns == NULL)
        return;
    g->columns = columns;
    columns[g->column_count] = (grid_column){.align = align,
                                             .fold = fold,
                                             .heading = plain_text(heading, PLAIN_LINE),
                                             .unit = plain_text(unit, PLAIN_LINE)};
    if (columns[g->column_count].heading == NULL || columns[g->column_count].unit == NULL)
        g->failed = true;
    g->column_count++;
}

void grid_add_cell(grid *g, const char *text)
{
    char **cells = grow(g, g->cells, g->cell_count, sizeof *cells);

    if (cells == NULL)
        return;
    g->cells = cells;
    cells[g->cell_count] = plain_text(text, PLAIN_LINE);
    if (cells[g->cell_count] == NULL)
        g->failed = true;
    g->cell_count++;
}

size_t grid_row_count(const grid *g)
{
    return g->column_count == 0 ? 0 : (g->cell_count + g->column_count - 1) / g->column_count;
}

const char *grid_text(const grid *g, size_t line, size_t column)
{
    if (line == 0)
        return g->columns[column].heading;
    if (line == 1)
        return g->columns[column].unit;

    const size_t cell = (line - GRID_HEAD_LINES) * g->column_count + column;
    return cell < g->cell_count ? g->cells[cell] : "";
}

static int columns_of(const char *text)
{
    return plain_columns(text, strlen(text));
}

static int larger(int a, int b)
{
    return a > b ? a : b;
}

/* The longest word of a text, in columns. */
static int longest_word(const char *text)
{
    int longest = 0;

    while (*text != '\0') {
        const size_t bytes = strcspn(text, " ");
        longest = larger(longest, plain_columns(text, bytes));
        text += bytes + strspn(text + bytes, " ");
    }
    return longest;
}

/* The longest line of a heading folded to HEADING_FOLD, or to its longest word up to HEADING_MAX. */
static int heading_width(const char *heading)
{
    const int word = longest_word(heading);
    const int fold_width = larger(word < HEADING_MAX ? word : HEADING_MAX, HEADING_FOLD);
    plain_line line;
    int longest = 0;

    while (plain_cut(&heading, fold_width, &line))
        longest = larger(longest, line.columns);
    return longest;
}

/* Sets a column to the width it would take of its own. */
static void measure(const grid *g, size_t index)
{
    grid_column *column = &g->columns[index];
    int widest = 0;

    column->before = column->after = 0;
    for (size_t row = 0; row < grid_row_count(g); row++) {
        const char *text = grid_text(g, row + GRID_HEAD_LINES, index);
        const int before = plain_columns(text, strcspn(text, ".e"));

        widest = larger(widest, columns_of(text));
        column->before = larger(column->before, before);
        column->after = larger(column->after, columns_of(text) - before);
    }
    if (column->align == GRID_POINT && column->before + column->after > POINT_MAX)
        column->before = column->after = 0;
    column->width = larger(widest, column->before + column->after);
    if (column->align != GRID_POINT)
        column->width = widest;
    column->width = larger(column->width, heading_width(column->heading));
    column->width = larger(column->width, columns_of(column->unit));
}

/* The width of columns [from, to) with the gaps behind them. */
static int width_of(const grid *g, size_t from, size_t to)
{
    int width = 0;

    for (size_t i = from; i < to; i++)
        width += g->columns[i].width + GRID_GAP;
    return width;
}

/* The widest of columns [from, to) that may still be folded; `to` if there is none. */
static size_t widest_foldable(const grid *g, size_t from, size_t to)
{
    size_t widest = to;

    for (size_t i = from; i < to; i++) {
        const grid_column *column = &g->columns[i];

        if (column->align == GRID_POINT || column->width <= column->fold)
            continue;
        if (widest == to || column->width > g->columns[widest].width)
            widest = i;
    }
    return widest;
}

/* Folds columns [from, to), the widest first, until they fit in so many columns with their gaps. */
static void fold(grid *g, size_t from, size_t to, int width)
{
    for (int over = width_of(g, from, to) - width; over > 0; over--) {
        const size_t widest = widest_foldable(g, from, to);

        if (widest == to)
            return;
        g->columns[widest].width--;
    }
}

static size_t fixed_count(const grid *g)
{
    return g->fixed < g->column_count ? g->fixed : g->column_count;
}

void grid_fit(grid *g, int width)
{
    const int room = width - g->indent + GRID_GAP; /* no gap is needed behind the last column */
    const size_t fixed = fixed_count(g);

    for (size_t i = 0; i < g->column_count; i++)
        measure(g, i);
    fold(g, 0, g->column_count, room);
    if (width_of(g, 0, g->column_count) <= room)
        return;

    for (size_t i = 0; i < g->column_count; i++)
        measure(g, i);
    fold(g, 0, fixed, room - BLOCK_ROOM);
    for (size_t i = fixed; i < g->column_count; i++)
        fold(g, i, i + 1, room - width_of(g, 0, fixed));
}

size_t grid_block_end(const grid *g, size_t from, int width)
{
    const size_t fixed = fixed_count(g);
    const int room = width - g->indent + GRID_GAP - width_of(g, 0, fixed);
    size_t end = from;

    while (end < g->column_count && width_of(g, from, end + 1) <= room)
        end++;
    return end > from || from >= g->column_count ? end : from + 1; /* too wide is better than never */
}
