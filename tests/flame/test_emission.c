/* SPDX-License-Identifier: MIT */
/* test_emission.c - a pollutant in all its forms, and the F-factors of Method 19. */
#include "flame_support.h"

#include "bluecone/emission.h"
#include "bluecone/flue.h"
#include "bluecone/iso6976.h"
#include "bluecone/oxidant.h"

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

/* F-factors of 40 CFR 60 appendix A, Method 19: scf per million Btu gross, 68 F, air of 20.9 % oxygen, 385.3 scf/lbmol. */
static void f_factors_are_those_of_method_19(void **state)
{
    static const struct {
        const char *fuel;
        char which; /* d dry, w wet, c carbon */
        double expected, tolerance;
        const char *source;
    } ROWS[] = {
        {"methane=100", 'd', 8710.0, 0.015 * 8710.0, "table 19-2 for natural gas: 1.5 %"},
        {"methane=100", 'c', 1040.0, 0.04 * 1040.0, "table 19-2 for natural gas: 4 %"},
        {"methane=100", 'w', 10610.0, 0.015 * 10610.0, "table 19-2 for natural gas, value from memory"},
        {"propane=100", 'd', 8710.0, 0.03 * 8710.0, "table 19-2: 3 %"},
        {"propane=100", 'c', 1190.0, 0.03 * 1190.0, "table 19-2: 3 %"},
        {"propane=100", 'w', 10200.0, 0.03 * 10200.0, "table 19-2, value from memory: 3 %"},
        {"n-butane=100", 'd', 8710.0, 0.03 * 8710.0, "table 19-2: 3 %"},
        {"n-butane=100", 'c', 1250.0, 0.03 * 1250.0, "table 19-2: 3 %"},
        {"n-butane=100", 'w', 10390.0, 0.03 * 10390.0, "table 19-2, value from memory: 3 %"},
        {"methane=100", 'w', 10636.2, 5.3, "balance: 0.05 %"},
        {"ethane=100", 'd', 8755.1, 4.4, "balance: 0.05 %"},
        {"ethane=100", 'c', 1148.5, 0.6, "balance: 0.05 %"},
        {"propane=100", 'w', 10469.1, 5.2, "balance: 0.05 %"},
        {"n-butane=100", 'd', 8908.0, 4.5, "balance: 0.05 %"},
        {"n-butane=100", 'c', 1245.9, 0.6, "balance: 0.05 %"}};
    const bc_gas air = gas_of("oxygen=20.9,nitrogen=79.1");

    (void)state;
    for (size_t i = 0; i < BC_COUNT(ROWS); i++) {
        const bc_gas fuel = gas_of(ROWS[i].fuel);
        const double btu_per_lbmol = value_of(&fuel).gross_j_per_mol / 1055.05585 * 453.59237;
        bc_flue flue;

        assert_int_equal(bc_flue_at(&fuel, &air, 1.0, &flue, NULL), BC_OK);
        const double mol = ROWS[i].which == 'd'   ? flue.dry_mol
                           : ROWS[i].which == 'w' ? flue.wet_mol
                                                  : flue.wet.x[SPECIES_carbon_dioxide] * flue.wet_mol;

        assert_within(mol * 385.3 / btu_per_lbmol * 1e6, ROWS[i].expected, ROWS[i].tolerance, ROWS[i].source);
    }
}

static bc_emission_basis methane_basis(bc_pollutant pollutant)
{
    const bc_gas methane = gas_of("methane=100");
    const bc_flue flue = burn("methane=100", 1.0);

    return (bc_emission_basis){pollutant, 0.03, 0.03, 0.20946, flue.dry_mol, value_of(&methane).net_j_per_mol};
}

