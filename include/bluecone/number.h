/* SPDX-License-Identifier: MIT */
/* bluecone/number.h - numbers as people write them in files and options, in every locale alike. */
#ifndef BLUECONE_NUMBER_H
#define BLUECONE_NUMBER_H

#include <stddef.h>

#include "bluecone/status.h"

#ifdef __cplusplus
extern "C" {
#endif

/* Reads a whole decimal number: [+-]digits[.digits][(e|E)[+-]digits], spaces around it allowed.
 *
 *   text   the number and nothing else, at most 63 characters without the spaces
 *   value  out: the double nearest to the decimal; untouched on failure
 *   err    out: the cause and the remedy; may be NULL
 *
 * The decimal mark is a point in every locale. Refused with BC_ERR_INPUT: an empty text, a decimal
 * comma (named as such), hexadecimal, inf and nan, a value beyond the range of a double (overflow or
 * underflow to zero of a figure that is not zero), anything behind the number. */
BC_API BC_MUST_USE bc_status bc_number_parse(const char *text, double *value, bc_error *err);

/* Reads the number that a text starts with, written right before a unit ("101.325kPa", "15 C").
 *
 *   value  out: as above
 *   rest   out: the first character behind the number and the spaces after it
 *
 * The same rules, but anything may follow. An 'e' counts as an exponent only before digits. */
BC_API BC_MUST_USE bc_status bc_number_prefix(const char *text, double *value, const char **rest,
                                              bc_error *err);

#ifdef __cplusplus
}
#endif

#endif
