/* SPDX-License-Identifier: MIT */
/* test_limits.c - contract files: what they mean, what is refused, how gases stand to them. */
#include "support.h"

#include "bluecone/limits.h"
#include "bluecone/quantity.h"
#include "gas/species_index.h"

#define EXAMPLES BC_SOURCE_DIR "/examples/"

static bc_contract *read_text(const char *text)
{
    static bc_contract contract;
    bc_error err;

    assert_ok(bc_contract_read(write_scratch(text, strlen(text)), &contract, &err), &err);
    return &contract;
}

static bc_gas gas_of(const char *literal)
{
    static bc_composition c;
    bc_error err;

    assert_ok(bc_composition_parse(literal, &c, &err), &err);
    return c.gas;
}

static double value_of(const char *text, const bc_gas *gas)
{
    const bc_contract *c = read_text(text);
    double value = 0.0;
    bc_error err;

    assert_ok(bc_limit_value(c, 0, gas, &value, &err), &err);
    return value;
}

static void a_limit_has_its_own_state_and_unit_whatever_the_contract_says(void **state)
{
    const bc_gas gas = gas_of("methane=71.3,ethane=11.7,propane=9.1,hydrogen=4.3,carbon-dioxide=3.6");
    const double contract = value_of("[contract]\nat = 25/0\n[limit hhv]\nmin = 3\nunit = kWh/m3\n", &gas);
    const double own = value_of("[contract]\nat = 25/0\n[limit hhv]\nmin = 3\nunit = MJ/m3\nat = 15/15\n", &gas);
    static const char *const STATES[] = {"25/0", "15/15"};
    double want[2];

    (void)state;
    for (size_t i = 0; i < 2; i++) {
        bc_state s = bc_state_default();
        bc_reference r;

        assert_int_equal(bc_state_parse(STATES[i], &s, NULL), BC_OK);
        assert_int_equal(bc_reference_at(&s, &r, NULL), BC_OK);
        want[i] = bc_value_of(&r, &gas).gross_j_per_m3;
    }
    assert_within(contract, want[0] / 3.6e6, 1e-12);
    assert_within(own, want[1] / 1e6, 1e-12);
}

static void groups_add_up_what_belongs_to_them(void **state)
{
    const bc_gas gas = gas_of("methane=70,ethane=7.1,propane=5.3,n-butane=3.1,isobutane=2.3,n-pentane=1.7,propene=1.3,nitrogen=3.7,"
                              "carbon-dioxide=2.9,helium=1.1,oxygen=0.7,hydrogen=0.8");

    (void)state;
    assert_within(value_of("[limit c2+]\nmax = 9\n", &gas), 7.1 + 5.3 + 3.1 + 2.3 + 1.7 + 1.3, 1e-12);
    assert_within(value_of("[limit C4+]\nmax = 9\n", &gas), 3.1 + 2.3 + 1.7, 1e-12);
    assert_within(value_of("[limit inerts]\nmax = 9\nunit = ppm\n", &gas), 1e4 * (3.7 + 2.9 + 1.1), 1e-8);
    assert_within(value_of("[limit nC4]\nmax = 9\nunit = mol %\n", &gas), 3.1, 1e-12);
}

/* By hand: 11 ppm H2S (34.0809 g/mol) in ideal gas of 22.414 m3/kmol at 0 C; methane's Z of 0.9976 adds 0.24 %.
 * Sulphur alone (32.065 g/mol) counts two atoms of carbon disulfide. */
static void a_concentration_is_mass_per_volume_of_real_gas(void **state)
{
    bc_gas gas = {{0.0}};

    (void)state;
    gas.x[SPECIES_methane] = 1.0 - 11e-6;
    gas.x[SPECIES_hydrogen_sulfide] = 11e-6;
    const double h2s = value_of("[contract]\nat = 25/0\n[limit hydrogen sulfide]\nmax = 5\nunit = mg/m3\n", &gas);
    const double sulphur = value_of("[contract]\nat = 25/0\n[limit total-sulphur]\nmax = 5\nunit = mg/Nm3\n", &gas);

    assert_within(h2s, 11e-6 * 34.0809e6 / 22.41396 / 0.9976, 0.005);
    assert_within(sulphur / h2s, 32.065 / 34.0809, 1e-5);
}

