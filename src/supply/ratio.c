/* SPDX-License-Identifier: MIT */
/* ratio.c - which quantities are ratios of linear sums, and their coefficients. */
#include "bluecone/ratio.h"

#include "base/compiler.h"
#include "base/error_internal.h"
#include "bluecone/oxidant.h"
#include "bluecone/quantity.h"
#include "gas/species_index.h"
#include "value/formation_internal.h"
#include "value/uncertainty.h"

#include <math.h>
#include <string.h>

#define ID_MAX 28
#define GROSS false
#define NET true

/* Rows of ISO 6976: power products of the molar heat, mass and compression factor. */
static const struct {
    exponents powers;
    double scale;
    char id[ID_MAX];
} POWERS[] = {
#define POWER(id, field, heat, a, b, g, r, m, n, unit, scale, group, label, meaning) {{a, b, g, r, m, n, heat}, scale, id},
#define OTHER(id, function, unit, digits, scatter, group, label, method, meaning)
#include "value/quantities.def"
};

/* What a mole of a species adds to the sums of an atom balance. */
typedef enum {
    NOTHING,
    OXYGEN,      /* mol O2 that it needs */
    AIR,         /* mol air that it needs */
    AIR_KG,
    KG,          /* its mass */
    FLUE_DRY,    /* mol of stoichiometric flue gas */
    FLUE_WATER,
    FLUE_WET,
    FLUE_CO2,
    OWN_CO2_KG,  /* of its carbon alone */
    CARBON,      /* mol atoms */
    HYDROGEN,
    GROSS_HEAT,  /* J, ISO 6976 */
    NET_HEAT,
    GROSS_FORMED, /* J, formation balance */
    NET_FORMED,
    GROSS_GAP,
    SHARES
} share;

/* Rows of the atom and formation balances: a sum, or a sum over another. */
static const struct {
    double scale;
    share over, under;
    bool proxy;
    char id[ID_MAX];
} BALANCES[] = {
    {1.0, OXYGEN, NOTHING, false, "oxygen-demand"},
    {1.0, AIR, NOTHING, false, "air-demand"},
    {1.0, AIR_KG, KG, false, "air-demand-mass"},
    {1.0, FLUE_WET, NOTHING, false, "flue-wet"},
    {1.0, FLUE_DRY, NOTHING, false, "flue-dry"},
    {100.0, FLUE_CO2, FLUE_DRY, false, "co2-max"},
    /* at a fixed pressure a dew point rises with the fraction of water, and with nothing else */
    {1.0, FLUE_WATER, FLUE_WET, true, "flue-dew-point"},
    {1e9, OWN_CO2_KG, NET_HEAT, false, "co2-factor-net"},
    {1e9, OWN_CO2_KG, GROSS_HEAT, false, "co2-factor-gross"},
    {1.0, HYDROGEN, CARBON, false, "hydrogen-carbon-ratio"},
    {1e-3, GROSS_FORMED, NOTHING, false, "hhv-formation"},
    {1e-3, NET_FORMED, NOTHING, false, "lhv-formation"},
    {100.0, GROSS_GAP, GROSS_HEAT, false, "formation-gap"},
};

/* Moles of dry flue gas that the atoms of a gas make by themselves. */
static double own_dry_flue(const bc_gas *gas)
{
    return bc_gas_atoms(gas, BC_C) + bc_gas_atoms(gas, BC_S) + bc_gas_atoms(gas, BC_N) / 2.0 + bc_gas_atoms(gas, BC_HE) +
           bc_gas_atoms(gas, BC_NE) + bc_gas_atoms(gas, BC_AR);
}

/* All shares of one species. Stoichiometric flue gas is that of the atoms of fuel and air together; no
 * oxygen is left, so each species brings its own atoms and those of the air that it needs. */
