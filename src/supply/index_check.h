/* SPDX-License-Identifier: MIT */
/* index_check.h - the check values of the indices of interchangeability, which continue those of check.c. */
#ifndef INDEX_CHECK_H
#define INDEX_CHECK_H

#include <stddef.h>

#include "bluecone/check.h"

/* Number of checks, and the area of one: "interchange" for values published elsewhere, "arithmetic" for values worked
 * out from the same formulas, which prove the program and not the method. */
size_t index_check_count(void);
const char *index_check_area(size_t index);

/* Computes one at 15/15, ISO 6976:2016, but for `ok`; check.with is the gas the burner was set on. A value out of the
 * method's range is compared all the same; a gas without a value is an error. The index is valid. */
BC_MUST_USE bc_status index_check_run(size_t index, bc_check *check, bc_error *err);

#endif
