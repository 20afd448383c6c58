/* SPDX-License-Identifier: MIT */
/* sweep.c - crossings and windows of limits along a line of blends. */
#include "bluecone/sweep.h"

#include "base/root.h"

#define PIECES 128 /* samples: curves of gas quality over a share bend once or twice */
#define BOUNDS_MAX (2 * BC_LIMIT_MAX * BC_CROSSING_MAX + 2)

/* A figure of the line against a value. */
typedef struct {
    const bc_blend_line *line;
    const bc_contract *contract;
    size_t limit;
    double value;
} distance;

void bc_line_shares(const bc_blend_line *line, double t, double share[])
{
    for (size_t i = 0; i < line->mixer->count; i++)
        share[i] = (1.0 - t) * line->from[i] + t * line->to[i];
}

bc_gas bc_line_gas(const bc_blend_line *line, double t)
{
    double share[BC_BLEND_PARTS_MAX];

    bc_line_shares(line, t, share);
    return bc_mixer_gas(line->mixer, share);
}

static bool distance_at(double t, double *y, void *data)
{
    const distance *d = data;
    const bc_gas gas = bc_line_gas(d->line, t);

    if (bc_limit_value(d->contract, d->limit, &gas, y, NULL) != BC_OK)
        return false;
    *y -= d->value;
    return true;
}

static const bc_span WHOLE = {0.0, 1.0, PIECES};

size_t bc_line_crossings(const bc_blend_line *line, const bc_contract *contract, size_t limit, double value, double t[], size_t most)
{
    distance d = {line, contract, limit, value};

    return bc_roots(distance_at, &d, &WHOLE, t, most);
}

bool bc_line_nearest(const bc_blend_line *line, const bc_contract *contract, size_t limit, double value, double *t)
{
    distance d = {line, contract, limit, value};

    return bc_nearest_zero(distance_at, &d, &WHOLE, t);
}

static bool within_all(const bc_blend_line *line, const bc_contract *contract, double t)
{
    const bc_gas gas = bc_line_gas(line, t);

    for (size_t i = 0; i < contract->limit_count; i++) {
        const bc_limit *limit = &contract->limits[i];
        double value = 0.0;

        if (bc_limit_value(contract, i, &gas, &value, NULL) != BC_OK
            || bc_limit_margin(limit, value) < -BC_LIMIT_ROUNDING * bc_limit_scale(limit))
            return false;
    }
    return true;
}

static void insert(double t[], size_t *count, double value)
{
    size_t i = (*count)++;

    for (; i > 0 && t[i - 1] > value; i--)
        t[i] = t[i - 1];
    t[i] = value;
}

/* All places where a bound is crossed, with both ends, ascending. */
static size_t bounds_of(const bc_blend_line *line, const bc_contract *contract, double t[])
{
    size_t count = 0;

    insert(t, &count, 0.0);
    insert(t, &count, 1.0);
    for (size_t i = 0; i < contract->limit_count; i++) {
        const bc_limit *limit = &contract->limits[i];
        const double bound[] = {limit->min, limit->max};
        const bool there[] = {limit->has_min, limit->has_max};

        for (size_t side = 0; side < 2; side++) {
            double crossing[BC_CROSSING_MAX];
            const size_t n = there[side] ? bc_line_crossings(line, contract, i, bound[side], crossing, BC_CROSSING_MAX) : 0;

            for (size_t k = 0; k < n; k++)
                insert(t, &count, crossing[k]);
        }
    }
    return count;
}

/* Adds [low, high], joined with the window before it where they meet. */
static size_t add_window(bc_window window[], size_t count, double low, double high)
{
    if (count > 0 && window[count - 1].high >= low) {
        window[count - 1].high = high;
        return count;
    }
    if (count < BC_WINDOW_MAX)
        window[count++] = (bc_window){low, high};
    return count;
}

size_t bc_line_windows(const bc_blend_line *line, const bc_contract *contract, bc_window window[])
{
    double t[BOUNDS_MAX];
    const size_t bounds = bounds_of(line, contract, t);
    size_t count = 0;

    for (size_t i = 0; i < bounds; i++) {
        if (within_all(line, contract, t[i]))
            count = add_window(window, count, t[i], t[i]);
        if (i + 1 < bounds && t[i + 1] > t[i] && within_all(line, contract, 0.5 * (t[i] + t[i + 1])))
            count = add_window(window, count, t[i], t[i + 1]);
    }
    return count;
}
