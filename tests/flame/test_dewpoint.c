/* SPDX-License-Identifier: MIT */
/* test_dewpoint.c - water dew points, latent heat, condensation. */
#include "flame_support.h"

#include "bluecone/dewpoint.h"
#include "bluecone/flue.h"
#include "bluecone/humidity.h"
#include "bluecone/oxidant.h"
#include "bluecone/steam.h"

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

/* Balance with 20.946 % oxygen and IAPWS SR1-86(1992), coded apart; 0.02 K: two printed decimals. */
static void flue_gases_have_their_water_dew_points(void **state)
{
    static const char BFG[] = "carbon-monoxide=22,carbon-dioxide=22,hydrogen=3,nitrogen=53";
    static const char COG[] = "hydrogen=56,methane=26,carbon-monoxide=6,ethene=2,ethane=1,carbon-dioxide=2,nitrogen=7";
    static const struct {
        const char *fuel;
        double lambda, p_pa, t_c;
    } ROWS[] = {
        {"methane=100", 1.0, P0_PA, 59.19},  {"methane=100", 1.2, P0_PA, 55.66},  {"methane=100", 1.5, P0_PA, 51.38},
        {"ethane=100", 1.0, P0_PA, 56.2},    {"ethane=100", 1.2, P0_PA, 52.7},    {"ethane=100", 1.5, P0_PA, 48.47},
        {"propane=100", 1.0, P0_PA, 54.87},  {"propane=100", 1.2, P0_PA, 51.38},  {"propane=100", 1.5, P0_PA, 47.17},
        {"n-butane=100", 1.0, P0_PA, 54.12}, {"n-butane=100", 1.2, P0_PA, 50.64}, {"n-butane=100", 1.5, P0_PA, 46.44},
        {"hydrogen=100", 1.0, P0_PA, 72.74}, {"hydrogen=100", 1.2, P0_PA, 69.18}, {"hydrogen=100", 1.5, P0_PA, 64.81},
        {"methane=100", 1.1, 80e3, 52.41},   {"methane=100", 1.1, 200e3, 72.53},  {"methane=100", 1.1, 1e6, 115.84},
        {COG, 1.1, P0_PA, 61.1},             {BFG, 1.0, P0_PA, 18.01},            {BFG, 1.2, P0_PA, 16.77}};
    bc_dew dew;

    (void)state;
    for (size_t i = 0; i < BC_COUNT(ROWS); i++) {
        const bc_flue flue = burn(ROWS[i].fuel, ROWS[i].lambda);

        assert_int_equal(bc_dew_point(flue.wet.x[SPECIES_water], ROWS[i].p_pa, &dew, NULL), BC_OK);
        assert_true(dew.exists && !dew.frost);
        assert_within(dew.t_k - T0_K, ROWS[i].t_c, 0.02, ROWS[i].fuel);
    }
}

static void the_dew_point_inverts_the_saturation_pressure(void **state)
{
    bc_dew dew;
    double p_pa = 0.0;

    (void)state;
    for (double t_k = 51.3; t_k < BC_STEAM_T_MAX_K; t_k += 2.9) {
        assert_int_equal(bc_steam_pressure(t_k, &p_pa, NULL), BC_OK);
        assert_int_equal(bc_dew_point(0.37, p_pa / 0.37, &dew, NULL), BC_OK);
        assert_within(dew.t_k, t_k, 1e-11 * t_k, "temperature");
        assert_int_equal(dew.frost, t_k < BC_STEAM_T_MIN_K);
    }
}

static void the_dew_point_passes_the_triple_point_without_a_step(void **state)
{
    bc_dew below;
    bc_dew above;

    (void)state;
    assert_int_equal(bc_dew_point(1.0, 611.657 * (1.0 - 1e-9), &below, NULL), BC_OK);
    assert_int_equal(bc_dew_point(1.0, 611.657 * (1.0 + 1e-6), &above, NULL), BC_OK);
    assert_true(below.frost || below.t_k >= BC_STEAM_T_MIN_K);
    assert_within(below.t_k, 273.16, 2e-5, "below");
    assert_within(above.t_k, 273.16, 2e-5, "above");
    assert_int_equal(bc_dew_point(1.0, 22.064e6, &above, NULL), BC_OK);
    assert_within(above.t_k, 647.096, 1e-9, "critical point");
}

