/* SPDX-License-Identifier: MIT */
/* test_assess.c - the guard-band rule, by the examples of JCGM 106:2012. */
#include "support.h"

#include "bluecone/assess.h"

#include <float.h>

/* JCGM 106:2012, table 1, value from memory: conformance probability and z, two decimals. */
static void coverage_factors_are_those_of_the_guide(void **state)
{
    static const struct {
        double coverage, k;
    } TABLE_1[] = {{0.80, 0.84}, {0.90, 1.28}, {0.95, 1.64}, {0.99, 2.33}, {0.999, 3.09}};

    (void)state;
    for (size_t i = 0; i < COUNT(TABLE_1); i++) {
        double k = 0.0;

        assert_int_equal(bc_coverage_factor(TABLE_1[i].coverage, &k, NULL), BC_OK);
        assert_within(k, TABLE_1[i].k, 0.005);
    }
}

/* JCGM 106:2012, values from memory: breakdown voltage of a Zener diode (5.47 V, u 0.05 V, at least 5.40 V: 0.92); bursting
 * strength of a container (509.7 kPa, u 8.6 kPa, at least 490 kPa: 0.99); viscosity of a motor oil (13.6 mm2/s, u 1.8,
 * 12.5 to 16.3: 0.66). */
static void conformance_probabilities_are_those_of_the_guides_examples(void **state)
{
    static const struct {
        bc_limit limit;
        double value, u, probability;
    } EXAMPLES[] = {
        {{.has_min = true, .min = 5.40}, 5.47, 0.05, 0.92},
        {{.has_min = true, .min = 490.0}, 509.7, 8.6, 0.99},
        {{.has_min = true, .has_max = true, .min = 12.5, .max = 16.3}, 13.6, 1.8, 0.66},
    };

    (void)state;
    for (size_t i = 0; i < COUNT(EXAMPLES); i++)
        assert_within(bc_conformance_probability(&EXAMPLES[i].limit, EXAMPLES[i].value, EXAMPLES[i].u), EXAMPLES[i].probability, 0.005);
}

/* JCGM 106:2012, value from memory: a speed limit of 100 km/h, u 2 % of the speed, 99.9 % wanted: action from 107 km/h on. */
static void the_guard_band_of_the_speed_limit_is_7_km_per_h(void **state)
{
    double k = 0.0;

    (void)state;
    assert_int_equal(bc_coverage_factor(0.999, &k, NULL), BC_OK);
    assert_within(100.0 / (1.0 - 0.02 * k), 107.0, 0.5);
}

static bc_conformity class_of(double value, double u)
{
    const bc_limit limit = {.has_min = true, .has_max = true, .min = 46.5, .max = 51.41};
    bc_limit_figure f = {.value = value, .has_u = u > 0.0, .u = u, .margin = bc_limit_margin(&limit, value)};

    f.inside = f.margin >= 0.0;
    return bc_limit_assess(&limit, &f, 1.6448536269514722).conformity;
}

static void the_class_changes_where_the_guard_band_ends(void **state)
{
    (void)state;
    assert_int_equal(class_of(51.24, 0.1), BC_CONFORM_INSIDE);
    assert_int_equal(class_of(51.26, 0.1), BC_CONFORM_LIKELY);
    assert_int_equal(class_of(51.42, 0.1), BC_CONFORM_UNLIKELY);
    assert_int_equal(class_of(51.58, 0.1), BC_CONFORM_OUTSIDE);
    assert_int_equal(class_of(46.66, 0.1), BC_CONFORM_LIKELY);
    assert_int_equal(class_of(46.67, 0.1), BC_CONFORM_INSIDE);
    assert_int_equal(class_of(51.41, 0.0), BC_CONFORM_INSIDE);
    assert_int_equal(class_of(51.42, 0.0), BC_CONFORM_OUTSIDE);
}

static void a_coverage_outside_of_its_range_is_refused(void **state)
{
    static const double BAD[] = {0.49, 1.0, -1.0, 0.999999};
    double k = -7.0;

    (void)state;
    for (size_t i = 0; i < COUNT(BAD); i++) {
        bc_error err = {.status = BC_OK};

        assert_int_equal(bc_coverage_factor(BAD[i], &k, &err), BC_ERR_RANGE);
        assert_within(k, -7.0, 0.0);
    }
    bc_error err = {.status = BC_OK};

    assert_refused(bc_coverage_factor(0.4, &k, &err), &err, BC_ERR_RANGE, "of 40 %|50 to 99.999 %");
    assert_int_equal(bc_coverage_factor(BC_COVERAGE_MAX, &k, NULL), BC_OK);
    assert_within(0.5 * erfc(-k / sqrt(2.0)), BC_COVERAGE_MAX, 1e-15); /* by the distribution itself */
    assert_int_equal(bc_coverage_factor(0.5, &k, NULL), BC_OK);
    assert_within(k, 0.0, DBL_MIN);
}

