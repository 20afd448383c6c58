/* SPDX-License-Identifier: MIT */
/* book_cover.c - the first sheet: verdict, caution, state, gases, checks, warnings, and who made it. */
#include "output/book_internal.h"

#include "output/text_internal.h"

#include <string.h>

#define WIDTH        90   /* of texts, in characters */
#define TITLE_HEIGHT 24.0 /* points */

static const struct {
    book_look look;
    const char *word;
} JUDGEMENTS[] = {[REPORT_UNJUDGED] = {BOOK_WORD, "Verdict"},
                  [REPORT_YES] = {BOOK_GOOD, "Verdict: yes"},
                  [REPORT_CARE] = {BOOK_CARE, "Verdict: take care"},
                  [REPORT_NO] = {BOOK_BAD, "Verdict: no"}};

static void put_row(book_sheet *s, book_look look, const char *word, book_look text_look, const char *text)
{
    book_put_text(s, 0, look, word);
    book_put_text(s, 1, text_look, text);
    book_end_row(s, WIDTH);
}

static void put_fact(book_sheet *s, const char *word, const char *text)
{
    put_row(s, BOOK_WORD, word, BOOK_WRAPPED, text);
}

static void put_verdict(book_sheet *s, const report *r)
{
    const report_judgement judged = report_judged(r);
    const book_look look = JUDGEMENTS[judged].look;

    if (r->verdict != NULL)
        put_row(s, look, JUDGEMENTS[judged].word, judged == REPORT_UNJUDGED ? BOOK_WRAPPED : look,
                r->verdict);
    if (r->caution != NULL)
        put_row(s, BOOK_CARE, "Caution", BOOK_CARE, r->caution);
}

static void put_gases(book_sheet *s, const report *r)
{
    for (size_t i = 0; i < r->gas_count; i++) {
        const report_gas *gas = &r->gases[i];
        char word[TEXT_LEAD_MAX];

        text_gas_lead(r, i, word);
        put_fact(s, word, gas->name);
        if (*gas->source != '\0' && strcmp(gas->source, gas->name) != 0)
            put_fact(s, "", gas->source);
    }
}

static void put_checks(book_sheet *s, const report *r)
{
    for (size_t i = 0; i < r->check_count; i++) {
        const report_check *check = &r->checks[i];

        put_row(s, check->ok ? BOOK_GOOD : BOOK_BAD, check->ok ? "Check: ok" : "Check: FAILED", BOOK_WRAPPED,
                *check->detail == '\0' ? check->id : check->detail);
    }
}

static void put_files(book_sheet *s, const report *r)
{
    for (size_t i = 0; i < r->input_count; i++) {
        char text[600];

        if (r->inputs[i].sha256 == NULL)
            continue;
        (void)snprintf(text, sizeof text, "%.500s: SHA-256 %.64s", r->inputs[i].name, r->inputs[i].sha256);
        put_fact(s, "File", text);
    }
}

static void put_end(book_sheet *s, const report *r)
{
    char text[200];

    (void)snprintf(text, sizeof text, "bluecone %.60s, command %.60s", r->version, r->command);
    put_fact(s, "Program", text);
    put_files(s, r);
    for (size_t i = 0; i < r->result_count; i++) {
        if (!r->results[i].has_uncertainty)
            continue;
        put_fact(s, "Uncertainty",
                 "u is the standard uncertainty (coverage factor k = 1) from input and tables, in the unit of "
                 "its row; that of the method itself is not in it. For figures without u none is stated: that is not to say that they "
                 "are exact.");
        return;
    }
}

void book_cover(book *b)
{
    const report *r = b->r;
    book_sheet s;

    if (book_open_sheet(b, &s, "Report", 2)) {
        book_put_text(&s, 0, BOOK_TITLE, r->title);
        book_check(b, worksheet_set_row(s.at, s.row++, TITLE_HEIGHT, NULL));
        s.most = 0;
        put_verdict(&s, r);
        if (r->state.present)
            put_fact(&s, "State", r->state.text);
        put_gases(&s, r);
        put_checks(&s, r);
        for (size_t i = 0; i < r->warning_count && !b->style->quiet; i++)
            put_row(&s, BOOK_CARE, "Warning", BOOK_WRAPPED, r->warnings[i]);
        put_end(&s, r);
        s.widths[1] = WIDTH;
    }
    book_close_sheet(&s, 0);
}
