/* SPDX-License-Identifier: MIT */
/* test_root.c - roots of curves whose roots are known. */
#include "support.h"

#include "base/root.h"

/* (x - a)(x - b)(x - c) with the roots in data. */
static bool cubic(double x, double *y, void *data)
{
    const double *r = data;

    *y = (x - r[0]) * (x - r[1]) * (x - r[2]);
    return true;
}

static bool parabola(double x, double *y, void *data)
{
    const double *d = data; /* where, how high */

    *y = (x - d[0]) * (x - d[0]) + d[1];
    return true;
}

static bool half_defined(double x, double *y, void *data)
{
    (void)data;
    *y = log(x) - log(0.7);
    return x > 0.25;
}

static bool nowhere(double x, double *y, void *data)
{
    (void)x;
    (void)y;
    (void)data;
    return false;
}

static void every_crossing_is_found_to_1e_12_even_two_between_samples(void **state)
{
    const bc_span span = {-0.3, 1.9, 64};
    chance dice = {4711};

    (void)state;
    for (size_t k = 0; k < 500; k++) {
        double wanted[3], root[8];

        wanted[0] = -0.2 + 0.5 * chance_uniform(&dice);
        wanted[1] = 0.9 + 0.5 * chance_uniform(&dice);
        wanted[2] = wanted[1] + 1e-4 + 0.3 * chance_uniform(&dice) * (double)(k % 2); /* every other time a close pair */
        const size_t count = bc_roots(cubic, wanted, &span, root, COUNT(root));

        assert_int_equal(count, 3);
        for (size_t i = 0; i < 3; i++)
            assert_within(root[i], wanted[i], 2e-12);
    }
}

static void a_root_on_a_sample_is_told_once(void **state)
{
    const bc_span span = {0.0, 1.0, 10};
    double data[2] = {0.3, -0.04}; /* roots 0.1 and 0.5 */
    double root[8];

    (void)state;
    assert_int_equal(bc_roots(parabola, data, &span, root, COUNT(root)), 2);
    assert_within(root[0], 0.1, 1e-13);
    assert_within(root[1], 0.5, 1e-13);
}

static void a_touch_is_told_and_a_miss_is_not(void **state)
{
    const bc_span span = {0.0, 1.0, 16};
    double data[2] = {0.331, 0.0};
    double root[8];

    (void)state;
    assert_int_equal(bc_roots(parabola, data, &span, root, COUNT(root)), 1);
    assert_within(root[0], 0.331, 1e-6); /* a double root is known to the root of the rounding */
    data[1] = 1e-6;
    assert_int_equal(bc_roots(parabola, data, &span, root, COUNT(root)), 0);
}

static void a_curve_that_ends_is_followed_as_far_as_it_goes(void **state)
{
    const bc_span span = {0.0, 1.0, 32};
    double root[8];
    double x = 0.0;

    (void)state;
    assert_int_equal(bc_roots(half_defined, NULL, &span, root, COUNT(root)), 1);
    assert_within(root[0], 0.7, 1e-13);
    assert_int_equal(bc_roots(nowhere, NULL, &span, root, COUNT(root)), 0);
    assert_false(bc_nearest_zero(nowhere, NULL, &span, &x));
}

static void the_nearest_point_is_the_extreme_or_the_end(void **state)
{
    const bc_span span = {0.0, 1.0, 16};
    double inside[2] = {0.437, 0.11};
    double beyond[2] = {1.37, 0.11};
    double x = 0.0;

    (void)state;
    assert_true(bc_nearest_zero(parabola, inside, &span, &x));
    assert_within(x, 0.437, 1e-6);
    assert_true(bc_nearest_zero(parabola, beyond, &span, &x));
    assert_within(x, 1.0, 1e-9);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(every_crossing_is_found_to_1e_12_even_two_between_samples),
        cmocka_unit_test(a_root_on_a_sample_is_told_once),
        cmocka_unit_test(a_touch_is_told_and_a_miss_is_not),
        cmocka_unit_test(a_curve_that_ends_is_followed_as_far_as_it_goes),
        cmocka_unit_test(the_nearest_point_is_the_extreme_or_the_end),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
