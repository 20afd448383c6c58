/* SPDX-License-Identifier: MIT */
/* burn_working.c - the heat path term by term, for checking by hand. */
#include "cli/burn_report.h"

/* Sums of a stream's terms, kJ per mole of fuel. */
typedef struct {
    double formation, increment;
} stream_sum;

static stream_sum add_stream(report *r, size_t table, const char *stream, const bc_heat_term terms[], double sign)
{
    stream_sum sum = {0.0, 0.0};

    for (size_t i = 0; i < bc_species_count(); i++) {
        const bc_heat_term *t = &terms[i];

        if (!(t->mol > 0.0))
            continue;
        const double formation = sign * t->mol * t->formation_j_per_mol * 1e-3;
        const double increment = sign * t->mol * t->increment_j_per_mol * 1e-3;

        report_add_text(r, table, stream);
        report_add_text(r, table, bc_species_id(i));
        report_add_number(r, table, t->mol, 6);
        report_add_number(r, table, t->formation_j_per_mol * 1e-3, 3);
        report_add_number(r, table, formation, 4);
        report_add_number(r, table, t->increment_j_per_mol * 1e-3, 4);
        report_add_number(r, table, increment, 4);
        sum.formation += formation;
        sum.increment += increment;
    }
    return sum;
}

static void add_step(report *r, size_t table, const char *step, const char *how, double kj_per_mol)
{
    report_add_text(r, table, step);
    report_add_text(r, table, how);
    report_add_number(r, table, kj_per_mol, 4);
}

static void add_columns(report *r, size_t table)
{
    report_add_column(r, table, "stream", "stream", "");
    report_add_column(r, table, "species", "species", "");
    report_add_column(r, table, "mol", "n", "mol/mol");
    report_add_column(r, table, "formation", "Hf", "kJ/mol");
    report_add_column(r, table, "formation-part", "+-n Hf", "kJ/mol");
    report_add_column(r, table, "increment", "H(T)-H0", "kJ/mol");
    report_add_column(r, table, "increment-part", "+-n (H-H0)", "kJ/mol");
}

void burn_working(report *r, const burn_case_result *c)
{
    const bc_heat_path *p = &c->burn.path;
    const size_t terms = report_add_table(r, "working-terms", "Working: terms per mole of fuel (H0 at 298.15 K; + products, - reactants)");

    add_columns(r, terms);
    const stream_sum fuel = add_stream(r, terms, "fuel", p->fuel, -1.0);
    const stream_sum oxidant = add_stream(r, terms, "oxidant", p->oxidant, -1.0);
    const stream_sum products = add_stream(r, terms, "products", p->products, 1.0);
    const size_t steps = report_add_table(r, "working-path", "Working: the path");

    report_add_column(r, steps, "step", "step", "");
    report_add_column(r, steps, "how", "sum of", "");
    report_add_column(r, steps, "heat", "enthalpy", "kJ/mol");
    add_step(r, steps, "fuel to 298.15 K", "-n (H-H0) of the fuel", fuel.increment);
    add_step(r, steps, "oxidant to 298.15 K", "-n (H-H0) of the oxidant", oxidant.increment);
    add_step(r, steps, "reaction at 298.15 K", "+-n Hf of all", fuel.formation + oxidant.formation + products.formation);
    add_step(r, steps, "products to exit", "+n (H-H0) of the products", products.increment);
    add_step(r, steps, "condensation", "-n (Hvapour - Hliquid)", p->condensation_j * 1e-3);
    add_step(r, steps, "sum", "heat given off when negative", p->total_j * 1e-3);
}