static void only_a_value_outside_breaks_a_limit(void **state)
{
    (void)state;
    assert_false(bc_conformity_breaks(BC_CONFORM_INSIDE));
    assert_false(bc_conformity_breaks(BC_CONFORM_LIKELY));
    assert_true(bc_conformity_breaks(BC_CONFORM_UNLIKELY));
    assert_true(bc_conformity_breaks(BC_CONFORM_OUTSIDE));
}

/* A figure that is known exactly conforms or not: the limit of the rule for u to 0; on the limit itself it conforms. */
static void without_uncertainty_conformance_is_certain(void **state)
{
    const bc_limit limit = {.has_min = true, .has_max = true, .min = 46.5, .max = 51.41};
    static const struct {
        double value, probability;
    } ROWS[] = {{46.5, 1.0}, {51.41, 1.0}, {48.0, 1.0}, {46.499, 0.0}, {51.411, 0.0}};

    (void)state;
    for (size_t i = 0; i < COUNT(ROWS); i++) {
        const bc_limit_figure f = {.value = ROWS[i].value, .margin = bc_limit_margin(&limit, ROWS[i].value), .inside = ROWS[i].probability > 0.0};

        assert_within(bc_conformance_probability(&limit, ROWS[i].value, 0.0), ROWS[i].probability, 0.0);
        assert_within(bc_limit_assess(&limit, &f, 1.64).probability, ROWS[i].probability, 0.0);
        if (ROWS[i].value > 47.0 || ROWS[i].value < 46.5) /* on the lower limit itself half of what scatters lies outside */
            assert_within(bc_conformance_probability(&limit, ROWS[i].value, 1e-6), ROWS[i].value > 51.4 && ROWS[i].value < 51.411 ? 0.5 : ROWS[i].probability, 1e-9);
    }
}

/* Of a figure with an uncertainty the assessment has the probability of the value, not only of which side it is on; the guard
 * is k u. Phi(1) = 0.841344746 (any table of the normal distribution). */
static void an_assessment_has_guard_and_probability_of_its_uncertainty(void **state)
{
    const bc_limit limit = {.has_max = true, .max = 10.0};
    bc_limit_figure f = {.value = 9.5, .has_u = true, .u = 0.5, .margin = 0.5, .inside = true};

    (void)state;
    assert_within(bc_limit_assess(&limit, &f, 1.5).probability, 0.841344746, 1e-9);
    assert_within(bc_limit_assess(&limit, &f, 1.5).guard, 0.75, 0.0);
    assert_int_equal(bc_limit_assess(&limit, &f, 1.5).conformity, BC_CONFORM_LIKELY);
    assert_int_equal(bc_limit_assess(&limit, &f, 1.0).conformity, BC_CONFORM_INSIDE); /* the end of the guard band is inside */
    f = (bc_limit_figure){.value = 10.5, .has_u = true, .u = 0.5, .margin = -0.5, .inside = false};
    assert_within(bc_limit_assess(&limit, &f, 1.0).probability, 1.0 - 0.841344746, 1e-9);
    assert_int_equal(bc_limit_assess(&limit, &f, 1.0).conformity, BC_CONFORM_UNLIKELY); /* and so is that of the other */
    assert_int_equal(bc_limit_assess(&limit, &f, 0.99).conformity, BC_CONFORM_OUTSIDE);
    f.has_u = false;
    assert_within(bc_limit_assess(&limit, &f, 1.0).guard, 0.0, 0.0);
    assert_within(bc_limit_assess(&limit, &f, 1.0).probability, 0.0, 0.0);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(coverage_factors_are_those_of_the_guide),
        cmocka_unit_test(conformance_probabilities_are_those_of_the_guides_examples),
        cmocka_unit_test(the_guard_band_of_the_speed_limit_is_7_km_per_h),
        cmocka_unit_test(the_class_changes_where_the_guard_band_ends),
        cmocka_unit_test(a_coverage_outside_of_its_range_is_refused),
        cmocka_unit_test(only_a_value_outside_breaks_a_limit),
        cmocka_unit_test(without_uncertainty_conformance_is_certain),
        cmocka_unit_test(an_assessment_has_guard_and_probability_of_its_uncertainty),
    };

    return cmocka_run_group_tests_name("assess", tests, NULL, NULL);
}
