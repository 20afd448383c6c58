/* SPDX-License-Identifier: MIT */
/* test_units.c - every unit against a definition or a printed table that is not ours. */
#include "support.h"

#include "bluecone/units.h"

/* What one of each unit is in SI, as its source prints it; tolerance half of the last printed digit,
 * nothing (rounding apart) where the definition is exact. */
#define EXACT 0.0
static const struct {
    const char *symbol, *si;
    double one, tolerance;
    const char *source;
} DEFINITIONS[] = {
    {"J", "J", 1.0, EXACT, "SI brochure (2019)"},
    {"kJ", "J", 1000.0, EXACT, "SI brochure (2019) table 7"},
    {"MJ", "J", 1000000.0, EXACT, "SI brochure (2019) table 7"},
    {"GJ", "J", 1.0e9, EXACT, "SI brochure (2019) table 7"},
    {"TJ", "J", 1.0e12, EXACT, "SI brochure (2019) table 7"},
    {"Wh", "J", 3.6e3, EXACT, "NIST SP 811 (2008) B.8: watt hour 3.6 E+03"},
    {"kWh", "J", 3.6e6, EXACT, "NIST SP 811 (2008) B.8: kilowatt hour 3.6 E+06"},
    {"MWh", "J", 3.6e9, EXACT, "NIST SP 811 (2008) B.8"},
    {"GWh", "J", 3.6e12, EXACT, "NIST SP 811 (2008) B.8"},
    {"cal", "J", 4.1868, EXACT, "NIST SP 811 (2008) B.8: calorie IT 4.1868"},
    {"kcal", "J", 4186.8, EXACT, "NIST SP 811 (2008) B.8: kilocalorie IT 4.1868 E+03"},
    {"Mcal", "J", 4.1868e6, EXACT, "as kcal"},
    {"Gcal", "J", 4.1868e9, EXACT, "as kcal"},
    {"kcal_th", "J", 4184.0, EXACT, "NIST SP 811 (2008) B.8: kilocalorie th 4.184 E+03"},
    {"Btu", "J", 1055.05585262, 0.5e-8, "NIST SP 811 (2008) B.8 footnote 9: 1.05505585262 E+03 exact"},
    {"kBtu", "J", 1055055.85262, 0.5e-5, "as Btu"},
    {"MMBtu", "J", 1055055852.62, 0.5e-2, "as Btu"},
    {"therm", "J", 105505585.262, 0.5e-3, "NIST SP 811 (2008) B.8: therm EC 1.05506 E+08"},
    {"therm_us", "J", 105480400.0, EXACT, "NIST SP 811 (2008) B.8: therm US 1.054804 E+08"},
    {"Dth", "J", 1055055852.62, 0.5e-2, "ten therm EC"},
    {"kg", "kg", 1.0, EXACT, "SI brochure (2019)"},
    {"g", "kg", 0.001, EXACT, "SI brochure (2019)"},
    {"mg", "kg", 0.000001, EXACT, "SI brochure (2019)"},
    {"t", "kg", 1000.0, EXACT, "SI brochure (2019) table 8"},
    {"lb", "kg", 0.45359237, EXACT, "NIST SP 811 (2008) B.8: pound avoirdupois 4.535924 E-01"},
    {"gr", "kg", 64.79891e-6, EXACT, "NIST SP 811 (2008) B.8: grain 6.479891 E-05 exact"},
    {"m3", "m3", 1.0, EXACT, "SI brochure (2019)"},
    {"dm3", "m3", 0.001, EXACT, "SI brochure (2019)"},
    {"L", "m3", 0.001, EXACT, "SI brochure (2019) table 8"},
    {"cm3", "m3", 0.000001, EXACT, "SI brochure (2019)"},
    {"ft3", "m3", 0.028316846592, 0.5e-12, "NIST SP 811 (2008) B.8: cubic foot 2.831685 E-02; 0.3048 m cubed by hand"},
    {"cf", "m3", 0.028316846592, 0.5e-12, "as ft3"},
    {"Ccf", "m3", 2.8316846592, 0.5e-10, "as ft3"},
    {"Mcf", "m3", 28.316846592, 0.5e-9, "as ft3"},
    {"MMcf", "m3", 28316.846592, 0.5e-6, "as ft3"},
    {"scf", "m3", 0.028316846592, 0.5e-12, "as ft3"},
    {"Nm3", "m3", 1.0, EXACT, "DIN 1343:1990"},
    {"Sm3", "m3", 1.0, EXACT, "ISO 13443:1996"},
    {"mol", "mol", 1.0, EXACT, "SI brochure (2019)"},
    {"kmol", "mol", 1000.0, EXACT, "SI brochure (2019)"},
    {"lbmol", "mol", 453.59237, EXACT, "pound over gram"},
    {"s", "s", 1.0, EXACT, "SI brochure (2019)"},
    {"min", "s", 60.0, EXACT, "SI brochure (2019) table 8"},
    {"h", "s", 3600.0, EXACT, "SI brochure (2019) table 8"},
    {"d", "s", 86400.0, EXACT, "SI brochure (2019) table 8"},
    {"W", "J/s", 1.0, EXACT, "SI brochure (2019)"},
    {"kW", "J/s", 1000.0, EXACT, "SI brochure (2019)"},
    {"MW", "J/s", 1.0e6, EXACT, "SI brochure (2019)"},
    {"GW", "J/s", 1.0e9, EXACT, "SI brochure (2019)"},
    {"Pa", "Pa", 1.0, EXACT, "SI brochure (2019)"},
    {"hPa", "Pa", 100.0, EXACT, "SI brochure (2019)"},
    {"kPa", "Pa", 1000.0, EXACT, "SI brochure (2019)"},
    {"MPa", "Pa", 1.0e6, EXACT, "SI brochure (2019)"},
    {"mbar", "Pa", 100.0, EXACT, "NIST SP 811 (2008) B.8: millibar 1.0 E+02"},
    {"bar", "Pa", 100000.0, EXACT, "NIST SP 811 (2008) B.8: bar 1.0 E+05"},
    {"atm", "Pa", 101325.0, EXACT, "NIST SP 811 (2008) B.8: standard atmosphere 1.01325 E+05"},
    {"psi", "Pa", 6894.757, 0.5e-3, "NIST SP 811 (2008) B.8: pound-force per square inch 6.894757 E+03"},
    {"psia", "Pa", 6894.757, 0.5e-3, "as psi"},
    {"psig", "Pa", 101325.0 + 6894.757, 0.5e-3, "as psi, above a standard atmosphere"},
    {"barg", "Pa", 201325.0, EXACT, "as bar, above a standard atmosphere"},
    {"mbarg", "Pa", 101425.0, EXACT, "as mbar, above a standard atmosphere"},
    {"kPag", "Pa", 102325.0, EXACT, "as kPa, above a standard atmosphere"},
    {"mmHg", "Pa", 133.3224, 0.5e-4, "NIST SP 811 (2008) B.8: millimetre of mercury, conventional 1.333224 E+02"},
    {"inHg", "Pa", 3386.389, 0.5e-3, "NIST SP 811 (2008) B.8: inch of mercury, conventional 3.386389 E+03"},
    {"inH2O", "Pa", 101325.0 + 249.0889, 0.5e-4, "NIST SP 811 (2008) B.8: inch of water, conventional 2.490889 E+02, above a standard atmosphere"},
    {"mmH2O", "Pa", 101325.0 + 9.80665, 1e-9, "NIST SP 811 (2008) B.8: millimeter of water, conventional 9.80665 E+00, above a standard atmosphere"},
    {"K", "K", 1.0, EXACT, "SI brochure (2019)"},
    {"C", "K", 274.15, EXACT, "SI brochure (2019) 2.3.1: t/C = T/K - 273.15"},
    {"m", "m", 1.0, EXACT, "SI"},
    {"cm", "m", 0.01, EXACT, "SI prefix"},
    {"mm", "m", 0.001, EXACT, "SI prefix"},
    {"ft", "m", 1200.0 / 3937.0, 1e-6, "US survey foot, 2 ppm longer: NIST SP 811 (2008) B.6"},
    {"in", "m", 0.9144 / 36.0, EXACT, "international yard of 0.9144 m (1959)"},
    {"F", "K", (1.0 + 459.67) * 5.0 / 9.0, EXACT, "NIST SP 811 (2008) B.8: T = (t + 459.67)/1.8"},
    {"1", "1", 1.0, EXACT, "one"},
    {"%", "1", 0.01, EXACT, "per cent"},
    {"ppm", "1", 0.000001, EXACT, "per million"},
    {"ppb", "1", 1.0e-9, EXACT, "per 1e9"},
};

