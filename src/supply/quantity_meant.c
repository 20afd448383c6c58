/* SPDX-License-Identifier: MIT */
/* quantity_meant.c - the id that a word of the trade stands for. */
#include "supply/quantity_meant.h"

#include "base/compiler.h"
#include "base/text.h"

static const struct {
    const char *word, *ids;
} WORDS[] = {
#define TRADE_WORD(word, ids) {word, ids},
#include "data/trade_words.def"
};

const char *quantity_meant(const char *word)
{
    for (size_t i = 0; i < BC_COUNT(WORDS); i++)
        if (bc_text_same(WORDS[i].word, word))
            return WORDS[i].ids;
    return NULL;
}
