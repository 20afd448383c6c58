/* SPDX-License-Identifier: MIT */
/* text_letter.c - the letters that stand for gases. */
#include "output/text_internal.h"

void text_letter(size_t gas, char out[TEXT_LETTERS_MAX])
{
    char reversed[TEXT_LETTERS_MAX];
    size_t count = 0;

    for (size_t rest = gas + 1; rest > 0 && count < TEXT_LETTERS_MAX - 1; rest = (rest - 1) / 26)
        reversed[count++] = (char)('A' + (rest - 1) % 26);
    for (size_t i = 0; i < count; i++)
        out[i] = reversed[count - 1 - i];
    out[count] = '\0';
}
