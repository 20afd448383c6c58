/* SPDX-License-Identifier: MIT */
/* test_contract_terms.c - shares on other bases, prices on every basis, confusions, printed figures. */
#include "support.h"

#include "bluecone/printed.h"
#include "bluecone/trade.h"
#include "bluecone/trap.h"

#define LITERAL "methane=87.3,ethane=6.1,propane=2.3,n-hexane=0.4,nitrogen=2.2,carbon-dioxide=1.7"

static bc_contract *read_text(const char *text)
{
    static bc_contract c;
    bc_error err;

    assert_ok(bc_contract_read(write_scratch(text, strlen(text)), &c, &err), &err);
    return &c;
}

static bc_composition *gas_of(const char *literal)
{
    static bc_composition c;
    bc_error err;

    assert_ok(bc_composition_parse(literal, &c, &err), &err);
    return &c;
}

static double first_value(const bc_contract *c, const bc_gas *gas)
{
    double value = 0.0;
    bc_error err;

    assert_ok(bc_limit_value(c, 0, gas, &value, &err), &err);
    return value;
}

/* A composition stated by mass, read back by a limit on mass; and by volume. */
static void a_share_comes_back_on_the_basis_it_was_stated_on(void **state)
{
    (void)state;
    assert_within(first_value(read_text("[limit propane]\nmax = 9\nbasis = mass\n"), &gas_of("mass:methane=83.1,propane=11.7,carbon-dioxide=5.2")->gas), 11.7,
                  1e-9);
    assert_within(first_value(read_text("[limit propane]\nmax = 9\nbasis = volume\n"), &gas_of("volume:methane=83.1,propane=11.7,carbon-dioxide=5.2")->gas),
                  11.7, 1e-9);
    assert_within(first_value(read_text("[limit propane]\nmax = 9\nbasis = mole\n"), &gas_of("methane=83.1,propane=11.7,carbon-dioxide=5.2")->gas), 11.7, 1e-9);
}

/* The same money on every basis: price times amount is one number. */
static void a_price_is_the_same_money_on_every_basis(void **state)
{
    static const char *const PRICES[] = {"31.7 EUR/MWh", "9.1 EUR/GJ net", "0.43 EUR/kg", "0.37 EUR/m3", "1.13 EUR/therm"};
    const bc_composition *gas = gas_of(LITERAL);

    (void)state;
    for (size_t i = 0; i < COUNT(PRICES); i++) {
        char text[200];
        bc_trade t;
        bc_error err;

        (void)snprintf(text, sizeof text, "[contract]\nat = 25/0\nprice = %s\nannual_volume = 3.1e6 m3\n[limit hhv]\nmin = 1\n", PRICES[i]);
        assert_ok(bc_contract_trade(read_text(text), NULL, &gas->gas, &t, &err), &err);
        assert_within(t.annual_m3, 3.1e6, 1e-6);
        assert_within(t.price_per_m3 * t.annual_m3, t.annual_cost, 1e-6 * t.annual_cost);
        assert_within(t.price_per_kg * t.annual_kg, t.annual_cost, 1e-6 * t.annual_cost);
        assert_within(t.price_per_net_j * t.annual_net_j, t.annual_cost, 1e-6 * t.annual_cost);
        assert_within(t.co2_kg_per_net_j * t.annual_net_j, t.annual_co2_kg, 1e-6 * t.annual_co2_kg);
    }
}

static void a_gas_without_heat_has_no_price(void **state)
{
    bc_trade t = {.annual_kg = -7.0};
    bc_error err = {.status = BC_OK};

    (void)state;
    assert_refused(bc_contract_trade(read_text("[contract]\nprice = 0.43 EUR/kg\n[limit density]\nmin = 1\n"), NULL,
                                     &gas_of("nitrogen=71,argon=29")->gas, &t, &err), &err, BC_ERR_RANGE, "without heat");
    assert_within(t.annual_kg, -7.0, 0.0);
}

static void a_net_annual_energy_is_net(void **state)
{
    bc_trade t;
    bc_error err;

    (void)state;
    assert_ok(bc_contract_trade(read_text("[contract]\nannual_energy = 70 GWh net\n[limit hhv]\nmin = 1\n"), NULL, &gas_of(LITERAL)->gas, &t, &err), &err);
    assert_within(t.annual_net_j / 3.6e12, 70.0, 1e-9);
    assert_false(t.has_price);
}

