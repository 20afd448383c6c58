/* SPDX-License-Identifier: MIT */
/* grid_print.c - a fitted grid on the page, block by block and line by line. */
#include "output/grid_internal.h"

#include "output/plain_text_internal.h"

#include <string.h>

/* The columns of one block: the fixed ones, then [from, to). */
typedef struct {
    size_t fixed, from, to;
} block;

static size_t block_size(const block *b)
{
    return b->fixed + b->to - b->from;
}

static size_t column_at(const block *b, size_t place)
{
    return place < b->fixed ? place : b->from + place - b->fixed;
}

static int height_of(const grid *g, const block *b, size_t line)
{
    int height = 0;

    for (size_t i = 0; i < block_size(b); i++) {
        const size_t column = column_at(b, i);
        const int count = plain_line_count(grid_text(g, line, column), g->columns[column].width);
        height = count > height ? count : height;
    }
    return height;
}

/* The n-th line of a folded text; false when it has none. */
static bool nth_line(const char *text, int width, int n, plain_line *line)
{
    bool found = n >= 0;

    for (int i = 0; found && i <= n; i++)
        found = plain_cut(&text, width, line);
    return found;
}

/* Columns to leave free before a text in its column. */
static int lead_of(const grid_column *column, const plain_line *text, bool is_head)
{
    if (column->align == GRID_LEFT)
        return 0;
    if (column->align == GRID_RIGHT || is_head || column->before == 0)
        return column->width - text->columns;

    const int before = plain_columns(text->start, strcspn(text->start, ".e"));
    return column->width - column->after - before;
}

/* Prints the n-th of the lines into which a line of the grid is folded. Spaces wait until a text
 * follows, so that no line ends in one. */
static void print_folded(const grid *g, text_page *page, const block *b, size_t line, int n)
{
    const bool is_head = line < GRID_HEAD_LINES;
    int spaces = g->indent;

    for (size_t i = 0; i < block_size(b); i++) {
        const grid_column *column = &g->columns[column_at(b, i)];
        const char *text = grid_text(g, line, column_at(b, i));
        /* Headings stand on the unit, cells hang from the first line. */
        const int empty = line == 0 ? height_of(g, b, 0) - plain_line_count(text, column->width) : 0;
        plain_line part = {text, 0, 0};

        if (nth_line(text, column->width, n - empty, &part)) {
            spaces += lead_of(column, &part, is_head);
            fprintf(page->out, "%*s", spaces, "");
            fwrite(part.start, 1, part.bytes, page->out);
            spaces = column->width - part.columns - lead_of(column, &part, is_head);
        } else {
            spaces += column->width;
        }
        spaces += GRID_GAP;
    }
    fputc('\n', page->out);
}

static void print_line(const grid *g, text_page *page, const block *b, size_t line)
{
    const int height = height_of(g, b, line);

    for (int n = 0; n < height; n++)
        print_folded(g, page, b, line, n);
}

/* A rule below the headings, one stroke a column. */
static void print_rule(const grid *g, text_page *page, const block *b)
{
    int spaces = g->indent;

    for (size_t i = 0; i < block_size(b); i++) {
        const int width = g->columns[column_at(b, i)].width;

        if (width > 0)
            fprintf(page->out, "%*s", spaces, "");
        for (int n = 0; n < width; n++)
            fputc('-', page->out);
        spaces = width > 0 ? GRID_GAP : spaces + GRID_GAP;
    }
    fputc('\n', page->out);
}

static void print_block(const grid *g, text_page *page, const block *b)
{
    const bool has_head = height_of(g, b, 0) + height_of(g, b, 1) > 0;

    for (size_t line = 0; line < GRID_HEAD_LINES; line++)
        print_line(g, page, b, line);
    if (has_head)
        print_rule(g, page, b);
    for (size_t row = 0; row < grid_row_count(g); row++)
        print_line(g, page, b, row + GRID_HEAD_LINES);
}

static void print_blocks(const grid *g, text_page *page)
{
    const size_t fixed = g->fixed < g->column_count ? g->fixed : g->column_count;
    block b = {.fixed = fixed, .from = fixed};

    do {
        b.to = grid_block_end(g, b.from, page->width);
        print_block(g, page, &b);
        if (b.to < g->column_count)
            fputc('\n', page->out);
        b.from = b.to;
    } while (b.to < g->column_count);
}

void grid_print(grid *g, text_page *page)
{
    page->failed = page->failed || g->failed;
    if (!g->failed && g->column_count > 0) {
        grid_fit(g, page->width);
        print_blocks(g, page);
    }
    grid_close(g);
}
