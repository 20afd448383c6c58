/* SPDX-License-Identifier: MIT */
/* test_worst_lp.c - small linear programs: textbook cases, and random ones that must prove themselves. */
#include "supply/worst_lp.h"

#include "support.h"

#define TOLERANCE 1e-9 /* rounding of a few pivots */

static lp_problem lp;
static lp_work work;
static lp_answer answer;

static void start(size_t columns, const double cost[], double upper)
{
    memset(&lp, 0, sizeof lp);
    lp.columns = columns;
    for (size_t j = 0; j < columns; j++) {
        lp.cost[j] = cost[j];
        lp.upper[j] = upper;
    }
}

static void assert_optimum(double value)
{
    lp_maximise(&lp, &work, &answer);
    assert_int_equal(answer.status, LP_OPTIMAL);
    assert_within(answer.value, value, TOLERANCE * fmax(1.0, fabs(value)));
    assert_within(answer.bound, value, TOLERANCE * fmax(1.0, fabs(value)));
}

/* Dantzig, Linear Programming and Extensions (1963), and every textbook since: Wyndor Glass, Hillier and
 * Lieberman, Introduction to Operations Research, 3.1: maximise 3 x + 5 y, x <= 4, 2 y <= 12, 3 x + 2 y <= 18. */
static void wyndor_glass_makes_thirty_six(void **state)
{
    (void)state;
    start(2, (const double[]){3.0, 5.0}, 100.0);
    lp_add_row(&lp, (const double[]){1.0, 0.0}, -HUGE_VAL, 4.0);
    lp_add_row(&lp, (const double[]){0.0, 2.0}, -HUGE_VAL, 12.0);
    lp_add_row(&lp, (const double[]){3.0, 2.0}, -HUGE_VAL, 18.0);
    assert_optimum(36.0);
    assert_within(answer.x[0], 2.0, TOLERANCE);
    assert_within(answer.x[1], 6.0, TOLERANCE);
}

/* Beale, Naval Research Logistics Quarterly 2 (1955) 269: the simplex method with the usual rule cycles. */
static void beales_degenerate_program_does_not_cycle(void **state)
{
    (void)state;
    start(4, (const double[]){0.75, -20.0, 0.5, -6.0}, 1000.0);
    lp_add_row(&lp, (const double[]){0.25, -8.0, -1.0, 9.0}, -HUGE_VAL, 0.0);
    lp_add_row(&lp, (const double[]){0.5, -12.0, -0.5, 3.0}, -HUGE_VAL, 0.0);
    lp_add_row(&lp, (const double[]){0.0, 0.0, 1.0, 0.0}, -HUGE_VAL, 1.0);
    assert_optimum(1.25);
}

/* Klee and Minty (1972) for three columns: 2^n - 1 steps by the primal rule. */
static void klee_and_mintys_cube_ends_at_its_last_corner(void **state)
{
    (void)state;
    start(3, (const double[]){100.0, 10.0, 1.0}, 10000.0);
    lp_add_row(&lp, (const double[]){1.0, 0.0, 0.0}, -HUGE_VAL, 1.0);
    lp_add_row(&lp, (const double[]){20.0, 1.0, 0.0}, -HUGE_VAL, 100.0);
    lp_add_row(&lp, (const double[]){200.0, 20.0, 1.0}, -HUGE_VAL, 10000.0);
    assert_optimum(10000.0);
}

static void an_equality_and_a_range_hold_at_once(void **state)
{
    (void)state;
    start(3, (const double[]){1.0, 2.0, 4.0}, 1.0);
    lp_add_row(&lp, (const double[]){1.0, 1.0, 1.0}, 1.0, 1.0);
    lp_add_row(&lp, (const double[]){1.0, -1.0, 0.0}, 0.25, 0.5);
    /* z = 1 - x - y, x - y >= 1/4: y = 0, x = 1/4, z = 3/4 */
    assert_optimum(0.25 + 4.0 * 0.75);
}

static void fixed_columns_stay_where_they_are(void **state)
{
    (void)state;
    start(3, (const double[]){5.0, 1.0, 3.0}, 1.0);
    lp.lower[0] = lp.upper[0] = 0.125;
    lp_add_row(&lp, (const double[]){1.0, 1.0, 1.0}, 1.0, 1.0);
    assert_optimum(5.0 * 0.125 + 3.0 * 0.875);
    assert_true(answer.x[0] == 0.125);
}

