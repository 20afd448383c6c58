/* SPDX-License-Identifier: MIT */
/* worst_nozzle.c - extremes of a figure behind a nozzle: slices of heat capacity, each with a bound.
 *
 * The figure or its inverse is N g(c)/phi: N and c = cp are linear sums, g falls and is convex (burner_ratio.c). On a
 * slice lo <= c <= hi a chord lies above g, and a line through lo and a point before it lies below; with N in Nl..Nh
 * (McCormick, Math. Program. 10 (1976) 147)
 *   N g <= Nh chord + g(hi) (N - Nh),    N g >= Nl line + g(hi) (N - Nl),
 * which are linear sums, so that the slice has a certified extreme. The slice that promises most is cut until it
 * promises no more than what a gas attains. */
#include "supply/worst_part.h"

#include "base/error_internal.h"

#include <math.h>

#define SLICES_MAX 100              /* an end; burners of a usual contract take up to thirty */
#define GAP (0.95 * BC_WORST_EXACT) /* relative, at which a slice is done; the linear sums take half of it */
#define CUT_MIN 0.05                /* of the width of a slice: a gas nearer to its end cuts it in the middle */
#define BEFORE 1e-3                 /* relative: a point before a slice, near enough for a tangent */

typedef struct {
    double lo, hi; /* of cp */
    double bound;  /* no gas of it is beyond */
    double cut;    /* where to divide it */
} slice;

typedef struct {
    const nozzle_figure *figure;
    bc_ratio form;    /* N/phi */
    double sign;      /* of N g/phi */
    double n;         /* Nh or Nl */
    slice slices[SLICES_MAX];
    size_t count;
    bool found;
    bc_extreme best;
} slicing;

/* N g/phi with N g replaced by the linear sum that is on the safe side of it in a slice. */
static bc_ratio estimate(const slicing *s, double lo, double hi)
{
    const bc_burner_case *set = s->figure->set;
    const burner_ratios *r = s->figure->ratios;
    const double other = s->sign > 0.0 ? hi : lo * (1.0 - BEFORE);
    const double at_lo = burner_nozzle_factor(set, lo), at_hi = burner_nozzle_factor(set, hi);
    const double slope = other > lo || other < lo ? (burner_nozzle_factor(set, other) - at_lo) / (other - lo) : 0.0;
    const double constant = at_lo - slope * lo - at_hi;
    bc_ratio form = s->form;

    for (size_t i = 0; i < BC_SPECIES_CAPACITY; i++)
        form.over[i] = at_hi * s->form.over[i] + s->n * (constant * r->one[i] + slope * r->cp.over[i]);
    return form;
}

static bc_status extreme_of(bc_worst *w, const bc_ratio *form, double sign, bc_extreme *extreme, bc_error *err)
{
    worst_term term;
    bc_status status = worst_term_of(w, form, &term, err);

    if (status == BC_OK)
        status = worst_add_axes(w, &term, err);
    if (status == BC_OK)
        status = worst_extreme(w, &term, sign, extreme, err);
    if (status == BC_OK && !extreme->bounded)
        return bc_fail(err, BC_ERR_SOLVER, "nothing is proven of a slice of heat capacity");
    return status;
}

/* What the gas of a slice attains, and where it would divide the slice. */
static bc_status attain(slicing *s, slice *piece, const bc_gas *gas, bc_error *err)
{
    const double margin = CUT_MIN * (piece->hi - piece->lo);
    double cp = 0.0;
    double value = 0.0;
    bc_status status = bc_ratio_evaluate(&s->figure->ratios->cp, gas, &cp, err);

    if (status == BC_OK)
        status = bc_ratio_evaluate(&s->form, gas, &value, err);
    if (status != BC_OK)
        return status;
    value *= burner_nozzle_factor(s->figure->set, cp);
    piece->cut = cp > piece->lo + margin && cp < piece->hi - margin ? cp : 0.5 * (piece->lo + piece->hi);
    if (!s->found || s->sign * (value - s->best.value) > 0.0)
        s->best = (bc_extreme){.value = value, .gas = *gas};
    s->found = true;
    return BC_OK;
}

