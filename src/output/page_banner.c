/* SPDX-License-Identifier: MIT */
/* page_banner.c - what stands first on a page: the verdict, the caution, and what all of it is about. */
#include "output/page_internal.h"

#include <string.h>

/* Colours alone tell nothing to who cannot see them, or prints in grey: each has its word. */
static const struct {
    const char *kind, *word;
} JUDGEMENTS[] = {[REPORT_UNJUDGED] = {"plain", "Verdict"},
                  [REPORT_YES] = {"yes", "Verdict: yes"},
                  [REPORT_CARE] = {"care", "Verdict: take care"},
                  [REPORT_NO] = {"no", "Verdict: no"}};

static void put_verdict(page *p)
{
    const report_judgement judged = report_judged(p->r);

    if (p->r->verdict == NULL)
        return;
    fprintf(p->out, "<p class=\"verdict %s\"><strong>%s</strong> ", JUDGEMENTS[judged].kind,
            JUDGEMENTS[judged].word);
    page_text(p, p->r->verdict);
    fputs("</p>\n", p->out);
}

static void put_caution(page *p)
{
    if (p->r->caution == NULL)
        return;
    fputs("<p class=\"caution\"><strong>Caution</strong> ", p->out);
    page_text(p, p->r->caution);
    fputs("</p>\n", p->out);
}

static void put_gas(page *p, size_t gas)
{
    const report_gas *of = &p->r->gases[gas];

    fputs("<dt>", p->out);
    page_gas_word(p, gas);
    fputs("</dt><dd>", p->out);
    page_element(p, "bdi", of->name);
    if (*of->source != '\0' && strcmp(of->source, of->name) != 0)
        page_element(p, "small", of->source);
    fputs("</dd>\n", p->out);
}

static void put_facts(page *p)
{
    if (!p->r->state.present && p->r->gas_count == 0)
        return;
    fputs("<dl>\n", p->out);
    if (p->r->state.present) {
        fputs("<dt>State</dt>", p->out);
        page_element(p, "dd", p->r->state.text);
        fputc('\n', p->out);
    }
    for (size_t i = 0; i < p->r->gas_count; i++)
        put_gas(p, i);
    fputs("</dl>\n", p->out);
}

static void put_link(page *p, char id, size_t n, const char *title)
{
    fprintf(p->out, "<li><a href=\"#%c%zu\">", id, n);
    page_text(p, title);
    fputs("</a></li>\n", p->out);
}

static void put_table_links(page *p, bool leading)
{
    for (size_t i = 0; i < p->r->table_count; i++)
        if (p->r->tables[i].leads == leading)
            put_link(p, 't', i, p->r->tables[i].title);
}

static size_t failed_checks(const report *r)
{
    size_t count = 0;

    for (size_t i = 0; i < r->check_count; i++)
        count += !r->checks[i].ok;
    return count;
}

/* How many there are, so that nobody must scroll to learn that there are none. */
static void put_remark_links(page *p)
{
    const report *r = p->r;
    const size_t failed = failed_checks(r);
    char text[80];

    if (r->check_count > 0) {
        if (failed > 0)
            (void)snprintf(text, sizeof text, "Checks: %zu of %zu failed", failed, r->check_count);
        else
            (void)snprintf(text, sizeof text, "Checks: %zu ok", r->check_count);
        put_link(p, 'k', 0, text);
    }
    if (r->warning_count > 0 && !p->style->quiet) {
        (void)snprintf(text, sizeof text, "Warnings: %zu", r->warning_count);
        put_link(p, 'w', 0, text);
    }
}

static void put_contents(page *p)
{
    fputs("<nav aria-label=\"Contents\">\n<ul>\n", p->out);
    put_table_links(p, true);
    for (size_t i = 0; i < p->r->section_count; i++)
        if (page_has_results(p, i))
            put_link(p, 's', i, p->r->sections[i].title);
    put_remark_links(p);
    put_table_links(p, false);
    if (p->r->chart_count > 0)
        put_link(p, 'c', 0, "Charts");
    put_link(p, 'a', 0, "About this report");
    fputs("</ul>\n</nav>\n", p->out);
}

void page_banner(page *p)
{
    put_verdict(p);
    put_caution(p);
    put_facts(p);
    put_contents(p);
}