static void the_dew_point_rises_with_water_and_pressure(void **state)
{
    double last = 0.0;

    (void)state;
    for (double x = 1e-6; x < 1.0; x *= 1.7) {
        bc_dew dew;

        assert_int_equal(bc_dew_point(x, 131e3, &dew, NULL), BC_OK);
        assert_true(dew.t_k > last);
        last = dew.t_k;
    }
}

static void a_dry_gas_has_no_dew_point(void **state)
{
    bc_dew dew = {true, true, 300.0};
    bc_error err = {.status = BC_OK};

    (void)state;
    assert_int_equal(bc_dew_point(0.0, P0_PA, &dew, NULL), BC_OK);
    assert_true(!dew.exists && !dew.frost);
    assert_refused(bc_dew_point(0.9, 30e6, &dew, &err), BC_ERR_RANGE, &err);
    assert_refused(bc_dew_point(1.1, P0_PA, &dew, &err), BC_ERR_RANGE, &err);
    assert_refused(bc_dew_point(0.1, -1.0, &dew, &err), BC_ERR_RANGE, &err);
    assert_refused(bc_dew_point((double)NAN, P0_PA, &dew, &err), BC_ERR_RANGE, &err);
    assert_refused(bc_dew_point(1e-60, P0_PA, &dew, &err), BC_ERR_RANGE, &err);
}

/* Steam table of a university property table, kJ/kg; 1.5e-4 relative: 0.3 kJ/kg between the two formulations. */
static void the_latent_heat_is_that_of_the_steam_table(void **state)
{
    static const struct {
        double t_c, kj_per_kg;
    } TABLE[] = {{5.0, 2489.1},  {15.0, 2465.3}, {25.0, 2441.7}, {35.0, 2417.9}, {45.0, 2394.0},
                 {55.0, 2369.8}, {65.0, 2345.4}, {75.0, 2320.6}, {85.0, 2295.3}};
    double j_per_kg = 0.0;

    (void)state;
    for (size_t i = 0; i < BC_COUNT(TABLE); i++) {
        assert_int_equal(bc_steam_latent_heat(T0_K + TABLE[i].t_c, &j_per_kg, NULL), BC_OK);
        assert_within(j_per_kg * 1e-3, TABLE[i].kj_per_kg, 1.5e-4 * TABLE[i].kj_per_kg, "latent heat");
    }
}

/* IAPWS SR1-86(1992), table of check values, value from memory: 273.16 K 999.789, 373.1243 K 958.365 kg/m3; 611.657 and
 * 101325 Pa. Relative 1e-6. */
static void saturated_water_has_the_density_of_its_release(void **state)
{
    double liquid = 0.0;
    double vapour = 0.0;
    double p_pa = 0.0;
    bc_error err = {.status = BC_OK};

    (void)state;
    assert_int_equal(bc_steam_density(273.16, &liquid, &vapour, NULL), BC_OK);
    assert_within(liquid, 999.789, 1e-3, "273.16 K");
    assert_int_equal(bc_steam_density(373.1243, &liquid, &vapour, NULL), BC_OK);
    assert_within(liquid, 958.365, 1e-3, "373.1243 K");
    assert_within(vapour, 0.597586, 1e-6, "vapour, 373.1243 K: same table, value from memory");
    assert_int_equal(bc_steam_pressure(273.16, &p_pa, NULL), BC_OK);
    assert_within(p_pa, 611.657, 6e-4, "273.16 K");
    assert_int_equal(bc_steam_pressure(373.124, &p_pa, NULL), BC_OK);
    assert_within(p_pa, 101325.0, 1.1, "373.124 K: 0.0003 K of rounding is 1 Pa");
    assert_refused(bc_steam_density(270.0, &liquid, &vapour, &err), BC_ERR_RANGE, &err);
    assert_refused(bc_steam_latent_heat(650.0, &p_pa, &err), BC_ERR_RANGE, &err);
}

