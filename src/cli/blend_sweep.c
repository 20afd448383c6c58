/* SPDX-License-Identifier: MIT */
/* blend_sweep.c - one share runs: a table of figures, the shares at which limits are crossed, what is allowed. */
#include "base/error_internal.h"
#include "base/text.h"
#include "cli/blend_sweep.h"
#include "cli/contract_report.h"
#include "cli/sheet.h"

#include <math.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>
#include <strings.h>

/* Shown when neither --show nor a contract says what matters. */
static const char DEFAULT_SHOW[] = "wobbe-gross,hhv,relative-density,air-demand,co2-factor-gross";

static bc_status add_quantity(sweep_table *t, const arguments *a, size_t quantity, bc_error *err)
{
    sweep_column *column = &t->column[t->count];

    if (t->count == SWEEP_COLUMNS_MAX)
        return bc_fail(err, BC_ERR_USAGE, "--show: more than %d quantities", SWEEP_COLUMNS_MAX);
    *column = (sweep_column){.is_limit = false, .index = quantity};
    (void)snprintf(column->id, sizeof column->id, "%s", bc_quantity_at(quantity)->id);
    unit_for(a, bc_quantity_at(quantity)->unit, column->unit, sizeof column->unit);
    t->count++;
    const bc_status status = bc_unit_parse(bc_quantity_at(quantity)->unit, &column->own, err);

    return status == BC_OK ? bc_unit_parse(column->unit, &column->shown, err) : status;
}

static bc_status add_every_quantity(sweep_table *t, const arguments *a, bc_error *err)
{
    for (size_t i = 0; i < bc_quantity_count(); i++) {
        const bc_status status = add_quantity(t, a, i, err);

        if (status != BC_OK)
            return status;
    }
    return BC_OK;
}

static bc_status add_shown(sweep_table *t, const arguments *a, const char *list, bc_error *err)
{
    while (*list != '\0') {
        const size_t length = strcspn(list, ",");
        char id[BC_WORD_MAX];
        size_t quantity = 0;

        if (!bc_text_copy(id, sizeof id, list, length) || id[0] == '\0')
            return bc_fail(err, BC_ERR_USAGE, "--show: a quantity is empty or too long; write them as hhv,wobbe-gross");
        bc_status status = bc_quantity_find(id, &quantity, err);

        if (status == BC_OK)
            status = add_quantity(t, a, quantity, err);
        if (status != BC_OK)
            return status;
        list += length + (list[length] == ',');
    }
    return BC_OK;
}

static void add_limits(sweep_table *t, const bc_contract *contract)
{
    for (size_t i = 0; i < contract->limit_count && t->count < SWEEP_COLUMNS_MAX; i++) {
        sweep_column *column = &t->column[t->count++];

        *column = (sweep_column){.is_limit = true, .index = i};
        (void)snprintf(column->id, sizeof column->id, "%s", contract->limits[i].id);
        (void)snprintf(column->unit, sizeof column->unit, "%s", contract->limits[i].unit);
    }
}

static bc_status choose_columns(sweep_table *t, const blend_case *c, bc_error *err)
{
    const char *show = c->a->value[OPTION_show];

    if (show && strcmp(show, "all") == 0)
        return add_every_quantity(t, c->a, err);
    if (!show && c->within) {
        add_limits(t, c->within);
        return BC_OK;
    }
    return add_shown(t, c->a, show ? show : DEFAULT_SHOW, err);
}

static bc_status check_units(const sweep_table *t, const blend_case *c, bc_error *err)
{
    size_t quantity[SWEEP_COLUMNS_MAX];
    size_t count = 0;

    for (size_t i = 0; i < t->count; i++)
        if (!t->column[i].is_limit)
            quantity[count++] = t->column[i].index;
    if (count > 0)
        return units_check(c->a, &c->parts.state, quantity, count, err);
    return c->a->value[OPTION_unit] ? bc_fail(err, BC_ERR_USAGE, "--unit is for quantities of --show: the limits keep the units of the contract") : BC_OK;
}

/* The swept share at the ends, and the rest beside it. */
static void make_line(const blend_case *c, bc_blend_line *line)
{
    const share_word *s = &c->share[c->swept];

    line->mixer = &c->mixer;
    for (size_t i = 0; i < c->count; i++)
        line->from[i] = line->to[i] = c->share[i].value;
    line->from[c->swept] = s->low;
    line->to[c->swept] = s->high;
    line->from[c->rest] = fmax(1.0 - c->fixed - s->low, 0.0);
    line->to[c->rest] = fmax(1.0 - c->fixed - s->high, 0.0);
}

double sweep_share_at(const sweep_table *t, double place)
{
    return (1.0 - place) * t->low + place * t->high;
}

size_t sweep_points(const sweep_table *t)
{
    const double steps = (t->high - t->low) / t->step;

    return (size_t)ceil(steps - 1e-9) + 1;
}

/* The last point is the end of the range even where the step does not meet it. */
double sweep_place(const sweep_table *t, size_t point)
{
    return fmin((double)point * t->step / (t->high - t->low), 1.0);
}