static void shares_of(size_t species, const bc_reference *r, double of[SHARES])
{
    const bc_gas air = bc_oxidant_air();
    const double t_k = r->state.combustion_c + 273.15;
    const double hydrogen = bc_species_atoms(species, BC_H);
    bc_gas pure = {{0.0}};

    pure.x[species] = 1.0;
    of[NOTHING] = 0.0;
    of[OXYGEN] = bc_oxygen_demand(&pure);
    of[AIR] = of[OXYGEN] / -bc_oxygen_demand(&air);
    of[AIR_KG] = of[AIR] * bc_gas_molar_mass_kg_per_mol(&air);
    of[KG] = bc_species_molar_mass_kg_per_mol(species);
    of[FLUE_DRY] = own_dry_flue(&pure) + of[AIR] * own_dry_flue(&air);
    of[FLUE_WATER] = (hydrogen + of[AIR] * bc_gas_atoms(&air, BC_H)) / 2.0;
    of[FLUE_WET] = of[FLUE_DRY] + of[FLUE_WATER];
    of[CARBON] = bc_species_atoms(species, BC_C);
    of[HYDROGEN] = hydrogen;
    of[FLUE_CO2] = of[CARBON] + of[AIR] * bc_gas_atoms(&air, BC_C);
    of[OWN_CO2_KG] = of[CARBON] * bc_species_molar_mass_kg_per_mol(SPECIES_carbon_dioxide);
    of[GROSS_HEAT] = r->gross_j_per_mol[species];
    of[NET_HEAT] = r->net_j_per_mol[species];
    of[GROSS_FORMED] = formation_gross_j_per_mol(species, t_k);
    of[NET_FORMED] = of[GROSS_FORMED] - hydrogen / 2.0 * formation_vaporisation_j_per_mol(t_k);
    of[GROSS_GAP] = of[GROSS_FORMED] - of[GROSS_HEAT];
}

static void balance_ratio(size_t row, const bc_reference *r, bc_ratio *ratio)
{
    double of[SHARES];

    for (size_t i = 0; i < SPECIES_COUNT; i++) {
        shares_of(i, r, of);
        ratio->over[i] = of[BALANCES[row].over];
        ratio->under[i] = of[BALANCES[row].under];
    }
    ratio->under_power = BALANCES[row].under == NOTHING ? 0.0 : 1.0;
    ratio->scale = BALANCES[row].scale;
    ratio->proxy = BALANCES[row].proxy;
}

/* What all figures of a state share: Z of the gas, and volume per mole as R T/p. */
static void start_ratio(const bc_reference *r, bc_ratio *ratio)
{
    memset(ratio, 0, sizeof *ratio);
    memcpy(ratio->factor, r->factor, sizeof ratio->factor);
    ratio->pressure = r->state.metering_pa / BC_P0_PA;
    ratio->scale = 1.0;
}

static double ideal_volume(const bc_reference *r)
{
    return r->r_j_per_mol_k * (r->state.metering_c + 273.15) / r->state.metering_pa;
}

static const double *numerator(const exponents *e, const bc_reference *r)
{
    if (e->heat == 0.0)
        return r->mass_kg_per_mol;
    return e->net ? r->net_j_per_mol : r->gross_j_per_mol;
}

static bool is_none_or_one(double exponent)
{
    return exponent == 0.0 || exponent == 1.0;
}

/* N is the heat or else the mass or else one; what stands under the bar is concave when its powers are not
 * negative and add up to one at most. */
static bool is_ratio(const exponents *e, const bc_ratio *ratio)
{
    const double p = ratio->under_power;
    const double r = ratio->z_power;

    return is_none_or_one(e->heat) && (e->heat == 1.0 || is_none_or_one(e->mass)) && p >= 0.0 && r >= 0.0 && p + r <= 1.0;
}

/* scale H^heat M^mass Z^z as a ratio. A figure with Z over the bar alone is the inverse of 1/Z. */
static bc_status power_ratio(const exponents *e, const bc_reference *r, bc_ratio *ratio, bc_error *err)
{
    const bool has_over = e->heat != 0.0 || e->mass > 0.0;

    ratio->inverse = !has_over && e->z > 0.0;
    ratio->under_power = e->heat != 0.0 ? -e->mass : 0.0;
    ratio->z_power = ratio->inverse ? e->z : -e->z;
    if (!is_ratio(e, ratio))
        return bc_fail(err, BC_ERR_USAGE, "this power product of heat, mass and compression factor is no ratio of sums");
    for (size_t i = 0; i < SPECIES_COUNT; i++) {
        ratio->over[i] = has_over ? numerator(e, r)[i] : 1.0;
        ratio->under[i] = r->mass_kg_per_mol[i];
    }
    ratio->scale = pow(ideal_volume(r), e->r) * pow(r->air_kg_per_mol, e->air) * pow(r->air_z, e->air_z);
    return BC_OK;
}

/* Metered saturated: x' = (1 - w) x/(1 - x_water) for all but water and x'_water = w, so that with
 * y = x/(1 - x_water) every sum c x' is sum over all but water of [(1 - w) c + w c_water] y. */