/* 100 mg/m3 at 3 % dry is 27.865 mg/MJ net for methane, by balance; 0.01: four digits of the volume. */
static void milligrams_per_megajoule_follow_from_the_flue_volume(void **state)
{
    const bc_emission_basis basis = methane_basis(BC_POLLUTANT_CO);
    bc_emission e;

    (void)state;
    assert_int_equal(bc_emission_convert(&basis, BC_EMISSION_DENSITY, 100e-6, &e, NULL), BC_OK);
    assert_within(e.kg_per_j * 1e12, 27.865, 0.01, "mg/MJ");
}

/* 80 ppm at 3 % is 26.369 ppm at 15 %, 20.9 % basis: 80 (20.9 - 15)/(20.9 - 3); three printed decimals. */
static void the_reference_oxygen_dilutes(void **state)
{
    bc_emission_basis basis = methane_basis(BC_POLLUTANT_NOX);
    bc_emission at_3;
    bc_emission at_15;

    (void)state;
    basis.o2_air = BC_EMISSION_AIR_US;
    basis.o2_reference = 0.15;
    assert_int_equal(bc_emission_convert(&basis, BC_EMISSION_FRACTION, 80e-6, &at_3, NULL), BC_OK);
    assert_within(at_3.kg_per_m3_at_ref, at_3.kg_per_m3 * (20.9 - 15.0) / (20.9 - 3.0), 1e-12 * at_3.kg_per_m3, "mg/m3 at 15 %");
    basis.o2_measured = 0.15;
    assert_int_equal(bc_emission_convert(&basis, BC_EMISSION_DENSITY_AT_REF, at_3.kg_per_m3_at_ref, &at_15, NULL), BC_OK);
    assert_within(at_15.fraction * 1e6, 26.369, 1e-3, "ppm at 15 %");
}

/* M/22.414: 2.0525 mg/m3 for 1 ppm NO2 (13. BImSchV practice), SO2 2.8582; CO 28.0101/22.414 = 1.2497. */
static void a_ppm_has_its_milligrams(void **state)
{
    static const double MG[] = {[BC_POLLUTANT_NOX] = 2.0525, [BC_POLLUTANT_CO] = 1.2497, [BC_POLLUTANT_SO2] = 2.8582};

    (void)state;
    for (int p = 0; p < BC_POLLUTANTS; p++) {
        const bc_emission_basis basis = methane_basis((bc_pollutant)p);
        bc_emission e;

        assert_int_equal(bc_emission_convert(&basis, BC_EMISSION_FRACTION, 1e-6, &e, NULL), BC_OK);
        assert_within(e.kg_per_m3 * 1e6, MG[p], 2e-4, "mg/m3 a ppm");
    }
}

static void emissions_out_of_range_are_refused(void **state)
{
    bc_emission_basis basis = methane_basis(BC_POLLUTANT_CO);
    bc_emission e = {.fraction = 9.0};
    bc_error err = {.status = BC_OK};

    (void)state;
    assert_refused(bc_emission_convert(&basis, BC_EMISSION_FRACTION, -1e-6, &e, &err), BC_ERR_RANGE, &err);
    assert_refused(bc_emission_convert(&basis, (bc_emission_form)4, 1e-6, &e, &err), BC_ERR_USAGE, &err);
    basis.o2_measured = 0.2107;
    assert_int_equal(bc_emission_convert(&basis, BC_EMISSION_FRACTION, 1e-6, &e, &err), BC_ERR_RANGE);
    assert_non_null(strstr(err.message, "21.07 % oxygen measured"));
    assert_non_null(strstr(err.message, "below the 20.9"));
    basis.o2_measured = 0.20946;
    assert_refused(bc_emission_convert(&basis, BC_EMISSION_FRACTION, 1e-6, &e, &err), BC_ERR_RANGE, &err);
    basis.o2_measured = 0.03;
    basis.o2_reference = 0.2107;
    assert_int_equal(bc_emission_convert(&basis, BC_EMISSION_FRACTION, 1e-6, &e, &err), BC_ERR_RANGE);
    assert_non_null(strstr(err.message, "reference oxygen of 21.07 %"));
    assert_non_null(strstr(err.message, "below the 20.9"));
    basis.o2_reference = 0.21;
    assert_refused(bc_emission_convert(&basis, BC_EMISSION_FRACTION, 1e-6, &e, &err), BC_ERR_RANGE, &err);
    basis.o2_reference = 0.03;
    basis.heat_j_per_mol = 0.0;
    assert_refused(bc_emission_convert(&basis, BC_EMISSION_FRACTION, 1e-6, &e, &err), BC_ERR_RANGE, &err);
    assert_within(e.fraction, 9.0, 0.0, "output after refusals");
    basis = methane_basis(BC_POLLUTANT_CO);
    basis.o2_measured = 0.0;
    basis.o2_reference = 0.0;
    assert_int_equal(bc_emission_convert(&basis, BC_EMISSION_DENSITY, 1e-6, &e, NULL), BC_OK);
    assert_within(e.kg_per_m3_at_ref, 1e-6, 1e-20, "undiluted on both sides");
}