void sweep_row(const sweep_table *t, const blend_case *c, const bc_subject *gas, double row[])
{
    bc_quantity_values(t->wanted, gas, t->figure);
    for (size_t k = 0; k < t->count; k++) {
        const sweep_column *column = &t->column[k];

        if (!column->is_limit)
            row[k] = bc_unit_from_si(&column->shown, bc_unit_to_si(&column->own, t->figure[column->index]));
        else if (bc_limit_value(c->within, column->index, &gas->gas, &row[k], NULL) != BC_OK)
            row[k] = (double)NAN;
    }
}

static bc_status open_rows(sweep_table *t, size_t points, bc_error *err)
{
    t->wanted = calloc(bc_quantity_count(), sizeof *t->wanted);
    t->figure = calloc(bc_quantity_count(), sizeof *t->figure);
    t->value = malloc(points * t->count * sizeof *t->value);
    if (!t->wanted || !t->figure || !t->value)
        return bc_fail(err, BC_ERR_MEMORY, "not enough memory for %zu points", points);
    for (size_t k = 0; k < t->count; k++)
        if (!t->column[k].is_limit)
            t->wanted[t->column[k].index] = true;
    return BC_OK;
}

/* Subjects are made once a point. */
static bc_status evaluate(sweep_table *t, const blend_case *c, bc_error *err)
{
    const size_t points = sweep_points(t);

    if (t->count == 0)
        return bc_fail(err, BC_ERR_USAGE, "--show needs a quantity, as wobbe-gross,hhv");
    bc_status status = open_rows(t, points, err);

    for (size_t i = 0; status == BC_OK && i < points; i++) {
        const bc_gas gas = bc_line_gas(&t->line, sweep_place(t, i));
        bc_subject here;

        status = bc_subject_make(&c->parts.reference, &gas, NULL, &here, err);
        if (status == BC_OK)
            sweep_row(t, c, &here, &t->value[i * t->count]);
    }
    return status;
}

void sweep_heading(const blend_case *c, const sweep_column *column, char *text, size_t size)
{
    char state[64] = "";

    if (column->is_limit)
        contract_state_text(c->within, &c->within->limits[column->index], state, sizeof state);
    const char *at = state[0] == 'b' ? ", " : ", at "; /* "by mass" is no state */

    (void)snprintf(text, size, "%s%s%s", column->id, state[0] == '\0' ? "" : at, state);
}

static void add_table(report *r, const sweep_table *t, const blend_case *c)
{
    char title[BC_NAME_MAX + 64];

    (void)snprintf(title, sizeof title, "Share of %.100s, by %s", blend_part_name(c, c->swept), bc_blend_basis_text(c->by));
    const size_t table = report_add_table(r, "sweep", title);

    report_add_column(r, table, "share", "share", "%");
    for (size_t k = 0; k < t->count; k++) {
        char heading[SWEEP_HEADING_MAX];

        sweep_heading(c, &t->column[k], heading, sizeof heading);
        report_add_column(r, table, t->column[k].id, heading, strcmp(t->column[k].unit, "1") == 0 ? "" : t->column[k].unit);
    }
    for (size_t i = 0; i < sweep_points(t); i++) {
        report_add_number(r, table, 100.0 * sweep_share_at(t, sweep_place(t, i)), -1);
        for (size_t k = 0; k < t->count; k++) {
            const double value = t->value[i * t->count + k];

            if (isfinite(value))
                report_add_number(r, table, value, -1);
            else
                report_add_text(r, table, "-");
        }
    }
}

/* A picture is drawn where one is asked for; the other forms have the table. */
static bool wants_chart(const arguments *a)
{
    static const char *const PLAIN[] = {".txt", ".csv", ".json", ".ini"};
    const char *dot = a->value[OPTION_output] ? strrchr(a->value[OPTION_output], '.') : NULL;

    for (size_t i = 0; dot && i < BC_COUNT(PLAIN); i++)
        if (strcasecmp(dot, PLAIN[i]) == 0)
            return false;
    return dot && !a->value[OPTION_json] && !a->value[OPTION_csv];
}

static bc_status fill(report *r, sweep_table *t, blend_case *c, bool *allowed, bc_error *err)
{
    bc_status status = choose_columns(t, c, err);

    if (status == BC_OK)
        status = check_units(t, c, err);
    if (status == BC_OK)
        status = evaluate(t, c, err);
    if (status != BC_OK)
        return status;
    subjects_report(&c->parts, r);
    add_table(r, t, c);
    if (wants_chart(c->a))
        status = sweep_chart(r, t, c, err);
    *allowed = sweep_limits(r, t, c);
    report_set_caution(r, SHEET_CAUTION);
    return status;
}

int blend_sweep(blend_case *c, report *r)
{
    const share_word *s = &c->share[c->swept];
    sweep_table t = {.low = s->low, .high = s->high, .step = s->step};
    bool allowed = true;
    bc_error err;

    make_line(c, &t.line);
    const bc_status status = fill(r, &t, c, &allowed, &err);

    free(t.wanted);
    free(t.figure);
    free(t.value);
    if (status == BC_OK)
        return blend_answer(r, c, NULL, allowed ? 0 : 1);
    report_close(r);
    blend_close(c);
    return complain(&err);
}
