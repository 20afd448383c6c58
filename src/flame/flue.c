/* SPDX-License-Identifier: MIT */
/* flue.c - complete combustion by a balance of the elements. */
#include "bluecone/flue.h"

#include "base/error_internal.h"
#include "bluecone/oxidant.h"
#include "flame/flue_internal.h"
#include "gas/species_index.h"

#include <math.h>
#include <stdbool.h>

#define R_J_PER_MOL_K 8.31446261815324 /* SI (2019), exact */

static double mass(size_t species)
{
    return bc_species_molar_mass_kg_per_mol(species);
}

/* Amounts of flue gas that atoms make once nothing is left to burn; returns their sum without water. */
static double burnt_amounts(const double atoms[BC_ELEMENTS], double oxygen_mol, bc_gas *amounts)
{
    const bc_gas none = {{0.0}};

    *amounts = none;
    amounts->x[SPECIES_carbon_dioxide] = atoms[BC_C];
    amounts->x[SPECIES_water] = atoms[BC_H] / 2.0;
    amounts->x[SPECIES_sulfur_dioxide] = atoms[BC_S];
    amounts->x[SPECIES_nitrogen] = atoms[BC_N] / 2.0;
    amounts->x[SPECIES_oxygen] = oxygen_mol;
    amounts->x[SPECIES_helium] = atoms[BC_HE];
    amounts->x[SPECIES_neon] = atoms[BC_NE];
    amounts->x[SPECIES_argon] = atoms[BC_AR];
    return atoms[BC_C] + atoms[BC_S] + atoms[BC_N] / 2.0 + oxygen_mol + atoms[BC_HE] + atoms[BC_NE] +
           atoms[BC_AR];
}

double flue_amounts(const oxidant_pair *pair, double lambda, bc_gas *amounts)
{
    double atoms[BC_ELEMENTS];

    for (int k = 0; k < BC_ELEMENTS; k++)
        atoms[k] = pair->fuel[k] + lambda * pair->ratio * pair->oxidant[k];
    /* (lambda - 1) a, not a difference of oxygen atoms: exactly none is left at lambda 1 */
    return burnt_amounts(atoms, (lambda - 1.0) * pair->need, amounts);
}

static void divide_amounts(const bc_gas *amounts, bc_flue *flue)
{
    for (size_t i = 0; i < BC_SPECIES_CAPACITY; i++) {
        flue->wet.x[i] = amounts->x[i] / flue->wet_mol;
        flue->dry.x[i] = flue->dry_mol > 0.0 ? amounts->x[i] / flue->dry_mol : 0.0;
    }
    flue->dry.x[SPECIES_water] = 0.0;
}

bc_status bc_flue_at(const bc_gas *fuel, const bc_gas *oxidant, double lambda, bc_flue *flue, bc_error *err)
{
    oxidant_pair pair;
    bc_gas amounts;

    if (!(lambda >= 1.0) || !isfinite(lambda))
        return bc_fail(err, BC_ERR_RANGE,
                       "lambda is %.6g; complete combustion needs 1 or more, below it ask for equilibrium",
                       lambda);
    const bc_status status = oxidant_pair_of(fuel, oxidant, &pair, err);

    if (status != BC_OK)
        return status;
    flue->lambda = lambda;
    flue->oxidant_mol = lambda * pair.ratio;
    flue->dry_mol = flue_amounts(&pair, lambda, &amounts);
    flue->wet_mol = flue->dry_mol + amounts.x[SPECIES_water];
    divide_amounts(&amounts, flue);
    flue->fuel_kg_per_mol = bc_gas_molar_mass_kg_per_mol(fuel);
    flue->oxidant_kg_per_mol = bc_gas_molar_mass_kg_per_mol(oxidant);
    flue->wet_kg_per_mol = bc_gas_molar_mass_kg_per_mol(&flue->wet);
    flue->dry_kg_per_mol = bc_gas_molar_mass_kg_per_mol(&flue->dry);
    return BC_OK;
}

