/* SPDX-License-Identifier: MIT */
/* log.c - taking in the rows of a log, each judged as it comes, and settling how long they hold. */
#include "supply/log_internal.h"

#include "base/error_internal.h"
#include "supply/row.h"

#include <stdlib.h>

#define FIRST_ROOM 1024

bc_status bc_log_open(const bc_contract *contract, bc_log **log, bc_error *err)
{
    bc_log *l = calloc(1, sizeof *l);

    if (!l)
        return bc_fail(err, BC_ERR_MEMORY, "not enough memory for a log");
    l->contract = contract;
    l->limits = contract->limit_count;
    const bc_status status = bc_reference_at(&contract->state, &l->reference, err);

    if (status == BC_OK)
        *log = l;
    else
        bc_log_close(l);
    return status;
}

void bc_log_close(bc_log *log)
{
    if (!log)
        return;
    free(log->rows);
    free(log->values);
    free(log);
}

static bc_status make_room(bc_log *log, bc_error *err)
{
    const size_t room = log->room > 0 ? 2 * log->room : FIRST_ROOM;

    if (log->count < log->room)
        return BC_OK;
    log_row *rows = realloc(log->rows, room * sizeof *rows);

    if (!rows)
        return bc_fail(err, BC_ERR_MEMORY, "not enough memory for more than %zu rows of a log", log->count);
    log->rows = rows;
    double *values = realloc(log->values, room * (log->limits + 1) * sizeof *values); /* never of no size */

    if (!values)
        return bc_fail(err, BC_ERR_MEMORY, "not enough memory for more than %zu rows of a log", log->count);
    log->values = values;
    log->room = room;
    return BC_OK;
}

bc_status bc_log_add(bc_log *log, const bc_log_row *from, bc_error *err)
{
    log_row row = {.time_s = from->time_s};

    if (log->count > 0 && !(from->time_s > log->rows[log->count - 1].time_s))
        return bc_fail(err, BC_ERR_INPUT, "its time is not after that of the row before");
    bc_status status = make_room(log, err);

    row.has_flow = from->flow.given;
    if (status == BC_OK && row.has_flow)
        status = row_power_w(&log->reference, &from->gas, &from->flow, &row.power_w, err);
    if (status == BC_OK)
        status = row_judge(log->contract, &from->gas, log->values + log->count * log->limits, &row.known, &row.broken, err);
    if (status == BC_OK)
        log->rows[log->count++] = row;
    return status;
}

static int compare(const void *a, const void *b)
{
    const double x = *(const double *)a;
    const double y = *(const double *)b;

    return (x > y) - (x < y);
}

static bc_status find_step(bc_log *log, bc_error *err)
{
    const size_t steps = log->count - 1;

    log->step_s = 0.0;
    if (steps == 0)
        return BC_OK;
    double *all = malloc(steps * sizeof *all);

    if (!all)
        return bc_fail(err, BC_ERR_MEMORY, "not enough memory for the steps of a log");
    for (size_t i = 0; i < steps; i++)
        all[i] = log->rows[i + 1].time_s - log->rows[i].time_s;
    qsort(all, steps, sizeof *all, compare);
    log->step_s = all[steps / 2];
    free(all);
    return BC_OK;
}

bc_status bc_log_settle(bc_log *log, bc_error *err)
{
    if (log->count == 0)
        return bc_fail(err, BC_ERR_INPUT, "the log has no row that can be used");
    const bc_status status = find_step(log, err);

    for (size_t i = 0; i < log->count && status == BC_OK; i++) {
        log_row *row = &log->rows[i];
        const bool last = i + 1 == log->count;
        const double step = last ? log->step_s : row[1].time_s - row->time_s;

        row->gap = !last && step > BC_LOG_GAP * log->step_s;
        row->held_s = row->gap ? log->step_s : step;
    }
    return status;
}
