/* SPDX-License-Identifier: MIT */
/* report_add.c - what goes into a report: each item copied, or dropped when memory is short. */
#include "output/report.h"

#include "output/report_internal.h"

#include <assert.h>
#include <math.h>
#include <stdlib.h>
#include <string.h>

size_t report_add_gas(report *r, const char *name, const char *source, double sum_before)
{
    report_gas gas = {
        .name = report_copy(r, name), .source = report_copy(r, source), .sum_before = sum_before};
    report_gas *gases = report_grow(r, r->gases, r->gas_count, sizeof gas);

    if (gases != NULL)
        r->gases = gases;
    if (gases == NULL || gas.name == NULL || gas.source == NULL) {
        report_free_gas(&gas);
        return REPORT_NO_GAS;
    }
    gases[r->gas_count] = gas;
    return r->gas_count++;
}

/* Whether an index handed out earlier may be used: after a failed allocation it may be none. */
static bool is_there(const report *r, size_t index, size_t count)
{
    assert(index < count || r->failed);
    (void)r;
    return index < count;
}

void report_name_role(report *r, size_t gas, const char *role)
{
    if (is_there(r, gas, r->gas_count) && r->gases[gas].role == NULL)
        r->gases[gas].role = report_copy(r, role);
}

void report_add_fraction(report *r, size_t gas, const char *id, double x)
{
    if (!is_there(r, gas, r->gas_count))
        return;

    report_gas *to = &r->gases[gas];
    report_fraction *fractions = report_grow(r, to->fractions, to->fraction_count, sizeof *fractions);
    if (fractions == NULL)
        return;
    to->fractions = fractions;

    report_fraction fraction = {.id = report_copy(r, id), .x = x};
    if (fraction.id != NULL)
        fractions[to->fraction_count++] = fraction;
}

size_t report_add_section(report *r, const char *id, const char *title)
{
    report_section section = {.id = report_copy(r, id), .title = report_copy(r, title)};
    report_section *sections = report_grow(r, r->sections, r->section_count, sizeof section);

    if (sections != NULL)
        r->sections = sections;
    if (sections == NULL || section.id == NULL || section.title == NULL) {
        free(section.id);
        free(section.title);
        return (size_t)-1;
    }
    sections[r->section_count] = section;
    return r->section_count++;
}

/* Copies the texts of a result; false, with nothing held, when memory is short. */
static bool copy_result(report *r, const report_result *from, report_result *to)
{
    *to = *from;
    to->id = report_copy(r, from->id);
    to->label = report_copy(r, from->label);
    to->unit = report_copy(r, from->unit);
    to->method = report_copy(r, from->method);
    to->note = from->note == NULL ? NULL : report_copy(r, from->note);
    if (to->id != NULL && to->label != NULL && to->unit != NULL && to->method != NULL &&
        (to->note != NULL || from->note == NULL))
        return true;
    report_free_result(to);
    return false;
}

void report_add_result(report *r, const report_result *result)
{
    assert(isfinite(result->value));
    if (!is_there(r, result->section, r->section_count))
        return;
    if (result->gas != REPORT_NO_GAS && !is_there(r, result->gas, r->gas_count))
        return;

    report_result *results = report_grow(r, r->results, r->result_count, sizeof *results);
    if (results == NULL)
        return;
    r->results = results;
    if (copy_result(r, result, &results[r->result_count]))
        r->result_count++;
}

size_t report_add_table(report *r, const char *id, const char *title)
{
    report_table table = {.id = report_copy(r, id), .title = report_copy(r, title)};
    report_table *tables = report_grow(r, r->tables, r->table_count, sizeof table);

    if (tables != NULL)
        r->tables = tables;
    if (tables == NULL || table.id == NULL || table.title == NULL) {
        report_free_table(&table);
        return (size_t)-1;
    }
    tables[r->table_count] = table;
    return r->table_count++;
}

void report_lead_with(report *r, size_t table)
{
    if (table < r->table_count)
        r->tables[table].leads = true;
}

void report_add_column(report *r, size_t table, const char *id, const char *heading, const char *unit)
{
    if (!is_there(r, table, r->table_count))
        return;

    report_table *to = &r->tables[table];
    report_column column = {report_copy(r, id), report_copy(r, heading), report_copy(r, unit)};
    report_column *columns = report_grow(r, to->columns, to->column_count, sizeof column);

    if (columns != NULL)
        to->columns = columns;
    if (columns == NULL || column.id == NULL || column.heading == NULL || column.unit == NULL)
        report_free_column(&column);
    else
        columns[to->column_count++] = column;
}

/* Adds a cell and takes its text over. */
static void add_cell(report *r, size_t table, report_cell cell)
{
    report_cell *cells = NULL;

    if (is_there(r, table, r->table_count)) {
        report_table *to = &r->tables[table];
        cells = report_grow(r, to->cells, to->cell_count, sizeof cell);
        if (cells != NULL) {
            to->cells = cells;
            cells[to->cell_count++] = cell;
        }
    }
    if (cells == NULL)
        free(cell.text);
}

/* A cell whose text finds no memory stays, empty, lest the cells behind it change columns. */
void report_add_text(report *r, size_t table, const char *text)
{
    add_cell(r, table, (report_cell){.text = text == NULL ? NULL : report_copy(r, text)});
}

void report_add_number(report *r, size_t table, double number, int decimals)
{
    assert(isfinite(number));
    add_cell(r, table, (report_cell){.is_number = true, .number = number, .decimals = decimals});
}

void report_add_check(report *r, const char *id, bool ok, const char *detail)
{
    report_check check = {.id = report_copy(r, id), .detail = report_copy(r, detail), .ok = ok};
    report_check *checks = report_grow(r, r->checks, r->check_count, sizeof check);

    if (checks != NULL)
        r->checks = checks;
    if (checks == NULL || check.id == NULL || check.detail == NULL) {
        free(check.id);
        free(check.detail);
        return;
    }
    checks[r->check_count++] = check;
}

void report_add_warning(report *r, const char *text)
{
    for (size_t i = 0; i < r->warning_count; i++)
        if (strcmp(r->warnings[i], text) == 0)
            return;

    char **warnings = report_grow(r, r->warnings, r->warning_count, sizeof *warnings);
    if (warnings == NULL)
        return;
    r->warnings = warnings;
    warnings[r->warning_count] = report_copy(r, text);
    if (warnings[r->warning_count] != NULL)
        r->warning_count++;
}
