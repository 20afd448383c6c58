/* SPDX-License-Identifier: MIT */
/* tally.c - opening a tally, taking in rows, and what the next row makes known of the one before. */
#include "supply/tally_internal.h"

#include "base/error_internal.h"
#include "bluecone/log.h"
#include "supply/tally_calendar.h"

#include <math.h>
#include <stdlib.h>
#include <string.h>

#define STEP_MAX_S 3.2e7 /* a year, and somewhat more */

static bc_status check_plan(const tally_plan *plan, bc_error *err)
{
    if (plan->figure_count > TALLY_FIGURE_MAX || plan->limit_count > TALLY_LIMIT_MAX || plan->flag_count > TALLY_FLAG_MAX)
        return bc_fail(err, BC_ERR_USAGE, "too much for one summary: at most %d figures, %d limits and %d kinds of remarks", TALLY_FIGURE_MAX,
                       TALLY_LIMIT_MAX, TALLY_FLAG_MAX);
    if (!(plan->step_s >= 0.0) || plan->step_s > STEP_MAX_S || (plan->step_s > 0.0 && plan->step_s < 1.0 / TALLY_MS))
        return bc_fail(err, BC_ERR_USAGE, "a usual step of %.6g s cannot be summed up: a millisecond to a year, or 0 for none", plan->step_s);
    return BC_OK;
}

static bool make_room(tally *t)
{
    const size_t figures = t->plan.figure_count;

    t->hot = tally_group_open(figures, 0);
    t->whole = tally_group_open(figures, 0);
    t->bins = malloc((figures + 1) * sizeof *t->bins); /* never of no size */
    for (size_t i = 0; t->bins && i < figures; i++)
        tally_bins_open(&t->bins[i]);
    t->trend.figures = t->periods.figures = figures;
    return tally_longest_open(&t->longest) && t->hot && t->whole && t->bins;
}

bc_status tally_open(const tally_plan *plan, tally **out, bc_error *err)
{
    const bc_status status = check_plan(plan, err);

    if (status != BC_OK)
        return status;
    tally *t = calloc(1, sizeof *t);

    if (!t)
        return bc_fail(err, BC_ERR_MEMORY, "not enough memory for a summary");
    t->plan = *plan;
    t->step_ms = llround(plan->step_s * TALLY_MS);
    t->every = plan->limit_count > 0 ? UINT64_MAX >> (64 - plan->limit_count) : 0;
    t->first_ms = TALLY_NO_TIME;
    t->last_ms = -1;
    if (!make_room(t)) {
        tally_close(t);
        return bc_fail(err, BC_ERR_MEMORY, "not enough memory for a summary");
    }
    *out = t;
    return BC_OK;
}

void tally_close(tally *t)
{
    if (!t)
        return;
    for (size_t i = 0; t->bins && i < t->plan.figure_count; i++)
        tally_bins_close(&t->bins[i]);
    free(t->bins);
    free(t->hot);
    free(t->whole);
    tally_groups_close(&t->trend);
    tally_groups_close(&t->periods);
    tally_longest_close(&t->longest);
    free(t);
}

const tally_plan *tally_plan_of(const tally *t)
{
    return &t->plan;
}

size_t tally_bytes(const tally *t)
{
    const size_t groups = t->trend.count + t->periods.count + 2;
    size_t bytes = sizeof *t + groups * tally_group_bytes(t->plan.figure_count) + TALLY_RUN_MAX * sizeof *t->longest.kept;

    for (size_t i = 0; i < t->plan.figure_count; i++)
        bytes += sizeof *t->bins + t->bins[i].room * sizeof *t->bins[i].bins;
    return bytes + (t->trend.room + t->periods.room) * sizeof(void *);
}

void tally_tell_runs(tally *t, tally_on_run *on_run, void *data)
{
    t->on_run = on_run;
    t->on_run_data = data;
}

void tally_add_refused(tally *t, uint64_t rows)
{
    t->refused += rows;
}

void tally_count_flag(tally *t, size_t flag, uint64_t rows)
{
    t->flagged[flag] += rows;
}

static bc_status find_time(const tally *t, const tally_row *row, int64_t *ms, bc_error *err)
{
    if (!row->has_time && t->step_ms > 0)
        return bc_fail(err, BC_ERR_INPUT, "it has no time although the log has; give it one, or leave it out");
    if (row->has_time && !(row->time_s >= 0.0 && row->time_s <= (double)TALLY_LATEST_MS / TALLY_MS))
        return bc_fail(err, BC_ERR_INPUT, "its time is outside of the years 1970 to 9999");
    if (row->has_flow && !(row->power_w >= 0.0 && row->power_w < TALLY_VALUE_MAX))
        return bc_fail(err, BC_ERR_INPUT, "its flow brings a heat that is negative or no number");
    *ms = row->has_time ? (int64_t)(row->time_s * TALLY_MS + 0.5) : TALLY_NO_TIME;
    return BC_OK;
}

static void keep(tally *t, const tally_row *row, int64_t ms)
{
    tally_pending *p = &t->pending;

    p->there = true;
    p->ms = ms;
    p->has_flow = row->has_flow;
    p->power_w = row->has_flow ? row->power_w : 0.0;
    p->known = row->known & t->every;
    p->broken = row->broken & p->known;
    for (size_t i = 0; i < t->plan.figure_count; i++)
        p->values[i] = row->values[i];
    for (uint64_t rest = p->broken, i = 0; rest != 0; rest >>= 1, i++)
        if ((rest & 1U) != 0)
            p->limit_values[i] = row->limit_values[i];
    t->flows += row->has_flow;
    if (ms == TALLY_NO_TIME)
        return;
    t->first_ms = ms < t->first_ms ? ms : t->first_ms;
    t->last_ms = ms > t->last_ms ? ms : t->last_ms;
}

bc_status tally_add(tally *t, const tally_row *row, bc_error *err)
{
    int64_t ms = 0;
    bc_status status = find_time(t, row, &ms, err);

    if (status == BC_OK && t->pending.there)
        status = tally_account(t, ms, false, err);
    else if (status == BC_OK)
        t->begin_ms = ms;
    if (status == BC_OK)
        keep(t, row, ms);
    return status;
}
