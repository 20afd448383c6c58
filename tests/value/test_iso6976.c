/* SPDX-License-Identifier: MIT */
/* test_iso6976.c - the formulas of ISO 6976 by hand, at their limits, and over random gases. */
#include "support.h"

#include "bluecone/composition.h"
#include "bluecone/iso6976.h"
#include "bluecone/steam.h"
#include "gas/species_index.h"

#define R_2016 8.3144621 /* J/(mol K), ISO 6976:2016 annex A */

static bc_reference reference_at(const char *text, int edition)
{
    bc_state s = bc_state_default();
    bc_reference r;
    bc_error err;

    s.edition = edition;
    assert_ok(bc_state_parse(text, &s, &err), &err);
    assert_ok(bc_reference_at(&s, &r, &err), &err);
    return r;
}

static bc_gas gas_of(const char *literal)
{
    bc_composition c;
    bc_error err;

    assert_ok(bc_composition_parse(literal, &c, &err), &err);
    return c.gas;
}

static bc_value value_of(const char *literal, const char *state_text, int edition)
{
    const bc_reference r = reference_at(state_text, edition);
    const bc_gas gas = gas_of(literal);

    return bc_value_of(&r, &gas);
}

/* A natural gas, sometimes with hydrogen, never of a single component. */
static bc_gas random_natural_gas(chance *c)
{
    double amounts[BC_SPECIES_CAPACITY] = {0.0};
    bc_gas gas;

    amounts[SPECIES_methane] = 0.75 + 0.2 * chance_uniform(c);
    amounts[SPECIES_ethane] = 0.08 * chance_uniform(c);
    amounts[SPECIES_propane] = 0.03 * chance_uniform(c);
    amounts[SPECIES_n_butane] = 0.01 * chance_uniform(c);
    amounts[SPECIES_isobutane] = 0.01 * chance_uniform(c);
    amounts[SPECIES_n_pentane] = 0.003 * chance_uniform(c);
    amounts[SPECIES_n_hexane] = 0.001 * chance_uniform(c);
    amounts[SPECIES_nitrogen] = 0.1 * chance_uniform(c);
    amounts[SPECIES_carbon_dioxide] = 0.04 * chance_uniform(c);
    amounts[SPECIES_hydrogen] = chance_uniform(c) < 0.3 ? 0.2 * chance_uniform(c) : 0.0;
    assert_int_equal(bc_gas_from_amounts(amounts, &gas, NULL), BC_OK);
    return gas;
}

/* Anything at all, water included. */
static bc_gas random_gas(chance *c)
{
    double amounts[BC_SPECIES_CAPACITY] = {0.0};
    bc_gas gas;

    for (int k = 0; k < 9; k++)
        amounts[chance_below(c, bc_species_count())] += pow(chance_uniform(c), 3);
    amounts[SPECIES_nitrogen] += 2.0;
    assert_int_equal(bc_gas_from_amounts(amounts, &gas, NULL), BC_OK);
    return gas;
}

/* ---- by hand ------------------------------------------------------------------------------------- */

#define ANNEX_D "methane=93.3212,ethane=2.5656,propane=1.5368,nitrogen=1.035,carbon-dioxide=1.5414"

/* ISO 6976:2016 annex D example 1, value from memory. The sums by hand, with the molar figures of table 3:
 *   H = 0.933212 x 891.51 + 0.025656 x 1562.14 + 0.015368 x 2221.10 = 906.17989
 *   M = 0.933212 x 16.04246 + 0.025656 x 30.06904 + 0.015368 x 44.09562 + 0.01035 x 28.0134 + 0.015414 x 44.0095 = 17.388436
 *   s = 0.933212 x 0.04452 + 0.025656 x 0.0919 + 0.015368 x 0.1344 + 0.01035 x 0.0170 + 0.015414 x 0.0752 = 0.0473050 */
