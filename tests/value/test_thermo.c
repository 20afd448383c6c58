/* SPDX-License-Identifier: MIT */
/* test_thermo.c - the polynomials against each other: derivatives, joints, zero points, limits. */
#include "support.h"

#include "bluecone/thermo.h"
#include "gas/species_index.h"
#include "value/formation_internal.h"
#include "value/thermo_internal.h"

static double cp_at(size_t i, double t_k)
{
    double cp = 0.0;

    assert_int_equal(bc_thermo_cp(i, t_k, &cp, NULL), BC_OK);
    return cp;
}

static double h_at(size_t i, double t_k)
{
    double h = 0.0;

    assert_int_equal(bc_thermo_enthalpy(i, t_k, &h, NULL), BC_OK);
    return h;
}

static double s_at(size_t i, double t_k)
{
    double s = 0.0;

    assert_int_equal(bc_thermo_entropy(i, t_k, &s, NULL), BC_OK);
    return s;
}

/* Temperatures of both ranges, none on a round number and none across the joint at 1000 K. */
static const double TEMPERATURES_K[] = {213.7, 287.31, 341.9, 557.3, 811.7, 983.1, 1017.9, 1431.3, 2213.7, 3370.1, 4811.3, 5903.9};

static void the_slope_of_enthalpy_is_the_heat_capacity_for_every_species(void **state)
{
    (void)state;
    for (size_t i = 0; i < bc_thermo_count(); i++)
        for (size_t k = 0; k < COUNT(TEMPERATURES_K); k++) {
            const double t = TEMPERATURES_K[k], step = 0.01 * t < 10.0 ? 0.01 * t : 10.0;
            /* fourth-order central difference: what remains is rounding and (step/t)^4 */
            const double slope = (8.0 * (h_at(i, t + 0.5 * step) - h_at(i, t - 0.5 * step)) - (h_at(i, t + step) - h_at(i, t - step))) / (6.0 * step);

            assert_within_at(bc_thermo_name(i), slope, cp_at(i, t), 1e-5 * cp_at(i, t));
        }
}

static void the_slope_of_entropy_is_the_heat_capacity_over_temperature(void **state)
{
    (void)state;
    for (size_t i = 0; i < bc_thermo_count(); i++)
        for (size_t k = 0; k < COUNT(TEMPERATURES_K); k++) {
            const double t = TEMPERATURES_K[k], step = 0.01 * t < 10.0 ? 0.01 * t : 10.0;
            const double slope = (8.0 * (s_at(i, t + 0.5 * step) - s_at(i, t - 0.5 * step)) - (s_at(i, t + step) - s_at(i, t - step))) / (6.0 * step);

            assert_within_at(bc_thermo_name(i), slope * t, cp_at(i, t), 1e-5 * cp_at(i, t));
        }
}

/* The data set is fitted so that its ranges join; printed with ten digits they do to 1e-5 or so of R (Cp),
 * RT (H) and R (S): McBride, Zehe, Gordon, NASA/TP-2002-211556, section on the fit. */
static void both_ranges_join_at_1000_k(void **state)
{
    const double r = BC_THERMO_R_J_PER_MOL_K;
    const double before = 1000.0 - 1e-9;

    (void)state;
    for (size_t i = 0; i < bc_thermo_count(); i++) {
        assert_within_at(bc_thermo_name(i), cp_at(i, before) / r, cp_at(i, 1000.0) / r, 1e-4);
        assert_within_at(bc_thermo_name(i), h_at(i, before) / (1000.0 * r), h_at(i, 1000.0) / (1000.0 * r), 2e-5);
        assert_within_at(bc_thermo_name(i), s_at(i, before) / r, s_at(i, 1000.0) / r, 2e-5);
    }
}

/* 1000 K itself belongs to the upper range, here as in the flames: Cp/R = a1 T^-2 + a2 T^-1 + a3 + a4 T + ... by its row. */
static void the_joint_belongs_to_the_upper_range(void **state)
{
    size_t apart = 0;

    (void)state;
    for (size_t i = 0; i < bc_thermo_count(); i++) {
        double cp_r[2] = {0.0, 0.0};

        for (int range = 0; range < 2; range++)
            for (int k = 0; k < 7; k++)
                cp_r[range] += bc_thermo_coefficients(i, range)[k] * pow(1000.0, k - 2);
        assert_within_at(bc_thermo_name(i), cp_at(i, 1000.0) / BC_THERMO_R_J_PER_MOL_K, cp_r[1], 1e-12 * cp_r[1]);
        apart += fabs(cp_r[0] - cp_r[1]) > 1e-11 * cp_r[1];
    }
    assert_true(apart > 20);
}

static void enthalpy_at_298_15_k_is_the_formation_enthalpy(void **state)
{
    (void)state;
    for (size_t i = 0; i < bc_thermo_count(); i++)
        assert_within_at(bc_thermo_name(i), h_at(i, 298.15), bc_thermo_formation_j_per_mol(i), 2.0); /* J/mol: 10 digits of b1 R */
}

