/* SPDX-License-Identifier: MIT */
/* bluecone/gas.h - a gas: mole fractions over the species table, as a plain value.
 *
 * A gas is copied and returned, never owned. Every function of the library that takes one expects
 * fractions that are not negative and add up to one, as every function that makes one leaves them. */
#ifndef BLUECONE_GAS_H
#define BLUECONE_GAS_H

#include <stdbool.h>
#include <stddef.h>

#include "bluecone/species.h"
#include "bluecone/status.h"

#ifdef __cplusplus
extern "C" {
#endif

/* Mole fractions, by species index. Frozen in size by BC_SPECIES_CAPACITY. */
typedef struct {
    double x[BC_SPECIES_CAPACITY];
} bc_gas;

/* Independent sources of uncertainty of a composition: dx[k] is the change of every mole fraction
 * when source k moves by one standard deviation, so that for any quantity Y
 *   u2(Y) = sum over k of (sum over j of dY/dx_j dx[k][j])^2.
 * Closure (fractions add up to one), a component by difference and a change of basis are in the dx. */
typedef struct {
    size_t count;
    double dx[BC_SPECIES_CAPACITY][BC_SPECIES_CAPACITY];
} bc_spread;

/* Scales amounts of substance to mole fractions.
 *
 *   amounts   BC_SPECIES_CAPACITY amounts, any common unit, not negative, finite
 *   gas       out: the gas; untouched on failure
 *
 * BC_ERR_INPUT: a negative or non-finite amount, or a sum of zero. */
BC_API BC_MUST_USE bc_status bc_gas_from_amounts(const double amounts[], bc_gas *gas, bc_error *err);

/* Molar mass, kg/mol, from the atomic masses of ISO 6976:2016. */
BC_API double bc_gas_molar_mass_kg_per_mol(const bc_gas *gas);

/* Atoms of an element per molecule of gas, mol/mol. */
BC_API double bc_gas_atoms(const bc_gas *gas, bc_element element);

/* Dry air of the CIPM-2007 equation (Picard et al., Metrologia 45, 2008); krypton and xenon count as
 * argon. */
BC_API bc_gas bc_gas_air(void);

/* The gas without its water. BC_ERR_INPUT when there is nothing but water. */
BC_API BC_MUST_USE bc_status bc_gas_dry(const bc_gas *gas, bc_gas *dry, bc_error *err);

/* The gas saturated with water vapour over liquid water or, below 0.01 C, over ice; its own water is
 * replaced: x_w = p_sat(T)/p.
 *
 *   t_k, p_pa   temperature 223.15..373.15 K and pressure of the gas, over p_sat(T)
 *
 * BC_ERR_RANGE outside of it. Source: IAPWS SR1-86(1992), IAPWS R14-08(2011); ideal mixing (the
 * enhancement factor, 1.004 at 20 C and 1 atm after Greenspan 1976, is neglected). */
BC_API BC_MUST_USE bc_status bc_gas_saturated(const bc_gas *gas, double t_k, double p_pa, bc_gas *wet,
                                              bc_error *err);

/* The gas without the air that its oxygen stands for: all oxygen leaves together with nitrogen (and
 * argon) in the proportion of dry air, as far as there is any.
 *
 *   air         out: mole fraction of air that was taken out; may be NULL
 *
 * BC_ERR_INPUT when nothing but air is left. */
BC_API BC_MUST_USE bc_status bc_gas_air_free(const bc_gas *gas, bc_gas *pure, double *air, bc_error *err);

#ifdef __cplusplus
}
#endif

#endif
