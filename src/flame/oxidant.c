/* SPDX-License-Identifier: MIT */
/* oxidant.c - oxygen balances of fuels and oxidants, and lambda from a flue-gas reading. */
#include "bluecone/oxidant.h"

#include "base/error_internal.h"
#include "bluecone/formation.h"
#include "flame/oxidant_internal.h"
#include "gas/species_atoms.h"

#include <math.h>

/* Differences of atom counts of a few: what is left of a balance that closes is below it. */
#define NOTHING 1e-12

static void clear(double atoms[BC_ELEMENTS])
{
    for (int k = 0; k < BC_ELEMENTS; k++)
        atoms[k] = 0.0;
}

static void add(double atoms[BC_ELEMENTS], size_t species, double x)
{
    for (int k = 0; k < BC_ELEMENTS; k++)
        atoms[k] += x * SPECIES_ATOMS[species][k];
}

void oxidant_atoms(const bc_gas *gas, double atoms[BC_ELEMENTS])
{
    clear(atoms);
    for (size_t i = 0; i < SPECIES_COUNT; i++)
        if (gas->x[i] != 0.0)
            add(atoms, i, gas->x[i]);
}

void oxidant_air_atoms(double atoms[BC_ELEMENTS])
{
    clear(atoms);
#define COMBUSTION_AIR(symbol, fraction, source) add(atoms, SPECIES_##symbol, fraction);
#include "data/combustion_air.def"
}

double oxidant_oxygen_need(const double atoms[BC_ELEMENTS])
{
    return atoms[BC_C] + atoms[BC_H] / 4.0 + atoms[BC_S] - atoms[BC_O] / 2.0;
}

double bc_oxygen_demand(const bc_gas *gas)
{
    double atoms[BC_ELEMENTS];

    oxidant_atoms(gas, atoms);
    const double need = oxidant_oxygen_need(atoms);

    return fabs(need) > NOTHING ? need : 0.0;
}

bc_status bc_fuel_check(const bc_gas *gas, bc_error *err)
{
    double gross = 0.0;
    double net = 0.0;

    if (bc_oxygen_demand(gas) > 0.0)
        return BC_OK;
    const bc_status status = bc_formation_gas(gas, 298.15, &gross, &net, err);

    if (status != BC_OK)
        return status;
    if (net > 1.0) /* J/mol: what burns is there, and its oxygen, too */
        return bc_fail(err, BC_ERR_RANGE, "the gas holds all the oxygen that it needs: it may explode as it is, and is no fuel for a burner");
    return bc_fail(err, BC_ERR_RANGE, "the gas does not burn: it needs no oxygen");
}

bc_gas bc_oxidant_air(void)
{
    bc_gas air = {{0.0}};

#define COMBUSTION_AIR(symbol, fraction, source) air.x[SPECIES_##symbol] = fraction;
#include "data/combustion_air.def"
    return air;
}

/* x = x_air + s (1 - x_air): s moles of oxygen in a mole of the mixture. */
bc_status bc_oxidant_enriched(double x_oxygen, bc_gas *oxidant, bc_error *err)
{
    const bc_gas air = bc_oxidant_air();
    const double lowest = air.x[SPECIES_oxygen];

    if (!(x_oxygen >= lowest && x_oxygen <= 1.0))
        return bc_fail(
            err, BC_ERR_RANGE,
            "enriched air has %.5g to 100 %% oxygen, not %.6g %%; below it give the oxidant as a gas",
            lowest * 100.0, x_oxygen * 100.0);
    const double kept = (1.0 - x_oxygen) / (1.0 - lowest);

    for (size_t i = 0; i < BC_SPECIES_CAPACITY; i++)
        oxidant->x[i] = kept * air.x[i];
    oxidant->x[SPECIES_oxygen] = x_oxygen;
    return BC_OK;
}

bc_status bc_oxidant_oxygen(double purity, double argon_of_rest, bc_gas *oxidant, bc_error *err)
{
    if (!(purity >= BC_OXYGEN_PURITY_MIN && purity <= 1.0))
        return bc_fail(
            err, BC_ERR_RANGE,
            "an oxygen purity lies between %g and 100 %%, not at %.6g %%; take enriched air below it",
            BC_OXYGEN_PURITY_MIN * 100.0, purity * 100.0);
    if (!(argon_of_rest >= 0.0 && argon_of_rest <= 1.0))
        return bc_fail(err, BC_ERR_RANGE, "the share of argon in the rest is %.6g; it lies between 0 and 1",
                       argon_of_rest);
    const bc_gas none = {{0.0}};

    *oxidant = none;
    oxidant->x[SPECIES_oxygen] = purity;
    oxidant->x[SPECIES_argon] = (1.0 - purity) * argon_of_rest;
    oxidant->x[SPECIES_nitrogen] = (1.0 - purity) * (1.0 - argon_of_rest);
    return BC_OK;
}

