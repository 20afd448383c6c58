/* SPDX-License-Identifier: MIT */
/* index_quantities.c - the indices of a gas alone in the form the list of quantities takes them. */
#include "supply/index_quantities.h"

#include "base/compiler.h"
#include "base/error_internal.h"
#include "bluecone/index.h"

static const bc_quantity ROWS[] = {
#define ALONE(id, digits, label, method, meaning) {id, label, "interchange", "1", method, meaning, digits, true},
#include "data/quantities_index.def"
};

static const bc_quantity *shown(size_t row)
{
    return &ROWS[row];
}

static bc_status evaluate(size_t row, const bc_subject *subject, bc_figure *figure, bc_error *err)
{
    bc_index found;
    size_t index = 0;
    bc_status status = bc_index_find(ROWS[row].id, &index, err);

    if (status == BC_OK)
        status = bc_index_evaluate(index, NULL, subject, &found, err);
    if (status != BC_OK)
        return status;
    if (!found.has_value || !found.in_range)
        return bc_fail(err, BC_ERR_RANGE, "%s is not given for this gas: %s", ROWS[row].id, found.reason);
    *figure = (bc_figure){.value = found.value};
    return BC_OK;
}

quantity_source index_quantities(void)
{
    return (quantity_source){BC_COUNT(ROWS), shown, evaluate, NULL};
}