static bc_unit unit_of(const char *text)
{
    bc_unit unit;
    bc_error err;

    assert_ok(bc_unit_parse(text, &unit, &err), &err);
    return unit;
}

static void assert_no_unit(const char *text, const char *words)
{
    bc_unit unit = {.factor = 47.11};
    bc_error err = {.status = BC_OK};

    assert_refused_at(text, bc_unit_parse(text, &unit, &err), &err, BC_ERR_USAGE, words);
    assert_true(unit.factor == 47.11);
}

static void one_of_every_unit_is_what_its_definition_says(void **state)
{
    (void)state;
    for (size_t i = 0; i < COUNT(DEFINITIONS); i++) {
        const bc_unit unit = unit_of(DEFINITIONS[i].symbol);
        const bc_unit si = unit_of(DEFINITIONS[i].si);

        assert_true(bc_unit_matches(&unit, &si));
        assert_within_at(DEFINITIONS[i].symbol, bc_unit_to_si(&unit, 1.0), DEFINITIONS[i].one,
                         DEFINITIONS[i].tolerance + 4e-16 * DEFINITIONS[i].one);
    }
}

static bool has_definition(const char *symbol)
{
    for (size_t i = 0; i < COUNT(DEFINITIONS); i++)
        if (strcmp(DEFINITIONS[i].symbol, symbol) == 0)
            return true;
    return false;
}

