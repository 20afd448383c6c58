/* SPDX-License-Identifier: MIT */
/* test_offer.c - prices, intensities and flows, alone and in a composition file. */
#include "support.h"

#include "bluecone/composition.h"

static void prices_per_energy_mass_volume_and_amount_are_read(void **state)
{
    static const struct {
        const char *text;
        double si;
        bc_dimension of;
        bool net;
        const char *currency;
    } ROWS[] = {
        {"32 EUR/MWh", 32.0 / 3.6e9, BC_DIM_ENERGY, false, "EUR"},
        {"8.7 GBP/GJ net", 8.7e-9, BC_DIM_ENERGY, true, "GBP"},
        {"0.41 crowns/kg", 0.41, BC_DIM_MASS, false, "crowns"},
        {"0.37EUR/Nm3", 0.37, BC_DIM_VOLUME, false, "EUR"},
        {"7.3 USD/kmol", 7.3e-3, BC_DIM_AMOUNT, false, "USD"},
        {"11.3 USD/MMBtu gross", 11.3 / 1055.05585262e6, BC_DIM_ENERGY, false, "USD"},
    };

    (void)state;
    for (size_t i = 0; i < COUNT(ROWS); i++) {
        bc_per_amount p;
        char currency[BC_CURRENCY_MAX];
        bc_error err;

        assert_ok(bc_price_parse(ROWS[i].text, &p, currency, &err), &err);
        assert_within_at(ROWS[i].text, p.si, ROWS[i].si, 1e-14 * ROWS[i].si);
        assert_true(p.given && p.of == ROWS[i].of && p.net == ROWS[i].net);
        assert_string_equal(currency, ROWS[i].currency);
    }
}

static void intensities_and_flows_are_read_in_si(void **state)
{
    bc_per_amount p;
    bc_error err;

    (void)state;
    assert_ok(bc_intensity_parse("12 kg/MWh", &p, &err), &err);
    assert_within(p.si, 12.0 / 3.6e9, 1e-22);
    assert_ok(bc_intensity_parse("-310 g/MJ net", &p, &err), &err);
    assert_within(p.si, -0.31e-6, 1e-20);
    assert_true(p.net);
    assert_ok(bc_flow_parse("300 m3/h", &p, &err), &err);
    assert_within(p.si, 300.0 / 3600.0, 1e-16);
    assert_int_equal(p.of, BC_DIM_VOLUME);
    assert_ok(bc_flow_parse("2.5MW", &p, &err), &err);
    assert_within(p.si, 2.5e6, 0.0);
    assert_int_equal(p.of, BC_DIM_ENERGY);
}

/* Nm3 at 0 C, Sm3 at 15 C, scf at 60 F: units.def. */
static void a_volume_brings_the_temperature_it_is_counted_at_or_none(void **state)
{
    static const struct {
        const char *price, *flow;
        bool has_metering;
        double metering_c;
    } ROWS[] = {{"0.37 EUR/Nm3", "120 Nm3/h", true, 0.0},
                {"0.37 EUR/Sm3", "120 Sm3/h", true, 15.0},
                {"0.01 USD/scf", "120 scf/h", true, 140.0 / 9.0},
                {"0.37 EUR/m3", "120 m3/h", false, 0.0}};

    (void)state;
    for (size_t i = 0; i < COUNT(ROWS); i++) {
        bc_per_amount price, flow;
        char currency[BC_CURRENCY_MAX];
        bc_error err;

        assert_ok(bc_price_parse(ROWS[i].price, &price, currency, &err), &err);
        assert_ok(bc_flow_parse(ROWS[i].flow, &flow, &err), &err);
        assert_int_equal(price.has_metering, ROWS[i].has_metering);
        assert_int_equal(flow.has_metering, ROWS[i].has_metering);
        if (!ROWS[i].has_metering)
            continue;
        assert_within_at(ROWS[i].price, price.metering_c, ROWS[i].metering_c, 1e-9);
        assert_within_at(ROWS[i].flow, flow.metering_c, ROWS[i].metering_c, 1e-9);
    }
}

