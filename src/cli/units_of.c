/* SPDX-License-Identifier: MIT */
/* units_of.c - the units a user asked for, and quantities printed in them. */
#include "base/error_internal.h"
#include "base/text.h"
#include "cli/figures.h"

#include <math.h>
#include <stdio.h>
#include <string.h>

/* The next unit of a comma-separated list; false at the end or when it is too long. */
static bool next_unit(const char **list, char *unit, size_t size)
{
    if (!*list || **list == '\0')
        return false;
    const size_t length = strcspn(*list, ",");
    const bool fits = bc_text_copy(unit, size, *list, length);

    *list += length + ((*list)[length] == ',');
    return fits;
}

static bool fits_quantity(const bc_unit *unit, const bc_quantity *quantity)
{
    bc_unit own;

    return bc_unit_parse(quantity->unit, &own, NULL) == BC_OK && bc_unit_matches(unit, &own);
}

/* A unit such as scf or Nm3 counts gas at its own metering temperature: at another one it would lie. */
static bc_status check_metering(const char *text, const bc_unit *unit, const bc_state *state, bc_error *err)
{
    if (!unit->has_metering || fabs(unit->metering_c - state->metering_c) < 0.01)
        return BC_OK;
    if (fabs(unit->metering_c - 60.0 / 1.8 + 32.0 / 1.8) < 1e-6)
        return bc_fail(err, BC_ERR_USAGE, "--unit %s counts gas metered at 60 F, but the state meters at %.6g C; write --at 60F/60F, or take m3 or ft3",
                       text, state->metering_c);
    return bc_fail(err, BC_ERR_USAGE, "--unit %s counts gas metered at %g C, but the state meters at %.6g C; write --at %.6g/%g, or take m3 or ft3", text,
                   unit->metering_c, state->metering_c, state->combustion_c, unit->metering_c);
}

/* hhv-mass is of another basis than hhv. */
static bool is_of_other_basis(const char *id, const char *than)
{
    const size_t length = strlen(than);

    return strncmp(id, than, length) == 0 && id[length] == '-';
}

static bc_status check_unit(const char *text, const bc_state *state, const size_t quantities[], size_t count, bc_error *err)
{
    bc_unit unit;
    bc_status status = bc_unit_parse(text, &unit, err);

    if (status == BC_OK)
        status = check_metering(text, &unit, state, err);
    if (status != BC_OK)
        return status;
    for (size_t i = 0; i < count; i++)
        if (fits_quantity(&unit, bc_quantity_at(quantities[i])))
            return BC_OK;
    const bc_quantity *first = bc_quantity_at(quantities[0]);

    if (strcmp(first->unit, "1") == 0)
        return bc_fail(err, BC_ERR_USAGE, "--unit %s fits none of the quantities; %s is a pure number (bluecone list quantities)", text, first->id);
    for (size_t i = 0; i < bc_quantity_count(); i++)
        if (is_of_other_basis(bc_quantity_at(i)->id, first->id) && fits_quantity(&unit, bc_quantity_at(i)))
            return bc_fail(err, BC_ERR_USAGE, "--unit %s fits none of the quantities; %s is in %s; write %s for that basis", text, first->id,
                           first->unit, bc_quantity_at(i)->id);
    return bc_fail(err, BC_ERR_USAGE, "--unit %s fits none of the quantities; %s is in %s; ask for one on that basis (bluecone list quantities)",
                   text, first->id, first->unit);
}

bc_status units_check(const arguments *a, const bc_state *state, const size_t quantities[], size_t count, bc_error *err)
{
    const char *list = a->value[OPTION_unit];
    char unit[BC_WORD_MAX];

    if (list && *list == '\0')
        return bc_fail(err, BC_ERR_USAGE, "--unit needs a unit, as kWh/m3");
    while (next_unit(&list, unit, sizeof unit)) {
        const bc_status status = check_unit(unit, state, quantities, count, err);

        if (status != BC_OK)
            return status;
    }
    return list && *list != '\0' ? bc_fail(err, BC_ERR_USAGE, "--unit: a unit is longer than %d characters", BC_WORD_MAX - 1) : BC_OK;
}

