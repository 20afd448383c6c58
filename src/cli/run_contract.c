/* SPDX-License-Identifier: MIT */
/* run_contract.c - may we sign for this gas: limits, terms, traps and states of a contract. */
#include "cli/contract_report.h"

#include "base/error_internal.h"
#include "cli/sheet.h"

#include <stdio.h>

void contract_warn(report *r, const bc_contract *c)
{
    char text[BC_NAME_MAX + 320];

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