static void bounds_belong_to_what_is_allowed_and_the_margin_tells_the_nearer_one(void **state)
{
    const bc_gas gas = gas_of("methane=91.7,hydrogen=8.3");
    const bc_contract *c = read_text("[limit hydrogen]\nmin = 1.3\nmax = 8.3\n");
    bc_limit_figure f;
    bc_error err;

    (void)state;
    assert_ok(bc_limit_judge(c, 0, &gas, NULL, &f, &err), &err);
    assert_true(f.inside);
    assert_within(f.margin, 0.0, 1e-12);
    assert_within(bc_limit_margin(&c->limits[0], 3.3), 2.0, 1e-12);
    assert_within(bc_limit_margin(&c->limits[0], 0.9), -0.4, 1e-12);
    assert_within(bc_limit_margin(&c->limits[0], 9.9), -1.6, 1e-12);
    assert_within(bc_limit_scale(&c->limits[0]), 7.0, 1e-12);
}

static void scatter_of_the_composition_shows_in_a_limit_on_a_component(void **state)
{
    static bc_composition g;
    const bc_contract *c = read_text("[limit inerts]\nmax = 4\nunit = ppm\n");
    bc_limit_figure f;
    bc_error err;

    (void)state;
    assert_ok(bc_composition_parse("methane=rest,nitrogen=3~0.3,carbon-dioxide=2~0.4", &g, &err), &err);
    assert_ok(bc_limit_judge(c, 0, &g.gas, &g.spread, &f, &err), &err);
    assert_true(f.has_u);
    assert_within(f.u, 5000.0, 1e-9); /* 3-4-5: independent, methane by difference */
    assert_false(f.inside);
}

static void a_followed_contract_gives_the_limits_that_are_not_replaced(void **state)
{
    static bc_contract c;
    char text[300];
    bc_error err;

    (void)state;
    (void)snprintf(text, sizeof text, "[contract]\nname = Ours\nfollows = %scontract-gb-gsmr-2025.ini\nat = 25/0\n[limit hydrogen]\nmax = 20\n", EXAMPLES);
    assert_ok(bc_contract_read(write_scratch(text, strlen(text)), &c, &err), &err);
    assert_string_equal(c.name, "Ours");
    assert_int_equal(c.limit_count, 6);
    assert_string_equal(c.limits[3].id, "hydrogen");
    assert_within(c.limits[3].max, 20.0, 0.0);
    assert_within(c.references[c.limits[0].reference].state.metering_c, 15.0, 0.0);
    assert_within(c.references[c.limits[3].reference].state.metering_c, 0.0, 0.0);
}

static void terms_and_ranges_are_kept(void **state)
{
    static bc_contract c;
    bc_error err;

    (void)state;
    assert_ok(bc_contract_read(EXAMPLES "contract-marrowfen.ini", &c, &err), &err);
    assert_int_equal(c.limit_count, 8);
    assert_int_equal(c.range_count, 2);
    assert_within(c.ranges[0].min, 0.78, 1e-15);
    assert_within(c.ranges[1].max, 0.12, 1e-15);
    assert_string_equal(c.currency, "EUR");
    assert_within(c.price.si, 31.5 / 3.6e9, 1e-20);
    assert_within(c.annual.si, 220.0 * 3.6e12, 1.0);
}

static void bundled_contracts_are_read(void **state)
{
    static const char *const NAMES[] = {"gb-gsmr-2025", "es-pd01", "pl-e", "marrowfen"};
    static bc_contract c;

    (void)state;
    for (size_t i = 0; i < COUNT(NAMES); i++) {
        char path[200];
        bc_error err;

        (void)snprintf(path, sizeof path, EXAMPLES "contract-%s.ini", NAMES[i]);
        assert_ok(bc_contract_read(path, &c, &err), &err);
        assert_true(strlen(c.origin) > 5);
    }
}

