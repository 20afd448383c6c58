/* SPDX-License-Identifier: MIT */
/* test_gas.c - gases as values: scaling, water, air; the saturation line; the summation factors. */
#include "support.h"

#include "bluecone/gas.h"
#include "bluecone/steam.h"
#include "gas/species_index.h"
#include "gas/summation.h"

static bc_gas gas_of(const double amounts[])
{
    bc_gas gas;
    bc_error err;

    assert_ok(bc_gas_from_amounts(amounts, &gas, &err), &err);
    return gas;
}

static bc_gas random_gas(chance *c)
{
    double amounts[BC_SPECIES_CAPACITY] = {0.0};

    for (size_t i = 0; i < bc_species_count(); i++)
        if (chance_uniform(c) < 0.3)
            amounts[i] = 5.0 * chance_uniform(c);
    amounts[SPECIES_methane] += 1e-3;
    return gas_of(amounts);
}

static double sum_of(const bc_gas *gas)
{
    double sum = 0.0;

    for (size_t i = 0; i < BC_SPECIES_CAPACITY; i++)
        sum += gas->x[i];
    return sum;
}

static void amounts_become_fractions_whatever_their_scale(void **state)
{
    chance c = {112233};

    (void)state;
    for (int k = 0; k < 200; k++) {
        const bc_gas a = random_gas(&c);
        double scaled[BC_SPECIES_CAPACITY];
        const double scale = pow(10.0, 20.0 * chance_uniform(&c) - 10.0);

        for (size_t i = 0; i < BC_SPECIES_CAPACITY; i++)
            scaled[i] = scale * a.x[i];
        const bc_gas b = gas_of(scaled);

        assert_within(sum_of(&a), 1.0, 1e-14);
        for (size_t i = 0; i < BC_SPECIES_CAPACITY; i++)
            assert_within_at(bc_species_id(i), b.x[i], a.x[i], 1e-15);
    }
}

static void amounts_behind_the_last_species_do_not_count(void **state)
{
    double amounts[BC_SPECIES_CAPACITY] = {0.0};

    (void)state;
    amounts[SPECIES_methane] = 3.0;
    amounts[bc_species_count()] = 5.0;
    amounts[BC_SPECIES_CAPACITY - 1] = 7.0;
    const bc_gas gas = gas_of(amounts);

    for (size_t i = 0; i < BC_SPECIES_CAPACITY; i++)
        assert_within(gas.x[i], i == SPECIES_methane ? 1.0 : 0.0, 0.0);
}

static void amounts_that_make_no_gas_are_refused(void **state)
{
    static const double BAD[] = {-1e-9, (double)INFINITY, (double)NAN};
    double amounts[BC_SPECIES_CAPACITY] = {0.0};
    bc_gas gas = {{0.25}};
    bc_error err = {.status = BC_OK};

    (void)state;
    assert_refused(bc_gas_from_amounts(amounts, &gas, &err), &err, BC_ERR_INPUT, "no components");
    for (size_t k = 0; k < COUNT(BAD); k++) {
        amounts[SPECIES_ethane] = BAD[k];
        amounts[SPECIES_methane] = 3.0;
        assert_refused(bc_gas_from_amounts(amounts, &gas, &err), &err, BC_ERR_INPUT, "amount of ethane");
    }
    amounts[SPECIES_ethane] = amounts[SPECIES_methane] = 1.7e308;
    assert_refused(bc_gas_from_amounts(amounts, &gas, &err), &err, BC_ERR_INPUT, "no components");
    assert_within(gas.x[0], 0.25, 0.0);
}

static void molar_mass_and_atoms_of_a_mixture_are_its_weighted_sums(void **state)
{
    double amounts[BC_SPECIES_CAPACITY] = {0.0};

    (void)state;
    amounts[SPECIES_methane] = 3.0;
    amounts[SPECIES_carbon_dioxide] = 2.0;
    const bc_gas gas = gas_of(amounts);

    assert_within(1e3 * bc_gas_molar_mass_kg_per_mol(&gas), 0.6 * 16.04246 + 0.4 * 44.0095, 1e-6); /* masses of ISO 6976:2016 */
    assert_within(bc_gas_atoms(&gas, BC_C), 1.0, 1e-15);
    assert_within(bc_gas_atoms(&gas, BC_H), 2.4, 1e-15);
    assert_within(bc_gas_atoms(&gas, BC_O), 0.8, 1e-15);
}

