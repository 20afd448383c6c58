/* SPDX-License-Identifier: MIT */
/* bluecone/weaver.h - Weaver's six indices of interchangeability and his flame speed factor.
 *
 * Source: Weaver, Formulas and graphs for representing the interchangeability of fuel gases, J. Res. NBS 46(3), 1951,
 * RP2193; formulas partly from memory, constants in data/weaver.def. No published worked pair of gases is known to us.
 * Texts named `..._outside` are static: "" in range, else why the figure says nothing. */
#ifndef BLUECONE_WEAVER_H
#define BLUECONE_WEAVER_H

#include <stdbool.h>

#include "bluecone/gas.h"
#include "bluecone/iso6976.h"
#include "bluecone/status.h"

#ifdef __cplusplus
extern "C" {
#endif

/* What the indices take of a gas; it is dried first. */
typedef struct {
    double gross_j_per_m3;   /* real gas, at the state of the reference */
    double relative_density; /* real gas */
    double air;              /* A, m3 air/m3 from the method's table, less what its own oxygen saves */
    bool has_speed;
    double speed;            /* S, hydrogen 100: sum F x/(A + 5 Z - 18.8 Q + 1); 0 without one (rich in oxygen) */
    double oxygen_percent;   /* Q, mol % */
    double carbon_excess;    /* N, C atoms in hydrocarbons per 100 molecules, less one a saturated one */
    bool has_ratio;
    double ratio;            /* R, all H atoms over the C atoms of hydrocarbons; 0 without hydrocarbons */
    const char *outside;     /* of all indices; the three below hold it and more */
    const char *speed_outside, *ratio_outside, *yellow_outside; /* of JL, JF and S; of JI; of JY */
} bc_weaver_gas;

/* Reads a gas for the method.
 *
 *   reference   of one state for both gases; the method's own is 60 F, 30 inHg
 *
 * BC_ERR_RANGE: the gas does not burn, or holds the oxygen it needs. */
BC_API BC_MUST_USE bc_status bc_weaver_gas_of(const bc_reference *reference, const bc_gas *gas, bc_weaver_gas *out, bc_error *err);

/* The six indices (1) of a new gas on a burner set for an old one; an old gas against itself: 1, 1, 1, 0, 0, 0. */
typedef struct {
    double heat;       /* JH = (H2/H1) sqrt(d1/d2) */
    double air;        /* JA = (A2/A1) sqrt(d1/d2) */
    bool has_speed;    /* lifting and flashback are defined */
    double lifting;    /* JL = JA (S2/S1)(100 - Q2)/(100 - Q1); low: lifts */
    double flashback;  /* JF = S2/S1 - 1.4 JA + 0.4; high: flashes back */
    bool has_incomplete;
    double incomplete; /* JI = JA - 0.366 R2/R1 - 0.634; high: carbon monoxide */
    double yellow_tip; /* JY = JA + (N2 - N1)/110 - 1; high: yellow tips */
} bc_weaver;

/* Compares two gases that bc_weaver_gas_of() accepted. */
BC_API bc_weaver bc_weaver_compare(const bc_weaver_gas *old_gas, const bc_weaver_gas *new_gas);

#ifdef __cplusplus
}
#endif

#endif
