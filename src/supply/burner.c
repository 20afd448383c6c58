/* SPDX-License-Identifier: MIT */
/* burner.c - a burner set on its old gas: air, trim, jet, and the flows that its data give. */
#include "bluecone/burner.h"

#include "base/error_internal.h"
#include "bluecone/humidity.h"
#include "gas/species_index.h"
#include "supply/burner_internal.h"

#include <math.h>
#include <string.h>

#define PI 3.14159265358979323846

bc_burner bc_burner_default(void)
{
    return (bc_burner){.type = BC_BURNER_NOZZLE_MIX, .control = BC_CONTROL_FIXED, .dosing = BC_DOSING_ORIFICE, .orifices = 1.0, .discharge = 0.8,
                       .ambient_pa = 101325.0, .gas_k = 288.15, .air_k = 298.15, .flue_k = 423.15, .air_setting = BC_AIR_BY_LAMBDA,
                       .lambda = 1.2, .o2_basis = BC_FLUE_DRY, .primary = 0.6, .trim_range = 0.15, .co_lambda = 1.05,
                       .input = {true, true, 0.95, 1.05}};
}

bc_burner_setting bc_burner_setting_as_found(void)
{
    return (bc_burner_setting){1.0, 1.0, 1.0, 1.0, 0.0};
}

static bc_dosing dosing_of(const bc_burner *b)
{
    switch (b->control) {
    case BC_CONTROL_VOLUME:
        return BC_DOSING_VOLUME;
    case BC_CONTROL_MASS:
        return BC_DOSING_MASS;
    case BC_CONTROL_TRIM_AIR:
    case BC_CONTROL_TRIM_GAS:
        return b->dosing;
    case BC_CONTROL_FIXED:
    case BC_CONTROL_PNEUMATIC:
    case BC_CONTROL_ENTRAINED:
    case BC_CONTROLS:
    default:
        return BC_DOSING_ORIFICE;
    }
}

static bc_status moisten(const bc_burner *b, bc_gas *air, bc_error *err)
{
    double x_water = 0.0;
    bc_gas wet;

    if (!b->has_air_dew)
        return BC_OK;
    bc_status status = bc_humidity_dew_point(b->air_dew_k, b->ambient_pa, &x_water, err);

    if (status == BC_OK)
        status = bc_humidity_apply(air, x_water, &wet, err);
    if (status == BC_OK)
        *air = wet;
    return status;
}

bc_status need_of(const bc_burner_case *set, const bc_subject *gas, double *need, bc_error *err)
{
    bc_demand demand;
    const bc_status status = bc_oxidant_demand(&gas->gas, &set->air, &demand, err);

    if (status != BC_OK)
        return status;
    if (!(demand.oxidant_mol > 0.0))
        return bc_fail(err, BC_ERR_RANGE, "the gas does not burn: it needs no air");
    *need = demand.oxidant_mol;
    return BC_OK;
}

/* Air factor and flue oxygen of the setting, each from the other. */
static bc_status set_air(bc_burner_case *set, bc_error *err)
{
    const bc_burner *b = set->burner;
    bc_flue flue;
    bc_status status = need_of(set, set->old_gas, &set->need, err);

    set->lambda = b->lambda;
    set->o2 = 0.0;
    if (status == BC_OK && b->air_setting == BC_AIR_BY_FLUE_O2)
        status = bc_lambda_from_flue_oxygen(&set->old_gas->gas, &set->air, b->flue_o2, b->o2_basis, &set->lambda, err);
    if (status != BC_OK || set->lambda < 1.0)
        return status;
    status = bc_flue_at(&set->old_gas->gas, &set->air, set->lambda, &flue, err);
    if (status == BC_OK)
        set->o2 = (b->o2_basis == BC_FLUE_WET ? flue.wet : flue.dry).x[SPECIES_oxygen];
    return status;
}

/* Molar masses and temperatures of gas and air: what a jet feels. */
void jet_of(const bc_burner_case *set, const bc_subject *gas, double gas_k, double *theta, double *d)
{
    *theta = gas_k / set->burner->air_k;
    *d = bc_gas_molar_mass_kg_per_mol(&gas->gas) / bc_gas_molar_mass_kg_per_mol(&set->air);
}

