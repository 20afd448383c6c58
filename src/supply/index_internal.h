/* SPDX-License-Identifier: MIT */
/* index_internal.h - what a method gives to the list of indices. */
#ifndef INDEX_INTERNAL_H
#define INDEX_INTERNAL_H

#include "bluecone/aga36.h"
#include "bluecone/dutton.h"
#include "bluecone/index.h"
#include "bluecone/weaver.h"
#include "supply/constituents.h"

/* The indices by function, in the order of the list. */
enum {
#define INDEX(id, method, ...) INDEX_##method,
#include "data/indices.def"
};

/* The reference state that a method was published for. */
typedef enum { STATE_60F_30INHG, STATE_15_15, STATE_0_0, METHOD_STATES } method_state;

/* What several indices of one pair of gases share: the groups of both gases, and what is made when the first of them
 * asks. */
typedef struct {
    constituents old_parts, new_parts; /* the former is unset without an old gas */
    bool has_reference[METHOD_STATES], has_weaver_old, has_weaver_new, has_aga, has_dutton;
    bc_reference reference[METHOD_STATES];
    bc_weaver_gas weaver_old, weaver_new;
    bc_aga_gas aga_old, aga_new;
    bc_dutton dutton;
} index_room;

/* The two gases of a comparison; old_gas is NULL for an index of one gas. */
typedef struct {
    const bc_subject *old_gas, *new_gas;
    bool old_burns, new_burns;
    index_room *room;
} index_case;

/* An index as its method reads it. Texts are static. */
typedef struct {
    bool has_value;
    double value, low, high;
    const char *outside; /* "" while the method covers the gases, else why not */
    const char *caution; /* "" or a danger that the index does not see */
    bool own_limits;     /* the limits hang on the gas: these, not those of the row */
    bc_index_limits preferable, acceptable;
    const char *limits_source;
} reading;

/* A value inside ("") or outside of its method's range. */
static inline reading reading_of(double value, const char *outside)
{
    return (reading){.has_value = true, .value = value, .low = value, .high = value, .outside = outside, .caution = "", .limits_source = ""};
}

/* No value, and why. */
static inline reading reading_none(const char *why)
{
    return (reading){.outside = why, .caution = "", .limits_source = ""};
}

/* The first text that says something. */
static inline const char *first_of(const char *a, const char *b)
{
    return a[0] != '\0' ? a : b;
}

/* Sets up a case in a room: what the room shares is empty but for the groups. */
void open_case(index_case *c, const bc_subject *old_gas, const bc_subject *new_gas, index_room *room);

/* Evaluates an index, INDEX_... of the list, of a case. */
BC_MUST_USE bc_status index_of_case(const index_case *c, size_t index, bc_index *out, bc_error *err);

/* The figures of a method's own state for the two gases, in the edition of the new subject; *reference lies in the room. */
bc_status method_reference(const index_case *c, method_state state, const bc_reference **reference, bc_error *err);

/* The methods: one function a row of indices.def. A failure is one of reading the gas, not of its range. */
typedef bc_status index_method(const index_case *c, reading *r, bc_error *err);
index_method wobbe_ratio_index, air_index_index, mcp_index, gbt_cp_index, methane_number_index;
index_method aga_lifting_index, aga_flashback_index, aga_yellow_tip_index;
index_method weaver_heat_index, weaver_air_index, weaver_lifting_index, weaver_flashback_index;
index_method weaver_incomplete_index, weaver_yellow_tip_index, weaver_speed_index;
index_method dutton_icf_index, dutton_soot_index;

#endif
