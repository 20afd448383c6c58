/* SPDX-License-Identifier: MIT */
/* test_flame.c - flame temperatures against published cases, by hand, in limits and in their tendencies. */
#include "equilibrium_support.h"

#include "bluecone/oxidant.h"

#define AIR    "oxygen=20.946,nitrogen=78.084,argon=0.97"
#define OXYGEN "oxygen=100"

static const struct {
    const char *id, *fuel, *oxidant;
    double lambda, fuel_t_k, oxidant_t_k, p_pa;
    const char *quantity;
    double expected, tolerance;
} CHECKS[] = {
#define CHECK_FLAME(area, id, fuel, oxidant, lambda, t_fuel_k, t_ox_k, p_kpa, quantity, expected_k,          \
                    tolerance, why, source)                                                                  \
    {id, fuel, oxidant, lambda, t_fuel_k, t_ox_k, (p_kpa)*1e3, quantity, expected_k, tolerance},
#include "data/checks_flame.def"
};

static bc_mixture complete(const bc_reactants *r)
{
    bc_mixture m = {.t_k = 0.0};
    bc_error err;

    assert_ok(bc_flame_complete(r, &m, &err), &err);
    return m;
}

static void flame_temperatures_are_those_of_the_check_table(void **state)
{
    (void)state;
    for (size_t i = 0; i < COUNT(CHECKS); i++) {
        bc_reactants r =
            equilibrium_reactants(CHECKS[i].fuel, CHECKS[i].oxidant, CHECKS[i].lambda, CHECKS[i].fuel_t_k);

        r.oxidant_t_k = CHECKS[i].oxidant_t_k;
        r.p_pa = CHECKS[i].p_pa;
        const bc_mixture m =
            strcmp(CHECKS[i].quantity, "flame-temperature") == 0 ? equilibrium_flame(&r) : complete(&r);

        assert_within_at(CHECKS[i].id, m.t_k, CHECKS[i].expected, CHECKS[i].tolerance);
    }
}

/* CH4 + 2 O2 at 298.15 K: 802.56 kJ/mol (formation enthalpies of NASA/TP-2002-211556) heat CO2 + 2 H2O and
 * what else is there; here 20 N2 and 3 O2 more. */
static void complete_combustion_closes_by_hand(void **state)
{
    static const struct {
        const char *formula;
        double moles;
    } PRODUCTS[] = {{"CO2", 1.0}, {"H2O", 2.0}, {"N2", 20.0}, {"O2", 3.0}};
    const bc_reactants r = {.fuel = equilibrium_gas("methane=100"),
                            .oxidant = equilibrium_gas("oxygen=20,nitrogen=80"),
                            .fuel_t_k = 298.15,
                            .oxidant_t_k = 298.15,
                            .oxidant_per_fuel = 25.0,
                            .p_pa = 131000.0};
    const bc_mixture m = complete(&r);
    double heat_j = 0.0;

    (void)state;
    for (size_t i = 0; i < COUNT(PRODUCTS); i++) {
        size_t product = 0;
        double h = 0.0;

        while (strcmp(bc_product_formula(product), PRODUCTS[i].formula) != 0)
            product++;
        assert_within_at(PRODUCTS[i].formula, m.moles[product], PRODUCTS[i].moles, 1e-12);
        assert_int_equal(bc_thermo_enthalpy(bc_product_thermo(product), m.t_k, &h, NULL), BC_OK);
        heat_j += PRODUCTS[i].moles * (h - bc_thermo_formation_j_per_mol(bc_product_thermo(product)));
    }
    assert_within(heat_j, 802560.0, 5.0);
    assert_within(m.total_moles, 26.0, 1e-12);
    assert_within(m.p_pa, 131000.0, 0.0);
}

static void complete_combustion_and_equilibrium_meet_in_a_lean_cool_flame(void **state)
{
    const bc_reactants r = equilibrium_reactants("methane=93,ethane=7", AIR, 4.3, 283.7);
    const bc_mixture m = equilibrium_flame(&r);

    (void)state;
    assert_within(m.t_k, complete(&r).t_k, 0.5); /* NO takes a little heat */
}

