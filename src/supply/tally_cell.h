/* SPDX-License-Identifier: MIT */
/* tally_cell.h - the moments and the ends of one figure over some rows, and of all figures together. */
#ifndef TALLY_CELL_H
#define TALLY_CELL_H

#include <stddef.h>
#include <stdint.h>

#include "supply/tally_sum.h"

#define TALLY_NO_TIME INT64_MAX /* of a row without a time: behind all others */

/* A figure over some rows. Weights are milliseconds, or rows; energies W ms, or W rows. */
typedef struct {
    uint64_t rows, weight;
    tally_sum wx, wxx; /* weight times value, and times its square */
    tally_sum e, ex;   /* energy, and times value */
    double min, max;   /* with rows only; the earliest of equal ones */
    int64_t min_ms, max_ms;
} tally_cell;

/* Rows that belong together: all, a period, a step of the trend. */
typedef struct {
    int64_t key;       /* of the period or step */
    uint64_t rows, weight;
    uint64_t outside, outside_weight; /* of rows that break a limit, whichever */
    tally_sum energy;
    int64_t first_ms, last_ms; /* earliest and latest */
    tally_cell cells[];
} tally_group;

/* What a row brings to all its figures. */
typedef struct {
    int64_t ms;
    uint64_t weight;
    tally_split w;
    int has_energy;
    tally_split energy;
} tally_share;

/* NULL without memory. */
tally_group *tally_group_open(size_t figures, int64_t key);
void tally_group_clear(tally_group *g, size_t figures, int64_t key);
void tally_group_join(tally_group *g, const tally_group *other, size_t figures);
size_t tally_group_bytes(size_t figures);

static inline void tally_cell_add(tally_cell *c, double x, const tally_share *share)
{
    const tally_split value = tally_split_of(x);
    const double wx = share->w.value * x;
    const double xx = x * x;
    const tally_split square = tally_split_of(xx);
    const double wxx = share->w.value * xx;

    if (c->rows == 0 || x < c->min || (x <= c->min && share->ms < c->min_ms)) {
        c->min = x;
        c->min_ms = share->ms;
    }
    if (c->rows == 0 || x > c->max || (x >= c->max && share->ms < c->max_ms)) {
        c->max = x;
        c->max_ms = share->ms;
    }
    c->rows++;
    c->weight += share->weight;
    tally_sum_add(&c->wx, wx, tally_product_error(share->w, value, wx));
    tally_sum_add(&c->wxx, wxx,
                  tally_product_error(share->w, square, wxx) + share->w.value * tally_product_error(value, value, xx));
    if (share->has_energy) {
        const double ex = share->energy.value * x;

        tally_sum_add(&c->e, share->energy.value, 0.0);
        tally_sum_add(&c->ex, ex, tally_product_error(share->energy, value, ex));
    }
}

#endif
