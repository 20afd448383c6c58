/* SPDX-License-Identifier: MIT */
/* optimum.c - descents from fixed starts, what holds the optimum, and what excludes one. */
#include "supply/optimum_internal.h"

#include "base/error_internal.h"

#include <math.h>
#include <string.h>

#define AGREED 1e-6        /* relative: descents that end so near to each other found the same optimum */
#define BINDING 1e-6       /* in parts of the scale: a limit with less room holds the optimum */
#define RELAXED 1e-4       /* of the scale: small beside any curvature, large beside the solver's 1e-8 */
#define SHADOW_NOISE 1e-7  /* of the objective's scale per scale of the bound: below it a shadow price is none */

/* The best end of all descents of a program that keeps its limits. False when none does. */
static bool descend_all(nlopt_library *l, const program *p, double best[], size_t *starts, size_t *agreed)
{
    double found[2 * PROGRAM_VARIABLES_MAX + 1];
    double x[PROGRAM_VARIABLES_MAX] = {0.0};
    double least = HUGE_VAL;
    size_t count = 0;

    for (*starts = 0; program_start(p, *starts, x); (*starts)++) {
        if (p->variables > p->shares) /* the breach starts where it is */
            x[p->shares] = fmax(program_violation(p, x), 0.0);
        if (!program_descend(l, p, x) || program_violation(p, x) > PROGRAM_TOLERANCE)
            continue;
        found[count] = program_value(p, x);
        if (found[count] < least) {
            least = found[count];
            memcpy(best, x, p->variables * sizeof *x);
        }
        count++;
    }
    *agreed = 0;
    for (size_t i = 0; i < count; i++)
        *agreed += found[i] <= least + AGREED * fmax(fabs(least), 1.0);
    return count > 0;
}

/* The optimum of the program again from where it was, after a bound has moved; false when it leads nowhere. */
static bool solve_again(nlopt_library *l, optimum_model *m, const double from[], double *f)
{
    double x[PROGRAM_VARIABLES_MAX];
    program p;

    optimum_program(m, &p);
    memcpy(x, from, p.variables * sizeof *x);
    if (!program_descend(l, &p, x) || program_violation(&p, x) > PROGRAM_TOLERANCE)
        return false;
    *f = program_value(&p, x);
    return true;
}

/* -df/d(bound that gives way): over both sides where both can be solved. */
static double shadow_price(nlopt_library *l, optimum_model *m, size_t k, const double at[], double f)
{
    const double step = RELAXED * m->limit[k].scale;
    double wider = f;
    double tighter = f;

    m->limit[k].relaxed = step;
    const bool out = solve_again(l, m, at, &wider);

    m->limit[k].relaxed = -step;
    const bool in = solve_again(l, m, at, &tighter);

    m->limit[k].relaxed = 0.0;
    if (!out && !in)
        return 0.0;
    const double slope = (tighter - wider) / (step * (double)(out + in));

    return slope * m->limit[k].scale > SHADOW_NOISE ? slope * m->scale : 0.0;
}

static bc_binding *add_binding(bc_optimum *o, const optimum_limit *limit)
{
    if (o->binding_count == BC_BINDING_MAX)
        return NULL;
    bc_binding *b = &o->binding[o->binding_count++];

    *b = (bc_binding){.kind = limit->kind, .index = limit->index, .bound = limit->bound};
    return b;
}

static void tell_what_holds(nlopt_library *l, optimum_model *m, bc_optimum *o)
{
    double c[PROGRAM_LIMITS_MAX];
    const double f = o->objective / m->scale;

    optimum_model_limits(m, o->share, c);
    for (size_t k = 0; k < m->limit_count; k++) {
        bc_binding *b = c[k] > -BINDING ? add_binding(o, &m->limit[k]) : NULL;

        if (b)
            b->shadow = shadow_price(l, m, k, o->share, f);
    }
}

