/* SPDX-License-Identifier: MIT */
/* exercise.h - all that the library computes without memory, once, as one long row of numbers.
 *
 * Rows of two runs are alike to the last bit, whatever runs beside them: nothing here asserts, so that it may
 * run in threads and while no memory is to be had. What fails is a number, too: its status and its message. */
#ifndef EXERCISE_H
#define EXERCISE_H

#include "bluecone/bluecone.h"

#include <string.h>

#define EXERCISE_MAX 40000 /* numbers of one row */

/* What is exercised. */
typedef struct {
    bc_reference reference;
    bc_reference other_reference; /* another state: saturated, 1995 */
    bc_gas gas, other;
    bc_spread spread;
    bc_offer offer[2];
    bc_burner burner;
    bc_contract contract;
    bc_composition composition; /* that the gas was read from */
} exercise_of;

typedef struct {
    size_t count;
    size_t failures; /* calls that were refused */
    double number[EXERCISE_MAX];
} exercise_row;

static inline void note(exercise_row *row, double number)
{
    if (row->count < EXERCISE_MAX)
        row->number[row->count] = number;
    row->count++;
}

static inline void note_all(exercise_row *row, const double numbers[], size_t count)
{
    for (size_t i = 0; i < count; i++)
        note(row, numbers[i]);
}

/* True when the call succeeded; a refusal is noted with its sentence, by a sum that feels the order of letters. */
static inline bool did(exercise_row *row, bc_status status, const bc_error *err)
{
    double sum = 0.0;

    note(row, (double)status);
    if (status == BC_OK)
        return true;
    for (size_t i = 0; err->message[i] != '\0'; i++)
        sum += (double)(i + 1) * (double)(unsigned char)err->message[i];
    note(row, sum);
    row->failures++;
    return false;
}

#define EXERCISE_QUANTITIES 128 /* room for all quantities */

static inline void exercise_quantities(const bc_subject *s, exercise_row *row)
{
    bool wanted[EXERCISE_QUANTITIES];
    double values[EXERCISE_QUANTITIES];
    bc_error err;

    if (bc_quantity_count() <= EXERCISE_QUANTITIES) {
        for (size_t i = 0; i < EXERCISE_QUANTITIES; i++)
            wanted[i] = i % 5 != 3;
        bc_quantity_values(wanted, s, values);
        note_all(row, values, bc_quantity_count());
    }

    for (size_t i = 0; i < bc_quantity_count(); i++) {
        bc_figure f;
        double value = 0.0;

        if (did(row, bc_quantity_evaluate(i, s, &f, &err), &err))
            note_all(row, (double[]){f.value, f.u, f.u_composition, f.u_tables}, 4);
        if (did(row, bc_quantity_value(i, s, &value, &err), &err))
            note(row, value);
    }
}

static inline void exercise_components(exercise_row *row)
{
    static const char *const WORDS[] = {"nC4", "c6+", "air", "c5+", "methan"};
    double parts[BC_SPECIES_CAPACITY];
    char remark[BC_REMARK_BYTES];
    bc_error err;

    for (size_t i = 0; i < sizeof WORDS / sizeof *WORDS; i++)
        if (did(row, bc_composition_component(WORDS[i], parts, remark, &err), &err)) {
            note_all(row, parts, BC_SPECIES_CAPACITY);
            note(row, (double)strlen(remark));
        }
}

static inline void exercise_flames(const bc_gas *gas, exercise_row *row)
{
    static const double LAMBDAS[] = {0.63, 1.0, 1.37};
    bc_error err;

    for (size_t i = 0; i < sizeof LAMBDAS / sizeof *LAMBDAS; i++) {
        bc_reactants r = {.fuel = *gas, .oxidant = bc_oxidant_air(), .fuel_t_k = 288.15, .oxidant_t_k = 473.15, .p_pa = 101325.0};
        bc_burn_case c = bc_burn_case_default(gas);
        bc_mixture flame;
        bc_burn burn;

        if (did(row, bc_oxidant_for_lambda(gas, &r.oxidant, LAMBDAS[i], &r.oxidant_per_fuel, &err), &err)) {
            if (did(row, bc_flame_equilibrium(&r, &flame, &err), &err))
                note_all(row, flame.moles, BC_PRODUCT_CAPACITY);
            if (did(row, bc_flame_complete(&r, &flame, &err), &err))
                note(row, flame.t_k);
        }
        c.lambda = LAMBDAS[i];
        if (did(row, bc_burn_of(&c, &burn, &err), &err))
            note_all(row, (double[]){burn.dew.t_k, burn.flame.t_k, burn.path.total_j, burn.yield.efficiency_net, burn.released_j}, 5);
    }
}

