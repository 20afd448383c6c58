/* SPDX-License-Identifier: MIT */
/* contract_log.c - a log of analyses under a contract: read, settled, told. */
#include "cli/contract_log.h"

#include "base/error_internal.h"

#include <stdlib.h>

bc_status contract_log(report *r, const contract_case *c, bool *good, bc_error *err)
{
    log_case *l = calloc(1, sizeof *l);

    if (!l)
        return bc_fail(err, BC_ERR_MEMORY, "not enough memory for a log");
    l->c = c;
    l->path = c->a->value[OPTION_log];
    bc_status status = bc_log_open(c->contract, &l->log, err);

    if (status == BC_OK)
        status = log_read(l, err);
    if (status == BC_OK)
        status = bc_log_settle(l->log, err);
    if (status == BC_OK) {
        report_add_input(r, l->path);
        report_state_of(r, &c->contract->state);
        contract_warn(r, c->contract);
        status = log_report(l, r, good, err);
    }
    if (status == BC_OK)
        log_charts(l, r);
    bc_log_close(l->log);
    free(l);
    return status;
}
