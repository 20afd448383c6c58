/* SPDX-License-Identifier: MIT */
/* humidity.c - psychrometry of combustion air. */
#include "bluecone/humidity.h"

#include "base/error_internal.h"
#include "bluecone/steam.h"
#include "gas/species_index.h"

#include <math.h>

#define T0_K       273.15
#define MASS_RATIO 0.621945 /* water over dry air, ASHRAE Fundamentals 2017 chapter 1 */

/* Partial pressure of saturated water as a mole fraction of the total pressure. */
static bc_status saturated_fraction(double t_k, double p_pa, double *x, bc_error *err)
{
    double p_sat_pa = 0.0;

    if (!(t_k >= BC_HUMIDITY_T_MIN_K && t_k <= BC_HUMIDITY_T_MAX_K))
        return bc_fail(err, BC_ERR_RANGE,
                       "%.6g C is outside %.6g to %.6g C, where the humidity of air is computed", t_k - T0_K,
                       BC_HUMIDITY_T_MIN_K - T0_K, BC_HUMIDITY_T_MAX_K - T0_K);
    if (!(p_pa > 0.0) || !isfinite(p_pa))
        return bc_fail(err, BC_ERR_RANGE, "the pressure of the air is %.6g Pa; give the absolute pressure",
                       p_pa);
    const bc_status status = bc_steam_pressure(t_k, &p_sat_pa, err);

    if (status == BC_OK)
        *x = p_sat_pa / p_pa;
    return status;
}

static bc_status keep_fraction(double x, double p_pa, double *x_water, bc_error *err)
{
    if (!(x < 1.0))
        return bc_fail(
            err, BC_ERR_RANGE,
            "that much water has a higher pressure than the air, %.6g kPa; check temperature and pressure",
            p_pa * 1e-3);
    *x_water = x;
    return BC_OK;
}

bc_status bc_humidity_relative(double relative, double t_k, double p_pa, double *x_water, bc_error *err)
{
    double x = 0.0;

    if (!(relative >= 0.0 && relative <= 1.0))
        return bc_fail(err, BC_ERR_RANGE, "a relative humidity lies between 0 and 100 %%, not at %.6g %%",
                       relative * 100.0);
    const bc_status status = saturated_fraction(t_k, p_pa, &x, err);

    return status == BC_OK ? keep_fraction(relative * x, p_pa, x_water, err) : status;
}

bc_status bc_humidity_dew_point(double t_dew_k, double p_pa, double *x_water, bc_error *err)
{
    double x = 0.0;
    const bc_status status = saturated_fraction(t_dew_k, p_pa, &x, err);

    return status == BC_OK ? keep_fraction(x, p_pa, x_water, err) : status;
}

/* ASHRAE Fundamentals 2017 chapter 1, (33) and, with an iced bulb, (35); t, t* in C, W_s at t*:
 *   W = [(2501 - 2.326 t*) W_s - 1.006 (t - t*)] / (2501 + 1.86 t - 4.186 t*)
 *   W = [(2830 - 0.24 t*) W_s - 1.006 (t - t*)] / (2830 + 1.86 t - 2.1 t*)      t* < 0 */
static double wet_bulb_ratio(double t, double t_wet, double saturated)
{
    const double cooling = 1.006 * (t - t_wet);

    if (t_wet >= 0.0)
        return ((2501.0 - 2.326 * t_wet) * saturated - cooling) / (2501.0 + 1.86 * t - 4.186 * t_wet);
    return ((2830.0 - 0.24 * t_wet) * saturated - cooling) / (2830.0 + 1.86 * t - 2.1 * t_wet);
}

bc_status bc_humidity_wet_bulb(double t_k, double t_wet_k, double p_pa, double *x_water, bc_error *err)
{
    double x = 0.0;
    double x_wet = 0.0;
    bc_status status = saturated_fraction(t_k, p_pa, &x, err);

    if (status == BC_OK)
        status = saturated_fraction(t_wet_k, p_pa, &x_wet, err);
    if (status == BC_OK)
        status = keep_fraction(x_wet, p_pa, &x_wet, err);
    if (status != BC_OK)
        return status;
    if (!(t_wet_k <= t_k))
        return bc_fail(err, BC_ERR_RANGE,
                       "a wet bulb of %.6g C is warmer than the air, %.6g C; check which is which",
                       t_wet_k - T0_K, t_k - T0_K);
    const double ratio = wet_bulb_ratio(t_k - T0_K, t_wet_k - T0_K, bc_humidity_ratio(x_wet));

    if (ratio < 0.0)
        return bc_fail(err, BC_ERR_RANGE,
                       "no air of %.6g C has a wet bulb as cold as %.6g C: dry air has a warmer one",
                       t_k - T0_K, t_wet_k - T0_K);
    *x_water = bc_humidity_fraction(ratio);
    return BC_OK;
}

double bc_humidity_ratio(double x_water)
{
    return MASS_RATIO * x_water / (1.0 - x_water);
}

double bc_humidity_fraction(double ratio)
{
    return ratio / (MASS_RATIO + ratio);
}

bc_status bc_humidity_apply(const bc_gas *gas, double x_water, bc_gas *wet, bc_error *err)
{
    bc_gas dry;

    if (!(x_water >= 0.0 && x_water < 1.0))
        return bc_fail(err, BC_ERR_RANGE, "a mole fraction of water of %.6g is not from 0 to below 1",
                       x_water);
    const bc_status status = bc_gas_dry(gas, &dry, err);

    if (status != BC_OK)
        return status;
    for (size_t i = 0; i < BC_SPECIES_CAPACITY; i++)
        wet->x[i] = dry.x[i] * (1.0 - x_water);
    wet->x[SPECIES_water] = x_water;
    return BC_OK;
}

bc_status bc_altitude_pressure(double altitude_m, double *p_pa, bc_error *err)
{
    if (!(altitude_m >= BC_ALTITUDE_MIN_M && altitude_m <= BC_ALTITUDE_MAX_M))
        return bc_fail(err, BC_ERR_RANGE,
                       "%.6g m is outside the lowest layer of the standard atmosphere, %g to %g m",
                       altitude_m, BC_ALTITUDE_MIN_M, BC_ALTITUDE_MAX_M);
    *p_pa = 101325.0 * pow(1.0 - 2.25577e-5 * altitude_m, 5.25588);
    return BC_OK;
}
