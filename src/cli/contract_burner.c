/* SPDX-License-Identifier: MIT */
/* contract_burner.c - what the gases that a contract allows do to a burner that is set on the present supply. */
#include "cli/contract_worst.h"

#include "base/error_internal.h"
#include "cli/burner_notes.h"
#include "cli/contract_burner.h"
#include "cli/sheet.h"

#include <math.h>
#include <stdio.h>

#define T0_K 273.15
#define PERCENT 100.0
#define ROWS_MAX 8

bc_status contract_burner_check(const arguments *a, bc_error *err)
{
    if (!a->value[OPTION_burner])
        return BC_OK;
    if (!a->value[OPTION_worst])
        return bc_fail(err, BC_ERR_USAGE, "--burner asks what the gases that a contract allows do to a burner: add --worst, or ask of one gas "
                                          "bluecone switch OLD GAS --burner FILE");
    if (!a->value[OPTION_against])
        return bc_fail(err, BC_ERR_USAGE, "--burner needs the gas that the burner was set on: name the present supply with --against GAS");
    return BC_OK;
}

bc_status contract_burner_load(contract_case *c, bc_error *err)
{
    const char *file = c->a->value[OPTION_burner];

    if (!file)
        return BC_OK;
    bc_status status = bc_burner_read(file, &c->burner, err);

    if (status == BC_OK)
        status = bc_burner_set(&c->burner, &c->gases.each[c->judged].subject, &c->set, err);
    c->has_burner = status == BC_OK;
    return status;
}

/* The rows of a burner; the heat input in watts only where it is known. */
static size_t rows_of(const contract_case *c, burner_row rows[ROWS_MAX])
{
    const bc_burner *b = &c->burner;
    const bc_burner_limit none = {.has_min = false}, air = {.has_min = true, .min = b->co_lambda};
    size_t n = 0;

    if (c->set.has_flow)
        rows[n++] = (burner_row){BC_BURNER_HEAT, "input-net", "kW", 1e-3 * c->set.input_w, 0.0, none};
    rows[n++] = (burner_row){BC_BURNER_HEAT, "heat-input-ratio", "%", PERCENT, 0.0, b->input};
    rows[n++] = (burner_row){BC_BURNER_LAMBDA, "lambda", "1", 1.0, 0.0, air};
    if (b->control == BC_CONTROL_TRIM_AIR || b->control == BC_CONTROL_TRIM_GAS)
        rows[n++] = (burner_row){BC_BURNER_TRIM, "trim-travel", "%", PERCENT, 0.0, none};
    rows[n++] = (burner_row){BC_BURNER_FLUE_O2, b->o2_basis == BC_FLUE_WET ? "flue-o2-wet" : "flue-o2-dry", "%", PERCENT, 0.0, b->o2};
    rows[n++] = (burner_row){BC_BURNER_FLAME, "flame-temperature-adiabatic", "C", 1.0, T0_K, b->flame};

    const burner_row velocity = {BC_BURNER_VELOCITY, "burning-velocity", "%", PERCENT, 0.0, b->velocity};
    const burner_row knock = {BC_BURNER_METHANE_NUMBER, "methane-number", "1", 1.0, 0.0, b->methane_number};

    if (burner_has_limit(&velocity))
        rows[n++] = velocity;
    if (burner_has_limit(&knock))
        rows[n++] = knock;
    return n;
}

/* What moves nothing, what the trim cannot hold, and where air is short. */
static void note_row(report *r, const contract_case *c, const burner_row *row, const bc_extremes *e)
{
    const double range = c->burner.trim_range;
    char text[300];

    if (e->min.exact && e->max.exact && e->max.value - e->min.value <= BC_WORST_EXACT * fabs(e->max.value)) {
        (void)snprintf(text, sizeof text, "On the burner %s is constant: the same with every allowed gas.", row->id);
        report_add_warning(r, text);
    }
    if (row->figure == BC_BURNER_TRIM && (burner_beyond(e->min.value, 1.0 - range, -1.0) || burner_beyond(e->max.value, 1.0 + range, 1.0))) {
        (void)snprintf(text, sizeof text, "On some allowed gases the trim is at the end of its range of %.3g %%: the flue oxygen is not held.", PERCENT * range);
        report_add_warning(r, text);
    }
    if (row->figure == BC_BURNER_LAMBDA && e->min.value < 1.0) {
        (void)snprintf(text, sizeof text, "On some allowed gases the burner lacks air (lambda %.3f): carbon monoxide forms.", e->min.value);
        report_add_warning(r, text);
    }
}

/* A figure that some allowed gas does not have, such as the air factor of one that does not burn, has no row. */
static void add_row(worst_case *w, report *r, size_t table, const burner_row *row, const bc_extremes *e, burner_tally *t)
{
    if (e) {
        const bc_extremes s = burner_shown(row, e);

        worst_add(w, r, &(worst_figure){row->id, row->unit, "on the burner"}, &s);
        note_row(r, w->c, row, e);
    }
    if (burner_has_limit(row))
        burner_judge(r, table, row, e, t);
}

bc_status worst_burner(worst_case *w, report *r, bool *good, bc_error *err)
{
    const size_t table = burner_limits_table(r, w->c);
    burner_row rows[ROWS_MAX];
    const size_t count = rows_of(w->c, rows);
    burner_tally t = {.broken = 0};
    bc_extremes e;
    bc_status status = BC_OK;

    for (size_t i = 0; i < count; i++) {
        if (i == 0 || rows[i].figure != rows[i - 1].figure) /* one figure in two units is asked once */
            status = bc_worst_burner(w->worst, &w->c->set, rows[i].figure, &e, err);
        if (status != BC_OK && status != BC_ERR_RANGE)
            return status;
        add_row(w, r, table, &rows[i], status == BC_OK ? &e : NULL, &t);
    }
    burner_conclude(r, &t, good);
    burner_note_orifice(r, &w->c->set);
    burner_note_air(r, &w->c->burner);
    report_set_caution(r, SHEET_CAUTION);
    return BC_OK;
}