static void the_example_of_annex_d_comes_out(void **state)
{
    const bc_value v = value_of(ANNEX_D, "15/15", 2016);

    (void)state;
    assert_within(v.gross_j_per_mol * 1e-3, 906.1799, 0.00015); /* printed figure; the last digit is recalled */
    assert_within(v.gross_j_per_kg * 1e-6, 52.113, 0.001);
    assert_within(v.gross_j_per_m3 * 1e-6, 38.41061, 2e-5);
    const double h = 0.933212 * 891.51 + 0.025656 * 1562.14 + 0.015368 * 2221.10;
    const double m = 0.933212 * 16.04246 + 0.025656 * 30.06904 + 0.015368 * 44.09562 + 0.01035 * 28.0134 + 0.015414 * 44.0095;
    const double s = 0.933212 * 0.04452 + 0.025656 * 0.0919 + 0.015368 * 0.1344 + 0.01035 * 0.0170 + 0.015414 * 0.0752;
    const double z = 1.0 - s * s, hv = h * 101.325 / (R_2016 * 288.15) / z;
    const double d = m * 101.325 / (R_2016 * 288.15) / z, g = m / 28.96546 * 0.999595 / z;

    assert_within(v.gross_j_per_mol * 1e-3, h, 1e-9);
    assert_within(v.molar_mass_kg_per_mol * 1e3, m, 1e-9);
    assert_within(v.z, z, 1e-12);
    assert_within(v.gross_j_per_m3 * 1e-6, hv, 1e-10);
    assert_within(v.density_kg_per_m3, d, 1e-12);
    assert_within(v.relative_density, g, 1e-12);
    assert_within(v.wobbe_gross_j_per_m3 * 1e-6, hv / sqrt(g), 1e-9);
    assert_within(v.molar_volume_m3_per_mol, R_2016 * 288.15 / 101325.0 * z, 1e-15);
}

/* b = 2 x 0.933212 + 3 x 0.025656 + 4 x 0.015368 waters a mole, Lo = 44.431 kJ/mol at 15 C (annex A). */
static void net_heats_are_the_gross_ones_less_the_water_formed(void **state)
{
    const bc_value v = value_of(ANNEX_D, "15/15", 2016);
    const double waters = 2.0 * 0.933212 + 3.0 * 0.025656 + 4.0 * 0.015368;

    (void)state;
    assert_within((v.gross_j_per_mol - v.net_j_per_mol) * 1e-3, waters * 44.431, 1e-9);
    assert_within(v.net_j_per_m3 / v.gross_j_per_m3, v.net_j_per_mol / v.gross_j_per_mol, 1e-14);
    assert_within(v.net_j_per_kg / v.gross_j_per_kg, v.net_j_per_mol / v.gross_j_per_mol, 1e-14);
    assert_within(v.wobbe_net_j_per_m3 / v.wobbe_gross_j_per_m3, v.net_j_per_mol / v.gross_j_per_mol, 1e-14);
}

/* Pressure enters the volume and the compression factor: V = Z R T/p, Z = 1 - (p/p0) s2. */
static void metering_pressure_enters_volume_and_compression(void **state)
{
    static const double PRESSURES_KPA[] = {90.3, 97.31, 101.325, 101.5598, 109.7};

    (void)state;
    for (size_t i = 0; i < COUNT(PRESSURES_KPA); i++) {
        char text[48];
        const double p = PRESSURES_KPA[i], z = 1.0 - p / 101.325 * 0.1344 * 0.1344; /* propane at 15 C, ISO 6976:2016 */

        (void)snprintf(text, sizeof text, "15/15@%.7gkPa", p);
        const bc_value v = value_of("propane=100", text, 2016);

        assert_within_at(text, v.z, z, 1e-12);
        assert_within_at(text, v.gross_j_per_m3 * 1e-6, 2221.10 * p / (R_2016 * 288.15) / z, 1e-9);
        assert_within_at(text, v.relative_density, 44.09562 / 28.96546 * (1.0 - p / 101.325 * (1.0 - 0.999595)) / z, 1e-9);
    }
}

