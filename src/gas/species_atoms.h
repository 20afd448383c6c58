/* SPDX-License-Identifier: MIT */
/* species_atoms.h - atoms of every species as one table, for sums over the components of a gas. */
#ifndef SPECIES_ATOMS_H
#define SPECIES_ATOMS_H

#include "bluecone/species.h"
#include "gas/species_index.h"

/* As doubles, so that a sum does not convert each of them; whole numbers, hence exact. */
extern const double SPECIES_ATOMS[SPECIES_COUNT][BC_ELEMENTS];

#endif
