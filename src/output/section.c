/* SPDX-License-Identifier: MIT */
/* section.c - the order of a section's results: rows, methods and notes. */
#include "output/section_internal.h"

#include "output/text_internal.h"

#include <stdio.h>
#include <stdlib.h>
#include <string.h>

static bool is_inside(const section *s, size_t result)
{
    return s->r->results[result].section == s->index;
}

static bool stands_alone(const report *r, const report_result *result)
{
    return r->gas_count <= 1 || result->gas == REPORT_NO_GAS;
}

static bool same_quantity(const report_result *a, const report_result *b)
{
    return strcmp(a->id, b->id) == 0 && strcmp(a->unit, b->unit) == 0 && strcmp(a->label, b->label) == 0;
}

/* The row of an earlier result of the same quantity that has none of this gas yet, else a new one. */
static size_t row_for(const section *s, size_t result)
{
    const report_result *results = s->r->results;

    for (size_t i = 0; i < result; i++)
        if (s->row_of[i] != SECTION_NONE && same_quantity(&results[i], &results[result]) &&
            section_find(s, s->row_of[i], results[result].gas) == SECTION_NONE)
            return s->row_of[i];
    return s->row_count;
}

static void sort_rows(section *s)
{
    for (size_t i = 0; i < s->r->result_count; i++)
        s->row_of[i] = SECTION_NONE;
    for (size_t i = 0; i < s->r->result_count; i++) {
        if (!is_inside(s, i))
            continue;
        if (stands_alone(s->r, &s->r->results[i])) {
            s->single_count++;
            continue;
        }
        s->row_of[i] = row_for(s, i);
        s->row_count += s->row_of[i] == s->row_count;
    }
}

static bool is_same(const char *a, const char *b)
{
    return a != NULL && b != NULL && strcmp(a, b) == 0;
}

/* The number of an equal note further up in the section, else a new one. */
static size_t note_for(const section *s, size_t result)
{
    for (size_t i = 0; i < result; i++)
        if (s->note_of[i] != 0 && is_same(s->r->results[i].note, s->r->results[result].note))
            return s->note_of[i];
    return s->note_count + 1;
}

static void number_notes(section *s)
{
    for (size_t i = 0; i < s->r->result_count; i++) {
        const char *note = s->r->results[i].note;

        if (!is_inside(s, i) || note == NULL || *note == '\0')
            continue;
        s->note_of[i] = note_for(s, i);
        s->note_count = s->note_of[i] > s->note_count ? s->note_of[i] : s->note_count;
    }
}

/* The method that all results of the section share, or NULL. */
static const char *shared_method(const section *s)
{
    const char *method = NULL;

    for (size_t i = 0; i < s->r->result_count; i++) {
        if (!is_inside(s, i))
            continue;
        if (method != NULL && strcmp(method, s->r->results[i].method) != 0)
            return NULL;
        method = s->r->results[i].method;
    }
    return method;
}

bool section_open(section *s, const report *r, size_t index, bool with_notes)
{
    *s = (section){.r = r, .index = index};
    s->row_of = calloc(r->result_count + 1, sizeof *s->row_of);
    s->note_of = calloc(r->result_count + 1, sizeof *s->note_of);
    if (s->row_of == NULL || s->note_of == NULL)
        return false;

    sort_rows(s);
    if (with_notes)
        number_notes(s);
    s->method = shared_method(s);
    return true;
}

void section_close(section *s)
{
    free(s->row_of);
    free(s->note_of);
    memset(s, 0, sizeof *s);
}

bool section_has_single(const section *s, size_t result)
{
    return is_inside(s, result) && stands_alone(s->r, &s->r->results[result]);
}

bool section_has_gas(const section *s, size_t gas)
{
    for (size_t i = 0; i < s->r->result_count; i++)
        if (s->row_of[i] != SECTION_NONE && s->r->results[i].gas == gas)
            return true;
    return false;
}

size_t section_find(const section *s, size_t row, size_t gas)
{
    for (size_t i = 0; i < s->r->result_count; i++)
        if (s->row_of[i] == row && s->r->results[i].gas == gas)
            return i;
    return SECTION_NONE;
}

size_t section_first(const section *s, size_t row)
{
    size_t i = 0;

    while (s->row_of[i] != row)
        i++;
    return i;
}
