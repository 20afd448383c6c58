/* SPDX-License-Identifier: MIT */
/* blend_aim.c - free shares for aims: all solutions, or the nearest blend. */
#include "base/error_internal.h"
#include "cli/blend_report.h"

#include <math.h>
#include <stdio.h>
#include <string.h>

void blend_free_bounds(const blend_case *c, double low[], double high[])
{
    for (size_t i = 0; i < c->count; i++) {
        const bool is_free = c->share[i].kind == SHARE_FREE || c->share[i].kind == SHARE_REST;

        low[i] = is_free ? 0.0 : c->share[i].value;
        high[i] = is_free ? fmax(1.0 - c->fixed, 0.0) : c->share[i].value;
    }
}

/* A pure number has no unit to be shown. */
static const char *shown_unit(const bc_limit *limit)
{
    return strcmp(limit->unit, "1") == 0 ? "" : limit->unit;
}

/* A row a solution: the shares, and what the aims come to. */
static void report_solutions(report *r, const blend_case *c, const bc_aim *aim)
{
    const size_t table = report_add_table(r, "solutions", aim->reached ? "Solutions" : "Nearest blend");

    report_add_column(r, table, "solution", "blend", "");
    for (size_t i = 0; i < c->count; i++) {
        char id[32];

        (void)snprintf(id, sizeof id, "share-%zu", i + 1);
        report_add_column(r, table, id, blend_part_name(c, i), "%");
    }
    for (size_t k = 0; k < c->aims->limit_count; k++)
        report_add_column(r, table, c->aims->limits[k].id, c->aims->limits[k].id, shown_unit(&c->aims->limits[k]));
    for (size_t n = 0; n < aim->count; n++) {
        const bc_gas gas = bc_mixer_gas(&c->mixer, aim->share[n]);
        char number[24];

        (void)snprintf(number, sizeof number, "%zu", n + 1);
        report_add_text(r, table, number);
        for (size_t i = 0; i < c->count; i++)
            report_add_number(r, table, 100.0 * aim->share[n][i], 6);
        for (size_t k = 0; k < c->aims->limit_count; k++) {
            double value = 0.0;

            if (bc_limit_value(c->aims, k, &gas, &value, NULL) == BC_OK)
                report_add_number(r, table, value, -1);
            else
                report_add_text(r, table, "-");
        }
    }
    report_lead_with(r, table);
}

/* "wobbe-gross of 50.72 MJ/m3 and hydrogen of 10 mol %". */
static void describe_aims(const blend_case *c, char *text, size_t size)
{
    text[0] = '\0';
    for (size_t k = 0; k < c->aims->limit_count; k++) {
        const size_t used = strlen(text);
        const bc_limit *aim = &c->aims->limits[k];

        if (used + 1 < size)
            (void)snprintf(text + used, size - used, "%s%s of %.8g%s%s", k > 0 ? " and " : "", aim->id, aim->min, *shown_unit(aim) ? " " : "",
                           shown_unit(aim));
    }
}

/* What the first aim comes to in the nearest blend: with one aim it is an end of what can be reached. */
static void verdict(report *r, const blend_case *c, const bc_aim *aim, bool inside)
{
    char aims[300];
    char text[700];
    const bc_gas gas = bc_mixer_gas(&c->mixer, aim->share[0]);
    double value = 0.0;

    describe_aims(c, aims, sizeof aims);
    if (aim->reached && aim->count == 1)
        (void)snprintf(text, sizeof text, "%s is reached", aims);
    else if (aim->reached)
        (void)snprintf(text, sizeof text, "%s is reached by %zu blends", aims, aim->count);
    else if (c->aims->limit_count == 1 && bc_limit_value(c->aims, 0, &gas, &value, NULL) == BC_OK)
        (void)snprintf(text, sizeof text, "%s is out of reach; the nearest that these gases give is %.6g %s", aims, value, shown_unit(&c->aims->limits[0]));
    else
        (void)snprintf(text, sizeof text, "%s cannot be reached together; the nearest blend is shown", aims);
    const size_t used = strlen(text);

    if (c->within && used < sizeof text)
        (void)snprintf(text + used, sizeof text - used, inside ? "; all limits of %.100s are kept" : "; not all limits of %.100s are kept", c->within->name);
    report_set_verdict(r, text);
}

/* Adds the blends as gases, as many as there is room for beside the parts. */
static bc_status add_blends(blend_case *c, const bc_aim *aim, size_t *shown, bc_error *err)
{
    *shown = aim->count < c->count + 1 ? aim->count : c->count + 1;
    for (size_t n = 0; n < *shown; n++) {
        char name[40];

        (void)snprintf(name, sizeof name, aim->count == 1 ? "Blend" : "Blend %zu", n + 1);
        const bc_status status = blend_add(c, aim->share[n], name, err);

        if (status != BC_OK)
            return status;
    }
    return BC_OK;
}

static bc_status fill(report *r, blend_case *c, const bc_aim *aim, bool *ok, bc_error *err)
{
    size_t shown = 0;
    bool inside = true;
    bc_status status = add_blends(c, aim, &shown, err);

    if (status == BC_OK)
        status = blend_sheet(r, c, aim->share[0], err);
    if (status != BC_OK)
        return status;
    if (blend_has_terms(c) && aim->count == 1)
        blend_cost(r, c, aim->share[0]);
    report_solutions(r, c, aim);
    for (size_t n = 0; n < shown; n++)
        blend_judge(r, c, c->count + n, &inside);
    verdict(r, c, aim, inside);
    *ok = aim->reached && inside;
    return BC_OK;
}

int blend_aim(blend_case *c, report *r)
{
    bc_aim_problem problem = {.mixer = &c->mixer, .aims = c->aims};
    bc_aim aim;
    bool ok = false;
    bc_error err;

    blend_free_bounds(c, problem.low, problem.high);
    bc_status status = bc_aim_find(&problem, &aim, &err);

    if (status == BC_OK)
        status = fill(r, c, &aim, &ok, &err);
    if (status == BC_OK)
        return blend_answer(r, c, aim.share[0], ok ? 0 : 1);
    report_close(r);
    blend_close(c);
    return complain(&err);
}
