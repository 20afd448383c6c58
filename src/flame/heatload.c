/* SPDX-License-Identifier: MIT */
/* heatload.c - the enthalpy path of a flame and the efficiency that follows. */
#include "bluecone/heatload.h"

#include "base/error_internal.h"
#include "bluecone/steam.h"
#include "bluecone/thermo.h"
#include "gas/species_index.h"
#include "value/thermo_internal.h"

#include <math.h>

#define LIQUID_T_MAX_K 600.0 /* end of the liquid row of NASA/TP-2002-211556 */

static bc_status check_temperature(double t_k, const char *what, bc_error *err)
{
    if (t_k >= BC_THERMO_T_MIN_K && t_k <= BC_THERMO_T_MAX_K)
        return BC_OK;
    return bc_fail(err, BC_ERR_RANGE,
                   "a temperature of the %s of %.6g K is outside the thermodynamic data, %g to %g K", what,
                   t_k, BC_THERMO_T_MIN_K, BC_THERMO_T_MAX_K);
}

static bc_status check_case(const bc_heat_case *heat_case, bc_error *err)
{
    bc_status status = check_temperature(heat_case->fuel_k, "fuel", err);

    if (status == BC_OK)
        status = check_temperature(heat_case->oxidant_k, "oxidant", err);
    if (status == BC_OK)
        status = check_temperature(heat_case->exit_k, "flue gas", err);
    return status;
}

/* Two sums over the species of a stream. */
typedef struct {
    double formation_j, increment_j;
} stream_sum;

/* Fills the terms of `mol` moles of a gas at t_k. */
static stream_sum fill_terms(const bc_gas *gas, double mol, double t_k, bc_heat_term terms[])
{
    stream_sum sum = {0.0, 0.0};

    for (size_t i = 0; i < BC_SPECIES_CAPACITY; i++) {
        terms[i] = (bc_heat_term){0.0, 0.0, 0.0};
        if (i >= SPECIES_COUNT || gas->x[i] == 0.0)
            continue;
        const double formation = thermo_h_j_per_mol(i, BC_HEAT_T0_K);
        const double increment = t_k == BC_HEAT_T0_K ? 0.0 : thermo_h_j_per_mol(i, t_k) - formation;

        terms[i] = (bc_heat_term){mol * gas->x[i], formation, increment};
        sum.formation_j += terms[i].mol * formation;
        sum.increment_j += terms[i].mol * increment;
    }
    return sum;
}

static double vaporisation_j_per_mol(double t_k)
{
    return thermo_h_j_per_mol(THERMO_water, t_k) - thermo_liquid_water_j_per_mol(t_k);
}

/* Finds what condenses; nothing where that was not asked for. */
static bc_status condense(const bc_heat_case *heat_case, const bc_flue *flue, bc_condensation *condensation,
                          bc_error *err)
{
    if (!heat_case->condensing) {
        *condensation = (bc_condensation){.exit_mol = 1.0, .exit = flue->wet};
        return BC_OK;
    }
    const bc_status status = bc_condense(&flue->wet, heat_case->exit_k, heat_case->p_pa, condensation, err);

    if (status == BC_OK && condensation->condenses && heat_case->exit_k > LIQUID_T_MAX_K)
        return bc_fail(err, BC_ERR_RANGE, "water condenses at %.6g K, above the data of liquid water, %g K",
                       heat_case->exit_k, LIQUID_T_MAX_K);
    return status;
}

static void walk(const bc_heat_case *heat_case, bc_heat_path *path)
{
    const bc_flue *flue = &path->flue;
    const stream_sum fuel = fill_terms(heat_case->fuel, 1.0, heat_case->fuel_k, path->fuel);
    const stream_sum oxidant =
        fill_terms(heat_case->oxidant, flue->oxidant_mol, heat_case->oxidant_k, path->oxidant);
    const stream_sum products = fill_terms(&flue->wet, flue->wet_mol, heat_case->exit_k, path->products);

    path->fuel_j = -fuel.increment_j;
    path->oxidant_j = -oxidant.increment_j;
    path->reaction_j = products.formation_j - fuel.formation_j - oxidant.formation_j;
    path->products_j = products.increment_j;
    path->condensate_mol = path->condensation.condensate_mol * flue->wet_mol;
    path->condensation_j =
        path->condensate_mol > 0.0 ? -path->condensate_mol * vaporisation_j_per_mol(heat_case->exit_k) : 0.0;
    path->total_j =
        path->fuel_j + path->oxidant_j + path->reaction_j + path->products_j + path->condensation_j;
    path->net_j = -path->reaction_j;
    path->gross_j =
        path->net_j + bc_gas_atoms(heat_case->fuel, BC_H) / 2.0 * vaporisation_j_per_mol(BC_HEAT_T0_K);
}

bc_status bc_heat_path_of(const bc_heat_case *heat_case, bc_heat_path *path, bc_error *err)
{
    bc_flue flue;
    bc_condensation condensation;
    bc_status status = check_case(heat_case, err);

    if (status == BC_OK)
        status = bc_flue_at(heat_case->fuel, heat_case->oxidant, heat_case->lambda, &flue, err);
    if (status == BC_OK)
        status = condense(heat_case, &flue, &condensation, err);
    if (status != BC_OK)
        return status;
    path->flue = flue;
    path->condensation = condensation;
    walk(heat_case, path);
    return BC_OK;
}

bc_status bc_heat_yield_of(const bc_heat_path *path, double casing_loss, bc_heat_yield *yield, bc_error *err)
{
    if (!(casing_loss >= 0.0 && casing_loss <= 1.0))
        return bc_fail(err, BC_ERR_RANGE, "a casing loss of %.6g %% is not between 0 and 100 %%",
                       casing_loss * 100.0);
    if (!(path->net_j > 0.0))
        return bc_fail(err, BC_ERR_RANGE, "the gas has a net heat of %.6g J/mol: there is no efficiency",
                       path->net_j);
    const double released = -path->total_j;
    const double casing = casing_loss * path->net_j;
    const double useful = released - casing;

    *yield = (bc_heat_yield){
        .released_j = released,
        .casing_j = casing,
        .useful_j = useful,
        .efficiency_net = useful / path->net_j,
        .efficiency_gross = useful / path->gross_j,
        .stack_loss_net = 1.0 - released / path->net_j,
        .stack_loss_gross = 1.0 - released / path->gross_j,
        .casing_loss_net = casing_loss,
        .casing_loss_gross = casing / path->gross_j,
        .released_per_oxidant_j = released / path->flue.oxidant_mol,
    };
    return BC_OK;
}

bc_status bc_heat_rate(const bc_heat_yield *yield, double duty_w, double *fuel_mol_per_s, bc_error *err)
{
    if (!(duty_w >= 0.0) || !isfinite(duty_w))
        return bc_fail(err, BC_ERR_RANGE, "a duty of %.6g W is negative or not a number", duty_w);
    if (!(yield->useful_j > 0.0))
        return bc_fail(err, BC_ERR_RANGE,
                       "nothing of the heat is useful (%.6g J/mol): the flue gas leaves too hot for any duty",
                       yield->useful_j);
    *fuel_mol_per_s = duty_w / yield->useful_j;
    return BC_OK;
}

double bc_heat_duty_w(const bc_heat_yield *yield, double fuel_mol_per_s)
{
    return yield->useful_j * fuel_mol_per_s;
}
