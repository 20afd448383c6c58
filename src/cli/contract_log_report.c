/* SPDX-License-Identifier: MIT */
/* contract_log_report.c - what a log comes to: cover, rows without use, excursions, distribution, verdict. */
#include "cli/contract_log.h"

#include "base/error_internal.h"

#include <stdio.h>
#include <string.h>

#define HOUR_S 3600.0
#define J_PER_GJ 1e9

typedef struct {
    const char *id, *heading, *unit;
} column;

static size_t open_table(report *r, const char *id, const char *title, const column columns[], size_t count)
{
    const size_t table = report_add_table(r, id, title);

    for (size_t i = 0; i < count; i++)
        report_add_column(r, table, columns[i].id, columns[i].heading, columns[i].unit);
    return table;
}

static void add_time(report *r, size_t table, double time_s)
{
    char text[BC_LOG_TIME_TEXT];

    bc_log_time_text(time_s, text);
    report_add_text(r, table, text);
}

static const char *unit_of(const bc_limit *limit)
{
    return strcmp(limit->unit, "1") == 0 ? "" : limit->unit;
}

static void add_line(report *r, size_t table, const char *what, double value, int decimals, const char *unit)
{
    report_add_text(r, table, what);
    report_add_number(r, table, value, decimals);
    report_add_text(r, table, unit);
}

static void add_cover(const log_case *l, report *r, const bc_log_cover *cover)
{
    static const column COLUMNS[] = {{"what", "what", ""}, {"value", "value", ""}, {"unit", "unit", ""}};
    char title[BC_NAME_MAX + 120];
    char first[BC_LOG_TIME_TEXT];
    char last[BC_LOG_TIME_TEXT];

    bc_log_time_text(cover->first_s, first);
    bc_log_time_text(cover->last_s, last);
    (void)snprintf(title, sizeof title, "Log under %.120s, %s to %s%s", l->c->contract->name, first, last, l->zoned ? " UTC" : "");
    const size_t table = open_table(r, "log", title, COLUMNS, BC_COUNT(COLUMNS));

    add_line(r, table, "rows read", (double)l->rows, 0, "");
    add_line(r, table, "rows used", (double)cover->rows, 0, "");
    add_line(r, table, "rows without use", (double)l->refused, 0, "");
    add_line(r, table, "time covered", cover->held_s / HOUR_S, 2, "h");
    add_line(r, table, "usual step", cover->step_s / HOUR_S, 4, "h");
    add_line(r, table, "gaps", (double)cover->gaps, 0, "");
    add_line(r, table, "time in gaps, not counted", cover->gap_s / HOUR_S, 2, "h");
    if (l->header.has_flow)
        add_line(r, table, "gross heat", cover->energy_j / J_PER_GJ, 1, "GJ");
}

static void add_gaps(const log_case *l, report *r, const bc_log_cover *cover)
{
    static const column COLUMNS[] = {{"from", "from", ""}, {"to", "to", ""}, {"hours", "hours", "h"}};

    if (cover->gaps == 0)
        return;
    const size_t table = open_table(r, "gaps", "Gaps: more than three usual steps without an analysis", COLUMNS, BC_COUNT(COLUMNS));
    size_t told = 0;

    for (size_t i = 0; i + 1 < cover->rows && told < LOG_TOLD_MAX; i++) {
        double from = 0.0;
        double held = 0.0;
        double to = 0.0;
        double next = 0.0;

        if (!bc_log_held(l->log, i, &from, &held))
            continue;
        (void)bc_log_held(l->log, i + 1, &to, &next);
        add_time(r, table, from + held);
        add_time(r, table, to);
        report_add_number(r, table, (to - from - held) / HOUR_S, 2);
        told++;
    }
}

static void add_refused(const log_case *l, report *r)
{
    static const column COLUMNS[] = {{"line", "line", ""}, {"reason", "reason", ""}};

    if (l->refused == 0)
        return;
    const size_t table = open_table(r, "refused", "Rows that could not be used", COLUMNS, BC_COUNT(COLUMNS));

    for (size_t i = 0; i < l->refused && i < LOG_TOLD_MAX; i++) {
        report_add_number(r, table, l->told[i].line, 0);
        report_add_text(r, table, l->told[i].reason);
    }
    if (l->refused > LOG_TOLD_MAX) {
        char text[80];

        (void)snprintf(text, sizeof text, "and %zu rows more", l->refused - LOG_TOLD_MAX);
        report_add_text(r, table, "");
        report_add_text(r, table, text);
    }
}

static void add_bound(report *r, size_t table, bool there, double bound)
{
    if (there)
        report_add_number(r, table, bound, -1);
    else
        report_add_text(r, table, "-");
}

/* A limit, the unit of its figures and the state they are at, which may be another one than that of the report. */
static void add_limit(const bc_contract *c, report *r, size_t table, const bc_limit *limit)
{
    char state[64];

    contract_state_text(c, limit, state, sizeof state);
    report_add_text(r, table, limit->id);
    report_add_text(r, table, unit_of(limit));
    report_add_text(r, table, state);
}

