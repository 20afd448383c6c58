/* SPDX-License-Identifier: MIT */
/* products.c - the products of combustion, their polynomials and the sums over a mixture of them. */
#include "flame/products_internal.h"

#include "base/compiler.h"
#include "bluecone/thermo.h"
#include "value/thermo_internal.h"

#include <assert.h>
#include <math.h>
#include <stdbool.h>

#define JOIN_K 1000.0 /* where the two ranges of nasa9.def meet */

static const struct {
    size_t thermo;
    const char *formula, *role, *source;
} PRODUCTS[] = {
#define PRODUCT(symbol, formula, role, source) {THERMO_##symbol, formula, role, source},
#include "data/products.def"
};

static_assert(PRODUCT_COUNT <= BC_PRODUCT_CAPACITY, "BC_PRODUCT_CAPACITY is too small");

static const signed char ATOMS[THERMO_COUNT][BC_ELEMENTS] = {
#define NASA9(symbol, name, c, h, n, o, s, he, ne, ar, ...) {c, h, n, o, s, he, ne, ar},
#include "data/nasa9.def"
};

size_t bc_product_count(void)
{
    return PRODUCT_COUNT;
}

size_t bc_product_thermo(size_t product)
{
    return product < PRODUCT_COUNT ? PRODUCTS[product].thermo : THERMO_COUNT;
}

const char *bc_product_formula(size_t product)
{
    return product < PRODUCT_COUNT ? PRODUCTS[product].formula : "";
}

const char *bc_product_role(size_t product)
{
    return product < PRODUCT_COUNT ? PRODUCTS[product].role : "";
}

const char *bc_product_source(size_t product)
{
    return product < PRODUCT_COUNT ? PRODUCTS[product].source : "";
}

size_t bc_product_of(size_t thermo_index)
{
    size_t i = 0;

    while (i < PRODUCT_COUNT && PRODUCTS[i].thermo != thermo_index)
        i++;
    return i;
}

const signed char *product_atoms(size_t thermo_index)
{
    return ATOMS[thermo_index];
}

/* Cp/R = a1 T^-2 + a2 T^-1 + a3 + a4 T + a5 T^2 + a6 T^3 + a7 T^4
 * H/RT = -a1 T^-2 + a2 ln(T)/T + a3 + a4 T/2 + a5 T^2/3 + a6 T^3/4 + a7 T^4/5 + b1/T
 * (H - T S)/RT, S/R = -a1 T^-2/2 - a2 T^-1 + a3 ln T + a4 T + a5 T^2/2 + a6 T^3/3 + a7 T^4/4 + b2 */
void polynomial_factors_at(double t_k, polynomial_factors *f)
{
    const double t = t_k, t2 = t * t, t3 = t2 * t, t4 = t2 * t2, inverse = 1.0 / t, log_t = log(t);
    const polynomial_factors at = {
        .t_k = t_k,
        .range = t_k < JOIN_K ? 0 : 1,
        .cp = {inverse * inverse, inverse, 1.0, t, t2, t3, t4},
        .h = {-inverse * inverse, log_t * inverse, 1.0, t / 2.0, t2 / 3.0, t3 / 4.0, t4 / 5.0, inverse},
        .g = {-inverse * inverse / 2.0, (log_t + 1.0) * inverse, 1.0 - log_t, -t / 2.0, -t2 / 6.0, -t3 / 12.0,
              -t4 / 20.0, inverse, -1.0},
    };

    *f = at;
}

double polynomial_cp_r(const double a[9], const polynomial_factors *f)
{
    return a[0] * f->cp[0] + a[1] * f->cp[1] + a[2] * f->cp[2] + a[3] * f->cp[3] + a[4] * f->cp[4] +
           a[5] * f->cp[5] + a[6] * f->cp[6];
}

double polynomial_h_rt(const double a[9], const polynomial_factors *f)
{
    return a[0] * f->h[0] + a[1] * f->h[1] + a[2] * f->h[2] + a[3] * f->h[3] + a[4] * f->h[4] +
           a[5] * f->h[5] + a[6] * f->h[6] + a[7] * f->h[7];
}

