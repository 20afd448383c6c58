/* SPDX-License-Identifier: MIT */
/* contract_worst.c - the worst gas that a contract lets in: extremes, the limits that are idle or open, conflicts. */
#include "cli/contract_worst.h"

#include "base/error_internal.h"

#include <math.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>

#define SHARE_TOLD 5e-7 /* mole fractions below it are rounding of a vertex */

/* What pipeline gas is made of: the components when neither contract nor gases name others. */
static const char *const USUAL[] = {"methane", "ethane", "propane", "isobutane", "n-butane", "isopentane", "n-pentane", "n-hexane", "nitrogen", "carbon-dioxide"};

static void take_species(const contract_case *c, bool present[BC_SPECIES_CAPACITY])
{
    memset(present, 0, BC_SPECIES_CAPACITY * sizeof *present);
    for (size_t g = 0; g < c->gases.count; g++)
        for (size_t i = 0; i < bc_species_count(); i++)
            present[i] = present[i] || c->gases.each[g].loaded.gas.x[i] > 0.0;
    for (size_t k = 0; c->gases.count == 0 && k < BC_COUNT(USUAL); k++) {
        size_t species = 0;

        if (bc_species_find(USUAL[k], &species, NULL) == BC_OK)
            present[species] = true;
    }
}

bc_status worst_open(worst_case *w, const contract_case *c, bc_error *err)
{
    bool present[BC_SPECIES_CAPACITY];

    memset(w, 0, sizeof *w);
    w->c = c;
    w->space = calloc(1, sizeof *w->space);
    if (!w->space)
        return bc_fail(err, BC_ERR_MEMORY, "not enough memory for the space of gases");
    take_species(c, present);
    const bc_status status = bc_contract_space(c->contract, c->own_limits, present, w->space, w->place, err);

    return status == BC_OK ? bc_worst_open(w->space, &w->worst, err) : status;
}

void worst_close(worst_case *w)
{
    bc_worst_close(w->worst);
    free(w->space);
}

static void describe_gas(const bc_gas *gas, char *text, size_t size)
{
    text[0] = '\0';
    for (size_t i = 0; i < bc_species_count(); i++) {
        const size_t used = strlen(text);

        if (gas->x[i] > SHARE_TOLD)
            (void)snprintf(text + used, size - used, "%s%s %.4g", used > 0 ? ", " : "", bc_species_id(i), 100.0 * gas->x[i]);
    }
}

static void keep_end(report *r, size_t worst, report_end end, const bc_extreme *e)
{
    report_set_worst(r, worst, end, e->value, e->exact);
    for (size_t i = 0; i < bc_species_count(); i++)
        if (e->gas.x[i] > 0.0)
            report_add_worst_fraction(r, worst, end, bc_species_id(i), e->gas.x[i]);
}

void worst_add(worst_case *w, report *r, const worst_figure *f, const bc_extremes *e)
{
    const bc_extreme *const ends[] = {&e->min, &e->max};
    static const char *const WORDS[] = {"min", "max"};
    const size_t worst = report_add_worst(r, f->id, f->unit, f->state);

    keep_end(r, worst, REPORT_MIN, &e->min);
    keep_end(r, worst, REPORT_MAX, &e->max);
    report_add_text(r, w->figures, f->id);
    report_add_text(r, w->figures, strcmp(f->unit, "1") == 0 ? "" : f->unit);
    report_add_text(r, w->figures, f->state);
    report_add_number(r, w->figures, e->min.value, -1);
    report_add_number(r, w->figures, e->max.value, -1);
    report_add_text(r, w->figures, e->min.exact && e->max.exact ? "exact" : "searched");
    for (size_t i = 0; i < BC_COUNT(WORDS); i++) {
        char text[1200];

        describe_gas(&ends[i]->gas, text, sizeof text);
        report_add_text(r, w->gases, f->id);
        report_add_text(r, w->gases, WORDS[i]);
        report_add_text(r, w->gases, text);
    }
}

void worst_tables(worst_case *w, report *r)
{
    w->figures = report_add_table(r, "worst", "What a gas can be that the contract allows");
    report_add_column(r, w->figures, "figure", "figure", "");
    report_add_column(r, w->figures, "unit", "unit", "");
    report_add_column(r, w->figures, "state", "at", "");
    report_add_column(r, w->figures, "min", "min", "");
    report_add_column(r, w->figures, "max", "max", "");
    report_add_column(r, w->figures, "proof", "proof", "");
    w->gases = report_add_table(r, "worst-gases", "Gases that attain it");
    report_add_column(r, w->gases, "figure", "figure", "");
    report_add_column(r, w->gases, "end", "end", "");
    report_add_column(r, w->gases, "gas", "composition", "mol %");
}

