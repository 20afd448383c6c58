/* SPDX-License-Identifier: MIT */
/* species_index.h - the species by symbol, for code that must name one (water, oxygen). */
#ifndef SPECIES_INDEX_H
#define SPECIES_INDEX_H

enum {
#define SPECIES(symbol, id, name, formula, c, h, n, o, s, he, ne, ar, cas, source) SPECIES_##symbol,
#include "data/species.def"
    SPECIES_COUNT
};

#endif
