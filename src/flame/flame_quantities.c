/* SPDX-License-Identifier: MIT */
/* flame_quantities.c - combustion figures of a gas alone, in the form the list of quantities takes them. */
#include "flame/flame_quantities.h"

#include "base/compiler.h"
#include "base/error_internal.h"
#include "bluecone/dewpoint.h"
#include "bluecone/flame.h"
#include "bluecone/flammability.h"
#include "bluecone/oxidant.h"
#include "flame/flue_internal.h"
#include "gas/species_index.h"

#include <string.h>

#define T_IN_K 298.15
#define P_PA 101325.0
#define J_PER_GJ 1e9

typedef bc_status figure_function(const bc_subject *, double *, bc_error *);

static figure_function oxygen_demand, air_demand, air_demand_mass, flue_wet, flue_dry, co2_max, flue_dew_point, acid_dew_point,
    flame_temperature, flame_complete, co2_factor_net, co2_factor_gross, lower_limit, upper_limit, burning_velocity;

static const struct {
    bc_quantity shown;
    figure_function *of;
} ROWS[] = {
#define FLAME(id, function, unit, digits, scatter, group, label, method, meaning) {{id, label, group, unit, method, meaning, digits, scatter}, function},
#include "flame/quantities_flame.def"
};

/* The gas and the dry air that just burns it; needs oxygen, as a fuel does. */
static bc_status pair_of(const bc_subject *s, oxidant_pair *pair, bc_error *err)
{
    memcpy(pair->fuel, s->atoms, sizeof pair->fuel);
    oxidant_air_atoms(pair->oxidant);
    return oxidant_pair_balance(pair, err);
}

/* The same for figures that say what is wrong with a gas that is no fuel. */
static bc_status fuel_pair_of(const bc_subject *s, oxidant_pair *pair, bc_error *err)
{
    const bc_status status = pair_of(s, pair, NULL);

    return status == BC_ERR_RANGE ? bc_fuel_check(&s->gas, err) : status;
}

static bc_status oxygen_demand(const bc_subject *s, double *value, bc_error *err)
{
    oxidant_pair pair;
    const bc_status status = fuel_pair_of(s, &pair, err);

    if (status == BC_OK)
        *value = pair.need;
    return status;
}

static bc_status air_demand(const bc_subject *s, double *value, bc_error *err)
{
    oxidant_pair pair;
    const bc_status status = fuel_pair_of(s, &pair, err);

    if (status == BC_OK)
        *value = pair.ratio;
    return status;
}

static bc_status air_demand_mass(const bc_subject *s, double *value, bc_error *err)
{
    oxidant_pair pair;
    const bc_status status = fuel_pair_of(s, &pair, err);

    if (status != BC_OK)
        return status;
    const bc_gas air = bc_oxidant_air();

    *value = pair.ratio * bc_gas_molar_mass_kg_per_mol(&air) / bc_gas_molar_mass_kg_per_mol(&s->gas);
    return BC_OK;
}

/* Flue gas with the air that just suffices, mol per mol of gas. */
typedef struct {
    double wet, dry;
    bc_gas amounts;
} flue_figures;

static bc_status flue_of(const bc_subject *s, flue_figures *flue, bc_error *err)
{
    oxidant_pair pair;
    const bc_status status = pair_of(s, &pair, err);

    if (status != BC_OK)
        return status;
    flue->dry = flue_amounts(&pair, 1.0, &flue->amounts);
    flue->wet = flue->dry + flue->amounts.x[SPECIES_water];
    return BC_OK;
}

static bc_status flue_wet(const bc_subject *s, double *value, bc_error *err)
{
    flue_figures flue;
    const bc_status status = flue_of(s, &flue, err);

    if (status == BC_OK)
        *value = flue.wet;
    return status;
}

static bc_status flue_dry(const bc_subject *s, double *value, bc_error *err)
{
    flue_figures flue;
    const bc_status status = flue_of(s, &flue, err);

    if (status == BC_OK)
        *value = flue.dry;
    return status;
}

static bc_status co2_max(const bc_subject *s, double *value, bc_error *err)
{
    flue_figures flue;
    const bc_status status = flue_of(s, &flue, err);

    if (status == BC_OK)
        *value = 100.0 * (flue.amounts.x[SPECIES_carbon_dioxide] / flue.dry); /* the air leaves nitrogen: not 0 */
    return status;
}

static bc_status flue_dew_point(const bc_subject *s, double *value, bc_error *err)
{
    flue_figures flue;
    bc_dew dew;
    bc_status status = flue_of(s, &flue, err);

    if (status == BC_OK)
        status = bc_dew_point(flue.amounts.x[SPECIES_water] / flue.wet, P_PA, &dew, err);
    if (status != BC_OK)
        return status;
    if (!dew.exists)
        return bc_fail(err, BC_ERR_RANGE, "the flue gas holds no water: it has no water dew point");
    *value = dew.t_k - 273.15;
    return BC_OK;
}

