/* SPDX-License-Identifier: MIT */
/* stream_part_limits.c - the excursions of a tally to and from a part file. */
#include "cli/stream_part_internal.h"

#include <math.h>

json_t *part_stretch_to(const tally_stretch *s, bool *failed)
{
    if (s->rows == 0)
        return json_null();
    json_t *a = json_array();

    part_append_count(a, s->limit, failed);
    part_append_count(a, s->rows, failed);
    part_append_count(a, s->weight, failed);
    part_append_sum(a, &s->energy, failed);
    part_append_time(a, s->from_ms, failed);
    part_append_time(a, s->last_ms < 0 ? TALLY_NO_TIME : s->last_ms, failed);
    part_append_time(a, s->until_ms < 0 ? TALLY_NO_TIME : s->until_ms, failed);
    part_append(a, json_real(s->worst), failed);
    part_append_time(a, s->worst_ms, failed);
    return a;
}

/* Where a time is kept that is behind all others when there is none, and before all others here. */
static int64_t take_late_time(part_list *l)
{
    const int64_t ms = part_take_time(l);

    return ms == TALLY_NO_TIME ? -1 : ms;
}

bool part_stretch_from(const json_t *from, size_t limits, tally_stretch *s)
{
    part_list l = part_list_of(from);

    *s = (tally_stretch){.rows = 0};
    if (json_is_null(from))
        return true;
    s->limit = part_take_count(&l);
    s->rows = part_take_count(&l);
    s->weight = part_take_count(&l);
    s->energy = part_take_sum(&l, PART_SUM_MAX);
    s->from_ms = part_take_time(&l);
    s->last_ms = take_late_time(&l);
    s->until_ms = take_late_time(&l);
    s->worst = part_take_number(&l);
    s->worst_ms = part_take_time(&l);
    return part_list_ended(&l) && s->rows > 0 && s->limit < limits && (s->last_ms < 0) == (s->from_ms == TALLY_NO_TIME)
           && (s->last_ms < 0) == (s->until_ms < 0);
}

json_t *part_beyond_to(const tally_beyond *b, bool *failed)
{
    json_t *a = json_array();

    part_append_count(a, b->judged, failed);
    part_append_count(a, b->judged_weight, failed);
    part_append_count(a, b->runs, failed);
    part_append(a, part_stretch_to(&b->all, failed), failed);
    part_append(a, part_stretch_to(&b->longest, failed), failed);
    part_append(a, part_stretch_to(&b->open, failed), failed);
    part_append(a, json_boolean(b->open_leads), failed);
    part_append(a, part_stretch_to(&b->lead, failed), failed);
    return a;
}

static bool stretch_of(part_list *l, size_t limit, tally_stretch *s)
{
    const json_t *one = part_take(l);

    return one && part_stretch_from(one, TALLY_LIMIT_MAX, s) && (s->rows == 0 || s->limit == limit);
}

bool part_beyond_from(const json_t *from, size_t limit, tally_beyond *b)
{
    part_list l = part_list_of(from);

    b->judged = part_take_count(&l);
    b->judged_weight = part_take_count(&l);
    b->runs = part_take_count(&l);
    if (!stretch_of(&l, limit, &b->all) || !stretch_of(&l, limit, &b->longest) || !stretch_of(&l, limit, &b->open))
        return false;
    const json_t *leads = part_take(&l);

    b->open_leads = json_is_true(leads);
    return json_is_boolean(leads) && stretch_of(&l, limit, &b->lead) && part_list_ended(&l) && (b->runs > 0) == (b->longest.rows > 0)
           && !(b->open_leads && (b->open.rows == 0 || b->lead.rows > 0));
}