static void sixty_fahrenheit_uses_its_own_columns(void **state)
{
    const bc_value v = value_of("methane=100", "60F/60F@14.696psi", 2016);
    const bc_value by_celsius = value_of("methane=100", "15.55/15.55", 2016);

    (void)state;
    assert_within(v.gross_j_per_mol * 1e-3, 891.46, 1e-9); /* ISO 6976:2016 table 3, 15.55 C */
    assert_within(v.z, 1.0 - 101.325353 / 101.325 * 0.04437 * 0.04437, 1e-9);
    assert_within(v.gross_ideal_j_per_m3 * 1e-6 * 947.81712 / 35.314667, 1010.0, 0.25); /* Btu/ft3, GPA 2145 / ASTM D3588 */
    assert_within(by_celsius.gross_j_per_m3 / v.gross_j_per_m3, 1.0, 3e-5);
}

/* Methane metered saturated at 15 C: p_sat = 1.7058 kPa (ASME steam tables 1999, value from memory, the
 * last digit uncertain: 0.01 %), so x_w = 0.016835; water brings Lo = 44.431 kJ/mol and s = 0.2562 (ISO 6976:2016). */
static void a_gas_metered_saturated_is_worth_less_by_its_water(void **state)
{
    bc_state s = bc_state_default();
    const bc_gas dry = gas_of("methane=100");
    bc_gas wet;
    bc_reference r;
    bc_error err;

    (void)state;
    s.saturated = true;
    assert_ok(bc_reference_at(&s, &r, &err), &err);
    assert_ok(bc_gas_for_state(&dry, &s, &wet, &err), &err);
    const bc_value v = bc_value_of(&r, &wet);
    const double xw = 1.7058 / 101.325, h = (1.0 - xw) * 891.51 + xw * 44.431, factor = (1.0 - xw) * 0.04452 + xw * 0.2562;
    const double hv = h * 101.325 / (R_2016 * 288.15) / (1.0 - factor * factor);

    assert_within(wet.x[SPECIES_water], xw, 1e-4 * xw);
    assert_within(v.gross_j_per_m3 * 1e-6, hv, 1e-4);
    assert_within(v.net_j_per_mol * 1e-3, (1.0 - xw) * (891.51 - 2.0 * 44.431), 1e-3);
    assert_within(v.gross_j_per_m3 / value_of("methane=100", "15/15", 2016).gross_j_per_m3, 0.984, 0.001); /* 1.7 % less, the trade's rule */
}

static void figures_of_the_1995_edition_are_its_own(void **state)
{
    const bc_value v = value_of("methane=100", "25/0", 1995);

    (void)state;
    assert_within(v.gross_j_per_mol * 1e-3, 890.63, 1e-9); /* ISO 6976:1995 table 3 */
    assert_within(v.gross_ideal_j_per_m3 * 1e-6, 39.735, 0.0005); /* table 5 */
    assert_within(v.gross_j_per_m3 * 1e-6, 890.63 * 101.325 / (8.314510 * 273.15) / (1.0 - 0.0490 * 0.0490), 1e-9);
    assert_within(v.relative_density, 16.043 / 28.9626 * 0.99941 / (1.0 - 0.0490 * 0.0490), 1e-9);
}

/* ---- between the columns -------------------------------------------------------------------------- */

