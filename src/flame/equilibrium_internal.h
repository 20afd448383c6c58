/* SPDX-License-Identifier: MIT */
/* equilibrium_internal.h - one equilibrium problem while it is being solved.
 *
 * Elements are scaled to one mole of reacting atoms. The reacting species are written through components: a
 * choice of as many abundant, independent species as there are elements, so that species j is made of
 * v[j][i] of component i. This is Gordon and McBride's system in another basis of the same space. It keeps
 * its accuracy where theirs is singular: in a stoichiometric flame at 300 K the balance of surplus oxygen (O2
 * - CO/2 - H2/2 ... = 0) holds traces of 1e-30 only, and no large terms that hide them. */
#ifndef EQUILIBRIUM_INTERNAL_H
#define EQUILIBRIUM_INTERNAL_H

#include <stdbool.h>

#include "flame/products_internal.h"

enum {
    REACTING = BC_HE, /* C H N O S combine; the elements from He on are inert atoms */
    LN_T = REACTING,  /* unknowns: potentials of the components, ln T, ln n */
    LN_N,
    UNKNOWNS
};

/* Where a search for a temperature starts: a usual flame. */
#define EVEN_T_K 2000.0

/* At 1000 K the ranges of the data differ by up to 0.16 J/mol. An iteration that hops between them more often
 * than this stays in one. */
#define RANGE_CHANGES_MAX 4

/* The product that an inert element is, from He on. */
extern const size_t PRODUCT_OF_INERT[BC_ELEMENTS - REACTING];

typedef struct {
    /* Given. */
    double elements[BC_ELEMENTS]; /* scaled */
    double h_r;                   /* wanted H/R, K, scaled */
    double ln_p;                  /* ln(p / 1 bar) */
    bool fixed_t;                 /* at temperature and pressure; h_r is not read */
    double inert_moles;

    /* The reacting species and their components. */
    size_t species, components;
    size_t product[PRODUCT_COUNT];     /* index in products.def */
    size_t component[REACTING];        /* index of species, by row */
    size_t choice[REACTING];           /* the same, in the order of choice: by abundance */
    double v[PRODUCT_COUNT][UNKNOWNS]; /* [j][i], i < components; [LN_T] H/RT, [LN_N] 1 */
    double amount[REACTING];           /* of each component, were it all made of components */
    const double *coefficients[PRODUCT_COUNT];

    /* The state. */
    double t_k, n, ln_n; /* temperature; all moles and their logarithm */
    double ln_moles[PRODUCT_COUNT], moles[PRODUCT_COUNT];
    double g[PRODUCT_COUNT], cp[PRODUCT_COUNT]; /* G/RT at 1 bar, Cp/R at t_k */
    double inert_h, inert_cp;                   /* sums of n H/RT, n Cp/R */
    polynomial_factors factors;                 /* at the temperature of g and cp; 0 K: they are due */
    int range_changes, iterations;
} equilibrium;

/* Lists the species that the elements present can form. */
void equilibrium_list_species(equilibrium *e);

/* Chooses the components, the most abundant species first, and takes out species that the element balance
 * excludes (CO2 from equal moles of C and O). */
void equilibrium_choose_components(equilibrium *e);

/* Whether species have outgrown components so much that equilibrium_choose_components() is due. */
bool equilibrium_components_are_poor(const equilibrium *e);

/* Thermodynamic functions at e->t_k; the iteration calls it when they are due. */
void equilibrium_evaluate(equilibrium *e);

/* Sets moles and their logarithm from the logarithm, with a floor far below anything that counts. */
void equilibrium_set_moles(equilibrium *e, size_t species, double ln_moles);

/* First states, components chosen: from complete combustion and its dissociation, or the same small amount
 * of everything. */
void equilibrium_estimate(equilibrium *e);
void equilibrium_start_evenly(equilibrium *e);

/* Newton's iteration from the state in e; false when it does not arrive within the steps. */
bool equilibrium_iterate(equilibrium *e, int steps);

#endif