static void what_is_none_of_them_is_refused_with_the_form(void **state)
{
    bc_per_amount p;
    char currency[BC_CURRENCY_MAX];
    bc_error err = {.status = BC_OK};

    (void)state;
    assert_refused(bc_price_parse("32", &p, currency, &err), &err, BC_ERR_USAGE, "32 EUR/MWh|up to 15 letters");
    assert_refused(bc_price_parse("32 ABCDEFGHIJKLMNOP/MWh", &p, currency, &err), &err, BC_ERR_USAGE, "up to 15 letters");
    assert_refused(bc_price_parse("32 EUR/kkkkkkkkkkkkkkkkkkkkkkkkkkkkkkkkkkkkkkkkkkkkkkkkkkkkkkkkkkkkkkkkkkkkkkk", &p, currency, &err), &err, BC_ERR_USAGE,
                   "longer than 63 characters");
    assert_refused(bc_price_parse("32 /MWh", &p, currency, &err), &err, BC_ERR_USAGE, "number, currency");
    assert_refused(bc_price_parse("32 EUR/h", &p, currency, &err), &err, BC_ERR_USAGE, "no amount of gas");
    assert_refused(bc_price_parse("cheap", &p, currency, &err), &err, BC_ERR_INPUT, "cheap");
    assert_refused(bc_intensity_parse("12 m3/MWh", &p, &err), &err, BC_ERR_USAGE, "no mass of CO2");
    assert_refused(bc_intensity_parse("12 kg", &p, &err), &err, BC_ERR_USAGE, "12 kg/MWh");
    assert_refused(bc_flow_parse("12 kg", &p, &err), &err, BC_ERR_USAGE, "no flow");
    assert_refused(bc_flow_parse("0 kg/h", &p, &err), &err, BC_ERR_RANGE, "above zero");
    assert_refused(bc_flow_parse("1e-321 kg/h", &p, &err), &err, BC_ERR_RANGE, "above zero"); /* of a double nothing is left */
    assert_refused(bc_flow_parse("1e305 GW", &p, &err), &err, BC_ERR_RANGE, "computed with");
    assert_refused(bc_price_parse("1e305 EUR/mg", &p, currency, &err), &err, BC_ERR_RANGE, "computed with");
}

static void a_composition_file_may_state_the_terms_of_supply(void **state)
{
    static const char TEXT[] = "[gas]\nname = a\n[components]\nmethane = 100\n[supply]\nprice = 61 EUR/MWh\nco2 = 18 kg/MWh\n"
                               "max_flow = 350 m3/h\ncarbon = biogenic\n";
    static bc_composition c;
    bc_error err;

    (void)state;
    assert_ok(bc_composition_read(write_scratch(TEXT, strlen(TEXT)), &c, &err), &err);
    assert_true(c.offer.price.given && c.offer.co2.given && c.offer.max_flow.given && c.offer.biogenic);
    assert_string_equal(c.offer.currency, "EUR");
    assert_ok(bc_composition_parse("methane=100", &c, &err), &err);
    assert_false(c.offer.price.given || c.offer.biogenic);
}

static void bad_terms_of_supply_are_refused_with_their_line(void **state)
{
    static const struct {
        const char *text, *words;
    } ROWS[] = {
        {"[components]\nmethane = 100\n[supply]\nprice = 61\n", "32 EUR/MWh"},
        {"[components]\nmethane = 100\n[supply]\nprize = 61 EUR/MWh\n", "unknown key 'prize' in [supply]|known are price"},
        {"[components]\nmethane = 100\n[supply]\ncarbon = green\n", "fossil, biogenic"},
        {"[components]\nmethane = 100\n[supply]\nmax_flow = -1 m3/h\n", "above zero"},
    };
    static bc_composition c;

    (void)state;
    for (size_t i = 0; i < COUNT(ROWS); i++) {
        bc_error err = {.status = BC_OK};
        const bc_status status = bc_composition_read(write_scratch(ROWS[i].text, strlen(ROWS[i].text)), &c, &err);

        assert_refused_at(ROWS[i].text, status, &err, BC_ERR_INPUT, ROWS[i].words);
        assert_int_equal(err.line, 4);
    }
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(prices_per_energy_mass_volume_and_amount_are_read),
        cmocka_unit_test(intensities_and_flows_are_read_in_si),
        cmocka_unit_test(a_volume_brings_the_temperature_it_is_counted_at_or_none),
        cmocka_unit_test(what_is_none_of_them_is_refused_with_the_form),
        cmocka_unit_test(a_composition_file_may_state_the_terms_of_supply),
        cmocka_unit_test(bad_terms_of_supply_are_refused_with_their_line),
    };

    return cmocka_run_group_tests(tests, NULL, remove_scratch);
}
