/* SPDX-License-Identifier: MIT */
/* contract_standing.c - how limits stand to each other, what excludes every gas, and the worst gas for a burner. */
#include "cli/contract_worst.h"

#include <math.h>
#include <stdio.h>
#include <string.h>

/* Idle: nothing that is allowed otherwise reaches it. Open: the ranges let gases in that break it. */
static void describe_side(const bc_side_standing *side, const char *unit, char *text, size_t size)
{
    if (!side->stated)
        (void)snprintf(text, size, "-");
    else if (side->idle && !side->open)
        (void)snprintf(text, size, "idle");
    else if (side->idle)
        (void)snprintf(text, size, "idle: other limits keep it");
    else if (side->open)
        (void)snprintf(text, size, "open by %.4g%s%s", side->excess, strcmp(unit, "1") == 0 ? "" : " ", strcmp(unit, "1") == 0 ? "" : unit);
    else
        (void)snprintf(text, size, "needed");
}

bc_status worst_standings(worst_case *w, report *r, bc_error *err)
{
    const size_t table = report_add_table(r, "standing", "Which limits bind: idle, no allowed gas reaches it; open, the ranges alone would let it be broken by so much");

    report_add_column(r, table, "limit", "limit", "");
    report_add_column(r, table, "min", "min", "");
    report_add_column(r, table, "max", "max", "");
    for (size_t i = 0; i < w->c->own_limits; i++) {
        const bc_limit *limit = &w->c->contract->limits[i];
        bc_limit_standing standing;
        char text[BC_LIMIT_ID_MAX + 40];

        if (w->place[i] == BC_NOT_IMPOSED)
            continue;
        const bc_status status = bc_worst_standing(w->worst, w->place[i], &standing, err);

        if (status != BC_OK)
            return status;
        report_add_text(r, table, limit->id);
        describe_side(&standing.min, limit->unit, text, sizeof text);
        report_add_text(r, table, text);
        describe_side(&standing.max, limit->unit, text, sizeof text);
        report_add_text(r, table, text);
    }
    return BC_OK;
}

/* The limit of the contract that stands at an index of the space. */
static const bc_limit *limit_at(const worst_case *w, size_t index)
{
    for (size_t i = 0; i < w->c->own_limits; i++)
        if (w->place[i] == index)
            return &w->c->contract->limits[i];
    return NULL;
}

static bool same_weights(const double a[], const double b[])
{
    for (size_t i = 0; i < bc_species_count(); i++)
        if (a[i] < b[i] || a[i] > b[i])
            return false;
    return true;
}

/* The range on a group that stands at an index of the space: groups keep the order of the ranges. */
static const char *group_at(const worst_case *w, size_t index)
{
    for (size_t i = 0; i < w->c->contract->range_count; i++)
        if (same_weights(w->c->contract->ranges[i].weight, w->space->groups[index].weight))
            return w->c->contract->ranges[i].id;
    return "a group";
}

static void describe_limit(const bc_limit *limit, bool upper, char *text, size_t size)
{
    const bool plain = strcmp(limit->unit, "1") == 0;

    (void)snprintf(text, size, "%s %s %.6g%s%s", limit->id, upper ? "max" : "min", upper ? limit->max : limit->min, plain ? "" : " ",
                   plain ? "" : limit->unit);
}

static void describe_part(const worst_case *w, const bc_conflict_part *part, char *text, size_t size)
{
    const char *side = part->upper ? "max" : "min";
    const bc_limit *limit = part->kind == BC_PART_LIMIT ? limit_at(w, part->index) : NULL;

    if (limit) {
        describe_limit(limit, part->upper, text, size);
    } else if (part->kind == BC_PART_GROUP) {
        const bc_space_group *g = &w->space->groups[part->index];

        (void)snprintf(text, size, "range %s %s %.6g mol %%", group_at(w, part->index), side, 100.0 * (part->upper ? g->max : g->min));
    } else {
        const bc_space_component *x = &w->space->components[part->index];

        (void)snprintf(text, size, "range %s %s %.6g mol %%", bc_species_id(x->species), side, 100.0 * (part->upper ? x->max : x->min));
    }
}

void worst_explain(const worst_case *w, report *r)
{
    bc_conflict conflict;
    char text[2000] = "no gas is allowed: these exclude each other: ";

    bc_worst_conflict(w->worst, &conflict);
    for (size_t i = 0; i < conflict.count; i++) {
        const size_t used = strlen(text);
        char part[160];

        describe_part(w, &conflict.parts[i], part, sizeof part);
        (void)snprintf(text + used, sizeof text - used, "%s%s", i > 0 ? ", " : "", part);
    }
    report_add_check(r, "worst-conflict", false, text);
    if (!r->verdict)
        report_set_verdict(r, text);
    report_judge(r, REPORT_NO);
}

/* An index against the present supply, as bc_worst_search() asks for it. */
typedef struct {
    size_t index;
    const bc_reference *reference;
    const bc_subject *present;
} asked_index;

static double index_of(const bc_gas *gas, void *context)
{
    const asked_index *a = context;
    bc_subject here;
    bc_index index;

    if (bc_subject_make(a->reference, gas, NULL, &here, NULL) != BC_OK || bc_index_evaluate(a->index, a->present, &here, &index, NULL) != BC_OK
        || !index.has_value || !index.in_range)
        return HUGE_VAL;
    return index.value;
}

/* The heat input of a burner goes with the Wobbe index: the ratio of both is certified. */
static bc_status add_heat_input(worst_case *w, report *r, const bc_subject *present, bc_error *err)
{
    bc_ratio ratio;
    bc_extremes e;
    size_t q = 0;
    bc_status status = bc_quantity_find("wobbe-gross", &q, err);

    if (status == BC_OK)
        status = bc_ratio_of_quantity(q, present->reference, &ratio, err);
    if (status != BC_OK || !(present->value.wobbe_gross_j_per_m3 > 0.0))
        return status;
    ratio.scale *= 1e6 / present->value.wobbe_gross_j_per_m3; /* the quantity is in MJ/m3 */
    status = bc_worst_ratio(w->worst, &ratio, &e, err);
    if (status == BC_OK)
        worst_add(w, r, &(worst_figure){"wobbe-ratio", "1", "against the present supply"}, &e);
    return status;
}

bc_status worst_against(worst_case *w, report *r, bc_error *err)
{
    const contract_case *c = w->c;
    bc_status status = BC_OK;

    if (!c->has_present)
        return BC_OK;
    const bc_subject *present = &c->gases.each[c->judged].subject;

    status = add_heat_input(w, r, present, err);
    for (size_t i = 0; i < bc_index_count() && status == BC_OK; i++) {
        asked_index asked = {i, &c->gases.reference, present};
        const bc_index_row *row = bc_index_at(i);
        bc_extremes e;

        if (row->kind != BC_INDEX_AGAINST || strcmp(row->id, "wobbe-ratio") == 0)
            continue;
        const bc_status searched = bc_worst_search(w->worst, index_of, &asked, &e, err);

        if (searched == BC_OK)
            worst_add(w, r, &(worst_figure){row->id, row->unit, "against the present supply"}, &e);
        else if (searched != BC_ERR_RANGE) /* a method that covers none of the gases has no worst one */
            status = searched;
    }
    return status;
}
