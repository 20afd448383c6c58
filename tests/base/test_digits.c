/* SPDX-License-Identifier: MIT */
/* test_digits.c - the fast numbers against strtod() and printf() of the C library, which are the source of every
 * expected value here. */
#include "base/digits.h"
#include "support.h"

#include <float.h>
#include <math.h>
#include <stdint.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>

static uint64_t seed = 20261201;

static uint64_t next(void)
{
    seed ^= seed << 13;
    seed ^= seed >> 7;
    seed ^= seed << 17;
    return seed;
}

static double unit(void)
{
    return (double)(next() >> 11) / 9007199254740992.0;
}

static void check_scan(const char *text)
{
    double value = -1.0;
    const char *end = text + strlen(text);
    const char *behind = bc_digits_scan(text, end, '.', &value);

    if (!behind)
        return;
    const double expected = strtod(text, NULL);

    assert_ptr_equal(behind, end);
    assert_memory_equal(&value, &expected, sizeof value);
}

static void a_plain_number_is_read_as_strtod_reads_it(void **state)
{
    static const char *const EDGES[] = {"0", "-0", "0.0", "1", "+1", "1.", ".5", "-.5", "999999999999999", "0.000000000000001",
                                        "123456789.123456", "000000000000.01", "9007199254.740993", "0.1", "0.3", "5e-324"};
    char text[64];

    (void)state;
    for (size_t i = 0; i < sizeof EDGES / sizeof *EDGES; i++)
        check_scan(EDGES[i]);
    for (int i = 0; i < 400000; i++) {
        snprintf(text, sizeof text, "%.*f", (int)(next() % 10), (unit() - 0.5) * pow(10.0, (double)(next() % 9)));
        check_scan(text);
        snprintf(text, sizeof text, "%llu.%0*llu", (unsigned long long)(next() % 100000000ULL), 7, (unsigned long long)(next() % 10000000ULL));
        check_scan(text);
    }
}

static void what_is_not_plain_is_left_to_the_general_reader(void **state)
{
    static const char *const OTHERS[] = {"", "-", "+", ".", "1e3", "1E3", "1234567890123456", "0.1234567890123456", "<1", " 1", "x"};
    double value = 7.0;

    (void)state;
    for (size_t i = 0; i < sizeof OTHERS / sizeof *OTHERS; i++)
        assert_null(bc_digits_scan(OTHERS[i], OTHERS[i] + strlen(OTHERS[i]), '.', &value));
    assert_true(value == 7.0);
}

static void reading_stops_at_the_end_and_behind_the_number(void **state)
{
    const char *text = "12,5;3";
    double value = 0.0;

    (void)state;
    assert_ptr_equal(bc_digits_scan(text, text + 6, ',', &value), text + 4);
    assert_true(value == 12.5);
    assert_ptr_equal(bc_digits_scan(text, text + 1, ',', &value), text + 1);
    assert_true(value == 1.0);
    assert_ptr_equal(bc_digits_scan(text, text + 6, '.', &value), text + 2);
    assert_true(value == 12.0);
}

static void check_print(double value, int digits)
{
    char expected[64], got[BC_DIGITS_TEXT];

    snprintf(expected, sizeof expected, "%.*g", digits, value);
    if (strcmp(expected, "-0") == 0)
        memcpy(expected, "0", 2);
    assert_int_equal(bc_digits_print(value, digits, '.', got), strlen(expected));
    assert_string_equal(got, expected);
}

static void a_number_is_written_as_printf_writes_it(void **state)
{
    (void)state;
    for (int i = 0; i < 400000; i++) {
        const int digits = 1 + (int)(next() % BC_DIGITS_MAX);

        check_print((unit() - 0.5) * pow(10.0, (double)(next() % 12)), digits);
        check_print(unit() * pow(10.0, (double)(next() % 24) - 8.0), digits);
    }
}

static void any_bit_pattern_is_written_as_printf_writes_it(void **state)
{
    (void)state;
    for (int i = 0; i < 200000; i++) {
        const uint64_t bits = next();
        double value = 0.0;

        memcpy(&value, &bits, sizeof value);
        if (isfinite(value))
            check_print(value, 1 + (int)(next() % BC_DIGITS_MAX));
    }
}

/* Ties and their neighbours, powers of ten and theirs: where a rounding can go wrong. */
static void boundaries_are_written_as_printf_writes_them(void **state)
{
    (void)state;
    for (int digits = 1; digits <= BC_DIGITS_MAX; digits++) {
        for (int e = -6; e <= 17; e++) {
            const double power = pow(10.0, e);

            check_print(power, digits);
            check_print(nextafter(power, 0.0), digits);
            check_print(nextafter(power, DBL_MAX), digits);
            check_print(9.9999999999999995 * power, digits);
            check_print(9.5 * power, digits);
        }
        for (int i = 0; i < 20000; i++) {
            /* a whole number and an odd eighth: exact in binary, often a tie at some digit */
            const double tie = (double)(next() % 1000000) + (double)(next() % 8) / 8.0;

            check_print(tie, digits);
            check_print(nextafter(tie, 0.0), digits);
            check_print(nextafter(tie, DBL_MAX), digits);
        }
    }
    check_print(0.0, 6);
    check_print(-0.0, 6);
    check_print(DBL_MIN, 15);
    check_print(DBL_TRUE_MIN, 15);
    check_print(DBL_MAX, 15);
}

static void another_mark_stands_for_the_point(void **state)
{
    char got[BC_DIGITS_TEXT];

    (void)state;
    bc_digits_print(-12.5, 6, ',', got);
    assert_string_equal(got, "-12,5");
    bc_digits_print(1.25e-7, 6, ',', got);
    assert_string_equal(got, "1,25e-07");
    bc_digits_print(1.25e17, 6, ',', got);
    assert_string_equal(got, "1,25e+17");
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(a_plain_number_is_read_as_strtod_reads_it),
        cmocka_unit_test(what_is_not_plain_is_left_to_the_general_reader),
        cmocka_unit_test(reading_stops_at_the_end_and_behind_the_number),
        cmocka_unit_test(a_number_is_written_as_printf_writes_it),
        cmocka_unit_test(any_bit_pattern_is_written_as_printf_writes_it),
        cmocka_unit_test(boundaries_are_written_as_printf_writes_them),
        cmocka_unit_test(another_mark_stands_for_the_point),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
