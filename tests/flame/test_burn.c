/* SPDX-License-Identifier: MIT */
/* test_burn.c - a burner case against the pieces it is made of, and against the balances of atoms and energy. */
#include "equilibrium_support.h"

#include "bluecone/burn.h"
#include "gas/species_index.h"

static bc_burn_case case_of(const char *fuel)
{
    const bc_gas gas = equilibrium_gas(fuel);

    return bc_burn_case_default(&gas);
}

static bc_burn burn(const bc_burn_case *c)
{
    bc_burn b;
    bc_error err;

    assert_ok(bc_burn_of(c, &b, &err), &err);
    return b;
}

/* bluecone/burn.h. */
static void the_usual_case_is_that_of_the_header(void **state)
{
    const bc_burn_case c = case_of("methane=83,nitrogen=17");
    const bc_gas air = bc_oxidant_air();

    (void)state;
    assert_within(c.lambda, 1.0, 0.0);
    assert_within(c.fuel_k, 298.15, 0.0);
    assert_within(c.oxidant_k, 298.15, 0.0);
    assert_within(c.exit_k, 423.15, 0.0);
    assert_within(c.p_pa, 101325.0, 0.0);
    assert_within(c.so3_conversion, BC_SO3_CONVERSION, 0.0);
    assert_within(c.casing_loss, 0.0, 0.0);
    assert_within(c.fuel.x[SPECIES_nitrogen], 0.17, 1e-15);
    assert_memory_equal(&c.oxidant, &air, sizeof air);
}

/* The same figures by the functions of the pieces. */
static void a_lean_case_is_made_of_its_pieces(void **state)
{
    bc_burn_case c = case_of("methane=71,hydrogen=19,hydrogen-sulfide=3,carbon-dioxide=7");
    bc_flue flue;
    bc_dew dew;
    bc_acid_dew acid;
    bc_heat_path path;
    bc_heat_yield yield;
    bc_mixture complete, flame;
    bc_error err;

    (void)state;
    c.lambda = 1.27;
    c.fuel_k = 311.0;
    c.oxidant_k = 431.0;
    c.exit_k = 467.0;
    c.p_pa = 143e3;
    c.so3_conversion = 0.037;
    c.casing_loss = 0.013;
    const bc_burn b = burn(&c);
    const bc_heat_case heat = {&c.fuel, &c.oxidant, c.lambda, c.fuel_k, c.oxidant_k, c.exit_k, c.p_pa, true};
    bc_reactants r = {.fuel = c.fuel, .oxidant = c.oxidant, .fuel_t_k = c.fuel_k, .oxidant_t_k = c.oxidant_k, .p_pa = c.p_pa};

    assert_ok(bc_oxidant_for_lambda(&c.fuel, &c.oxidant, c.lambda, &r.oxidant_per_fuel, &err), &err);
    assert_ok(bc_flue_at(&c.fuel, &c.oxidant, c.lambda, &flue, &err), &err);
    assert_ok(bc_dew_point(flue.wet.x[SPECIES_water], c.p_pa, &dew, &err), &err);
    assert_ok(bc_acid_dew_point_of(&flue.wet, c.so3_conversion, c.p_pa, &acid, &err), &err);
    assert_ok(bc_heat_path_of(&heat, &path, &err), &err);
    assert_ok(bc_heat_yield_of(&path, c.casing_loss, &yield, &err), &err);
    assert_ok(bc_flame_complete(&r, &complete, &err), &err);
    assert_ok(bc_flame_equilibrium(&r, &flame, &err), &err);
    assert_true(!b.rich && b.has_acid && b.has_complete);
    assert_within(b.oxidant_mol, r.oxidant_per_fuel, 1e-13);
    assert_within(b.demand.oxidant_mol, r.oxidant_per_fuel / 1.27, 1e-13);
    assert_within(b.flue.wet_mol, flue.wet_mol, 0.0);
    assert_within(b.dew.t_k, dew.t_k, 0.0);
    assert_within(b.acid.max_k, acid.max_k, 0.0);
    assert_within(b.path.total_j, path.total_j, 0.0);
    assert_within(b.yield.useful_j, yield.useful_j, 0.0);
    assert_within(b.released_j, yield.released_j, 0.0);
    assert_within(b.flame_complete_k, complete.t_k, 1e-9);
    assert_within(b.flame.t_k, flame.t_k, 1e-9);
}

static void sulfur_alone_brings_an_acid_dew_point(void **state)
{
    bc_burn_case c = case_of("methane=100");

    (void)state;
    assert_false(burn(&c).has_acid);
    c = case_of("methane=99,hydrogen-sulfide=1");
    assert_true(burn(&c).has_acid);
    c.so3_conversion = 1e-6; /* too little for the correlations */
    assert_false(burn(&c).has_acid);
}

/* Above the triple point of water, 273.16 K, what cannot stay vapour condenses; below it would freeze. */
static void water_condenses_down_to_its_triple_point(void **state)
{
    bc_burn_case c = case_of("methane=100");

    (void)state;
    c.exit_k = 273.16;
    assert_true(burn(&c).path.condensation.condenses);
    c.exit_k = nextafter(273.16, 0.0);
    assert_false(burn(&c).path.condensation.condenses);
}

