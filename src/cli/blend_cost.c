/* SPDX-License-Identifier: MIT */
/* blend_cost.c - what a blend costs and what CO2 it brings, as far as its parts state terms of supply. */
#include "cli/blend_report.h"
#include "cli/figures.h"

#include <stdio.h>

#define J_PER_MWH 3.6e9
#define J_PER_GJ 1e9

bool blend_has_terms(const blend_case *c)
{
    for (size_t i = 0; i < c->count; i++)
        if (c->offer[i].price.given || c->offer[i].co2.given)
            return true;
    return false;
}

static bool has_price(const bc_offer *offer)
{
    return offer->price.given;
}

static bool has_co2(const bc_offer *offer)
{
    return offer->co2.given;
}

/* What some parts state and others do not, the blend does not have: said, since it was stated to be counted. */
static void warn_lacking(report *r, const blend_case *c, const double share[], bool (*has)(const bc_offer *), const char *what, const char *option)
{
    char text[BC_NAME_MAX + 100];
    size_t lacking = NO_PART;
    bool some = false;

    for (size_t i = 0; i < c->count; i++) {
        some = some || has(&c->offer[i]);
        if (share[i] > 0.0 && !has(&c->offer[i]) && lacking == NO_PART)
            lacking = i;
    }
    if (!some || lacking == NO_PART)
        return;
    (void)snprintf(text, sizeof text, "%.100s has no %s, so the blend has none; state it with --%s.", blend_part_name(c, lacking), what, option);
    report_add_warning(r, text);
}

void blend_cost(report *r, const blend_case *c, const double share[])
{
    bc_blend_terms t;
    bc_error err;
    char text[BC_MESSAGE_MAX + 32];
    char per_mwh[32];
    char per_gj[32];

    if (bc_blend_terms_of(&c->mixer, c->offer, share, &t, &err) != BC_OK) {
        (void)snprintf(text, sizeof text, "No cost of the blend: %s.", err.message);
        report_add_warning(r, text);
        return;
    }
    const slot where = {r, report_add_section(r, "terms", "Cost and carbon dioxide, per gross heat"), c->count};

    (void)snprintf(per_mwh, sizeof per_mwh, "%s/MWh", t.currency);
    (void)snprintf(per_gj, sizeof per_gj, "%s/GJ", t.currency);
    const plain_figure figures[] = {
        {"co2-burning", "CO2 of burning, biogenic not counted", t.co2_burning_per_j * J_PER_GJ, "kg/GJ", 5, "carbon balance"},
        {"co2-making", "CO2 of making", t.co2_making_per_j * J_PER_GJ, "kg/GJ", 5, "as stated"},
        {"cost", "Cost", t.price_per_j * J_PER_MWH, per_mwh, 6, "as stated"},
        {"cost-per-gj", "Cost", t.price_per_j * J_PER_GJ, per_gj, 6, "as stated"},
    };

    add_figures(&where, c->a, figures, t.has_co2 ? 2 : 1);
    if (t.has_price)
        add_figures(&where, c->a, figures + 2, 2);
    if (c->a->value[OPTION_least]) /* which has warnings of its own */
        return;
    warn_lacking(r, c, share, has_price, "price", "price");
    warn_lacking(r, c, share, has_co2, "CO2 of making", "co2");
}
