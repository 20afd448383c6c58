/* SPDX-License-Identifier: MIT */
/* thermo.c - evaluation of the NASA nine-coefficient polynomials. */
#include "bluecone/thermo.h"

#include "base/compiler.h"
#include "base/error_internal.h"
#include "gas/species_index.h"
#include "value/thermo_internal.h"

#include <assert.h>
#include <math.h>

#define JOIN_K 1000.0 /* where the two ranges meet */
#define WATER_T_MIN_K 273.15
#define WATER_T_MAX_K 600.0


typedef struct {
    const char *name, *source;
    signed char atoms[BC_ELEMENTS];
    bc_thermo_origin origin;
    double formation_j_per_mol;
    double low[9], high[9];
} thermo_row;

#define PUBLISHED BC_THERMO_PUBLISHED
#define DERIVED BC_THERMO_DERIVED
#define FITTED BC_THERMO_FITTED

static const thermo_row ROWS[] = {
#define NASA9(symbol, name, c, h, n, o, s, he, ne, ar, dhf, origin, l1, l2, l3, l4, l5, l6, l7, lb1, lb2, h1, h2, h3, h4, h5, \
              h6, h7, hb1, hb2, source)                                                                                      \
    {name, source, {c, h, n, o, s, he, ne, ar}, origin, dhf, {l1, l2, l3, l4, l5, l6, l7, lb1, lb2},                         \
     {h1, h2, h3, h4, h5, h6, h7, hb1, hb2}},
#include "data/nasa9.def"
};

/* nasa9.def starts with the species of species.def, in their order: one index serves both. */
#define SPECIES(symbol, ...) static_assert((int)THERMO_##symbol == (int)SPECIES_##symbol, "nasa9.def and species.def differ at " #symbol);
#include "data/species.def"

typedef struct {
    double t_low_k, t_high_k;
    double coefficients[9];
} condensed_row;

static const condensed_row LIQUID_WATER[] = {
#define SELECT_water_liquid(...) __VA_ARGS__
#define SELECT_graphite(...)
#define LIQUID(symbol, lo, hi, dhf, a1, a2, a3, a4, a5, a6, a7, b1, b2, source) \
    SELECT_##symbol({lo, hi, {a1, a2, a3, a4, a5, a6, a7, b1, b2}},)
#include "data/nasa9_condensed.def"
};

size_t bc_thermo_count(void)
{
    return THERMO_COUNT;
}

const char *bc_thermo_name(size_t index)
{
    return index < THERMO_COUNT ? ROWS[index].name : "";
}

const char *bc_thermo_source(size_t index)
{
    return index < THERMO_COUNT ? ROWS[index].source : "";
}

bc_thermo_origin bc_thermo_origin_of(size_t index)
{
    return index < THERMO_COUNT ? ROWS[index].origin : BC_THERMO_FITTED;
}

const double *bc_thermo_coefficients(size_t index, int range_index)
{
    if (index >= THERMO_COUNT)
        return NULL;
    return range_index == 0 ? ROWS[index].low : ROWS[index].high;
}

int bc_thermo_atoms(size_t index, bc_element element)
{
    return index < THERMO_COUNT ? ROWS[index].atoms[element] : 0;
}

double bc_thermo_formation_j_per_mol(size_t index)
{
    return index < THERMO_COUNT ? ROWS[index].formation_j_per_mol : 0.0;
}

static const double *range_at(size_t index, double t_k)
{
    return t_k < JOIN_K ? ROWS[index].low : ROWS[index].high;
}

/* Cp/R = a1 T^-2 + a2 T^-1 + a3 + a4 T + a5 T^2 + a6 T^3 + a7 T^4 */
double thermo_cp_r(size_t index, double t_k)
{
    const double *a = range_at(index, t_k);

    return (a[0] / t_k + a[1]) / t_k + a[2] + t_k * (a[3] + t_k * (a[4] + t_k * (a[5] + t_k * a[6])));
}

