/* SPDX-License-Identifier: MIT */
/* page_section.c - results on a page, a row each; those of several gases side by side. */
#include "output/page_internal.h"

#include "output/result_text_internal.h"
#include "output/section_internal.h"
#include "output/text_internal.h"

#include <stdlib.h>

#define ACROSS 5 /* more gases want a sheet of paper across */

/* The longest fractions of a column of values and of one of uncertainties. */
typedef struct {
    int value, u;
} fractions;

static void widen(fractions *f, const result_text *text)
{
    const int value = page_fraction(text->value), u = page_fraction(text->u);

    f->value = value > f->value ? value : f->value;
    f->u = u > f->u ? u : f->u;
}

bool page_has_results(const page *p, size_t index)
{
    for (size_t i = 0; i < p->r->result_count; i++)
        if (p->r->results[i].section == index)
            return true;
    return false;
}

/* On all sections of a page alike, so that their columns stand below each other. */
static bool has_uncertainty(const report *r)
{
    for (size_t i = 0; i < r->result_count; i++)
        if (r->results[i].has_uncertainty)
            return true;
    return false;
}

static void put_label(page *p, const section *s, size_t result)
{
    char *label = section_label(s, result);

    /* Where the column of methods finds no room, its text stands below the label. */
    fputs("<th scope=\"row\" data-method=\"", p->out);
    page_text(p, s->r->results[result].method);
    fputs("\">", p->out);
    page_text(p, label);
    fputs("</th>", p->out);
    p->failed = p->failed || label == NULL;
    free(label);
}

/* ---- one figure a row ---- */

static void put_single(page *p, const section *s, size_t i, const fractions *f)
{
    const report_result *result = &s->r->results[i];
    const result_text text = result_text_of(result, p->style);

    fputs("<tr>", p->out);
    put_label(p, s, i);
    page_number(p, text.value, "", f->value);
    page_element(p, "td class=\"q\"", text.unit);
    if (has_uncertainty(s->r))
        page_number(p, text.u, "", f->u);
    page_element(p, "td class=\"m\"", result->method);
    fputs("</tr>\n", p->out);
}

static void put_singles(page *p, const section *s)
{
    fractions f = {0, 0};

    for (size_t i = 0; i < s->r->result_count; i++) {
        if (section_has_single(s, i)) {
            const result_text text = result_text_of(&s->r->results[i], p->style);
            widen(&f, &text);
        }
    }
    page_open_table(p, has_uncertainty(s->r) ? "figures with-u" : "figures", s->r->sections[s->index].title,
                    0);
    fputs("<thead><tr>", p->out);
    page_column_head(p, "", "figure", "");
    page_column_head(p, "n", "value", "");
    page_column_head(p, "", "unit", "");
    if (has_uncertainty(s->r))
        page_column_head(p, "n", "u (k\302\240=\302\2401)", "");
    page_column_head(p, "m", "method", "");
    fputs("</tr></thead>\n<tbody>\n", p->out);
    for (size_t i = 0; i < s->r->result_count; i++)
        if (section_has_single(s, i))
            put_single(p, s, i, &f);
    page_close_table(p);
}

/* ---- several gases ---- */

static int fraction_of_gas(const page *p, const section *s, size_t gas)
{
    fractions f = {0, 0};

    for (size_t row = 0; row < s->row_count; row++) {
        const size_t i = section_find(s, row, gas);

        if (i != SECTION_NONE) {
            const result_text text = result_text_of(&s->r->results[i], p->style);
            widen(&f, &text);
        }
    }
    return f.value > f.u ? f.value : f.u;
}

static size_t count_gases(const section *s)
{
    size_t count = 0;

    for (size_t gas = 0; gas < s->r->gas_count; gas++)
        count += section_has_gas(s, gas);
    return count;
}

static void put_gas_head(page *p, size_t gas)
{
    char letter[TEXT_LETTERS_MAX];

    text_letter(p->r, gas, letter);
    fprintf(p->out, "<th scope=\"col\" class=\"n\">%s <span>", letter);
    page_element(p, "bdi", p->r->gases[gas].name);
    fputs("</span></th>", p->out);
}

static void put_row(page *p, const section *s, size_t row, const int *fraction)
{
    const size_t first = section_first(s, row);

    fputs("<tr>", p->out);
    put_label(p, s, first);
    page_element(p, "td class=\"q\"", result_text_of(&s->r->results[first], p->style).unit);
    for (size_t gas = 0; gas < s->r->gas_count; gas++) {
        const size_t i = section_find(s, row, gas);

        if (i != SECTION_NONE) {
            const result_text text = result_text_of(&s->r->results[i], p->style);
            page_number(p, text.value, text.u, fraction[gas]);
        } else if (section_has_gas(s, gas)) {
            fputs("<td class=\"n\">-</td>", p->out);
        }
    }
    page_element(p, "td class=\"m\"", s->r->results[first].method);
    fputs("</tr>\n", p->out);
}

static void put_rows(page *p, const section *s)
{
    const size_t gases = count_gases(s);
    int *fraction = calloc(s->r->gas_count, sizeof *fraction);

    if (fraction == NULL) {
        p->failed = true;
        return;
    }
    page_open_table(p, gases > ACROSS ? "gases many" : "gases", s->r->sections[s->index].title, gases);
    fputs("<thead><tr>", p->out);
    page_column_head(p, "", "figure", "");
    page_column_head(p, "", "unit", "");
    for (size_t gas = 0; gas < s->r->gas_count; gas++) {
        fraction[gas] = fraction_of_gas(p, s, gas);
        if (section_has_gas(s, gas))
            put_gas_head(p, gas);
    }
    page_column_head(p, "m", "method", "");
    fputs("</tr></thead>\n<tbody>\n", p->out);
    for (size_t row = 0; row < s->row_count; row++)
        put_row(p, s, row, fraction);
    page_close_table(p);
    free(fraction);
}

static void put_notes(page *p, const section *s)
{
    for (size_t number = 1; number <= s->note_count; number++) {
        char *note = section_note(s, number);

        fprintf(p->out, "<p class=\"note\">[%zu] ", number);
        page_text(p, note);
        fputs("</p>\n", p->out);
        p->failed = p->failed || note == NULL;
        free(note);
    }
}

static void put_section(page *p, size_t index)
{
    section s;

    if (!section_open(&s, p->r, index, !p->style->quiet)) {
        p->failed = true;
    } else {
        page_open_block(p, 's', index, p->r->sections[index].title);
        if (s.single_count > 0)
            put_singles(p, &s);
        if (s.row_count > 0)
            put_rows(p, &s);
        put_notes(p, &s);
        page_close_block(p);
    }
    section_close(&s);
}

void page_sections(page *p)
{
    for (size_t i = 0; i < p->r->section_count; i++)
        if (page_has_results(p, i))
            put_section(p, i);
}
