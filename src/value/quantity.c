/* SPDX-License-Identifier: MIT */
/* quantity.c - the list of quantities and their evaluation. */
#include "bluecone/quantity.h"

#include "base/compiler.h"
#include "base/error_internal.h"
#include "base/text.h"
#include "bluecone/formation.h"
#include "gas/species_index.h"
#include "value/formation_internal.h"
#include "value/uncertainty.h"

#include <math.h>
#include <string.h>

typedef bc_status other_function(const bc_subject *, double *, bc_error *);

/* A quantity and how it is computed: a field of bc_value with its exponents, or a function. */
typedef struct {
    bc_quantity shown;
    size_t field;
    double scale;
    exponents powers;
    other_function *other;
} quantity_row;

static other_function formation_gross, formation_net, formation_gap, hydrogen_carbon_ratio;

#define GROSS false
#define NET true

static const quantity_row ROWS[] = {
#define POWER(id, field, heat, a, b, g, r, m, n, unit, scale, group, label, meaning)                             \
    {{id, label, group, unit, "ISO 6976", meaning, 6}, offsetof(bc_value, field), scale, {a, b, g, r, m, n, heat}, NULL},
#define OTHER(id, function, unit, digits, group, label, method, meaning) \
    {{id, label, group, unit, method, meaning, digits}, 0, 1.0, {0.0, 0.0, 0.0, 0.0, 0.0, 0.0, false}, function},
#include "value/quantities.def"
};

bc_status bc_subject_make(const bc_reference *reference, const bc_gas *gas, const bc_spread *spread, bc_subject *subject, bc_error *err)
{
    bc_gas metered;
    const bc_status status = bc_gas_for_state(gas, &reference->state, &metered, err);

    if (status != BC_OK)
        return status;
    subject->reference = reference;
    subject->spread = spread && spread->count > 0 ? spread : NULL;
    subject->spread_scale = 1.0;
    if (reference->state.saturated)
        subject->spread_scale = (1.0 - metered.x[SPECIES_water]) / (1.0 - gas->x[SPECIES_water]);
    subject->gas = metered;
    subject->value = bc_value_of(reference, &metered);
    return BC_OK;
}

size_t bc_quantity_count(void)
{
    return BC_COUNT(ROWS);
}

const bc_quantity *bc_quantity_at(size_t index)
{
    return index < BC_COUNT(ROWS) ? &ROWS[index].shown : NULL;
}

static bc_status refuse_id(const char *id, bc_error *err)
{
    size_t best = 0;
    char shown[BC_WORD_MAX];

    for (size_t i = 0; i < BC_COUNT(ROWS); i++)
        if (bc_text_distance(ROWS[i].shown.id, id) < bc_text_distance(ROWS[best].shown.id, id))
            best = i;
    bc_text_show(shown, sizeof shown, id);
    return bc_fail(err, BC_ERR_USAGE, "unknown quantity '%s'; the nearest known one is '%s' (bluecone list quantities)", shown, ROWS[best].shown.id);
}

bc_status bc_quantity_find(const char *id, size_t *index, bc_error *err)
{
    for (size_t i = 0; i < BC_COUNT(ROWS); i++)
        if (bc_text_same(ROWS[i].shown.id, id)) {
            *index = i;
            return BC_OK;
        }
    return refuse_id(id, err);
}

static bc_status formation_gross(const bc_subject *s, double *value, bc_error *err)
{
    double gross = 0.0;
    double net = 0.0;
    const bc_status status = bc_formation_gas(&s->gas, s->reference->state.combustion_c + 273.15, &gross, &net, err);

    if (status == BC_OK)
        *value = gross * 1e-3;
    return status;
}

static bc_status formation_net(const bc_subject *s, double *value, bc_error *err)
{
    double gross = 0.0;
    double net = 0.0;
    const bc_status status = bc_formation_gas(&s->gas, s->reference->state.combustion_c + 273.15, &gross, &net, err);

    if (status == BC_OK)
        *value = net * 1e-3;
    return status;
}

/* 1 J/mol: below it the gas is inert and a relative difference has no meaning. */
static bc_status formation_gap(const bc_subject *s, double *value, bc_error *err)
{
    double gross_kj_per_mol = 0.0;
    const bc_status status = formation_gross(s, &gross_kj_per_mol, err);

    if (status != BC_OK)
        return status;
    if (s->value.gross_j_per_mol < 1.0)
        return bc_fail(err, BC_ERR_RANGE, "the gas does not burn: there are no two heating values to compare");
    *value = 100.0 * (gross_kj_per_mol * 1e3 / s->value.gross_j_per_mol - 1.0);
    return BC_OK;
}

static bc_status hydrogen_carbon_ratio(const bc_subject *s, double *value, bc_error *err)
{
    const double carbon = bc_gas_atoms(&s->gas, BC_C);

    if (!(carbon > 0.0))
        return bc_fail(err, BC_ERR_RANGE, "the gas holds no carbon: it has no hydrogen-carbon ratio");
    *value = bc_gas_atoms(&s->gas, BC_H) / carbon;
    return BC_OK;
}

static double field_of(const bc_value *value, size_t offset)
{
    double field = 0.0;

    memcpy(&field, (const char *)value + offset, sizeof field);
    return field;
}

bc_status bc_quantity_evaluate(size_t index, const bc_subject *subject, bc_figure *figure, bc_error *err)
{
    bc_figure f = {0.0, false, 0.0, 0.0, 0.0};

    if (index >= BC_COUNT(ROWS))
        return bc_fail(err, BC_ERR_USAGE, "there is no quantity %zu", index);
    const quantity_row *row = &ROWS[index];

    if (row->other) {
        const bc_status status = row->other(subject, &f.value, err);

        if (status == BC_OK)
            *figure = f;
        return status;
    }
    const relative_u u = propagate(subject, &row->powers);

    f.value = field_of(&subject->value, row->field) * row->scale;
    f.has_u = true;
    f.u_composition = fabs(f.value) * u.composition;
    f.u_tables = fabs(f.value) * u.tables;
    f.u = sqrt(f.u_composition * f.u_composition + f.u_tables * f.u_tables);
    *figure = f;
    return BC_OK;
}

void bc_gap_shares(const bc_subject *s, double share[])
{
    const double t_k = s->reference->state.combustion_c + 273.15;

    for (size_t i = 0; i < BC_SPECIES_CAPACITY; i++) {
        share[i] = 0.0;
        if (i < SPECIES_COUNT && s->gas.x[i] > 0.0 && s->value.gross_j_per_mol > 0.0)
            share[i] = s->gas.x[i] * (formation_gross_j_per_mol(i, t_k) - s->reference->gross_j_per_mol[i]) / s->value.gross_j_per_mol;
    }
}
