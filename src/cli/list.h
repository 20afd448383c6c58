/* SPDX-License-Identifier: MIT */
/* list.h - the lists that need more than a table of texts. */
#ifndef LIST_H
#define LIST_H

#include "cli/cli.h"

/* Columns headed by their ids, and one row of texts under them. */
void list_columns(report *r, size_t table, const char *const ids[], size_t count);
void list_row(report *r, size_t table, const char *const cells[], size_t count);

/* True when a row begins with this name: a name found twice belongs to the folder searched first. */
bool list_has(const report *r, size_t table, const char *name);

/* All bundled gases, or one with its composition and source. */
bc_status list_gases(report *r, const char *name, bc_error *err);

/* All bundled specifications, or one with its limits and source. */
bc_status list_specifications(report *r, const char *name, bc_error *err);

/* All species, or one with each datum and its source. */
bc_status list_species(report *r, const char *name, bc_error *err);

#endif
