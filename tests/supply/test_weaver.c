/* SPDX-License-Identifier: MIT */
/* test_weaver.c - Weaver's indices and AGA Bulletin 36, which rest on the same ratios. */
#include "supply/gases.h"

static bc_weaver_gas weaver_gas(const char *literal)
{
    const bc_reference us = reference_at("60F/60F@30inHg");
    const bc_gas gas = gas_of(literal);
    bc_weaver_gas g;
    bc_error err;

    assert_ok(bc_weaver_gas_of(&us, &gas, &g, &err), &err);
    return g;
}

static bc_aga_gas aga_gas(const char *literal)
{
    const bc_reference us = reference_at("60F/60F@30inHg");
    const bc_gas gas = gas_of(literal);
    bc_aga_gas g;
    bc_error err;

    assert_ok(bc_aga_gas_of(&us, &gas, &g, &err), &err);
    return g;
}

/* N after RP2193: CH4 0, C2H6 1, C3H8 2, C4H10 3, C2H4 2, C3H6 3, C6H6 6 a molecule; CO and CO2 do not count. */
static void carbon_beyond_the_first_atom_counts_for_yellow_tips(void **state)
{
    static const struct {
        const char *gas;
        double n;
    } PURE[] = {{"methane=100", 0.0}, {"ethane=100", 100.0}, {"propane=100", 200.0}, {"isobutane=100", 300.0}, {"ethene=100", 200.0},
                {"propene=100", 300.0}, {"benzene=100", 600.0}, {"carbon-monoxide=70,carbon-dioxide=30", 0.0},
                {NATURAL, 11.5}, {RICH, 18.0}};

    (void)state;
    for (size_t i = 0; i < COUNT(PURE); i++)
        assert_within_at(PURE[i].gas, weaver_gas(PURE[i].gas).carbon_excess, PURE[i].n, 1e-9);
}

/* Derived by hand from the formulas of the tables: A and R of natural gas, and hydrogen atoms outside hydrocarbons. */
static void air_and_hydrogen_ratio_are_sums_over_the_gas(void **state)
{
    (void)state;
    assert_within(weaver_gas(NATURAL).air, 10.23015, 1e-9);
    assert_within(weaver_gas(NATURAL).ratio, 4.17 / 1.10, 1e-9);
    assert_within(weaver_gas(BLEND).ratio, 4.5, 1e-9);
    assert_within(weaver_gas("methane=98,oxygen=2").air, 0.98 * 9.55 - 0.02 * 4.78, 1e-9);
    assert_within(weaver_gas("methane=98,oxygen=2").oxygen_percent, 2.0, 1e-9);
    assert_within(weaver_gas("methane=98,hydrogen-sulfide=2").ratio, (0.98 * 4.0 + 0.04) / 0.98, 1e-9);
    /* CH4O takes 3/2 O2 from air of 20.92 % */
    assert_within(weaver_gas("methanol=100").air, 1.5 / 0.2092, 1e-9);
    /* water is dried off, not counted */
    assert_within(weaver_gas("methane=98,water=2").ratio, 4.0, 1e-9);
    assert_within(weaver_gas("methane=98,water=2").air, 9.55, 1e-9);
}

/* RP2193: the coefficients of oxygen and inert gas cancel for air, 18.8 x 0.21 = 5 x 0.79. */
static void air_in_a_gas_only_dilutes_its_flame_speed_factor(void **state)
{
    const double mixed = weaver_gas("propane=60,nitrogen=31.592,oxygen=8.408").speed;

    (void)state;
    assert_within(mixed, 0.6 * 398.0 / (0.6 * 23.87 + 1.0), 0.02);
}

/* Derived: ten percent nitrogen lowers S of methane to 0.940, the same as it lowers MCP (33.84/36). */
static void nitrogen_slows_methane_as_it_does_by_mcp(void **state)
{
    (void)state;
    assert_within(weaver_gas("methane=90,nitrogen=10").speed / weaver_gas("methane=100").speed, 33.84 / 36.0, 0.001);
    assert_within(weaver_gas("methane=90,carbon-dioxide=10").speed, weaver_gas("methane=90,nitrogen=10").speed, 1e-12);
    assert_within(weaver_gas("methane=90,helium=10").speed, weaver_gas("methane=90,nitrogen=10").speed, 1e-12);
}

/* An alkane beyond the table: F = 16 (A + 1), A = 8/0.2092 of pentane (derived). */
static void heavier_alkanes_take_the_flame_speed_of_the_alkanes(void **state)
{
    const bc_weaver_gas g = weaver_gas("n-pentane=100");

    (void)state;
    assert_within(g.speed, 16.0, 1e-9);
    assert_within(g.air, 8.0 / 0.2092, 1e-9);
    assert_true(g.speed_outside[0] != '\0');
}

