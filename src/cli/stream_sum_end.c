/* SPDX-License-Identifier: MIT */
/* stream_sum_end.c - what a tally comes to at the end: a part, the note of the excursions, a report; and parts merged. */
#include "cli/contract_report.h"
#include "cli/stream_part.h"
#include "cli/stream_sum.h"
#include "cli/stream_summary.h"

#include "base/error_internal.h"

#include <stdlib.h>
#include <string.h>

#define ANSWER_NO 1

static bool is_outside(const tally *t)
{
    tally_cover cover;

    tally_covers(t, &cover);
    return cover.outside > 0;
}

/* Rows whose heat is not in the sum. */
static void warn_flows(report *r, const tally *t)
{
    tally_cover cover;
    char text[160];

    tally_covers(t, &cover);
    if (cover.flows >= cover.rows)
        return;
    (void)snprintf(text, sizeof text, "No heat is counted for %llu of the rows used: their flow is none, or cannot be read.",
                   (unsigned long long)(cover.rows - cover.flows));
    report_add_warning(r, text);
}

/* Of parts it is not known any more which files they were of. */
static void open_report(report *r, const stream_plan *p, const tally *t, const char *title)
{
    char absent[LOG_ABSENT_TEXT];

    report_open(r, BC_VERSION, "stream", title);
    report_state_of(r, &tally_plan_of(t)->at);
    if (p) {
        if (p->a->argument_count > 0 && strcmp(p->a->argument[0], "-") != 0)
            report_add_input(r, p->path);
        if (p->contract)
            report_contract_inputs(r, p->contract);
        if (p->contract)
            contract_warn(r, p->contract);
        if (p->contract && log_header_absent(&p->header, p->contract, absent))
            report_add_warning(r, absent);
        for (size_t i = 0; i < p->header.remark_count; i++)
            report_add_warning(r, p->header.remarks[i]);
        if (p->header.has_flow)
            warn_flows(r, t);
        if (log_header_flow_note(&p->header))
            report_add_warning(r, log_header_flow_note(&p->header));
    }
    if (is_outside(t))
        report_set_caution(r, LOG_CAUTION);
}

static int write_excursions(const arguments *a, const stream_plan *p, const tally *t)
{
    arguments with_file = *a;
    report r;

    with_file.value[OPTION_output] = a->value[OPTION_excursions];
    with_file.value[OPTION_json] = NULL;
    with_file.value[OPTION_csv] = NULL;
    open_report(&r, p, t, "Excursions");
    stream_summary_excursions(&r, t);
    return answer(&r, &with_file, false, is_outside(t) ? ANSWER_NO : 0);
}

static int write_summary(const arguments *a, const stream_plan *p, const tally *t)
{
    report r;

    open_report(&r, p, t, "Summary of a log");
    stream_summary_report(&r, t);
    /* a limit that cannot be judged is no yes either */
    return answer(&r, a, false, is_outside(t) || report_judged(&r) == REPORT_NO ? ANSWER_NO : 0);
}

/* The note and the report of a settled tally; the exit code of what failed, else of the answer. */
static int write_settled(const arguments *a, const stream_plan *p, const tally *t, bool summary)
{
    int code = is_outside(t) ? ANSWER_NO : 0;

    if (a->value[OPTION_excursions])
        code = write_excursions(a, p, t);
    return summary && code <= ANSWER_NO ? write_summary(a, p, t) : code;
}

bc_status stream_sum_end(stream_sum *s, int *code, bc_error *err)
{
    const arguments *a = s->p->a;
    bc_status status = s->t ? BC_OK : stream_sum_begin(s, err);

    if (status != BC_OK)
        return status;
    tally_add_refused(s->t, s->refused);
    for (size_t i = 0; i < STREAM_FLAGS; i++)
        tally_count_flag(s->t, i, s->flagged[i]);
    if (a->value[OPTION_summary_part])
        return stream_part_write(s->t, a->value[OPTION_output], err);
    status = tally_settle(s->t, err);
    if (status == BC_OK) {
        const int written = write_settled(a, s->p, s->t, a->value[OPTION_summary] != NULL);

        *code = written > *code ? written : *code; /* the rows may have said no already */
    }
    return status;
}

/* ---- merging -------------------------------------------------------------------------------------------------------------- */

static int compare_begin(const void *a, const void *b)
{
    tally_cover x;
    tally_cover y;

    tally_covers(*(tally *const *)a, &x);
    tally_covers(*(tally *const *)b, &y);
    return (x.first_s > y.first_s) - (x.first_s < y.first_s);
}

static bc_status merge(const arguments *a, tally *parts[], bc_error *err)
{
    bc_status status = BC_OK;

    for (size_t i = 0; i < a->argument_count && status == BC_OK; i++)
        status = stream_part_read(a->argument[i], &parts[i], err);
    if (status != BC_OK)
        return status;
    if (tally_plan_of(parts[0])->step_s > 0.0)
        qsort(parts, a->argument_count, sizeof(tally *), compare_begin);
    for (size_t i = 1; i < a->argument_count && status == BC_OK; i++)
        status = tally_merge(parts[0], parts[i], err);
    return status;
}

static bc_status check_merge(const arguments *a, bc_error *err)
{
    static const size_t OTHERS[] = {OPTION_add, OPTION_columns, OPTION_no_header, OPTION_contract, OPTION_against, OPTION_step, OPTION_period,
                                    OPTION_follow, OPTION_strict, OPTION_calibration, OPTION_at, OPTION_unit, OPTION_saturated, OPTION_edition};
    static const char *const WORDS[] = {"add", "columns", "no-header", "contract", "against", "step", "by",
                                        "follow", "strict", "calibration", "at", "unit", "saturated", "edition"};

    for (size_t i = 0; i < BC_COUNT(OTHERS); i++)
        if (a->value[OTHERS[i]])
            return bc_fail(err, BC_ERR_USAGE, "--%s belongs to the run that makes the parts; --merge takes them as they are", WORDS[i]);
    if (a->argument_count == 0)
        return bc_fail(err, BC_ERR_USAGE, "--merge needs the files that --summary-part wrote");
    return BC_OK;
}

/* A part may be one long outage, all of them together may not. */
static bc_status settle(tally *t, bc_error *err)
{
    tally_cover cover;
    const bc_status status = tally_settle(t, err);

    tally_covers(t, &cover);
    if (status == BC_OK && cover.rows == 0)
        return bc_fail(err, BC_ERR_INPUT, "no row of any part could be used, of %llu that were read", (unsigned long long)cover.refused);
    return status;
}

int stream_merge(const arguments *a)
{
    tally *parts[ARGUMENTS_MAX] = {NULL};
    bc_error err;
    int code = 0;
    bc_status status = check_merge(a, &err);

    if (status == BC_OK)
        status = merge(a, parts, &err);
    if (status == BC_OK && a->value[OPTION_summary_part])
        status = stream_part_write(parts[0], a->value[OPTION_output], &err);
    else if (status == BC_OK && (status = settle(parts[0], &err)) == BC_OK)
        code = write_settled(a, NULL, parts[0], true);
    for (size_t i = 0; i < a->argument_count; i++)
        tally_close(parts[i]);
    return status == BC_OK ? code : complain(&err);
}
