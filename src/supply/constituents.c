/* SPDX-License-Identifier: MIT */
/* constituents.c - sorts species into the groups of the interchangeability tables. */
#include "supply/constituents.h"

#include "flame/oxidant_internal.h"
#include "gas/species_index.h"

#include <string.h>

static double atoms(size_t species, bc_element element)
{
    return (double)bc_species_atoms(species, element);
}

/* mol O2 per mol of a species */
static double oxygen_demand(size_t species)
{
    double count[BC_ELEMENTS];

    for (size_t e = 0; e < BC_ELEMENTS; e++)
        count[e] = atoms(species, (bc_element)e);
    return oxidant_oxygen_need(count);
}

static bool is_hydrocarbon(size_t species)
{
    static const bc_element OTHERS[] = {BC_N, BC_O, BC_S, BC_HE, BC_NE, BC_AR};

    for (size_t i = 0; i < sizeof OTHERS / sizeof *OTHERS; i++)
        if (bc_species_atoms(species, OTHERS[i]) > 0)
            return false;
    return bc_species_atoms(species, BC_C) > 0;
}

static bool is_alkane(size_t species)
{
    return is_hydrocarbon(species) && bc_species_atoms(species, BC_H) == 2 * bc_species_atoms(species, BC_C) + 2;
}

static part hydrocarbon_part(size_t species)
{
    static const part ALKANES[] = {PART_METHANE, PART_ETHANE, PART_PROPANE, PART_BUTANES};
    static const part ALKENES[] = {PART_ETHENE, PART_PROPENE, PART_BUTENES};
    const int carbon = bc_species_atoms(species, BC_C);
    const int hydrogen = bc_species_atoms(species, BC_H);

    if (is_alkane(species))
        return carbon <= 4 ? ALKANES[carbon - 1] : PART_ALKANES;
    if (hydrogen == 2 * carbon && carbon <= 4)
        return ALKENES[carbon - 2];
    return species == SPECIES_benzene ? PART_BENZENE : PART_HYDROCARBONS;
}

static part part_of(size_t species)
{
    switch (species) {
    case SPECIES_hydrogen:
        return PART_HYDROGEN;
    case SPECIES_carbon_monoxide:
        return PART_CARBON_MONOXIDE;
    case SPECIES_carbon_dioxide:
        return PART_CARBON_DIOXIDE;
    case SPECIES_nitrogen:
    case SPECIES_argon:
        return PART_NITROGEN;
    case SPECIES_oxygen:
        return PART_OXYGEN;
    default:
        if (is_hydrocarbon(species))
            return hydrocarbon_part(species);
        return oxygen_demand(species) > 0.0 ? PART_FUELS : PART_INERTS;
    }
}

static void add(constituents *c, size_t species, double x)
{
    const part p = part_of(species);
    const double demand = oxygen_demand(species);

    c->x[p] += x;
    if (demand > 0.0)
        c->oxygen[p] += x * demand;
    c->hydrogen_atoms += x * atoms(species, BC_H);
    if (!is_hydrocarbon(species))
        return;
    c->hydrocarbons += x;
    c->hydrocarbon_c += x * atoms(species, BC_C);
    c->hydrocarbon_h += x * atoms(species, BC_H);
    if (is_alkane(species))
        c->alkanes += x;
}

constituents constituents_of(const bc_gas *gas)
{
    constituents c;
    const double dry = 1.0 - gas->x[SPECIES_water];

    memset(&c, 0, sizeof c);
    c.water = gas->x[SPECIES_water];
    if (!(dry > 0.0))
        return c;
    for (size_t i = 0; i < SPECIES_COUNT; i++)
        if (gas->x[i] > 0.0 && i != SPECIES_water)
            add(&c, i, gas->x[i] / dry);
    return c;
}

double rich_part(const constituents *c)
{
    return c->x[PART_HYDROGEN] + c->x[PART_CARBON_MONOXIDE];
}

bool is_lpg_air(const constituents *c)
{
    const double lpg = c->x[PART_PROPANE] + c->x[PART_BUTANES] + c->x[PART_PROPENE] + c->x[PART_BUTENES];

    return c->x[PART_OXYGEN] > 0.01 && lpg > c->hydrocarbons / 2.0;
}
