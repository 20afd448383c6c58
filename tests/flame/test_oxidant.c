/* SPDX-License-Identifier: MIT */
/* test_oxidant.c - oxygen needs, oxidants and the air factor. */
#include "flame_support.h"

#include "bluecone/flue.h"
#include "bluecone/humidity.h"
#include "bluecone/oxidant.h"


static void the_oxygen_need_of_a_molecule_is_its_balance(void **state)
{
    static const struct {
        const char *gas;
        double need;
    } CASES[] = {{"methane=100", 2.0},   {"propane=100", 5.0},        {"hydrogen=100", 0.5},          {"carbon-monoxide=100", 0.5},
                 {"nitrogen=100", 0.0},  {"carbon-dioxide=100", 0.0}, {"water=100", 0.0},             {"oxygen=100", -1.0},
                 {"methanol=100", 1.5},  {"ammonia=100", 0.75},       {"hydrogen-sulfide=100", 1.5},  {"sulfur-dioxide=100", 0.0},
                 {"nitrous-oxide=100", -0.5}, {"helium=100", 0.0},    {"carbon-disulfide=100", 3.0}};

    (void)state;
    for (size_t i = 0; i < BC_COUNT(CASES); i++) {
        const bc_gas gas = gas_of(CASES[i].gas);

        assert_within(bc_oxygen_demand(&gas), CASES[i].need, 1e-15, CASES[i].gas);
    }
}

static void the_oxygen_of_the_fuel_lowers_its_need(void **state)
{
    const bc_gas gas = gas_of("propane=27,oxygen=15,nitrogen=58");
    const bc_gas air = bc_oxidant_air();
    bc_demand demand;

    (void)state;
    assert_int_equal(bc_oxidant_demand(&gas, &air, &demand, NULL), BC_OK);
    assert_within(demand.oxygen_mol, 0.27 * 5.0 - 0.15, 1e-14, "LPG-air");
    assert_within(demand.oxidant_mol, demand.oxygen_mol / 0.20946, 1e-14, "LPG-air");
}

static void a_gas_with_oxygen_to_spare_has_a_negative_need(void **state)
{
    const bc_gas gas = gas_of("methane=3,oxygen=20,nitrogen=77");
    const bc_gas air = bc_oxidant_air();
    bc_demand demand;

    (void)state;
    assert_int_equal(bc_oxidant_demand(&gas, &air, &demand, NULL), BC_OK);
    assert_within(demand.oxygen_mol, -0.14, 1e-14, "lean gas");
    assert_true(demand.oxidant_mol < 0.0 && demand.oxidant_kg < 0.0);
}

/* 17.2 kg air per kg methane and 34.3 for hydrogen, combustion textbooks (Turns, Heywood), value from memory. */
static void the_air_need_by_mass_is_that_of_the_textbooks(void **state)
{
    const bc_gas air = bc_oxidant_air();
    const bc_gas methane = gas_of("methane=100");
    const bc_gas hydrogen = gas_of("hydrogen=100");
    bc_demand demand;

    (void)state;
    assert_int_equal(bc_oxidant_demand(&methane, &air, &demand, NULL), BC_OK);
    assert_within(demand.oxidant_kg, 17.2, 0.05, "methane");
    assert_int_equal(bc_oxidant_demand(&hydrogen, &air, &demand, NULL), BC_OK);
    assert_within(demand.oxidant_kg, 34.3, 0.05, "hydrogen");
    assert_within(demand.oxygen_kg, 15.9994 / (2.0 * 1.00794), 1e-4, "hydrogen with oxygen: the masses of ISO 6976:2016");
}

static void fractions_of_every_oxidant_add_up_to_one(void **state)
{
    bc_gas oxidant[4] = {bc_oxidant_air()};

    (void)state;
    assert_int_equal(bc_oxidant_enriched(0.283, &oxidant[1], NULL), BC_OK);
    assert_int_equal(bc_oxidant_oxygen(0.9537, 0.83, &oxidant[2], NULL), BC_OK);
    assert_int_equal(bc_humidity_apply(&oxidant[0], 0.0187, &oxidant[3], NULL), BC_OK);
    for (size_t k = 0; k < BC_COUNT(oxidant); k++) {
        double sum = 0.0;

        for (size_t i = 0; i < BC_SPECIES_CAPACITY; i++)
            sum += oxidant[k].x[i];
        assert_within(sum, 1.0, 1e-15, "sum of fractions");
    }
    assert_within(oxidant[1].x[SPECIES_oxygen], 0.283, 0.0, "enriched air");
    assert_within(oxidant[1].x[SPECIES_nitrogen] / oxidant[1].x[SPECIES_argon], 0.78084 / 0.0097, 1e-10, "its nitrogen and argon");
    assert_within(oxidant[2].x[SPECIES_argon], 0.0463 * 0.83, 1e-15, "argon of cryogenic oxygen");
    assert_within(oxidant[3].x[SPECIES_water], 0.0187, 0.0, "humid air");
}