static void dry_air_has_the_molar_mass_of_the_standard(void **state)
{
    const bc_gas air = bc_gas_air();

    (void)state;
    assert_within(sum_of(&air), 1.0, 1e-15);
    assert_within(1e3 * bc_gas_molar_mass_kg_per_mol(&air), 28.96546, 0.00017); /* ISO 6976:2016, its own uncertainty */
    assert_within(air.x[SPECIES_oxygen] / air.x[SPECIES_nitrogen], 0.20939 / 0.780848, 1e-9); /* CIPM-2007 */
    assert_within(air.x[SPECIES_water], 0.0, 0.0);
}

/* IAPWS-IF97 (2007 revision), table 35, and IAPWS R14-08(2011) page 5: 230 K 8.94735 Pa. The liquid equation here is
 * SR1-86(1992), which agrees with IF97 within 0.05 % (IAPWS SR1-86). */
static void the_saturation_line_agrees_with_the_check_tables_of_iapws(void **state)
{
    static const struct {
        double t_k, p_pa, tolerance;
    } ROWS[] = {{300.0, 0.353658941e4, 2.0}, {500.0, 0.263889776e7, 500.0}, {600.0, 0.123443146e8, 3000.0}, {230.0, 8.94735, 0.000005}};

    (void)state;
    for (size_t i = 0; i < COUNT(ROWS); i++) {
        double p_pa = 0.0;

        assert_int_equal(bc_steam_pressure(ROWS[i].t_k, &p_pa, NULL), BC_OK);
        assert_within(p_pa, ROWS[i].p_pa, ROWS[i].tolerance);
    }
}

static void ice_and_liquid_water_meet_at_the_triple_point_and_end_at_the_critical_one(void **state)
{
    double ice = 0.0, liquid = 0.0, critical = 0.0;
    bc_error err = {.status = BC_OK};

    (void)state;
    assert_int_equal(bc_steam_pressure(273.16 - 1e-9, &ice, NULL), BC_OK);
    assert_int_equal(bc_steam_pressure(273.16, &liquid, NULL), BC_OK);
    assert_within(ice, 611.657, 0.001); /* triple point, IAPWS R14-08(2011) */
    assert_within(liquid, 611.657, 0.01);
    assert_int_equal(bc_steam_pressure(647.096, &critical, NULL), BC_OK);
    assert_within(critical, 22.064e6, 1.0);
    assert_refused(bc_steam_pressure(647.1, &critical, &err), &err, BC_ERR_RANGE, "647.1 K is outside");
    assert_refused(bc_steam_pressure(49.9, &critical, &err), &err, BC_ERR_RANGE, "outside");
    assert_refused(bc_steam_pressure((double)NAN, &critical, &err), &err, BC_ERR_RANGE, "outside");
}

static void a_saturated_gas_holds_the_saturation_pressure_over_its_own(void **state)
{
    double amounts[BC_SPECIES_CAPACITY] = {0.0};
    bc_gas wet;
    double p_pa = 0.0;
    bc_error err;

    (void)state;
    amounts[SPECIES_methane] = 0.61;
    amounts[SPECIES_carbon_dioxide] = 0.36;
    amounts[SPECIES_water] = 0.03;
    const bc_gas gas = gas_of(amounts);

    assert_ok(bc_gas_saturated(&gas, 308.15, 98.3e3, &wet, &err), &err);
    assert_int_equal(bc_steam_pressure(308.15, &p_pa, NULL), BC_OK);
    assert_within(p_pa, 5628.6, 1.0); /* 35 C: 5.6286 kPa, ASME steam tables (1999), value from memory */
    assert_within(wet.x[SPECIES_water], p_pa / 98.3e3, 1e-15);
    assert_within(wet.x[SPECIES_methane] / wet.x[SPECIES_carbon_dioxide], 61.0 / 36.0, 1e-12);
    assert_within(sum_of(&wet), 1.0, 1e-15);
}

