/* SPDX-License-Identifier: MIT */
/* stream_row.c - a row of CSV: read in one pass where it is plain, cell by cell where it is not. */
#include "cli/stream_result.h"

#include "base/digits.h"
#include "base/error_internal.h"
#include "base/text.h"
#include "bluecone/number.h"

#include <stdio.h>
#include <string.h>

/* ---- the plain row: no quotes, plain numbers, as many cells as columns ------------------------------------------- */

static const char *cell_end(const stream_plan *p, const char *text, const char *end)
{
    while (text < end && *text != p->delimiter)
        text++;
    return text;
}

/* Behind a number that fills its cell; NULL when it does not, or is negative. */
static const char *read_plain(const stream_plan *p, const char *text, const char *end, double *value)
{
    const char *behind = bc_digits_scan(text, end, p->mark, value);

    if (!behind || (behind < end && *behind != p->delimiter) || *value < 0.0)
        return NULL;
    return behind;
}

static const char *read_cell(const stream_plan *p, stream_batch *b, stream_reading *r, size_t column, const char *text, const char *end)
{
    double value = 0.0;
    const char *behind = NULL;

    if (p->columns[column].kind == LOG_COMPONENT) {
        behind = read_plain(p, text, end, &value);
        if (behind)
            stream_reading_add(p, r, column, value);
        return behind;
    }
    if (text < end && *text == '"')
        return NULL;
    if (p->columns[column].kind == LOG_FLOW) {
        behind = read_plain(p, text, end, &r->flow);
        return behind;
    }
    behind = cell_end(p, text, end);
    if (p->columns[column].kind == LOG_TIME && p->time_columns > 1)
        return NULL;
    if (p->columns[column].kind == LOG_TIME && !stream_read_time(b, r, text, (size_t)(behind - text)))
        r->flags |= 1U << STREAM_timeless;
    return behind;
}

static bool read_plain_row(const stream_plan *p, stream_batch *b, stream_reading *r, const char *text, const char *end)
{
    for (size_t i = 0; i < p->column_count; i++) {
        text = read_cell(p, b, r, i, text, end);
        if (!text || (text == end) != (i + 1 == p->column_count))
            return false;
        text++;
    }
    return true;
}

/* ---- any row ------------------------------------------------------------------------------------------------------- */

#define CELL_SHOWN 40

static void refuse(stream_reading *r, const char *what)
{
    if (r->reason[0] == '\0')
        (void)snprintf(r->reason, sizeof r->reason, "%s", what);
}

static void refuse_cell(stream_reading *r, const char *name, const char *cell, const char *why)
{
    char shown[CELL_SHOWN];

    bc_text_show(shown, sizeof shown, cell);
    if (r->reason[0] == '\0')
        (void)snprintf(r->reason, sizeof r->reason, "'%s' reads '%s', %s", name, shown, why);
}

/* Where cells are not parted by commas, one may be the decimal mark, as may a point. */
static bool read_number(const stream_plan *p, const char *cell, double *value)
{
    char text[LOG_CELL_MAX];

    (void)snprintf(text, sizeof text, "%s", cell);
    for (char *c = text; *c != '\0' && p->delimiter != ','; c++)
        if (*c == ',')
            *c = '.';
    return bc_number_parse(text, value, NULL) == BC_OK;
}

/* A share that is a thousand times too great shows in the sum; a flow that is so small shows nowhere. */
static bool read_flow(const stream_plan *p, const char *cell, double *value)
{
    return !(p->mark == ',' && log_is_grouped(cell)) && read_number(p, cell, value);
}

static void read_share(const stream_plan *p, stream_reading *r, size_t column, const char *cell)
{
    const char *name = p->header.columns[column].name;
    const char *text = bc_text_skip_space(cell);
    double value = 0.0;

    if (*text == '\0') {
        stream_reading_miss(r, column);
        return;
    }
    if (!read_number(p, *text == '<' ? text + 1 : text, &value)) {
        refuse_cell(r, name, cell, "which is no number");
        return;
    }
    if (value < 0.0)
        refuse_cell(r, name, cell, "and no share is negative");
    else if (*text == '<')
        r->flags |= 1U << STREAM_below;
    else
        stream_reading_add(p, r, column, value);
}

/* A date and a time in two columns are joined. */
static void read_time(const stream_plan *p, stream_batch *b, stream_reading *r, char (*cells)[LOG_CELL_MAX])
{
    char text[2 * LOG_CELL_MAX] = "";
    size_t used = 0;

    for (size_t i = 0; i < p->column_count; i++)
        if (p->columns[i].kind == LOG_TIME)
            used += (size_t)snprintf(text + used, sizeof text - used, "%s%s", used > 0 ? " " : "", bc_text_skip_space(cells[i]));
    while (used > 0 && (text[used - 1] == ' ' || text[used - 1] == '\t'))
        used--;
    text[used] = '\0';
    r->has_time = false;
    if (p->has_time && !stream_read_time(b, r, text, used))
        r->flags |= 1U << STREAM_timeless;
}

void stream_read_cells(const stream_plan *p, stream_batch *b, stream_reading *r, char (*cells)[LOG_CELL_MAX], const bool is_cell[])
{
    for (size_t i = 0; i < p->column_count; i++) {
        if (is_cell && !is_cell[i])
            continue;
        if (p->columns[i].kind == LOG_COMPONENT)
            read_share(p, r, i, cells[i]);
        else if (p->columns[i].kind == LOG_FLOW && (!read_flow(p, cells[i], &r->flow) || r->flow < 0.0))
            r->flow = -1.0;
    }
    read_time(p, b, r, cells);
}

