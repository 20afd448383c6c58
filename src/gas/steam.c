/* SPDX-License-Identifier: MIT */
/* steam.c - saturation line of water, IAPWS SR1-86(1992), and sublimation line, IAPWS R14-08(2011). */
#include "bluecone/steam.h"

#include "base/compiler.h"
#include "base/error_internal.h"

#include <math.h>
#include <stddef.h>

/* One term a * u^e of a saturation equation. */
typedef struct {
    double a, e;
} term;

/* SR1-86(1992), equation (1), value from memory:
 * ln(p/p_c) = (T_c/T) sum a_i tau^e_i, tau = 1 - T/T_c, T_c = 647.096 K, p_c = 22.064 MPa. */
static double liquid_pressure_pa(double t_k)
{
    static const term TERMS[] = {{-7.85951783, 1.0}, {1.84408259, 1.5}, {-11.7866497, 3.0},
                                 {22.6807411, 3.5},  {-15.9618719, 4.0}, {1.80122502, 7.5}};
    const double tau = 1.0 - t_k / BC_STEAM_T_MAX_K;
    double sum = 0.0;

    for (size_t i = 0; i < BC_COUNT(TERMS); i++)
        sum += TERMS[i].a * pow(tau, TERMS[i].e);
    return 22.064e6 * exp(BC_STEAM_T_MAX_K / t_k * sum);
}

/* R14-08(2011), equation (6), value from memory:
 * ln(p/p_t) = (1/theta) sum a_i theta^b_i, theta = T/273.16 K, p_t = 611.657 Pa. */
static double ice_pressure_pa(double t_k)
{
    static const term TERMS[] = {{-21.2144006, 0.00333333333}, {27.3203819, 1.20666667}, {-6.10598130, 1.70333333}};
    const double theta = t_k / BC_STEAM_T_MIN_K;
    double sum = 0.0;

    for (size_t i = 0; i < BC_COUNT(TERMS); i++)
        sum += TERMS[i].a * pow(theta, TERMS[i].e);
    return 611.657 * exp(sum / theta);
}

bc_status bc_steam_pressure(double t_k, double *p_pa, bc_error *err)
{
    if (!(t_k >= BC_FROST_T_MIN_K && t_k <= BC_STEAM_T_MAX_K))
        return bc_fail(err, BC_ERR_RANGE, "%.6g K is outside the saturation line of water, %.6g to %.6g K", t_k,
                       BC_FROST_T_MIN_K, BC_STEAM_T_MAX_K);
    *p_pa = t_k >= BC_STEAM_T_MIN_K ? liquid_pressure_pa(t_k) : ice_pressure_pa(t_k);
    return BC_OK;
}
