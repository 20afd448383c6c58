/* SPDX-License-Identifier: MIT */
/* digits.c - decimal numbers with one correctly rounded operation each, and a proof that it was enough. */
#include "base/digits.h"

#include "base/compiler.h"
#include "base/text.h"

#include <math.h>
#include <stdint.h>
#include <string.h>

/* All of these are exact doubles: 5^22 < 2^53. */
static const double TEN_TO[] = {1e0,  1e1,  1e2,  1e3,  1e4,  1e5,  1e6,  1e7,  1e8,  1e9,  1e10, 1e11,
                                1e12, 1e13, 1e14, 1e15, 1e16, 1e17, 1e18, 1e19, 1e20, 1e21, 1e22};

static bool is_digit(char c)
{
    return c >= '0' && c <= '9';
}

/* Digits and power of ten are both exact, so the quotient is rounded once, as strtod() would
 * (W. D. Clinger, How to read floating point numbers accurately, PLDI 1990). */
const char *bc_digits_scan(const char *text, const char *end, char mark, double *value)
{
    const char *p = text;
    const bool negative = p < end && *p == '-';
    uint64_t digits = 0;
    int decimals = 0;

    if (p < end && (*p == '-' || *p == '+'))
        p++;
    const char *first = p;

    for (; p < end && is_digit(*p); p++)
        digits = digits * 10U + (uint64_t)(*p - '0');
    size_t count = (size_t)(p - first);

    if (p < end && *p == mark) {
        const char *behind = ++p;

        for (; p < end && is_digit(*p); p++)
            digits = digits * 10U + (uint64_t)(*p - '0');
        decimals = (int)(p - behind);
        count += (size_t)decimals;
    }
    if (count == 0 || count > BC_DIGITS_MAX || (p < end && (*p == 'e' || *p == 'E')))
        return NULL;
    const double magnitude = (double)digits / TEN_TO[decimals];

    *value = negative ? -magnitude : magnitude;
    return p;
}

/* The decimal exponent of a value in 1e-4..1e15. Below one the doubles nearest to the powers of ten lie above them and
 * their neighbours below, so a comparison of doubles is one of numbers. */
static int exponent_of(double value)
{
    int exponent = 0;

    if (value < 1.0)
        return value >= 1e-1 ? -1 : value >= 1e-2 ? -2 : value >= 1e-3 ? -3 : -4;
    while (value >= TEN_TO[exponent + 1])
        exponent++;
    return exponent;
}

/* value * 10^places to the nearest whole number, ties to even as printf() has them. The product and what its rounding
 * lost are exact together (fused multiply-add), so the half is never missed. Below 2^53. */
static uint64_t scaled(double value, int places)
{
    const double product = value * TEN_TO[places];
    const double lost = fma(value, TEN_TO[places], -product);
    const uint64_t whole = (uint64_t)product;
    const double beyond = product - (double)whole - 0.5;
    const bool half = !(beyond < 0.0) && !(beyond > 0.0);

    if (half && !(lost < 0.0) && !(lost > 0.0))
        return whole + (whole & 1U);
    return whole + (half ? lost > 0.0 : beyond > 0.0);
}

/* Writes exactly `count` digits of a number. */
static void put_digits(uint64_t number, int count, char *to)
{
    static const char PAIRS[] = "00010203040506070809101112131415161718192021222324252627282930313233343536373839"
                                "40414243444546474849505152535455565758596061626364656667686970717273747576777879"
                                "8081828384858687888990919293949596979899";

    for (; count >= 2; count -= 2, number /= 100U)
        memcpy(to + count - 2, PAIRS + 2U * (number % 100U), 2);
    if (count == 1)
        to[0] = (char)('0' + number % 10U);
}

static size_t print_in_general(double value, int digits, char mark, char out[])
{
    char *point;

    (void)bc_text_format(out, BC_DIGITS_TEXT, "%.*g", digits, value);
    point = strchr(out, '.');
    if (point)
        *point = mark;
    return strlen(out);
}

/* Digits with the mark between them, zeros at the end of the fraction dropped. */
static size_t place(const char digits[], int count, int exponent, char mark, char *out)
{
    char *p = out;
    int kept = count;

    while (kept > 1 && kept > exponent + 1 && digits[kept - 1] == '0')
        kept--;
    if (exponent < 0) {
        *p++ = '0';
        *p++ = mark;
        for (int i = exponent + 1; i < 0; i++)
            *p++ = '0';
        memcpy(p, digits, (size_t)kept);
        p += kept;
    } else {
        memcpy(p, digits, (size_t)exponent + 1);
        p += exponent + 1;
        if (kept > exponent + 1) {
            *p++ = mark;
            memcpy(p, digits + exponent + 1, (size_t)(kept - exponent - 1));
            p += kept - exponent - 1;
        }
    }
    *p = '\0';
    return (size_t)(p - out);
}

size_t bc_digits_print(double value, int digits, char mark, char out[])
{
    const double magnitude = fabs(value);
    char text[BC_DIGITS_MAX + 1];

    if (!(magnitude >= 1e-4 && magnitude < 1e15)) {
        if (magnitude > 0.0)
            return print_in_general(value, digits, mark, out);
        memcpy(out, "0", 2);
        return 1;
    }
    int exponent = exponent_of(magnitude);

    if (exponent >= digits)
        return print_in_general(value, digits, mark, out);
    uint64_t number = scaled(magnitude, digits - 1 - exponent);

    if ((double)number >= TEN_TO[digits]) { /* 9.99... became 10.00... */
        number /= 10U;
        if (++exponent >= digits)
            return print_in_general(value, digits, mark, out);
    }
    put_digits(number, digits, text);
    if (value < 0.0)
        *out = '-';
    return (value < 0.0 ? 1U : 0U) + place(text, digits, exponent, mark, out + (value < 0.0));
}
