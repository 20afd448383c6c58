/* SPDX-License-Identifier: MIT */
/* section_note.c - labels with the marks of their notes, and the notes. */
#include "output/section_internal.h"

#include "output/memory_stream_internal.h"
#include "output/text_internal.h"

#include <stdio.h>
#include <stdlib.h>

/* Closes a stream into memory, which gives up its text only then; NULL when memory was
 * short. */
static char *finish(FILE *out, char **text)
{
    if (bc_memory_stream_close(out))
        return *text;
    free(*text);
    return NULL;
}

/* Whether a result stands in the same row as another one. */
static bool shares_row(const section *s, size_t a, size_t b)
{
    return a == b || (s->row_of[a] != SECTION_NONE && s->row_of[a] == s->row_of[b]);
}

/* Whether a result before this one, in the same row, already has the same note. */
static bool is_marked(const section *s, size_t first, size_t result)
{
    for (size_t i = first; i < result; i++)
        if (shares_row(s, first, i) && s->note_of[i] == s->note_of[result])
            return true;
    return false;
}

char *section_label(const section *s, size_t result)
{
    const report_result *labelled = &s->r->results[result];
    char *text = NULL;
    size_t size = 0;
    FILE *out = bc_memory_stream_open(&text, &size);

    if (out == NULL)
        return NULL;
    fputs(*labelled->label == '\0' ? labelled->id : labelled->label, out);
    for (size_t i = result; i < s->r->result_count; i++)
        if (s->note_of[i] != 0 && shares_row(s, result, i) && !is_marked(s, result, i))
            fprintf(out, " [%zu]", s->note_of[i]);
    return finish(out, &text);
}

static bool is_about(const section *s, size_t number, size_t gas)
{
    for (size_t i = 0; i < s->r->result_count; i++)
        if (s->note_of[i] == number && s->r->results[i].gas == gas)
            return true;
    return false;
}

/* Whether the note must say whose it is: some gas of the rows has it and some has not. */
static bool needs_letters(const section *s, size_t number)
{
    bool has = false, lacks = false;

    for (size_t gas = 0; s->row_count > 0 && gas < s->r->gas_count; gas++) {
        if (!section_has_gas(s, gas))
            continue;
        has = has || is_about(s, number, gas);
        lacks = lacks || !is_about(s, number, gas);
    }
    return has && lacks;
}

static void write_letters(const section *s, size_t number, FILE *out)
{
    const char *separator = "";

    for (size_t gas = 0; gas < s->r->gas_count; gas++) {
        char letter[TEXT_LETTERS_MAX];

        if (!is_about(s, number, gas))
            continue;
        text_letter(s->r, gas, letter);
        fprintf(out, "%s%s", separator, letter);
        separator = ", ";
    }
    fputs(": ", out);
}

/* The text of a note, as the first result that bears it has it. */
static const char *text_of(const section *s, size_t number)
{
    size_t i = 0;

    while (s->note_of[i] != number)
        i++;
    return s->r->results[i].note;
}

char *section_note(const section *s, size_t number)
{
    char *text = NULL;
    size_t size = 0;
    FILE *out = bc_memory_stream_open(&text, &size);

    if (out == NULL)
        return NULL;
    if (needs_letters(s, number))
        write_letters(s, number, out);
    fputs(text_of(s, number), out);
    return finish(out, &text);
}
