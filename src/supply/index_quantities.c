/* SPDX-License-Identifier: MIT */
/* index_quantities.c - the indices of a gas alone in the form the list of quantities takes them. */
#include "supply/index_quantities.h"

#include "base/compiler.h"
#include "base/error_internal.h"
#include "supply/index_internal.h"

static const struct {
    bc_quantity shown;
    size_t index;
} ROWS[] = {
#define ALONE(id, function, digits, label, method, meaning) \
    {{id, label, "interchange", "1", method, meaning, digits, true}, INDEX_##function},
#include "data/quantities_index.def"
};

static const bc_quantity *shown(size_t row)
{
    return &ROWS[row].shown;
}

static bc_status evaluate(size_t row, const bc_subject *subject, bc_figure *figure, bc_error *err)
{
    bc_index found;
    const bc_status status = bc_index_evaluate(ROWS[row].index, NULL, subject, &found, err);

    if (status != BC_OK)
        return status;
    if (!found.has_value || !found.in_range)
        return bc_fail(err, BC_ERR_RANGE, "%s is not given for this gas: %s", ROWS[row].shown.id, found.reason);
    *figure = (bc_figure){.value = found.value};
    return BC_OK;
}

/* One case for all: its room keeps what they share. */
static void values(const bc_subject *subject, const bool wanted[], double value[])
{
    BC_UNFILLED index_room room;
    index_case c = {.room = NULL};

    for (size_t row = 0; row < BC_COUNT(ROWS); row++) {
        bc_index found;

        if (!wanted[row])
            continue;
        if (!c.room)
            open_case(&c, NULL, subject, &room);
        if (index_of_case(&c, ROWS[row].index, &found, NULL) == BC_OK && found.has_value && found.in_range)
            value[row] = found.value;
    }
}

quantity_source index_quantities(void)
{
    return (quantity_source){BC_COUNT(ROWS), shown, evaluate, NULL, values};
}
