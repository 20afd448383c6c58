/* SPDX-License-Identifier: MIT */
/* worst_bound.c - branch and bound over cells: the extreme of a term, with its proof.
 *
 * With a value tau to beat, N/phi > tau somewhere in a cell only if the largest N - tau phi there is above
 * zero; a plane on the safe side of phi makes that a linear program. Its dual proves the cell done, its
 * solution is the next value to beat, or shows where to cut the cell: there the planes are exact afterwards. */
#include "supply/worst_internal.h"

#include <math.h>
#include <string.h>

#define ROUNDS 30     /* solutions in a row that may improve one cell */
#define CUT_MIN 1e-3 /* of the width of a cell: a solution nearer to its end is cut off in the middle instead */

/* The value that has to be beaten by more than the target. */
static double to_beat(const worst_run *run)
{
    return run->best + run->sign * WORST_TARGET * fmax(fabs(run->best), WORST_SMALL);
}

/* True when nothing is left to find: any allowed composition, or what a limit allows. */
static bool is_done(const worst_run *run)
{
    return run->found && (!run->term || run->sign * (run->stated - to_beat(run)) <= 0.0);
}

/* sign (n - tau phi) with phi estimated on the safe side. */
static void set_cost(bc_worst *w, const worst_run *run, const worst_cell *cell, double tau)
{
    double phi[LP_COLUMNS];

    if (!run->term) {
        memset(w->cell_lp.cost, 0, sizeof w->cell_lp.cost);
        return;
    }
    worst_estimate(w, run->term, cell, run->sign * tau < 0.0, phi);
    for (size_t j = 0; j < w->columns; j++)
        w->cell_lp.cost[j] = run->sign * (run->term->n[j] - tau * phi[j]);
}

/* Takes an allowed composition if it is better by more than rounding. */
static bool take(const bc_worst *w, worst_run *run, const double x[])
{
    double raw = 0.0;

    if (run->term && !worst_raw(w, run->term, x, &raw))
        return false;
    if (run->found && !(run->sign * (raw - run->best) > 0.01 * WORST_TARGET * fmax(fabs(run->best), WORST_SMALL)))
        return false;
    run->found = true;
    run->best = raw;
    memcpy(run->x, x, w->columns * sizeof x[0]);
    return true;
}

/* The solution of the cell, or what becomes of it on the limits. */
static bool improve(bc_worst *w, worst_run *run)
{
    double x[LP_COLUMNS], phi[LP_COLUMNS], cost[LP_COLUMNS] = {0.0};
    worst_cell at;

    memcpy(x, w->cell_answer.x, sizeof x);
    if (worst_allowed(w, x))
        return take(w, run, x);
    if (run->term && run->waiting > 0) {
        run->waiting--;
        return false;
    }
    if (run->term) {
        for (size_t a = 0; a < w->axis_count; a++)
            at.touch[a] = at.lo[a] = at.hi[a] = worst_sum(w, w->axis[a].form, x);
        worst_estimate(w, run->term, &at, true, phi);
        for (size_t j = 0; j < w->columns; j++)
            cost[j] = run->sign * (run->term->n[j] - run->best * phi[j]);
    }
    const bool better = worst_correct(w, cost, x) && take(w, run, x);

    /* walks that lead nowhere become rare, as they cost more than a cell */
    run->patience = better ? 0 : run->patience < 32 ? 2 * run->patience + 1 : run->patience;
    run->waiting = run->patience;
    return better;
}

/* What the last program proves of a cell: N - tau phi <= v, so N/phi <= tau + v/phi. */
static double cell_bound(const bc_worst *w, const worst_run *run, const worst_cell *cell, double tau)
{
    const double v = fmax(w->cell_answer.bound, 0.0);
    const double least = run->term ? worst_phi_least(w, run->term, cell) : 0.0;

    return least > 0.0 ? tau + run->sign * v / least : run->sign * HUGE_VAL;
}

/* Settles a cell, or returns true when it has to be cut. */
static bool must_cut(bc_worst *w, worst_run *run, worst_cell *cell)
{
    worst_relax(w, cell);
    for (int round = 0; round < ROUNDS; round++) {
        const double tau = run->term ? to_beat(run) : 0.0;

        set_cost(w, run, cell, tau);
        lp_maximise(&w->cell_lp, &w->work, &w->cell_answer);
        if (w->cell_answer.status == LP_INFEASIBLE || (run->term && w->cell_answer.bound <= 0.0))
            return false;
        if (run->term)
            cell->bound = run->sign * fmin(run->sign * cell->bound, run->sign * cell_bound(w, run, cell, tau));
        if (!improve(w, run))
            return true;
        if (is_done(run))
            return false;
    }
    return true;
}

