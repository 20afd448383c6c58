/* SPDX-License-Identifier: MIT */
/* test_ratio.c - figures as ratios of sums against the floors that compute them. */
#include "bluecone/ratio.h"

#include "bluecone/quantity.h"
#include "support.h"

/* Both ways are a few sums of doubles. */
#define TOLERANCE 1e-12

static const char *const STATES[] = {"15/15", "25/0", "60F/60F@14.73psi", "21.5/17.3@95kPa"};

/* Mostly methane, with some of everything that burns and does not. */
static bc_gas random_gas(chance *c)
{
    static const char *const PARTS[] = {"methane", "ethane",   "propane",        "n-butane", "n-hexane", "hydrogen", "carbon-monoxide",
                                        "oxygen",  "nitrogen", "carbon-dioxide", "helium",   "argon",    "water",    "hydrogen-sulfide"};
    double amounts[BC_SPECIES_CAPACITY] = {0.0};
    bc_gas gas;

    for (size_t i = 0; i < COUNT(PARTS); i++) {
        size_t species;

        assert_int_equal(bc_species_find(PARTS[i], &species, NULL), BC_OK);
        amounts[species] = (i == 0 ? 20.0 : 1.0) * -log(chance_uniform(c));
    }
    assert_int_equal(bc_gas_from_amounts(amounts, &gas, NULL), BC_OK);
    return gas;
}

static void reference_of(const char *text, bool saturated, int edition, bc_reference *reference)
{
    bc_state s = bc_state_default();
    bc_error err;

    s.edition = edition;
    s.saturated = saturated;
    assert_ok(bc_state_parse(text, &s, &err), &err);
    assert_ok(bc_reference_at(&s, reference, &err), &err);
}

static void compare(size_t quantity, const bc_reference *reference, const bc_gas *gas)
{
    const char *id = bc_quantity_at(quantity)->id;
    bc_ratio ratio;
    bc_subject subject;
    bc_figure figure;
    bc_error err;
    double value = 0.0;

    if (bc_ratio_of_quantity(quantity, reference, &ratio, &err) != BC_OK || ratio.proxy)
        return;
    assert_ok(bc_subject_make(reference, gas, NULL, &subject, &err), &err);
    assert_ok(bc_quantity_evaluate(quantity, &subject, &figure, &err), &err);
    assert_ok(bc_ratio_evaluate(&ratio, gas, &value, &err), &err);
    /* the gap of the two routes is a difference of heats, in percent */
    assert_within_at(id, value, figure.value, TOLERANCE * fmax(fabs(figure.value), strcmp(id, "formation-gap") == 0 ? 100.0 : 0.0));
}

static void every_ratio_is_its_quantity_at_every_state(void **state)
{
    chance c = {11};
    bc_reference reference;

    (void)state;
    for (size_t s = 0; s < COUNT(STATES); s++)
        for (int k = 0; k < 4; k++) {
            reference_of(STATES[s], k % 2 == 1, k / 2 == 1 && s != 2 ? 1995 : 2016, &reference);
            for (int i = 0; i < 10; i++) {
                const bc_gas gas = random_gas(&c);

                for (size_t q = 0; q < bc_quantity_count(); q++)
                    compare(q, &reference, &gas);
            }
        }
}

static void every_figure_of_iso_6976_and_of_the_balances_is_a_ratio(void **state)
{
    static const char *const OTHERS[] = {"acid-dew-point", "flame-temperature", "flame-temperature-complete", "lfl", "ufl", "burning-velocity"};
    bc_reference reference;
    size_t count = 0;

    (void)state;
    reference_of("15/15", false, 2016, &reference);
    for (size_t q = 0; q < bc_quantity_count(); q++) {
        bc_ratio ratio;
        bc_error err;
        const bc_status status = bc_ratio_of_quantity(q, &reference, &ratio, &err);
        bool other = false;

        for (size_t i = 0; i < COUNT(OTHERS); i++)
            other = other || strcmp(OTHERS[i], bc_quantity_at(q)->id) == 0;
        if (other)
            assert_refused_at(bc_quantity_at(q)->id, status, &err, BC_ERR_USAGE, "no ratio of sums");
        count += status == BC_OK;
    }
    assert_true(count >= 32); /* 19 of ISO 6976, 10 of atoms, 3 of formation */
}

