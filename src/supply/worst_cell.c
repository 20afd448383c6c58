/* SPDX-License-Identifier: MIT */
/* worst_cell.c - the linear programs of a space: its ranges, a cell's relaxation, the linearisation at a point. */
#include "supply/worst_internal.h"

#include "base/error_internal.h"

#include <math.h>
#include <string.h>

#define Z_MIN 0.05 /* far below what the formula for Z stands for (0.9), far enough above zero to divide by */

/* What rounding may leave beyond a bound: the program's own, where the bound is next to nothing. */
static double rounding(double bound)
{
    return fmax(WORST_ROUNDING * fabs(bound), 2.0 * LP_TOLERANCE);
}

static bool within(double value, double lo, double hi)
{
    return (!isfinite(lo) || value >= lo - rounding(lo)) && (!isfinite(hi) || value <= hi + rounding(hi));
}

/* n - bound phi, with an estimate of phi. */
static void limit_row(const bc_worst *w, const worst_term *t, double bound, const double phi[], double row[])
{
    for (size_t j = 0; j < w->columns; j++)
        row[j] = t->n[j] - bound * phi[j];
}

/* Rows of a limit: n - hi phi <= 0 with phi not too small, n - lo phi >= 0 with phi not too large; a tangent
 * (which is too large) for both is the linearisation at its point. */
static void add_limit(const bc_worst *w, size_t limit, const worst_cell *cell, bool tangents, lp_problem *lp)
{
    const worst_term *t = &w->term[limit];
    const double hi = w->bounds.limit_hi[limit];
    const double lo = w->bounds.limit_lo[limit];
    double phi[LP_COLUMNS], row[LP_COLUMNS];

    if (isfinite(hi)) {
        worst_estimate(w, t, cell, tangents || hi >= 0.0, phi);
        limit_row(w, t, hi, phi, row);
        lp_add_row(lp, row, -HUGE_VAL, 0.0);
    }
    if (isfinite(lo)) {
        worst_estimate(w, t, cell, tangents || lo < 0.0, phi);
        limit_row(w, t, lo, phi, row);
        lp_add_row(lp, row, 0.0, HUGE_VAL);
    }
}

static void add_base_rows(bc_worst *w, lp_problem *lp)
{
    static const worst_cell NOWHERE; /* a linear term has no place */
    double ones[LP_COLUMNS];

    for (size_t j = 0; j < w->columns; j++)
        ones[j] = 1.0;
    lp_add_row(lp, ones, 1.0, 1.0);
    for (size_t i = 0; i < w->groups; i++)
        if (isfinite(w->bounds.group_lo[i]) || isfinite(w->bounds.group_hi[i]))
            lp_add_row(lp, w->group[i], w->bounds.group_lo[i], w->bounds.group_hi[i]);
    for (size_t i = 0; i < w->limits; i++)
        if (worst_is_linear(&w->term[i]))
            add_limit(w, i, &NOWHERE, true, lp);
}

static void start_program(bc_worst *w, lp_problem *lp)
{
    lp->columns = w->columns;
    lp->rows = 0;
    memcpy(lp->lower, w->bounds.lower, sizeof lp->lower);
    memcpy(lp->upper, w->bounds.upper, sizeof lp->upper);
    memset(lp->cost, 0, sizeof lp->cost);
    add_base_rows(w, lp);
}

/* Largest value of sign form over the ranges and linear limits, proven. */
static lp_status base_most(bc_worst *w, const double form[], double sign, double *most)
{
    w->cell_lp.rows = w->base_rows;
    for (size_t j = 0; j < w->columns; j++)
        w->cell_lp.cost[j] = sign * form[j];
    lp_maximise(&w->cell_lp, &w->work, &w->cell_answer);
    *most = w->cell_answer.bound;
    return w->cell_answer.status;
}

/* The axis of a sum, found or made. */
static bc_status axis_of(bc_worst *w, const double form[], size_t *axis, bc_error *err)
{
    for (size_t a = 0; a < w->axis_count; a++)
        if (memcmp(w->axis[a].form, form, w->columns * sizeof form[0]) == 0) {
            *axis = a;
            return BC_OK;
        }
    if (w->axis_count == WORST_AXES)
        return bc_fail(err, BC_ERR_USAGE, "limits and figures stand at too many reference states; at most %d different sums are dealt with",
                       WORST_AXES);
    worst_axis *made = &w->axis[w->axis_count];
    double least = 0.0;

    memset(made->form, 0, sizeof made->form);
    memcpy(made->form, form, w->columns * sizeof form[0]);
    (void)base_most(w, form, 1.0, &made->hi);
    (void)base_most(w, form, -1.0, &least);
    made->lo = -least;
    *axis = w->axis_count++;
    return BC_OK;
}

static bc_status no_such_figure(bc_error *err)
{
    return bc_fail(err, BC_ERR_RANGE, "some gas of the ranges has no such figure: what it is divided by can be zero; narrow the ranges");
}