static void the_heat_rate_is_the_wobbe_ratio(void **state)
{
    const bc_reference us = reference_at("60F/60F@30inHg");
    const bc_subject a = subject_of(&us, NATURAL);
    const bc_subject s = subject_of(&us, BLEND);

    (void)state;
    assert_within(index_of("weaver-heat", NATURAL, BLEND).value, s.value.wobbe_gross_j_per_m3 / a.value.wobbe_gross_j_per_m3, 1e-9);
}

static void a_burner_there_and_back_is_where_it_was(void **state)
{
    const bc_weaver_gas a = weaver_gas(NATURAL);
    const bc_weaver_gas s = weaver_gas(RICH);
    const bc_weaver there = bc_weaver_compare(&a, &s);
    const bc_weaver back = bc_weaver_compare(&s, &a);

    (void)state;
    assert_within(there.heat * back.heat, 1.0, 1e-12);
    assert_within(there.air * back.air, 1.0, 1e-12);
    assert_within(there.lifting * back.lifting, 1.0, 1e-12);
}

/* JL carries the oxygen of the gas as (100 - Q2)/(100 - Q1), RP2193. */
static void oxygen_in_the_gas_lowers_the_lifting_index(void **state)
{
    bc_weaver_gas a = weaver_gas(NATURAL);
    bc_weaver_gas s = a;

    (void)state;
    s.oxygen_percent = 4.0;
    assert_within(bc_weaver_compare(&a, &s).lifting, 0.96, 1e-12);
    a.oxygen_percent = 2.0;
    assert_within(bc_weaver_compare(&a, &s).lifting, 0.96 / 0.98, 1e-12);
}

/* Both methods are built on the same ratios: f1/f2 = JH and f1 a2/(f2 a1) = JA. */
static void bulletin_36_follows_from_the_ratios_of_weaver(void **state)
{
    static const char *const GASES[] = {RICH, BLEND, "methane=90,nitrogen=10", LPG_AIR, COKE_OVEN};
    const bc_weaver_gas wa = weaver_gas(NATURAL);
    const bc_aga_gas aa = aga_gas(NATURAL);

    (void)state;
    for (size_t i = 0; i < COUNT(GASES); i++) {
        const bc_weaver_gas ws = weaver_gas(GASES[i]);
        const bc_aga_gas as = aga_gas(GASES[i]);
        const bc_weaver w = bc_weaver_compare(&wa, &ws);
        const bc_aga g = bc_aga_compare(&aa, &as);
        const double h = as.gross_j_per_m3 / (1055.05585262 / 0.028316846592);

        assert_within_at(GASES[i], g.lifting, aa.lifting_constant / (w.air * (as.lifting_constant - log10(w.heat))), 1e-12);
        assert_within_at(GASES[i], g.flashback, as.lifting_constant / aa.lifting_constant * sqrt(h / 1000.0) / w.heat, 1e-12);
        assert_within_at(GASES[i], g.yellow_tip, aa.yellow_tip_limit / as.yellow_tip_limit / w.air, 1e-12);
    }
}

/* K over the relative density of the ideal gas. */
static double lifting_of(const char *literal)
{
    const bc_gas gas = gas_of(literal);
    const bc_aga_gas g = aga_gas(literal);

    return g.lifting_constant * g.relative_density * 0.02896546 / bc_gas_molar_mass_kg_per_mol(&gas);
}

/* Yellow tip limits 100 T/A of the pure gases of Bulletin 36, % primary air, and K/d of the ideal gases (derived). */
static void yellow_tip_limits_rise_with_the_carbon_number(void **state)
{
    (void)state;
    assert_within(aga_gas("methane=100").yellow_tip_limit, 22.8, 0.05);
    assert_within(aga_gas("ethane=100").yellow_tip_limit, 34.7, 0.05);
    assert_within(aga_gas("propane=100").yellow_tip_limit, 41.1, 0.05);
    assert_within(aga_gas("n-butane=100").yellow_tip_limit, 54.3, 0.05);
    assert_within(lifting_of("methane=100"), 1.21, 0.005);
    assert_within(lifting_of("ethane=100"), 1.37, 0.005);
    assert_within(lifting_of("propane=100"), 1.27, 0.005);
    assert_within(lifting_of("n-butane=100"), 1.27, 0.005);
    assert_within(aga_gas(NATURAL).lifting_constant, 1.21283, 0.0005);
    assert_within(aga_gas(NATURAL).yellow_tip_limit, 25.0625, 0.0005);
    /* beyond the table: as butane of the same oxygen demand */
    assert_within(aga_gas("n-hexane=100").yellow_tip_limit, 54.3, 0.05);
    assert_within(lifting_of("n-hexane=100"), 1.27, 0.02);
}

