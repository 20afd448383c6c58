/* SPDX-License-Identifier: MIT */
/* stream_summary_periods.c - the hours, days or months of a tally. */
#include "cli/stream_summary.h"

#include "base/compiler.h"
#include "bluecone/log.h"

#include <stdio.h>

/* "2026-03-01 13:00", "2026-03-01", "2026-03" */
static void add_period(report *r, size_t table, const tally *t, const tally_span *span)
{
    static const size_t LENGTHS[] = {[TALLY_WHOLE] = 0, [TALLY_HOUR] = 16, [TALLY_DAY] = 10, [TALLY_MONTH] = 7};
    char text[BC_LOG_TIME_TEXT];

    bc_log_time_text(span->from_s, text);
    text[LENGTHS[tally_plan_of(t)->by]] = '\0';
    report_add_text(r, table, text);
}

static void add_periods(report *r, const tally *t, const tally_cover *cover, const char *word)
{
    const summary_column columns[] = {{word, word, ""}, {"rows", "rows", ""}, {"held", cover->timed ? "covered" : "rows", summary_held_unit(cover)},
                                      {"outside", "outside limits", summary_held_unit(cover)}, {"energy", "heat", "GJ"}};
    const bool limits = tally_plan_of(t)->limit_count > 0;
    const bool heat = cover->flows > 0 && cover->timed;
    char id[20];
    char title[40];

    (void)snprintf(id, sizeof id, "by-%s", word);
    (void)snprintf(title, sizeof title, "By %s", word);
    const size_t table = summary_table(r, id, title, columns, 2);

    for (size_t i = 2; i < BC_COUNT(columns); i++)
        if ((i != 2 || cover->timed) && (i != 3 || limits) && (i != 4 || heat))
            report_add_column(r, table, columns[i].id, columns[i].heading, columns[i].unit);
    for (size_t i = 0; i < tally_period_count(t); i++) {
        tally_span span;

        tally_period_at(t, i, &span);
        add_period(r, table, t, &span);
        report_add_number(r, table, (double)span.rows, 0);
        if (cover->timed)
            report_add_number(r, table, summary_held(cover, span.held), 2);
        if (limits)
            report_add_number(r, table, summary_held(cover, span.outside_held), cover->timed ? 2 : 0);
        if (heat)
            report_add_number(r, table, span.energy_j / SUMMARY_J_PER_GJ, 1);
    }
}

static void add_figure_periods(report *r, const tally *t, size_t figure, bool heat, const char *word)
{
    const summary_column columns[] = {{word, word, ""}, {"mean", "mean", ""}, {"sd", "st. dev.", ""}, {"min", "min", ""}, {"max", "max", ""},
                                      {"energy-mean", "mean by heat", ""}};
    const tally_figure_name *name = &tally_plan_of(t)->figures[figure];
    const char *unit = summary_unit(name->unit);
    char id[BC_LIMIT_ID_MAX + 20];
    char title[2 * BC_LIMIT_ID_MAX + 20];

    (void)snprintf(id, sizeof id, "by-%s-%s", word, name->id);
    (void)snprintf(title, sizeof title, "%s by %s%s%s", name->id, word, unit[0] ? ", " : "", unit);
    const size_t table = summary_table(r, id, title, columns, BC_COUNT(columns) - (heat ? 0 : 1));

    for (size_t i = 0; i < tally_period_count(t); i++) {
        tally_span span;
        tally_spread s;

        tally_period_at(t, i, &span);
        tally_period_spread(t, i, figure, &s);
        add_period(r, table, t, &span);
        summary_number(r, table, s.has_mean, s.mean);
        summary_number(r, table, s.has_mean, s.sd);
        summary_number(r, table, s.rows > 0, s.min);
        summary_number(r, table, s.rows > 0, s.max);
        if (heat)
            summary_number(r, table, s.has_energy_mean, s.energy_mean);
    }
}

void summary_periods(report *r, const tally *t)
{
    static const char *const WORDS[] = {"", "hour", "day", "month"};
    const tally_plan *plan = tally_plan_of(t);
    tally_cover cover;

    if (plan->by == TALLY_WHOLE || tally_period_count(t) == 0)
        return;
    tally_covers(t, &cover);
    add_periods(r, t, &cover, WORDS[plan->by]);
    for (size_t i = 0; i < plan->figure_count; i++)
        add_figure_periods(r, t, i, cover.flows > 0, WORDS[plan->by]);
}
