/* SPDX-License-Identifier: MIT */
/* bluecone/blend_in.h - how much of a new gas may be blended into the old one before a criterion is broken. */
#ifndef BLUECONE_BLEND_IN_H
#define BLUECONE_BLEND_IN_H

#include <stdbool.h>
#include <stddef.h>

#include "bluecone/status.h"
#include "bluecone/switch.h"

#ifdef __cplusplus
extern "C" {
#endif

#define BC_BLEND_IN_STEPS 100 /* of the share: where crossings are looked for; a limit broken within less than a step may be missed */

/* A share of the new gas, mole fraction. */
typedef struct {
    bool exists; /* false: not between 0 and 1 */
    double share;
} bc_crossing;

/* One criterion along the share. Texts are static. */
typedef struct {
    const char *id, *label, *unit;
    int decimals;
    bool of_burner, counts;
    bc_index_limits acceptable;   /* at share 0: those of a class may change along the way */
    bc_crossing caution, broken;  /* first share with that verdict, or worse */
    bc_crossing blind;            /* first share that the method does not cover */
    bool has[BC_BLEND_IN_STEPS + 1];
    double value[BC_BLEND_IN_STEPS + 1]; /* at share k/BC_BLEND_IN_STEPS */
} bc_blend_criterion;

typedef struct {
    size_t count;
    bc_blend_criterion criteria[BC_CRITERIA_MAX];
    bc_crossing adjusts; /* first share that the burner takes only after adjustment, or not */
    bc_crossing refuses; /* first share that it does not take */
} bc_blend_in;

/* Finds all crossings on the mixture (1 - s) old + s new, s mole fraction, by bracketing on the steps and bisection to 1e-9.
 *
 *   burner, new_gas_k   as bc_switch_judge()
 *   result              out: untouched on failure
 *
 * Errors as bc_switch_judge(), which judges every share. Source: mole balance of the mixture. */
BC_API BC_MUST_USE bc_status bc_blend_in_of(const bc_subject *old_gas, const bc_subject *new_gas, const bc_burner *burner, double new_gas_k,
                                            bc_blend_in *result, bc_error *err);

#ifdef __cplusplus
}
#endif

#endif