static void add_outside(const log_case *l, report *r)
{
    static const column COLUMNS[] = {{"limit", "limit", ""}, {"unit", "unit", ""}, {"state", "at", ""}, {"min", "min", ""}, {"max", "max", ""},
                                     {"rows", "rows", ""}, {"hours", "hours", "h"}, {"share", "share", "%"}, {"energy", "heat", "GJ"}};
    const bc_contract *c = l->c->contract;
    const size_t table = open_table(r, "outside", "Outside each limit", COLUMNS, BC_COUNT(COLUMNS) - (l->header.has_flow ? 0 : 1));

    for (size_t i = 0; i < c->limit_count; i++) {
        const bc_limit *limit = &c->limits[i];
        bc_log_excursions e;

        bc_log_outside(l->log, i, &e);
        add_limit(c, r, table, limit);
        add_bound(r, table, limit->has_min, limit->min);
        add_bound(r, table, limit->has_max, limit->max);
        report_add_number(r, table, (double)e.broken, 0);
        report_add_number(r, table, e.broken_s / HOUR_S, 2);
        report_add_number(r, table, e.judged_s > 0.0 ? 100.0 * e.broken_s / e.judged_s : 0.0, 2);
        if (l->header.has_flow)
            report_add_number(r, table, e.broken_j / J_PER_GJ, 1);
    }
}

static void add_excursion(report *r, size_t table, const bc_limit *limit, const bc_log_excursions *e)
{
    report_add_text(r, table, limit->id);
    report_add_number(r, table, (double)e->runs, 0);
    add_time(r, table, e->first_s);
    add_time(r, table, e->last_s);
    add_time(r, table, e->worst_s);
    report_add_number(r, table, e->worst, -1);
    report_add_text(r, table, unit_of(limit));
    report_add_number(r, table, e->longest_s / HOUR_S, 2);
    add_time(r, table, e->longest_from_s);
}

static void add_excursions(const log_case *l, report *r)
{
    static const column COLUMNS[] = {{"limit", "limit", ""}, {"runs", "runs", ""}, {"first", "first row", ""}, {"last", "last row", ""},
                                     {"worst-at", "worst at", ""}, {"worst", "worst", ""}, {"unit", "unit", ""}, {"longest", "longest", "h"},
                                     {"longest-from", "longest from", ""}};
    const bc_contract *c = l->c->contract;
    double held = 0.0;

    if (bc_log_any_outside(l->log, &held) == 0)
        return;
    const size_t table = open_table(r, "excursions", "Excursions", COLUMNS, BC_COUNT(COLUMNS));

    for (size_t i = 0; i < c->limit_count; i++) {
        bc_log_excursions e;

        bc_log_outside(l->log, i, &e);
        if (e.broken > 0)
            add_excursion(r, table, &c->limits[i], &e);
    }
}

static void add_distribution_row(report *r, size_t table, const bc_log_distribution *d)
{
    const double values[] = {d->min, d->p5, d->median, d->mean, d->p95, d->max};

    for (size_t i = 0; i < BC_COUNT(values); i++)
        report_add_number(r, table, values[i], -1);
    if (d->has_energy_mean)
        report_add_number(r, table, d->energy_mean, -1);
}

static bc_status add_distributions(const log_case *l, report *r, const bc_log_cover *cover, bc_error *err)
{
    static const column COLUMNS[] = {{"limit", "limit", ""}, {"unit", "unit", ""}, {"state", "at", ""}, {"min", "min", ""}, {"p5", "5 %", ""},
                                     {"median", "median", ""}, {"mean", "mean", ""}, {"p95", "95 %", ""}, {"max", "max", ""},
                                     {"energy-mean", "mean by heat", ""}};
    const bc_contract *c = l->c->contract;
    const size_t table = open_table(r, "distribution", "Distribution, weighted by time", COLUMNS, BC_COUNT(COLUMNS) - (cover->energy_j > 0.0 ? 0 : 1));

    for (size_t i = 0; i < c->limit_count; i++) {
        bc_log_distribution d;
        const bc_status status = bc_log_distribute(l->log, i, &d, err);

        if (status == BC_ERR_RANGE)
            continue;
        if (status != BC_OK)
            return status;
        if (cover->energy_j > 0.0 && !d.has_energy_mean) { /* figures only where no gas flowed */
            d.has_energy_mean = true;
            d.energy_mean = d.mean;
        }
        add_limit(c, r, table, &c->limits[i]);
        add_distribution_row(r, table, &d);
    }
    return BC_OK;
}

bc_status log_report(const log_case *l, report *r, bool *good, bc_error *err)
{
    bc_log_cover cover;

    bc_log_covers(l->log, &cover);
    log_warn(l, r);
    add_cover(l, r, &cover);
    add_refused(l, r);
    add_gaps(l, r, &cover);
    add_outside(l, r);
    add_excursions(l, r);
    const bc_status status = add_distributions(l, r, &cover, err);

    *good = log_judge(l, r, &cover);
    return status;
}
