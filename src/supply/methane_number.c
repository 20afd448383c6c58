/* SPDX-License-Identifier: MIT */
/* methane_number.c - the two routes of ISO/TR 22302 to a methane number. */
#include "bluecone/methane_number.h"

#include "base/error_internal.h"
#include "supply/index_internal.h"

#include <math.h>

#define RATIO_MAX 4.0   /* methane */
#define INERT_MAX 0.05  /* of the H/C route, value from memory */

static const struct {
    bool listed;
    double coefficient;
} LINEAR[PART_COUNT] = {
#define MON_LINEAR(group, coefficient, source) [PART_##group] = {true, coefficient},
#define MON_RATIO(power, coefficient, source)
#define MN_REGRESSION(name, slope, constant, source)
#include "data/methane_number.def"
};

static const double RATIO[] = {
#define MON_LINEAR(group, coefficient, source)
#define MON_RATIO(power, coefficient, source) [power] = coefficient,
#define MN_REGRESSION(name, slope, constant, source)
#include "data/methane_number.def"
};

enum { ISO, OTHER };

static const struct {
    double slope, constant;
} REGRESSIONS[] = {
#define MON_LINEAR(group, coefficient, source)
#define MON_RATIO(power, coefficient, source)
#define MN_REGRESSION(name, slope, constant, source) [name] = {slope, constant},
#include "data/methane_number.def"
};

static double methane_number(double mon, size_t regression)
{
    return REGRESSIONS[regression].slope * mon + REGRESSIONS[regression].constant;
}

/* Horner over the powers of R. */
static double octane_of_ratio(double r)
{
    double mon = 0.0;

    for (size_t i = sizeof RATIO / sizeof *RATIO; i-- > 0;)
        mon = mon * r + RATIO[i];
    return mon;
}

static double octane_of_parts(const constituents *c)
{
    double mon = 0.0;

    for (size_t p = 0; p < PART_COUNT; p++)
        mon += LINEAR[p].coefficient * c->x[p];
    return mon;
}

/* Above 4 only by rounding: pure methane is 4 itself. */
static bool ratio_holds(double ratio)
{
    return ratio >= BC_METHANE_NUMBER_HC_MIN && ratio <= RATIO_MAX * (1.0 + 1e-9);
}

bc_status bc_motor_octane(double ratio, double *mon, bc_error *err)
{
    if (!ratio_holds(ratio))
        return bc_fail(err, BC_ERR_RANGE, "a hydrogen-carbon ratio of %.6g is outside %g to %g", ratio, BC_METHANE_NUMBER_HC_MIN, RATIO_MAX);
    *mon = octane_of_ratio(ratio);
    return BC_OK;
}

/* Why a gas has no methane number by these routes; "" when it has. */
static const char *refusal(const constituents *c)
{
    if (!(c->hydrocarbon_c > 0.0))
        return "a gas without hydrocarbons has no methane number by these routes";
    if (c->x[PART_HYDROGEN] > BC_METHANE_NUMBER_FOREIGN_MAX)
        return "hydrogen above 0.5 %: the routes have no term for it";
    if (c->x[PART_CARBON_MONOXIDE] > BC_METHANE_NUMBER_FOREIGN_MAX)
        return "carbon monoxide above 0.5 %: the routes have no term for it";
    return ratio_holds(c->hydrocarbon_h / c->hydrocarbon_c) ? "" : "the hydrogen-carbon ratio is outside 2.5 to 4";
}

static const char *outside_of(const constituents *c, const bc_methane_number *n)
{
    double listed = c->x[PART_HYDROGEN] + c->x[PART_CARBON_MONOXIDE];

    for (size_t p = 0; p < PART_COUNT; p++)
        if (LINEAR[p].listed)
            listed += c->x[p];
    if (1.0 - listed > UNLISTED_MAX)
        return "more than 1 % of substances without a coefficient of the linear route";
    if (c->water > WATER_MAX)
        return WET_TEXT;
    if (c->x[PART_CARBON_DIOXIDE] + c->x[PART_NITROGEN] + c->x[PART_INERTS] > INERT_MAX)
        return "inerts above 5 %: the hydrogen-carbon route does not see them";
    return n->spread > BC_METHANE_NUMBER_SPREAD_MAX ? "the two routes differ by more than 6: ISO/TR 22302 asks for an engine test" : "";
}

static bc_methane_number evaluate(const constituents *c)
{
    bc_methane_number n = {.hydrogen_carbon = c->hydrocarbon_h / c->hydrocarbon_c, .mon_linear = octane_of_parts(c)};

    n.mon_ratio = octane_of_ratio(n.hydrogen_carbon);
    n.linear = methane_number(n.mon_linear, ISO);
    n.ratio = methane_number(n.mon_ratio, ISO);
    n.linear_other = methane_number(n.mon_linear, OTHER);
    n.ratio_other = methane_number(n.mon_ratio, OTHER);
    n.spread = fabs(n.linear - n.ratio);
    n.outside = outside_of(c, &n);
    return n;
}

bc_status bc_methane_number_of(const bc_gas *gas, bc_methane_number *out, bc_error *err)
{
    const constituents c = constituents_of(gas);
    const char *why = refusal(&c);

    if (why[0] != '\0')
        return bc_fail(err, BC_ERR_RANGE, "%s", why);
    *out = evaluate(&c);
    return BC_OK;
}

bc_status methane_number_index(const index_case *c, reading *r, bc_error *err)
{
    const constituents *parts = &c->room->new_parts;
    const char *why = refusal(parts);

    (void)err;
    if (why[0] != '\0') {
        *r = reading_none(why);
        return BC_OK;
    }
    const bc_methane_number n = evaluate(parts);

    *r = reading_of(n.linear, n.outside);
    r->low = fmin(n.linear, n.ratio);
    r->high = fmax(n.linear, n.ratio);
    return BC_OK;
}
