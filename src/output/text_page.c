/* SPDX-License-Identifier: MIT */
/* text_page.c - titles and paragraphs within the width of a page. */
#include "output/text_internal.h"

#include "output/plain_text_internal.h"

#include <stdlib.h>
#include <string.h>

#define TITLE_GAP 2 /* columns between a title and what stands at its right */

/* Starts or, with TEXT_PLAIN, ends bold or red text, if the page has colour. */
static void set_tone(const text_page *page, text_tone tone)
{
    static const char *const SEQUENCES[] = {"\033[0m", "\033[1m", "\033[1;31m"}; /* ECMA-48, SGR */

    if (page->style->color)
        fputs(SEQUENCES[tone], page->out);
}

/* Writes spaces up to a column and answers the column reached. */
static int fill(const text_page *page, int from, int to)
{
    if (to > from)
        fprintf(page->out, "%*s", to - from, "");
    return to > from ? to : from;
}

static void put_line(const text_page *page, const plain_line *line, text_tone tone)
{
    if (tone != TEXT_PLAIN)
        set_tone(page, tone);
    fwrite(line->start, 1, line->bytes, page->out);
    if (tone != TEXT_PLAIN)
        set_tone(page, TEXT_PLAIN);
}

/* The lead in its tone; answers the column behind it. */
static int put_lead(const text_page *page, const text_shape *shape)
{
    const int column = fill(page, 0, shape->indent);
    const char *lead = shape->lead == NULL ? "" : shape->lead;
    const plain_line line = {lead, strlen(lead), (int)strlen(lead)};

    if (line.bytes > 0)
        put_line(page, &line, shape->lead_tone);
    return column + line.columns;
}

void text_paragraph(text_page *page, text_shape shape, const char *text)
{
    char *plain = plain_text(text, PLAIN_LINE);
    const char *rest = plain;
    plain_line line;
    int column = put_lead(page, &shape);

    while (plain != NULL && plain_cut(&rest, page->width - shape.hang, &line)) {
        if (column > shape.hang) {
            fputc('\n', page->out);
            column = 0;
        }
        fill(page, column, shape.hang);
        put_line(page, &line, shape.text_tone);
        column = page->width;
    }
    fputc('\n', page->out);
    page->failed = page->failed || plain == NULL;
    free(plain);
}

/* A title with `right` at the far end of its line; false when they do not fit there. */
static bool put_title(const text_page *page, const char *left, const char *right)
{
    const plain_line line = {left, strlen(left), plain_columns(left, strlen(left))};
    const int start = page->width - plain_columns(right, strlen(right));

    if (*left == '\0' || *right == '\0' || line.columns + TITLE_GAP > start)
        return false;
    put_line(page, &line, TEXT_BOLD);
    fill(page, line.columns, start);
    fprintf(page->out, "%s\n", right);
    return true;
}

void text_title(text_page *page, const char *left, const char *right)
{
    char *plain_left = plain_text(left, PLAIN_LINE);
    char *plain_right = plain_text(right, PLAIN_LINE);

    if (plain_left == NULL || plain_right == NULL) {
        page->failed = true;
    } else if (!put_title(page, plain_left, plain_right)) {
        text_paragraph(page, (text_shape){.text_tone = TEXT_BOLD}, plain_left);
        if (*plain_right != '\0')
            text_paragraph(page, (text_shape){.indent = TITLE_GAP, .hang = TITLE_GAP}, plain_right);
    }
    free(plain_left);
    free(plain_right);
}
