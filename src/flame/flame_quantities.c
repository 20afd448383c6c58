/* SPDX-License-Identifier: MIT */
/* flame_quantities.c - combustion figures of a gas alone, in the form the list of quantities takes them. */
#include "flame/flame_quantities.h"

#include "base/compiler.h"
#include "base/error_internal.h"
#include "bluecone/dewpoint.h"
#include "bluecone/flame.h"
#include "bluecone/flammability.h"
#include "bluecone/flue.h"
#include "bluecone/oxidant.h"
#include "gas/species_index.h"

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

static bc_status demand_of(const bc_subject *s, bc_demand *demand, bc_error *err)
{
    const bc_gas air = bc_oxidant_air();
    const bc_status status = bc_fuel_check(&s->gas, err);

    return status == BC_OK ? bc_oxidant_demand(&s->gas, &air, demand, err) : status;
}

static bc_status oxygen_demand(const bc_subject *s, double *value, bc_error *err)
{
    bc_demand demand;
    const bc_status status = demand_of(s, &demand, err);

    if (status == BC_OK)
        *value = demand.oxygen_mol;
    return status;
}

static bc_status air_demand(const bc_subject *s, double *value, bc_error *err)
{
    bc_demand demand;
    const bc_status status = demand_of(s, &demand, err);

    if (status == BC_OK)
        *value = demand.oxidant_mol;
    return status;
}

static bc_status air_demand_mass(const bc_subject *s, double *value, bc_error *err)
{
    bc_demand demand;
    const bc_status status = demand_of(s, &demand, err);

    if (status == BC_OK)
        *value = demand.oxidant_kg;
    return status;
}

static bc_status flue_of(const bc_subject *s, bc_flue *flue, bc_error *err)
{
    const bc_gas air = bc_oxidant_air();

    return bc_flue_at(&s->gas, &air, 1.0, flue, err);
}

static bc_status flue_wet(const bc_subject *s, double *value, bc_error *err)
{
    bc_flue flue;
    const bc_status status = flue_of(s, &flue, err);

    if (status == BC_OK)
        *value = flue.wet_mol;
    return status;
}

static bc_status flue_dry(const bc_subject *s, double *value, bc_error *err)
{
    bc_flue flue;
    const bc_status status = flue_of(s, &flue, err);

    if (status == BC_OK)
        *value = flue.dry_mol;
    return status;
}

static bc_status co2_max(const bc_subject *s, double *value, bc_error *err)
{
    double x = 0.0;
    const bc_status status = bc_flue_co2_max(&s->gas, &x, err);

    if (status == BC_OK)
        *value = 100.0 * x;
    return status;
}

static bc_status flue_dew_point(const bc_subject *s, double *value, bc_error *err)
{
    bc_flue flue;
    bc_dew dew;
    bc_status status = flue_of(s, &flue, err);

    if (status == BC_OK)
        status = bc_dew_point(flue.wet.x[SPECIES_water], P_PA, &dew, err);
    if (status != BC_OK)
        return status;
    if (!dew.exists)
        return bc_fail(err, BC_ERR_RANGE, "the flue gas holds no water: it has no water dew point");
    *value = dew.t_k - 273.15;
    return BC_OK;
}

static bc_status acid_dew_point(const bc_subject *s, double *value, bc_error *err)
{
    bc_flue flue;
    bc_acid_dew dew;
    bc_status status = flue_of(s, &flue, err);

    if (status == BC_OK)
        status = bc_acid_dew_point_of(&flue.wet, BC_SO3_CONVERSION, P_PA, &dew, err);
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
    bc_demand demand;
    bc_mixture flame;
    bc_status status = demand_of(s, &demand, err);

    if (status != BC_OK)
        return status;
    r.oxidant_per_fuel = demand.oxidant_mol;
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
    const bc_status status = bc_flue_factor_of(&s->gas, heat_j_per_mol, &factor, err);

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
    bc_figure f = {0.0, false, 0.0, 0.0, 0.0};
    const bc_status status = ROWS[index].of(subject, &f.value, err);

    if (status == BC_OK)
        *figure = f;
    return status;
}

quantity_source flame_quantities(void)
{
    return (quantity_source){BC_COUNT(ROWS), shown, evaluate, NULL};
}
