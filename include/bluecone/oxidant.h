/* SPDX-License-Identifier: MIT */
/* bluecone/oxidant.h - what a gas burns with: oxygen need, oxidants as gases, and the air factor.
 *
 * An oxidant is a gas like any other: take one from here, moisten it (bluecone/humidity.h), or read its
 * composition (turbine exhaust, recirculated flue gas). All that it brings counts: its water, its carbon
 * dioxide, its oxygen, and what of it burns. */
#ifndef BLUECONE_OXIDANT_H
#define BLUECONE_OXIDANT_H

#include "bluecone/gas.h"
#include "bluecone/status.h"

#ifdef __cplusplus
extern "C" {
#endif

#define BC_OXYGEN_PURITY_MIN 0.5 /* below it the oxidant is enriched air */

/* Dry air for combustion: O2 0.20946, N2 0.78084, rest 0.00970 as argon.
 * Source: ISO 6976:1995 (oxygen, value from memory), ISO 2533:1975 (nitrogen). EPA formulas take 0.209. */
BC_API bc_gas bc_oxidant_air(void);

/* Dry air mixed with pure oxygen.
 *
 *   x_oxygen   mole fraction of oxygen of the mixture, 0.20946..1
 *   oxidant    out: untouched on failure
 *
 * BC_ERR_RANGE outside of it. Source: a balance on bc_oxidant_air(). */
BC_API BC_MUST_USE bc_status bc_oxidant_enriched(double x_oxygen, bc_gas *oxidant, bc_error *err);

/* Oxygen of a purity; the rest is argon and nitrogen.
 *
 *   purity         mole fraction of oxygen, BC_OXYGEN_PURITY_MIN..1
 *   argon_of_rest  share of argon in the rest, 0..1: near 1 for cryogenic oxygen
 *   oxidant        out: untouched on failure
 *
 * BC_ERR_RANGE outside of it. */
BC_API BC_MUST_USE bc_status bc_oxidant_oxygen(double purity, double argon_of_rest, bc_gas *oxidant, bc_error *err);

/* Oxygen that a gas needs to burn completely to CO2, H2O, SO2 and N2, mol O2 per mol of gas:
 *
 *   a = C + H/4 + S - O/2   (atoms per molecule of gas)
 *
 * Oxygen of the gas itself counts, bound or free. Zero for inerts, negative for a gas that has oxygen to
 * give: -a is what an oxidant supplies. Source: the stoichiometric balance. */
BC_API double bc_oxygen_demand(const bc_gas *gas);

/* Whether a gas can be the fuel of a burner: BC_OK when it needs oxygen.
 *
 * BC_ERR_RANGE: nothing in it burns, or it holds all the oxygen that it needs, so that it may explode as it
 * is; the message says which. Source: bc_oxygen_demand(), heats of bluecone/formation.h. */
BC_API BC_MUST_USE bc_status bc_fuel_check(const bc_gas *gas, bc_error *err);

/* Stoichiometric need of a fuel. Negative figures: the fuel brings more oxygen than it needs. */
typedef struct {
    double oxygen_mol;  /* mol O2 per mol of fuel = m3/m3 of ideal gases */
    double oxidant_mol; /* mol oxidant per mol of fuel, A = a(fuel)/-a(oxidant) */
    double oxygen_kg;   /* kg O2 per kg of fuel */
    double oxidant_kg;  /* kg oxidant per kg of fuel */
} bc_demand;

/* The need of a fuel with an oxidant.
 *
 *   demand   out: untouched on failure
 *
 * BC_ERR_INPUT: the oxidant has no oxygen to give. Source: as bc_oxygen_demand(). */
BC_API BC_MUST_USE bc_status bc_oxidant_demand(const bc_gas *fuel, const bc_gas *oxidant, bc_demand *demand,
                                               bc_error *err);

/* The air factor (lambda: oxidant over its stoichiometric need) of an excess.
 *
 *   excess   fraction of the need, 0.2 for 20 %; above -1; negative is lack of oxidant
 *   lambda   out: 1 + excess; untouched on failure
 *
 * BC_ERR_RANGE: -1 or less, or not finite. */
BC_API BC_MUST_USE bc_status bc_lambda_from_excess(double excess, double *lambda, bc_error *err);

/* How an analyser samples a flue gas. */
typedef enum {
    BC_FLUE_DRY, /* behind a cooler: the usual extractive analyser */
    BC_FLUE_WET  /* in situ, such as a zirconia probe */
} bc_flue_basis;

/* The air factor from the oxygen of the flue gas, exact for any fuel and oxidant, complete combustion:
 *
 *   lambda = 1 + y V / (A (o - y v))
 *
 * y oxygen read; V stoichiometric flue gas, mol per mol of fuel, on the basis of the reading; A oxidant
 * need; o oxygen a mole of oxidant gives; v flue gas a mole of oxidant leaves on that basis. For dry air v = 1
 * and this is the textbook lambda = 1 + (V/A) y/(x - y). With CO or H2 in the flue gas, take half of them
 * from the reading first.
 *
 *   x_oxygen   mole fraction of oxygen read, from 0 to below o/v
 *   lambda     out: untouched on failure
 *
 * BC_ERR_RANGE: a reading that this oxidant cannot give, a fuel that needs no oxidant, or a dry reading
 * where the dry flue gas is nothing but oxygen. BC_ERR_INPUT: the oxidant has no oxygen to give. */
BC_API BC_MUST_USE bc_status bc_lambda_from_flue_oxygen(const bc_gas *fuel, const bc_gas *oxidant, double x_oxygen,
                                                        bc_flue_basis basis, double *lambda, bc_error *err);

#ifdef __cplusplus
}
#endif

#endif
