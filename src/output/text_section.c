/* SPDX-License-Identifier: MIT */
/* text_section.c - results as rows; those of several gases side by side. */
#include "output/text_internal.h"

#include "output/grid_internal.h"
#include "output/plain_text_internal.h"
#include "output/result_text_internal.h"
#include "output/section_internal.h"

#include <stdio.h>
#include <stdlib.h>
#include <string.h>

#define INDENT           2
#define LABEL_FOLD       24 /* labels, units and methods are not folded narrower than this */
#define UNIT_FOLD        10
#define METHOD_FOLD      14
#define NAME_MAX_COLUMNS 14 /* of a gas at the head of its column */

static void add_label(grid *g, const section *s, size_t result)
{
    char *label = section_label(s, result);

    grid_add_cell(g, label);
    g->failed = g->failed || label == NULL;
    free(label);
}

static void add_uncertainty(grid *g, const char *u)
{
    char cell[NUMBER_TEXT_MAX + 2] = "";

    if (*u != '\0')
        snprintf(cell, sizeof cell, "u %s", u);
    grid_add_cell(g, cell);
}

/* Whether any row of one figure has an uncertainty. */
static bool has_uncertainty(const section *s)
{
    for (size_t i = 0; i < s->r->result_count; i++)
        if (section_has_single(s, i) && s->r->results[i].has_uncertainty)
            return true;
    return false;
}

/* The results that are one figure a row: label, value, unit, uncertainty, method. */
static void print_singles(text_page *page, const section *s)
{
    const bool with_u = has_uncertainty(s);
    grid g;

    grid_open(&g, INDENT, 1);
    grid_add_column(&g, GRID_LEFT, LABEL_FOLD, "", "");
    grid_add_column(&g, GRID_POINT, 0, "", "");
    grid_add_column(&g, GRID_LEFT, UNIT_FOLD, "", "");
    if (with_u)
        grid_add_column(&g, GRID_POINT, 0, "", "");
    if (s->method == NULL)
        grid_add_column(&g, GRID_LEFT, METHOD_FOLD, "", "");
    for (size_t i = 0; i < s->r->result_count; i++) {
        if (!section_has_single(s, i))
            continue;

        const report_result *result = &s->r->results[i];
        const result_text text = result_text_of(result, page->style);
        add_label(&g, s, i);
        grid_add_cell(&g, text.value);
        grid_add_cell(&g, text.unit);
        if (with_u)
            add_uncertainty(&g, text.u);
        if (s->method == NULL)
            grid_add_cell(&g, result->method);
    }
    grid_print(&g, page);
}

/* Keeps the whole words of a name that fit the head of a column; one long word is cut. */
static void shorten_name(char *name)
{
    const size_t whole = plain_bytes(name, NAME_MAX_COLUMNS);
    size_t n = whole;

    if (name[whole] == '\0')
        return;
    while (n > 0 && name[n] != ' ')
        n--;
    while (n > 0 && (name[n - 1] == ' ' || name[n - 1] == ','))
        n--;
    name[n > 0 ? n : whole] = '\0';
}

/* The letter of a gas over the beginning of its name. */
static void add_gas_column(grid *g, const section *s, size_t gas)
{
    char letter[TEXT_LETTERS_MAX];
    char *name = plain_text(s->r->gases[gas].name, PLAIN_LINE);

    if (name != NULL)
        shorten_name(name);
    text_letter(s->r, gas, letter);
    grid_add_column(g, GRID_POINT, 0, letter, name);
    g->failed = g->failed || name == NULL;
    free(name);
}

static void add_value_of(grid *g, const text_page *page, const section *s, size_t row, size_t gas)
{
    const size_t result = section_find(s, row, gas);

    if (result == SECTION_NONE)
        grid_add_cell(g, "-");
    else
        grid_add_cell(g, result_text_of(&s->r->results[result], page->style).value);
}

/* The results of several gases: label, unit, and a column for each gas that has any. */
static void print_gases(text_page *page, const section *s)
{
    grid g;

    grid_open(&g, INDENT, 2);
    grid_add_column(&g, GRID_LEFT, LABEL_FOLD, "", "");
    grid_add_column(&g, GRID_LEFT, UNIT_FOLD, "", "");
    for (size_t gas = 0; gas < s->r->gas_count; gas++)
        if (section_has_gas(s, gas))
            add_gas_column(&g, s, gas);
    if (s->method == NULL)
        grid_add_column(&g, GRID_LEFT, METHOD_FOLD, "", "");
    for (size_t row = 0; row < s->row_count; row++) {
        const size_t first = section_first(s, row);

        add_label(&g, s, first);
        grid_add_cell(&g, result_text_of(&s->r->results[first], page->style).unit);
        for (size_t gas = 0; gas < s->r->gas_count; gas++)
            if (section_has_gas(s, gas))
                add_value_of(&g, page, s, row, gas);
        if (s->method == NULL)
            grid_add_cell(&g, s->r->results[first].method);
    }
    grid_print(&g, page);
}

static void print_notes(text_page *page, const section *s)
{
    for (size_t number = 1; number <= s->note_count; number++) {
        char lead[24];
        char *note = section_note(s, number);

        snprintf(lead, sizeof lead, "[%zu] ", number);
        const int hang = INDENT + (int)strlen(lead);
        text_paragraph(page, (text_shape){.lead = lead, .indent = INDENT, .hang = hang}, note);
        page->failed = page->failed || note == NULL;
        free(note);
    }
}

static void print_section(text_page *page, const section *s)
{
    fputc('\n', page->out);
    text_title(page, s->r->sections[s->index].title, s->method);
    if (s->single_count > 0)
        print_singles(page, s);
    if (s->single_count > 0 && s->row_count > 0)
        fputc('\n', page->out);
    if (s->row_count > 0)
        print_gases(page, s);
    print_notes(page, s);
}

void text_sections(text_page *page, const report *r)
{
    bool with_u = false;

    for (size_t i = 0; i < r->section_count; i++) {
        section s;

        if (!section_open(&s, r, i, !page->style->quiet))
            page->failed = true;
        else if (s.single_count + s.row_count > 0)
            print_section(page, &s);
        with_u = with_u || has_uncertainty(&s);
        section_close(&s);
    }
    if (with_u)
        fputs("\nu: standard uncertainty (k = 1), in the unit of its row;\n"
              "   from input and tables, that of the method is not in it\n", page->out);
}