static void a_combustion_temperature_between_the_columns_joins_them_within_0_01_per_cent(void **state)
{
    static const double COLUMNS_C[] = {0.0, 15.0, 20.0, 25.0};
    static const char *const GASES[] = {ANNEX_D, "hydrogen=100", "propane=60,n-butane=40", "carbon-monoxide=27.3,hydrogen=3.1,nitrogen=rest"};

    (void)state;
    for (size_t g = 0; g < COUNT(GASES); g++)
        for (size_t i = 0; i < COUNT(COLUMNS_C); i++) {
            char at[32], beside[32];

            (void)snprintf(at, sizeof at, "%g/15", COLUMNS_C[i]);
            (void)snprintf(beside, sizeof beside, "%g/15", COLUMNS_C[i] + 0.02);
            const bc_value table = value_of(GASES[g], at, 2016), balance = value_of(GASES[g], beside, 2016);

            assert_within_at(GASES[g], balance.gross_j_per_m3 / table.gross_j_per_m3, 1.0, 1e-4);
            assert_within_at(GASES[g], balance.net_j_per_m3 / table.net_j_per_m3, 1.0, 1e-4);
        }
}

static void figures_off_the_columns_are_labelled_as_formation_balance(void **state)
{
    const bc_reference on = reference_at("15/15", 2016), off = reference_at("37.3/15", 2016), old = reference_at("60F/15", 1995);

    (void)state;
    assert_int_equal(on.heat_origin[SPECIES_methane], BC_ORIGIN_EDITION);
    assert_int_equal(on.heat_origin[SPECIES_naphthalene], BC_ORIGIN_FORMATION);
    assert_int_equal(off.heat_origin[SPECIES_methane], BC_ORIGIN_FORMATION);
    assert_int_equal(off.heat_origin[SPECIES_nitrogen], BC_ORIGIN_EDITION); /* no table is needed for nothing */
    assert_int_equal(old.heat_origin[SPECIES_methane], BC_ORIGIN_FORMATION);
    assert_true(off.u_gross_j_per_mol[SPECIES_methane] > on.u_gross_j_per_mol[SPECIES_methane]);
    assert_within(off.gross_j_per_mol[SPECIES_methane] * 1e-3, 889.45, 0.1); /* 25 C to 37.3 C at -0.0943 kJ/(mol K) from the table */
}

static void figures_of_the_other_edition_are_labelled_as_such(void **state)
{
    const bc_reference young = reference_at("15/15", 2016), old = reference_at("15/15", 1995);

    (void)state;
    assert_int_equal(young.factor_origin[SPECIES_methane], BC_ORIGIN_EDITION);
    assert_int_equal(young.factor_origin[SPECIES_ethyne], BC_ORIGIN_OTHER_EDITION);
    assert_int_equal(young.factor_origin[SPECIES_naphthalene], BC_ORIGIN_ESTIMATE);
    assert_int_equal(old.heat_origin[SPECIES_n_dodecane], BC_ORIGIN_OTHER_EDITION);
    for (size_t i = 0; i < bc_species_count(); i++) {
        assert_true(strlen(bc_reference_heat_source(i, 2016)) > 5);
        assert_true(strlen(bc_reference_factor_source(i, 1995)) > 5);
    }
    assert_non_null(strstr(bc_reference_heat_source(SPECIES_n_dodecane, 1995), "ISO 6976:2016"));
    assert_non_null(strstr(bc_reference_heat_source(SPECIES_methane, 1995), "ISO 6976:1995"));
    assert_string_equal(bc_reference_heat_source(bc_species_count(), 2016), "");
    assert_string_equal(bc_reference_factor_source(bc_species_count(), 2016), "");
}

static void a_metering_temperature_between_the_columns_is_smooth(void **state)
{
    bc_value last = value_of(ANNEX_D, "15/0", 2016);

    (void)state;
    for (double t = 0.25; t <= 25.0; t += 0.25) {
        char text[32];

        (void)snprintf(text, sizeof text, "15/%g", t);
        const bc_value v = value_of(ANNEX_D, text, 2016);

        /* V grows with T: -1/T a kelvin, 0.0875 % to 0.0916 % a quarter */
        assert_within_at(text, 1.0 - v.gross_j_per_m3 / last.gross_j_per_m3, 0.25 / (t + 273.15), 3e-5);
        last = v;
    }
}

/* ---- limits and refusals --------------------------------------------------------------------------- */

