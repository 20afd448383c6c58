/* SPDX-License-Identifier: MIT */
/* fuzz_digits.c - the fast numbers against strtod() and snprintf(). */
#include "fuzz.h"

#include "base/digits.h"

static void check_scan(const char *text, size_t length)
{
    double value = 0.0;
    const char *behind = bc_digits_scan(text, text + length, '.', &value);

    if (!behind)
        return;
    char *number = fuzz_text((const uint8_t *)text, (size_t)(behind - text));
    char *end = NULL;
    const double want = strtod(number, &end);

    fuzz_require(behind > text && behind <= text + length);
    fuzz_require(*end == '\0');
    fuzz_require(memcmp(&value, &want, sizeof value) == 0);
    free(number);
}

static void check_print(double value, int digits)
{
    char want[64];
    char got[BC_DIGITS_TEXT];

    (void)snprintf(want, sizeof want, "%.*g", digits, value);
    fuzz_require(bc_digits_print(value, digits, '.', got) == strlen(got));
    fuzz_require(strcmp(got, strcmp(want, "-0") == 0 ? "0" : want) == 0);
}

/* A byte for the digits, then a double as bytes, then as text. */
int LLVMFuzzerTestOneInput(const uint8_t *data, size_t size)
{
    fuzz_bytes b = {data, size};
    const int digits = 1 + fuzz_byte(&b) % BC_DIGITS_MAX;
    const double value = fuzz_double(&b);

    if (isfinite(value))
        check_print(value, digits);
    if (size <= 1)
        return 0;
    char *text = fuzz_text(data + 1, size - 1);
    const double written = strtod(text, NULL);

    check_scan(text, size - 1);
    if (isfinite(written))
        check_print(written, digits);
    free(text);
    return 0;
}
