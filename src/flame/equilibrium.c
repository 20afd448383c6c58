/* SPDX-License-Identifier: MIT */
/* equilibrium.c - chemical equilibrium at temperature and pressure or at enthalpy and pressure. */
#include "bluecone/equilibrium.h"

#include "base/error_internal.h"
#include "bluecone/thermo.h"
#include "flame/equilibrium_internal.h"

#include <math.h>
#include <string.h>

#define P_STANDARD_PA 1.0e5 /* of the entropies: 1 bar, NASA/TP-2002-211556 */

/* Steps that the iteration gets: a good estimate takes 3 to 10, one of very rich mixtures up to 50 (a million
 * random mixtures); mixtures that cool down get time, because there is nothing after them. */
#define STEPS_GOOD 60
#define STEPS_MANY 200

/* Cooling down starts where all molecules dissociate and takes steps that the iteration follows easily. */
#define HOT_K   3500.0
#define COOLING 0.8

/* Halving 5800 K 43 times ends here; H then closes to 1e-12 of its terms. */
#define SEARCH_LAST_K 1.0e-9

/* The most carbon that gases of the other elements hold: CO, C2H, CN and CS. */
static double carbon_held(const double element_moles[BC_ELEMENTS])
{
    return element_moles[BC_O] + 2.0 * element_moles[BC_H] + element_moles[BC_N] + element_moles[BC_S];
}

static bc_status check_elements(const double element_moles[BC_ELEMENTS], bc_error *err)
{
    double sum = 0.0;

    for (int k = 0; k < BC_ELEMENTS; k++) {
        if (!(element_moles[k] >= 0.0 && isfinite(element_moles[k])))
            return bc_fail(err, BC_ERR_INPUT,
                           "the amount of %s is %g mol; amounts of elements are not negative",
                           bc_element_symbol((bc_element)k), element_moles[k]);
        sum += element_moles[k];
    }
    if (!(sum > 0.0 && isfinite(sum)))
        return bc_fail(err, BC_ERR_INPUT,
                       "a mixture without elements has no equilibrium; give it at least one");
    if (!(sum >= BC_EQUILIBRIUM_MOL_MIN && sum <= BC_EQUILIBRIUM_MOL_MAX))
        return bc_fail(err, BC_ERR_INPUT, "%g mol of atoms are outside of %g to %g mol; scale the mixture", sum,
                       BC_EQUILIBRIUM_MOL_MIN, BC_EQUILIBRIUM_MOL_MAX);
    if (element_moles[BC_C] > carbon_held(element_moles) + AMOUNT_MIN * sum)
        return bc_fail(
            err, BC_ERR_INPUT,
            "%.4g mol of carbon are more than the gases considered can hold with the other elements, "
            "%.4g mol; add oxidant",
            element_moles[BC_C], carbon_held(element_moles));
    return BC_OK;
}

static bc_status check_pressure(double p_pa, bc_error *err)
{
    if (p_pa >= BC_EQUILIBRIUM_P_MIN_PA && p_pa <= BC_EQUILIBRIUM_P_MAX_PA)
        return BC_OK;
    return bc_fail(err, BC_ERR_RANGE,
                   "a pressure of %.6g Pa is outside the range of ideal gases, %g to %g Pa", p_pa,
                   BC_EQUILIBRIUM_P_MIN_PA, BC_EQUILIBRIUM_P_MAX_PA);
}

/* The problem, scaled to one mole of atoms; returns the scale. */
static double begin(equilibrium *e, const double element_moles[BC_ELEMENTS], double p_pa)
{
    double sum = 0.0;

    for (int k = 0; k < BC_ELEMENTS; k++)
        sum += element_moles[k];
    e->inert_moles = 0.0;
    for (int k = 0; k < BC_ELEMENTS; k++) {
        e->elements[k] = element_moles[k] / sum < AMOUNT_MIN ? 0.0 : element_moles[k] / sum;
        if (k >= REACTING)
            e->inert_moles += e->elements[k];
    }
    e->ln_p = log(p_pa / P_STANDARD_PA);
    e->range_changes = e->iterations = 0;
    e->factors.range = 1;
    equilibrium_list_species(e);
    return sum;
}

static void write_mixture(equilibrium *e, const double element_moles[BC_ELEMENTS], double scale, double p_pa,
                          bc_mixture *mixture)
{
    memset(mixture, 0, sizeof *mixture);
    for (size_t j = 0; j < e->species; j++)
        mixture->moles[e->product[j]] = e->moles[j] * scale;
    for (int k = REACTING; k < BC_ELEMENTS; k++)
        mixture->moles[PRODUCT_OF_INERT[k - REACTING]] = element_moles[k];
    mixture->t_k = e->t_k;
    mixture->p_pa = p_pa;
    mixture->iterations = e->iterations;
    if (e->factors.t_k != e->t_k) {
        const int range = e->factors.range;

        polynomial_factors_at(e->t_k, &e->factors);
        if (e->range_changes > RANGE_CHANGES_MAX)
            e->factors.range = range;
    }
    mixture_finish(mixture, element_moles, &e->factors);
}

typedef enum { FOUND, NOT_FOUND, TOO_COLD, TOO_HOT } outcome;