static inline void exercise_flue(const bc_gas *gas, exercise_row *row)
{
    const bc_gas air = bc_oxidant_air();
    const bc_siegert *siegert = bc_siegert_at(0);
    bc_flue flue;
    bc_flue_factor factor;
    bc_condensation condensation;
    bc_acid_dew acid;
    bc_flammability flammability;
    bc_burning_velocity velocity;
    bc_emission emission;
    double number = 0.0;
    bc_error err;

    if (did(row, bc_flue_at(gas, &air, 1.17, &flue, &err), &err)) {
        if (did(row, bc_condense(&flue.wet, 313.7, 101325.0, &condensation, &err), &err))
            note(row, condensation.condensate_mol);
        if (did(row, bc_acid_dew_point_of(&flue.wet, 0.02, 101325.0, &acid, &err), &err))
            note_all(row, (double[]){acid.min_k, acid.max_k}, 2);
        const bc_emission_basis basis = {BC_POLLUTANT_NOX, 0.031, 0.03, BC_EMISSION_AIR_EU, flue.dry_mol, 8.0e5};

        if (did(row, bc_emission_convert(&basis, BC_EMISSION_FRACTION, 87e-6, &emission, &err), &err))
            note(row, emission.kg_per_m3_at_ref);
        if (did(row, bc_lambda_from_flue_oxygen(gas, &air, 0.031, BC_FLUE_WET, &number, &err), &err))
            note(row, number);
    }
    if (did(row, bc_flue_factor_of(gas, 8.0e5, &factor, &err), &err))
        note(row, factor.carbon_dioxide);
    if (did(row, bc_flammability_of(gas, &flammability, &err), &err))
        note_all(row, (double[]){flammability.lfl, flammability.ufl, flammability.iso10156_sum}, 3);
    if (did(row, bc_burning_velocity_of(gas, &velocity, &err), &err))
        note(row, velocity.value_m_per_s);
    if (did(row, bc_siegert_loss(siegert, 431.0, 293.0, 0.047, &number, &err), &err))
        note(row, number);
    if (did(row, bc_humidity_wet_bulb(301.3, 294.1, 99800.0, &number, &err), &err))
        note(row, number);
    if (did(row, bc_thermo_enthalpy(3, 7000.0, &number, &err), &err)) /* refused: beyond the data */
        note(row, number);
}

static inline void exercise_blend(const exercise_of *e, exercise_row *row)
{
    const bc_blend_part parts[] = {{&e->gas, &e->spread}, {&e->other, NULL}};
    const double share[BC_BLEND_PARTS_MAX] = {0.37, 0.63};
    double other_share[BC_BLEND_PARTS_MAX];
    bc_mixer mixer;
    bc_spread spread;
    bc_blend_terms terms;
    bc_window window[BC_WINDOW_MAX];
    bc_error err;

    for (bc_blend_basis by = BC_BY_MOLE; by <= BC_BY_ENERGY; by++) {
        if (!did(row, bc_mixer_make(&e->reference, by, parts, 2, &mixer, &err), &err))
            continue;
        const bc_gas gas = bc_mixer_gas(&mixer, share);
        const bc_blend_line line = {&mixer, {1.0, 0.0}, {0.0, 1.0}};

        note_all(row, gas.x, BC_SPECIES_CAPACITY);
        bc_mixer_spread(&mixer, share, &spread);
        note_all(row, spread.dx[0], spread.count > 0 ? BC_SPECIES_CAPACITY : 0);
        bc_mixer_shares(&mixer, share, BC_BY_MASS, other_share);
        note_all(row, other_share, 2);
        if (did(row, bc_blend_terms_of(&mixer, e->offer, share, &terms, &err), &err))
            note_all(row, (double[]){terms.price_per_j, terms.co2_burning_per_j}, 2);
        const size_t windows = bc_line_windows(&line, &e->contract, window);

        note(row, (double)windows);
        for (size_t i = 0; i < windows; i++)
            note_all(row, (double[]){window[i].low, window[i].high}, 2);
    }
}

static inline void exercise_switch(const exercise_of *e, const bc_subject *s, exercise_row *row)
{
    bc_subject other;
    bc_switch judged;
    bc_error err;

    if (!did(row, bc_subject_make(s->reference, &e->other, NULL, &other, &err), &err))
        return;
    for (int with_burner = 0; with_burner < 2; with_burner++) {
        if (!did(row, bc_switch_judge(s, &other, with_burner ? &e->burner : NULL, 0.0, &judged, &err), &err))
            continue;
        note(row, (double)judged.verdict);
        for (size_t i = 0; i < judged.count; i++)
            note_all(row, (double[]){judged.criteria[i].value, judged.criteria[i].adjusted, (double)judged.criteria[i].verdict}, 3);
    }
}

