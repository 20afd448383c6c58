/* SPDX-License-Identifier: MIT */
/* run_burn.c - what a gas does in a burner: the case, its physics, and the report of it. */
#include "base/error_internal.h"
#include "cli/burn_report.h"

#include <string.h>

static bc_status compute(const arguments *a, const subjects *s, burn_case_result *c, bc_error *err)
{
    bc_status status = burn_setup_from(a, &s->each[0].subject, &c->setup, err);

    if (status == BC_OK)
        status = bc_burn_of(&c->setup.physics, &c->burn, err);
    c->fuel = &s->each[0].subject;
    c->family = s->each[0].loaded.composition.family;
    return status;
}

static bc_status fill(report *r, const arguments *a, const subjects *s, const burn_case_result *c, bc_error *err)
{
    subjects_report(s, r);
    report_add_input(r, c->setup.oxidant_path);
    bc_status status = burn_report(r, a, c, err);

    if (status == BC_OK && burn_wants_chart(a))
        status = burn_chart(r, a, c, err);
    return status == BC_OK ? check_units_used(r, a, err) : status;
}

int run_burn(const arguments *a)
{
    subjects s = {.count = 0};
    burn_case_result c;
    report r;
    bc_error err;

    memset(&c, 0, sizeof c);
    report_open(&r, BC_VERSION, "burn", "Combustion");
    bc_status status = subjects_open(&s, a, a->argument, 1, false, &err);

    if (status == BC_OK)
        status = compute(a, &s, &c, &err);
    if (status == BC_OK)
        status = fill(&r, a, &s, &c, &err);
    subjects_close(&s);
    if (status == BC_OK)
        return answer(&r, a, false, 0);
    report_close(&r);
    return complain(&err);
}
