/* SPDX-License-Identifier: MIT */
/* status.c - statuses, their exit codes and the finished sentences of errors. */
#include "bluecone/status.h"

#include "base/error_internal.h"
#include "base/text.h"

#include <stdarg.h>
#include <stdio.h>
#include <string.h>

typedef struct {
    int exit_code;
    const char *text;
} status_row;

static const status_row ROWS[] = {
#define STATUS(code, exit_code, text) [code] = {exit_code, text},
#include "base/status.def"
};

static const status_row *row_of(bc_status status)
{
    const size_t index = (size_t)status;

    return &ROWS[index < BC_COUNT(ROWS) ? index : (size_t)BC_ERR_INPUT];
}

int bc_exit_code(bc_status status)
{
    return row_of(status)->exit_code;
}

const char *bc_status_text(bc_status status)
{
    return row_of(status)->text;
}

const char *bc_version(void)
{
    return BC_VERSION;
}

/* Messages repeat words of the user: nothing in them may command a terminal. */
static void disarm(char *text)
{
    for (; *text != '\0'; text++)
        if ((unsigned char)*text < 0x20 || *text == 0x7f)
            *text = '?';
}

static void fill(bc_error *err, bc_status status, const char *file, int line, const char *format,
                 va_list arguments) BC_PRINTF(5, 0);

static void fill(bc_error *err, bc_status status, const char *file, int line, const char *format,
                 va_list arguments)
{
    err->status = status;
    err->line = line;
    (void)snprintf(err->file, sizeof err->file, "%s", file);
    (void)bc_text_vformat(err->message, sizeof err->message, format, arguments);
    disarm(err->file);
    disarm(err->message);
}

bc_status bc_fail(bc_error *err, bc_status status, const char *format, ...)
{
    if (err) {
        va_list arguments;

        va_start(arguments, format);
        fill(err, status, "", 0, format, arguments);
        va_end(arguments);
    }
    return status;
}

bc_status bc_fail_at(bc_error *err, bc_status status, const char *file, int line, const char *format, ...)
{
    if (err) {
        va_list arguments;

        va_start(arguments, format);
        fill(err, status, file, line, format, arguments);
        va_end(arguments);
    }
    return status;
}
