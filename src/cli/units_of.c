/* SPDX-License-Identifier: MIT */
/* units_of.c - the units a user asked for, and quantities printed in them. */
#include "base/error_internal.h"
#include "base/text.h"
#include "cli/cli.h"

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

/* The unit to print a quantity in: the first of the list that fits, else its own. */
static void choose_unit(const bc_quantity *quantity, const char *list, char *text, size_t size, bc_unit *unit)
{
    while (next_unit(&list, text, size))
        if (bc_unit_parse(text, unit, NULL) == BC_OK && fits_quantity(unit, quantity))
            return;
    (void)snprintf(text, size, "%s", quantity->unit);
    if (bc_unit_parse(text, unit, NULL) != BC_OK)
        *unit = (bc_unit){.factor = 1.0};
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
    bc_unit own;
    bc_unit shown;
    char unit[BC_WORD_MAX];
    char method[96];
    char id[BC_WORD_MAX];
    char label[BC_WORD_MAX];
    bc_status status = bc_quantity_evaluate(quantity, subject, &figure, err);

    if (status == BC_OK)
        status = bc_unit_parse(q->unit, &own, err);
    if (status != BC_OK)
        return status;
    choose_unit(q, a->value[OPTION_unit], unit, sizeof unit, &shown);
    const double factor = own.factor / shown.factor;
    const report_result result = {.id = id, .label = label, .unit = unit, .method = method, .section = where->section, .gas = where->gas,
                                  .value = figure.value * factor, .has_uncertainty = figure.has_u, .uncertainty = figure.u * factor,
                                  .digits = q->digits};

    (void)snprintf(id, sizeof id, "%s", q->id);
    (void)snprintf(label, sizeof label, "%s", q->label);
    method_of(q, subject->reference->state.edition, method, sizeof method);
    report_add_result(where->r, &result);
    return BC_OK;
}
