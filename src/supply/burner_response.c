/* SPDX-License-Identifier: MIT */
/* burner_response.c - flows, flame and flue gas of a burner on another gas than it was set on. */
#include "base/error_internal.h"
#include "bluecone/flammability.h"
#include "gas/species_index.h"
#include "supply/burner_internal.h"

#include <math.h>
#include <string.h>

/* sqrt(p p_abs/(M Z T)) over that of the old gas; without a stated pressure p is small and p_abs stays. */
static double orifice_ratio(const bc_burner_case *set, const bc_subject *gas, const bc_burner_setting *setting)
{
    const double ambient = set->burner->ambient_pa;
    const jet_gas was = jet_gas_of(set->old_gas, set->burner->gas_k);
    const jet_gas is = jet_gas_of(gas, gas_temperature(set, setting->gas_k));

    if (!set->has_pressure)
        return setting->area * sqrt(setting->pressure * was.m_kg_per_mol * was.z * was.t_k / (is.m_kg_per_mol * is.z * is.t_k));
    const bool nozzle = expands(set->gas_pa, ambient);

    return setting->area * orifice_flux(&is, set->gas_pa * setting->pressure, ambient, nozzle) / orifice_flux(&was, set->gas_pa, ambient, nozzle);
}

static double dosed(const bc_burner_case *set, const bc_subject *gas, const bc_burner_setting *setting)
{
    const bc_value *was = &set->old_gas->value;
    const bc_value *is = &gas->value;

    switch (set->dosing) {
    case BC_DOSING_VOLUME:
        return setting->gas * was->molar_volume_m3_per_mol / is->molar_volume_m3_per_mol;
    case BC_DOSING_MASS:
        return setting->gas * was->molar_mass_kg_per_mol / is->molar_mass_kg_per_mol;
    case BC_DOSING_ORIFICE:
    case BC_DOSINGS:
    default:
        return orifice_ratio(set, gas, setting);
    }
}

bc_status burner_lambda_target(const bc_burner_case *set, const bc_subject *gas, double *lambda, bc_error *err)
{
    const bool trim = set->burner->control == BC_CONTROL_TRIM_AIR || set->burner->control == BC_CONTROL_TRIM_GAS;

    if (!trim || set->lambda < 1.0) {
        *lambda = set->lambda;
        return BC_OK;
    }
    return bc_lambda_from_flue_oxygen(&gas->gas, &set->air, set->o2, set->burner->o2_basis, lambda, err);
}

static double held(double wanted, double range, bool *at_end)
{
    const double kept = fmin(fmax(wanted, 1.0 - range), 1.0 + range);

    *at_end = fabs(wanted - kept) > 1e-9;
    return kept;
}

/* The trim moves its flow from where the ratio control puts it, within its range. */
static void trim(const bc_burner_case *set, double need, double target, burner_flows *f)
{
    const double range = set->burner->trim_range;

    if (set->burner->control == BC_CONTROL_TRIM_AIR)
        f->air *= held(target / f->lambda, range, &f->trim_at_end);
    else
        f->fuel *= held(f->lambda / target, range, &f->trim_at_end);
    f->lambda = f->air * set->lambda * set->need / (f->fuel * need);
}

static void draw_air(const bc_burner_case *set, const bc_subject *gas, const bc_burner_setting *setting, double need, burner_flows *f)
{
    double theta = 0.0;
    double d = 0.0;

    jet_of(set, gas, gas_temperature(set, setting->gas_k), &theta, &d);
    /* a larger jet in the same throat: the ratio of their areas falls */
    const double constant = set->jet / setting->area;
    const double primary = constant > 1.0 ? setting->air * jet_air(constant, theta, d) : 0.0;
    const double air = f->fuel * primary + setting->air * set->secondary;

    f->primary = primary / need;
    f->air = air / (set->lambda * set->need);
    f->lambda = air / (f->fuel * need);
}

bc_status burner_flow_of(const bc_burner_case *set, const bc_subject *gas, const bc_burner_setting *setting, bool trimmed,
                         burner_flows *flows, bc_error *err)
{
    const bc_control control = set->burner->control;
    burner_flows f = {.air = setting->air};
    double need = 0.0;
    double target = 0.0;
    bc_status status = need_of(set, gas, &need, err);

    if (status != BC_OK)
        return status;
    f.fuel = dosed(set, gas, setting);
    f.lambda = f.air * set->lambda * set->need / (f.fuel * need);
    if (control == BC_CONTROL_ENTRAINED)
        draw_air(set, gas, setting, need, &f);
    if (trimmed && (control == BC_CONTROL_TRIM_AIR || control == BC_CONTROL_TRIM_GAS)) {
        status = burner_lambda_target(set, gas, &target, err);
        if (status == BC_OK)
            trim(set, need, target, &f);
    }
    if (status == BC_OK)
        *flows = f;
    return status;
}

