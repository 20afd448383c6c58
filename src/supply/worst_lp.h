/* SPDX-License-Identifier: MIT */
/* worst_lp.h - small dense linear programs over bounded columns, each answered with a certificate.
 *
 *   maximise  cost x   with  lower <= x <= upper  and  lo <= row x <= hi
 *
 * All columns are bounded, so no program is unbounded and any multipliers y of the rows prove
 *   cost x <= sum over rows of max(y lo, y hi) + sum over columns of max(d lower, d upper),  d = cost - y row
 * whatever the rounding that led to them (Neumaier and Shcherbina, Math. Program. 99 (2004) 283). */
#ifndef WORST_LP_H
#define WORST_LP_H

#include <stdbool.h>
#include <stddef.h>

#include "bluecone/species.h"

#define LP_COLUMNS BC_SPECIES_CAPACITY
#define LP_ROWS 208
#define LP_TOLERANCE 1e-11 /* of a row of coefficients up to one over fractions up to one */

typedef struct {
    size_t columns, rows;
    double lower[LP_COLUMNS], upper[LP_COLUMNS]; /* finite */
    double cost[LP_COLUMNS];
    double row[LP_ROWS][LP_COLUMNS];
    double lo[LP_ROWS], hi[LP_ROWS]; /* infinite when open */
} lp_problem;

typedef enum {
    LP_OPTIMAL,    /* x attains value, and no x exceeds bound */
    LP_INFEASIBLE, /* y proves it */
    LP_UNSOLVED    /* gave up; bound still holds */
} lp_status;

typedef struct {
    lp_status status;
    double x[LP_COLUMNS];
    double y[LP_ROWS];
    double value; /* cost x */
    double bound; /* proven by y; meaningless when infeasible */
} lp_answer;

/* Workspace: basic variables over nonbasic ones. A variable is a column, or behind those a row. */
typedef struct {
    double t[LP_ROWS][LP_COLUMNS]; /* basic = t nonbasic */
    double d[LP_COLUMNS];          /* cost of the nonbasic */
    double at[LP_COLUMNS];         /* value of the nonbasic: one of its bounds */
    double beta[LP_ROWS];          /* value of the basic */
    double low[LP_COLUMNS + LP_ROWS], high[LP_COLUMNS + LP_ROWS];
    size_t basic[LP_ROWS], nonbasic[LP_COLUMNS];
    size_t order[LP_COLUMNS];      /* candidates of a ratio test */
    double ratio[LP_COLUMNS];
    bool plain;                    /* after many pivots: Bland's rule, which cannot cycle */
} lp_work;

/* Appends a row, scaled so that its largest coefficient is one; a row of zeros is left out when it holds. */
void lp_add_row(lp_problem *lp, const double row[], double lo, double hi);

/* Solves by the dual simplex method with bound flipping. */
void lp_maximise(const lp_problem *lp, lp_work *work, lp_answer *answer);

/* The bound that multipliers y prove for a cost; NULL stands for no cost: below zero, it proves that
 * nothing meets the rows. */
double lp_proven_bound(const lp_problem *lp, const double cost[], const double y[]);

#endif