/* 7 I = 26.3 O2 for air: air in the gas leaves the yellow tip limit alone. */
static void air_in_a_gas_does_not_move_its_yellow_tip_limit(void **state)
{
    (void)state;
    assert_within(aga_gas("propane=60,nitrogen=31.592,oxygen=8.408").yellow_tip_limit, aga_gas("propane=100").yellow_tip_limit, 0.1);
    assert_within(aga_gas("methane=80,helium=20").yellow_tip_limit, 0.8 * 218.0 / (0.8 * 9.55 + 1.4), 1e-9);
}

/* Borders from memory: over 10 % inert and below 1000 Btu/ft3; 1100 Btu/ft3 or more. */
static void the_class_of_the_old_gas_picks_the_limits(void **state)
{
    (void)state;
    assert_int_equal(aga_gas("methane=100").gas_class, BC_AGA_HIGH_METHANE);
    assert_int_equal(aga_gas("methane=91,nitrogen=9").gas_class, BC_AGA_HIGH_METHANE);
    assert_int_equal(aga_gas("methane=88,nitrogen=12").gas_class, BC_AGA_HIGH_INERT);
    assert_int_equal(aga_gas("methane=60,propane=25,nitrogen=15").gas_class, BC_AGA_HIGH_BTU);
    assert_int_equal(aga_gas(RICH).gas_class, BC_AGA_HIGH_BTU);
    assert_within(index_of("aga-lifting", "methane=100", NATURAL).acceptable.max, 1.06, 0.0);
    assert_within(index_of("aga-lifting", "methane=88,nitrogen=12", NATURAL).acceptable.max, 1.03, 0.0);
    assert_within(index_of("aga-lifting", RICH, NATURAL).acceptable.max, 1.12, 0.0);
    assert_within(index_of("aga-yellow-tip", RICH, NATURAL).acceptable.min, 0.7, 0.0);
    assert_within(index_of("aga-yellow-tip", "methane=100", NATURAL).acceptable.min, 0.8, 0.0);
    assert_within(index_of("aga-yellow-tip", "methane=88,nitrogen=12", NATURAL).acceptable.min, 0.9, 0.0);
    assert_within(index_of("aga-flashback", RICH, NATURAL).acceptable.max, 1.2, 0.0);
    assert_within(index_of("aga-flashback", RICH, NATURAL).preferable.max, 1.18, 0.0);
}

static void gases_that_cannot_be_burnt_with_air_are_refused(void **state)
{
    const bc_reference us = reference_at("60F/60F@30inHg");
    const bc_gas inert = gas_of("nitrogen=100");
    const bc_gas steam = gas_of("water=100");
    const bc_gas ready = gas_of("methane=9,air=91");
    bc_weaver_gas w;
    bc_aga_gas g;
    bc_error err;

    (void)state;
    assert_refused(bc_weaver_gas_of(&us, &inert, &w, &err), &err, BC_ERR_RANGE, "does not burn");
    assert_refused(bc_aga_gas_of(&us, &inert, &g, &err), &err, BC_ERR_RANGE, "does not burn");
    assert_refused(bc_weaver_gas_of(&us, &ready, &w, &err), &err, BC_ERR_RANGE, "oxygen it needs");
    assert_refused(bc_aga_gas_of(&us, &ready, &g, &err), &err, BC_ERR_RANGE, "oxygen it needs");
    assert_refused(bc_weaver_gas_of(&us, &steam, &w, &err), &err, BC_ERR_INPUT, "no components");
    assert_refused(bc_aga_gas_of(&us, &steam, &g, &err), &err, BC_ERR_INPUT, "no components");
}

/* Half oxygen: S would divide by a negative sum, and says so instead. */
static void oxygen_rich_gas_has_no_flame_speed_factor(void **state)
{
    const bc_weaver_gas g = weaver_gas("propane=30,oxygen=70");

    (void)state;
    assert_false(g.has_speed);
    assert_within(g.speed, 0.0, 0.0);
    assert_false(index_of("weaver-lifting", NATURAL, "propane=30,oxygen=70").has_value);
    assert_outside(index_of("weaver-speed", NULL, "propane=30,oxygen=70"), "oxygen");
}

