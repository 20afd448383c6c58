/* SPDX-License-Identifier: MIT */
/* test_acid_dew.c - sulfuric-acid dew points. */
#include "flame_support.h"

#include "bluecone/dewpoint.h"
#include "bluecone/flue.h"
#include "bluecone/oxidant.h"

#define T0_K 273.15
#define P0_PA 101325.0

static bc_flue burn(const char *fuel_literal, double lambda)
{
    const bc_gas fuel = gas_of(fuel_literal);
    const bc_gas air = bc_oxidant_air();
    bc_flue flue = {.lambda = 0.0};

    assert_int_equal(bc_flue_at(&fuel, &air, lambda, &flue, NULL), BC_OK);
    return flue;
}

/* "Deu Point" flue-gas worksheet: 38.1103549 mmHg water, 0.00097421 mmHg SO3: 383.525 K, half a hundredth. */
static void verhoff_and_banchero_match_a_published_worksheet(void **state)
{
    bc_acid_dew dew;

    (void)state;
    assert_int_equal(bc_acid_dew_point(38.1103549 / 760.0, 0.00097421 / 760.0, P0_PA, &dew, NULL), BC_OK);
    assert_within(dew.verhoff_banchero_k, 383.525, 0.005, "worksheet");
}

/* The correlations themselves, coded apart: two printed decimals. v Verhoff-Banchero, o Okkes, z ZareNezhad. */
static void the_acid_correlations_give_their_figures(void **state)
{
    static const struct {
        char which;
        double w_atm, s_atm, t_c;
    } ROWS[] = {
        {'v', 0.08, 1e-6, 113.17}, {'z', 0.08, 1e-6, 110.94}, {'o', 0.08, 1e-5, 130.58}, {'v', 0.08, 1e-4, 159.62}, {'z', 0.08, 1e-4, 157.4},
        {'o', 0.10, 1e-6, 115.51}, {'v', 0.10, 1e-5, 137.3},  {'z', 0.10, 1e-5, 136.4},  {'o', 0.10, 1e-4, 154.4},  {'v', 0.12, 1e-6, 117.69},
        {'z', 0.12, 1e-6, 115.35}, {'o', 0.12, 1e-5, 135.44}, {'v', 0.12, 1e-4, 163.09}, {'z', 0.12, 1e-4, 161.1},  {'o', 0.15, 1e-6, 120.37},
        {'v', 0.15, 1e-5, 141.42}, {'z', 0.15, 1e-5, 140.46}, {'o', 0.15, 1e-4, 159.26},
        /* rounded table of the three, 5 and 18 % water: one printed decimal, see below */
        {'v', 0.05, 1e-6, 108.1},  {'o', 0.05, 1e-6, 107.2},  {'z', 0.05, 1e-6, 105.8},  {'v', 0.18, 1e-4, 166.6},  {'o', 0.18, 1e-4, 161.5},
        {'z', 0.18, 1e-4, 164.8}};

    (void)state;
    for (size_t i = 0; i < BC_COUNT(ROWS); i++) {
        bc_acid_dew dew;

        assert_int_equal(bc_acid_dew_point(ROWS[i].w_atm, ROWS[i].s_atm, P0_PA, &dew, NULL), BC_OK);
        const double got = ROWS[i].which == 'v' ? dew.verhoff_banchero_k : ROWS[i].which == 'o' ? dew.okkes_k : dew.zarenezhad_k;

        assert_within(got - T0_K, ROWS[i].t_c, i < 18 ? 0.02 : 0.06, "acid dew point");
    }
}

static void acid_outside_the_fits_is_marked(void **state)
{
    bc_acid_dew dew;

    (void)state;
    assert_int_equal(bc_acid_dew_point(0.10, 0.05e-6, P0_PA, &dew, NULL), BC_OK);
    assert_true(dew.exists && !dew.in_range);
    assert_int_equal(bc_acid_dew_point(0.45, 5e-6, P0_PA, &dew, NULL), BC_OK);
    assert_true(dew.exists && !dew.in_range);
    assert_int_equal(bc_acid_dew_point(0.0301, 0.101e-6, P0_PA, &dew, NULL), BC_OK);
    assert_true(dew.in_range);
    assert_int_equal(bc_acid_dew_point(0.299, 199e-6, P0_PA, &dew, NULL), BC_OK);
    assert_true(dew.in_range);
    assert_int_equal(bc_acid_dew_point(0.301, 199e-6, P0_PA, &dew, NULL), BC_OK);
    assert_false(dew.in_range);
    assert_int_equal(bc_acid_dew_point(0.10, 201e-6, P0_PA, &dew, NULL), BC_OK);
    assert_false(dew.in_range);
    assert_int_equal(bc_acid_dew_point(0.0299, 5e-6, P0_PA, &dew, NULL), BC_OK);
    assert_false(dew.in_range);
    assert_int_equal(bc_acid_dew_point(0.10, 1e-8, P0_PA, &dew, NULL), BC_OK);
    assert_true(isfinite(dew.min_k) && dew.min_k > 320.0);
}

