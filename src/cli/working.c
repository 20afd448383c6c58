/* SPDX-License-Identifier: MIT */
/* working.c - contributions of the components and the steps of ISO 6976, for checking by hand. */
#include "cli/working.h"

#include "base/compiler.h"
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
    report_add_column(r, table, "x", "x", "mol %");
    report_add_column(r, table, "mass", "x M", "g/mol");
    report_add_column(r, table, "gross", "x Hgross", "kJ/mol");
    report_add_column(r, table, "net", "x Hnet", "kJ/mol");
    report_add_column(r, table, "factor", "x s", "1");
    report_add_column(r, table, "wobbe", "to Wobbe", "MJ/m3");
}

#define NUMBERS 6

/* One decimal more than the results need, so that the rounded terms add up to the rounded result. */
static void add_row(report *r, size_t table, const char *name, const double numbers[NUMBERS])
{
    static const int DECIMALS[NUMBERS] = {5, 6, 5, 5, 7, 5};

    report_add_text(r, table, name);
    for (size_t i = 0; i < NUMBERS; i++)
        report_add_number(r, table, numbers[i], DECIMALS[i]);
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
        const double gross = x * ref->gross_j_per_mol[i] * 1e-3;
        const double row[NUMBERS] = {100.0 * x, x * ref->mass_kg_per_mol[i] * 1e3, gross, x * ref->net_j_per_mol[i] * 1e-3,
                                     x * ref->factor[i], gross * t->wobbe_per_heat};

        if (x > 0.0)
            add_row(r, table, bc_species_id(i), row);
    }
    const double sums[NUMBERS] = {100.0, s->value.molar_mass_kg_per_mol * 1e3, s->value.gross_j_per_mol * 1e-3, s->value.net_j_per_mol * 1e-3,
                                  t->sum_factor, s->value.wobbe_gross_j_per_m3 * 1e-6};

    add_row(r, table, "sum", sums);
}

/* A line of the steps: what, how, how much, with its decimals and unit. */
typedef struct {
    const char *symbol, *formula;
    double value;
    int decimals;
    const char *unit;
} step;

static void add_steps(report *r, size_t table, const step steps[], size_t count)
{
    for (size_t i = 0; i < count; i++) {
        report_add_text(r, table, steps[i].symbol);
        report_add_text(r, table, steps[i].formula);
        report_add_number(r, table, steps[i].value, steps[i].decimals);
        report_add_text(r, table, steps[i].unit);
    }
}

static void add_constants(report *r, size_t table, const bc_reference *ref)
{
    const step steps[] = {
        {"R", "gas constant", ref->r_j_per_mol_k, 7, "J/(mol K)"},
        {"Lo", "vaporisation of water at t1", ref->vaporisation_j_per_mol * 1e-3, 3, "kJ/mol"},
        {"Mair", "molar mass of dry air", ref->air_kg_per_mol * 1e3, 5, "g/mol"},
        {"Zair", "of dry air at t2, p2", ref->air_z, 6, "1"},
        {"T2", "t2 + 273.15", ref->state.metering_c + 273.15, 4, "K"},
        {"p2", "metering pressure", ref->state.metering_pa * 1e-3, 4, "kPa"},
    };

    add_steps(r, table, steps, BC_COUNT(steps));
}

static void add_results(report *r, size_t table, const terms *t)
{
    const bc_value *v = &t->s->value;
    const bc_reference *ref = t->s->reference;
    const double ideal_l = ref->r_j_per_mol_k * (ref->state.metering_c + 273.15) / (ref->state.metering_pa * 1e-3);

    const step steps[] = {
        {"Z", "1 - (p2/101.325)(sum x s)^2", v->z, 7, "1"},
        {"V0", "R T2/p2, ideal", ideal_l, 6, "m3/kmol"},
        {"V", "V0 Z, real", v->molar_volume_m3_per_mol * 1e3, 6, "m3/kmol"},
        {"HHV", "sum x Hgross/V", v->gross_j_per_m3 * 1e-6, 5, "MJ/m3"},
        {"LHV", "sum x Hnet/V", v->net_j_per_m3 * 1e-6, 5, "MJ/m3"},
        {"D", "sum x M/V", v->density_kg_per_m3, 6, "kg/m3"},
        {"G", "(sum x M/Mair) Zair/Z", v->relative_density, 6, "1"},
        {"Wgross", "HHV/sqrt(G)", v->wobbe_gross_j_per_m3 * 1e-6, 5, "MJ/m3"},
        {"Wnet", "LHV/sqrt(G)", v->wobbe_net_j_per_m3 * 1e-6, 5, "MJ/m3"},
        {"hhv-mass", "sum x Hgross/sum x M", v->gross_j_per_kg * 1e-6, 5, "MJ/kg"},
        {"lhv-mass", "sum x Hnet/sum x M", v->net_j_per_kg * 1e-6, 5, "MJ/kg"},
    };

    add_steps(r, table, steps, BC_COUNT(steps));
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
