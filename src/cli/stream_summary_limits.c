/* SPDX-License-Identifier: MIT */
/* stream_summary_limits.c - outside of each limit, excursions, verdict of a tally; the words of contract --log. */
#include "cli/stream_summary.h"

#include "base/compiler.h"
#include "bluecone/log.h"

#include <stdio.h>
#include <string.h>

/* What the parts of this table and verdict look at. */
typedef struct {
    report *r;
    const tally *t;
    const tally_plan *plan;
    tally_cover cover;
} view;

static bool tells_heat(const view *v)
{
    return v->cover.flows > 0 && v->cover.timed;
}

/* Of a limit at a state of its own, which the head of the report does not tell. */
static void add_limit(report *r, size_t table, const tally_limit_name *limit)
{
    char text[2 * BC_LIMIT_ID_MAX + 4];

    (void)snprintf(text, sizeof text, "%s%s%s", limit->id, limit->state[0] ? ", " : "", limit->state);
    report_add_text(r, table, text);
}

static void add_outside(const view *v)
{
    const summary_column columns[] = {{"limit", "limit", ""}, {"unit", "unit", ""}, {"min", "min", ""}, {"max", "max", ""}, {"rows", "rows", ""},
                                      {"hours", v->cover.timed ? "hours" : "rows", summary_held_unit(&v->cover)}, {"share", "share", "%"},
                                      {"energy", "heat", "GJ"}};
    report *r = v->r;
    const size_t table = summary_table(r, "outside", "Outside each limit", columns, BC_COUNT(columns) - (tells_heat(v) ? 0 : 1));

    for (size_t i = 0; i < v->plan->limit_count; i++) {
        const tally_limit_name *limit = &v->plan->limits[i];
        tally_excursions e;

        tally_outside(v->t, i, &e);
        add_limit(r, table, limit);
        report_add_text(r, table, summary_unit(limit->unit));
        summary_number(r, table, limit->has_min, limit->min);
        summary_number(r, table, limit->has_max, limit->max);
        report_add_number(r, table, (double)e.broken, 0);
        report_add_number(r, table, summary_held(&v->cover, e.broken_held), v->cover.timed ? 2 : 0);
        report_add_number(r, table, e.judged_held > 0.0 ? 100.0 * e.broken_held / e.judged_held : 0.0, 2);
        if (tells_heat(v))
            report_add_number(r, table, e.broken_j / SUMMARY_J_PER_GJ, 1);
    }
}

static void add_excursions(const view *v)
{
    const summary_column columns[] = {{"limit", "limit", ""}, {"runs", "runs", ""}, {"first", "first row", ""}, {"last", "last row", ""},
                                      {"worst-at", "worst at", ""}, {"worst", "worst", ""}, {"unit", "unit", ""},
                                      {"longest", "longest", summary_held_unit(&v->cover)}, {"longest-from", "longest from", ""}};
    report *r = v->r;
    const size_t table = summary_table(r, "excursions", "Excursions", columns, BC_COUNT(columns));

    for (size_t i = 0; i < v->plan->limit_count; i++) {
        tally_excursions e;

        tally_outside(v->t, i, &e);
        if (e.broken == 0)
            continue;
        add_limit(r, table, &v->plan->limits[i]);
        report_add_number(r, table, (double)e.runs, 0);
        summary_time(r, table, e.has_time, e.first_s);
        summary_time(r, table, e.has_time, e.last_s);
        summary_time(r, table, e.has_time, e.worst_s);
        report_add_number(r, table, e.worst, -1);
        report_add_text(r, table, summary_unit(v->plan->limits[i].unit));
        report_add_number(r, table, summary_held(&v->cover, e.longest), v->cover.timed ? 2 : 0);
        summary_time(r, table, e.has_time, e.longest_from_s);
    }
}

static void warn_unjudged(const view *v, size_t *limits)
{
    *limits = 0;
    for (size_t i = 0; i < v->plan->limit_count; i++) {
        tally_excursions e;
        char text[BC_LIMIT_ID_MAX + 80];

        tally_outside(v->t, i, &e);
        if (e.judged == v->cover.rows)
            continue;
        (void)snprintf(text, sizeof text, "%s cannot be judged in %llu of %llu rows.", v->plan->limits[i].id,
                       (unsigned long long)(v->cover.rows - e.judged), (unsigned long long)v->cover.rows);
        report_add_warning(v->r, text);
        (*limits)++;
    }
}

/* "9.5 h", "12 rows" */
static void tell_held(const view *v, double held, char *text, size_t size)
{
    (void)snprintf(text, size, "%.6g %s", summary_held(&v->cover, held), summary_held_unit(&v->cover));
}

/* "hydrogen in 9 rows, 9 h, at worst 11.2 mol % at 2026-03-09 02:00" */
static void describe(const view *v, size_t limit, const tally_excursions *e, char *text, size_t size)
{
    const char *unit = summary_unit(v->plan->limits[limit].unit);
    char worst[BC_LOG_TIME_TEXT];
    char held[40];

    bc_log_time_text(e->worst_s, worst);
    tell_held(v, e->broken_held, held, sizeof held);
    (void)snprintf(text, size, "%s in %llu row%s%s%s, at worst %.6g%s%s%s%s", v->plan->limits[limit].id, (unsigned long long)e->broken,
                   e->broken == 1 ? "" : "s", v->cover.timed ? ", " : "", v->cover.timed ? held : "", e->worst, unit[0] ? " " : "", unit,
                   e->has_time ? " at " : "", e->has_time ? worst : "");
}

