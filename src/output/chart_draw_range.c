/* SPDX-License-Identifier: MIT */
/* chart_draw_range.c - what range of values an axis of a chart has to show. */
#include "output/chart_scale_internal.h"

#include <math.h>

#define AIR        0.05 /* of the span, beyond data that would else touch the frame */
#define TIME_LEAST 60.0 /* s */
#define SPAN_LEAST 1e-6 /* of the greatest value: less is noise of computing, not a change */

bool chart_drawable(double value)
{
    return fabs(value) <= CHART_VALUE_MAX;
}

bool chart_bars_lie(const report_chart *chart)
{
    return chart->y.name_count > 0;
}

static bool has_bars(const report_chart *chart)
{
    for (size_t i = 0; i < chart->series_count; i++)
        if (chart->series[i].kind == REPORT_BARS)
            return true;
    return false;
}

static double along(const report_point *point, bool x)
{
    return x ? point->x : point->y;
}

double chart_bar_pitch(const report_chart *chart)
{
    double pitch = 0.0;

    for (size_t i = 0; i < chart->series_count; i++) {
        const report_series *s = &chart->series[i];

        for (size_t p = 1; s->kind == REPORT_BARS && p < s->point_count; p++) {
            const bool x = !chart_bars_lie(chart);
            const double gap = fabs(along(&s->points[p], x) - along(&s->points[p - 1], x));

            if (chart_drawable(gap) && gap > 0.0 && (pitch == 0.0 || gap < pitch))
                pitch = gap;
        }
    }
    return pitch == 0.0 ? 1.0 : pitch;
}

/* An empty range is one with low > high. */
static void take(chart_range *range, double value)
{
    if (!chart_drawable(value))
        return;
    range->low = fmin(range->low, value);
    range->high = fmax(range->high, value);
}

static chart_range range_of_data(const report_chart *chart, report_axis_id axis)
{
    const report_mark_kind other = axis == REPORT_X ? REPORT_MARK_Y : REPORT_MARK_X;
    chart_range range = {HUGE_VAL, -HUGE_VAL};

    for (size_t i = 0; i < chart->series_count; i++)
        for (size_t p = 0; p < chart->series[i].point_count; p++)
            take(&range, along(&chart->series[i].points[p], axis == REPORT_X));
    for (size_t i = 0; i < chart->mark_count; i++)
        if (chart->marks[i].kind != other)
            take(&range, axis == REPORT_X ? chart->marks[i].x : chart->marks[i].y);
    return range;
}

/* A range that can be divided by its length. */
static chart_range widen(chart_range range, bool is_time)
{
    const double greatest = fmax(fabs(range.low), fabs(range.high));
    const double least = is_time ? TIME_LEAST : SPAN_LEAST * greatest;

    if (range.low > range.high)
        return is_time ? (chart_range){0.0, TIME_LEAST} : (chart_range){0.0, 1.0};
    if (range.high - range.low > least)
        return range;

    const double middle = range.low + (range.high - range.low) / 2.0;
    const double half = is_time ? TIME_LEAST / 2.0 : greatest > 0.0 ? AIR * greatest : 1.0;
    return (chart_range){middle - half, middle + half};
}

/* Only lines reach from edge to edge; a point on the frame is hard to see. */
static bool only_lines(const report_chart *chart)
{
    for (size_t i = 0; i < chart->series_count; i++)
        if (chart->series[i].kind != REPORT_LINE || chart->series[i].point_count == 1)
            return false;
    return true;
}

static chart_range add_air(chart_range range, double air)
{
    const chart_range wide = {range.low - air, range.high + air};

    return range.low >= 0.0 && wide.low < 0.0 ? (chart_range){0.0, wide.high} : wide;
}

chart_range chart_range_of(const report_chart *chart, report_axis_id axis)
{
    const report_axis *it = axis == REPORT_X ? &chart->x : &chart->y;
    const bool of_values = (axis == REPORT_X) == chart_bars_lie(chart);
    chart_range range = range_of_data(chart, axis);

    if (it->fixed && chart_drawable(it->low) && chart_drawable(it->high) && it->low < it->high)
        return (chart_range){it->low, it->high};
    if (it->name_count > 0)
        return (chart_range){-0.5, (double)it->name_count - 0.5};
    if (has_bars(chart) && !of_values) {
        const double half = chart_bar_pitch(chart) / 2.0;
        return widen((chart_range){range.low - half, range.high + half}, it->is_time);
    }
    if (has_bars(chart))
        take(&range, 0.0);
    range = widen(range, it->is_time);
    if (axis == REPORT_X && only_lines(chart))
        return range;
    return add_air(range, AIR * (range.high - range.low));
}
