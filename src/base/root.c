/* SPDX-License-Identifier: MIT */
/* root.c - roots by sampling, bracketing and Ridders' method; extremes by golden section. */
#include "base/root.h"

#include <math.h>

#define STEPS_MAX 120        /* bisection alone needs 44 for 1e-13 */
#define GOLDEN 0.6180339887498949
#define GOLDEN_STEPS 50      /* 0.618^50 = 4e-11: beyond it an extreme is flat in double precision */
#define TOUCH 1e-13          /* of the largest |y| sampled: an extreme this near to zero touches it */

typedef struct {
    double x, y;
    bool there;
} sample;

typedef struct {
    bc_curve *curve;
    void *data;
    const bc_span *span;
    sample s[BC_PIECES_MAX + 1];
    double largest; /* |y| of the samples */
    double *root;
    size_t count, most;
} search;

static sample sample_at(const search *f, double x)
{
    sample s = {x, 0.0, false};

    s.there = f->curve(x, &s.y, f->data) && isfinite(s.y);
    return s;
}

static void take_samples(search *f)
{
    const size_t pieces = f->span->pieces < BC_PIECES_MAX ? f->span->pieces : BC_PIECES_MAX;

    for (size_t i = 0; i <= pieces; i++) {
        const double part = (double)i / (double)pieces;

        f->s[i] = sample_at(f, i == pieces ? f->span->high : f->span->low + part * (f->span->high - f->span->low));
        if (f->s[i].there)
            f->largest = fmax(f->largest, fabs(f->s[i].y));
    }
}

static bool opposite(const sample *a, const sample *b)
{
    return a->there && b->there && ((a->y < 0.0 && b->y > 0.0) || (a->y > 0.0 && b->y < 0.0));
}

static void add_root(search *f, double x)
{
    size_t i = f->count;

    if (f->count == f->most)
        return;
    for (; i > 0 && f->root[i - 1] > x; i--)
        f->root[i] = f->root[i - 1];
    f->root[i] = x;
    f->count++;
}

/* The part of a bracket in which the curve changes sign, of the three that two points inside leave. */
static void narrow(sample *a, sample *b, const sample *low, const sample *high)
{
    if (opposite(a, low)) {
        *b = *low;
    } else if (opposite(low, high)) {
        *a = *low;
        *b = *high;
    } else {
        *a = *high;
    }
}

/* Ridders, IEEE Transactions on Circuits and Systems 26 (1979) 979: x = m + (m - a) sign(fa) fm/sqrt(fm^2 - fa fb),
 * m the middle. At a point without a value the bracket is given up. */
static void close_bracket(search *f, sample a, sample b)
{
    const double width = BC_ROOT_RELATIVE * (f->span->high - f->span->low);

    for (int step = 0; step < STEPS_MAX && b.x - a.x > width; step++) {
        const sample m = sample_at(f, 0.5 * (a.x + b.x));
        const double root = sqrt(m.y * m.y - a.y * b.y);
        const double way = m.there && root > 0.0 ? copysign(m.y / root, a.y * m.y) : 0.0;
        const sample n = sample_at(f, m.x + (m.x - a.x) * way);

        if (!m.there || !n.there)
            return;
        if (n.y == 0.0 || m.y == 0.0) {
            add_root(f, n.y == 0.0 ? n.x : m.x);
            return;
        }
        narrow(&a, &b, m.x < n.x ? &m : &n, m.x < n.x ? &n : &m);
    }
    add_root(f, fabs(a.y) < fabs(b.y) ? a.x : b.x);
}

/* The point between two samples where |y| is smallest or crosses zero, by golden section. */
static sample sink(const search *f, double low, double high, double sign)
{
    sample a = sample_at(f, high - GOLDEN * (high - low));
    sample b = sample_at(f, low + GOLDEN * (high - low));

    for (int step = 0; step < GOLDEN_STEPS && a.there && b.there; step++) {
        if (sign * a.y < sign * b.y) {
            high = b.x;
            b = a;
            a = sample_at(f, high - GOLDEN * (high - low));
        } else {
            low = a.x;
            a = b;
            b = sample_at(f, low + GOLDEN * (high - low));
        }
    }
    return sign * a.y < sign * b.y ? a : b;
}

static bool is_dip(const sample *s)
{
    return s[0].there && s[1].there && s[2].there && s[0].y * s[1].y > 0.0 && s[1].y * s[2].y > 0.0 && fabs(s[1].y) <= fabs(s[0].y)
           && fabs(s[1].y) <= fabs(s[2].y);
}

/* Three samples on one side of zero with the middle one nearest to it may hide two crossings or a touch. */
static void look_between(search *f, const sample *s)
{
    const sample lowest = sink(f, s[0].x, s[2].x, s[1].y < 0.0 ? -1.0 : 1.0);

    if (opposite(&s[0], &lowest)) {
        close_bracket(f, s[0], lowest);
        close_bracket(f, lowest, s[2]);
    } else if (lowest.there && fabs(lowest.y) <= TOUCH * f->largest) {
        add_root(f, lowest.x);
    }
}

size_t bc_roots(bc_curve *curve, void *data, const bc_span *span, double root[], size_t most)
{
    search f = {.curve = curve, .data = data, .span = span, .root = root, .most = most};
    const size_t pieces = span->pieces < BC_PIECES_MAX ? span->pieces : BC_PIECES_MAX;

    take_samples(&f);
    if (f.largest == 0.0) /* on zero everywhere: it crosses nowhere */
        return 0;
    for (size_t i = 0; i <= pieces; i++) {
        if (f.s[i].there && f.s[i].y == 0.0)
            add_root(&f, f.s[i].x);
        if (i < pieces && opposite(&f.s[i], &f.s[i + 1]))
            close_bracket(&f, f.s[i], f.s[i + 1]);
        if (i + 2 <= pieces && is_dip(&f.s[i]))
            look_between(&f, &f.s[i]);
    }
    return f.count;
}

/* The sample nearest to zero; pieces + 1 when there is none. */
static size_t nearest_sample(const search *f, size_t pieces)
{
    size_t best = pieces + 1;

    for (size_t i = 0; i <= pieces; i++)
        if (f->s[i].there && (best > pieces || fabs(f->s[i].y) < fabs(f->s[best].y)))
            best = i;
    return best;
}

bool bc_nearest_zero(bc_curve *curve, void *data, const bc_span *span, double *x)
{
    search f = {.curve = curve, .data = data, .span = span};
    const size_t pieces = span->pieces < BC_PIECES_MAX ? span->pieces : BC_PIECES_MAX;

    take_samples(&f);
    const size_t best = nearest_sample(&f, pieces);

    if (best > pieces)
        return false;
    const sample low = f.s[best > 0 ? best - 1 : best];
    const sample high = f.s[best < pieces ? best + 1 : best];
    const sample sunk = sink(&f, low.x, high.x, f.s[best].y < 0.0 ? -1.0 : 1.0);

    *x = sunk.there && fabs(sunk.y) < fabs(f.s[best].y) ? sunk.x : f.s[best].x;
    return true;
}
