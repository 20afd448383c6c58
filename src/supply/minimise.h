/* SPDX-License-Identifier: MIT */
/* minimise.h - least value of a smooth function of shares under smooth limits, by NLopt.
 *
 * Shares lie between bounds and add up to a sum. NLopt is loaded when it is first needed and let go at the
 * end of each call, so that no other answer waits for it; SLSQP (Kraft 1988) is deterministic. */
#ifndef MINIMISE_H
#define MINIMISE_H

#include "bluecone/blend.h"

#include <stdbool.h>
#include <stddef.h>

#define PROGRAM_VARIABLES_MAX (BC_BLEND_PARTS_MAX + 1)
#define PROGRAM_LIMITS_MAX 160
#define PROGRAM_TOLERANCE 1e-8 /* of a scaled limit, and of the sum: what counts as kept */

/* What is to be minimised. evaluate() gives f and every c, all scaled to the order of one: inequalities first,
 * kept where c <= 0, then equalities, kept where c = 0. `first` variables are shares, of which the sum is
 * `sum`; variables behind them are free of it. */
typedef struct {
    size_t variables, shares;
    double low[PROGRAM_VARIABLES_MAX], high[PROGRAM_VARIABLES_MAX];
    double sum;
    size_t inequalities, equalities;
    void (*evaluate)(const double x[], double *f, double c[], void *data);
    void *data;
} program;

/* NLopt as it was loaded. */
typedef struct nlopt_library nlopt_library;
BC_MUST_USE bc_status nlopt_library_open(nlopt_library **library, bc_error *err);
void nlopt_library_close(nlopt_library *library);

/* The status of work done with NLopt: BC_ERR_MEMORY when any descent lacked memory, whatever the others found. */
BC_MUST_USE bc_status nlopt_library_fed(const nlopt_library *library, bc_status status, bc_error *err);

/* One descent from x, which is replaced by its end; the caller judges by program_violation() whether the end
 * keeps the limits. False when NLopt could not start. */
bool program_descend(nlopt_library *library, const program *p, double x[]);

/* f at x, and the largest amount by which a limit or the sum is broken there; 0 or less when all are kept. */
double program_value(const program *p, const double x[]);
double program_violation(const program *p, const double x[]);

/* The start with a number: the middle, then towards each corner, then each corner; shares only, variables
 * behind them are left. False when there is none of that number. */
bool program_start(const program *p, size_t number, double x[]);

#endif