/* Where sum x s = 0 the gas is ideal: hydrogen has s = -0.0100, nitrogen 0.0170 at 15 C (ISO 6976:2016). */
static void a_gas_without_summation_is_ideal(void **state)
{
    double amounts[BC_SPECIES_CAPACITY] = {0.0};
    const bc_reference r = reference_at("15/15", 2016);
    bc_gas gas;

    (void)state;
    amounts[SPECIES_hydrogen] = 17.0;
    amounts[SPECIES_nitrogen] = 10.0;
    assert_int_equal(bc_gas_from_amounts(amounts, &gas, NULL), BC_OK);
    const bc_value v = bc_value_of(&r, &gas);

    assert_within(v.z, 1.0, 1e-15);
    assert_within(v.gross_j_per_m3, v.gross_ideal_j_per_m3, 1e-6);
    assert_within(v.density_kg_per_m3, v.density_ideal_kg_per_m3, 1e-14);
    assert_within(v.relative_density, v.relative_density_ideal * r.air_z, 1e-14);
}

static void air_has_the_density_of_air(void **state)
{
    const bc_gas air = bc_gas_air();
    const bc_reference r = reference_at("15/15", 2016);
    const bc_value v = bc_value_of(&r, &air);

    (void)state;
    assert_within(v.relative_density, 1.0, 5e-5); /* the mixing rule and Z of air are fitted apart */
    assert_within(v.density_kg_per_m3, 1.22541, 0.0002); /* ISO 6976:1995, dry air at 15 C */
    assert_within(v.gross_j_per_m3, 0.0, 100.0); /* half a ppm of hydrogen, 1.5 ppm of methane */
}

static void volume_figures_end_where_z_falls_below_0_9(void **state)
{
    const bc_value last = {.z = 0.9}, first = {.z = 0.9000001};
    const bc_value thin = value_of("propane=100", "15/15", 2016), thick = value_of("n-octane=100", "15/15", 2016);

    (void)state;
    assert_true(bc_value_in_range(&thin));
    assert_false(bc_value_in_range(&thick));
    assert_true(bc_value_in_range(&first));
    assert_false(bc_value_in_range(&last)); /* Z > 0.9: ISO 6976:2016, value from memory */
    assert_within(thick.gross_j_per_mol * 1e-3, 5516.01, 1e-9); /* the molar figure holds all the same */
}

static void a_state_that_is_out_of_range_leaves_the_reference_untouched(void **state)
{
    bc_state s = bc_state_default();
    bc_reference r;
    bc_error err = {.status = BC_OK};

    (void)state;
    r.r_j_per_mol_k = 47.11;
    s.metering_pa = 120e3;
    assert_refused(bc_reference_at(&s, &r, &err), &err, BC_ERR_RANGE, "metering pressure");
    s = bc_state_default();
    s.edition = 1983;
    assert_refused(bc_reference_at(&s, &r, &err), &err, BC_ERR_USAGE, "not 1983");
    assert_within(r.r_j_per_mol_k, 47.11, 0.0);
}

/* ---- properties over random gases ------------------------------------------------------------------ */

static void molar_figures_are_linear_under_mixing(void **state)
{
    const bc_reference r = reference_at("25/0", 2016);
    chance c = {161803};

    (void)state;
    for (int n = 0; n < 500; n++) {
        const bc_gas a = random_gas(&c), b = random_gas(&c);
        const double share = chance_uniform(&c);
        bc_gas mixed;

        for (size_t i = 0; i < BC_SPECIES_CAPACITY; i++)
            mixed.x[i] = share * a.x[i] + (1.0 - share) * b.x[i];
        const bc_value va = bc_value_of(&r, &a), vb = bc_value_of(&r, &b), vm = bc_value_of(&r, &mixed);

        assert_within(vm.gross_j_per_mol, share * va.gross_j_per_mol + (1.0 - share) * vb.gross_j_per_mol, 1e-7);
        assert_within(vm.net_j_per_mol, share * va.net_j_per_mol + (1.0 - share) * vb.net_j_per_mol, 1e-7);
        assert_within(vm.molar_mass_kg_per_mol, share * va.molar_mass_kg_per_mol + (1.0 - share) * vb.molar_mass_kg_per_mol, 1e-15);
        assert_true(vm.gross_j_per_mol <= fmax(va.gross_j_per_mol, vb.gross_j_per_mol) + 1e-7);
    }
}

