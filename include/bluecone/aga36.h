/* SPDX-License-Identifier: MIT */
/* bluecone/aga36.h - lifting, flashback and yellow tip index of AGA Bulletin 36.
 *
 * Source: AGA Research Bulletin 36, Interchangeability of other fuel gases with natural gases, 1946, value from
 * memory; constants in data/aga36.def, limits in data/aga36_limits.def. No published worked value is known to us. */
#ifndef BLUECONE_AGA36_H
#define BLUECONE_AGA36_H

#include <stdbool.h>

#include "bluecone/gas.h"
#include "bluecone/iso6976.h"
#include "bluecone/status.h"

#ifdef __cplusplus
extern "C" {
#endif

/* Class of the gas the burner was adjusted on; it picks the limits. The borders of the classes are from memory with
 * low confidence: high inert has over 10 % inert and less than 1000 Btu/ft3, high Btu 1100 Btu/ft3 or more. */
typedef enum { BC_AGA_HIGH_METHANE, BC_AGA_HIGH_BTU, BC_AGA_HIGH_INERT, BC_AGA_CLASSES } bc_aga_class;

/* What the indices take of a gas; it is dried first. */
typedef struct {
    double gross_j_per_m3;   /* h: real gas, dry, 60 F and 30 inHg */
    double relative_density; /* d */
    double air;              /* A, m3 air/m3 from the method's table, less what its own oxygen saves */
    double lifting_constant; /* K = sum K x/d */
    double yellow_tip_limit; /* Y = 100 sum T x/(A + 7 I - 26.3 O2), % primary air; 0: burns without yellow tips */
    bc_aga_class gas_class;
    const char *outside_adjustment; /* "" when the method covers it as the old gas, else why not; static */
    const char *outside_substitute; /* the same as the new gas */
} bc_aga_gas;

/* Reads a gas for the method.
 *
 *   reference   of 60F/60F@30inHg, dry: only the flashback index feels another state (the square root of h)
 *
 * BC_ERR_RANGE: the gas does not burn, or holds the oxygen it needs. */
BC_API BC_MUST_USE bc_status bc_aga_gas_of(const bc_reference *reference, const bc_gas *gas, bc_aga_gas *out, bc_error *err);

/* The indices (1). With f = 1000 sqrt(d)/h, a = 100 A/h and h in Btu/ft3, 1 the old and 2 the new gas: */
typedef struct {
    bool has_lifting;    /* the logarithm leaves a lifting limit above zero */
    double lifting;      /* IL = K1/{[f1 a2/(f2 a1)] [K2 - log10(f1/f2)]}; high: lifts. 1 against itself */
    double flashback;    /* IF = (K2 f2)/(K1 f1) sqrt(h2/1000); high: flashes back. sqrt(h/1000) against itself */
    bool has_yellow_tip; /* both gases have a yellow tip limit */
    double yellow_tip;   /* IY = (f2 a1 Y1)/(f1 a2 Y2); low: yellow tips. 1 against itself */
} bc_aga;

/* Compares two gases that bc_aga_gas_of() accepted. */
BC_API bc_aga bc_aga_compare(const bc_aga_gas *old_gas, const bc_aga_gas *new_gas);

#ifdef __cplusplus
}
#endif

#endif
