/* SPDX-License-Identifier: MIT */
/* trap.c - figures as somebody would work them out who confuses state, basis or analysis. */
#include "bluecone/trap.h"

#include "base/compiler.h"
#include "bluecone/quantity.h"
#include "gas/composition_internal.h"
#include "gas/species_index.h"
#include "supply/limits_internal.h"
#include "supply/partner_quantity.h"

#include <math.h>
#include <string.h>

#define F60 ((60.0 - 32.0) / 1.8)
#define PSIA_14_73 (14.73 * 0.45359237 * 9.80665 / (0.0254 * 0.0254))
#define SAME_C 1e-3   /* temperatures nearer than that are one */
#define SAME_PA 1.0
#define SUM_TOLD 1e-6 /* relative: a sum nearer to one was not scaled */

/* What somebody in the trap works with. */
typedef struct {
    bc_state state;
    bc_gas gas;
    partner_kind partner; /* another quantity is read in place of the one meant */
    double sum;           /* what the shares add up to */
} view;

static bool change_temperature(double *t_c, double to_c)
{
    const bool same = fabs(*t_c - to_c) < SAME_C;

    *t_c = to_c;
    return !same;
}

/* Mass or volume of a mole of a component, up to a factor common to all: what a share counts. */
static double share_of_mole(const bc_reference *reference, bc_basis basis, size_t species)
{
    if (basis == BC_BASIS_MASS)
        return bc_species_molar_mass_kg_per_mol(species);
    if (basis == BC_BASIS_VOLUME)
        return 1.0 - reference->factor[species] * reference->factor[species];
    return 1.0;
}

/* Shares written on one basis and read on another: x' ~ x m/m'. */
static bool change_basis(view *v, bc_basis written, bc_basis read)
{
    const bc_state at_15 = bc_state_default();
    double amounts[BC_SPECIES_CAPACITY] = {0.0};
    bc_reference reference;

    if (written == read || bc_reference_at(&at_15, &reference, NULL) != BC_OK)
        return false;
    for (size_t i = 0; i < SPECIES_COUNT; i++)
        if (v->gas.x[i] > 0.0)
            amounts[i] = v->gas.x[i] * share_of_mole(&reference, written, i) / share_of_mole(&reference, read, i);
    return bc_gas_from_amounts(amounts, &v->gas, NULL) == BC_OK;
}

static bool is_heavy(size_t i)
{
    return bc_species_atoms(i, BC_C) >= 6 && bc_species_atoms(i, BC_H) > 0 && bc_species_atoms(i, BC_O) == 0 && bc_species_atoms(i, BC_N) == 0
           && bc_species_atoms(i, BC_S) == 0;
}

/* The moles of C6 and heavier, split otherwise. */
static bool change_heavy(view *v, bool by_default)
{
    double parts[BC_SPECIES_CAPACITY] = {0.0};
    double heavy = 0.0;
    double as_it_was = 0.0; /* of the heavy moles, how many stand as they would be split */

    if (!by_default || !cut_default("c6+", parts)) {
        memset(parts, 0, sizeof parts);
        parts[SPECIES_n_hexane] = 1.0;
    }
    for (size_t i = 0; i < SPECIES_COUNT; i++)
        if (is_heavy(i))
            heavy += v->gas.x[i];
    for (size_t i = 0; i < SPECIES_COUNT; i++)
        if (is_heavy(i)) {
            as_it_was += fmin(v->gas.x[i], heavy * parts[i]);
            v->gas.x[i] = heavy * parts[i];
        }
    return as_it_was < heavy * (1.0 - SUM_TOLD);
}

/* One function a kind of confusion: puts it into a view; false when there is none. */
static bool enter_heat(view *v, double argument, const bc_composition *c)
{
    (void)argument;
    (void)c;
    v->partner = PARTNER_HEAT;
    return true;
}

static bool enter_ideal(view *v, double argument, const bc_composition *c)
{
    (void)argument;
    (void)c;
    v->partner = PARTNER_IDEAL;
    return true;
}

static bool enter_combustion(view *v, double argument, const bc_composition *c)
{
    (void)c;
    return change_temperature(&v->state.combustion_c, argument);
}

static bool enter_metering(view *v, double argument, const bc_composition *c)
{
    (void)c;
    return change_temperature(&v->state.metering_c, argument);
}