static double moved(const char *id, const char *text, const bc_composition *gas, bool *applies)
{
    const bc_contract *c = read_text(text);
    const bc_trap_gas words = {gas, &gas->gas};
    bc_trapped trapped;
    bc_error err;

    for (size_t t = 0; t < bc_trap_count(); t++)
        if (strcmp(bc_trap_id(t), id) == 0) {
            assert_ok(bc_trap_value(t, c, 0, &words, &trapped, &err), &err);
            *applies = trapped.applies;
            return trapped.value / first_value(c, &gas->gas) - 1.0;
        }
    fail_msg("no confusion %s", id);
    return 0.0;
}

/* Sizes as textbooks give them for natural gas: metering 0 for 15 C 5.5 %, gross for net 11 %, 14.73 for 14.696 psia 0.23 %. */
static void confusions_have_the_size_that_textbooks_give(void **state)
{
    static const char HHV[] = "[limit hhv]\nmin = 1\n";
    const bc_composition *methane = gas_of("methane=100");
    bool applies = false;

    (void)state;
    assert_within(moved("metering-0", HHV, methane, &applies), 0.055, 0.0005);
    assert_true(applies);
    assert_within(moved("metering-20", HHV, methane, &applies), 288.15 / 293.15 - 1.0, 0.0002);
    assert_within(moved("net-for-gross", "[limit lhv]\nmin = 1\n", methane, &applies), 0.110, 0.0015);
    assert_within(moved("pressure-14.73", HHV, methane, &applies), 14.73 / 14.69595 - 1.0, 1e-5);
    assert_within(moved("ideal", HHV, methane, &applies), -0.0020, 0.0001);
    assert_within(moved("saturated", HHV, methane, &applies), -0.0168 + 0.0008, 0.0004); /* 1.68 % vapour, less its heat of condensation */
    assert_within(moved("metering-15", HHV, methane, &applies), 0.0, 0.0);
    assert_false(applies);
}

static void a_sum_that_was_scaled_shows_what_scaling_did(void **state)
{
    const bc_composition *gas = gas_of("methane=93.1,ethane=5.9");
    bool applies = false;

    (void)state;
    assert_within(moved("not-normalised", "[limit hhv]\nmin = 1\n", gas, &applies), -0.01, 1e-12);
    assert_true(applies);
    assert_within(moved("not-normalised", "[limit wobbe-gross]\nmin = 1\n", gas, &applies), sqrt(0.99) - 1.0, 1e-12);
    (void)moved("c6+-hexane", "[limit hhv]\nmin = 1\n", gas, &applies);
    assert_false(applies);
}

/* Reading mole per cent as mass per cent and what that makes as mole per cent again must come back. */
static void a_confusion_of_basis_is_that_of_reading_the_words_so(void **state)
{
    bool applies = false;
    const double by_trap = moved("mass-percent", "[limit hhv]\nmin = 1\n", gas_of(LITERAL), &applies);
    const double right = first_value(read_text("[limit hhv]\nmin = 1\n"), &gas_of(LITERAL)->gas);
    const double read_so = first_value(read_text("[limit hhv]\nmin = 1\n"), &gas_of("mass:" LITERAL)->gas);

    (void)state;
    assert_within(by_trap, read_so / right - 1.0, 1e-12);
}

/* What we compute at a state, printed with its digits, is traced back to that state. */
static void figures_printed_at_a_state_are_traced_back_to_it(void **state)
{
    static const char *const STATES[] = {"25/20", "0/0", "25/0", "60F/60F"};
    const bc_composition *gas = gas_of(LITERAL);

    (void)state;
    for (size_t i = 0; i < COUNT(STATES); i++) {
        bc_state at = bc_state_default();
        bc_reference reference;
        bc_printed p = {.count = 0};
        bc_fits fits;
        char text[40];
        bc_error err;

        assert_int_equal(bc_state_parse(STATES[i], &at, NULL), BC_OK);
        assert_int_equal(bc_reference_at(&at, &reference, NULL), BC_OK);
        const bc_value v = bc_value_of(&reference, &gas->gas);

        (void)snprintf(text, sizeof text, "%.4f MJ/m3", v.gross_j_per_m3 * 1e-6);
        assert_ok(bc_printed_add(&p, "hhv", text, &err), &err);
        (void)snprintf(text, sizeof text, "%.5f kWh/Nm3", v.wobbe_gross_j_per_m3 / 3.6e6);
        assert_ok(bc_printed_add(&p, "wobbe-gross", text, &err), &err);
        (void)snprintf(text, sizeof text, "%.5f", v.relative_density);
        assert_ok(bc_printed_add(&p, "relative-density", text, &err), &err);
        assert_ok(bc_printed_fit(&p, &gas->gas, NULL, &fits, &err), &err);
        assert_int_equal(fits.best[0].fit, BC_FIT_DIGITS);
        assert_int_equal(fits.explain, 1);
        assert_within(fits.best[0].state.combustion_c, at.combustion_c, 1e-9);
        assert_within(fits.best[0].state.metering_c, at.metering_c, 1e-9);
        assert_int_equal(fits.best[0].state.edition, 2016);
        assert_false(fits.best[0].exchanged || fits.best[0].ideal || fits.best[0].state.saturated);
    }
}

