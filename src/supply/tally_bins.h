/* SPDX-License-Identifier: MIT */
/* tally_bins.h - how the weight of a figure is spread over its values, within a known relative accuracy.
 *
 * A sketch of quantiles after Masson, Rim and Lee, "DDSketch", Proc. VLDB Endow. 12 (2019) 2195: bins whose width is
 * in proportion to the value, mergeable by adding. Instead of a logarithm the bins part each octave evenly (their
 * linear interpolation of it): the sign, the exponent and the first `bits` bits of the fraction of a double are the
 * key of its bin. With the middle of the bin for the value the relative error is at most 2^-(bits + 1).
 *
 * When the values fill more than TALLY_BINS_MAX bins, neighbours are joined everywhere and bits falls by one (uniform
 * collapse: Epicoco et al., IEEE Access 8 (2020) 147604). How far it falls depends on the set of values alone, not on
 * their order or partition. Values over 24 octaves, 1 to 16 million, fit with 10 bits in any case: 4.9e-4. */
#ifndef TALLY_BINS_H
#define TALLY_BINS_H

#include <stdbool.h>
#include <stddef.h>
#include <stdint.h>

#define TALLY_BINS_MAX 24576 /* three quarters of the largest table, 512 KiB */
#define TALLY_BINS_BITS 16   /* to begin with: 7.6e-6 */

typedef struct {
    uint32_t key;
    uint64_t weight;         /* 0: the place is free */
} tally_bin;

typedef struct {
    unsigned bits;
    size_t count, room;      /* bins in use; places, a power of two, or 0 */
    uint64_t zero;           /* weight of the value zero */
    tally_bin *bins;         /* hashed; sorted by key once settled */
    size_t negatives;        /* then: bins of negative values */
} tally_bins;

void tally_bins_open(tally_bins *b);
void tally_bins_close(tally_bins *b);

/* False without memory. A weight of 0 adds nothing. */
bool tally_bins_add(tally_bins *b, double value, uint64_t weight);
bool tally_bins_add_key(tally_bins *b, unsigned bits, uint32_t key, uint64_t weight); /* bits: b->bits or more */
bool tally_bins_join(tally_bins *b, const tally_bins *other);

/* Joins neighbours until no more than so many bits are left. */
bool tally_bins_coarsen(tally_bins *b, unsigned bits);

/* Sorts the bins: nothing is added afterwards; then the bins are asked for in the order of their values, 0..count - 1.
 * The value zero stands behind the first `negatives` of them. */
void tally_bins_sort(tally_bins *b);
const tally_bin *tally_bins_at(const tally_bins *b, size_t i);

/* The ends of a bin, low < high but for the last bin of all. */
void tally_bin_ends(unsigned bits, uint32_t key, double *low, double *high);

#endif
