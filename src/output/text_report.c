/* SPDX-License-Identifier: MIT */
/* text_report.c - the report as an engineer prints it. */
#include "output/render.h"

#include "base/error_internal.h"
#include "output/text_internal.h"

#include <stdio.h>
#include <string.h>

#define WIDTH_DEFAULT 80
#define WIDTH_MIN     40 /* below, not even a label and a number fit side by side */
#define HEAD_HANG     9  /* behind "Caution: ", the longest word in front of a text */
#define INDENT        2
#define CHECK_HANG    (INDENT + 8) /* behind "FAILED" */

static void print_head(text_page *page, const report *r)
{
    char tool[64];

    snprintf(tool, sizeof tool, "bluecone %s", r->version);
    text_title(page, r->title, tool);
    if (r->state.present || r->gas_count > 0)
        fputc('\n', page->out);
    if (r->state.present)
        text_paragraph(page, (text_shape){.lead = "State:", .hang = HEAD_HANG}, r->state.text);
}

static void print_gas(text_page *page, const report *r, size_t gas)
{
    char word[TEXT_LEAD_MAX];
    char lead[TEXT_LEAD_MAX + 1];
    const report_gas *of = &r->gases[gas];

    text_gas_lead(r, gas, word);
    snprintf(lead, sizeof lead, "%s:", word);
    text_paragraph(page, (text_shape){.lead = lead, .hang = HEAD_HANG}, of->name);
    if (*of->source != '\0' && strcmp(of->source, of->name) != 0)
        text_paragraph(page, (text_shape){.indent = HEAD_HANG, .hang = HEAD_HANG}, of->source);
}

static void print_check(text_page *page, const report_check *check)
{
    text_shape shape = {.lead = "ok", .indent = INDENT, .hang = CHECK_HANG};

    if (!check->ok) {
        shape.lead = "FAILED";
        shape.lead_tone = TEXT_ALARM;
    }
    text_paragraph(page, shape, *check->detail == '\0' ? check->id : check->detail);
}

static void print_checks(text_page *page, const report *r)
{
    if (r->check_count == 0)
        return;
    fputc('\n', page->out);
    text_title(page, "Checks", NULL);
    for (size_t i = 0; i < r->check_count; i++)
        print_check(page, &r->checks[i]);
}

static void print_warnings(text_page *page, const report *r)
{
    if (r->warning_count == 0 || page->style->quiet)
        return;
    fputc('\n', page->out);
    text_title(page, "Warnings", NULL);
    for (size_t i = 0; i < r->warning_count; i++)
        text_paragraph(page, (text_shape){.lead = "-", .indent = INDENT, .hang = INDENT + 2}, r->warnings[i]);
}

static void print_end(text_page *page, const report *r)
{
    if (r->verdict != NULL || r->caution != NULL)
        fputc('\n', page->out);
    if (r->verdict != NULL) {
        const text_tone tone = report_judged(r) == REPORT_NO ? TEXT_ALARM : TEXT_BOLD;
        text_paragraph(page, (text_shape){"Verdict:", 0, HEAD_HANG, tone, tone}, r->verdict);
    }
    if (r->caution != NULL)
        text_paragraph(page, (text_shape){.lead = "Caution:", .hang = HEAD_HANG}, r->caution);
}

static int width_of(const render_style *style)
{
    if (style->width <= 0)
        return WIDTH_DEFAULT;
    return style->width < WIDTH_MIN ? WIDTH_MIN : style->width;
}

bc_status render_text(const report *r, const render_style *style, FILE *out, bc_error *err)
{
    text_page page = {.out = out, .style = style, .width = width_of(style), .failed = !report_ok(r)};

    if (!page.failed) {
        print_head(&page, r);
        for (size_t i = 0; i < r->gas_count; i++)
            print_gas(&page, r, i);
        text_tables(&page, r, true);
        if (r->limits_lead)
            text_limits(&page, r);
        text_sections(&page, r);
        text_tables(&page, r, false);
        if (!r->limits_lead)
            text_limits(&page, r);
        print_checks(&page, r);
        print_warnings(&page, r);
        print_end(&page, r);
    }
    if (page.failed)
        return bc_fail(err, BC_ERR_MEMORY, "no memory for the report");
    return ferror(out) ? bc_fail(err, BC_ERR_FILE, "cannot write the report") : BC_OK;
}
