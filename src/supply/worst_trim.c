/* SPDX-License-Identifier: MIT */
/* worst_trim.c - extremes of figures of a burner with a trim, certified part by part.
 *
 * The travel that holding the oxygen asks of the trim is a ratio of linear sums itself, so that the gases on which
 * the trim stands below, within or above its range are spaces with one limit more. In each of them the figure has
 * one form. The three overlap in their borders, where the forms agree: the extreme of all gases is the furthest of
 * theirs, and so is the bound. */
#include "supply/worst_part.h"

#include "base/error_internal.h"

#include <math.h>

#define PARTS 3

/* A form, and where it holds: the travel of the trim within a window. */
typedef struct {
    bc_ratio form;
    double min, max;
} part;

static bool misses(const part *p, const bc_extremes *reach)
{
    return (reach->min.bounded && reach->min.bound > p->max) || (reach->max.bounded && reach->max.bound < p->min);
}

/* *empty when no gas is in the part. */
static bc_status certify_part(bc_worst *w, const bc_ratio *travel, const part *p, bc_extremes *extremes, bool *empty, bc_error *err)
{
    bc_status status = worst_impose(w, travel, p->min, p->max, err);

    if (status != BC_OK)
        return status;
    *empty = w->empty;
    if (!w->empty)
        status = worst_certify(w, &p->form, extremes, err);
    worst_lift(w);
    return status;
}

static void join_end(bc_extreme *end, const bc_extreme *other, double sign)
{
    const bool bounded = end->bounded && other->bounded;
    const double bound = sign * fmax(sign * end->bound, sign * other->bound);

    if (sign * (other->value - end->value) > 0.0)
        *end = *other;
    end->bounded = bounded;
    end->bound = bounded ? bound : 0.0;
    end->exact = bounded && fabs(bound - end->value) <= BC_WORST_EXACT * fabs(end->value);
}

static void join(bc_extremes *all, const bc_extremes *one, bool first)
{
    if (first) {
        *all = *one;
        return;
    }
    join_end(&all->min, &one->min, -1.0);
    join_end(&all->max, &one->max, 1.0);
}

static bc_status certify_parts(bc_worst *w, const bc_ratio *travel, const part parts[PARTS], bc_extremes *extremes, bc_error *err)
{
    bc_extremes reach, found;
    size_t count = 0;
    bc_status status = worst_certify(w, travel, &reach, err);

    for (size_t i = 0; i < PARTS && status == BC_OK; i++) {
        bc_extremes one;
        bool empty = false;

        if (worst_covers(parts[i].min, parts[i].max, &reach))
            return worst_certify(w, &parts[i].form, extremes, err);
        if (misses(&parts[i], &reach))
            continue;
        status = certify_part(w, travel, &parts[i], &one, &empty, err);
        if (status == BC_OK && !empty)
            join(&found, &one, count++ == 0);
    }
    if (status == BC_OK && count == 0)
        status = bc_fail(err, BC_ERR_SOLVER, "no part of the trim's range was found to hold an allowed gas");
    if (status == BC_OK)
        *extremes = found;
    return status;
}

static bc_ratio scaled(const bc_ratio *ratio, double factor)
{
    bc_ratio made = *ratio;

    made.scale *= factor;
    return made;
}

bc_status worst_certify_trimmed(bc_worst *w, const trimmed_figure *f, bc_extremes *extremes, bc_error *err)
{
    const double low = 1.0 - f->range, high = 1.0 + f->range;
    const part parts[PARTS] = {{scaled(f->untrimmed, f->rises ? low : 1.0 / low), -HUGE_VAL, low},
                               {*f->held, low, high},
                               {scaled(f->untrimmed, f->rises ? high : 1.0 / high), high, HUGE_VAL}};

    if (!(f->range > 0.0)) /* both ends are one: a window without width would have no gas */
        return worst_certify(w, f->untrimmed, extremes, err);
    return certify_parts(w, f->travel, parts, extremes, err);
}
