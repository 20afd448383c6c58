/* SPDX-License-Identifier: MIT */
/* limits_word.c - the words that limits are on, and the units of their bounds. */
#include "supply/limits_internal.h"

#include "base/error_internal.h"
#include "base/text.h"
#include "bluecone/quantity.h"
#include "gas/species_index.h"

#include <math.h>
#include <stdio.h>
#include <string.h>

#define METERING_TOLD 0.01 /* K: metering temperatures nearer than that are the same */

/* Groups with a name of their own; c2+ to c9+ are found by their form. */
static const char *const GROUPS[] = {"inerts", "total-sulphur", "c2+", "c3+", "c4+", "c5+", "c6+"};

static bool is_hydrocarbon(size_t i, int carbon)
{
    return bc_species_atoms(i, BC_C) >= carbon && bc_species_atoms(i, BC_H) > 0 && bc_species_atoms(i, BC_O) == 0
           && bc_species_atoms(i, BC_N) == 0 && bc_species_atoms(i, BC_S) == 0;
}

/* Gases that neither burn nor feed a flame: noble gases, nitrogen, carbon dioxide. */
static bool is_inert(size_t i)
{
    static const size_t INERT[] = {SPECIES_nitrogen, SPECIES_carbon_dioxide, SPECIES_helium, SPECIES_neon, SPECIES_argon};

    for (size_t k = 0; k < BC_COUNT(INERT); k++)
        if (INERT[k] == i)
            return true;
    return false;
}

static double member_weight(const char *folded, size_t i)
{
    if (folded[0] == 'c')
        return is_hydrocarbon(i, folded[1] - '0') ? 1.0 : 0.0;
    if (folded[0] == 'i')
        return is_inert(i) ? 1.0 : 0.0;
    return (double)bc_species_atoms(i, BC_S);
}

static bool group_members(const char *word, double weight[])
{
    char folded[BC_WORD_MAX];

    if (!bc_text_fold(folded, sizeof folded, word))
        return false;
    const bool by_carbon = folded[0] == 'c' && folded[1] >= '2' && folded[1] <= '9' && strcmp(folded + 2, "+") == 0;

    if (!by_carbon && strcmp(folded, "inerts") != 0 && strcmp(folded, "totalsulphur") != 0 && strcmp(folded, "totalsulfur") != 0)
        return false;
    for (size_t i = 0; i < BC_SPECIES_CAPACITY; i++)
        weight[i] = i < SPECIES_COUNT ? member_weight(folded, i) : 0.0;
    return true;
}

bool limit_members(const char *word, double weight[BC_SPECIES_CAPACITY])
{
    size_t species = 0;

    if (group_members(word, weight))
        return true;
    if (bc_species_find(word, &species, NULL) != BC_OK)
        return false;
    memset(weight, 0, BC_SPECIES_CAPACITY * sizeof *weight);
    weight[species] = 1.0;
    return true;
}

static const char *nearest(const char *word)
{
    const char *best = bc_quantity_at(0)->id;

    for (size_t i = 0; i < bc_quantity_count(); i++)
        if (bc_text_unlikeness(word, bc_quantity_at(i)->id) < bc_text_unlikeness(word, best))
            best = bc_quantity_at(i)->id;
    for (size_t i = 0; i < bc_species_count(); i++)
        if (bc_text_unlikeness(word, bc_species_id(i)) < bc_text_unlikeness(word, best))
            best = bc_species_id(i);
    for (size_t i = 0; i < BC_COUNT(GROUPS); i++)
        if (bc_text_unlikeness(word, GROUPS[i]) < bc_text_unlikeness(word, best))
            best = GROUPS[i];
    return best;
}

bc_status limit_find(const char *word, bc_limit *limit, bc_error *err)
{
    size_t species = 0;

    limit->kind = BC_LIMIT_FRACTION;
    (void)snprintf(limit->id, sizeof limit->id, "%s", word);
    if (bc_quantity_find(word, &limit->quantity, NULL) == BC_OK) {
        limit->kind = BC_LIMIT_QUANTITY;
        (void)snprintf(limit->id, sizeof limit->id, "%s", bc_quantity_at(limit->quantity)->id);
        return BC_OK;
    }
    if (!limit_members(word, limit->weight))
        return bc_fail(err, BC_ERR_INPUT, "'%s' is no quantity, component or group; the nearest known word is '%s'", word, nearest(word));
    if (bc_species_find(word, &species, NULL) == BC_OK)
        (void)snprintf(limit->id, sizeof limit->id, "%s", bc_species_id(species));
    return BC_OK;
}

/* "mol %", "mol-%" and "%" are one unit of a fraction. */
static const char *plain_unit(const char *unit)
{
    char folded[BC_WORD_MAX];

    if (bc_text_fold(folded, sizeof folded, unit) && (strcmp(folded, "mol%") == 0 || strcmp(folded, "mole%") == 0))
        return "%";
    return unit;
}

/* Moles that count become kilograms that count; of sulphur in general its own atoms weigh. */
static void weigh(bc_limit *limit)
{
    const bool sulphur = bc_text_same(limit->id, "total-sulphur") || bc_text_same(limit->id, "total-sulfur");

    for (size_t i = 0; i < SPECIES_COUNT; i++)
        limit->weight[i] *= sulphur ? bc_element_mass_g_per_mol(BC_S) * 1e-3 : bc_species_molar_mass_kg_per_mol(i);
    limit->kind = BC_LIMIT_CONCENTRATION;
}

static bc_status check_metering(const bc_limit *limit, const bc_state *state, bc_error *err)
{
    if (!limit->shown.has_metering || fabs(limit->shown.metering_c - state->metering_c) < METERING_TOLD)
        return BC_OK;
    return bc_fail(err, BC_ERR_INPUT, "the unit %s counts gas metered at %.4g C, but the state of this limit meters at %.6g C; correct 'at' or write m3",
                   limit->unit, limit->shown.metering_c, state->metering_c);
}

bc_status limit_take_unit(const char *unit, const bc_state *state, bc_limit *limit, bc_error *err)
{
    const char *own = limit->kind == BC_LIMIT_QUANTITY ? bc_quantity_at(limit->quantity)->unit : "1";
    const char *fallback = limit->kind == BC_LIMIT_QUANTITY ? own : "mol %";
    bc_unit concentration;
    bc_status status = BC_OK;

    (void)snprintf(limit->unit, sizeof limit->unit, "%s", unit[0] != '\0' ? unit : fallback);
    status = bc_unit_parse(plain_unit(limit->unit), &limit->shown, err);
    if (status == BC_OK)
        status = bc_unit_parse("kg/m3", &concentration, err);
    if (status == BC_OK && limit->kind == BC_LIMIT_FRACTION && bc_unit_matches(&limit->shown, &concentration)) {
        weigh(limit);
        own = "kg/m3";
    }
    if (status == BC_OK)
        status = bc_unit_parse(own, &limit->own, err);
    if (status != BC_OK)
        return status;
    if (!bc_unit_matches(&limit->own, &limit->shown))
        return bc_fail(err, BC_ERR_INPUT, "the unit %s does not fit '%s'; write one that converts to %s", limit->unit, limit->id,
                       limit->kind == BC_LIMIT_FRACTION ? "mol % or mg/m3" : own);
    return check_metering(limit, state, err);
}
