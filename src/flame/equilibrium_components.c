/* SPDX-License-Identifier: MIT */
/* equilibrium_components.c - the species of a problem, written through the most abundant of them. */
#include "flame/equilibrium_internal.h"

#include "bluecone/thermo.h"

#include <math.h>

#define LN_MOLES_MIN (-690.0) /* exp() of it is a normal double: 1e-300 */

/* Exact elimination leaves multiples of 1/60 here; anything smaller than this is rounding. */
#define COEFFICIENT_MIN 1.0e-9

/* A component this many times rarer than a species made of it, or than a component chosen after it, no longer
 * keeps the balances accurate. */
#define POOR_RATIO  100.0
#define ORDER_RATIO 2.0

const size_t PRODUCT_OF_INERT[BC_ELEMENTS - REACTING] = {PRODUCT_helium, PRODUCT_neon, PRODUCT_argon};

void equilibrium_set_moles(equilibrium *e, size_t species, double ln_moles)
{
    e->ln_moles[species] = ln_moles;
    e->moles[species] = exp(fmax(ln_moles, LN_MOLES_MIN));
}

static bool elements_are_present(const equilibrium *e, const signed char atoms[BC_ELEMENTS])
{
    for (int k = 0; k < BC_ELEMENTS; k++)
        if (atoms[k] > 0 && e->elements[k] <= 0.0)
            return false;
    return true;
}

void equilibrium_list_species(equilibrium *e)
{
    e->species = 0;
    e->factors.t_k = 0.0;
    for (size_t i = 0; i < PRODUCT_COUNT; i++) {
        const signed char *atoms = product_atoms(bc_product_thermo(i));

        if (elements_are_present(e, atoms) && atoms[BC_HE] + atoms[BC_NE] + atoms[BC_AR] == 0)
            e->product[e->species++] = i;
    }
}

/* The rows before any elimination: atoms of the elements present, the scarcest element first. */
static void start_from_elements(equilibrium *e)
{
    e->components = 0;
    for (int k = 0; k < REACTING; k++) {
        size_t row = e->components;

        if (e->elements[k] <= 0.0)
            continue;
        for (; row > 0 && e->amount[row - 1] > e->elements[k]; row--) {
            e->amount[row] = e->amount[row - 1];
            e->component[row] = e->component[row - 1];
        }
        e->amount[row] = e->elements[k];
        e->component[row] = (size_t)k; /* the element, until a species takes its place */
        e->components++;
    }
    for (size_t j = 0; j < e->species; j++)
        for (size_t row = 0; row < e->components; row++)
            e->v[j][row] = product_atoms(bc_product_thermo(e->product[j]))[e->component[row]];
}

/* The most abundant species that holds something of the rows that have no component yet. */
static size_t most_abundant(const equilibrium *e, const bool done[REACTING])
{
    size_t best = e->species;

    for (size_t j = 0; j < e->species; j++)
        if (best == e->species || e->moles[j] > e->moles[best])
            for (size_t i = 0; i < e->components; i++)
                if (!done[i] && fabs(e->v[j][i]) > COEFFICIENT_MIN)
                    best = j;
    return best;
}

/* Gauss-Jordan: one column through the factors of the pivot species. */
static void eliminate_column(double column[], const double factor[], size_t row, size_t rows)
{
    const double t = column[row] / factor[row];

    for (size_t i = 0; i < rows; i++)
        if (i != row) {
            column[i] -= factor[i] * t;
            if (fabs(column[i]) < COEFFICIENT_MIN * COEFFICIENT_MIN)
                column[i] = 0.0;
        }
    column[row] = t;
}

/* The component takes the scarcest element it holds, so that the balance of a scarce element stays free of
 * differences of large amounts. Returns its row. */
static size_t make_component(equilibrium *e, size_t species, const bool done[REACTING])
{
    double factor[REACTING] = {0.0};
    size_t row = 0;

    while (done[row] || fabs(e->v[species][row]) <= COEFFICIENT_MIN)
        row++;
    for (size_t i = 0; i < e->components; i++)
        factor[i] = e->v[species][i];
    for (size_t j = 0; j < e->species; j++)
        if (e->v[j][row] != 0.0)
            eliminate_column(e->v[j], factor, row, e->components);
    if (fabs(e->amount[row]) < AMOUNT_MIN)
        e->amount[row] = 0.0; /* now, before its rounding reaches the balance of a scarce element */
    eliminate_column(e->amount, factor, row, e->components);
    e->component[row] = species;
    return row;
}

