/* SPDX-License-Identifier: MIT */
/* page_text.c - texts and numbers as HTML, and the elements that all parts of a page use. */
#include "output/page_internal.h"

#include "output/plain_text_internal.h"
#include "output/text_internal.h"

#include <stdlib.h>
#include <string.h>

static const char *entity_of(char c)
{
    switch (c) {
    case '&':
        return "&amp;";
    case '<':
        return "&lt;";
    case '>':
        return "&gt;";
    case '"':
        return "&quot;";
    case '\'':
        return "&#39;";
    default:
        return NULL;
    }
}

void page_text(page *p, const char *text)
{
    char *plain = plain_text(text, PLAIN_LINE);
    const char *at = plain;

    p->failed = p->failed || plain == NULL;
    while (at != NULL && *at != '\0') {
        const size_t harmless = strcspn(at, "&<>\"'");

        fwrite(at, 1, harmless, p->out);
        at += harmless;
        if (*at != '\0')
            fputs(entity_of(*at++), p->out);
    }
    free(plain);
}

void page_element(page *p, const char *name, const char *text)
{
    fprintf(p->out, "<%s>", name);
    page_text(p, text);
    fprintf(p->out, "</%.*s>", (int)strcspn(name, " "), name);
}

void page_open_block(page *p, char id, size_t n, const char *title)
{
    fprintf(p->out, "<section>\n<h2 id=\"%c%zu\">", id, n);
    page_text(p, title);
    fputs("</h2>\n", p->out);
}

void page_close_block(page *p)
{
    fputs("</section>\n", p->out);
}

void page_open_table(page *p, const char *kind, const char *caption, size_t gases)
{
    fprintf(p->out, "<div class=\"box %s\" role=\"region\" tabindex=\"0\" aria-label=\"", kind);
    page_text(p, caption);
    fprintf(p->out, "\">\n<table style=\"--n:%zu\">\n<caption>", gases);
    page_text(p, caption);
    fputs("</caption>\n", p->out);
}

void page_close_table(page *p)
{
    fputs("</tbody>\n</table>\n</div>\n", p->out);
}

void page_column_head(page *p, const char *kind, const char *heading, const char *unit)
{
    fprintf(p->out, "<th scope=\"col\" class=\"%s\">", kind);
    page_text(p, heading);
    if (*unit != '\0') {
        fputs(" <span>", p->out);
        page_text(p, unit);
        fputs("</span>", p->out);
    }
    fputs("</th>", p->out);
}

int page_fraction(const char *number)
{
    return (int)strlen(number + strcspn(number, "."));
}

/* The digits behind the point get a box of their own, as wide in every row. */
static void put_aligned(page *p, const char *number, int fraction)
{
    const size_t whole = strcspn(number, ".");

    if (fraction == 0 || fraction > PAGE_FRACTION_MAX || *number == '\0')
        fputs(number, p->out);
    else
        fprintf(p->out, "%.*s<i class=\"f%d\">%s</i>", (int)whole, number, fraction, number + whole);
}

void page_number(page *p, const char *number, const char *u, int fraction)
{
    fputs("<td class=\"n\">", p->out);
    put_aligned(p, number, fraction);
    if (*u != '\0') {
        fputs("<small>u ", p->out);
        put_aligned(p, u, fraction);
        fputs("</small>", p->out);
    }
    fputs("</td>", p->out);
}

void page_gas_word(page *p, size_t gas)
{
    char lead[TEXT_LEAD_MAX];

    text_gas_lead(p->r, gas, lead);
    fputs(lead, p->out);
}
