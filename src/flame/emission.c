/* SPDX-License-Identifier: MIT */
/* emission.c - ppm, mg/m3, mg/m3 at a reference oxygen and mg/MJ of one reading. */
#include "bluecone/emission.h"

#include "base/error_internal.h"
#include "gas/species_index.h"

#include <math.h>

/* Molar volume of an ideal gas at 273.15 K and 101325 Pa, R = 8.31446261815324 J/(mol K) (SI, 2019). */
#define V0_M3_PER_MOL (8.31446261815324 * 273.15 / 101325.0)

static double kg_per_mol(bc_pollutant pollutant)
{
    static const size_t SPECIES_OF[BC_POLLUTANTS] = {SPECIES_nitrogen_dioxide, SPECIES_carbon_monoxide,
                                                     SPECIES_sulfur_dioxide};

    return bc_species_molar_mass_kg_per_mol(SPECIES_OF[pollutant]);
}

static bc_status check_oxygen(const bc_emission_basis *basis, bc_error *err)
{
    if (!(basis->o2_air > 0.0 && basis->o2_air <= 1.0))
        return bc_fail(err, BC_ERR_RANGE,
                       "an oxidant with %.6g %% oxygen dilutes no flue gas; take 21 or 20.9 %%",
                       basis->o2_air * 100.0);
    if (!(basis->o2_measured >= 0.0 && basis->o2_measured < basis->o2_air))
        return bc_fail(
            err, BC_ERR_RANGE,
            "%.6g %% oxygen measured is not from 0 to below the %.6g %% of the oxidant; check the reading",
            basis->o2_measured * 100.0, basis->o2_air * 100.0);
    if (!(basis->o2_reference >= 0.0 && basis->o2_reference < basis->o2_air))
        return bc_fail(err, BC_ERR_RANGE,
                       "a reference oxygen of %.6g %% is not from 0 to below the %.6g %% of the oxidant",
                       basis->o2_reference * 100.0, basis->o2_air * 100.0);
    return BC_OK;
}

static bc_status check_basis(const bc_emission_basis *basis, bc_emission_form form, bc_error *err)
{
    if ((unsigned)basis->pollutant >= BC_POLLUTANTS || (unsigned)form > BC_EMISSION_PER_HEAT)
        return bc_fail(err, BC_ERR_USAGE, "there is no pollutant %u or no form %u",
                       (unsigned)basis->pollutant, (unsigned)form);
    if (!(basis->dry_mol > 0.0) || !isfinite(basis->dry_mol))
        return bc_fail(err, BC_ERR_RANGE,
                       "a fuel with %.6g mol of dry flue gas per mol has no emission per m3 of it",
                       basis->dry_mol);
    if (!(basis->heat_j_per_mol > 0.0) || !isfinite(basis->heat_j_per_mol))
        return bc_fail(err, BC_ERR_RANGE, "a fuel with a heat of %.6g J/mol has no emission per heat",
                       basis->heat_j_per_mol);
    return check_oxygen(basis, err);
}

bc_status bc_emission_convert(const bc_emission_basis *basis, bc_emission_form form, double value,
                              bc_emission *emission, bc_error *err)
{
    const bc_status status = check_basis(basis, form, err);

    if (status != BC_OK)
        return status;
    if (!(value >= 0.0) || !isfinite(value))
        return bc_fail(err, BC_ERR_RANGE,
                       "an emission of %.6g is negative or not a number; check the reading", value);
    const double spare = basis->o2_air - basis->o2_reference;
    /* each form over the density at the reference oxygen */
    const double density = (basis->o2_air - basis->o2_measured) / spare;
    const double fraction = density * V0_M3_PER_MOL / kg_per_mol(basis->pollutant);
    const double per_heat = basis->dry_mol * V0_M3_PER_MOL * basis->o2_air / spare / basis->heat_j_per_mol;
    const double over[] = {[BC_EMISSION_FRACTION] = fraction,
                           [BC_EMISSION_DENSITY] = density,
                           [BC_EMISSION_DENSITY_AT_REF] = 1.0,
                           [BC_EMISSION_PER_HEAT] = per_heat};
    const double at_ref = value / over[form];

    *emission = (bc_emission){at_ref * fraction, at_ref * density, at_ref, at_ref * per_heat};
    return BC_OK;
}
