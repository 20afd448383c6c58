/* SPDX-License-Identifier: MIT */
/* reference_internal.h - a reference state for a few gases: quick to look up where a method needs it once. */
#ifndef REFERENCE_INTERNAL_H
#define REFERENCE_INTERNAL_H

#include <stdbool.h>

#include "bluecone/iso6976.h"
#include "gas/species_index.h"

/* bc_reference_at() for the species that are wanted; the rows of all others are zero. */
BC_MUST_USE bc_status reference_of(const bc_state *state, const bool wanted[SPECIES_COUNT], bc_reference *reference, bc_error *err);

#endif
