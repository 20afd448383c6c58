/* SPDX-License-Identifier: MIT */
/* book_chart.c - a chart of a report as a sheet: its points, and a native chart beside them. */
#include "output/book_chart_internal.h"

#include <math.h>
#include <stdlib.h>
#include <string.h>

#define WIDTH      2.0 /* of the chart, in those of Excel's own size */
#define HEIGHT     1.8
#define LINE_WIDTH 2.0F
#define LINE_HEIGHT 15.0 /* points, of a row */

/* Okabe and Ito (2008), as in the drawings. */
static const lxw_color_t COLOURS[] = {0x0072B2, 0xD55E00, 0x009E73, 0xCC79A7, 0xE69F00, 0x56B4E9, 0x000000};

static bool all_bars(const report_chart *chart)
{
    for (size_t i = 0; i < chart->series_count; i++)
        if (chart->series[i].kind != REPORT_BARS)
            return false;
    return chart->series_count > 0;
}

static lxw_chart_series *draw_series(book_points *t, book_place at)
{
    /* Bars along x have their categories on y. */
    const bool across = t->is_bars && t->chart->y.name_count > 0;
    lxw_chart_series *series = chart_add_series(t->drawn, NULL, NULL);

    if (series == NULL) {
        t->s.b->failed = true;
        return NULL;
    }
    chart_series_set_categories(series, t->s.name, BOOK_CHART_HEAD, across ? at.y : at.x, at.last,
                                across ? at.y : at.x);
    chart_series_set_values(series, t->s.name, BOOK_CHART_HEAD, across ? at.x : at.y, at.last,
                            across ? at.x : at.y);
    chart_series_set_name_range(series, t->s.name, BOOK_CHART_HEAD - 1, at.y);
    return series;
}

static void style_series(lxw_chart_series *series, report_series_kind kind, size_t index)
{
    const lxw_color_t rgb = COLOURS[index % (sizeof COLOURS / sizeof *COLOURS)];
    lxw_chart_line line = {.color = rgb, .width = LINE_WIDTH, .none = kind == REPORT_POINTS};
    lxw_chart_fill fill = {.color = rgb};

    if (kind == REPORT_BARS) {
        chart_series_set_fill(series, &fill);
        return;
    }
    chart_series_set_line(series, &line);
    chart_series_set_marker_type(series,
                                 kind == REPORT_POINTS ? LXW_CHART_MARKER_AUTOMATIC : LXW_CHART_MARKER_NONE);
}

/* A curve with a gap, or a point with its region, is several series of one name: the first of them. */
static size_t first_of_name(const report_chart *chart, size_t index)
{
    size_t first = 0;

    while (strcmp(chart->series[first].label, chart->series[index].label) != 0)
        first++;
    return first;
}

/* The legend has each name once, and none without a name. */
static void thin_legend(const book_points *t)
{
    const report_chart *chart = t->chart;
    int16_t *away = calloc(chart->series_count + 1, sizeof *away);
    size_t count = 0;
    int16_t drawn = 0;

    if (away == NULL) {
        t->s.b->failed = true;
        return;
    }
    for (size_t i = 0; i < chart->series_count; i++) {
        if (chart->series[i].point_count == 0)
            continue;
        if (first_of_name(chart, i) < i || *chart->series[i].label == '\0')
            away[count++] = drawn;
        drawn++;
    }
    away[count] = -1;
    if (count > 0)
        book_check(t->s.b, chart_legend_delete_series(t->drawn, away));
    free(away);
}

/* A mark as a series of its own: a line from end to end, or a point. */
static void put_mark(book_points *t, const report_mark *mark)
{
    report_point points[2] = {{mark->x, mark->y}, {mark->x, mark->y}};
    report_series series = {mark->label, mark->kind == REPORT_MARK_POINT ? REPORT_POINTS : REPORT_LINE,
                            points, mark->kind == REPORT_MARK_POINT ? 1 : 2};
    lxw_chart_line line = {.color = 0x444444, .width = 1.0F, .dash_type = LXW_CHART_LINE_DASH_DASH};

    if (mark->kind == REPORT_MARK_X)
        book_range(t->chart, false, &points[0].y, &points[1].y);
    if (mark->kind == REPORT_MARK_Y)
        book_range(t->chart, true, &points[0].x, &points[1].x);
    const book_place at = book_put_extra(t, &series);
    lxw_chart_series *drawn = t->is_bars ? NULL : draw_series(t, at);
    if (drawn == NULL)
        return;
    if (mark->kind == REPORT_MARK_POINT)
        style_series(drawn, REPORT_POINTS, 0);
    else
        chart_series_set_line(drawn, &line);
}