/* How far a limit would have to give way alone: its least breach with all others kept. */
static void tell_needed(nlopt_library *l, optimum_model *m, size_t k, bc_binding *b)
{
    double x[PROGRAM_VARIABLES_MAX] = {0.0};
    size_t starts = 0;
    size_t agreed = 0;
    program p;

    m->goal = GOAL_ONE;
    m->one = k;
    optimum_program(m, &p);
    b->has_needed = descend_all(l, &p, x, &starts, &agreed);
    if (!b->has_needed)
        return;
    const double way = program_value(&p, x) * m->limit[k].scale;

    b->has_needed = isfinite(way);
    if (!b->has_needed)
        return;
    b->needed = m->limit[k].bound + (b->kind == BC_BOUND_MIN ? -way : way);
}

static void take_end(const optimum_model *m, const double x[], bc_optimum *o)
{
    memcpy(o->share, x, m->problem->mixer->count * sizeof *x);
    o->objective = optimum_model_objective(m, o->share);
}

/* The blend whose largest breach is least; the limits that are broken as much exclude each other. */
static bc_status tell_conflict(nlopt_library *l, optimum_model *m, bc_optimum *o, bc_error *err)
{
    double x[PROGRAM_VARIABLES_MAX] = {0.0};
    double c[PROGRAM_LIMITS_MAX];
    program p;

    m->goal = GOAL_BREACH;
    optimum_program(m, &p);
    if (!descend_all(l, &p, x, &o->starts, &o->agreed))
        return bc_fail(err, BC_ERR_SOLVER, m->problem->aims ? "no blend reaches the aims; look for them without --least first"
                                                            : "no descent came to an end; the limits cannot be judged for these gases");
    take_end(m, x, o);
    if (x[p.shares] <= PROGRAM_TOLERANCE) { /* a blend that keeps all limits after all: the way down starts at it */
        m->goal = GOAL_OBJECTIVE;
        optimum_program(m, &p);
        (void)program_descend(l, &p, x);
        o->feasible = true;
        take_end(m, x, o);
        return BC_OK;
    }
    optimum_model_limits(m, o->share, c);
    for (size_t k = 0; k < m->limit_count; k++) {
        bc_binding *b = c[k] > x[p.shares] - BINDING ? add_binding(o, &m->limit[k]) : NULL;

        if (b)
            tell_needed(l, m, k, b);
    }
    return BC_OK;
}

static bc_status find(nlopt_library *l, optimum_model *m, bc_optimum *o, bc_error *err)
{
    double x[PROGRAM_VARIABLES_MAX] = {0.0};
    program p;
    bc_status status = BC_OK;

    optimum_program(m, &p);
    o->feasible = descend_all(l, &p, x, &o->starts, &o->agreed);
    if (o->feasible)
        take_end(m, x, o);
    else
        status = tell_conflict(l, m, o, err);
    if (status == BC_OK && o->feasible)
        tell_what_holds(l, m, o);
    return status;
}

bc_status bc_optimum_find(const bc_optimum_problem *problem, bc_optimum *optimum, bc_error *err)
{
    bc_optimum o = {.feasible = false};
    optimum_model model;
    nlopt_library *library = NULL;
    bc_status status = optimum_model_make(problem, &model, err);

    if (status == BC_OK)
        status = nlopt_library_open(&library, err);
    if (status != BC_OK)
        return status;
    status = nlopt_library_fed(library, find(library, &model, &o, err), err);
    nlopt_library_close(library);
    if (status == BC_OK)
        *optimum = o;
    return status;
}

bc_status bc_optimum_objective(const bc_optimum_problem *problem, const double share[], double *objective, bc_error *err)
{
    optimum_model model;
    const bc_status status = optimum_model_make(problem, &model, err);

    if (status == BC_OK)
        *objective = optimum_model_objective(&model, share);
    return status;
}

bc_status bc_optimum_breach(const bc_optimum_problem *problem, const double share[], double *breach, bc_error *err)
{
    optimum_model model;
    double c[PROGRAM_LIMITS_MAX];
    const bc_status status = optimum_model_make(problem, &model, err);
    double worst = -HUGE_VAL;

    if (status != BC_OK)
        return status;
    optimum_model_limits(&model, share, c);
    for (size_t k = 0; k < model.limit_count + (problem->aims ? problem->aims->limit_count : 0); k++)
        worst = fmax(worst, k < model.limit_count ? c[k] : fabs(c[k]));
    *breach = worst;
    return BC_OK;
}
