/* SPDX-License-Identifier: MIT */
/* bluecone/offer.h - on what terms a gas can be had: its price, the CO2 of its making, how much there is. */
#ifndef BLUECONE_OFFER_H
#define BLUECONE_OFFER_H

#include <stdbool.h>

#include "bluecone/status.h"
#include "bluecone/units.h"

#ifdef __cplusplus
extern "C" {
#endif

#define BC_CURRENCY_MAX 16 /* bytes of a currency's word with the final NUL */

/* A figure per amount of gas, or an amount per time. Not given: all zero. */
typedef struct {
    bool given;
    double si;          /* per J, kg, m3 or mol; of a flow J, kg, m3 or mol per second; not NaN */
    bc_dimension of;    /* BC_DIM_ENERGY, _MASS, _VOLUME or _AMOUNT */
    bool net;           /* energy is the net heat; else the gross one */
    bool has_metering;  /* the unit counts volumes at this temperature (Nm3, Sm3, scf); else the state does */
    double metering_c;
} bc_per_amount;

/* Section [supply] of a composition file. */
typedef struct {
    bc_per_amount price;
    char currency[BC_CURRENCY_MAX]; /* "" without a price */
    bc_per_amount co2;              /* kg of CO2 for making and moving the gas, without burning it */
    bc_per_amount max_flow;
    bool biogenic;                  /* CO2 of burning it is not counted */
} bc_offer;

/* Reads a price: "32 EUR/MWh", "0.41 GBP/kg net", "11 USD/MMBtu". The currency is any word; energy is gross
 * unless `net` stands behind.
 *
 *   price, currency   out: untouched on failure
 *
 * BC_ERR_USAGE: no such form, or a unit that is none of energy, mass, volume, amount; BC_ERR_INPUT: no number;
 * BC_ERR_RANGE: beyond 1e60 of the SI unit. */
BC_API BC_MUST_USE bc_status bc_price_parse(const char *text, bc_per_amount *price, char currency[BC_CURRENCY_MAX], bc_error *err);

/* Reads an intensity of CO2: "12 kg/MWh", "3.1 g/MJ net", "0.4 kg/m3". May be negative. Errors as above. */
BC_API BC_MUST_USE bc_status bc_intensity_parse(const char *text, bc_per_amount *intensity, bc_error *err);

/* Reads a flow of gas: "300 m3/h", "2.5 MW", "120 kg/h". Errors as above; BC_ERR_RANGE: not
 * above zero, that is from 1e-60 to 1e60 of the SI unit. */
BC_API BC_MUST_USE bc_status bc_flow_parse(const char *text, bc_per_amount *flow, bc_error *err);

#ifdef __cplusplus
}
#endif

#endif
