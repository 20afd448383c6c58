/* SPDX-License-Identifier: MIT */
/* bluecone/worst.h - the worst gas that a contract lets in: extremes of a figure over all allowed compositions.
 *
 * A space says what is allowed: a window for each component, windows for groups of them, and limits on
 * figures, each at its own reference state. Opened, it answers for any figure with the smallest and the
 * largest value and the composition that attains it. Figures that are ratios of linear sums
 * (bluecone/ratio.h) are bounded by branch and bound over linear programs until the proof meets the value;
 * others are searched for. Everything is deterministic. */
#ifndef BLUECONE_WORST_H
#define BLUECONE_WORST_H

#include <stdbool.h>
#include <stddef.h>

#include "bluecone/gas.h"
#include "bluecone/iso6976.h"
#include "bluecone/ratio.h"
#include "bluecone/status.h"

#ifdef __cplusplus
extern "C" {
#endif

#define BC_SPACE_GROUP_MAX 32
#define BC_SPACE_LIMIT_MAX 64
#define BC_WORST_EXACT 1e-6 /* relative gap between value and proof below which a result is called exact */

/* What one component may be, mole fraction. The component that makes up the rest has the window 0 to 1. */
typedef struct {
    size_t species;
    double min, max;
} bc_space_component;

/* What a weighted sum of mole fractions may be (inerts, c4+). An open end is -INFINITY or INFINITY. */
typedef struct {
    double weight[BC_SPECIES_CAPACITY];
    double min, max;
} bc_space_group;

/* What a figure may be, in the unit of the ratio. An open end is -INFINITY or INFINITY. */
typedef struct {
    bc_ratio ratio; /* no proxy */
    double min, max;
} bc_space_limit;

/* All allowed compositions: 180 kB, counts first set to zero by the caller. Species that are no component
 * are absent. Ranges are the components and groups; limits come on top of them. */
typedef struct {
    size_t component_count;
    bc_space_component components[BC_SPECIES_CAPACITY];
    size_t group_count;
    bc_space_group groups[BC_SPACE_GROUP_MAX];
    size_t limit_count;
    bc_space_limit limits[BC_SPACE_LIMIT_MAX];
} bc_space;

/* A space, checked and made ready, 2 MB; bc_worst_close() frees it. One thread at a time. */
typedef struct bc_worst bc_worst;

/* Checks a space and makes it ready. A space that lets no gas in opens, too: see bc_worst_conflict().
 *
 *   worst   out: untouched on failure
 *
 * BC_ERR_INPUT: a window upside down or not finite, a component twice, a proxy as a limit; BC_ERR_RANGE: a
 * figure metered saturated while the window of water is open; BC_ERR_USAGE: no component, or a count over its
 * maximum; BC_ERR_SOLVER: neither an allowed gas nor a proof that there is none; BC_ERR_MEMORY. */
BC_API BC_MUST_USE bc_status bc_worst_open(const bc_space *space, bc_worst **worst, bc_error *err);

/* Frees what bc_worst_open() made; NULL is no error. */
BC_API void bc_worst_close(bc_worst *worst);

/* True when no composition is allowed, which is proven. */
BC_API bool bc_worst_is_empty(const bc_worst *worst);

/* An end of what a figure can be. */
typedef struct {
    double value;  /* attained by `gas` */
    bc_gas gas;    /* allowed but for rounding: limits hold within 1e-9 of their bounds */
    bool bounded;  /* no gas that keeps every bound lies beyond `bound`, which is proven */
    double bound;
    bool exact;    /* value and bound agree within BC_WORST_EXACT; else the result was searched for */
} bc_extreme;

typedef struct {
    bc_extreme min, max;
} bc_extremes;

/* Extremes of a ratio, certified.
 *
 *   extremes   out: untouched on failure
 *
 * Exact unless the cells of the branch and bound run out; the bound then says how far it came. A proof is
 * relative to the value, or, for values near zero, to a ten-thousandth of what one component can make of it.
 * BC_ERR_INPUT: nothing is allowed; BC_ERR_RANGE: a figure metered saturated while the window of water is
 * open, or one that some allowed gas does not have (CO2 per heat of an inert gas). */
BC_API BC_MUST_USE bc_status bc_worst_ratio(bc_worst *worst, const bc_ratio *ratio, bc_extremes *extremes, bc_error *err);

/* A figure of a gas; not finite when the gas has none. It is asked only near allowed compositions. */
typedef double bc_objective(const bc_gas *gas, void *context);

/* Extremes of any figure, searched for: local searches by sequential linear programs from several vertices.
 * Never bounded, never exact.
 *
 *   extremes   out: untouched on failure
 *
 * BC_ERR_INPUT: nothing is allowed; BC_ERR_RANGE: no gas that was tried has the figure. */
BC_API BC_MUST_USE bc_status bc_worst_search(bc_worst *worst, bc_objective *objective, void *context, bc_extremes *extremes,
                                             bc_error *err);

/* Extremes of a quantity, in its unit: certified where bc_ratio_of_quantity() knows its form, else searched
 * for. Of a proxy (dew point) the bound is the figure of the gas that certifiably has the extreme.
 *
 *   quantity    index of bc_quantity_at()
 *   reference   the state it is asked at
 *   extremes    out: untouched on failure
 *
 * Errors as bc_worst_ratio(), bc_worst_search() and bc_quantity_evaluate(). */
BC_API BC_MUST_USE bc_status bc_worst_quantity(bc_worst *worst, size_t quantity, const bc_reference *reference, bc_extremes *extremes,
                                               bc_error *err);

/* How a side of a limit stands to the ranges and to the other limits. */
typedef struct {
    bool stated; /* the side has a bound */
    bool idle;   /* proven: ranges and all other limits keep every gas within it, it could be left out */
    bool open;   /* ranges alone let gases in that break it: `gas` does */
    double excess; /* by how much at most, in the unit of the limit; 0 when not open */
    bc_gas gas;
} bc_side_standing;

typedef struct {
    bc_side_standing min, max;
} bc_limit_standing;

/* Finds how a limit stands.
 *
 *   limit      0..limit_count - 1 of the space
 *   standing   out: untouched on failure
 *
 * BC_ERR_USAGE: no such limit; BC_ERR_INPUT: without this limit nothing is allowed either; BC_ERR_RANGE as
 * bc_worst_ratio(); BC_ERR_SOLVER as bc_worst_open(). */
BC_API BC_MUST_USE bc_status bc_worst_standing(bc_worst *worst, size_t limit, bc_limit_standing *standing, bc_error *err);

/* What a conflict is made of. */
typedef enum { BC_PART_COMPONENT, BC_PART_GROUP, BC_PART_LIMIT } bc_part_kind;

/* One bound of the space. */
typedef struct {
    bc_part_kind kind;
    size_t index; /* of components, groups or limits of the space */
    bool upper;   /* its max, else its min */
} bc_conflict_part;

/* Bounds that cannot all hold while the fractions add up to one, none of which could be left out. */
typedef struct {
    size_t count;
    bc_conflict_part parts[2 * (BC_SPECIES_CAPACITY + BC_SPACE_GROUP_MAX + BC_SPACE_LIMIT_MAX)];
} bc_conflict;

/* Explains why a space is empty: leaves out one bound after another, and keeps those without which a gas
 * would be allowed. Component windows are tried first, so that limits remain in the explanation.
 *
 *   conflict   out: count is 0 when the space is not empty
 *
 * A bound whose removal could not be settled stays in. */
BC_API void bc_worst_conflict(bc_worst *worst, bc_conflict *conflict);

#ifdef __cplusplus
}
#endif

#endif
