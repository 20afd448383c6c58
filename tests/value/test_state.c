/* SPDX-License-Identifier: MIT */
/* test_state.c - reading, checking and telling reference states. */
#include "support.h"

#include "bluecone/state.h"

static void assert_state(const char *text, double combustion_c, double metering_c, double metering_pa)
{
    bc_state s = {.combustion_c = -99.0, .metering_c = -99.0, .metering_pa = 95e3, .saturated = true, .edition = 1995};
    bc_error err;

    assert_ok(bc_state_parse(text, &s, &err), &err);
    assert_within_at(text, s.combustion_c, combustion_c, 1e-9);
    assert_within_at(text, s.metering_c, metering_c, 1e-9);
    assert_within_at(text, s.metering_pa, metering_pa, 1e-3);
    assert_true(s.saturated);
    assert_int_equal(s.edition, 1995);
}

static void assert_no_state(const char *text, bc_status status, const char *words)
{
    bc_state s = {.combustion_c = 47.11, .edition = 2016};
    bc_error err = {.status = BC_OK};

    assert_refused_at(text, bc_state_parse(text, &s, &err), &err, status, words);
    assert_within(s.combustion_c, 47.11, 0.0);
}

static void the_default_is_iso_13443(void **state)
{
    const bc_state s = bc_state_default();

    (void)state;
    assert_within(s.combustion_c, 15.0, 0.0);
    assert_within(s.metering_c, 15.0, 0.0);
    assert_within(s.metering_pa, 101325.0, 0.0);
    assert_false(s.saturated);
    assert_int_equal(s.edition, 2016);
    assert_int_equal(bc_state_check(&s, NULL), BC_OK);
}

static void states_of_the_trade_are_read(void **state)
{
    (void)state;
    assert_state("15/15", 15.0, 15.0, 101325.0);
    assert_state("25/0", 25.0, 0.0, 101325.0);
    assert_state("60F/60F@14.73psi", 15.5555555556, 15.5555555556, 101559.774928);
    assert_state("60F/60F@14.696 psia", 15.5555555556, 15.5555555556, 101325.353);
    assert_state("288.15K/273.15K", 15.0, 0.0, 101325.0);
    assert_state(" 25 C / 20 C @ 101.325 ", 25.0, 20.0, 101325.0);
    assert_state("15/15@1013.25mbar", 15.0, 15.0, 101325.0);
    assert_state("15/15@0.05psig", 15.0, 15.0, 101669.738);
    assert_state("15/15@30inHg", 15.0, 15.0, 101591.659); /* 30 x 3386.389, NIST SP 811 (2008) B.8 */
    assert_state("37.3/17.9@97.31", 37.3, 17.9, 97310.0);
}

static void a_round_celsius_temperature_survives_the_way_through_kelvin(void **state)
{
    (void)state;
    for (int t = 0; t <= 25; t++) {
        char text[32];
        bc_state s = bc_state_default();

        (void)snprintf(text, sizeof text, "%d/%d", t, t);
        assert_int_equal(bc_state_parse(text, &s, NULL), BC_OK);
        assert_within_at(text, s.combustion_c, (double)t, 0.0);
    }
}

static void texts_that_are_no_state_are_refused(void **state)
{
    static const char *const TEXTS[] = {"", "15", "/", "15/", "/15", "15-15", "15@101.325", "warm/15", "15/15/15", "15/15C@", "15/15@much",
                                        "15kPa/15", "15/15@15C", "15,5/15", "nan/15", "15/inf", "15/15@0x19000Pa", "15/15@101.325@3"};

    (void)state;
    for (size_t i = 0; i < COUNT(TEXTS); i++)
        assert_no_state(TEXTS[i], BC_ERR_USAGE, "reference state");
}