static void the_latent_heat_ends_at_the_critical_point(void **state)
{
    double last = 1e9;
    double j_per_kg = 0.0;

    (void)state;
    for (double t_k = BC_STEAM_T_MIN_K; t_k < BC_STEAM_T_MAX_K; t_k += 3.3) {
        assert_int_equal(bc_steam_latent_heat(t_k, &j_per_kg, NULL), BC_OK);
        assert_true(j_per_kg < last && j_per_kg > 0.0);
        last = j_per_kg;
    }
    assert_int_equal(bc_steam_latent_heat(BC_STEAM_T_MAX_K, &j_per_kg, NULL), BC_OK);
    assert_within(j_per_kg, 0.0, 1e-3, "critical point");
}

/* Methane, lambda 1.2, dry air, 1 atm, kg water per kg fuel: balance coded apart, four decimals. */
static void methane_flue_gas_gives_its_condensate(void **state)
{
    static const struct {
        double t_c, kg_per_kg;
    } ROWS[] = {{25.0, 1.8667}, {30.0, 1.7322}, {40.0, 1.3227}, {50.0, 0.6155}, {55.0, 0.0824}};
    const bc_flue flue = burn("methane=100", 1.2);

    (void)state;
    for (size_t i = 0; i < BC_COUNT(ROWS); i++) {
        bc_condensation c;

        assert_int_equal(bc_condense(&flue.wet, T0_K + ROWS[i].t_c, P0_PA, &c, NULL), BC_OK);
        assert_true(c.condenses);
        assert_within(c.condensate_kg * flue.wet_mol / flue.fuel_kg_per_mol, ROWS[i].kg_per_kg, 1e-4, "condensate");
    }
}

static void the_exit_gas_is_saturated_and_nothing_is_lost(void **state)
{
    uint32_t seed = 99;

    (void)state;
    for (int i = 0; i < 500; i++) {
        const bc_gas air = bc_oxidant_air();
        const double t_k = 274.0 + 80.0 * next_number(&seed);
        const double p_pa = 90e3 + 4e5 * next_number(&seed);
        double p_sat_pa = 0.0;
        bc_gas wet;
        bc_condensation c;

        assert_int_equal(bc_humidity_apply(&air, 0.9 * next_number(&seed), &wet, NULL), BC_OK);
        assert_int_equal(bc_condense(&wet, t_k, p_pa, &c, NULL), BC_OK);
        assert_int_equal(bc_steam_pressure(t_k, &p_sat_pa, NULL), BC_OK);
        assert_int_equal(c.condenses, wet.x[SPECIES_water] > p_sat_pa / p_pa);
        assert_within(c.condensate_mol + c.exit_mol, 1.0, 1e-14, "moles");
        assert_within(c.exit_mol * c.exit.x[SPECIES_oxygen], wet.x[SPECIES_oxygen], 1e-14, "oxygen");
        if (c.condenses)
            assert_within(c.exit.x[SPECIES_water], p_sat_pa / p_pa, 1e-14, "saturation");
        else
            assert_within(c.exit.x[SPECIES_water], wet.x[SPECIES_water], 0.0, "unchanged");
    }
}

static void at_its_dew_point_a_gas_begins_to_condense(void **state)
{
    const bc_flue flue = burn("methane=91,ethane=9", 1.15);
    bc_dew dew;
    bc_condensation c;

    (void)state;
    assert_int_equal(bc_dew_point(flue.wet.x[SPECIES_water], 97e3, &dew, NULL), BC_OK);
    assert_int_equal(bc_condense(&flue.wet, dew.t_k + 1e-6, 97e3, &c, NULL), BC_OK);
    assert_false(c.condenses);
    assert_int_equal(bc_condense(&flue.wet, dew.t_k - 1e-6, 97e3, &c, NULL), BC_OK);
    assert_true(c.condenses && c.condensate_mol < 1e-7);
}

