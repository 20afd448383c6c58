/* SPDX-License-Identifier: MIT */
/* check.c - runs the rows of checks.def and the formation balance of every fuel of the standard. */
#include "bluecone/check.h"

#include "base/compiler.h"
#include "base/error_internal.h"
#include "bluecone/composition.h"
#include "bluecone/flame.h"
#include "bluecone/quantity.h"
#include "bluecone/steam.h"
#include "bluecone/thermo.h"
#include "bluecone/units.h"
#include "gas/species_index.h"
#include "supply/index_check.h"
#include "value/formation_internal.h"
#include "value/thermo_internal.h"

#include <math.h>
#include <string.h>

#define T0_K 273.15
#define T_FORMATION_K 298.15

typedef enum { GAS_VALUE, GAS_U, THERMO_VALUE, STEAM_VALUE, FLAME_VALUE } check_kind;

/* Texts stand in the row itself: pointers would be relocated at the start of every program that links
 * the library, for a table that only `verify` reads. */
typedef struct {
    check_kind kind;
    char area[16], id[40], subject[320], with[64], quantity[28], unit[16], why[160], source[180];
    int edition;
    double combustion_c, metering_c, metering_kpa, t_k, oxidant_k, lambda;
    double expected, tolerance;
} check_row;

static const check_row ROWS[] = {
#define CHECK_GAS(area, id, gas, edition, t1, t2, p, quantity, expected, unit, tolerance, why, source) \
    {GAS_VALUE, area, id, gas, "", quantity, unit, why, source, edition, t1, t2, p, 0.0, 0.0, 0.0, expected, tolerance},
#define CHECK_U(area, id, gas, edition, t1, t2, p, quantity, expected, unit, tolerance, why, source) \
    {GAS_U, area, id, gas, "", quantity, unit, why, source, edition, t1, t2, p, 0.0, 0.0, 0.0, expected, tolerance},
#define CHECK_THERMO(area, symbol, quantity, t_k, expected, unit, tolerance, why, source) \
    {THERMO_VALUE, area, symbol, symbol, "", quantity, unit, why, source, 0, 0.0, 0.0, 0.0, t_k, 0.0, 0.0, expected, tolerance},
#define CHECK_STEAM(quantity, t_c, expected, tolerance, why, source) \
    {STEAM_VALUE, "steam", "water", "water", "", quantity, "Pa", why, source, 0, 0.0, 0.0, 0.0, (t_c) + T0_K, 0.0, 0.0, expected, tolerance},
#include "data/checks.def"
#define CHECK_FLUE(area, id, gas, quantity, expected, unit, tolerance, why, source) \
    {GAS_VALUE, area, id, gas, "", quantity, unit, why, source, 2016, 25.0, 15.0, 101.325, 0.0, 0.0, 0.0, expected, tolerance},
#include "data/checks_flue.def"
#define CHECK_FLAME(area, id, fuel, oxidant, lambda, t_fuel, t_oxidant, p, quantity, expected, tolerance, why, source) \
    {FLAME_VALUE, area, id, fuel, oxidant, quantity, "K", why, source, 0, 0.0, 0.0, p, t_fuel, t_oxidant, lambda, expected, tolerance},
#include "data/checks_flame.def"
};

/* Fuels of ISO 6976:2016: the formation checks, one a row of the standard that burns. */
static const struct {
    size_t species;
    double expected_kj_per_mol;
    const char *source;
} FUELS[] = {
#define ISO2016_HEAT(symbol, m, h0, h15, h60f, h20, h25, u, source) {SPECIES_##symbol, h25, source},
#include "data/iso6976_2016_heat.def"
};

static const struct {
    size_t species;
    double allowed_percent;
    const char *why;
} GAPS[] = {
#define FORMATION_GAP(symbol, allowed, why) {SPECIES_##symbol, allowed, why},
#include "data/formation_gaps.def"
};

size_t bc_check_count(void)
{
    return BC_COUNT(ROWS) + BC_COUNT(FUELS) + index_check_count();
}

