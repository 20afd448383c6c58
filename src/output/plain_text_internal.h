/* SPDX-License-Identifier: MIT */
/* plain_text_internal.h - users' text made harmless, counted and cut into lines. */
#ifndef PLAIN_TEXT_INTERNAL_H
#define PLAIN_TEXT_INTERNAL_H

#include <stdbool.h>
#include <stddef.h>

/* What survives of the control characters; all others, and bytes that are no UTF-8, become '?'. */
typedef enum {
    PLAIN_LINE,   /* none: for a terminal */
    PLAIN_CELL,   /* tab and line feed: inside a quoted CSV cell */
    PLAIN_ESCAPED /* all below U+0020: where they are escaped anyway */
} plain_rule;

/* A harmless copy of text ("" for NULL), never longer; NULL when there is no memory. The caller
 * frees it. */
char *plain_text(const char *text, plain_rule rule);

/* The same where the text stands: needs no memory. */
void plain_text_in_place(char *text, plain_rule rule);

/* Columns that so many bytes of plain text take on a terminal: its code points. */
int plain_columns(const char *text, size_t bytes);

/* Bytes of a plain text's first `columns` columns, or of all of it. */
size_t plain_bytes(const char *text, int columns);

/* Some bytes of a text that form one line. */
typedef struct {
    const char *start;
    size_t bytes;
    int columns;
} plain_line;

/* Cuts the next line of at most `width` > 0 columns off *rest, at a blank if there is one; false
 * when nothing is left. */
bool plain_cut(const char **rest, int width, plain_line *line);

/* The number of lines that plain_cut() makes of a text. */
int plain_line_count(const char *text, int width);

#endif
