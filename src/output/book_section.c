/* SPDX-License-Identifier: MIT */
/* book_section.c - a section of a report as a sheet: figures as numbers, units beside them. */
#include "output/book_internal.h"

#include "output/memory_stream_internal.h"
#include "output/result_text_internal.h"
#include "output/section_internal.h"
#include "output/text_internal.h"

#include <stdlib.h>
#include <string.h>

/* Columns of figures that stand alone. */
enum { LABEL, VALUE, UNIT, U, METHOD, NOTE, ID, COLUMNS };

/* Columns before and behind those of the gases, each of which has a value and an uncertainty. */
enum { GAS_LABEL, GAS_UNIT, GASES };
enum { GAS_METHOD, GAS_NOTE, GAS_ID, BEHIND_GASES };

static void put_words(book_sheet *s, const report_result *result, size_t method, const char *note)
{
    book_put_text(s, method, BOOK_PLAIN, result->method);
    book_put_text(s, method + 1, BOOK_PLAIN, note);
    book_put_text(s, method + 2, BOOK_PLAIN, result->id);
}

static void put_figure(book_sheet *s, const report_result *result, size_t value, size_t u)
{
    const result_text text = result_text_of(result, s->b->style);

    book_put_number(s, value, result->value, text.value);
    if (result->has_uncertainty)
        book_put_number(s, u, result->uncertainty, text.u);
}

static void put_label(book_sheet *s, const report_result *result)
{
    book_put_text(s, LABEL, BOOK_PLAIN, *result->label == '\0' ? result->id : result->label);
}

/* ---- one figure a row ---- */

static void put_singles(book_sheet *s, const section *of)
{
    static const char *const HEADS[COLUMNS] = {"Figure", "Value", "Unit", "u (k = 1)",
                                               "Method", "Note",  "Id"};

    for (size_t i = 0; i < COLUMNS; i++)
        book_put_head(s, i, i == VALUE || i == U, HEADS[i]);
    book_end_row(s, BOOK_HEAD_WIDTH);
    for (size_t i = 0; i < of->r->result_count; i++) {
        const report_result *result = &of->r->results[i];

        if (!section_has_single(of, i))
            continue;
        put_label(s, result);
        put_figure(s, result, VALUE, U);
        book_put_text(s, UNIT, BOOK_PLAIN, result_text_of(result, s->b->style).unit);
        put_words(s, result, METHOD, s->b->style->quiet ? NULL : result->note);
        s->row++;
    }
}

/* ---- several gases ---- */

/* The notes of a row, each after the letter of its gas; NULL without memory. */
static char *row_notes(const section *of, size_t row)
{
    char *text = NULL;
    size_t size = 0;
    FILE *out = bc_memory_stream_open(&text, &size);

    if (out == NULL)
        return NULL;
    const char *between = "";

    for (size_t gas = 0; gas < of->r->gas_count; gas++) {
        const size_t i = section_find(of, row, gas);
        char letter[TEXT_LETTERS_MAX];

        if (i == SECTION_NONE || of->r->results[i].note == NULL)
            continue;
        text_letter(of->r, gas, letter);
        fprintf(out, "%s%s: %s", between, letter, of->r->results[i].note);
        between = "; ";
    }
    if (bc_memory_stream_close(out))
        return text;
    free(text);
    return NULL;
}

static void put_gas_heads(book_sheet *s, const section *of)
{
    size_t column = GASES;

    book_put_head(s, GAS_LABEL, false, "Figure");
    book_put_head(s, GAS_UNIT, false, "Unit");
    for (size_t gas = 0; gas < of->r->gas_count; gas++) {
        char letter[TEXT_LETTERS_MAX], head[TEXT_LETTERS_MAX + 120];

        if (!section_has_gas(of, gas))
            continue;
        text_letter(of->r, gas, letter);
        (void)snprintf(head, sizeof head, "%s: %.100s", letter, of->r->gases[gas].name);
        book_put_head(s, column++, true, head);
        (void)snprintf(head, sizeof head, "u of %s (k = 1)", letter);
        book_put_head(s, column++, true, head);
    }
    book_put_head(s, column + GAS_METHOD, false, "Method");
    book_put_head(s, column + GAS_NOTE, false, "Note");
    book_put_head(s, column + GAS_ID, false, "Id");
    book_end_row(s, BOOK_HEAD_WIDTH);
}

static void put_row(book_sheet *s, const section *of, size_t row)
{
    const report_result *first = &of->r->results[section_first(of, row)];
    char *notes = row_notes(of, row);
    size_t column = GASES;

    put_label(s, first);
    book_put_text(s, GAS_UNIT, BOOK_PLAIN, result_text_of(first, s->b->style).unit);
    for (size_t gas = 0; gas < of->r->gas_count; gas++) {
        const size_t i = section_find(of, row, gas);

        if (i != SECTION_NONE)
            put_figure(s, &of->r->results[i], column, column + 1);
        column += section_has_gas(of, gas) ? 2 : 0;
    }
    put_words(s, first, column, s->b->style->quiet ? NULL : notes);
    s->b->failed = s->b->failed || notes == NULL;
    free(notes);
    s->row++;
}

static void put_section(book *b, const section *of)
{
    const size_t across = GASES + 2 * b->r->gas_count + BEHIND_GASES;
    book_sheet s;

    if (book_open_sheet(b, &s, b->r->sections[of->index].title, across > COLUMNS ? across : COLUMNS)) {
        if (of->single_count > 0)
            put_singles(&s, of);
        s.row += of->single_count > 0 && of->row_count > 0;
        if (of->row_count > 0)
            put_gas_heads(&s, of);
        for (size_t row = 0; row < of->row_count; row++)
            put_row(&s, of, row);
    }
    book_close_sheet(&s, 1);
}

void book_section(book *b, size_t index)
{
    section of;

    if (!section_open(&of, b->r, index, false))
        b->failed = true;
    else if (of.single_count + of.row_count > 0)
        put_section(b, &of);
    section_close(&of);
}
