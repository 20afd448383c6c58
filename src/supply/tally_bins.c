/* SPDX-License-Identifier: MIT */
/* tally_bins.c - the bins of a spread: a hash table with linear probing that grows, then coarsens. */
#include "supply/tally_bins.h"

#include <assert.h>
#include <float.h>
#include <stdlib.h>
#include <string.h>

#define FIRST_ROOM 256
#define LAST_ROOM 32768
#define FRACTION_BITS 52

static_assert(sizeof(double) == sizeof(uint64_t) && DBL_MANT_DIG == FRACTION_BITS + 1, "keys are bits of an IEEE double");
static_assert(TALLY_BINS_MAX < LAST_ROOM, "a search must end at a free place");

void tally_bins_open(tally_bins *b)
{
    *b = (tally_bins){.bits = TALLY_BINS_BITS};
}

void tally_bins_close(tally_bins *b)
{
    free(b->bins);
    tally_bins_open(b);
}

/* Fibonacci hashing: neighbouring keys fall far apart (Knuth, The Art of Computer Programming 3, 6.4). */
static size_t place_of(const tally_bin bins[], size_t room, uint32_t key)
{
    size_t i = (size_t)((key * UINT32_C(2654435769)) >> 17) & (room - 1);

    while (bins[i].weight != 0 && bins[i].key != key)
        i = (i + 1) & (room - 1);
    return i;
}

/* The bins in another table, with keys of so many bits less. */
static void move(tally_bins *b, tally_bin to[], size_t room, unsigned less)
{
    size_t count = 0;

    for (size_t i = 0; i < b->room; i++) {
        const tally_bin from = b->bins[i];

        if (from.weight == 0)
            continue;
        tally_bin *bin = &to[place_of(to, room, from.key >> less)];

        count += bin->weight == 0;
        bin->key = from.key >> less;
        bin->weight += from.weight;
    }
    free(b->bins);
    b->bins = to;
    b->room = room;
    b->count = count;
    b->bits -= less;
}

static bool grow(tally_bins *b, size_t room)
{
    tally_bin *to = calloc(room, sizeof *to);

    if (to)
        move(b, to, room, 0);
    return to != NULL;
}

static bool coarsen(tally_bins *b, unsigned less)
{
    tally_bin *to = calloc(b->room, sizeof *to);

    if (to)
        move(b, to, b->room, less);
    return to != NULL;
}

bool tally_bins_coarsen(tally_bins *b, unsigned bits)
{
    if (b->room == 0)
        b->bits = bits;
    return b->bits <= bits || coarsen(b, b->bits - bits);
}

/* Room for one bin more; the table is kept three quarters full at most. */
static bool make_room(tally_bins *b)
{
    if (b->room == 0)
        return grow(b, FIRST_ROOM);
    if (b->count < b->room / 4 * 3)
        return true;
    return b->room >= LAST_ROOM || grow(b, 2 * b->room);
}

bool tally_bins_add_key(tally_bins *b, unsigned bits, uint32_t key, uint64_t weight)
{
    if (weight == 0)
        return true;
    if (b->room == 0 && !make_room(b))
        return false;
    tally_bin *bin = &b->bins[place_of(b->bins, b->room, key >> (bits - b->bits))];

    if (bin->weight == 0) {
        if (!make_room(b))
            return false;
        bin = &b->bins[place_of(b->bins, b->room, key >> (bits - b->bits))];
        bin->key = key >> (bits - b->bits);
        b->count++;
    }
    bin->weight += weight;
    while (b->count > TALLY_BINS_MAX)
        if (!coarsen(b, 1))
            return false;
    return true;
}

bool tally_bins_add(tally_bins *b, double value, uint64_t weight)
{
    uint64_t word = 0;

    if (!(value < 0.0) && !(value > 0.0)) {
        b->zero += weight;
        return true;
    }
    memcpy(&word, &value, sizeof word);
    return tally_bins_add_key(b, b->bits, (uint32_t)(word >> (FRACTION_BITS - b->bits)), weight);
}

bool tally_bins_join(tally_bins *b, const tally_bins *other)
{
    bool done = tally_bins_coarsen(b, other->bits);

    b->zero += other->zero;
    for (size_t i = 0; i < other->room && done; i++)
        done = tally_bins_add_key(b, other->bits, other->bins[i].key, other->bins[i].weight);
    return done;
}

void tally_bin_ends(unsigned bits, uint32_t key, double *low, double *high)
{
    const uint64_t negative = (uint64_t)key >> (11 + bits) << 63;
    const uint64_t near = ((uint64_t)key << (FRACTION_BITS - bits)) & (UINT64_MAX >> 1);
    const uint64_t far = near + ((uint64_t)1 << (FRACTION_BITS - bits));
    const uint64_t words[2] = {near | negative, far | negative};
    double ends[2];

    memcpy(ends, words, sizeof ends);
    *low = negative ? ends[1] : ends[0];
    *high = negative ? ends[0] : ends[1];
}

static int compare(const void *a, const void *b)
{
    const uint32_t x = ((const tally_bin *)a)->key;
    const uint32_t y = ((const tally_bin *)b)->key;

    return (x > y) - (x < y);
}

void tally_bins_sort(tally_bins *b)
{
    size_t count = 0;

    for (size_t i = 0; i < b->room; i++)
        if (b->bins[i].weight != 0)
            b->bins[count++] = b->bins[i];
    if (count > 0)
        qsort(b->bins, count, sizeof *b->bins, compare);
    b->count = count;
    b->negatives = 0;
    while (b->negatives < count && b->bins[count - 1 - b->negatives].key >> (11 + b->bits) != 0)
        b->negatives++;
}

/* Keys of negative values are above all others, and ascend with the magnitude. */
const tally_bin *tally_bins_at(const tally_bins *b, size_t i)
{
    return &b->bins[i < b->negatives ? b->count - 1 - i : i - b->negatives];
}
