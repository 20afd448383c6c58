/* SPDX-License-Identifier: MIT */
/* stream_columns.c - form, dialect and columns of a log, by its beginning. */
#include "cli/stream.h"

#include "base/error_internal.h"
#include "base/text.h"
#include "cli/json_memory.h"

#include <jansson.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>

#define BOM "\xEF\xBB\xBF" /* some programs put it in front of a text */

/* The beginning of a log, and how far it was read. */
typedef struct {
    const char *text;
    size_t length, at;
    bool last;
    int line;
} beginning;

static bool is_space(char c)
{
    return c == ' ' || c == '\t' || c == '\r' || c == '\n';
}

/* The next row that is not blank; false at the end of the bytes. */
static bool next_row(const stream_plan *p, beginning *b, const char **text, size_t *length)
{
    while (b->at < b->length) {
        const size_t row = stream_row_end(p, b->text + b->at, b->length - b->at, b->last);
        bool blank = true;

        if (row == 0)
            return false;
        *text = b->text + b->at;
        *length = row;
        b->line++;
        b->at += row;
        for (size_t i = 0; i < row && blank; i++)
            blank = is_space((*text)[i]);
        if (!blank)
            return true;
    }
    return false;
}

/* The row without its end, which is kept as that of the log. */
static size_t without_end(stream_plan *p, const char *text, size_t length)
{
    size_t bare = length;

    while (bare > 0 && (text[bare - 1] == '\n' || text[bare - 1] == '\r'))
        bare--;
    p->line_end = length - bare > 1 ? "\r\n" : "\n";
    return bare;
}

static bc_status take_names(stream_plan *p, char (*cells)[LOG_CELL_MAX], size_t count, int line, bc_error *err)
{
    const bc_status status = log_header_take(&p->header, cells, count, line, err);

    for (size_t i = 0; i < count && i < LOG_COLUMNS_MAX; i++)
        memcpy(p->names[i], cells[i], LOG_CELL_MAX);
    if (status == BC_OK)
        log_header_tell_ignored(&p->header);
    return status;
}

/* Names of --columns, or the cells of the header. */
static bc_status name_columns(stream_plan *p, char delimiter, const char *text, size_t length, int line, bc_error *err)
{
    char(*cells)[LOG_CELL_MAX] = calloc(LOG_COLUMNS_MAX, LOG_CELL_MAX);
    size_t count = 0;
    bc_status status = BC_OK;

    if (!cells)
        return bc_fail(err, BC_ERR_MEMORY, "not enough memory for the columns");
    if (memchr(text, '\0', length))
        status = bc_fail_at(err, BC_ERR_INPUT, p->path, line, "the line holds a NUL byte: not a text file, or UTF-16; save it as UTF-8");
    else if (stream_split(delimiter, text, length, cells, &count) != STREAM_CUT_WHOLE)
        status = bc_fail_at(err, BC_ERR_INPUT, p->path, line, "a quote opens and does not close its cell");
    else
        status = take_names(p, cells, count, line, err);
    free(cells);
    return status;
}

/* NDJSON: the keys of the first object in their order. */
static bc_status name_keys(stream_plan *p, const char *text, size_t length, int line, bc_error *err)
{
    char(*cells)[LOG_CELL_MAX] = calloc(LOG_COLUMNS_MAX, LOG_CELL_MAX);
    json_t *object = json_loadb(text, length, JSON_REJECT_DUPLICATES, NULL);
    size_t count = 0;
    const char *key = NULL;
    json_t *value = NULL;
    bc_status status = BC_OK;

    if (json_memory_was_short() || !cells)
        status = bc_fail(err, BC_ERR_MEMORY, "not enough memory for the columns");
    else if (!json_is_object(object))
        status = bc_fail_at(err, BC_ERR_INPUT, p->path, line, "the first line is no JSON object; its keys name the columns, or --no-header --columns does");
    if (status == BC_OK) {
        json_object_foreach(object, key, value)
        {
            if (count < LOG_COLUMNS_MAX)
                (void)snprintf(cells[count], LOG_CELL_MAX, "%s", key);
            count++;
        }
        status = take_names(p, cells, count, line, err);
    }
    json_decref(object);
    free(cells);
    return status;
}

