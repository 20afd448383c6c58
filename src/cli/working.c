/* SPDX-License-Identifier: MIT */
/* working.c - contributions of the components and the steps of ISO 6976, for checking by hand. */
#include "cli/working.h"

#include "bluecone/species.h"

#include <math.h>
#include <stdio.h>

/* The sums and factors that turn one component's share into its part of a result. */
typedef struct {
    const bc_subject *s;
    double sum_factor;       /* sum x s */
    double wobbe_per_heat;   /* MJ/m3 of Wobbe index per kJ/mol of heat: 1/(V_real sqrt G) */
} terms;

static terms terms_of(const bc_subject *s)
{
    terms t = {.s = s};

    for (size_t i = 0; i < bc_species_count(); i++)
        t.sum_factor += s->gas.x[i] * s->reference->factor[i];
    /* kJ/mol over m3/mol is kJ/m3, of which 1000 make a MJ/m3 */
    t.wobbe_per_heat = 1e-3 / (s->value.molar_volume_m3_per_mol * sqrt(s->value.relative_density));
    return t;
}

static void add_columns(report *r, size_t table)
{
    report_add_column(r, table, "component", "component", "");
    report_add_column(r, table, "x", "x", "mol-%");
    report_add_column(r, table, "mass", "x M", "g/mol");
    report_add_column(r, table, "gross", "x Hgross", "kJ/mol");
    report_add_column(r, table, "net", "x Hnet", "kJ/mol");
    report_add_column(r, table, "factor", "x s", "1");
    report_add_column(r, table, "wobbe", "to Wobbe", "MJ/m3");
}

/* One decimal more than the results need, so that the rounded terms add up to the rounded result. */
static void add_row(report *r, size_t table, const char *name, double x, double mass, double gross, double net, double factor, double wobbe)
{
    report_add_text(r, table, name);
    report_add_number(r, table, 100.0 * x, 5);
    report_add_number(r, table, mass, 6);
    report_add_number(r, table, gross, 5);
    report_add_number(r, table, net, 5);
    report_add_number(r, table, factor, 7);
    report_add_number(r, table, wobbe, 5);
}

static void add_contributions(report *r, const char *gas_name, const terms *t)
{
    const bc_subject *s = t->s;
    const bc_reference *ref = s->reference;
    char title[200];

    (void)snprintf(title, sizeof title, "Working: contributions, %.120s", gas_name);
    const size_t table = report_add_table(r, "working-contributions", title);

    add_columns(r, table);
    for (size_t i = 0; i < bc_species_count(); i++) {
        const double x = s->gas.x[i];

        if (x > 0.0)
            add_row(r, table, bc_species_id(i), x, x * ref->mass_kg_per_mol[i] * 1e3, x * ref->gross_j_per_mol[i] * 1e-3,
                    x * ref->net_j_per_mol[i] * 1e-3, x * ref->factor[i], x * ref->gross_j_per_mol[i] * 1e-3 * t->wobbe_per_heat);
    }
    add_row(r, table, "sum", 1.0, s->value.molar_mass_kg_per_mol * 1e3, s->value.gross_j_per_mol * 1e-3, s->value.net_j_per_mol * 1e-3,
            t->sum_factor, s->value.wobbe_gross_j_per_m3 * 1e-6);
}

static void add_step(report *r, size_t table, const char *symbol, const char *formula, double value, int decimals, const char *unit)
{
    report_add_text(r, table, symbol);
    report_add_text(r, table, formula);
    report_add_number(r, table, value, decimals);
    report_add_text(r, table, unit);
}

static void add_constants(report *r, size_t table, const bc_reference *ref)
{
    add_step(r, table, "R", "gas constant", ref->r_j_per_mol_k, 7, "J/(mol K)");
    add_step(r, table, "Lo", "vaporisation of water at t1", ref->vaporisation_j_per_mol * 1e-3, 3, "kJ/mol");
    add_step(r, table, "Mair", "molar mass of dry air", ref->air_kg_per_mol * 1e3, 5, "g/mol");
    add_step(r, table, "Zair", "of dry air at t2, p2", ref->air_z, 6, "1");
    add_step(r, table, "T2", "t2 + 273.15", ref->state.metering_c + 273.15, 4, "K");
    add_step(r, table, "p2", "metering pressure", ref->state.metering_pa * 1e-3, 4, "kPa");
}

static void add_results(report *r, size_t table, const terms *t)
{
    const bc_value *v = &t->s->value;
    const bc_reference *ref = t->s->reference;
    const double ideal_l = ref->r_j_per_mol_k * (ref->state.metering_c + 273.15) / (ref->state.metering_pa * 1e-3);

    add_step(r, table, "Z", "1 - (p2/101.325)(sum x s)^2", v->z, 7, "1");
    add_step(r, table, "V0", "R T2/p2, ideal", ideal_l, 6, "m3/kmol");
    add_step(r, table, "V", "V0 Z, real", v->molar_volume_m3_per_mol * 1e3, 6, "m3/kmol");
    add_step(r, table, "HHV", "sum x Hgross/V", v->gross_j_per_m3 * 1e-6, 5, "MJ/m3");
    add_step(r, table, "LHV", "sum x Hnet/V", v->net_j_per_m3 * 1e-6, 5, "MJ/m3");
    add_step(r, table, "D", "sum x M/V", v->density_kg_per_m3, 6, "kg/m3");
    add_step(r, table, "G", "(sum x M/Mair) Zair/Z", v->relative_density, 6, "1");
    add_step(r, table, "Wgross", "HHV/sqrt(G)", v->wobbe_gross_j_per_m3 * 1e-6, 5, "MJ/m3");
    add_step(r, table, "Wnet", "LHV/sqrt(G)", v->wobbe_net_j_per_m3 * 1e-6, 5, "MJ/m3");
    add_step(r, table, "hhv-mass", "sum x Hgross/sum x M", v->gross_j_per_kg * 1e-6, 5, "MJ/kg");
    add_step(r, table, "lhv-mass", "sum x Hnet/sum x M", v->net_j_per_kg * 1e-6, 5, "MJ/kg");
}

void report_working(report *r, const char *gas_name, const bc_subject *subject)
{
    const terms t = terms_of(subject);
    char title[200];

    add_contributions(r, gas_name, &t);
    (void)snprintf(title, sizeof title, "Working: steps, %.120s", gas_name);
    const size_t table = report_add_table(r, "working-steps", title);

    report_add_column(r, table, "symbol", "symbol", "");
    report_add_column(r, table, "formula", "formula", "");
    report_add_column(r, table, "value", "value", "");
    report_add_column(r, table, "unit", "unit", "");
    add_constants(r, table, subject->reference);
    add_results(r, table, &t);
}
