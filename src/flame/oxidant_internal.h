/* SPDX-License-Identifier: MIT */
/* oxidant_internal.h - the atoms of a gas counted once, for balances that need several elements. */
#ifndef OXIDANT_INTERNAL_H
#define OXIDANT_INTERNAL_H

#include "bluecone/gas.h"
#include "bluecone/status.h"

/* Atoms of every element per molecule of gas. */
void oxidant_atoms(const bc_gas *gas, double atoms[BC_ELEMENTS]);

/* The same of dry air, bc_oxidant_air(), without making a gas of it. */
void oxidant_air_atoms(double atoms[BC_ELEMENTS]);

/* a = C + H/4 + S - O/2. */
double oxidant_oxygen_need(const double atoms[BC_ELEMENTS]);

/* The stoichiometric pair of a fuel and an oxidant. */
typedef struct {
    double fuel[BC_ELEMENTS], oxidant[BC_ELEMENTS]; /* atoms per molecule */
    double need;                                    /* of the fuel, mol O2/mol; above 0 */
    double give;                                    /* of the oxidant, mol O2/mol; above 0 */
    double ratio;                                   /* mol oxidant per mol of fuel at lambda 1 */
} oxidant_pair;

/* Fills the rest of a pair whose atoms are set. BC_ERR_INPUT, BC_ERR_RANGE: as below. */
BC_MUST_USE bc_status oxidant_pair_balance(oxidant_pair *pair, bc_error *err);

/* Fills the pair. BC_ERR_INPUT: the oxidant gives nothing; BC_ERR_RANGE: the fuel needs nothing. */
BC_MUST_USE bc_status oxidant_pair_of(const bc_gas *fuel, const bc_gas *oxidant, oxidant_pair *pair,
                                      bc_error *err);

#endif
