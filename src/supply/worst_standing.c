/* SPDX-License-Identifier: MIT */
/* worst_standing.c - limits that no gas can reach, and limits that the ranges allow to be broken. */
#include "supply/worst_internal.h"

#include "base/error_internal.h"

#include <math.h>

/* One side of a limit; its raw bound is the other one when the figure is inverse. */
typedef struct {
    size_t limit;
    double sign; /* 1: its max */
} side;

static double *raw_bound(bc_worst *w, side s)
{
    return (s.sign > 0.0) != w->term[s.limit].inverse ? &w->bounds.limit_hi[s.limit] : &w->bounds.limit_lo[s.limit];
}

/* The extreme of the limited figure under the bounds as they are now. */
static bc_status extreme_now(bc_worst *w, side s, bc_extreme *extreme, bc_error *err)
{
    worst_term term;
    bc_status status = worst_prepare(w, err);

    if (status == BC_OK)
        status = worst_not_empty(w, err);
    term = w->term[s.limit];
    if (status == BC_OK)
        status = worst_add_axes(w, &term, err);
    if (status == BC_OK)
        status = worst_extreme(w, &term, s.sign, extreme, err);
    return status;
}

static void open_limits(bc_worst *w)
{
    for (size_t i = 0; i < w->limits; i++) {
        w->bounds.limit_lo[i] = -HUGE_VAL;
        w->bounds.limit_hi[i] = HUGE_VAL;
    }
}

static bc_status stand(bc_worst *w, side s, bc_side_standing *standing, bc_error *err)
{
    const worst_bounds all = w->bounds;
    const double raw = *raw_bound(w, s);
    bc_extreme extreme = {0};

    *standing = (bc_side_standing){.stated = isfinite(raw)};
    if (!standing->stated)
        return BC_OK;
    const double bound = worst_figure(&w->term[s.limit], raw);

    *raw_bound(w, s) = raw_bound(w, s) == &w->bounds.limit_hi[s.limit] ? HUGE_VAL : -HUGE_VAL;
    bc_status status = extreme_now(w, s, &extreme, err);

    if (status == BC_OK) {
        standing->idle = extreme.exact && s.sign * (extreme.value - bound) <= WORST_ROUNDING * fabs(bound);
        open_limits(w);
        status = extreme_now(w, s, &extreme, err);
    }
    if (status == BC_OK && s.sign * (extreme.value - bound) > WORST_ROUNDING * fabs(bound)) {
        standing->open = true;
        standing->excess = s.sign * (extreme.value - bound);
        standing->gas = extreme.gas;
    }
    w->bounds = all;
    return status;
}

bc_status bc_worst_standing(bc_worst *w, size_t limit, bc_limit_standing *standing, bc_error *err)
{
    bc_limit_standing found;

    if (limit >= w->limits)
        return bc_fail(err, BC_ERR_USAGE, "there is no limit %zu", limit);
    bc_status status = stand(w, (side){limit, -1.0}, &found.min, err);

    if (status == BC_OK)
        status = stand(w, (side){limit, 1.0}, &found.max, err);
    w->empty = worst_prepare(w, NULL) != BC_OK || w->empty;
    if (status == BC_OK)
        *standing = found;
    return status;
}
