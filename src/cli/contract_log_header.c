/* SPDX-License-Identifier: MIT */
/* contract_log_header.c - what the columns of a log are: time, flow, components, and what is of no use. */
#include "cli/contract_log.h"

#include "base/error_internal.h"
#include "base/text.h"

#include <stdio.h>
#include <stdlib.h>
#include <string.h>

void log_remark(log_case *l, const char *text)
{
    if (l->remark_count < BC_REMARK_MAX)
        (void)snprintf(l->remarks[l->remark_count++], BC_REMARK_BYTES, "%s", text);
}

/* A heading in its parts: "flow [m3/h]", "Methane (mol %)", "CH4 %". */
typedef struct {
    char word[LOG_CELL_MAX], unit[LOG_CELL_MAX];
} heading;

static void take_apart(const char *text, heading *h)
{
    const size_t length = strlen(text);
    const char last = length > 0 ? text[length - 1] : '\0';
    const char *opens = last == ']' ? strrchr(text, '[') : last == ')' ? strrchr(text, '(') : NULL;

    h->unit[0] = '\0';
    if (!opens && last == '%')
        opens = text + length - 1;
    if (opens && last == '%')
        (void)snprintf(h->unit, sizeof h->unit, "%%");
    else if (opens)
        (void)bc_text_copy(h->unit, sizeof h->unit, opens + 1, (size_t)(text + length - 1 - (opens + 1)));
    (void)bc_text_copy(h->word, sizeof h->word, text, opens ? (size_t)(opens - text) : length);
}

static bool is_time(const char *word)
{
    static const char *const WORDS[] = {"time", "timestamp", "date", "datetime"};

    for (size_t i = 0; i < BC_COUNT(WORDS); i++)
        if (bc_text_same(word, WORDS[i]))
            return true;
    return false;
}

static bc_status take_flow(log_case *l, log_column *column, const heading *h, int line, bc_error *err)
{
    char one[LOG_CELL_MAX + 4];

    if (l->has_flow)
        return bc_fail_at(err, BC_ERR_INPUT, l->path, line, "two columns of flow; keep the one that the analyses belong to");
    (void)snprintf(one, sizeof one, "1 %s", h->unit);
    if (h->unit[0] == '\0' || bc_flow_parse(one, &column->flow, NULL) != BC_OK)
        return bc_fail_at(err, BC_ERR_INPUT, l->path, line, "the column of flow needs its unit, as flow [m3/h], [kg/h] or [kmol/h]");
    column->kind = LOG_FLOW;
    l->has_flow = true;
    return BC_OK;
}

/* A formula of several species must not be passed over as a word that nobody knows. */
static bool is_formula(const char *word)
{
    for (size_t i = 0; i < bc_species_count(); i++)
        if (bc_text_same(word, bc_species_formula(i)))
            return true;
    return false;
}

static bc_status take_unit(const log_case *l, log_column *column, const char *unit, int line, bc_error *err)
{
    static const struct {
        const char *word;
        double fraction;
    } UNITS[] = {{"", 1e-2}, {"%", 1e-2}, {"mol%", 1e-2}, {"mole%", 1e-2}, {"%mol", 1e-2}, {"ppm", 1e-6}, {"molppm", 1e-6}};
    char shown[LOG_CELL_MAX];

    for (size_t i = 0; i < BC_COUNT(UNITS); i++)
        if (bc_text_same(unit, UNITS[i].word)) {
            column->fraction = UNITS[i].fraction;
            return BC_OK;
        }
    bc_text_show(shown, sizeof shown, unit);
    return bc_fail_at(err, BC_ERR_INPUT, l->path, line, "a component in '%s' is not understood; logs are in mol %% or ppm (mole)", shown);
}

static bool is_same_component(const log_column *a, const log_column *b)
{
    for (size_t i = 0; i < BC_COUNT(a->parts); i++)
        if (a->parts[i] < b->parts[i] || a->parts[i] > b->parts[i])
            return false;
    return true;
}

