/* SPDX-License-Identifier: MIT */
/* chart_draw_place.c - labels of marked points, each where it covers least. */
#include "output/chart_draw_internal.h"

#include <math.h>
#include <stdlib.h>

#define LABEL_MOST  230.0
#define NEAR        8.0 /* from the point to its label */
#define FAR         26.0
#define LABELS_MOST 60  /* more would cover the chart whatever their places */
#define PLACES      16  /* around a point: eight near, eight far */
#define SAMPLE      4.0 /* px along a curve that count as one thing covered */
#define WEIGHT_OUT  1e6 /* what a bad place costs, in samples covered */
#define WEIGHT_TEXT 200.0
#define WEIGHT_DOT  60.0
#define WEIGHT_LINE 8.0
#define WEIGHT_FAR  2.5

static const chart_font LABEL = {CHART_SMALL, false, CHART_INK, 0.0};

/* Directions, the best to read first. */
static const double AROUND[8][2] = {{0.7, -0.7}, {-0.7, -0.7}, {0.7, 0.7}, {-0.7, 0.7},
                                    {0.0, -1.0}, {0.0, 1.0},   {1.0, 0.0}, {-1.0, 0.0}};

static bool overlap(const chart_box *a, const chart_box *b)
{
    return a->left < b->left + b->width && b->left < a->left + a->width && a->top < b->top + b->height &&
           b->top < a->top + a->height;
}

static bool holds(const chart_box *box, double x, double y)
{
    return x >= box->left && x <= box->left + box->width && y >= box->top && y <= box->top + box->height;
}

/* Samples of the straight line between two points that a box covers. */
static double covered_between(const chart_box *box, const chart_panel *panel, const report_point *from,
                              const report_point *to)
{
    const double x = chart_px(panel, from->x), y = chart_py(panel, from->y);
    const double dx = chart_px(panel, to->x) - x, dy = chart_py(panel, to->y) - y;
    const int steps = (int)fmin(ceil(hypot(dx, dy) / SAMPLE), 1000.0);
    double covered = 0.0;

    for (int i = 0; i <= steps; i++)
        covered += holds(box, x + dx * i / fmax(steps, 1.0), y + dy * i / fmax(steps, 1.0));
    return covered;
}

static double covered_data(const chart_box *box, const chart_panel *panel)
{
    double covered = 0.0;

    for (size_t i = 0; i < panel->chart->series_count; i++) {
        const report_series *s = &panel->chart->series[i];
        const bool joined = s->kind != REPORT_POINTS && s->kind != REPORT_BARS;

        for (size_t p = 0; p < s->point_count; p++) {
            const report_point *to = &s->points[p];
            const report_point *from = joined && p > 0 ? to - 1 : to;

            if (chart_drawable(from->x) && chart_drawable(from->y) && chart_drawable(to->x) &&
                chart_drawable(to->y))
                covered += covered_between(box, panel, from, to);
        }
    }
    return covered;
}

static double covered_marks(const chart_box *box, const chart_panel *panel)
{
    double cost = 0.0;

    for (size_t i = 0; i < panel->chart->mark_count; i++) {
        const report_mark *mark = &panel->chart->marks[i];
        const double x = mark->kind == REPORT_MARK_Y ? box->left : chart_px(panel, mark->x);
        const double y = mark->kind == REPORT_MARK_X ? box->top : chart_py(panel, mark->y);
        const chart_box wide = {box->left - 4.0, box->top - 4.0, box->width + 8.0, box->height + 8.0};

        if (mark->kind == REPORT_MARK_POINT)
            cost += holds(&wide, x, y) ? WEIGHT_DOT : 0.0;
        else
            cost += holds(box, x, y) ? WEIGHT_LINE : 0.0;
    }
    return cost;
}

static chart_box place_at(const chart_panel *panel, const report_mark *mark, double width, size_t place)
{
    const double *towards = AROUND[place % 8];
    const double distance = place < 8 ? NEAR : FAR;
    const double height = CHART_SMALL + 2.0;
    const double x = chart_px(panel, mark->x) + towards[0] * distance;
    const double y = chart_py(panel, mark->y) + towards[1] * distance;
    const double left = towards[0] > 0.0 ? x : towards[0] < 0.0 ? x - width : x - width / 2.0;
    const double top = towards[1] > 0.0 ? y : towards[1] < 0.0 ? y - height : y - height / 2.0;

    return (chart_box){left, top, width, height};
}

static double cost_of(const chart_box *box, const chart_panel *panel, const chart_box *taken, size_t count)
{
    const chart_box *plot = &panel->plot;
    double cost = covered_data(box, panel) + covered_marks(box, panel);

    if (!holds(plot, box->left - 2.0, box->top - 2.0) ||
        !holds(plot, box->left + box->width + 2.0, box->top + box->height + 2.0))
        cost += WEIGHT_OUT;
    for (size_t i = 0; i < count; i++)
        cost += overlap(box, &taken[i]) ? WEIGHT_TEXT : 0.0;
    return cost;
}

static chart_box best_place(const chart_panel *panel, const report_mark *mark, double width,
                            const chart_box *taken, size_t count)
{
    chart_box best = place_at(panel, mark, width, 0);
    double least = HUGE_VAL;

    for (size_t place = 0; place < PLACES; place++) {
        const chart_box box = place_at(panel, mark, width, place);
        const double cost = cost_of(&box, panel, taken, count) + (place < 8 ? 0.0 : WEIGHT_FAR);

        if (cost < least) {
            least = cost;
            best = box;
        }
    }
    return best;
}

/* A thin line leads from a label that stands far off to its point. */
static void draw_label(chart_canvas *canvas, const chart_panel *panel, const report_mark *mark,
                       const chart_box *box)
{
    const double x = chart_px(panel, mark->x), y = chart_py(panel, mark->y);
    const double to_x = fmax(box->left, fmin(x, box->left + box->width));
    const double to_y = fmax(box->top, fmin(y, box->top + box->height));

    if (hypot(to_x - x, to_y - y) > 2.0 * NEAR) {
        chart_ink(canvas, CHART_PALE, 1.0);
        cairo_set_line_width(canvas->cr, 0.8);
        cairo_move_to(canvas->cr, x + (to_x - x) * 0.25, y + (to_y - y) * 0.25);
        cairo_line_to(canvas->cr, to_x, to_y);
        cairo_stroke(canvas->cr);
    }
    cairo_rectangle(canvas->cr, box->left - 1.0, box->top, box->width + 2.0, box->height);
    chart_ink(canvas, 0xFFFFFF, 0.6);
    cairo_fill(canvas->cr);
    chart_text(canvas, &LABEL, box->left, box->top + CHART_SMALL - 1.0, LABEL_MOST, mark->label);
}

void chart_point_labels(chart_canvas *canvas, const chart_panel *panel)
{
    const report_chart *chart = panel->chart;
    chart_box *taken = calloc(chart->mark_count + 1, sizeof *taken);
    size_t count = 0;

    if (taken == NULL) {
        canvas->failed = true;
        return;
    }
    for (size_t i = 0; i < chart->mark_count && count < LABELS_MOST; i++) {
        const report_mark *mark = &chart->marks[i];

        if (mark->kind != REPORT_MARK_POINT || *mark->label == '\0' || !chart_inside(panel->x, mark->x) ||
            !chart_inside(panel->y, mark->y))
            continue;
        const double width = fmin(chart_text_width(canvas, &LABEL, mark->label), LABEL_MOST);
        taken[count] = best_place(panel, mark, width, taken, count);
        draw_label(canvas, panel, mark, &taken[count]);
        count++;
    }
    free(taken);
}
