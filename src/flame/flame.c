/* SPDX-License-Identifier: MIT */
/* flame.c - reactants and their adiabatic flame. */
#include "bluecone/flame.h"

#include "base/error_internal.h"
#include "bluecone/oxidant.h"
#include "bluecone/thermo.h"
#include "flame/products_internal.h"
#include "gas/species_index.h"

#include <math.h>
#include <string.h>

/* What is left of sums of order 1 by rounding. */
#define ROUNDING 1.0e-12

/* A usual flame: where the search for the temperature starts. */
#define T_START_K 2000.0

/* Atoms per molecule of gas; one pass over its components. */
static void add_elements(const bc_gas *gas, double moles, double element_moles[BC_ELEMENTS])
{
    for (size_t i = 0; i < SPECIES_COUNT; i++) {
        const signed char *atoms = product_atoms(i);
        const double n = gas->x[i] * moles;

        if (n != 0.0)
            for (int k = 0; k < BC_ELEMENTS; k++)
                element_moles[k] += n * atoms[k];
    }
}

/* a = C + H/4 + S - O/2 */
static double oxygen_need(const double elements[BC_ELEMENTS])
{
    return elements[BC_C] + elements[BC_H] / 4.0 + elements[BC_S] - elements[BC_O] / 2.0;
}

bc_status bc_oxidant_for_lambda(const bc_gas *fuel, const bc_gas *oxidant, double lambda,
                                double *oxidant_per_fuel, bc_error *err)
{
    const double need = bc_oxygen_demand(fuel);
    const double supply = -bc_oxygen_demand(oxidant);

    if (!(lambda >= 0.0 && isfinite(lambda)))
        return bc_fail(err, BC_ERR_RANGE, "an oxidant ratio lambda of %g is not possible; it is 0 or more",
                       lambda);
    if (supply <= 0.0)
        return bc_fail(err, BC_ERR_INPUT,
                       "the oxidant has no oxygen to give; name one that has (air, oxygen)");
    if (need < 0.0)
        return bc_fail(err, BC_ERR_INPUT,
                       "the fuel holds %.4g mol of oxygen per mol more than it needs, so lambda has no "
                       "meaning; state the oxidant per mole of fuel",
                       -need);
    *oxidant_per_fuel = lambda * need / supply;
    return BC_OK;
}

static double enthalpy_j(const bc_gas *gas, double t_k)
{
    polynomial_factors f;
    double sum = 0.0;

    polynomial_factors_at(t_k, &f);
    for (size_t i = 0; i < SPECIES_COUNT; i++)
        if (gas->x[i] != 0.0)
            sum += gas->x[i] * polynomial_row_h_rt(i, &f);
    return sum * BC_THERMO_R_J_PER_MOL_K * t_k;
}

static bc_status check_temperature(const char *whose, double t_k, bc_error *err)
{
    if (t_k >= BC_THERMO_T_MIN_K && t_k <= BC_THERMO_T_MAX_K)
        return BC_OK;
    return bc_fail(err, BC_ERR_RANGE, "%s at %.6g K is outside the thermodynamic data, %g to %g K", whose,
                   t_k, BC_THERMO_T_MIN_K, BC_THERMO_T_MAX_K);
}

static bc_status check_reactants(const bc_reactants *r, bc_error *err)
{
    const bc_status status = check_temperature("the fuel", r->fuel_t_k, err);

    if (status != BC_OK)
        return status;
    if (!(r->oxidant_per_fuel >= 0.0 && isfinite(r->oxidant_per_fuel)))
        return bc_fail(err, BC_ERR_RANGE,
                       "%g mol of oxidant per mol of fuel is not possible; it is 0 or more",
                       r->oxidant_per_fuel);
    if (!(r->p_pa >= BC_EQUILIBRIUM_P_MIN_PA && r->p_pa <= BC_EQUILIBRIUM_P_MAX_PA))
        return bc_fail(err, BC_ERR_RANGE,
                       "a pressure of %.6g Pa is outside the range of ideal gases, %g to %g Pa", r->p_pa,
                       BC_EQUILIBRIUM_P_MIN_PA, BC_EQUILIBRIUM_P_MAX_PA);
    return r->oxidant_per_fuel > 0.0 ? check_temperature("the oxidant", r->oxidant_t_k, err) : BC_OK;
}

bc_status bc_reactants_sum(const bc_reactants *reactants, double element_moles[BC_ELEMENTS], double *h_j,
                           bc_error *err)
{
    const bc_status status = check_reactants(reactants, err);

    if (status != BC_OK)
        return status;
    memset(element_moles, 0, BC_ELEMENTS * sizeof *element_moles);
    add_elements(&reactants->fuel, 1.0, element_moles);
    *h_j = enthalpy_j(&reactants->fuel, reactants->fuel_t_k);
    if (reactants->oxidant_per_fuel > 0.0) {
        add_elements(&reactants->oxidant, reactants->oxidant_per_fuel, element_moles);
        *h_j += reactants->oxidant_per_fuel * enthalpy_j(&reactants->oxidant, reactants->oxidant_t_k);
    }
    return BC_OK;
}

/* C to CO2, H to H2O, S to SO2, N to N2; what oxygen is left stays O2. */
static void burn(const double elements[BC_ELEMENTS], double moles[PRODUCT_COUNT])
{
    moles[PRODUCT_carbon_dioxide] = elements[BC_C];
    moles[PRODUCT_water] = elements[BC_H] / 2.0;
    moles[PRODUCT_sulfur_dioxide] = elements[BC_S];
    moles[PRODUCT_nitrogen] = elements[BC_N] / 2.0;
    moles[PRODUCT_oxygen] = fmax(0.0, -oxygen_need(elements));
    moles[PRODUCT_helium] = elements[BC_HE];
    moles[PRODUCT_neon] = elements[BC_NE];
    moles[PRODUCT_argon] = elements[BC_AR];
}

bc_status bc_flame_complete(const bc_reactants *reactants, bc_mixture *flame, bc_error *err)
{
    double elements[BC_ELEMENTS], h_j;
    const bc_status status = bc_reactants_sum(reactants, elements, &h_j, err);
    bc_mixture m = {.p_pa = reactants->p_pa};
    polynomial_factors f;

    if (status != BC_OK)
        return status;
    const double lack = oxygen_need(elements);

    if (lack > ROUNDING * (elements[BC_O] + 1.0))
        return bc_fail(err, BC_ERR_RANGE,
                       "%.4g mol of oxygen per mol of fuel is lacking for complete combustion; ask for the "
                       "equilibrium flame",
                       lack);
    burn(elements, m.moles);
    m.iterations = mixture_temperature(m.moles, h_j, T_START_K, &m.t_k);
    if (m.iterations == 0)
        return bc_fail(err, BC_ERR_RANGE,
                       "the flame with complete combustion is outside the thermodynamic data, %g to %g K; "
                       "ask for the equilibrium flame",
                       BC_THERMO_T_MIN_K, BC_THERMO_T_MAX_K);
    polynomial_factors_at(m.t_k, &f);
    mixture_finish(&m, elements, &f);
    *flame = m;
    return BC_OK;
}

bc_status bc_flame_equilibrium(const bc_reactants *reactants, bc_mixture *flame, bc_error *err)
{
    double elements[BC_ELEMENTS], h_j;
    const bc_status status = bc_reactants_sum(reactants, elements, &h_j, err);

    if (status != BC_OK)
        return status;
    return bc_equilibrium_hp(elements, h_j, reactants->p_pa, flame, err);
}