/* A row taken apart, for the results must stand in their columns. */
typedef struct {
    const char *text, *end; /* behind it the results; cells without text beyond the last column are left out */
    size_t count;           /* of cells */
    bool open;              /* its last quote is not closed */
} row;

static bool is_empty(const char *text)
{
    return *bc_text_skip_space(text) == '\0';
}

/* Spreadsheets leave empty cells behind the last column. */
static void cut_empty(const stream_plan *p, row *at, char (*cells)[LOG_CELL_MAX])
{
    while (at->count > p->column_count && at->count <= LOG_COLUMNS_MAX && is_empty(cells[at->count - 1])) {
        while (at->end[-1] != p->delimiter)
            at->end--;
        at->end--;
        at->count--;
    }
}

static void read_any_row(const stream_plan *p, stream_batch *b, stream_reading *r, row *at)
{
    char cells[LOG_COLUMNS_MAX][LOG_CELL_MAX] BC_UNFILLED;
    const size_t length = (size_t)(at->end - at->text);
    const stream_cut cut = stream_split(p->delimiter, at->text, length, cells, &at->count);

    stream_reading_start(r);
    at->open = cut != STREAM_CUT_WHOLE && stream_is_open(p->delimiter, at->text, length);
    if (memchr(at->text, '\0', length))
        refuse(r, "it holds a NUL byte");
    else if (cut != STREAM_CUT_WHOLE)
        refuse(r, cut == STREAM_CUT_OPEN ? "a quote opens and does not close its cell" : "text follows behind the quote that closes a cell");
    else
        cut_empty(p, at, cells);
    if (r->reason[0] == '\0' && at->count != p->column_count)
        (void)snprintf(r->reason, sizeof r->reason, "it has %zu cells, but there are %zu columns", at->count, p->column_count);
    if (r->reason[0] == '\0')
        stream_read_cells(p, b, r, cells, NULL);
}

/* ---- the results behind it ------------------------------------------------------------------------------------------ */

/* A text as a cell of the dialect. */
static void put_text(const stream_plan *p, stream_batch *b, const char *text)
{
    const char special[] = {p->delimiter, '"', '\n', '\r', '\0'};

    if (text[strcspn(text, special)] == '\0') {
        stream_put(b, text, strlen(text));
        return;
    }
    stream_put(b, "\"", 1);
    for (; *text != '\0'; text++)
        stream_put(b, *text == '"' ? "\"\"" : text, *text == '"' ? 2 : 1);
    stream_put(b, "\"", 1);
}

static void put_results(const stream_plan *p, stream_batch *b, const stream_reading *r, stream_mark *mark, const stream_cells *cells)
{
    for (size_t i = 0; i < p->figure_count; i++) {
        stream_put(b, &p->delimiter, 1);
        stream_put(b, cells->figure[i], cells->length[i]);
    }
    if (p->contract) {
        stream_put(b, &p->delimiter, 1);
        put_text(p, b, cells->verdict);
    }
    stream_put(b, &p->delimiter, 1);
    put_text(p, b, r->reason);
    stream_put(b, &p->delimiter, 1);
    mark->end = b->out_length;
}

static void put_row(const stream_plan *p, stream_batch *b, const row *at)
{
    stream_put(b, at->text, (size_t)(at->end - at->text));
    if (at->open)
        stream_put(b, "\"", 1);
    for (size_t i = at->count; i < p->column_count; i++)
        stream_put(b, &p->delimiter, 1);
}

static void work_row(const stream_plan *p, stream_batch *b, const char *text, size_t length, uint32_t line)
{
    const size_t feed = length > 0 && text[length - 1] == '\n' ? 1 : 0;
    const size_t ending = feed && length > 1 && text[length - 2] == '\r' ? 2 : feed;
    const char *end = text + length - ending;
    row at = {text, end, p->column_count, false};
    stream_reading r BC_UNFILLED;
    stream_cells cells BC_UNFILLED;
    stream_mark mark = {.line = line};

    stream_reading_start(&r);
    if (!read_plain_row(p, b, &r, text, end))
        read_any_row(p, b, &r, &at);
    stream_evaluate(p, b, &r, &mark, &cells);
    put_row(p, b, &at);
    put_results(p, b, &r, &mark, &cells);
    stream_put(b, feed ? end : p->line_end, feed ? ending : strlen(p->line_end));
    stream_add_mark(b, &mark, &r);
}

static bool is_blank(const char *text, size_t length)
{
    for (size_t i = 0; i < length; i++)
        if (text[i] != ' ' && text[i] != '\t' && text[i] != '\r' && text[i] != '\n')
            return false;
    return true;
}

void stream_work(const stream_plan *p, stream_batch *b)
{
    b->out_length = 0;
    b->count = 0;
    b->refused = 0;
    b->lines = 0;
    b->status = BC_OK;
    for (size_t at = 0; at < b->in_length;) {
        const char *text = b->in + at;
        const size_t length = stream_row_end(p, text, b->in_length - at, true);

        if (!stream_make_room(p, b, length)) {
            b->status = BC_ERR_MEMORY;
            return;
        }
        if (is_blank(text, length))
            stream_put(b, text, length);
        else if (p->form == STREAM_NDJSON)
            stream_json_row(p, b, text, length, b->lines);
        else
            work_row(p, b, text, length, b->lines);
        if (b->status != BC_OK)
            return;
        b->lines += memchr(text, '\n', length - 1) ? stream_count_lines(text, length) : 1;
        b->out_length = p->drops ? 0 : b->out_length;
        at += length;
    }
}
