/* SPDX-License-Identifier: MIT */
/* bluecone/trap.h - the usual confusions of state, basis and analysis, and how far each would move a figure.
 *
 * A view is the state and composition that somebody in the trap would work with; the limit is read as it stands. */
#ifndef BLUECONE_TRAP_H
#define BLUECONE_TRAP_H

#include <stdbool.h>
#include <stddef.h>

#include "bluecone/composition.h"
#include "bluecone/limits.h"

#ifdef __cplusplus
extern "C" {
#endif

/* Number of confusions; id and sentence of each, static, NULL out of range. */
BC_API size_t bc_trap_count(void);
BC_API const char *bc_trap_id(size_t trap);
BC_API const char *bc_trap_text(size_t trap);

/* A gas with the words it was read from. */
typedef struct {
    const bc_composition *composition; /* its basis and sum are what is confused */
    const bc_gas *gas;                 /* the gas judged, which may be the composition's without its air */
} bc_trap_gas;

/* What somebody in a trap has. */
typedef struct {
    bool applies; /* false where nothing is confused: the state is that already, or the gas has nothing of the kind */
    double value; /* in the unit of the limit; that of bc_limit_value() when nothing is confused */
} bc_trapped;

/* What the figure of a limit becomes for somebody in a trap.
 *
 *   trap          0..bc_trap_count() - 1
 *   limit         0..contract->limit_count - 1
 *   trapped       out: untouched on failure
 *
 * Sources: the formulas of ISO 6976 at the state confused; of shares x' ~ x m/m', m the mass or volume of a mole on the
 * basis as stated and as read. Errors as bc_limit_value(); BC_ERR_RANGE, too, for a state outside the method. */
BC_API BC_MUST_USE bc_status bc_trap_value(size_t trap, const bc_contract *contract, size_t limit, const bc_trap_gas *gas, bc_trapped *trapped,
                                           bc_error *err);

#ifdef __cplusplus
}
#endif

#endif
