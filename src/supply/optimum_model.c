/* SPDX-License-Identifier: MIT */
/* optimum_model.c - objective, limits and flows of a blend as functions of its shares. */
#include "supply/optimum_internal.h"

#include "base/error_internal.h"

#include <math.h>
#include <string.h>

#define UNDEFINED_BREACH 1.0 /* in parts of the scale: far enough off to be left, near enough to be comparable */

static bc_status cost_of(const bc_optimum_problem *p, size_t i, double *num, bc_error *err)
{
    const bc_offer *offer = &p->offer[i];
    double amount = 0.0;

    if (!offer->price.given)
        return bc_fail(err, BC_ERR_USAGE, "part %zu has no price; state one in its file ([supply] price = 32 EUR/MWh) or with --price %zu=32EUR/MWh",
                       i + 1, i + 1);
    for (size_t k = 0; k < i; k++)
        if (p->offer[k].price.given && strcmp(p->offer[k].currency, offer->currency) != 0)
            return bc_fail(err, BC_ERR_USAGE, "prices are in %s and in %s; state them in one currency", p->offer[k].currency, offer->currency);
    const bc_status status = bc_amount_per_mole(&offer->price, p->mixer->reference, p->mixer->parts[i].gas, &amount, err);

    if (status == BC_OK)
        *num = offer->price.si * amount;
    return status;
}

/* A part that states no CO2 of its making counts with its burning alone. */
static bc_status co2_of(const bc_optimum_problem *p, size_t i, double *num, bc_error *err)
{
    const bc_offer *offer = &p->offer[i];
    double amount = 0.0;

    *num = offer->biogenic ? 0.0 : bc_co2_per_mole(p->mixer->parts[i].gas);
    if (!offer->co2.given)
        return BC_OK;
    const bc_status status = bc_amount_per_mole(&offer->co2, p->mixer->reference, p->mixer->parts[i].gas, &amount, err);

    if (status == BC_OK)
        *num += offer->co2.si * amount;
    return status;
}

static bc_status take_part(optimum_model *m, size_t i, bc_error *err)
{
    const bc_optimum_problem *p = m->problem;
    bc_status status = BC_OK;

    m->den[i] = p->least == BC_LEAST_SHARE ? p->mixer->per_mole[i] : p->mixer->value[i].gross_j_per_mol;
    if (p->least == BC_LEAST_COST)
        status = cost_of(p, i, &m->num[i], err);
    else if (p->least == BC_LEAST_CO2)
        status = co2_of(p, i, &m->num[i], err);
    else
        m->num[i] = i == p->part ? p->mixer->per_mole[i] : 0.0;
    m->scale = fmax(m->scale, m->den[i] > 0.0 ? fabs(m->num[i] / m->den[i]) : 0.0);
    return status;
}

static bc_status add_limit(optimum_model *m, const optimum_limit *limit, bc_error *err)
{
    const bc_contract *aims = m->problem->aims;

    if (m->limit_count + (aims ? aims->limit_count : 0) + 1 >= PROGRAM_LIMITS_MAX)
        return bc_fail(err, BC_ERR_USAGE, "more than %d bounds at once", PROGRAM_LIMITS_MAX);
    m->limit[m->limit_count++] = *limit;
    return BC_OK;
}

static bc_status add_limits(optimum_model *m, const bc_contract *within, bc_error *err)
{
    bc_status status = BC_OK;

    for (size_t i = 0; within && i < within->limit_count && status == BC_OK; i++) {
        const bc_limit *limit = &within->limits[i];
        optimum_limit bound = {.index = i, .scale = bc_limit_scale(limit)};

        if (limit->has_min) {
            bound.kind = BC_BOUND_MIN;
            bound.bound = limit->min;
            status = add_limit(m, &bound, err);
        }
        if (limit->has_max && status == BC_OK) {
            bound.kind = BC_BOUND_MAX;
            bound.bound = limit->max;
            status = add_limit(m, &bound, err);
        }
    }
    return status;
}

/* A gas without heat delivers none of a rate of energy. */
static bc_status delivered_by(const optimum_model *m, size_t i, double *amount, bc_error *err)
{
    const bc_optimum_problem *p = m->problem;
    const bc_per_amount *rate = p->rate;

    if (rate->of == BC_DIM_ENERGY) {
        *amount = rate->net ? p->mixer->value[i].net_j_per_mol : p->mixer->value[i].gross_j_per_mol;
        return BC_OK;
    }
    return bc_amount_per_mole(rate, p->mixer->reference, p->mixer->parts[i].gas, amount, err);
}

