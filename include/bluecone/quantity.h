/* SPDX-License-Identifier: MIT */
/* bluecone/quantity.h - every figure of a gas by its id, with value, unit and standard uncertainty.
 *
 * bc_subject, bc_quantity and bc_figure are described in bluecone/subject.h. */
#ifndef BLUECONE_QUANTITY_H
#define BLUECONE_QUANTITY_H

#include <stddef.h>

#include "bluecone/status.h"
#include "bluecone/subject.h"

#ifdef __cplusplus
extern "C" {
#endif

/* Number of quantities, and each by its index; NULL for an index out of range. */
BC_API size_t bc_quantity_count(void);
BC_API const bc_quantity *bc_quantity_at(size_t index);

/* Finds a quantity by id; case, '-' and '_' do not matter. BC_ERR_USAGE names
 * the id that a word of the trade stands for, or one that is near. */
BC_API BC_MUST_USE bc_status bc_quantity_find(const char *id, size_t *index, bc_error *err);

/* Evaluates a quantity of a subject. Where the method has no analytic uncertainty, that of the composition
 * (if one was stated) is propagated by central differences; the tables' share is then unknown and zero.
 *
 *   figure   out: untouched on failure
 *
 * BC_ERR_RANGE: the gas has no such figure (a hydrogen-carbon ratio without carbon). */
BC_API BC_MUST_USE bc_status bc_quantity_evaluate(size_t index, const bc_subject *subject, bc_figure *figure, bc_error *err);

/* The value alone, for what asks many times: sweeps and searches. `value` and errors as above. */
BC_API BC_MUST_USE bc_status bc_quantity_value(size_t index, const bc_subject *subject, double *value, bc_error *err);

/* Many values of one gas, faster than one after the other: what they share is worked out once.
 *
 *   wanted   bc_quantity_count() marks, by index
 *   value    out: bc_quantity_count() values; NaN where none is wanted, or the gas has none */
BC_API void bc_quantity_values(const bool wanted[], const bc_subject *subject, double value[]);

#ifdef __cplusplus
}
#endif

#endif
