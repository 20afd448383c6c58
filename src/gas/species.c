/* SPDX-License-Identifier: MIT */
/* species.c - the species table and the finding of species by their many names. */
#include "bluecone/species.h"

#include "base/compiler.h"
#include "base/error_internal.h"
#include "base/text.h"
#include "gas/species_atoms.h"

#include <assert.h>
#include <stdbool.h>
#include <stdio.h>
#include <string.h>

typedef struct {
    const char *id, *name, *formula, *cas, *source;
    signed char atoms[BC_ELEMENTS];
} species_row;

static const species_row SPECIES_TABLE[] = {
#define SPECIES(symbol, id, name, formula, c, h, n, o, s, he, ne, ar, cas, source) \
    {id, name, formula, cas, source, {c, h, n, o, s, he, ne, ar}},
#include "data/species.def"
};

const double SPECIES_ATOMS[SPECIES_COUNT][BC_ELEMENTS] = {
#define SPECIES(symbol, id, name, formula, c, h, n, o, s, he, ne, ar, cas, source) {c, h, n, o, s, he, ne, ar},
#include "data/species.def"
};

static_assert(SPECIES_COUNT <= BC_SPECIES_CAPACITY, "BC_SPECIES_CAPACITY is too small");

typedef struct {
    size_t species;
    const char *word;
} alias_row;

static const alias_row ALIASES[] = {
#define ALIAS(symbol, word) {SPECIES_##symbol, word},
#include "data/aliases.def"
};

typedef struct {
    const char *symbol, *source;
    double mass, u;
} element_row;

static const element_row ELEMENTS[BC_ELEMENTS] = {
#define ELEMENT(symbol, mass, u, source) {#symbol, source, mass, u},
#include "data/elements.def"
};

size_t bc_species_count(void)
{
    return SPECIES_COUNT;
}

/* A row of empty texts and no atoms stands for an index that does not exist. */
static const species_row *row_of(size_t index)
{
    static const species_row NONE = {"", "", "", "", "", {0}};

    return index < SPECIES_COUNT ? &SPECIES_TABLE[index] : &NONE;
}

const char *bc_species_id(size_t index)
{
    return row_of(index)->id;
}

const char *bc_species_name(size_t index)
{
    return row_of(index)->name;
}

const char *bc_species_formula(size_t index)
{
    return row_of(index)->formula;
}

const char *bc_species_cas(size_t index)
{
    return row_of(index)->cas;
}

const char *bc_species_source(size_t index)
{
    return row_of(index)->source;
}

const char *bc_species_alias(size_t index, size_t *species)
{
    if (index >= BC_COUNT(ALIASES))
        return NULL;
    *species = ALIASES[index].species;
    return ALIASES[index].word;
}

int bc_species_atoms(size_t index, bc_element element)
{
    return row_of(index)->atoms[element];
}

/* M = sum of n_k A_k over the elements k, ISO 6976:2016 annex A. */
double bc_species_molar_mass_kg_per_mol(size_t index)
{
    double mass = 0.0;

    if (index >= SPECIES_COUNT)
        return 0.0;
    for (size_t k = 0; k < BC_ELEMENTS; k++)
        mass += SPECIES_ATOMS[index][k] * ELEMENTS[k].mass;
    return mass * 1e-3;
}

double bc_element_mass_g_per_mol(bc_element element)
{
    return ELEMENTS[element].mass;
}

double bc_element_mass_u_g_per_mol(bc_element element)
{
    return ELEMENTS[element].u;
}

const char *bc_element_symbol(bc_element element)
{
    return ELEMENTS[element].symbol;
}

const char *bc_element_source(bc_element element)
{
    return ELEMENTS[element].source;
}

/* The species whose formula is the folded word; counts them, keeps the first. */
static size_t count_formula(const char *folded, size_t *first)
{
    size_t count = 0;

    for (size_t i = SPECIES_COUNT; i-- > 0;) {
        char formula[BC_WORD_MAX];

        if (bc_text_fold(formula, sizeof formula, SPECIES_TABLE[i].formula) && strcmp(formula, folded) == 0) {
            count++;
            *first = i;
        }
    }
    return count;
}

static bc_status refuse_ambiguous(const char *word, const char *folded, bc_error *err)
{
    char candidates[256] = "";
    size_t used = 0;

    for (size_t i = 0; i < SPECIES_COUNT; i++) {
        char formula[BC_WORD_MAX];

        if (!bc_text_fold(formula, sizeof formula, SPECIES_TABLE[i].formula) || strcmp(formula, folded) != 0)
            continue;
        const int n = snprintf(candidates + used, sizeof candidates - used, "%s%s", used ? ", " : "", SPECIES_TABLE[i].id);

        if (n < 0 || (size_t)n >= sizeof candidates - used)
            break;
        used += (size_t)n;
    }
    return bc_fail(err, BC_ERR_INPUT, "'%s' is the formula of several species; write one of %s", word, candidates);
}

static void keep_nearest(const char *word, const char *candidate, const char **best, size_t *distance)
{
    const size_t d = bc_text_unlikeness(word, candidate);

    if (d < *distance) {
        *distance = d;
        *best = candidate;
    }
}

static bc_status refuse_unknown(const char *word, const char *folded, bc_error *err)
{
    const char *best = SPECIES_TABLE[0].id;
    size_t distance = BC_WORD_MAX;
    char shown[BC_WORD_MAX];
    char hint[BC_HINT_MAX];

    for (size_t i = 0; i < SPECIES_COUNT; i++) {
        keep_nearest(folded, SPECIES_TABLE[i].id, &best, &distance);
        keep_nearest(folded, SPECIES_TABLE[i].name, &best, &distance);
    }
    for (size_t i = 0; i < BC_COUNT(ALIASES); i++)
        keep_nearest(folded, ALIASES[i].word, &best, &distance);
    bc_text_show(shown, sizeof shown, word);
    bc_text_suggest(hint, sizeof hint, "the nearest known one is", folded, best);
    return bc_fail(err, BC_ERR_INPUT, "unknown component '%s'%s (bluecone list species)", shown, hint);
}

bc_status bc_species_find(const char *word, size_t *index, bc_error *err)
{
    char folded[BC_WORD_MAX];
    size_t first = 0;

    if (!bc_text_fold(folded, sizeof folded, word) || folded[0] == '\0')
        return bc_fail(err, BC_ERR_INPUT, "a component name is empty or longer than %d characters", BC_WORD_MAX - 1);
    for (size_t i = 0; i < SPECIES_COUNT; i++)
        if (bc_text_same(SPECIES_TABLE[i].id, folded) || bc_text_same(SPECIES_TABLE[i].name, folded)) {
            *index = i;
            return BC_OK;
        }
    for (size_t i = 0; i < BC_COUNT(ALIASES); i++)
        if (bc_text_same(ALIASES[i].word, folded)) {
            *index = ALIASES[i].species;
            return BC_OK;
        }
    const size_t count = count_formula(folded, &first);

    if (count == 1) {
        *index = first;
        return BC_OK;
    }
    return count > 1 ? refuse_ambiguous(word, folded, err) : refuse_unknown(word, folded, err);
}