static inline void exercise_contract(const exercise_of *e, exercise_row *row)
{
    const bc_trap_gas trapped_gas = {&e->composition, &e->gas};
    bc_trade trade;
    bc_ratio ratio;
    bc_error err;

    for (size_t i = 0; i < e->contract.limit_count; i++) {
        bc_limit_figure f;
        bc_trapped trapped;
        double value = 0.0;

        if (did(row, bc_limit_judge(&e->contract, i, &e->gas, &e->spread, &f, &err), &err)) {
            const bc_assessment a = bc_limit_assess(&e->contract.limits[i], &f, 1.64);

            note_all(row, (double[]){f.value, f.u, f.margin, a.probability, (double)a.conformity}, 5);
        }
        if (did(row, bc_limit_ratio(&e->contract, i, &ratio, &err), &err)
            && did(row, bc_ratio_evaluate(&ratio, &e->gas, &value, &err), &err))
            note(row, value);
        for (size_t trap = 0; trap < bc_trap_count(); trap++)
            if (did(row, bc_trap_value(trap, &e->contract, i, &trapped_gas, &trapped, &err), &err))
                note(row, trapped.value);
    }
    if (did(row, bc_contract_trade(&e->contract, NULL, &e->gas, &trade, &err), &err))
        note_all(row, (double[]){trade.price_per_m3, trade.annual_cost, trade.annual_co2_kg}, 3);
}

static inline void exercise_words(exercise_row *row)
{
    static const char *const WORDS[] = {"isobutane", "C4H10", "ethan", "CO2", "1e3"};
    size_t index = 0;
    bc_state state = bc_state_default();
    bc_unit unit;
    double number = 0.0;
    bc_error err;

    for (size_t i = 0; i < sizeof WORDS / sizeof *WORDS; i++) {
        if (did(row, bc_species_find(WORDS[i], &index, &err), &err))
            note(row, (double)index);
        if (did(row, bc_number_parse(WORDS[i], &number, &err), &err))
            note(row, number);
        if (did(row, bc_unit_parse(WORDS[i], &unit, &err), &err))
            note(row, unit.factor);
    }
    if (did(row, bc_state_parse("60F/60F@14.73psi", &state, &err), &err))
        note(row, state.metering_pa);
    (void)did(row, bc_state_parse("15/31.5", &state, &err), &err);
    if (did(row, bc_number_parse("0.1234567890123456789012345678901234567", &number, &err), &err))
        note(row, number);
}

static inline void exercise_checks(exercise_row *row)
{
    bc_check check;
    bc_error err;

    for (size_t i = 0; i < bc_check_count(); i++)
        if (did(row, bc_check_run(i, &check, &err), &err))
            note(row, check.computed);
}

/* Everything. The row is emptied first. */
static inline void exercise(const exercise_of *e, exercise_row *row)
{
    const bc_reference *const references[] = {&e->reference, &e->other_reference};
    bc_subject s;
    bc_error err;

    row->count = 0;
    row->failures = 0;
    for (size_t i = 0; i < 2; i++)
        if (did(row, bc_subject_make(references[i], &e->gas, &e->spread, &s, &err), &err)) {
            exercise_quantities(&s, row);
            exercise_switch(e, &s, row);
        }
    exercise_components(row);
    exercise_flames(&e->gas, row);
    exercise_flue(&e->gas, row);
    exercise_blend(e, row);
    exercise_contract(e, row);
    exercise_words(row);
    exercise_checks(row);
}

/* Reads what is exercised from the told scenario; asserts nothing: the caller does. */
static inline bc_status exercise_load(const char *gas, exercise_of *e, bc_error *err)
{
    static const bc_state SATURATED = {60.0 / 1.8 - 32.0 / 1.8, 60.0 / 1.8 - 32.0 / 1.8, 101559.8, true, 1995};
    const bc_state contract_state = {25.0, 0.0, 101325.0, false, 2016};
    bc_status status = bc_reference_at(&contract_state, &e->reference, err);

    if (status == BC_OK)
        status = bc_reference_at(&SATURATED, &e->other_reference, err);
    if (status == BC_OK)
        status = bc_composition_read(BC_SOURCE_DIR "/examples/biomethane-offer.ini", &e->composition, err);
    e->other = e->composition.gas;
    e->offer[1] = e->composition.offer;
    if (status == BC_OK)
        status = bc_composition_find(gas, NULL, 0, &e->composition, err);
    e->gas = e->composition.gas;
    e->spread = e->composition.spread;
    e->offer[0] = e->composition.offer;
    if (status == BC_OK)
        status = bc_burner_read(BC_SOURCE_DIR "/examples/kiln.ini", &e->burner, err);
    if (status == BC_OK)
        status = bc_contract_read(BC_SOURCE_DIR "/examples/contract-marrowfen.ini", &e->contract, err);
    return status;
}

#endif
