/* SPDX-License-Identifier: MIT */
/* worst_burner_search.c - figures of a burner as they are searched for: asked of the burner model gas by gas. */
#include "supply/worst_part.h"

#include "base/error_internal.h"
#include "bluecone/flammability.h"
#include "bluecone/methane_number.h"
#include "gas/species_index.h"
#include "supply/burner_internal.h"

#include <math.h>

typedef struct {
    const bc_burner_case *set;
    bc_burner_figure figure;
    bool uncovered; /* a gas that was asked of is outside the method */
} question;

static double oxygen_of(const bc_burner_case *set, const bc_gas *gas, double lambda)
{
    bc_flue flue;

    if (lambda < 1.0)
        return 0.0;
    if (bc_flue_at(gas, &set->air, lambda, &flue, NULL) != BC_OK)
        return HUGE_VAL;
    return (set->burner->o2_basis == BC_FLUE_WET ? flue.wet : flue.dry).x[SPECIES_oxygen];
}

static double flame_of(const bc_burner_case *set, const bc_gas *gas, double lambda)
{
    const bc_burner *b = set->burner;
    bc_reactants r = {.fuel = *gas, .oxidant = set->air, .fuel_t_k = b->gas_k, .oxidant_t_k = b->air_k, .p_pa = b->ambient_pa};
    bc_mixture flame;

    if (!(lambda >= BC_BURN_LAMBDA_MIN && lambda <= BC_BURN_LAMBDA_MAX) ||
        bc_oxidant_for_lambda(gas, &set->air, lambda, &r.oxidant_per_fuel, NULL) != BC_OK || bc_flame_equilibrium(&r, &flame, NULL) != BC_OK)
        return HUGE_VAL;
    return flame.t_k;
}

/* What the trim finds before it moves, over what it aims at or the other way round. */
static double travel_of(const bc_burner_case *set, const bc_subject *gas)
{
    const bc_burner_setting found = bc_burner_setting_as_found();
    burner_flows f;
    double target = 0.0;

    if (burner_flow_of(set, gas, &found, false, &f, NULL) != BC_OK || burner_lambda_target(set, gas, &target, NULL) != BC_OK)
        return HUGE_VAL;
    return set->burner->control == BC_CONTROL_TRIM_GAS ? f.lambda / target : target / f.lambda;
}

static bool has_velocity(const bc_gas *gas, bc_burning_velocity *v)
{
    return bc_burning_velocity_of(gas, v, NULL) == BC_OK && v->in_range;
}

/* Of gases outside of the method, the old one included, there is no ratio. */
static double velocity_of(const bc_gas *gas, const bc_gas *old_gas)
{
    bc_burning_velocity is, was;

    return has_velocity(gas, &is) && has_velocity(old_gas, &was) ? is.value_m_per_s / was.value_m_per_s : HUGE_VAL;
}

static double methane_number_of(const bc_gas *gas)
{
    bc_methane_number n;

    return bc_methane_number_of(gas, &n, NULL) == BC_OK && n.outside[0] == '\0' ? n.linear : HUGE_VAL;
}

static double figure_of(const question *q, const bc_subject *gas, const burner_flows *f)
{
    switch (q->figure) {
    case BC_BURNER_HEAT:
        return f->fuel * gas->value.net_j_per_mol / q->set->old_gas->value.net_j_per_mol;
    case BC_BURNER_LAMBDA:
        return f->lambda;
    case BC_BURNER_TRIM:
        return travel_of(q->set, gas);
    case BC_BURNER_FLUE_O2:
        return oxygen_of(q->set, &gas->gas, f->lambda);
    case BC_BURNER_FLAME:
        return flame_of(q->set, &gas->gas, f->lambda);
    case BC_BURNER_VELOCITY:
        return velocity_of(&gas->gas, &q->set->old_gas->gas);
    case BC_BURNER_METHANE_NUMBER:
        return methane_number_of(&gas->gas);
    case BC_BURNER_FIGURES:
    default:
        return HUGE_VAL;
    }
}

/* A bc_objective: the figure as the burner model has it. */
static double objective(const bc_gas *gas, void *context)
{
    question *q = context;
    const bc_burner_setting found = bc_burner_setting_as_found();
    double value = HUGE_VAL;
    bc_subject subject;
    burner_flows f;

    if (bc_subject_make(q->set->old_gas->reference, gas, NULL, &subject, NULL) == BC_OK &&
        burner_flow_of(q->set, &subject, &found, true, &f, NULL) == BC_OK)
        value = figure_of(q, &subject, &f);
    q->uncovered = q->uncovered || !isfinite(value);
    return value;
}

/* What is said of some of the gases alone would be no answer. */
bc_status worst_search_burner(bc_worst *w, const bc_burner_case *set, bc_burner_figure figure, bc_extremes *extremes, bc_error *err)
{
    question q = {.set = set, .figure = figure};
    bc_extremes found;
    const bc_status status = bc_worst_search(w, objective, &q, &found, err);

    if (status != BC_OK)
        return status;
    if (q.uncovered)
        return bc_fail(err, BC_ERR_RANGE, "some allowed gas has no such figure: it does not burn, or its method does not cover it or the old gas");
    *extremes = found;
    return BC_OK;
}
