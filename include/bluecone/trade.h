/* SPDX-License-Identifier: MIT */
/* bluecone/trade.h - what a gas costs under the terms of a contract, and what a year of it is. */
#ifndef BLUECONE_TRADE_H
#define BLUECONE_TRADE_H

#include <stdbool.h>

#include "bluecone/limits.h"

#ifdef __cplusplus
extern "C" {
#endif

/* Price on every basis and the amounts of a year. Volumes are of the real gas at the state of the contract, heats at
 * its combustion temperature; CO2 is that of burning all carbon of the gas. */
typedef struct {
    bool has_price, has_annual;
    char currency[BC_CURRENCY_MAX];
    double price_per_gross_j, price_per_net_j, price_per_kg, price_per_m3;
    double annual_m3, annual_kg, annual_gross_j, annual_net_j, annual_co2_kg; /* count with has_annual */
    double annual_cost;             /* counts with has_price */
    double co2_kg_per_gross_j, co2_kg_per_net_j;
} bc_trade;

/* The terms of a contract applied to a gas.
 *
 *   price      a price other than the contract's, with its currency; NULL for the contract's
 *   gas        as composed: a saturated state saturates it
 *   trade      out: untouched on failure
 *
 * BC_ERR_RANGE: a gas without heat is counted by energy, or cannot be saturated. */
BC_API BC_MUST_USE bc_status bc_contract_trade(const bc_contract *contract, const bc_offer *price, const bc_gas *gas, bc_trade *trade,
                                               bc_error *err);

#ifdef __cplusplus
}
#endif

#endif
