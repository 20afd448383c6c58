/* SPDX-License-Identifier: MIT */
/* equilibrium_estimate.c - where Newton's iteration starts.
 *
 * A flame whose carbon is at least CO is estimated so well that a handful of steps suffice: complete
 * combustion gives a temperature, the oxygen pressure at which CO, CO2, H2 and H2O share the oxygen there
 * gives the composition. Anything else starts from the same amount of every species, as in NASA RP-1311. */
#include "flame/equilibrium_internal.h"

#include "bluecone/thermo.h"
#include "value/thermo_internal.h"

#include <math.h>

/* Dissociation takes heat: complete combustion at 1900 K + d becomes 1900 K + d/(1 + d/1600 K), which is
 * within 40 K of equilibrium for methane, hydrogen and CO in air and oxygen at 1 bar (our own results). */
#define DISSOCIATION_K      1900.0
#define DISSOCIATION_SPAN_K 1600.0

/* Largest mole fraction a species starts with that is not known to be abundant: ln 0.02. */
#define LN_MINOR (-3.9)
/* Logarithm of the moles of a species not yet estimated. */
#define LN_UNKNOWN (-600.0)

/* Start of Gordon and McBride (1994), section 3.2: n = 0.1 in all. */
#define EVEN_MOLES 0.1

#define OXYGEN_STEPS     60
#define LN_U_SPAN        300.0  /* K of CO2 at 200 K is exp(155) */
#define OXYGEN_STEP_LAST 1.0e-3 /* of ln u: an estimate needs no more */

static double atoms_of(const equilibrium *e, bc_element element)
{
    return e->elements[element];
}

/* Oxygen beyond what makes CO of all carbon and SO2 of all sulphur. */
static double free_oxygen(const equilibrium *e)
{
    return atoms_of(e, BC_O) - atoms_of(e, BC_C) - 2.0 * atoms_of(e, BC_S);
}

static void set_inerts(const equilibrium *e, double moles[PRODUCT_COUNT])
{
    for (int k = REACTING; k < BC_ELEMENTS; k++)
        moles[PRODUCT_OF_INERT[k - REACTING]] = e->elements[k];
}

/* CO2, H2O, SO2, N2 and O2; oxygen that does not suffice burns equal shares of CO and H2. */
static void burn_completely(const equilibrium *e, double moles[PRODUCT_COUNT])
{
    const double c = atoms_of(e, BC_C), h2 = atoms_of(e, BC_H) / 2.0;
    const double oxygen = free_oxygen(e);
    const double share = oxygen < c + h2 ? oxygen / (c + h2) : 1.0;

    moles[PRODUCT_carbon_dioxide] = share * c;
    moles[PRODUCT_carbon_monoxide] = (1.0 - share) * c;
    moles[PRODUCT_water] = share * h2;
    moles[PRODUCT_hydrogen] = (1.0 - share) * h2;
    moles[PRODUCT_sulfur_dioxide] = atoms_of(e, BC_S);
    moles[PRODUCT_nitrogen] = atoms_of(e, BC_N) / 2.0;
    moles[PRODUCT_oxygen] = share < 1.0 ? 0.0 : fmax(0.0, (oxygen - c - h2) / 2.0);
    set_inerts(e, moles);
}

static double estimate_temperature(const equilibrium *e, const double moles[PRODUCT_COUNT])
{
    double t_k = EVEN_T_K;
    const double h_j = e->h_r * BC_THERMO_R_J_PER_MOL_K;

    if (mixture_temperature(moles, h_j, EVEN_T_K, &t_k) == 0)
        return EVEN_T_K;
    const double excess = t_k - DISSOCIATION_K;

    return excess > 0.0 ? DISSOCIATION_K + excess / (1.0 + excess / DISSOCIATION_SPAN_K) : t_k;
}

static double g_at(const polynomial_factors *f, size_t product)
{
    return polynomial_g_rt(bc_thermo_coefficients(bc_product_thermo(product), f->range), f);
}

enum { PAIRS = 3 };

/* Species that oxygen turns into each other: poor + 1/2 O2 = rich. */
static const struct {
    bc_element element;
    int atoms; /* of the element, in either */
    size_t poor, rich;
} PAIR[PAIRS] = {
    {BC_C, 1, PRODUCT_carbon_monoxide, PRODUCT_carbon_dioxide},
    {BC_H, 2, PRODUCT_hydrogen, PRODUCT_water},
    {BC_S, 1, PRODUCT_sulfur_monoxide, PRODUCT_sulfur_dioxide},
};

/* What the oxygen pressure is found from. */
typedef struct {
    double moles[PAIRS], k[PAIRS]; /* of both of a pair; ratio rich/poor at u = 1 */
    double surplus;                /* atoms of oxygen beyond complete combustion; negative in rich mixtures */
    double per_bar;                /* atoms of oxygen in O2 at u = 1, 2 n/p */
} oxygen_balance;

/* ln u that would do if O2 alone, or O2 with the CO, H2 and SO of a stoichiometric mixture, held the surplus.
 */
