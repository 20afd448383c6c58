/* SPDX-License-Identifier: MIT */
/* chart_draw_series.c - the data of a panel: regions, bars, curves, points, spans. */
#include "output/chart_draw_internal.h"

#include <math.h>

#define CURVE    1.9 /* width of lines */
#define DENSE    1.1 /* of lines with more points than pixels */
#define OUTLINE  1.2
#define BAR_PART 0.72 /* of its place that a bar among categories fills; a histogram's touch */
#define CAP      3.5  /* half of the cross line at the end of a span */
#define COLUMNS  2.0  /* columns per pixel that a curve of very many points is thinned to */
#define BEYOND   5.0  /* the frame, that markers on it stay whole */

static bool is_drawable(const report_point *point)
{
    return chart_drawable(point->x) && chart_drawable(point->y);
}

static bool same_column(const chart_panel *panel, const report_point *a, const report_point *b)
{
    return floor(COLUMNS * chart_px(panel, a->x)) == floor(COLUMNS * chart_px(panel, b->x));
}

/* The end of the points from `first` on that fall into one column. */
static size_t column_end(const chart_panel *panel, const report_series *s, size_t first)
{
    size_t end = first + 1;

    while (end < s->point_count && is_drawable(&s->points[end]) &&
           same_column(panel, &s->points[first], &s->points[end]))
        end++;
    return end;
}

static void line_to(const chart_canvas *canvas, const chart_panel *panel, const report_point *point)
{
    cairo_line_to(canvas->cr, chart_px(panel, point->x), chart_py(panel, point->y));
}

/* Of a column the first, the extreme and the last points are enough: the picture stays the same. */
static void trace_column(const chart_canvas *canvas, const chart_panel *panel, const report_point *points,
                         size_t count)
{
    size_t low = 0, high = 0;

    for (size_t i = 1; i < count; i++) {
        low = points[i].y < points[low].y ? i : low;
        high = points[i].y > points[high].y ? i : high;
    }
    line_to(canvas, panel, &points[0]);
    line_to(canvas, panel, &points[low < high ? low : high]);
    line_to(canvas, panel, &points[low < high ? high : low]);
    line_to(canvas, panel, &points[count - 1]);
}

/* A point that cannot be drawn leaves a gap. */
static void trace_curve(const chart_canvas *canvas, const chart_panel *panel, const report_series *s)
{
    cairo_new_path(canvas->cr);
    for (size_t i = 0; i < s->point_count;) {
        if (!is_drawable(&s->points[i])) {
            cairo_new_sub_path(canvas->cr);
            i++;
            continue;
        }
        const size_t end = column_end(panel, s, i);
        if (end - i > 4) {
            trace_column(canvas, panel, &s->points[i], end - i);
            i = end;
        } else {
            line_to(canvas, panel, &s->points[i++]);
        }
    }
}

static void trace_polygon(const chart_canvas *canvas, const chart_panel *panel, const report_series *s)
{
    cairo_new_path(canvas->cr);
    for (size_t i = 0; i < s->point_count; i++)
        if (is_drawable(&s->points[i]))
            line_to(canvas, panel, &s->points[i]);
    if (s->point_count > 0)
        cairo_close_path(canvas->cr);
}

static void stroke(const chart_canvas *canvas, const chart_style *style, double width, bool dashed)
{
    chart_ink(canvas, style->rgb, 1.0);
    cairo_set_line_width(canvas->cr, width);
    if (dashed)
        chart_set_dash(canvas, style->index);
    cairo_stroke(canvas->cr);
    cairo_set_dash(canvas->cr, NULL, 0, 0.0);
}

static void draw_region(const chart_canvas *canvas, const chart_panel *panel, const report_series *s,
                        const chart_style *style)
{
    trace_polygon(canvas, panel, s);
    chart_ink(canvas, style->rgb, 0.13);
    cairo_fill_preserve(canvas->cr);
    stroke(canvas, style, OUTLINE, true);
}

void chart_bar(const chart_canvas *canvas, const chart_style *style, const chart_box *bar)
{
    static const double FULLNESS[] = {0.85, 0.45, 0.15}; /* tells bars apart without colours */

    cairo_rectangle(canvas->cr, bar->left, bar->top, bar->width, bar->height);
    chart_ink(canvas, 0xFFFFFF, 1.0); /* no grid shines through */
    cairo_fill_preserve(canvas->cr);
    chart_ink(canvas, style->rgb, FULLNESS[style->index % 3]);
    cairo_fill_preserve(canvas->cr);
    chart_ink(canvas, style->rgb, 1.0);
    cairo_set_line_width(canvas->cr, 1.0);
    cairo_stroke(canvas->cr);
}

/* Bars of several series stand side by side: that of number `which` of `of`. */
static void draw_bars(const chart_canvas *canvas, const chart_panel *panel, size_t series, size_t which,
                      size_t of)
{
    const report_series *s = &panel->chart->series[series];
    const chart_style style = chart_style_of(panel, series);
    const bool lie = chart_bars_lie(panel->chart);
    const bool apart = lie || panel->chart->x.name_count > 0;
    const double place = chart_bar_pitch(panel->chart) * (apart ? BAR_PART : 1.0);
    const double from = place * ((double)which / (double)of - 0.5);
    const double to = place * ((double)(which + 1) / (double)of - 0.5);

    for (size_t i = 0; i < s->point_count; i++) {
        const report_point p = s->points[i];

        if (!is_drawable(&p))
            continue;
        const double x1 = chart_px(panel, lie ? 0.0 : p.x + from), x2 = chart_px(panel, lie ? p.x : p.x + to);
        const double y1 = chart_py(panel, lie ? p.y + from : 0.0), y2 = chart_py(panel, lie ? p.y + to : p.y);
        chart_bar(canvas, &style, &(chart_box){fmin(x1, x2), fmin(y1, y2), fabs(x2 - x1), fabs(y2 - y1)});
    }
}

