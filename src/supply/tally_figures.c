/* SPDX-License-Identifier: MIT */
/* tally_figures.c - what a settled tally says. */
#include "supply/tally_internal.h"

#include "supply/tally_calendar.h"

#include <math.h>

/* Weights to seconds, or rows. */
static double held(const tally *t, uint64_t weight)
{
    return (double)weight / (t->step_ms > 0 ? TALLY_MS : 1.0);
}

static double energy(const tally *t, const tally_sum *e)
{
    return t->step_ms > 0 ? tally_sum_value(e) / TALLY_MS : 0.0;
}

void tally_covers(const tally *t, tally_cover *cover)
{
    const tally_group *w = t->whole;

    *cover = (tally_cover){.rows = w->rows, .refused = t->refused, .flows = t->flows, .outside = w->outside};
    cover->has_time = t->last_ms >= 0;
    if (cover->has_time) {
        cover->first_s = (double)t->first_ms / TALLY_MS;
        cover->last_s = (double)t->last_ms / TALLY_MS;
    }
    cover->timed = t->step_ms > 0;
    cover->held = held(t, w->weight);
    cover->outside_held = held(t, w->outside_weight);
    cover->gaps = t->gaps;
    cover->gap_s = (double)t->gap_ms / TALLY_MS;
    cover->repeats = t->repeats;
    cover->backs = t->backs;
    cover->untimed = t->untimed;
    cover->energy_j = energy(t, &w->energy);
}

uint64_t tally_flagged(const tally *t, size_t flag)
{
    return t->flagged[flag];
}

/* Variance W^-2 (W sum(w x^2) - sum(w x)^2), the difference from products with their errors: it may be ten orders of
 * magnitude smaller than they are. */
static double deviation(const tally_cell *c)
{
    const double weight = (double)c->weight;
    const double first = tally_sum_value(&c->wx);
    const double first_error = c->wx.error - (first - c->wx.sum);
    const double second = tally_sum_value(&c->wxx);
    const double second_error = c->wxx.error - (second - c->wxx.sum);
    const double a = weight * second;
    const double b = first * first;
    const tally_split w = tally_split_of(weight);
    const tally_split f = tally_split_of(first);
    const double a_error = tally_product_error(w, tally_split_of(second), a) + weight * second_error;
    const double b_error = tally_product_error(f, f, b) + 2.0 * first * first_error;
    const double difference = (a - b) + (a_error - b_error);

    return c->max > c->min && difference > 0.0 ? sqrt(difference) / weight : 0.0;
}

static void spread_of(const tally *t, const tally_cell *c, tally_spread *s)
{
    *s = (tally_spread){.rows = c->rows, .held = held(t, c->weight), .has_mean = c->weight > 0, .has_energy_mean = c->e.sum > 0.0};
    if (c->rows == 0)
        return;
    if (s->has_mean) {
        s->mean = fmin(fmax(tally_sum_value(&c->wx) / (double)c->weight, c->min), c->max);
        s->sd = deviation(c);
    }
    if (s->has_energy_mean)
        s->energy_mean = fmin(fmax(tally_sum_value(&c->ex) / tally_sum_value(&c->e), c->min), c->max);
    s->min = c->min;
    s->max = c->max;
    s->min_timed = c->min_ms != TALLY_NO_TIME;
    s->max_timed = c->max_ms != TALLY_NO_TIME;
    s->min_s = s->min_timed ? (double)c->min_ms / TALLY_MS : 0.0;
    s->max_s = s->max_timed ? (double)c->max_ms / TALLY_MS : 0.0;
}

void tally_spreads(const tally *t, size_t figure, tally_spread *spread)
{
    spread_of(t, &t->whole->cells[figure], spread);
}

static void span_of(const tally *t, const tally_group *g, tally_span *span)
{
    span->first_s = (double)g->first_ms / TALLY_MS;
    span->last_s = (double)g->last_ms / TALLY_MS;
    span->rows = g->rows;
    span->outside = g->outside;
    span->held = held(t, g->weight);
    span->outside_held = held(t, g->outside_weight);
    span->energy_j = energy(t, &g->energy);
}

size_t tally_period_count(const tally *t)
{
    return t->periods.count;
}

void tally_period_at(const tally *t, size_t period, tally_span *span)
{
    const tally_group *g = t->periods.groups[period];

    span_of(t, g, span);
    span->from_s = (double)tally_period_begin_ms(t->plan.by, g->key) / TALLY_MS;
    span->until_s = (double)tally_period_begin_ms(t->plan.by, g->key + 1) / TALLY_MS;
}

void tally_period_spread(const tally *t, size_t period, size_t figure, tally_spread *spread)
{
    spread_of(t, &t->periods.groups[period]->cells[figure], spread);
}

size_t tally_trend_count(const tally *t)
{
    return t->trend.count;
}

void tally_trend_at(const tally *t, size_t step, tally_span *span)
{
    const tally_group *g = t->trend.groups[step];
    const int64_t width = TALLY_TREND_MS << t->trend_doubled;

    span_of(t, g, span);
    span->from_s = (double)(g->key * width) / TALLY_MS;
    span->until_s = (double)((g->key + 1) * width) / TALLY_MS;
}

void tally_trend_spread(const tally *t, size_t step, size_t figure, tally_spread *spread)
{
    spread_of(t, &t->trend.groups[step]->cells[figure], spread);
}

void tally_outside(const tally *t, size_t limit, tally_excursions *e)
{
    const tally_beyond *b = &t->beyond[limit];
    tally_run run;

    *e = (tally_excursions){.judged = t->all_judged + b->judged, .judged_held = held(t, t->all_judged_weight + b->judged_weight)};
    e->broken = b->all.rows;
    e->runs = b->runs;
    if (e->broken == 0)
        return;
    tally_run_of(t, &b->all, &run);
    e->broken_held = run.held;
    e->broken_j = run.energy_j;
    e->has_time = run.has_time;
    e->first_s = run.from_s;
    e->last_s = run.has_time ? (double)b->all.last_ms / TALLY_MS : 0.0;
    e->worst = run.worst;
    e->worst_s = run.worst_s;
    tally_run_of(t, &b->longest, &run);
    e->longest = run.held;
    e->longest_from_s = run.from_s;
}

size_t tally_run_count(const tally *t)
{
    return t->longest.count;
}

void tally_run_at(const tally *t, size_t run, tally_run *out)
{
    tally_run_of(t, &t->longest.kept[run], out);
}
