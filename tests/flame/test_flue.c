/* SPDX-License-Identifier: MIT */
/* test_flue.c - the flue gas of complete combustion, and its figures. */
#include "flame_support.h"

#include "bluecone/dewpoint.h"
#include "bluecone/flammability.h"
#include "bluecone/flue.h"
#include "bluecone/iso6976.h"
#include "bluecone/oxidant.h"
#include "bluecone/units.h"

#define T0_K 273.15
#define P0_PA 101325.0

/* Heats of ISO 6976:2016 at 25 C. */
static bc_value value_of(const bc_gas *gas)
{
    const bc_state state = {25.0, 15.0, P0_PA, false, 2016};
    bc_reference reference;

    assert_int_equal(bc_reference_at(&state, &reference, NULL), BC_OK);
    return bc_value_of(&reference, gas);
}

static bc_flue burn(const char *fuel_literal, double lambda)
{
    const bc_gas fuel = gas_of(fuel_literal);
    const bc_gas air = bc_oxidant_air();
    bc_flue flue = {.lambda = 0.0};

    assert_int_equal(bc_flue_at(&fuel, &air, lambda, &flue, NULL), BC_OK);
    return flue;
}

static double demand_of(const bc_gas *fuel, const char *quantity)
{
    const bc_gas air = bc_oxidant_air();
    bc_demand d;

    assert_int_equal(bc_oxidant_demand(fuel, &air, &d, NULL), BC_OK);
    if (strcmp(quantity, "oxygen-demand") == 0)
        return d.oxygen_mol;
    return strcmp(quantity, "air-demand") == 0 ? d.oxidant_mol : d.oxidant_kg;
}

static double limit_of(const bc_gas *fuel, const char *quantity)
{
    bc_flammability f;

    assert_int_equal(bc_flammability_of(fuel, &f, NULL), BC_OK);
    return strcmp(quantity, "lfl") == 0 ? f.lfl : f.ufl;
}

static double factor_of(const bc_gas *fuel, const char *quantity)
{
    const bc_value value = value_of(fuel);
    bc_flue_factor factor;

    assert_int_equal(bc_flue_factor_of(fuel, strcmp(quantity, "co2-factor-net") == 0 ? value.net_j_per_mol : value.gross_j_per_mol, &factor,
                                       NULL),
                     BC_OK);
    return factor.carbon_dioxide;
}

static double flue_figure_of(const bc_gas *fuel, const char *quantity)
{
    const bc_gas air = bc_oxidant_air();
    bc_flue flue;
    bc_dew dew;

    assert_int_equal(bc_flue_at(fuel, &air, 1.0, &flue, NULL), BC_OK);
    if (strcmp(quantity, "flue-wet") == 0)
        return flue.wet_mol;
    if (strcmp(quantity, "flue-dry") == 0)
        return flue.dry_mol;
    if (strcmp(quantity, "co2-max") == 0)
        return flue.dry.x[SPECIES_carbon_dioxide];
    assert_string_equal(quantity, "flue-dew-point");
    assert_int_equal(bc_dew_point(flue.wet.x[SPECIES_water], P0_PA, &dew, NULL), BC_OK);
    assert_true(dew.exists);
    return dew.t_k;
}

/* The figure in SI units. */
static double figure_of(const bc_gas *fuel, const char *quantity)
{
    if (strstr(quantity, "-demand"))
        return demand_of(fuel, quantity);
    if (strstr(quantity, "co2-factor"))
        return factor_of(fuel, quantity);
    if (strcmp(quantity, "lfl") == 0 || strcmp(quantity, "ufl") == 0)
        return limit_of(fuel, quantity);
    return flue_figure_of(fuel, quantity);
}

static const struct {
    const char *area, *id, *gas, *quantity;
    double expected;
    const char *unit;
    double tolerance;
    const char *why, *source;
} CHECKS[] = {
#define CHECK_FLUE(area, id, gas, quantity, expected, unit, tolerance, why, source) \
    {area, id, gas, quantity, expected, unit, tolerance, why, source},
#include "data/checks_flue.def"
};

