/* SPDX-License-Identifier: MIT */
/* number.c - text to double: one grammar, checked to the last character, free of the locale. */
#include "bluecone/number.h"

#include "base/error_internal.h"
#include "base/text.h"

#include <float.h>
#include <langinfo.h>
#include <math.h>
#include <stdbool.h>
#include <stdint.h>
#include <stdlib.h>
#include <string.h>

#define NUMBER_MAX 63 /* characters of one number; a double needs at most 24 to round-trip */

/* A number taken apart: value = (negative ? -1 : 1) * digits * 10^exponent. */
typedef struct {
    bool negative;
    bool inexact;      /* more digits than fit the 64-bit integer */
    bool nonzero;      /* any digit other than 0 */
    int digit_count;   /* of the mantissa as written */
    int exponent;
    uint64_t digits;
    const char *end;   /* behind the last character of the number */
} decimal;

static bool is_digit(char c)
{
    return c >= '0' && c <= '9';
}

static void take_digit(decimal *d, char c, bool fraction)
{
    const uint64_t digit = (uint64_t)(c - '0');

    d->digit_count++;
    d->nonzero = d->nonzero || digit != 0;
    if (d->digits > (UINT64_MAX - digit) / 10U) {
        d->inexact = true;
        d->exponent += fraction ? 0 : 1;
        return;
    }
    d->digits = d->digits * 10U + digit;
    d->exponent -= fraction ? 1 : 0;
}

/* The exponent behind an 'e', clamped: beyond 4 digits nothing fits a double anyway. */
static const char *take_exponent(decimal *d, const char *p)
{
    const char *q = p + 1;
    bool negative = false;
    int exponent = 0;

    if (*q == '+' || *q == '-')
        negative = *q++ == '-';
    if (!is_digit(*q))
        return p;
    for (; is_digit(*q); q++)
        exponent = exponent < 10000 ? exponent * 10 + (*q - '0') : exponent;
    d->exponent += negative ? -exponent : exponent;
    return q;
}

static bool take_apart(const char *text, decimal *d)
{
    const char *p = text;

    memset(d, 0, sizeof *d);
    if (*p == '+' || *p == '-')
        d->negative = *p++ == '-';
    for (; is_digit(*p); p++)
        take_digit(d, *p, false);
    if (*p == '.')
        for (p++; is_digit(*p); p++)
            take_digit(d, *p, true);
    if (d->digit_count == 0)
        return false;
    if (*p == 'e' || *p == 'E')
        p = take_exponent(d, p);
    d->end = p;
    return true;
}

/* Exact when mantissa and power of ten are both exact doubles: one correctly rounded operation
 * (W. D. Clinger, How to read floating point numbers accurately, PLDI 1990). */
static bool convert_exactly(const decimal *d, double *value)
{
    static const double TEN_TO[] = {1e0,  1e1,  1e2,  1e3,  1e4,  1e5,  1e6,  1e7,  1e8,  1e9,  1e10, 1e11,
                                    1e12, 1e13, 1e14, 1e15, 1e16, 1e17, 1e18, 1e19, 1e20, 1e21, 1e22};
    const int limit = (int)BC_COUNT(TEN_TO) - 1;

    if (d->inexact || d->digits > (UINT64_C(1) << DBL_MANT_DIG) || d->exponent < -limit || d->exponent > limit)
        return false;
    const double digits = (double)d->digits;
    const double magnitude = d->exponent < 0 ? digits / TEN_TO[-d->exponent] : digits * TEN_TO[d->exponent];
    *value = d->negative ? -magnitude : magnitude;
    return true;
}

/* The C library's strtod reads the decimal mark of the host program's locale: give it that mark. */
static double convert_by_library(const char *text, size_t length)
{
    char local[NUMBER_MAX + 16];
    const char *mark = nl_langinfo(RADIXCHAR); /* localeconv() writes into an object that threads share */
    const size_t mark_length = strlen(mark);
    size_t n = 0;

    for (size_t i = 0; i < length && n + mark_length < sizeof local - 1; i++) {
        if (text[i] == '.') {
            memcpy(local + n, mark, mark_length);
            n += mark_length;
        } else {
            local[n++] = text[i];
        }
    }
    local[n] = '\0';
    char *end = NULL;
    const double value = strtod(local, &end);

    return end == local + n ? value : HUGE_VAL;
}

static bc_status refuse_start(const char *text, bc_error *err)
{
    char shown[32];

    bc_text_show(shown, sizeof shown, text);
    if (*text == '\0')
        return bc_fail(err, BC_ERR_INPUT, "a number is missing; write it with a decimal point, as 12.5");
    return bc_fail(err, BC_ERR_INPUT, "'%s' is not a number; write it with a decimal point, as 12.5", shown);
}

bc_status bc_number_prefix(const char *text, double *value, const char **rest, bc_error *err)
{
    const char *start = bc_text_skip_space(text);
    decimal d;

    if (!take_apart(start, &d))
        return refuse_start(start, err);
    const size_t length = (size_t)(d.end - start);
    char shown[32];

    bc_text_show(shown, sizeof shown, start);
    if (*d.end == ',' && is_digit(d.end[1]))
        return bc_fail(err, BC_ERR_INPUT, "'%s' has a decimal comma; write a decimal point instead", shown);
    if (length > NUMBER_MAX)
        return bc_fail(err, BC_ERR_INPUT, "the number '%s' has more than %d characters; shorten it", shown, NUMBER_MAX);
    double v = 0.0;

    if (!convert_exactly(&d, &v))
        v = convert_by_library(start, length);
    if (!isfinite(v) || (v == 0.0 && d.nonzero))
        return bc_fail(err, BC_ERR_INPUT, "'%s' is outside the range of numbers (1e-307 to 1e308); correct it", shown);
    *value = v;
    *rest = bc_text_skip_space(d.end);
    return BC_OK;
}

bc_status bc_number_parse(const char *text, double *value, bc_error *err)
{
    const char *rest = "";
    double v = 0.0;
    const bc_status status = bc_number_prefix(text, &v, &rest, err);

    if (status != BC_OK)
        return status;
    if (*rest != '\0')
        return refuse_start(bc_text_skip_space(text), err);
    *value = v;
    return BC_OK;
}
