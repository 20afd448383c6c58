/* SPDX-License-Identifier: MIT */
/* test_check.c - every published check value of checks.def, computed. */
#include "support.h"

#include "bluecone/check.h"

static void every_published_check_value_is_reproduced(void **state)
{
    int failed = 0;

    (void)state;
    for (size_t i = 0; i < bc_check_count(); i++) {
        bc_check c;
        bc_error err;

        if (bc_check_run(i, &c, &err) != BC_OK) {
            print_error("check %zu: %s\n", i, err.message);
            failed++;
        } else if (!c.ok || !(fabs(c.computed - c.expected) <= c.tolerance)) {
            print_error("%s, %s: %s %s: got %.10g, want %.10g %s, tolerance %.3g (%s)\n", c.area, c.id, c.subject, c.quantity, c.computed,
                        c.expected, c.unit, c.tolerance, c.source);
            failed++;
        }
    }
    assert_int_equal(failed, 0);
}

static void every_check_names_its_source_and_the_reason_of_its_tolerance(void **state)
{
    (void)state;
    for (size_t i = 0; i < bc_check_count(); i++) {
        bc_check c;
        bc_error err;

        assert_ok(bc_check_run(i, &c, &err), &err);
        if (strlen(c.source) < 6 || strlen(c.why) < 6 || !(c.tolerance > 0.0) || c.id[0] == '\0' || c.quantity[0] == '\0')
            fail_msg("check %zu (%s %s) has no source, reason or tolerance", i, c.id, c.quantity);
        assert_string_equal(bc_check_area(i), c.area);
    }
}

/* A tolerance as wide as the value would pass anything (formation enthalpies, near zero by chance, apart). 3.5 %: a landfill gas printed as 16 MJ/m3. */
static void no_tolerance_is_so_wide_that_it_cannot_fail(void **state)
{
    (void)state;
    for (size_t i = 0; i < bc_check_count(); i++) {
        bc_check c;

        assert_int_equal(bc_check_run(i, &c, NULL), BC_OK);
        /* defaults of traded fuels (IPCC) are bands by nature: up to 17 % */
        if (strncmp(c.id, "ipcc-2006", 9) == 0) {
            assert_true(c.tolerance < 0.17 * c.expected);
            continue;
        }
        if (strcmp(c.area, "thermo") != 0 && !c.of_uncertainty && c.expected != 0.0 && c.tolerance > 0.035 * fabs(c.expected) && c.tolerance > 0.06)
            fail_msg("%s %s: %g +- %g", c.id, c.quantity, c.expected, c.tolerance);
    }
}

static void every_area_of_the_trade_has_checks(void **state)
{
    static const char *const AREAS[] = {"iso6976", "en437", "iso12213", "us-units", "thermo", "steam", "formation"};

    (void)state;
    assert_in_range(bc_check_count(), 700, 100000);
    for (size_t k = 0; k < COUNT(AREAS); k++) {
        size_t n = 0;

        for (size_t i = 0; i < bc_check_count(); i++)
            n += strcmp(bc_check_area(i), AREAS[k]) == 0;
        if (n < 5)
            fail_msg("area %s has %zu checks", AREAS[k], n);
    }
}

static void a_check_that_does_not_exist_is_an_error_and_never_a_pass(void **state)
{
    bc_check c = {.ok = false, .expected = 47.11};
    bc_error err = {.status = BC_OK};

    (void)state;
    assert_refused(bc_check_run(bc_check_count(), &c, &err), &err, BC_ERR_USAGE, "no check");
    assert_refused(bc_check_run(SIZE_MAX, &c, &err), &err, BC_ERR_USAGE, "no check");
    assert_within(c.expected, 47.11, 0.0);
    assert_string_equal(bc_check_area(bc_check_count()), "");
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(every_published_check_value_is_reproduced),
        cmocka_unit_test(every_check_names_its_source_and_the_reason_of_its_tolerance),
        cmocka_unit_test(no_tolerance_is_so_wide_that_it_cannot_fail),
        cmocka_unit_test(every_area_of_the_trade_has_checks),
        cmocka_unit_test(a_check_that_does_not_exist_is_an_error_and_never_a_pass),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
