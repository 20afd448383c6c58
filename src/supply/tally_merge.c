/* SPDX-License-Identifier: MIT */
/* tally_merge.c - two parts of a log made one: the row at the edge, the excursions over it, sums and groups. */
#include "supply/tally_internal.h"

#include "base/error_internal.h"
#include "bluecone/log.h"

#include <string.h>

static bc_status check(const tally *into, const tally *later, bc_error *err)
{
    char differ[300];
    char ends[BC_LOG_TIME_TEXT];
    char begins[BC_LOG_TIME_TEXT];

    if (into->settled || later->settled)
        return bc_fail(err, BC_ERR_USAGE, "a summary that is finished cannot be merged");
    if (tally_plans_differ(&into->plan, &later->plan, differ, sizeof differ))
        return bc_fail(err, BC_ERR_INPUT, "the parts were not summed up alike: %s; make them with the same options", differ);
    if (into->last_ms < 0 || later->last_ms < 0 || later->first_ms >= into->last_ms)
        return BC_OK;
    bc_log_time_text((double)into->last_ms / TALLY_MS, ends);
    bc_log_time_text((double)later->first_ms / TALLY_MS, begins);
    return bc_fail(err, BC_ERR_INPUT, "the parts overlap: one ends at %s, the next begins at %s; give parts that do not share a time", ends, begins);
}

static bool has_rows(const tally *t)
{
    return t->accounted || t->pending.there;
}

/* A part without rows has no clock of its own. */
static void set_clocks(tally *into, tally *later)
{
    if (!has_rows(into))
        into->plan.zoned = later->plan.zoned;
    else if (!has_rows(later))
        later->plan.zoned = into->plan.zoned;
}

static void merge_counts(tally *t, const tally *l)
{
    t->refused += l->refused;
    for (size_t i = 0; i < t->plan.flag_count; i++)
        t->flagged[i] += l->flagged[i];
}

static void merge_rows(tally *t, const tally *l)
{
    t->flows += l->flows;
    t->gaps += l->gaps;
    t->gap_ms += l->gap_ms;
    t->repeats += l->repeats;
    t->backs += l->backs;
    t->untimed += l->untimed;
    t->first_ms = l->first_ms < t->first_ms ? l->first_ms : t->first_ms;
    t->last_ms = l->last_ms > t->last_ms ? l->last_ms : t->last_ms;
    t->all_judged += l->all_judged;
    t->all_judged_weight += l->all_judged_weight;
    tally_group_join(t->whole, l->whole, t->plan.figure_count);
}

/* The later part's first excursion, when its first row was in it; NULL when not. */
static tally_stretch *leading(tally_beyond *b)
{
    if (b->lead.rows > 0)
        return &b->lead;
    return b->open_leads ? &b->open : NULL;
}

/* An excursion goes on over the edge when the earlier part ends in one and the later one begins in one: a gap between
 * them has already ended the first. */
static void merge_edge(tally *t, tally *l, size_t limit)
{
    tally_beyond *b = &t->beyond[limit];
    tally_beyond *more = &l->beyond[limit];
    const tally_stretch *lead = leading(more);
    const bool ends = more->lead.rows > 0;

    if (!lead) {
        tally_end_run(t, limit, false);
        return;
    }
    if (b->open.rows == 0)
        b->open_leads = !t->accounted;
    tally_stretch_join(&b->open, lead, &t->plan.limits[limit]);
    if (ends)
        tally_end_run(t, limit, false);
}

static void merge_limit(tally *t, tally *l, size_t limit)
{
    tally_beyond *b = &t->beyond[limit];
    tally_beyond *more = &l->beyond[limit];

    merge_edge(t, l, limit);
    tally_stretch_join(&b->all, &more->all, &t->plan.limits[limit]);
    b->judged += more->judged;
    b->judged_weight += more->judged_weight;
    b->runs += more->runs;
    if (more->longest.rows > 0 && (b->longest.rows == 0 || tally_stretch_before(&more->longest, &b->longest)))
        b->longest = more->longest;
    if (more->open.rows > 0 && !more->open_leads)
        b->open = more->open;
}