static void a_gas_cannot_be_saturated_when_boiling_frozen_through_or_water_alone(void **state)
{
    double amounts[BC_SPECIES_CAPACITY] = {0.0};
    bc_gas wet = {{0.5}};
    bc_gas at_end;
    bc_error err = {.status = BC_OK};

    (void)state;
    amounts[SPECIES_water] = 1.0;
    const bc_gas water = gas_of(amounts);

    amounts[SPECIES_methane] = 1.0;
    const bc_gas gas = gas_of(amounts);

    assert_refused(bc_gas_saturated(&gas, 373.15, 101.325e3, &wet, &err), &err, BC_ERR_RANGE, "boils|higher pressure");
    assert_refused(bc_gas_saturated(&gas, 223.1, 101.325e3, &wet, &err), &err, BC_ERR_RANGE, "-50 and 100 C");
    assert_refused(bc_gas_saturated(&gas, 373.2, 9e5, &wet, &err), &err, BC_ERR_RANGE, "-50 and 100 C");
    assert_ok(bc_gas_saturated(&gas, 223.15, 101.325e3, &at_end, &err), &err); /* the ends that gas.h names */
    assert_ok(bc_gas_saturated(&gas, 373.15, 9e5, &at_end, &err), &err);
    assert_refused(bc_gas_saturated(&gas, 290.0, (double)NAN, &wet, &err), &err, BC_ERR_RANGE, "boils");
    assert_refused(bc_gas_saturated(&water, 290.0, 101.325e3, &wet, &err), &err, BC_ERR_INPUT, "no components");
    assert_within(wet.x[0], 0.5, 0.0);
}

/* A gas that is all vapour at its own pressure has no room for anything else. */
static void the_saturation_pressure_itself_is_no_pressure_of_a_gas(void **state)
{
    double amounts[BC_SPECIES_CAPACITY] = {0.0};
    double p_pa = 0.0;
    bc_gas wet;
    bc_error err = {.status = BC_OK};

    (void)state;
    amounts[SPECIES_methane] = 1.0;
    const bc_gas gas = gas_of(amounts);

    assert_int_equal(bc_steam_pressure(333.15, &p_pa, NULL), BC_OK); /* 60 C: 19.946 kPa, ASME steam tables (1999), value from memory */
    assert_within(p_pa, 19946.0, 2.0);
    assert_refused(bc_gas_saturated(&gas, 333.15, p_pa, &wet, &err), &err, BC_ERR_RANGE, "at 60 C water boils below 19.94");
    assert_ok(bc_gas_saturated(&gas, 333.15, nextafter(p_pa, HUGE_VAL), &wet, &err), &err);
    assert_refused(bc_gas_saturated(&gas, 203.15, 1e5, &wet, &err), &err, BC_ERR_RANGE, "not at -70 C");
}

/* u of a factor that only the older edition has: 0.025 up to four heavy atoms, 0.05 above, as summation.c tells; butane and
 * pentane stand on either side. */
static void factors_of_the_older_edition_scatter_by_the_size_of_the_molecule(void **state)
{
    (void)state;
    assert_within(bc_summation_factor(SPECIES_n_butane, 1995, 15.0).u, 0.025, 0.0);
    assert_within(bc_summation_factor(SPECIES_n_pentane, 1995, 15.0).u, 0.05, 0.0);
}

static void drying_undoes_saturating(void **state)
{
    chance c = {9090};

    (void)state;
    for (int k = 0; k < 100; k++) {
        bc_gas gas = random_gas(&c), wet, dry;
        bc_error err;

        gas.x[SPECIES_water] = 0.0;
        gas = gas_of(gas.x);
        assert_ok(bc_gas_saturated(&gas, 263.15 + 60.0 * chance_uniform(&c), 90e3 + 2e4 * chance_uniform(&c), &wet, &err), &err);
        assert_ok(bc_gas_dry(&wet, &dry, &err), &err);
        for (size_t i = 0; i < bc_species_count(); i++)
            assert_within_at(bc_species_id(i), dry.x[i], gas.x[i], 1e-14);
    }
}