static bc_status combust(const bc_burner_case *set, const bc_subject *gas, double gas_k, double lambda, bc_burn *burn, bc_error *err)
{
    const bc_burner *b = set->burner;
    bc_burn_case c = bc_burn_case_default(&gas->gas);

    c.oxidant = set->air;
    c.lambda = lambda;
    c.fuel_k = gas_k;
    c.oxidant_k = b->air_k;
    c.exit_k = b->flue_k;
    c.p_pa = b->ambient_pa;
    c.casing_loss = b->casing_loss;
    return bc_burn_of(&c, burn, err);
}

/* Oxygen and carbon monoxide of the flue gas, from the balance or, at lack of air, from equilibrium. */
static void read_flue(bc_burner_response *r, double *wet_mol)
{
    if (!r->burn.rich) {
        r->o2_dry = r->burn.flue.dry.x[SPECIES_oxygen];
        r->o2_wet = r->burn.flue.wet.x[SPECIES_oxygen];
        *wet_mol = r->burn.flue.wet_mol;
        return;
    }
    const bc_mixture *m = &r->burn.exit;
    const double water = m->moles[bc_product_of(SPECIES_water)];

    r->co_dry = m->moles[bc_product_of(SPECIES_carbon_monoxide)] / (m->total_moles - water);
    *wet_mol = m->total_moles;
}

static bc_status flue_of_old(const bc_burner_case *set, double *wet_mol, bc_error *err)
{
    bc_burner_response old = {.burn = {.rich = false}};
    bc_status status;

    if (set->lambda >= 1.0)
        status = bc_flue_at(&set->old_gas->gas, &set->air, set->lambda, &old.burn.flue, err);
    else
        status = combust(set, set->old_gas, set->burner->gas_k, set->lambda, &old.burn, err);
    if (status == BC_OK)
        read_flue(&old, wet_mol);
    return status;
}

static void scale(const bc_burner_case *set, const bc_subject *gas, bc_burner_response *r)
{
    const double fuel_kg = bc_gas_molar_mass_kg_per_mol(&gas->gas);
    const double air_kg = r->burn.oxidant_mol * bc_gas_molar_mass_kg_per_mol(&set->air);

    r->heat_ratio = r->fuel_ratio * gas->value.net_j_per_mol / set->old_gas->value.net_j_per_mol;
    r->has_flow = set->has_flow;
    if (!set->has_flow)
        return;
    r->fuel_mol_per_s = set->fuel_mol_per_s * r->fuel_ratio;
    r->input_w = r->fuel_mol_per_s * gas->value.net_j_per_mol;
    r->flue_kg_per_s = r->fuel_mol_per_s * (fuel_kg + air_kg);
}

static void read_velocity(const bc_subject *gas, bc_burner_response *r)
{
    bc_burning_velocity v;

    if (bc_burning_velocity_of(&gas->gas, &v, NULL) != BC_OK || !v.in_range)
        return;
    r->has_velocity = true;
    r->velocity_m_per_s = v.value_m_per_s;
}

bc_status bc_burner_respond(const bc_burner_case *set, const bc_subject *new_gas, const bc_burner_setting *setting,
                            bc_burner_response *response, bc_error *err)
{
    burner_flows f;
    bc_burner_response r;
    double wet_mol = 0.0, old_wet_mol = 0.0;
    bc_status status = burner_flow_of(set, new_gas, setting, true, &f, err);

    if (status != BC_OK)
        return status;
    memset(&r, 0, sizeof r);
    r.fuel_ratio = f.fuel;
    r.air_ratio = f.air;
    r.lambda = fabs(f.lambda - 1.0) < 1e-12 ? 1.0 : f.lambda; /* just enough air is no lack of it */
    r.primary = f.primary;
    r.trim_at_end = f.trim_at_end;
    status = combust(set, new_gas, gas_temperature(set, setting->gas_k), r.lambda, &r.burn, err);
    if (status == BC_OK)
        status = flue_of_old(set, &old_wet_mol, err);
    if (status != BC_OK)
        return status;
    read_flue(&r, &wet_mol);
    r.flue_ratio = r.fuel_ratio * wet_mol / old_wet_mol;
    scale(set, new_gas, &r);
    read_velocity(new_gas, &r);
    *response = r;
    return BC_OK;
}
