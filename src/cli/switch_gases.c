/* SPDX-License-Identifier: MIT */
/* switch_gases.c - the two gases of a switch side by side. */
#include "bluecone/methane_number.h"
#include "bluecone/wobbe.h"
#include "cli/switch_report.h"

#define T0_K 273.15
#define MODIFIED_UNIT 1e6 /* MJ/(m3 K^0.5) */

/* A figure that a gas does not have leaves no row. */
static void add_quantities(report *r, const switch_case *c, size_t section, const char *const ids[], size_t count)
{
    for (size_t i = 0; i < count; i++) {
        size_t quantity = 0;

        if (bc_quantity_find(ids[i], &quantity, NULL) != BC_OK)
            continue;
        for (size_t gas = 0; gas < c->s->count; gas++) {
            const slot where = {r, section, gas};

            if (report_quantity(&where, quantity, &c->s->each[gas].subject, c->a, NULL) != BC_OK)
                continue;
        }
    }
}

/* What the temperature of the fuel does, once one is stated. */
static void add_corrected(report *r, const switch_case *c, size_t section)
{
    for (size_t gas = 0; gas < c->s->count && (c->has_burner || c->has_fuel_k); gas++) {
        const bc_subject *s = &c->s->each[gas].subject;
        const double t_k = gas == OLD_GAS ? c->old_k : c->new_k;
        const slot where = {r, section, gas};
        double corrected = 0.0;
        double modified = 0.0;

        if (bc_wobbe_corrected(s->value.wobbe_gross_j_per_m3, s->reference->state.metering_c + T0_K, t_k, &corrected, NULL) != BC_OK
            || bc_wobbe_modified(s->value.net_j_per_m3, s->value.relative_density, t_k, &modified, NULL) != BC_OK)
            continue;
        const plain_figure figures[] = {
            {"fuel-temperature", "Gas at the burner", t_k - T0_K, "C", 5, "stated, or default"},
            {"wobbe-gross-corrected", "Wobbe gross at that", corrected * 1e-6, "MJ/m3", 5, "W sqrt(T0/T)"},
            {"wobbe-modified", "Modified Wobbe, net", modified / MODIFIED_UNIT, "MJ/(m3 K^0.5)", 5, "Hi/sqrt(d T)"},
        };

        add_figures(&where, c->a, figures, BC_COUNT(figures));
    }
}

static void add_methane_numbers(report *r, const switch_case *c, size_t section)
{
    for (size_t gas = 0; gas < c->s->count; gas++) {
        const slot where = {r, section, gas};
        bc_methane_number n;

        if (bc_methane_number_of(&c->s->each[gas].subject.gas, &n, NULL) != BC_OK)
            continue;
        const plain_figure figures[] = {
            {"methane-number-linear", "Methane number, linear route", n.linear, "1", 3, "ISO/TR 22302"},
            {"methane-number-ratio", "Methane number, hydrogen-carbon route", n.ratio, "1", 3, "ISO/TR 22302"},
            {"methane-number-spread", "Spread of the two routes", n.spread, "1", 2, "ISO/TR 22302"},
        };

        add_figures(&where, c->a, figures, BC_COUNT(figures));
    }
}

void switch_gases(report *r, const switch_case *c)
{
    static const char *const HEAT[] = {"wobbe-gross", "wobbe-net", "hhv", "lhv", "relative-density", "air-index"};
    static const char *const FLAME[] = {"burning-velocity", "mcp", "gbt-cp", "weaver-speed", "flame-temperature"};
    const size_t heat = report_add_section(r, "gases", "Old gas and new gas");
    const size_t flame = report_add_section(r, "flame", "Flame (no row: the gas is outside the method)");
    const size_t knock = report_add_section(r, "knock", "Knock (an estimate, within some 6 units)");

    add_quantities(r, c, heat, HEAT, BC_COUNT(HEAT));
    add_corrected(r, c, heat);
    add_quantities(r, c, flame, FLAME, BC_COUNT(FLAME));
    add_methane_numbers(r, c, knock);
}
