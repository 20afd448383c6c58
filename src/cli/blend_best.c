/* SPDX-License-Identifier: MIT */
/* blend_best.c - the blend that makes cost, CO2 or a share least within limits. */
#include "base/error_internal.h"
#include "cli/blend_report.h"
#include "cli/figures.h"

#include <math.h>
#include <stdio.h>
#include <string.h>

#define J_PER_MWH 3.6e9
#define METHOD "SLSQP, several starts"

typedef struct {
    bc_optimum_problem problem;
    bc_per_amount rate;
    bc_optimum optimum;
} best_blend;

static bc_status take_least(const blend_case *c, bc_optimum_problem *p, bc_error *err)
{
    const char *word = c->a->value[OPTION_least];

    if (strcmp(word, "cost") == 0 || strcmp(word, "co2") == 0) {
        p->least = word[2] == 's' ? BC_LEAST_COST : BC_LEAST_CO2;
        return BC_OK;
    }
    p->least = BC_LEAST_SHARE;
    if (strncmp(word, "share:", 6) == 0)
        return blend_find_part(c, "least", word + 6, &p->part, err);
    return bc_fail(err, BC_ERR_USAGE, "--least %.40s: write cost, co2, or share:GAS", word);
}

static bc_status take_rate(const blend_case *c, best_blend *b, bc_error *err)
{
    const char *rate = c->a->value[OPTION_flow];

    if (!rate)
        return BC_OK;
    const bc_status status = bc_flow_parse(rate, &b->rate, err);

    b->problem.rate = &b->rate;
    if (status != BC_OK && err)
        err->status = BC_ERR_USAGE;
    return status == BC_OK ? BC_OK : BC_ERR_USAGE;
}

static bc_status find(const blend_case *c, best_blend *b, bc_error *err)
{
    b->problem = (bc_optimum_problem){.mixer = &c->mixer, .within = c->within, .aims = c->aims, .offer = c->offer};
    blend_free_bounds(c, b->problem.low, b->problem.high);
    bc_status status = take_least(c, &b->problem, err);

    if (status == BC_OK)
        status = take_rate(c, b, err);
    return status == BC_OK ? bc_optimum_find(&b->problem, &b->optimum, err) : status;
}

/* Unit of a shadow price's numerator, and what SI is multiplied by. */
static double objective_unit(const blend_case *c, const best_blend *b, char *unit, size_t size)
{
    if (b->problem.least == BC_LEAST_SHARE) {
        (void)snprintf(unit, size, "%%");
        return 100.0;
    }
    (void)snprintf(unit, size, "%s/MWh", b->problem.least == BC_LEAST_COST ? c->offer[0].currency : "kg");
    return J_PER_MWH;
}

/* The bound in words, and its unit: of a flow that of a cubic metre, a kilogram, a kilomole an hour, or MW. */
static void describe_bound(const blend_case *c, const bc_binding *bound, char *what, size_t size, const char **unit, double *factor)
{
    static const char *const UNITS[BC_DIMENSIONS] = {[BC_DIM_ENERGY] = "MW", [BC_DIM_MASS] = "kg/h", [BC_DIM_VOLUME] = "m3/h", [BC_DIM_AMOUNT] = "kmol/h"};
    static const double FACTORS[BC_DIMENSIONS] = {[BC_DIM_ENERGY] = 1e-6, [BC_DIM_MASS] = 3600.0, [BC_DIM_VOLUME] = 3600.0, [BC_DIM_AMOUNT] = 3.6};

    if (bound->kind == BC_BOUND_FLOW) {
        (void)snprintf(what, size, "flow of %.60s, max", blend_part_name(c, bound->index));
        *unit = UNITS[c->offer[bound->index].max_flow.of];
        *factor = FACTORS[c->offer[bound->index].max_flow.of];
        return;
    }
    (void)snprintf(what, size, "%s, %s", c->within->limits[bound->index].id, bound->kind == BC_BOUND_MIN ? "min" : "max");
    *unit = c->within->limits[bound->index].unit;
    *factor = 1.0;
}