static void the_flame_gets_hotter_with_preheat_and_pressure(void **state)
{
    bc_reactants r = equilibrium_reactants("methane=71,hydrogen=23,nitrogen=6", AIR, 1.07, 293.15);
    double last_k = 0.0, last_complete_k = 0.0;

    (void)state;
    for (int i = 0; i < 48; i++) {
        r.oxidant_t_k = 251.3 + 25.9 * i;
        const double t_k = equilibrium_flame(&r).t_k, complete_k = complete(&r).t_k;

        assert_true(t_k > last_k + 1.0 && complete_k > last_complete_k + 1.0 && complete_k > t_k);
        last_k = t_k;
        last_complete_k = complete_k;
    }
    for (r.p_pa = 5.0e3, last_k = 0.0; r.p_pa <= 1.0e7; r.p_pa *= 1.7) {
        const double t_k = equilibrium_flame(&r).t_k;

        assert_true(t_k > last_k);
        last_k = t_k;
    }
}

/* lambda 0.3 and 20, 0.05 and 100 bar: element and enthalpy balances close in every corner. */
static void the_corners_of_the_range_have_a_flame(void **state)
{
    static const char *const FUELS[] = {"methane=100",
                                        "hydrogen=100",
                                        "carbon-monoxide=100",
                                        "ammonia=100",
                                        "hydrogen-sulfide=100",
                                        "carbon-disulfide=100",
                                        "hydrogen-cyanide=100",
                                        "n-pentadecane=100",
                                        "ethyne=100",
                                        "naphthalene=100",
                                        "carbonyl-sulfide=100",
                                        "methanol=100",
                                        "nitrous-oxide=40,methanethiol=60",
                                        "carbon-monoxide=23,carbon-dioxide=21,hydrogen=3,nitrogen=53"};
    static const double LAMBDAS[] = {0.3, 0.9999999, 1.0, 1.0000001, 20.0}, P_PA[] = {5.0e3, 1.0e7};

    (void)state;
    for (size_t i = 0; i < COUNT(FUELS); i++)
        for (size_t k = 0; k < COUNT(LAMBDAS) * COUNT(P_PA); k++) {
            bc_reactants r =
                equilibrium_reactants(FUELS[i], k % 3 == 0 ? OXYGEN : AIR, LAMBDAS[k / 2], 250.0);
            double elements[BC_ELEMENTS], h_j = 0.0;

            r.p_pa = P_PA[k % 2];
            r.oxidant_t_k = 1500.0;
            const bc_mixture m = equilibrium_flame(&r);

            assert_int_equal(bc_reactants_sum(&r, elements, &h_j, NULL), BC_OK);
            assert_within_at(FUELS[i], m.element_residual, 0.0, 1e-10);
            assert_within_at(FUELS[i], m.enthalpy_j, h_j, 1e-9 * equilibrium_h_scale(&m));
        }
}

static void gases_that_do_not_burn_take_the_temperature_of_mixing(void **state)
{
    static const char *const FUELS[] = {"nitrogen=100", "argon=61,helium=39", "carbon-dioxide=37,nitrogen=63",
                                        "water=100", "sulfur-dioxide=11,nitrogen=89"};

    (void)state;
    for (size_t i = 0; i < COUNT(FUELS); i++) {
        bc_reactants r = equilibrium_reactants(FUELS[i], AIR, 1.3, 307.9);

        assert_within_at(FUELS[i], r.oxidant_per_fuel, 0.0, 0.0);
        assert_within_at(FUELS[i], equilibrium_flame(&r).t_k, 307.9, 1e-6);
        assert_within_at(FUELS[i], complete(&r).t_k, 307.9, 1e-6);
        if (i == 4)
            continue; /* SO2 burns to SO3 in cold air */
        r.oxidant_per_fuel = 1.7;
        r.oxidant_t_k = 411.3;
        assert_within_at(FUELS[i], equilibrium_flame(&r).t_k, complete(&r).t_k, 1e-4);
    }
}

