/* SPDX-License-Identifier: MIT */
/* bluecone/flame.h - the adiabatic flame: what fuel and oxidant bring, and how hot their products get.
 *
 * Both gases are ideal and each brings its own enthalpy at its own temperature; no heat is lost and the
 * pressure stays. A flame figure is an upper bound: a real flame radiates. */
#ifndef BLUECONE_FLAME_H
#define BLUECONE_FLAME_H

#include "bluecone/equilibrium.h"
#include "bluecone/gas.h"
#include "bluecone/status.h"

#ifdef __cplusplus
extern "C" {
#endif

/* What goes into a flame, per mole of fuel gas. */
typedef struct {
    bc_gas fuel, oxidant;
    double fuel_t_k;         /* BC_THERMO_T_MIN_K..BC_THERMO_T_MAX_K */
    double oxidant_t_k;      /* the same; not read without oxidant */
    double oxidant_per_fuel; /* mol/mol, not negative; 0: the fuel alone */
    double p_pa;             /* BC_EQUILIBRIUM_P_MIN_PA..BC_EQUILIBRIUM_P_MAX_PA */
} bc_reactants;

/* Oxidant for a ratio lambda (1/phi): the fuel's need times lambda over what the oxidant gives,
 *   oxidant/fuel = lambda a(fuel) / -a(oxidant),  mol/mol.
 *
 *   lambda             0 or more
 *   oxidant_per_fuel   out: mol/mol, untouched on failure; 0 for a fuel that is inert
 *
 * BC_ERR_RANGE: lambda negative or not finite; BC_ERR_INPUT: an oxidant without oxygen to give, or a
 * fuel that has more oxygen than it needs (lambda has no meaning there). */
BC_API BC_MUST_USE bc_status bc_oxidant_for_lambda(const bc_gas *fuel, const bc_gas *oxidant, double lambda,
                                                   double *oxidant_per_fuel, bc_error *err);

/* Elements, mol of atoms, and enthalpy, J, of the reactants per mole of fuel.
 *
 *   element_moles   out: BC_ELEMENTS values
 *   h_j             out: formation enthalpies included
 *
 * BC_ERR_RANGE: a temperature, the pressure or oxidant_per_fuel outside of its range. Source of the
 * enthalpies: bluecone/thermo.h. */
BC_API BC_MUST_USE bc_status bc_reactants_sum(const bc_reactants *reactants,
                                              double element_moles[BC_ELEMENTS], double *h_j, bc_error *err);

/* Adiabatic flame with complete combustion: only CO2, H2O, SO2, N2, surplus O2 and inert gases. Without
 * dissociation it runs 5 K (lambda 1.7) to 100 K (lambda 1) hotter than equilibrium in air, 2000 K in oxygen.
 *
 *   flame   out: products per mole of fuel, untouched on failure
 *
 * BC_ERR_RANGE: less oxygen than complete combustion needs (use bc_flame_equilibrium), a flame beyond
 * the thermodynamic data, or as bc_reactants_sum(). */
BC_API BC_MUST_USE bc_status bc_flame_complete(const bc_reactants *reactants, bc_mixture *flame,
                                               bc_error *err);

/* Adiabatic flame in chemical equilibrium: bc_equilibrium_hp() of the reactants. For reactants that
 * cannot burn this is the temperature of mixing. Errors as there and of bc_reactants_sum(). */
BC_API BC_MUST_USE bc_status bc_flame_equilibrium(const bc_reactants *reactants, bc_mixture *flame,
                                                  bc_error *err);

#ifdef __cplusplus
}
#endif

#endif
