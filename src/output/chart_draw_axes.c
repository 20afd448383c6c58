/* SPDX-License-Identifier: MIT */
/* chart_draw_axes.c - grid, frame, ticks and labels of a panel's axes. */
#include "output/chart_draw_internal.h"

#include <math.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>

#define PER_X_TICK  90.0 /* px of axis for each tick */
#define PER_Y_TICK  28.0
#define MOST_TICKS  8   /* wanted, that the grid does not crowd a large plot */
#define TICK_GAP    6.0 /* between the frame and what ticks say */
#define NAME_MOST   170.0
#define LABEL_GAP   8.0 /* between ticks and the label of an axis */
#define LABEL_LINES 2

static const chart_font TICKS = {CHART_SMALL, false, CHART_INK, 0.5};
static const chart_font TICKS_LEFT = {CHART_SMALL, false, CHART_INK, 1.0};
static const chart_font BELOW = {CHART_SMALL, false, CHART_PALE, 0.5};
static const chart_font LABEL = {CHART_NORMAL, false, CHART_INK, 0.5};

/* Units as print has them, for those that a keyboard writes otherwise. */
static const struct {
    const char *typed, *printed;
} UNITS[] = {{"C", "\xC2\xB0"
                   "C"},
             {"F", "\xC2\xB0"
                   "F"},
             {"1", ""}};

/* Copies a unit with the exponents of lengths raised: m3, Nm3, m2, cm3, ft3. */
static void write_unit(const char *unit, char *to, size_t size)
{
    size_t length = 0;

    for (size_t i = 0; i < sizeof UNITS / sizeof *UNITS; i++)
        if (strcmp(unit, UNITS[i].typed) == 0)
            unit = UNITS[i].printed;
    for (; *unit != '\0' && length + 3 < size; unit++) {
        const bool behind_length = length > 0 && (to[length - 1] == 'm' || to[length - 1] == 't');

        if (behind_length && (*unit == '2' || *unit == '3')) {
            to[length++] = '\xC2'; /* U+00B2, U+00B3 */
            to[length++] = *unit == '2' ? '\xB2' : '\xB3';
        } else {
            to[length++] = *unit;
        }
    }
    to[length] = '\0';
}

/* The unit alone says enough where the title has said the rest. */
static void write_label(const report_axis *axis, const char *title, char *to, size_t size)
{
    char unit[64];

    write_unit(axis->unit, unit, sizeof unit);
    if (strcmp(axis->label, title) == 0)
        snprintf(to, size, "%s", unit);
    else if (*unit == '\0')
        snprintf(to, size, "%s", axis->label);
    else
        snprintf(to, size, "%.*s (%s)", (int)(size - sizeof unit - 4), axis->label, unit);
}

static size_t name_ticks(const report_axis *axis, chart_range range, chart_tick *ticks)
{
    size_t count = 0;

    for (size_t i = 0; i < axis->name_count && count < CHART_TICKS_MAX; i++) {
        if (!chart_inside(range, (double)i))
            continue;
        ticks[count] = (chart_tick){.at = (double)i};
        snprintf(ticks[count].text, sizeof ticks[count].text, "%s", axis->names[i]);
        count++;
    }
    return count;
}

static size_t ticks_of(const report_axis *axis, chart_range range, double room, chart_tick *ticks)
{
    const int wanted = room < 2.0 ? 2 : room > MOST_TICKS ? MOST_TICKS : (int)room;

    if (axis->name_count > 0)
        return name_ticks(axis, range, ticks);
    return axis->is_time ? chart_time_ticks(range, wanted, ticks) : chart_number_ticks(range, wanted, ticks);
}

static size_t x_ticks(const chart_panel *panel, chart_tick *ticks)
{
    return ticks_of(&panel->chart->x, panel->x, panel->plot.width / PER_X_TICK, ticks);
}

static size_t y_ticks(const chart_panel *panel, chart_tick *ticks)
{
    return ticks_of(&panel->chart->y, panel->y, panel->plot.height / PER_Y_TICK, ticks);
}

/* On whole and a half pixels a thin line is sharp. */
static double sharp(double at)
{
    return floor(at) + 0.5;
}

static void line(cairo_t *cr, double x1, double y1, double x2, double y2)
{
    cairo_move_to(cr, x1, y1);
    cairo_line_to(cr, x2, y2);
}

