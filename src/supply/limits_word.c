/* SPDX-License-Identifier: MIT */
/* limits_word.c - the words that limits are on, and the units of their bounds. */
#include "supply/limits_internal.h"

#include "base/error_internal.h"
#include "base/text.h"
#include "bluecone/index.h"
#include "bluecone/quantity.h"
#include "gas/species_index.h"
#include "supply/quantity_meant.h"

#include <math.h>
#include <stdio.h>
#include <string.h>

#define METERING_TOLD 0.01 /* K: metering temperatures nearer than that are the same */

static bool is_hydrocarbon(size_t i, int carbon)
{
    return bc_species_atoms(i, BC_C) >= carbon && bc_species_atoms(i, BC_H) > 0 && bc_species_atoms(i, BC_O) == 0
           && bc_species_atoms(i, BC_N) == 0 && bc_species_atoms(i, BC_S) == 0;
}

static bool is_alkane(size_t i, int carbon)
{
    return is_hydrocarbon(i, carbon) && bc_species_atoms(i, BC_C) == carbon && bc_species_atoms(i, BC_H) == 2 * carbon + 2;
}

/* Gases that neither burn nor feed a flame: noble gases, nitrogen, carbon dioxide. */
static double inerts(size_t i)
{
    static const size_t INERT[] = {SPECIES_nitrogen, SPECIES_carbon_dioxide, SPECIES_helium, SPECIES_neon, SPECIES_argon};

    for (size_t k = 0; k < BC_COUNT(INERT); k++)
        if (INERT[k] == i)
            return 1.0;
    return 0.0;
}

static double inerts_and_oxygen(size_t i)
{
    return i == SPECIES_oxygen ? 1.0 : inerts(i);
}

static double butanes(size_t i)
{
    return is_alkane(i, 4) ? 1.0 : 0.0;
}

static double pentanes(size_t i)
{
    return is_alkane(i, 5) ? 1.0 : 0.0;
}

static double sulphur(size_t i)
{
    return (double)bc_species_atoms(i, BC_S);
}

static double hydrogen_sulphide_and_cos(size_t i)
{
    return i == SPECIES_hydrogen_sulfide || i == SPECIES_carbonyl_sulfide ? 1.0 : 0.0;
}

static double mercaptans(size_t i)
{
    return i == SPECIES_methanethiol ? 1.0 : 0.0;
}

/* Groups with a name of their own: moles that a mole of a species counts. Sulphur ones weigh by their sulphur. */
static const struct {
    const char *word;
    double (*count)(size_t species);
} GROUPS[] = {
    {"inerts", inerts},           {"inerts+oxygen", inerts_and_oxygen}, {"butanes", butanes},
    {"pentanes", pentanes},       {"total-sulphur", sulphur},           {"total-sulfur", sulphur},
    {"h2s+cos", hydrogen_sulphide_and_cos}, {"mercaptan-sulphur", mercaptans},
};

/* "c4+": all hydrocarbons from that carbon number on. */
static int least_carbon(const char *word)
{
    char folded[BC_WORD_MAX];

    if (!bc_text_fold(folded, sizeof folded, word) || folded[0] != 'c' || folded[1] < '2' || folded[1] > '9' || strcmp(folded + 2, "+") != 0)
        return 0;
    return folded[1] - '0';
}

static bool group_members(const char *word, double weight[])
{
    const int carbon = least_carbon(word);
    size_t group = 0;

    while (group < BC_COUNT(GROUPS) && !bc_text_same(GROUPS[group].word, word))
        group++;
    if (carbon == 0 && group == BC_COUNT(GROUPS))
        return false;
    for (size_t i = 0; i < BC_SPECIES_CAPACITY; i++) {
        weight[i] = 0.0;
        if (i < SPECIES_COUNT && carbon > 0)
            weight[i] = is_hydrocarbon(i, carbon) ? 1.0 : 0.0;
        else if (i < SPECIES_COUNT)
            weight[i] = GROUPS[group].count(i);
    }
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
    for (size_t i = 0; i < bc_index_count(); i++)
        if (bc_text_unlikeness(word, bc_index_at(i)->id) < bc_text_unlikeness(word, best))
            best = bc_index_at(i)->id;
    for (size_t i = 0; i < bc_species_count(); i++)
        if (bc_text_unlikeness(word, bc_species_id(i)) < bc_text_unlikeness(word, best))
            best = bc_species_id(i);
    for (size_t i = 0; i < BC_COUNT(GROUPS); i++)
        if (bc_text_unlikeness(word, GROUPS[i].word) < bc_text_unlikeness(word, best))
            best = GROUPS[i].word;
    return best;
}

/* The quantity or index of a word; without one, no nearest word is looked for, which would cost more than all else. */
static bool find_figure(const char *word, bc_limit *limit)
{
    for (size_t i = 0; i < bc_quantity_count(); i++)
        if (bc_text_same(bc_quantity_at(i)->id, word)) {
            limit->kind = BC_LIMIT_QUANTITY;
            limit->quantity = i;
            (void)snprintf(limit->id, sizeof limit->id, "%s", bc_quantity_at(i)->id);
            return true;
        }
    for (size_t i = 0; i < bc_index_count(); i++)
        if (bc_text_same(bc_index_at(i)->id, word)) {
            limit->kind = BC_LIMIT_INDEX;
            limit->quantity = i;
            (void)snprintf(limit->id, sizeof limit->id, "%s", bc_index_at(i)->id);
            return true;
        }
    return false;
}

