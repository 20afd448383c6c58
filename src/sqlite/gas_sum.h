/* SPDX-License-Identifier: MIT */
/* gas_sum.h - adding up the components of a row. */
#ifndef GAS_SUM_H
#define GAS_SUM_H

#include "sqlite/connection.h"

/* A row being added up. */
typedef struct {
    double amounts[BC_SPECIES_CAPACITY];
    double sum; /* fraction of one */
} gas_sum;

void gas_sum_start(gas_sum *s);

/* Adds a share in mole per cent that was checked. */
void gas_sum_add(gas_sum *s, const component *what, double percent);

/* A share written as a text, as the cells of a log have them: "0.12"; "" and "<0.01" (below detection) are zero.
 *
 *   name   of the component, for the message
 *
 * BC_ERR_INPUT: no number. */
BC_MUST_USE bc_status share_from_text(const char *text, const char *name, double *percent, bc_error *err);

/* BC_ERR_INPUT: negative, or no number. */
BC_MUST_USE bc_status share_check(double percent, const char *name, bc_error *err);

/* BC_ERR_INPUT: they do not add up to 98 to 102 %. */
BC_MUST_USE bc_status gas_sum_finish(const gas_sum *s, bc_gas *gas, bc_error *err);

#endif
