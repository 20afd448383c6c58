/* SPDX-License-Identifier: MIT */
/* summation.c - summation factors of both editions of ISO 6976 and what stands in where they are silent. */
#include "gas/summation.h"

#include "base/compiler.h"
#include "gas/species_index.h"

#include <math.h>
#include <stdbool.h>

#define P0_PA 101325.0
#define T0_K 273.15
#define STATE_60F_C ((60.0 - 32.0) / 1.8)
#define SAME_TEMPERATURE_C 0.01 /* 15.55 C and 60 F = 15.5556 C are one column of the standard */

/* A factor at 0, 15, 60 F and 20 C; source NULL where the table has no row. */
typedef struct {
    double at_0, at_15, at_60f, at_20, u;
    const char *source;
} factor_row;

static const factor_row FACTORS_2016[SPECIES_COUNT] = {
#define ISO2016_SUM(symbol, s0, s15, s60f, s20, u, source) [SPECIES_##symbol] = {s0, s15, s60f, s20, u, source},
#include "data/iso6976_2016_sum.def"
};

/* The 1995 edition has no 60 F column (NAN: interpolate) and no uncertainty; see fallback_u(). */
static const factor_row FACTORS_1995[SPECIES_COUNT] = {
#define ISO1995(symbol, m, h0, h15, h20, h25, z0, z15, z20, b0, b15, b20, source) \
    [SPECIES_##symbol] = {b0, b15, -1.0, b20, 0.0, source},
#include "data/iso6976_1995.def"
};

static const factor_row Z_1995[SPECIES_COUNT] = {
#define ISO1995(symbol, m, h0, h15, h20, h25, z0, z15, z20, b0, b15, b20, source) \
    [SPECIES_##symbol] = {z0, z15, -1.0, z20, 0.0, source},
#include "data/iso6976_1995.def"
};

typedef struct {
    double tc_k, pc_pa, acentric;
    const char *source;
} critical_row;

static const critical_row CRITICALS[SPECIES_COUNT] = {
#define CRITICAL(symbol, tc, pc, acentric, source) [SPECIES_##symbol] = {tc, pc, acentric, source},
#include "data/critical.def"
};

static bool same(double a, double b)
{
    return fabs(a - b) < SAME_TEMPERATURE_C;
}

/* The column where there is one, else the parabola through 0, 15 and 20 C (Lagrange). */
static double at_temperature(const factor_row *row, double t_c)
{
    if (same(t_c, 0.0))
        return row->at_0;
    if (same(t_c, 15.0))
        return row->at_15;
    if (same(t_c, STATE_60F_C) && row->at_60f > -1.0)
        return row->at_60f;
    if (same(t_c, 20.0))
        return row->at_20;
    return row->at_0 * (t_c - 15.0) * (t_c - 20.0) / (15.0 * 20.0)
           - row->at_15 * t_c * (t_c - 20.0) / (15.0 * 5.0) + row->at_20 * t_c * (t_c - 15.0) / (20.0 * 5.0);
}

/* Atoms heavier than hydrogen: how large a molecule is. */
static int heavy_atoms(size_t species)
{
    int atoms = 0;

    for (size_t k = 0; k < BC_ELEMENTS; k++)
        if (k != BC_H)
            atoms += bc_species_atoms(species, (bc_element)k);
    return atoms;
}

/* Where both editions know a factor they differ at 15 C by up to 0.022 for small molecules (water) and up to
 * 0.05 for larger ones (compared here over the two tables): taken as the standard uncertainty. */
static double fallback_u(size_t species)
{
    return heavy_atoms(species) <= 4 ? 0.025 : 0.05;
}

/* Second virial coefficient of a nonpolar gas, m3/mol. Tsonopoulos, AIChE J. 20 (1974) 263:
 * B pc/(R Tc) = f0(Tr) + w f1(Tr). */
static double second_virial_m3_per_mol(const critical_row *c, double t_k)
{
    const double tr = t_k / c->tc_k;
    const double tr3 = tr * tr * tr;
    const double tr8 = tr3 * tr3 * tr * tr;
    const double f0 = 0.1445 - 0.330 / tr - 0.1385 / (tr * tr) - 0.0121 / tr3 - 0.000607 / tr8;
    const double f1 = 0.0637 + 0.331 / (tr * tr) - 0.423 / tr3 - 0.008 / tr8;

    return 8.3144621 * c->tc_k / c->pc_pa * (f0 + c->acentric * f1);
}

/* Z = 1 + B p0/(R T) and Z = 1 - s^2 give s. The virial series means nothing once s nears 1 (a liquid):
 * traces of such a species count with s = 1. */
static double virial_factor(size_t species, double t_c)
{
    const double t_k = t_c + T0_K;
    const double s2 = -second_virial_m3_per_mol(&CRITICALS[species], t_k) * P0_PA / (8.3144621 * t_k);

    return s2 <= 0.0 ? 0.0 : s2 < 1.0 ? sqrt(s2) : 1.0;
}

/* Longer n-alkanes: the factor of n-decane grown with the number of carbon atoms (derived: from C6 to
 * C10 the factors of the 2016 edition grow a little faster than in proportion). */
static double homologous_factor(size_t species, double t_c)
{
    const double decane = at_temperature(&FACTORS_2016[SPECIES_n_decane], t_c);

    return decane * bc_species_atoms(species, BC_C) / 10.0;
}

static bc_summation estimate(size_t species, double t_c)
{
    const double s = bc_species_atoms(species, BC_C) > 10 ? homologous_factor(species, t_c) : virial_factor(species, t_c);

    return (bc_summation){s, 0.25 * s, BC_ORIGIN_ESTIMATE}; /* a quarter: between the two published forms for heavy molecules */
}

bc_summation bc_summation_factor(size_t species, int edition, double t_c)
{
    const factor_row *new_row = &FACTORS_2016[species];
    const factor_row *old_row = &FACTORS_1995[species];
    const bool old_first = edition == 1995;

    if (old_first && old_row->source)
        return (bc_summation){at_temperature(old_row, t_c), fallback_u(species), BC_ORIGIN_EDITION};
    if (new_row->source)
        return (bc_summation){at_temperature(new_row, t_c), new_row->u, old_first ? BC_ORIGIN_OTHER_EDITION : BC_ORIGIN_EDITION};
    if (old_row->source)
        return (bc_summation){at_temperature(old_row, t_c), fallback_u(species), BC_ORIGIN_OTHER_EDITION};
    return estimate(species, t_c);
}

double bc_species_z(size_t species, double t_c)
{
    const bc_summation factor = bc_summation_factor(species, 2016, t_c);

    if (factor.s < 0.0 && Z_1995[species].source)
        return at_temperature(&Z_1995[species], t_c);
    return 1.0 - factor.s * factor.s;
}

const char *bc_summation_source(size_t species, int edition)
{
    if (edition == 1995 && FACTORS_1995[species].source)
        return FACTORS_1995[species].source;
    if (FACTORS_2016[species].source)
        return FACTORS_2016[species].source;
    if (FACTORS_1995[species].source)
        return FACTORS_1995[species].source;
    return bc_species_atoms(species, BC_C) > 10 ? "derived: n-decane's factor in proportion to the carbon number"
                                                : "derived: Tsonopoulos, AIChE J. 20 (1974) 263, from critical constants";
}
