/* SPDX-License-Identifier: MIT */
/* stream_part_groups.c - the groups and the bins of a tally to and from a part file. */
#include "cli/stream_part_internal.h"

#include <math.h>

static json_t *cell_to(const tally_cell *c, bool *failed)
{
    if (c->rows == 0)
        return json_null();
    json_t *a = json_array();

    part_append_count(a, c->rows, failed);
    part_append_count(a, c->weight, failed);
    part_append_sum(a, &c->wx, failed);
    part_append_sum(a, &c->wxx, failed);
    part_append_sum(a, &c->e, failed);
    part_append_sum(a, &c->ex, failed);
    part_append(a, json_real(c->min), failed);
    part_append(a, json_real(c->max), failed);
    part_append_time(a, c->min_ms, failed);
    part_append_time(a, c->max_ms, failed);
    return a;
}

static bool cell_from(const json_t *from, tally_cell *c)
{
    part_list l = part_list_of(from);

    if (json_is_null(from))
        return true;
    c->rows = part_take_count(&l);
    c->weight = part_take_count(&l);
    c->wx = part_take_sum(&l, PART_SUM_MAX);
    c->wxx = part_take_sum(&l, PART_PRODUCT_MAX);
    c->e = part_take_sum(&l, PART_SUM_MAX);
    c->ex = part_take_sum(&l, PART_PRODUCT_MAX);
    c->min = part_take_number(&l);
    c->max = part_take_number(&l);
    c->min_ms = part_take_time(&l);
    c->max_ms = part_take_time(&l);
    return part_list_ended(&l) && c->rows > 0 && c->min <= c->max && fabs(c->min) < TALLY_VALUE_MAX && fabs(c->max) < TALLY_VALUE_MAX;
}

json_t *part_group_to(const tally_group *g, size_t figures, bool *failed)
{
    json_t *a = json_array();

    part_append_count(a, (uint64_t)g->key, failed);
    part_append_count(a, g->rows, failed);
    part_append_count(a, g->weight, failed);
    part_append_count(a, g->outside, failed);
    part_append_count(a, g->outside_weight, failed);
    part_append_sum(a, &g->energy, failed);
    part_append_time(a, g->first_ms, failed);
    part_append_time(a, g->last_ms < 0 ? TALLY_NO_TIME : g->last_ms, failed);
    for (size_t i = 0; i < figures; i++)
        part_append(a, cell_to(&g->cells[i], failed), failed);
    return a;
}

bool part_group_from(const json_t *from, size_t figures, tally_group *g)
{
    part_list l = part_list_of(from);

    g->key = (int64_t)part_take_count(&l);
    g->rows = part_take_count(&l);
    g->weight = part_take_count(&l);
    g->outside = part_take_count(&l);
    g->outside_weight = part_take_count(&l);
    g->energy = part_take_sum(&l, PART_SUM_MAX);
    g->first_ms = part_take_time(&l);
    g->last_ms = part_take_time(&l);
    if (g->last_ms == TALLY_NO_TIME)
        g->last_ms = -1;
    for (size_t i = 0; i < figures && !l.bad; i++) {
        const json_t *cell = part_take(&l);

        l.bad = l.bad || !cell_from(cell, &g->cells[i]) || g->cells[i].rows > g->rows || g->cells[i].weight > g->weight;
    }
    return part_list_ended(&l) && g->outside <= g->rows && g->outside_weight <= g->weight
           && (g->last_ms < 0 ? g->first_ms == TALLY_NO_TIME : g->first_ms <= g->last_ms);
}

bool part_groups_from(const json_t *from, int64_t key_max, size_t most, tally_groups *s)
{
    int64_t before = -1;

    if (!json_is_array(from) || json_array_size(from) > most)
        return false;
    for (size_t i = 0; i < json_array_size(from); i++) {
        const json_t *one = json_array_get(from, i);
        const json_t *key = json_array_get(one, 0);

        if (!json_is_integer(key) || json_integer_value(key) <= before || json_integer_value(key) > key_max)
            return false;
        before = json_integer_value(key);
        tally_group *g = tally_groups_take(s, before);

        if (!g || !part_group_from(one, s->figures, g) || g->rows == 0 || g->last_ms < 0)
            return false;
    }
    return true;
}

json_t *part_bins_to(const tally_bins *b, bool *failed)
{
    json_t *a = json_array();

    part_append_count(a, b->bits, failed);
    part_append_count(a, b->zero, failed);
    for (size_t i = 0; i < b->room; i++) {
        if (b->bins[i].weight == 0)
            continue;
        part_append_count(a, b->bins[i].key, failed);
        part_append_count(a, b->bins[i].weight, failed);
    }
    return a;
}

/* Of a finite value that is not zero. */
static bool is_key(uint64_t key, unsigned bits)
{
    return key >> (12 + bits) == 0 && (key >> bits & 0x7ff) != 0x7ff;
}

bool part_bins_from(const json_t *from, tally_bins *b)
{
    part_list l = part_list_of(from);
    const uint64_t bits = part_take_count(&l);

    b->zero = part_take_count(&l);
    if (l.bad || bits > TALLY_BINS_BITS || !tally_bins_coarsen(b, (unsigned)bits))
        return false;
    const size_t count = (json_array_size(from) - 2) / 2;

    for (size_t i = 0; i < count && count <= TALLY_BINS_MAX; i++) {
        const uint64_t key = part_take_count(&l);
        const uint64_t weight = part_take_count(&l);

        if (l.bad || !is_key(key, b->bits) || weight == 0 || !tally_bins_add_key(b, b->bits, (uint32_t)key, weight))
            return false;
    }
    return part_list_ended(&l) && b->count == count;
}
