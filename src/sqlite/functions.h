/* SPDX-License-Identifier: MIT */
/* functions.h - what the module registers; bluecone-sqlite(7) is its manual. */
#ifndef FUNCTIONS_H
#define FUNCTIONS_H

#include "sqlite/connection.h"
#include "sqlite/extension.h"

/* gas_value(quantity, composition [, state]) or (quantity, state, component, share, ...). */
void gas_value(sqlite3_context *context, int count, sqlite3_value **values);

/* The same; NULL for a row that has no value. */
void gas_value_or_null(sqlite3_context *context, int count, sqlite3_value **values);

/* gas_unit(quantity), gas_version(). */
void gas_unit(sqlite3_context *context, int count, sqlite3_value **values);
void gas_version(sqlite3_context *context, int count, sqlite3_value **values);

/* The table function gas_sheet(composition [, state]). */
extern const sqlite3_module GAS_SHEET;

/* Answers a call with the sentence of an error; without memory with SQLite's own. */
void functions_fail(sqlite3_context *context, const char *name, const bc_error *err);

#endif
