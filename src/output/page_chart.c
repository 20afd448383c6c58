/* SPDX-License-Identifier: MIT */
/* page_chart.c - the charts of a report, drawn into the page. */
#include "output/page_internal.h"

#include "base/error_internal.h"
#include "output/memory_stream_internal.h"
#include "output/chart_internal.h"

#include <stdlib.h>
#include <string.h>

#define TOGETHER 3 /* panels of one drawing: more do not fit on a sheet of A4 */

/* Names within a drawing, which must not meet those of another one on the page. */
static const char *const NAMES[] = {" id=\"", "href=\"#", "url(#"};

static bool share_x(const report_chart *a, const report_chart *b)
{
    return strcmp(a->x.label, b->x.label) == 0 && strcmp(a->x.unit, b->x.unit) == 0;
}

/* How many charts from `first` on form one drawing: those that share an axis, in parts of about the
 * same size where they are too many. */
static size_t count_together(const report *r, size_t first)
{
    size_t count = 1;

    while (first + count < r->chart_count && share_x(&r->charts[first], &r->charts[first + count]))
        count++;
    const size_t parts = (count + TOGETHER - 1) / TOGETHER;
    return (count + parts - 1) / parts;
}

/* The next name in a drawing; NULL behind the last. *length: of what stands before it. */
static const char *next_name(const char *svg, size_t *length)
{
    const char *nearest = NULL;

    for (size_t i = 0; i < sizeof NAMES / sizeof *NAMES; i++) {
        const char *at = strstr(svg, NAMES[i]);

        if (at != NULL && (nearest == NULL || at < nearest)) {
            nearest = at;
            *length = strlen(NAMES[i]);
        }
    }
    return nearest;
}

/* A drawing without the head of an XML file; its words, which come first, hold no names. */
static void put_drawing(page *p, const char *file, size_t number)
{
    const char *svg = strstr(file, "<svg ");
    const char *words_end = svg == NULL ? NULL : strstr(svg, "</desc>");
    size_t length = 0;

    if (words_end == NULL)
        return;
    fwrite(svg, 1, (size_t)(words_end - svg), p->out);
    svg = words_end;
    for (const char *at = next_name(svg, &length); at != NULL; at = next_name(svg, &length)) {
        fwrite(svg, 1, (size_t)(at - svg) + length, p->out);
        fprintf(p->out, "c%zu-", number);
        svg = at + length;
    }
    fputs(svg, p->out);
}

/* The titles of some charts, as the name of the drawing; NULL without memory. */
static char *titles_of(const report *part)
{
    char *text = NULL;
    size_t size = 0;
    FILE *out = bc_memory_stream_open(&text, &size);

    if (out == NULL)
        return NULL;
    for (size_t i = 0; i < part->chart_count; i++)
        fprintf(out, "%s%s", i > 0 ? "; " : "", part->charts[i].title);
    if (bc_memory_stream_close(out))
        return text;
    free(text);
    return NULL;
}

/* The drawing of a part of the report. What comes back is the caller's; NULL on failure. */
static char *draw(report *part, bc_error *err)
{
    char *svg = NULL;
    size_t size = 0;
    FILE *out = bc_memory_stream_open(&svg, &size);
    bc_status status = BC_ERR_MEMORY;

    part->title = titles_of(part);
    if (out != NULL && part->title != NULL)
        status = chart_inset(part, out, err);
    else
        (void)bc_fail(err, BC_ERR_MEMORY, "no memory for the charts");
    if (out != NULL && !bc_memory_stream_close(out) && status == BC_OK)
        status = bc_fail(err, BC_ERR_MEMORY, "no memory for the charts");
    free(part->title);
    if (status == BC_OK)
        return svg;
    free(svg);
    return NULL;
}

/* One drawing; false when none can be made. */
static bool put_figure(page *p, size_t first, size_t count, size_t number)
{
    report part = *p->r;
    bc_error err = {0};

    part.charts += first;
    part.chart_count = count;
    part.state.present = false;
    part.caution = NULL;
    part.verdict = NULL;
    part.gas_count = 0; /* the page around has all of them */
    char *svg = draw(&part, &err);
    if (svg == NULL) {
        fputs("<p class=\"note\">The charts are left out: ", p->out);
        page_text(p, err.message);
        fputs("</p>\n", p->out);
        p->failed = p->failed || err.status == BC_ERR_MEMORY;
        return false;
    }
    fputs("<figure class=\"box\" tabindex=\"0\">\n", p->out);
    put_drawing(p, svg, number);
    fputs("</figure>\n", p->out);
    free(svg);
    return true;
}

void page_charts(page *p)
{
    const report *r = p->r;
    bool ok = true;

    if (r->chart_count == 0)
        return;
    page_open_block(p, 'c', 0, "Charts");
    for (size_t i = 0, number = 0; ok && i < r->chart_count; i += count_together(r, i))
        ok = put_figure(p, i, count_together(r, i), number++);
    page_close_block(p);
}
