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

void report_add_limit(report *r, const report_limit *limit)
{
    assert(!limit->has_value || (isfinite(limit->value) && isfinite(limit->margin)));

    report_limit *limits = report_grow(r, r->limits, r->limit_count, sizeof *limits);
    if (limits == NULL)
        return;
    r->limits = limits;

    report_limit copy = *limit;
    copy.id = report_copy(r, limit->id);
    copy.unit = report_copy(r, limit->unit);
    copy.state = report_copy(r, limit->state);
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
