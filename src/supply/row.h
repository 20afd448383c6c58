/* SPDX-License-Identifier: MIT */
/* row.h - what one analysis of a log comes to, without those before and behind it. */
#ifndef ROW_H
#define ROW_H

#include <stdint.h>

#include "bluecone/limits.h"

/* Judges a gas by all limits of a contract, each reference state evaluated once.
 *
 *   values   out: the figure of each limit in its unit; 0 where the gas has none
 *   known    out: a bit for each limit whose figure is there
 *   broken   out: a bit for each limit that the gas breaks; bounds belong to what is allowed
 *
 * BC_ERR_RANGE: a state cannot saturate the gas; BC_ERR_USAGE: an index of two gases without a present one. */
BC_MUST_USE bc_status row_judge(const bc_contract *contract, const bc_gas *gas, double values[], uint64_t *known, uint64_t *broken, bc_error *err);

/* Gross heat a second that a flow of the gas carries, W, at the combustion temperature of the reference.
 *
 * BC_ERR_RANGE: the flow cannot be counted by what the gas is. */
BC_MUST_USE bc_status row_power_w(const bc_reference *reference, const bc_gas *gas, const bc_per_amount *flow, double *power_w, bc_error *err);

#endif
