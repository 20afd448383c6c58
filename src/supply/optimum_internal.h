/* SPDX-License-Identifier: MIT */
/* optimum_internal.h - a problem of blending as functions of the shares. */
#ifndef OPTIMUM_INTERNAL_H
#define OPTIMUM_INTERNAL_H

#include "bluecone/optimum.h"
#include "supply/minimise.h"

/* One inequality: c = (figure - bound)/scale, or the other way round, and how far its bound has given way. */
typedef struct {
    bc_bound_kind kind;
    size_t index;
    double bound, scale, relaxed; /* relaxed: in the unit of the bound, positive gives way */
} optimum_limit;

/* What the program minimises. */
typedef enum {
    GOAL_OBJECTIVE, /* the objective of the problem */
    GOAL_BREACH,    /* t, the variable behind the shares, with c <= t for all limits */
    GOAL_ONE        /* the breach of one limit, which is left out of the limits */
} optimum_goal;

/* A problem in the form of ratios: objective = sum(f num)/sum(f den) with mole fractions f of the parts. */
typedef struct {
    const bc_optimum_problem *problem;
    double num[BC_BLEND_PARTS_MAX], den[BC_BLEND_PARTS_MAX];
    double scale;                          /* of the objective */
    double delivered[BC_BLEND_PARTS_MAX];  /* what a mole of the part counts of the rate; volumes: of the part alone */
    double taken[BC_BLEND_PARTS_MAX];      /* what a mole of the part counts of its max_flow */
    size_t limit_count;
    optimum_limit limit[PROGRAM_LIMITS_MAX];
    optimum_goal goal;
    size_t one;                            /* GOAL_ONE: index of the limit */
} optimum_model;

/* Makes the model of a problem. Errors as bc_optimum_find(). */
BC_MUST_USE bc_status optimum_model_make(const bc_optimum_problem *problem, optimum_model *model, bc_error *err);

/* The objective in SI at shares. */
double optimum_model_objective(const optimum_model *model, const double share[]);

/* All limits at shares: c[0..limit_count) and, behind them, the aims. A figure that the gas does not have counts
 * as broken by its whole scale. */
void optimum_model_limits(const optimum_model *model, const double share[], double c[]);

/* The program of a model and its goal. The model must outlive it. */
void optimum_program(optimum_model *model, program *p);

#endif
