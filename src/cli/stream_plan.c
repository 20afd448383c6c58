/* SPDX-License-Identifier: MIT */
/* stream_plan.c - what the options of `stream` settle before a byte of the log is read. */
#include "cli/stream.h"

#include "base/digits.h"
#include "base/error_internal.h"

#include <stdio.h>
#include <stdlib.h>
#include <string.h>

#define DIGITS_DEFAULT 7 /* more than any analyser knows */
#define FIGURES_DEFAULT "hhv,lhv,wobbe-gross,wobbe-net,density,relative-density"

static void name_figure(const arguments *a, stream_figure *f)
{
    const bc_quantity *q = bc_quantity_at(f->quantity);

    unit_for(a, q->unit, f->unit, sizeof f->unit);
    if (bc_unit_parse(q->unit, &f->own, NULL) != BC_OK)
        f->own = (bc_unit){.factor = 1.0};
    if (bc_unit_parse(f->unit, &f->shown, NULL) != BC_OK)
        f->shown = f->own;
    if (f->unit[0] == '\0' || strcmp(f->unit, "1") == 0)
        (void)snprintf(f->heading, sizeof f->heading, "%s", q->id);
    else
        (void)snprintf(f->heading, sizeof f->heading, "%s [%s]", q->id, f->unit);
}

static bc_status take_figures(stream_plan *p, bc_error *err)
{
    const char *list = p->a->value[OPTION_add];
    size_t quantities[QUANTITIES_MAX];
    bc_status status = quantities_take(list ? list : FIGURES_DEFAULT, quantities, &p->figure_count, err);

    if (status == BC_OK)
        status = units_check(p->a, &p->state, quantities, p->figure_count, err);
    if (status != BC_OK)
        return status;
    for (size_t i = 0; i < p->figure_count; i++) {
        p->figures[i].quantity = quantities[i];
        name_figure(p->a, &p->figures[i]);
    }
    p->digits = DIGITS_DEFAULT;
    int asked = 0;

    status = digits_from(p->a, &asked, err);
    p->digits = asked > 0 ? asked : p->digits;
    return status;
}

static bc_status load(const char *word, bc_gas *gas, bc_error *err)
{
    loaded_gas *loaded = malloc(sizeof *loaded);

    if (!loaded)
        return bc_fail(err, BC_ERR_MEMORY, "not enough memory for a gas");
    const bc_status status = gas_load(word, loaded, err);

    if (status == BC_OK)
        *gas = loaded->gas;
    free(loaded);
    return status;
}

static bc_status take_contract(stream_plan *p, bc_error *err)
{
    const char *word = p->a->value[OPTION_contract];
    const char *present = p->a->value[OPTION_against];

    if (!word && present)
        return bc_fail(err, BC_ERR_USAGE, "--against is the present gas of a contract: add --contract FILE");
    if (!word)
        return BC_OK;
    p->contract = malloc(sizeof *p->contract);
    if (!p->contract)
        return bc_fail(err, BC_ERR_MEMORY, "not enough memory for the contract");
    bc_status status = contract_load(word, p->contract, err);

    if (status == BC_OK)
        status = contract_bind_ranges(p->contract, err);
    if (status != BC_OK || !present)
        return status;
    p->contract->has_present = true;
    return load(present, &p->contract->present, err);
}

static bc_status take_form(stream_plan *p, bc_error *err)
{
    const char *form = p->a->value[OPTION_form];
    const char *mark = p->a->value[OPTION_decimal];

    if (form && strcmp(form, "csv") != 0 && strcmp(form, "ndjson") != 0)
        return bc_fail(err, BC_ERR_USAGE, "--form %.20s: write csv or ndjson", form);
    if (mark && strcmp(mark, "point") != 0 && strcmp(mark, "comma") != 0)
        return bc_fail(err, BC_ERR_USAGE, "--decimal %.20s: write point or comma", mark);
    p->mark = !mark ? '\0' : mark[0] == 'c' ? ',' : '.';
    p->has_header = !p->a->value[OPTION_no_header];
    if (!p->has_header && !p->a->value[OPTION_columns])
        return bc_fail(err, BC_ERR_USAGE, "--no-header needs --columns, the names that the header would have: --columns time,methane,ethane");
    if (p->has_header && p->a->value[OPTION_columns])
        return bc_fail(err, BC_ERR_USAGE, "--columns names the columns of a log without header: add --no-header");
    log_header_start(&p->header, p->path);
    if (p->a->value[OPTION_shares] && !log_header_shares(&p->header, p->a->value[OPTION_shares]))
        return bc_fail(err, BC_ERR_USAGE, "--shares %.40s: write mol %%, vol %%, mass %%, ppm or fraction", p->a->value[OPTION_shares]);
    return BC_OK;
}

static bc_status take_step(stream_plan *p, bc_error *err)
{
    const char *text = p->a->value[OPTION_step];
    bc_status status = BC_OK;

    if (!text)
        return BC_OK;
    status = bc_measure_parse(text, "s", NULL, &p->step_s, err);
    if (status != BC_OK || !(p->step_s >= 1e-3 && p->step_s <= 366.0 * 86400.0))
        return bc_fail(err, BC_ERR_USAGE, "--step %.20s: write the time between two analyses with its unit, as 60s, 5min, 1h", text);
    return BC_OK;
}

bc_status stream_plan_open(stream_plan *p, const arguments *a, bc_error *err)
{
    memset(p, 0, sizeof *p);
    p->a = a;
    if (a->argument_count > 1)
        return bc_fail(err, BC_ERR_USAGE, "'%s' is one argument too many: one log at a time; --merge takes several parts", a->argument[1]);
    p->path = a->argument_count > 0 && strcmp(a->argument[0], "-") != 0 ? a->argument[0] : "standard input";
    p->alone = a->value[OPTION_rows_alone] != NULL;
    p->is_part = a->value[OPTION_no_header] && (a->value[OPTION_summary_part] || (p->alone && !a->value[OPTION_summary]));
    bc_status status = state_from(a, &p->state, err);

    if (status == BC_OK)
        status = bc_reference_at(&p->state, &p->reference, err);
    if (status == BC_OK)
        status = take_figures(p, err);
    if (status == BC_OK)
        status = take_form(p, err);
    if (status == BC_OK)
        status = take_step(p, err);
    if (status == BC_OK)
        status = take_contract(p, err);
    p->has_calibration = a->value[OPTION_calibration] != NULL;
    if (status == BC_OK && p->has_calibration)
        status = load(a->value[OPTION_calibration], &p->calibration, err);
    return status;
}

void stream_plan_close(stream_plan *p)
{
    free(p->contract);
    p->contract = NULL;
}
