/* SPDX-License-Identifier: MIT */
/* trade.c - the terms of a contract per mole of gas, and from there on every basis. */
#include "bluecone/trade.h"

#include "base/error_internal.h"
#include "bluecone/terms.h"

#include <string.h>

/* Amounts of one mole of gas. */
typedef struct {
    double gross_j, net_j, kg, m3, co2_kg;
} mole;

static bc_status price_of(const bc_per_amount *price, const bc_subject *s, const mole *m, bc_trade *t, bc_error *err)
{
    double amount = 0.0;
    const bc_status status = bc_amount_per_mole(price, s->reference, &s->gas, &amount, err);

    if (status != BC_OK)
        return status;
    t->has_price = true;
    t->price_per_gross_j = price->si * amount / m->gross_j;
    t->price_per_net_j = price->si * amount / m->net_j;
    t->price_per_kg = price->si * amount / m->kg;
    t->price_per_m3 = price->si * amount / m->m3;
    return BC_OK;
}

static bc_status year_of(const bc_per_amount *annual, const bc_subject *s, const mole *m, bc_trade *t, bc_error *err)
{
    double amount = 0.0;
    const bc_status status = bc_amount_per_mole(annual, s->reference, &s->gas, &amount, err);

    if (status != BC_OK)
        return status;
    const double moles = annual->si / amount;

    t->has_annual = true;
    t->annual_m3 = moles * m->m3;
    t->annual_kg = moles * m->kg;
    t->annual_gross_j = moles * m->gross_j;
    t->annual_net_j = moles * m->net_j;
    t->annual_co2_kg = moles * m->co2_kg;
    t->annual_cost = t->price_per_gross_j * t->annual_gross_j;
    return BC_OK;
}

bc_status bc_contract_trade(const bc_contract *c, const bc_offer *offer, const bc_gas *gas, bc_trade *trade, bc_error *err)
{
    const bc_per_amount *price = offer ? &offer->price : &c->price;
    bc_reference reference;
    bc_subject s;
    bc_trade t;
    bc_status status = bc_reference_at(&c->state, &reference, err);

    memset(&t, 0, sizeof t);
    if (status == BC_OK)
        status = bc_subject_make(&reference, gas, NULL, &s, err);
    if (status != BC_OK)
        return status;
    const mole m = {s.value.gross_j_per_mol, s.value.net_j_per_mol, s.value.molar_mass_kg_per_mol, s.value.molar_volume_m3_per_mol,
                    bc_co2_per_mole(&s.gas)};

    if (!(m.net_j > 0.0))
        return bc_fail(err, BC_ERR_RANGE, "a gas without heat has no price or CO2 per heat");
    memcpy(t.currency, offer ? offer->currency : c->currency, sizeof t.currency);
    t.co2_kg_per_gross_j = m.co2_kg / m.gross_j;
    t.co2_kg_per_net_j = m.co2_kg / m.net_j;
    if (price->given)
        status = price_of(price, &s, &m, &t, err);
    if (status == BC_OK && c->annual.given)
        status = year_of(&c->annual, &s, &m, &t, err);
    if (status == BC_OK)
        *trade = t;
    return status;
}
