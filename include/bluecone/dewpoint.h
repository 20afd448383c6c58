/* SPDX-License-Identifier: MIT */
/* bluecone/dewpoint.h - where a flue gas begins to condense, water and sulfuric acid, and what is left of it
 * below the dew point. */
#ifndef BLUECONE_DEWPOINT_H
#define BLUECONE_DEWPOINT_H

#include <stdbool.h>

#include "bluecone/gas.h"
#include "bluecone/status.h"

#ifdef __cplusplus
extern "C" {
#endif

/* A water dew point. */
typedef struct {
    bool exists; /* false: the gas holds no water */
    bool frost;  /* water condenses as ice: below 273.16 K */
    double t_k;  /* 0 when there is none */
} bc_dew;

/* The temperature at which x_water p is the saturation pressure of water.
 *
 *   x_water   mole fraction of water, 0..1
 *   p_pa      pressure of the gas, above 0
 *   dew       out: untouched on failure
 *
 * BC_ERR_RANGE: outside of it, a partial pressure above the critical point, or below that of ice at 50 K.
 * Source: inverse of bc_steam_pressure(); ideal mixing, which puts the dew point of a flue gas about 0.1 K low
 * (enhancement factor of Greenspan 1976). */
BC_API BC_MUST_USE bc_status bc_dew_point(double x_water, double p_pa, bc_dew *dew, bc_error *err);

/* A gas cooled to a temperature, per mole of it as it was. */
typedef struct {
    bool condenses;       /* the temperature is below the dew point */
    double condensate_mol; /* liquid water */
    double condensate_kg;
    double exit_mol;      /* gas that stays */
    bc_gas exit;          /* its fractions, saturated when condenses; all zero when exit_mol is (steam alone) */
} bc_condensation;

/* Cools a gas and takes out the water that it cannot hold: n_v = n_dry p_sat/(p - p_sat).
 *
 *   t_k, p_pa      exit temperature and pressure, above 0
 *   condensation   out: untouched on failure
 *
 * BC_ERR_RANGE: temperature below 273.16 K and water that would come out as ice, or no state at all.
 * The latent heat is bc_steam_latent_heat(). Condensate of flue gas is acid by dissolved CO2 (pH 3 to 5).
 * Source: balance of the water; ideal mixing. */
BC_API BC_MUST_USE bc_status bc_condense(const bc_gas *gas, double t_k, double p_pa, bc_condensation *condensation,
                                         bc_error *err);

#define BC_SO3_CONVERSION 0.02 /* of SO2, mole by mole: a usual figure; 0.01 to 0.05 occur, value from memory */
#define BC_SO3_MIN 1e-8        /* mole fraction at 1 atm below which no acid dew point is given: ln s diverges */

/* Sulfuric-acid dew points by three correlations that differ by 1 to 10 K: show the spread. */
typedef struct {
    bool exists;   /* false: no SO3 or no water */
    bool in_range; /* SO3 0.1 to 200 ppm and H2O 3 to 30 % at 1 atm, the range of the fits, value from memory */
    double verhoff_banchero_k, okkes_k, zarenezhad_k; /* 0 when there is none */
    double min_k, max_k;                              /* of the three */
} bc_acid_dew;

/* The acid dew point of a gas with water and SO3 (all of it there as H2SO4).
 *
 *   x_water, x_so3   mole fractions, 0..1
 *   p_pa             pressure of the gas, above 0
 *   dew              out: untouched on failure
 *
 * BC_ERR_RANGE: outside of it, or SO3 above zero but below BC_SO3_MIN (partial pressure over 1 atm alike).
 * Source: Verhoff and Banchero, Chem. Eng. Progress 70 (1974); Okkes, Hydrocarbon Processing (1987); ZareNezhad,
 * Oil and Gas Journal (2009), value from memory. */
BC_API BC_MUST_USE bc_status bc_acid_dew_point(double x_water, double x_so3, double p_pa, bc_acid_dew *dew, bc_error *err);

/* The same for a flue gas whose SO2 is partly SO3: x_so3 = conversion x(SO2).
 *
 *   conversion   share of the SO2, mole by mole, 0..1; BC_SO3_CONVERSION when nothing better is known */
BC_API BC_MUST_USE bc_status bc_acid_dew_point_of(const bc_gas *flue, double conversion, double p_pa, bc_acid_dew *dew,
                                                  bc_error *err);

#ifdef __cplusplus
}
#endif

#endif
