/* SPDX-License-Identifier: MIT */
/* grid_internal.h - rows and columns of text, fitted to the width of a page.
 *
 * Columns are added first, then cells row by row. What does not fit is first folded within its
 * cells; if that is not enough the columns are spread over several blocks, each of which repeats
 * the first `fixed` columns. */
#ifndef GRID_INTERNAL_H
#define GRID_INTERNAL_H

#include "output/text_internal.h"

typedef enum {
    GRID_LEFT,  /* words */
    GRID_RIGHT, /* words that stand among numbers */
    GRID_POINT  /* numbers, decimal point under decimal point; never folded */
} grid_align;

typedef struct {
    grid_align align;
    int fold;          /* words are not folded narrower than this */
    int width;         /* as fitted */
    int before, after; /* GRID_POINT: columns before the decimal point, and from it on */
    char *heading, *unit;
} grid_column;

typedef struct {
    grid_column *columns;
    size_t column_count;
    char **cells; /* plain text, row by row */
    size_t cell_count;
    size_t fixed; /* columns repeated in every block */
    int indent;
    bool failed; /* an allocation failed */
} grid;

void grid_open(grid *g, int indent, size_t fixed);
void grid_close(grid *g);
void grid_add_column(grid *g, grid_align align, int fold, const char *heading, const char *unit);
void grid_add_cell(grid *g, const char *text); /* NULL: empty */
size_t grid_row_count(const grid *g);

/* The text of a column's heading (line 0), its unit (line 1), or a cell (line 2 and on). */
#define GRID_HEAD_LINES 2
const char *grid_text(const grid *g, size_t line, size_t column);

/* Sets the width of every column, for lines of `width` columns; how many columns behind the fixed
 * ones share a block is then grid_block_end(). */
#define GRID_GAP 2 /* between columns */
void grid_fit(grid *g, int width);
size_t grid_block_end(const grid *g, size_t from, int width);

/* Fits and prints the grid, and closes it; what failed in it has then failed on the page. */
void grid_print(grid *g, text_page *page);

#endif