static void every_row_of_the_table_is_tested_unique_and_explained(void **state)
{
    (void)state;
    assert_int_equal(bc_unit_count(), COUNT(DEFINITIONS));
    for (size_t i = 0; i < bc_unit_count(); i++) {
        if (!has_definition(bc_unit_symbol(i)))
            fail_msg("'%s' has no definition in this test", bc_unit_symbol(i));
        assert_true(strlen(bc_unit_meaning(i)) > 2);
        for (size_t j = 0; j < i; j++)
            assert_string_not_equal(bc_unit_symbol(i), bc_unit_symbol(j));
    }
    assert_string_equal(bc_unit_symbol(bc_unit_count()), "");
    assert_string_equal(bc_unit_meaning(bc_unit_count()), "");
}

static void every_unit_converts_there_and_back(void **state)
{
    chance c = {60606};

    (void)state;
    for (size_t i = 0; i < bc_unit_count(); i++) {
        const bc_unit unit = unit_of(bc_unit_symbol(i));

        for (int k = 0; k < 50; k++) {
            const double value = 1000.0 * chance_uniform(&c) - 333.0;
            const double scale = fabs(value) + fabs(unit.offset / unit.factor);

            assert_within_at(bc_unit_symbol(i), bc_unit_from_si(&unit, bc_unit_to_si(&unit, value)), value, 1e-15 * scale);
        }
    }
}

static void mbtu_is_refused_since_half_the_trade_means_a_million(void **state)
{
    (void)state;
    assert_no_unit("MBtu", "a thousand and as a million|kBtu|MMBtu");
    assert_no_unit("MBtu/scf", "kBtu or MMBtu");
    assert_no_unit("m3/MBtu", "kBtu or MMBtu");
}

static void an_unknown_unit_names_the_nearest_one(void **state)
{
    (void)state;
    assert_no_unit("kwh", "unknown unit 'kwh'|'kWh'|bluecone list units");
    assert_no_unit("btu/scf", "'Btu'");
    assert_no_unit("MJ/nm3", "unknown unit 'nm3'|'Nm3'");
    assert_no_unit("thrm", "'therm'");
    assert_no_unit("barrg", "'barg'");
    assert_no_unit("\xC2\xB0" "C", "unknown unit");
    assert_no_unit("MJ/m\xC2\xB3", "unknown unit");
    assert_no_unit("\x1b[31m", "unknown unit '?[31m'");
}

static void case_tells_units_apart(void **state)
{
    (void)state;
    assert_no_unit("MBAR", "'mbar'");
    assert_no_unit("mj", "'MJ'");
    assert_no_unit("PPM", "'ppm'");
}

