/* SPDX-License-Identifier: MIT */
/* bluecone/thermo.h - heat capacity, enthalpy and entropy of ideal gases and of liquid water.
 *
 * NASA nine-coefficient polynomials (McBride, Zehe, Gordon, NASA/TP-2002-211556). Enthalpies hold the
 * formation enthalpy from the elements at 298.15 K, so that the difference of two sums of them is the
 * heat of a reaction. Indices below bc_species_count() are the species of bluecone/species.h; those
 * above are products of combustion only (OH, H, O ...). */
#ifndef BLUECONE_THERMO_H
#define BLUECONE_THERMO_H

#include <stddef.h>

#include "bluecone/species.h"
#include "bluecone/status.h"

#ifdef __cplusplus
extern "C" {
#endif

#define BC_THERMO_T_MIN_K 200.0  /* many rows are fitted from 300 K: their low range serves below it */
#define BC_THERMO_T_MAX_K 6000.0 /* upper end of the data set */
#define BC_THERMO_R_J_PER_MOL_K 8.314510 /* the gas constant the polynomials were fitted with */

/* How independent a row is of the heats of ISO 6976. */
typedef enum {
    BC_THERMO_PUBLISHED, /* a row of the data set */
    BC_THERMO_DERIVED,   /* shape by analogy, formation enthalpy of an independent source */
    BC_THERMO_FITTED     /* formation enthalpy set from the ISO heat: no second route */
} bc_thermo_origin;

/* Number of species with thermodynamic data, at least bc_species_count(). */
BC_API size_t bc_thermo_count(void);

/* English name and source of a row; "" for an index out of range. */
BC_API const char *bc_thermo_name(size_t index);
BC_API const char *bc_thermo_source(size_t index);
BC_API bc_thermo_origin bc_thermo_origin_of(size_t index);

/* The nine coefficients of a range (0: below 1000 K, 1: from there on): a1..a7, b1, b2. NULL out of range. */
BC_API const double *bc_thermo_coefficients(size_t index, int range);

/* Atoms of an element in a molecule; 0 for an index out of range. */
BC_API int bc_thermo_atoms(size_t index, bc_element element);

/* Formation enthalpy of the ideal gas at 298.15 K, J/mol; 0 for an index out of range. */
BC_API double bc_thermo_formation_j_per_mol(size_t index);

/* Cp, H and S of the ideal gas at 1 bar.
 *
 *   index   0..bc_thermo_count()-1
 *   t_k     BC_THERMO_T_MIN_K..BC_THERMO_T_MAX_K
 *   out     J/(mol K), J/mol, J/(mol K); untouched on failure
 *
 * BC_ERR_RANGE: temperature out of range; BC_ERR_USAGE: no such index. */
BC_API BC_MUST_USE bc_status bc_thermo_cp(size_t index, double t_k, double *cp_j_per_mol_k, bc_error *err);
BC_API BC_MUST_USE bc_status bc_thermo_enthalpy(size_t index, double t_k, double *h_j_per_mol, bc_error *err);
BC_API BC_MUST_USE bc_status bc_thermo_entropy(size_t index, double t_k, double *s_j_per_mol_k, bc_error *err);

/* Enthalpy of liquid water at saturation, formation enthalpy included, J/mol; 273.15..600 K. */
BC_API BC_MUST_USE bc_status bc_thermo_liquid_water(double t_k, double *h_j_per_mol, bc_error *err);

#ifdef __cplusplus
}
#endif

#endif
