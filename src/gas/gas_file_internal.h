/* SPDX-License-Identifier: MIT */
/* gas_file_internal.h - a composition file being read, for the readers of its sections. */
#ifndef GAS_FILE_INTERNAL_H
#define GAS_FILE_INTERNAL_H

#include "base/ini.h"
#include "gas/composition_internal.h"

/* The file being read. */
typedef struct {
    const char *path;
    const bc_ini *ini;
    bc_composition *c;
    double unit;    /* of the shares: 0.01, 1 or 1e-6 */
    bc_error *err;
} reader;

/* A key of a section and what reads it. */
typedef struct {
    const char *key;
    bc_status (*take)(reader *, const bc_ini_entry *);
} file_key;

/* One word of a key's value and what it stands for. */
typedef struct {
    const char *word;
    int value;
} choice;

/* Keeps the cause that a deeper function gave and adds the place. */
bc_status gas_file_blame(const reader *r, const bc_ini_entry *e);

/* The value of one of some words, or a message that tells them all. */
bc_status gas_file_choice(const reader *r, const bc_ini_entry *e, const choice *choices, size_t count, int *value);

/* Reads a key by a table of them; an unknown one is refused with the nearest. */
bc_status gas_file_key(reader *r, const bc_ini_entry *e, const file_key keys[], size_t count);

/* A key of [supply]. */
bc_status gas_file_supply_key(reader *r, const bc_ini_entry *e);

#endif
