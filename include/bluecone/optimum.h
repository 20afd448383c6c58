/* SPDX-License-Identifier: MIT */
/* bluecone/optimum.h - the cheapest, the greenest or the leanest blend that keeps all limits.
 *
 * Found by NLopt's SLSQP from several fixed starts: the answer is the same every time. The library NLopt is
 * loaded when it is needed. */
#ifndef BLUECONE_OPTIMUM_H
#define BLUECONE_OPTIMUM_H

#include <stdbool.h>
#include <stddef.h>

#include "bluecone/blend.h"
#include "bluecone/limits.h"
#include "bluecone/offer.h"
#include "bluecone/terms.h"

#ifdef __cplusplus
extern "C" {
#endif

#define BC_BINDING_MAX 96 /* bounds told of one optimum */

/* What is to be least. */
typedef enum {
    BC_LEAST_COST,  /* price per gross heat of the blend, currency/J */
    BC_LEAST_CO2,   /* CO2 of making and burning per gross heat, kg/J */
    BC_LEAST_SHARE  /* of one part, on the basis of the mixer */
} bc_least;

/* A blend to be found. The pointers are the caller's. */
typedef struct {
    const bc_mixer *mixer;
    const bc_contract *within;  /* limits to keep; NULL: none */
    const bc_contract *aims;    /* limits whose bounds are equal: to be met; NULL: none */
    double low[BC_BLEND_PARTS_MAX], high[BC_BLEND_PARTS_MAX]; /* of each share, 0..1; equal ones are fixed */
    bc_least least;
    size_t part;                /* BC_LEAST_SHARE: whose */
    const bc_offer *offer;      /* terms of every part */
    const bc_per_amount *rate;  /* flow of the blend, which turns each max_flow into a limit; NULL: none counts */
} bc_optimum_problem;

/* What a bound is of. */
typedef enum { BC_BOUND_MIN, BC_BOUND_MAX, BC_BOUND_FLOW } bc_bound_kind;

/* A bound that holds the optimum back, or that conflicts with others. */
typedef struct {
    bc_bound_kind kind;
    size_t index;     /* of the limit, or of the part for a flow */
    double bound;     /* in the unit of the limit; of a flow SI per second */
    double shadow;    /* how much the objective falls per unit by which the bound gives way; 0 or more */
    bool has_needed;  /* of a conflict: giving way alone would do */
    double needed;    /* the bound that would do, all others kept */
} bc_binding;

/* An optimum, or where limits exclude each other the blend that breaks them least. */
typedef struct {
    bool feasible;
    double share[BC_BLEND_PARTS_MAX];
    double objective;           /* SI */
    size_t starts, agreed;      /* descents, and those that ended within 1e-6 of the best */
    size_t binding_count;       /* bounds that hold it, or those that conflict */
    bc_binding binding[BC_BINDING_MAX];
} bc_optimum;

/* Finds the optimum.
 *
 *   optimum   out: feasible or not; untouched on failure
 *
 * Shadow prices are differences of the optimum when a bound is moved by 1/10,000 of its scale both ways and
 * everything is solved again. Where no blend keeps all limits, `binding` are those that exclude each other:
 * they are broken alike, in parts of their scale, where the largest breach is least.
 *
 * BC_ERR_USAGE: a part without price, or in two currencies; a part whose amount the rate does not fix;
 * BC_ERR_FILE: NLopt is not there; BC_ERR_SOLVER: no descent led anywhere; BC_ERR_MEMORY. */
BC_API BC_MUST_USE bc_status bc_optimum_find(const bc_optimum_problem *problem, bc_optimum *optimum, bc_error *err);

/* The objective at shares that add up to one, SI; for checking an optimum. Errors as above. */
BC_API BC_MUST_USE bc_status bc_optimum_objective(const bc_optimum_problem *problem, const double share[], double *objective, bc_error *err);

/* The largest breach at shares that add up to one, in parts of the scale of each limit; 0 or less: all kept. */
BC_API BC_MUST_USE bc_status bc_optimum_breach(const bc_optimum_problem *problem, const double share[], double *breach, bc_error *err);

#ifdef __cplusplus
}
#endif

#endif