/* From a hot mixture, where nothing is rare, down to the temperature wanted. */
static outcome cool_down(equilibrium *e)
{
    const double wanted_k = e->t_k;

    e->t_k = fmax(wanted_k, HOT_K);
    equilibrium_list_species(e);
    equilibrium_start_evenly(e);
    while (equilibrium_iterate(e, STEPS_MANY)) {
        if (e->t_k <= wanted_k)
            return FOUND;
        e->t_k = fmax(wanted_k, e->t_k * COOLING);
    }
    return NOT_FOUND;
}

static outcome find_at_temperature(equilibrium *e)
{
    equilibrium_estimate(e);
    if (equilibrium_iterate(e, STEPS_GOOD))
        return FOUND;
    return cool_down(e);
}

/* Equilibrium at a temperature, and by how much its H/R surpasses the one wanted, K. */
static outcome find_surplus(equilibrium *e, double t_k, double *surplus)
{
    double sum = 0.0;

    e->t_k = t_k;
    const outcome found = find_at_temperature(e);

    for (size_t j = 0; j < e->species; j++)
        sum += e->moles[j] * e->v[j][LN_T];
    *surplus = (sum + e->inert_h) * t_k - e->h_r;
    return found;
}

/* The slow and sure way: enthalpy at equilibrium increases with temperature, so halving finds it. */
static outcome search_temperature(equilibrium *e)
{
    double low = BC_THERMO_T_MIN_K, high = BC_THERMO_T_MAX_K, surplus;
    outcome found;

    e->fixed_t = true;
    found = find_surplus(e, low, &surplus);
    if (found == FOUND && surplus > 0.0)
        return TOO_COLD;
    if (found == FOUND)
        found = find_surplus(e, high, &surplus);
    if (found == FOUND && surplus < 0.0)
        return TOO_HOT;
    while (found == FOUND && high - low > SEARCH_LAST_K) {
        const double middle = 0.5 * (low + high);

        found = find_surplus(e, middle, &surplus);
        *(surplus < 0.0 ? &low : &high) = middle;
    }
    return found;
}

static outcome find_at_enthalpy(equilibrium *e)
{
    equilibrium_estimate(e);
    if (equilibrium_iterate(e, STEPS_GOOD))
        return FOUND;
    equilibrium_list_species(e);
    return search_temperature(e);
}

static bc_status refuse(outcome found, bc_error *err)
{
    if (found == TOO_COLD || found == TOO_HOT)
        return bc_fail(err, BC_ERR_RANGE,
                       "the temperature that belongs to this enthalpy is %s %g K, the end of the data",
                       found == TOO_COLD ? "below" : "above",
                       found == TOO_COLD ? BC_THERMO_T_MIN_K : BC_THERMO_T_MAX_K);
    return bc_fail(err, BC_ERR_SOLVER, "the equilibrium was not found; please report the input");
}

bc_status bc_equilibrium_tp(const double element_moles[BC_ELEMENTS], double t_k, double p_pa,
                            bc_mixture *mixture, bc_error *err)
{
    bc_status status = check_elements(element_moles, err);

    if (status == BC_OK)
        status = check_pressure(p_pa, err);
    if (status != BC_OK)
        return status;
    if (!(t_k >= BC_THERMO_T_MIN_K && t_k <= BC_THERMO_T_MAX_K))
        return bc_fail(err, BC_ERR_RANGE, "%.6g K is outside the thermodynamic data, %g to %g K", t_k,
                       BC_THERMO_T_MIN_K, BC_THERMO_T_MAX_K);
    equilibrium e;
    const double scale = begin(&e, element_moles, p_pa);

    e.fixed_t = true;
    e.t_k = t_k;
    const outcome found = e.species > 0 ? find_at_temperature(&e) : FOUND;

    if (found != FOUND)
        return refuse(found, err);
    write_mixture(&e, element_moles, scale, p_pa, mixture);
    return BC_OK;
}

/* Inert atoms only: their temperature alone. */
static outcome find_inert_temperature(equilibrium *e)
{
    double moles[PRODUCT_COUNT] = {0.0};

    for (int k = REACTING; k < BC_ELEMENTS; k++)
        moles[PRODUCT_OF_INERT[k - REACTING]] = e->elements[k];
    /* Cp = 5/2 R: H/R = 5/2 n (T - 298.15 K) decides on which side an enthalpy lies outside. */
    e->iterations = mixture_temperature(moles, e->h_r * BC_THERMO_R_J_PER_MOL_K, EVEN_T_K, &e->t_k);
    if (e->iterations > 0)
        return FOUND;
    return e->h_r < 0.0 ? TOO_COLD : TOO_HOT;
}

bc_status bc_equilibrium_hp(const double element_moles[BC_ELEMENTS], double h_j, double p_pa,
                            bc_mixture *mixture, bc_error *err)
{
    bc_status status = check_elements(element_moles, err);

    if (status == BC_OK)
        status = check_pressure(p_pa, err);
    if (status != BC_OK)
        return status;
    if (!isfinite(h_j))
        return bc_fail(err, BC_ERR_RANGE, "the enthalpy is not a finite number");
    equilibrium e;
    const double scale = begin(&e, element_moles, p_pa);

    e.fixed_t = false;
    e.h_r = h_j / scale / BC_THERMO_R_J_PER_MOL_K;
    const outcome found = e.species > 0 ? find_at_enthalpy(&e) : find_inert_temperature(&e);

    if (found != FOUND)
        return refuse(found, err);
    write_mixture(&e, element_moles, scale, p_pa, mixture);
    return BC_OK;
}
