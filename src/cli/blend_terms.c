/* SPDX-License-Identifier: MIT */
/* blend_terms.c - terms of supply on the command line, over those of the files. */
#include "base/error_internal.h"
#include "base/text.h"
#include "bluecone/number.h"
#include "cli/blend_case.h"

#include <math.h>
#include <stdio.h>
#include <string.h>

bc_status blend_next_pair(const char **list, const char *option, char key[BC_NAME_MAX], char value[BC_NAME_MAX], bool *more, bc_error *err)
{
    *more = *list && **list != '\0';
    if (!*more)
        return BC_OK;
    const size_t length = strcspn(*list, ",");
    const char *equals = memchr(*list, '=', length);

    if (!equals || !bc_text_copy(key, BC_NAME_MAX, *list, (size_t)(equals - *list)) || key[0] == '\0'
        || !bc_text_copy(value, BC_NAME_MAX, equals + 1, length - (size_t)(equals + 1 - *list)) || value[0] == '\0')
        return bc_fail(err, BC_ERR_USAGE, "--%s %.80s: write what=value, several parted by commas", option, *list);
    *list += length + ((*list)[length] == ',');
    return BC_OK;
}

bc_status blend_find_part(const blend_case *c, const char *option, const char *word, size_t *part, bc_error *err)
{
    char shown[BC_WORD_MAX];
    double place = 0.0;

    if (bc_number_parse(word, &place, NULL) == BC_OK && place == floor(place) && place >= 1.0 && place <= (double)c->count) {
        *part = (size_t)place - 1;
        return BC_OK;
    }
    for (size_t i = 0; i < c->count; i++) {
        const bc_composition *composition = &c->parts.each[i].loaded.composition;

        if (strcmp(word, c->word[i]) == 0 || bc_text_same(word, composition->name) || (composition->bundled[0] && bc_text_same(word, composition->bundled))) {
            *part = i;
            return BC_OK;
        }
    }
    bc_text_show(shown, sizeof shown, word);
    return bc_fail(err, BC_ERR_USAGE, "--%s: '%s' is none of the %zu gases of this blend; write a gas as above, or its place from 1 to %zu", option, shown,
                   c->count, c->count);
}

typedef enum { TERM_PRICE, TERM_CO2, TERM_FLOW } term;

static bc_status take_term(bc_offer *offer, term what, const char *value, bc_error *err)
{
    switch (what) {
    case TERM_PRICE:
        return bc_price_parse(value, &offer->price, offer->currency, err);
    case TERM_CO2:
        return bc_intensity_parse(value, &offer->co2, err);
    case TERM_FLOW:
    default:
        return bc_flow_parse(value, &offer->max_flow, err);
    }
}

static bc_status take_terms(blend_case *c, const char *list, const char *option, term what, bc_error *err)
{
    for (;;) {
        char key[BC_NAME_MAX];
        char value[BC_NAME_MAX];
        size_t part = 0;
        bool more = false;
        bc_status status = blend_next_pair(&list, option, key, value, &more, err);

        if (status != BC_OK || !more)
            return status;
        status = blend_find_part(c, option, key, &part, err);
        if (status == BC_OK)
            status = take_term(&c->offer[part], what, value, err);
        if (status != BC_OK) { /* a number that is none stands on the command line */
            if (err)
                err->status = BC_ERR_USAGE;
            return BC_ERR_USAGE;
        }
    }
}

bc_status blend_take_terms(blend_case *c, bc_error *err)
{
    bc_status status = BC_OK;

    for (size_t i = 0; i < c->count; i++)
        c->offer[i] = c->parts.each[i].loaded.composition.offer;
    status = take_terms(c, c->a->value[OPTION_price], "price", TERM_PRICE, err);
    if (status == BC_OK)
        status = take_terms(c, c->a->value[OPTION_co2], "co2", TERM_CO2, err);
    if (status == BC_OK)
        status = take_terms(c, c->a->value[OPTION_max_flow], "max-flow", TERM_FLOW, err);
    return status;
}
