/* SPDX-License-Identifier: MIT */
/* page_remark.c - what is said about the figures of a page: checks, warnings, and where they come from. */
#include "output/page_internal.h"

#include <string.h>

void page_checks(page *p)
{
    if (p->r->check_count == 0)
        return;
    page_open_block(p, 'k', 0, "Checks");
    fputs("<ul class=\"checks\">\n", p->out);
    for (size_t i = 0; i < p->r->check_count; i++) {
        const report_check *check = &p->r->checks[i];

        fputs(check->ok ? "<li><b class=\"yes\">ok</b> " : "<li><b class=\"no\">FAILED</b> ", p->out);
        page_element(p, "span", *check->detail == '\0' ? check->id : check->detail);
        fputs("</li>\n", p->out);
    }
    fputs("</ul>\n", p->out);
    page_close_block(p);
}

void page_warnings(page *p)
{
    if (p->r->warning_count == 0 || p->style->quiet)
        return;
    page_open_block(p, 'w', 0, "Warnings");
    fputs("<ul>\n", p->out);
    for (size_t i = 0; i < p->r->warning_count; i++) {
        page_element(p, "li", p->r->warnings[i]);
        fputc('\n', p->out);
    }
    fputs("</ul>\n", p->out);
    page_close_block(p);
}

static bool is_first_with_method(const report *r, size_t result)
{
    for (size_t i = 0; i < result; i++)
        if (strcmp(r->results[i].method, r->results[result].method) == 0)
            return false;
    return *r->results[result].method != '\0';
}

static void put_methods(page *p)
{
    const char *before = "<dt>Methods</dt><dd>";
    bool any = false;

    for (size_t i = 0; i < p->r->result_count; i++) {
        if (!is_first_with_method(p->r, i))
            continue;
        fputs(before, p->out);
        page_text(p, p->r->results[i].method);
        before = "; ";
        any = true;
    }
    if (any)
        fputs(". Equation, range and source of each: bluecone-methods(7).</dd>\n", p->out);
}

static void put_uncertainty(page *p)
{
    for (size_t i = 0; i < p->r->result_count; i++) {
        if (!p->r->results[i].has_uncertainty)
            continue;
        fputs("<dt>Uncertainty</dt><dd>u is the standard uncertainty (coverage factor k = 1) from input and tables, in the unit "
              "of its row; double it for a coverage of about 95 %. That of the method itself is not in it. For figures without u none is stated: that "
              "is not to say that they are exact.</dd>\n",
              p->out);
        return;
    }
}

static void put_inputs(page *p)
{
    for (size_t i = 0; i < p->r->gas_count; i++) {
        fputs(i == 0 ? "<dt>Input</dt><dd>" : "<br>", p->out);
        page_gas_word(p, i);
        fputs(": ", p->out);
        page_element(p, "bdi", *p->r->gases[i].source == '\0' ? p->r->gases[i].name : p->r->gases[i].source);
    }
    if (p->r->gas_count > 0)
        fputs("</dd>\n", p->out);
}

static void put_files(page *p)
{
    bool any = false;

    for (size_t i = 0; i < p->r->input_count; i++) {
        if (p->r->inputs[i].sha256 == NULL)
            continue;
        fputs(any ? "<br>" : "<dt>Files</dt><dd>", p->out);
        page_element(p, "bdi", p->r->inputs[i].name);
        fputs(" SHA-256 ", p->out);
        page_element(p, "code", p->r->inputs[i].sha256);
        any = true;
    }
    if (any)
        fputs("</dd>\n", p->out);
}

void page_foot(page *p)
{
    fputs("<footer>\n<h2 id=\"a0\">About this report</h2>\n<dl>\n<dt>Program</dt><dd>bluecone ", p->out);
    page_text(p, p->r->version);
    fputs(", command ", p->out);
    page_text(p, p->r->command);
    fputs("</dd>\n", p->out);
    put_inputs(p);
    put_files(p);
    put_methods(p);
    put_uncertainty(p);
    fputs("</dl>\n</footer>\n", p->out);
}
