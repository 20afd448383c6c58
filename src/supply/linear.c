/* SPDX-License-Identifier: MIT */
/* linear.c - Gaussian elimination. */
#include "supply/linear.h"

#include <math.h>

#define SINGULAR 1e-14 /* pivot over the largest coefficient: below it nothing is left but rounding */

static void exchange(linear_system *s, size_t i, size_t k)
{
    for (size_t j = 0; j < s->n && i != k; j++) {
        const double kept = s->a[i][j];

        s->a[i][j] = s->a[k][j];
        s->a[k][j] = kept;
    }
    const double kept = s->b[i];

    s->b[i] = s->b[k];
    s->b[k] = kept;
}

static void eliminate(linear_system *s, size_t column)
{
    for (size_t i = column + 1; i < s->n; i++) {
        const double factor = s->a[i][column] / s->a[column][column];

        for (size_t j = column; j < s->n; j++)
            s->a[i][j] -= factor * s->a[column][j];
        s->b[i] -= factor * s->b[column];
    }
}

static double largest(const linear_system *s)
{
    double most = 0.0;

    for (size_t i = 0; i < s->n; i++)
        for (size_t j = 0; j < s->n; j++)
            most = fmax(most, fabs(s->a[i][j]));
    return most;
}

bool linear_solve(linear_system *s)
{
    const double least = SINGULAR * largest(s);

    for (size_t column = 0; column < s->n; column++) {
        size_t pivot = column;

        for (size_t i = column + 1; i < s->n; i++)
            if (fabs(s->a[i][column]) > fabs(s->a[pivot][column]))
                pivot = i;
        if (!(fabs(s->a[pivot][column]) > least))
            return false;
        exchange(s, column, pivot);
        eliminate(s, column);
    }
    for (size_t i = s->n; i-- > 0;) {
        for (size_t j = i + 1; j < s->n; j++)
            s->b[i] -= s->a[i][j] * s->b[j];
        s->b[i] /= s->a[i][i];
    }
    return true;
}
