/* SPDX-License-Identifier: MIT */
/* limits_internal.h - the parts of reading a contract file. */
#ifndef LIMITS_INTERNAL_H
#define LIMITS_INTERNAL_H

#include "base/ini.h"
#include "bluecone/limits.h"

/* Finds the quantity, component or group of a word and fills id, kind (quantity or fraction), quantity
 * and weight of *limit. BC_ERR_INPUT names the nearest known word. */
BC_MUST_USE bc_status limit_find(const char *word, bc_limit *limit, bc_error *err);

/* Mole weights of a component or group; false when the word is none. */
bool limit_members(const char *word, double weight[BC_SPECIES_CAPACITY]);

/* Takes the unit of the bounds ("" for the default): sets unit, own, shown, and makes a fraction a
 * concentration when the unit is mass per volume. BC_ERR_INPUT when it does not fit. */
BC_MUST_USE bc_status limit_take_unit(const char *unit, const bc_state *state, bc_limit *limit, bc_error *err);

/* Takes what a share of a component or group is a share of; "" is moles. Before the unit. BC_ERR_INPUT when the
 * limit is on no component or the word is none of mole, volume, mass. */
BC_MUST_USE bc_status limit_take_basis(const char *basis, bc_limit *limit, bc_error *err);

/* The figure of a limit in its own unit, for a subject at any state: what the limit would read there. Errors as
 * bc_limit_value(). */
BC_MUST_USE bc_status limit_figure(const bc_contract *contract, const bc_limit *limit, const bc_subject *subject, double *own, bc_error *err);

/* Where bundled specifications are looked for. */
typedef struct {
    const char *const *path;
    size_t count;
} limits_folders;

/* The file being read. */
typedef struct limits_reader {
    const char *path;
    const bc_ini *ini;
    bc_contract *c;
    const limits_folders *folders;
    const struct limits_reader *from; /* the file that follows this one; NULL for the first */
    int depth; /* files that led here by `follows`, this one included */
    bc_error *err;
} limits_reader;

/* Refuses an entry. The second keeps the cause that a deeper function gave and adds the place. */
bc_status limits_refuse(const limits_reader *r, const bc_ini_entry *e, const char *cause);
bc_status limits_blame(const limits_reader *r, int line);

/* Reads a key of [contract]; an edition; yes or no. */
BC_MUST_USE bc_status limits_take_term(limits_reader *r, const bc_ini_entry *e);
BC_MUST_USE bc_status limits_take_edition(const limits_reader *r, const bc_ini_entry *e, int *edition);
BC_MUST_USE bc_status limits_take_yes(const limits_reader *r, const bc_ini_entry *e, bool *yes);

/* Reads the section whose first entry is e into the contract. */
BC_MUST_USE bc_status limits_take_limit(limits_reader *r, const bc_ini_entry *e);
BC_MUST_USE bc_status limits_take_range(limits_reader *r, const bc_ini_entry *e);

#endif
