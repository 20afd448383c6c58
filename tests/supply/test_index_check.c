/* SPDX-License-Identifier: MIT */
/* test_index_check.c - the rows of checks_interchange.def, which `bluecone verify` runs with all others. */
#include "supply/gases.h"

#include "bluecone/check.h"

/* The checks of the indices stand at the end of the list, behind those of the formation balance. */
static size_t first_of_the_indices(void)
{
    size_t i = bc_check_count();

    while (i > 0 && strcmp(bc_check_area(i - 1), "formation") != 0)
        i--;
    return i;
}

static void every_check_value_is_met_within_its_tolerance(void **state)
{
    size_t failed = 0;

    (void)state;
    for (size_t i = first_of_the_indices(); i < bc_check_count(); i++) {
        bc_check c;
        bc_error err;

        assert_ok(bc_check_run(i, &c, &err), &err);
        if (c.ok)
            continue;
        print_error("%s %s %s of %s: got %.9g, want %.9g, tolerance %.3g (%s)\n", c.area, c.id, c.quantity, c.subject, c.computed,
                    c.expected, c.tolerance, c.source);
        failed++;
    }
    assert_int_equal(failed, 0);
}

static void what_was_derived_does_not_stand_among_what_was_published(void **state)
{
    size_t published = 0;

    (void)state;
    for (size_t i = first_of_the_indices(); i < bc_check_count(); i++) {
        bc_check c;

        assert_int_equal(bc_check_run(i, &c, NULL), BC_OK);
        assert_true(strcmp(c.area, "interchange") == 0 || strcmp(c.area, "arithmetic") == 0);
        assert_int_equal(strncmp(c.source, "derived", 7) == 0, strcmp(c.area, "arithmetic") == 0);
        published += strcmp(c.area, "interchange") == 0;
    }
    assert_in_range(published, 16, 1000);
}

static void a_check_names_both_gases_and_the_state(void **state)
{
    bc_check c;

    (void)state;
    assert_int_equal(bc_check_run(first_of_the_indices(), &c, NULL), BC_OK);
    assert_string_equal(c.with, "volume:methane=100");
    assert_string_equal(c.subject, "volume:methane=87,propane=13");
    assert_string_equal(c.quantity, "wobbe-ratio");
    assert_within(c.metering_kpa, 101.325, 1e-9);
    assert_within(c.metering_c, 15.0, 0.0);
    assert_int_equal(c.edition, 2016);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(every_check_value_is_met_within_its_tolerance),
        cmocka_unit_test(what_was_derived_does_not_stand_among_what_was_published),
        cmocka_unit_test(a_check_names_both_gases_and_the_state),
    };

    return cmocka_run_group_tests_name("index checks", tests, NULL, NULL);
}