static bc_status set_jet(bc_burner_case *set, bc_error *err)
{
    const bc_burner *b = set->burner;
    const double primary = b->primary * set->need;
    double theta = 0.0;
    double d = 0.0;

    set->jet = 0.0;
    set->secondary = 0.0;
    if (b->control != BC_CONTROL_ENTRAINED)
        return BC_OK;
    if (b->primary > set->lambda * (1.0 + 1e-12))
        return bc_fail_at(err, BC_ERR_INPUT, b->path, 0, "primary air of %.4g %% of the need is more than the %.4g %% of all air; lower it or raise the excess",
                       100.0 * b->primary, 100.0 * set->lambda);
    jet_of(set, set->old_gas, b->gas_k, &theta, &d);
    set->jet = jet_constant(primary, theta, d);
    set->secondary = fmax(set->lambda * set->need - primary, 0.0);
    return BC_OK;
}

static double flux(const bc_burner_case *set, double gas_pa)
{
    const jet_gas gas = jet_gas_of(set->old_gas, set->burner->gas_k);

    return orifice_flux(&gas, gas_pa, set->burner->ambient_pa, expands(gas_pa, set->burner->ambient_pa));
}

/* The pressure that drives a flow through the orifice, by Bernoulli's equation first, by the nozzle where that is
 * too high for it. */
static bool pressure_for(const bc_burner_case *set, double mol_per_m2_s, double *gas_pa)
{
    const jet_gas gas = jet_gas_of(set->old_gas, set->burner->gas_k);
    const double ambient = set->burner->ambient_pa;
    const double trial = 1.0e3;

    for (int pass = 0; pass < 2; pass++) {
        const bool nozzle = pass == 1;
        const double ratio = mol_per_m2_s / orifice_flux(&gas, trial, ambient, nozzle);

        if (!orifice_pressure(&gas, trial, ambient, nozzle, ratio, gas_pa))
            return false;
        if (!nozzle && !expands(*gas_pa, ambient))
            return true;
    }
    return true;
}

/* Of heat input, pressure and orifice each two give the third, and three a discharge coefficient. */
static void complete_flow(bc_burner_case *set)
{
    const bc_burner *b = set->burner;
    const double stated_m2 = set->area_m2;

    if (!b->has_input && b->has_pressure && b->has_orifice) {
        set->has_flow = true;
        set->fuel_mol_per_s = b->discharge * stated_m2 * flux(set, b->gas_pa);
        set->input_w = set->fuel_mol_per_s * set->old_gas->value.net_j_per_mol;
    }
    if (!b->has_input || !(b->has_pressure || b->has_orifice))
        return;
    if (!b->has_orifice) {
        set->has_area = true;
        set->area_m2 = set->fuel_mol_per_s / (b->discharge * flux(set, b->gas_pa));
    } else if (!b->has_pressure) {
        set->has_pressure = pressure_for(set, set->fuel_mol_per_s / (b->discharge * stated_m2), &set->gas_pa);
    } else {
        set->has_implied = true;
        set->implied_discharge = set->fuel_mol_per_s / (stated_m2 * flux(set, b->gas_pa));
    }
}

static void set_flow(bc_burner_case *set)
{
    const bc_burner *b = set->burner;
    const bc_value *v = &set->old_gas->value;

    set->input_w = b->input_is_gross ? b->input_w * v->net_j_per_mol / v->gross_j_per_mol : b->input_w;
    set->has_flow = b->has_input;
    set->has_pressure = b->has_pressure;
    set->gas_pa = b->gas_pa;
    set->has_area = b->has_orifice;
    set->area_m2 = 0.25 * PI * b->orifice_m * b->orifice_m * b->orifices;
    set->fuel_mol_per_s = set->input_w / v->net_j_per_mol;
    complete_flow(set);
}

bc_status bc_burner_set(const bc_burner *burner, const bc_subject *old_gas, bc_burner_case *set, bc_error *err)
{
    bc_burner_case s;

    memset(&s, 0, sizeof s);
    s.burner = burner;
    s.old_gas = old_gas;
    s.dosing = dosing_of(burner);
    s.air = bc_oxidant_air();
    bc_status status = moisten(burner, &s.air, err);

    if (status == BC_OK)
        status = set_air(&s, err);
    if (status == BC_OK)
        status = set_jet(&s, err);
    if (status != BC_OK)
        return status;
    set_flow(&s);
    *set = s;
    return BC_OK;
}
