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

/* Where the part goes, piece by piece: as a whole the tree of a part is a hundred times its tally. */
typedef struct {
    output_stream out;
    bool failed;     /* without memory */
    bc_status status;
    bc_error *err;
} part_writer;

static void put_text(part_writer *w, const char *text)
{
    if (w->status == BC_OK)
        w->status = output_put(&w->out, text, strlen(text), w->err);
}

static void put_value(part_writer *w, json_t *value)
{
    char *text = w->failed || w->status != BC_OK ? NULL : json_dumps(value, JSON_COMPACT | JSON_ENCODE_ANY | JSON_REAL_PRECISION(17));

    json_decref(value);
    if (text)
        put_text(w, text);
    else
        w->failed = true;
    free(text);
}

static void put_member(part_writer *w, const char *key, json_t *value)
{
    put_text(w, ",\"");
    put_text(w, key);
    put_text(w, "\":");
    put_value(w, value);
}

static void put_groups(part_writer *w, const char *key, const tally_groups *s)
{
    put_text(w, ",\"");
    put_text(w, key);
    put_text(w, "\":[");
    for (size_t i = 0; i < s->count; i++) {
        put_text(w, i > 0 ? "," : "");
        put_value(w, part_group_to(s->groups[i], s->figures, &w->failed));
    }
    put_text(w, "]");
}

static void put_tally(part_writer *w, const tally *t)
{
    put_text(w, "{\"tool\":");
    put_value(w, json_string("bluecone"));
    put_member(w, "part", json_integer(STREAM_PART_VERSION));
    put_member(w, "version", json_string(bc_version()));
    put_member(w, "plan", part_plan_to(&t->plan, &w->failed));
    put_member(w, "counts", counts_to(t, &w->failed));
    put_member(w, "times", times_to(t, &w->failed));
    put_member(w, "flagged", flags_to(t, &w->failed));
    put_member(w, "pending", pending_to(t, &w->failed));
    put_member(w, "whole", part_group_to(t->whole, t->plan.figure_count, &w->failed));
    put_groups(w, "periods", &t->periods);
    put_member(w, "doubled", json_integer(t->trend_doubled));
    put_groups(w, "trend", &t->trend);
    put_member(w, "bins", all_bins_to(t, &w->failed));
    put_member(w, "limits", limits_to(t, &w->failed));
    put_member(w, "longest", longest_to(t, &w->failed));
    put_text(w, "}\n");
}

bc_status stream_part_write(tally *t, const char *path, bc_error *err)
{
    part_writer w = {.status = tally_flush(t, err), .err = err};

    if (w.status == BC_OK)
        w.status = output_open(&w.out, path, err);
    if (w.status != BC_OK)
        return w.status;
    put_tally(&w, t);
    if (w.status == BC_OK && !w.failed)
        return output_finish(&w.out, err);
    output_discard(&w.out);
    return w.status != BC_OK ? w.status : bc_fail(err, BC_ERR_MEMORY, "not enough memory to write the summary of a part");
}
