/* SPDX-License-Identifier: MIT */
/* acid_dew.c - sulfuric-acid dew point by the three published fits that agree with each other. */
#include "bluecone/dewpoint.h"

#include "base/error_internal.h"
#include "gas/species_index.h"

#include <math.h>

#define T0_K         273.15
#define ATM_PA       101325.0
#define MMHG_PER_ATM 760.0

/* Verhoff and Banchero, Chem. Eng. Progress 70 (1974), w and s in mmHg:
 * 1000/T = 2.276 - 0.0294 ln w - 0.0858 ln s + 0.0062 ln w ln s. */
static double verhoff_banchero_k(double w_atm, double s_atm)
{
    const double w = log(w_atm * MMHG_PER_ATM);
    const double s = log(s_atm * MMHG_PER_ATM);

    return 1000.0 / (2.276 - 0.0294 * w - 0.0858 * s + 0.0062 * w * s);
}

/* Okkes, Hydrocarbon Processing (1987), w and s in atm, t in C:
 * t = 203.25 + 27.6 lg w + 10.83 lg s + 1.06 (lg s + 8)^2.19; the power ends at 1e-8 atm. */
static double okkes_k(double w_atm, double s_atm)
{
    const double s = log10(s_atm);

    return T0_K + 203.25 + 27.6 * log10(w_atm) + 10.83 * s + 1.06 * pow(fmax(s + 8.0, 0.0), 2.19);
}

/* ZareNezhad, Oil and Gas Journal (2009), value from memory; w and s in mmHg, t in C:
 * t = 150 + 11.664 ln s + 8.1328 ln w - 0.383226 ln s ln w. */
static double zarenezhad_k(double w_atm, double s_atm)
{
    const double w = log(w_atm * MMHG_PER_ATM);
    const double s = log(s_atm * MMHG_PER_ATM);

    return T0_K + 150.0 + 11.664 * s + 8.1328 * w - 0.383226 * s * w;
}

/* Range of the fits, about: SO3 0.1 to 200 ppm, H2O 3 to 30 % at 1 atm, value from memory. */
static bool fits_hold(double w_atm, double s_atm)
{
    return s_atm >= 0.1e-6 && s_atm <= 200e-6 && w_atm >= 0.03 && w_atm <= 0.30;
}

static bc_acid_dew spread(double w_atm, double s_atm)
{
    const double v = verhoff_banchero_k(w_atm, s_atm);
    const double o = okkes_k(w_atm, s_atm);
    const double z = zarenezhad_k(w_atm, s_atm);

    return (bc_acid_dew){true, fits_hold(w_atm, s_atm), v, o, z, fmin(v, fmin(o, z)), fmax(v, fmax(o, z))};
}

static bc_status check(double x_water, double x_so3, double p_pa, bc_error *err)
{
    if (!(x_water >= 0.0 && x_so3 >= 0.0 && x_water + x_so3 <= 1.0))
        return bc_fail(err, BC_ERR_RANGE,
                       "mole fractions of %.6g of water and %.6g of SO3 are not between 0 and 1", x_water,
                       x_so3);
    if (!(p_pa > 0.0) || !isfinite(p_pa))
        return bc_fail(err, BC_ERR_RANGE, "the pressure of the gas is %.6g Pa; give the absolute pressure",
                       p_pa);
    return BC_OK;
}

bc_status bc_acid_dew_point(double x_water, double x_so3, double p_pa, bc_acid_dew *dew, bc_error *err)
{
    const bc_status status = check(x_water, x_so3, p_pa, err);

    if (status != BC_OK)
        return status;
    const double s_atm = x_so3 * (p_pa / ATM_PA);

    if (x_water <= 0.0 || x_so3 <= 0.0) {
        *dew = (bc_acid_dew){false, false, 0.0, 0.0, 0.0, 0.0, 0.0};
        return BC_OK;
    }
    if (x_so3 < BC_SO3_MIN || s_atm < BC_SO3_MIN)
        return bc_fail(err, BC_ERR_RANGE,
                       "%.4g ppm SO3 (%.4g ppm at 1 atm) is below %g ppm, where no acid dew point is known",
                       x_so3 * 1e6, s_atm * 1e6, BC_SO3_MIN * 1e6);
    *dew = spread(x_water * (p_pa / ATM_PA), s_atm);
    return BC_OK;
}

bc_status bc_acid_dew_point_of(const bc_gas *flue, double conversion, double p_pa, bc_acid_dew *dew,
                               bc_error *err)
{
    if (!(conversion >= 0.0 && conversion <= 1.0))
        return bc_fail(err, BC_ERR_RANGE, "a conversion of SO2 to SO3 of %.6g %% is not between 0 and 100 %%",
                       conversion * 100.0);
    return bc_acid_dew_point(flue->x[SPECIES_water], conversion * flue->x[SPECIES_sulfur_dioxide], p_pa, dew,
                             err);
}