/* Names have no grid across: there is nothing to read off between them. */
static void draw_grid(const chart_canvas *canvas, const chart_panel *panel, const chart_tick *x,
                      size_t x_count, const chart_tick *y, size_t y_count)
{
    const chart_box *plot = &panel->plot;

    cairo_set_line_width(canvas->cr, 1.0);
    chart_ink(canvas, CHART_GRID, 1.0);
    for (size_t i = 0; i < x_count && panel->chart->x.name_count == 0; i++) {
        const double at = sharp(chart_px(panel, x[i].at));
        line(canvas->cr, at, plot->top, at, plot->top + plot->height);
    }
    for (size_t i = 0; i < y_count && panel->chart->y.name_count == 0; i++) {
        const double at = sharp(chart_py(panel, y[i].at));
        line(canvas->cr, plot->left, at, plot->left + plot->width, at);
    }
    cairo_stroke(canvas->cr);
}

static void draw_frame(const chart_canvas *canvas, const chart_panel *panel)
{
    const chart_box *plot = &panel->plot;

    chart_ink(canvas, 0x888888, 1.0);
    cairo_rectangle(canvas->cr, sharp(plot->left), sharp(plot->top), round(plot->width), round(plot->height));
    cairo_stroke(canvas->cr);
}

static void label_x(chart_canvas *canvas, const chart_panel *panel, const chart_tick *ticks, size_t count)
{
    const chart_box *plot = &panel->plot;
    const double first = plot->top + plot->height + TICK_GAP + CHART_SMALL;
    const double room =
        panel->chart->x.name_count > 0 ? plot->width / (double)panel->chart->x.name_count - 6.0 : plot->width;
    char label[400];

    for (size_t i = 0; i < count; i++) {
        const double at = chart_px(panel, ticks[i].at);

        chart_text(canvas, &TICKS, at, first, room, ticks[i].text);
        chart_text(canvas, &BELOW, at, first + chart_leading(&BELOW), room, ticks[i].below);
    }
    write_label(&panel->chart->x, "", label, sizeof label);
    chart_text(canvas, &LABEL, plot->left + plot->width / 2.0,
               plot->top + plot->height + chart_foot_height(panel) - 4.0, plot->width, label);
}

/* The y axis's label runs upwards, at the left of all that belongs to the axis. Answers its lines. */
static int label_y(chart_canvas *canvas, const chart_panel *panel, double left)
{
    const chart_box *plot = &panel->plot;
    const chart_box along = {plot->height / 2.0, 0.0, plot->height, 0.0};
    char label[400];

    write_label(&panel->chart->y, panel->has_title ? panel->chart->title : "", label, sizeof label);
    cairo_save(canvas->cr);
    cairo_translate(canvas->cr, left + CHART_NORMAL - 2.0, plot->top + plot->height);
    cairo_rotate(canvas->cr, -1.5707963267948966);
    const int lines = chart_paragraph(canvas, &LABEL, &along, LABEL_LINES, label);
    cairo_restore(canvas->cr);
    return lines;
}

double chart_left_width(chart_canvas *canvas, const chart_panel *panel)
{
    chart_tick ticks[CHART_TICKS_MAX];
    const size_t count = y_ticks(panel, ticks);
    const int lines = label_y(canvas, panel, 0.0);
    double widest = 0.0;

    for (size_t i = 0; i < count; i++)
        widest = fmax(widest, fmin(chart_text_width(canvas, &TICKS_LEFT, ticks[i].text), NAME_MOST));
    return lines * chart_leading(&LABEL) + (lines > 0 ? LABEL_GAP : 0.0) + widest + TICK_GAP;
}

double chart_foot_height(const chart_panel *panel)
{
    double height = 0.0;

    if (!panel->has_x_labels)
        return 0.0;
    height = TICK_GAP + chart_leading(&TICKS) * (panel->chart->x.is_time ? 2.0 : 1.0);
    return *panel->chart->x.label == '\0' ? height : height + chart_leading(&LABEL) + 4.0;
}

void chart_axes(chart_canvas *canvas, const chart_panel *panel)
{
    chart_tick x[CHART_TICKS_MAX], y[CHART_TICKS_MAX];
    const size_t x_count = x_ticks(panel, x);
    const size_t y_count = y_ticks(panel, y);

    draw_grid(canvas, panel, x, x_count, y, y_count);
    draw_frame(canvas, panel);
    for (size_t i = 0; i < y_count; i++)
        chart_text(canvas, &TICKS_LEFT, panel->plot.left - TICK_GAP,
                   chart_py(panel, y[i].at) + 0.35 * CHART_SMALL, NAME_MOST, y[i].text);
    label_y(canvas, panel, panel->plot.left - panel->left_width);
    if (panel->has_x_labels)
        label_x(canvas, panel, x, x_count);
}
