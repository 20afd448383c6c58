/* SPDX-License-Identifier: MIT */
/* bluecone/formation.h - heating values by an enthalpy-of-formation balance: the second route. */
#ifndef BLUECONE_FORMATION_H
#define BLUECONE_FORMATION_H

#include "bluecone/gas.h"
#include "bluecone/status.h"

#ifdef __cplusplus
extern "C" {
#endif

#define BC_FORMATION_T_MIN_K 273.15 /* liquid water below it is ice */
#define BC_FORMATION_T_MAX_K 373.15

/* Heat of combustion of one species, J/mol, all of it burnt with oxygen at t_k and its products brought
 * back to t_k: CO2, N2, SO2 as gases, H2O as liquid (gross) or vapour (net).
 *
 *   q = H(species) + a H(O2) - c H(CO2) - h/2 H(H2O) - n/2 H(N2)
 *     - s H(SO2),  a = c + h/4 - o/2 + s
 *
 *   t_k   BC_FORMATION_T_MIN_K..BC_FORMATION_T_MAX_K, else BC_ERR_RANGE; index out of range: BC_ERR_USAGE
 *   gross_j_per_mol, net_j_per_mol   out: untouched on failure
 *
 * Source of the enthalpies: bluecone/thermo.h. */
BC_API BC_MUST_USE bc_status bc_formation_species(size_t species, double t_k, double *gross_j_per_mol,
                                                  double *net_j_per_mol, bc_error *err);

/* The same for a gas: the sum over its mole fractions, an ideal mixture. */
BC_API BC_MUST_USE bc_status bc_formation_gas(const bc_gas *gas, double t_k, double *gross_j_per_mol,
                                              double *net_j_per_mol, bc_error *err);

#ifdef __cplusplus
}
#endif

#endif
