/* SPDX-License-Identifier: MIT */
/* contract_log_chart.c - trend of each limited figure with its limits, and how it is spread. */
#include "cli/contract_log.h"

#include <math.h>
#include <stdio.h>
#include <string.h>

#define TREND_POINTS 1500 /* about two on a pixel; more rows are drawn by the least and the most of each few */
#define BINS 24
#define HOUR_S 3600.0

/* A log's figure being drawn. */
typedef struct {
    report *r;
    const bc_log *log;
    size_t limit, rows;
    size_t chart, series;
    const bc_limit *of;
} trend;

static void set_axis(const log_case *l, trend *t, report_axis_id axis)
{
    char state[64];
    char label[BC_LIMIT_ID_MAX + 80];

    contract_state_text(l->c->contract, t->of, state, sizeof state);
    (void)snprintf(label, sizeof label, "%s%s%s", t->of->id, state[0] ? ", " : "", state);
    report_set_axis(t->r, t->chart, axis, label, strcmp(t->of->unit, "1") == 0 ? "" : t->of->unit);
}

static void add_bound(const trend *t, report_mark_kind kind, const char *word, double bound)
{
    char label[32];

    (void)snprintf(label, sizeof label, "%s %.6g", word, bound);
    report_add_mark(t->r, t->chart, kind, kind == REPORT_MARK_X ? bound : 0.0, kind == REPORT_MARK_Y ? bound : 0.0, label);
}

static void add_bounds(const trend *t)
{
    if (t->of->has_min)
        add_bound(t, REPORT_MARK_Y, "min", t->of->min);
    if (t->of->has_max)
        add_bound(t, REPORT_MARK_Y, "max", t->of->max);
}

static void add_point(const trend *t, size_t row)
{
    double time = 0.0;
    double held = 0.0;
    double value = 0.0;

    (void)bc_log_held(t->log, row, &time, &held);
    if (bc_log_value(t->log, row, t->limit, &value))
        report_add_point(t->r, t->chart, t->series, time, value);
}

/* Some rows without a gap by their least and their most, in the order of time: no excursion is thinned out. */
static void add_few(const trend *t, size_t from, size_t to)
{
    size_t least = from;
    size_t most = from;
    double low = HUGE_VAL;
    double high = -HUGE_VAL;

    for (size_t i = from; i < to; i++) {
        double value = 0.0;

        if (!bc_log_value(t->log, i, t->limit, &value))
            continue;
        if (value < low) {
            low = value;
            least = i;
        }
        if (value > high) {
            high = value;
            most = i;
        }
    }
    add_point(t, least < most ? least : most);
    if (least != most)
        add_point(t, least < most ? most : least);
}

/* Rows up to the next gap, at most `few` of them. */
static size_t end_of(const trend *t, size_t from, size_t few, bool *gap)
{
    double time = 0.0;
    double held = 0.0;
    size_t to = from;

    *gap = false;
    while (to < t->rows && to < from + few && !*gap)
        *gap = bc_log_held(t->log, to++, &time, &held);
    return to;
}

static void add_trend(const log_case *l, report *r, size_t limit, size_t rows)
{
    trend t = {.r = r, .log = l->log, .limit = limit, .rows = rows, .of = &l->c->contract->limits[limit]};
    const size_t few = rows > TREND_POINTS ? (2 * rows + TREND_POINTS - 1) / TREND_POINTS : 1;
    char id[40];
    bool gap = true;

    (void)snprintf(id, sizeof id, "trend-%zu", limit + 1);
    t.chart = report_add_chart(r, id, t.of->id);
    report_set_axis(r, t.chart, REPORT_X, l->zoned ? "time, UTC" : "time of the log", "");
    report_set_time(r, t.chart);
    set_axis(l, &t, REPORT_Y);
    for (size_t from = 0; from < rows;) {
        if (gap)
            t.series = report_add_series(r, t.chart, REPORT_LINE, t.of->id);
        const size_t to = end_of(&t, from, few, &gap);

        add_few(&t, from, to);
        from = to;
    }
    add_bounds(&t);
}

/* A bound so far off that the bars would shrink to a line is left to the trend. */
static void add_near_bounds(const trend *t, const bc_log_distribution *d)
{
    const double span = d->max - d->min;

    if (t->of->has_min && t->of->min >= d->min - span && t->of->min <= d->max + span)
        add_bound(t, REPORT_MARK_X, "min", t->of->min);
    if (t->of->has_max && t->of->max >= d->min - span && t->of->max <= d->max + span)
        add_bound(t, REPORT_MARK_X, "max", t->of->max);
}

static void add_histogram(const log_case *l, report *r, size_t limit, const bc_log_distribution *d)
{
    trend t = {.r = r, .log = l->log, .limit = limit, .of = &l->c->contract->limits[limit]};
    double hours[BINS] = {0.0};
    const double width = (d->max - d->min) / BINS;
    bc_log_cover cover;
    char id[40];
    char title[BC_LIMIT_ID_MAX + 40];

    bc_log_covers(l->log, &cover);
    for (size_t i = 0; i < cover.rows; i++) {
        double time = 0.0;
        double held = 0.0;
        double value = 0.0;

        (void)bc_log_held(l->log, i, &time, &held);
        if (bc_log_value(l->log, i, limit, &value))
            hours[(size_t)fmin(BINS - 1.0, (value - d->min) / width)] += held / HOUR_S;
    }
    (void)snprintf(id, sizeof id, "spread-%zu", limit + 1);
    (void)snprintf(title, sizeof title, "Hours by %s", t.of->id);
    t.chart = report_add_chart(r, id, title);
    set_axis(l, &t, REPORT_X);
    report_set_axis(r, t.chart, REPORT_Y, "time", "h");
    t.series = report_add_series(r, t.chart, REPORT_BARS, "");
    for (size_t i = 0; i < BINS; i++)
        report_add_point(r, t.chart, t.series, d->min + ((double)i + 0.5) * width, hours[i]);
    add_near_bounds(&t, d);
}

void log_charts(const log_case *l, report *r)
{
    const bc_contract *c = l->c->contract;
    bc_log_distribution d;
    bc_log_cover cover;

    bc_log_covers(l->log, &cover);
    for (size_t i = 0; i < c->limit_count; i++)
        if (bc_log_distribute(l->log, i, &d, NULL) == BC_OK)
            add_trend(l, r, i, cover.rows);
    for (size_t i = 0; i < c->limit_count; i++) /* a figure that never moves has no spread */
        if (bc_log_distribute(l->log, i, &d, NULL) == BC_OK && d.max > d.min && cover.held_s > 0.0)
            add_histogram(l, r, i, &d);
}