/* A name beginning with '=' would be taken for a formula. */
static char *safe_name(book *b, const char *label, const char *unit)
{
    char text[200];

    if (*unit == '\0')
        (void)snprintf(text, sizeof text, "%s%.120s", *label == '=' ? " " : "", label);
    else
        (void)snprintf(text, sizeof text, "%s%.120s (%.60s)", *label == '=' ? " " : "", label, unit);
    return book_text(b, text, sizeof text);
}

static void name_axis(book *b, lxw_chart_axis *to, const report_axis *axis)
{
    char *name = safe_name(b, axis->label, axis->unit);

    if (name != NULL && *name != '\0')
        chart_axis_set_name(to, name);
    if (axis->is_time)
        chart_axis_set_num_format(to, "yyyy\\-mm\\-dd");
    free(name);
}

static void name_chart(book_points *t)
{
    char *title = safe_name(t->s.b, t->chart->title, "");
    const bool across = t->is_bars && t->chart->y.name_count > 0;

    if (title != NULL && *title != '\0')
        chart_title_set_name(t->drawn, title);
    /* libxlsxwriter's x lies level in every chart: it makes the categories of bars along x its y itself. */
    name_axis(t->s.b, t->drawn->x_axis, &t->chart->x);
    name_axis(t->s.b, t->drawn->y_axis, &t->chart->y);
    if (across)
        chart_axis_set_reverse(t->drawn->y_axis); /* names are read from above */
    free(title);
}

/* Of its own accord a spreadsheet begins most axes at 0, where there is nothing to see. */
static void set_range(const report_chart *chart, bool of_x, lxw_chart_axis *to)
{
    const report_axis *axis = of_x ? &chart->x : &chart->y;
    double low = 0.0, high = 0.0;

    book_range(chart, of_x, &low, &high);
    if (axis->is_time || !(high > low))
        return;
    const double step = axis->fixed ? 0.0 : pow(10.0, floor(log10(high - low)));
    chart_axis_set_min(to, axis->fixed ? low : step * floor(low / step));
    chart_axis_set_max(to, axis->fixed ? high : step * ceil(high / step));
}

static uint8_t type_of(const report_chart *chart)
{
    if (!all_bars(chart))
        return LXW_CHART_SCATTER_STRAIGHT;
    return chart->y.name_count > 0 ? LXW_CHART_BAR : LXW_CHART_COLUMN;
}

static void draw(book_points *t)
{
    const report_chart *chart = t->chart;
    lxw_chart_options options = {.x_scale = WIDTH, .y_scale = HEIGHT};
    book_place at = {0, 0, 0};

    for (size_t i = 0; i < chart->series_count; i++) {
        at = book_put_series(t, i, at);
        lxw_chart_series *series = chart->series[i].point_count > 0 ? draw_series(t, at) : NULL;
        if (series != NULL)
            style_series(series, chart->series[i].kind, first_of_name(chart, i));
    }
    for (size_t i = 0; i < chart->mark_count; i++)
        put_mark(t, &chart->marks[i]);
    name_chart(t);
    thin_legend(t);
    if (!t->is_bars) {
        set_range(chart, true, t->drawn->x_axis);
        set_range(chart, false, t->drawn->y_axis);
    }
    book_check(t->s.b, worksheet_insert_chart_opt(t->s.at, BOOK_CHART_HEAD, (lxw_col_t)(t->next + 1),
                                                  t->drawn, &options));
}

/* A chart without a series can be none of a spreadsheet's. */
static bool has_something(const book_points *t)
{
    for (size_t i = 0; i < t->chart->series_count; i++)
        if (t->chart->series[i].point_count > 0)
            return true;
    return t->chart->mark_count > 0 && !t->is_bars;
}

/* Names of axes fold in their columns, in the first row. */
static void raise_head(const book_points *t)
{
    const size_t x = strlen(t->chart->x.label), y = strlen(t->chart->y.label);
    const size_t lines = 1 + (x > y ? x : y) / BOOK_HEAD_WIDTH;

    if (t->s.at != NULL && lines > 1)
        book_check(t->s.b, worksheet_set_row(t->s.at, 0, LINE_HEIGHT * (double)lines, NULL));
}

void book_chart(book *b, const report_chart *chart)
{
    book_points t = {.chart = chart,
                     .is_bars = all_bars(chart),
                     .decimals_x = book_decimals(chart, true),
                     .decimals_y = book_decimals(chart, false)};
    const size_t columns = 2 * (chart->series_count + chart->mark_count);

    if (book_open_sheet(b, &t.s, *chart->title == '\0' ? chart->id : chart->title, columns)) {
        t.drawn = has_something(&t) ? workbook_add_chart(b->file, type_of(chart)) : NULL;
        if (t.drawn != NULL)
            draw(&t);
        b->failed = b->failed || (t.drawn == NULL && has_something(&t));
    }
    raise_head(&t);
    book_close_sheet(&t.s, BOOK_CHART_HEAD);
}