/* The figures of the limits themselves, each in its unit and at its state. */
static bc_status add_limit_figures(worst_case *w, report *r, bc_error *err)
{
    const bc_contract *c = w->c->contract;

    for (size_t i = 0; i < w->c->own_limits; i++) {
        const bc_limit *limit = &c->limits[i];
        char state[64];
        bc_extremes e;

        if (w->place[i] == BC_NOT_IMPOSED)
            continue;
        const bc_status status = bc_worst_ratio(w->worst, &w->space->limits[w->place[i]].ratio, &e, err);

        if (status != BC_OK)
            return status;
        contract_state_text(c, limit, state, sizeof state);
        worst_add(w, r, &(worst_figure){limit->id, limit->unit, state}, &e);
    }
    return BC_OK;
}

static bool is_limited(const contract_case *c, const char *id)
{
    for (size_t i = 0; i < c->own_limits; i++)
        if (strcmp(c->contract->limits[i].id, id) == 0)
            return true;
    return false;
}

/* Figures that are not limited, at the state of the contract. */
static bc_status add_quantities(worst_case *w, report *r, bc_error *err)
{
    static const char *const IDS[] = {"hhv", "lhv", "wobbe-gross", "wobbe-net", "relative-density", "air-demand", "co2-factor-net", "flue-dew-point",
                                      "flame-temperature"};
    char state[64];

    state_text(&w->c->contract->state, state, sizeof state);
    for (size_t i = 0; i < BC_COUNT(IDS); i++) {
        size_t q = 0;
        bc_extremes e;
        bc_status status = is_limited(w->c, IDS[i]) ? BC_ERR_RANGE : bc_quantity_find(IDS[i], &q, err);

        if (status == BC_OK)
            status = bc_worst_quantity(w->worst, q, &w->c->gases.reference, &e, err);
        if (status == BC_OK)
            worst_add(w, r, &(worst_figure){IDS[i], bc_quantity_at(q)->unit, state}, &e);
        else if (status != BC_ERR_RANGE)
            return status;
    }
    return BC_OK;
}

/* The figures are asked at the state of the contract, gases or none. */
static bc_status fill(worst_case *w, report *r, bool *good, bc_error *err)
{
    if (bc_worst_is_empty(w->worst)) {
        *good = false;
        worst_explain(w, r);
        return BC_OK;
    }
    worst_tables(w, r);
    bc_status status = add_limit_figures(w, r, err);

    if (status == BC_OK)
        status = add_quantities(w, r, err);
    if (status == BC_OK)
        status = worst_against(w, r, err);
    if (status == BC_OK && w->c->has_burner)
        status = worst_burner(w, r, good, err);
    return status == BC_OK ? worst_standings(w, r, err) : status;
}

/* Which components were let vary, and which limits could not be imposed. */
static void tell_space(const worst_case *w, report *r)
{
    char text[1400] = "The worst gas is made of";

    for (size_t i = 0; i < w->space->component_count; i++) {
        const size_t used = strlen(text);

        (void)snprintf(text + used, sizeof text - used, "%s %s", i > 0 ? "," : "", bc_species_id(w->space->components[i].species));
    }
    const size_t used = strlen(text);

    (void)snprintf(text + used, sizeof text - used, "%s.", w->c->gases.count > 0 ? ": what the contract names singly and the gases hold"
                                                                               : ": what the contract names singly and pipeline gas holds");
    report_add_warning(r, text);
    for (size_t i = 0; i < w->c->own_limits; i++) {
        if (w->place[i] != BC_NOT_IMPOSED)
            continue;
        (void)snprintf(text, sizeof text, "The limit on %s is no ratio of linear sums: the worst gas need not keep it.", w->c->contract->limits[i].id);
        report_add_warning(r, text);
    }
}

bc_status contract_worst(report *r, const contract_case *c, bool *good, bc_error *err)
{
    worst_case w;
    bc_status status = worst_open(&w, c, err);

    if (status == BC_OK) {
        tell_space(&w, r);
        status = fill(&w, r, good, err);
    }
    worst_close(&w);
    return status;
}
