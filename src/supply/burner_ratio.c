/* SPDX-License-Identifier: MIT */
/* burner_ratio.c - the forms of heat input, air factor and trim of a set burner.
 *
 * With old values marked o, H the net heat, A the air need, M and Z mass and compression factor of a mole of gas:
 *   flow     n/no = Mo^p Zo^r / (M^p Z^r),   p, r = 1/2, 1/2 (Bernoulli), 0, 1 (volume), 1, 0 (mass)
 *   heat     n H/(no Ho),                    Bernoulli: the net Wobbe index over the old one, without remainder
 *   lambda   lo Ao/((n/no) A)
 *   trim     L = lambda A that gives the oxygen to hold is linear, too (bluecone/oxidant.h):
 *            L = A + y (V/(o - y v)), V of the gas and of the air that it needs
 *   nozzle   n/no as Bernoulli's, times g(cp) = psi/psio
 * All of it over the gas as metered, as bc_burner_respond() does, so that the forms equal the response but for
 * rounding, and a certificate of the form is one of the burner. */
#include "supply/burner_ratio.h"

#include "bluecone/quantity.h"
#include "gas/species_index.h"
#include "supply/burner_internal.h"

#include <math.h>
#include <string.h>

/* Exponents of the gas flow. */
typedef struct {
    double mass, z;
} flow_powers;

static flow_powers powers_of(bc_dosing dosing)
{
    switch (dosing) {
    case BC_DOSING_VOLUME:
        return (flow_powers){0.0, 1.0};
    case BC_DOSING_MASS:
        return (flow_powers){1.0, 0.0};
    case BC_DOSING_ORIFICE:
    case BC_DOSINGS:
    default:
        return (flow_powers){0.5, 0.5};
    }
}

bool burner_trims(const bc_burner *burner)
{
    return burner->control == BC_CONTROL_TRIM_AIR || burner->control == BC_CONTROL_TRIM_GAS;
}

/* psi of the isentropic nozzle over that of the old gas. With u = R/cp = 1 - 1/kappa and the pressure ratio r = e^-L
 *   psi^2 = 2 (r^(2 - 2u) - r^(2 - u))/u = 2 r^2 e^(uL) (e^(uL) - 1)/u,
 * a power series of u whose coefficients are positive, with the logarithm uL + ln((e^(uL) - 1)/u) + const, which is
 * convex. So psi rises with u and is convex in it, at any r; u falls with cp and is convex in it, hence psi falls and
 * is convex. The choked jet has the largest psi of all r, and the largest of such functions is another. */
double burner_nozzle_factor(const bc_burner_case *set, double cp)
{
    const double ambient = set->burner->ambient_pa;
    const jet_gas was = jet_gas_of(set->old_gas, set->burner->gas_k);
    jet_gas is = was;

    is.kappa = jet_kappa(cp);
    return orifice_flux(&is, set->gas_pa, ambient, true) / orifice_flux(&was, set->gas_pa, ambient, true);
}

/* A sum over the gas as metered: a saturated state adds its water. */
static bc_status sum_of(const bc_reference *reference, const double weight[], double sum[], bc_error *err)
{
    bc_ratio made;
    const bc_status status = bc_ratio_of_concentration(weight, 1.0, reference, &made, err);

    if (status == BC_OK)
        memcpy(sum, made.over, sizeof made.over);
    return status;
}

/* A is linear: that of a species alone, negative where it brings oxygen. */
static bc_status weigh_need(const bc_burner_case *set, double weight[], bc_error *err)
{
    bc_status status = BC_OK;

    for (size_t i = 0; i < SPECIES_COUNT && status == BC_OK; i++) {
        bc_gas pure = {{0.0}};
        bc_demand demand;

        pure.x[i] = 1.0;
        status = bc_oxidant_demand(&pure, &set->air, &demand, err);
        weight[i] = status == BC_OK ? demand.oxidant_mol : 0.0;
    }
    return status;
}

/* L of a gas. */
static bc_status held_air(const bc_burner_case *set, const bc_gas *gas, double *air, bc_error *err)
{
    const bc_subject subject = {.gas = *gas};
    double lambda = 0.0;
    bc_status status = need_of(set, &subject, air, err);

    if (status == BC_OK)
        status = burner_lambda_target(set, &subject, &lambda, err);
    *air *= lambda;
    return status;
}

/* L is linear but has no meaning for a species that does not burn: it is read from a mixture of both halves with
 * methane, which does. */
static bc_status weigh_held_air(const bc_burner_case *set, double weight[], bc_error *err)
{
    double of_methane = 0.0;
    bc_gas methane = {{0.0}};

    methane.x[SPECIES_methane] = 1.0;
    bc_status status = held_air(set, &methane, &of_methane, err);

    for (size_t i = 0; i < SPECIES_COUNT && status == BC_OK; i++) {
        bc_gas half = {{0.0}};
        double air = 0.0;

        half.x[SPECIES_methane] = 0.5;
        half.x[i] += 0.5;
        status = held_air(set, &half, &air, err);
        weight[i] = 2.0 * air - of_methane;
    }
    return status;
}

