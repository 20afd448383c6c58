/* SPDX-License-Identifier: MIT */
/* run_contract.c - may we sign for this gas: limits, terms, traps and states of a contract. */
#include "cli/contract_report.h"

#include "base/error_internal.h"
#include "cli/sheet.h"

#include <stdio.h>
#include <string.h>

/* Adds "hydrogen (mol %)" to a list; what has no room is told by dots. */
static void add_item(char *list, size_t size, const char *id, const char *value)
{
    const size_t used = strlen(list);
    const char *comma = used > 0 ? ", " : "";

    if (used + strlen(id) + strlen(value) + 12 < size)
        (void)snprintf(list + used, size - used, "%s%s%s%s%s", comma, id, value[0] ? " (" : "", value, value[0] ? ")" : "");
    else if (used > 0 && list[used - 1] != '.')
        (void)snprintf(list + used, size - used, " ...");
}

/* Defaults that move a verdict: 5 of hydrogen sulphide are mg/m3 on paper and mol % without a unit. */
static void warn_assumed(report *r, const bc_contract *c)
{
    char units[200] = "";
    char states[200] = "";
    char state[64] = "";
    char text[400];

    for (size_t i = 0; i < c->limit_count; i++) {
        const bc_limit *limit = &c->limits[i];

        if (limit->unit_assumed)
            add_item(units, sizeof units, limit->id, limit->unit);
        if (!limit->state_assumed || limit->kind == BC_LIMIT_FRACTION || limit->kind == BC_LIMIT_MASS_FRACTION)
            continue; /* moles and masses have no state */
        add_item(states, sizeof states, limit->id, "");
        state_text(&c->references[limit->reference].state, state, sizeof state);
    }
    if (units[0]) {
        (void)snprintf(text, sizeof text, "The contract states no unit for %s: the one in brackets is taken; write it as unit = ...", units);
        report_add_warning(r, text);
    }
    if (states[0]) {
        (void)snprintf(text, sizeof text, "The contract states no reference state for %s: %.60s is taken; write it as at = ...", states, state);
        report_add_warning(r, text);
    }
}

void contract_warn(report *r, const bc_contract *c)
{
    char text[BC_NAME_MAX + 320];

    warn_assumed(r, c);

    if (c->until[0] != '\0') {
        (void)snprintf(text, sizeof text, "%.120s: the text was in force until %s and is superseded.", c->name, c->until);
        report_add_warning(r, text);
    }
    if (c->note[0] != '\0') {
        (void)snprintf(text, sizeof text, "%.120s: %s.", c->name, c->note);
        report_add_warning(r, text);
    }
}

static bc_status fill_alone(report *r, const contract_case *c, bool *good, bc_error *err)
{
    report_state_of(r, &c->contract->state);
    contract_limits_alone(r, c);
    contract_warn(r, c->contract);
    if (!c->a->value[OPTION_worst])
        return BC_OK;
    report_set_caution(r, SHEET_CAUTION);
    const bc_status status = contract_worst(r, c, good, err);

    return status == BC_OK ? contract_charts(r, c, err) : status;
}

static bc_status fill(report *r, const contract_case *c, bool *good, bc_error *err)
{
    report_contract_inputs(r, c->contract);
    report_add_input(r, c->burner.path);
    if (c->a->value[OPTION_log])
        return contract_log(r, c, good, err);
    if (c->judged == 0)
        return fill_alone(r, c, good, err);
    subjects_report(&c->gases, r);
    subjects_tell_uncertainty(&c->gases, r);
    contract_warn(r, c->contract);
    *good = contract_judge(r, c);
    bc_status status = contract_trade_report(r, c, err);

    if (status == BC_OK && c->a->value[OPTION_traps])
        status = contract_traps(r, c, err);
    if (status == BC_OK)
        status = contract_printed(r, c, err);
    if (status == BC_OK && c->a->value[OPTION_worst])
        status = contract_worst(r, c, good, err);
    if (status == BC_OK)
        status = contract_charts(r, c, err);
    report_set_caution(r, SHEET_CAUTION);
    return status;
}

int run_contract(const arguments *a)
{
    contract_case c;
    bool good = true;
    report r;
    bc_error err;

    report_open(&r, BC_VERSION, "contract", "Contract");
    bc_status status = contract_open(&c, a, &err);

    if (status == BC_OK)
        status = fill(&r, &c, &good, &err);
    contract_close(&c);
    if (status == BC_OK)
        return answer(&r, a, false, good ? 0 : 1);
    report_close(&r);
    return complain(&err);
}
