/* SPDX-License-Identifier: MIT */
/* combustible_internal.h - what of a gas burns, and how much of that a table knows. */
#ifndef COMBUSTIBLE_INTERNAL_H
#define COMBUSTIBLE_INTERNAL_H

#include <stdbool.h>
#include <stddef.h>

#include "bluecone/gas.h"

/* The combustibles of a gas that a table knows, scaled to one. */
typedef struct {
    double total;   /* mole fraction of combustibles in the gas */
    double covered; /* share of them that is known; 0 without combustibles */
    size_t missing; /* the unknown one there is most of; meaningless when covered is 1 */
    size_t count;
    size_t species[BC_SPECIES_CAPACITY];
    double share[BC_SPECIES_CAPACITY]; /* add up to one when count > 0 */
} combustible_part;

/* True for a species that needs oxygen to burn. */
bool combustible_is(size_t species);

/* Sorts a gas by what a table knows. */
combustible_part combustible_part_of(const bc_gas *gas, bool (*is_known)(size_t species));

#endif
