/* SPDX-License-Identifier: MIT */
/* chart_draw_style.c - how series are told apart: with colours, and in grey without them. */
#include "output/chart_draw_internal.h"

#include <string.h>

#define RADIUS 3.6

/* Okabe and Ito, Color Universal Design (2008), without the yellow that white paper swallows. */
static const unsigned COLOURS[] = {0x0072B2, 0xD55E00, 0x009E73, 0xCC79A7, 0xE69F00, 0x56B4E9, 0x000000};

/* Lengths of ink and gap. */
static const struct {
    int count;
    double length[6];
} DASHES[] = {{0, {0.0}},
              {2, {8.0, 3.5}},
              {2, {2.5, 2.5}},
              {4, {9.0, 3.0, 2.5, 3.0}},
              {6, {9.0, 3.0, 2.5, 3.0, 2.5, 3.0}}};

#define COUNT(array) (sizeof(array) / sizeof *(array))

static bool have_same_label(const report_series *a, const report_series *b)
{
    return *a->label != '\0' && strcmp(a->label, b->label) == 0;
}

void chart_number_styles(const report_chart *chart, size_t *styles)
{
    size_t count = 0;

    for (size_t i = 0; i < chart->series_count; i++) {
        size_t same = 0;

        while (same < i && !have_same_label(&chart->series[same], &chart->series[i]))
            same++;
        styles[i] = same < i ? styles[same] : count++;
    }
}

chart_style chart_style_of(const chart_panel *panel, size_t series)
{
    const size_t index = panel->styles[series];

    return (chart_style){COLOURS[index % COUNT(COLOURS)], index};
}

bool chart_is_repeated(const chart_panel *panel, size_t series)
{
    for (size_t i = 0; i < series; i++)
        if (panel->styles[i] == panel->styles[series])
            return true;
    return false;
}

bool chart_has_kind(const chart_panel *panel, const chart_style *style, report_series_kind kind)
{
    for (size_t i = 0; i < panel->chart->series_count; i++)
        if (panel->chart->series[i].kind == kind && panel->styles[i] == style->index)
            return true;
    return false;
}

unsigned chart_text_rgb(unsigned rgb)
{
    const unsigned red = rgb >> 16 & 0xFFu, green = rgb >> 8 & 0xFFu, blue = rgb & 0xFFu;
    const unsigned light = (3 * red + 6 * green + blue) / 10;
    const unsigned most = 95; /* lightness that has a contrast of about 6 on white */

    if (light <= most)
        return rgb;
    return (red * most / light) << 16 | (green * most / light) << 8 | blue * most / light;
}

void chart_set_dash(const chart_canvas *canvas, size_t style)
{
    const size_t dash = style % COUNT(DASHES);

    cairo_set_dash(canvas->cr, DASHES[dash].length, DASHES[dash].count, 0.0);
}

static void trace_polygon(cairo_t *cr, double x, double y, const double (*corners)[2], size_t count)
{
    for (size_t i = 0; i < count; i++)
        cairo_line_to(cr, x + RADIUS * corners[i][0], y + RADIUS * corners[i][1]);
    cairo_close_path(cr);
}

void chart_marker(const chart_canvas *canvas, size_t style, double x, double y)
{
    static const double SQUARE[][2] = {{-0.9, -0.9}, {0.9, -0.9}, {0.9, 0.9}, {-0.9, 0.9}};
    static const double UP[][2] = {{0.0, -1.25}, {1.1, 0.85}, {-1.1, 0.85}};
    static const double DIAMOND[][2] = {{0.0, -1.3}, {1.15, 0.0}, {0.0, 1.3}, {-1.15, 0.0}};
    static const double DOWN[][2] = {{0.0, 1.25}, {1.1, -0.85}, {-1.1, -0.85}};
    cairo_t *cr = canvas->cr;

    cairo_new_path(cr);
    switch (style % 5) {
    case 0:
        cairo_arc(cr, x, y, RADIUS, 0.0, 6.283185307179586);
        cairo_close_path(cr);
        break;
    case 1:
        trace_polygon(cr, x, y, SQUARE, COUNT(SQUARE));
        break;
    case 2:
        trace_polygon(cr, x, y, UP, COUNT(UP));
        break;
    case 3:
        trace_polygon(cr, x, y, DIAMOND, COUNT(DIAMOND));
        break;
    default:
        trace_polygon(cr, x, y, DOWN, COUNT(DOWN));
        break;
    }
}
