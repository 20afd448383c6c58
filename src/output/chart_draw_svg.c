/* SPDX-License-Identifier: MIT */
/* chart_draw_svg.c - Cairo's SVG given words, and freed of names that count the process's surfaces. */
#include "output/chart_draw_svg_internal.h"

#include "output/chart_draw_internal.h"
#include "output/text_internal.h"

#include <stdlib.h>
#include <string.h>

#define SURFACE " id=\"surface" /* a number follows */

static void put_escaped(const char *plain, FILE *out)
{
    for (; *plain != '\0'; plain++) {
        if (*plain == '&')
            fputs("&amp;", out);
        else if (*plain == '<')
            fputs("&lt;", out);
        else if (*plain == '>')
            fputs("&gt;", out);
        else
            fputc(*plain, out);
    }
}

/* A line of the description; false without memory. */
static bool put_line(const char *text, FILE *out)
{
    char *plain = chart_plain(text);

    if (plain == NULL)
        return false;
    if (*plain != '\0') {
        put_escaped(plain, out);
        fputc('\n', out);
    }
    free(plain);
    return true;
}

static bool put_axis(const report_axis *axis, FILE *out)
{
    bool ok = put_line(axis->label, out) && put_line(axis->unit, out);

    for (size_t i = 0; ok && i < axis->name_count; i++)
        ok = put_line(axis->names[i], out);
    return ok;
}

static bool put_chart(const report_chart *chart, FILE *out)
{
    bool ok = put_line(chart->title, out) && put_axis(&chart->x, out) && put_axis(&chart->y, out);

    for (size_t i = 0; ok && i < chart->series_count; i++)
        ok = put_line(chart->series[i].label, out);
    for (size_t i = 0; ok && i < chart->mark_count; i++)
        ok = put_line(chart->marks[i].label, out);
    return ok;
}

/* What the head of the drawing says of the report. */
static bool put_subject(const report *r, FILE *out)
{
    bool ok = true;

    if (r->verdict != NULL) {
        fputs("Verdict: ", out);
        ok = put_line(r->verdict, out);
    }
    if (ok && r->state.present)
        ok = put_line(r->state.text, out);
    for (size_t i = 0; ok && i < r->gas_count; i++) {
        char lead[TEXT_LEAD_MAX];

        text_gas_lead(r, i, lead);
        fprintf(out, "%s: ", lead);
        ok = put_line(r->gases[i].name, out);
    }
    return ok;
}

static bool put_words(const report *r, FILE *out)
{
    fputs("\n<title>", out);
    bool ok = put_line(r->title, out);
    fputs("</title>\n<desc>", out);
    ok = ok && put_subject(r, out);
    for (size_t i = 0; ok && i < r->chart_count; i++)
        ok = put_chart(&r->charts[i], out);
    if (r->caution != NULL) {
        fputs("Caution: ", out);
        ok = ok && put_line(r->caution, out);
    }
    fputs("</desc>", out);
    return ok;
}

static void put_without_surfaces(const char *svg, FILE *out)
{
    for (const char *at = strstr(svg, SURFACE); at != NULL; at = strstr(svg, SURFACE)) {
        fwrite(svg, 1, (size_t)(at - svg), out);
        svg = at + strlen(SURFACE);
        svg += strspn(svg, "0123456789\"");
    }
    fputs(svg, out);
}

bool chart_write_svg(const report *r, const char *svg, FILE *out)
{
    const char *root = strstr(svg, "<svg ");
    const char *end = root == NULL ? NULL : strchr(root, '>');

    if (end == NULL) {
        fputs(svg, out);
        return true;
    }
    fwrite(svg, 1, (size_t)(end - svg), out);
    fputs(" role=\"img\">", out);
    const bool ok = put_words(r, out);
    put_without_surfaces(end + 1, out);
    return ok;
}
