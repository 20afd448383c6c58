/* SPDX-License-Identifier: MIT */
/* report_chart.c - the charts of a report: copied in, or dropped when memory is short. */
#include "output/report.h"

#include "output/report_internal.h"

#include <assert.h>
#include <math.h>
#include <stdlib.h>

static void free_axis(report_axis *axis)
{
    for (size_t i = 0; i < axis->name_count; i++)
        free(axis->names[i]);
    free(axis->names);
    free(axis->label);
    free(axis->unit);
}

void report_free_chart(report_chart *chart)
{
    for (size_t i = 0; i < chart->series_count; i++) {
        free(chart->series[i].label);
        free(chart->series[i].points);
    }
    for (size_t i = 0; i < chart->mark_count; i++)
        free(chart->marks[i].label);
    free(chart->series);
    free(chart->marks);
    free_axis(&chart->x);
    free_axis(&chart->y);
    free(chart->id);
    free(chart->title);
}

/* The chart with an index handed out earlier; NULL when a failed allocation left none. */
static report_chart *chart_at(const report *r, size_t chart)
{
    assert(chart < r->chart_count || r->failed);
    return chart < r->chart_count ? &r->charts[chart] : NULL;
}

static report_axis *axis_at(const report *r, size_t chart, report_axis_id axis)
{
    report_chart *at = chart_at(r, chart);

    if (at == NULL)
        return NULL;
    return axis == REPORT_X ? &at->x : &at->y;
}

/* Labels and units are there from the start, so that no reader meets NULL. */
static bool open_axis(report *r, report_axis *axis)
{
    axis->label = report_copy(r, "");
    axis->unit = report_copy(r, "");
    return axis->label != NULL && axis->unit != NULL;
}

size_t report_add_chart(report *r, const char *id, const char *title)
{
    report_chart chart = {.id = report_copy(r, id), .title = report_copy(r, title)};
    const bool has_x = open_axis(r, &chart.x);
    const bool has_y = open_axis(r, &chart.y);
    report_chart *charts = report_grow(r, r->charts, r->chart_count, sizeof chart);

    if (charts != NULL)
        r->charts = charts;
    if (charts == NULL || chart.id == NULL || chart.title == NULL || !has_x || !has_y) {
        report_free_chart(&chart);
        return (size_t)-1;
    }
    charts[r->chart_count] = chart;
    return r->chart_count++;
}

void report_set_axis(report *r, size_t chart, report_axis_id axis, const char *label, const char *unit)
{
    report_axis *to = axis_at(r, chart, axis);
    char *new_label = report_copy(r, label);
    char *new_unit = report_copy(r, unit);

    if (to == NULL || new_label == NULL || new_unit == NULL) {
        free(new_label);
        free(new_unit);
        return;
    }
    free(to->label);
    free(to->unit);
    to->label = new_label;
    to->unit = new_unit;
}

void report_set_range(report *r, size_t chart, report_axis_id axis, double low, double high)
{
    report_axis *to = axis_at(r, chart, axis);

    assert(isfinite(low) && isfinite(high) && low < high);
    if (to == NULL)
        return;
    to->fixed = true;
    to->low = low;
    to->high = high;
}

void report_set_time(report *r, size_t chart)
{
    report_axis *to = axis_at(r, chart, REPORT_X);

    if (to != NULL)
        to->is_time = true;
}

void report_add_name(report *r, size_t chart, report_axis_id axis, const char *name)
{
    report_axis *to = axis_at(r, chart, axis);
    char **names = to == NULL ? NULL : report_grow(r, to->names, to->name_count, sizeof *names);

    if (names == NULL)
        return;
    to->names = names;
    names[to->name_count] = report_copy(r, name);
    if (names[to->name_count] != NULL)
        to->name_count++;
}

size_t report_add_series(report *r, size_t chart, report_series_kind kind, const char *label)
{
    report_chart *to = chart_at(r, chart);
    report_series *all = to == NULL ? NULL : report_grow(r, to->series, to->series_count, sizeof *all);

    if (all == NULL)
        return (size_t)-1;
    to->series = all;

    report_series series = {.label = report_copy(r, label), .kind = kind};
    if (series.label == NULL)
        return (size_t)-1;
    all[to->series_count] = series;
    return to->series_count++;
}

void report_add_point(report *r, size_t chart, size_t series, double x, double y)
{
    const report_chart *in = chart_at(r, chart);

    assert(isfinite(x) && isfinite(y));
    if (in == NULL)
        return;
    assert(series < in->series_count || r->failed);
    if (series >= in->series_count)
        return;

    report_series *to = &in->series[series];
    report_point *points = report_grow(r, to->points, to->point_count, sizeof *points);
    if (points == NULL)
        return;
    to->points = points;
    points[to->point_count++] = (report_point){x, y};
}

void report_add_mark(report *r, size_t chart, report_mark_kind kind, double x, double y, const char *label)
{
    report_chart *to = chart_at(r, chart);
    report_mark *marks = to == NULL ? NULL : report_grow(r, to->marks, to->mark_count, sizeof *marks);

    assert(isfinite(x) && isfinite(y));
    if (marks == NULL)
        return;
    to->marks = marks;

    const report_mark mark = {.label = report_copy(r, label),
                              .kind = kind,
                              .x = kind == REPORT_MARK_Y ? 0.0 : x,
                              .y = kind == REPORT_MARK_X ? 0.0 : y};
    if (mark.label != NULL)
        marks[to->mark_count++] = mark;
}
