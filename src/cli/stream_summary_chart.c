/* SPDX-License-Identifier: MIT */
/* stream_summary_chart.c - trend of each figure with its limits, and how it is spread. */
#include "cli/stream_summary.h"

#include "bluecone/log.h"

#include <stdio.h>
#include <string.h>

#define BARS 24
#define TREND_MAX TALLY_TREND_MAX

/* A figure being drawn. */
typedef struct {
    report *r;
    const tally *t;
    const tally_plan *plan;
    tally_cover cover;
    size_t figure, chart;
} drawing;

static const tally_figure_name *name_of(const drawing *d)
{
    return &d->plan->figures[d->figure];
}

static void open_chart(drawing *d, const char *kind, const char *before)
{
    char id[40];
    char title[BC_LIMIT_ID_MAX + 40];

    (void)snprintf(id, sizeof id, "%s-%zu", kind, d->figure + 1);
    (void)snprintf(title, sizeof title, "%s%s", before, name_of(d)->id);
    d->chart = report_add_chart(d->r, id, title);
}

/* The limit that this figure is held to, at the same state and in the same unit; NULL when there is none. */
static const tally_limit_name *limit_of(const drawing *d)
{
    for (size_t i = 0; i < d->plan->limit_count; i++) {
        const tally_limit_name *limit = &d->plan->limits[i];

        if (limit->state[0] == '\0' && strcmp(limit->id, name_of(d)->id) == 0 && strcmp(limit->unit, name_of(d)->unit) == 0)
            return limit;
    }
    return NULL;
}

/* One step of the trend as it is drawn. */
typedef struct {
    double x, low, mean, high;
} point;

/* Steps from `from` on that have the figure, up to the next gap; where the next ones begin. */
static size_t take_stretch(const drawing *d, size_t from, point points[], size_t *count, bool *one_row)
{
    tally_span before = {.last_s = 0.0};
    size_t i = from;

    *count = 0;
    for (; i < tally_trend_count(d->t); i++) {
        tally_span span;
        tally_spread s;

        tally_trend_at(d->t, i, &span);
        if (i > from && d->cover.timed && span.first_s - before.last_s > BC_LOG_GAP * d->plan->step_s)
            break;
        before = span;
        tally_trend_spread(d->t, i, d->figure, &s);
        if (!s.has_mean)
            continue;
        points[(*count)++] = (point){0.5 * (span.first_s + span.last_s), s.min, s.mean, s.max};
        *one_row = *one_row && s.rows <= 1;
    }
    return i;
}

/* The band from the least to the most of each step: out along the top, back along the bottom. */
static void draw_band(const drawing *d, const point points[], size_t count)
{
    const size_t series = report_add_series(d->r, d->chart, REPORT_REGION, "least to most");

    for (size_t i = 0; i < count; i++)
        report_add_point(d->r, d->chart, series, points[i].x, points[i].high);
    for (size_t i = count; i > 0; i--)
        report_add_point(d->r, d->chart, series, points[i - 1].x, points[i - 1].low);
}

static void draw_mean(const drawing *d, const point points[], size_t count, const char *label)
{
    const size_t series = report_add_series(d->r, d->chart, REPORT_LINE, label);

    for (size_t i = 0; i < count; i++)
        report_add_point(d->r, d->chart, series, points[i].x, points[i].mean);
}

static void draw_stretches(const drawing *d)
{
    point points[TREND_MAX];
    bool one_row = true;
    size_t count = 0;

    for (size_t i = 0; i < tally_trend_count(d->t);)
        i = take_stretch(d, i, points, &count, &one_row);
    for (size_t i = 0; i < tally_trend_count(d->t);) {
        i = take_stretch(d, i, points, &count, &one_row);
        if (count > 0)
            draw_mean(d, points, count, one_row ? name_of(d)->id : "mean");
    }
    for (size_t i = 0; i < tally_trend_count(d->t) && !one_row;) {
        i = take_stretch(d, i, points, &count, &one_row);
        if (count > 1)
            draw_band(d, points, count);
    }
}

/* A bound with its figure, which nobody should have to read off an axis. */
static void mark(const drawing *d, report_mark_kind kind, const char *word, double bound)
{
    char label[32];

    (void)snprintf(label, sizeof label, "%s %.6g", word, bound);
    report_add_mark(d->r, d->chart, kind, kind == REPORT_MARK_X ? bound : 0.0, kind == REPORT_MARK_Y ? bound : 0.0, label);
}

static void draw_trend(drawing *d)
{
    const tally_limit_name *limit = limit_of(d);

    open_chart(d, "trend", "");
    report_set_axis(d->r, d->chart, REPORT_X, d->plan->zoned ? "time, UTC" : "time of the log", "");
    report_set_time(d->r, d->chart);
    report_set_axis(d->r, d->chart, REPORT_Y, name_of(d)->id, summary_unit(name_of(d)->unit));
    draw_stretches(d);
    if (limit && limit->has_min)
        mark(d, REPORT_MARK_Y, "min", limit->min);
    if (limit && limit->has_max)
        mark(d, REPORT_MARK_Y, "max", limit->max);
}

/* A bound so far off that the bars would shrink to a line is left to the trend. */
static void mark_near(const drawing *d, bool there, double bound, const tally_spread *s, const char *word)
{
    const double span = s->max - s->min;

    if (there && bound >= s->min - span && bound <= s->max + span)
        mark(d, REPORT_MARK_X, word, bound);
}

static void draw_spread(drawing *d, const tally_spread *s)
{
    const double width = (s->max - s->min) / BARS;
    const tally_limit_name *limit = limit_of(d);
    double held[BARS];

    tally_bars(d->t, d->figure, s->min, s->max, BARS, held);
    open_chart(d, "spread", d->cover.timed ? "Hours by " : "Rows by ");
    report_set_axis(d->r, d->chart, REPORT_X, name_of(d)->id, summary_unit(name_of(d)->unit));
    report_set_axis(d->r, d->chart, REPORT_Y, d->cover.timed ? "time" : "rows", d->cover.timed ? "h" : "");
    const size_t series = report_add_series(d->r, d->chart, REPORT_BARS, "");

    for (size_t i = 0; i < BARS; i++)
        report_add_point(d->r, d->chart, series, s->min + ((double)i + 0.5) * width, summary_held(&d->cover, held[i]));
    if (limit) {
        mark_near(d, limit->has_min, limit->min, s, "min");
        mark_near(d, limit->has_max, limit->max, s, "max");
    }
}

void summary_charts(report *r, const tally *t)
{
    drawing d = {.r = r, .t = t, .plan = tally_plan_of(t)};
    tally_spread s;

    tally_covers(t, &d.cover);
    for (d.figure = 0; d.figure < d.plan->figure_count && tally_trend_count(t) > 1; d.figure++) {
        tally_spreads(t, d.figure, &s);
        if (s.has_mean)
            draw_trend(&d);
    }
    for (d.figure = 0; d.figure < d.plan->figure_count; d.figure++) { /* a figure that never moves has no spread */
        tally_spreads(t, d.figure, &s);
        if (s.has_mean && s.max > s.min)
            draw_spread(&d, &s);
    }
}