static void a_gross_heat_under_a_net_heading_is_found(void **state)
{
    const bc_composition *gas = gas_of(LITERAL);
    bc_reference reference;
    const bc_state at = bc_state_default();
    bc_printed p = {.count = 0};
    bc_fits fits;
    char text[40];
    bc_error err;

    (void)state;
    assert_int_equal(bc_reference_at(&at, &reference, NULL), BC_OK);
    const bc_value v = bc_value_of(&reference, &gas->gas);

    (void)snprintf(text, sizeof text, "%.4f", v.gross_j_per_m3 * 1e-6);
    assert_ok(bc_printed_add(&p, "lhv", text, &err), &err);
    (void)snprintf(text, sizeof text, "%.4f", v.net_j_per_m3 * 1e-6);
    assert_ok(bc_printed_add(&p, "hhv", text, &err), &err);
    assert_ok(bc_printed_fit(&p, &gas->gas, NULL, &fits, &err), &err);
    assert_int_equal(fits.best[0].fit, BC_FIT_DIGITS);
    assert_true(fits.best[0].exchanged);
}

static void figures_of_no_state_are_said_to_be_of_none(void **state)
{
    bc_printed p = {.count = 0};
    bc_fits fits;
    bc_error err;

    (void)state;
    assert_ok(bc_printed_add(&p, "hhv", "52.31 MJ/m3", &err), &err);
    assert_ok(bc_printed_fit(&p, &gas_of(LITERAL)->gas, NULL, &fits, &err), &err);
    assert_int_equal(fits.best[0].fit, BC_FIT_NONE);
    assert_int_equal(fits.explain, 0);
    assert_refused_at("unit", bc_printed_add(&p, "hhv", "52.31 MJ/kg", &err), &err, BC_ERR_USAGE, "does not fit");
    assert_refused_at("number", bc_printed_add(&p, "hhv", "much", &err), &err, BC_ERR_INPUT, "");
    p.count = 0;
    assert_refused_at("none", bc_printed_fit(&p, &gas_of(LITERAL)->gas, NULL, &fits, &err), &err, BC_ERR_USAGE, "no printed figures");
}

static void half_a_digit_is_that_of_the_number_as_written(void **state)
{
    static const struct {
        const char *text;
        double half;
    } WRITTEN[] = {{"41.2 MJ/m3", 0.05}, {"41.20", 0.005}, {"41", 0.5}, {"1.2e3", 50.0}, {"4.12e1 MJ/m3", 0.05}};
    bc_printed p = {.count = 0};
    bc_error err;

    (void)state;
    for (size_t i = 0; i < COUNT(WRITTEN); i++) {
        assert_ok(bc_printed_add(&p, "hhv", WRITTEN[i].text, &err), &err);
        assert_within(p.figures[i].half, WRITTEN[i].half, 1e-12 * WRITTEN[i].half);
    }
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(a_share_comes_back_on_the_basis_it_was_stated_on),
        cmocka_unit_test(a_price_is_the_same_money_on_every_basis),
        cmocka_unit_test(a_gas_without_heat_has_no_price),
        cmocka_unit_test(a_net_annual_energy_is_net),
        cmocka_unit_test(confusions_have_the_size_that_textbooks_give),
        cmocka_unit_test(a_sum_that_was_scaled_shows_what_scaling_did),
        cmocka_unit_test(a_confusion_of_basis_is_that_of_reading_the_words_so),
        cmocka_unit_test(figures_printed_at_a_state_are_traced_back_to_it),
        cmocka_unit_test(a_gross_heat_under_a_net_heading_is_found),
        cmocka_unit_test(figures_of_no_state_are_said_to_be_of_none),
        cmocka_unit_test(half_a_digit_is_that_of_the_number_as_written),
    };

    return cmocka_run_group_tests_name("contract terms", tests, NULL, remove_scratch);
}
