/* SPDX-License-Identifier: MIT */
/* covariance.h - covariances of mole fractions, and sources of scatter that have them. */
#ifndef COVARIANCE_H
#define COVARIANCE_H

#include "bluecone/gas.h"

typedef struct {
    double c[BC_SPECIES_CAPACITY][BC_SPECIES_CAPACITY];
} covariance;

void covariance_clear(covariance *v);

/* Adds an independent source: C += dx dx'. */
void covariance_add(covariance *v, const double dx[]);

/* Sources with the covariances C, at most as many as there are species; *v is used up. */
void covariance_factor(covariance *v, bc_spread *spread);

#endif
