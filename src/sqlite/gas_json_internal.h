/* SPDX-License-Identifier: MIT */
/* gas_json_internal.h - between the two readers of JSON. */
#ifndef GAS_JSON_INTERNAL_H
#define GAS_JSON_INTERNAL_H

#include "sqlite/gas_sum.h"
#include "sqlite/gas_text.h"

/* The components that a gas has already, by what they stand for. */
typedef struct {
    bool there[COMPONENTS_MAX];
} json_taken;

/* False when it was there already. */
static inline bool json_take(json_taken *t, const component *c)
{
    const bool is_new = !t->there[c->same];

    t->there[c->same] = true;
    return is_new;
}

/* Adds up a plain object; false when it must be read in general, *sum is of no use then. */
bool gas_json_plain(connection *c, const word *w, gas_sum *sum);

#endif
