/* SPDX-License-Identifier: MIT */
/* worst_term.c - a figure over the columns of a space, and linear estimates of what it is divided by. */
#include "supply/worst_internal.h"

#include "base/error_internal.h"
#include "gas/species_index.h"

#include <math.h>

static double largest(const double form[], size_t count)
{
    double most = 0.0;

    for (size_t j = 0; j < count; j++)
        most = fmax(most, fabs(form[j]));
    return most > 0.0 ? most : 1.0;
}

/* Water that a saturated state replaces has to be a constant: the sums would be ratios themselves. */
static bc_status water_share(const bc_worst *w, double *share, bc_error *err)
{
    *share = 0.0;
    for (size_t j = 0; j < w->columns; j++) {
        if (w->species[j] != SPECIES_water)
            continue;
        if (w->bounds.lower[j] < w->bounds.upper[j])
            return bc_fail(err, BC_ERR_RANGE, "a figure of the gas metered saturated replaces its water; give water one fraction, not a window");
        *share = w->bounds.lower[j];
    }
    if (!(*share < 1.0))
        return bc_fail(err, BC_ERR_RANGE, "a gas of nothing but water cannot be metered saturated");
    return BC_OK;
}

bc_status worst_term_of(const bc_worst *w, const bc_ratio *ratio, worst_term *term, bc_error *err)
{
    double water = 0.0;
    const bc_status status = ratio->saturated ? water_share(w, &water, err) : BC_OK;

    if (status != BC_OK)
        return status;
    for (size_t j = 0; j < w->columns; j++) {
        const size_t i = w->species[j];

        term->n[j] = ratio->over[i] / (1.0 - water);
        term->d[j] = ratio->under[i] / (1.0 - water);
        term->s[j] = ratio->factor[i] / (1.0 - water);
    }
    const double n = largest(term->n, w->columns);
    const double d = largest(term->d, w->columns);

    for (size_t j = 0; j < w->columns; j++) {
        term->n[j] /= n;
        term->d[j] /= d;
    }
    term->p = ratio->under_power;
    term->r = ratio->z_power;
    term->q = ratio->pressure;
    term->inverse = ratio->inverse;
    term->unit = ratio->inverse ? ratio->scale * pow(d, term->p) / n : ratio->scale * n / pow(d, term->p);
    term->d_axis = WORST_NO_AXIS;
    term->s_axis = WORST_NO_AXIS;
    return BC_OK;
}

bool worst_is_linear(const worst_term *t)
{
    return t->r == 0.0 && (t->p == 0.0 || t->p == 1.0);
}

double worst_sum(const bc_worst *w, const double form[], const double x[])
{
    double sum = 0.0;

    for (size_t j = 0; j < w->columns; j++)
        sum += form[j] * x[j];
    return sum;
}

/* The powers that occur, without the cost of pow(). */
static double power(double base, double exponent)
{
    if (exponent == 0.0)
        return 1.0;
    if (exponent == 1.0)
        return base;
    return exponent == 0.5 ? sqrt(base) : pow(base, exponent);
}

static double phi_at(const worst_term *t, double d, double s)
{
    return power(d, t->p) * power(1.0 - t->q * s * s, t->r);
}

bool worst_raw(const bc_worst *w, const worst_term *t, const double x[], double *raw)
{
    const double d = t->p > 0.0 ? worst_sum(w, t->d, x) : 1.0;
    const double s = t->r > 0.0 ? worst_sum(w, t->s, x) : 0.0;

    if (!(d > 0.0) || !(1.0 - t->q * s * s > 0.0))
        return false;
    *raw = worst_sum(w, t->n, x) / phi_at(t, d, s);
    return true;
}

double worst_figure(const worst_term *t, double raw)
{
    return t->inverse ? t->unit / raw : t->unit * raw;
}

/* An inverse figure lies above zero: a min that does not is no bound, a max that does not leaves nothing,
 * which a bound out of reach says. */
void worst_raw_window(const worst_term *t, double min, double max, double *lo, double *hi)
{
    const double out_of_reach = 1e300;

    if (!t->inverse) {
        *lo = min / t->unit;
        *hi = max / t->unit;
        return;
    }
    *hi = min > 0.0 ? t->unit / min : HUGE_VAL;
    if (isfinite(max))
        *lo = max > 0.0 ? t->unit / max : out_of_reach;
    else
        *lo = -HUGE_VAL;
}

