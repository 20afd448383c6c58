/* SPDX-License-Identifier: MIT */
/* limits.c - how a gas stands to the limits of a contract. */
#include "bluecone/limits.h"

#include "base/error_internal.h"
#include "bluecone/index.h"
#include "bluecone/quantity.h"
#include "gas/species_index.h"
#include "supply/limits_internal.h"

#include <math.h>

/* Volume that a mole of a component would take by itself, in ideal ones: Z_i = 1 - s_i^2 p/p0, ISO 6976:2016 (8)
 * for one component. */
static double own_volume(const bc_reference *reference, size_t species)
{
    const double s = reference->factor[species];

    return 1.0 - s * s * reference->state.metering_pa / BC_P0_PA;
}

/* What the amount of a limit is divided by, for a mole of gas. */
static double divisor(const bc_limit *limit, const bc_subject *subject)
{
    double volume = 0.0;

    if (limit->kind == BC_LIMIT_CONCENTRATION)
        return subject->value.molar_volume_m3_per_mol;
    if (limit->kind == BC_LIMIT_MASS_FRACTION)
        return subject->value.molar_mass_kg_per_mol;
    if (limit->kind != BC_LIMIT_VOLUME_FRACTION)
        return 1.0;
    for (size_t i = 0; i < SPECIES_COUNT; i++)
        volume += subject->gas.x[i] * own_volume(subject->reference, i);
    return volume;
}

/* Sum of what the species add, over the divisor. */
static double amount_in(const bc_limit *limit, const bc_subject *subject, const double x[])
{
    const bool by_volume = limit->kind == BC_LIMIT_VOLUME_FRACTION;
    double sum = 0.0;

    for (size_t i = 0; i < SPECIES_COUNT; i++)
        sum += x[i] * limit->weight[i] * (by_volume ? own_volume(subject->reference, i) : 1.0);
    return sum / divisor(limit, subject);
}

/* u of a sum of fractions; the small change of the divisor with the composition is left out. */
static double amount_u(const bc_limit *limit, const bc_subject *subject)
{
    double variance = 0.0;

    for (size_t k = 0; subject->spread && k < subject->spread->count; k++) {
        const double step = subject->spread_scale * amount_in(limit, subject, subject->spread->dx[k]);

        variance += step * step;
    }
    return sqrt(variance);
}

static bc_status index_value(const bc_contract *c, const bc_limit *limit, const bc_subject *subject, double *value, bc_error *err)
{
    bc_subject present;
    bc_index index = {.has_value = false};
    const bool alone = bc_index_at(limit->quantity)->kind == BC_INDEX_ALONE;
    bc_status status = BC_OK;

    if (!alone && !c->has_present)
        return bc_fail(err, BC_ERR_USAGE, "it compares with the present gas; give that with --against");
    if (!alone)
        status = bc_subject_make(subject->reference, &c->present, NULL, &present, err);
    if (status == BC_OK)
        status = bc_index_evaluate(limit->quantity, alone ? NULL : &present, subject, &index, err);
    if (status != BC_OK)
        return status;
    if (!index.has_value || !index.in_range)
        return bc_fail(err, BC_ERR_RANGE, "%s", index.reason[0] != '\0' ? index.reason : "the method does not cover the gas");
    *value = index.value;
    return BC_OK;
}

/* u of an index from the scatter of the composition, by a step of each source; the method's own is not known. */
static bool index_u(const bc_contract *c, const bc_limit *limit, const bc_subject *subject, double value, double *u)
{
    const bc_spread *spread = subject->spread;
    double variance = 0.0;

    for (size_t k = 0; spread && k < spread->count; k++) {
        bc_gas moved = subject->gas;
        bc_subject other;
        double there = 0.0;

        for (size_t i = 0; i < SPECIES_COUNT; i++)
            moved.x[i] = fmax(0.0, moved.x[i] + subject->spread_scale * spread->dx[k][i]);
        if (bc_subject_make(subject->reference, &moved, NULL, &other, NULL) != BC_OK || index_value(c, limit, &other, &there, NULL) != BC_OK)
            return false;
        variance += (there - value) * (there - value);
    }
    *u = sqrt(variance);
    return spread != NULL;
}

bc_status limit_figure(const bc_contract *c, const bc_limit *limit, const bc_subject *subject, double *own, bc_error *err)
{
    if (limit->kind == BC_LIMIT_QUANTITY)
        return bc_quantity_value(limit->quantity, subject, own, err);
    if (limit->kind == BC_LIMIT_INDEX)
        return index_value(c, limit, subject, own, err);
    *own = amount_in(limit, subject, subject->gas.x);
    return BC_OK;
}

static bc_status evaluate(const bc_contract *c, const bc_limit *limit, const bc_subject *subject, bc_limit_figure *f, bc_error *err)
{
    bc_figure figure;
    bc_status status = BC_OK;

    f->u = 0.0;
    if (limit->kind != BC_LIMIT_QUANTITY) {
        status = limit_figure(c, limit, subject, &f->value, err);
        if (status == BC_OK && limit->kind == BC_LIMIT_INDEX) {
            f->has_u = index_u(c, limit, subject, f->value, &f->u);
        } else if (status == BC_OK) {
            f->has_u = subject->spread != NULL;
            f->u = amount_u(limit, subject);
        }
        return status;
    }
    status = bc_quantity_evaluate(limit->quantity, subject, &figure, err);
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

    if (status == BC_OK)
        status = limit_figure(contract, limit, &subject, &own, err);
    if (status == BC_OK)
        *value = bc_unit_from_si(&limit->shown, bc_unit_to_si(&limit->own, own));
    return status;
}

bc_status bc_limit_judge(const bc_contract *contract, size_t index, const bc_gas *gas, const bc_spread *spread, bc_limit_figure *figure,
                         bc_error *err)
{
    const bc_limit *limit = &contract->limits[index];
    bc_subject subject;
    bc_limit_figure f = {.value = 0.0};
    bc_status status = bc_subject_make(&contract->references[limit->reference], gas, spread, &subject, err);

    if (status == BC_OK)
        status = evaluate(contract, limit, &subject, &f, err);
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
