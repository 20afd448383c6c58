/* SPDX-License-Identifier: MIT */
/* bluecone/steam.h - saturation of water vapour over liquid water and over ice. */
#ifndef BLUECONE_STEAM_H
#define BLUECONE_STEAM_H

#include "bluecone/status.h"

#ifdef __cplusplus
extern "C" {
#endif

#define BC_STEAM_T_MIN_K 273.16  /* triple point of water */
#define BC_STEAM_T_MAX_K 647.096 /* critical point of water */
#define BC_FROST_T_MIN_K 50.0    /* lower end of IAPWS R14-08(2011) */

/* Saturation pressure of water vapour over liquid water, below the triple point over ice.
 *
 *   t_k    temperature, K, BC_FROST_T_MIN_K..BC_STEAM_T_MAX_K
 *   p_pa   out: pressure, Pa; untouched on failure
 *
 * BC_ERR_RANGE: t_k outside the range or not finite; nothing is extrapolated.
 * Source: IAPWS SR1-86(1992), Wagner and Pruss, J. Phys. Chem. Ref. Data 22 (1993) 783, for liquid;
 * IAPWS R14-08(2011), Wagner et al., J. Phys. Chem. Ref. Data 40 (2011) 043103, for ice. */
BC_API BC_MUST_USE bc_status bc_steam_pressure(double t_k, double *p_pa, bc_error *err);

/* Densities of liquid water and of its vapour at saturation.
 *
 *   t_k        temperature, K, BC_STEAM_T_MIN_K..BC_STEAM_T_MAX_K
 *   liquid_kg_per_m3, vapour_kg_per_m3   out: untouched on failure
 *
 * BC_ERR_RANGE outside of it. Source: IAPWS SR1-86(1992). */
BC_API BC_MUST_USE bc_status bc_steam_density(double t_k, double *liquid_kg_per_m3, double *vapour_kg_per_m3,
                                              bc_error *err);

/* Latent heat of water, Clapeyron: L = T (dp/dT) (1/rho'' - 1/rho'), consistent with the two functions above.
 *
 *   t_k        temperature, K, BC_STEAM_T_MIN_K..BC_STEAM_T_MAX_K
 *   j_per_kg   out: untouched on failure
 *
 * BC_ERR_RANGE outside of it; ice is not covered. Source: IAPWS SR1-86(1992); within 0.3 kJ/kg of steam tables
 * from 5 to 90 C. */
BC_API BC_MUST_USE bc_status bc_steam_latent_heat(double t_k, double *j_per_kg, bc_error *err);

#ifdef __cplusplus
}
#endif

#endif