static void states_outside_the_method_are_refused_as_range(void **state)
{
    (void)state;
    assert_no_state("-0.1/15", BC_ERR_RANGE, "combustion|0 to 100 C");
    assert_no_state("100.1/15", BC_ERR_RANGE, "combustion");
    assert_no_state("15/-0.1", BC_ERR_RANGE, "metering temperature|0 to 25 C");
    assert_no_state("15/25.1", BC_ERR_RANGE, "metering temperature");
    assert_no_state("15/15@89.99", BC_ERR_RANGE, "metering pressure|90 to 110 kPa");
    assert_no_state("15/15@110.01kPa", BC_ERR_RANGE, "metering pressure");
    assert_no_state("1e300/15", BC_ERR_RANGE, "combustion");
    assert_state("0/0@90", 0.0, 0.0, 90e3);
    assert_state("100/25@110", 100.0, 25.0, 110e3);
}

static void only_two_editions_exist(void **state)
{
    bc_state s = bc_state_default();
    bc_error err = {.status = BC_OK};

    (void)state;
    s.edition = 2005;
    assert_refused(bc_state_check(&s, &err), &err, BC_ERR_USAGE, "1995 and 2016, not 2005");
    s.edition = 1995;
    assert_int_equal(bc_state_check(&s, NULL), BC_OK);
    s.metering_pa = (double)NAN;
    assert_refused(bc_state_check(&s, &err), &err, BC_ERR_RANGE, "metering pressure");
}

static void the_columns_of_each_edition_are_known(void **state)
{
    static const struct {
        double t_c;
        bool combustion_2016, metering_2016, combustion_1995, metering_1995;
    } ROWS[] = {
        {0.0, true, true, true, true},    {15.0, true, true, true, true},   {15.55, true, true, false, false},
        {15.5556, true, true, false, false}, {20.0, true, true, true, true}, {25.0, true, false, true, false},
        {14.98, false, false, false, false}, {15.6, false, false, false, false}, {18.3, false, false, false, false},
    };

    (void)state;
    for (size_t i = 0; i < COUNT(ROWS); i++) {
        const bc_state young = {ROWS[i].t_c, ROWS[i].t_c, BC_P0_PA, false, 2016}, old = {ROWS[i].t_c, ROWS[i].t_c, BC_P0_PA, false, 1995};

        if (bc_state_standard_combustion(&young) != ROWS[i].combustion_2016 || bc_state_standard_metering(&young) != ROWS[i].metering_2016
            || bc_state_standard_combustion(&old) != ROWS[i].combustion_1995 || bc_state_standard_metering(&old) != ROWS[i].metering_1995)
            fail_msg("%g C", ROWS[i].t_c);
    }
}

static void a_state_is_told_in_words_that_fit_the_room(void **state)
{
    bc_state s = bc_state_default();
    char text[120], small[12];

    (void)state;
    bc_state_describe(&s, text, sizeof text);
    assert_string_equal(text, "combustion 15 C, metering 15 C and 101.325 kPa, water as stated, ISO 6976:2016");
    assert_int_equal(bc_state_parse("60F/17.25@14.73psi", &s, NULL), BC_OK);
    s.saturated = true;
    s.edition = 1995;
    bc_state_describe(&s, text, sizeof text);
    assert_string_equal(text, "combustion 60 F, metering 17.25 C and 101.5598 kPa, saturated with water, ISO 6976:1995");
    bc_state_describe(&s, small, sizeof small);
    assert_string_equal(small, "combustion ");
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(the_default_is_iso_13443),
        cmocka_unit_test(states_of_the_trade_are_read),
        cmocka_unit_test(a_round_celsius_temperature_survives_the_way_through_kelvin),
        cmocka_unit_test(texts_that_are_no_state_are_refused),
        cmocka_unit_test(states_outside_the_method_are_refused_as_range),
        cmocka_unit_test(only_two_editions_exist),
        cmocka_unit_test(the_columns_of_each_edition_are_known),
        cmocka_unit_test(a_state_is_told_in_words_that_fit_the_room),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
