/* SPDX-License-Identifier: MIT */
/* bluecone/dutton.h - Dutton's equivalent mixture, incomplete combustion factor and soot index, and the GB limits.
 *
 * Source: Gas Safety (Management) Regulations 1996 (SI 1996/551) schedule 3, after Dutton; soot index and equivalent
 * mixture, value from memory. The lift index and the hydrogen terms are not known to us and left out. */
#ifndef BLUECONE_DUTTON_H
#define BLUECONE_DUTTON_H

#include <stdbool.h>
#include <stddef.h>

#include "bluecone/gas.h"
#include "bluecone/iso6976.h"
#include "bluecone/status.h"

#ifdef __cplusplus
extern "C" {
#endif

/* Incomplete combustion factor ICF = (WN - 50.73 + 0.03 PN)/1.56 (1): each unit doubles the CO/CO2 of the flue.
 *
 *   wobbe_gross_j_per_m3   WN at 15 C / 15 C, J/m3
 *   pn_percent             propane and nitrogen of the equivalent mixture, %
 * Range: natural gases without hydrogen. */
BC_API double bc_dutton_icf(double wobbe_gross_j_per_m3, double pn_percent);

/* Soot index SI = 0.896 arctan(0.0255 C3H8 - 0.0233 N2 + 0.617) (1), both in % of the equivalent mixture; radians.
 * Range: natural gases without hydrogen. */
BC_API double bc_dutton_soot(double propane_percent, double nitrogen_percent);

/* A gas after Dutton. */
typedef struct {
    double wobbe_gross_j_per_m3; /* 15 C / 15 C, dry */
    double methane_percent, propane_percent, nitrogen_percent; /* equivalent mixture */
    double pn_percent;           /* propane and nitrogen */
    double icf, soot;
    bool clamped;                /* even without nitrogen the mixture has no higher Wobbe index than the gas */
    double wobbe_gap;            /* W of the mixture over W of the gas, less one: 0 unless clamped */
    const char *outside;         /* "" in range, else why the figures say nothing; static */
} bc_dutton;

/* Reduces a gas and evaluates both formulas: other hydrocarbons become methane and propane of equal total volume and
 * equal carbon number; then nitrogen is added until the Wobbe index is that of the gas.
 *
 *   reference   of 15/15 at 101.325 kPa, else BC_ERR_USAGE
 *
 * BC_ERR_RANGE: no hydrocarbons, or a negative share of methane. */
BC_API BC_MUST_USE bc_status bc_dutton_of(const bc_reference *reference, const bc_gas *gas, bc_dutton *out, bc_error *err);

/* A limit of the regulations of Great Britain, as a row. Texts are static. */
typedef struct {
    const char *quantity; /* id of a quantity or species */
    const char *unit, *supply, *valid, *source;
    bool has_min, has_max;
    double min, max;      /* in unit */
} bc_gb_limit;

/* Number of the limits, and each by its index; NULL out of range. Source: as each row says. */
BC_API size_t bc_gb_limit_count(void);
BC_API const bc_gb_limit *bc_gb_limit_at(size_t index);

#ifdef __cplusplus
}
#endif

#endif