static bc_status acid_dew_point(const bc_subject *s, double *value, bc_error *err)
{
    flue_figures flue;
    bc_acid_dew dew;
    bc_status status = flue_of(s, &flue, err);

    if (status == BC_OK)
        status = bc_acid_dew_point(flue.amounts.x[SPECIES_water] / flue.wet,
                                   BC_SO3_CONVERSION * (flue.amounts.x[SPECIES_sulfur_dioxide] / flue.wet), P_PA, &dew, err);
    if (status != BC_OK)
        return status;
    if (!dew.exists)
        return bc_fail(err, BC_ERR_RANGE, "the flue gas holds no sulfur: it has no acid dew point");
    *value = dew.verhoff_banchero_k - 273.15;
    return BC_OK;
}

typedef bc_status flame_function(const bc_reactants *, bc_mixture *, bc_error *);

static bc_status flame_with(const bc_subject *s, flame_function *flame_at, double *value, bc_error *err)
{
    bc_reactants r = {.fuel = s->gas, .oxidant = bc_oxidant_air(), .fuel_t_k = T_IN_K, .oxidant_t_k = T_IN_K, .p_pa = P_PA};
    oxidant_pair pair;
    bc_mixture flame;
    bc_status status = fuel_pair_of(s, &pair, err);

    if (status != BC_OK)
        return status;
    r.oxidant_per_fuel = pair.ratio;
    status = flame_at(&r, &flame, err);
    if (status == BC_OK)
        *value = flame.t_k - 273.15;
    return status;
}

static bc_status flame_temperature(const bc_subject *s, double *value, bc_error *err)
{
    return flame_with(s, bc_flame_equilibrium, value, err);
}

static bc_status flame_complete(const bc_subject *s, double *value, bc_error *err)
{
    return flame_with(s, bc_flame_complete, value, err);
}

static bc_status co2_factor(const bc_subject *s, double heat_j_per_mol, double *value, bc_error *err)
{
    bc_flue_factor factor;
    const bc_status status = flue_factor_of(s->atoms, heat_j_per_mol, &factor, err);

    if (status == BC_OK)
        *value = factor.carbon_dioxide * J_PER_GJ;
    return status;
}

static bc_status co2_factor_net(const bc_subject *s, double *value, bc_error *err)
{
    return co2_factor(s, s->value.net_j_per_mol, value, err);
}

static bc_status co2_factor_gross(const bc_subject *s, double *value, bc_error *err)
{
    return co2_factor(s, s->value.gross_j_per_mol, value, err);
}

static bc_status flammability_of(const bc_subject *s, bc_flammability *f, bc_error *err)
{
    const bc_status status = bc_flammability_of(&s->gas, f, err);

    if (status == BC_OK && f->verdict == BC_NOT_FLAMMABLE)
        return bc_fail(err, BC_ERR_RANGE, "the gas is not flammable in air: it has no flammability limits");
    return status;
}

static bc_status lower_limit(const bc_subject *s, double *value, bc_error *err)
{
    bc_flammability f;
    const bc_status status = flammability_of(s, &f, err);

    if (status != BC_OK)
        return status;
    if (!f.has_lfl)
        return bc_fail(err, BC_ERR_RANGE, "the gas has no lower flammability limit by this method");
    *value = 100.0 * f.lfl;
    return BC_OK;
}

static bc_status upper_limit(const bc_subject *s, double *value, bc_error *err)
{
    bc_flammability f;
    const bc_status status = flammability_of(s, &f, err);

    if (status != BC_OK)
        return status;
    if (!f.has_ufl)
        return bc_fail(err, BC_ERR_RANGE, "the gas has no upper flammability limit by this method");
    *value = 100.0 * f.ufl;
    return BC_OK;
}

static bc_status burning_velocity(const bc_subject *s, double *value, bc_error *err)
{
    bc_burning_velocity velocity;
    const bc_status status = bc_burning_velocity_of(&s->gas, &velocity, err);

    if (status != BC_OK)
        return status;
    if (!velocity.in_range)
        return bc_fail(err, BC_ERR_RANGE, "the gas is outside the mixing rule for burning velocities: over 50 %% hydrogen in its combustibles");
    *value = 100.0 * velocity.value_m_per_s;
    return BC_OK;
}

static const bc_quantity *shown(size_t index)
{
    return &ROWS[index].shown;
}

static bc_status evaluate(size_t index, const bc_subject *subject, bc_figure *figure, bc_error *err)
{
    bc_figure f = {.has_u = false};
    const bc_status status = ROWS[index].of(subject, &f.value, err);

    if (status == BC_OK)
        *figure = f;
    return status;
}

quantity_source flame_quantities(void)
{
    return (quantity_source){BC_COUNT(ROWS), shown, evaluate, NULL, NULL};
}
