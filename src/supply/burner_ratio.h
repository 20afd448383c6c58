/* SPDX-License-Identifier: MIT */
/* burner_ratio.h - figures of a set burner as ratios of linear sums over the mole fractions of its gas. */
#ifndef BURNER_RATIO_H
#define BURNER_RATIO_H

#include <stdbool.h>

#include "bluecone/burner.h"
#include "bluecone/ratio.h"

/* Each over the gas as found at the burner. Behind a nozzle the gas flow has a factor beside its form. */
typedef struct {
    bool trims, nozzle;
    bc_ratio heat, lambda;           /* untrimmed: net heat input over the old one; air factor */
    bc_ratio travel;                 /* trims: what they are asked for, BC_BURNER_TRIM */
    bc_ratio held_heat, held_lambda; /* trims: while they hold the oxygen; without the factor */
    bc_ratio cp;                     /* nozzle: J/(mol K), what the factor depends on; a sum */
    double one[BC_SPECIES_CAPACITY]; /* nozzle: a sum that is one */
} burner_ratios;

/* Whether the burner moves a flow to hold the oxygen. */
bool burner_trims(const bc_burner *burner);

/* The factor of the nozzle on the gas flow, over that of the old gas: it falls as cp rises, and is
 * convex. */
double burner_nozzle_factor(const bc_burner_case *set, double cp);

/* The forms. Errors as bc_ratio_of_quantity(). */
bc_status burner_ratios_of(const bc_burner_case *set, burner_ratios *ratios, bc_error *err);

#endif