static void the_root_of_non_ideality_is_linear_under_mixing(void **state)
{
    const bc_reference r = reference_at("15/15", 2016);
    chance c = {1618};

    (void)state;
    for (int n = 0; n < 300; n++) {
        const bc_gas a = random_natural_gas(&c), b = random_natural_gas(&c);
        const double share = chance_uniform(&c);
        bc_gas mixed;

        for (size_t i = 0; i < BC_SPECIES_CAPACITY; i++)
            mixed.x[i] = share * a.x[i] + (1.0 - share) * b.x[i];
        const double want = share * sqrt(1.0 - bc_value_of(&r, &a).z) + (1.0 - share) * sqrt(1.0 - bc_value_of(&r, &b).z);

        assert_within(sqrt(1.0 - bc_value_of(&r, &mixed).z), want, 1e-12);
    }
}

static void gross_is_over_net_exactly_by_the_hydrogen(void **state)
{
    const bc_reference r = reference_at("20/20", 2016);
    chance c = {57721};

    (void)state;
    for (int n = 0; n < 500; n++) {
        const bc_gas gas = random_gas(&c);
        const bc_value v = bc_value_of(&r, &gas);
        const double hydrogen = bc_gas_atoms(&gas, BC_H);

        assert_within(v.gross_j_per_mol - v.net_j_per_mol, hydrogen / 2.0 * 44222.0, 1e-6); /* Lo at 20 C, ISO 6976:2016 annex A */
        assert_int_equal(v.gross_j_per_m3 > v.net_j_per_m3, hydrogen > 0.0);
    }
    const bc_value blast = value_of("carbon-monoxide=27.3,carbon-dioxide=20.1,nitrogen=rest", "20/20", 2016);

    assert_within(blast.gross_j_per_m3, blast.net_j_per_m3, 0.0);
}

static void the_wobbe_index_is_heat_over_the_root_of_relative_density(void **state)
{
    const bc_reference r = reference_at("15/15@97.31", 2016);
    chance c = {141421};

    (void)state;
    for (int n = 0; n < 300; n++) {
        const bc_gas gas = random_gas(&c);
        const bc_value v = bc_value_of(&r, &gas);

        assert_within(v.wobbe_gross_j_per_m3, v.gross_j_per_m3 / sqrt(v.relative_density), 1e-8 * v.gross_j_per_m3);
        assert_within(v.wobbe_net_ideal_j_per_m3, v.net_ideal_j_per_m3 / sqrt(v.relative_density_ideal), 1e-8 * v.gross_j_per_m3);
    }
}

static void the_bases_of_a_heat_belong_together(void **state)
{
    const bc_reference r = reference_at("25/20@103.7", 2016);
    chance c = {173205};

    (void)state;
    for (int n = 0; n < 300; n++) {
        const bc_gas gas = random_gas(&c);
        const bc_value v = bc_value_of(&r, &gas);

        assert_within(v.gross_j_per_m3 * v.molar_volume_m3_per_mol, v.gross_j_per_mol, 1e-9 * v.gross_j_per_mol);
        assert_within(v.net_j_per_kg * v.molar_mass_kg_per_mol, v.net_j_per_mol, 1e-9 * v.gross_j_per_mol);
        assert_within(v.density_kg_per_m3 * v.molar_volume_m3_per_mol, v.molar_mass_kg_per_mol, 1e-15);
        assert_within(v.gross_ideal_j_per_m3 / v.gross_j_per_m3, v.gross_j_per_m3 > 0.0 ? v.z : 1.0, 1e-13);
    }
}

