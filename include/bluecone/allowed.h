/* SPDX-License-Identifier: MIT */
/* bluecone/allowed.h - the compositions that a contract allows, as a space for bluecone/worst.h. */
#ifndef BLUECONE_ALLOWED_H
#define BLUECONE_ALLOWED_H

#include <stdbool.h>
#include <stddef.h>

#include "bluecone/limits.h"
#include "bluecone/ratio.h"
#include "bluecone/worst.h"

#ifdef __cplusplus
extern "C" {
#endif

#define BC_NOT_IMPOSED ((size_t)-1)

/* The form of a limit's figure, in the unit of the limit.
 *
 *   limit   0..limit_count - 1
 *   ratio   out: untouched on failure
 *
 * BC_ERR_USAGE: the figure is no ratio of linear sums (a flame temperature, an index); BC_ERR_RANGE as
 * bc_ratio_of_quantity(). */
BC_API BC_MUST_USE bc_status bc_limit_ratio(const bc_contract *contract, size_t limit, bc_ratio *ratio, bc_error *err);

/* Makes the space of a contract. Components are those that a range or a limit names singly and those in `present`;
 * water is none. Ranges on one component are its window, those on groups are groups, limits are limits.
 *
 *   limit_count   limits of the contract that count, from the first on
 *   present       BC_SPECIES_CAPACITY: true for species that can occur whatever the contract names
 *   space         out: of no use after a failure
 *   place         out: BC_LIMIT_MAX; the index of each limit in the space, BC_NOT_IMPOSED where its figure is no
 *                 ratio of linear sums
 *
 * BC_ERR_RANGE as bc_ratio_of_quantity(); BC_ERR_USAGE: more groups than BC_SPACE_GROUP_MAX. */
BC_API BC_MUST_USE bc_status bc_contract_space(const bc_contract *contract, size_t limit_count, const bool present[], bc_space *space,
                                               size_t place[], bc_error *err);

#ifdef __cplusplus
}
#endif

#endif
