/* SPDX-License-Identifier: MIT */
/* limits.c - how a gas stands to the limits of a contract. */
#include "bluecone/limits.h"

#include "bluecone/quantity.h"
#include "gas/species_index.h"

#include <math.h>

/* Sum of what the species add, over the volume of a mole where the limit is a concentration. */
static double amount_in(const bc_limit *limit, const bc_subject *subject, const double x[])
{
    double sum = 0.0;

    for (size_t i = 0; i < SPECIES_COUNT; i++)
        sum += x[i] * limit->weight[i];
    return limit->kind == BC_LIMIT_CONCENTRATION ? sum / subject->value.molar_volume_m3_per_mol : sum;
}

/* u of a sum of fractions; the small change of the molar volume with the composition is left out of a concentration. */
static double amount_u(const bc_limit *limit, const bc_subject *subject)
{
    double variance = 0.0;

    for (size_t k = 0; subject->spread && k < subject->spread->count; k++) {
        const double step = subject->spread_scale * amount_in(limit, subject, subject->spread->dx[k]);

        variance += step * step;
    }
    return sqrt(variance);
}

static bc_status evaluate(const bc_limit *limit, const bc_subject *subject, bc_limit_figure *f, bc_error *err)
{
    bc_figure figure;

    if (limit->kind != BC_LIMIT_QUANTITY) {
        f->value = amount_in(limit, subject, subject->gas.x);
        f->has_u = subject->spread != NULL;
        f->u = amount_u(limit, subject);
        return BC_OK;
    }
    const bc_status status = bc_quantity_evaluate(limit->quantity, subject, &figure, err);

    if (status != BC_OK)
        return status;
    f->value = figure.value;
    f->has_u = figure.has_u;
    f->u = figure.u;
    return BC_OK;
}

double bc_limit_scale(const bc_limit *limit)
{
    const double low = fabs(limit->min);
    const double high = fabs(limit->max);

    if (limit->has_min && limit->has_max && limit->max > limit->min)
        return limit->max - limit->min;
    return fmax(low, high) > 0.0 ? fmax(low, high) : 1.0;
}

double bc_limit_margin(const bc_limit *limit, double value)
{
    const double below = limit->has_min ? value - limit->min : HUGE_VAL;
    const double above = limit->has_max ? limit->max - value : HUGE_VAL;

    return fmin(below, above);
}

bc_status bc_limit_value(const bc_contract *contract, size_t index, const bc_gas *gas, double *value, bc_error *err)
{
    const bc_limit *limit = &contract->limits[index];
    bc_subject subject;
    double own = 0.0;
    bc_status status = bc_subject_make(&contract->references[limit->reference], gas, NULL, &subject, err);

    if (status == BC_OK && limit->kind != BC_LIMIT_QUANTITY)
        own = amount_in(limit, &subject, subject.gas.x);
    else if (status == BC_OK)
        status = bc_quantity_value(limit->quantity, &subject, &own, err);
    if (status == BC_OK)
        *value = bc_unit_from_si(&limit->shown, bc_unit_to_si(&limit->own, own));
    return status;
}

bc_status bc_limit_judge(const bc_contract *contract, size_t index, const bc_gas *gas, const bc_spread *spread, bc_limit_figure *figure,
                         bc_error *err)
{
    const bc_limit *limit = &contract->limits[index];
    bc_subject subject;
    bc_limit_figure f;
    bc_status status = bc_subject_make(&contract->references[limit->reference], gas, spread, &subject, err);

    if (status == BC_OK)
        status = evaluate(limit, &subject, &f, err);
    if (status != BC_OK)
        return status;
    f.value = bc_unit_from_si(&limit->shown, bc_unit_to_si(&limit->own, f.value));
    f.u *= limit->own.factor / limit->shown.factor; /* a difference: no offset */
    f.margin = bc_limit_margin(limit, f.value);
    f.inside = f.margin >= -BC_LIMIT_ROUNDING * bc_limit_scale(limit);
    if (f.inside && f.margin < 0.0)
        f.margin = 0.0;
    *figure = f;
    return BC_OK;
}