static void a_program_without_rows_goes_to_its_bounds(void **state)
{
    (void)state;
    start(2, (const double[]){-3.0, 2.0}, 7.0);
    lp.lower[0] = -4.0;
    assert_optimum(12.0 + 14.0);
}

static void rows_that_exclude_each_other_are_proven_to(void **state)
{
    (void)state;
    start(3, (const double[]){1.0, 1.0, 1.0}, 1.0);
    lp_add_row(&lp, (const double[]){1.0, 1.0, 1.0}, 1.0, 1.0);
    lp_add_row(&lp, (const double[]){1.0, 1.0, 0.0}, 0.7, HUGE_VAL);
    lp_add_row(&lp, (const double[]){0.0, 1.0, 1.0}, 0.7, HUGE_VAL);
    lp_add_row(&lp, (const double[]){0.0, 1.0, 0.0}, -HUGE_VAL, 0.39);
    lp_maximise(&lp, &work, &answer);
    assert_int_equal(answer.status, LP_INFEASIBLE);
    assert_true(lp_proven_bound(&lp, NULL, answer.y) < -1e-3);
    lp.hi[3] = 0.4; /* 0.7 + 0.7 - 0.4 = 1 */
    assert_optimum(1.0);
}

static void a_row_out_of_reach_of_its_columns_is_infeasible(void **state)
{
    (void)state;
    start(2, (const double[]){1.0, 1.0}, 1.0);
    lp_add_row(&lp, (const double[]){1.0, 1.0}, 2.1, HUGE_VAL);
    lp_maximise(&lp, &work, &answer);
    assert_int_equal(answer.status, LP_INFEASIBLE);
}

static void rows_of_zeros_are_left_out_when_they_hold(void **state)
{
    (void)state;
    start(2, (const double[]){1.0, 1.0}, 1.0);
    lp_add_row(&lp, (const double[]){0.0, 0.0}, -1.0, 0.0);
    assert_int_equal(lp.rows, 0);
    lp_add_row(&lp, (const double[]){0.0, 0.0}, 0.5, HUGE_VAL);
    lp_maximise(&lp, &work, &answer);
    assert_int_equal(answer.status, LP_INFEASIBLE);
}

/* Any multipliers prove a bound; those of the optimum prove the least. */
static void any_multipliers_prove_a_bound(void **state)
{
    chance c = {20240517};

    (void)state;
    start(2, (const double[]){3.0, 5.0}, 100.0);
    lp_add_row(&lp, (const double[]){1.0, 0.0}, -HUGE_VAL, 4.0);
    lp_add_row(&lp, (const double[]){0.0, 2.0}, -HUGE_VAL, 12.0);
    lp_add_row(&lp, (const double[]){3.0, 2.0}, -HUGE_VAL, 18.0);
    for (int i = 0; i < 1000; i++) {
        const double y[] = {20.0 * chance_normal(&c), 20.0 * chance_normal(&c), 20.0 * chance_normal(&c)};

        assert_true(lp_proven_bound(&lp, lp.cost, y) >= 36.0 - TOLERANCE);
    }
}

/* y'r <= max(y lo, y hi) and d'x <= sum of max(d l, d u) with d = c - y'R: the definition, where an open end of a row is what
 * its columns reach. */
static void the_bound_of_multipliers_is_that_of_its_definition(void **state)
{
    chance c = {1963};

    (void)state;
    for (int k = 0; k < 200; k++) {
        double cost[4], row[3][4], y[3], ends[3][2], d[4], want = 0.0;

        for (size_t j = 0; j < 4; j++)
            d[j] = cost[j] = chance_normal(&c);
        start(4, cost, 1.0);
        for (size_t j = 0; j < 4; j++) {
            lp.lower[j] = -chance_uniform(&c);
            lp.upper[j] = chance_uniform(&c);
        }
        for (size_t i = 0; i < 3; i++) {
            double largest = 0.0, reach[2] = {0.0, 0.0};

            y[i] = i == 0 ? 0.0 : chance_normal(&c); /* a row that does not count */
            for (size_t j = 0; j < 4; j++) {
                row[i][j] = chance_normal(&c);
                largest = fmax(largest, fabs(row[i][j]));
                reach[0] += row[i][j] * (row[i][j] > 0.0 ? lp.lower[j] : lp.upper[j]);
                reach[1] += row[i][j] * (row[i][j] > 0.0 ? lp.upper[j] : lp.lower[j]);
            }
            ends[i][0] = k % 3 == 0 ? -HUGE_VAL : -0.3;
            ends[i][1] = k % 3 == 1 ? HUGE_VAL : 0.4;
            lp_add_row(&lp, row[i], ends[i][0], ends[i][1]);
            ends[i][0] = k % 3 == 0 ? fmin(reach[0], 0.4) : ends[i][0];
            ends[i][1] = k % 3 == 1 ? fmax(reach[1], -0.3) : ends[i][1];
            y[i] *= largest; /* rows are kept scaled */
            want += fmax(y[i] * ends[i][0], y[i] * ends[i][1]) / largest;
            for (size_t j = 0; j < 4; j++)
                d[j] -= y[i] / largest * row[i][j];
        }
        for (size_t j = 0; j < 4; j++)
            want += fmax(d[j] * lp.lower[j], d[j] * lp.upper[j]);
        assert_within(lp_proven_bound(&lp, cost, y), want, 1e-12);
    }
}

