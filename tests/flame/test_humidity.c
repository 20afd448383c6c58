/* SPDX-License-Identifier: MIT */
/* test_humidity.c - the water of combustion air and its pressure at an altitude. */
#include "flame_support.h"

#include "bluecone/humidity.h"
#include "bluecone/oxidant.h"

#define T0_K 273.15
#define P0_PA 101325.0

/* 25 C, 60 %, 1.01325 bar: W = 0.01190 on the same equations, half of the last digit. */
static void three_ways_to_state_humidity_agree(void **state)
{
    double x = 0.0;
    double by_dew = 0.0;
    double by_bulb = 0.0;

    (void)state;
    assert_int_equal(bc_humidity_relative(0.6, T0_K + 25.0, P0_PA, &x, NULL), BC_OK);
    assert_within(bc_humidity_ratio(x), 0.01190, 0.00001, "25 C, 60 %");
    /* dew point 16.7 C and wet bulb 19.5 C of that air, psychrometric charts, value from memory: 0.1 K is 1 % of W */
    assert_int_equal(bc_humidity_dew_point(T0_K + 16.7, P0_PA, &by_dew, NULL), BC_OK);
    assert_within(by_dew, x, 0.01 * x, "dew point");
    assert_int_equal(bc_humidity_wet_bulb(T0_K + 25.0, T0_K + 19.5, P0_PA, &by_bulb, NULL), BC_OK);
    assert_within(by_bulb, x, 0.01 * x, "wet bulb");
}

/* ASHRAE Handbook Fundamentals 2017 chapter 1, table 1: standard atmosphere, Pa; tolerance 1 Pa, as printed. */
static void the_pressure_falls_with_altitude_as_ashrae_prints_it(void **state)
{
    static const struct {
        double h_m, p_pa;
    } TABLE_1[] = {{-500.0, 107478.0}, {500.0, 95461.0}, {4000.0, 61640.0}};
    double p_pa = 0.0;
    bc_error err = {.status = BC_OK};

    (void)state;
    for (size_t i = 0; i < BC_COUNT(TABLE_1); i++) {
        assert_int_equal(bc_altitude_pressure(TABLE_1[i].h_m, &p_pa, NULL), BC_OK);
        assert_within(p_pa, TABLE_1[i].p_pa, 1.0, "altitude");
    }
    assert_refused(bc_altitude_pressure(12000.0, &p_pa, &err), BC_ERR_RANGE, &err);
}

/* Test of an open psychrometric library (PsychroLib) on ASHRAE's equations; last one: ASHRAE table 2, which
 * counts the enhancement factor, hence 0.5 %. */
static void humidity_ratios_are_those_of_ashrae(void **state)
{
    double x = 0.0;

    (void)state;
    assert_within(bc_humidity_ratio(3169.7 / 95461.0), 0.0213603998047487, 1e-6 * 0.02136, "p_w 3169.7 Pa, p 95461 Pa");
    assert_int_equal(bc_humidity_wet_bulb(T0_K - 1.0, T0_K - 5.0, 95461.0, &x, NULL), BC_OK);
    assert_within(bc_humidity_ratio(x), 0.00120399819933844, 3e-4 * 0.001204, "-1 C, iced wet bulb -5 C");
    assert_int_equal(bc_humidity_relative(1.0, T0_K + 25.0, P0_PA, &x, NULL), BC_OK);
    assert_within(bc_humidity_ratio(x), 0.020173, 0.005 * 0.020173, "saturated, 25 C");
}

/* The same test: 30 C, W 0.02, 95461 Pa: 0.940855374352943 m3 per kg dry air; 3e-4: ASHRAE's gas constant of air. */
static void the_volume_of_humid_air_is_that_of_ashrae(void **state)
{
    const double x = bc_humidity_fraction(0.02);
    const bc_gas air = bc_oxidant_air();
    bc_gas wet;

    (void)state;
    assert_int_equal(bc_humidity_apply(&air, x, &wet, NULL), BC_OK);
    const double dry_kg_per_mol = bc_gas_molar_mass_kg_per_mol(&wet) - x * bc_species_molar_mass_kg_per_mol(SPECIES_water);

    assert_within(8.31446261815324 * (T0_K + 30.0) / 95461.0 / dry_kg_per_mol, 0.940855374352943, 3e-4, "m3 per kg dry air");
}

