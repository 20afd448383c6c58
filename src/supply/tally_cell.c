/* SPDX-License-Identifier: MIT */
/* tally_cell.c - groups of rows: empty, and joined. */
#include "supply/tally_cell.h"

#include <stdlib.h>
#include <string.h>

size_t tally_group_bytes(size_t figures)
{
    return sizeof(tally_group) + figures * sizeof(tally_cell);
}

tally_group *tally_group_open(size_t figures, int64_t key)
{
    tally_group *g = malloc(tally_group_bytes(figures));

    if (g)
        tally_group_clear(g, figures, key);
    return g;
}

void tally_group_clear(tally_group *g, size_t figures, int64_t key)
{
    memset(g, 0, tally_group_bytes(figures));
    g->key = key;
    g->first_ms = TALLY_NO_TIME;
    g->last_ms = -1;
}

static void join_cell(tally_cell *c, const tally_cell *other)
{
    if (other->rows == 0)
        return;
    if (c->rows == 0 || other->min < c->min || (other->min <= c->min && other->min_ms < c->min_ms)) {
        c->min = other->min;
        c->min_ms = other->min_ms;
    }
    if (c->rows == 0 || other->max > c->max || (other->max >= c->max && other->max_ms < c->max_ms)) {
        c->max = other->max;
        c->max_ms = other->max_ms;
    }
    c->rows += other->rows;
    c->weight += other->weight;
    tally_sum_join(&c->wx, &other->wx);
    tally_sum_join(&c->wxx, &other->wxx);
    tally_sum_join(&c->e, &other->e);
    tally_sum_join(&c->ex, &other->ex);
}

void tally_group_join(tally_group *g, const tally_group *other, size_t figures)
{
    g->rows += other->rows;
    g->weight += other->weight;
    g->outside += other->outside;
    g->outside_weight += other->outside_weight;
    tally_sum_join(&g->energy, &other->energy);
    if (other->first_ms < g->first_ms)
        g->first_ms = other->first_ms;
    if (other->last_ms > g->last_ms)
        g->last_ms = other->last_ms;
    for (size_t i = 0; i < figures; i++)
        join_cell(&g->cells[i], &other->cells[i]);
}
