/* SPDX-License-Identifier: MIT */
/* blend_crossing.c - the shares at which a sweep leaves and enters the limits of a contract. */
#include "cli/blend_sweep.h"
#include "cli/contract_report.h"

#include <stdio.h>
#include <string.h>

static void add_rows(report *r, size_t table, const sweep_table *t, const blend_case *c, size_t index, bool upper)
{
    const bc_limit *limit = &c->within->limits[index];
    const double bound = upper ? limit->max : limit->min;
    double place[BC_CROSSING_MAX];
    char state[64];
    const size_t count = bc_line_crossings(&t->line, c->within, index, bound, place, BC_CROSSING_MAX);

    contract_state_text(c->within, limit, state, sizeof state);
    for (size_t i = 0; i < count; i++) {
        report_add_text(r, table, limit->id);
        report_add_text(r, table, state);
        report_add_text(r, table, upper ? "max" : "min");
        report_add_number(r, table, bound, -1);
        report_add_text(r, table, strcmp(limit->unit, "1") == 0 ? "" : limit->unit);
        report_add_number(r, table, 100.0 * sweep_share_at(t, place[i]), 6);
    }
}

static void report_crossings(report *r, const sweep_table *t, const blend_case *c)
{
    static const char *const COLUMNS[][3] = {{"limit", "limit", ""}, {"state", "at", ""},  {"bound", "bound", ""},
                                             {"value", "value", ""}, {"unit", "unit", ""}, {"share", "share", "%"}};
    char title[BC_NAME_MAX + 32];

    (void)snprintf(title, sizeof title, "Crossings, %s", c->within->name);
    const size_t table = report_add_table(r, "crossings", title);

    for (size_t i = 0; i < BC_COUNT(COLUMNS); i++)
        report_add_column(r, table, COLUMNS[i][0], COLUMNS[i][1], COLUMNS[i][2]);
    for (size_t i = 0; i < c->within->limit_count; i++) {
        if (c->within->limits[i].has_min)
            add_rows(r, table, t, c, i, false);
        if (c->within->limits[i].has_max)
            add_rows(r, table, t, c, i, true);
    }
}

static void verdict(report *r, const sweep_table *t, const blend_case *c, const bc_window window[], size_t count)
{
    char text[1000];
    size_t used = 0;

    if (count == 0) {
        (void)snprintf(text, sizeof text, "no share of %.100s from %.6g to %.6g %% by %s keeps all limits of %s", blend_part_name(c, c->swept),
                       100.0 * t->low, 100.0 * t->high, bc_blend_basis_text(c->by), c->within->name);
        report_set_verdict(r, text);
        return;
    }
    (void)snprintf(text, sizeof text, "all limits of %s are kept with ", c->within->name);
    for (size_t i = 0; i < count; i++) {
        used = strlen(text);
        if (used + 80 < sizeof text)
            (void)snprintf(text + used, sizeof text - used, "%s%.6g to %.6g %%", i > 0 ? ", and " : "", 100.0 * sweep_share_at(t, window[i].low),
                           100.0 * sweep_share_at(t, window[i].high));
    }
    used = strlen(text);
    (void)snprintf(text + used, sizeof text - used, " of %.100s, by %s", blend_part_name(c, c->swept), bc_blend_basis_text(c->by));
    report_set_verdict(r, text);
}

bool sweep_limits(report *r, const sweep_table *t, const blend_case *c)
{
    bc_window window[BC_WINDOW_MAX];

    if (!c->within)
        return true;
    report_crossings(r, t, c);
    const size_t count = bc_line_windows(&t->line, c->within, window);

    verdict(r, t, c, window, count);
    return count > 0;
}
