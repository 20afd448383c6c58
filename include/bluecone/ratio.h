/* SPDX-License-Identifier: MIT */
/* bluecone/ratio.h - figures of a gas that are a ratio of linear sums over its mole fractions.
 *
 * Heating values, density, Wobbe index, air demand and their like depend on the mole fractions x only as
 *
 *   value = scale N / (D^p Z^r)   or, inverse,   value = scale D^p Z^r / N,
 *   N = sum n x,  D = sum d x,  Z = 1 - q (sum s x)^2,
 *
 * with p and r not negative and p + r <= 1, so that D^p Z^r is concave. Extremes of such figures can be
 * certified (bluecone/worst.h). */
#ifndef BLUECONE_RATIO_H
#define BLUECONE_RATIO_H

#include <stdbool.h>
#include <stddef.h>

#include "bluecone/gas.h"
#include "bluecone/iso6976.h"
#include "bluecone/status.h"

#ifdef __cplusplus
extern "C" {
#endif

/* A figure in that form; the arrays run over species. */
typedef struct {
    double over[BC_SPECIES_CAPACITY];   /* n */
    double under[BC_SPECIES_CAPACITY];  /* d; of no matter when p is 0 */
    double factor[BC_SPECIES_CAPACITY]; /* s; of no matter when r is 0 */
    double under_power, z_power;        /* p, r */
    double pressure;                    /* q, metering pressure over 101.325 kPa */
    double scale;                       /* above zero */
    bool inverse;
    bool proxy;      /* the quantity is not this value but rises with it (a dew point with its water) */
    bool saturated;  /* the sums are of the gas with water left out and the rest scaled up to one; the
                        coefficients then hold the water that the state adds */
} bc_ratio;

/* The form of a quantity at a reference state, in the unit of the quantity.
 *
 *   quantity    index of bc_quantity_at()
 *   ratio       out: untouched on failure
 *
 * BC_ERR_USAGE: the quantity is not of this form (a flame temperature); BC_ERR_RANGE: as
 * bc_gas_saturated(). Source: ISO 6976:2016 clauses 5 to 10 and the atom balances of bluecone/flue.h. */
BC_API BC_MUST_USE bc_status bc_ratio_of_quantity(size_t quantity, const bc_reference *reference, bc_ratio *ratio, bc_error *err);

/* A weighted sum of the mole fractions of the gas as composed: the fraction of a component or a group.
 *
 *   weight   BC_SPECIES_CAPACITY weights, 1 for what counts
 *   scale    of the value: 100 for mole percent */
BC_API bc_ratio bc_ratio_of_fraction(const double weight[], double scale);

/* A weighted sum per volume of the real gas at the metering state.
 *
 *   weight   BC_SPECIES_CAPACITY amounts of what counts, per mole of the species: kg for a mass
 *   scale    of the value: 1e6 for mg/m3
 *   ratio    out: untouched on failure
 *
 * BC_ERR_RANGE: as bc_gas_saturated(). */
BC_API BC_MUST_USE bc_status bc_ratio_of_concentration(const double weight[], double scale, const bc_reference *reference, bc_ratio *ratio,
                                                       bc_error *err);

/* Evaluates a ratio for a gas as composed.
 *
 *   value   out: untouched on failure
 *
 * BC_ERR_RANGE: what the figure is divided by is not above zero (CO2 per heat of an inert gas). */
BC_API BC_MUST_USE bc_status bc_ratio_evaluate(const bc_ratio *ratio, const bc_gas *gas, double *value, bc_error *err);

#ifdef __cplusplus
}
#endif

#endif
