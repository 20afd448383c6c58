/* SPDX-License-Identifier: MIT */
/* test_number_text.c - the digits of numbers, whatever the locale. */
#include <stdarg.h>
#include <stddef.h>
#include <setjmp.h>
#include <stdint.h>

#include <cmocka.h>

#include "output/number_text_internal.h"

#include "support.h"

#include <locale.h>
#include <math.h>

static void assert_significant(double value, int digits, const char *wanted)
{
    char text[NUMBER_TEXT_MAX];

    number_significant(value, digits, text);
    assert_string_equal(text, wanted);
}

static void assert_decimals(double value, int decimals, const char *wanted)
{
    char text[NUMBER_TEXT_MAX];

    number_decimals(value, decimals, text);
    assert_string_equal(text, wanted);
}

static void assert_uncertain(double value, double u, const char *wanted, const char *wanted_u)
{
    char text[NUMBER_TEXT_MAX], u_text[NUMBER_TEXT_MAX];

    number_uncertain(value, u, 6, text, u_text);
    assert_string_equal(text, wanted);
    assert_string_equal(u_text, wanted_u);
}

static void assert_plain(double value, int digits, const char *wanted)
{
    char text[NUMBER_TEXT_MAX];

    number_plain(value, digits, text);
    assert_string_equal(text, wanted);
}

static void significant_digits_keep_their_trailing_zeros(void **state)
{
    (void)state;
    assert_significant(39.7, 6, "39.7000");
    assert_significant(0.61234567, 6, "0.612346");
    assert_significant(-17.25, 3, "-17.2");
    assert_significant(0.0, 4, "0.000");
}

static void rounding_up_to_the_next_power_of_ten_adds_no_digit(void **state)
{
    (void)state;
    assert_significant(9.99996, 5, "10.000");
    assert_significant(999.6, 3, "1000");
    assert_significant(0.000099999, 3, "0.000100");
}

static void digits_before_the_point_that_mean_nothing_are_zero(void **state)
{
    (void)state;
    assert_significant(1234567.0, 3, "1230000");
    assert_significant(101325.0, 6, "101325");
    assert_decimals(45678.9, -2, "45700");
}

static void an_exponent_appears_only_outside_1e_minus_4_to_1e15(void **state)
{
    (void)state;
    assert_significant(0.000123456, 3, "0.000123");
    assert_significant(0.0000123456, 3, "1.23e-05");
    assert_significant(987654321012345.0, 15, "987654321012345");
    assert_significant(1.2345e15, 5, "1.2345e+15");
    assert_decimals(-1.5e300, 1, "-1.50000000000000e+300");
}

static void decimals_are_fixed_and_zero_has_no_sign(void **state)
{
    (void)state;
    assert_decimals(91.3, 2, "91.30");
    assert_decimals(2.7, 0, "3");
    assert_decimals(-0.0004, 2, "0.00");
    assert_decimals(-0.006, 2, "-0.01");
    assert_significant(-0.0, 3, "0.00");
}

static void an_uncertainty_decides_the_decimal_place(void **state)
{
    (void)state;
    assert_uncertain(39.73512, 0.0131, "39.735", "0.013");
    assert_uncertain(39.73512, 0.0996, "39.74", "0.10");
    assert_uncertain(892.9237, 1.94, "892.9", "1.9");
    assert_uncertain(45678.9, 1234.0, "45700", "1200");
    assert_uncertain(0.0001, 1.3, "0.0", "1.3");
    assert_uncertain(0.5, 0.0000131, "0.500000", "0.000013");
}

static void an_uncertainty_serves_very_small_and_very_large_values(void **state)
{
    (void)state;
    assert_uncertain(1.2345e-7, 1.31e-9, "1.235e-07", "1.3e-09");
    assert_uncertain(-6.5432e20, 3.14e18, "-6.543e+20", "3.1e+18");
}

static void an_uncertainty_below_the_last_digit_of_a_double_brings_up_no_noise(void **state)
{
    (void)state;
    assert_uncertain(0.1, 1e-19, "0.100000000000000", "1.0e-19");
}

static void no_uncertainty_leaves_the_digits_of_the_result(void **state)
{
    (void)state;
    assert_uncertain(39.73512, 0.0, "39.7351", "0");
}

static void what_is_not_finite_is_a_dash_for_people_and_nothing_for_machines(void **state)
{
    (void)state;
    assert_significant(nan(""), 6, "-");
    assert_significant(HUGE_VAL, 6, "-");
    assert_decimals(-HUGE_VAL, 2, "-");
    assert_uncertain(nan(""), 0.1, "-", "0");
    assert_uncertain(39.73512, nan(""), "39.7351", "-");
    assert_plain(nan(""), 0, "");
    assert_plain(-HUGE_VAL, 0, "");
}

static void machines_get_twelve_digits_without_trailing_zeros(void **state)
{
    (void)state;
    assert_plain(1.0 / 3.0, 0, "0.333333333333");
    assert_plain(39.7, 0, "39.7");
    assert_plain(-0.0, 0, "0");
    assert_plain(1.0 / 3.0, 4, "0.3333");
}

static void a_locale_with_a_decimal_comma_changes_nothing(void **state)
{
    (void)state;
    use_german_numbers();
    assert_string_equal(localeconv()->decimal_point, ",");
    assert_significant(39.7, 6, "39.7000");
    assert_significant(1.23456e-7, 3, "1.23e-07");
    assert_decimals(91.3, 2, "91.30");
    assert_uncertain(39.73512, 0.0131, "39.735", "0.013");
    assert_plain(0.25, 0, "0.25");
}

static int back_to_c(void **state)
{
    (void)state;
    return setlocale(LC_ALL, "C") == NULL;
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(significant_digits_keep_their_trailing_zeros),
        cmocka_unit_test(rounding_up_to_the_next_power_of_ten_adds_no_digit),
        cmocka_unit_test(digits_before_the_point_that_mean_nothing_are_zero),
        cmocka_unit_test(an_exponent_appears_only_outside_1e_minus_4_to_1e15),
        cmocka_unit_test(decimals_are_fixed_and_zero_has_no_sign),
        cmocka_unit_test(an_uncertainty_decides_the_decimal_place),
        cmocka_unit_test(an_uncertainty_serves_very_small_and_very_large_values),
        cmocka_unit_test(an_uncertainty_below_the_last_digit_of_a_double_brings_up_no_noise),
        cmocka_unit_test(no_uncertainty_leaves_the_digits_of_the_result),
        cmocka_unit_test(what_is_not_finite_is_a_dash_for_people_and_nothing_for_machines),
        cmocka_unit_test(machines_get_twelve_digits_without_trailing_zeros),
        cmocka_unit_test_teardown(a_locale_with_a_decimal_comma_changes_nothing, back_to_c),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