double polynomial_g_rt(const double a[9], const polynomial_factors *f)
{
    return a[0] * f->g[0] + a[1] * f->g[1] + a[2] * f->g[2] + a[3] * f->g[3] + a[4] * f->g[4] +
           a[5] * f->g[5] + a[6] * f->g[6] + a[7] * f->g[7] + a[8] * f->g[8];
}

double polynomial_row_h_rt(size_t thermo_index, const polynomial_factors *f)
{
    return polynomial_h_rt(bc_thermo_coefficients(thermo_index, f->range), f);
}

void mixture_finish(bc_mixture *mixture, const double element_moles[BC_ELEMENTS], const polynomial_factors *f)
{
    double found[BC_ELEMENTS] = {0.0}, sum = 0.0, h = 0.0, mass = 0.0, residual = 0.0, atoms = 0.0;

    for (size_t i = 0; i < PRODUCT_COUNT; i++) {
        const double n = mixture->moles[i];

        if (n == 0.0)
            continue;
        sum += n;
        h += n * polynomial_row_h_rt(PRODUCTS[i].thermo, f);
        for (int e = 0; e < BC_ELEMENTS; e++)
            found[e] += n * ATOMS[PRODUCTS[i].thermo][e];
    }
    for (int e = 0; e < BC_ELEMENTS; e++)
        atoms += element_moles[e];
    for (int e = 0; e < BC_ELEMENTS; e++) {
        mass += found[e] * bc_element_mass_g_per_mol((bc_element)e) * 1e-3;
        if (element_moles[e] > AMOUNT_MIN * atoms)
            residual = fmax(residual, fabs(found[e] / element_moles[e] - 1.0));
    }
    mixture->total_moles = sum;
    mixture->enthalpy_j = h * BC_THERMO_R_J_PER_MOL_K * f->t_k;
    mixture->molar_mass_kg_per_mol = mass / sum;
    mixture->element_residual = residual;
}

/* H and Cp of fixed moles, both over R. */
static void heat_content(const double moles[PRODUCT_COUNT], double t_k, double *h_k, double *cp)
{
    polynomial_factors f;
    double h = 0.0;

    polynomial_factors_at(t_k, &f);
    *cp = 0.0;
    for (size_t i = 0; i < PRODUCT_COUNT; i++)
        if (moles[i] > 0.0) {
            const double *a = bc_thermo_coefficients(PRODUCTS[i].thermo, f.range);

            h += moles[i] * polynomial_h_rt(a, &f);
            *cp += moles[i] * polynomial_cp_r(a, &f);
        }
    *h_k = h * t_k;
}

#define STEPS_MAX     60     /* 45 halvings take 5800 K to 2e-10 K */
#define STEP_LAST_K   1.0e-5 /* Newton squares it: 1e-5 K leaves less than 1e-12 K */
#define BRACKET_MIN_K 1.0e-10

/* Newton's temperature, if it is inside the bracket; an end of the data that was not looked at yet, if it is
 * beyond (there it shows whether there is a root); else the middle. */
static double choose_temperature(double newton_k, double low_k, double high_k)
{
    if (newton_k > low_k && newton_k < high_k)
        return newton_k;
    if (newton_k >= high_k && high_k >= BC_THERMO_T_MAX_K)
        return high_k;
    if (newton_k <= low_k && low_k <= BC_THERMO_T_MIN_K)
        return low_k;
    return 0.5 * (low_k + high_k);
}

int mixture_temperature(const double moles[PRODUCT_COUNT], double h_j, double t_start_k, double *t_k)
{
    const double wanted = h_j / BC_THERMO_R_J_PER_MOL_K;
    double low = BC_THERMO_T_MIN_K, high = BC_THERMO_T_MAX_K, t = t_start_k;

    for (int step = 1; step <= STEPS_MAX; step++) {
        double h, cp;

        heat_content(moles, t, &h, &cp);
        const double newton = t + (wanted - h) / cp;
        const bool at_end = h < wanted ? t >= BC_THERMO_T_MAX_K : t <= BC_THERMO_T_MIN_K;

        if (fabs(newton - t) < STEP_LAST_K || high - low < BRACKET_MIN_K) {
            *t_k = fmin(fmax(newton, BC_THERMO_T_MIN_K), BC_THERMO_T_MAX_K);
            return step;
        }
        if (at_end)
            return 0;
        *(h > wanted ? &high : &low) = t;
        t = choose_temperature(newton, low, high);
    }
    return 0;
}