static double enthalpy_j(const bc_mixture *m, double t_k)
{
    double sum = 0.0, h = 0.0;

    for (size_t i = 0; i < bc_product_count(); i++) {
        assert_int_equal(bc_thermo_enthalpy(bc_product_thermo(i), t_k, &h, NULL), BC_OK);
        sum += m->moles[i] * h;
    }
    return sum;
}

/* At its own adiabatic temperature a flame gives nothing off; the heat given off further down is what the exit lacks. */
static void a_rich_flame_gives_off_what_its_flue_gas_lacks(void **state)
{
    bc_burn_case c = case_of("methane=62,hydrogen=27,carbon-monoxide=11");
    double elements[BC_ELEMENTS], h_j;
    bc_error err;

    (void)state;
    c.lambda = 0.81;
    c.fuel_k = 304.0;
    c.oxidant_k = 377.0;
    const bc_burn warm = burn(&c);
    const bc_reactants r = {.fuel = c.fuel, .oxidant = c.oxidant, .fuel_t_k = c.fuel_k, .oxidant_t_k = c.oxidant_k,
                            .oxidant_per_fuel = warm.oxidant_mol, .p_pa = c.p_pa};

    assert_true(warm.rich && !warm.has_complete);
    assert_within(warm.flame_complete_k, 0.0, 0.0);
    assert_ok(bc_reactants_sum(&r, elements, &h_j, &err), &err);
    assert_within(warm.released_j, h_j - enthalpy_j(&warm.exit, c.exit_k), 1e-6 * fabs(h_j));
    assert_within(warm.exit.enthalpy_j, enthalpy_j(&warm.exit, c.exit_k), 1e-9 * fabs(warm.exit.enthalpy_j));
    assert_within(warm.exit.t_k, c.exit_k, 0.0);
    for (int k = 0; k < BC_ELEMENTS; k++) {
        double found = 0.0;

        for (size_t i = 0; i < bc_product_count(); i++)
            found += warm.exit.moles[i] * bc_thermo_atoms(bc_product_thermo(i), (bc_element)k);
        assert_within(found, elements[k], 1e-9 * (1.0 + elements[k]));
    }
    c.exit_k = warm.flame.t_k;
    const bc_burn hot = burn(&c);

    assert_within(hot.released_j, 0.0, 1e-6 * fabs(h_j));
    assert_within(equilibrium_x(&hot.exit, "CO"), equilibrium_x(&hot.flame, "CO"), 1e-9);
}

/* Where reactions stop the composition stays: that of 1500 K at any exit below it, another one above. */
static void a_rich_flue_gas_freezes_where_reactions_stop(void **state)
{
    bc_burn_case c = case_of("methane=100");

    (void)state;
    c.lambda = 0.7;
    c.exit_k = BC_BURN_FREEZE_K;
    const bc_burn at = burn(&c);

    c.exit_k = 600.0;
    const bc_burn below = burn(&c);

    c.exit_k = BC_BURN_FREEZE_K + 200.0;
    const bc_burn above = burn(&c);

    assert_within(equilibrium_x(&below.exit, "CO"), equilibrium_x(&at.exit, "CO"), 1e-12);
    assert_within(at.exit.enthalpy_j - below.exit.enthalpy_j, enthalpy_j(&at.exit, BC_BURN_FREEZE_K) - enthalpy_j(&at.exit, 600.0), 1e-3);
    /* the water-gas reaction takes CO2 to CO as it gets hotter */
    assert_true(equilibrium_x(&above.exit, "CO") > equilibrium_x(&at.exit, "CO") + 1e-3);
}

static void just_enough_air_is_no_lack_of_it(void **state)
{
    bc_burn_case c = case_of("propane=100");

    (void)state;
    assert_false(burn(&c).rich);
    c.lambda = nextafter(1.0, 0.0);
    assert_true(burn(&c).rich);
}

static void what_does_not_burn_is_no_case_and_nothing_is_written(void **state)
{
    bc_burn_case c = case_of("nitrogen=60,carbon-dioxide=40");
    bc_burn b = {.released_j = -7.0};
    bc_error err = {.status = BC_OK};

    (void)state;
    assert_refused(bc_burn_of(&c, &b, &err), &err, BC_ERR_RANGE, "does not burn");
    c = case_of("hydrogen=4,oxygen=21,nitrogen=75");
    assert_refused(bc_burn_of(&c, &b, &err), &err, BC_ERR_RANGE, "may explode");
    c = case_of("methane=100");
    c.oxidant = equilibrium_gas("nitrogen=100");
    assert_refused(bc_burn_of(&c, &b, &err), &err, BC_ERR_INPUT, "oxygen to give");
    assert_within(b.released_j, -7.0, 0.0);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(the_usual_case_is_that_of_the_header),
        cmocka_unit_test(a_lean_case_is_made_of_its_pieces),
        cmocka_unit_test(sulfur_alone_brings_an_acid_dew_point),
        cmocka_unit_test(water_condenses_down_to_its_triple_point),
        cmocka_unit_test(a_rich_flame_gives_off_what_its_flue_gas_lacks),
        cmocka_unit_test(a_rich_flue_gas_freezes_where_reactions_stop),
        cmocka_unit_test(just_enough_air_is_no_lack_of_it),
        cmocka_unit_test(what_does_not_burn_is_no_case_and_nothing_is_written),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
