/* SPDX-License-Identifier: MIT */
/* flue_internal.h - the amounts of a flue gas, for figures that need a few of them and no gas. */
#ifndef FLUE_INTERNAL_H
#define FLUE_INTERNAL_H

#include "bluecone/flue.h"
#include "flame/oxidant_internal.h"

/* Amounts per mole of fuel after complete combustion with lambda of 1 or more; returns their sum without water. */
double flue_amounts(const oxidant_pair *pair, double lambda, bc_gas *amounts);

/* bc_flue_factor_of() of a fuel whose atoms are counted. */
BC_MUST_USE bc_status flue_factor_of(const double atoms[BC_ELEMENTS], double heat_j_per_mol, bc_flue_factor *factor, bc_error *err);

#endif
