/* SPDX-License-Identifier: MIT */
/* tally_percentile.c - percentiles and bars from the bins of a settled tally. */
#include "supply/tally_internal.h"

#include <math.h>

/* The bins in the order of values, the value zero among them. */
typedef struct {
    double low, high;
    uint64_t weight;
} part;

static size_t part_count(const tally_bins *b)
{
    return b->count + (b->zero > 0);
}

/* A bin, cut to what the figure was. */
static part part_at(const tally *t, size_t figure, size_t i)
{
    const tally_bins *b = &t->bins[figure];
    const tally_cell *c = &t->whole->cells[figure];
    part p = {.weight = b->zero};

    if (b->zero > 0 && i == b->negatives)
        return p;
    const tally_bin *bin = tally_bins_at(b, i - (b->zero > 0 && i > b->negatives));

    tally_bin_ends(b->bits, bin->key, &p.low, &p.high);
    p.low = fmax(p.low, c->min);
    p.high = fmin(p.high, c->max);
    p.weight = bin->weight;
    return p;
}

bool tally_percentile(const tally *t, size_t figure, double share, double *value)
{
    const double wanted = share * (double)t->whole->cells[figure].weight;
    const size_t count = part_count(&t->bins[figure]);
    uint64_t below = 0;

    for (size_t i = 0; i < count; i++) {
        const part p = part_at(t, figure, i);

        below += p.weight;
        *value = p.low + 0.5 * (p.high - p.low);
        if ((double)below >= wanted)
            break;
    }
    return count > 0;
}

double tally_accuracy(const tally *t, size_t figure)
{
    return ldexp(0.5, -(int)t->bins[figure].bits);
}

/* The weight of a bin is taken to be spread evenly over it. */
static void pour(const part *p, double weight, double low, double width, size_t bars, double held[])
{
    const double last = (double)bars - 1.0;
    const double from = fmin(fmax((p->low - low) / width, 0.0), last + 1.0);
    const double until = fmin(fmax((p->high - low) / width, 0.0), last + 1.0);
    const size_t first = (size_t)fmin(floor(from), last);
    const size_t end = (size_t)fmin(floor(until), last);

    if (first == end) {
        held[first] += weight;
        return;
    }
    for (size_t k = first; k <= end; k++)
        held[k] += weight * (fmin(until, (double)k + 1.0) - fmax(from, (double)k)) / (until - from);
}

void tally_bars(const tally *t, size_t figure, double low, double high, size_t bars, double held[])
{
    const double width = (high - low) / (double)bars;

    for (size_t k = 0; k < bars; k++)
        held[k] = 0.0;
    for (size_t i = 0; i < part_count(&t->bins[figure]); i++) {
        const part p = part_at(t, figure, i);

        pour(&p, (double)p.weight / (t->step_ms > 0 ? TALLY_MS : 1.0), low, width, bars, held);
    }
}
