/* SPDX-License-Identifier: MIT */
/* terms.c - prices and CO2 of parts, put on one scale and added up. */
#include "bluecone/terms.h"

#include "base/error_internal.h"
#include "gas/species_index.h"

#include <math.h>
#include <string.h>

#define SAME_METERING 0.01      /* K */
#define HEAT_MIN_J_PER_MOL 1e3  /* below it a gas is no fuel, as in blend.c */

static bc_status volume_per_mole(const bc_per_amount *figure, const bc_reference *reference, const bc_gas *gas, double *amount, bc_error *err)
{
    bc_state state = reference->state;
    bc_reference own;

    if (!figure->has_metering || fabs(figure->metering_c - state.metering_c) < SAME_METERING) {
        *amount = bc_value_of(reference, gas).molar_volume_m3_per_mol;
        return BC_OK;
    }
    state.metering_c = figure->metering_c;
    state.metering_pa = BC_P0_PA;
    const bc_status status = bc_reference_at(&state, &own, err);

    if (status == BC_OK)
        *amount = bc_value_of(&own, gas).molar_volume_m3_per_mol;
    return status;
}

bc_status bc_amount_per_mole(const bc_per_amount *figure, const bc_reference *reference, const bc_gas *gas, double *amount, bc_error *err)
{
    const bc_value v = bc_value_of(reference, gas);

    if (figure->of == BC_DIM_VOLUME)
        return volume_per_mole(figure, reference, gas, amount, err);
    if (figure->of == BC_DIM_MASS)
        *amount = v.molar_mass_kg_per_mol;
    else if (figure->of == BC_DIM_AMOUNT)
        *amount = 1.0;
    else if (v.gross_j_per_mol < HEAT_MIN_J_PER_MOL)
        return bc_fail(err, BC_ERR_RANGE, "a gas without heat cannot be counted by energy; state its price, CO2 or flow per kg, m3 or kmol");
    else
        *amount = figure->net ? v.net_j_per_mol : v.gross_j_per_mol;
    return BC_OK;
}

double bc_co2_per_mole(const bc_gas *gas)
{
    return bc_gas_atoms(gas, BC_C) * bc_species_molar_mass_kg_per_mol(SPECIES_carbon_dioxide);
}

/* Adds what a mole of blend pays for one part: *sum += f a(part) figure. */
static bc_status add_per_mole(const bc_mixer *m, size_t part, double mole, const bc_per_amount *figure, double *sum, bc_error *err)
{
    double amount = 0.0;
    const bc_status status = bc_amount_per_mole(figure, m->reference, m->parts[part].gas, &amount, err);

    if (status == BC_OK)
        *sum += mole * amount * figure->si;
    return status;
}

static bc_status add_part(const bc_mixer *m, size_t part, double mole, const bc_offer *offer, bc_blend_terms *t, bc_error *err)
{
    bc_status status = BC_OK;

    if (offer->price.given && t->currency[0] != '\0' && strcmp(t->currency, offer->currency) != 0)
        return bc_fail(err, BC_ERR_USAGE, "prices are in %s and in %s; state them in one currency", t->currency, offer->currency);
    if (offer->price.given)
        memcpy(t->currency, offer->currency, sizeof t->currency);
    t->has_price = t->has_price && offer->price.given;
    t->has_co2 = t->has_co2 && offer->co2.given;
    if (offer->price.given)
        status = add_per_mole(m, part, mole, &offer->price, &t->price_per_j, err);
    if (status == BC_OK && offer->co2.given)
        status = add_per_mole(m, part, mole, &offer->co2, &t->co2_making_per_j, err);
    if (!offer->biogenic)
        t->co2_burning_per_j += mole * bc_co2_per_mole(m->parts[part].gas);
    return status;
}

bc_status bc_blend_terms_of(const bc_mixer *m, const bc_offer offer[], const double share[], bc_blend_terms *terms, bc_error *err)
{
    bc_blend_terms t = {.has_price = true, .has_co2 = true};
    double mole[BC_BLEND_PARTS_MAX];
    double heat = 0.0;

    bc_mixer_moles(m, share, mole);
    for (size_t i = 0; i < m->count; i++) {
        heat += mole[i] * m->value[i].gross_j_per_mol;
        const bc_status status = mole[i] > 0.0 ? add_part(m, i, mole[i], &offer[i], &t, err) : BC_OK;

        if (status != BC_OK)
            return status;
    }
    if (heat < HEAT_MIN_J_PER_MOL)
        return bc_fail(err, BC_ERR_RANGE, "the blend has no heat, so nothing can be counted per unit of it");
    t.price_per_j /= heat;
    t.co2_making_per_j /= heat;
    t.co2_burning_per_j /= heat;
    *terms = t;
    return BC_OK;
}