static void enriching_to_the_oxygen_of_air_changes_nothing(void **state)
{
    const bc_gas air = bc_oxidant_air();
    bc_gas same;

    (void)state;
    assert_int_equal(bc_oxidant_enriched(air.x[SPECIES_oxygen], &same, NULL), BC_OK);
    for (size_t i = 0; i < BC_SPECIES_CAPACITY; i++)
        assert_within(same.x[i], air.x[i], 1e-16, bc_species_id(i));
}

static void oxidants_that_cannot_be_are_refused(void **state)
{
    const bc_gas fuel = gas_of("methane=93,ethane=7");
    const bc_gas inert = gas_of("nitrogen=90,carbon-dioxide=10");
    bc_gas oxidant;
    bc_demand demand;
    bc_error err = {.status = BC_OK};

    (void)state;
    assert_refused(bc_oxidant_enriched(0.2, &oxidant, &err), BC_ERR_RANGE, &err);
    assert_refused(bc_oxidant_enriched(1.01, &oxidant, &err), BC_ERR_RANGE, &err);
    assert_refused(bc_oxidant_oxygen(0.3, 0.5, &oxidant, &err), BC_ERR_RANGE, &err);
    assert_refused(bc_oxidant_oxygen(1.01, 0.1, &oxidant, &err), BC_ERR_RANGE, &err);
    assert_refused(bc_oxidant_oxygen(0.9, -0.1, &oxidant, &err), BC_ERR_RANGE, &err);
    assert_refused(bc_oxidant_oxygen((double)NAN, 0.1, &oxidant, &err), BC_ERR_RANGE, &err);
    assert_refused(bc_oxidant_demand(&fuel, &inert, &demand, &err), BC_ERR_INPUT, &err);
    assert_refused(bc_oxidant_demand(&fuel, &fuel, &demand, &err), BC_ERR_INPUT, &err);
}

/* Balance with 20.946 % oxygen; five printed decimals. */
static void lambda_from_dry_oxygen_is_the_exact_balance(void **state)
{
    static const struct {
        const char *fuel;
        double x, lambda;
    } CASES[] = {
        {"methane=100", 0.03, 1.14966},  {"methane=100", 0.06, 1.3594},   {"propane=100", 0.03, 1.15316}, {"propane=100", 0.06, 1.36781},
        {"hydrogen=100", 0.03, 1.13215}, {"hydrogen=100", 0.06, 1.31736},
        {"carbon-monoxide=22,carbon-dioxide=22,hydrogen=3,nitrogen=53", 0.03, 1.40387},
        {"carbon-monoxide=22,carbon-dioxide=22,hydrogen=3,nitrogen=53", 0.06, 1.96987}};
    const bc_gas air = bc_oxidant_air();
    double lambda = 0.0;

    (void)state;
    for (size_t i = 0; i < BC_COUNT(CASES); i++) {
        const bc_gas fuel = gas_of(CASES[i].fuel);

        assert_int_equal(bc_lambda_from_flue_oxygen(&fuel, &air, CASES[i].x, BC_FLUE_DRY, &lambda, NULL), BC_OK);
        assert_within(lambda, CASES[i].lambda, 1e-5, CASES[i].fuel);
    }
}

/* A random oxidant: humid air, enriched air, or the exhaust of a turbine. */
static bc_gas next_oxidant(uint32_t *seed)
{
    const bc_gas air = bc_gas_air();
    bc_gas oxidant = gas_of("oxygen=13.7,carbon-dioxide=3.2,water=7.4,nitrogen=74.8,argon=0.9");
    const double kind = next_number(seed);

    if (kind < 0.4)
        assert_int_equal(bc_humidity_apply(&air, 0.1 * next_number(seed), &oxidant, NULL), BC_OK);
    else if (kind < 0.7)
        assert_int_equal(bc_oxidant_enriched(0.21 + 0.5 * next_number(seed), &oxidant, NULL), BC_OK);
    return oxidant;
}

static void lambda_comes_back_from_the_oxygen_of_its_flue_gas(void **state)
{
    uint32_t seed = 4711;
    int burnt = 0;

    (void)state;
    for (int i = 0; i < 3000; i++) {
        const bc_gas fuel = next_gas(&seed);
        const bc_gas oxidant = next_oxidant(&seed);
        const double lambda = 1.0 + 3.0 * next_number(&seed) * next_number(&seed);
        double back = 0.0;
        bc_flue flue;

        if (bc_oxygen_demand(&fuel) < 0.01)
            continue;
        burnt++;
        assert_int_equal(bc_flue_at(&fuel, &oxidant, lambda, &flue, NULL), BC_OK);
        assert_int_equal(bc_lambda_from_flue_oxygen(&fuel, &oxidant, flue.wet.x[SPECIES_oxygen], BC_FLUE_WET, &back, NULL), BC_OK);
        assert_within(back, lambda, 1e-11 * lambda, "lambda from wet oxygen");
        assert_int_equal(bc_lambda_from_flue_oxygen(&fuel, &oxidant, flue.dry.x[SPECIES_oxygen], BC_FLUE_DRY, &back, NULL), BC_OK);
        assert_within(back, lambda, 1e-11 * lambda, "lambda from dry oxygen");
    }
    assert_true(burnt > 2000);
}

