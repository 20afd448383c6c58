/* SPDX-License-Identifier: MIT */
/* tally_account.c - a row whose weight is known, into all that is kept. */
#include "supply/tally_internal.h"

#include "base/error_internal.h"
#include "bluecone/log.h"
#include "supply/tally_calendar.h"

#include <math.h>

/* How long the pending row holds, ms; true when a gap follows. */
static bool hold(tally *t, int64_t next_ms, bool last, uint64_t *weight)
{
    const int64_t step = last ? t->step_ms : next_ms - t->pending.ms;

    *weight = 1;
    if (t->step_ms == 0)
        return false;
    *weight = (uint64_t)t->step_ms;
    if (last)
        return false;
    if (step < 0) {
        t->backs++;
        return false;
    }
    if ((double)step > BC_LOG_GAP * (double)t->step_ms) {
        t->gaps++;
        t->gap_ms += (uint64_t)(step - t->step_ms);
        return true;
    }
    t->repeats += step == 0;
    *weight = (uint64_t)step;
    return false;
}

size_t tally_period_room(const tally *t)
{
    const size_t figures = t->plan.figure_count > 0 ? t->plan.figure_count : 1;

    return TALLY_CELL_MAX / figures < TALLY_PERIOD_MAX ? TALLY_CELL_MAX / figures : TALLY_PERIOD_MAX;
}

bc_status tally_take_period(tally *t, int64_t key, tally_group **group, bc_error *err)
{
    static const char *const NAMES[] = {"", "hours", "days", "months"};
    const size_t most = tally_period_room(t);

    if (t->periods.count >= most && !tally_groups_have(&t->periods, key))
        return bc_fail(err, BC_ERR_INPUT, "the log covers more than %zu %s, the most that are kept with so many figures; sum it up --by month", most, NAMES[t->plan.by]);
    *group = tally_groups_take(&t->periods, key);
    return *group ? BC_OK : bc_fail(err, BC_ERR_MEMORY, "not enough memory for a summary by %s", NAMES[t->plan.by]);
}

void tally_narrow_trend(tally *t)
{
    for (; t->trend.count > TALLY_TREND_MAX; t->trend_doubled++)
        tally_groups_halve(&t->trend);
}

static bc_status flush_timed(tally *t, bc_error *err)
{
    const size_t figures = t->plan.figure_count;
    tally_group *group = NULL;

    if (t->plan.by != TALLY_WHOLE) {
        const bc_status status = tally_take_period(t, tally_period_key(t->plan.by, t->hot->first_ms), &group, err);

        if (status != BC_OK)
            return status;
        tally_group_join(group, t->hot, figures);
    }
    group = tally_groups_take(&t->trend, t->hot->first_ms / (TALLY_TREND_MS << t->trend_doubled));
    if (!group)
        return bc_fail(err, BC_ERR_MEMORY, "not enough memory for the trend of a log");
    tally_group_join(group, t->hot, figures);
    tally_narrow_trend(t);
    return BC_OK;
}

bc_status tally_flush(tally *t, bc_error *err)
{
    if (t->hot->rows == 0)
        return BC_OK;
    if (t->hot->last_ms >= 0) {
        const bc_status status = flush_timed(t, err);

        if (status != BC_OK)
            return status;
    }
    tally_group_join(t->whole, t->hot, t->plan.figure_count);
    tally_group_clear(t->hot, t->plan.figure_count, 0);
    return BC_OK;
}

/* The span that the trend and the periods have in common around a time. */
static void heat_up(tally *t, int64_t ms)
{
    const int64_t width = TALLY_TREND_MS << t->trend_doubled;

    t->hot_from = ms == TALLY_NO_TIME ? ms : ms / width * width;
    t->hot_until = ms == TALLY_NO_TIME ? ms : t->hot_from + width;
    if (ms == TALLY_NO_TIME || t->plan.by == TALLY_WHOLE)
        return;
    const int64_t key = tally_period_key(t->plan.by, ms);
    const int64_t from = tally_period_begin_ms(t->plan.by, key);
    const int64_t until = tally_period_begin_ms(t->plan.by, key + 1);

    t->hot_from = from > t->hot_from ? from : t->hot_from;
    t->hot_until = until < t->hot_until ? until : t->hot_until;
}

static bool account_figures(tally *t, const tally_share *share)
{
    const double *values = t->pending.values;

    for (size_t i = 0; i < t->plan.figure_count; i++) {
        if (!(fabs(values[i]) < TALLY_VALUE_MAX))
            continue;
        tally_cell_add(&t->hot->cells[i], values[i], share);
        if (!tally_bins_add(&t->bins[i], values[i], share->weight))
            return false;
    }
    return true;
}

static void account_group(tally *t, const tally_share *share)
{
    tally_group *g = t->hot;

    g->rows++;
    g->weight += share->weight;
    if (share->has_energy)
        tally_sum_add(&g->energy, share->energy.value, 0.0);
    if (t->pending.broken != 0) {
        g->outside++;
        g->outside_weight += share->weight;
    }
    if (share->ms == TALLY_NO_TIME) {
        t->untimed++;
        return;
    }
    g->first_ms = share->ms < g->first_ms ? share->ms : g->first_ms;
    g->last_ms = share->ms > g->last_ms ? share->ms : g->last_ms;
}

bc_status tally_account(tally *t, int64_t next_ms, bool last, bc_error *err)
{
    const tally_pending *p = &t->pending;
    bc_status status = BC_OK;

    if (p->ms < t->hot_from || (p->ms >= t->hot_until && p->ms != t->hot_from)) {
        status = tally_flush(t, err);
        if (status != BC_OK)
            return status;
        heat_up(t, p->ms);
    }
    tally_share share = {.ms = p->ms, .has_energy = p->has_flow};
    const bool gap = hold(t, next_ms, last, &share.weight);

    share.w = tally_split_of((double)share.weight);
    share.energy = tally_split_of(p->power_w * (double)share.weight);
    if (!account_figures(t, &share))
        return bc_fail(err, BC_ERR_MEMORY, "not enough memory for the percentiles of a log");
    account_group(t, &share);
    if (t->plan.limit_count > 0)
        tally_account_limits(t, &share, gap);
    t->accounted = true;
    return BC_OK;
}
