/* SPDX-License-Identifier: MIT */
/* text_letter.c - the letters, or words, that stand for gases. */
#include "output/text_internal.h"

#include <stdio.h>

static void put_letters(size_t gas, char out[TEXT_LETTERS_MAX])
{
    char reversed[TEXT_LETTERS_MAX];
    size_t count = 0;

    for (size_t rest = gas + 1; rest > 0 && count < TEXT_LETTERS_MAX - 1; rest = (rest - 1) / 26)
        reversed[count++] = (char)('A' + (rest - 1) % 26);
    for (size_t i = 0; i < count; i++)
        out[i] = reversed[count - 1 - i];
    out[count] = '\0';
}

void text_letter(const report *r, size_t gas, char out[TEXT_LETTERS_MAX])
{
    if (r->gases[gas].role != NULL)
        (void)snprintf(out, TEXT_LETTERS_MAX, "%s", r->gases[gas].role);
    else
        put_letters(gas, out);
}

void text_gas_lead(const report *r, size_t gas, char out[TEXT_LEAD_MAX])
{
    char letter[TEXT_LETTERS_MAX];

    text_letter(r, gas, letter);
    if (r->gases[gas].role != NULL)
        (void)snprintf(out, TEXT_LEAD_MAX, "%c%s gas", letter[0] - 'a' + 'A', letter + 1);
    else
        (void)snprintf(out, TEXT_LEAD_MAX, r->gas_count > 1 ? "Gas %s" : "Gas", letter);
}
