/* SPDX-License-Identifier: MIT */
/* tally_groups.h - groups of rows by a key that mostly ascends: the periods, the steps of the trend. */
#ifndef TALLY_GROUPS_H
#define TALLY_GROUPS_H

#include <stdbool.h>

#include "supply/tally_cell.h"

typedef struct {
    size_t figures;
    size_t count, room;
    tally_group **groups; /* by key, ascending */
} tally_groups;

void tally_groups_close(tally_groups *s);

/* The group of a key, which is made where there is none; NULL without memory. */
tally_group *tally_groups_take(tally_groups *s, int64_t key);

bool tally_groups_have(const tally_groups *s, int64_t key);

/* Halves all keys, rounded down, and joins what comes together. */
void tally_groups_halve(tally_groups *s);

#endif
