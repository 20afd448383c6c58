/* SPDX-License-Identifier: MIT */
/* get.c - one line a quantity. */
#include "base/error_internal.h"
#include "base/text.h"
#include "cli/subjects.h"

static bc_status fill(report *r, const subjects *s, const arguments *a, const size_t quantities[], size_t count, bc_error *err)
{
    const size_t section = report_add_section(r, "asked", "Quantities");

    subjects_report(s, r);
    for (size_t i = 0; i < s->count; i++)
        for (size_t j = 0; j < count; j++) {
            const slot where = {r, section, i};
            const bc_status status = report_quantity(&where, quantities[j], &s->each[i].subject, a, err);

            if (status != BC_OK)
                return status;
        }
    return BC_OK;
}

/* GAS before QUANTITY is the natural slip: the message shows the order. */
static bc_status take_quantities(const arguments *a, size_t quantities[], size_t *count, bc_error *err)
{
    size_t second = 0;
    char shown[BC_WORD_MAX];
    const bc_status status = quantities_take(a->argument[0], quantities, count, err);

    if (status == BC_OK || bc_quantity_find(a->argument[1], &second, NULL) != BC_OK)
        return status;
    bc_text_show(shown, sizeof shown, a->argument[0]);
    return bc_fail(err, BC_ERR_USAGE, "'%s' is no quantity; the quantity comes first, then the gas: bluecone get %s %s", shown,
                   bc_quantity_at(second)->id, shown);
}

int run_get(const arguments *a)
{
    size_t quantities[QUANTITIES_MAX];
    size_t count = 0;
    subjects s = {.count = 0};
    report r;
    bc_error err;
    bc_status status = take_quantities(a, quantities, &count, &err);

    report_open(&r, BC_VERSION, "get", "Quantities");
    if (status == BC_OK)
        status = subjects_open(&s, a, a->argument + 1, a->argument_count - 1, false, &err);
    if (status == BC_OK)
        status = units_check(a, &s.state, quantities, count, &err);
    if (status == BC_OK)
        status = fill(&r, &s, a, quantities, count, &err);
    subjects_close(&s);
    if (status == BC_OK)
        return answer(&r, a, true, 0);
    report_close(&r);
    return complain(&err);
}