/* Fractions with random windows, rows and costs. An allowed point is known from the making, so the program
 * is feasible; its answer must be allowed, no worse than that point, and proven. */
static void random_programs_prove_their_answers(void **state)
{
    chance c = {7};

    (void)state;
    for (int k = 0; k < 5000; k++) {
        const size_t n = 2 + chance_below(&c, 30);
        const size_t m = chance_below(&c, 25);
        double known[LP_COLUMNS], row[LP_COLUMNS], sum = 0.0, value = 0.0;

        start(n, known, 1.0);
        for (size_t j = 0; j < n; j++)
            sum += known[j] = -log(chance_uniform(&c));
        for (size_t j = 0; j < n; j++) {
            known[j] /= sum;
            lp.lower[j] = chance_below(&c, 3) == 0 ? known[j] : known[j] * chance_uniform(&c);
            lp.upper[j] = chance_below(&c, 3) == 0 ? known[j] : 1.0;
            lp.cost[j] = chance_below(&c, 4) == 0 ? 0.0 : chance_normal(&c);
            value += lp.cost[j] * known[j];
            row[j] = 1.0;
        }
        lp_add_row(&lp, row, 1.0, 1.0);
        for (size_t i = 0; i < m; i++) {
            double at = 0.0;

            for (size_t j = 0; j < n; j++)
                at += known[j] * (row[j] = chance_below(&c, 2) == 0 ? 0.0 : chance_normal(&c));
            const size_t kind = chance_below(&c, 5); /* open above, open below, or closed */
            const double width = chance_below(&c, 2) == 0 ? 0.0 : 0.01;

            lp_add_row(&lp, row, kind > 2 ? -HUGE_VAL : kind == 0 ? at - width : at, kind == 0 ? HUGE_VAL : at + width);
        }
        lp_maximise(&lp, &work, &answer);
        assert_int_equal(answer.status, LP_OPTIMAL);
        assert_true(answer.value >= value - TOLERANCE);
        assert_within(answer.bound, answer.value, TOLERANCE);
        for (size_t i = 0; i < lp.rows; i++) {
            double at = 0.0;

            for (size_t j = 0; j < n; j++)
                at += lp.row[i][j] * answer.x[j];
            assert_true(at >= lp.lo[i] - 1e-10 && at <= lp.hi[i] + 1e-10);
        }
        for (size_t j = 0; j < n; j++)
            assert_true(answer.x[j] >= lp.lower[j] && answer.x[j] <= lp.upper[j]);
    }
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(wyndor_glass_makes_thirty_six),
        cmocka_unit_test(beales_degenerate_program_does_not_cycle),
        cmocka_unit_test(klee_and_mintys_cube_ends_at_its_last_corner),
        cmocka_unit_test(an_equality_and_a_range_hold_at_once),
        cmocka_unit_test(fixed_columns_stay_where_they_are),
        cmocka_unit_test(a_program_without_rows_goes_to_its_bounds),
        cmocka_unit_test(rows_that_exclude_each_other_are_proven_to),
        cmocka_unit_test(a_row_out_of_reach_of_its_columns_is_infeasible),
        cmocka_unit_test(rows_of_zeros_are_left_out_when_they_hold),
        cmocka_unit_test(any_multipliers_prove_a_bound),
        cmocka_unit_test(the_bound_of_multipliers_is_that_of_its_definition),
        cmocka_unit_test(random_programs_prove_their_answers),
    };

    return cmocka_run_group_tests_name("supply/test_worst_lp", tests, NULL, NULL);
}
