/* SPDX-License-Identifier: MIT */
/* bluecone/index.h - the indices of interchangeability by id: value, limits, verdict, range and trust.
 *
 * Each index compares two gases on one class of burner, mostly old domestic ones. None of them alone clears a gas. */
#ifndef BLUECONE_INDEX_H
#define BLUECONE_INDEX_H

#include <stdbool.h>
#include <stddef.h>

#include "bluecone/quantity.h"
#include "bluecone/status.h"

#ifdef __cplusplus
extern "C" {
#endif

/* Whether an index belongs to one gas or compares it with the gas the burner was set on. */
typedef enum { BC_INDEX_ALONE, BC_INDEX_AGAINST } bc_index_kind;

/* What an index says of the new gas. */
typedef enum {
    BC_VERDICT_OK,
    BC_VERDICT_CAUTION,        /* between preferable and acceptable, or a danger the index does not see */
    BC_VERDICT_NOT_ACCEPTABLE,
    BC_VERDICT_CANNOT_JUDGE    /* out of range, not defined for the gas, or no limit is published */
} bc_verdict;

/* Limits of an index, each side on its own; min and max are 0 where there is none. */
typedef struct {
    bool has_min;
    double min;
    bool has_max;
    double max;
} bc_index_limits;

/* An index, as a list shows it. All texts are static. */
typedef struct {
    const char *id;      /* "weaver-flashback" */
    const char *label;   /* "Flashback index, Weaver" */
    const char *unit;    /* "1" for most */
    const char *meaning; /* one sentence, with the side that is bad */
    const char *range;   /* gases it holds for */
    const char *trust;   /* where its formula, constants and limits come from, and how good that is */
    const char *source;  /* published document */
    const char *limits_source; /* of the limits; "" without any */
    bc_index_kind kind;
    int digits;          /* decimals worth printing */
    bc_index_limits preferable, acceptable; /* where they do not hang on the gas; see bc_index */
} bc_index_row;

/* Number of indices, and each by its index; NULL out of range. Sources: in the rows. */
BC_API size_t bc_index_count(void);
BC_API const bc_index_row *bc_index_at(size_t index);

/* Finds an index by id; case, '-' and '_' do not matter. BC_ERR_USAGE names the nearest known id. */
BC_API BC_MUST_USE bc_status bc_index_find(const char *id, size_t *index, bc_error *err);

/* An index of a gas. All texts are static. */
typedef struct {
    bool has_value;
    bool in_range;      /* both gases are covered by the method and it has a value */
    bc_verdict verdict;
    double value;       /* in the unit of the row; 0 without one */
    double low, high;   /* what other published routes to it give; both equal to value where there is one route */
    bc_index_limits preferable; /* within: ok. Sides as the method has them */
    bc_index_limits acceptable; /* outside: not acceptable */
    const char *reason; /* why it is out of range, not defined, cautious, or without verdict; "" otherwise */
    const char *source, *limits_source, *trust; /* as in the row, but for limits that hang on a class of gas */
} bc_index;

/* Evaluates an index for a burner set on the old gas that is given the new one. The gas is dried and every method
 * takes its own reference state, of the edition of the new subject; the Wobbe ratio and the air index are those of
 * the subjects' state.
 *
 *   index     0..bc_index_count()-1
 *   old_gas   may be NULL for an index of the gas alone
 *   out       untouched on failure
 *
 * A gas out of the method's range is no failure: the value is given where there is one, and marked.
 * BC_ERR_USAGE: no such index, no old gas for one that needs it, or two gases at different states. */
BC_API BC_MUST_USE bc_status bc_index_evaluate(size_t index, const bc_subject *old_gas, const bc_subject *new_gas,
                                               bc_index *out, bc_error *err);

/* All indices of a pair at once, with what they share worked out only once: out[bc_index_count()], untouched on failure.
 * Sources and failures are those of bc_index_evaluate(). */
BC_API BC_MUST_USE bc_status bc_index_evaluate_all(const bc_subject *old_gas, const bc_subject *new_gas, bc_index out[], bc_error *err);

/* The verdict in words: "ok", "caution", "broken", "cannot judge"; never NULL. */
BC_API const char *bc_verdict_text(bc_verdict verdict);

#ifdef __cplusplus
}
#endif

#endif
