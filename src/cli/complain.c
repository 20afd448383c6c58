/* SPDX-License-Identifier: MIT */
/* complain.c - what goes to standard error: errors and warnings, a line each. */
#include "cli/cli.h"
#include "output/plain_text_internal.h"

#include <stdarg.h>
#include <stdio.h>

#define LINE_BYTES 1536 /* a file name, a line number and a sentence */

/* Words and file names of the user are quoted in the line: a terminal must not obey them. */
static void tell(char *text)
{
    plain_text_in_place(text, PLAIN_LINE);
    (void)fprintf(stderr, "bluecone: %s\n", text);
}

int complain(const bc_error *err)
{
    char text[LINE_BYTES];

    if (err->file[0] != '\0' && err->line > 0)
        (void)snprintf(text, sizeof text, "%s:%d: %s", err->file, err->line, err->message);
    else if (err->file[0] != '\0')
        (void)snprintf(text, sizeof text, "%s: %s", err->file, err->message);
    else
        (void)snprintf(text, sizeof text, "%s", err->message);
    tell(text);
    return bc_exit_code(err->status);
}

void warn(const char *format, ...)
{
    va_list arguments_list;
    char text[LINE_BYTES];

    va_start(arguments_list, format);
    (void)vsnprintf(text, sizeof text, format, arguments_list);
    va_end(arguments_list);
    tell(text);
}
