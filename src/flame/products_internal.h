/* SPDX-License-Identifier: MIT */
/* products_internal.h - the products of combustion by symbol, their atoms and their polynomials. */
#ifndef PRODUCTS_INTERNAL_H
#define PRODUCTS_INTERNAL_H

#include <stddef.h>

#include "bluecone/equilibrium.h"

enum {
#define PRODUCT(symbol, formula, role, source) PRODUCT_##symbol,
#include "data/products.def"
    PRODUCT_COUNT
};

/* Atoms of C H N O S He Ne Ar in a row of nasa9.def; index valid. */
const signed char *product_atoms(size_t thermo_index);

/* The factors of a1..a7, b1, b2 in Cp/R, H/RT and (H - T S)/RT at one temperature, so that a species
 * costs three short sums and no logarithm. */
typedef struct {
    double t_k;
    int range; /* of the coefficients: 0 below 1000 K, 1 from there on */
    double cp[7], h[8], g[9];
} polynomial_factors;

void polynomial_factors_at(double t_k, polynomial_factors *f);

double polynomial_cp_r(const double a[9], const polynomial_factors *f);
double polynomial_h_rt(const double a[9], const polynomial_factors *f);
double polynomial_g_rt(const double a[9], const polynomial_factors *f);

/* H/RT of a row of nasa9.def, index valid. */
double polynomial_row_h_rt(size_t thermo_index, const polynomial_factors *f);

/* Shares of all atoms below this are rounding: sums of a few terms of order 1 that cancel leave less. */
#define AMOUNT_MIN 4.0e-15

/* Sum of moles, molar mass, enthalpy and element balance of a mixture whose moles, t_k and p_pa are set. */
void mixture_finish(bc_mixture *mixture, const double element_moles[BC_ELEMENTS],
                    const polynomial_factors *f);

/* Temperature at which the products have the enthalpy h_j: a Newton iteration between bounds that start at
 * the ends of the data. Returns the count of iterations; 0 when h_j lies outside. */
int mixture_temperature(const double moles[PRODUCT_COUNT], double h_j, double t_start_k, double *t_k);

#endif