/* Saturated is not yet wet: exactly what the gas can hold stays in it. */
static void a_gas_that_is_just_saturated_keeps_its_water(void **state)
{
    double p_sat_pa = 0.0;
    bc_gas gas = {{0.0}};
    bc_condensation c;
    bc_error err = {.status = BC_OK};

    (void)state;
    assert_int_equal(bc_steam_pressure(333.0, &p_sat_pa, NULL), BC_OK);
    gas.x[SPECIES_water] = p_sat_pa / 131e3;
    gas.x[SPECIES_nitrogen] = 1.0 - gas.x[SPECIES_water];
    assert_int_equal(bc_condense(&gas, 333.0, 131e3, &c, NULL), BC_OK);
    assert_false(c.condenses);
    assert_within(c.exit_mol, 1.0, 0.0, "all of it");
    assert_within(c.condensate_mol + c.condensate_kg, 0.0, 0.0, "no condensate");
    assert_refused(bc_condense(&gas, (double)INFINITY, 131e3, &c, &err), BC_ERR_RANGE, &err);
    gas.x[SPECIES_water] *= 1.0 + 1e-9;
    assert_int_equal(bc_condense(&gas, 333.0, 131e3, &c, NULL), BC_OK);
    assert_true(c.condenses);
    assert_within(c.condensate_kg, c.condensate_mol * bc_species_molar_mass_kg_per_mol(SPECIES_water), 1e-15, "mass");
}

static void steam_alone_condenses_whole(void **state)
{
    const bc_gas steam = gas_of("water=100");
    bc_condensation c;

    (void)state;
    assert_int_equal(bc_condense(&steam, 350.0, P0_PA, &c, NULL), BC_OK);
    assert_within(c.condensate_mol, 1.0, 0.0, "condensate");
    assert_within(c.exit_mol, 0.0, 0.0, "gas left");
    assert_int_equal(bc_condense(&steam, 700.0, 30e6, &c, NULL), BC_OK);
    assert_false(c.condenses);
}

static void water_that_would_freeze_out_is_refused(void **state)
{
    const bc_flue flue = burn("methane=100", 1.2);
    const bc_gas dry = gas_of("nitrogen=100");
    bc_condensation c;
    bc_error err = {.status = BC_OK};

    (void)state;
    assert_refused(bc_condense(&flue.wet, 263.0, P0_PA, &c, &err), BC_ERR_RANGE, &err);
    assert_refused(bc_condense(&flue.wet, 40.0, P0_PA, &c, &err), BC_ERR_RANGE, &err);
    assert_refused(bc_condense(&flue.wet, 300.0, 0.0, &c, &err), BC_ERR_RANGE, &err);
    assert_int_equal(bc_condense(&dry, 263.0, P0_PA, &c, NULL), BC_OK);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(flue_gases_have_their_water_dew_points),
        cmocka_unit_test(the_dew_point_inverts_the_saturation_pressure),
        cmocka_unit_test(the_dew_point_passes_the_triple_point_without_a_step),
        cmocka_unit_test(the_dew_point_rises_with_water_and_pressure),
        cmocka_unit_test(a_dry_gas_has_no_dew_point),
        cmocka_unit_test(the_latent_heat_is_that_of_the_steam_table),
        cmocka_unit_test(saturated_water_has_the_density_of_its_release),
        cmocka_unit_test(the_latent_heat_ends_at_the_critical_point),
        cmocka_unit_test(methane_flue_gas_gives_its_condensate),
        cmocka_unit_test(the_exit_gas_is_saturated_and_nothing_is_lost),
        cmocka_unit_test(at_its_dew_point_a_gas_begins_to_condense),
        cmocka_unit_test(a_gas_that_is_just_saturated_keeps_its_water),
        cmocka_unit_test(steam_alone_condenses_whole),
        cmocka_unit_test(water_that_would_freeze_out_is_refused),
    };

    return cmocka_run_group_tests_name("dewpoint", tests, NULL, NULL);
}
