/* SPDX-License-Identifier: MIT */
/* root.h - where a curve crosses zero, and where it comes nearest to it. */
#ifndef ROOT_H
#define ROOT_H

#include <stdbool.h>
#include <stddef.h>

/* y(x); false where there is no value. Nothing is asked of the curve beyond being continuous on the scale of
 * the samples. */
typedef bool bc_curve(double x, double *y, void *data);

/* Where to look, and how densely a first look samples. */
typedef struct {
    double low, high; /* low < high */
    size_t pieces;    /* 2..BC_PIECES_MAX */
} bc_span;

#define BC_PIECES_MAX 256
#define BC_ROOT_RELATIVE 1e-13 /* of the span: width at which a bracket is a root */

/* All x of the span where the curve crosses or touches zero, ascending; the number found, at most `most`.
 * A bracket between samples is closed by Ridders' method to BC_ROOT_RELATIVE of the span; two crossings
 * between neighbouring samples are found through the extreme between them. */
size_t bc_roots(bc_curve *curve, void *data, const bc_span *span, double root[], size_t most);

/* The x of the span where |y| is smallest; false when the curve has no value anywhere. */
bool bc_nearest_zero(bc_curve *curve, void *data, const bc_span *span, double *x);

#endif