/* Points that fall on the one before are left out: a year of analyses is as many dots. */
static void draw_points(const chart_canvas *canvas, const chart_panel *panel, const report_series *s,
                        const chart_style *style)
{
    double last_x = -1e9, last_y = -1e9;

    for (size_t i = 0; i < s->point_count; i++) {
        const double x = chart_px(panel, s->points[i].x), y = chart_py(panel, s->points[i].y);

        if (!is_drawable(&s->points[i]) || fabs(x - last_x) + fabs(y - last_y) < 1.0 / COLUMNS ||
            !chart_inside(panel->x, s->points[i].x) || !chart_inside(panel->y, s->points[i].y))
            continue;
        chart_marker(canvas, style->index, x, y);
        chart_ink(canvas, style->rgb, 1.0);
        cairo_fill_preserve(canvas->cr);
        chart_ink(canvas, 0xFFFFFF, 1.0);
        cairo_set_line_width(canvas->cr, 0.7);
        cairo_stroke(canvas->cr);
        last_x = x;
        last_y = y;
    }
}

static void draw_spans(const chart_canvas *canvas, const chart_panel *panel, const report_series *s,
                       const chart_style *style)
{
    for (size_t i = 0; i + 1 < s->point_count; i += 2) {
        if (!is_drawable(&s->points[i]) || !is_drawable(&s->points[i + 1]))
            continue;
        const double x1 = chart_px(panel, s->points[i].x), x2 = chart_px(panel, s->points[i + 1].x);
        const double y1 = chart_py(panel, s->points[i].y), y2 = chart_py(panel, s->points[i + 1].y);
        const double length = hypot(x2 - x1, y2 - y1);
        const double across_x = length > 0.0 ? CAP * (y1 - y2) / length : 0.0;
        const double across_y = length > 0.0 ? CAP * (x2 - x1) / length : CAP;

        cairo_move_to(canvas->cr, x1, y1);
        cairo_line_to(canvas->cr, x2, y2);
        cairo_move_to(canvas->cr, x1 - across_x, y1 - across_y);
        cairo_line_to(canvas->cr, x1 + across_x, y1 + across_y);
        cairo_move_to(canvas->cr, x2 - across_x, y2 - across_y);
        cairo_line_to(canvas->cr, x2 + across_x, y2 + across_y);
    }
    chart_ink(canvas, chart_has_kind(panel, style, REPORT_BARS) ? CHART_INK : style->rgb, 1.0);
    cairo_set_line_width(canvas->cr, OUTLINE);
    cairo_stroke(canvas->cr);
}

static void clip(const chart_canvas *canvas, const chart_panel *panel, double beyond)
{
    const chart_box *plot = &panel->plot;

    cairo_save(canvas->cr);
    cairo_rectangle(canvas->cr, plot->left - beyond, plot->top - beyond, plot->width + 2.0 * beyond,
                    plot->height + 2.0 * beyond);
    cairo_clip(canvas->cr);
    cairo_set_line_join(canvas->cr, CAIRO_LINE_JOIN_ROUND);
}

void chart_areas(const chart_canvas *canvas, const chart_panel *panel)
{
    const report_chart *chart = panel->chart;
    size_t bars = 0, bar = 0;

    clip(canvas, panel, 0.0);
    for (size_t i = 0; i < chart->series_count; i++) {
        const chart_style style = chart_style_of(panel, i);

        bars += chart->series[i].kind == REPORT_BARS;
        if (chart->series[i].kind == REPORT_REGION)
            draw_region(canvas, panel, &chart->series[i], &style);
    }
    for (size_t i = 0; i < chart->series_count; i++)
        if (chart->series[i].kind == REPORT_BARS)
            draw_bars(canvas, panel, i, bar++, bars);
    cairo_restore(canvas->cr);
}

static void draw_curve(const chart_canvas *canvas, const chart_panel *panel, size_t series)
{
    const report_series *s = &panel->chart->series[series];
    const chart_style style = chart_style_of(panel, series);

    if (s->kind == REPORT_LINE && s->point_count == 1) {
        draw_points(canvas, panel, s, &style);
    } else if (s->kind == REPORT_LINE) {
        trace_curve(canvas, panel, s);
        stroke(canvas, &style, (double)s->point_count > panel->plot.width ? DENSE : CURVE, true);
    } else if (s->kind == REPORT_OUTLINE) {
        trace_polygon(canvas, panel, s);
        stroke(canvas, &style, OUTLINE, !chart_has_kind(panel, &style, REPORT_POINTS));
    } else if (s->kind == REPORT_SPANS) {
        draw_spans(canvas, panel, s, &style);
    }
}

void chart_curves(const chart_canvas *canvas, const chart_panel *panel)
{
    const report_chart *chart = panel->chart;

    clip(canvas, panel, 1.0);
    for (size_t i = 0; i < chart->series_count; i++)
        draw_curve(canvas, panel, i);
    cairo_restore(canvas->cr);
    clip(canvas, panel, BEYOND);
    for (size_t i = 0; i < chart->series_count; i++) {
        const chart_style style = chart_style_of(panel, i);

        if (chart->series[i].kind == REPORT_POINTS)
            draw_points(canvas, panel, &chart->series[i], &style);
    }
    cairo_restore(canvas->cr);
}