static void air_mixed_into_a_gas_comes_out_again(void **state)
{
    const bc_gas air = bc_gas_air();
    chance c = {46692};

    (void)state;
    for (int k = 0; k < 100; k++) {
        bc_gas gas = random_gas(&c), mixed, pure;
        const double share = 0.7 * chance_uniform(&c);
        double found = 0.0;
        bc_error err;

        gas.x[SPECIES_oxygen] = 0.0;
        gas = gas_of(gas.x);
        for (size_t i = 0; i < BC_SPECIES_CAPACITY; i++)
            mixed.x[i] = share * air.x[i] + (1.0 - share) * gas.x[i];
        assert_ok(bc_gas_air_free(&mixed, &pure, &found, &err), &err);
        assert_within(found, share, 1e-14);
        for (size_t i = 0; i < bc_species_count(); i++)
            assert_within_at(bc_species_id(i), pure.x[i], gas.x[i], 1e-13);
        assert_ok(bc_gas_air_free(&mixed, &pure, NULL, &err), &err);
    }
}

static void oxygen_without_enough_nitrogen_leaves_nothing_negative(void **state)
{
    double amounts[BC_SPECIES_CAPACITY] = {0.0};
    bc_gas pure;
    double air = 0.0;
    bc_error err = {.status = BC_OK};

    (void)state;
    amounts[SPECIES_methane] = 0.7;
    amounts[SPECIES_oxygen] = 0.3;
    const bc_gas oxygen_blown = gas_of(amounts), only_air = bc_gas_air();

    assert_ok(bc_gas_air_free(&oxygen_blown, &pure, &air, &err), &err);
    assert_within(pure.x[SPECIES_methane], 1.0, 1e-15);
    assert_within(air, 1.0, 0.0);
    amounts[SPECIES_methane] = 0.7895; /* 1.005 times the oxygen of air: more than all of it cannot be air */
    amounts[SPECIES_oxygen] = 0.2105;
    const bc_gas just_more = gas_of(amounts);

    assert_ok(bc_gas_air_free(&just_more, &pure, &air, &err), &err);
    assert_within(air, 1.0, 0.0);
    assert_int_equal(bc_gas_air_free(&only_air, &pure, &air, &err), BC_ERR_INPUT);
}

/* The estimate of summation.c written again, for the rows of critical.def that have a factor in the standard. */
typedef struct {
    size_t species;
    double tc_k, pc_pa, acentric;
    const char *source;
} critical;

static const critical CRITICALS[] = {
#define CRITICAL(symbol, tc, pc, acentric, source) {SPECIES_##symbol, tc, pc, acentric, source},
#include "data/critical.def"
};

/* s2 = -B p0/(R T), B after Tsonopoulos, AIChE J. 20 (1974) 263, nonpolar. */
static double tsonopoulos_factor(const critical *c, double t_k)
{
    const double tr = t_k / c->tc_k;
    const double f0 = 0.1445 - 0.330 / tr - 0.1385 / pow(tr, 2) - 0.0121 / pow(tr, 3) - 0.000607 / pow(tr, 8);
    const double f1 = 0.0637 + 0.331 / pow(tr, 2) - 0.423 / pow(tr, 3) - 0.008 / pow(tr, 8);
    const double s2 = -(f0 + c->acentric * f1) * c->tc_k * 101325.0 / (c->pc_pa * t_k);

    return s2 <= 0.0 ? 0.0 : s2 >= 1.0 ? 1.0 : sqrt(s2);
}

/* 0.004: the standard's own uncertainty of the butane factor, and the larger of the deviations that a virial
 * of corresponding states has from measured ones there (Tsonopoulos 1974, table 3: 3 cm3/mol for nitrogen). */