static double first_ln_u(const oxygen_balance *b)
{
    double poor = 1.0e-300;

    for (int i = 0; i < PAIRS; i++)
        if (b->moles[i] > 0.0)
            poor += b->moles[i] / b->k[i];
    const double even = log(poor / b->per_bar) / 3.0;

    return b->surplus > 0.0 ? fmax(even, 0.5 * log(b->surplus / b->per_bar)) : even;
}

/* (2 n/p) u^2 - sum over the pairs of moles/(1 + k u) - surplus, and its slope in ln u. */
static double oxygen_excess(const oxygen_balance *b, double u, double *slope)
{
    const double o2 = b->per_bar * u * u;
    double excess = o2 - b->surplus;

    *slope = 2.0 * o2;
    for (int i = 0; i < PAIRS; i++)
        if (b->moles[i] > 0.0) {
            const double share = 1.0 / (1.0 + b->k[i] * u);

            excess -= b->moles[i] * share;
            *slope += b->moles[i] * share * (1.0 - share);
        }
    return excess;
}

/* u = sqrt(p(O2)/1 bar) at which the excess is zero; it increases in u: Newton in ln u within a bracket. Free
 * of differences of large terms when the surplus is zero. */
static double find_oxygen(const oxygen_balance *b)
{
    double w = first_ln_u(b), high = w + LN_U_SPAN, low = w - LN_U_SPAN;

    for (int step = 0; step < OXYGEN_STEPS; step++) {
        double slope;
        const double excess = oxygen_excess(b, exp(w), &slope);
        double next = w - excess / slope;

        *(excess > 0.0 ? &high : &low) = w;
        if (!(next >= low && next <= high))
            next = 0.5 * (low + high);
        if (fabs(next - w) < OXYGEN_STEP_LAST)
            return exp(next);
        w = next;
    }
    return exp(w);
}

/* Shares the oxygen among O2 and the pairs at e->t_k. */
static void dissociate(const equilibrium *e, double moles[PRODUCT_COUNT])
{
    polynomial_factors f;
    oxygen_balance b = {.surplus = 0.0};
    double n = 0.0;

    polynomial_factors_at(e->t_k, &f);
    const double g_o = 0.5 * g_at(&f, PRODUCT_oxygen);

    for (size_t i = 0; i < PRODUCT_COUNT; i++)
        n += moles[i];
    b.per_bar = 2.0 * n / exp(e->ln_p);
    b.surplus = free_oxygen(e) - e->elements[BC_C] - e->elements[BC_H] / 2.0;
    if (fabs(b.surplus) < AMOUNT_MIN)
        b.surplus = 0.0;
    for (int i = 0; i < PAIRS; i++) {
        b.moles[i] = e->elements[PAIR[i].element] / PAIR[i].atoms;
        if (b.moles[i] > 0.0)
            b.k[i] = exp(g_at(&f, PAIR[i].poor) + g_o - g_at(&f, PAIR[i].rich));
    }
    const double u = find_oxygen(&b);

    for (int i = 0; i < PAIRS; i++) {
        moles[PAIR[i].poor] = b.moles[i] / (1.0 + b.k[i] * u);
        moles[PAIR[i].rich] = b.moles[i] - moles[PAIR[i].poor];
    }
    moles[PRODUCT_oxygen] = b.per_bar * u * u / 2.0;
}

static void set_total(equilibrium *e)
{
    e->n = e->inert_moles;
    for (size_t j = 0; j < e->species; j++)
        e->n += e->moles[j];
    e->ln_n = log(e->n);
}

/* Species that are not components start in equilibrium with them. */
static void set_minor_species(equilibrium *e)
{
    double mu[REACTING] = {0.0};

    for (size_t i = 0; i < e->components; i++)
        mu[i] = e->g[e->component[i]] + e->ln_moles[e->component[i]] - e->ln_n + e->ln_p;
    for (size_t j = 0; j < e->species; j++) {
        double ln_x = -e->g[j] - e->ln_p;

        for (size_t i = 0; i < e->components; i++)
            ln_x += e->v[j][i] * mu[i];
        if (e->ln_moles[j] <= LN_UNKNOWN)
            equilibrium_set_moles(e, j, fmin(ln_x, LN_MINOR) + e->ln_n);
    }
}

void equilibrium_estimate(equilibrium *e)
{
    double moles[PRODUCT_COUNT] = {0.0};

    if (free_oxygen(e) <= 0.0 && atoms_of(e, BC_C) + atoms_of(e, BC_H) + atoms_of(e, BC_S) > 0.0) {
        equilibrium_start_evenly(e);
        return;
    }
    burn_completely(e, moles);
    if (!e->fixed_t)
        e->t_k = estimate_temperature(e, moles);
    dissociate(e, moles);
    for (size_t j = 0; j < e->species; j++)
        equilibrium_set_moles(e, j, fmax(LN_UNKNOWN, log(moles[e->product[j]])));
    set_total(e);
    equilibrium_choose_components(e);
    equilibrium_evaluate(e);
    set_minor_species(e);
}

void equilibrium_start_evenly(equilibrium *e)
{
    if (!e->fixed_t)
        e->t_k = EVEN_T_K;
    for (size_t j = 0; j < e->species; j++)
        equilibrium_set_moles(e, j, log(EVEN_MOLES / (double)e->species));
    set_total(e);
    equilibrium_choose_components(e);
}