static bc_status check_gives(double give, bc_error *err)
{
    if (give > NOTHING)
        return BC_OK;
    return bc_fail(err, BC_ERR_INPUT, "the oxidant has no oxygen to give; check its composition");
}

bc_status bc_oxidant_demand(const bc_gas *fuel, const bc_gas *oxidant, bc_demand *demand, bc_error *err)
{
    const double need = bc_oxygen_demand(fuel);
    const double give = -bc_oxygen_demand(oxidant);
    const bc_status status = check_gives(give, err);

    if (status != BC_OK)
        return status;
    const double fuel_kg = bc_gas_molar_mass_kg_per_mol(fuel);

    demand->oxygen_mol = need;
    demand->oxidant_mol = need / give;
    demand->oxygen_kg = need * bc_species_molar_mass_kg_per_mol(SPECIES_oxygen) / fuel_kg;
    demand->oxidant_kg = demand->oxidant_mol * bc_gas_molar_mass_kg_per_mol(oxidant) / fuel_kg;
    return BC_OK;
}

bc_status oxidant_pair_balance(oxidant_pair *pair, bc_error *err)
{
    pair->need = oxidant_oxygen_need(pair->fuel);
    pair->give = -oxidant_oxygen_need(pair->oxidant);
    const bc_status status = check_gives(pair->give, err);

    if (status != BC_OK)
        return status;
    if (!(pair->need > NOTHING))
        return bc_fail(err, BC_ERR_RANGE,
                       "the gas needs no oxygen (%.4g mol per mol): nothing of it burns with an oxidant, so "
                       "it has no air factor",
                       pair->need);
    pair->ratio = pair->need / pair->give;
    return BC_OK;
}

bc_status oxidant_pair_of(const bc_gas *fuel, const bc_gas *oxidant, oxidant_pair *pair, bc_error *err)
{
    oxidant_atoms(fuel, pair->fuel);
    oxidant_atoms(oxidant, pair->oxidant);
    return oxidant_pair_balance(pair, err);
}

bc_status bc_lambda_from_excess(double excess, double *lambda, bc_error *err)
{
    if (!(excess > -1.0) || !isfinite(excess))
        return bc_fail(err, BC_ERR_RANGE, "an excess of %.6g %% leaves no oxidant; it lies above -100 %%",
                       excess * 100.0);
    *lambda = 1.0 + excess;
    return BC_OK;
}

/* Flue gas of a burnt molecule without free oxygen: CO2, SO2, N2, noble gases, and H2O when wet. */
static double burnt_mol(const double atoms[BC_ELEMENTS], bc_flue_basis basis)
{
    const double dry =
        atoms[BC_C] + atoms[BC_S] + atoms[BC_N] / 2.0 + atoms[BC_HE] + atoms[BC_NE] + atoms[BC_AR];

    return basis == BC_FLUE_WET ? dry + atoms[BC_H] / 2.0 : dry;
}

static bc_status refuse_reading(double x_oxygen, double most, bc_flue_basis basis, bc_error *err)
{
    return bc_fail(err, BC_ERR_RANGE,
                   "a %s flue gas of this oxidant holds 0 to below %.4g %% oxygen, so %.4g %% cannot be; "
                   "check wet or dry, the "
                   "analyser and the oxidant",
                   basis == BC_FLUE_WET ? "wet" : "dry", most * 100.0, x_oxygen * 100.0);
}

bc_status bc_lambda_from_flue_oxygen(const bc_gas *fuel, const bc_gas *oxidant, double x_oxygen,
                                     bc_flue_basis basis, double *lambda, bc_error *err)
{
    oxidant_pair pair;
    const bc_status status = oxidant_pair_of(fuel, oxidant, &pair, err);

    if (status != BC_OK)
        return status;
    const double left = burnt_mol(pair.oxidant, basis);
    const double v = left + pair.give;
    const double stoichiometric = burnt_mol(pair.fuel, basis) + pair.ratio * left;

    if (!(stoichiometric > NOTHING))
        return bc_fail(
            err, BC_ERR_RANGE,
            "the dry flue gas is nothing but spare oxygen and says nothing about lambda; give a wet reading");
    if (!(x_oxygen >= 0.0 && pair.give - x_oxygen * v > NOTHING))
        return refuse_reading(x_oxygen, pair.give / v, basis, err);
    *lambda = 1.0 + x_oxygen * stoichiometric / (pair.ratio * (pair.give - x_oxygen * v));
    return BC_OK;
}
