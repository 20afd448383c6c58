/* SPDX-License-Identifier: MIT */
/* tally_beyond.c - the excursions of a row's limits: begun, gone on, ended. */
#include "supply/tally_internal.h"

void tally_run_of(const tally *t, const tally_stretch *s, tally_run *run)
{
    const bool timed = t->step_ms > 0;

    *run = (tally_run){.limit = s->limit, .rows = s->rows, .worst = s->worst, .open_at_end = s->open_at_end};
    run->held = (double)s->weight / (timed ? TALLY_MS : 1.0);
    run->energy_j = timed ? tally_sum_value(&s->energy) / TALLY_MS : 0.0;
    run->has_time = s->last_ms >= 0;
    if (!run->has_time)
        return;
    run->from_s = (double)s->from_ms / TALLY_MS;
    run->until_s = (double)s->until_ms / TALLY_MS;
    run->worst_s = (double)(s->worst_ms == TALLY_NO_TIME ? s->from_ms : s->worst_ms) / TALLY_MS;
}

void tally_count_run(tally *t, const tally_stretch *s)
{
    tally_beyond *b = &t->beyond[s->limit];

    b->runs++;
    if (b->longest.rows == 0 || tally_stretch_before(s, &b->longest))
        b->longest = *s;
    tally_longest_add(&t->longest, s);
}

void tally_end_run(tally *t, size_t limit, bool at_end)
{
    tally_beyond *b = &t->beyond[limit];

    if (b->open.rows == 0)
        return;
    b->open.open_at_end = at_end;
    if (t->on_run) {
        tally_run run;

        tally_run_of(t, &b->open, &run);
        t->on_run(t->on_run_data, &run);
    }
    if (b->open_leads)
        b->lead = b->open;
    else
        tally_count_run(t, &b->open);
    b->open = (tally_stretch){.rows = 0};
    b->open_leads = false;
}

/* A broken row by itself. */
static tally_stretch stretch_of(const tally *t, size_t limit, const tally_share *share)
{
    const bool timed = share->ms != TALLY_NO_TIME;
    tally_stretch s = {.limit = limit, .rows = 1, .weight = share->weight, .worst = t->pending.limit_values[limit]};

    s.from_ms = s.worst_ms = share->ms;
    s.last_ms = timed ? share->ms : -1;
    s.until_ms = timed ? share->ms + (t->step_ms > 0 ? (int64_t)share->weight : 0) : -1;
    if (share->has_energy)
        s.energy.sum = share->energy.value;
    return s;
}

static void go_on(tally *t, size_t limit, const tally_share *share)
{
    tally_beyond *b = &t->beyond[limit];
    const tally_stretch row = stretch_of(t, limit, share);

    if (b->open.rows == 0)
        b->open_leads = !t->accounted;
    tally_stretch_join(&b->open, &row, &t->plan.limits[limit]);
    tally_stretch_join(&b->all, &row, &t->plan.limits[limit]);
    t->open |= (uint64_t)1 << limit;
}

static void count_judged(tally *t, uint64_t weight)
{
    if (t->pending.known == t->every) {
        t->all_judged++;
        t->all_judged_weight += weight;
        return;
    }
    for (size_t i = 0; i < t->plan.limit_count; i++)
        if ((t->pending.known >> i & 1U) != 0) {
            t->beyond[i].judged++;
            t->beyond[i].judged_weight += weight;
        }
}

void tally_account_limits(tally *t, const tally_share *share, bool gap)
{
    const uint64_t broken = t->pending.broken;

    count_judged(t, share->weight);
    if ((broken | t->open) == 0)
        return;
    for (size_t i = 0; i < t->plan.limit_count; i++) {
        if ((broken >> i & 1U) != 0)
            go_on(t, i, share);
        if ((broken >> i & 1U) == 0 || gap)
            tally_end_run(t, i, false);
    }
    t->open = gap ? 0 : broken;
}