/* Curvature of ln phi over the width of a cell, by axis: what separates its planes. */
static void add_scores(const worst_term *t, const worst_cell *cell, double score[])
{
    if (t->d_axis != WORST_NO_AXIS) {
        const double width = (cell->hi[t->d_axis] - cell->lo[t->d_axis]) / cell->hi[t->d_axis];

        score[t->d_axis] += t->p * (1.0 - t->p) * width * width;
    }
    if (t->s_axis != WORST_NO_AXIS) {
        const double width = cell->hi[t->s_axis] - cell->lo[t->s_axis];

        score[t->s_axis] += 2.0 * t->q * t->r * width * width;
    }
}

/* The axis to cut: of the figure, and of the limits that the solution only meets by the planes' leave. */
static size_t axis_to_cut(const bc_worst *w, const worst_run *run, const worst_cell *cell)
{
    double score[WORST_AXES] = {0.0};
    size_t best = WORST_NO_AXIS;

    if (run->term)
        add_scores(run->term, cell, score);
    for (size_t i = 0; i < w->limits; i++)
        if (!worst_limit_holds(w, i, w->cell_answer.x))
            add_scores(&w->term[i], cell, score);
    for (size_t a = 0; a < w->axis_count; a++)
        if (score[a] > 0.0 && (best == WORST_NO_AXIS || score[a] > score[best]))
            best = a;
    return best;
}

static double clamp(double value, double lo, double hi)
{
    return fmin(fmax(value, lo), hi);
}

bool worst_cut(const bc_worst *w, const worst_run *run, worst_cell *cell, worst_cell *other)
{
    const size_t axis = axis_to_cut(w, run, cell);

    if (axis == WORST_NO_AXIS)
        return false;
    const double lo = cell->lo[axis], hi = cell->hi[axis];
    double at = worst_sum(w, w->axis[axis].form, w->cell_answer.x);

    if (at < lo + CUT_MIN * (hi - lo) || at > hi - CUT_MIN * (hi - lo))
        at = 0.5 * (lo + hi);
    if (!(at > lo && at < hi))
        return false;
    *other = *cell;
    cell->hi[axis] = at;
    other->lo[axis] = at;
    for (size_t a = 0; a < w->axis_count; a++) {
        const double solution = worst_sum(w, w->axis[a].form, w->cell_answer.x);

        cell->touch[a] = clamp(solution, cell->lo[a], cell->hi[a]);
        other->touch[a] = clamp(solution, other->lo[a], other->hi[a]);
    }
    return true;
}

/* A cell that is given up weakens the proof to what is known of it. */
static void give_up(worst_run *run, const worst_cell *cell)
{
    run->bound = run->sign * fmax(run->sign * run->bound, run->sign * cell->bound);
}

static bool same_form(const bc_worst *w, const double a[], const double b[], bool matters)
{
    return !matters || memcmp(a, b, w->columns * sizeof a[0]) == 0;
}

/* A limit on the very figure that is asked bounds it, and is hard to prove otherwise: all of it is optimal. */
static double stated_bound(const bc_worst *w, const worst_run *run)
{
    const worst_term *t = run->term;
    double bound = run->sign * HUGE_VAL;

    for (size_t i = 0; t && i < w->limits; i++) {
        const worst_term *l = &w->term[i];
        const double stated = run->sign > 0.0 ? w->bounds.limit_hi[i] : w->bounds.limit_lo[i];

        if (l->p == t->p && l->r == t->r && l->q == t->q && same_form(w, l->n, t->n, true) && same_form(w, l->d, t->d, t->p > 0.0) &&
            same_form(w, l->s, t->s, t->r > 0.0))
            bound = run->sign * fmin(run->sign * bound, run->sign * stated);
    }
    return bound;
}

/* Brings the most promising cell to the top of the stack: what is left when the cells run out is bounded
 * well then. A stack that fills up is worked off from its top. */
static void bring_best_up(bc_worst *w, const worst_run *run, size_t count)
{
    size_t best = count - 1;

    if (!run->term || count > WORST_STACK / 2)
        return;
    for (size_t i = count - 1; i-- > 0;)
        if (run->sign * (w->stack[i].bound - w->stack[best].bound) > 0.0)
            best = i;
    if (best != count - 1) {
        const worst_cell kept = w->stack[best];

        w->stack[best] = w->stack[count - 1];
        w->stack[count - 1] = kept;
    }
}

void worst_explore(bc_worst *w, worst_run *run)
{
    size_t count = 1;

    run->stated = stated_bound(w, run);
    worst_root(w, &w->stack[0]);
    w->stack[0].bound = run->sign * HUGE_VAL;
    run->bound = -run->sign * HUGE_VAL;
    for (run->cells = 0; count > 0 && run->cells < run->budget && !is_done(run); run->cells++) {
        bring_best_up(w, run, count);
        worst_cell *cell = &w->stack[count - 1];

        if (!must_cut(w, run, cell)) {
            count--;
        } else if (count == WORST_STACK || !worst_cut(w, run, cell, &w->stack[count])) {
            give_up(run, cell);
            count--;
        } else {
            count++;
        }
    }
    while (count > 0 && !is_done(run))
        give_up(run, &w->stack[--count]);
    if (run->found)
        run->bound = run->sign * fmax(run->sign * run->bound, run->sign * to_beat(run));
}