static const struct {
    const char *label, *text;
    int line;
    const char *words;
} BAD[] = {
    {"no limit", "[contract]\nname = x\n", 0, "has no limit"},
    {"unknown key", "[contract]\nnmae = x\n", 2, "unknown key 'nmae'|'name'"},
    {"unknown section", "[contract]\nname = x\n[limits]\na = 1\n", 4, "unknown section [limits]|[limit WHAT]"},
    {"unknown word", "[limit wobe-gross]\nmin = 1\n", 2, "'wobe-gross' is no quantity|'wobbe-gross'"},
    {"no bound", "[limit hhv]\nunit = MJ/m3\n", 2, "neither min nor max"},
    {"bounds exchanged", "[limit hhv]\nmin = 3\nmax = 2\n", 2, "min above its max"},
    {"unit of another dimension", "[limit hhv]\nmin = 3\nunit = MJ/kg\n", 3, "MJ/kg does not fit 'hhv'|MJ/m3"},
    {"unit of a fraction", "[limit hydrogen]\nmax = 3\nunit = MJ\n", 3, "does not fit 'hydrogen'|mg/m3"},
    {"metering of the unit", "[limit hhv]\nmin = 3\nunit = kWh/Nm3\n", 3, "counts gas metered at 0 C|15 C"},
    {"a bad number", "[limit hhv]\nmin = 3,4\n", 2, "decimal"},
    {"key of a limit", "[limit hhv]\nmin = 3\nmaxi = 4\n", 3, "unknown key 'maxi'|min, max, unit"},
    {"same limit twice", "[limit hydrogen]\nmax = 3\n[limit H2]\nmax = 4\n", 4, "line 2|join"},
    {"state", "[contract]\nat = 25\n[limit hhv]\nmin = 3\n", 2, "combustion/metering"},
    {"edition", "[contract]\nedition = 1984\n[limit hhv]\nmin = 3\n", 2, "1995 and 2016"},
    {"saturated", "[limit hhv]\nmin = 3\nsaturated = wet\n", 3, "yes or no"},
    {"price", "[contract]\nprice = 30 EUR\n[limit hhv]\nmin = 3\n", 2, "32 EUR/MWh"},
    {"annual energy", "[contract]\nannual_energy = 30 C\n[limit hhv]\nmin = 3\n", 2, "no flow"},
    {"range of a quantity", "[limit hhv]\nmin = 3\n[range hhv]\nmax = 3\n", 4, "no component or group"},
    {"range in mass", "[limit hhv]\nmin = 3\n[range ethane]\nmax = 3\nunit = mg/m3\n", 4, "mole fractions"},
    {"followed file is not there", "[contract]\nfollows = nowhere.ini\n[limit hhv]\nmin = 3\n", 2, "no file or bundled specification 'nowhere.ini'"},
};

static void what_a_contract_cannot_mean_is_refused_with_its_line(void **state)
{
    static bc_contract c;

    (void)state;
    for (size_t i = 0; i < COUNT(BAD); i++) {
        bc_error err = {.status = BC_OK};
        const bc_status status = bc_contract_read(write_scratch(BAD[i].text, strlen(BAD[i].text)), &c, &err);

        assert_refused_at(BAD[i].label, status, &err, BC_ERR_INPUT, BAD[i].words);
        if (err.line != BAD[i].line)
            fail_msg("%s: line %d, want %d", BAD[i].label, err.line, BAD[i].line);
    }
}

static void contracts_that_follow_each_other_in_a_circle_are_refused(void **state)
{
    static bc_contract c;
    char text[200];
    bc_error err = {.status = BC_OK};

    (void)state;
    (void)snprintf(text, sizeof text, "[contract]\nfollows = %s\n[limit hhv]\nmin = 3\n", scratch_path());
    assert_refused(bc_contract_read(write_scratch(text, strlen(text)), &c, &err), &err, BC_ERR_INPUT, "in a circle");
}

static void a_figure_that_a_gas_does_not_have_cannot_be_judged(void **state)
{
    const bc_gas gas = gas_of("hydrogen=100");
    const bc_contract *c = read_text("[limit hydrogen-carbon-ratio]\nmax = 4\n");
    bc_limit_figure f;
    bc_error err = {.status = BC_OK};

    (void)state;
    assert_refused(bc_limit_judge(c, 0, &gas, NULL, &f, &err), &err, BC_ERR_RANGE, "no carbon");
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(a_limit_has_its_own_state_and_unit_whatever_the_contract_says),
        cmocka_unit_test(groups_add_up_what_belongs_to_them),
        cmocka_unit_test(a_concentration_is_mass_per_volume_of_real_gas),
        cmocka_unit_test(bounds_belong_to_what_is_allowed_and_the_margin_tells_the_nearer_one),
        cmocka_unit_test(scatter_of_the_composition_shows_in_a_limit_on_a_component),
        cmocka_unit_test(a_followed_contract_gives_the_limits_that_are_not_replaced),
        cmocka_unit_test(terms_and_ranges_are_kept),
        cmocka_unit_test(bundled_contracts_are_read),
        cmocka_unit_test(what_a_contract_cannot_mean_is_refused_with_its_line),
        cmocka_unit_test(contracts_that_follow_each_other_in_a_circle_are_refused),
        cmocka_unit_test(a_figure_that_a_gas_does_not_have_cannot_be_judged),
    };

    return cmocka_run_group_tests(tests, NULL, remove_scratch);
}
