/* SPDX-License-Identifier: MIT */
/* run_blend.c - mixing gases: which of its questions a command line asks. */
#include "cli/blend_report.h"

static int ask(blend_case *c, report *r)
{
    if (c->swept != NO_PART)
        return blend_sweep(c, r);
    if (c->a->value[OPTION_least])
        return blend_best(c, r);
    return c->free_count > 0 ? blend_aim(c, r) : blend_mix(c, r);
}

int run_blend(const arguments *a)
{
    blend_case c;
    report r;
    bc_error err;

    if (blend_open(&c, a, &err) != BC_OK) {
        blend_close(&c);
        return complain(&err);
    }
    report_open(&r, BC_VERSION, "blend", "Blend");
    if (c.within)
        report_contract_inputs(&r, c.within);
    return ask(&c, &r);
}
