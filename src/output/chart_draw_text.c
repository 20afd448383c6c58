/* SPDX-License-Identifier: MIT */
/* chart_draw_text.c - texts of a chart: measured, shortened, folded into lines. */
#include "output/chart_draw_internal.h"

#include "output/plain_text_internal.h"

#include <stdlib.h>
#include <string.h>

#define LEADING   1.3            /* of the size, from line to line */
#define NARROWEST 0.2            /* of the size: no letter that matters is narrower */
#define LONGEST   400            /* characters of a line; what is longer is cut before it is measured */
#define MORE      "\xE2\x80\xA6" /* U+2026, ... */

void chart_ink(const chart_canvas *canvas, unsigned rgb, double alpha)
{
    cairo_set_source_rgba(canvas->cr, (rgb >> 16 & 0xFFu) / 255.0, (rgb >> 8 & 0xFFu) / 255.0,
                          (rgb & 0xFFu) / 255.0, alpha);
}

static void set_font(const chart_canvas *canvas, const chart_font *font)
{
    cairo_select_font_face(canvas->cr, "sans", CAIRO_FONT_SLANT_NORMAL,
                           font->bold ? CAIRO_FONT_WEIGHT_BOLD : CAIRO_FONT_WEIGHT_NORMAL);
    cairo_set_font_size(canvas->cr, font->size);
}

/* The length of a code point that Unicode keeps from ever being a character (U+FDD0 to U+FDEF, and the
 * last two of each plane): Cairo takes none, XML not all. 0: it is a character. */
static size_t length_of_none(const char *text)
{
    const unsigned char *b = (const unsigned char *)text;

    if (b[0] == 0xEF && b[1] == 0xB7 && b[2] >= 0x90 && b[2] <= 0xAF)
        return 3;
    if (b[0] == 0xEF && b[1] == 0xBF && b[2] >= 0xBE)
        return 3;
    return b[0] >= 0xF0 && (b[1] & 0x0F) == 0x0F && b[2] == 0xBF && b[3] >= 0xBE ? 4 : 0;
}

char *chart_plain(const char *text)
{
    char *plain = plain_text(text, PLAIN_LINE);
    char *to = plain;

    if (plain == NULL)
        return NULL;
    for (const char *from = plain; *from != '\0';) {
        const size_t none = length_of_none(from);

        *to++ = none > 0 ? '?' : *from;
        from += none > 0 ? none : 1;
    }
    *to = '\0';
    return plain;
}

/* The text without what could harm, with room for MORE; NULL without memory. The caller frees it. */
static char *clean(chart_canvas *canvas, const char *text)
{
    char *plain = chart_plain(text);
    char *roomy = plain == NULL ? NULL : realloc(plain, strlen(plain) + sizeof MORE);

    if (roomy == NULL) {
        canvas->failed = true;
        free(plain);
        return NULL;
    }
    roomy[plain_bytes(roomy, LONGEST)] = '\0';
    return roomy;
}

static double width_of(const chart_canvas *canvas, const char *plain)
{
    cairo_text_extents_t extents;

    cairo_text_extents(canvas->cr, plain, &extents);
    return extents.x_advance;
}

/* Cuts a text until it fits, MORE in place of what is lost. */
static void shorten(const chart_canvas *canvas, char *plain, double room)
{
    int columns = plain_columns(plain, strlen(plain));

    while (columns > 0 && width_of(canvas, plain) > room) {
        columns--;
        memcpy(plain + plain_bytes(plain, columns), MORE, sizeof MORE);
    }
}

static void show(const chart_canvas *canvas, const chart_font *font, double x, double y, const char *plain)
{
    cairo_move_to(canvas->cr, x - font->align * width_of(canvas, plain), y);
    chart_ink(canvas, font->rgb, 1.0);
    cairo_show_text(canvas->cr, plain);
    cairo_new_path(canvas->cr);
}

double chart_text_width(chart_canvas *canvas, const chart_font *font, const char *text)
{
    char *plain = clean(canvas, text);
    double width = 0.0;

    if (plain != NULL) {
        set_font(canvas, font);
        width = width_of(canvas, plain);
    }
    free(plain);
    return width;
}

void chart_text(chart_canvas *canvas, const chart_font *font, double x, double y, double room,
                const char *text)
{
    char *plain = clean(canvas, text);

    if (plain != NULL && *plain != '\0') {
        set_font(canvas, font);
        shorten(canvas, plain, room);
        show(canvas, font, x, y, plain);
    }
    free(plain);
}

double chart_leading(const chart_font *font)
{
    return LEADING * font->size;
}

/* Cuts the longest line that fits off *rest; the caller frees it. NULL at the end, or without memory. */
static char *next_line(chart_canvas *canvas, const chart_font *font, double room, const char **rest)
{
    int columns = 1 + (int)(room / (NARROWEST * font->size));
    plain_line cut;

    for (;; columns--) {
        const char *left = *rest;

        if (!plain_cut(&left, columns, &cut))
            return NULL;

        char *line = malloc(cut.bytes + sizeof MORE);
        if (line == NULL) {
            canvas->failed = true;
            return NULL;
        }
        memcpy(line, cut.start, cut.bytes);
        line[cut.bytes] = '\0';
        if (columns == 1 || width_of(canvas, line) <= room) {
            *rest = left;
            return line;
        }
        free(line);
    }
}

int chart_paragraph(chart_canvas *canvas, const chart_font *font, const chart_box *at, int most,
                    const char *text)
{
    char *plain = clean(canvas, text);
    const char *rest = plain;
    int lines = 0;

    set_font(canvas, font);
    while (plain != NULL && lines < most) {
        char *line = next_line(canvas, font, at->width, &rest);

        if (line == NULL)
            break;
        if (lines + 1 == most && rest[strspn(rest, " ")] != '\0') {
            memcpy(line + strlen(line), MORE, sizeof MORE);
            shorten(canvas, line, at->width);
        }
        show(canvas, font, at->left, at->top + lines * chart_leading(font), line);
        free(line);
        lines++;
    }
    free(plain);
    return lines;
}
