/* SPDX-License-Identifier: MIT */
/* number_text_internal.h - numbers as text, the same in every locale.
 *
 * The decimal point is '.'; between 1e-4 and 1e15 there is no exponent; there is no "-0" and never
 * a "nan" or "inf": what is not finite becomes "-". */
#ifndef NUMBER_TEXT_INTERNAL_H
#define NUMBER_TEXT_INTERNAL_H

#define NUMBER_TEXT_MAX 64 /* bytes of any number, with the final NUL */

/* With 1 to 17 significant digits, trailing zeros kept; digits before the point that are not
 * significant become 0. */
void number_significant(double value, int digits, char out[NUMBER_TEXT_MAX]);

/* With a fixed number of decimals, at most 20; below 0: rounded to tens, hundreds, ... */
void number_decimals(double value, int decimals, char out[NUMBER_TEXT_MAX]);

/* A value with its standard uncertainty u >= 0, as the GUM has it (JCGM 100:2008, 7.2.6): u to two
 * significant digits, the value to the same decimal place. u = 0 decides nothing: the value then
 * gets `digits`. */
void number_uncertain(double value, double u, int digits, char out[NUMBER_TEXT_MAX],
                      char u_out[NUMBER_TEXT_MAX]);

/* For machines: up to so many significant digits (0: 12), no trailing zeros, an exponent where it is
 * shorter; "" if not finite. */
void number_plain(double value, int digits, char out[NUMBER_TEXT_MAX]);

#endif
