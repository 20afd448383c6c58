/* SPDX-License-Identifier: MIT */
/* text_internal.h - the page that the parts of a text report are written on. */
#ifndef TEXT_INTERNAL_H
#define TEXT_INTERNAL_H

#include "output/render.h"

typedef struct {
    FILE *out;
    const render_style *style;
    int width;   /* columns of a line */
    bool failed; /* an allocation failed: something is missing on the page */
} text_page;

typedef enum { TEXT_PLAIN, TEXT_BOLD, TEXT_ALARM } text_tone;

/* A title on a line of its own, with `right` at the far end of it, or below where that is too far;
 * right may be NULL. */
void text_title(text_page *page, const char *left, const char *right);

/* `lead` from column `indent` on, then the text from column `hang` on, over as many lines as it
 * takes; a lead that reaches beyond hang - 1 has its line alone. The lead is our own word. */
typedef struct {
    const char *lead;
    int indent, hang;
    text_tone lead_tone, text_tone;
} text_shape;
void text_paragraph(text_page *page, text_shape shape, const char *text);

/* The letter of a gas on the page, A, B, ... Z, AA, ..., or the word for its role. */
#define TEXT_LETTERS_MAX 16
void text_letter(const report *r, size_t gas, char out[TEXT_LETTERS_MAX]);

/* What stands in front of its name: "Gas", where there are several "Gas B", or "Old gas". */
#define TEXT_LEAD_MAX (TEXT_LETTERS_MAX + 8)
void text_gas_lead(const report *r, size_t gas, char out[TEXT_LEAD_MAX]);

/* All sections with their results, and all tables. */
void text_sections(text_page *page, const report *r);
void text_tables(text_page *page, const report *r, bool leading); /* those that lead, or the others */

/* The limits, a line each. */
void text_limits(text_page *page, const report *r);

#endif
