/* SPDX-License-Identifier: MIT */
/* formation_internal.h - the balance of one species at a temperature known to be in range. */
#ifndef FORMATION_INTERNAL_H
#define FORMATION_INTERNAL_H

#include <stddef.h>

/* What every balance at one temperature shares: temperature and enthalpies of oxygen and products, J/mol. */
typedef struct {
    double t_k;
    double oxygen, carbon_dioxide, water_liquid, nitrogen, sulfur_dioxide;
} formation_products;

formation_products formation_products_at(double t_k);

/* Gross heat of combustion, J/mol. */
double formation_gross_with(const formation_products *products, size_t species);

/* The same at a temperature that is asked for once. */
double formation_gross_j_per_mol(size_t species, double t_k);

/* Enthalpy of vaporisation of water, J/mol: H(vapour) - H(liquid) of the same data. */
double formation_vaporisation_j_per_mol(double t_k);

#endif
