/* SPDX-License-Identifier: MIT */
/* stream_part_write.c - a tally into a part file. */
#include "cli/stream_part.h"

#include "base/error_internal.h"
#include "cli/stream_part_internal.h"
#include "output/output_file_internal.h"

#include <math.h>
#include <stdlib.h>
#include <string.h>

static json_t *counts_to(const tally *t, bool *failed)
{
    const uint64_t counts[] = {t->refused, t->flows, t->gaps, t->gap_ms, t->repeats, t->backs, t->untimed, t->all_judged,
                               t->all_judged_weight};
    json_t *a = json_array();

    for (size_t i = 0; i < BC_COUNT(counts); i++)
        part_append_count(a, counts[i], failed);
    return a;
}

static json_t *times_to(const tally *t, bool *failed)
{
    json_t *a = json_array();

    part_append_time(a, t->begin_ms, failed);
    part_append_time(a, t->first_ms, failed);
    part_append_time(a, t->last_ms < 0 ? TALLY_NO_TIME : t->last_ms, failed);
    return a;
}

/* A limit of the last row: null not judged, false kept, a number broken. */
static json_t *standing_to(const tally_pending *p, size_t limit)
{
    if ((p->broken >> limit & 1U) != 0)
        return json_real(p->limit_values[limit]);
    return (p->known >> limit & 1U) != 0 ? json_false() : json_null();
}

static json_t *pending_to(const tally *t, bool *failed)
{
    const tally_pending *p = &t->pending;

    if (!p->there)
        return json_null();
    json_t *a = json_array();

    part_append_time(a, p->ms, failed);
    part_append(a, p->has_flow ? json_real(p->power_w) : json_null(), failed);
    for (size_t i = 0; i < t->plan.figure_count; i++)
        part_append(a, isfinite(p->values[i]) ? json_real(p->values[i]) : json_null(), failed);
    for (size_t i = 0; i < t->plan.limit_count; i++)
        part_append(a, standing_to(p, i), failed);
    return a;
}

static json_t *limits_to(const tally *t, bool *failed)
{
    json_t *a = json_array();

    for (size_t i = 0; i < t->plan.limit_count; i++)
        part_append(a, part_beyond_to(&t->beyond[i], failed), failed);
    return a;
}

static json_t *longest_to(const tally *t, bool *failed)
{
    json_t *a = json_array();

    for (size_t i = 0; i < t->longest.count; i++)
        part_append(a, part_stretch_to(&t->longest.kept[i], failed), failed);
    return a;
}

static json_t *flags_to(const tally *t, bool *failed)
{
    json_t *a = json_array();

    for (size_t i = 0; i < t->plan.flag_count; i++)
        part_append_count(a, t->flagged[i], failed);
    return a;
}

static json_t *all_bins_to(const tally *t, bool *failed)
{
    json_t *a = json_array();

    for (size_t i = 0; i < t->plan.figure_count; i++)
        part_append(a, part_bins_to(&t->bins[i], failed), failed);
    return a;
}

static json_t *tally_to(const tally *t, bool *failed)
{
    json_t *o = json_object();

    part_put(o, "tool", json_string("bluecone"), failed);
    part_put(o, "part", json_integer(STREAM_PART_VERSION), failed);
    part_put(o, "version", json_string(bc_version()), failed);
    part_put(o, "plan", part_plan_to(&t->plan, failed), failed);
    part_put(o, "counts", counts_to(t, failed), failed);
    part_put(o, "times", times_to(t, failed), failed);
    part_put(o, "flagged", flags_to(t, failed), failed);
    part_put(o, "pending", pending_to(t, failed), failed);
    part_put(o, "whole", part_group_to(t->whole, t->plan.figure_count, failed), failed);
    part_put(o, "periods", part_groups_to(&t->periods, failed), failed);
    part_put(o, "doubled", json_integer(t->trend_doubled), failed);
    part_put(o, "trend", part_groups_to(&t->trend, failed), failed);
    part_put(o, "bins", all_bins_to(t, failed), failed);
    part_put(o, "limits", limits_to(t, failed), failed);
    part_put(o, "longest", longest_to(t, failed), failed);
    return o;
}

bc_status stream_part_write(tally *t, const char *path, bc_error *err)
{
    bool failed = false;
    bc_status status = tally_flush(t, err);

    if (status != BC_OK)
        return status;
    json_t *o = tally_to(t, &failed);
    char *text = failed ? NULL : json_dumps(o, JSON_COMPACT | JSON_REAL_PRECISION(17));

    json_decref(o);
    if (!text)
        return bc_fail(err, BC_ERR_MEMORY, "not enough memory to write the summary of a part");
    const size_t length = strlen(text);

    text[length] = '\n'; /* in the place of the final NUL */
    status = output_write(path, text, length + 1, err);
    free(text);
    return status;
}
