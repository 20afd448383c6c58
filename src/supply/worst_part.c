/* SPDX-License-Identifier: MIT */
/* worst_part.c - one more limit on a space, put on and taken off. */
#include "supply/worst_part.h"

#include "base/error_internal.h"

#include <math.h>

bc_status worst_impose(bc_worst *w, const bc_ratio *figure, double min, double max, bc_error *err)
{
    const size_t i = w->limits;

    if (i == BC_SPACE_LIMIT_MAX)
        return bc_fail(err, BC_ERR_SOLVER, "no room for a limit more beside %d", BC_SPACE_LIMIT_MAX);
    bc_status status = worst_term_of(w, figure, &w->term[i], err);

    if (status != BC_OK)
        return status;
    worst_raw_window(&w->term[i], min, max, &w->bounds.limit_lo[i], &w->bounds.limit_hi[i]);
    w->limits++;
    status = worst_prepare(w, err);
    if (status != BC_OK)
        worst_lift(w);
    return status;
}

void worst_lift(bc_worst *w)
{
    w->limits--;
    w->empty = worst_prepare(w, NULL) != BC_OK || w->empty;
}

bc_status worst_certify(bc_worst *w, const bc_ratio *form, bc_extremes *extremes, bc_error *err)
{
    bc_extremes found;
    const bc_status status = bc_worst_ratio(w, form, &found, err);

    if (status != BC_OK)
        return status;
    if (!isfinite(found.min.value) || !isfinite(found.max.value))
        return bc_fail(err, BC_ERR_RANGE, "an allowed gas does not burn: it has no air factor");
    *extremes = found;
    return BC_OK;
}

bool worst_covers(double min, double max, const bc_extremes *reach)
{
    return reach->min.bounded && reach->max.bounded && reach->min.bound >= min && reach->max.bound <= max;
}
