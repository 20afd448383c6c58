/* SPDX-License-Identifier: MIT */
/* component.c - what the word of a component stands for: a species, a cut, air. */
#include "base/error_internal.h"
#include "base/text.h"
#include "gas/composition_internal.h"

#include <stdio.h>
#include <string.h>

static bc_status find_cut(const char *word, double parts[], char remark[], bc_error *err)
{
    double found[BC_SPECIES_CAPACITY];
    char split[160];

    if (!cut_default(word, found))
        return bc_fail(err, BC_ERR_INPUT, "the cut '%s' has no default split; state one in a section [cut %s]", word, word);
    memcpy(parts, found, sizeof found);
    cut_describe(parts, split, sizeof split);
    if (remark)
        (void)snprintf(remark, BC_REMARK_BYTES, "%s has no split of its own: taken as %s (mole, common practice).", word, split);
    return BC_OK;
}

bc_status bc_composition_component(const char *word, double parts[], char remark[], bc_error *err)
{
    size_t species = 0;
    int carbon = 0;

    if (remark)
        remark[0] = '\0';
    if (cut_word(word, &carbon))
        return find_cut(word, parts, remark, err);
    if (bc_text_same(word, "air")) {
        const bc_gas air = bc_gas_air();

        memcpy(parts, air.x, sizeof air.x);
        return BC_OK;
    }
    const bc_status status = bc_species_find(word, &species, err);

    if (status != BC_OK)
        return status;
    memset(parts, 0, BC_SPECIES_CAPACITY * sizeof *parts);
    parts[species] = 1.0;
    return BC_OK;
}
