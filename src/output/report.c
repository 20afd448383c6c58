/* SPDX-License-Identifier: MIT */
/* report.c - the life of a report: its memory from opening to closing. */
#include "output/report.h"

#include "output/report_internal.h"

#include <stdint.h>
#include <stdlib.h>
#include <string.h>

/* A list is full exactly when its length is 0 or a power of two, so no capacity need be kept. */
void *report_grow(report *r, void *items, size_t count, size_t size)
{
    void *grown = items;

    if ((count & (count - 1)) == 0) {
        const size_t capacity = count == 0 ? 1 : 2 * count;
        grown = count <= SIZE_MAX / 2 / size ? realloc(items, capacity * size) : NULL;
    }
    if (grown == NULL)
        r->failed = true;
    return grown;
}

char *report_copy(report *r, const char *text)
{
    const char *from = text == NULL ? "" : text;
    const size_t size = strlen(from) + 1;
    char *to = malloc(size);

    if (to == NULL)
        r->failed = true;
    else
        memcpy(to, from, size);
    return to;
}

void report_open(report *r, const char *version, const char *command, const char *title)
{
    memset(r, 0, sizeof *r);
    r->version = report_copy(r, version);
    r->command = report_copy(r, command);
    r->title = report_copy(r, title);
}

void report_free_gas(report_gas *gas)
{
    for (size_t i = 0; i < gas->fraction_count; i++)
        free(gas->fractions[i].id);
    free(gas->fractions);
    free(gas->name);
    free(gas->source);
    free(gas->role);
}

void report_free_result(report_result *result)
{
    free(result->id);
    free(result->label);
    free(result->unit);
    free(result->method);
    free(result->note);
}

void report_free_column(report_column *column)
{
    free(column->id);
    free(column->heading);
    free(column->unit);
}

void report_free_table(report_table *table)
{
    for (size_t i = 0; i < table->column_count; i++)
        report_free_column(&table->columns[i]);
    for (size_t i = 0; i < table->cell_count; i++)
        free(table->cells[i].text);
    free(table->columns);
    free(table->cells);
    free(table->id);
    free(table->title);
}

static void free_sections(report *r)
{
    for (size_t i = 0; i < r->section_count; i++) {
        free(r->sections[i].id);
        free(r->sections[i].title);
    }
    free(r->sections);
}

static void free_checks(report *r)
{
    for (size_t i = 0; i < r->check_count; i++) {
        free(r->checks[i].id);
        free(r->checks[i].detail);
    }
    free(r->checks);
}

static void free_warnings(report *r)
{
    for (size_t i = 0; i < r->warning_count; i++)
        free(r->warnings[i]);
    free(r->warnings);
}

void report_close(report *r)
{
    for (size_t i = 0; i < r->gas_count; i++)
        report_free_gas(&r->gases[i]);
    for (size_t i = 0; i < r->input_count; i++)
        report_free_input(&r->inputs[i]);
    free(r->inputs);
    for (size_t i = 0; i < r->result_count; i++)
        report_free_result(&r->results[i]);
    for (size_t i = 0; i < r->table_count; i++)
        report_free_table(&r->tables[i]);
    for (size_t i = 0; i < r->limit_count; i++)
        report_free_limit(&r->limits[i]);
    free(r->limits);
    free(r->limits_title);
    for (size_t i = 0; i < r->worst_count; i++)
        report_free_worst(&r->worst[i]);
    free(r->worst);
    for (size_t i = 0; i < r->chart_count; i++)
        report_free_chart(&r->charts[i]);
    free(r->gases);
    free(r->results);
    free(r->tables);
    free(r->charts);
    free_sections(r);
    free_checks(r);
    free_warnings(r);
    free(r->state.text);
    free(r->version);
    free(r->command);
    free(r->title);
    free(r->verdict);
    free(r->caution);
    memset(r, 0, sizeof *r);
}

bool report_ok(const report *r)
{
    return !r->failed;
}

void report_set_state(report *r, const report_state *state)
{
    char *text = report_copy(r, state->text);

    if (text == NULL)
        return;
    free(r->state.text);
    r->state = *state;
    r->state.text = text;
}

/* Puts a copy of text, or nothing for NULL, in the place of an older text. */
static void replace(report *r, char **place, const char *text)
{
    char *fresh = text == NULL ? NULL : report_copy(r, text);

    free(*place);
    *place = fresh;
}

void report_set_verdict(report *r, const char *text)
{
    replace(r, &r->verdict, text);
}

void report_judge(report *r, report_judgement judgement)
{
    r->judgement = judgement;
}

void report_set_caution(report *r, const char *text)
{
    replace(r, &r->caution, text);
}
