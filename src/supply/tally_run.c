/* SPDX-License-Identifier: MIT */
/* tally_run.c - stretches of broken rows, joined and ordered. */
#include "supply/tally_run.h"

#include <math.h>
#include <stdlib.h>

static double margin(const tally_limit_name *limit, double value)
{
    const double below = limit->has_min ? value - limit->min : HUGE_VAL;
    const double above = limit->has_max ? limit->max - value : HUGE_VAL;

    return fmin(below, above);
}

void tally_stretch_join(tally_stretch *s, const tally_stretch *more, const tally_limit_name *limit)
{
    if (more->rows == 0)
        return;
    if (s->rows == 0) {
        *s = *more;
        return;
    }
    const double margin_now = margin(limit, s->worst);
    const double margin_more = margin(limit, more->worst);

    if (margin_more < margin_now || (margin_more <= margin_now && more->worst_ms < s->worst_ms)) {
        s->worst = more->worst;
        s->worst_ms = more->worst_ms;
    }
    s->rows += more->rows;
    s->weight += more->weight;
    tally_sum_join(&s->energy, &more->energy);
    if (more->from_ms < s->from_ms)
        s->from_ms = more->from_ms;
    if (more->last_ms > s->last_ms)
        s->last_ms = more->last_ms;
    if (more->until_ms > s->until_ms)
        s->until_ms = more->until_ms;
    s->open_at_end = more->open_at_end;
}

bool tally_stretch_before(const tally_stretch *a, const tally_stretch *b)
{
    if (a->weight != b->weight)
        return a->weight > b->weight;
    if (a->from_ms != b->from_ms)
        return a->from_ms < b->from_ms;
    if (a->limit != b->limit)
        return a->limit < b->limit;
    if (a->rows != b->rows)
        return a->rows > b->rows;
    if (a->worst < b->worst || a->worst > b->worst)
        return a->worst > b->worst;
    return tally_sum_value(&a->energy) > tally_sum_value(&b->energy);
}

bool tally_longest_open(tally_longest *l)
{
    l->count = 0;
    l->kept = malloc(TALLY_RUN_MAX * sizeof *l->kept);
    return l->kept != NULL;
}

void tally_longest_close(tally_longest *l)
{
    free(l->kept);
    l->kept = NULL;
    l->count = 0;
}

static void swap(tally_stretch *a, tally_stretch *b)
{
    const tally_stretch kept = *a;

    *a = *b;
    *b = kept;
}

/* A new leaf goes up while it is less than what is above it. */
static void rise(tally_longest *l)
{
    for (size_t i = l->count - 1; i > 0 && tally_stretch_before(&l->kept[(i - 1) / 2], &l->kept[i]); i = (i - 1) / 2)
        swap(&l->kept[(i - 1) / 2], &l->kept[i]);
}

/* A new top goes down while something below it is less. */
static void sink(tally_longest *l)
{
    for (size_t i = 0, child = 1; child < l->count; i = child, child = 2 * i + 1) {
        if (child + 1 < l->count && tally_stretch_before(&l->kept[child], &l->kept[child + 1]))
            child++;
        if (!tally_stretch_before(&l->kept[i], &l->kept[child]))
            return;
        swap(&l->kept[i], &l->kept[child]);
    }
}

void tally_longest_add(tally_longest *l, const tally_stretch *s)
{
    if (l->count < TALLY_RUN_MAX) {
        l->kept[l->count++] = *s;
        rise(l);
    } else if (tally_stretch_before(s, &l->kept[0])) {
        l->kept[0] = *s;
        sink(l);
    }
}

static int compare(const void *a, const void *b)
{
    const tally_stretch *x = a;
    const tally_stretch *y = b;
    const int by_time = (x->from_ms > y->from_ms) - (x->from_ms < y->from_ms);
    const int by_limit = (x->limit > y->limit) - (x->limit < y->limit);

    return by_time != 0 ? by_time : by_limit != 0 ? by_limit : tally_stretch_before(y, x) - tally_stretch_before(x, y);
}

void tally_longest_sort(tally_longest *l)
{
    if (l->count > 0)
        qsort(l->kept, l->count, sizeof *l->kept, compare);
}