static void the_elements_have_no_formation_enthalpy(void **state)
{
    static const size_t ELEMENTS[] = {SPECIES_hydrogen, SPECIES_nitrogen, SPECIES_oxygen, SPECIES_argon, SPECIES_helium, SPECIES_neon};

    (void)state;
    for (size_t k = 0; k < COUNT(ELEMENTS); k++)
        assert_within_at(bc_thermo_name(ELEMENTS[k]), h_at(ELEMENTS[k], 298.15), 0.0, 0.5);
}

/* CODATA key values for thermodynamics (Cox, Wagman, Medvedev 1989), kJ/mol and J/(mol K), with their uncertainties. */
static void key_values_of_codata_are_met(void **state)
{
    static const struct {
        size_t species;
        double formation, u_formation, entropy, u_entropy;
    } ROWS[] = {
        {SPECIES_water, -241.826, 0.040, 188.835, 0.010},         {SPECIES_carbon_dioxide, -393.51, 0.13, 213.785, 0.010},
        {SPECIES_carbon_monoxide, -110.53, 0.17, 197.660, 0.004}, {SPECIES_sulfur_dioxide, -296.81, 0.20, 248.223, 0.05},
        {SPECIES_ammonia, -45.94, 0.35, 192.77, 0.05},            {SPECIES_hydrogen_sulfide, -20.6, 0.5, 205.81, 0.05},
        {SPECIES_nitrogen, 0.0, 0.001, 191.609, 0.004},           {SPECIES_oxygen, 0.0, 0.001, 205.152, 0.005},
        {SPECIES_hydrogen, 0.0, 0.001, 130.680, 0.003},           {SPECIES_argon, 0.0, 0.001, 154.846, 0.003},
    };

    (void)state;
    for (size_t k = 0; k < COUNT(ROWS); k++) {
        assert_within_at(bc_thermo_name(ROWS[k].species), h_at(ROWS[k].species, 298.15) * 1e-3, ROWS[k].formation, ROWS[k].u_formation);
        assert_within_at(bc_thermo_name(ROWS[k].species), s_at(ROWS[k].species, 298.15), ROWS[k].entropy, ROWS[k].u_entropy);
    }
}

/* A monatomic ideal gas has Cp = 5/2 R at all temperatures (kinetic theory); no molecule has less; 0.04 % for the
 * ripple of the fits (atomic nitrogen at 1018 K: 0.01 %). */
static void no_heat_capacity_is_below_that_of_a_single_atom(void **state)
{
    (void)state;
    for (size_t i = 0; i < bc_thermo_count(); i++)
        for (size_t k = 0; k < COUNT(TEMPERATURES_K); k++)
            if (!(cp_at(i, TEMPERATURES_K[k]) >= 2.499 * BC_THERMO_R_J_PER_MOL_K))
                fail_msg("%s at %g K: %g", bc_thermo_name(i), TEMPERATURES_K[k], cp_at(i, TEMPERATURES_K[k]));
    assert_within(cp_at(SPECIES_argon, 733.1), 2.5 * BC_THERMO_R_J_PER_MOL_K, 1e-6);
}

static void species_and_polynomials_are_the_same_molecules(void **state)
{
    (void)state;
    assert_true(bc_thermo_count() >= bc_species_count());
    for (size_t i = 0; i < bc_thermo_count(); i++) {
        assert_true(strlen(bc_thermo_source(i)) > 5);
        assert_true(strlen(bc_thermo_name(i)) > 0);
        for (int k = 0; k < BC_ELEMENTS && i < bc_species_count(); k++)
            assert_int_equal(bc_thermo_atoms(i, (bc_element)k), bc_species_atoms(i, (bc_element)k));
        if (i < bc_species_count())
            assert_string_equal(bc_thermo_name(i), bc_species_name(i));
    }
}

