/* SPDX-License-Identifier: MIT */
/* value_quantities.c - the quantities of ISO 6976 and of the formation route. */
#include "value/value_quantities.h"

#include "base/compiler.h"
#include "base/error_internal.h"
#include "bluecone/formation.h"
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
    {{id, label, group, unit, "ISO 6976", meaning, 6, true}, offsetof(bc_value, field), scale, {a, b, g, r, m, n, heat}, NULL},
#define OTHER(id, function, unit, digits, scatter, group, label, method, meaning) \
    {{id, label, group, unit, method, meaning, digits, scatter}, 0, 1.0, {0.0, 0.0, 0.0, 0.0, 0.0, 0.0, false}, function},
#include "value/quantities.def"
};

static const bc_quantity *shown(size_t index)
{
    return &ROWS[index].shown;
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
    const double carbon = s->atoms[BC_C];

    if (!(carbon > 0.0))
        return bc_fail(err, BC_ERR_RANGE, "the gas holds no carbon: it has no hydrogen-carbon ratio");
    *value = s->atoms[BC_H] / carbon;
    return BC_OK;
}

static double field_of(const bc_value *value, size_t offset)
{
    double field = 0.0;

    memcpy(&field, (const char *)value + offset, sizeof field);
    return field;
}

static bc_status value_alone(size_t index, const bc_subject *subject, double *value, bc_error *err)
{
    const quantity_row *row = &ROWS[index];

    if (row->other)
        return row->other(subject, value, err);
    *value = field_of(&subject->value, row->field) * row->scale;
    return BC_OK;
}

static bc_status evaluate(size_t index, const bc_subject *subject, bc_figure *figure, bc_error *err)
{
    const quantity_row *row = &ROWS[index];
    bc_figure f = {.has_u = false};

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

quantity_source value_quantities(void)
{
    return (quantity_source){BC_COUNT(ROWS), shown, evaluate, value_alone, NULL};
}
