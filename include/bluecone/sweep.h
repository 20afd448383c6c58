/* SPDX-License-Identifier: MIT */
/* bluecone/sweep.h - a blend while its shares run along a straight line: where limits are crossed.
 *
 * A line has one parameter t from 0 to 1: the share that is swept, or the proportion of a free pair. */
#ifndef BLUECONE_SWEEP_H
#define BLUECONE_SWEEP_H

#include <stdbool.h>
#include <stddef.h>

#include "bluecone/blend.h"
#include "bluecone/limits.h"

#ifdef __cplusplus
extern "C" {
#endif

#define BC_CROSSING_MAX 16 /* crossings told of one bound */
#define BC_WINDOW_MAX 32   /* windows told of one line */

/* Shares w(t) = from + t (to - from) on the basis of the mixer; both ends not negative, with a sum above zero. */
typedef struct {
    const bc_mixer *mixer;
    double from[BC_BLEND_PARTS_MAX], to[BC_BLEND_PARTS_MAX];
} bc_blend_line;

/* A part of a line, 0 <= low <= high <= 1. */
typedef struct {
    double low, high;
} bc_window;

/* The shares and the gas at t, 0..1. */
BC_API void bc_line_shares(const bc_blend_line *line, double t, double share[]);
BC_API bc_gas bc_line_gas(const bc_blend_line *line, double t);

/* Where the figure of a limit equals a value.
 *
 *   value   in the unit of the limit
 *   t       out: ascending; at most `most`
 *
 * Found by 128 samples, then each closed to 1e-13 of the line; two crossings between samples are found through
 * the extreme between them. Where the gas has no such figure nothing is found. */
BC_API size_t bc_line_crossings(const bc_blend_line *line, const bc_contract *contract, size_t limit, double value, double t[], size_t most);

/* Where the figure of a limit is nearest to a value it never has. False when it has no value anywhere. */
BC_API bool bc_line_nearest(const bc_blend_line *line, const bc_contract *contract, size_t limit, double value, double *t);

/* The windows of a line within all limits of a contract, ascending, bounded by its crossings and the ends. A
 * limit that cannot be judged lets nothing in.
 *
 *   window   out: at most BC_WINDOW_MAX; a single point that is let in is a window of no width */
BC_API size_t bc_line_windows(const bc_blend_line *line, const bc_contract *contract, bc_window window[]);

#ifdef __cplusplus
}
#endif

#endif