static void an_empty_part_of_a_unit_is_refused(void **state)
{
    (void)state;
    assert_no_unit("/", "empty part");
    assert_no_unit("MJ/", "empty part");
    assert_no_unit("/m3", "empty part");
    assert_no_unit("MJ//m3", "empty part");
    assert_no_unit("MJ/ /m3", "empty part");
    assert_no_unit("kg/kg/kg/kg/kg/kg/kg/kg/kg/kg/kg/kg/kg/kg/kg/kg/kg/kg/kg/kg/kg/kg/kg", "longer than 63");
}

static void the_dimension_of_a_quotient_is_that_of_its_parts(void **state)
{
    (void)state;
    const bc_unit heat = unit_of("MJ/m3"), specific = unit_of("kWh/kg"), rate = unit_of("kg/h"), power = unit_of("kW");
    const bc_unit energy_rate = unit_of("kJ/s"), intensity = unit_of("kW/m3/h");

    assert_int_equal(heat.power[BC_DIM_ENERGY], 1);
    assert_int_equal(heat.power[BC_DIM_VOLUME], -1);
    assert_within(heat.factor, 1e6, 0.0);
    assert_int_equal(specific.power[BC_DIM_MASS], -1);
    assert_int_equal(rate.power[BC_DIM_TIME], -1);
    assert_within(rate.factor, 1.0 / 3600.0, 1e-19);
    assert_int_equal(power.power[BC_DIM_ENERGY], 1);
    assert_int_equal(power.power[BC_DIM_TIME], -1);
    assert_true(bc_unit_matches(&power, &energy_rate));
    assert_within(power.factor, energy_rate.factor, 0.0);
    assert_int_equal(intensity.power[BC_DIM_TIME], -2);
    assert_false(bc_unit_matches(&heat, &specific));
    assert_false(bc_unit_matches(&rate, &power));
}

static void the_trade_converts_its_heating_values_as_handbooks_do(void **state)
{
    (void)state;
    const bc_unit si = unit_of("MJ/m3"), us = unit_of("Btu/ft3"), pound = unit_of("Btu/lb"), mass = unit_of("MJ/kg");
    const bc_unit kcal = unit_of("kcal/m3"), meter = unit_of("kWh/m3");

    /* NIST SP 811 (2008) B.9: Btu IT per cubic foot 3.725895 E+04 J/m3, Btu IT per pound 2.326 E+03 J/kg */
    assert_within(bc_unit_to_si(&us, 1.0), 3.725895e4, 0.5e-2);
    assert_within(bc_unit_to_si(&pound, 1.0), 2326.0, 1e-9);
    assert_within(bc_unit_from_si(&us, bc_unit_to_si(&si, 37.78)), 1013.985, 0.5e-3);
    assert_within(bc_unit_from_si(&pound, bc_unit_to_si(&mass, 55.574)), 23892.52, 0.5e-2);
    assert_within(bc_unit_from_si(&kcal, bc_unit_to_si(&meter, 11.37)), 11.37 * 859.845228, 1e-5); /* 3600/4.1868 */
}

static void an_offset_counts_only_where_the_unit_stands_alone(void **state)
{
    (void)state;
    const bc_unit f = unit_of("F"), slope = unit_of("kJ/F"), gauge = unit_of("barg"), rate = unit_of("barg/s");

    assert_within(bc_unit_to_si(&f, 60.0), 288.70555555555556, 1e-12); /* 60 F, NIST SP 811 (2008) B.8 */
    assert_within(bc_unit_to_si(&f, -40.0), 233.15, 1e-12);
    assert_within(slope.offset, 0.0, 0.0);
    assert_within(bc_unit_to_si(&slope, 1.0), 1800.0, 1e-9);
    assert_within(bc_unit_to_si(&gauge, 3.7), 471325.0, 1e-9);
    assert_within(rate.offset, 0.0, 0.0);
}

