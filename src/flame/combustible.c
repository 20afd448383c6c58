/* SPDX-License-Identifier: MIT */
/* combustible.c - the combustible part of a gas. */
#include "flame/combustible_internal.h"

#include "gas/species_atoms.h"

/* Need of oxygen above zero, a = C + H/4 + S - O/2, in quarters of an atom so that it is exact. */
bool combustible_is(size_t species)
{
    const double *atoms = SPECIES_ATOMS[species];

    return 4.0 * atoms[BC_C] + atoms[BC_H] + 4.0 * atoms[BC_S] > 2.0 * atoms[BC_O];
}

combustible_part combustible_part_of(const bc_gas *gas, bool (*is_known)(size_t species))
{
    combustible_part part = {.total = 0.0};
    double known = 0.0;
    double most = 0.0;

    for (size_t i = 0; i < SPECIES_COUNT; i++) {
        const double x = gas->x[i];

        if (x == 0.0 || !combustible_is(i))
            continue;
        part.total += x;
        if (is_known(i)) {
            known += x;
            part.share[part.count] = x;
            part.species[part.count++] = i;
        } else if (x > most) {
            most = x;
            part.missing = i;
        }
    }
    part.covered = part.total > 0.0 ? known / part.total : 0.0;
    for (size_t i = 0; i < part.count; i++)
        part.share[i] /= known;
    return part;
}
