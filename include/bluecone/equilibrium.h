/* SPDX-License-Identifier: MIT */
/* bluecone/equilibrium.h - chemical equilibrium of an ideal gas mixture.
 *
 * What a mixture of given elements becomes when every reaction has run its course: the composition of
 * least Gibbs energy, at a temperature and pressure or at an enthalpy and pressure (an adiabatic flame).
 * Gases only: no liquid water, no soot. Where the elements hold more carbon than oxygen (C/O > 1) soot
 * would form in a real flame, and the gas-only result is no more than a formality.
 *
 * Method: Newton's on the element potentials (Gordon and McBride, NASA RP-1311, 1994), standard pressure
 * 1 bar, data of bluecone/thermo.h. Tested for lambda 0.3..20, 250..4500 K, 0.05..100 bar. */
#ifndef BLUECONE_EQUILIBRIUM_H
#define BLUECONE_EQUILIBRIUM_H

#include <stddef.h>

#include "bluecone/species.h"
#include "bluecone/status.h"

#ifdef __cplusplus
extern "C" {
#endif

/* Slots in arrays over products of combustion; slots from bc_product_count() on are always zero. */
#define BC_PRODUCT_CAPACITY 64

#define BC_EQUILIBRIUM_P_MIN_PA 1.0e2 /* ideal gases; tested from 5 kPa */
#define BC_EQUILIBRIUM_P_MAX_PA 1.0e8 /* tested to 10 MPa; real-gas effects are not in the data */

#define BC_EQUILIBRIUM_MOL_MIN 1.0e-200 /* of atoms in all: beyond these a result would leave the range of a double */
#define BC_EQUILIBRIUM_MOL_MAX 1.0e200

/* A mixture of products of combustion, a plain value. */
typedef struct {
    double moles[BC_PRODUCT_CAPACITY]; /* amount of each product, mol */
    double total_moles;                /* their sum */
    double t_k, p_pa;
    double enthalpy_j; /* of all of it, formation enthalpies included */
    double molar_mass_kg_per_mol;
    double element_residual; /* largest |element in - element out| / (element in) */
    int iterations;
} bc_mixture;

/* Number of products of combustion considered. */
BC_API size_t bc_product_count(void);

/* The index of a product in the tables of bluecone/thermo.h (name, atoms, enthalpy); an index from
 * bc_product_count() on gives bc_thermo_count(), which those answer with "" and 0. */
BC_API size_t bc_product_thermo(size_t product);

/* Formula ("CO2"), why the product is considered, and the source of its data; "" out of range. */
BC_API const char *bc_product_formula(size_t product);
BC_API const char *bc_product_role(size_t product);
BC_API const char *bc_product_source(size_t product);

/* The product that is a row of bluecone/thermo.h; bc_product_count() when none is. Rows below
 * bc_species_count() are the species of a bc_gas. */
BC_API size_t bc_product_of(size_t thermo_index);

/* Equilibrium at temperature and pressure.
 *
 *   element_moles   amount of each element, mol of atoms, BC_ELEMENTS of them, not negative, in all
 *                   BC_EQUILIBRIUM_MOL_MIN..BC_EQUILIBRIUM_MOL_MAX; shares of all atoms below 1e-14 are left out
 *   t_k             BC_THERMO_T_MIN_K..BC_THERMO_T_MAX_K
 *   p_pa            BC_EQUILIBRIUM_P_MIN_PA..BC_EQUILIBRIUM_P_MAX_PA
 *   mixture         out: untouched on failure
 *
 * BC_ERR_RANGE: t_k or p_pa outside; BC_ERR_INPUT: a negative, non-finite, empty or too large or small sum of elements, or
 * elements that no gas of the list can hold (carbon alone); BC_ERR_SOLVER: not found (a defect).
 * Source: Gordon and McBride, NASA RP-1311 (1994), sections 2.3 and 3. */
BC_API BC_MUST_USE bc_status bc_equilibrium_tp(const double element_moles[BC_ELEMENTS], double t_k,
                                               double p_pa, bc_mixture *mixture, bc_error *err);

/* Equilibrium at enthalpy and pressure.
 *
 *   h_j   enthalpy of the elements' whole amount, J, formation enthalpies included
 *
 * BC_ERR_RANGE also when the temperature that belongs to h_j is outside the thermodynamic data; else as
 * bc_equilibrium_tp(). The enthalpy closes to 1e-10 of the sum of |n_j H_j|; at 1000 K, where the two
 * ranges of the data differ by up to 0.16 J/mol, within that. */
BC_API BC_MUST_USE bc_status bc_equilibrium_hp(const double element_moles[BC_ELEMENTS], double h_j,
                                               double p_pa, bc_mixture *mixture, bc_error *err);

#ifdef __cplusplus
}
#endif

#endif