static void cubic_feet_and_metres_of_the_trade_fix_the_metering_temperature(void **state)
{
    (void)state;
    const bc_unit scf = unit_of("Btu/scf"), normal = unit_of("kWh/Nm3"), standard = unit_of("kg/Sm3"), plain = unit_of("MJ/m3");
    const bc_unit foot = unit_of("Btu/ft3");

    assert_true(scf.has_metering);
    assert_within(scf.metering_c, 15.5555555555556, 1e-12);
    assert_true(normal.has_metering);
    assert_within(normal.metering_c, 0.0, 0.0);
    assert_true(standard.has_metering);
    assert_within(standard.metering_c, 15.0, 0.0);
    assert_false(plain.has_metering);
    assert_false(foot.has_metering);
}

static void no_unit_and_one_are_the_unit_one(void **state)
{
    (void)state;
    const bc_unit none = unit_of(""), one = unit_of("1"), percent = unit_of("%"), ratio = unit_of("m3/m3");

    assert_true(bc_unit_matches(&none, &one));
    assert_true(bc_unit_matches(&percent, &ratio));
    assert_within(bc_unit_to_si(&percent, 4.85), 0.0485, 1e-17);
}

static void assert_measure(const char *text, const char *like, const char *bare, double want)
{
    double si = 0.0;
    bc_error err;

    assert_ok(bc_measure_parse(text, like, bare, &si, &err), &err);
    assert_within_at(text, si, want, 1e-9 * fabs(want));
}

static void a_number_with_its_unit_behind_it_is_read_in_si(void **state)
{
    (void)state;
    assert_measure("15C", "K", "C", 288.15);
    assert_measure("15", "K", "C", 288.15);
    assert_measure("60F", "K", "C", 288.7055555555556);
    assert_measure("288.15 K", "K", NULL, 288.15);
    assert_measure("14.73psi", "Pa", "kPa", 101559.77492837); /* 14.73 x 6894.757293168 */
    assert_measure("101.325", "Pa", "kPa", 101325.0);
    assert_measure(" 350 kW ", "W", NULL, 350e3);
}

static void assert_no_measure(const char *text, const char *like, const char *bare, bc_status status, const char *words)
{
    double si = 47.11;
    bc_error err = {.status = BC_OK};

    assert_refused_at(text, bc_measure_parse(text, like, bare, &si, &err), &err, status, words);
    assert_within(si, 47.11, 0.0);
}

static void a_measure_of_another_dimension_or_without_a_unit_is_refused(void **state)
{
    (void)state;
    assert_no_measure("15 kPa", "K", "C", BC_ERR_USAGE, "does not fit|converts to K");
    assert_no_measure("15", "Pa", NULL, BC_ERR_USAGE, "has no unit|15kPa");
    assert_no_measure("warm", "K", "C", BC_ERR_INPUT, "not a number");
    assert_no_measure("", "K", "C", BC_ERR_INPUT, "missing");
    assert_no_measure("15 Celsius", "K", "C", BC_ERR_USAGE, "unknown unit");
    assert_no_measure("15,5 C", "K", "C", BC_ERR_INPUT, "decimal comma");
    assert_no_measure("nan C", "K", "C", BC_ERR_INPUT, "not a number");
    assert_no_measure("0.99e308 MJ/m3", "MJ/m3", NULL, BC_ERR_INPUT, "beyond the range");
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(one_of_every_unit_is_what_its_definition_says),
        cmocka_unit_test(every_row_of_the_table_is_tested_unique_and_explained),
        cmocka_unit_test(every_unit_converts_there_and_back),
        cmocka_unit_test(mbtu_is_refused_since_half_the_trade_means_a_million),
        cmocka_unit_test(an_unknown_unit_names_the_nearest_one),
        cmocka_unit_test(case_tells_units_apart),
        cmocka_unit_test(an_empty_part_of_a_unit_is_refused),
        cmocka_unit_test(the_dimension_of_a_quotient_is_that_of_its_parts),
        cmocka_unit_test(the_trade_converts_its_heating_values_as_handbooks_do),
        cmocka_unit_test(an_offset_counts_only_where_the_unit_stands_alone),
        cmocka_unit_test(cubic_feet_and_metres_of_the_trade_fix_the_metering_temperature),
        cmocka_unit_test(no_unit_and_one_are_the_unit_one),
        cmocka_unit_test(a_number_with_its_unit_behind_it_is_read_in_si),
        cmocka_unit_test(a_measure_of_another_dimension_or_without_a_unit_is_refused),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