static void the_virial_estimate_reproduces_the_factors_of_the_standard(void **state)
{
    static const double COLUMNS_C[] = {0.0, 15.0, 20.0};
    int controls = 0;

    (void)state;
    for (size_t i = 0; i < COUNT(CRITICALS); i++) {
        if (strstr(CRITICALS[i].source, "control") == NULL)
            continue;
        controls++;
        for (size_t k = 0; k < COUNT(COLUMNS_C); k++) {
            const bc_summation table = bc_summation_factor(CRITICALS[i].species, 2016, COLUMNS_C[k]);

            assert_int_equal(table.origin, BC_ORIGIN_EDITION);
            assert_within_at(bc_species_id(CRITICALS[i].species), tsonopoulos_factor(&CRITICALS[i], COLUMNS_C[k] + 273.15), table.s, 0.004);
        }
    }
    assert_in_range(controls, 6, 20);
}

static void species_without_a_factor_get_the_estimate_and_its_label(void **state)
{
    int estimates = 0;

    (void)state;
    for (size_t i = 0; i < COUNT(CRITICALS); i++) {
        const bc_summation got = bc_summation_factor(CRITICALS[i].species, 2016, 17.3);

        if (strstr(CRITICALS[i].source, "control") != NULL)
            continue;
        estimates++;
        assert_int_equal(got.origin, BC_ORIGIN_ESTIMATE);
        assert_within_at(bc_species_id(CRITICALS[i].species), got.s, tsonopoulos_factor(&CRITICALS[i], 17.3 + 273.15), 1e-12);
        assert_within_at(bc_species_id(CRITICALS[i].species), got.u, 0.25 * got.s, 1e-12); /* as summation.c tells */
        assert_non_null(strstr(bc_summation_source(CRITICALS[i].species, 2016), "Tsonopoulos"));
    }
    assert_int_equal(estimates, 9);
}

static void no_species_has_a_factor_of_nothing_and_all_shrink_with_temperature(void **state)
{
    (void)state;
    for (size_t i = 0; i < bc_species_count(); i++) {
        const bc_summation cold = bc_summation_factor(i, 2016, 0.0), warm = bc_summation_factor(i, 2016, 25.0);

        if (cold.s == 0.0)
            fail_msg("%s has no summation factor", bc_species_id(i));
        if (cold.s > 0.0 && (warm.s > cold.s || (warm.s == cold.s && cold.s < 1.0)))
            fail_msg("%s: %.4f at 0 C, %.4f at 25 C", bc_species_id(i), cold.s, warm.s);
        assert_true(cold.u > 0.0);
        assert_true(strlen(bc_summation_source(i, 1995)) > 5);
    }
}

static void factors_between_the_columns_lie_on_a_smooth_curve(void **state)
{
    /* methane, ISO 6976:2016: 0.04452 at 15 C, 0.04437 at 60 F, 0.04317 at 20 C. The parabola is 0.04436 at 60 F. */
    (void)state;
    assert_within(bc_summation_factor(SPECIES_methane, 2016, 15.55).s, 0.04437, 1e-12);
    assert_within(bc_summation_factor(SPECIES_methane, 2016, 15.5556).s, 0.04437, 1e-12);
    assert_within(bc_summation_factor(SPECIES_methane, 2016, 15.50).s, 0.04438, 2e-5);
    for (size_t i = 0; i < bc_species_count(); i++) {
        const double a = bc_summation_factor(i, 2016, 15.55).s, b = bc_summation_factor(i, 2016, 15.53).s;

        /* 0.5 %: the parabola through three printed columns against the fourth */
        assert_within_at(bc_species_id(i), b, a, 0.005 * fabs(a));
    }
}

static void the_1995_edition_has_its_own_factors_and_no_60_f_column(void **state)
{
    (void)state;
    const bc_summation butane = bc_summation_factor(SPECIES_n_butane, 1995, 15.0), benzene = bc_summation_factor(SPECIES_benzene, 2016, 15.0);
    const bc_summation heavy = bc_summation_factor(SPECIES_n_dodecane, 1995, 15.0), at_60f = bc_summation_factor(SPECIES_methane, 1995, 15.5556);

    assert_within(butane.s, 0.1871, 1e-12); /* ISO 6976:1995 table 2 */
    assert_int_equal(butane.origin, BC_ORIGIN_EDITION);
    assert_within(benzene.s, 0.2720, 1e-12); /* only the older edition's factor is known */
    assert_int_equal(benzene.origin, BC_ORIGIN_OTHER_EDITION);
    assert_int_equal(heavy.origin, BC_ORIGIN_ESTIMATE);
    assert_within(heavy.s, 0.5991 * 1.2, 1e-12); /* n-decane's of 2016 grown with the carbon number */
    assert_within(at_60f.s, 0.0447, 3e-4);
    assert_true(at_60f.s < 0.0447 && at_60f.s > 0.0436);
}

