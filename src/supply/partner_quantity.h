/* SPDX-License-Identifier: MIT */
/* partner_quantity.h - the quantity that is taken for another one: net for gross, ideal for real. */
#ifndef PARTNER_QUANTITY_H
#define PARTNER_QUANTITY_H

#include <stddef.h>

typedef enum { PARTNER_NONE, PARTNER_HEAT, PARTNER_IDEAL } partner_kind;

/* The quantity taken for one with an index; the same index when it has no such partner. */
size_t partner_quantity(size_t quantity, partner_kind kind);

/* The power of the sum of the shares that a figure goes with when shares are not scaled to one. */
double partner_power_of_sum(const char *id);

#endif