/* H/RT = -a1 T^-2 + a2 ln(T)/T + a3 + a4 T/2 + a5 T^2/3 + a6 T^3/4 + a7 T^4/5 + b1/T */
static double enthalpy_rt(const double a[9], double t_k)
{
    return (-a[0] / t_k + a[1] * log(t_k) + a[7]) / t_k + a[2]
           + t_k * (a[3] / 2.0 + t_k * (a[4] / 3.0 + t_k * (a[5] / 4.0 + t_k * a[6] / 5.0)));
}

double thermo_h_rt(size_t index, double t_k)
{
    return enthalpy_rt(range_at(index, t_k), t_k);
}

/* S/R = -a1 T^-2/2 - a2 T^-1 + a3 ln T + a4 T + a5 T^2/2 + a6 T^3/3 + a7 T^4/4 + b2 */
double thermo_s_r(size_t index, double t_k)
{
    const double *a = range_at(index, t_k);

    return (-a[0] / (2.0 * t_k) - a[1]) / t_k + a[2] * log(t_k) + a[8]
           + t_k * (a[3] + t_k * (a[4] / 2.0 + t_k * (a[5] / 3.0 + t_k * a[6] / 4.0)));
}

double thermo_h_j_per_mol(size_t index, double t_k)
{
    return thermo_h_rt(index, t_k) * BC_THERMO_R_J_PER_MOL_K * t_k;
}

double thermo_liquid_water_j_per_mol(double t_k)
{
    size_t i = 0;

    while (i + 1 < BC_COUNT(LIQUID_WATER) && t_k > LIQUID_WATER[i].t_high_k)
        i++;
    return enthalpy_rt(LIQUID_WATER[i].coefficients, t_k) * BC_THERMO_R_J_PER_MOL_K * t_k;
}

static bc_status check(size_t index, double t_k, bc_error *err)
{
    if (index >= THERMO_COUNT)
        return bc_fail(err, BC_ERR_USAGE, "there is no thermodynamic species %zu", index);
    if (!(t_k >= BC_THERMO_T_MIN_K && t_k <= BC_THERMO_T_MAX_K))
        return bc_fail(err, BC_ERR_RANGE, "%.6g K is outside the thermodynamic data, %g to %g K", t_k, BC_THERMO_T_MIN_K, BC_THERMO_T_MAX_K);
    return BC_OK;
}

bc_status bc_thermo_cp(size_t index, double t_k, double *cp_j_per_mol_k, bc_error *err)
{
    const bc_status status = check(index, t_k, err);

    if (status == BC_OK)
        *cp_j_per_mol_k = thermo_cp_r(index, t_k) * BC_THERMO_R_J_PER_MOL_K;
    return status;
}

bc_status bc_thermo_enthalpy(size_t index, double t_k, double *h_j_per_mol, bc_error *err)
{
    const bc_status status = check(index, t_k, err);

    if (status == BC_OK)
        *h_j_per_mol = thermo_h_j_per_mol(index, t_k);
    return status;
}

bc_status bc_thermo_entropy(size_t index, double t_k, double *s_j_per_mol_k, bc_error *err)
{
    const bc_status status = check(index, t_k, err);

    if (status == BC_OK)
        *s_j_per_mol_k = thermo_s_r(index, t_k) * BC_THERMO_R_J_PER_MOL_K;
    return status;
}

bc_status bc_thermo_liquid_water(double t_k, double *h_j_per_mol, bc_error *err)
{
    if (!(t_k >= WATER_T_MIN_K && t_k <= WATER_T_MAX_K))
        return bc_fail(err, BC_ERR_RANGE, "%.6g K is outside the data of liquid water, %g to %g K", t_k, WATER_T_MIN_K, WATER_T_MAX_K);
    *h_j_per_mol = thermo_liquid_water_j_per_mol(t_k);
    return BC_OK;
}