static bc_status add_shares(stream_plan *p, size_t column, bc_error *err)
{
    const log_column *from = &p->header.columns[column];
    stream_column *to = &p->columns[column];

    to->first_share = p->share_count;
    for (size_t i = 0; i < bc_species_count(); i++) {
        if (!(from->parts[i] > 0.0))
            continue;
        if (p->share_count == BC_COUNT(p->shares))
            return bc_fail(err, BC_ERR_INPUT, "the components of the log are too many");
        p->shares[p->share_count++] = (stream_share){i, from->parts[i]};
    }
    to->share_count = p->share_count - to->first_share;
    return BC_OK;
}

/* A time that nobody asks for is only passed on. */
static bc_status settle_columns(stream_plan *p, bc_error *err)
{
    const bool wants_time = !p->alone || p->keeps;
    bc_status status = BC_OK;

    p->column_count = p->header.column_count;
    p->time_columns = log_header_count(&p->header, LOG_TIME);
    p->has_time = wants_time && p->time_columns > 0;
    for (size_t i = 0; i < p->column_count && status == BC_OK; i++) {
        const log_column *from = &p->header.columns[i];

        p->columns[i] = (stream_column){.kind = from->kind, .fraction = from->fraction};
        if (from->kind == LOG_TIME && !wants_time)
            p->columns[i].kind = LOG_IGNORED;
        if (from->kind == LOG_FLOW && !p->keeps)
            p->columns[i].kind = LOG_IGNORED;
        if (from->kind == LOG_FLOW)
            p->flow = from->flow;
        if (from->kind == LOG_COMPONENT)
            status = add_shares(p, i, err);
    }
    return status;
}

/* The first row tells, if a number of it has a mark; else a log parted by semicolons has decimal commas, others have
 * points. Later rows are not asked: of a pipe they may have come or not. */
static char find_mark(const stream_plan *p, beginning b)
{
    char(*cells)[LOG_CELL_MAX] = calloc(LOG_COLUMNS_MAX, LOG_CELL_MAX);
    const char *text = NULL;
    size_t length = 0;
    size_t count = 0;
    char mark = '\0';

    if (cells && next_row(p, &b, &text, &length) && stream_split(p->delimiter, text, length, cells, &count) == STREAM_CUT_WHOLE)
        for (size_t i = 0; i < count && i < p->column_count && mark == '\0'; i++) {
            const char *sign = p->columns[i].kind == LOG_COMPONENT ? strpbrk(cells[i], ".,") : NULL;

            mark = sign ? *sign : '\0';
        }
    free(cells);
    return mark != '\0' ? mark : p->delimiter == ';' ? ',' : '.';
}

static bc_status take_csv(stream_plan *p, beginning *b, const char *text, size_t length, size_t *header, bc_error *err)
{
    const char *names = p->a->value[OPTION_columns];
    const size_t bare = without_end(p, text, length);
    bc_status status = names ? name_columns(p, ',', names, strlen(names), 0, err) : name_columns(p, p->delimiter, text, bare, b->line, err);

    if (status == BC_OK)
        status = settle_columns(p, err);
    if (status != BC_OK)
        return status;
    *header = names ? p->mark_length : b->at;
    if (p->delimiter == ',' && p->mark == ',')
        return bc_fail(err, BC_ERR_USAGE, "--decimal comma: cells are parted by commas; a log with decimal commas parts them by semicolons or tabs");
    if (p->delimiter == ',')
        p->mark = '.';
    if (names)
        b->at = p->mark_length;
    if (p->mark == '\0')
        p->mark = find_mark(p, *b);
    return BC_OK;
}