/* log10 of the heat ratio above K: no lifting limit is left, IL has no value. */
static void a_gas_of_much_more_heat_may_have_no_lifting_index(void **state)
{
    bc_aga_gas a = aga_gas("methane=100");
    bc_aga_gas s = a;

    (void)state;
    s.gross_j_per_m3 *= 20.0;
    assert_false(bc_aga_compare(&a, &s).has_lifting);
    s = a;
    s.yellow_tip_limit = 0.0;
    assert_false(bc_aga_compare(&a, &s).has_yellow_tip);
    assert_true(bc_aga_compare(&a, &a).has_yellow_tip);
    assert_outside(index_of("aga-yellow-tip", "methane=100", "hydrogen=100"), "yellow tip limit");
}

/* IL = K_a/((f_a a_s/(f_s a_a)) (K_s - log10(f_a/f_s))) of the Bulletin; for equal heat and density f is 1 and its logarithm 0. */
static void a_low_lifting_constant_gives_a_high_index(void **state)
{
    const bc_aga_gas gas = aga_gas("methane=100");
    bc_aga_gas low = gas;

    (void)state;
    low.lifting_constant = 0.25;
    assert_true(bc_aga_compare(&gas, &low).has_lifting);
    assert_within(bc_aga_compare(&gas, &low).lifting, gas.lifting_constant / 0.25, 1e-12);
    low.lifting_constant = 0.0;
    assert_false(bc_aga_compare(&gas, &low).has_lifting);
}

/* More than 10 % of inert gas and less than 1000 Btu/ft3 make a gas of high inerts: Bulletin 36, value from memory. */
static void a_tenth_of_inert_gas_is_not_yet_high(void **state)
{
    (void)state;
    assert_int_equal(aga_gas("methane=90,nitrogen=10").gas_class, BC_AGA_HIGH_METHANE);
    assert_int_equal(aga_gas("methane=89.999,nitrogen=10.001").gas_class, BC_AGA_HIGH_INERT);
    assert_int_equal(aga_gas("ethane=60,nitrogen=40").gas_class, BC_AGA_HIGH_METHANE);
}

/* A yellow tip limit of zero, of a gas without hydrocarbons, divides nothing and is divided by nothing. */
static void without_a_yellow_tip_limit_there_is_no_index_of_it(void **state)
{
    const bc_aga_gas gas = aga_gas("methane=100");

    (void)state;
    assert_true(gas.yellow_tip_limit > 0.0 && bc_aga_compare(&gas, &gas).has_yellow_tip);
    for (int side = 0; side < 2; side++) {
        bc_aga_gas other = gas;

        other.yellow_tip_limit = 0.0;
        const bc_aga index = side ? bc_aga_compare(&gas, &other) : bc_aga_compare(&other, &gas);

        assert_false(index.has_yellow_tip);
        assert_within(index.yellow_tip, 0.0, 0.0);
        other.yellow_tip_limit = 0.5; /* however low it is */
        assert_true((side ? bc_aga_compare(&gas, &other) : bc_aga_compare(&other, &gas)).has_yellow_tip);
    }
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(carbon_beyond_the_first_atom_counts_for_yellow_tips),
        cmocka_unit_test(air_and_hydrogen_ratio_are_sums_over_the_gas),
        cmocka_unit_test(air_in_a_gas_only_dilutes_its_flame_speed_factor),
        cmocka_unit_test(nitrogen_slows_methane_as_it_does_by_mcp),
        cmocka_unit_test(heavier_alkanes_take_the_flame_speed_of_the_alkanes),
        cmocka_unit_test(the_heat_rate_is_the_wobbe_ratio),
        cmocka_unit_test(a_burner_there_and_back_is_where_it_was),
        cmocka_unit_test(oxygen_in_the_gas_lowers_the_lifting_index),
        cmocka_unit_test(bulletin_36_follows_from_the_ratios_of_weaver),
        cmocka_unit_test(yellow_tip_limits_rise_with_the_carbon_number),
        cmocka_unit_test(air_in_a_gas_does_not_move_its_yellow_tip_limit),
        cmocka_unit_test(the_class_of_the_old_gas_picks_the_limits),
        cmocka_unit_test(gases_that_cannot_be_burnt_with_air_are_refused),
        cmocka_unit_test(oxygen_rich_gas_has_no_flame_speed_factor),
        cmocka_unit_test(a_low_lifting_constant_gives_a_high_index),
        cmocka_unit_test(a_tenth_of_inert_gas_is_not_yet_high),
        cmocka_unit_test(without_a_yellow_tip_limit_there_is_no_index_of_it),
        cmocka_unit_test(a_gas_of_much_more_heat_may_have_no_lifting_index),
    };

    return cmocka_run_group_tests_name("weaver", tests, NULL, NULL);
}