static bc_status check_twice(const log_case *l, const log_column *column, int line, bc_error *err)
{
    for (size_t i = 0; i < l->column_count; i++) {
        const log_column *other = &l->columns[i];

        if (other->kind == LOG_COMPONENT && is_same_component(other, column))
            return bc_fail_at(err, BC_ERR_INPUT, l->path, line, "'%s' and '%s' are the same component; keep one of them", other->name, column->name);
    }
    return BC_OK;
}

/* A component is what the literal `word=100` would be: species, cuts with their default split, air. */
static bc_status take_component(log_case *l, log_column *column, const heading *h, int line, bc_error *err)
{
    char literal[LOG_CELL_MAX + 8];
    bc_composition *c = malloc(sizeof *c);

    if (!c)
        return bc_fail(err, BC_ERR_MEMORY, "not enough memory for a composition");
    (void)snprintf(literal, sizeof literal, "%s=100", h->word);
    for (char *p = literal; *p != '\0'; p++)
        if (*p == ',')
            *p = '-';
    bc_error cause;
    bc_status status = bc_composition_parse(literal, c, &cause);

    if (status == BC_OK) {
        memcpy(column->parts, c->entries[0].parts, sizeof column->parts);
        column->kind = LOG_COMPONENT;
        for (size_t i = 0; i < c->remark_count; i++)
            log_remark(l, c->remarks[i]);
        status = check_twice(l, column, line, err);
        status = status == BC_OK ? take_unit(l, column, h->unit, line, err) : status;
    } else {
        status = is_formula(h->word) ? bc_fail_at(err, BC_ERR_INPUT, l->path, line, "%s", cause.message) : BC_OK;
    }
    free(c);
    return status;
}

static bc_status take_column(log_case *l, const char *text, int line, bc_error *err)
{
    log_column *column = &l->columns[l->column_count];
    bc_status status = BC_OK;
    heading h;

    memset(column, 0, sizeof *column);
    take_apart(text, &h);
    bc_text_show(column->name, sizeof column->name, h.word);
    if (is_time(h.word))
        column->kind = LOG_TIME;
    else if (bc_text_same(h.word, "flow"))
        status = take_flow(l, column, &h, line, err);
    else if (h.word[0] != '\0')
        status = take_component(l, column, &h, line, err);
    if (column->name[0] == '\0')
        (void)snprintf(column->name, sizeof column->name, "number %zu", l->column_count + 1);
    l->column_count++;
    return status;
}

static size_t count_kind(const log_case *l, log_column_kind kind)
{
    size_t count = 0;

    for (size_t i = 0; i < l->column_count; i++)
        count += l->columns[i].kind == kind;
    return count;
}

/* Columns that nothing is made of are named. */
static void tell_ignored(log_case *l)
{
    char text[BC_REMARK_BYTES] = "Columns of the log that are ignored: ";
    size_t told = 0;

    for (size_t i = 0; i < l->column_count; i++) {
        const size_t used = strlen(text);

        if (l->columns[i].kind != LOG_IGNORED)
            continue;
        if (used + strlen(l->columns[i].name) + 8 < sizeof text)
            (void)snprintf(text + used, sizeof text - used, "%s%s", told > 0 ? ", " : "", l->columns[i].name);
        else if (strcmp(text + used - 3, "...") != 0)
            (void)snprintf(text + used, sizeof text - used, " ...");
        told++;
    }
    if (told > 0)
        log_remark(l, text);
}

bc_status log_take_header(log_case *l, int line, bc_error *err)
{
    for (size_t i = 0; i < l->cell_count; i++) {
        const bc_status status = take_column(l, l->cells[i], line, err);

        if (status != BC_OK)
            return status;
    }
    tell_ignored(l);
    if (count_kind(l, LOG_COMPONENT) == 0)
        return bc_fail_at(err, BC_ERR_INPUT, l->path, line, "no column is a component; the first row of a log names them, as in time,methane,ethane");
    if (count_kind(l, LOG_TIME) == 0)
        return bc_fail_at(err, BC_ERR_INPUT, l->path, line, "no column is the time; name it time, timestamp or date");
    if (count_kind(l, LOG_TIME) > 2)
        return bc_fail_at(err, BC_ERR_INPUT, l->path, line, "more than two columns of time; keep one, or a date and a time");
    return BC_OK;
}
