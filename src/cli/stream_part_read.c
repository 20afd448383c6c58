/* SPDX-License-Identifier: MIT */
/* stream_part_read.c - a part file into a tally. */
#include "cli/stream_part.h"

#include "base/error_internal.h"
#include "base/file_text.h"
#include "cli/json_memory.h"
#include "cli/stream_part_internal.h"

#include <errno.h>
#include <stdlib.h>
#include <string.h>

static const char REMEDY[] = "write it anew with --summary-part";

/* What stands behind the plan; the tally is kept or closed. */
static bc_status fill(const json_t *o, const char *path, tally *t, tally **out, bc_error *err)
{
    errno = 0; /* which a call that finds no memory sets, and nothing else here does */
    const char *damaged = part_fill(o, t);
    const bool is_short = errno == ENOMEM;

    if (!damaged) {
        *out = t;
        return BC_OK;
    }
    tally_close(t);
    if (is_short)
        return bc_fail(err, BC_ERR_MEMORY, "not enough memory to read the summary of a part");
    return bc_fail_at(err, BC_ERR_INPUT, path, 0, "its \"%s\" is damaged; %s", damaged, REMEDY);
}

static bc_status take(const json_t *o, const char *path, tally **out, bc_error *err)
{
    const json_t *part = json_object_get(o, "part");
    const char *tool = json_string_value(json_object_get(o, "tool"));
    tally_plan *plan = NULL;

    if (!tool || strcmp(tool, "bluecone") != 0 || !json_is_integer(part))
        return bc_fail_at(err, BC_ERR_INPUT, path, 0, "it is no summary of a part of a log; %s", REMEDY);
    if (json_integer_value(part) != STREAM_PART_VERSION)
        return bc_fail_at(err, BC_ERR_INPUT, path, 0, "it was written by another version of bluecone; %s", REMEDY);
    plan = malloc(sizeof *plan);
    if (!plan)
        return bc_fail(err, BC_ERR_MEMORY, "not enough memory to read the summary of a part");
    if (!part_plan_from(json_object_get(o, "plan"), plan)) {
        free(plan);
        return bc_fail_at(err, BC_ERR_INPUT, path, 0, "its \"plan\" is damaged; %s", REMEDY);
    }
    tally *t = NULL;
    const bc_status status = tally_open(plan, &t, err);

    free(plan);
    if (status != BC_OK)
        return status == BC_ERR_USAGE ? bc_fail_at(err, BC_ERR_INPUT, path, 0, "its \"plan\" is damaged; %s", REMEDY) : status;
    return fill(o, path, t, out, err);
}

bc_status stream_part_read(const char *path, tally **t, bc_error *err)
{
    char *text = NULL;
    size_t length = 0;
    json_error_t where;
    bc_status status = bc_file_text(path, STREAM_PART_BYTES_MAX, &text, &length, err);

    if (status != BC_OK)
        return status;
    json_t *o = json_loadb(text, length, JSON_REJECT_DUPLICATES, &where);

    free(text);
    if (json_memory_was_short()) { /* also when it says nothing: letters are missing then */
        json_decref(o);
        return bc_fail(err, BC_ERR_MEMORY, "not enough memory to read the summary of a part");
    }
    if (!o)
        return bc_fail_at(err, BC_ERR_INPUT, path, where.line, "it is not JSON, or not all of it: %.120s; write it anew with --summary-part",
                          where.text);
    status = take(o, path, t, err);
    json_decref(o);
    return status;
}