static void merge_limits(tally *t, tally *l)
{
    for (size_t i = 0; i < t->plan.limit_count; i++)
        merge_limit(t, l, i);
    for (size_t i = 0; i < l->longest.count; i++)
        tally_longest_add(&t->longest, &l->longest.kept[i]);
    t->open = l->open;
}

static bc_status merge_periods(tally *t, const tally *l, bc_error *err)
{
    for (size_t i = 0; i < l->periods.count; i++) {
        tally_group *group = NULL;
        const bc_status status = tally_take_period(t, l->periods.groups[i]->key, &group, err);

        if (status != BC_OK)
            return status;
        tally_group_join(group, l->periods.groups[i], t->plan.figure_count);
    }
    return BC_OK;
}

static bc_status merge_trend(tally *t, tally *l, bc_error *err)
{
    for (; t->trend_doubled < l->trend_doubled; t->trend_doubled++)
        tally_groups_halve(&t->trend);
    for (; l->trend_doubled < t->trend_doubled; l->trend_doubled++)
        tally_groups_halve(&l->trend);
    for (size_t i = 0; i < l->trend.count; i++) {
        tally_group *group = tally_groups_take(&t->trend, l->trend.groups[i]->key);

        if (!group)
            return bc_fail(err, BC_ERR_MEMORY, "not enough memory for the trend of a log");
        tally_group_join(group, l->trend.groups[i], t->plan.figure_count);
    }
    tally_narrow_trend(t);
    return BC_OK;
}

static bc_status merge_bins(tally *t, const tally *l, bc_error *err)
{
    for (size_t i = 0; i < t->plan.figure_count; i++)
        if (!tally_bins_join(&t->bins[i], &l->bins[i]))
            return bc_fail(err, BC_ERR_MEMORY, "not enough memory for the percentiles of a log");
    return BC_OK;
}

/* The later part has rows whose weight is known. */
static bc_status merge_accounted(tally *t, tally *l, bc_error *err)
{
    bc_status status = BC_OK;

    if (t->pending.there)
        status = tally_account(t, l->begin_ms, false, err);
    else
        t->begin_ms = l->begin_ms;
    if (status == BC_OK)
        status = tally_flush(l, err); /* the earlier part's hot rows stay hot */
    if (status == BC_OK)
        status = merge_periods(t, l, err);
    if (status == BC_OK)
        status = merge_trend(t, l, err);
    if (status == BC_OK)
        status = merge_bins(t, l, err);
    if (status != BC_OK)
        return status;
    merge_rows(t, l);
    merge_limits(t, l);
    t->pending = l->pending;
    t->accounted = true;
    return BC_OK;
}

/* The later part is one row, which still waits for the next. */
static bc_status merge_pending(tally *t, const tally *l, bc_error *err)
{
    const tally_pending *p = &l->pending;
    const tally_row row = {.has_time = p->ms != TALLY_NO_TIME, .time_s = (double)p->ms / TALLY_MS, .has_flow = p->has_flow,
                           .power_w = p->power_w, .values = p->values, .limit_values = p->limit_values, .known = p->known,
                           .broken = p->broken};

    return tally_add(t, &row, err);
}

bc_status tally_merge(tally *into, tally *later, bc_error *err)
{
    set_clocks(into, later);
    bc_status status = check(into, later, err);

    if (status == BC_OK && later->accounted)
        status = merge_accounted(into, later, err);
    else if (status == BC_OK && later->pending.there)
        status = merge_pending(into, later, err);
    if (status == BC_OK)
        merge_counts(into, later);
    return status;
}

bc_status tally_settle(tally *t, bc_error *err)
{
    bc_status status = BC_OK;

    if (t->settled)
        return BC_OK;
    if (t->pending.there)
        status = tally_account(t, TALLY_NO_TIME, true, err);
    if (status == BC_OK)
        status = tally_flush(t, err);
    if (status != BC_OK)
        return status;
    for (size_t i = 0; i < t->plan.limit_count; i++) {
        tally_end_run(t, i, true);
        if (t->beyond[i].lead.rows > 0)
            tally_count_run(t, &t->beyond[i].lead);
    }
    for (size_t i = 0; i < t->plan.figure_count; i++)
        tally_bins_sort(&t->bins[i]);
    tally_longest_sort(&t->longest);
    t->settled = true;
    return BC_OK;
}