const char *bc_check_area(size_t index)
{
    if (index >= bc_check_count())
        return "";
    if (index >= BC_COUNT(ROWS) + BC_COUNT(FUELS))
        return index_check_area(index - BC_COUNT(ROWS) - BC_COUNT(FUELS));
    return index < BC_COUNT(ROWS) ? ROWS[index].area : "formation";
}

static const char *const SYMBOLS[] = {
#define NASA9(symbol, ...) #symbol,
#include "data/nasa9.def"
};

static bc_status find_thermo(const char *symbol, size_t *index, bc_error *err)
{
    for (size_t i = 0; i < BC_COUNT(SYMBOLS); i++)
        if (strcmp(SYMBOLS[i], symbol) == 0) {
            *index = i;
            return BC_OK;
        }
    return bc_fail(err, BC_ERR_USAGE, "no thermodynamic species '%s'", symbol);
}

static bc_status run_thermo(bc_check *check, bc_error *err)
{
    size_t i = 0;
    const bc_status status = find_thermo(check->subject, &i, err);

    if (status != BC_OK)
        return status;
    if (strcmp(check->quantity, "entropy") == 0)
        check->computed = thermo_s_r(i, check->t_k) * BC_THERMO_R_J_PER_MOL_K;
    else if (strcmp(check->quantity, "formation-enthalpy") == 0)
        check->computed = thermo_h_j_per_mol(i, T_FORMATION_K) * 1e-3;
    else
        check->computed = (thermo_h_j_per_mol(i, check->t_k) - thermo_h_j_per_mol(i, T_FORMATION_K)) * 1e-3;
    return BC_OK;
}

/* The figure of a quantity in the unit that the source prints. */
static bc_status convert(const bc_check *check, const bc_quantity *quantity, double *figure, bc_error *err)
{
    bc_unit from;
    bc_unit to;
    bc_status status = bc_unit_parse(quantity->unit, &from, err);

    if (status == BC_OK)
        status = bc_unit_parse(check->unit, &to, err);
    if (status != BC_OK)
        return status;
    if (!bc_unit_matches(&from, &to))
        return bc_fail(err, BC_ERR_USAGE, "%s is not measured in %s", quantity->id, check->unit);
    *figure = bc_unit_from_si(&to, bc_unit_to_si(&from, *figure));
    return BC_OK;
}

/* The example of the standard takes the fractions as uncorrelated. */
static bc_status read_gas(const bc_check *check, bc_composition *c, bc_error *err)
{
    const bc_status status = bc_composition_parse(check->subject, c, err);

    if (status == BC_OK && check->of_uncertainty)
        return bc_composition_close(c, BC_CLOSURE_NONE, err);
    return status;
}

static bc_status run_gas(bc_check *check, bc_error *err)
{
    const bc_state state = {check->combustion_c, check->metering_c, check->metering_kpa * 1e3, false, check->edition};
    bc_composition c;
    bc_reference reference;
    bc_subject subject;
    bc_figure figure;
    size_t quantity = 0;
    bc_status status = read_gas(check, &c, err);

    if (status == BC_OK)
        status = bc_reference_at(&state, &reference, err);
    if (status == BC_OK)
        status = bc_quantity_find(check->quantity, &quantity, err);
    if (status == BC_OK)
        status = bc_subject_make(&reference, &c.gas, &c.spread, &subject, err);
    if (status == BC_OK)
        status = bc_quantity_evaluate(quantity, &subject, &figure, err);
    if (status != BC_OK)
        return status;
    check->computed = check->of_uncertainty ? figure.u : figure.value;
    return convert(check, bc_quantity_at(quantity), &check->computed, err);
}

static bc_status read_literal(const char *literal, bc_gas *gas, bc_error *err)
{
    bc_composition c;
    const bc_status status = bc_composition_parse(literal, &c, err);

    if (status == BC_OK)
        *gas = c.gas;
    return status;
}