/* 0.05 %: methane's new heat is 0.006 %, the changed factors of butane and above move Z by up to 0.01 %. */
static void both_editions_agree_on_natural_gas_within_0_05_per_cent(void **state)
{
    static const char *const STATES[] = {"15/15", "25/0", "0/0", "25/20"};
    chance c = {223606};

    (void)state;
    for (int n = 0; n < 300; n++) {
        const bc_gas gas = random_natural_gas(&c);
        const bc_reference young = reference_at(STATES[n % 4], 2016), old = reference_at(STATES[n % 4], 1995);
        const bc_value a = bc_value_of(&young, &gas), b = bc_value_of(&old, &gas);

        assert_within_at(STATES[n % 4], a.gross_j_per_m3 / b.gross_j_per_m3, 1.0, 5e-4);
        assert_within_at(STATES[n % 4], a.net_j_per_m3 / b.net_j_per_m3, 1.0, 5e-4);
        assert_within_at(STATES[n % 4], a.wobbe_gross_j_per_m3 / b.wobbe_gross_j_per_m3, 1.0, 5e-4);
        assert_within_at(STATES[n % 4], a.density_kg_per_m3 / b.density_kg_per_m3, 1.0, 5e-4);
    }
}

static void volumes_of_two_states_differ_by_their_gas_law(void **state)
{
    chance c = {264575};

    (void)state;
    for (int n = 0; n < 100; n++) {
        const bc_gas gas = random_natural_gas(&c);
        const bc_reference cold = reference_at("15/0@101.325", 2016), warm = reference_at("15/20@95.7", 2016);
        const bc_value a = bc_value_of(&cold, &gas), b = bc_value_of(&warm, &gas);
        const double want = 293.15 / 273.15 * 101.325 / 95.7 * b.z / a.z;

        assert_within(a.gross_j_per_m3 / b.gross_j_per_m3, want, 1e-12);
        assert_within(a.gross_j_per_kg, b.gross_j_per_kg, 1e-6);
    }
}

/* ISO 6976:2016 annex A: u of the vaporisation enthalpy 4 J/mol, of Z of air 0.000015; R and the mass of air with theirs
 * (R 8.3144621(75) J/(mol K), M of air 28.96546(17) g/mol). */
static void the_constants_have_the_uncertainties_of_annex_a(void **state)
{
    const bc_state at = bc_state_default();
    bc_reference r;
    bc_error err;

    (void)state;
    assert_ok(bc_reference_at(&at, &r, &err), &err);
    assert_within(r.u_vaporisation_j_per_mol, 4.0, 0.0);
    assert_within(r.u_air_z, 0.000015, 0.0);
    assert_within(r.u_r_j_per_mol_k, 0.0000075, 1e-18);
    assert_within(r.u_air_kg_per_mol, 0.00017e-3, 1e-18);
}

/* What an edition does not list comes from the other one, and says so; what none lists from formation enthalpies. */
static void a_heat_that_an_edition_lacks_is_that_of_the_other(void **state)
{
    bc_reference of[2];
    size_t only[2] = {0, 0}, both = 0, neither = 0;
    bc_error err;

    (void)state;
    for (int k = 0; k < 2; k++) {
        const bc_state at = {.combustion_c = 25.0, .metering_c = 0.0, .metering_pa = 101325.0, .edition = k == 0 ? 1995 : 2016};

        assert_ok(bc_reference_at(&at, &of[k], &err), &err);
    }
    for (size_t i = 0; i < bc_species_count(); i++) {
        const char *old_source = bc_reference_heat_source(i, 1995), *new_source = bc_reference_heat_source(i, 2016);
        const bool old_has = strstr(old_source, "1995") != NULL, new_has = strstr(new_source, "2016") != NULL;

        if (of[0].gross_j_per_mol[i] == 0.0)
            continue; /* inert: no table is needed */
        both += old_has && new_has;
        neither += !old_has && !new_has;
        for (int k = 0; k < 2; k++) {
            const bool own = k == 0 ? old_has : new_has, other = strstr(k == 0 ? old_source : new_source, k == 0 ? "2016" : "1995") != NULL;

            only[k] += other;
            assert_int_equal(of[k].heat_origin[i], own ? BC_ORIGIN_EDITION : other ? BC_ORIGIN_OTHER_EDITION : BC_ORIGIN_FORMATION);
            if (other)
                assert_within_at(bc_species_id(i), of[0].gross_j_per_mol[i], of[1].gross_j_per_mol[i], 0.0);
        }
    }
    assert_true(both > 10 && neither > 0 && only[0] > 0);
}