static void temperatures_and_species_outside_the_data_are_refused(void **state)
{
    static const double BAD_K[] = {199.99, 6000.01, -5.0, (double)NAN, (double)INFINITY};
    double value = 47.11;
    bc_error err = {.status = BC_OK};

    (void)state;
    for (size_t k = 0; k < COUNT(BAD_K); k++) {
        assert_refused(bc_thermo_cp(SPECIES_ethane, BAD_K[k], &value, &err), &err, BC_ERR_RANGE, "200 to 6000 K");
        assert_refused(bc_thermo_enthalpy(SPECIES_ethane, BAD_K[k], &value, &err), &err, BC_ERR_RANGE, "outside");
        assert_refused(bc_thermo_entropy(SPECIES_ethane, BAD_K[k], &value, &err), &err, BC_ERR_RANGE, "outside");
    }
    assert_refused(bc_thermo_cp(bc_thermo_count(), 500.0, &value, &err), &err, BC_ERR_USAGE, "no thermodynamic species");
    assert_refused(bc_thermo_liquid_water(273.1, &value, &err), &err, BC_ERR_RANGE, "liquid water");
    assert_refused(bc_thermo_liquid_water(600.1, &value, &err), &err, BC_ERR_RANGE, "liquid water");
    assert_within(value, 47.11, 0.0);
    for (size_t k = 0; k < 2; k++) { /* the ends belong to the data */
        assert_ok(bc_thermo_cp(SPECIES_ethane, k == 0 ? BC_THERMO_T_MIN_K : BC_THERMO_T_MAX_K, &value, &err), &err);
        assert_ok(bc_thermo_liquid_water(k == 0 ? 273.15 : 600.0, &value, &err), &err);
    }
    assert_null(bc_thermo_coefficients(bc_thermo_count(), 0));
    for (size_t k = 0; k < 2; k++) {
        const size_t beyond = k == 0 ? bc_thermo_count() : SIZE_MAX;

        assert_within(bc_thermo_formation_j_per_mol(beyond), 0.0, 0.0);
        assert_string_equal(bc_thermo_name(beyond), "");
        assert_string_equal(bc_thermo_source(beyond), "");
        assert_int_equal(bc_thermo_origin_of(beyond), BC_THERMO_FITTED);
        for (int element = 0; element < BC_ELEMENTS; element++)
            assert_int_equal(bc_thermo_atoms(beyond, (bc_element)element), 0);
    }
}

static void liquid_water_has_its_known_enthalpy_and_heat_capacity(void **state)
{
    double h0 = 0.0, h1 = 0.0, h2 = 0.0;

    (void)state;
    assert_int_equal(bc_thermo_liquid_water(298.15, &h0, NULL), BC_OK);
    assert_within(h0 * 1e-3, -285.830, 0.040); /* CODATA key values 1989 */
    assert_int_equal(bc_thermo_liquid_water(297.15, &h1, NULL), BC_OK);
    assert_int_equal(bc_thermo_liquid_water(299.15, &h2, NULL), BC_OK);
    assert_within((h2 - h1) / 2.0, 75.33, 0.05); /* 4.1813 kJ/(kg K) at 25 C, IAPWS-95, x 18.01528 */
    assert_int_equal(bc_thermo_liquid_water(373.15 - 1e-9, &h1, NULL), BC_OK);
    assert_int_equal(bc_thermo_liquid_water(373.15 + 1e-9, &h2, NULL), BC_OK);
    assert_within(h2, h1, 1.0); /* the two ranges join, but for 0.16 J/mol; the joint itself belongs to the lower one */
    assert_true(h2 - h1 > 0.1);
    assert_int_equal(bc_thermo_liquid_water(373.15, &h2, NULL), BC_OK);
    assert_within(h2, h1, 1e-6);
    /* saturated liquid at 500 K has 870.6 kJ/kg more than at 25 C: steam tables, value from memory; 1 %: the pressure */
    assert_int_equal(bc_thermo_liquid_water(500.0, &h1, NULL), BC_OK);
    assert_within((h1 - h0) / 18.01528, 870.6, 8.7);
    /* 6.4 kJ/(kg K) at 590 K, on the way up to the critical point: steam tables, value from memory; 3 %: the pressure */
    assert_int_equal(bc_thermo_liquid_water(588.0, &h1, NULL), BC_OK);
    assert_int_equal(bc_thermo_liquid_water(592.0, &h2, NULL), BC_OK);
    assert_within((h2 - h1) / 4.0 / 18.01528, 6.4, 0.2);
}

/* ISO 6976:2016 annex A; 0.02 kJ/mol: the standard's come from IAPWS, these from an ideal vapour of CODATA. */
static void vaporisation_of_water_agrees_with_the_standards_column(void **state)
{
    static const struct {
        double t_c, lo;
    } ROWS[] = {{0.0, 45.064}, {15.0, 44.431}, {15.55, 44.408}, {20.0, 44.222}, {25.0, 44.013}};

    (void)state;
    for (size_t k = 0; k < COUNT(ROWS); k++)
        assert_within(formation_vaporisation_j_per_mol(ROWS[k].t_c + 273.15) * 1e-3, ROWS[k].lo, 0.02);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(the_slope_of_enthalpy_is_the_heat_capacity_for_every_species),
        cmocka_unit_test(the_slope_of_entropy_is_the_heat_capacity_over_temperature),
        cmocka_unit_test(both_ranges_join_at_1000_k),
        cmocka_unit_test(the_joint_belongs_to_the_upper_range),
        cmocka_unit_test(enthalpy_at_298_15_k_is_the_formation_enthalpy),
        cmocka_unit_test(the_elements_have_no_formation_enthalpy),
        cmocka_unit_test(key_values_of_codata_are_met),
        cmocka_unit_test(no_heat_capacity_is_below_that_of_a_single_atom),
        cmocka_unit_test(species_and_polynomials_are_the_same_molecules),
        cmocka_unit_test(temperatures_and_species_outside_the_data_are_refused),
        cmocka_unit_test(liquid_water_has_its_known_enthalpy_and_heat_capacity),
        cmocka_unit_test(vaporisation_of_water_agrees_with_the_standards_column),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
