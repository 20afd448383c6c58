/* SPDX-License-Identifier: MIT */
/* bluecone/methane_number.h - knock resistance of natural gas by both routes of ISO/TR 22302.
 *
 * Formulas of this kind stand within some 6 units of an engine test; where the two routes differ by more the report
 * asks for one. The tables of EN 16726 annex A are not known to us: figures here are not that methane number. */
#ifndef BLUECONE_METHANE_NUMBER_H
#define BLUECONE_METHANE_NUMBER_H

#include "bluecone/gas.h"
#include "bluecone/status.h"

#ifdef __cplusplus
extern "C" {
#endif

#define BC_METHANE_NUMBER_SPREAD_MAX 6.0 /* between the routes, ISO/TR 22302:2014 scope */
#define BC_METHANE_NUMBER_HC_MIN 2.5     /* H/C below which the second route does not hold, ISO/TR 22302:2014 */
#define BC_METHANE_NUMBER_FOREIGN_MAX 0.005 /* mole fraction of H2 or CO: neither route has a term; value from memory */

/* Motor octane number from the hydrogen-carbon ratio R of all hydrocarbons,
 * -406.14 + 508.04 R - 173.55 R^2 + 20.17 R^3.
 *
 *   ratio   BC_METHANE_NUMBER_HC_MIN..4, else BC_ERR_RANGE
 *   mon     out: untouched on failure
 *
 * Source: ISO/TR 22302:2014. */
BC_API BC_MUST_USE bc_status bc_motor_octane(double ratio, double *mon, bc_error *err);

/* Both routes; all numbers (1). */
typedef struct {
    double hydrogen_carbon;      /* H/C of the hydrocarbons */
    double mon_linear, mon_ratio;
    double linear, ratio;        /* MN = 1.445 MON - 103.42 of each route */
    double linear_other, ratio_other; /* MN = 1.624 MON - 119.1, in use as well: 8 to 9 higher */
    double spread;               /* |linear - ratio| */
    const char *outside;         /* "" in range, else why the figures are not to be relied on; static */
} bc_methane_number;

/* Evaluates a gas, dried first.
 *
 * BC_ERR_RANGE: no hydrocarbons, hydrogen or carbon monoxide above BC_METHANE_NUMBER_FOREIGN_MAX, or H/C outside of
 * bc_motor_octane(). In range: what has a coefficient makes up 99 %, inerts below 5 % (value from memory), the routes
 * agree. Source: ISO/TR 22302:2014, ISO 15403-1 annex D; coefficients in data/methane_number.def. */
BC_API BC_MUST_USE bc_status bc_methane_number_of(const bc_gas *gas, bc_methane_number *out, bc_error *err);

#ifdef __cplusplus
}
#endif

#endif