bc_status worst_add_axes(bc_worst *w, worst_term *t, bc_error *err)
{
    bc_status status = BC_OK;
    double least = 0.0;

    if (t->p > 0.0) {
        (void)base_most(w, t->d, -1.0, &least);
        if (!(-least > 0.0))
            return no_such_figure(err);
    }
    if (t->p > 0.0 && t->p < 1.0)
        status = axis_of(w, t->d, &t->d_axis, err);
    if (status != BC_OK || t->r == 0.0)
        return status;
    status = axis_of(w, t->s, &t->s_axis, err);
    if (status != BC_OK)
        return status;
    const worst_axis *s = &w->axis[t->s_axis];
    const double most = fmax(fabs(s->lo), fabs(s->hi));

    return 1.0 - t->q * most * most > Z_MIN ? BC_OK : no_such_figure(err);
}

bc_status worst_lay_base(bc_worst *w, bc_error *err)
{
    start_program(w, &w->cell_lp);
    start_program(w, &w->near_lp);
    w->base_rows = w->cell_lp.rows;
    w->axis_count = 0;
    w->point_count = 0;
    lp_maximise(&w->cell_lp, &w->work, &w->cell_answer);
    w->empty = w->cell_answer.status == LP_INFEASIBLE;
    if (w->empty)
        return BC_OK;
    for (size_t i = 0; i < w->limits; i++) {
        worst_term *t = &w->term[i];

        if (!isfinite(w->bounds.limit_lo[i]) && !isfinite(w->bounds.limit_hi[i]))
            continue;
        const bc_status status = worst_add_axes(w, t, err);

        if (status != BC_OK)
            return status;
    }
    w->limit_axes = w->axis_count;
    return BC_OK;
}

void worst_root(const bc_worst *w, worst_cell *cell)
{
    for (size_t a = 0; a < w->axis_count; a++) {
        cell->lo[a] = w->axis[a].lo;
        cell->hi[a] = w->axis[a].hi;
        cell->touch[a] = 0.5 * (cell->lo[a] + cell->hi[a]);
    }
    cell->bound = HUGE_VAL;
}

void worst_relax(bc_worst *w, const worst_cell *cell)
{
    lp_problem *lp = &w->cell_lp;

    lp->rows = w->base_rows;
    for (size_t i = 0; i < w->limits; i++)
        if (!worst_is_linear(&w->term[i]))
            add_limit(w, i, cell, false, lp);
    for (size_t a = 0; a < w->axis_count; a++) {
        const worst_axis *axis = &w->axis[a];

        if (cell->lo[a] > axis->lo || cell->hi[a] < axis->hi)
            lp_add_row(lp, axis->form, cell->lo[a] > axis->lo ? cell->lo[a] : -HUGE_VAL, cell->hi[a] < axis->hi ? cell->hi[a] : HUGE_VAL);
    }
}

void worst_linearise(bc_worst *w, const double x[])
{
    worst_cell at;

    for (size_t a = 0; a < w->axis_count; a++)
        at.touch[a] = at.lo[a] = at.hi[a] = worst_sum(w, w->axis[a].form, x);
    w->near_lp.rows = w->base_rows;
    for (size_t i = 0; i < w->limits; i++)
        if (!worst_is_linear(&w->term[i]))
            add_limit(w, i, &at, true, &w->near_lp);
}

bool worst_limit_holds(const bc_worst *w, size_t limit, const double x[])
{
    const double lo = w->bounds.limit_lo[limit];
    const double hi = w->bounds.limit_hi[limit];
    double raw = 0.0;

    if (!isfinite(lo) && !isfinite(hi))
        return true;
    return worst_raw(w, &w->term[limit], x, &raw) && within(raw, lo, hi);
}

bool worst_allowed(const bc_worst *w, const double x[])
{
    double sum = 0.0;

    for (size_t j = 0; j < w->columns; j++) {
        sum += x[j];
        if (x[j] < w->bounds.lower[j] || x[j] > w->bounds.upper[j])
            return false;
    }
    if (fabs(sum - 1.0) > 10.0 * LP_TOLERANCE)
        return false;
    for (size_t i = 0; i < w->groups; i++)
        if (!within(worst_sum(w, w->group[i], x), w->bounds.group_lo[i], w->bounds.group_hi[i]))
            return false;
    for (size_t i = 0; i < w->limits; i++)
        if (!worst_limit_holds(w, i, x))
            return false;
    return true;
}

/* Tangents make a bound that cuts a piece out of the ranges safe, and meet the others to second order:
 * a few programs on end walk onto the limits. */
bool worst_correct(bc_worst *w, const double cost[], double x[])
{
    for (int step = 0; step < 5; step++) {
        worst_linearise(w, x);
        memcpy(w->near_lp.cost, cost, w->columns * sizeof cost[0]);
        lp_maximise(&w->near_lp, &w->work, &w->near_answer);
        if (w->near_answer.status != LP_OPTIMAL)
            return false;
        memcpy(x, w->near_answer.x, w->columns * sizeof x[0]);
        if (worst_allowed(w, x))
            return true;
    }
    return false;
}
