/* SPDX-License-Identifier: MIT */
/* assess.c - the guard-band rule of JCGM 106:2012. */
#include "bluecone/assess.h"

#include "base/error_internal.h"

#include <math.h>

#define FACTOR_MAX 5.0 /* Phi(5) is above BC_COVERAGE_MAX */
#define HALVINGS 60    /* of that interval: to the last bit of a double */

/* Distribution function of the standard normal distribution. */
static double phi(double z)
{
    return 0.5 * erfc(-z / sqrt(2.0));
}

bc_status bc_coverage_factor(double coverage, double *k, bc_error *err)
{
    double low = 0.0;
    double high = FACTOR_MAX;

    if (!(coverage >= 0.5 && coverage <= BC_COVERAGE_MAX))
        return bc_fail(err, BC_ERR_RANGE, "a coverage of %.6g %% is outside 50 to %.6g %%", 100.0 * coverage, 100.0 * BC_COVERAGE_MAX);
    for (int i = 0; i < HALVINGS; i++) {
        const double middle = 0.5 * (low + high);

        if (phi(middle) < coverage)
            low = middle;
        else
            high = middle;
    }
    *k = coverage > 0.5 ? high : 0.0;
    return BC_OK;
}

double bc_conformance_probability(const bc_limit *limit, double value, double u)
{
    if (!(u > 0.0))
        return bc_limit_margin(limit, value) >= 0.0 ? 1.0 : 0.0;
    const double below_max = limit->has_max ? phi((limit->max - value) / u) : 1.0;
    const double below_min = limit->has_min ? phi((limit->min - value) / u) : 0.0;

    return below_max - below_min;
}

bc_assessment bc_limit_assess(const bc_limit *limit, const bc_limit_figure *figure, double k)
{
    bc_assessment a = {.guard = figure->has_u ? k * figure->u : 0.0, .probability = figure->inside ? 1.0 : 0.0};

    if (figure->has_u && figure->u > 0.0)
        a.probability = bc_conformance_probability(limit, figure->value, figure->u);
    if (figure->inside)
        a.conformity = figure->margin >= a.guard ? BC_CONFORM_INSIDE : BC_CONFORM_LIKELY;
    else
        a.conformity = -figure->margin > a.guard ? BC_CONFORM_OUTSIDE : BC_CONFORM_UNLIKELY;
    return a;
}

const char *bc_conformity_text(bc_conformity conformity)
{
    static const char *const TEXTS[] = {"inside", "inside, within uncertainty", "outside, within uncertainty", "outside"};

    return TEXTS[conformity];
}

bool bc_conformity_breaks(bc_conformity conformity)
{
    return conformity == BC_CONFORM_UNLIKELY || conformity == BC_CONFORM_OUTSIDE;
}
