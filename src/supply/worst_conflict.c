/* SPDX-License-Identifier: MIT */
/* worst_conflict.c - which bounds leave no gas between them. */
#include "supply/worst_internal.h"

#include <math.h>

static double *bound_of(bc_worst *w, const bc_conflict_part *part)
{
    switch (part->kind) {
    case BC_PART_COMPONENT:
        return part->upper ? &w->bounds.upper[part->index] : &w->bounds.lower[part->index];
    case BC_PART_GROUP:
        return part->upper ? &w->bounds.group_hi[part->index] : &w->bounds.group_lo[part->index];
    case BC_PART_LIMIT:
    default: /* the raw bound of an inverse figure is its other one */
        return part->upper != w->term[part->index].inverse ? &w->bounds.limit_hi[part->index] : &w->bounds.limit_lo[part->index];
    }
}

/* What a bound is when there is none. A fraction stays between 0 and 1. */
static double open_end(const bc_worst *w, const bc_conflict_part *part)
{
    if (part->kind == BC_PART_COMPONENT)
        return part->upper ? 1.0 : 0.0;
    return (part->kind == BC_PART_LIMIT && w->term[part->index].inverse) != part->upper ? HUGE_VAL : -HUGE_VAL;
}

static size_t count_of(const bc_worst *w, bc_part_kind kind)
{
    if (kind == BC_PART_COMPONENT)
        return w->columns;
    return kind == BC_PART_GROUP ? w->groups : w->limits;
}

/* Leaves a bound out for good if what remains is a conflict still. */
static void try_without(bc_worst *w, const bc_conflict_part *part, bc_conflict *conflict)
{
    double *bound = bound_of(w, part);
    const double kept = *bound;

    if (kept == open_end(w, part) || (part->kind == BC_PART_COMPONENT && w->keep_water && w->bounds.lower[part->index] == w->bounds.upper[part->index]))
        return;
    *bound = open_end(w, part);
    if (worst_prepare(w, NULL) == BC_OK && w->empty)
        return;
    *bound = kept;
    conflict->parts[conflict->count++] = *part;
}

void bc_worst_conflict(bc_worst *w, bc_conflict *conflict)
{
    static const bc_part_kind ORDER[] = {BC_PART_COMPONENT, BC_PART_GROUP, BC_PART_LIMIT};
    const worst_bounds all = w->bounds;

    conflict->count = 0;
    if (!w->empty)
        return;
    for (size_t k = 0; k < sizeof ORDER / sizeof *ORDER; k++)
        for (size_t i = 0; i < count_of(w, ORDER[k]); i++)
            for (int upper = 0; upper < 2; upper++) {
                const bc_conflict_part part = {ORDER[k], i, upper == 1};

                try_without(w, &part, conflict);
            }
    w->bounds = all;
    w->empty = worst_prepare(w, NULL) != BC_OK || w->empty;
}