static bc_status run_flame(bc_check *check, bc_error *err)
{
    const bool complete = strcmp(check->quantity, "flame-temperature-complete") == 0;
    bc_reactants r = {.fuel_t_k = check->t_k, .oxidant_t_k = check->oxidant_k, .p_pa = check->metering_kpa * 1e3};
    bc_mixture flame;
    bc_status status = read_literal(check->subject, &r.fuel, err);

    if (status == BC_OK)
        status = read_literal(check->with, &r.oxidant, err);
    if (status == BC_OK)
        status = bc_oxidant_for_lambda(&r.fuel, &r.oxidant, check->lambda, &r.oxidant_per_fuel, err);
    if (status == BC_OK)
        status = complete ? bc_flame_complete(&r, &flame, err) : bc_flame_equilibrium(&r, &flame, err);
    if (status == BC_OK)
        check->computed = flame.t_k;
    return status;
}

static void run_formation(size_t fuel, bc_check *check)
{
    const size_t species = FUELS[fuel].species;
    double allowed_percent = 0.1;
    const char *why = "0.1 %: two independent routes to the same heat";

    for (size_t i = 0; i < BC_COUNT(GAPS); i++)
        if (GAPS[i].species == species) {
            allowed_percent = GAPS[i].allowed_percent;
            why = GAPS[i].why;
        }
    if (bc_thermo_origin_of(species) == BC_THERMO_FITTED)
        why = "0.1 %, arithmetic only: the formation enthalpy of this species was set from the same heat";
    *check = (bc_check){.area = "formation", .id = bc_species_id(species), .subject = bc_species_id(species), .with = "", .quantity = "hhv-formation",
                        .unit = "kJ/mol", .why = why, .source = FUELS[fuel].source, .combustion_c = 25.0, .t_k = T_FORMATION_K,
                        .expected = FUELS[fuel].expected_kj_per_mol};
    /* an inert gas has a heat of nothing: 0.01 kJ/mol is the last printed digit of the standard */
    check->tolerance = check->expected > 0.0 ? allowed_percent / 100.0 * check->expected : 0.01;
    check->computed = formation_gross_j_per_mol(species, T_FORMATION_K) * 1e-3;
}

static bc_status run_row(const check_row *row, bc_check *check, bc_error *err)
{
    *check = (bc_check){.area = row->area, .id = row->id, .subject = row->subject, .with = row->with, .quantity = row->quantity, .unit = row->unit,
                        .why = row->why, .source = row->source, .combustion_c = row->combustion_c, .metering_c = row->metering_c,
                        .metering_kpa = row->metering_kpa, .t_k = row->t_k, .oxidant_k = row->oxidant_k, .lambda = row->lambda, .edition = row->edition, .of_uncertainty = row->kind == GAS_U,
                        .expected = row->expected, .tolerance = row->tolerance};
    switch (row->kind) {
    case THERMO_VALUE:
        return run_thermo(check, err);
    case STEAM_VALUE:
        return bc_steam_pressure(check->t_k, &check->computed, err);
    case FLAME_VALUE:
        return run_flame(check, err);
    case GAS_VALUE:
    case GAS_U:
    default:
        return run_gas(check, err);
    }
}

bc_status bc_check_run(size_t index, bc_check *check, bc_error *err)
{
    bc_check computed;
    bc_status status = BC_OK;

    if (index >= bc_check_count())
        return bc_fail(err, BC_ERR_USAGE, "there is no check %zu", index);
    if (index < BC_COUNT(ROWS))
        status = run_row(&ROWS[index], &computed, err);
    else if (index < BC_COUNT(ROWS) + BC_COUNT(FUELS))
        run_formation(index - BC_COUNT(ROWS), &computed);
    else
        status = index_check_run(index - BC_COUNT(ROWS) - BC_COUNT(FUELS), &computed, err);
    if (status != BC_OK)
        return status;
    computed.ok = fabs(computed.computed - computed.expected) <= computed.tolerance;
    *check = computed;
    return BC_OK;
}
