/* SPDX-License-Identifier: MIT */
/* gb_limits.c - the limits of the Gas Safety (Management) Regulations 1996 as rows. */
#include "base/compiler.h"
#include "bluecone/dutton.h"

#define NONE (-1.0)

static const bc_gb_limit ROWS[] = {
#define GB_LIMIT(quantity, lowest, highest, unit, supply, valid, source) \
    {quantity, unit, supply, valid, source, (lowest) >= 0.0, (highest) >= 0.0, (lowest) >= 0.0 ? (lowest) : 0.0, \
     (highest) >= 0.0 ? (highest) : 0.0},
#include "data/gb_limits.def"
};

size_t bc_gb_limit_count(void)
{
    return BC_COUNT(ROWS);
}

const bc_gb_limit *bc_gb_limit_at(size_t index)
{
    return index < BC_COUNT(ROWS) ? &ROWS[index] : NULL;
}