/* The box of a cell over the two sums of a term; a sum without an axis stands at a constant. */
typedef struct {
    double d[2], s[2], touch_d, touch_s;
} box;

static box box_of(const worst_term *t, const worst_cell *cell)
{
    box b = {{1.0, 1.0}, {0.0, 0.0}, 1.0, 0.0};

    if (t->d_axis != WORST_NO_AXIS) {
        b.d[0] = cell->lo[t->d_axis];
        b.d[1] = cell->hi[t->d_axis];
        b.touch_d = cell->touch[t->d_axis];
    }
    if (t->s_axis != WORST_NO_AXIS) {
        b.s[0] = cell->lo[t->s_axis];
        b.s[1] = cell->hi[t->s_axis];
        b.touch_s = cell->touch[t->s_axis];
    }
    return b;
}

typedef struct {
    double constant, d, s;
} plane;

/* phi is concave, so its tangent plane lies above it. */
static plane tangent(const worst_term *t, double d, double s)
{
    const double phi = phi_at(t, d, s);
    const double by_d = t->p * phi / d;
    const double by_s = -2.0 * t->q * t->r * s * phi / (1.0 - t->q * s * s);

    return (plane){phi - by_d * d - by_s * s, by_d, by_s};
}

static double slope(double rise, double width)
{
    return width > 0.0 ? rise / width : 0.0;
}

/* phi is concave, so a plane that lies below it at the corners of a box does so in all of it. Of the two
 * diagonals one gives two such planes, each through three corners; taken is that over the touching point. */
static plane through_corners(const worst_term *t, const box *b)
{
    const double width_d = b->d[1] - b->d[0];
    const double width_s = b->s[1] - b->s[0];
    const double f00 = phi_at(t, b->d[0], b->s[0]), f01 = phi_at(t, b->d[0], b->s[1]);
    const double f10 = phi_at(t, b->d[1], b->s[0]), f11 = phi_at(t, b->d[1], b->s[1]);
    const double u = slope(b->touch_d - b->d[0], width_d);
    const double v = slope(b->touch_s - b->s[0], width_s);
    const bool falling = f10 + f01 <= f00 + f11;
    const bool low_s = falling ? u + v <= 1.0 : u >= v;  /* rise along d is taken at the lower s */
    const bool low_d = falling ? u + v <= 1.0 : u < v;   /* rise along s is taken at the lower d */
    plane under = {0.0, slope(low_s ? f10 - f00 : f11 - f01, width_d), slope(low_d ? f01 - f00 : f11 - f10, width_s)};

    /* the least of the corners, so that rounding cannot lift the plane over one */
    under.constant = fmin(fmin(f00 - under.d * b->d[0] - under.s * b->s[0], f01 - under.d * b->d[0] - under.s * b->s[1]),
                          fmin(f10 - under.d * b->d[1] - under.s * b->s[0], f11 - under.d * b->d[1] - under.s * b->s[1]));
    return under;
}

double worst_phi_least(const bc_worst *w, const worst_term *t, const worst_cell *cell)
{
    const box b = box_of(t, cell);
    double least = fmin(fmin(phi_at(t, b.d[0], b.s[0]), phi_at(t, b.d[0], b.s[1])),
                        fmin(phi_at(t, b.d[1], b.s[0]), phi_at(t, b.d[1], b.s[1])));

    if (t->p == 1.0) { /* linear, without an axis: no less than its least coefficient */
        least = HUGE_VAL;
        for (size_t j = 0; j < w->columns; j++)
            least = fmin(least, t->d[j]);
    }
    return fmax(least, 0.0);
}

void worst_estimate(const bc_worst *w, const worst_term *t, const worst_cell *cell, bool above, double row[])
{
    const box b = box_of(t, cell);
    const plane p = above || worst_is_linear(t) ? tangent(t, b.touch_d, b.touch_s) : through_corners(t, &b);

    /* the fractions add up to one: a constant is that coefficient for every column */
    for (size_t j = 0; j < w->columns; j++)
        row[j] = p.constant + p.d * t->d[j] + p.s * t->s[j];
}
