/* SPDX-License-Identifier: MIT */
/* burn.c - one burner case through all pieces of flame physics. */
#include "bluecone/burn.h"

#include "base/error_internal.h"
#include "gas/species_index.h"
#include "value/thermo_internal.h"

#include <string.h>

#define T_MIN_K 250.0
#define T_MAX_K 3000.0
#define P_MIN_PA 5e3
#define P_MAX_PA 1e7

bc_burn_case bc_burn_case_default(const bc_gas *fuel)
{
    return (bc_burn_case){.fuel = *fuel, .oxidant = bc_oxidant_air(), .lambda = 1.0, .fuel_k = 298.15, .oxidant_k = 298.15,
                          .exit_k = 423.15, .p_pa = 101325.0, .so3_conversion = BC_SO3_CONVERSION, .casing_loss = 0.0};
}

static bool within(double value, double least, double most)
{
    return value >= least && value <= most;
}

static bc_status check_case(const bc_burn_case *c, bc_error *err)
{
    static const char *const STREAMS[] = {"fuel", "oxidant", "flue gas"};
    const double temperatures[] = {c->fuel_k, c->oxidant_k, c->exit_k};

    if (!within(c->lambda, BC_BURN_LAMBDA_MIN, BC_BURN_LAMBDA_MAX))
        return bc_fail(err, BC_ERR_RANGE, "the air factor %.4g is outside %g to %g", c->lambda, BC_BURN_LAMBDA_MIN, BC_BURN_LAMBDA_MAX);
    for (size_t i = 0; i < 3; i++)
        if (!within(temperatures[i], T_MIN_K, T_MAX_K))
            return bc_fail(err, BC_ERR_RANGE, "the temperature of the %s, %.6g C, is outside %.6g to %.6g C", STREAMS[i], temperatures[i] - 273.15,
                           T_MIN_K - 273.15, T_MAX_K - 273.15);
    if (!within(c->p_pa, P_MIN_PA, P_MAX_PA))
        return bc_fail(err, BC_ERR_RANGE, "the pressure %.6g kPa is outside %g to %g kPa", c->p_pa * 1e-3, P_MIN_PA * 1e-3, P_MAX_PA * 1e-3);
    if (!within(c->so3_conversion, 0.0, 1.0) || !within(c->casing_loss, 0.0, 1.0))
        return bc_fail(err, BC_ERR_RANGE, "SO3 conversion and casing loss are shares from 0 to 100 %%");
    return bc_fuel_check(&c->fuel, err);
}

static bc_status burn_flames(const bc_burn_case *c, bc_burn *b, bc_error *err)
{
    const bc_reactants r = {.fuel = c->fuel, .oxidant = c->oxidant, .fuel_t_k = c->fuel_k, .oxidant_t_k = c->oxidant_k,
                            .oxidant_per_fuel = b->oxidant_mol, .p_pa = c->p_pa};
    bc_mixture complete;
    const bc_status status = bc_flame_equilibrium(&r, &b->flame, err);

    if (status != BC_OK)
        return status;
    b->has_complete = !b->rich && bc_flame_complete(&r, &complete, NULL) == BC_OK;
    b->flame_complete_k = b->has_complete ? complete.t_k : 0.0;
    return BC_OK;
}

/* Complete combustion: flue gas, heat path, dew points. */
static bc_status burn_completely(const bc_burn_case *c, bc_burn *b, bc_error *err)
{
    const bc_heat_case heat = {.fuel = &c->fuel, .oxidant = &c->oxidant, .lambda = c->lambda, .fuel_k = c->fuel_k,
                               .oxidant_k = c->oxidant_k, .exit_k = c->exit_k, .p_pa = c->p_pa, .condensing = c->exit_k >= 273.16};
    bc_status status = bc_heat_path_of(&heat, &b->path, err);

    if (status == BC_OK)
        status = bc_heat_yield_of(&b->path, c->casing_loss, &b->yield, err);
    if (status != BC_OK)
        return status;
    b->flue = b->path.flue;
    b->released_j = b->yield.released_j;
    status = bc_dew_point(b->flue.wet.x[SPECIES_water], c->p_pa, &b->dew, err);
    if (status != BC_OK)
        return status;
    b->has_acid = bc_acid_dew_point_of(&b->flue.wet, c->so3_conversion, c->p_pa, &b->acid, NULL) == BC_OK && b->acid.exists;
    return BC_OK;
}

/* Enthalpy of a mixture whose composition stays while its temperature changes. */
static double frozen_enthalpy_j(const bc_mixture *m, double t_k)
{
    double h = 0.0;

    for (size_t i = 0; i < bc_product_count(); i++)
        h += m->moles[i] * thermo_h_j_per_mol(bc_product_thermo(i), t_k);
    return h;
}

/* Lack of oxidant: equilibrium at the exit temperature, or frozen where reactions stop. */
static bc_status burn_rich(const bc_burn_case *c, bc_burn *b, bc_error *err)
{
    const bc_reactants r = {.fuel = c->fuel, .oxidant = c->oxidant, .fuel_t_k = c->fuel_k, .oxidant_t_k = c->oxidant_k,
                            .oxidant_per_fuel = b->oxidant_mol, .p_pa = c->p_pa};
    const double freeze_k = c->exit_k > BC_BURN_FREEZE_K ? c->exit_k : BC_BURN_FREEZE_K;
    double elements[BC_ELEMENTS];
    double h_j = 0.0;
    bc_status status = bc_reactants_sum(&r, elements, &h_j, err);

    if (status == BC_OK)
        status = bc_equilibrium_tp(elements, freeze_k, c->p_pa, &b->exit, err);
    if (status != BC_OK)
        return status;
    b->exit.enthalpy_j = frozen_enthalpy_j(&b->exit, c->exit_k);
    b->exit.t_k = c->exit_k;
    b->released_j = h_j - b->exit.enthalpy_j;
    return BC_OK;
}

bc_status bc_burn_of(const bc_burn_case *c, bc_burn *burn, bc_error *err)
{
    bc_burn b;
    bc_status status = check_case(c, err);

    if (status != BC_OK)
        return status;
    memset(&b, 0, sizeof b);
    b.rich = c->lambda < 1.0;
    status = bc_oxidant_demand(&c->fuel, &c->oxidant, &b.demand, err);
    if (status != BC_OK)
        return status;
    b.oxidant_mol = c->lambda * b.demand.oxidant_mol;
    status = burn_flames(c, &b, err);
    if (status == BC_OK)
        status = b.rich ? burn_rich(c, &b, err) : burn_completely(c, &b, err);
    if (status == BC_OK)
        *burn = b;
    return status;
}
