/* SPDX-License-Identifier: MIT */
/* run_switch.c - may a burner that was set on one gas take another? */
#include "base/error_internal.h"
#include "cli/switch_report.h"

#include <string.h>

static bc_status take_fuel_temperature(switch_case *c, bc_error *err)
{
    const char *text = c->a->value[OPTION_fuel_temp];
    char cause[BC_MESSAGE_MAX];

    c->old_k = c->burner.gas_k;
    c->new_k = c->old_k;
    c->has_fuel_k = text != NULL;
    if (!text)
        return BC_OK;
    const bc_status status = bc_measure_parse(text, "K", "C", &c->new_k, err);

    if (status == BC_OK && !(c->new_k >= 250.0 && c->new_k <= 1000.0))
        return bc_fail(err, BC_ERR_USAGE, "--fuel-temp %.40s is outside -23 to 727 C", text);
    if (status != BC_OK) {
        memcpy(cause, err->message, sizeof cause);
        return bc_fail(err, BC_ERR_USAGE, "--fuel-temp: %.460s", cause);
    }
    return status;
}

/* The published indices compare gases of one temperature: it counts on a burner alone. */
double switch_new_k(const switch_case *c)
{
    return c->has_burner && c->has_fuel_k ? c->new_k : 0.0;
}

static bc_status judge(switch_case *c, bc_error *err)
{
    const bc_subject *old_gas = &c->s->each[OLD_GAS].subject;
    const bc_subject *new_gas = &c->s->each[NEW_GAS].subject;
    const double new_k = switch_new_k(c);
    bc_status status = bc_switch_judge(old_gas, new_gas, c->has_burner ? &c->burner : NULL, new_k, &c->result, err);

    if (status == BC_OK)
        status = bc_burner_set(&c->burner, old_gas, &c->set, err);
    return status == BC_OK ? bc_burner_restore(&c->set, new_gas, new_k, &c->remedy, err) : status;
}

static bc_status compute(switch_case *c, bc_error *err)
{
    const char *file = c->a->value[OPTION_burner];
    bc_status status = BC_OK;

    c->burner = bc_burner_default();
    c->has_burner = file != NULL;
    if (file)
        status = bc_burner_read(file, &c->burner, err);
    if (status == BC_OK)
        status = take_fuel_temperature(c, err);
    return status == BC_OK ? judge(c, err) : status;
}

/* Charts show shares: there is nothing else to draw. */
static bool wants_shares(const arguments *a)
{
    render_form form = RENDER_TEXT;
    const char *path = a->value[OPTION_output];

    return a->value[OPTION_blend_in] || (path && render_form_of(path, &form) && render_form_shows_charts(form));
}

static bc_status fill(report *r, const switch_case *c, bc_error *err)
{
    subjects_report(c->s, r);
    report_name_role(r, OLD_GAS, "old");
    report_name_role(r, NEW_GAS, "new");
    report_add_input(r, c->burner.path);
    switch_burner(r, c);
    switch_gases(r, c);
    switch_indices(r, c);
    switch_controls(r, c);
    bc_status status = BC_OK;

    if (wants_shares(c->a))
        status = switch_shares(r, c, err);
    if (status == BC_OK)
        switch_conclude(r, c);
    return status == BC_OK ? check_units_used(r, c->a, err) : status;
}

int run_switch(const arguments *a)
{
    subjects s = {.count = 0};
    switch_case c;
    report r;
    bc_error err;

    memset(&c, 0, sizeof c);
    c.a = a;
    c.s = &s;
    report_open(&r, BC_VERSION, "switch", "Switch of gas");
    bc_status status = subjects_open(&s, a, a->argument, 2, false, &err);

    if (status == BC_OK)
        status = compute(&c, &err);
    if (status == BC_OK)
        status = fill(&r, &c, &err);
    subjects_close(&s);
    if (status == BC_OK)
        return answer(&r, a, false, c.result.verdict == BC_SWITCH_TAKES ? 0 : 1);
    report_close(&r);
    return complain(&err);
}
