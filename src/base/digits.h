/* SPDX-License-Identifier: MIT */
/* digits.h - decimal numbers read and written fast, where it can be done exactly.
 *
 * A log of a year is a hundred million numbers: the C library spends more time on them than the physics does. These
 * take the common cases alone and leave the rest to the general functions; tests prove them equal to strtod() and
 * printf() over random and boundary values. */
#ifndef DIGITS_H
#define DIGITS_H

#include <stdbool.h>
#include <stddef.h>

#define BC_DIGITS_MAX 15  /* significant digits that can be asked for */
#define BC_DIGITS_TEXT 32 /* bytes that a number takes at most, with the final NUL */

/* Reads a plain decimal number, [+-]digits[mark digits], from text[0..end).
 *
 *   mark    decimal mark
 *   value   out: the double nearest to the number; untouched when it was not read
 *
 * Returns where the number ends, or NULL when it must be read in general: an exponent, more than 15 digits behind
 * leading zeros, no digit at all. */
const char *bc_digits_scan(const char *text, const char *end, char mark, double *value);

/* Writes a finite number as "%.*g" of the C locale does, -0 as 0; another mark may stand for the point.
 *
 *   digits   significant digits, 1..BC_DIGITS_MAX
 *   out      BC_DIGITS_TEXT bytes; gets a final NUL
 *
 * Returns the length. */
size_t bc_digits_print(double value, int digits, char mark, char out[]);

#endif
