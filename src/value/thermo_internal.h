/* SPDX-License-Identifier: MIT */
/* thermo_internal.h - the polynomials without range checks, for loops that have checked already. */
#ifndef THERMO_INTERNAL_H
#define THERMO_INTERNAL_H

#include "bluecone/thermo.h"

/* The thermodynamic species by symbol. */
enum {
#define NASA9(symbol, ...) THERMO_##symbol,
#include "data/nasa9.def"
    THERMO_COUNT
};

/* Cp/R, H/(R T) and S/R of one species at t_k; index and temperature are valid. */
double thermo_cp_r(size_t index, double t_k);
double thermo_h_rt(size_t index, double t_k);
double thermo_s_r(size_t index, double t_k);

/* H in J/mol; index and temperature are valid. */
double thermo_h_j_per_mol(size_t index, double t_k);
double thermo_liquid_water_j_per_mol(double t_k);

#endif