static void a_wet_bulb_as_warm_as_the_air_means_saturation(void **state)
{
    static const double T_C[] = {-17.0, -3.5, 0.5, 12.25, 31.0};
    double x = 0.0;
    double saturated = 0.0;

    (void)state;
    for (size_t i = 0; i < BC_COUNT(T_C); i++) {
        assert_int_equal(bc_humidity_wet_bulb(T0_K + T_C[i], T0_K + T_C[i], 98000.0, &x, NULL), BC_OK);
        assert_int_equal(bc_humidity_relative(1.0, T0_K + T_C[i], 98000.0, &saturated, NULL), BC_OK);
        assert_within(x, saturated, 1e-12, "saturation");
    }
}

/* ASHRAE Fundamentals 2017 chapter 1, (33): a bulb at 0 C itself is wet, not iced. */
static void a_bulb_at_0_c_is_wet(void **state)
{
    double x = 0.0;
    double saturated = 0.0;

    (void)state;
    assert_int_equal(bc_humidity_relative(1.0, T0_K, 98000.0, &saturated, NULL), BC_OK);
    assert_int_equal(bc_humidity_wet_bulb(T0_K + 4.0, T0_K, 98000.0, &x, NULL), BC_OK);
    assert_within(bc_humidity_ratio(x), (2501.0 * bc_humidity_ratio(saturated) - 1.006 * 4.0) / (2501.0 + 1.86 * 4.0), 1e-12, "humidity ratio");
}

static void humidity_that_cannot_be_is_refused(void **state)
{
    double x = 7.0;
    bc_error err = {.status = BC_OK};
    const bc_gas water = gas_of("water=100");
    const bc_gas air = bc_oxidant_air();
    bc_gas wet;

    (void)state;
    assert_int_equal(bc_humidity_apply(&air, 0.0, &wet, NULL), BC_OK);
    assert_refused(bc_humidity_apply(&air, 1.0, &wet, &err), BC_ERR_RANGE, &err);
    assert_refused(bc_humidity_relative(1.01, 300.0, P0_PA, &x, &err), BC_ERR_RANGE, &err);
    assert_refused(bc_humidity_relative(0.5, 500.0, P0_PA, &x, &err), BC_ERR_RANGE, &err);
    assert_refused(bc_humidity_relative(0.5, 300.0, 0.0, &x, &err), BC_ERR_RANGE, &err);
    assert_refused(bc_humidity_dew_point(370.0, 50000.0, &x, &err), BC_ERR_RANGE, &err);
    assert_refused(bc_humidity_wet_bulb(300.0, 301.0, P0_PA, &x, &err), BC_ERR_RANGE, &err);
    assert_refused(bc_humidity_wet_bulb(303.0, 278.0, P0_PA, &x, &err), BC_ERR_RANGE, &err);
    assert_refused(bc_humidity_apply(&water, 0.1, &wet, &err), BC_ERR_INPUT, &err);
    assert_int_equal(bc_humidity_wet_bulb(T0_K + 30.0, T0_K + 5.0, P0_PA, &x, &err), BC_ERR_RANGE);
    assert_non_null(strstr(err.message, "no air of 30 C has a wet bulb as cold as 5 C"));
    assert_int_equal(bc_humidity_dew_point(T0_K + 96.85, 50000.0, &x, &err), BC_ERR_RANGE);
    assert_non_null(strstr(err.message, "than the air, 50 kPa"));
    assert_within(x, 7.0, 0.0, "output after refusals");
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(the_pressure_falls_with_altitude_as_ashrae_prints_it),
        cmocka_unit_test(humidity_ratios_are_those_of_ashrae),
        cmocka_unit_test(the_volume_of_humid_air_is_that_of_ashrae),
        cmocka_unit_test(three_ways_to_state_humidity_agree),
        cmocka_unit_test(a_wet_bulb_as_warm_as_the_air_means_saturation),
        cmocka_unit_test(a_bulb_at_0_c_is_wet),
        cmocka_unit_test(humidity_that_cannot_be_is_refused),
    };

    return cmocka_run_group_tests_name("humidity", tests, NULL, NULL);
}
