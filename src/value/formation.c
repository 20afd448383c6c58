/* SPDX-License-Identifier: MIT */
/* formation.c - heats of combustion from formation enthalpies. */
#include "bluecone/formation.h"

#include "base/error_internal.h"
#include "gas/species_atoms.h"
#include "value/formation_internal.h"
#include "value/thermo_internal.h"

formation_products formation_products_at(double t_k)
{
    return (formation_products){.t_k = t_k,
                                .oxygen = thermo_h_j_per_mol(THERMO_oxygen, t_k),
                                .carbon_dioxide = thermo_h_j_per_mol(THERMO_carbon_dioxide, t_k),
                                .water_liquid = thermo_liquid_water_j_per_mol(t_k),
                                .nitrogen = thermo_h_j_per_mol(THERMO_nitrogen, t_k),
                                .sulfur_dioxide = thermo_h_j_per_mol(THERMO_sulfur_dioxide, t_k)};
}

double formation_gross_with(const formation_products *p, size_t species)
{
    const double *atoms = SPECIES_ATOMS[species];
    const double c = atoms[BC_C];
    const double h = atoms[BC_H];
    const double n = atoms[BC_N];
    const double s = atoms[BC_S];
    const double oxygen = c + h / 4.0 - atoms[BC_O] / 2.0 + s;
    const double inert = atoms[BC_HE] + atoms[BC_NE] + atoms[BC_AR];

    if (inert > 0.0)
        return 0.0;
    return thermo_h_j_per_mol(species, p->t_k) + oxygen * p->oxygen - c * p->carbon_dioxide - h / 2.0 * p->water_liquid
           - n / 2.0 * p->nitrogen - s * p->sulfur_dioxide;
}

double formation_gross_j_per_mol(size_t species, double t_k)
{
    const formation_products products = formation_products_at(t_k);

    return formation_gross_with(&products, species);
}

double formation_vaporisation_j_per_mol(double t_k)
{
    return thermo_h_j_per_mol(THERMO_water, t_k) - thermo_liquid_water_j_per_mol(t_k);
}

static bc_status check_temperature(double t_k, bc_error *err)
{
    if (t_k >= BC_FORMATION_T_MIN_K && t_k <= BC_FORMATION_T_MAX_K)
        return BC_OK;
    return bc_fail(err, BC_ERR_RANGE, "%.6g C is outside 0 to 100 C, where a heating value refers to liquid water", t_k - 273.15);
}

bc_status bc_formation_species(size_t species, double t_k, double *gross_j_per_mol, double *net_j_per_mol, bc_error *err)
{
    const bc_status status = check_temperature(t_k, err);

    if (status != BC_OK)
        return status;
    if (species >= bc_species_count())
        return bc_fail(err, BC_ERR_USAGE, "there is no species %zu", species);
    const double gross = formation_gross_j_per_mol(species, t_k);

    *gross_j_per_mol = gross;
    *net_j_per_mol = gross - bc_species_atoms(species, BC_H) / 2.0 * formation_vaporisation_j_per_mol(t_k);
    return BC_OK;
}

bc_status bc_formation_gas(const bc_gas *gas, double t_k, double *gross_j_per_mol, double *net_j_per_mol, bc_error *err)
{
    const bc_status status = check_temperature(t_k, err);
    double gross = 0.0;

    if (status != BC_OK)
        return status;
    const formation_products products = formation_products_at(t_k);

    for (size_t i = 0; i < SPECIES_COUNT; i++)
        if (gas->x[i] != 0.0)
            gross += gas->x[i] * formation_gross_with(&products, i);
    *gross_j_per_mol = gross;
    *net_j_per_mol = gross - bc_gas_atoms(gas, BC_H) / 2.0 * formation_vaporisation_j_per_mol(t_k);
    return BC_OK;
}