static void every_check_row_is_met(void **state)
{
    (void)state;
    for (size_t i = 0; i < BC_COUNT(CHECKS); i++) {
        const bc_gas fuel = gas_of(CHECKS[i].gas);
        bc_unit unit;

        assert_int_equal(bc_unit_parse(CHECKS[i].unit, &unit, NULL), BC_OK);
        assert_within(bc_unit_from_si(&unit, figure_of(&fuel, CHECKS[i].quantity)), CHECKS[i].expected, CHECKS[i].tolerance, CHECKS[i].id);
        assert_true(strlen(CHECKS[i].why) > 8 && strlen(CHECKS[i].source) > 8 && strlen(CHECKS[i].area) > 3);
    }
}

static void elements_and_mass_go_through_the_flame_unchanged(void **state)
{
    const bc_gas oxidant = gas_of("oxygen=13.7,carbon-dioxide=3.2,water=7.4,nitrogen=74.7,argon=0.9,helium=0.1");
    uint32_t seed = 20260;

    (void)state;
    for (int i = 0; i < 2000; i++) {
        const bc_gas fuel = next_gas(&seed);
        const double lambda = 1.0 + 9.0 * next_number(&seed);
        bc_flue flue;

        if (bc_flue_at(&fuel, &oxidant, lambda, &flue, NULL) != BC_OK)
            continue;
        for (int k = 0; k < BC_ELEMENTS; k++) {
            const double in = bc_gas_atoms(&fuel, (bc_element)k) + flue.oxidant_mol * bc_gas_atoms(&oxidant, (bc_element)k);

            assert_within(flue.wet_mol * bc_gas_atoms(&flue.wet, (bc_element)k), in, 1e-12 * (in + 1.0), "atoms");
        }
        const double mass = flue.fuel_kg_per_mol + flue.oxidant_mol * flue.oxidant_kg_per_mol;

        assert_within(flue.wet_mol * flue.wet_kg_per_mol, mass, 1e-12 * mass, "mass");
        assert_within(flue.dry_mol * flue.dry_kg_per_mol + (flue.wet_mol - flue.dry_mol) * bc_species_molar_mass_kg_per_mol(SPECIES_water),
                      mass, 1e-12 * mass, "mass of dry flue gas and water");
    }
}

static void fractions_of_wet_and_dry_flue_gas_add_up_to_one(void **state)
{
    const bc_flue flue = burn("methane=81,ethane=3,nitrogen=14,carbon-dioxide=1,hydrogen-sulfide=1", 1.17);
    double wet = 0.0;
    double dry = 0.0;

    (void)state;
    for (size_t i = 0; i < BC_SPECIES_CAPACITY; i++) {
        wet += flue.wet.x[i];
        dry += flue.dry.x[i];
    }
    assert_within(wet, 1.0, 1e-14, "wet");
    assert_within(dry, 1.0, 1e-14, "dry");
    assert_within(flue.dry.x[SPECIES_water], 0.0, 0.0, "water of the dry flue gas");
}

static void the_moisture_of_fuel_and_air_reaches_the_flue_gas(void **state)
{
    const bc_gas fuel = gas_of("methane=95,water=5");
    const bc_gas oxidant = gas_of("oxygen=20.5,nitrogen=77.4,water=2.1");
    bc_flue flue;

    (void)state;
    assert_int_equal(bc_flue_at(&fuel, &oxidant, 1.3, &flue, NULL), BC_OK);
    assert_within(flue.oxidant_mol, 1.3 * 1.9 / 0.205, 1e-12, "oxidant");
    assert_within(flue.wet_mol - flue.dry_mol, 1.9 + 0.05 + 0.021 * flue.oxidant_mol, 1e-12, "water");
}

static void no_oxygen_is_left_at_lambda_one(void **state)
{
    (void)state;
    assert_within(burn("methane=87,ethane=9,propane=4", 1.0).wet.x[SPECIES_oxygen], 0.0, 0.0, "oxygen");
}

