/* SPDX-License-Identifier: MIT */
/* chart_draw_legend.c - keys and names of series in rows above the plot, where they cover nothing. */
#include "output/chart_draw_internal.h"

#include <math.h>
#include <string.h>

#define ROW     18.0
#define KEY     26.0 /* width of a sample of the line */
#define KEY_GAP 6.0  /* from the sample to the name */
#define GAP     20.0 /* between entries */
#define MOST    250.0

static const chart_font NAME = {CHART_NORMAL, false, CHART_INK, 0.0};

/* A panel whose only name stands at its axis of values already. */
static bool axis_names_all(const report_chart *chart)
{
    for (size_t i = 0; i < chart->series_count; i++)
        if (strcmp(chart->series[i].label, chart->y.label) != 0)
            return false;
    return true;
}

static bool has_entry(const chart_panel *panel, size_t series)
{
    const report_chart *chart = panel->chart;
    const report_series *s = &chart->series[series];

    return *s->label != '\0' && !chart_is_repeated(panel, series) && !axis_names_all(chart) &&
           !(panel->labels_at_ends && s->kind == REPORT_LINE);
}

static void stroke_key(const chart_canvas *canvas, const chart_style *style, double width)
{
    chart_ink(canvas, style->rgb, 1.0);
    cairo_set_line_width(canvas->cr, width);
    cairo_stroke(canvas->cr);
    cairo_set_dash(canvas->cr, NULL, 0, 0.0);
}

static void draw_key(const chart_canvas *canvas, report_series_kind kind, const chart_style *style, double x,
                     double y)
{
    cairo_t *cr = canvas->cr;

    cairo_new_path(cr);
    switch (kind) {
    case REPORT_LINE:
        chart_set_dash(canvas, style->index);
        cairo_move_to(cr, x, y);
        cairo_line_to(cr, x + KEY, y);
        stroke_key(canvas, style, 1.9);
        break;
    case REPORT_POINTS:
        chart_marker(canvas, style->index, x + KEY / 2.0, y);
        chart_ink(canvas, style->rgb, 1.0);
        cairo_fill(cr);
        break;
    case REPORT_BARS:
        chart_bar(canvas, style, &(chart_box){x + KEY / 2.0 - 7.0, y - 5.0, 14.0, 10.0});
        break;
    case REPORT_REGION:
        cairo_rectangle(cr, x + 1.0, y - 5.0, KEY - 2.0, 10.0);
        chart_ink(canvas, style->rgb, 0.13);
        cairo_fill_preserve(cr);
        chart_set_dash(canvas, style->index);
        stroke_key(canvas, style, 1.2);
        break;
    case REPORT_OUTLINE:
        cairo_save(cr);
        cairo_translate(cr, x + KEY / 2.0, y);
        cairo_scale(cr, KEY / 2.0, 5.0);
        cairo_arc(cr, 0.0, 0.0, 0.95, 0.0, 6.283185307179586);
        cairo_restore(cr);
        stroke_key(canvas, style, 1.2);
        break;
    case REPORT_SPANS:
        cairo_move_to(cr, x + KEY / 2.0, y - 6.0);
        cairo_line_to(cr, x + KEY / 2.0, y + 6.0);
        stroke_key(canvas, style, 1.2);
        break;
    }
}

/* All kinds of series that share the name. */
static void draw_keys(const chart_canvas *canvas, const chart_panel *panel, size_t series, double x, double y)
{
    const report_chart *chart = panel->chart;
    const chart_style style = chart_style_of(panel, series);

    for (size_t i = series; i < chart->series_count; i++)
        if (panel->styles[i] == style.index)
            draw_key(canvas, chart->series[i].kind, &style, x, y);
}

static double row_width(const chart_panel *panel)
{
    return CHART_PAGE_WIDTH - CHART_EDGE - panel->plot.left;
}

/* Goes through the entries from row to row; draws them if `drawn`, the first row's middle at y. */
static int take_entries(chart_canvas *canvas, const chart_panel *panel, bool drawn, double y)
{
    double x = 0.0;
    int rows = 0;

    for (size_t i = 0; i < panel->chart->series_count; i++) {
        if (!has_entry(panel, i))
            continue;

        const char *label = panel->chart->series[i].label;
        const double width = KEY + KEY_GAP + fmin(chart_text_width(canvas, &NAME, label), MOST);
        if (rows == 0 || x + width > row_width(panel)) {
            x = 0.0;
            rows++;
        }
        if (drawn) {
            const double left = panel->plot.left + x, middle = y + ROW * (rows - 1);

            draw_keys(canvas, panel, i, left, middle);
            chart_text(canvas, &NAME, left + KEY + KEY_GAP, middle + 0.35 * CHART_NORMAL, MOST, label);
        }
        x += width + GAP;
    }
    return rows;
}

double chart_legend(chart_canvas *canvas, const chart_panel *panel, bool drawn, double y)
{
    const int rows = take_entries(canvas, panel, false, 0.0);
    const double height = rows > 0 ? ROW * rows + 4.0 : 0.0;

    if (drawn && rows > 0)
        take_entries(canvas, panel, true, y - height + ROW / 2.0);
    return height;
}
