/* SPDX-License-Identifier: MIT */
/* verify.c - the published check values, computed now: what an auditor files. */
#include "base/error_internal.h"
#include "base/text.h"
#include "cli/cli.h"

#include <stdio.h>
#include <string.h>

#define AREAS_MAX 32

/* Counts of one area. */
typedef struct {
    const char *area;
    size_t run, failed;
} tally;

/* Counts of all areas that were run, in the order of the list of checks. */
typedef struct {
    size_t count;
    tally each[AREAS_MAX];
} tallies;

static void count_check(tallies *t, const bc_check *c)
{
    size_t i = 0;

    while (i < t->count && strcmp(t->each[i].area, c->area) != 0)
        i++;
    if (i == AREAS_MAX)
        i--; /* the last one takes what does not fit: nothing is lost from the total */
    else if (i == t->count)
        t->each[t->count++] = (tally){c->area, 0, 0};
    t->each[i].run++;
    t->each[i].failed += !c->ok;
}

static void add_columns(report *r, size_t table)
{
    report_add_column(r, table, "number", "no.", "");
    report_add_column(r, table, "area", "area", "");
    report_add_column(r, table, "case", "case", "");
    report_add_column(r, table, "state", "state", "");
    report_add_column(r, table, "quantity", "quantity", "");
    report_add_column(r, table, "expected", "expected", "");
    report_add_column(r, table, "computed", "computed", "");
    report_add_column(r, table, "deviation", "deviation", "");
    report_add_column(r, table, "tolerance", "tolerance", "");
    report_add_column(r, table, "unit", "unit", "");
    report_add_column(r, table, "verdict", "verdict", "");
    report_add_column(r, table, "source", "source", "");
    report_add_column(r, table, "why", "why this tolerance", "");
    report_add_column(r, table, "subject", "subject", "");
}

static void describe_state(const bc_check *c, char *text, size_t size)
{
    if (c->lambda > 0.0)
        (void)snprintf(text, size, "lambda %.4g, %.5g/%.5g K, %.6g kPa", c->lambda, c->t_k, c->oxidant_k, c->metering_kpa);
    else if (c->edition != 0)
        (void)snprintf(text, size, "%.6g/%.6g@%.6gkPa %d", c->combustion_c, c->metering_c, c->metering_kpa, c->edition);
    else
        (void)snprintf(text, size, "%.6g K", c->t_k);
}

static void add_row(report *r, size_t table, size_t number, const bc_check *c)
{
    char state[64];
    char quantity[BC_WORD_MAX];
    char subject[480];

    describe_state(c, state, sizeof state);
    (void)snprintf(quantity, sizeof quantity, "%s%s", c->of_uncertainty ? "u of " : "", c->quantity);
    report_add_number(r, table, (double)number, 0);
    report_add_text(r, table, c->area);
    report_add_text(r, table, c->id);
    report_add_text(r, table, state);
    report_add_text(r, table, quantity);
    report_add_number(r, table, c->expected, -1);
    report_add_number(r, table, c->computed, -1);
    report_add_number(r, table, c->computed - c->expected, -1);
    report_add_number(r, table, c->tolerance, -1);
    report_add_text(r, table, c->unit[0] ? c->unit : "1");
    report_add_text(r, table, c->ok ? "pass" : "FAIL");
    report_add_text(r, table, c->source);
    report_add_text(r, table, c->why);
    if (c->edition != 0 && c->with[0] != '\0')
        (void)snprintf(subject, sizeof subject, "%s against %s", c->subject, c->with);
    else
        (void)snprintf(subject, sizeof subject, "%s", c->subject);
    report_add_text(r, table, subject);
}

static bc_status run_area(report *r, size_t table, const char *area, tallies *t, bc_error *err)
{
    for (size_t i = 0; i < bc_check_count(); i++) {
        bc_check c;

        if (area && strcmp(bc_check_area(i), area) != 0)
            continue;
        const bc_status status = bc_check_run(i, &c, err);

        if (status != BC_OK)
            return status;
        add_row(r, table, i + 1, &c);
        count_check(t, &c);
    }
    return BC_OK;
}

static bc_status check_area(const char *area, bc_error *err)
{
    const char *best = bc_check_area(0);
    char shown[BC_WORD_MAX];
    char hint[BC_HINT_MAX];

    for (size_t i = 0; i < bc_check_count(); i++) {
        if (strcmp(bc_check_area(i), area) == 0)
            return BC_OK;
        if (bc_text_unlikeness(area, bc_check_area(i)) < bc_text_unlikeness(area, best))
            best = bc_check_area(i);
    }
    bc_text_show(shown, sizeof shown, area);
    bc_text_suggest(hint, sizeof hint, "the nearest is", area, best);
    return bc_fail(err, BC_ERR_USAGE, "unknown area '%s' of checks%s (bluecone list areas; verify without an area runs all)", shown, hint);
}

/* A line for each area and the verdict; the number of failed checks comes back. */
static size_t conclude(report *r, const tallies *t)
{
    char text[160];
    size_t run = 0;
    size_t failed = 0;

    for (size_t i = 0; i < t->count; i++) {
        (void)snprintf(text, sizeof text, "%s: %zu values, %zu outside their tolerance", t->each[i].area, t->each[i].run, t->each[i].failed);
        report_add_check(r, t->each[i].area, t->each[i].failed == 0, text);
        run += t->each[i].run;
        failed += t->each[i].failed;
    }
    if (failed == 0)
        (void)snprintf(text, sizeof text, "all %zu check values are met within their tolerance", run);
    else
        (void)snprintf(text, sizeof text, "%zu of %zu check values are NOT met within their tolerance", failed, run);
    report_set_verdict(r, text);
    report_judge(r, failed == 0 ? REPORT_YES : REPORT_NO);
    return failed;
}

int run_verify(const arguments *a)
{
    const char *area = a->argument_count > 0 ? a->argument[0] : NULL;
    tallies t = {.count = 0};
    report r;
    bc_error err;
    bc_status status = area ? check_area(area, &err) : BC_OK;

    report_open(&r, BC_VERSION, "verify", "Verification against published values");
    const size_t table = report_add_table(&r, "checks", "Check values");

    add_columns(&r, table);
    if (status == BC_OK)
        status = run_area(&r, table, area, &t, &err);
    if (status == BC_OK)
        return answer(&r, a, false, conclude(&r, &t) == 0 ? 0 : 1);
    report_close(&r);
    return complain(&err);
}
