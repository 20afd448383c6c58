/* SPDX-License-Identifier: MIT */
/* printed.c - which state explains printed figures: all states of the trade, ranked. */
#include "bluecone/printed.h"

#include "base/compiler.h"
#include "base/error_internal.h"
#include "base/text.h"
#include "bluecone/number.h"
#include "bluecone/quantity.h"
#include "supply/partner_quantity.h"

#include <math.h>
#include <stdio.h>
#include <string.h>

#define F60 ((60.0 - 32.0) / 1.8)
#define PSIA_14_73 (14.73 * 0.45359237 * 9.80665 / (0.0254 * 0.0254))
#define EDGE 1e-9       /* of a half digit: a figure on the edge of rounding belongs to it */
#define EXPANSION 2.0   /* coverage factor of the expanded uncertainty, about 95 % */

/* Half of the last digit of a written number: "41.20" 0.005, "1.2e3" 50. */
static double half_digit(const char *number, size_t length)
{
    int decimals = 0;
    bool point = false;
    const char *exponent = NULL;

    for (size_t i = 0; i < length; i++) {
        if (number[i] == 'e' || number[i] == 'E') {
            exponent = number + i + 1;
            break;
        }
        decimals += point && number[i] >= '0' && number[i] <= '9';
        point = point || number[i] == '.';
    }
    double power = 0.0;
    const char *rest = NULL;

    if (exponent && bc_number_prefix(exponent, &power, &rest, NULL) != BC_OK)
        power = 0.0;
    return 0.5 * pow(10.0, power - decimals);
}

#define PRINTED_MOST 1e30 /* and its inverse: residuals are counted in half digits, and stay finite */

bc_status bc_printed_add(bc_printed *p, const char *id, const char *text, bc_error *err)
{
    bc_printed_figure f = {.half = 0.0};
    const char *rest = NULL;
    bc_status status = bc_quantity_find(id, &f.quantity, err);

    if (status == BC_OK && p->count == BC_PRINTED_MAX)
        return bc_fail(err, BC_ERR_USAGE, "more than %d printed figures", BC_PRINTED_MAX);
    if (status == BC_OK)
        status = bc_number_prefix(text, &f.value, &rest, err);
    if (status != BC_OK)
        return status;
    const char *own = bc_quantity_at(f.quantity)->unit;

    f.half = half_digit(text, (size_t)(rest - text));
    if (!(f.half >= 1.0 / PRINTED_MOST && f.half <= PRINTED_MOST && fabs(f.value) <= PRINTED_MOST))
        return bc_fail(err, BC_ERR_USAGE, "%.40s is no figure that a certificate prints; correct the number", text);
    (void)snprintf(f.unit, sizeof f.unit, "%s", rest[0] != '\0' ? rest : own);
    status = bc_unit_parse(own, &f.own, err);
    if (status == BC_OK)
        status = bc_unit_parse(f.unit, &f.shown, err);
    if (status == BC_OK && !bc_unit_matches(&f.own, &f.shown))
        return bc_fail(err, BC_ERR_USAGE, "the unit %.40s does not fit %s, which is in %s", f.unit, id, own);
    if (status == BC_OK)
        p->figures[p->count++] = f;
    return status;
}

/* What all states share: the question and the relative uncertainties, which hardly hang on the state. */
typedef struct {
    const bc_printed *printed;
    const bc_gas *gas;
    double u[BC_PRINTED_MAX]; /* standard, in the printed unit */
} question;

static bc_status take_uncertainty(question *q, const bc_spread *spread)
{
    const bc_state state = bc_state_default();
    bc_reference reference;
    bc_subject subject;
    bc_status status = bc_reference_at(&state, &reference, NULL);

    if (status == BC_OK)
        status = bc_subject_make(&reference, q->gas, spread, &subject, NULL);
    for (size_t i = 0; i < q->printed->count && status == BC_OK; i++) {
        const bc_printed_figure *f = &q->printed->figures[i];
        bc_figure figure;

        q->u[i] = 0.0;
        if (bc_quantity_evaluate(f->quantity, &subject, &figure, NULL) == BC_OK && figure.has_u)
            q->u[i] = figure.u * f->own.factor / f->shown.factor;
    }
    return status;
}

/* Residuals and class of a fit whose state is set; false when the gas lacks a figure there. */
static bool judge(const question *q, const bc_subject *subject, bc_fit *fit)
{
    fit->worst = 0.0;
    fit->fit = BC_FIT_DIGITS;
    for (size_t i = 0; i < q->printed->count; i++) {
        const bc_printed_figure *f = &q->printed->figures[i];
        size_t quantity = fit->exchanged ? partner_quantity(f->quantity, PARTNER_HEAT) : f->quantity;
        double own = 0.0;

        if (fit->ideal)
            quantity = partner_quantity(quantity, PARTNER_IDEAL);
        if (bc_quantity_value(quantity, subject, &own, NULL) != BC_OK)
            return false;
        const double residual = bc_unit_from_si(&f->shown, bc_unit_to_si(&f->own, own)) - f->value;

        fit->residual[i] = residual;
        fit->worst = fmax(fit->worst, fabs(residual) / f->half);
        if (fabs(residual) > f->half * (1.0 + EDGE) && fit->fit == BC_FIT_DIGITS)
            fit->fit = BC_FIT_UNCERTAINTY;
        if (fabs(residual) > f->half + EXPANSION * q->u[i])
            fit->fit = BC_FIT_NONE;
    }
    return true;
}

