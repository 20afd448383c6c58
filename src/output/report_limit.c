/* SPDX-License-Identifier: MIT */
/* report_limit.c - the limits of a report. */
#include "output/report.h"

#include "output/report_internal.h"

#include <assert.h>
#include <math.h>
#include <stdlib.h>

void report_free_limit(report_limit *limit)
{
    free(limit->id);
    free(limit->unit);
    free(limit->state);
    free(limit->verdict);
}

#define AT_BOUND 1e-8 /* of a bound: an optimum that was solved onto it has no margin */

/* Room between a value and a bound, inwards. */
static double room(double from, double bound, double inwards)
{
    const double margin = (from - bound) * inwards;

    return fabs(margin) < AT_BOUND * fabs(bound) ? 0.0 : margin;
}

/* 0 where there is no value or no bound. */
static double margin_of(const report_limit *l)
{
    const double above = room(l->value, l->min, 1.0);
    const double below = room(l->value, l->max, -1.0);

    if (!l->has_value || (!l->has_min && !l->has_max))
        return 0.0;
    if (l->has_min && l->has_max)
        return above < below ? above : below;
    return l->has_min ? above : below;
}

void report_add_limit(report *r, const report_limit *limit)
{
    assert(!limit->has_value || isfinite(limit->value));

    report_limit *limits = report_grow(r, r->limits, r->limit_count, sizeof *limits);
    if (limits == NULL)
        return;
    r->limits = limits;

    report_limit copy = *limit;
    copy.id = report_copy(r, limit->id);
    copy.unit = report_copy(r, limit->unit);
    copy.state = report_copy(r, limit->state ? limit->state : "");
    copy.margin = margin_of(limit);
    copy.verdict = report_copy(r, limit->verdict);
    if (copy.id == NULL || copy.unit == NULL || copy.state == NULL || copy.verdict == NULL)
        report_free_limit(&copy);
    else
        limits[r->limit_count++] = copy;
}

void report_set_limits_title(report *r, const char *title)
{
    free(r->limits_title);
    r->limits_title = report_copy(r, title);
}

void report_lead_with_limits(report *r)
{
    r->limits_lead = true;
}
