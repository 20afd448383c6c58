/* SPDX-License-Identifier: MIT */
/* bluecone/flammability.h - limits of flammability and laminar burning velocity of a gas in air.
 *
 * Estimates by mixing rules, for a first judgement. No safety decision may rest on them alone: measure, and
 * read the standard in force. */
#ifndef BLUECONE_FLAMMABILITY_H
#define BLUECONE_FLAMMABILITY_H

#include <stdbool.h>
#include <stddef.h>

#include "bluecone/gas.h"
#include "bluecone/status.h"

#ifdef __cplusplus
extern "C" {
#endif

/* Le Chatelier's rule, 1/sum(share/figure), for limits and, after Di Sarli and Di Benedetto, burning velocities.
 *
 *   share, figure   `count` shares that add up to one, and the figures of the pure gases, above 0
 *
 * Source: Le Chatelier 1891; Coward and Jones, USBM Bulletin 503 (1952). */
BC_API double bc_le_chatelier(const double share[], const double figure[], size_t count);

/* What is known about a gas in air at 25 C and 1 atm. */
typedef enum {
    BC_NOT_FLAMMABLE,         /* nothing burns, the gas as it is is leaner than its lower limit by more than
                               * BC_LFL_ERROR, or ISO 10156 says so on confirmed constants */
    BC_FLAMMABLE,
    BC_FLAMMABILITY_UNDECIDED /* ISO 10156 might say no, but on constants that are not confirmed: take it for flammable */
} bc_flammability_verdict;

#define BC_FLAMMABILITY_COVERED_MIN 0.995 /* of the combustibles: 0.5 % of heavy ones more would move a limit by 2 %, half the error of the rule */
#define BC_FLAMMABILITY_OXYGEN_MAX 0.03   /* "a few per cent": with more, ISO 10156 does not apply */
#define BC_FLAMMABILITY_ODD_MAX 0.01      /* of the combustibles: less of a gas that breaks the rule moves a limit by about 1 % */
#define BC_LFL_ERROR 0.10 /* relative error of the lower limit, worst of six published mixtures; 0.04 is typical */
#define BC_UFL_ERROR 0.08 /* of the upper limit, which comes out too high */

typedef struct {
    bc_flammability_verdict verdict;
    double combustible;    /* mole fraction of the gas that burns */
    double covered;        /* share of it with a published limit */
    bool has_lfl, has_ufl; /* false: not flammable, or the first-order correction has left 100 % */
    double lfl, ufl;       /* mole fraction of the gas in its mixture with air */
    bool has_sum;          /* every combustible has a constant of ISO 10156 */
    double iso10156_sum;   /* sum of A'/T_c, above 1 is flammable; of those with a constant */
    bool inert_corrected;  /* the gas holds inerts: limits of its combustibles over their share, a first-order rule */
    bool with_oxygen;      /* oxygen over BC_FLAMMABILITY_OXYGEN_MAX: it may already be near an explosive mixture */
    bool outside_rule;     /* mixture with hydrogen sulfide, carbon disulfide or ethyne: Le Chatelier does not hold */
} bc_flammability;

/* Limits and verdict of a gas.
 *
 *   L = 1/sum(x_i/L_i)/combustible
 *   A'_i = 100 A_i/(sum A + sum K_k B_k)
 *
 * The first is Le Chatelier's over the combustibles, lower and upper alike, 25 C, 1 atm, upward; the second that of
 * ISO 10156, by which a gas is flammable when sum(A'_i/T_ci) > 1.
 *
 *   flammability   out: untouched on failure
 *
 * BC_ERR_RANGE: less than BC_FLAMMABILITY_COVERED_MIN of the combustibles has a published limit; names the gas
 * that is missing. Source: Le Chatelier with USBM Bulletin 627 limits; ISO 10156:2010. Lower limits err by 4 %
 * typically, BC_LFL_ERROR at worst, upper ones by BC_UFL_ERROR. */
BC_API BC_MUST_USE bc_status bc_flammability_of(const bc_gas *gas, bc_flammability *flammability, bc_error *err);

/* Limits of a pure gas in air, mole fractions, and their source; false when none is published here. */
BC_API bool bc_flammability_pure(size_t species, double *lfl, double *ufl, const char **source);

#define BC_BURNING_HYDROGEN_MAX 0.5     /* of the fuel: beyond it the rule overpredicts */
#define BC_BURNING_COVERED_MIN 0.95     /* of the combustibles: any hydrocarbon missing moves the velocity by less than 3 % */
#define BC_BURNING_DILUENT_MAX 0.20     /* mass fraction, range of the dilution term, value from memory */
#define BC_BURNING_VELOCITY_ERROR 0.05  /* relative error for methane with hydrogen up to BC_BURNING_HYDROGEN_MAX */

/* Laminar burning velocity of the stoichiometric mixture with air at 298 K and 1 atm. */
typedef struct {
    double value_m_per_s;
    double low_m_per_s, high_m_per_s; /* the same rule on the ends of the published bands of the pure gases */
    double hydrogen;                  /* share of hydrogen in the combustibles */
    double diluent;                   /* mass fraction of inerts of the gas in the mixture */
    bool in_range;                    /* hydrogen up to BC_BURNING_HYDROGEN_MAX, or a pure gas */
} bc_burning_velocity;

/* The velocity by mixing rule, 1/S = sum(x_i/S_i) at phi 1, x of the combustibles, times 1 - 2.1 f for a diluent
 * mass fraction f.
 *
 *   velocity   out: untouched on failure
 *
 * BC_ERR_RANGE: nothing that burns; less than BC_BURNING_COVERED_MIN of the combustibles has a figure (carbon
 * monoxide has none at phi 1 that depends on the gas alone: it follows moisture); f over BC_BURNING_DILUENT_MAX.
 * Source: Di Sarli and Di Benedetto, Int. J. Hydrogen Energy 32 (2007) 637; Metghalchi and Keck, Combust. Flame
 * 48 (1982) 191 (dilution). Never compare with flame speeds in tubes, which are several times larger. */
BC_API BC_MUST_USE bc_status bc_burning_velocity_of(const bc_gas *gas, bc_burning_velocity *velocity, bc_error *err);

#ifdef __cplusplus
}
#endif

#endif
