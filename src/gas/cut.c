/* SPDX-License-Identifier: MIT */
/* cut.c - lumped fractions of a chromatograph report (C6+) and what they are split into. */
#include "base/compiler.h"
#include "base/text.h"
#include "gas/composition_internal.h"
#include "gas/species_index.h"

#include <stdio.h>
#include <string.h>

typedef struct {
    const char *word;
    size_t species;
    double share;
} cut_row;

static const cut_row CUTS[] = {
#define CUT(word, symbol, share, source) {word, SPECIES_##symbol, share},
#include "data/cuts.def"
};

bool cut_word(const char *word, int *carbon)
{
    char folded[BC_WORD_MAX];
    int n = 0;

    if (!bc_text_fold(folded, sizeof folded, word) || folded[0] != 'c')
        return false;
    const char *p = folded + 1;

    for (; *p >= '0' && *p <= '9' && n < 100; p++)
        n = n * 10 + (*p - '0');
    if (p == folded + 1 || strcmp(p, "+") != 0)
        return false;
    *carbon = n;
    return true;
}

bool cut_default(const char *word, double parts[BC_SPECIES_CAPACITY])
{
    bool found = false;

    memset(parts, 0, BC_SPECIES_CAPACITY * sizeof *parts);
    for (size_t i = 0; i < BC_COUNT(CUTS); i++)
        if (bc_text_same(CUTS[i].word, word)) {
            parts[CUTS[i].species] = CUTS[i].share;
            found = true;
        }
    return found;
}

void cut_describe(const double parts[BC_SPECIES_CAPACITY], char *text, size_t size)
{
    size_t used = 0;

    text[0] = '\0';
    for (size_t i = 0; i < SPECIES_COUNT; i++) {
        if (parts[i] <= 0.0)
            continue;
        const int n = bc_text_format(text + used, size - used, "%s%s %.4g %%", used ? ", " : "", bc_species_id(i), 100.0 * parts[i]);

        if (n < 0 || (size_t)n >= size - used)
            return;
        used += (size_t)n;
    }
}
