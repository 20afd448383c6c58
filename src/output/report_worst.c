/* SPDX-License-Identifier: MIT */
/* report_worst.c - extremes over all allowed compositions, in a report. */
#include "output/report.h"

#include "output/report_internal.h"

#include <assert.h>
#include <math.h>
#include <stdlib.h>
#include <string.h>

static void free_fractions(report_fraction *fractions, size_t count)
{
    for (size_t i = 0; i < count; i++)
        free(fractions[i].id);
    free(fractions);
}

void report_free_worst(report_worst *worst)
{
    free(worst->id);
    free(worst->unit);
    free(worst->state);
    free_fractions(worst->at_min, worst->at_min_count);
    free_fractions(worst->at_max, worst->at_max_count);
}

size_t report_add_worst(report *r, const char *id, const char *unit, const char *state)
{
    report_worst *all = report_grow(r, r->worst, r->worst_count, sizeof *all);

    if (all == NULL)
        return (size_t)-1;
    r->worst = all;
    report_worst w = {.id = report_copy(r, id), .unit = report_copy(r, unit), .state = report_copy(r, state)};

    if (w.id == NULL || w.unit == NULL || w.state == NULL) {
        report_free_worst(&w);
        return (size_t)-1;
    }
    all[r->worst_count] = w;
    return r->worst_count++;
}

static report_worst *worst_at(const report *r, size_t worst)
{
    assert(worst < r->worst_count || r->failed);
    return worst < r->worst_count ? &r->worst[worst] : NULL;
}

void report_set_worst(report *r, size_t worst, report_end end, double value, bool exact)
{
    report_worst *w = worst_at(r, worst);

    assert(isfinite(value));
    if (w == NULL)
        return;
    *(end == REPORT_MIN ? &w->min : &w->max) = value;
    *(end == REPORT_MIN ? &w->min_exact : &w->max_exact) = exact;
}

void report_add_worst_fraction(report *r, size_t worst, report_end end, const char *id, double x)
{
    report_worst *w = worst_at(r, worst);
    const report_fraction fraction = {.id = report_copy(r, id), .x = x};

    if (w == NULL || fraction.id == NULL) {
        free(fraction.id);
        return;
    }
    report_fraction **list = end == REPORT_MIN ? &w->at_min : &w->at_max;
    size_t *count = end == REPORT_MIN ? &w->at_min_count : &w->at_max_count;
    report_fraction *grown = report_grow(r, *list, *count, sizeof *grown);

    if (grown == NULL) {
        free(fraction.id);
        return;
    }
    *list = grown;
    grown[(*count)++] = fraction;
}
