/* SPDX-License-Identifier: MIT */
/* test_number.c - text to double: exact, locale-free, and nothing passes that is not a number. */
#include "support.h"

#include "bluecone/number.h"

#include <float.h>

static void assert_bits(const char *text, double want)
{
    double got = 0.0;
    bc_error err;

    assert_ok(bc_number_parse(text, &got, &err), &err);
    if (memcmp(&got, &want, sizeof got) != 0)
        fail_msg("%s reads as %.17g, want %.17g", text, got, want);
}

static void assert_no_number(const char *text, const char *words)
{
    double value = 47.11;
    bc_error err = {.status = BC_OK};

    assert_refused_at(text, bc_number_parse(text, &value, &err), &err, BC_ERR_INPUT, words);
    assert_true(value == 47.11);
    assert_int_equal(bc_number_parse(text, &value, NULL), BC_ERR_INPUT);
}

static void two_hundred_thousand_doubles_with_17_digits_read_back_bit_by_bit(void **state)
{
    chance c = {20240611};

    (void)state;
    for (int i = 0; i < 200000; i++) {
        const uint64_t bits = chance_bits(&c);
        double value = 0.0;
        char text[40];

        memcpy(&value, &bits, sizeof value);
        if (!isfinite(value) || value == 0.0)
            continue;
        (void)snprintf(text, sizeof text, "%.17g", value);
        assert_bits(text, value);
    }
}

static void decimals_of_certificates_agree_with_the_c_library(void **state)
{
    static const char *const FORMATS[] = {"%.2f", "%.6g", "%.9f", "%.15g", "%.3e", "%.0f"};
    chance c = {771177};

    (void)state;
    for (int i = 0; i < 60000; i++) {
        const double value = (chance_uniform(&c) - 0.3) * pow(10.0, 12.0 * chance_uniform(&c) - 4.0);
        char text[64];

        switch (i % (int)COUNT(FORMATS)) {
        case 0: (void)snprintf(text, sizeof text, "%.2f", value); break;
        case 1: (void)snprintf(text, sizeof text, "%.6g", value); break;
        case 2: (void)snprintf(text, sizeof text, "%.9f", value); break;
        case 3: (void)snprintf(text, sizeof text, "%.15g", value); break;
        case 4: (void)snprintf(text, sizeof text, "%.3e", value); break;
        default: (void)snprintf(text, sizeof text, "%.0f", value); break;
        }
        assert_bits(text, strtod(text, NULL));
    }
}

static void digit_strings_longer_than_an_integer_agree_with_the_c_library(void **state)
{
    chance c = {31415926};

    (void)state;
    for (int i = 0; i < 20000; i++) {
        char text[64] = {0};
        const size_t digits = 19 + chance_below(&c, 36);
        const size_t point = chance_below(&c, digits + 1);
        size_t n = 0;

        for (size_t k = 0; k < digits; k++) {
            if (k == point)
                text[n++] = '.';
            text[n++] = (char)('0' + chance_below(&c, 10));
        }
        (void)snprintf(text + n, sizeof text - n, "e%d", (int)chance_below(&c, 200) - 100);
        assert_bits(text, strtod(text, NULL));
    }
}

static void values_half_way_between_two_doubles_round_to_even(void **state)
{
    (void)state;
    assert_bits("9007199254740993", 9007199254740992.0); /* 2^53 + 1: IEEE 754 ties to even */
    assert_bits("9007199254740995", 9007199254740996.0);
    assert_bits("9007199254740993.00000000000000000000000001", 9007199254740994.0);
    assert_bits("2.2250738585072011e-308", 2.2250738585072011e-308); /* once hung a well-known strtod */
}

static void the_ends_of_the_range_are_read(void **state)
{
    (void)state;
    assert_bits("1.7976931348623157e308", DBL_MAX);
    assert_bits("-1.7976931348623157e+308", -DBL_MAX);
    assert_bits("2.2250738585072014e-308", DBL_MIN);
    assert_bits("4.9406564584124654e-324", DBL_TRUE_MIN);
    assert_bits("1.2345e-312", 1.2345e-312);
}

static void zero_may_be_written_in_any_way(void **state)
{
    static const char *const ZEROS[] = {"0", "0.0", ".0", "0.", "+0", "0e0", "0.000e-999", "0e999", "000"};

    (void)state;
    for (size_t i = 0; i < COUNT(ZEROS); i++)
        assert_bits(ZEROS[i], 0.0);
    assert_bits("-0", -0.0);
}

static void usual_spellings_mean_what_they_say(void **state)
{
    (void)state;
    assert_bits(" 91.3 ", 91.3);
    assert_bits("\t+4.85\r", 4.85);
    assert_bits(".5", 0.5);
    assert_bits("5.", 5.0);
    assert_bits("1.2E+01", 12.0);
    assert_bits("007.250", 7.25);
    assert_bits("000000000000000000000000000000000000000000000000000000000017.3", 17.3);
}

static void overflow_is_refused_and_so_is_underflow_to_nothing(void **state)
{
    (void)state;
    assert_no_number("1e999", "outside the range|correct it");
    assert_no_number("-1e999", "outside the range");
    assert_no_number("1.8e308", "outside the range");
    assert_no_number("1e-999", "outside the range");
    assert_no_number("2e-324", "outside the range");
    assert_no_number("1e99999999999999999999", "outside the range");
    assert_no_number("1e-99999999999999999999", "outside the range");
}

