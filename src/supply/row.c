/* SPDX-License-Identifier: MIT */
/* row.c - one analysis of a log, judged by the limits of a contract, and the heat that flows with it. */
#include "supply/row.h"

#include "bluecone/terms.h"
#include "supply/limits_internal.h"

#include <assert.h>

static_assert(BC_LIMIT_MAX <= 64, "a set of limits is one word");

static bc_status make_subjects(const bc_contract *c, const bc_gas *gas, bc_subject subjects[], bc_error *err)
{
    bc_status status = BC_OK;

    for (size_t i = 0; i < c->reference_count && status == BC_OK; i++)
        status = bc_subject_make(&c->references[i], gas, NULL, &subjects[i], err);
    return status;
}

bc_status row_judge(const bc_contract *c, const bc_gas *gas, double values[], uint64_t *known, uint64_t *broken, bc_error *err)
{
    bc_subject subjects[BC_LIMIT_REFERENCE_MAX];
    bc_status status = make_subjects(c, gas, subjects, err);

    *known = 0;
    *broken = 0;
    for (size_t i = 0; i < c->limit_count && status == BC_OK; i++) {
        const bc_limit *limit = &c->limits[i];
        double own = 0.0;

        values[i] = 0.0;
        status = limit_figure(c, limit, &subjects[limit->reference], &own, err);
        if (status == BC_ERR_RANGE) {
            status = BC_OK;
            continue;
        }
        values[i] = bc_unit_from_si(&limit->shown, bc_unit_to_si(&limit->own, own));
        *known |= (uint64_t)1 << i;
        if (bc_limit_margin(limit, values[i]) < -BC_LIMIT_ROUNDING * bc_limit_scale(limit))
            *broken |= (uint64_t)1 << i;
    }
    return status;
}

bc_status row_power_w(const bc_reference *reference, const bc_gas *gas, const bc_per_amount *flow, double *power_w, bc_error *err)
{
    bc_gas metered;
    double amount = 0.0;
    bc_status status = bc_gas_for_state(gas, &reference->state, &metered, err);

    if (status == BC_OK)
        status = bc_amount_per_mole(flow, reference, &metered, &amount, err);
    if (status == BC_OK)
        *power_w = flow->si / amount * bc_value_of(reference, &metered).gross_j_per_mol;
    return status;
}
