/* SPDX-License-Identifier: MIT */
/* worst_search.c - extremes of figures that nothing is known of but their values.
 *
 * Most figures of a gas are nearly monotone in each fraction, so their extremes lie on corners of what is
 * allowed: from the best of some corners a linear program over slopes leads to the next, within a region of
 * trust that shrinks where the slopes mislead. */
#include "supply/worst_internal.h"

#include "base/error_internal.h"
#include "bluecone/quantity.h"

#include <math.h>
#include <stdint.h>
#include <string.h>

#define STARTS 8         /* local searches an end */
#define STEPS 24         /* linear programs a local search */
#define DIFFERENCE 1e-5  /* mole fraction; figures that are iterated for are good to some 1e-9 of themselves */
#define TRUST_MIN 1e-3   /* of the windows */
#define GAIN_MIN 1e-8    /* relative: below it a step is not worth its slopes */

typedef struct {
    bc_objective *objective;
    void *context;
    double value[WORST_POINTS]; /* of the points */
    bool exists[WORST_POINTS];
} search;

typedef struct {
    double sign, value;
    double x[LP_COLUMNS];
    double slope[LP_COLUMNS]; /* of sign value */
} climber;

/* Directions spread evenly over the windows: splitmix64 (Steele et al., OOPSLA 2014), in (-1, 1). */
static double spread(uint64_t seed)
{
    uint64_t z = seed * UINT64_C(0x9e3779b97f4a7c15);

    z = (z ^ (z >> 30)) * UINT64_C(0xbf58476d1ce4e5b9);
    z = (z ^ (z >> 27)) * UINT64_C(0x94d049bb133111eb);
    return (double)((z ^ (z >> 31)) >> 11) / 4503599627370496.0 - 1.0;
}

static double width_of(const bc_worst *w, size_t j)
{
    return w->bounds.upper[j] - w->bounds.lower[j];
}

/* Corners of what is allowed, in directions that count every window alike, and their middle. */
static void make_points(bc_worst *w)
{
    double middle[LP_COLUMNS] = {0.0};
    double cost[LP_COLUMNS];

    for (size_t k = 0; k + 1 < WORST_POINTS; k++) {
        double *x = w->point[k];

        for (size_t j = 0; j < w->columns; j++)
            cost[j] = width_of(w, j) > 0.0 ? spread(1 + j + k * w->columns) / width_of(w, j) : 0.0;
        memcpy(x, w->inside, sizeof w->inside);
        if (!worst_correct(w, cost, x))
            memcpy(x, w->inside, sizeof w->inside);
        for (size_t j = 0; j < w->columns; j++)
            middle[j] += x[j] / (WORST_POINTS - 1);
    }
    w->point_count = WORST_POINTS - 1;
    if (worst_allowed(w, middle))
        memcpy(w->point[w->point_count++], middle, sizeof middle);
}

static bool evaluate(const bc_worst *w, const search *s, const double x[], double *value)
{
    const bc_gas gas = worst_gas(w, x);
    const double v = s->objective(&gas, s->context);

    if (!isfinite(v))
        return false;
    *value = v;
    return true;
}

/* Slopes towards each pure component: [f((x + h e)/(1 + h)) - f(x)]/h, which for steps that keep the sum is
 * the derivative. */
static void find_slopes(const bc_worst *w, const search *s, climber *c)
{
    for (size_t j = 0; j < w->columns; j++) {
        double moved[LP_COLUMNS];
        double value = 0.0;

        c->slope[j] = 0.0;
        if (width_of(w, j) == 0.0)
            continue;
        for (size_t i = 0; i < w->columns; i++)
            moved[i] = (c->x[i] + (i == j ? DIFFERENCE : 0.0)) / (1.0 + DIFFERENCE);
        if (evaluate(w, s, moved, &value))
            c->slope[j] = c->sign * (value - c->value) / DIFFERENCE;
    }
}

/* The best composition by the slopes within a share of the windows. */
static bool step_to(bc_worst *w, const climber *c, double trust, double x[])
{
    lp_problem *lp = &w->near_lp;

    for (size_t j = 0; j < w->columns; j++) {
        lp->lower[j] = fmax(w->bounds.lower[j], c->x[j] - trust * width_of(w, j));
        lp->upper[j] = fmin(w->bounds.upper[j], c->x[j] + trust * width_of(w, j));
    }
    memcpy(x, c->x, sizeof c->x);
    const bool allowed = worst_correct(w, c->slope, x);

    memcpy(lp->lower, w->bounds.lower, sizeof lp->lower);
    memcpy(lp->upper, w->bounds.upper, sizeof lp->upper);
    return allowed;
}

static void climb(bc_worst *w, const search *s, climber *c)
{
    double trust = 1.0;
    double x[LP_COLUMNS];

    find_slopes(w, s, c);
    for (int step = 0; step < STEPS && trust >= TRUST_MIN; step++) {
        double value = 0.0;
        const bool allowed = step_to(w, c, trust, x);

        if (allowed && worst_sum(w, c->slope, x) - worst_sum(w, c->slope, c->x) <= GAIN_MIN * fabs(c->value))
            return;
        if (allowed && evaluate(w, s, x, &value) && c->sign * (value - c->value) > 0.0) {
            c->value = value;
            memcpy(c->x, x, sizeof c->x);
            find_slopes(w, s, c);
            trust = fmin(1.0, 2.0 * trust);
        } else {
            trust *= 0.25;
        }
    }
}

/* The point that comes next in order of value. */
static size_t next_start(const bc_worst *w, const search *s, double sign, const bool used[])
{
    size_t best = w->point_count;

    for (size_t k = 0; k < w->point_count; k++)
        if (s->exists[k] && !used[k] && (best == w->point_count || sign * (s->value[k] - s->value[best]) > 0.0))
            best = k;
    return best;
}

static void find_end(bc_worst *w, const search *s, double sign, bc_extreme *extreme)
{
    bool used[WORST_POINTS] = {false};

    for (int k = 0; k < STARTS; k++) {
        const size_t start = next_start(w, s, sign, used);

        if (start == w->point_count)
            return;
        climber c = {.sign = sign, .value = s->value[start]};

        used[start] = true;
        memcpy(c.x, w->point[start], sizeof c.x);
        climb(w, s, &c);
        if (k == 0 || sign * (c.value - extreme->value) > 0.0)
            *extreme = (bc_extreme){.value = c.value, .gas = worst_gas(w, c.x)};
    }
}

bc_status bc_worst_search(bc_worst *w, bc_objective *objective, void *context, bc_extremes *extremes, bc_error *err)
{
    search s = {.objective = objective, .context = context};
    bool exists = false;
    const bc_status status = worst_not_empty(w, err);

    if (status != BC_OK)
        return status;
    if (w->point_count == 0)
        make_points(w);
    for (size_t k = 0; k < w->point_count; k++) {
        s.exists[k] = evaluate(w, &s, w->point[k], &s.value[k]);
        exists = exists || s.exists[k];
    }
    if (!exists)
        return bc_fail(err, BC_ERR_RANGE, "none of the allowed gases that were tried has such a figure");
    find_end(w, &s, -1.0, &extremes->min);
    find_end(w, &s, 1.0, &extremes->max);
    return BC_OK;
}
