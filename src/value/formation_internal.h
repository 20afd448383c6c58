/* SPDX-License-Identifier: MIT */
/* formation_internal.h - the balance of one species at a temperature known to be in range. */
#ifndef FORMATION_INTERNAL_H
#define FORMATION_INTERNAL_H

#include <stddef.h>

/* Gross heat of combustion, J/mol. */
double formation_gross_j_per_mol(size_t species, double t_k);

/* Enthalpy of vaporisation of water, J/mol: H(vapour) - H(liquid) of the same data. */
double formation_vaporisation_j_per_mol(double t_k);

#endif