/* Adds a slice unless no gas is in it. */
static bc_status add_slice(bc_worst *w, slicing *s, slice piece, bc_error *err)
{
    const bc_ratio form = estimate(s, piece.lo, piece.hi);
    bc_extreme extreme;
    bc_status status = worst_impose(w, &s->figure->ratios->cp, piece.lo, piece.hi, err);

    if (status != BC_OK)
        return status;
    if (!w->empty) {
        status = extreme_of(w, &form, s->sign, &extreme, err);
        if (status == BC_OK)
            status = attain(s, &piece, &extreme.gas, err);
        if (status == BC_OK) {
            piece.bound = s->sign * fmin(s->sign * piece.bound, s->sign * extreme.bound);
            s->slices[s->count++] = piece;
        }
    }
    worst_lift(w);
    return status;
}

static size_t most_promising(const slicing *s)
{
    size_t best = 0;

    for (size_t i = 1; i < s->count; i++)
        if (s->sign * (s->slices[i].bound - s->slices[best].bound) > 0.0)
            best = i;
    return best;
}

/* Cuts slices until the best gas is proven. */
static bc_status settle(bc_worst *w, slicing *s, const bc_extremes *cp, bc_error *err)
{
    bc_status status = add_slice(w, s, (slice){cp->min.bound, cp->max.bound, s->sign * HUGE_VAL, 0.0}, err);

    for (int cuts = 0; status == BC_OK && s->count > 0 && cuts + 2 < SLICES_MAX; cuts++) {
        const size_t i = most_promising(s);
        const slice piece = s->slices[i];

        if (s->sign * (piece.bound - s->best.value) <= GAP * fabs(s->best.value)) {
            s->best.bounded = s->best.exact = true;
            s->best.bound = s->sign * fmax(s->sign * piece.bound, s->sign * s->best.value);
            return BC_OK;
        }
        s->slices[i] = s->slices[--s->count];
        status = add_slice(w, s, (slice){piece.lo, piece.cut, piece.bound, 0.0}, err);
        if (status == BC_OK)
            status = add_slice(w, s, (slice){piece.cut, piece.hi, piece.bound, 0.0}, err);
    }
    return status != BC_OK ? status : bc_fail(err, BC_ERR_SOLVER, "slices of heat capacity proved nothing");
}

/* N/phi back to the figure. */
static void scale(const bc_ratio *form, bc_extreme *e)
{
    e->value = form->inverse ? form->scale / e->value : form->scale * e->value;
    e->bound = form->inverse ? form->scale / e->bound : form->scale * e->bound;
}

/* The whole of cp, and the N that encloses the product. */
static bc_status measure(bc_worst *w, slicing *s, bc_extremes *cp, bc_error *err)
{
    bc_ratio sum = s->form;
    bc_extremes n;

    sum.under_power = sum.z_power = 0.0;
    bc_status status = worst_certify(w, &s->figure->ratios->cp, cp, err);

    if (status == BC_OK)
        status = worst_certify(w, &sum, &n, err);
    if (status != BC_OK)
        return status;
    if (s->figure->form->inverse && !(n.min.value > 0.0))
        return bc_fail(err, BC_ERR_RANGE, "an allowed gas does not burn: it has no air factor");
    if (!(cp->min.bounded && cp->max.bounded && cp->min.bound > 0.0 && n.min.bounded && n.min.bound > 0.0 && n.max.bounded))
        return bc_fail(err, BC_ERR_SOLVER, "nothing is proven of heat capacity, heat or air");
    s->n = s->sign > 0.0 ? n.max.bound : n.min.bound;
    return BC_OK;
}

static bc_status find_end(bc_worst *w, const nozzle_figure *figure, double sign, bc_extreme *extreme, bc_error *err)
{
    const bc_ratio *form = figure->form;
    slicing s = {.figure = figure, .form = *form, .sign = form->inverse ? -sign : sign};
    bc_extremes cp;

    s.form.inverse = false;
    s.form.scale = 1.0;
    bc_status status = measure(w, &s, &cp, err);

    if (status == BC_OK)
        status = settle(w, &s, &cp, err);
    if (status != BC_OK)
        return status;
    scale(form, &s.best);
    *extreme = s.best;
    return BC_OK;
}

bc_status worst_certify_nozzle(bc_worst *w, const nozzle_figure *figure, bc_extremes *extremes, bc_error *err)
{
    bc_extremes found;
    bc_status status = find_end(w, figure, -1.0, &found.min, err);

    if (status == BC_OK)
        status = find_end(w, figure, 1.0, &found.max, err);
    if (status == BC_OK)
        *extremes = found;
    return status;
}