/* ISO 6976:1995 table 2: Z printed beside sqrt(b); Z = 1 - b to the digits printed. */
static void the_two_columns_of_the_1995_table_agree(void **state)
{
    static const struct {
        size_t species;
        double z[3], b[3];
    } ROWS[] = {
#define ISO1995(symbol, m, h0, h15, h20, h25, z0, z15, z20, b0, b15, b20, source) {SPECIES_##symbol, {z0, z15, z20}, {b0, b15, b20}},
#include "data/iso6976_1995.def"
    };

    (void)state;
    for (size_t i = 0; i < COUNT(ROWS); i++)
        for (int k = 0; k < 3; k++)
            if (ROWS[i].z[k] < 1.0) /* hydrogen, helium and neon carry a convention instead */
                assert_within_at(bc_species_id(ROWS[i].species), 1.0 - ROWS[i].b[k] * ROWS[i].b[k], ROWS[i].z[k], 0.00005);
}

static void a_pure_gas_has_the_compression_factor_of_its_summation_factor(void **state)
{
    (void)state;
    assert_within(bc_species_z(SPECIES_methane, 15.0), 1.0 - 0.04452 * 0.04452, 1e-12);
    assert_within(bc_species_z(SPECIES_hydrogen, 15.0), 1.0006, 1e-12); /* ISO 6976:1995 lists Z itself */
    for (size_t i = 0; i < bc_species_count(); i++)
        assert_true(bc_species_z(i, 15.0) > -1e-12 && bc_species_z(i, 15.0) < 1.001);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(amounts_become_fractions_whatever_their_scale),
        cmocka_unit_test(amounts_behind_the_last_species_do_not_count),
        cmocka_unit_test(amounts_that_make_no_gas_are_refused),
        cmocka_unit_test(molar_mass_and_atoms_of_a_mixture_are_its_weighted_sums),
        cmocka_unit_test(dry_air_has_the_molar_mass_of_the_standard),
        cmocka_unit_test(the_saturation_line_agrees_with_the_check_tables_of_iapws),
        cmocka_unit_test(ice_and_liquid_water_meet_at_the_triple_point_and_end_at_the_critical_one),
        cmocka_unit_test(a_saturated_gas_holds_the_saturation_pressure_over_its_own),
        cmocka_unit_test(a_gas_cannot_be_saturated_when_boiling_frozen_through_or_water_alone),
        cmocka_unit_test(the_saturation_pressure_itself_is_no_pressure_of_a_gas),
        cmocka_unit_test(factors_of_the_older_edition_scatter_by_the_size_of_the_molecule),
        cmocka_unit_test(drying_undoes_saturating),
        cmocka_unit_test(air_mixed_into_a_gas_comes_out_again),
        cmocka_unit_test(oxygen_without_enough_nitrogen_leaves_nothing_negative),
        cmocka_unit_test(the_virial_estimate_reproduces_the_factors_of_the_standard),
        cmocka_unit_test(species_without_a_factor_get_the_estimate_and_its_label),
        cmocka_unit_test(no_species_has_a_factor_of_nothing_and_all_shrink_with_temperature),
        cmocka_unit_test(factors_between_the_columns_lie_on_a_smooth_curve),
        cmocka_unit_test(the_1995_edition_has_its_own_factors_and_no_60_f_column),
        cmocka_unit_test(the_two_columns_of_the_1995_table_agree),
        cmocka_unit_test(a_pure_gas_has_the_compression_factor_of_its_summation_factor),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
