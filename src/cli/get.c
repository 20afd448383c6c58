/* SPDX-License-Identifier: MIT */
/* get.c - one line a quantity. */
#include "base/error_internal.h"
#include "base/text.h"
#include "cli/subjects.h"

#include <string.h>

#define ASKED_MAX 64

static bc_status take_quantities(const char *list, size_t quantities[], size_t *count, bc_error *err)
{
    *count = 0;
    for (;;) {
        char id[BC_WORD_MAX];
        const size_t length = strcspn(list, ",");

        if (!bc_text_copy(id, sizeof id, list, length) || id[0] == '\0')
            return bc_fail(err, BC_ERR_USAGE, "a quantity is empty or too long; write them as hhv,wobbe-gross");
        if (*count == ASKED_MAX)
            return bc_fail(err, BC_ERR_USAGE, "more than %d quantities", ASKED_MAX);
        const bc_status status = bc_quantity_find(id, &quantities[*count], err);

        if (status != BC_OK)
            return status;
        (*count)++;
        if (list[length] == '\0')
            return BC_OK;
        list += length + 1;
    }
}

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

int run_get(const arguments *a)
{
    size_t quantities[ASKED_MAX];
    size_t count = 0;
    subjects s = {.count = 0};
    report r;
    bc_error err;
    bc_status status = take_quantities(a->argument[0], quantities, &count, &err);

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
