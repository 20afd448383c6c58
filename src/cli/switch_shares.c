/* SPDX-License-Identifier: MIT */
/* switch_shares.c - how much of the new gas may be blended into the old one. */
#include "cli/switch_report.h"

#include <stdio.h>
#include <string.h>

#define PERCENT 100.0

static void add_crossing(report *r, size_t table, const bc_crossing *c)
{
    if (c->exists)
        report_add_number(r, table, PERCENT * c->share, 3);
    else
        report_add_text(r, table, "-");
}

static void add_columns(report *r, size_t table)
{
    static const char *const COLUMNS[][3] = {{"criterion", "criterion", ""},       {"acceptable", "acceptable", ""}, {"caution", "caution", "%"},
                                             {"broken", "broken", "%"},       {"blind", "not covered", "%"}, {"counts", "counts", ""}};

    for (size_t i = 0; i < BC_COUNT(COLUMNS); i++)
        report_add_column(r, table, COLUMNS[i][0], COLUMNS[i][1], COLUMNS[i][2]);
}

static void add_table(report *r, const bc_blend_in *b)
{
    const size_t table = report_add_table(r, "blend-in", "Share of the new gas in the old one from which a verdict holds, mol %");

    add_columns(r, table);
    for (size_t i = 0; i < b->count; i++) {
        const bc_blend_criterion *k = &b->criteria[i];
        char limits[48];

        switch_limit_text(&k->acceptable, limits, sizeof limits);
        report_add_text(r, table, k->id);
        report_add_text(r, table, limits);
        add_crossing(r, table, &k->caution);
        add_crossing(r, table, &k->broken);
        add_crossing(r, table, &k->blind);
        report_add_text(r, table, k->counts ? "yes" : "no");
    }
}

static void add_bounds(report *r, const switch_case *c, const bc_blend_in *b)
{
    const slot where = {r, report_add_section(r, "shares", "Share of the new gas, mol %"), NEW_GAS};
    const plain_figure figures[] = {
        {"share-as-found", "The burner takes it as it is, up to", PERCENT * (b->adjusts.exists ? b->adjusts.share : 1.0), "%", 5, "bisection"},
        {"share-adjusted", "The burner takes it adjusted, up to", PERCENT * (b->refuses.exists ? b->refuses.share : 1.0), "%", 5, "bisection"},
    };

    add_figures(&where, c->a, figures, BC_COUNT(figures));
}

/* What a panel has to show: a criterion that counts and has figures. */
static bool is_drawn(const bc_blend_criterion *k)
{
    size_t figures = 0;

    for (size_t i = 0; i <= BC_BLEND_IN_STEPS; i++)
        figures += k->has[i];
    return k->counts && figures > 1;
}

static void mark_limit(report *r, size_t chart, bool has, double value, const char *word)
{
    char label[32];

    (void)snprintf(label, sizeof label, "%s %.6g", word, value);
    if (has)
        report_add_mark(r, chart, REPORT_MARK_Y, 0.0, value, label);
}

static void mark_crossing(report *r, size_t chart, const bc_crossing *c, const char *word)
{
    char label[48];

    (void)snprintf(label, sizeof label, "%s from %.4g %%", word, PERCENT * c->share);
    if (c->exists)
        report_add_mark(r, chart, REPORT_MARK_X, PERCENT * c->share, 0.0, label);
}

/* A curve with a gap is two series of one name. */
static void add_curve(report *r, size_t chart, const bc_blend_criterion *k)
{
    size_t series = 0;

    for (size_t i = 0; i <= BC_BLEND_IN_STEPS; i++) {
        if (!k->has[i])
            continue;
        if (i == 0 || !k->has[i - 1])
            series = report_add_series(r, chart, REPORT_LINE, k->id);
        report_add_point(r, chart, series, PERCENT * (double)i / BC_BLEND_IN_STEPS, k->value[i]);
    }
}

/* One criterion along the share, its limits, and where it breaks or the method ends. */
static void add_panel(report *r, const bc_blend_criterion *k)
{
    const size_t chart = report_add_chart(r, k->id, k->label);

    report_set_axis(r, chart, REPORT_X, "share of the new gas", "mol %");
    report_set_axis(r, chart, REPORT_Y, k->id, strcmp(k->unit, "1") == 0 ? "" : k->unit);
    add_curve(r, chart, k);
    mark_limit(r, chart, k->acceptable.has_min, k->acceptable.min, "min");
    mark_limit(r, chart, k->acceptable.has_max, k->acceptable.max, "max");
    mark_crossing(r, chart, &k->broken, "broken");
    mark_crossing(r, chart, &k->blind, "not covered");
}

#define PANELS_MAX 6 /* more do not fit a page */

/* Criteria with an event first; a page holds only so many. */
static void add_panels(report *r, const bc_blend_in *b)
{
    size_t drawn = 0;

    for (int eventful = 1; eventful >= 0; eventful--)
        for (size_t i = 0; i < b->count && drawn < PANELS_MAX; i++) {
            const bc_blend_criterion *k = &b->criteria[i];
            const bool has_event = k->broken.exists || k->caution.exists;

            if (is_drawn(k) && has_event == (eventful == 1)) {
                add_panel(r, k);
                drawn++;
            }
        }
}

bc_status switch_shares(report *r, const switch_case *c, bc_error *err)
{
    bc_blend_in b;
    const bc_status status = bc_blend_in_of(&c->s->each[OLD_GAS].subject, &c->s->each[NEW_GAS].subject, c->has_burner ? &c->burner : NULL,
                                            switch_new_k(c), &b, err);

    if (status != BC_OK)
        return status;
    add_bounds(r, c, &b);
    add_table(r, &b);
    add_panels(r, &b);
    return BC_OK;
}