static bc_status take_ndjson(stream_plan *p, const beginning *b, const char *text, size_t length, size_t *header, bc_error *err)
{
    const char *names = p->a->value[OPTION_columns];
    const size_t bare = without_end(p, text, length);
    const bc_status status = names ? name_columns(p, ',', names, strlen(names), 0, err) : name_keys(p, text, bare, b->line, err);

    p->delimiter = ',';
    p->mark = '.';
    p->line_end = "\n";
    *header = p->mark_length;
    return status == BC_OK ? settle_columns(p, err) : status;
}

static size_t mark_of(const char *text, size_t length)
{
    return length >= strlen(BOM) && memcmp(text, BOM, strlen(BOM)) == 0 ? strlen(BOM) : 0;
}

/* An object, by its first byte: its quotes are not those of CSV. */
static bool is_ndjson(const stream_plan *p, const char *text, size_t length)
{
    const char *form = p->a->value[OPTION_form];
    size_t at = 0;

    while (at < length && is_space(text[at]))
        at++;
    return form ? form[0] == 'n' : at < length && text[at] == '{';
}

/* The header, or the first analysis: cut as a row of commas it shows its delimiter, by which it is then cut. */
static bool cut_first(stream_plan *p, beginning *b, const char **text, size_t *length)
{
    beginning at = *b;

    p->form = is_ndjson(p, b->text + b->at, b->length - b->at) ? STREAM_NDJSON : STREAM_CSV;
    p->delimiter = ',';
    if (!next_row(p, &at, text, length))
        return false;
    if (p->form == STREAM_CSV)
        p->delimiter = log_delimiter(*text, without_end(p, *text, *length));
    return next_row(p, b, text, length);
}

/* The first row names the columns and the second shows the decimal mark; an object does both. */
bool stream_has_beginning(stream_plan *p, const char *text, size_t length)
{
    beginning b = {text, length, mark_of(text, length), false, 0};
    const char *row = NULL;
    size_t row_length = 0;

    if (!cut_first(p, &b, &row, &row_length))
        return false;
    if (p->form == STREAM_NDJSON)
        return true;
    b.at = p->has_header ? b.at : mark_of(text, length);
    return next_row(p, &b, &row, &row_length);
}

bc_status stream_find_columns(stream_plan *p, const char *text, size_t length, bool last, size_t *header, bc_error *err)
{
    const size_t mark = mark_of(text, length);
    beginning b = {text, length, mark, last, 0};
    const char *row = text;
    size_t row_length = 0;

    p->mark_length = mark;
    if (!cut_first(p, &b, &row, &row_length) && !(last && p->is_part))
        return bc_fail_at(err, BC_ERR_INPUT, p->path, 0, last ? "the log is empty; its first row names the columns" : "the first row is longer than 256 KiB; is it a log?");
    if (p->form == STREAM_NDJSON)
        return take_ndjson(p, &b, row, row_length, header, err);
    return take_csv(p, &b, row, row_length, header, err);
}

/* Adds a text; returns behind it. */
static char *add(char *to, const char *text)
{
    while (*text != '\0')
        *to++ = *text++;
    return to;
}

size_t stream_put_header(const stream_plan *p, const char *text, size_t length, char *out)
{
    size_t bare = length;
    char *to = out;

    while (bare > 0 && (text[bare - 1] == '\n' || text[bare - 1] == '\r'))
        bare--;
    memcpy(to, text, bare);
    to += bare;
    for (size_t i = 0; i < p->figure_count; i++) {
        *to++ = p->delimiter;
        to = add(to, p->figures[i].heading);
    }
    if (p->contract) {
        *to++ = p->delimiter;
        to = add(to, "contract");
    }
    *to++ = p->delimiter;
    to = add(to, "reason");
    *to++ = p->delimiter;
    to = add(to, "flags");
    to = add(to, p->line_end);
    return (size_t)(to - out);
}
