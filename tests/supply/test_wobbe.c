/* SPDX-License-Identifier: MIT */
/* test_wobbe.c - Wobbe ratio and temperature correction, air index. */
#include "supply/gases.h"

#define BTU_PER_FT3 (1055.05585262 / 0.028316846592)

static double wobbe_of_blend(double hydrogen_percent)
{
    char literal[64];

    (void)snprintf(literal, sizeof literal, "methane=%.3f,hydrogen=%.3f", 100.0 - hydrogen_percent, hydrogen_percent);
    return index_of("wobbe-ratio", "methane=100", literal).value;
}

/* Common statement of the hydrogen literature: the Wobbe index of methane falls with hydrogen to a minimum at 70 to 80 %
 * and then rises to that of hydrogen, still below methane's. */
static void hydrogen_lowers_the_wobbe_index_until_seventy_to_eighty_percent_and_then_raises_it(void **state)
{
    double lowest = 2.0;
    double at = 0.0;

    (void)state;
    for (double share = 1.0; share < 100.0; share += 1.0)
        if (wobbe_of_blend(share) < lowest) {
            lowest = wobbe_of_blend(share);
            at = share;
        }
    assert_true(at >= 70.0 && at <= 85.0);
    assert_true(wobbe_of_blend(20.0) < wobbe_of_blend(10.0));
    assert_true(wobbe_of_blend(99.0) > wobbe_of_blend(90.0));
    assert_true(wobbe_of_blend(99.0) < 1.0);
}

/* Trade data sheet of Wobbe-equal LP gas and air: natural gas of h and d, LP gas of 2516 Btu/ft3 and 1.53 in a share
 * given to 0.01 %; the tolerance is the rounding of the share, 0.005 in 45.76 at the least, times the slope. */
static void air_and_lpg_by_the_trade_table_carry_the_heat_of_the_natural_gas(void **state)
{
    static const struct {
        double h, d, share;
    } TABLE[] = {{800.0, 0.56, 0.4754}, {1000.0, 0.56, 0.6111}, {900.0, 0.58, 0.5318}, {800.0, 0.60, 0.4576}, {1000.0, 0.60, 0.5876}};

    (void)state;
    for (size_t i = 0; i < COUNT(TABLE); i++) {
        const double natural = TABLE[i].h * BTU_PER_FT3 / sqrt(TABLE[i].d);
        const double mixture = TABLE[i].share * 2516.0 * BTU_PER_FT3 / sqrt(1.0 + 0.53 * TABLE[i].share);
        double ratio = 0.0;

        assert_int_equal(bc_wobbe_ratio(natural, mixture, &ratio, NULL), BC_OK);
        assert_within(ratio, 1.0, 1.1e-4);
    }
}

/* Gas turbine practice: 900 Btu/scf, d 0.60 at 60 F gives 50.9686 Btu/scf per square root of degR (derived). */
static void the_modified_wobbe_index_is_that_of_the_worked_example(void **state)
{
    const double unit = BTU_PER_FT3 * sqrt(1.8); /* Btu/(scf degR^0.5) */
    double modified = 0.0;
    double heated = 0.0;

    (void)state;
    assert_int_equal(bc_wobbe_modified(900.0 * BTU_PER_FT3, 0.60, 519.67 / 1.8, &modified, NULL), BC_OK);
    assert_within(modified / unit, 50.9686, 1e-3);
    /* heating a gas by 10 % in temperature lowers it by 4.7 % */
    assert_int_equal(bc_wobbe_modified(900.0 * BTU_PER_FT3, 0.60, 1.1 * 519.67 / 1.8, &heated, NULL), BC_OK);
    assert_within(heated / modified, 0.953, 0.0005);
}

static void the_corrected_wobbe_index_falls_with_the_root_of_the_fuel_temperature(void **state)
{
    double corrected = 0.0;

    (void)state;
    assert_int_equal(bc_wobbe_corrected(50.72e6, 288.15, 288.15, &corrected, NULL), BC_OK);
    assert_within(corrected, 50.72e6, 1.0);
    assert_int_equal(bc_wobbe_corrected(50.72e6, 288.15, 353.15, &corrected, NULL), BC_OK);
    assert_within(corrected, 50.72e6 * 0.903295, 100.0);
}

