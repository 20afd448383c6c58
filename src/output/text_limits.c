/* SPDX-License-Identifier: MIT */
/* text_limits.c - the limits of a report as a grid. */
#include "output/text_internal.h"

#include "output/grid_internal.h"
#include "output/number_text_internal.h"

#include <stdio.h>
#include <string.h>

#define INDENT    2
#define CELL_FOLD 20 /* why a limit cannot be judged is a sentence */
#define BOUND_DIGITS 9
#define MARGIN_DIGITS 4
#define UNCERTAINTY_DIGITS 2
#define PERCENT_DIGITS 3

static void add_number(grid *g, bool there, double number, int digits)
{
    char text[NUMBER_TEXT_MAX];

    if (there)
        number_significant(number, digits, text);
    grid_add_cell(g, there ? text : "-");
}

/* A bound as it was written, without the zeros that significant digits would add. */
static void add_bound(grid *g, bool there, double bound)
{
    char text[NUMBER_TEXT_MAX];

    if (there) {
        number_significant(bound, BOUND_DIGITS, text);
        if (strchr(text, '.') != NULL && strchr(text, 'e') == NULL) {
            size_t length = strlen(text);

            while (text[length - 1] == '0')
                length--;
            text[text[length - 1] == '.' ? length - 1 : length] = '\0';
        }
    }
    grid_add_cell(g, there ? text : "-");
}

/* Columns that only some reports fill. */
typedef struct {
    bool judged, uncertainty, percent; /* without a gas there is nothing but bounds */
} limit_columns;

static limit_columns columns_of(const report *r)
{
    limit_columns c = {false, false, false};

    for (size_t i = 0; i < r->limit_count; i++) {
        c.judged = c.judged || r->limits[i].gas != REPORT_NO_GAS;
        c.uncertainty = c.uncertainty || r->limits[i].has_uncertainty;
        c.percent = c.percent || r->limits[i].has_percent;
    }
    return c;
}

static void add_columns(grid *g, const limit_columns *c)
{
    static const char *const LEFT[] = {"limit", "gas", "unit", "at"};
    static const char *const RIGHT[] = {"min", "max"};

    for (size_t i = 0; i < sizeof LEFT / sizeof *LEFT; i++)
        if (c->judged || strcmp(LEFT[i], "gas") != 0)
            grid_add_column(g, GRID_LEFT, CELL_FOLD, LEFT[i], "");
    for (size_t i = 0; i < sizeof RIGHT / sizeof *RIGHT; i++)
        grid_add_column(g, GRID_RIGHT, CELL_FOLD, RIGHT[i], "");
    if (!c->judged)
        return;
    grid_add_column(g, GRID_RIGHT, CELL_FOLD, "value", "");
    if (c->uncertainty)
        grid_add_column(g, GRID_RIGHT, CELL_FOLD, "u", "");
    grid_add_column(g, GRID_RIGHT, CELL_FOLD, "margin", "");
    if (c->percent)
        grid_add_column(g, GRID_RIGHT, CELL_FOLD, "%", "");
    grid_add_column(g, GRID_LEFT, CELL_FOLD, "verdict", "");
}

static void add_limit(grid *g, const limit_columns *c, const report *r, const report_limit *limit, const render_style *style)
{
    char letter[TEXT_LETTERS_MAX] = "";

    if (limit->gas != REPORT_NO_GAS)
        text_letter(r, limit->gas, letter);
    grid_add_cell(g, limit->id);
    if (c->judged)
        grid_add_cell(g, letter);
    grid_add_cell(g, strcmp(limit->unit, "1") == 0 ? "" : limit->unit);
    grid_add_cell(g, limit->state);
    add_bound(g, limit->has_min, limit->min);
    add_bound(g, limit->has_max, limit->max);
    if (!c->judged)
        return;
    add_number(g, limit->has_value, limit->value, style->digits > 0 ? style->digits : REPORT_DIGITS);
    if (c->uncertainty)
        add_number(g, limit->has_uncertainty, limit->uncertainty, UNCERTAINTY_DIGITS);
    add_number(g, limit->has_value, limit->margin, MARGIN_DIGITS);
    if (c->percent)
        add_number(g, limit->has_percent, limit->percent, PERCENT_DIGITS);
    grid_add_cell(g, limit->verdict);
}

void text_limits(text_page *page, const report *r)
{
    grid g;

    if (r->limit_count == 0 || r->limits_title == NULL)
        return;
    fputc('\n', page->out);
    text_title(page, r->limits_title, NULL);
    const limit_columns c = columns_of(r);

    grid_open(&g, INDENT, c.judged ? 2 : 1); /* limit and gas */

    add_columns(&g, &c);
    for (size_t i = 0; i < r->limit_count; i++)
        add_limit(&g, &c, r, &r->limits[i], page->style);
    grid_print(&g, page);
    if (c.percent)
        fputs("\n%: margin in per cent of max - min, or of the only bound; negative: outside\n", page->out);
}
