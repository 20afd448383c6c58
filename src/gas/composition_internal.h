/* SPDX-License-Identifier: MIT */
/* composition_internal.h - the steps from the words of a certificate to a gas, shared by its readers. */
#ifndef COMPOSITION_INTERNAL_H
#define COMPOSITION_INTERNAL_H

#include "base/compiler.h"
#include "bluecone/composition.h"

/* An empty composition with the documented defaults: mole, dry, 15 C, 101.325 kPa, normalised. */
void composition_clear(bc_composition *c);

/* Resolves the word of an entry: a species, `air`, or a cut (`c6+`) with its default split. `line` and
 * c->path go into the error. The entry is not counted until the caller raises entry_count. */
bc_status composition_resolve(bc_composition *c, bc_entry *entry, bc_error *err);

/* Adds a remark. A composition gives rise to five at most; beyond the capacity they would be dropped. */
void composition_remark(bc_composition *c, const char *format, ...) BC_PRINTF(2, 3);

/* From entries to sum, gas, spread and remarks. All settings and entries must be in place. */
bc_status composition_finish(bc_composition *c, bc_error *err);

/* True for a cut's word ("c6+", "C7 +"); *carbon is its first carbon number. */
bool cut_word(const char *word, int *carbon);

/* The documented split of a cut into `parts`; false when the cut has none. */
bool cut_default(const char *word, double parts[BC_SPECIES_CAPACITY]);

/* The split of a cut in words ("n-hexane 60 %, n-heptane 30 %"). */
void cut_describe(const double parts[BC_SPECIES_CAPACITY], char *text, size_t size);

#endif
