/* SPDX-License-Identifier: MIT */
/* burner_restore.c - the setting that gives a new gas the heat input and the air ratio of the old one.
 *
 * Factors are found one after the other: the gas side restores the heat, then the air its ratio. The air factor is
 * linear in the air, so that one quotient is exact. */
#include "supply/burner_internal.h"

#include <math.h>

/* The gas side; `heat_as_found` is in place. */
static void restore_heat(const bc_burner_case *set, const bc_subject *gas, double new_gas_k, bc_burner_remedy *m)
{
    const double ambient = set->burner->ambient_pa;
    const double wanted = 1.0 / m->heat_as_found;
    double gas_pa = 0.0;

    if (!m->by_orifice) {
        m->gas = wanted;
        return;
    }
    m->area = wanted;
    m->diameter = sqrt(wanted);
    if (!set->has_pressure) {
        m->has_pressure = true;
        m->pressure = wanted * wanted;
        return;
    }
    const jet_gas jet = jet_gas_of(gas, gas_temperature(set, new_gas_k));

    m->has_pressure = orifice_pressure(&jet, set->gas_pa, ambient, expands(set->gas_pa, ambient), wanted, &gas_pa);
    m->pressure = m->has_pressure ? gas_pa / set->gas_pa : 1.0;
}

/* The air that restores the ratio on a gas side already set. */
static bc_status restore_air(const bc_burner_case *set, const bc_subject *gas, bc_burner_setting setting, double target, double *air,
                             bc_error *err)
{
    burner_flows f;

    setting.air = 1.0;
    const bc_status status = burner_flow_of(set, gas, &setting, false, &f, err);

    if (status == BC_OK)
        *air = target / f.lambda;
    return status;
}

bc_status bc_burner_restore(const bc_burner_case *set, const bc_subject *new_gas, double new_gas_k, bc_burner_remedy *remedy, bc_error *err)
{
    bc_burner_remedy m = {.by_orifice = set->dosing == BC_DOSING_ORIFICE, .area = 1.0, .diameter = 1.0, .pressure = 1.0, .gas = 1.0,
                          .air = 1.0, .air_by_pressure = 1.0};
    bc_burner_setting found = bc_burner_setting_as_found();
    burner_flows f;

    found.gas_k = new_gas_k;
    bc_status status = burner_flow_of(set, new_gas, &found, false, &f, err);

    if (status == BC_OK)
        status = burner_lambda_target(set, new_gas, &m.lambda_target, err);
    if (status != BC_OK)
        return status;
    m.heat_as_found = f.fuel * new_gas->value.net_j_per_mol / set->old_gas->value.net_j_per_mol;
    m.air_alone = m.lambda_target / f.lambda;
    restore_heat(set, new_gas, new_gas_k, &m);
    status = restore_air(set, new_gas, bc_burner_setting_of(&m, false, new_gas_k), m.lambda_target, &m.air, err);
    if (status == BC_OK)
        status = restore_air(set, new_gas, bc_burner_setting_of(&m, true, new_gas_k), m.lambda_target, &m.air_by_pressure, err);
    if (status == BC_OK)
        *remedy = m;
    return status;
}

bc_burner_setting bc_burner_setting_of(const bc_burner_remedy *remedy, bool by_pressure, double new_gas_k)
{
    const bool pressure = by_pressure && remedy->by_orifice && remedy->has_pressure;

    return (bc_burner_setting){.area = pressure ? 1.0 : remedy->area, .pressure = pressure ? remedy->pressure : 1.0, .gas = remedy->gas,
                               .air = pressure ? remedy->air_by_pressure : remedy->air, .gas_k = new_gas_k};
}