static void the_water_of_the_air_leaves_its_dry_oxygen_readable(void **state)
{
    const bc_gas fuel = gas_of("methane=100");
    const bc_gas air = bc_oxidant_air();
    double lambda = 0.0;
    bc_gas wet;

    (void)state;
    assert_int_equal(bc_humidity_apply(&air, 0.1, &wet, NULL), BC_OK);
    /* humid air holds 18.85 % oxygen, dried 20.946 % */
    assert_int_equal(bc_lambda_from_flue_oxygen(&fuel, &wet, 0.209, BC_FLUE_DRY, &lambda, NULL), BC_OK);
    assert_true(lambda > 300.0);
}

static void no_oxygen_in_the_flue_gas_means_lambda_one(void **state)
{
    const bc_gas fuel = gas_of("methane=62,carbon-dioxide=38");
    const bc_gas air = bc_oxidant_air();
    double lambda = 0.0;

    (void)state;
    assert_int_equal(bc_lambda_from_flue_oxygen(&fuel, &air, 0.0, BC_FLUE_DRY, &lambda, NULL), BC_OK);
    assert_within(lambda, 1.0, 0.0, "lambda");
    assert_int_equal(bc_lambda_from_excess(0.175, &lambda, NULL), BC_OK);
    assert_within(lambda, 1.175, 1e-15, "lambda of 17.5 % excess");
}

static void impossible_readings_are_refused(void **state)
{
    const bc_gas fuel = gas_of("methane=100");
    const bc_gas hydrogen = gas_of("hydrogen=100");
    const bc_gas inert = gas_of("nitrogen=60,argon=40");
    const bc_gas air = bc_oxidant_air();
    bc_gas oxygen;
    double lambda = 5.0;
    bc_error err = {.status = BC_OK};

    (void)state;
    assert_int_equal(bc_oxidant_oxygen(1.0, 0.0, &oxygen, NULL), BC_OK);
    assert_refused(bc_lambda_from_flue_oxygen(&fuel, &air, -0.001, BC_FLUE_DRY, &lambda, &err), BC_ERR_RANGE, &err);
    assert_refused(bc_lambda_from_flue_oxygen(&fuel, &air, 0.20946, BC_FLUE_DRY, &lambda, &err), BC_ERR_RANGE, &err);
    assert_refused(bc_lambda_from_flue_oxygen(&fuel, &air, 0.9, BC_FLUE_WET, &lambda, &err), BC_ERR_RANGE, &err);
    assert_refused(bc_lambda_from_flue_oxygen(&fuel, &air, (double)NAN, BC_FLUE_WET, &lambda, &err), BC_ERR_RANGE, &err);
    assert_refused(bc_lambda_from_flue_oxygen(&inert, &air, 0.03, BC_FLUE_DRY, &lambda, &err), BC_ERR_RANGE, &err);
    assert_refused(bc_lambda_from_flue_oxygen(&fuel, &inert, 0.03, BC_FLUE_DRY, &lambda, &err), BC_ERR_INPUT, &err);
    assert_refused(bc_lambda_from_flue_oxygen(&hydrogen, &oxygen, 0.03, BC_FLUE_DRY, &lambda, &err), BC_ERR_RANGE, &err);
    assert_int_equal(bc_lambda_from_excess(-1.25, &lambda, &err), BC_ERR_RANGE);
    assert_non_null(strstr(err.message, "-125 %"));
    assert_refused(bc_lambda_from_excess(-1.0, &lambda, &err), BC_ERR_RANGE, &err);
    assert_within(lambda, 5.0, 0.0, "output after refusals");
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(the_oxygen_need_of_a_molecule_is_its_balance),
        cmocka_unit_test(the_oxygen_of_the_fuel_lowers_its_need),
        cmocka_unit_test(a_gas_with_oxygen_to_spare_has_a_negative_need),
        cmocka_unit_test(the_air_need_by_mass_is_that_of_the_textbooks),
        cmocka_unit_test(fractions_of_every_oxidant_add_up_to_one),
        cmocka_unit_test(enriching_to_the_oxygen_of_air_changes_nothing),
        cmocka_unit_test(oxidants_that_cannot_be_are_refused),
        cmocka_unit_test(lambda_from_dry_oxygen_is_the_exact_balance),
        cmocka_unit_test(lambda_comes_back_from_the_oxygen_of_its_flue_gas),
        cmocka_unit_test(the_water_of_the_air_leaves_its_dry_oxygen_readable),
        cmocka_unit_test(no_oxygen_in_the_flue_gas_means_lambda_one),
        cmocka_unit_test(impossible_readings_are_refused),
    };

    return cmocka_run_group_tests_name("oxidant", tests, NULL, NULL);
}
