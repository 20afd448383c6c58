/* SPDX-License-Identifier: MIT */
/* index_check.c - runs the rows of checks_interchange.def. */
#include "supply/index_check.h"

#include "base/compiler.h"
#include "base/error_internal.h"
#include "bluecone/composition.h"
#include "bluecone/index.h"

/* Texts stand in the row itself, as in check.c: pointers would be relocated at every start. */
typedef struct {
    char area[16], id[40], old_gas[200], new_gas[200], index[24];
    double expected, tolerance;
    char why[160], source[180];
} check_row;

static const check_row ROWS[] = {
#define CHECK_INDEX(area, id, old_gas, new_gas, index, expected, tolerance, why, source) \
    {area, id, old_gas, new_gas, index, expected, tolerance, why, source},
#include "data/checks_interchange.def"
};

size_t index_check_count(void)
{
    return BC_COUNT(ROWS);
}

const char *index_check_area(size_t index)
{
    return ROWS[index].area;
}

static bc_status read_subject(const bc_reference *reference, const char *literal, bc_subject *subject, bc_error *err)
{
    bc_composition c;
    const bc_status status = bc_composition_parse(literal, &c, err);

    return status == BC_OK ? bc_subject_make(reference, &c.gas, NULL, subject, err) : status;
}

static bc_status compute(const check_row *row, const bc_reference *reference, bc_check *check, bc_error *err)
{
    bc_subject old_gas;
    bc_subject new_gas;
    bc_index found;
    size_t index = 0;
    const bool alone = row->old_gas[0] == '\0';
    bc_status status = bc_index_find(row->index, &index, err);

    if (status == BC_OK && !alone)
        status = read_subject(reference, row->old_gas, &old_gas, err);
    if (status == BC_OK)
        status = read_subject(reference, row->new_gas, &new_gas, err);
    if (status == BC_OK)
        status = bc_index_evaluate(index, alone ? NULL : &old_gas, &new_gas, &found, err);
    if (status != BC_OK)
        return status;
    if (!found.has_value)
        return bc_fail(err, BC_ERR_RANGE, "%s of %s: %s", row->index, row->new_gas, found.reason);
    check->computed = found.value;
    check->unit = bc_index_at(index)->unit;
    return BC_OK;
}

bc_status index_check_run(size_t index, bc_check *check, bc_error *err)
{
    const bc_state state = bc_state_default();
    const check_row *row = &ROWS[index];
    bc_reference reference;
    bc_check computed = {.area = row->area, .id = row->id, .subject = row->new_gas, .with = row->old_gas, .quantity = row->index, .unit = "1",
                         .why = row->why, .source = row->source, .combustion_c = state.combustion_c, .metering_c = state.metering_c,
                         .metering_kpa = state.metering_pa * 1e-3, .edition = state.edition, .expected = row->expected,
                         .tolerance = row->tolerance};
    bc_status status = bc_reference_at(&state, &reference, err);

    if (status == BC_OK)
        status = compute(row, &reference, &computed, err);
    if (status == BC_OK)
        *check = computed;
    return status;
}
