/* SPDX-License-Identifier: MIT */
/* worst_burner.c - extremes of the figures of a burner: certified, or else searched for. */
#include "bluecone/worst_burner.h"

#include "base/error_internal.h"
#include "supply/worst_part.h"

/* What a trim holds on every gas is what it was set to. */
static bc_extremes constant(const bc_worst *w, double value)
{
    const bc_extreme end = {.value = value, .gas = worst_gas(w, w->inside), .bounded = true, .bound = value, .exact = true};

    return (bc_extremes){end, end};
}

/* A set burner with its forms. */
typedef struct {
    const bc_burner_case *set;
    burner_ratios r;
    bool trims_gas;
} subject_burner;

/* A figure that follows the gas flow, or its inverse. */
static bc_status certify_flow(bc_worst *w, const subject_burner *b, const bc_ratio *form, bc_extremes *extremes, bc_error *err)
{
    const nozzle_figure behind_nozzle = {b->set, &b->r, form};

    return b->r.nozzle ? worst_certify_nozzle(w, &behind_nozzle, extremes, err) : worst_certify(w, form, extremes, err);
}

static bc_status certify_travel(bc_worst *w, const subject_burner *b, bc_extremes *extremes, bc_error *err)
{
    return certify_flow(w, b, &b->r.travel, extremes, err);
}

/* Whether a trim is proven to hold the oxygen on every allowed gas. */
static bool holds(bc_worst *w, const subject_burner *b)
{
    const double range = b->set->burner->trim_range;
    bc_extremes reach;

    return b->r.trims && certify_travel(w, b, &reach, NULL) == BC_OK && worst_covers(1.0 - range, 1.0 + range, &reach);
}

/* Behind a nozzle the travel is no ratio to cut a space by: then it is proven or searched for as a whole. */
static bc_status certify_trimmed(bc_worst *w, const subject_burner *b, const trimmed_figure *f, bc_extremes *extremes, bc_error *err)
{
    if (!b->r.nozzle)
        return worst_certify_trimmed(w, f, extremes, err);
    return holds(w, b) ? worst_certify(w, f->held, extremes, err) : BC_ERR_SOLVER;
}

static bc_status certify_heat(bc_worst *w, const subject_burner *b, bc_extremes *extremes, bc_error *err)
{
    const trimmed_figure heat = {&b->r.travel, &b->r.heat, &b->r.held_heat, true, b->set->burner->trim_range};

    return b->trims_gas ? certify_trimmed(w, b, &heat, extremes, err) : certify_flow(w, b, &b->r.heat, extremes, err);
}

static bc_status certify_lambda(bc_worst *w, const subject_burner *b, bc_extremes *extremes, bc_error *err)
{
    const trimmed_figure lambda = {&b->r.travel, &b->r.lambda, &b->r.held_lambda, !b->trims_gas, b->set->burner->trim_range};

    if (b->set->burner->control == BC_CONTROL_ENTRAINED)
        return BC_ERR_SOLVER;
    return b->r.trims ? certify_trimmed(w, b, &lambda, extremes, err) : certify_flow(w, b, &b->r.lambda, extremes, err);
}

/* BC_ERR_SOLVER: not of this form, or nothing proven; then it has to be searched for. */
static bc_status certify(bc_worst *w, const bc_burner_case *set, bc_burner_figure figure, bc_extremes *extremes, bc_error *err)
{
    subject_burner b = {.set = set, .trims_gas = set->burner->control == BC_CONTROL_TRIM_GAS};
    worst_term term;

    if (burner_ratios_of(set, &b.r, NULL) != BC_OK || worst_term_of(w, &b.r.heat, &term, NULL) != BC_OK)
        return BC_ERR_SOLVER;
    switch (figure) {
    case BC_BURNER_HEAT:
        return certify_heat(w, &b, extremes, err);
    case BC_BURNER_LAMBDA:
        return certify_lambda(w, &b, extremes, err);
    case BC_BURNER_TRIM:
        return certify_travel(w, &b, extremes, err);
    case BC_BURNER_FLUE_O2:
        if (!holds(w, &b))
            return BC_ERR_SOLVER;
        *extremes = constant(w, set->o2);
        return BC_OK;
    case BC_BURNER_FLAME:
    case BC_BURNER_VELOCITY:
    case BC_BURNER_METHANE_NUMBER:
    case BC_BURNER_FIGURES:
    default:
        return BC_ERR_SOLVER;
    }
}

bc_status bc_worst_burner(bc_worst *w, const bc_burner_case *set, bc_burner_figure figure, bc_extremes *extremes, bc_error *err)
{
    const bc_status status = worst_not_empty(w, err);

    if (status != BC_OK)
        return status;
    if ((size_t)figure >= BC_BURNER_FIGURES)
        return bc_fail(err, BC_ERR_USAGE, "a burner has no figure %d", (int)figure);
    if (figure == BC_BURNER_TRIM && !burner_trims(set->burner))
        return bc_fail(err, BC_ERR_USAGE, "this burner has no trim whose travel could be asked for; its control is %s",
                       bc_control_word(set->burner->control));
    const bc_status proven = certify(w, set, figure, extremes, err);

    return proven == BC_ERR_SOLVER ? worst_search_burner(w, set, figure, extremes, err) : proven;
}
