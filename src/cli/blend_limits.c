/* SPDX-License-Identifier: MIT */
/* blend_limits.c - blends against the limits of a contract. */
#include "cli/blend_report.h"
#include "cli/contract_report.h"

#include <math.h>
#include <stdio.h>
#include <string.h>

static void add_limit(report *r, const blend_case *c, size_t index, size_t gas, bool *inside)
{
    const bc_limit *limit = &c->within->limits[index];
    const subject *each = &c->parts.each[gas];
    char id[BC_LIMIT_ID_MAX];
    char unit[BC_LIMIT_ID_MAX];
    char state[64];
    bc_limit_figure f = {.value = 0.0};
    bc_error err = {.status = BC_OK};
    const bc_spread *spread = each->loaded.scattered ? &each->loaded.composition.spread : NULL;
    const bool judged = bc_limit_judge(c->within, index, &each->loaded.gas, spread, &f, &err) == BC_OK;
    report_limit row = {.id = id, .unit = unit, .state = state, .gas = gas, .has_value = judged, .has_min = limit->has_min, .has_max = limit->has_max,
                        .value = f.value, .min = limit->min, .max = limit->max, .margin = f.margin};
    char verdict[BC_MESSAGE_MAX + 16];

    (void)snprintf(id, sizeof id, "%s", limit->id);
    (void)snprintf(unit, sizeof unit, "%s", limit->unit);
    contract_state_text(c->within, limit, state, sizeof state);
    if (judged)
        (void)snprintf(verdict, sizeof verdict, "%s", f.inside ? "inside" : "outside");
    else
        (void)snprintf(verdict, sizeof verdict, "not judged: %s", err.message);
    row.verdict = verdict;
    report_add_limit(r, &row);
    *inside = *inside && judged && f.inside;
}

void blend_judge(report *r, const blend_case *c, size_t gas, bool *inside)
{
    char title[BC_NAME_MAX + 16];

    if (!c->within)
        return;
    (void)snprintf(title, sizeof title, "Limits: %s", c->within->name);
    report_set_limits_title(r, title);
    for (size_t i = 0; i < c->within->limit_count; i++)
        add_limit(r, c, i, gas, inside);
}

/* How near a judged row is to being broken: its margin in units of the limit's scale. */
static double closeness(const blend_case *c, const report_limit *row, size_t index)
{
    return row->has_value ? row->margin / bc_limit_scale(&c->within->limits[index]) : -HUGE_VAL;
}

static void describe_row(const report_limit *row, char *text, size_t size)
{
    const bool low = row->has_min && row->value - row->min <= row->margin;
    const char *unit = strcmp(row->unit, "1") == 0 ? "" : row->unit;
    const char *gap = *unit == '\0' ? "" : " ";

    if (!row->has_value)
        (void)snprintf(text, size, "%s cannot be judged", row->id);
    else if (row->margin < 0.0)
        (void)snprintf(text, size, "%s is %.4g%s%s %s its %s of %.6g", row->id, -row->margin, gap, unit, low ? "below" : "above",
                       low ? "minimum" : "maximum", low ? row->min : row->max);
    else
        (void)snprintf(text, size, "%s, %.4g%s%s from its %s", row->id, row->margin, gap, unit, low ? "minimum" : "maximum");
}

/* The row with the least closeness that was not taken yet; the rows of one gas are the last ones. */
static size_t worst_row(const report *r, const blend_case *c, size_t gas, const bool taken[])
{
    const size_t first = r->limit_count - c->within->limit_count;
    size_t worst = BC_LIMIT_MAX;

    for (size_t i = 0; i < c->within->limit_count; i++) {
        if (taken[i] || r->limits[first + i].gas != gas)
            continue;
        if (worst == BC_LIMIT_MAX || closeness(c, &r->limits[first + i], i) < closeness(c, &r->limits[first + worst], worst))
            worst = i;
    }
    return worst;
}

void blend_verdict(report *r, const blend_case *c, size_t gas, bool inside)
{
    bool taken[BC_LIMIT_MAX] = {false};
    char text[1200];
    char row[BC_MESSAGE_MAX];

    if (!c->within || r->limit_count < c->within->limit_count)
        return;
    const report_limit *rows = r->limits + (r->limit_count - c->within->limit_count);

    if (inside)
        (void)snprintf(text, sizeof text, "within all limits of %s; the nearest is ", c->within->name);
    else
        (void)snprintf(text, sizeof text, "not within the limits of %s: ", c->within->name);
    for (size_t told = 0;; told++) {
        const size_t worst = worst_row(r, c, gas, taken);
        const size_t used = strlen(text);

        if (worst == BC_LIMIT_MAX || (inside && told == 1) || (!inside && strcmp(rows[worst].verdict, "inside") == 0))
            break;
        taken[worst] = true;
        describe_row(&rows[worst], row, sizeof row);
        (void)snprintf(text + used, sizeof text - used, "%s%s", told > 0 ? "; " : "", row);
    }
    report_set_verdict(r, text);
}
