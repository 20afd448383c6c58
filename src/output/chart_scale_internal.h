/* SPDX-License-Identifier: MIT */
/* chart_scale_internal.h - the ranges of axes and where their ticks stand; nothing of drawing. */
#ifndef CHART_SCALE_INTERNAL_H
#define CHART_SCALE_INTERNAL_H

#include <stdbool.h>
#include <stddef.h>

#include "output/report.h"

#define CHART_TICKS_MAX 40
#define CHART_VALUE_MAX 1e100 /* values beyond it, and what is not finite, are not drawn */

typedef struct {
    double low, high; /* low < high */
} chart_range;

typedef struct {
    double at;
    char text[72];
    char below[24]; /* of a time: the date or year, where it changes; else "" */
} chart_tick;

bool chart_drawable(double value);

/* What an axis shows: the fixed range, or all points and marks with some air around them. Bars start
 * at zero; data that are nowhere negative get no negative axis. */
chart_range chart_range_of(const report_chart *chart, report_axis_id axis);

/* The least distance between two neighbouring bars of a chart; 1 where there is none. */
double chart_bar_pitch(const report_chart *chart);

/* Whether bars lie: where the y axis has the names. */
bool chart_bars_lie(const report_chart *chart);

/* The least step of 1, 2 or 5 times a power of ten with which at most `wanted` >= 1 steps fill a span. */
double chart_step(double span, int wanted);

/* Ticks within the range, two at least and CHART_TICKS_MAX at most; about `wanted` >= 2 of them. */
size_t chart_number_ticks(chart_range range, int wanted, chart_tick ticks[CHART_TICKS_MAX]);

/* The same, maybe fewer, for seconds since 1970, at full minutes, hours, days, months or years. */
size_t chart_time_ticks(chart_range range, int wanted, chart_tick ticks[CHART_TICKS_MAX]);

#endif
