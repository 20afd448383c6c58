/* SPDX-License-Identifier: MIT */
/* bluecone/humidity.h - the water of combustion air, from each way in which it is stated, and the pressure
 * of the air at an altitude.
 *
 * Saturation is that of bluecone/steam.h: over liquid water, below 0.01 C over ice. The enhancement factor
 * (1.004 at 20 C and 1 atm, Greenspan 1976) is neglected, so that saturated air holds 0.5 % (25 C) to 1 %
 * (50 C) less water than the tables of ASHRAE say. */
#ifndef BLUECONE_HUMIDITY_H
#define BLUECONE_HUMIDITY_H

#include "bluecone/gas.h"
#include "bluecone/status.h"

#ifdef __cplusplus
extern "C" {
#endif

#define BC_HUMIDITY_T_MIN_K 223.15 /* of the air: where combustion air is found, and saturation is sure */
#define BC_HUMIDITY_T_MAX_K 373.15

#define BC_ALTITUDE_MIN_M (-5000.0) /* ISO 2533:1975 begins here, value from memory */
#define BC_ALTITUDE_MAX_M 11000.0   /* end of its lowest layer */

/* Mole fraction of water of air with a relative humidity, x = phi p_sat(T)/p.
 *
 *   relative   relative humidity phi, 0..1
 *   t_k        temperature of the air, BC_HUMIDITY_T_MIN_K..BC_HUMIDITY_T_MAX_K
 *   p_pa       its pressure, above the partial pressure of the water
 *   x_water    out: mol per mol of humid air; untouched on failure
 *
 * BC_ERR_RANGE outside of it. */
BC_API BC_MUST_USE bc_status bc_humidity_relative(double relative, double t_k, double p_pa, double *x_water, bc_error *err);

/* The same from the dew point, below 0.01 C the frost point, of the air: x = p_sat(T_dew)/p. */
BC_API BC_MUST_USE bc_status bc_humidity_dew_point(double t_dew_k, double p_pa, double *x_water, bc_error *err);

/* The same from a psychrometer: dry-bulb and wet-bulb temperature, the bulb iced below 0 C.
 *
 *   t_k, t_wet_k   temperature of the air and of the wet bulb, not above it
 *
 * BC_ERR_RANGE: outside the temperatures above, or a pair that no air can show (drier than dry).
 * Source: ASHRAE Handbook Fundamentals 2017 chapter 1, equations (33) and (35), value from memory. */
BC_API BC_MUST_USE bc_status bc_humidity_wet_bulb(double t_k, double t_wet_k, double p_pa, double *x_water, bc_error *err);

/* Humidity ratio, kg water per kg of dry air, W = 0.621945 x/(1 - x), and back.
 *
 *   x_water, ratio   0..below 1; 0 and above
 *
 * Source: ASHRAE Handbook Fundamentals 2017 chapter 1, ratio of the molar masses of water and air. */
BC_API double bc_humidity_ratio(double x_water);
BC_API double bc_humidity_fraction(double ratio);

/* A gas with a stated mole fraction of water in the place of its own.
 *
 *   x_water   0..below 1
 *   wet       out: untouched on failure
 *
 * BC_ERR_RANGE: x_water out of range; BC_ERR_INPUT: a gas that is nothing but water. */
BC_API BC_MUST_USE bc_status bc_humidity_apply(const bc_gas *gas, double x_water, bc_gas *wet, bc_error *err);

/* Pressure of the standard atmosphere, p = 101325 Pa (1 - 2.25577e-5 h/m)^5.25588.
 *
 *   altitude_m   geopotential altitude, BC_ALTITUDE_MIN_M..BC_ALTITUDE_MAX_M
 *   p_pa         out: untouched on failure
 *
 * BC_ERR_RANGE outside of it. Source: ISO 2533:1975 in the form of ASHRAE Handbook Fundamentals 2017 chapter
 * 1, equation (3), value from memory. */
BC_API BC_MUST_USE bc_status bc_altitude_pressure(double altitude_m, double *p_pa, bc_error *err);

#ifdef __cplusplus
}
#endif

#endif