static void hydrogen_in_oxygen_leaves_no_dry_flue_gas(void **state)
{
    const bc_gas hydrogen = gas_of("hydrogen=100");
    bc_gas oxygen;
    bc_flue flue;

    (void)state;
    assert_int_equal(bc_oxidant_oxygen(1.0, 0.0, &oxygen, NULL), BC_OK);
    assert_int_equal(bc_flue_at(&hydrogen, &oxygen, 1.0, &flue, NULL), BC_OK);
    assert_within(flue.dry_mol, 0.0, 0.0, "dry flue gas");
    assert_within(flue.dry.x[SPECIES_oxygen], 0.0, 0.0, "its oxygen");
    assert_within(flue.wet.x[SPECIES_water], 1.0, 0.0, "steam");
}

static void co2_max_of_a_fuel_without_carbon_is_zero(void **state)
{
    const bc_gas hydrogen = gas_of("hydrogen=97,nitrogen=3");
    double x = 1.0;

    (void)state;
    assert_int_equal(bc_flue_co2_max(&hydrogen, &x, NULL), BC_OK);
    assert_within(x, 0.0, 0.0, "CO2max");
}

static void flames_that_cannot_be_are_refused(void **state)
{
    const bc_gas fuel = gas_of("methane=100");
    const bc_gas inert = gas_of("nitrogen=60,carbon-dioxide=40");
    const bc_gas lean = gas_of("methane=3,oxygen=20,nitrogen=77");
    const bc_gas air = bc_oxidant_air();
    bc_flue flue = {.lambda = 7.0};
    bc_error err = {.status = BC_OK};

    (void)state;
    assert_refused(bc_flue_at(&fuel, &air, 0.98, &flue, &err), BC_ERR_RANGE, &err);
    assert_refused(bc_flue_at(&fuel, &air, (double)INFINITY, &flue, &err), BC_ERR_RANGE, &err);
    assert_refused(bc_flue_at(&inert, &air, 1.2, &flue, &err), BC_ERR_RANGE, &err);
    assert_refused(bc_flue_at(&lean, &air, 1.2, &flue, &err), BC_ERR_RANGE, &err);
    assert_refused(bc_flue_at(&fuel, &inert, 1.2, &flue, &err), BC_ERR_INPUT, &err);
    assert_within(flue.lambda, 7.0, 0.0, "output after refusals");
}

static void flue_volumes_follow_the_ideal_gas(void **state)
{
    const bc_flue flue = burn("propane=100", 1.25);
    const bc_gas propane = gas_of("propane=100");
    const bc_value value = value_of(&propane);
    bc_flue_volume cold;
    bc_flue_volume hot;
    bc_error err = {.status = BC_OK};

    (void)state;
    assert_int_equal(bc_flue_volume_at(&flue, T0_K + 15.0, P0_PA, value.molar_volume_m3_per_mol, &cold, NULL), BC_OK);
    assert_int_equal(bc_flue_volume_at(&flue, 2.0 * (T0_K + 15.0), P0_PA, value.molar_volume_m3_per_mol, &hot, NULL), BC_OK);
    /* the fuel is a real gas: Z of propane, 0.98 at 15 C, makes a cubic metre of it more moles; 1e-6: R of ISO 6976:2016 */
    assert_within(cold.wet_m3, flue.wet_mol / value.z, 1e-5, "wet");
    assert_within(cold.oxidant_m3, flue.oxidant_mol / value.z, 1e-5, "air");
    assert_within(hot.dry_m3, 2.0 * cold.dry_m3, 1e-12 * hot.dry_m3, "doubled temperature");
    assert_within(cold.wet_kg_per_m3 * cold.wet_m3, value.density_kg_per_m3 * (1.0 + flue.oxidant_mol * flue.oxidant_kg_per_mol / flue.fuel_kg_per_mol),
                  1e-5, "mass of flue gas a cubic metre of fuel");
    assert_refused(bc_flue_volume_at(&flue, 0.0, P0_PA, 0.024, &cold, &err), BC_ERR_RANGE, &err);
    assert_refused(bc_flue_volume_at(&flue, 300.0, P0_PA, 0.0, &cold, &err), BC_ERR_RANGE, &err);
}

