/* SPDX-License-Identifier: MIT */
/* covariance.c - sums of sources of scatter, and their factor by pivoted Cholesky elimination. */
#include "supply/covariance.h"

#include "gas/species_index.h"

#include <math.h>
#include <string.h>

/* Relative to the largest variance: what is left below it is rounding. */
#define RANK_TOLERANCE 1e-15

void covariance_clear(covariance *v)
{
    memset(v, 0, sizeof *v);
}

void covariance_add(covariance *v, const double dx[])
{
    for (size_t i = 0; i < SPECIES_COUNT; i++)
        for (size_t j = 0; j < SPECIES_COUNT && dx[i] != 0.0; j++)
            v->c[i][j] += dx[i] * dx[j];
}

static size_t largest(const covariance *v)
{
    size_t best = 0;

    for (size_t i = 1; i < SPECIES_COUNT; i++)
        if (v->c[i][i] > v->c[best][best])
            best = i;
    return best;
}

/* C = L L' column by column, the largest variance left first: column = C e_p/sqrt(C_pp), C -= column column'. */
void covariance_factor(covariance *v, bc_spread *spread)
{
    const size_t first = largest(v);
    const double least = RANK_TOLERANCE * v->c[first][first];

    spread->count = 0;
    for (size_t p = first; v->c[p][p] > least && spread->count < BC_SPECIES_CAPACITY; p = largest(v)) {
        double *column = spread->dx[spread->count++];
        const double root = sqrt(v->c[p][p]);

        memset(column, 0, sizeof spread->dx[0]);
        for (size_t i = 0; i < SPECIES_COUNT; i++)
            column[i] = v->c[i][p] / root;
        for (size_t i = 0; i < SPECIES_COUNT; i++)
            for (size_t j = 0; j < SPECIES_COUNT; j++)
                v->c[i][j] -= column[i] * column[j];
        v->c[p][p] = 0.0;
    }
}
