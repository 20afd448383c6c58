/* SPDX-License-Identifier: MIT */
/* steam.c - saturation of water, IAPWS SR1-86(1992), and sublimation line, IAPWS R14-08(2011). */
#include "bluecone/steam.h"

#include "base/compiler.h"
#include "base/error_internal.h"

#include <math.h>
#include <stddef.h>

#define P_CRITICAL_PA 22.064e6   /* IAPWS SR1-86(1992) */
#define RHO_CRITICAL_KG_PER_M3 322.0

/* One term a * u^e of a saturation equation. */
typedef struct {
    double a, e;
} term;

/* SR1-86(1992), equation (1), value from memory:
 * ln(p/p_c) = (T_c/T) sum a_i tau^e_i, tau = 1 - T/T_c, T_c = 647.096 K, p_c = 22.064 MPa. */
static const term PRESSURE[] = {{-7.85951783, 1.0}, {1.84408259, 1.5}, {-11.7866497, 3.0},
                                {22.6807411, 3.5},  {-15.9618719, 4.0}, {1.80122502, 7.5}};

/* SR1-86(1992), equation (2), value from memory: rho'/rho_c = 1 + sum b_i tau^e_i. */
static const term LIQUID_DENSITY[] = {{1.99274064, 1.0 / 3.0},   {1.09965342, 2.0 / 3.0},   {-0.510839303, 5.0 / 3.0},
                                      {-1.75493479, 16.0 / 3.0}, {-45.5170352, 43.0 / 3.0}, {-6.7469445e5, 110.0 / 3.0}};

/* SR1-86(1992), equation (3), value from memory: ln(rho''/rho_c) = sum c_i tau^e_i. */
static const term VAPOUR_DENSITY[] = {{-2.03150240, 2.0 / 6.0},  {-2.68302940, 4.0 / 6.0},  {-5.38626492, 8.0 / 6.0},
                                      {-17.2991605, 18.0 / 6.0}, {-44.7586581, 37.0 / 6.0}, {-63.9201063, 71.0 / 6.0}};

static double sum_terms(const term terms[], size_t count, double u)
{
    double sum = 0.0;

    for (size_t i = 0; i < count; i++)
        sum += terms[i].a * pow(u, terms[i].e);
    return sum;
}

/* The sum of PRESSURE, whose powers are halves: a dew point asks for it a dozen times, and pow() would be most of it. */
static double pressure_sum(double tau)
{
    const double root = sqrt(tau);
    const double tau3 = tau * tau * tau;
    const double powers[BC_COUNT(PRESSURE)] = {tau, tau * root, tau3, tau3 * root, tau3 * tau, tau3 * tau3 * tau * root};
    double sum = 0.0;

    for (size_t i = 0; i < BC_COUNT(PRESSURE); i++)
        sum += PRESSURE[i].a * powers[i];
    return sum;
}

static double tau_at(double t_k)
{
    return 1.0 - t_k / BC_STEAM_T_MAX_K;
}

static double liquid_pressure_pa(double t_k)
{
    return P_CRITICAL_PA * exp(BC_STEAM_T_MAX_K / t_k * pressure_sum(tau_at(t_k)));
}

/* Derivative of equation (1): dp/dT = -(p/T) [ln(p/p_c) + sum a_i e_i tau^(e_i - 1)]. */
static double liquid_slope_pa_per_k(double t_k)
{
    const double p_pa = liquid_pressure_pa(t_k);
    double sum = log(p_pa / P_CRITICAL_PA);

    for (size_t i = 0; i < BC_COUNT(PRESSURE); i++)
        sum += PRESSURE[i].a * PRESSURE[i].e * pow(tau_at(t_k), PRESSURE[i].e - 1.0);
    return -p_pa / t_k * sum;
}

static double liquid_density_kg_per_m3(double t_k)
{
    return RHO_CRITICAL_KG_PER_M3 * (1.0 + sum_terms(LIQUID_DENSITY, BC_COUNT(LIQUID_DENSITY), tau_at(t_k)));
}

static double vapour_density_kg_per_m3(double t_k)
{
    return RHO_CRITICAL_KG_PER_M3 * exp(sum_terms(VAPOUR_DENSITY, BC_COUNT(VAPOUR_DENSITY), tau_at(t_k)));
}

/* R14-08(2011), equation (6), value from memory:
 * ln(p/p_t) = (1/theta) sum a_i theta^b_i, theta = T/273.16 K, p_t = 611.657 Pa. */
static double ice_pressure_pa(double t_k)
{
    static const term TERMS[] = {{-21.2144006, 0.00333333333}, {27.3203819, 1.20666667}, {-6.10598130, 1.70333333}};
    const double theta = t_k / BC_STEAM_T_MIN_K;

    return 611.657 * exp(sum_terms(TERMS, BC_COUNT(TERMS), theta) / theta);
}

bc_status bc_steam_pressure(double t_k, double *p_pa, bc_error *err)
{
    if (!(t_k >= BC_FROST_T_MIN_K && t_k <= BC_STEAM_T_MAX_K))
        return bc_fail(err, BC_ERR_RANGE, "%.6g K is outside the saturation line of water, %.6g to %.6g K", t_k,
                       BC_FROST_T_MIN_K, BC_STEAM_T_MAX_K);
    *p_pa = t_k >= BC_STEAM_T_MIN_K ? liquid_pressure_pa(t_k) : ice_pressure_pa(t_k);
    return BC_OK;
}

static bc_status check_liquid(double t_k, bc_error *err)
{
    if (t_k >= BC_STEAM_T_MIN_K && t_k <= BC_STEAM_T_MAX_K)
        return BC_OK;
    return bc_fail(err, BC_ERR_RANGE, "%.6g K is outside %.6g to %.6g K, where water is a liquid", t_k, BC_STEAM_T_MIN_K, BC_STEAM_T_MAX_K);
}

bc_status bc_steam_density(double t_k, double *liquid_kg_per_m3, double *vapour_kg_per_m3, bc_error *err)
{
    const bc_status status = check_liquid(t_k, err);

    if (status != BC_OK)
        return status;
    *liquid_kg_per_m3 = liquid_density_kg_per_m3(t_k);
    *vapour_kg_per_m3 = vapour_density_kg_per_m3(t_k);
    return BC_OK;
}

bc_status bc_steam_latent_heat(double t_k, double *j_per_kg, bc_error *err)
{
    const bc_status status = check_liquid(t_k, err);

    if (status == BC_OK)
        *j_per_kg = t_k * liquid_slope_pa_per_k(t_k) * (1.0 / vapour_density_kg_per_m3(t_k) - 1.0 / liquid_density_kg_per_m3(t_k));
    return status;
}