/* The unit to print a figure in: the first of the list that fits its own, else its own. */
static void choose_unit(const char *own_text, const char *list, char *text, size_t size, bc_unit *own, bc_unit *unit)
{
    if (bc_unit_parse(own_text, own, NULL) != BC_OK)
        *own = (bc_unit){.factor = 1.0};
    while (next_unit(&list, text, size))
        if (bc_unit_parse(text, unit, NULL) == BC_OK && bc_unit_matches(unit, own))
            return;
    (void)snprintf(text, size, "%s", own_text);
    *unit = *own;
}

void unit_for(const arguments *a, const char *own, char *text, size_t size)
{
    bc_unit from;
    bc_unit to;

    choose_unit(own, a->value[OPTION_unit], text, size, &from, &to);
}

void report_in_units(const slot *where, const arguments *a, const report_result *result)
{
    char text[BC_WORD_MAX];
    report_result r = *result;
    bc_unit own;
    bc_unit shown;

    choose_unit(result->unit, a->value[OPTION_unit], text, sizeof text, &own, &shown);
    r.section = where->section;
    r.gas = where->gas;
    r.unit = text;
    r.value = bc_unit_from_si(&shown, bc_unit_to_si(&own, result->value));
    r.uncertainty = result->uncertainty * own.factor / shown.factor; /* a difference: no offset */
    report_add_result(where->r, &r);
}

static void method_of(const bc_quantity *quantity, int edition, char *text, size_t size)
{
    if (strcmp(quantity->method, "ISO 6976") == 0)
        (void)snprintf(text, size, "ISO 6976:%d", edition);
    else
        (void)snprintf(text, size, "%s", quantity->method);
}

bc_status report_quantity(const slot *where, size_t quantity, const bc_subject *subject, const arguments *a, bc_error *err)
{
    const bc_quantity *q = bc_quantity_at(quantity);
    bc_figure figure;
    char unit[BC_WORD_MAX];
    char method[96];
    char id[BC_WORD_MAX];
    char label[BC_WORD_MAX];
    const bc_status status = bc_quantity_evaluate(quantity, subject, &figure, err);

    if (status != BC_OK)
        return status;
    const report_result result = {.id = id, .label = label, .unit = unit, .method = method, .value = figure.value,
                                  .has_uncertainty = figure.has_u, .uncertainty = figure.u, .digits = q->digits};

    (void)snprintf(id, sizeof id, "%s", q->id);
    (void)snprintf(label, sizeof label, "%s", q->label);
    (void)snprintf(unit, sizeof unit, "%s", q->unit);
    method_of(q, subject->reference->state.edition, method, sizeof method);
    report_in_units(where, a, &result);
    return BC_OK;
}

void add_figures(const slot *where, const arguments *a, const plain_figure figures[], size_t count)
{
    for (size_t i = 0; i < count; i++) {
        char text[4][96];
        const report_result result = {.id = text[0], .label = text[1], .unit = text[2], .method = text[3], .value = figures[i].value,
                                      .digits = figures[i].digits};

        (void)snprintf(text[0], sizeof text[0], "%s", figures[i].id);
        (void)snprintf(text[1], sizeof text[1], "%s", figures[i].label);
        (void)snprintf(text[2], sizeof text[2], "%s", figures[i].unit);
        (void)snprintf(text[3], sizeof text[3], "%s", figures[i].method);
        report_in_units(where, a, &result);
    }
}

static bool is_used(const report *r, const char *unit)
{
    for (size_t i = 0; i < r->result_count; i++)
        if (strcmp(r->results[i].unit, unit) == 0)
            return true;
    return false;
}

bc_status check_units_used(const report *r, const arguments *a, bc_error *err)
{
    const char *list = a->value[OPTION_unit];
    char text[BC_WORD_MAX];
    bc_unit unit;

    while (next_unit(&list, text, sizeof text)) {
        const bc_status status = bc_unit_parse(text, &unit, err);

        if (status != BC_OK)
            return status;
        if (unit.has_metering && fabs(unit.metering_c - r->state.metering_c) > 0.01)
            return bc_fail(err, BC_ERR_USAGE, "--unit %s counts gas metered at %.4g C, but the state meters at %.6g C", text, unit.metering_c,
                           r->state.metering_c);
        if (!is_used(r, text))
            return bc_fail(err, BC_ERR_USAGE, "--unit %s fits none of the figures of this report", text);
    }
    return BC_OK;
}