/* The ends themselves are inside: 0.1 to 200 ppm and 3 to 30 % at 1 atm. */
static void the_fits_end_at_their_figures(void **state)
{
    static const struct {
        double w, s;
        bool inside;
    } ROWS[] = {{0.03, 5e-6, true}, {0.30, 5e-6, true}, {0.1, 0.1e-6, true}, {0.1, 200e-6, true}, {0.029999, 5e-6, false},
                {0.300001, 5e-6, false}, {0.1, 0.09999e-6, false}, {0.1, 200.001e-6, false}};

    (void)state;
    for (size_t i = 0; i < BC_COUNT(ROWS); i++) {
        bc_acid_dew dew;

        assert_int_equal(bc_acid_dew_point(ROWS[i].w, ROWS[i].s, P0_PA, &dew, NULL), BC_OK);
        assert_int_equal(dew.in_range, ROWS[i].inside);
    }
}

static void the_acid_spread_holds_all_three_and_depends_on_partial_pressure(void **state)
{
    bc_acid_dew at_1;
    bc_acid_dew at_2;

    (void)state;
    assert_int_equal(bc_acid_dew_point(0.11, 7e-6, P0_PA, &at_1, NULL), BC_OK);
    assert_int_equal(bc_acid_dew_point(0.055, 3.5e-6, 2.0 * P0_PA, &at_2, NULL), BC_OK);
    assert_within(at_2.okkes_k, at_1.okkes_k, 1e-10, "half the fractions, twice the pressure");
    assert_true(at_1.exists && at_1.in_range);
    assert_true(at_1.min_k <= at_1.okkes_k && at_1.min_k <= at_1.zarenezhad_k && at_1.min_k <= at_1.verhoff_banchero_k);
    assert_true(at_1.max_k >= at_1.okkes_k && at_1.max_k >= at_1.zarenezhad_k && at_1.max_k >= at_1.verhoff_banchero_k);
    /* the fits differ by 1 to 10 K in their range */
    assert_true(at_1.max_k - at_1.min_k > 1.0 && at_1.max_k - at_1.min_k < 10.0);
}

static void the_conversion_counts_mole_by_mole(void **state)
{
    const bc_flue flue = burn("methane=99,hydrogen-sulfide=1", 1.2);
    bc_acid_dew by_flue;
    bc_acid_dew by_hand;

    (void)state;
    assert_int_equal(bc_acid_dew_point_of(&flue.wet, 0.031, 99e3, &by_flue, NULL), BC_OK);
    assert_int_equal(bc_acid_dew_point(flue.wet.x[SPECIES_water], 0.031 * flue.wet.x[SPECIES_sulfur_dioxide], 99e3, &by_hand, NULL), BC_OK);
    assert_within(by_flue.max_k, by_hand.max_k, 0.0, "acid dew point");
}

static void without_sulfur_there_is_no_acid_dew_point(void **state)
{
    const bc_flue flue = burn("methane=100", 1.2);
    bc_acid_dew dew;
    bc_error err = {.status = BC_OK};

    (void)state;
    assert_int_equal(bc_acid_dew_point_of(&flue.wet, BC_SO3_CONVERSION, P0_PA, &dew, NULL), BC_OK);
    assert_false(dew.exists);
    assert_int_equal(bc_acid_dew_point(0.0, 1e-6, P0_PA, &dew, NULL), BC_OK);
    assert_false(dew.exists);
    assert_int_equal(bc_acid_dew_point_of(&flue.wet, 0.0, P0_PA, &dew, NULL), BC_OK);
    assert_refused(bc_acid_dew_point(0.1, 5e-9, P0_PA, &dew, &err), BC_ERR_RANGE, &err);
    assert_refused(bc_acid_dew_point(0.1, 1.1e-8, 50e3, &dew, &err), BC_ERR_RANGE, &err);
    assert_refused(bc_acid_dew_point(0.1, -1e-6, P0_PA, &dew, &err), BC_ERR_RANGE, &err);
    assert_int_equal(bc_acid_dew_point(0.1, 1e-6, 0.0, &dew, &err), BC_ERR_RANGE);
    assert_non_null(strstr(err.message, "absolute pressure")); /* and not for want of SO3 */
    assert_refused(bc_acid_dew_point_of(&flue.wet, 1.5, P0_PA, &dew, &err), BC_ERR_RANGE, &err);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(the_acid_correlations_give_their_figures),
        cmocka_unit_test(verhoff_and_banchero_match_a_published_worksheet),
        cmocka_unit_test(the_acid_spread_holds_all_three_and_depends_on_partial_pressure),
        cmocka_unit_test(the_conversion_counts_mole_by_mole),
        cmocka_unit_test(without_sulfur_there_is_no_acid_dew_point),
        cmocka_unit_test(acid_outside_the_fits_is_marked),
        cmocka_unit_test(the_fits_end_at_their_figures),
    };

    return cmocka_run_group_tests_name("acid_dew", tests, NULL, NULL);
}
