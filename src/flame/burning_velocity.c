/* SPDX-License-Identifier: MIT */
/* burning_velocity.c - laminar burning velocity of a fuel blend by a mixing rule. */
#include "bluecone/flammability.h"

#include "base/error_internal.h"
#include "bluecone/oxidant.h"
#include "flame/combustible_internal.h"
#include "gas/species_index.h"

/* Figures by species, cm/s; 0 where there is none. */
static const struct {
    double used, lowest, highest;
} VELOCITIES[SPECIES_COUNT] = {
#define BURNING_VELOCITY(symbol, used, lowest, highest, source) [SPECIES_##symbol] = {used, lowest, highest},
#include "data/burning_velocity.def"
};

static bool has_velocity(size_t species)
{
    return VELOCITIES[species].used > 0.0;
}

/* Mass fraction of the inerts of an air-free gas in its stoichiometric mixture with dry air. */
static bc_status diluent_of(const bc_gas *gas, double *fraction, bc_error *err)
{
    const bc_gas air = bc_oxidant_air();
    bc_demand demand;
    double inert_kg = 0.0;
    const bc_status status = bc_oxidant_demand(gas, &air, &demand, err);

    if (status != BC_OK)
        return status;
    for (size_t i = 0; i < SPECIES_COUNT; i++)
        if (gas->x[i] != 0.0 && !combustible_is(i))
            inert_kg += gas->x[i] * bc_species_molar_mass_kg_per_mol(i);
    *fraction = inert_kg / bc_gas_molar_mass_kg_per_mol(gas) / (1.0 + demand.oxidant_kg);
    return BC_OK;
}

/* 1/S = sum(x_i/S_i), times 1 - 2.1 f (Metghalchi and Keck). */
static void mix(const combustible_part *part, double diluent, bc_burning_velocity *v)
{
    double used[BC_SPECIES_CAPACITY];
    double lowest[BC_SPECIES_CAPACITY];
    double highest[BC_SPECIES_CAPACITY];
    const double dilution = 1.0 - 2.1 * diluent;

    for (size_t i = 0; i < part->count; i++) {
        used[i] = VELOCITIES[part->species[i]].used / 100.0;
        lowest[i] = VELOCITIES[part->species[i]].lowest / 100.0;
        highest[i] = VELOCITIES[part->species[i]].highest / 100.0;
    }
    v->value_m_per_s = dilution * bc_le_chatelier(part->share, used, part->count);
    v->low_m_per_s = dilution * bc_le_chatelier(part->share, lowest, part->count);
    v->high_m_per_s = dilution * bc_le_chatelier(part->share, highest, part->count);
}

static bc_status check_part(const combustible_part *part, bc_error *err)
{
    if (part->total <= 0.0)
        return bc_fail(err, BC_ERR_RANGE, "nothing of the gas burns, so it has no burning velocity");
    if (part->covered < BC_BURNING_COVERED_MIN)
        return bc_fail(
            err, BC_ERR_RANGE,
            "no burning velocity is tabulated here for %s: only %.4g %% of what burns in the gas has one",
            bc_species_id(part->missing), part->covered * 100.0);
    return BC_OK;
}

bc_status bc_burning_velocity_of(const bc_gas *gas, bc_burning_velocity *velocity, bc_error *err)
{
    const combustible_part part = combustible_part_of(gas, has_velocity);
    bc_gas pure;
    double diluent = 0.0;
    bc_status status = check_part(&part, err);

    if (status == BC_OK)
        status = bc_gas_air_free(gas, &pure, NULL, err);
    if (status == BC_OK)
        status = diluent_of(&pure, &diluent, err);
    if (status != BC_OK)
        return status;
    if (diluent > BC_BURNING_DILUENT_MAX)
        return bc_fail(err, BC_ERR_RANGE,
                       "inerts are %.4g %% of the mass of the mixture; the dilution term holds up to %g %%",
                       diluent * 100.0, BC_BURNING_DILUENT_MAX * 100.0);
    velocity->hydrogen = gas->x[SPECIES_hydrogen] / part.total;
    velocity->diluent = diluent;
    velocity->in_range = velocity->hydrogen <= BC_BURNING_HYDROGEN_MAX || part.count == 1;
    mix(&part, diluent, velocity);
    return BC_OK;
}