static bc_status add_flows(optimum_model *m, bc_error *err)
{
    const bc_optimum_problem *p = m->problem;
    bc_status status = BC_OK;

    for (size_t i = 0; p->rate && i < p->mixer->count && status == BC_OK; i++) {
        const optimum_limit flow = {.kind = BC_BOUND_FLOW, .index = i, .bound = p->offer[i].max_flow.si, .scale = p->offer[i].max_flow.si};

        status = delivered_by(m, i, &m->delivered[i], err);
        if (status == BC_OK && p->offer[i].max_flow.given) {
            status = bc_amount_per_mole(&p->offer[i].max_flow, p->mixer->reference, p->mixer->parts[i].gas, &m->taken[i], err);
            if (status == BC_OK)
                status = add_limit(m, &flow, err);
        }
    }
    return status;
}

bc_status optimum_model_make(const bc_optimum_problem *problem, optimum_model *model, bc_error *err)
{
    bc_status status = BC_OK;

    memset(model, 0, sizeof *model);
    model->problem = problem;
    for (size_t i = 0; i < problem->mixer->count && status == BC_OK; i++)
        status = take_part(model, i, err);
    if (!(model->scale > 0.0))
        model->scale = 1.0;
    if (status == BC_OK)
        status = add_limits(model, problem->within, err);
    return status == BC_OK ? add_flows(model, err) : status;
}

double optimum_model_objective(const optimum_model *m, const double share[])
{
    double mole[BC_BLEND_PARTS_MAX];
    double num = 0.0;
    double den = 0.0;

    bc_mixer_moles(m->problem->mixer, share, mole);
    for (size_t i = 0; i < m->problem->mixer->count; i++) {
        num += mole[i] * m->num[i];
        den += mole[i] * m->den[i];
    }
    /* a blend without heat is as bad as can be */
    return den > 0.0 ? num / den : 1e3 * m->scale;
}

/* Flow of a part at the rate of the blend, over what there is, less one: f_i taken_i rate/(delivered max) - 1. */
static double flow_breach(const optimum_model *m, const optimum_limit *limit, const double mole[])
{
    double delivered = 0.0;

    for (size_t i = 0; i < m->problem->mixer->count; i++)
        delivered += mole[i] * m->delivered[i];
    const double flow = delivered > 0.0 ? mole[limit->index] * m->taken[limit->index] * m->problem->rate->si / delivered : 2.0 * limit->bound;

    return (flow - limit->bound - limit->relaxed) / limit->scale;
}

void optimum_model_limits(const optimum_model *m, const double share[], double c[])
{
    const bc_optimum_problem *p = m->problem;
    const bc_gas gas = bc_mixer_gas(p->mixer, share);
    double mole[BC_BLEND_PARTS_MAX];
    double value = 0.0;
    bool there = false;
    size_t last = BC_LIMIT_MAX;

    bc_mixer_moles(p->mixer, share, mole);
    for (size_t k = 0; k < m->limit_count; k++) {
        const optimum_limit *limit = &m->limit[k];

        if (limit->kind == BC_BOUND_FLOW) {
            c[k] = flow_breach(m, limit, mole);
            continue;
        }
        if (limit->index != last) /* both bounds of a limit stand behind each other */
            there = bc_limit_value(p->within, limit->index, &gas, &value, NULL) == BC_OK;
        last = limit->index;
        c[k] = (limit->kind == BC_BOUND_MIN ? limit->bound - value : value - limit->bound) - limit->relaxed;
        c[k] = there ? c[k] / limit->scale : UNDEFINED_BREACH;
    }
    for (size_t k = 0; p->aims && k < p->aims->limit_count; k++) {
        const bc_limit *aim = &p->aims->limits[k];

        there = bc_limit_value(p->aims, k, &gas, &value, NULL) == BC_OK;
        c[m->limit_count + k] = there ? (value - aim->min) / bc_limit_scale(aim) : UNDEFINED_BREACH;
    }
}

/* As a program sees it: limits follow the goal. */
static void evaluate(const double x[], double *f, double c[], void *data)
{
    const optimum_model *m = data;
    const size_t shares = m->problem->mixer->count;

    optimum_model_limits(m, x, c);
    if (m->goal == GOAL_OBJECTIVE) {
        *f = optimum_model_objective(m, x) / m->scale;
        return;
    }
    if (m->goal == GOAL_ONE) {
        *f = c[m->one];
        c[m->one] = -1.0;
        return;
    }
    *f = x[shares];
    for (size_t k = 0; k < m->limit_count; k++)
        c[k] -= x[shares];
}

void optimum_program(optimum_model *m, program *p)
{
    const bc_optimum_problem *problem = m->problem;

    memset(p, 0, sizeof *p);
    p->shares = problem->mixer->count;
    p->variables = p->shares + (m->goal == GOAL_BREACH ? 1 : 0);
    memcpy(p->low, problem->low, p->shares * sizeof *p->low);
    memcpy(p->high, problem->high, p->shares * sizeof *p->high);
    p->low[p->shares] = -1e3;
    p->high[p->shares] = 1e3;
    p->sum = 1.0;
    p->inequalities = m->limit_count;
    p->equalities = problem->aims ? problem->aims->limit_count : 0;
    p->evaluate = evaluate;
    p->data = m;
}