/* 1.293 kg/m3 at 0 C: the flue gas of nothing but air is air (lambda without end), to 0.1 %. */
static void thin_flue_gas_has_the_density_of_air(void **state)
{
    const bc_flue flue = burn("methane=100", 1e5);
    bc_flue_volume volume;

    (void)state;
    assert_int_equal(bc_flue_volume_at(&flue, T0_K, P0_PA, 0.0224, &volume, NULL), BC_OK);
    assert_within(volume.wet_kg_per_m3, 1.2929, 1.3e-3, "density");
}

static void flows_balance_for_a_fuel_rate(void **state)
{
    const bc_flue flue = burn("methane=90,ethane=6,nitrogen=3,hydrogen-sulfide=1", 1.12);
    const bc_flue_flow flow = bc_flue_flow_at(&flue, 3.7);

    (void)state;
    assert_within(flow.fuel_kg + flow.oxidant_kg, flow.wet_kg, 1e-12 * flow.wet_kg, "mass");
    assert_within(flow.dry_kg + flow.water_kg, flow.wet_kg, 1e-12 * flow.wet_kg, "water");
    assert_within(flow.sulfur_dioxide_kg, 3.7 * 0.01 * bc_species_molar_mass_kg_per_mol(SPECIES_sulfur_dioxide), 1e-14, "SO2");
    assert_within(flow.carbon_dioxide_kg, 3.7 * 1.02 * bc_species_molar_mass_kg_per_mol(SPECIES_carbon_dioxide), 1e-13, "CO2");
    assert_within(flow.dry_mol + flow.water_kg / bc_species_molar_mass_kg_per_mol(SPECIES_water), flow.wet_mol, 1e-12 * flow.wet_mol, "moles");
}

static void emission_factors_count_the_fuel_and_nothing_else(void **state)
{
    const bc_gas fuel = gas_of("methane=50,carbon-dioxide=30,carbon-monoxide=10,hydrogen-sulfide=2,water=8");
    const bc_gas none = gas_of("nitrogen=100");
    bc_flue_factor factor;
    bc_error err = {.status = BC_OK};

    (void)state;
    assert_int_equal(bc_flue_factor_of(&fuel, 4.5e5, &factor, NULL), BC_OK);
    assert_within(factor.carbon_dioxide, 0.9 * 44.0095e-3 / 4.5e5, 1e-15, "CO2");
    assert_within(factor.water, (1.0 + 0.02 + 0.08) * 18.01528e-3 / 4.5e5, 1e-15, "H2O");
    assert_within(factor.sulfur_dioxide, 0.02 * bc_species_molar_mass_kg_per_mol(SPECIES_sulfur_dioxide) / 4.5e5, 1e-18, "SO2");
    assert_refused(bc_flue_factor_of(&none, 0.0, &factor, &err), BC_ERR_RANGE, &err);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(every_check_row_is_met),
        cmocka_unit_test(elements_and_mass_go_through_the_flame_unchanged),
        cmocka_unit_test(fractions_of_wet_and_dry_flue_gas_add_up_to_one),
        cmocka_unit_test(the_moisture_of_fuel_and_air_reaches_the_flue_gas),
        cmocka_unit_test(no_oxygen_is_left_at_lambda_one),
        cmocka_unit_test(hydrogen_in_oxygen_leaves_no_dry_flue_gas),
        cmocka_unit_test(co2_max_of_a_fuel_without_carbon_is_zero),
        cmocka_unit_test(flames_that_cannot_be_are_refused),
        cmocka_unit_test(flue_volumes_follow_the_ideal_gas),
        cmocka_unit_test(thin_flue_gas_has_the_density_of_air),
        cmocka_unit_test(flows_balance_for_a_fuel_rate),
        cmocka_unit_test(emission_factors_count_the_fuel_and_nothing_else),
    };

    return cmocka_run_group_tests_name("flue", tests, NULL, NULL);
}