static void words_and_hexadecimal_are_no_numbers(void **state)
{
    static const char *const WORDS[] = {"nan", "NaN", "-nan", "nan(0x7)", "inf", "-inf", "Infinity", "0x10", "0X1p3", "1e", "1e+",
                                        "e5", ".", "+", "-", "-.", "++1", "+-1", "- 5", "1 2", "1_000", "12abc", "1.2.3", "1d5",
                                        "\xC2\xB2", "1\xC2\xA0", "\xEF\xBC\x91", "rest", "0b11", "1f", "$5", "5%"};

    (void)state;
    for (size_t i = 0; i < COUNT(WORDS); i++)
        assert_no_number(WORDS[i], "is not a number|12.5");
}

static void nothing_at_all_is_a_missing_number(void **state)
{
    (void)state;
    assert_no_number("", "a number is missing");
    assert_no_number("   \t ", "a number is missing");
}

static void a_decimal_comma_is_named_as_such(void **state)
{
    (void)state;
    assert_no_number("91,3", "'91,3' has a decimal comma|write a decimal point");
    assert_no_number("1.234,5", "decimal comma");
    assert_no_number("91,", "is not a number");
}

static void a_message_never_repeats_control_characters_or_a_whole_novel(void **state)
{
    char novel[5000];
    bc_error err;
    double value = 0.0;

    (void)state;
    memset(novel, 'x', sizeof novel);
    novel[sizeof novel - 1] = '\0';
    novel[3] = '\x1b';
    assert_refused(bc_number_parse(novel, &value, &err), &err, BC_ERR_INPUT, "'xxx?xx|...'");
    assert_true(strlen(err.message) < 120);
    assert_null(strchr(err.message, '\x1b'));
}

static void sixty_three_characters_are_the_most(void **state)
{
    char text[80] = "0.";

    (void)state;
    memset(text + 2, '3', 61);
    assert_bits(text, 1.0 / 3.0);
    memset(text + 2, '3', 62);
    assert_no_number(text, "more than 63 characters|shorten");
}

static void assert_prefix(const char *text, double want, const char *want_rest)
{
    const char *rest = NULL;
    double value = 0.0;
    bc_error err;

    assert_ok(bc_number_prefix(text, &value, &rest, &err), &err);
    assert_within_at(text, value, want, 0.0);
    assert_string_equal(rest, want_rest);
}

static void a_number_ends_where_its_unit_starts(void **state)
{
    (void)state;
    assert_prefix("101.325kPa", 101.325, "kPa");
    assert_prefix(" 15 C", 15.0, "C");
    assert_prefix("-7.5F/60F", -7.5, "F/60F");
    assert_prefix("2e", 2.0, "e");
    assert_prefix("2e+", 2.0, "e+");
    assert_prefix("2e3e", 2000.0, "e");
    assert_prefix("3E-2 %", 0.03, "%");
    assert_prefix("0x10", 0.0, "x10");
    assert_prefix("15, 101 kPa", 15.0, ", 101 kPa");
}

static void a_decimal_comma_before_a_unit_is_refused_too(void **state)
{
    const char *rest = "kept";
    double value = 3.7;
    bc_error err;

    (void)state;
    assert_refused(bc_number_prefix("101,325 kPa", &value, &rest, &err), &err, BC_ERR_INPUT, "decimal comma");
    assert_string_equal(rest, "kept");
    assert_within(value, 3.7, 0.0);
}

static void a_german_locale_changes_nothing(void **state)
{
    chance c = {5550123};

    (void)state;
    use_german_numbers();
    assert_string_equal(localeconv()->decimal_point, ",");
    assert_bits("91.3", 91.3);
    assert_bits("1.7976931348623157e308", DBL_MAX);
    assert_bits("0.1234567890123456789012345678901234567", 0.12345678901234568);
    assert_no_number("91,3", "decimal comma");
    for (int i = 0; i < 20000; i++) {
        const uint64_t bits = chance_bits(&c);
        double value = 0.0;
        char text[40];

        memcpy(&value, &bits, sizeof value);
        if (!isfinite(value) || value == 0.0)
            continue;
        (void)snprintf(text, sizeof text, "%.17g", value);
        char *comma = strchr(text, ',');

        if (comma != NULL)
            *comma = '.';
        assert_bits(text, value);
    }
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(two_hundred_thousand_doubles_with_17_digits_read_back_bit_by_bit),
        cmocka_unit_test(decimals_of_certificates_agree_with_the_c_library),
        cmocka_unit_test(digit_strings_longer_than_an_integer_agree_with_the_c_library),
        cmocka_unit_test(values_half_way_between_two_doubles_round_to_even),
        cmocka_unit_test(the_ends_of_the_range_are_read),
        cmocka_unit_test(zero_may_be_written_in_any_way),
        cmocka_unit_test(usual_spellings_mean_what_they_say),
        cmocka_unit_test(overflow_is_refused_and_so_is_underflow_to_nothing),
        cmocka_unit_test(words_and_hexadecimal_are_no_numbers),
        cmocka_unit_test(nothing_at_all_is_a_missing_number),
        cmocka_unit_test(a_decimal_comma_is_named_as_such),
        cmocka_unit_test(a_message_never_repeats_control_characters_or_a_whole_novel),
        cmocka_unit_test(sixty_three_characters_are_the_most),
        cmocka_unit_test(a_number_ends_where_its_unit_starts),
        cmocka_unit_test(a_decimal_comma_before_a_unit_is_refused_too),
        cmocka_unit_test_teardown(a_german_locale_changes_nothing, use_c_numbers),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
