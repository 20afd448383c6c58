/* SPDX-License-Identifier: MIT */
/* quantity.c - the one list of quantities, joined from the floors that compute them. */
#include "bluecone/quantity.h"

#include "bluecone/index.h"

#include "base/compiler.h"
#include "base/error_internal.h"
#include "base/text.h"
#include "flame/flame_quantities.h"
#include "gas/species_index.h"
#include "supply/index_quantities.h"
#include "supply/quantity_meant.h"
#include "value/subject_internal.h"
#include "value/value_quantities.h"

#include <math.h>

typedef quantity_source source_function(void);

static source_function *const FLOORS[] = {value_quantities, flame_quantities, index_quantities};

/* The floor that an index of the joined list falls to; *index becomes that of the floor. */
static bool find_floor(size_t *index, quantity_source *source)
{
    for (size_t i = 0; i < BC_COUNT(FLOORS); i++) {
        *source = FLOORS[i]();
        if (*index < source->count)
            return true;
        *index -= source->count;
    }
    return false;
}

size_t bc_quantity_count(void)
{
    size_t count = 0;

    for (size_t i = 0; i < BC_COUNT(FLOORS); i++)
        count += FLOORS[i]().count;
    return count;
}

const bc_quantity *bc_quantity_at(size_t index)
{
    quantity_source source;

    return find_floor(&index, &source) ? source.at(index) : NULL;
}

static bool compares_two_gases(const char *id)
{
    for (size_t i = 0; i < bc_index_count(); i++)
        if (bc_index_at(i)->kind == BC_INDEX_AGAINST && bc_text_same(bc_index_at(i)->id, id))
            return true;
    return false;
}

static bc_status refuse_id(const char *id, bc_error *err)
{
    const char *best = bc_quantity_at(0)->id;
    const char *meant = quantity_meant(id);
    char shown[BC_WORD_MAX];
    char hint[BC_HINT_MAX];

    for (size_t i = 0; i < bc_quantity_count(); i++)
        if (bc_text_unlikeness(id, bc_quantity_at(i)->id) < bc_text_unlikeness(id, best))
            best = bc_quantity_at(i)->id;
    bc_text_show(shown, sizeof shown, id);
    if (meant)
        return bc_fail(err, BC_ERR_USAGE, "unknown quantity '%s'; write %s (bluecone list quantities)", shown, meant);
    if (compares_two_gases(id))
        return bc_fail(err, BC_ERR_USAGE, "'%s' compares two gases, it is no quantity of one; see bluecone switch", shown);
    bc_text_suggest(hint, sizeof hint, "the nearest known one is", id, best);
    return bc_fail(err, BC_ERR_USAGE, "unknown quantity '%s'%s (bluecone list quantities)", shown, hint);
}

bc_status bc_quantity_find(const char *id, size_t *index, bc_error *err)
{
    for (size_t i = 0; i < bc_quantity_count(); i++)
        if (bc_text_same(bc_quantity_at(i)->id, id)) {
            *index = i;
            return BC_OK;
        }
    return refuse_id(id, err);
}

#define STEP 0.01 /* of a standard deviation: small enough for the slope, large enough for rounding */

/* dY of one source of scatter, per standard deviation: [Y(x + h dx) - Y(x - h dx)]/(2 h). */
static bc_status slope(const quantity_source *source, size_t index, const bc_subject *subject, const double dx[], double *step, bc_error *err)
{
    bc_subject moved = *subject;
    double y[2] = {0.0, 0.0};

    moved.spread = NULL;
    for (int side = 0; side < 2; side++) {
        const double h = side == 0 ? STEP : -STEP;
        bc_figure figure;

        for (size_t j = 0; j < SPECIES_COUNT; j++)
            moved.gas.x[j] = fmax(subject->gas.x[j] + h * subject->spread_scale * dx[j], 0.0);
        subject_weigh(&moved);
        const bc_status status = source->evaluate(index, &moved, &figure, err);

        if (status != BC_OK)
            return status;
        y[side] = figure.value;
    }
    *step = (y[0] - y[1]) / (2.0 * STEP);
    return BC_OK;
}

/* JCGM 100:2008, 5.1: u2(Y) = sum over independent sources of (dY)^2. A figure that exists for the gas but
 * not for its neighbours keeps no uncertainty. */
static void propagate_numerically(const quantity_source *source, size_t index, const bc_subject *subject, bc_figure *figure)
{
    double variance = 0.0;

    for (size_t k = 0; k < subject->spread->count; k++) {
        double step = 0.0;

        if (slope(source, index, subject, subject->spread->dx[k], &step, NULL) != BC_OK)
            return;
        variance += step * step;
    }
    figure->u_composition = sqrt(variance);
    figure->u = figure->u_composition;
    figure->has_u = true;
}

bc_status bc_quantity_evaluate(size_t index, const bc_subject *subject, bc_figure *figure, bc_error *err)
{
    quantity_source source;
    bc_figure f;

    if (!find_floor(&index, &source))
        return bc_fail(err, BC_ERR_USAGE, "there is no quantity of that number");
    const bc_status status = source.evaluate(index, subject, &f, err);

    if (status != BC_OK)
        return status;
    if (!f.has_u && subject->spread && source.at(index)->has_scatter)
        propagate_numerically(&source, index, subject, &f);
    *figure = f;
    return BC_OK;
}

static bc_status value_of(const quantity_source *source, size_t index, const bc_subject *subject, double *value, bc_error *err)
{
    bc_figure f;

    if (source->value)
        return source->value(index, subject, value, err);
    const bc_status status = source->evaluate(index, subject, &f, err);

    if (status == BC_OK)
        *value = f.value;
    return status;
}

bc_status bc_quantity_value(size_t index, const bc_subject *subject, double *value, bc_error *err)
{
    quantity_source source;

    if (!find_floor(&index, &source))
        return bc_fail(err, BC_ERR_USAGE, "there is no quantity of that number");
    return value_of(&source, index, subject, value, err);
}

static void values_of(const quantity_source *source, const bool wanted[], const bc_subject *subject, double value[])
{
    for (size_t i = 0; i < source->count; i++)
        value[i] = (double)NAN;
    if (source->values) {
        source->values(subject, wanted, value);
        return;
    }
    for (size_t i = 0; i < source->count; i++)
        if (wanted[i])
            (void)value_of(source, i, subject, &value[i], NULL); /* untouched where the gas has none */
}

void bc_quantity_values(const bool wanted[], const bc_subject *subject, double value[])
{
    for (size_t i = 0; i < BC_COUNT(FLOORS); i++) {
        const quantity_source source = FLOORS[i]();

        values_of(&source, wanted, subject, value);
        wanted += source.count;
        value += source.count;
    }
}