static void every_form_of_an_emission_leads_back_to_the_others(void **state)
{
    const bc_emission_basis basis = {BC_POLLUTANT_SO2, 0.047, 0.03, BC_EMISSION_AIR_EU, 8.73, 8.1e5};
    bc_emission e;

    (void)state;
    assert_int_equal(bc_emission_convert(&basis, BC_EMISSION_FRACTION, 113e-6, &e, NULL), BC_OK);
    const double forms[] = {e.fraction, e.kg_per_m3, e.kg_per_m3_at_ref, e.kg_per_j};

    for (int form = 0; form <= BC_EMISSION_PER_HEAT; form++) {
        bc_emission back;

        assert_int_equal(bc_emission_convert(&basis, (bc_emission_form)form, forms[form], &back, NULL), BC_OK);
        assert_within(back.fraction, 113e-6, 1e-18, "ppm");
        assert_within(back.kg_per_j, e.kg_per_j, 1e-14 * e.kg_per_j, "per heat");
    }
}

static void with_the_oxygen_of_the_oxidant_dilution_is_exact(void **state)
{
    const bc_gas fuel = gas_of("methane=61,carbon-dioxide=39");
    const bc_gas air = bc_oxidant_air();
    bc_emission_basis basis = {BC_POLLUTANT_NOX, 0.0, 0.05, 0.20946, burn("methane=61,carbon-dioxide=39", 1.0).dry_mol, 4.9e5};
    const double pollutant_mol = 3.3e-4; /* per mol of fuel, whatever the dilution */
    double first = 0.0;

    (void)state;
    for (int i = 0; i < 5; i++) {
        bc_flue flue;
        bc_emission e;

        assert_int_equal(bc_flue_at(&fuel, &air, 1.03 + 0.27 * i, &flue, NULL), BC_OK);
        basis.o2_measured = flue.dry.x[SPECIES_oxygen];
        assert_int_equal(bc_emission_convert(&basis, BC_EMISSION_FRACTION, pollutant_mol / flue.dry_mol, &e, NULL), BC_OK);
        first = i == 0 ? e.kg_per_m3_at_ref : first;
        assert_within(e.kg_per_m3_at_ref, first, 1e-12 * first, "at the reference");
        assert_within(e.kg_per_j, pollutant_mol * bc_species_molar_mass_kg_per_mol(SPECIES_nitrogen_dioxide) / 4.9e5, 1e-12 * e.kg_per_j, "per heat");
    }
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(f_factors_are_those_of_method_19),
        cmocka_unit_test(a_ppm_has_its_milligrams),
        cmocka_unit_test(the_reference_oxygen_dilutes),
        cmocka_unit_test(milligrams_per_megajoule_follow_from_the_flue_volume),
        cmocka_unit_test(with_the_oxygen_of_the_oxidant_dilution_is_exact),
        cmocka_unit_test(every_form_of_an_emission_leads_back_to_the_others),
        cmocka_unit_test(emissions_out_of_range_are_refused),
    };

    return cmocka_run_group_tests_name("emission", tests, NULL, NULL);
}