static void report_bindings(report *r, const blend_case *c, const best_blend *b)
{
    const bc_optimum *o = &b->optimum;
    char unit[32];
    const double factor = objective_unit(c, b, unit, sizeof unit);

    if (o->binding_count == 0)
        return;
    const size_t table = report_add_table(r, o->feasible ? "active" : "conflict", o->feasible ? "What holds the optimum" : "Limits that exclude each other");

    report_add_column(r, table, "bound", "bound", "");
    report_add_column(r, table, "value", "value", "");
    report_add_column(r, table, "unit", "unit", "");
    if (o->feasible)
        report_add_column(r, table, "shadow-price", "one unit more saves", unit);
    else
        report_add_column(r, table, "needed", "would do alone", "");
    for (size_t i = 0; i < o->binding_count; i++) {
        const bc_binding *bound = &o->binding[i];
        const char *bound_unit = "";
        double bound_factor = 1.0;
        char what[96];

        describe_bound(c, bound, what, sizeof what, &bound_unit, &bound_factor);
        report_add_text(r, table, what);
        report_add_number(r, table, bound->bound * bound_factor, -1);
        report_add_text(r, table, strcmp(bound_unit, "1") == 0 ? "" : bound_unit);
        if (o->feasible)
            report_add_number(r, table, bound->shadow * factor / bound_factor, -1);
        else if (bound->has_needed)
            report_add_number(r, table, bound->needed * bound_factor, -1);
        else
            report_add_text(r, table, "-");
    }
    report_lead_with(r, table);
}

static void verdict(report *r, const blend_case *c, const best_blend *b)
{
    const bc_optimum *o = &b->optimum;
    char text[700];
    char unit[32];
    const double factor = objective_unit(c, b, unit, sizeof unit);

    if (o->feasible)
        (void)snprintf(text, sizeof text, "least %s: %.6g %s%s%s; found from %zu of %zu starting blends", c->a->value[OPTION_least], o->objective * factor, unit,
                       strchr(unit, '/') ? " gross" : "", o->binding_count == 0 ? ", held by no limit" : "", o->agreed, o->starts);
    else
        (void)snprintf(text, sizeof text, "no blend of these gases keeps all limits of %s: %zu of them exclude each other; the blend shown breaks them least",
                       c->within ? c->within->name : "the flows", o->binding_count);
    report_set_verdict(r, text);
}

static void warn_terms(report *r, const blend_case *c, const best_blend *b)
{
    bool flow = false;
    bool making = true;

    for (size_t i = 0; i < c->count; i++) {
        flow = flow || c->offer[i].max_flow.given;
        making = making && c->offer[i].co2.given;
    }
    if (flow && !b->problem.rate)
        report_add_warning(r, "The flows that can be had do not count: state the flow of the blend with --flow.");
    if (b->problem.least == BC_LEAST_CO2 && !making)
        report_add_warning(r, "Not every part states the CO2 of its making: those that do not count with their burning alone.");
}

static bc_status fill(report *r, blend_case *c, const best_blend *b, bc_error *err)
{
    const bc_optimum *o = &b->optimum;
    bool inside = true;
    bc_status status = blend_add(c, o->share, o->feasible ? "Best blend" : "Nearest blend", err);

    if (status == BC_OK)
        status = blend_sheet(r, c, o->share, err);
    if (status != BC_OK)
        return status;
    report_bindings(r, c, b);
    blend_cost(r, c, o->share);
    blend_judge(r, c, c->count, &inside);
    warn_terms(r, c, b);
    verdict(r, c, b);
    return BC_OK;
}

int blend_best(blend_case *c, report *r)
{
    best_blend b;
    bc_error err;

    memset(&b, 0, sizeof b);
    bc_status status = find(c, &b, &err);

    if (status == BC_OK)
        status = fill(r, c, &b, &err);
    if (status == BC_OK)
        return blend_answer(r, c, b.optimum.share, b.optimum.feasible ? 0 : 1);
    report_close(r);
    blend_close(c);
    return complain(&err);
}
