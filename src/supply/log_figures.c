/* SPDX-License-Identifier: MIT */
/* log_figures.c - what a settled log says: cover, excursions, distribution. */
#include "supply/log_internal.h"

#include "base/error_internal.h"

#include <stdlib.h>

void bc_log_covers(const bc_log *log, bc_log_cover *cover)
{
    bc_log_cover c = {.rows = log->count, .step_s = log->step_s};

    for (size_t i = 0; i < log->count; i++) {
        const log_row *row = &log->rows[i];

        c.held_s += row->held_s;
        c.energy_j += row->power_w * row->held_s;
        c.flows += row->has_flow;
        c.gaps += row->gap;
        if (row->gap)
            c.gap_s += row[1].time_s - row->time_s - row->held_s;
    }
    if (log->count > 0) {
        c.first_s = log->rows[0].time_s;
        c.last_s = log->rows[log->count - 1].time_s;
    }
    *cover = c;
}

/* An excursion that is going on. */
typedef struct {
    bool on;
    double from_s, held_s;
} run;

static void count_broken(const bc_log *log, size_t limit, size_t i, bc_log_excursions *e, run *r)
{
    const log_row *row = &log->rows[i];
    const bc_limit *of = &log->contract->limits[limit];
    const double value = log_value(log, i, limit);

    if (!r->on) {
        *r = (run){true, row->time_s, 0.0};
        e->runs++;
    }
    r->held_s += row->held_s;
    if (e->broken == 0)
        e->first_s = row->time_s;
    if (e->broken == 0 || bc_limit_margin(of, value) < bc_limit_margin(of, e->worst)) {
        e->worst = value;
        e->worst_s = row->time_s;
    }
    if (r->held_s > e->longest_s || e->broken == 0) {
        e->longest_s = r->held_s;
        e->longest_from_s = r->from_s;
    }
    e->last_s = row->time_s;
    e->broken++;
    e->broken_s += row->held_s;
    e->broken_j += row->power_w * row->held_s;
}

void bc_log_outside(const bc_log *log, size_t limit, bc_log_excursions *excursions)
{
    bc_log_excursions e = {.judged = 0};
    run r = {.on = false};

    for (size_t i = 0; i < log->count; i++) {
        const log_row *row = &log->rows[i];

        if (log_bit(row->known, limit)) {
            e.judged++;
            e.judged_s += row->held_s;
        }
        if (log_bit(row->broken, limit))
            count_broken(log, limit, i, &e, &r);
        else
            r.on = false;
        r.on = r.on && !row->gap;
    }
    *excursions = e;
}

size_t bc_log_any_outside(const bc_log *log, double *held_s)
{
    size_t rows = 0;

    *held_s = 0.0;
    for (size_t i = 0; i < log->count; i++)
        if (log->rows[i].broken != 0) {
            rows++;
            *held_s += log->rows[i].held_s;
        }
    return rows;
}

bool bc_log_held(const bc_log *log, size_t row, double *time_s, double *held_s)
{
    *time_s = log->rows[row].time_s;
    *held_s = log->rows[row].held_s;
    return log->rows[row].gap;
}

bool bc_log_value(const bc_log *log, size_t row, size_t limit, double *value)
{
    if (!log_bit(log->rows[row].known, limit))
        return false;
    *value = log_value(log, row, limit);
    return true;
}

/* A value and its weight. */
typedef struct {
    double value, weight;
} weighted;

static int compare(const void *a, const void *b)
{
    const double x = ((const weighted *)a)->value;
    const double y = ((const weighted *)b)->value;

    return (x > y) - (x < y);
}

/* The least value that a share of the weight does not exceed. */
static double quantile(const weighted all[], size_t count, double total, double share)
{
    double below = 0.0;

    for (size_t i = 0; i < count; i++) {
        below += all[i].weight;
        if (below >= share * total)
            return all[i].value;
    }
    return all[count - 1].value;
}

/* The rows that have the figure; the sum of their weights and, by energy, of their values. */
static size_t gather(const bc_log *log, size_t limit, weighted all[], double *total, bc_log_distribution *d)
{
    size_t count = 0;
    double sum = 0.0;
    double heat = 0.0;
    double heat_sum = 0.0;

    *total = 0.0;
    for (size_t i = 0; i < log->count; i++) {
        const log_row *row = &log->rows[i];

        if (!log_bit(row->known, limit))
            continue;
        const double value = log_value(log, i, limit);
        const double weight = log->step_s > 0.0 ? row->held_s : 1.0;

        all[count++] = (weighted){value, weight};
        *total += weight;
        sum += weight * value;
        heat += row->power_w * weight;
        heat_sum += row->power_w * weight * value;
    }
    d->mean = count > 0 ? sum / *total : 0.0;
    d->has_energy_mean = heat > 0.0;
    d->energy_mean = heat > 0.0 ? heat_sum / heat : 0.0;
    return count;
}

bc_status bc_log_distribute(const bc_log *log, size_t limit, bc_log_distribution *d, bc_error *err)
{
    bc_log_distribution out = {.mean = 0.0};
    double total = 0.0;
    weighted *all = malloc((log->count + 1) * sizeof *all);

    if (!all)
        return bc_fail(err, BC_ERR_MEMORY, "not enough memory for the distribution of %zu rows", log->count);
    const size_t count = gather(log, limit, all, &total, &out);

    if (count == 0) {
        free(all);
        return bc_fail(err, BC_ERR_RANGE, "no row of the log has this figure");
    }
    qsort(all, count, sizeof *all, compare);
    out.min = all[0].value;
    out.max = all[count - 1].value;
    out.p5 = quantile(all, count, total, 0.05);
    out.median = quantile(all, count, total, 0.5);
    out.p95 = quantile(all, count, total, 0.95);
    free(all);
    *d = out;
    return BC_OK;
}
