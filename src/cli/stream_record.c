/* SPDX-License-Identifier: MIT */
/* stream_record.c - where rows end and what their cells are, after RFC 4180. */
#include "cli/stream.h"

#include "base/text.h"

#include <string.h>

/* The end of a row whose quotes may hold line feeds: a quote opens at the beginning of a cell, and doubled it stands
 * for itself. NULL when it is not found; *open then says that a quote is to blame. */
static const char *find_quoted_end(char delimiter, const char *text, const char *end, bool *open)
{
    bool at_begin = true;

    *open = false;
    for (const char *p = text; p < end; p++) {
        if (*open) {
            if (*p == '"' && !(p + 1 < end && p[1] == '"'))
                *open = false;
            else if (*p == '"')
                p++;
            continue;
        }
        if (*p == '\n')
            return p + 1;
        *open = at_begin && *p == '"';
        at_begin = *p == delimiter;
    }
    return NULL;
}

bool stream_is_open(char delimiter, const char *text, size_t length)
{
    bool open = false;

    (void)find_quoted_end(delimiter, text, text + length, &open);
    return open;
}

/* A quote that nobody closes must not swallow the log: its line is then a row by itself. That is a matter of the bytes
 * behind it alone, so that a block is cut the same way wherever it begins. */
size_t stream_row_end(const stream_plan *p, const char *text, size_t length, bool last)
{
    const char *feed = memchr(text, '\n', length);
    const size_t line = feed ? (size_t)(feed + 1 - text) : length;

    if (!feed && !last)
        return 0;
    if (p->form == STREAM_NDJSON || !memchr(text, '"', line))
        return line;
    const size_t seen = length < STREAM_QUOTED_MAX ? length : STREAM_QUOTED_MAX;
    bool open = false;
    const char *end = find_quoted_end(p->delimiter, text, text + seen, &open);

    if (end)
        return (size_t)(end - text);
    return last || seen == STREAM_QUOTED_MAX ? line : 0;
}

/* A cell being filled; what does not fit is cut. */
typedef struct {
    char *text;
    size_t length;
} cell;

static void put(cell *c, char sign)
{
    if (c->text && c->length + 1 < LOG_CELL_MAX)
        c->text[c->length++] = sign;
}

/* Takes the text between quotes; NULL when they are not closed or something else than a delimiter follows. */
static const char *take_quoted(cell *c, char delimiter, const char *p, const char *end, bool *open)
{
    for (p++; p < end; p++) {
        if (*p == '"' && p + 1 < end && p[1] == '"')
            p++;
        else if (*p == '"')
            break;
        put(c, *p);
    }
    *open = p == end;
    return p < end && (p + 1 == end || p[1] == delimiter) ? p + 1 : NULL;
}

stream_cut stream_split(char delimiter, const char *text, size_t length, char (*cells)[LOG_CELL_MAX], size_t *count)
{
    const char *end = text + length;
    const char *p = text;
    bool open = false;

    for (*count = 0;; p++) {
        cell c = {*count < LOG_COLUMNS_MAX ? cells[*count] : NULL, 0};

        if (p < end && *p == '"') {
            p = take_quoted(&c, delimiter, p, end, &open);
            if (!p) {
                (*count)++;
                return open ? STREAM_CUT_OPEN : STREAM_CUT_TORN;
            }
        } else {
            for (; p < end && *p != delimiter; p++)
                put(&c, *p);
        }
        if (c.text)
            c.text[c.length] = '\0';
        (*count)++;
        if (p == end)
            return STREAM_CUT_WHOLE;
    }
}

uint32_t stream_count_lines(const char *text, size_t length)
{
    uint32_t lines = 0;

    for (const char *p = text; (p = memchr(p, '\n', (size_t)(text + length - p))) != NULL; p++)
        lines++;
    return lines;
}
