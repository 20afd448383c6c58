/* SPDX-License-Identifier: MIT */
/* constituents.c - sorts species into the groups of the interchangeability tables. */
#include "supply/constituents.h"

#include "gas/species_index.h"

#include <assert.h>
#include <string.h>

/* What sorting a species takes, worked out from its atoms when this is compiled. */
typedef struct {
    part group;
    bool hydrocarbon, alkane; /* CnHm, CnH2n+2 */
    double carbon, hydrogen;  /* atoms */
    double oxygen;            /* mol O2 that a mole burns with, a = C + H/4 + S - O/2; below 0: what it gives */
} species_row;

#define HYDROCARBON(c, n, o, s, noble) ((c) > 0 && (n) + (o) + (s) + (noble) == 0)
#define ALKANE(c, h) ((h) == 2 * (c) + 2)
#define OXYGEN(c, h, o, s) ((c) + (h) / 4.0 + (s) - (o) / 2.0)

static_assert(PART_BUTANES == PART_METHANE + 3 && PART_ALKANES == PART_METHANE + 4, "alkanes stand in the order of their carbon atoms");
static_assert(PART_BUTENES == PART_ETHENE + 2, "alkenes stand in the order of their carbon atoms");

#define HYDROCARBON_PART(i, c, h)                                          \
    (ALKANE(c, h)                 ? PART_METHANE + ((c) < 5 ? (c) : 5) - 1 \
     : (h) == 2 * (c) && (c) <= 4 ? PART_ETHENE + (c) - 2                  \
     : (i) == SPECIES_benzene     ? PART_BENZENE                           \
                                  : PART_HYDROCARBONS)

#define PART_OF(i, c, h, n, o, s, noble)                                           \
    ((i) == SPECIES_hydrogen                           ? PART_HYDROGEN             \
     : (i) == SPECIES_carbon_monoxide                  ? PART_CARBON_MONOXIDE      \
     : (i) == SPECIES_carbon_dioxide                   ? PART_CARBON_DIOXIDE       \
     : (i) == SPECIES_nitrogen || (i) == SPECIES_argon ? PART_NITROGEN             \
     : (i) == SPECIES_oxygen                           ? PART_OXYGEN               \
     : HYDROCARBON(c, n, o, s, noble)                  ? HYDROCARBON_PART(i, c, h) \
     : OXYGEN(c, h, o, s) > 0.0                        ? PART_FUELS                \
                                                       : PART_INERTS)

static const species_row ROWS[SPECIES_COUNT] = {
#define SPECIES(symbol, id, name, formula, c, h, n, o, s, he, ne, ar, cas, source)                          \
    {(part)(PART_OF(SPECIES_##symbol, c, h, n, o, s, he + ne + ar)), HYDROCARBON(c, n, o, s, he + ne + ar), \
     HYDROCARBON(c, n, o, s, he + ne + ar) && ALKANE(c, h), c, h, OXYGEN(c, h, o, s)},
#include "data/species.def"
};

static void add(constituents *c, const species_row *row, double x)
{
    c->x[row->group] += x;
    if (row->oxygen > 0.0)
        c->oxygen[row->group] += x * row->oxygen;
    c->hydrogen_atoms += x * row->hydrogen;
    if (!row->hydrocarbon)
        return;
    c->hydrocarbons += x;
    c->hydrocarbon_c += x * row->carbon;
    c->hydrocarbon_h += x * row->hydrogen;
    if (row->alkane)
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
            add(&c, &ROWS[i], gas->x[i] / dry);
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