static void add_water(double c[], double w)
{
    for (size_t i = 0; i < SPECIES_COUNT; i++)
        if (i != SPECIES_water)
            c[i] = (1.0 - w) * c[i] + w * c[SPECIES_water];
    c[SPECIES_water] = 0.0;
}

static bc_status saturate(const bc_reference *r, bc_ratio *ratio, bc_error *err)
{
    bc_gas metered;
    bc_gas dry = {{0.0}};

    if (!r->state.saturated)
        return BC_OK;
    dry.x[SPECIES_methane] = 1.0;
    const bc_status status = bc_gas_for_state(&dry, &r->state, &metered, err);

    if (status != BC_OK)
        return status;
    add_water(ratio->over, metered.x[SPECIES_water]);
    add_water(ratio->under, metered.x[SPECIES_water]);
    add_water(ratio->factor, metered.x[SPECIES_water]);
    ratio->saturated = true;
    return BC_OK;
}

static bc_status fill(const char *id, const bc_reference *r, bc_ratio *ratio, bc_error *err)
{
    for (size_t i = 0; i < BC_COUNT(POWERS); i++)
        if (strcmp(POWERS[i].id, id) == 0) {
            const bc_status status = power_ratio(&POWERS[i].powers, r, ratio, err);

            ratio->scale *= POWERS[i].scale;
            return status;
        }
    for (size_t i = 0; i < BC_COUNT(BALANCES); i++)
        if (strcmp(BALANCES[i].id, id) == 0) {
            balance_ratio(i, r, ratio);
            return BC_OK;
        }
    return bc_fail(err, BC_ERR_USAGE, "%s is no ratio of sums over the mole fractions; its extremes can only be searched for", id);
}

bc_status bc_ratio_of_quantity(size_t quantity, const bc_reference *reference, bc_ratio *ratio, bc_error *err)
{
    const bc_quantity *q = bc_quantity_at(quantity);
    bc_ratio made;

    if (!q)
        return bc_fail(err, BC_ERR_USAGE, "there is no quantity of that number");
    start_ratio(reference, &made);
    bc_status status = fill(q->id, reference, &made, err);

    if (status == BC_OK)
        status = saturate(reference, &made, err);
    if (status == BC_OK)
        *ratio = made;
    return status;
}

bc_ratio bc_ratio_of_fraction(const double weight[], double scale)
{
    bc_ratio ratio;

    memset(&ratio, 0, sizeof ratio);
    memcpy(ratio.over, weight, sizeof ratio.over);
    ratio.scale = scale;
    return ratio;
}

bc_status bc_ratio_of_concentration(const double weight[], double scale, const bc_reference *reference, bc_ratio *ratio, bc_error *err)
{
    bc_ratio made;

    start_ratio(reference, &made);
    memcpy(made.over, weight, sizeof made.over);
    made.z_power = 1.0;
    made.scale = scale / ideal_volume(reference);
    const bc_status status = saturate(reference, &made, err);

    if (status == BC_OK)
        *ratio = made;
    return status;
}

/* A sum of the gas, or of what is left of it without the water that a saturated state replaces. */
static double sum_of(const bc_ratio *ratio, const double form[], const bc_gas *gas)
{
    double sum = 0.0;

    for (size_t i = 0; i < SPECIES_COUNT; i++)
        sum += form[i] * gas->x[i];
    return ratio->saturated ? sum / (1.0 - gas->x[SPECIES_water]) : sum;
}

static bool is_above_zero(double value, double power)
{
    return power == 0.0 || value > 0.0;
}

bc_status bc_ratio_evaluate(const bc_ratio *ratio, const bc_gas *gas, double *value, bc_error *err)
{
    const double n = sum_of(ratio, ratio->over, gas);
    const double d = sum_of(ratio, ratio->under, gas);
    const double s = sum_of(ratio, ratio->factor, gas);
    const double z = 1.0 - ratio->pressure * s * s;

    if (!isfinite(n) || !is_above_zero(d, ratio->under_power) || !is_above_zero(z, ratio->z_power) || (ratio->inverse && !(n > 0.0)))
        return bc_fail(err, BC_ERR_RANGE, "what the figure is divided by is not above zero for this gas: it has no such figure");
    const double raw = n / (pow(d, ratio->under_power) * pow(z, ratio->z_power));

    *value = ratio->scale * (ratio->inverse ? 1.0 / raw : raw);
    return BC_OK;
}