bc_status bc_flue_co2_max(const bc_gas *fuel, double *x, bc_error *err)
{
    const bc_gas air = bc_oxidant_air();
    bc_flue flue = {.lambda = 1.0};
    const bc_status status = bc_flue_at(fuel, &air, 1.0, &flue, err);

    if (status == BC_OK)
        *x = flue.dry.x[SPECIES_carbon_dioxide];
    return status;
}

static bool is_positive(double value)
{
    return value > 0.0 && isfinite(value);
}

bc_status bc_flue_volume_at(const bc_flue *flue, double t_k, double p_pa, double fuel_m3_per_mol,
                            bc_flue_volume *volume, bc_error *err)
{
    if (!is_positive(t_k) || !is_positive(p_pa))
        return bc_fail(err, BC_ERR_RANGE,
                       "%.6g K and %.6g Pa are no state of a flue gas; both are absolute and above 0", t_k,
                       p_pa);
    if (!is_positive(fuel_m3_per_mol))
        return bc_fail(err, BC_ERR_RANGE, "a molar volume of the fuel of %.6g m3/mol; it is above 0",
                       fuel_m3_per_mol);
    const double m3_per_mol = R_J_PER_MOL_K * t_k / p_pa;
    const double ratio = m3_per_mol / fuel_m3_per_mol;

    volume->wet_m3 = flue->wet_mol * ratio;
    volume->dry_m3 = flue->dry_mol * ratio;
    volume->oxidant_m3 = flue->oxidant_mol * ratio;
    volume->wet_kg_per_m3 = flue->wet_kg_per_mol / m3_per_mol;
    volume->dry_kg_per_m3 = flue->dry_kg_per_mol / m3_per_mol;
    return BC_OK;
}

bc_status flue_factor_of(const double atoms[BC_ELEMENTS], double heat_j_per_mol, bc_flue_factor *factor, bc_error *err)
{
    if (!is_positive(heat_j_per_mol))
        return bc_fail(err, BC_ERR_RANGE,
                       "the gas has a heat of %.6g J/mol; an emission factor needs one above 0",
                       heat_j_per_mol);
    factor->carbon_dioxide = mass(SPECIES_carbon_dioxide) * atoms[BC_C] / heat_j_per_mol;
    factor->sulfur_dioxide = mass(SPECIES_sulfur_dioxide) * atoms[BC_S] / heat_j_per_mol;
    factor->water = mass(SPECIES_water) * atoms[BC_H] / 2.0 / heat_j_per_mol;
    return BC_OK;
}

bc_status bc_flue_factor_of(const bc_gas *fuel, double heat_j_per_mol, bc_flue_factor *factor, bc_error *err)
{
    double atoms[BC_ELEMENTS];

    oxidant_atoms(fuel, atoms);
    return flue_factor_of(atoms, heat_j_per_mol, factor, err);
}

bc_flue_flow bc_flue_flow_at(const bc_flue *flue, double fuel_mol_per_s)
{
    const double wet_mol = flue->wet_mol * fuel_mol_per_s;
    const double *x = flue->wet.x;

    return (bc_flue_flow){
        .fuel_mol = fuel_mol_per_s,
        .oxidant_mol = flue->oxidant_mol * fuel_mol_per_s,
        .wet_mol = wet_mol,
        .dry_mol = flue->dry_mol * fuel_mol_per_s,
        .fuel_kg = flue->fuel_kg_per_mol * fuel_mol_per_s,
        .oxidant_kg = flue->oxidant_kg_per_mol * flue->oxidant_mol * fuel_mol_per_s,
        .wet_kg = flue->wet_kg_per_mol * wet_mol,
        .dry_kg = flue->dry_kg_per_mol * flue->dry_mol * fuel_mol_per_s,
        .carbon_dioxide_kg = x[SPECIES_carbon_dioxide] * wet_mol * mass(SPECIES_carbon_dioxide),
        .water_kg = x[SPECIES_water] * wet_mol * mass(SPECIES_water),
        .sulfur_dioxide_kg = x[SPECIES_sulfur_dioxide] * wet_mol * mass(SPECIES_sulfur_dioxide),
        .nitrogen_kg = x[SPECIES_nitrogen] * wet_mol * mass(SPECIES_nitrogen),
        .oxygen_kg = x[SPECIES_oxygen] * wet_mol * mass(SPECIES_oxygen),
    };
}
