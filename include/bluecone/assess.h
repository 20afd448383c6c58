/* SPDX-License-Identifier: MIT */
/* bluecone/assess.h - whether a figure keeps a limit when both its value and its uncertainty are looked at.
 *
 * The guard-band rule of JCGM 106:2012 (ISO/IEC Guide 98-4), clause 8: a bound is moved by g = k u, with k the normal
 * quantile of the coverage asked for on one side. What lies farther inside than g is inside at that coverage, what
 * lies farther outside is outside; between them stands what the measurement cannot tell. */
#ifndef BLUECONE_ASSESS_H
#define BLUECONE_ASSESS_H

#include <stdbool.h>

#include "bluecone/limits.h"

#ifdef __cplusplus
extern "C" {
#endif

#define BC_COVERAGE_DEFAULT 0.95
#define BC_COVERAGE_MAX 0.99999

/* From good to bad. */
typedef enum {
    BC_CONFORM_INSIDE,        /* inside by the guard band or more, or without uncertainty known */
    BC_CONFORM_LIKELY,        /* inside, but within the guard band of a bound */
    BC_CONFORM_UNLIKELY,      /* outside, but within the guard band of a bound */
    BC_CONFORM_OUTSIDE        /* outside by more than the guard band, or without uncertainty known */
} bc_conformity;

/* How a figure stands to a limit. */
typedef struct {
    bc_conformity conformity;
    double guard;             /* width of the guard band, in the unit of the limit; 0 without uncertainty */
    double probability;       /* that the true value lies within the limit; 0 or 1 without uncertainty */
} bc_assessment;

/* The one-sided coverage factor: Phi(k) = coverage, Phi the standard normal distribution.
 *
 *   coverage   0.5..BC_COVERAGE_MAX; 0.5 gives k = 0, the rule of simple acceptance
 *   k          out: untouched on failure
 *
 * BC_ERR_RANGE outside of that. Source: JCGM 106:2012, table 1. */
BC_API BC_MUST_USE bc_status bc_coverage_factor(double coverage, double *k, bc_error *err);

/* Probability that the true value lies within the bounds, for a normal distribution about the value:
 * p = Phi((max - y)/u) - Phi((min - y)/u); a bound that is not there is infinitely far.
 *
 *   value, u   in the unit of the limit; u = 0 gives 0 or 1
 *
 * Source: JCGM 106:2012, clause 7.3 and 7.4. */
BC_API double bc_conformance_probability(const bc_limit *limit, double value, double u);

/* Assesses a judged figure at a coverage factor k. Source: JCGM 106:2012, clause 8.3. */
BC_API bc_assessment bc_limit_assess(const bc_limit *limit, const bc_limit_figure *figure, double k);

/* The class in words: "inside", "inside, within uncertainty", "outside, within uncertainty", "outside"; never NULL. */
BC_API const char *bc_conformity_text(bc_conformity conformity);

/* Whether the class breaks the limit: the best estimate lies outside, whatever the uncertainty says. */
BC_API bool bc_conformity_breaks(bc_conformity conformity);

#ifdef __cplusplus
}
#endif

#endif
