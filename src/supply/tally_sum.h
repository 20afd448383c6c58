/* SPDX-License-Identifier: MIT */
/* tally_sum.h - sums that come out the same in twelve digits whatever way their terms were parted.
 *
 * A sum carries its rounding errors beside it: each addition is TwoSum (Knuth, The Art of Computer Programming 2,
 * 4.2.2), each product TwoProduct (Dekker, Numer. Math. 18 (1971) 224), the errors are summed plainly; that is Sum2
 * and Dot2 of Ogita, Rump and Oishi, SIAM J. Sci. Comput. 26 (2005) 1955, as good as arithmetic of twice the length:
 * the relative error of n terms of one sign is below n^2 2^-106, 1e-14 for a thousand million rows in the worst case.
 * The code rests on IEEE doubles without contraction and without reordering: -ffp-contract=off, no -ffast-math. */
#ifndef TALLY_SUM_H
#define TALLY_SUM_H

typedef struct {
    double sum, error;
} tally_sum;

/* A double, and two halves of 26 bits that add up to it: products of halves are exact. */
typedef struct {
    double value, high, low;
} tally_split;

static inline tally_split tally_split_of(double x)
{
    const double scaled = 134217729.0 * x; /* 2^27 + 1: Dekker's splitting, after Veltkamp */
    const double high = scaled - (scaled - x);

    return (tally_split){x, high, x - high};
}

/* The rounding error of `product`, the rounded product of a and b. */
static inline double tally_product_error(tally_split a, tally_split b, double product)
{
    return ((a.high * b.high - product) + a.high * b.low + a.low * b.high) + a.low * b.low;
}

/* Adds term + error, the error being small beside the term. */
static inline void tally_sum_add(tally_sum *s, double term, double error)
{
    const double sum = s->sum + term;
    const double part = sum - s->sum;

    s->error += ((s->sum - (sum - part)) + (term - part)) + error;
    s->sum = sum;
}

static inline void tally_sum_join(tally_sum *s, const tally_sum *other)
{
    tally_sum_add(s, other->sum, other->error);
}

static inline double tally_sum_value(const tally_sum *s)
{
    return s->sum + s->error;
}

#endif