/* Net heat over mass and Z, for powers and scale to be filled in. */
static bc_status start(const bc_reference *reference, bc_ratio *base, bc_error *err)
{
    size_t wobbe = 0;
    const bc_status status = bc_quantity_find("wobbe-net", &wobbe, err);

    return status == BC_OK ? bc_ratio_of_quantity(wobbe, reference, base, err) : status;
}

/* over/(M^p Z^r) scale, or the inverse. */
static bc_ratio over_flow(const bc_ratio *base, const double over[], flow_powers powers, double scale, bool inverse)
{
    bc_ratio ratio = *base;

    memcpy(ratio.over, over, sizeof ratio.over);
    ratio.under_power = powers.mass;
    ratio.z_power = powers.z;
    ratio.scale = scale;
    ratio.inverse = inverse;
    return ratio;
}

/* over/under scale, or the inverse. */
static bc_ratio over_sum(const bc_ratio *base, const double over[], const double under[], double scale, bool inverse)
{
    bc_ratio ratio = over_flow(base, over, (flow_powers){1.0, 0.0}, scale, inverse);

    memcpy(ratio.under, under, sizeof ratio.under);
    return ratio;
}

/* A trim asks air for target/lambda, gas for the inverse; held gas has the flow lo Ao/L, whatever doses it. */
static bc_status add_trim(const bc_burner_case *set, const bc_ratio *base, const double need[], burner_ratios *made, double flow, bc_error *err)
{
    const bool gas = set->burner->control == BC_CONTROL_TRIM_GAS;
    const double air = set->lambda * set->need;
    double weight[BC_SPECIES_CAPACITY] = {0.0}, held[BC_SPECIES_CAPACITY];
    bc_status status = weigh_held_air(set, weight, err);

    if (status == BC_OK)
        status = sum_of(set->old_gas->reference, weight, held, err);
    if (status != BC_OK)
        return status;
    made->travel = over_flow(base, held, powers_of(set->dosing), gas ? air / flow : flow / air, gas);
    made->held_heat = gas ? over_sum(base, base->over, held, air / set->old_gas->value.net_j_per_mol, false) : made->heat;
    made->held_lambda = over_sum(base, need, held, 1.0, true);
    return BC_OK;
}

static bool has_nozzle(const bc_burner_case *set)
{
    return set->dosing == BC_DOSING_ORIFICE && set->has_pressure && expands(set->gas_pa, set->burner->ambient_pa);
}

static bc_status add_nozzle(const bc_burner_case *set, const bc_ratio *base, burner_ratios *made, bc_error *err)
{
    double weight[BC_SPECIES_CAPACITY] = {0.0}, ones[BC_SPECIES_CAPACITY] = {0.0}, cp[BC_SPECIES_CAPACITY];

    for (size_t i = 0; i < SPECIES_COUNT; i++) {
        bc_gas pure = {{0.0}};

        pure.x[i] = 1.0;
        weight[i] = jet_cp(&pure, set->burner->gas_k);
        ones[i] = 1.0;
    }
    bc_status status = sum_of(set->old_gas->reference, ones, made->one, err);

    if (status == BC_OK)
        status = sum_of(set->old_gas->reference, weight, cp, err);

    if (status == BC_OK)
        made->cp = over_flow(base, cp, (flow_powers){0.0, 0.0}, 1.0, false);
    return status;
}

bc_status burner_ratios_of(const bc_burner_case *set, burner_ratios *ratios, bc_error *err)
{
    const bc_value *old = &set->old_gas->value;
    const flow_powers powers = powers_of(set->dosing);
    const double flow = pow(old->molar_mass_kg_per_mol, powers.mass) * pow(old->z, powers.z);
    double weight[BC_SPECIES_CAPACITY] = {0.0}, need[BC_SPECIES_CAPACITY];
    burner_ratios made = {.trims = burner_trims(set->burner), .nozzle = has_nozzle(set)};
    bc_ratio base;
    bc_status status = start(set->old_gas->reference, &base, err);

    if (status == BC_OK)
        status = weigh_need(set, weight, err);
    if (status == BC_OK)
        status = sum_of(set->old_gas->reference, weight, need, err);
    if (status != BC_OK)
        return status;
    made.heat = over_flow(&base, base.over, powers, flow / old->net_j_per_mol, false);
    made.lambda = over_flow(&base, need, powers, set->lambda * set->need / flow, true);
    if (made.trims)
        status = add_trim(set, &base, need, &made, flow, err);
    if (status == BC_OK && made.nozzle)
        status = add_nozzle(set, &base, &made, err);
    if (status == BC_OK)
        *ratios = made;
    return status;
}
