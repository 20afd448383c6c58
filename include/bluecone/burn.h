/* SPDX-License-Identifier: MIT */
/* bluecone/burn.h - all that a gas does in one burner case: oxidant, flue gas, dew points, flame, heat. */
#ifndef BLUECONE_BURN_H
#define BLUECONE_BURN_H

#include <stdbool.h>

#include "bluecone/dewpoint.h"
#include "bluecone/flame.h"
#include "bluecone/flue.h"
#include "bluecone/heatload.h"
#include "bluecone/oxidant.h"
#include "bluecone/status.h"

#ifdef __cplusplus
extern "C" {
#endif

#define BC_BURN_LAMBDA_MIN 0.3  /* below it soot and unburnt fuel make equilibrium a formality */
#define BC_BURN_LAMBDA_MAX 20.0
#define BC_BURN_FREEZE_K 1500.0 /* below it the water-gas reaction of a rich flue gas no longer keeps up, common practice */

/* A burner case. */
typedef struct {
    bc_gas fuel, oxidant;
    double lambda;                    /* BC_BURN_LAMBDA_MIN..BC_BURN_LAMBDA_MAX */
    double fuel_k, oxidant_k, exit_k; /* 250..3000 K */
    double p_pa;                      /* of the flue gas, absolute, 5e3..1e7 Pa */
    double so3_conversion;            /* share of the SO2 that becomes SO3, 0..1 */
    double casing_loss;               /* share of the net heat, 0..1 */
} bc_burn_case;

/* Stoichiometric dry air, everything in at 25 C and 101.325 kPa, flue gas at 150 C, no casing loss. */
BC_API bc_burn_case bc_burn_case_default(const bc_gas *fuel);

/* What comes of it, per mole of fuel. With lambda below 1 (`rich`) the flue gas is that of chemical
 * equilibrium, frozen below BC_BURN_FREEZE_K: it holds CO and H2, and flue, path, yield and both dew points
 * are not filled. */
typedef struct {
    bool rich;
    bc_demand demand;       /* stoichiometric, of the case's oxidant */
    double oxidant_mol;     /* supplied, mol per mol of fuel */
    bc_flue flue;
    bc_dew dew;
    bool has_acid;          /* false: no sulfur, or too little for the correlations */
    bc_acid_dew acid;
    bc_heat_path path;
    bc_heat_yield yield;
    bool has_complete;      /* a complete flame within the thermodynamic data */
    double flame_complete_k;
    bc_mixture flame;       /* adiabatic, in equilibrium */
    bc_mixture exit;        /* rich: flue gas at the exit temperature */
    double released_j;      /* heat given off down to the exit temperature, J per mole of fuel */
} bc_burn;

/* Computes a case.
 *
 *   burn   out: untouched on failure
 *
 * BC_ERR_RANGE: a value outside the ranges above, a fuel that needs no oxygen, a flame beyond the data;
 * BC_ERR_INPUT: an oxidant without oxygen to give. Sources: those of the headers included here. */
BC_API BC_MUST_USE bc_status bc_burn_of(const bc_burn_case *burn_case, bc_burn *burn, bc_error *err);

#ifdef __cplusplus
}
#endif

#endif
