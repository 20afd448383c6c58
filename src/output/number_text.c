/* SPDX-License-Identifier: MIT */
/* number_text.c - how many digits of a number are printed, and how. */
#include "output/number_text_internal.h"

#include "base/digits.h"

#include <math.h>
#include <stdbool.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>

#define DIGITS_MAX   17 /* tells every double from its neighbours */
#define DIGITS_KNOWN 15 /* every decimal number of so many digits survives in a double */
#define DECIMALS_MAX 20
#define FIXED_FROM   (-4) /* decimal exponents printed without an exponent */
#define FIXED_BELOW  15
#define PLAIN_DIGITS 12 /* as in JSON */

static int within(int value, int low, int high)
{
    return value < low ? low : value > high ? high : value;
}

/* Puts '.' for the locale's decimal point, which may be several bytes: it is all that printf
 * writes into a number that is neither digit nor sign nor 'e'. Asking localeconv() instead would
 * not be safe beside other threads. */
static void use_point(char *text)
{
    const size_t before = strspn(text, "+-0123456789e");
    const size_t point = strcspn(text + before, "+-0123456789e");

    if (point == 0)
        return;
    text[before] = '.';
    memmove(text + before + 1, text + before + point, strlen(text + before + point) + 1);
}

/* "-0.00" says more about rounding than about the value. */
static void drop_sign_of_zero(char *text)
{
    if (text[0] == '-' && strspn(text + 1, "0.") == strlen(text + 1))
        memmove(text, text + 1, strlen(text));
}

static void print_fixed(double value, int decimals, char out[NUMBER_TEXT_MAX])
{
    snprintf(out, NUMBER_TEXT_MAX, "%.*f", within(decimals, 0, DECIMALS_MAX), value);
    use_point(out);
    drop_sign_of_zero(out);
}

static void print_exponent(double value, int digits, char out[NUMBER_TEXT_MAX])
{
    snprintf(out, NUMBER_TEXT_MAX, "%.*e", within(digits, 1, DIGITS_MAX) - 1, value);
    use_point(out);
}

static void print_nothing(char out[NUMBER_TEXT_MAX])
{
    memcpy(out, "-", sizeof "-");
}

/* The decimal exponent of a value once it is rounded to so many digits; 0 for 0. */
static int exponent_of(double value, int digits)
{
    char text[NUMBER_TEXT_MAX];

    print_exponent(value, digits, text);
    return (int)strtol(strchr(text, 'e') + 1, NULL, 10);
}

static bool is_fixed(int exponent)
{
    return exponent >= FIXED_FROM && exponent < FIXED_BELOW;
}

/* The value rounded to a power of ten above 1. */
static double round_to(double value, int power)
{
    double step = 1.0;

    for (int i = 0; i < power; i++)
        step *= 10.0;
    return round(value / step) * step;
}

void number_significant(double value, int digits, char out[NUMBER_TEXT_MAX])
{
    if (!isfinite(value)) {
        print_nothing(out);
        return;
    }

    const int kept = within(digits, 1, DIGITS_MAX);
    const int exponent = exponent_of(value, kept);
    if (is_fixed(exponent))
        number_decimals(value, kept - 1 - exponent, out);
    else
        print_exponent(value, kept, out);
}

void number_decimals(double value, int decimals, char out[NUMBER_TEXT_MAX])
{
    const int exponent = isfinite(value) ? exponent_of(value, DIGITS_KNOWN) : 0;

    if (!isfinite(value))
        print_nothing(out);
    else if (exponent >= FIXED_BELOW)
        print_exponent(value, within(exponent + 1 + decimals, 1, DIGITS_KNOWN), out);
    else if (decimals < 0)
        print_fixed(round_to(value, -decimals), 0, out);
    else
        print_fixed(value, decimals, out);
}

void number_uncertain(double value, double u, int digits, char out[NUMBER_TEXT_MAX],
                      char u_out[NUMBER_TEXT_MAX])
{
    if (!isfinite(value) || !isfinite(u) || u <= 0.0) {
        number_significant(value, digits, out);
        number_decimals(u, 0, u_out);
        return;
    }

    const int exponent = exponent_of(value, DIGITS_KNOWN);
    const int decimals = 1 - exponent_of(u, 2);
    const int needed = exponent + 1 + decimals; /* digits of the value down to the place of u */
    if (is_fixed(exponent) && needed <= DIGITS_KNOWN) {
        number_decimals(value, decimals, out);
        number_decimals(u, decimals, u_out);
    } else {
        number_significant(value, within(needed, 1, DIGITS_KNOWN), out);
        number_significant(u, 2, u_out);
    }
}

void number_plain(double value, int digits, char out[NUMBER_TEXT_MAX])
{
    const int kept = digits > 0 ? within(digits, 1, DIGITS_MAX) : PLAIN_DIGITS;

    out[0] = '\0';
    if (!isfinite(value))
        return;
    if (kept <= BC_DIGITS_MAX) {
        (void)bc_digits_print(value, kept, '.', out);
        return;
    }
    snprintf(out, NUMBER_TEXT_MAX, "%.*g", kept, value);
    use_point(out);
    drop_sign_of_zero(out);
}
