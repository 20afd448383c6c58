/* SPDX-License-Identifier: MIT */
/* plain_text.c - a terminal obeys control characters wherever they come from: here they end. */
#include "output/plain_text_internal.h"

#include <limits.h>
#include <stdlib.h>
#include <string.h>

#define NO_CHARACTER (-1L)

/* The four forms of a character in UTF-8 (RFC 3629): marks of its first byte, and the first code
 * point that may be written so (a longer form than needed is a way to hide a character). */
static const struct {
    unsigned char mask, mark;
    long first;
} FORMS[] = {{0x80, 0x00, 0x0}, {0xE0, 0xC0, 0x80}, {0xF0, 0xE0, 0x800}, {0xF8, 0xF0, 0x10000}};

/* The number of bytes that follow a first byte; 4 if it starts no character. */
static size_t bytes_behind(unsigned char byte)
{
    size_t form = 0;

    while (form < 4 && (byte & FORMS[form].mask) != FORMS[form].mark)
        form++;
    return form;
}

/* The code point at s and its length; NO_CHARACTER, one byte long, where there is none. */
static long decode(const unsigned char *s, size_t *bytes)
{
    const size_t behind = bytes_behind(s[0]);

    *bytes = 1;
    if (behind == 4)
        return NO_CHARACTER;

    long point = s[0] & (unsigned char)~FORMS[behind].mask;
    for (size_t i = 1; i <= behind; i++) {
        if ((s[i] & 0xC0) != 0x80)
            return NO_CHARACTER;
        point = point << 6 | (s[i] & 0x3F);
    }
    if (point < FORMS[behind].first || point > 0x10FFFF || (point >= 0xD800 && point <= 0xDFFF))
        return NO_CHARACTER;
    *bytes = behind + 1;
    return point;
}

/* Controls of a terminal (C0, DEL, C1), the marks that let following text run backwards, which can
 * make a number look like another one, and what no XML file may hold. */
static bool is_control(long point)
{
    return point < 0x20 || (point >= 0x7F && point <= 0x9F) || (point >= 0x202A && point <= 0x202E) ||
           (point >= 0x2066 && point <= 0x2069) || point == 0xFFFE || point == 0xFFFF;
}

static bool survives(long point, plain_rule rule)
{
    if (!is_control(point))
        return true;
    if (rule == PLAIN_CELL)
        return point == '\t' || point == '\n';
    return rule == PLAIN_ESCAPED && point >= 0 && point < 0x20;
}

void plain_text_in_place(char *text, plain_rule rule)
{
    const char *from = text;
    char *to = text;

    while (*from != '\0') {
        size_t bytes = 0;
        if (survives(decode((const unsigned char *)from, &bytes), rule)) {
            memmove(to, from, bytes);
            to += bytes;
        } else {
            *to++ = '?';
        }
        from += bytes;
    }
    *to = '\0';
}

char *plain_text(const char *text, plain_rule rule)
{
    char *plain = strdup(text == NULL ? "" : text);

    if (plain != NULL)
        plain_text_in_place(plain, rule);
    return plain;
}

/* Plain text is valid UTF-8: every byte that continues no character starts one. */
static bool starts_character(char byte)
{
    return ((unsigned char)byte & 0xC0) != 0x80;
}

int plain_columns(const char *text, size_t bytes)
{
    int columns = 0;

    for (size_t i = 0; i < bytes && columns < INT_MAX; i++)
        columns += starts_character(text[i]);
    return columns;
}

size_t plain_bytes(const char *text, int columns)
{
    size_t bytes = 0;

    for (int taken = 0; text[bytes] != '\0'; bytes++) {
        taken += starts_character(text[bytes]);
        if (taken > columns)
            break;
    }
    return bytes;
}

/* Shortens a line that the text runs beyond to its last whole word, if it holds one. */
static size_t whole_words(const char *text, size_t bytes)
{
    size_t end = bytes;

    if (text[bytes] == '\0' || text[bytes] == ' ')
        return bytes;
    while (end > 0 && text[end - 1] != ' ')
        end--;
    return end == 0 ? bytes : end;
}

bool plain_cut(const char **rest, int width, plain_line *line)
{
    const char *start = *rest + strspn(*rest, " ");
    size_t bytes = whole_words(start, plain_bytes(start, width));

    *rest = start + bytes;
    while (bytes > 0 && start[bytes - 1] == ' ')
        bytes--;
    *line = (plain_line){start, bytes, plain_columns(start, bytes)};
    return bytes > 0;
}

int plain_line_count(const char *text, int width)
{
    plain_line line;
    int count = 0;

    while (plain_cut(&text, width, &line))
        count++;
    return count;
}