static void list_broken(const view *v, char *text, size_t size)
{
    size_t told = 0;

    for (size_t i = 0; i < v->plan->limit_count; i++) {
        const size_t used = strlen(text);
        tally_excursions e;
        char one[260];

        tally_outside(v->t, i, &e);
        if (e.broken == 0)
            continue;
        describe(v, i, &e, one, sizeof one);
        (void)snprintf(text + used, size - used, "%s%s", told++ > 0 ? ", " : "; broken: ", one);
    }
}

/* What a verdict does not rest on. */
static void list_missing(const view *v, size_t unjudged, char *text, size_t size)
{
    const struct {
        unsigned long long count;
        const char *one, *more;
    } LISTS[] = {
        {unjudged, "limit cannot be judged in every row", "limits cannot be judged in every row"},
        {v->cover.refused, "row could not be used", "rows could not be used"},
        {v->cover.gaps, "gap is not covered", "gaps are not covered"},
    };

    for (size_t i = 0; i < BC_COUNT(LISTS); i++) {
        const size_t used = strlen(text);

        if (LISTS[i].count > 0)
            (void)snprintf(text + used, size - used, "; %llu %s", LISTS[i].count, LISTS[i].count == 1 ? LISTS[i].one : LISTS[i].more);
    }
}

static void judge(const view *v, size_t unjudged)
{
    const tally_cover *c = &v->cover;
    const bool good = c->outside == 0 && unjudged == 0;
    char text[6000];
    char held[40];
    char all[60] = "";

    tell_held(v, c->held, held, sizeof held);
    if (c->outside > 0) {
        if (c->timed)
            (void)snprintf(all, sizeof all, ", %.6g of %s", summary_held(c, c->outside_held), held);
        (void)snprintf(text, sizeof text, "NOT within the contract in %llu of %llu analyses%s", (unsigned long long)c->outside,
                       (unsigned long long)c->rows, all);
    } else {
        if (c->timed)
            (void)snprintf(all, sizeof all, ", over %s", held);
        (void)snprintf(text, sizeof text, "%s the contract in %llu analys%s%s", good ? "within" : "NOT shown to be within",
                       (unsigned long long)c->rows, c->rows == 1 ? "is" : "es", all);
    }
    list_broken(v, text, sizeof text);
    list_missing(v, unjudged, text, sizeof text - 1);
    (void)strncat(text, ".", sizeof text - strlen(text) - 1);
    report_set_verdict(v->r, text);
    if (good)
        report_judge(v->r, c->refused + c->gaps > 0 ? REPORT_CARE : REPORT_YES);
    else
        report_judge(v->r, REPORT_NO);
}

void summary_limits(report *r, const tally *t)
{
    view v = {.r = r, .t = t, .plan = tally_plan_of(t)};
    size_t unjudged = 0;

    if (v.plan->limit_count == 0)
        return;
    tally_covers(t, &v.cover);
    add_outside(&v);
    if (v.cover.outside > 0)
        add_excursions(&v);
    warn_unjudged(&v, &unjudged);
    judge(&v, unjudged);
}

/* The note that a clause on gas outside its specification asks for. */
void stream_summary_excursions(report *r, const tally *t)
{
    view v = {.r = r, .t = t, .plan = tally_plan_of(t)};

    tally_covers(t, &v.cover);
    const summary_column columns[] = {{"limit", "limit", ""}, {"from", "from", ""}, {"until", "until", ""}, {"rows", "rows", ""},
                                      {"held", "lasted", summary_held_unit(&v.cover)}, {"worst", "worst", ""}, {"unit", "unit", ""},
                                      {"bound", "bound", ""}, {"worst-at", "worst at", ""}, {"energy", "heat", "GJ"}};
    const size_t runs = tally_run_count(t);
    const size_t table = summary_table(r, "excursion-list", runs < TALLY_RUN_MAX ? "Each excursion" : "The longest excursions", columns,
                                       BC_COUNT(columns) - (tells_heat(&v) ? 0 : 1));

    for (size_t i = 0; i < runs; i++) {
        tally_run run;

        tally_run_at(t, i, &run);
        const tally_limit_name *limit = &v.plan->limits[run.limit];
        const bool below = limit->has_min && (!limit->has_max || run.worst < limit->min);

        add_limit(r, table, limit);
        summary_time(r, table, run.has_time, run.from_s);
        summary_time(r, table, run.has_time, run.until_s);
        report_add_number(r, table, (double)run.rows, 0);
        report_add_number(r, table, summary_held(&v.cover, run.held), v.cover.timed ? 2 : 0);
        report_add_number(r, table, run.worst, -1);
        report_add_text(r, table, summary_unit(limit->unit));
        report_add_number(r, table, below ? limit->min : limit->max, -1);
        summary_time(r, table, run.has_time, run.worst_s);
        if (tells_heat(&v))
            report_add_number(r, table, run.energy_j / SUMMARY_J_PER_GJ, 3);
    }
}
