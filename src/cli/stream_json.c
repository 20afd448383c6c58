/* SPDX-License-Identifier: MIT */
/* stream_json.c - a row of NDJSON: one flat object a line, its own text kept and the results put in before its end. */
#include "cli/stream_result.h"

#include "base/text.h"
#include "cli/json_memory.h"

#include <jansson.h>
#include <stdio.h>
#include <string.h>

static void refuse(stream_reading *r, const char *name, const char *what)
{
    if (r->reason[0] == '\0')
        (void)snprintf(r->reason, sizeof r->reason, "'%.60s' %.100s", name, what);
}

/* Numbers as they are; texts such as "<0.01" as a cell of CSV would be read. */
static void take_number(const stream_plan *p, stream_reading *r, size_t column, const json_t *value)
{
    const char *name = p->header.columns[column].name;

    if (!json_is_number(value)) {
        refuse(r, name, "is neither a number nor a text");
        return;
    }
    const double number = json_number_value(value);

    if (p->columns[column].kind == LOG_FLOW)
        r->flow = number;
    else if (number < 0.0)
        refuse(r, name, "is negative, and no share is");
    else
        stream_reading_add(p, r, column, number);
}

/* Texts become cells; what was a number already becomes a cell that is passed over. */
static void take_values(const stream_plan *p, stream_batch *b, stream_reading *r, const json_t *object)
{
    char cells[LOG_COLUMNS_MAX][LOG_CELL_MAX] BC_UNFILLED;
    bool is_cell[LOG_COLUMNS_MAX];

    for (size_t i = 0; i < p->column_count; i++) {
        const json_t *value = json_object_get(object, p->names[i]);

        cells[i][0] = '\0';
        is_cell[i] = !value || json_is_null(value) || json_is_string(value);
        if (value && json_is_string(value))
            (void)snprintf(cells[i], LOG_CELL_MAX, "%s", json_string_value(value));
        else if (!is_cell[i] && (p->columns[i].kind == LOG_FLOW || p->columns[i].kind == LOG_COMPONENT))
            take_number(p, r, i, value);
    }
    stream_read_cells(p, b, r, cells, is_cell);
}

static void read_row(const stream_plan *p, stream_batch *b, stream_reading *r, const char *text, size_t length, bool *whole)
{
    json_error_t cause;
    json_t *object = json_loadb(text, length, JSON_REJECT_DUPLICATES, &cause);
    char shown[80];

    *whole = object && json_is_object(object);
    if (*whole) {
        take_values(p, b, r, object);
    } else {
        bc_text_show(shown, sizeof shown, object ? "the line is no object" : cause.text);
        (void)snprintf(r->reason, sizeof r->reason, "no JSON object: %s", shown);
    }
    if (json_memory_was_short())
        b->status = BC_ERR_MEMORY;
    json_decref(object);
}

/* A text of JSON; bytes that are no ASCII may be no UTF-8, and stand as '?'. */
static void put_text(stream_batch *b, const char *text, size_t length)
{
    for (size_t i = 0; i < length; i++) {
        const char c = text[i];

        if (c == '"' || c == '\\')
            stream_put(b, "\\", 1);
        stream_put(b, c >= 0x20 && c < 0x7f ? &c : "?", 1);
    }
}

static void put_member(stream_batch *b, const char *key, const char *value, size_t length, bool is_text)
{
    stream_put(b, ",\"", 2);
    put_text(b, key, strlen(key));
    stream_put(b, is_text ? "\":\"" : "\":", is_text ? 3 : 2);
    if (is_text)
        put_text(b, value, length);
    else
        stream_put(b, length > 0 ? value : "null", length > 0 ? length : 4);
    stream_put(b, "\"", is_text ? 1 : 0);
}

/* The object without its closing brace; a line that is none becomes a text in one. */
static void put_row(stream_batch *b, const char *text, size_t length, bool whole)
{
    size_t end = length;

    if (!whole) {
        stream_put(b, "{\"line\":\"", 9);
        put_text(b, text, length);
        stream_put(b, "\"", 1);
        return;
    }
    while (end > 0 && text[end - 1] != '}')
        end--;
    for (end--; end > 0 && strchr(" \t", text[end - 1]);)
        end--;
    stream_put(b, text, end);
    if (end > 0 && text[end - 1] == '{')
        stream_put(b, "\"line\":null", 11);
}

void stream_json_row(const stream_plan *p, stream_batch *b, const char *text, size_t length, uint32_t line)
{
    stream_reading r BC_UNFILLED;
    stream_cells cells BC_UNFILLED;
    stream_mark mark = {.line = line};
    bool whole = false;

    while (length > 0 && (text[length - 1] == '\n' || text[length - 1] == '\r'))
        length--;
    stream_reading_start(&r);
    read_row(p, b, &r, text, length, &whole);
    stream_evaluate(p, b, &r, &mark, &cells);
    put_row(b, text, length, whole);
    for (size_t i = 0; i < p->figure_count; i++)
        put_member(b, p->figures[i].heading, cells.figure[i], cells.length[i], false);
    if (p->contract)
        put_member(b, "contract", cells.verdict, strlen(cells.verdict), true);
    put_member(b, "reason", r.reason, strlen(r.reason), true);
    stream_put(b, ",\"flags\":\"", 10);
    mark.end = b->out_length;
    stream_put(b, "\"}\n", 3);
    stream_add_mark(b, &mark, &r);
}
