/* SPDX-License-Identifier: MIT */
/* chart_draw_marks.c - limits as dashed lines, and points to look at, each with its label. */
#include "output/chart_draw_internal.h"

#include <math.h>
#include <stdlib.h>

#define LINE_WIDTH 1.3
#define LIMIT      0x444444u
#define ROWS_MOST  6 /* of labels above a plot; there is no more room */
#define ROW        15.0
#define FLAG_GAP   4.0 /* from the pole to the label */
#define LABEL_MOST 260.0
#define DOT        4.2

/* The label of a vertical line, hung at a pole that goes on above the plot. */
typedef struct {
    const report_mark *mark;
    double width;
    size_t row; /* 0: the lowest */
} chart_flag;

static const chart_font LABEL = {CHART_SMALL, false, CHART_INK, 0.0};

static bool is_shown(const chart_panel *panel, const report_mark *mark)
{
    return (mark->kind == REPORT_MARK_Y || chart_inside(panel->x, mark->x)) &&
           (mark->kind == REPORT_MARK_X || chart_inside(panel->y, mark->y));
}

static bool has_flag(const chart_panel *panel, const report_mark *mark)
{
    return mark->kind == REPORT_MARK_X && *mark->label != '\0' && is_shown(panel, mark);
}

/* Where the label of a vertical line starts: behind its pole, but not beyond the paper. */
static double flag_left(const chart_panel *panel, const chart_flag *flag)
{
    return fmin(chart_px(panel, flag->mark->x) + FLAG_GAP, CHART_PAGE_WIDTH - CHART_EDGE - flag->width);
}

static int compare(const void *a, const void *b)
{
    const chart_flag *flag_a = a, *flag_b = b;
    const double x_a = flag_a->mark->x, x_b = flag_b->mark->x;

    if (x_a != x_b)
        return x_a < x_b ? -1 : 1;
    return flag_a->mark < flag_b->mark ? -1 : 1;
}

/* A flag hangs above all those at its right that it would reach: so no pole crosses a label. */
static void hang_flags(const chart_panel *panel, chart_flag *flags, size_t count)
{
    for (size_t i = count; i-- > 0;) {
        const double end = flag_left(panel, &flags[i]) + flags[i].width + FLAG_GAP;

        flags[i].row = 0;
        for (size_t j = i + 1; j < count; j++)
            if (chart_px(panel, flags[j].mark->x) < end || flag_left(panel, &flags[j]) < end)
                flags[i].row = flags[j].row >= flags[i].row ? flags[j].row + 1 : flags[i].row;
    }
}

/* The labels of vertical lines, hung in rows; NULL without memory. The caller frees them. */
static chart_flag *flags_of(chart_canvas *canvas, const chart_panel *panel, size_t *count)
{
    const report_chart *chart = panel->chart;
    chart_flag *flags = calloc(chart->mark_count + 1, sizeof *flags);

    *count = 0;
    if (flags == NULL) {
        canvas->failed = true;
        return NULL;
    }
    for (size_t i = 0; i < chart->mark_count; i++) {
        const report_mark *mark = &chart->marks[i];

        if (has_flag(panel, mark))
            flags[(*count)++] =
                (chart_flag){mark, fmin(chart_text_width(canvas, &LABEL, mark->label), LABEL_MOST), 0};
    }
    qsort(flags, *count, sizeof *flags, compare);
    hang_flags(panel, flags, *count);
    return flags;
}

double chart_mark_rows_height(chart_canvas *canvas, const chart_panel *panel)
{
    size_t count = 0, rows = 0;
    chart_flag *flags = flags_of(canvas, panel, &count);

    for (size_t i = 0; i < count; i++)
        rows = flags[i].row + 1 > rows ? flags[i].row + 1 : rows;
    free(flags);
    return ROW * (double)(rows < ROWS_MOST ? rows : ROWS_MOST);
}

static void draw_flags(chart_canvas *canvas, const chart_panel *panel)
{
    size_t count = 0;
    chart_flag *flags = flags_of(canvas, panel, &count);

    for (size_t i = 0; i < count; i++) {
        const double x = chart_px(panel, flags[i].mark->x);
        const double y = panel->plot.top - ROW * (double)flags[i].row;

        if (flags[i].row >= ROWS_MOST)
            continue;
        chart_ink(canvas, LIMIT, 1.0);
        cairo_set_line_width(canvas->cr, 0.8);
        cairo_move_to(canvas->cr, x, panel->plot.top);
        cairo_line_to(canvas->cr, x, y - ROW + 2.0);
        cairo_stroke(canvas->cr);
        chart_text(canvas, &LABEL, flag_left(panel, &flags[i]), y - 4.0, LABEL_MOST, flags[i].mark->label);
    }
    free(flags);
}

void chart_mark_lines(chart_canvas *canvas, const chart_panel *panel)
{
    static const double DASH[] = {6.0, 4.0};
    const chart_box *plot = &panel->plot;

    for (size_t i = 0; i < panel->chart->mark_count; i++) {
        const report_mark *mark = &panel->chart->marks[i];

        if (mark->kind == REPORT_MARK_POINT || !is_shown(panel, mark))
            continue;
        if (mark->kind == REPORT_MARK_X) {
            cairo_move_to(canvas->cr, chart_px(panel, mark->x), plot->top);
            cairo_line_to(canvas->cr, chart_px(panel, mark->x), plot->top + plot->height);
        } else {
            cairo_move_to(canvas->cr, plot->left, chart_py(panel, mark->y));
            cairo_line_to(canvas->cr, plot->left + plot->width, chart_py(panel, mark->y));
        }
    }
    chart_ink(canvas, LIMIT, 1.0);
    cairo_set_line_width(canvas->cr, LINE_WIDTH);
    cairo_set_dash(canvas->cr, DASH, 2, 0.0);
    cairo_stroke(canvas->cr);
    cairo_set_dash(canvas->cr, NULL, 0, 0.0);
    draw_flags(canvas, panel);
}

static void draw_dot(const chart_canvas *canvas, const chart_panel *panel, const report_mark *mark)
{
    cairo_new_path(canvas->cr);
    cairo_arc(canvas->cr, chart_px(panel, mark->x), chart_py(panel, mark->y), DOT, 0.0, 6.283185307179586);
    chart_ink(canvas, 0xFFFFFF, 1.0);
    cairo_fill_preserve(canvas->cr);
    chart_ink(canvas, CHART_INK, 1.0);
    cairo_set_line_width(canvas->cr, 1.6);
    cairo_stroke(canvas->cr);
}

void chart_mark_points(chart_canvas *canvas, const chart_panel *panel)
{
    const report_chart *chart = panel->chart;

    for (size_t i = 0; i < chart->mark_count; i++) {
        const report_mark *mark = &chart->marks[i];

        if (mark->kind == REPORT_MARK_POINT && is_shown(panel, mark))
            draw_dot(canvas, panel, mark);
    }
    chart_point_labels(canvas, panel);
}
