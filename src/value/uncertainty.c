/* SPDX-License-Identifier: MIT */
/* uncertainty.c - annex B of ISO 6976:2016 for any power product of H, M, Z and the constants.
 *
 * With Y = C H^a M^b Z^g the coefficient of a mole fraction is
 *   d ln Y/d x_j = a h_j/H + b M_j/M - g 2 q s s_j/Z,   q = p/p0, s = sum x s, Z = 1 - q s^2,
 * and the constants add their relative variances by their exponents. */
#include "value/uncertainty.h"

#include "gas/species_index.h"

#include <math.h>

static double square(double x)
{
    return x * x;
}

static double molar_heat(const bc_subject *s, const exponents *e)
{
    return e->net ? s->value.net_j_per_mol : s->value.gross_j_per_mol;
}

static double species_heat(const bc_reference *r, size_t j, bool net)
{
    return net ? r->net_j_per_mol[j] : r->gross_j_per_mol[j];
}

static double summation_sum(const bc_subject *s)
{
    double sum = 0.0;

    for (size_t j = 0; j < SPECIES_COUNT; j++)
        sum += s->gas.x[j] * s->reference->factor[j];
    return sum;
}

/* d ln Z / d s = -2 q s / Z */
static double z_slope(const bc_subject *s)
{
    const double q = s->reference->state.metering_pa / BC_P0_PA;

    return -2.0 * q * summation_sum(s) / s->value.z;
}

/* Of a gas that is metered saturated the water is fixed by temperature and pressure. What the analysis lists of
 * it is taken out, x_j = x'_j/(1 - x'_w), so that its scatter moves all dry fractions alike. */
static double slope_of_listed_water(const bc_gas *gas, const double a[])
{
    double slope = 0.0;

    for (size_t j = 0; j < SPECIES_COUNT; j++)
        slope += j == SPECIES_water ? 0.0 : a[j] * gas->x[j];
    return slope / (1.0 - gas->x[SPECIES_water]);
}

static double composition_variance(const bc_subject *s, const exponents *e)
{
    const bc_reference *r = s->reference;
    const double heat = molar_heat(s, e);
    const double slope = z_slope(s);
    double a[BC_SPECIES_CAPACITY] = {0.0};
    double variance = 0.0;

    if (!s->spread)
        return 0.0;
    for (size_t j = 0; j < SPECIES_COUNT; j++) {
        a[j] = e->mass * r->mass_kg_per_mol[j] / s->value.molar_mass_kg_per_mol + e->z * slope * r->factor[j];
        if (heat > 0.0)
            a[j] += e->heat * species_heat(r, j, e->net) / heat;
    }
    if (r->state.saturated)
        a[SPECIES_water] = slope_of_listed_water(&s->gas, a);
    for (size_t k = 0; k < s->spread->count; k++) {
        double step = 0.0;

        for (size_t j = 0; j < SPECIES_COUNT; j++)
            step += a[j] * s->spread->dx[k][j];
        variance += square(step);
    }
    return variance * square(s->spread_scale);
}

/* u2(M)/M2: the M_j share atoms, so sum over elements k of (sum_j x_j n_jk)^2 u2(A_k). */
static double mass_variance(const bc_subject *s)
{
    double variance = 0.0;

    for (size_t k = 0; k < BC_ELEMENTS; k++)
        variance += square(s->atoms[k] * bc_element_mass_u_g_per_mol((bc_element)k) * 1e-3);
    return variance / square(s->value.molar_mass_kg_per_mol);
}

static double heat_variance(const bc_subject *s, const exponents *e)
{
    const bc_reference *r = s->reference;
    const double heat = molar_heat(s, e);
    double variance = 0.0;

    if (!(heat > 0.0))
        return 0.0;
    for (size_t j = 0; j < SPECIES_COUNT; j++)
        variance += square(s->gas.x[j] * r->u_gross_j_per_mol[j]);
    if (e->net) /* d H_net / d Lo = - sum x_j b_j/2 */
        variance += square(s->atoms[BC_H] / 2.0 * r->u_vaporisation_j_per_mol);
    return variance / square(heat);
}

static double factor_variance(const bc_subject *s)
{
    double variance = 0.0;

    for (size_t j = 0; j < SPECIES_COUNT; j++)
        variance += square(s->gas.x[j] * s->reference->u_factor[j]);
    return variance * square(z_slope(s));
}

static double table_variance(const bc_subject *s, const exponents *e)
{
    const bc_reference *r = s->reference;

    return square(e->heat) * heat_variance(s, e) + square(e->mass) * mass_variance(s) + square(e->z) * factor_variance(s)
           + square(e->r * r->u_r_j_per_mol_k / r->r_j_per_mol_k) + square(e->air * r->u_air_kg_per_mol / r->air_kg_per_mol)
           + square(e->air_z * r->u_air_z / r->air_z);
}

relative_u propagate(const bc_subject *subject, const exponents *e)
{
    return (relative_u){sqrt(composition_variance(subject, e)), sqrt(table_variance(subject, e))};
}