/* Takes out the species that a balance of zero excludes. */
static void remove_species(equilibrium *e, size_t row)
{
    size_t kept = 0;

    for (size_t j = 0; j < e->species; j++)
        if (e->v[j][row] <= 0.0) {
            e->product[kept] = e->product[j];
            e->ln_moles[kept] = e->ln_moles[j];
            e->moles[kept++] = e->moles[j];
        }
    e->species = kept;
    e->factors.t_k = 0.0; /* their functions are due again */
}

/* Whether a balance excludes its species: a sum of zero without negative terms. */
static bool row_excludes(const equilibrium *e, size_t row)
{
    if (e->amount[row] > 0.0)
        return false;
    for (size_t j = 0; j < e->species; j++)
        if (e->v[j][row] < 0.0)
            return false;
    return true;
}

/* Rows left without a component depend on the others and say nothing more. */
static void drop_rows(equilibrium *e, const bool done[REACTING])
{
    size_t kept = 0;

    for (size_t i = 0; i < e->components; i++) {
        if (!done[i])
            continue;
        for (size_t j = 0; j < e->species; j++)
            e->v[j][kept] = e->v[j][i];
        e->component[kept] = e->component[i];
        e->amount[kept++] = fabs(e->amount[i]) < AMOUNT_MIN ? 0.0 : e->amount[i];
    }
    e->components = kept;
}

/* One elimination. False: species were taken out, another elimination is due. */
static bool eliminate(equilibrium *e)
{
    bool done[REACTING] = {false};

    start_from_elements(e);
    for (size_t found = 0; found < e->components; found++) {
        const size_t species = most_abundant(e, done);

        if (species == e->species)
            break;
        e->choice[found] = species;
        done[make_component(e, species, done)] = true;
    }
    drop_rows(e, done);
    for (size_t i = 0; i < e->components; i++)
        if (row_excludes(e, i)) {
            remove_species(e, i);
            return false;
        }
    return true;
}

void equilibrium_choose_components(equilibrium *e)
{
    while (!eliminate(e))
        continue;
    for (size_t j = 0; j < e->species; j++) {
        for (size_t i = e->components; i < REACTING; i++)
            e->v[j][i] = 0.0;
        e->v[j][LN_N] = 1.0;
    }
}

bool equilibrium_components_are_poor(const equilibrium *e)
{
    for (size_t i = 1; i < e->components; i++)
        if (e->moles[e->choice[i]] > ORDER_RATIO * e->moles[e->choice[i - 1]])
            return true;
    for (size_t j = 0; j < e->species; j++)
        for (size_t i = 0; i < e->components; i++)
            if (e->v[j][i] != 0.0 && e->moles[j] > POOR_RATIO * e->moles[e->component[i]])
                return true;
    return false;
}

void equilibrium_evaluate(equilibrium *e)
{
    polynomial_factors *f = &e->factors;
    const int range = f->range;

    polynomial_factors_at(e->t_k, f);
    if (!e->fixed_t && f->range != range && e->range_changes++ >= RANGE_CHANGES_MAX)
        f->range = range;
    for (size_t j = 0; j < e->species; j++) {
        const double *a = bc_thermo_coefficients(bc_product_thermo(e->product[j]), f->range);

        e->g[j] = polynomial_g_rt(a, f);
        e->cp[j] = polynomial_cp_r(a, f);
        e->v[j][LN_T] = polynomial_h_rt(a, f);
    }
    e->inert_h = e->inert_cp = 0.0;
    for (int k = REACTING; k < BC_ELEMENTS; k++)
        if (e->elements[k] > 0.0) {
            const double *a =
                bc_thermo_coefficients(bc_product_thermo(PRODUCT_OF_INERT[k - REACTING]), f->range);

            e->inert_h += e->elements[k] * polynomial_h_rt(a, f);
            e->inert_cp += e->elements[k] * polynomial_cp_r(a, f);
        }
}
