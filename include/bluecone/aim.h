/* SPDX-License-Identifier: MIT */
/* bluecone/aim.h - the shares that give a blend the figures that are wanted. */
#ifndef BLUECONE_AIM_H
#define BLUECONE_AIM_H

#include <stdbool.h>
#include <stddef.h>

#include "bluecone/blend.h"
#include "bluecone/limits.h"

#ifdef __cplusplus
extern "C" {
#endif

#define BC_AIM_SOLUTIONS_MAX 16 /* solutions told */

/* What is wanted of a blend. The pointers are the caller's. */
typedef struct {
    const bc_mixer *mixer;
    const bc_contract *aims; /* limits whose bounds are equal, one fewer than there are free shares */
    double low[BC_BLEND_PARTS_MAX], high[BC_BLEND_PARTS_MAX]; /* of each share, 0..1, sum one; equal ones are fixed */
} bc_aim_problem;

/* All blends that reach the aims, or the one that comes nearest. */
typedef struct {
    bool reached;
    size_t count;  /* solutions; 1 when none was reached: the nearest */
    double share[BC_AIM_SOLUTIONS_MAX][BC_BLEND_PARTS_MAX];
} bc_aim;

/* Finds the shares.
 *
 *   aim   out: untouched on failure
 *
 * Two free shares: all solutions along their line, each closed to 1e-13 of it. More: Newton's method from the
 * ends of least-squares descents from fixed starts, to 1e-12 of each aim; solutions that no start leads to are
 * not found. Nearest is least in |figure - aim|, or in the sum of squares of (figure - aim)/aim.
 *
 * BC_ERR_USAGE: another number of aims than free shares less one; BC_ERR_RANGE: no blend of the parts has the
 * figure; BC_ERR_FILE: NLopt, which several aims need, is not there; BC_ERR_MEMORY. */
BC_API BC_MUST_USE bc_status bc_aim_find(const bc_aim_problem *problem, bc_aim *aim, bc_error *err);

#ifdef __cplusplus
}
#endif

#endif