static bool enter_pressure(view *v, double argument, const bc_composition *c)
{
    const bool same = fabs(v->state.metering_pa - argument) < SAME_PA;

    (void)c;
    v->state.metering_pa = argument;
    return !same;
}

static bool enter_saturated(view *v, double argument, const bc_composition *c)
{
    (void)argument;
    (void)c;
    v->state.saturated = !v->state.saturated;
    return true;
}

static bool enter_edition(view *v, double argument, const bc_composition *c)
{
    (void)argument;
    (void)c;
    v->state.edition = v->state.edition == 2016 ? 1995 : 2016;
    return true;
}

static bool enter_basis(view *v, double argument, const bc_composition *c)
{
    return change_basis(v, c->basis, (bc_basis)argument);
}

static bool enter_unscaled(view *v, double argument, const bc_composition *c)
{
    (void)argument;
    v->sum = c->sum;
    return fabs(c->sum - 1.0) > SUM_TOLD;
}

static bool enter_air_out(view *v, double argument, const bc_composition *c)
{
    bc_gas pure;

    (void)argument;
    (void)c;
    if (!(v->gas.x[SPECIES_oxygen] > 0.0) || bc_gas_air_free(&v->gas, &pure, NULL, NULL) != BC_OK)
        return false;
    v->gas = pure;
    return true;
}

static bool enter_air_in(view *v, double argument, const bc_composition *c)
{
    const bc_gas air = bc_gas_air();

    (void)c;
    for (size_t i = 0; i < SPECIES_COUNT; i++)
        v->gas.x[i] = (1.0 - argument) * v->gas.x[i] + argument * air.x[i];
    return true;
}

static bool enter_heavy(view *v, double argument, const bc_composition *c)
{
    (void)c;
    return change_heavy(v, argument > 0.0);
}

static const struct {
    bool (*enter)(view *v, double argument, const bc_composition *c);
    double argument;
    const char *id, *text;
} TRAPS[] = {
#define TRAP(kind, argument, id, text) {enter_##kind, argument, id, text},
#include "data/traps.def"
};

size_t bc_trap_count(void)
{
    return BC_COUNT(TRAPS);
}

const char *bc_trap_id(size_t trap)
{
    return trap < BC_COUNT(TRAPS) ? TRAPS[trap].id : NULL;
}

const char *bc_trap_text(size_t trap)
{
    return trap < BC_COUNT(TRAPS) ? TRAPS[trap].text : NULL;
}

/* Shares that add up to s make heats and densities s times as large, Wobbe indices sqrt(s) times. */
static double unscaled(const bc_limit *limit, double value, double sum)
{
    if (limit->kind != BC_LIMIT_QUANTITY)
        return limit->kind == BC_LIMIT_INDEX ? value : value * sum;
    return value * pow(sum, partner_power_of_sum(bc_quantity_at(limit->quantity)->id));
}

static bc_status figure_of(const view *v, const bc_contract *c, const bc_limit *limit, double *value, bc_error *err)
{
    bc_limit read = *limit;
    bc_reference reference;
    bc_subject subject;
    double own = 0.0;

    if (limit->kind == BC_LIMIT_QUANTITY)
        read.quantity = partner_quantity(limit->quantity, v->partner);
    bc_status status = bc_reference_at(&v->state, &reference, err);

    if (status == BC_OK)
        status = bc_subject_make(&reference, &v->gas, NULL, &subject, err);
    if (status == BC_OK)
        status = limit_figure(c, &read, &subject, &own, err);
    if (status == BC_OK)
        *value = unscaled(limit, bc_unit_from_si(&limit->shown, bc_unit_to_si(&limit->own, own)), v->sum);
    return status;
}

bc_status bc_trap_value(size_t trap, const bc_contract *c, size_t index, const bc_trap_gas *gas, bc_trapped *trapped, bc_error *err)
{
    const bc_limit *limit = &c->limits[index];
    view v = {.state = c->references[limit->reference].state, .gas = *gas->gas, .sum = 1.0};
    const bool entered = TRAPS[trap].enter(&v, TRAPS[trap].argument, gas->composition);
    double figure = 0.0;
    const bc_status status = entered ? figure_of(&v, c, limit, &figure, err) : bc_limit_value(c, index, gas->gas, &figure, err);

    if (status != BC_OK)
        return status;
    trapped->applies = entered;
    trapped->value = figure;
    return BC_OK;
}