static void figures_without_meaning_are_refused(void **state)
{
    double out = 7.25;
    bc_error err;

    (void)state;
    assert_refused(bc_wobbe_ratio(0.0, 50e6, &out, &err), &err, BC_ERR_RANGE, "old gas");
    assert_refused(bc_wobbe_ratio(50e6, -1.0, &out, &err), &err, BC_ERR_RANGE, "new gas");
    assert_refused(bc_wobbe_ratio(50e6, HUGE_VAL, &out, &err), &err, BC_ERR_RANGE, "new gas");
    assert_refused(bc_wobbe_corrected(50e6, 288.15, 199.0, &out, &err), &err, BC_ERR_RANGE, "199");
    assert_refused(bc_wobbe_corrected(50e6, 1001.0, 300.0, &out, &err), &err, BC_ERR_RANGE, "1001");
    assert_refused(bc_wobbe_corrected(-50e6, 288.15, 300.0, &out, &err), &err, BC_ERR_RANGE, "above zero");
    assert_refused(bc_wobbe_modified(34e6, 0.0, 300.0, &out, &err), &err, BC_ERR_RANGE, "density");
    assert_refused(bc_wobbe_modified(0.0, 0.6, 300.0, &out, &err), &err, BC_ERR_RANGE, "heating value");
    assert_refused(bc_wobbe_modified(34e6, 0.6, (double)NAN, &out, &err), &err, BC_ERR_RANGE, "temperature");
    assert_within(out, 7.25, 0.0);
}

/* Methane takes 2 O2: 9.5484 mol of air of 20.946 %, 9.5636 m3 of real gases (ISO 6976:2016). */
static void the_air_index_of_methane_is_its_air_over_the_root_of_its_density(void **state)
{
    const bc_reference reference = reference_at("15/15");
    const bc_gas methane = gas_of("methane=100");
    const bc_value v = bc_value_of(&reference, &methane);
    double index = 0.0;

    (void)state;
    assert_int_equal(bc_air_index(&reference, &methane, &index, NULL), BC_OK);
    assert_within(index * sqrt(v.relative_density), 9.54836 * 0.999595 / 0.998018, 1e-4);
}

/* A burner on methane at an air factor of 1.2 that is given 20 % hydrogen runs at 1.282 (derived with the air
 * demand of ideal gases: 0.1 % is the compression factor of methane). */
static void twenty_percent_hydrogen_raises_the_air_factor_from_1_2_to_1_28(void **state)
{
    const double before = index_of("air-index", NULL, "methane=100").value;
    const double after = index_of("air-index", NULL, BLEND).value;

    (void)state;
    assert_within(1.2 * before / after, 1.2819, 1.5e-3);
}

/* CO takes 1/2 O2, methanol 3/2, H2S 3/2, ethyne 5/2; in proportion to the same sqrt(M Z). */
static void the_air_index_follows_the_oxygen_demand(void **state)
{
    static const struct {
        const char *gas;
        double demand;
    } PURE[] = {{"carbon-monoxide=100", 0.5}, {"methanol=100", 1.5}, {"hydrogen-sulfide=100", 1.5}, {"ethyne=100", 2.5}, {"hydrogen=100", 0.5}};
    const bc_reference reference = reference_at("15/15");
    const double air_oxygen = 0.20946; /* ISO 6976:1995, value from memory */

    (void)state;
    for (size_t i = 0; i < COUNT(PURE); i++) {
        const bc_gas gas = gas_of(PURE[i].gas);
        const bc_value v = bc_value_of(&reference, &gas);
        double index = 0.0;

        assert_int_equal(bc_air_index(&reference, &gas, &index, NULL), BC_OK);
        assert_within_at(PURE[i].gas, index * sqrt(v.relative_density) * v.z / reference.air_z, PURE[i].demand / air_oxygen, 2e-4);
    }
}

static void the_air_index_counts_oxygen_of_the_gas(void **state)
{
    const bc_reference reference = reference_at("15/15");
    const bc_gas inert = gas_of("nitrogen=90,oxygen=10");
    double out = 7.25;
    bc_error err;

    (void)state;
    assert_true(index_of("air-index", NULL, "methane=98,oxygen=2").value < index_of("air-index", NULL, "methane=98,nitrogen=2").value);
    assert_refused(bc_air_index(&reference, &inert, &out, &err), &err, BC_ERR_RANGE, "no air");
    assert_within(out, 7.25, 0.0);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(hydrogen_lowers_the_wobbe_index_until_seventy_to_eighty_percent_and_then_raises_it),
        cmocka_unit_test(air_and_lpg_by_the_trade_table_carry_the_heat_of_the_natural_gas),
        cmocka_unit_test(the_modified_wobbe_index_is_that_of_the_worked_example),
        cmocka_unit_test(the_corrected_wobbe_index_falls_with_the_root_of_the_fuel_temperature),
        cmocka_unit_test(figures_without_meaning_are_refused),
        cmocka_unit_test(the_air_index_of_methane_is_its_air_over_the_root_of_its_density),
        cmocka_unit_test(twenty_percent_hydrogen_raises_the_air_factor_from_1_2_to_1_28),
        cmocka_unit_test(the_air_index_follows_the_oxygen_demand),
        cmocka_unit_test(the_air_index_counts_oxygen_of_the_gas),
    };

    return cmocka_run_group_tests_name("wobbe", tests, NULL, NULL);
}
