/* SPDX-License-Identifier: MIT */
/* json_chart.c - the charts of a report in JSON: what is drawn, as numbers. */
#include "output/json_internal.h"

static const char *const KINDS[] = {
    [REPORT_LINE] = "line",     [REPORT_POINTS] = "points",   [REPORT_BARS] = "bars",
    [REPORT_REGION] = "region", [REPORT_OUTLINE] = "outline", [REPORT_SPANS] = "spans",
};

static const char *const MARKS[] = {
    [REPORT_MARK_X] = "x", [REPORT_MARK_Y] = "y", [REPORT_MARK_POINT] = "point"};

static json_t *axis_of(const report_axis *axis, bool *failed)
{
    json_t *object = json_object();

    put(object, "label", text_of(axis->label), failed);
    put(object, "unit", *axis->unit == '\0' ? json_null() : text_of(axis->unit), failed);
    if (axis->is_time)
        put(object, "time", json_true(), failed);
    if (axis->name_count > 0) {
        json_t *names = json_array();

        for (size_t i = 0; i < axis->name_count; i++)
            append(names, text_of(axis->names[i]), failed);
        put(object, "names", names, failed);
    }
    return object;
}

static json_t *point_of(const report_point *point, bool *failed)
{
    json_t *pair = json_array();

    append(pair, number_of(point->x), failed);
    append(pair, number_of(point->y), failed);
    return pair;
}

static json_t *series_of(const report_series *series, bool *failed)
{
    json_t *object = json_object();
    json_t *points = json_array();

    for (size_t i = 0; i < series->point_count; i++)
        append(points, point_of(&series->points[i], failed), failed);
    put(object, "label", text_of(series->label), failed);
    put(object, "kind", json_string(KINDS[series->kind]), failed);
    put(object, "points", points, failed);
    return object;
}

static json_t *mark_of(const report_mark *mark, bool *failed)
{
    json_t *object = json_object();

    put(object, "label", text_of(mark->label), failed);
    put(object, "kind", json_string(MARKS[mark->kind]), failed);
    put(object, "x", mark->kind == REPORT_MARK_Y ? json_null() : number_of(mark->x), failed);
    put(object, "y", mark->kind == REPORT_MARK_X ? json_null() : number_of(mark->y), failed);
    return object;
}

static json_t *chart_of(const report_chart *chart, bool *failed)
{
    json_t *object = json_object();
    json_t *series = json_array();
    json_t *marks = json_array();

    for (size_t i = 0; i < chart->series_count; i++)
        append(series, series_of(&chart->series[i], failed), failed);
    for (size_t i = 0; i < chart->mark_count; i++)
        append(marks, mark_of(&chart->marks[i], failed), failed);
    put(object, "id", text_of(chart->id), failed);
    put(object, "title", text_of(chart->title), failed);
    put(object, "x", axis_of(&chart->x, failed), failed);
    put(object, "y", axis_of(&chart->y, failed), failed);
    put(object, "series", series, failed);
    put(object, "marks", marks, failed);
    return object;
}

json_t *json_charts(const report *r, bool *failed)
{
    json_t *array = json_array();

    for (size_t i = 0; i < r->chart_count; i++)
        append(array, chart_of(&r->charts[i], failed), failed);
    return array;
}
