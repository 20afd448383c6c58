/* SPDX-License-Identifier: MIT */
/* constituents.h - a gas as the methods of interchangeability see it: dry, in the groups their tables list. */
#ifndef CONSTITUENTS_H
#define CONSTITUENTS_H

#include <stdbool.h>

#include "bluecone/gas.h"

/* Groups of species with one set of constants. */
typedef enum {
    PART_METHANE,
    PART_ETHANE,
    PART_PROPANE,
    PART_BUTANES,
    PART_ALKANES, /* C5 and up */
    PART_ETHENE,
    PART_PROPENE,
    PART_BUTENES,
    PART_BENZENE,
    PART_HYDROCARBONS, /* all others */
    PART_HYDROGEN,
    PART_CARBON_MONOXIDE,
    PART_FUELS, /* all others that burn: H2S, NH3 ... */
    PART_CARBON_DIOXIDE,
    PART_NITROGEN, /* argon counts as nitrogen: the "nitrogen" of an air analysis of the time */
    PART_INERTS,   /* all others that do not burn */
    PART_OXYGEN,
    PART_COUNT
} part;

/* A dry gas by groups; per mole of it. */
typedef struct {
    double x[PART_COUNT];            /* mole fractions, 1 in all */
    double oxygen[PART_COUNT];       /* mol O2 that a group burns with; 0 for what does not burn */
    double hydrocarbons;             /* mole fraction of all hydrocarbons */
    double alkanes;                  /* of those, the saturated chains CnH2n+2 */
    double hydrocarbon_c;            /* C atoms in hydrocarbons */
    double hydrocarbon_h;            /* H atoms in hydrocarbons */
    double hydrogen_atoms;           /* all H atoms */
    double water;                    /* mole fraction of the gas as it was, before drying */
} constituents;

/* More than this of what a method has no constant for puts a gas outside of it: 1 mol %. Our own line: below it
 * any sensible stand-in moves an index less than the spread of the published limits. */
#define UNLISTED_MAX 0.01

/* Water above this is steam, not the moisture of a gas (saturation at 29 C): 4 mol %. Our own line. */
#define WATER_MAX 0.04
#define WET_TEXT "more than 4 % water: the method is for dry gas"

/* Sorts a gas; one that is nothing but water comes back empty, with all figures but `water` zero. */
constituents constituents_of(const bc_gas *gas);

/* Mole fraction of hydrogen and carbon monoxide together. */
double rich_part(const constituents *c);

/* True for mixtures of air with LPG: more oxygen than 1 mol %, and most hydrocarbons are C3 and C4. */
bool is_lpg_air(const constituents *c);

#endif
