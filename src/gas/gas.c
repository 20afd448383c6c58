/* SPDX-License-Identifier: MIT */
/* gas.c - making gases from amounts, and their water and air. */
#include "bluecone/gas.h"

#include "base/error_internal.h"
#include "bluecone/steam.h"
#include "gas/species_atoms.h"

#include <float.h>
#include <math.h>

bc_status bc_gas_from_amounts(const double amounts[], bc_gas *gas, bc_error *err)
{
    double sum = 0.0;

    for (size_t i = 0; i < SPECIES_COUNT; i++) {
        if (!(amounts[i] >= 0.0 && amounts[i] <= DBL_MAX))
            return bc_fail(err, BC_ERR_INPUT, "the amount of %s is negative or not a number", bc_species_id(i));
        sum += amounts[i];
    }
    if (!(sum > 0.0) || !isfinite(sum))
        return bc_fail(err, BC_ERR_INPUT, "the gas has no components; give at least one a share above zero");
    for (size_t i = 0; i < BC_SPECIES_CAPACITY; i++)
        gas->x[i] = i < SPECIES_COUNT && amounts[i] > 0.0 ? amounts[i] / sum : 0.0;
    return BC_OK;
}

double bc_gas_molar_mass_kg_per_mol(const bc_gas *gas)
{
    double mass = 0.0;

    for (size_t i = 0; i < SPECIES_COUNT; i++)
        if (gas->x[i] != 0.0) /* most species are not there: the sum is asked for often */
            mass += gas->x[i] * bc_species_molar_mass_kg_per_mol(i);
    return mass;
}

double bc_gas_atoms(const bc_gas *gas, bc_element element)
{
    double atoms = 0.0;

    for (size_t i = 0; i < SPECIES_COUNT; i++)
        if (gas->x[i] != 0.0)
            atoms += gas->x[i] * SPECIES_ATOMS[i][element];
    return atoms;
}

bc_gas bc_gas_air(void)
{
    bc_gas air = {{0.0}};
    double sum = 0.0;

#define AIR(symbol, fraction, source) air.x[SPECIES_##symbol] = fraction;
#include "data/air.def"
    for (size_t i = 0; i < SPECIES_COUNT; i++)
        sum += air.x[i];
    for (size_t i = 0; i < SPECIES_COUNT; i++)
        air.x[i] /= sum;
    return air;
}

bc_status bc_gas_dry(const bc_gas *gas, bc_gas *dry, bc_error *err)
{
    bc_gas copy = *gas;

    copy.x[SPECIES_water] = 0.0;
    return bc_gas_from_amounts(copy.x, dry, err);
}

bc_status bc_gas_saturated(const bc_gas *gas, double t_k, double p_pa, bc_gas *wet, bc_error *err)
{
    double p_sat_pa = 0.0;
    bc_gas dry;
    bc_status status = BC_OK;

    if (!(t_k >= 223.15 && t_k <= 373.15))
        return bc_fail(err, BC_ERR_RANGE, "a gas is saturated between -50 and 100 C, not at %.6g C; give its real temperature",
                       t_k - 273.15);
    status = bc_steam_pressure(t_k, &p_sat_pa, err);
    if (status != BC_OK)
        return status;
    if (!(p_pa > p_sat_pa))
        return bc_fail(err, BC_ERR_RANGE, "at %.6g C water boils below %.6g kPa; a saturated gas needs a higher pressure",
                       t_k - 273.15, p_sat_pa * 1e-3);
    status = bc_gas_dry(gas, &dry, err);
    if (status != BC_OK)
        return status;
    const double x_water = p_sat_pa / p_pa;

    for (size_t i = 0; i < SPECIES_COUNT; i++)
        dry.x[i] *= 1.0 - x_water;
    dry.x[SPECIES_water] = x_water;
    *wet = dry;
    return BC_OK;
}

bc_status bc_gas_air_free(const bc_gas *gas, bc_gas *pure, double *air, bc_error *err)
{
    const bc_gas standard = bc_gas_air();
    const double share = gas->x[SPECIES_oxygen] / standard.x[SPECIES_oxygen];
    bc_gas rest = *gas;

    for (size_t i = 0; i < SPECIES_COUNT; i++) {
        const double left = gas->x[i] - share * standard.x[i];

        rest.x[i] = left > 0.0 ? left : 0.0;
    }
    rest.x[SPECIES_oxygen] = 0.0;
    const bc_status status = bc_gas_from_amounts(rest.x, pure, err);

    if (status == BC_OK && air)
        *air = share < 1.0 ? share : 1.0;
    return status;
}
