/* SPDX-License-Identifier: MIT */
/* dewpoint.c - water dew point and partial condensation. */
#include "bluecone/dewpoint.h"

#include "base/error_internal.h"
#include "bluecone/steam.h"
#include "gas/species_index.h"

#include <math.h>

#define STEPS_MAX 60    /* the search below takes about ten */
#define CLOSE     1e-13 /* of ln p: moves T by less than 1e-14 of it */

/* ln p_sat at u = 1/T. A quotient that rounding took past an end of the line is put back on it. */
static double log_pressure(double u)
{
    double p_pa = 1.0;

    (void)!bc_steam_pressure(fmin(fmax(1.0 / u, BC_FROST_T_MIN_K), BC_STEAM_T_MAX_K), &p_pa, NULL); /* cannot fail on the line */
    return log(p_pa);
}

/* The saturation line is nearly straight in ln p over 1/T, so false position with the Illinois rule homes in
 * fast and never leaves the bracket. cold and hot lie on one side of the triple point, where the line has a
 * bend; a pressure beyond one of them is that end (the two formulas differ by 1e-7 at the triple point). */
static double saturation_temperature_k(double p_pa, double cold_k, double hot_k)
{
    const double target = log(p_pa);
    double a = 1.0 / cold_k;
    double b = 1.0 / hot_k;
    double fa = log_pressure(a) - target;
    double fb = log_pressure(b) - target;
    double u = b;

    if (fa >= 0.0 || fb <= 0.0)
        return fa >= 0.0 ? cold_k : hot_k;
    for (int i = 0; i < STEPS_MAX && fabs(fb) > CLOSE; i++) {
        u = b - fb * (b - a) / (fb - fa);
        const double f = log_pressure(u) - target;

        if ((f > 0.0) != (fb > 0.0)) {
            a = b;
            fa = fb;
        } else {
            fa /= 2.0;
        }
        b = u;
        fb = f;
    }
    return 1.0 / u;
}

static bc_status check_state(double x, double p_pa, const char *what, bc_error *err)
{
    if (!(x >= 0.0 && x <= 1.0))
        return bc_fail(err, BC_ERR_RANGE, "a mole fraction of %s of %.6g is not between 0 and 1", what, x);
    if (!(p_pa > 0.0) || !isfinite(p_pa))
        return bc_fail(err, BC_ERR_RANGE, "the pressure of the gas is %.6g Pa; give the absolute pressure",
                       p_pa);
    return BC_OK;
}

bc_status bc_dew_point(double x_water, double p_pa, bc_dew *dew, bc_error *err)
{
    const bc_status status = check_state(x_water, p_pa, "water", err);

    if (status != BC_OK)
        return status;
    const double p_water_pa = x_water * p_pa;

    if (p_water_pa <= 0.0) {
        *dew = (bc_dew){false, false, 0.0};
        return BC_OK;
    }
    const double logarithm = log(p_water_pa);

    if (logarithm < log_pressure(1.0 / BC_FROST_T_MIN_K) || logarithm > log_pressure(1.0 / BC_STEAM_T_MAX_K))
        return bc_fail(err, BC_ERR_RANGE,
                       "a partial pressure of water of %.6g Pa has no dew point between %g and %.6g K",
                       p_water_pa, BC_FROST_T_MIN_K, BC_STEAM_T_MAX_K);
    if (logarithm < log_pressure(1.0 / BC_STEAM_T_MIN_K))
        *dew = (bc_dew){
            true, true,
            saturation_temperature_k(p_water_pa, BC_FROST_T_MIN_K, nextafter(BC_STEAM_T_MIN_K, 0.0))};
    else
        *dew =
            (bc_dew){true, false, saturation_temperature_k(p_water_pa, BC_STEAM_T_MIN_K, BC_STEAM_T_MAX_K)};
    return BC_OK;
}

/* Mole fraction of water that a gas can hold; 1 where nothing ever condenses. */
static bc_status saturated_fraction(double t_k, double p_pa, double *x, bc_error *err)
{
    double p_sat_pa = 0.0;

    if (t_k >= BC_STEAM_T_MAX_K && isfinite(t_k)) {
        *x = 1.0;
        return BC_OK;
    }
    const bc_status status = bc_steam_pressure(t_k, &p_sat_pa, err);

    if (status == BC_OK)
        *x = fmin(p_sat_pa / p_pa, 1.0);
    return status;
}

/* Takes water out of a gas; x is what the rest can hold, below that of the gas. */
static void split_water(const bc_gas *gas, double x, bc_condensation *c)
{
    const double dry_mol = 1.0 - gas->x[SPECIES_water];
    const double vapour_mol = dry_mol * x / (1.0 - x);

    c->condensate_mol = gas->x[SPECIES_water] - vapour_mol;
    c->condensate_kg = c->condensate_mol * bc_species_molar_mass_kg_per_mol(SPECIES_water);
    c->exit_mol = dry_mol + vapour_mol;
    for (size_t i = 0; i < BC_SPECIES_CAPACITY; i++)
        c->exit.x[i] = c->exit_mol > 0.0 ? gas->x[i] / c->exit_mol : 0.0;
    c->exit.x[SPECIES_water] = c->exit_mol > 0.0 ? x : 0.0;
}

bc_status bc_condense(const bc_gas *gas, double t_k, double p_pa, bc_condensation *condensation,
                      bc_error *err)
{
    double x = 1.0;
    bc_status status = check_state(gas->x[SPECIES_water], p_pa, "water", err);

    if (status == BC_OK)
        status = saturated_fraction(t_k, p_pa, &x, err);
    if (status != BC_OK)
        return status;
    if (gas->x[SPECIES_water] <= x) {
        *condensation = (bc_condensation){.exit_mol = 1.0, .exit = *gas};
        return BC_OK;
    }
    if (t_k < BC_STEAM_T_MIN_K)
        return bc_fail(err, BC_ERR_RANGE,
                       "at %.6g K the water of the gas freezes out; give an exit temperature above 0.01 C",
                       t_k);
    condensation->condenses = true;
    split_water(gas, x, condensation);
    return BC_OK;
}
