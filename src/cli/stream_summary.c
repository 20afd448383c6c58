/* SPDX-License-Identifier: MIT */
/* stream_summary.c - cover, remarks and distribution of a tally. */
#include "cli/stream_summary.h"

#include "base/compiler.h"
#include "bluecone/log.h"

#include <math.h>
#include <stdio.h>
#include <string.h>

#define HOUR_S 3600.0

size_t summary_table(report *r, const char *id, const char *title, const summary_column columns[], size_t count)
{
    const size_t table = report_add_table(r, id, title);

    for (size_t i = 0; i < count; i++)
        report_add_column(r, table, columns[i].id, columns[i].heading, columns[i].unit);
    return table;
}

void summary_time(report *r, size_t table, bool there, double time_s)
{
    char text[BC_LOG_TIME_TEXT];

    bc_log_time_text(time_s, text);
    report_add_text(r, table, there ? text : "-");
}

const char *summary_unit(const char *unit)
{
    return strcmp(unit, "1") == 0 ? "" : unit;
}

double summary_held(const tally_cover *cover, double held)
{
    return cover->timed ? held / HOUR_S : held;
}

const char *summary_held_unit(const tally_cover *cover)
{
    return cover->timed ? "h" : "rows";
}

static void add_line(report *r, size_t table, const char *what, double value, int decimals, const char *unit)
{
    report_add_text(r, table, what);
    report_add_number(r, table, value, decimals);
    report_add_text(r, table, unit);
}

/* "Log under NAME, FROM to UNTIL UTC" */
static void name_log(const tally_plan *plan, const tally_cover *cover, char *text, size_t size)
{
    char first[BC_LOG_TIME_TEXT];
    char last[BC_LOG_TIME_TEXT];
    const int used = snprintf(text, size, "Log%s%.120s", plan->contract[0] ? " under " : "", plan->contract);

    bc_log_time_text(cover->first_s, first);
    bc_log_time_text(cover->last_s, last);
    if (cover->has_time && used > 0)
        (void)snprintf(text + used, size - (size_t)used, ", %s to %s%s", first, last, plan->zoned ? " UTC" : "");
}

static void add_cover(report *r, const tally_plan *plan, const tally_cover *cover)
{
    static const summary_column COLUMNS[] = {{"what", "what", ""}, {"value", "value", ""}, {"unit", "unit", ""}};
    char title[BC_NAME_MAX + 120];

    name_log(plan, cover, title, sizeof title);
    const size_t table = summary_table(r, "log", title, COLUMNS, BC_COUNT(COLUMNS));

    add_line(r, table, "rows read", (double)(cover->rows + cover->refused), 0, "");
    add_line(r, table, "rows used", (double)cover->rows, 0, "");
    add_line(r, table, "rows without use", (double)cover->refused, 0, "");
    if (cover->untimed > 0)
        add_line(r, table, "rows without a time", (double)cover->untimed, 0, "");
    if (cover->timed) {
        add_line(r, table, "time covered", cover->held / HOUR_S, 2, "h");
        add_line(r, table, "usual step", plan->step_s / HOUR_S, 4, "h");
        add_line(r, table, "gaps", (double)cover->gaps, 0, "");
        add_line(r, table, "time in gaps, not counted", cover->gap_s / HOUR_S, 2, "h");
    }
    if (cover->repeats > 0)
        add_line(r, table, "rows at the time of the one before", (double)cover->repeats, 0, "");
    if (cover->backs > 0)
        add_line(r, table, "rows at a time before the one before", (double)cover->backs, 0, "");
    if (cover->flows > 0)
        add_line(r, table, "rows with a flow", (double)cover->flows, 0, "");
    if (cover->flows > 0 && cover->timed)
        add_line(r, table, "gross heat", cover->energy_j / SUMMARY_J_PER_GJ, 1, "GJ");
}

static void add_flags(report *r, const tally *t, const tally_cover *cover)
{
    static const summary_column COLUMNS[] = {{"remark", "remark", ""}, {"rows", "rows", ""}, {"share", "share", "%"}};
    const tally_plan *plan = tally_plan_of(t);
    const double rows = fmax(1.0, (double)(cover->rows + cover->refused));
    size_t table = 0;
    bool opened = false;

    for (size_t i = 0; i < plan->flag_count; i++) {
        const double flagged = (double)tally_flagged(t, i);

        if (flagged <= 0.0)
            continue;
        if (!opened)
            table = summary_table(r, "remarks", "Remarks on rows", COLUMNS, BC_COUNT(COLUMNS));
        opened = true;
        report_add_text(r, table, plan->flags[i].label);
        report_add_number(r, table, flagged, 0);
        report_add_number(r, table, 100.0 * flagged / rows, 3);
    }
}

