/* SPDX-License-Identifier: MIT */
/* stream_part_fill.c - what stands behind the plan of a part file, into a tally; what cannot be is refused. */
#include "cli/stream_part_internal.h"

#include "supply/tally_calendar.h"

#include <math.h>

#define DOUBLED_MAX 32 /* steps of 8,000 years: more is no trend */

static bool counts_from(const json_t *from, tally *t)
{
    uint64_t *const counts[] = {&t->refused, &t->flows, &t->gaps, &t->gap_ms, &t->repeats, &t->backs, &t->untimed, &t->all_judged,
                                &t->all_judged_weight};
    part_list l = part_list_of(from);

    for (size_t i = 0; i < BC_COUNT(counts); i++)
        *counts[i] = part_take_count(&l);
    return part_list_ended(&l);
}

static bool times_from(const json_t *from, tally *t)
{
    part_list l = part_list_of(from);

    t->begin_ms = part_take_time(&l);
    t->first_ms = part_take_time(&l);
    t->last_ms = part_take_time(&l);
    if (t->last_ms == TALLY_NO_TIME)
        t->last_ms = -1;
    return part_list_ended(&l) && (t->last_ms < 0) == (t->first_ms == TALLY_NO_TIME) && (t->last_ms < 0 || t->first_ms <= t->last_ms);
}

static bool flags_from(const json_t *from, tally *t)
{
    part_list l = part_list_of(from);

    for (size_t i = 0; i < t->plan.flag_count; i++)
        t->flagged[i] = part_take_count(&l);
    return part_list_ended(&l);
}

static double take_or(part_list *l, double none, bool *there)
{
    if (json_is_null(json_array_get(l->array, l->next))) {
        *there = part_take(l) == NULL;
        return none;
    }
    *there = true;
    return part_take_number(l);
}

static void take_standing(part_list *l, size_t limit, tally_pending *p)
{
    const json_t *one = json_array_get(l->array, l->next);

    if (json_is_null(one) || json_is_false(one)) {
        p->known |= (uint64_t)json_is_false(one) << limit;
        (void)part_take(l);
        return;
    }
    p->known |= (uint64_t)1 << limit;
    p->broken |= (uint64_t)1 << limit;
    p->limit_values[limit] = part_take_number(l);
}

static bool pending_from(const json_t *from, tally *t)
{
    tally_pending *p = &t->pending;
    part_list l = part_list_of(from);
    bool there = false;

    if (json_is_null(from))
        return true;
    p->there = true;
    p->ms = part_take_time(&l);
    p->power_w = take_or(&l, 0.0, &p->has_flow);
    for (size_t i = 0; i < t->plan.figure_count; i++)
        p->values[i] = take_or(&l, (double)NAN, &there);
    for (size_t i = 0; i < t->plan.limit_count; i++)
        take_standing(&l, i, p);
    return part_list_ended(&l) && p->power_w >= 0.0 && p->power_w < TALLY_VALUE_MAX && (t->step_ms == 0 || p->ms != TALLY_NO_TIME)
           && (p->ms == TALLY_NO_TIME || (p->ms >= t->first_ms && p->ms <= t->last_ms));
}

static bool limits_from(const json_t *from, tally *t)
{
    bool good = json_is_array(from) && json_array_size(from) == t->plan.limit_count;

    for (size_t i = 0; good && i < t->plan.limit_count; i++) {
        good = part_beyond_from(json_array_get(from, i), i, &t->beyond[i]);
        t->open |= (uint64_t)(t->beyond[i].open.rows > 0) << i;
    }
    return good;
}

static bool longest_from(const json_t *from, tally *t)
{
    bool good = json_is_array(from) && json_array_size(from) <= TALLY_RUN_MAX;

    for (size_t i = 0; good && i < json_array_size(from); i++) {
        tally_stretch s;

        good = part_stretch_from(json_array_get(from, i), t->plan.limit_count, &s) && s.rows > 0;
        if (good)
            tally_longest_add(&t->longest, &s);
    }
    return good;
}

static bool all_bins_from(const json_t *from, tally *t)
{
    bool good = json_is_array(from) && json_array_size(from) == t->plan.figure_count;

    for (size_t i = 0; good && i < t->plan.figure_count; i++)
        good = part_bins_from(json_array_get(from, i), &t->bins[i]);
    return good;
}

static bool groups_from(const json_t *o, tally *t)
{
    const json_t *doubled = json_object_get(o, "doubled");
    const json_int_t times = json_integer_value(doubled);

    if (!json_is_integer(doubled) || times < 0 || times > DOUBLED_MAX)
        return false;
    t->trend_doubled = (unsigned)times;
    return part_group_from(json_object_get(o, "whole"), t->plan.figure_count, t->whole)
           && part_groups_from(json_object_get(o, "trend"), TALLY_LATEST_MS / (TALLY_TREND_MS << times), TALLY_TREND_MAX, &t->trend)
           && part_groups_from(json_object_get(o, "periods"),
                               t->plan.by == TALLY_WHOLE ? -1 : tally_period_key(t->plan.by, TALLY_LATEST_MS), tally_period_room(t), &t->periods);
}

/* What is told in several places has to agree. */
static bool adds_up(const tally_groups *s, uint64_t rows)
{
    for (size_t i = 0; i < s->count; i++)
        rows -= s->groups[i]->rows;
    return rows == 0;
}

static bool weights_add_up(const tally *t, size_t figure)
{
    const tally_bins *b = &t->bins[figure];
    uint64_t rest = t->whole->cells[figure].weight - b->zero;

    for (size_t i = 0; i < b->room; i++)
        rest -= b->bins[i].weight;
    return rest == 0;
}

static bool consistent(const tally *t)
{
    const uint64_t timed = t->whole->rows - t->untimed;
    bool good = t->untimed <= t->whole->rows && adds_up(&t->trend, timed) && (t->plan.by == TALLY_WHOLE || adds_up(&t->periods, timed))
                && t->all_judged <= t->whole->rows && t->flows <= t->whole->rows + 1
                && (t->step_ms == 0 || (t->untimed == 0 && t->begin_ms != TALLY_NO_TIME));

    for (size_t i = 0; good && i < t->plan.figure_count; i++)
        good = weights_add_up(t, i);
    for (size_t i = 0; good && i < t->plan.limit_count; i++)
        good = t->beyond[i].all.rows <= t->whole->rows && t->beyond[i].judged <= t->whole->rows - t->all_judged;
    return good;
}

const char *part_fill(const json_t *o, tally *t)
{
    const struct {
        const char *key;
        bool (*from)(const json_t *, tally *);
    } PARTS[] = {{"counts", counts_from}, {"times", times_from}, {"flagged", flags_from}, {"pending", pending_from},
                 {"bins", all_bins_from}, {"limits", limits_from}, {"longest", longest_from}};

    for (size_t i = 0; i < BC_COUNT(PARTS); i++)
        if (!PARTS[i].from(json_object_get(o, PARTS[i].key), t))
            return PARTS[i].key;
    if (!groups_from(o, t))
        return "trend";
    t->accounted = t->whole->rows > 0;
    return consistent(t) ? NULL : "whole";
}