/* A word of the trade for another id, or for what a composition does not tell, must not be led astray. */
static bc_status refuse_word(const char *word, bc_error *err)
{
    const char *meant = quantity_meant(word);
    char folded[BC_WORD_MAX];
    char hint[BC_HINT_MAX];

    if (meant)
        return bc_fail(err, BC_ERR_INPUT, "'%s' is no quantity, component or group; write %s", word, meant);
    if (bc_text_fold(folded, sizeof folded, word) && strstr(folded, "dewpoint"))
        return bc_fail(err, BC_ERR_INPUT, "'%s' cannot be judged: no dew point of the gas itself is computed; leave the limit out and check it by other means",
                       word);
    bc_text_suggest(hint, sizeof hint, "the nearest known word is", word, nearest(word));
    return bc_fail(err, BC_ERR_INPUT, "'%s' is no quantity, component or group%s", word, hint);
}

bc_status limit_find(const char *word, bc_limit *limit, bc_error *err)
{
    size_t species = 0;

    if (find_figure(word, limit))
        return BC_OK;
    limit->kind = BC_LIMIT_FRACTION;
    (void)snprintf(limit->id, sizeof limit->id, "%s", word);
    if (group_members(word, limit->weight))
        return BC_OK;
    if (bc_species_find(word, &species, NULL) != BC_OK)
        return refuse_word(word, err);
    (void)limit_members(word, limit->weight);
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

/* Limits that texts state as sulphur, whatever molecule carries it. */
static bool is_of_sulphur(const char *word)
{
    static const char *const WORDS[] = {"total-sulphur", "total-sulfur", "h2s+cos", "mercaptan-sulphur"};

    for (size_t i = 0; i < BC_COUNT(WORDS); i++)
        if (bc_text_same(word, WORDS[i]))
            return true;
    return false;
}

/* Moles that count become kilograms that count; of sulphur its own atoms weigh. */
static void weigh(bc_limit *limit, bc_limit_kind kind)
{
    const bool of_sulphur = is_of_sulphur(limit->id);

    for (size_t i = 0; i < SPECIES_COUNT; i++)
        limit->weight[i] *= of_sulphur ? bc_element_mass_g_per_mol(BC_S) * 1e-3 : bc_species_molar_mass_kg_per_mol(i);
    limit->kind = kind;
}

bc_status limit_take_basis(const char *basis, bc_limit *limit, bc_error *err)
{
    if (limit->kind != BC_LIMIT_FRACTION)
        return bc_fail(err, BC_ERR_INPUT, "'%s' has its basis in its name; basis = mole, volume or mass belongs to components and groups", limit->id);
    if (bc_text_same(basis, "mass"))
        weigh(limit, BC_LIMIT_MASS_FRACTION);
    else if (bc_text_same(basis, "volume"))
        limit->kind = BC_LIMIT_VOLUME_FRACTION;
    else if (!bc_text_same(basis, "mole"))
        return bc_fail(err, BC_ERR_INPUT, "basis: a share is one of mole, volume or mass; write one of them");
    return BC_OK;
}

static bc_status check_metering(const bc_limit *limit, const bc_state *state, bc_error *err)
{
    if (!limit->shown.has_metering || fabs(limit->shown.metering_c - state->metering_c) < METERING_TOLD)
        return BC_OK;
    return bc_fail(err, BC_ERR_INPUT, "the unit %s counts gas metered at %.4g C, but the state of this limit meters at %.6g C; correct 'at' or write m3",
                   limit->unit, limit->shown.metering_c, state->metering_c);
}

/* The unit that the figure is computed in, and the one of bounds that state none. */
static const char *own_unit(const bc_limit *limit, const char **fallback)
{
    const char *own = "1";

    if (limit->kind == BC_LIMIT_QUANTITY)
        own = bc_quantity_at(limit->quantity)->unit;
    else if (limit->kind == BC_LIMIT_INDEX)
        own = bc_index_at(limit->quantity)->unit;
    *fallback = own;
    if (limit->kind == BC_LIMIT_FRACTION)
        *fallback = "mol %";
    else if (limit->kind == BC_LIMIT_MASS_FRACTION || limit->kind == BC_LIMIT_VOLUME_FRACTION)
        *fallback = "%";
    return own;
}

bc_status limit_take_unit(const char *unit, const bc_state *state, bc_limit *limit, bc_error *err)
{
    const char *fallback = NULL;
    const char *own = own_unit(limit, &fallback);
    bc_unit concentration;
    bc_status status = BC_OK;

    (void)snprintf(limit->unit, sizeof limit->unit, "%s", unit[0] != '\0' ? unit : fallback);
    status = bc_unit_parse(plain_unit(limit->unit), &limit->shown, err);
    if (status == BC_OK)
        status = bc_unit_parse("kg/m3", &concentration, err);
    if (status == BC_OK && limit->kind == BC_LIMIT_FRACTION && bc_unit_matches(&limit->shown, &concentration)) {
        weigh(limit, BC_LIMIT_CONCENTRATION);
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
