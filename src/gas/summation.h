/* SPDX-License-Identifier: MIT */
/* summation.h - the summation factor of a species: how far its gas is from ideal at 101.325 kPa. */
#ifndef SUMMATION_H
#define SUMMATION_H

#include "bluecone/species.h"

#include <stddef.h>

/* A summation factor s (1), its standard uncertainty and where it comes from. */
typedef struct {
    double s, u;
    bc_origin origin;
} bc_summation;

/* Summation factor at a metering temperature, Z = 1 - (p/101.325 kPa)(sum x s)^2.
 *
 *   edition   1995 or 2016: the table that is asked first; then the other edition; then an estimate
 *   t_c       0..25 C; between the columns of the table a parabola through 0, 15 and 20 C
 *
 * Sources: ISO 6976:2016, ISO 6976:1995; estimate: Tsonopoulos, AIChE J. 20 (1974) 263. */
bc_summation bc_summation_factor(size_t species, int edition, double t_c);

/* Compression factor of the pure real gas at 101.325 kPa and t_c, for turning volume fractions into
 * mole fractions. For hydrogen, helium and neon the 1995 edition lists Z itself. */
double bc_species_z(size_t species, double t_c);

/* The table's own words on a figure: the source of the row that bc_summation_factor() would use. */
const char *bc_summation_source(size_t species, int edition);

#endif
