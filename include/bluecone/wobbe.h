/* SPDX-License-Identifier: MIT */
/* bluecone/wobbe.h - the Wobbe index at the burner: the ratio of two gases, and what the temperature of the fuel does.
 *
 * The index itself is a figure of ISO 6976 (bluecone/iso6976.h). Heat through one orifice at equal low pressure is
 * proportional to H/sqrt(density), so that the ratio of two indices is the ratio of two heat inputs. */
#ifndef BLUECONE_WOBBE_H
#define BLUECONE_WOBBE_H

#include "bluecone/status.h"

#ifdef __cplusplus
extern "C" {
#endif

#define BC_FUEL_T_MIN_K 200.0  /* below it natural gas and LPG condense */
#define BC_FUEL_T_MAX_K 1000.0 /* above it hydrocarbons crack */

/* Ratio of heat inputs, new over old gas: W2/W1 (1).
 *
 *   old_j_per_m3, new_j_per_m3   Wobbe indices, both gross or both net, at one reference state, J/m3, above 0
 *   ratio                        out: untouched on failure
 *
 * BC_ERR_RANGE: an index that is not positive. Exact for one orifice while its pressure is below 3 % of the absolute
 * pressure. Source: EN 437:2021 and ISO 6976:2016 for the index; the ratio follows from Bernoulli's equation. */
BC_API BC_MUST_USE bc_status bc_wobbe_ratio(double old_j_per_m3, double new_j_per_m3, double *ratio, bc_error *err);

/* Wobbe index corrected for the temperature of the fuel at the orifice, W sqrt(T0/T), J/m3.
 *
 *   t_metering_k     metering temperature that the index refers to, K
 *   t_fuel_k         temperature of the fuel at the orifice, K, BC_FUEL_T_MIN_K..BC_FUEL_T_MAX_K, as the other
 *   corrected        out: untouched on failure
 *
 * BC_ERR_RANGE outside of it. Source: gas turbine practice ("temperature-corrected Wobbe index"), value from memory;
 * the form is the density of an ideal gas in the orifice equation. */
BC_API BC_MUST_USE bc_status bc_wobbe_corrected(double wobbe_j_per_m3, double t_metering_k, double t_fuel_k,
                                                double *corrected, bc_error *err);

/* Modified Wobbe index of gas turbine practice, net heat / sqrt(d T), J/(m3 K^0.5); 1 Btu/(scf degR^0.5) is
 * 49988 J/(m3 K^0.5). Sites usually allow 5 % around their own value.
 *
 *   net_j_per_m3       lower heating value, J/m3, above 0
 *   relative_density   1, above 0
 *   t_fuel_k           K, BC_FUEL_T_MIN_K..BC_FUEL_T_MAX_K
 *
 * BC_ERR_RANGE outside of it. Source: gas turbine makers' fuel specifications, value from memory; others take the
 * gross heat or sqrt(T/T0): name the form beside the figure. */
BC_API BC_MUST_USE bc_status bc_wobbe_modified(double net_j_per_m3, double relative_density, double t_fuel_k,
                                               double *modified, bc_error *err);

#ifdef __cplusplus
}
#endif

#endif