static void the_need_for_oxygen_counts_atoms(void **state)
{
    const bc_gas fuel =
        equilibrium_gas("methane=60,hydrogen-sulfide=10,oxygen=5,carbon-dioxide=20,ammonia=5");
    const bc_gas air = equilibrium_gas(AIR),
                 inert = equilibrium_gas("carbon-dioxide=31,nitrogen=47,water=22");

    (void)state;
    assert_within(bc_oxygen_demand(&fuel), 0.60 * 2.0 + 0.10 * 1.5 - 0.05 + 0.05 * 0.75, 1e-14);
    assert_within(bc_oxygen_demand(&air), -0.20946, 1e-14);
    assert_within(bc_oxygen_demand(&inert), 0.0, 0.0);
    const bc_reactants r = equilibrium_reactants("methane=90,oxygen=10", AIR, 1.25, 298.15);

    assert_within(r.oxidant_per_fuel, 1.25 * 1.7 / 0.20946, 1e-12);
}

static void what_has_no_flame_is_refused_and_nothing_is_written(void **state)
{
    bc_reactants r = equilibrium_reactants("methane=100", AIR, 0.97, 298.15), changed;
    const bc_gas nitrogen = equilibrium_gas("nitrogen=100"), air = equilibrium_gas(AIR);
    bc_mixture m = {.t_k = -7.0};
    bc_error err = {.status = BC_OK};
    double moles = -7.0;

    (void)state;
    assert_refused(bc_flame_complete(&r, &m, &err), &err, BC_ERR_RANGE, "0.06 mol|equilibrium");
    assert_refused(bc_oxidant_for_lambda(&r.fuel, &air, -0.1, &moles, &err), &err, BC_ERR_RANGE,
                   "lambda|-0.1");
    assert_refused(bc_oxidant_for_lambda(&r.fuel, &nitrogen, 1.1, &moles, &err), &err, BC_ERR_INPUT,
                   "oxygen to give");
    assert_refused(bc_oxidant_for_lambda(&air, &air, 1.1, &moles, &err), &err, BC_ERR_INPUT,
                   "no meaning|per mole");
    assert_within(moles, -7.0, 0.0);
    changed = r;
    changed.fuel_t_k = 6001.0;
    assert_refused(bc_flame_equilibrium(&changed, &m, &err), &err, BC_ERR_RANGE, "fuel|6001 K");
    changed = r;
    changed.oxidant_t_k = 150.0;
    assert_refused(bc_flame_equilibrium(&changed, &m, &err), &err, BC_ERR_RANGE, "oxidant|150 K");
    changed = r;
    changed.oxidant_per_fuel = -0.5;
    assert_refused(bc_flame_equilibrium(&changed, &m, &err), &err, BC_ERR_RANGE, "-0.5 mol");
    changed = r;
    changed.p_pa = 1.1e8;
    assert_refused(bc_flame_equilibrium(&changed, &m, &err), &err, BC_ERR_RANGE, "1.1e+08 Pa");
    changed = equilibrium_reactants("ethyne=100", OXYGEN, 1.0, 1500.0);
    assert_refused(bc_flame_complete(&changed, &m, &err), &err, BC_ERR_RANGE, "6000 K|equilibrium");
    assert_within(m.t_k, -7.0, 0.0);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(flame_temperatures_are_those_of_the_check_table),
        cmocka_unit_test(complete_combustion_closes_by_hand),
        cmocka_unit_test(complete_combustion_and_equilibrium_meet_in_a_lean_cool_flame),
        cmocka_unit_test(the_flame_gets_hotter_with_preheat_and_pressure),
        cmocka_unit_test(the_corners_of_the_range_have_a_flame),
        cmocka_unit_test(gases_that_do_not_burn_take_the_temperature_of_mixing),
        cmocka_unit_test(the_need_for_oxygen_counts_atoms),
        cmocka_unit_test(what_has_no_flame_is_refused_and_nothing_is_written),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