/* Between the columns 1 - Z of air follows the parabola through 0, 15 and 20 C, whose third difference vanishes:
 * f(3) - 3 f(2) + 3 f(1) - f(0) = 0 over equal steps, here from 5 to 20 C; both editions have the three columns. */
static void z_of_air_lies_on_the_parabola_of_its_columns(void **state)
{
    (void)state;
    for (int edition = 1995; edition <= 2016; edition += 21) {
        double z[5];

        for (int i = 0; i < 5; i++) {
            const bc_state at = {.combustion_c = 15.0, .metering_c = 5.0 * i, .metering_pa = 101325.0, .edition = edition};
            bc_reference r;
            bc_error err;

            assert_ok(bc_reference_at(&at, &r, &err), &err);
            z[i] = r.air_z;
        }
        assert_within(z[4] - 3.0 * z[3] + 3.0 * z[2] - z[1], 0.0, 1e-12);
        assert_within(z[3] - 3.0 * z[2] + 3.0 * z[1] - z[0], 0.0, 1e-12);
    }
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(the_constants_have_the_uncertainties_of_annex_a),
        cmocka_unit_test(a_heat_that_an_edition_lacks_is_that_of_the_other),
        cmocka_unit_test(z_of_air_lies_on_the_parabola_of_its_columns),
        cmocka_unit_test(the_example_of_annex_d_comes_out),
        cmocka_unit_test(net_heats_are_the_gross_ones_less_the_water_formed),
        cmocka_unit_test(metering_pressure_enters_volume_and_compression),
        cmocka_unit_test(sixty_fahrenheit_uses_its_own_columns),
        cmocka_unit_test(a_gas_metered_saturated_is_worth_less_by_its_water),
        cmocka_unit_test(figures_of_the_1995_edition_are_its_own),
        cmocka_unit_test(a_combustion_temperature_between_the_columns_joins_them_within_0_01_per_cent),
        cmocka_unit_test(figures_off_the_columns_are_labelled_as_formation_balance),
        cmocka_unit_test(figures_of_the_other_edition_are_labelled_as_such),
        cmocka_unit_test(a_metering_temperature_between_the_columns_is_smooth),
        cmocka_unit_test(a_gas_without_summation_is_ideal),
        cmocka_unit_test(air_has_the_density_of_air),
        cmocka_unit_test(volume_figures_end_where_z_falls_below_0_9),
        cmocka_unit_test(a_state_that_is_out_of_range_leaves_the_reference_untouched),
        cmocka_unit_test(molar_figures_are_linear_under_mixing),
        cmocka_unit_test(the_root_of_non_ideality_is_linear_under_mixing),
        cmocka_unit_test(gross_is_over_net_exactly_by_the_hydrogen),
        cmocka_unit_test(the_wobbe_index_is_heat_over_the_root_of_relative_density),
        cmocka_unit_test(the_bases_of_a_heat_belong_together),
        cmocka_unit_test(both_editions_agree_on_natural_gas_within_0_05_per_cent),
        cmocka_unit_test(volumes_of_two_states_differ_by_their_gas_law),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