/* Pairs of temperatures that the trade uses, the commonest first. */
static int pair_oddity(const bc_state *s)
{
    static const double PAIRS[][2] = {{15.0, 15.0}, {25.0, 0.0}, {0.0, 0.0}, {15.0, 0.0}, {F60, F60}, {20.0, 20.0}, {25.0, 20.0}, {25.0, 15.0}, {20.0, 0.0}};

    for (size_t i = 0; i < BC_COUNT(PAIRS); i++)
        if (s->combustion_c == PAIRS[i][0] && s->metering_c == PAIRS[i][1])
            return (int)i;
    return 12;
}

/* Readings that somebody would have to have confused. */
static int confusions_of(const bc_fit *f)
{
    return (f->exchanged ? 3 : 0) + (f->ideal ? 2 : 0) + (f->state.saturated ? 2 : 0) + (f->state.metering_pa != BC_P0_PA ? 1 : 0);
}

/* Counted so that one confusion more outweighs any pair of temperatures. */
static int oddity_of(const bc_fit *f)
{
    return 26 * confusions_of(f) + 2 * pair_oddity(&f->state) + (f->state.edition == 2016 ? 0 : 1);
}

/* What explains stands before what does not. Among those: fewer confusions, since an analysis is not exact to the last
 * digit either; then the class; then plainness. The rest by the worst residual. */
static bool is_better(const bc_fit *a, const bc_fit *b)
{
    if ((a->fit == BC_FIT_NONE) != (b->fit == BC_FIT_NONE))
        return b->fit == BC_FIT_NONE;
    if (a->fit != BC_FIT_NONE && confusions_of(a) != confusions_of(b))
        return confusions_of(a) < confusions_of(b);
    if (a->fit != b->fit)
        return a->fit < b->fit;
    if (a->fit == BC_FIT_DIGITS && a->oddity != b->oddity)
        return a->oddity < b->oddity;
    return a->worst != b->worst ? a->worst < b->worst : a->oddity < b->oddity;
}

/* The best so far, in order. */
typedef struct {
    bc_fits fits;
    size_t of_class[BC_FIT_NONE + 1];
} ranking;

static void insert(ranking *r, const bc_fit *fit)
{
    bc_fits *f = &r->fits;
    size_t at = f->count;

    r->of_class[fit->fit]++;
    while (at > 0 && is_better(fit, &f->best[at - 1]))
        at--;
    if (at == BC_FIT_MAX)
        return;
    if (f->count < BC_FIT_MAX)
        f->count++;
    memmove(&f->best[at + 1], &f->best[at], (f->count - at - 1) * sizeof *f->best);
    f->best[at] = *fit;
}

/* One state, with all readings of it. */
static void try_state(const question *q, const bc_state *state, ranking *r)
{
    bc_reference reference;
    bc_subject subject;

    if (bc_reference_at(state, &reference, NULL) != BC_OK || bc_subject_make(&reference, q->gas, NULL, &subject, NULL) != BC_OK)
        return;
    for (unsigned reading = 0; reading < 4; reading++) {
        bc_fit fit = {.state = *state, .ideal = (reading & 1U) != 0, .exchanged = (reading & 2U) != 0};

        fit.oddity = oddity_of(&fit);
        if (judge(q, &subject, &fit))
            insert(r, &fit);
    }
}

static void try_temperatures(const question *q, const bc_state *like, ranking *r)
{
    static const double TEMPERATURES_C[] = {0.0, 15.0, F60, 20.0, 25.0};

    for (size_t t1 = 0; t1 < BC_COUNT(TEMPERATURES_C); t1++)
        for (size_t t2 = 0; t2 < BC_COUNT(TEMPERATURES_C); t2++) {
            bc_state state = *like;

            state.combustion_c = TEMPERATURES_C[t1];
            state.metering_c = TEMPERATURES_C[t2];
            try_state(q, &state, r);
        }
}

bc_status bc_printed_fit(const bc_printed *printed, const bc_gas *gas, const bc_spread *spread, bc_fits *fits, bc_error *err)
{
    question q = {.printed = printed, .gas = gas};
    ranking r = {.fits = {.count = 0}};
    bc_status status = BC_OK;

    if (printed->count == 0)
        return bc_fail(err, BC_ERR_USAGE, "no printed figures are given; write them as hhv=41.21MJ/m3");
    status = take_uncertainty(&q, spread);
    for (unsigned kind = 0; kind < 8 && status == BC_OK; kind++) {
        bc_state like = bc_state_default();

        like.edition = (kind & 1U) != 0 ? 1995 : 2016;
        like.saturated = (kind & 2U) != 0;
        like.metering_pa = (kind & 4U) != 0 ? PSIA_14_73 : BC_P0_PA;
        try_temperatures(&q, &like, &r);
    }
    if (status != BC_OK || r.fits.count == 0)
        return bc_fail(err, BC_ERR_RANGE, "the gas does not have the printed figures at any state");
    r.fits.explain = r.fits.best[0].fit == BC_FIT_NONE ? 0 : r.of_class[r.fits.best[0].fit];
    *fits = r.fits;
    return BC_OK;
}
