/* SPDX-License-Identifier: MIT */
/* gas_text.h - a gas from a text: JSON, a literal, or the name of a bundled gas. */
#ifndef GAS_TEXT_H
#define GAS_TEXT_H

#include "sqlite/connection.h"

#define COMPOSITION_BYTES 65536 /* longest text that is taken for a composition */

/* Reads a composition. No file is opened but those of the bundled gases.
 *
 *   gas      out: the gas
 *   spread   out: its uncertainty, until the next call; NULL when none is stated
 *
 * BC_ERR_INPUT: no composition, with cause and remedy; BC_ERR_FILE, BC_ERR_MEMORY. */
BC_MUST_USE bc_status gas_from_text(connection *c, const word *w, bc_gas *gas, const bc_spread **spread, bc_error *err);

/* The gas of a JSON object of components and their mole per cent; null is zero. */
BC_MUST_USE bc_status gas_from_json(connection *c, const word *w, bc_gas *gas, bc_error *err);

#endif