/* A figure a mole of gas is divided by nothing, whatever the compiler leaves there. */
static void what_is_divided_by_nothing_has_no_divisor(void **state)
{
    static const char *const IDS[] = {"oxygen-demand", "air-demand", "flue-wet", "flue-dry", "hhv-formation", "lhv-formation"};
    bc_reference reference;

    (void)state;
    reference_of("15/15", false, 2016, &reference);
    for (size_t k = 0; k < COUNT(IDS); k++) {
        size_t quantity = 0;
        bc_ratio ratio;
        bc_error err;

        assert_int_equal(bc_quantity_find(IDS[k], &quantity, NULL), BC_OK);
        assert_ok(bc_ratio_of_quantity(quantity, &reference, &ratio, &err), &err);
        assert_within(ratio.under_power, 0.0, 0.0);
        for (size_t i = 0; i < BC_SPECIES_CAPACITY; i++)
            assert_within(ratio.under[i], 0.0, 0.0);
    }
}

static void a_dew_point_rises_with_its_ratio(void **state)
{
    chance c = {5};
    bc_reference reference;
    bc_ratio ratio;
    bc_error err;
    size_t q;

    (void)state;
    reference_of("15/15", false, 2016, &reference);
    assert_ok(bc_quantity_find("flue-dew-point", &q, &err), &err);
    assert_ok(bc_ratio_of_quantity(q, &reference, &ratio, &err), &err);
    assert_true(ratio.proxy);
    for (int i = 0; i < 200; i++) {
        double r[2];
        bc_figure f[2];

        for (int k = 0; k < 2; k++) {
            const bc_gas gas = random_gas(&c);
            bc_subject subject;

            assert_ok(bc_subject_make(&reference, &gas, NULL, &subject, &err), &err);
            assert_ok(bc_quantity_evaluate(q, &subject, &f[k], &err), &err);
            assert_ok(bc_ratio_evaluate(&ratio, &gas, &r[k], &err), &err);
        }
        assert_true((f[0].value > f[1].value) == (r[0] > r[1]));
    }
}

/* 5 mg of H2S in a cubic metre: 34.08 g/mol, and a molar volume of 23.6 l at 15 C. */
static void a_concentration_is_mass_per_volume_of_real_gas(void **state)
{
    double weight[BC_SPECIES_CAPACITY] = {0.0};
    bc_gas gas = {{0.0}};
    bc_reference reference;
    bc_ratio ratio;
    bc_error err;
    double value = 0.0;
    size_t h2s, methane;

    (void)state;
    assert_ok(bc_species_find("hydrogen-sulfide", &h2s, &err), &err);
    assert_ok(bc_species_find("methane", &methane, &err), &err);
    reference_of("15/15", false, 2016, &reference);
    weight[h2s] = bc_species_molar_mass_kg_per_mol(h2s);
    gas.x[h2s] = 3.5e-6;
    gas.x[methane] = 1.0 - 3.5e-6;
    assert_ok(bc_ratio_of_concentration(weight, 1e6, &reference, &ratio, &err), &err);
    assert_ok(bc_ratio_evaluate(&ratio, &gas, &value, &err), &err);
    const bc_value v = bc_value_of(&reference, &gas);

    assert_within(value, 3.5e-6 * weight[h2s] / v.molar_volume_m3_per_mol * 1e6, 1e-9);
    ratio = bc_ratio_of_fraction(weight, 1.0);
    assert_ok(bc_ratio_evaluate(&ratio, &gas, &value, &err), &err);
    assert_within(value, 3.5e-6 * weight[h2s], 1e-18);
}

static void an_inert_gas_has_no_carbon_dioxide_per_heat(void **state)
{
    bc_gas gas = {{0.0}};
    bc_reference reference;
    bc_ratio ratio;
    bc_error err;
    double value = 17.0;
    size_t q, nitrogen;

    (void)state;
    reference_of("15/15", false, 2016, &reference);
    assert_ok(bc_species_find("nitrogen", &nitrogen, &err), &err);
    gas.x[nitrogen] = 1.0;
    assert_ok(bc_quantity_find("co2-factor-net", &q, &err), &err);
    assert_ok(bc_ratio_of_quantity(q, &reference, &ratio, &err), &err);
    assert_refused(bc_ratio_evaluate(&ratio, &gas, &value, &err), &err, BC_ERR_RANGE, "not above zero");
    assert_true(value == 17.0);
    assert_refused(bc_ratio_of_quantity(bc_quantity_count(), &reference, &ratio, &err), &err, BC_ERR_USAGE, "no quantity");
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(every_ratio_is_its_quantity_at_every_state),
        cmocka_unit_test(every_figure_of_iso_6976_and_of_the_balances_is_a_ratio),
        cmocka_unit_test(what_is_divided_by_nothing_has_no_divisor),
        cmocka_unit_test(a_dew_point_rises_with_its_ratio),
        cmocka_unit_test(a_concentration_is_mass_per_volume_of_real_gas),
        cmocka_unit_test(an_inert_gas_has_no_carbon_dioxide_per_heat),
    };

    return cmocka_run_group_tests_name("supply/test_ratio", tests, NULL, NULL);
}
