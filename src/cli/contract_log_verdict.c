/* SPDX-License-Identifier: MIT */
/* contract_log_verdict.c - the verdict on a log, and what it has to be warned of. */
#include "cli/contract_log.h"

#include <stdio.h>
#include <string.h>

#define HOUR_S 3600.0

/* Limits whose figure some rows do not have. */
static size_t warn_unjudged(const log_case *l, report *r, size_t rows)
{
    size_t limits = 0;

    for (size_t i = 0; i < l->c->contract->limit_count; i++) {
        bc_log_excursions e;
        char text[BC_LIMIT_ID_MAX + 80];

        bc_log_outside(l->log, i, &e);
        if (e.judged == rows)
            continue;
        (void)snprintf(text, sizeof text, "%s cannot be judged in %zu of %zu rows.", l->c->contract->limits[i].id, rows - e.judged, rows);
        report_add_warning(r, text);
        limits++;
    }
    return limits;
}

void log_warn(const log_case *l, report *r)
{
    char text[LOG_ABSENT_TEXT];

    for (size_t i = 0; i < l->header.remark_count; i++)
        report_add_warning(r, l->header.remarks[i]);
    if (log_header_flow_note(&l->header))
        report_add_warning(r, log_header_flow_note(&l->header));
    if (log_header_absent(&l->header, l->c->contract, text))
        report_add_warning(r, text);
    if (l->sums_off > 0) {
        (void)snprintf(text, sizeof text, "Scaled to 100 %%, though their components add up to less than 99 or more than 101 %%: %zu of the rows, the first in line %d.",
                       l->sums_off, l->off_line);
        report_add_warning(r, text);
    }
    if (l->flows_missing == 0)
        return;
    (void)snprintf(text, sizeof text, "Judged without a flow, so that the heat is not counted: %zu of the rows, the first in line %d.", l->flows_missing, l->flow_line);
    report_add_warning(r, text);
}

/* "hydrogen in 9 rows, 9 h, at worst 11.2 mol % at 2026-03-09 02:00" */
static void describe(const bc_limit *limit, const bc_log_excursions *e, char *text, size_t size)
{
    char worst[BC_LOG_TIME_TEXT];
    const bool plain = strcmp(limit->unit, "1") == 0;

    bc_log_time_text(e->worst_s, worst);
    (void)snprintf(text, size, "%s in %zu row%s, %.6g h, at worst %.6g%s%s at %s", limit->id, e->broken, e->broken == 1 ? "" : "s",
                   e->broken_s / HOUR_S, e->worst, plain ? "" : " ", plain ? "" : limit->unit, worst);
}

static void list_broken(const log_case *l, char *text, size_t size)
{
    size_t told = 0;

    for (size_t i = 0; i < l->c->contract->limit_count; i++) {
        const size_t used = strlen(text);
        bc_log_excursions e;
        char one[260];

        bc_log_outside(l->log, i, &e);
        if (e.broken == 0)
            continue;
        describe(&l->c->contract->limits[i], &e, one, sizeof one);
        (void)snprintf(text + used, size - used, "%s%s", told++ > 0 ? ", " : "; broken: ", one);
    }
}

/* What a verdict does not rest on. */
static void list_missing(const log_case *l, const bc_log_cover *cover, size_t unjudged, char *text, size_t size)
{
    const struct {
        size_t count;
        const char *one, *more;
    } LISTS[] = {
        {unjudged, "limit cannot be judged in every row", "limits cannot be judged in every row"},
        {l->refused, "row could not be used", "rows could not be used"},
        {cover->gaps, "gap is not covered", "gaps are not covered"},
    };

    for (size_t i = 0; i < sizeof LISTS / sizeof *LISTS; i++) {
        const size_t used = strlen(text);

        if (LISTS[i].count > 0)
            (void)snprintf(text + used, size - used, "; %zu %s", LISTS[i].count, LISTS[i].count == 1 ? LISTS[i].one : LISTS[i].more);
    }
}

bool log_judge(const log_case *l, report *r, const bc_log_cover *cover)
{
    char text[6000];
    double held = 0.0;
    const size_t broken = bc_log_any_outside(l->log, &held);
    const size_t unjudged = warn_unjudged(l, r, cover->rows);
    const bool good = broken == 0 && unjudged == 0;

    if (broken > 0)
        (void)snprintf(text, sizeof text, "NOT within the contract in %zu of %zu analyses, %.6g of %.6g h", broken, cover->rows, held / HOUR_S,
                       cover->held_s / HOUR_S);
    else
        (void)snprintf(text, sizeof text, "%s the contract in %zu analys%s, over %.6g h", good ? "within" : "NOT shown to be within", cover->rows, cover->rows == 1 ? "is" : "es",
                       cover->held_s / HOUR_S);
    list_broken(l, text, sizeof text);
    list_missing(l, cover, unjudged, text, sizeof text - 1);
    (void)strncat(text, ".", sizeof text - strlen(text) - 1);
    report_set_verdict(r, text);
    if (!good)
        report_set_caution(r, LOG_CAUTION);
    if (!good)
        report_judge(r, REPORT_NO);
    else
        report_judge(r, l->refused + cover->gaps > 0 ? REPORT_CARE : REPORT_YES);
    return good;
}