void summary_number(report *r, size_t table, bool there, double value)
{
    if (there)
        report_add_number(r, table, value, -1);
    else
        report_add_text(r, table, "-");
}

static void add_percentile(report *r, size_t table, const tally *t, size_t figure, double share)
{
    double value = 0.0;
    const bool there = tally_percentile(t, figure, share, &value);

    summary_number(r, table, there, value);
}

static void add_distribution_row(report *r, size_t table, const tally *t, size_t figure, bool heat)
{
    static const double SHARES[] = {0.01, 0.05, 0.50, 0.95, 0.99};
    const tally_figure_name *name = &tally_plan_of(t)->figures[figure];
    tally_spread s;

    tally_spreads(t, figure, &s);
    report_add_text(r, table, name->id);
    report_add_text(r, table, summary_unit(name->unit));
    report_add_number(r, table, (double)s.rows, 0);
    summary_number(r, table, s.has_mean, s.mean);
    summary_number(r, table, s.has_mean, s.sd);
    for (size_t i = 0; i < BC_COUNT(SHARES); i++)
        add_percentile(r, table, t, figure, SHARES[i]);
    if (heat)
        summary_number(r, table, s.has_energy_mean, s.energy_mean);
}

/* The percentiles' accuracy belongs to what is told of them. */
static void name_distribution(const tally *t, const tally_cover *cover, char *text, size_t size)
{
    double worst = 0.0;

    for (size_t i = 0; i < tally_plan_of(t)->figure_count; i++)
        worst = fmax(worst, tally_accuracy(t, i));
    (void)snprintf(text, size, "Distribution, %s; percentiles are within %.2g %% of their value",
                   cover->timed ? "weighted by time" : "each row alike", 100.0 * worst);
}

static void add_distribution(report *r, const tally *t, const tally_cover *cover)
{
    static const summary_column COLUMNS[] = {{"figure", "figure", ""}, {"unit", "unit", ""}, {"rows", "rows", ""}, {"mean", "mean", ""},
                                             {"sd", "st. dev.", ""}, {"p1", "1 %", ""}, {"p5", "5 %", ""}, {"median", "median", ""},
                                             {"p95", "95 %", ""}, {"p99", "99 %", ""}, {"energy-mean", "mean by heat", ""}};
    const bool heat = cover->flows > 0;
    char title[160];

    name_distribution(t, cover, title, sizeof title);
    const size_t table = summary_table(r, "distribution", title, COLUMNS, BC_COUNT(COLUMNS) - (heat ? 0 : 1));

    for (size_t i = 0; i < tally_plan_of(t)->figure_count; i++)
        add_distribution_row(r, table, t, i, heat);
}

static void add_extremes(report *r, const tally *t)
{
    static const summary_column COLUMNS[] = {{"figure", "figure", ""}, {"unit", "unit", ""}, {"min", "min", ""}, {"min-at", "at", ""},
                                             {"max", "max", ""}, {"max-at", "at", ""}};
    const tally_plan *plan = tally_plan_of(t);
    const size_t table = summary_table(r, "extremes", "Least and most", COLUMNS, BC_COUNT(COLUMNS));

    for (size_t i = 0; i < plan->figure_count; i++) {
        tally_spread s;

        tally_spreads(t, i, &s);
        report_add_text(r, table, plan->figures[i].id);
        report_add_text(r, table, summary_unit(plan->figures[i].unit));
        summary_number(r, table, s.rows > 0, s.min);
        summary_time(r, table, s.min_timed, s.min_s);
        summary_number(r, table, s.rows > 0, s.max);
        summary_time(r, table, s.max_timed, s.max_s);
    }
}

void stream_summary_report(report *r, const tally *t)
{
    const tally_plan *plan = tally_plan_of(t);
    tally_cover cover;

    tally_covers(t, &cover);
    add_cover(r, plan, &cover);
    add_flags(r, t, &cover);
    if (cover.rows == 0)
        return;
    summary_limits(r, t);
    add_distribution(r, t, &cover);
    add_extremes(r, t);
    summary_periods(r, t);
    summary_charts(r, t);
}
