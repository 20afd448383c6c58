/* SPDX-License-Identifier: MIT */
/* test_index.c - the list of indices: its texts, limits, verdicts and refusals. */
#include "supply/gases.h"

static void every_index_names_its_source_range_and_trust(void **state)
{
    (void)state;
    for (size_t i = 0; i < bc_index_count(); i++) {
        const bc_index_row *r = bc_index_at(i);
        const char *texts[] = {r->id, r->label, r->unit, r->meaning, r->range, r->trust, r->source};

        for (size_t k = 0; k < COUNT(texts); k++)
            assert_true(texts[k][0] != '\0');
        if (r->preferable.has_min || r->preferable.has_max || r->acceptable.has_min || r->acceptable.has_max)
            assert_true(r->limits_source[0] != '\0');
    }
    assert_null(bc_index_at(bc_index_count()));
}

static void all_seventeen_indices_are_found_by_their_id(void **state)
{
    static const char *const IDS[] = {"wobbe-ratio", "aga-lifting", "aga-flashback", "aga-yellow-tip", "weaver-heat", "weaver-air",
                                      "weaver-lifting", "weaver-flashback", "weaver-incomplete", "weaver-yellow-tip", "weaver-speed",
                                      "dutton-icf", "dutton-soot", "mcp", "gbt-cp", "air-index", "methane-number"};
    size_t index = 0;
    size_t other = 0;

    (void)state;
    assert_int_equal(bc_index_count(), COUNT(IDS));
    for (size_t i = 0; i < COUNT(IDS); i++) {
        assert_int_equal(bc_index_find(IDS[i], &index, NULL), BC_OK);
        assert_string_equal(bc_index_at(index)->id, IDS[i]);
    }
    assert_int_equal(bc_index_find("Weaver_Heat", &other, NULL), BC_OK);
    assert_string_equal(bc_index_at(other)->id, "weaver-heat");
}

static void preferable_limits_lie_within_the_acceptable_ones(void **state)
{
    (void)state;
    for (size_t i = 0; i < bc_index_count(); i++) {
        const bc_index index = index_of(bc_index_at(i)->id, NATURAL, RICH);

        assert_int_equal(index.preferable.has_min, index.acceptable.has_min);
        assert_int_equal(index.preferable.has_max, index.acceptable.has_max);
        assert_true(!index.preferable.has_min || index.preferable.min >= index.acceptable.min);
        assert_true(!index.preferable.has_max || index.preferable.max <= index.acceptable.max);
    }
}

/* The neutral values are those of the formulas: ratios one, differences nothing. */
static void a_gas_against_itself_gives_the_neutral_value_of_every_index(void **state)
{
    static const struct {
        const char *id;
        double neutral;
    } NEUTRAL[] = {{"wobbe-ratio", 1.0},    {"weaver-heat", 1.0},       {"weaver-air", 1.0},        {"weaver-lifting", 1.0},
                   {"weaver-flashback", 0.0}, {"weaver-incomplete", 0.0}, {"weaver-yellow-tip", 0.0}, {"aga-lifting", 1.0},
                   {"aga-yellow-tip", 1.0}};
    static const char *const GASES[] = {NATURAL, RICH, BLEND, "methane=81.3,nitrogen=14.4,ethane=3.1,carbon-dioxide=1.2",
                                        "propane=61,n-butane=22,isobutane=17", COKE_OVEN};

    (void)state;
    for (size_t g = 0; g < COUNT(GASES); g++)
        for (size_t i = 0; i < COUNT(NEUTRAL); i++) {
            const bc_index index = index_of(NEUTRAL[i].id, GASES[g], GASES[g]);

            assert_true(index.has_value);
            assert_within_at(GASES[g], index.value, NEUTRAL[i].neutral, 1e-12);
            if (index.in_range && (index.acceptable.has_min || index.acceptable.has_max))
                assert_verdict(index, BC_VERDICT_OK);
        }
}

/* AGA Bulletin 36: the flashback index of a gas against itself is sqrt(h/1000), h at 60 F, 30 inHg. */
static void the_flashback_index_of_a_gas_against_itself_is_the_root_of_its_heat(void **state)
{
    const bc_reference us = reference_at("60F/60F@30inHg");
    const bc_subject s = subject_of(&us, NATURAL);
    const double h_btu = s.value.gross_j_per_m3 / (1055.05585262 / 0.028316846592);

    (void)state;
    assert_within(index_of("aga-flashback", NATURAL, NATURAL).value, sqrt(h_btu / 1000.0), 1e-6);
}

/* Methods take their own reference state: 25/0 heats are 5 % higher and may not reach them. */
static void an_index_does_not_depend_on_the_state_of_the_report(void **state)
{
    const bc_reference here = reference_at("15/15");
    const bc_reference there = reference_at("25/0");
    const bc_subject a = subject_of(&here, NATURAL);
    const bc_subject s = subject_of(&here, RICH);
    const bc_subject a2 = subject_of(&there, NATURAL);
    const bc_subject s2 = subject_of(&there, RICH);

    (void)state;
    for (size_t i = 0; i < bc_index_count(); i++) {
        const bool own = strcmp(bc_index_at(i)->id, "wobbe-ratio") != 0 && strcmp(bc_index_at(i)->id, "air-index") != 0;
        bc_index one;
        bc_index two;

        assert_int_equal(bc_index_evaluate(i, &a, &s, &one, NULL), BC_OK);
        assert_int_equal(bc_index_evaluate(i, &a2, &s2, &two, NULL), BC_OK);
        assert_within_at(bc_index_at(i)->id, two.value, one.value, own ? 0.0 : 0.01);
    }
}

/* A state may meter the gas saturated; every method dries it again. */
static void an_index_does_not_feel_the_moisture_of_the_metered_gas(void **state)
{
    bc_state wet_state = bc_state_default();
    bc_reference wet;

    (void)state;
    wet_state.metering_c = 25.0;
    wet_state.saturated = true;
    assert_int_equal(bc_reference_at(&wet_state, &wet, NULL), BC_OK);
    const bc_subject a = subject_of(&wet, NATURAL);
    const bc_subject s = subject_of(&wet, RICH);

    for (size_t i = 0; i < bc_index_count(); i++) {
        const char *id = bc_index_at(i)->id;
        bc_index moist;

        if (strcmp(id, "wobbe-ratio") == 0 || strcmp(id, "air-index") == 0)
            continue;
        assert_int_equal(bc_index_evaluate(i, &a, &s, &moist, NULL), BC_OK);
        assert_within_at(id, moist.value, index_of(id, NATURAL, RICH).value, 1e-9);
        assert_true(moist.in_range);
    }
}

static void all_indices_at_once_are_those_one_by_one(void **state)
{
    static const char *const GASES[] = {RICH, BLEND, LPG_AIR, BLAST_FURNACE, "hydrogen=100", "nitrogen=100"};
    const bc_reference reference = reference_at("15/15");
    const bc_subject a = subject_of(&reference, NATURAL);
    bc_index all[64];

    (void)state;
    assert_true(bc_index_count() <= COUNT(all));
    for (size_t g = 0; g < COUNT(GASES); g++) {
        const bc_subject s = subject_of(&reference, GASES[g]);

        assert_int_equal(bc_index_evaluate_all(&a, &s, all, NULL), BC_OK);
        for (size_t i = 0; i < bc_index_count(); i++) {
            bc_index one;

            assert_int_equal(bc_index_evaluate(i, &a, &s, &one, NULL), BC_OK);
            assert_within_at(bc_index_at(i)->id, all[i].value, one.value, 0.0);
            assert_int_equal(all[i].has_value, one.has_value);
            assert_int_equal(all[i].verdict, one.verdict);
            assert_string_equal(all[i].reason, one.reason);
        }
    }
}

static void the_verdict_follows_both_limits(void **state)
{
    (void)state;
    /* JI of this pair is 0.0498: over Weaver's own 0, under the later 0.05 */
    assert_verdict(index_of("weaver-incomplete", NATURAL, RICH), BC_VERDICT_CAUTION);
    assert_verdict(index_of("weaver-incomplete", NATURAL, "methane=83,ethane=12,propane=4,n-butane=1"), BC_VERDICT_NOT_ACCEPTABLE);
    assert_verdict(index_of("weaver-incomplete", RICH, NATURAL), BC_VERDICT_OK);
    /* JH 0.856 and 1.168 */
    assert_verdict(index_of("weaver-heat", NATURAL, "methane=90,nitrogen=10"), BC_VERDICT_NOT_ACCEPTABLE);
    assert_verdict(index_of("weaver-heat", "methane=90,nitrogen=10", NATURAL), BC_VERDICT_NOT_ACCEPTABLE);
    /* IL 1.038, high-methane gas: over 1.0, under 1.06; IL 1.19 */
    assert_verdict(index_of("aga-lifting", NATURAL, "methane=89.18,ethane=5.55,propane=1.55,n-butane=0.5,nitrogen=1.42,carbon-dioxide=1.8"),
                   BC_VERDICT_CAUTION);
    assert_verdict(index_of("aga-lifting", NATURAL, "methane=90,nitrogen=10"), BC_VERDICT_NOT_ACCEPTABLE);
    /* IY is bad when low: 0.906 of a high-methane gas */
    assert_verdict(index_of("aga-yellow-tip", NATURAL, RICH), BC_VERDICT_CAUTION);
    assert_verdict(index_of("aga-yellow-tip", "methane=100", "methane=80,propane=20"), BC_VERDICT_NOT_ACCEPTABLE);
    assert_verdict(index_of("weaver-air", NATURAL, RICH), BC_VERDICT_CANNOT_JUDGE);
    assert_string_equal(index_of("weaver-air", NATURAL, RICH).reason, "no limit is published for it");
}

static void equal_heat_does_not_clear_a_hydrogen_blend(void **state)
{
    /* the hydrogen costs as much Wobbe index as the ethane gives */
    const bc_index index = index_of("wobbe-ratio", "methane=100", "methane=78,ethane=12,hydrogen=10");

    (void)state;
    assert_within(index.value, 1.0, 0.04);
    assert_verdict(index, BC_VERDICT_CAUTION);
    assert_non_null(strstr(index.reason, "hydrogen"));
    assert_verdict(index_of("wobbe-ratio", "methane=100", "methane=96,hydrogen=4"), BC_VERDICT_OK);
}

static void gases_outside_a_method_are_marked_with_their_reason(void **state)
{
    (void)state;
    assert_outside(index_of("weaver-flashback", NATURAL, BLEND), "hydrogen");
    assert_outside(index_of("weaver-lifting", NATURAL, COKE_OVEN), "hydrogen");
    assert_outside(index_of("weaver-flashback", COKE_OVEN, NATURAL), "hydrogen");
    assert_outside(index_of("weaver-yellow-tip", NATURAL, LPG_AIR), "LPG with air");
    assert_outside(index_of("weaver-incomplete", NATURAL, "hydrogen=97,nitrogen=3"), "no hydrocarbons");
    assert_outside(index_of("weaver-incomplete", "hydrogen=97,nitrogen=3", NATURAL), "no hydrocarbons");
    assert_false(index_of("weaver-incomplete", "hydrogen=97,nitrogen=3", NATURAL).has_value);
    assert_outside(index_of("wobbe-ratio", "n-octane=100", NATURAL), "Z is below");
    assert_outside(index_of("weaver-speed", NULL, "methane=97,hydrogen-sulfide=3"), "no constants");
    assert_outside(index_of("weaver-heat", NATURAL, "methane=95,water=5"), "water");
    assert_outside(index_of("aga-flashback", NATURAL, "methane=79,hydrogen=21"), "above 20 %");
    assert_outside(index_of("aga-lifting", NATURAL, LPG_AIR), "LPG with air");
    assert_outside(index_of("aga-lifting", NATURAL, "methane=97,oxygen=3"), "oxygen above 1 %");
    assert_outside(index_of("aga-lifting", "propane=95,n-butane=5", NATURAL), "no natural gas");
    assert_outside(index_of("aga-lifting", "methane=70,nitrogen=30", NATURAL), "800 to 1200");
    assert_outside(index_of("dutton-icf", NULL, "methane=99.8,hydrogen=0.2"), "hydrogen above 0.1 %");
    assert_outside(index_of("dutton-soot", NULL, "methane=99.8,carbon-monoxide=0.2"), "carbon monoxide");
    assert_outside(index_of("dutton-icf", NULL, "methane=80,nitrogen=20"), "45.7 to 54.7");
    assert_outside(index_of("dutton-icf", NULL, LPG_AIR), "natural gas");
    assert_outside(index_of("mcp", NULL, "hydrogen=100"), "city gas class");
    assert_outside(index_of("gbt-cp", NULL, "methane=60,ammonia=40"), "no coefficient");
    assert_outside(index_of("methane-number", NULL, "methane=99.4,hydrogen=0.6"), "hydrogen above 0.5 %");
    assert_outside(index_of("methane-number", NULL, "methane=94,nitrogen=6"), "inerts");
    assert_outside(index_of("methane-number", NULL, "methane=60,propane=40"), "differ by more than 6");
}

static void a_gas_just_inside_a_line_is_judged(void **state)
{
    (void)state;
    assert_true(index_of("weaver-flashback", NATURAL, "methane=90,hydrogen=10").in_range);
    assert_true(index_of("aga-flashback", NATURAL, BLEND).in_range);
    assert_true(index_of("aga-lifting", NATURAL, "methane=99.1,oxygen=0.9").in_range);
    assert_true(index_of("weaver-speed", NULL, "methane=99.1,n-pentane=0.9").in_range);
    assert_true(index_of("dutton-icf", NULL, "methane=99.92,hydrogen=0.08").in_range);
    assert_true(index_of("methane-number", NULL, "methane=99.55,hydrogen=0.45").in_range);
}

static bc_index index_of_two(const char *id, const bc_subject *old_gas, const char *other, double x)
{
    const bc_reference reference = reference_at("15/15");
    size_t methane = 0, species = 0, i = 0;
    bc_gas gas = {{0.0}};
    bc_subject s;
    bc_index index;
    bc_error err;

    assert_ok(bc_species_find("methane", &methane, &err), &err);
    assert_ok(bc_species_find(other, &species, &err), &err);
    gas.x[methane] = 1.0 - x;
    gas.x[species] = x;
    assert_ok(bc_subject_make(&reference, &gas, NULL, &s, &err), &err);
    assert_ok(bc_index_find(id, &i, &err), &err);
    assert_ok(bc_index_evaluate(i, old_gas, &s, &index, &err), &err);
    return index;
}

/* The shares that the reasons name belong to the method; a millionth more does not. */
static void the_line_itself_is_inside_of_a_method(void **state)
{
    static const struct {
        const char *id, *other;
        double line;
        bool pair;
    } LINES[] = {{"weaver-flashback", "hydrogen", 0.10, true},      {"weaver-speed", "hydrogen", 0.10, false},
                 {"weaver-speed", "hydrogen-sulfide", 0.01, false}, {"aga-flashback", "hydrogen", 0.20, true},
                 {"aga-flashback", "carbon-monoxide", 0.20, true},  {"aga-lifting", "oxygen", 0.01, true},
                 {"aga-lifting", "hydrogen-sulfide", 0.01, true},   {"dutton-icf", "hydrogen", 0.001, false},
                 {"dutton-icf", "carbon-monoxide", 0.001, false},   {"methane-number", "hydrogen", 0.005, false},
                 {"methane-number", "carbon-monoxide", 0.005, false},
                 {"mcp", "ammonia", 0.01, false},                   {"mcp", "methanol", 0.01, false},
                 {"mcp", "water", 0.04, false},                     {"gbt-cp", "water", 0.04, false},
                 {"weaver-speed", "water", 0.04, false},            {"weaver-heat", "water", 0.04, true},
                 {"aga-lifting", "water", 0.04, true},              {"dutton-icf", "water", 0.04, false},
                 {"methane-number", "water", 0.04, false}};
    const bc_reference reference = reference_at("15/15");
    const bc_subject natural = subject_of(&reference, NATURAL);

    (void)state;
    for (size_t i = 0; i < COUNT(LINES); i++) {
        const bc_index at = index_of_two(LINES[i].id, LINES[i].pair ? &natural : NULL, LINES[i].other, LINES[i].line);
        const bc_index beyond = index_of_two(LINES[i].id, LINES[i].pair ? &natural : NULL, LINES[i].other, LINES[i].line + 1e-6);

        if (!at.has_value || !at.in_range)
            print_error("%s with %g of %s: %s\n", LINES[i].id, LINES[i].line, LINES[i].other, at.reason);
        if (beyond.has_value && beyond.in_range)
            print_error("%s with more than %g of %s is in range\n", LINES[i].id, LINES[i].line, LINES[i].other);
        assert_true(at.has_value && at.in_range && !(beyond.has_value && beyond.in_range));
    }
}

/* 5 % of inerts belong to the methane number; more is told in front of what the routes differ by. */
static void five_per_cent_of_inerts_are_not_yet_told(void **state)
{
    static const char *const INERTS[] = {"nitrogen", "carbon-dioxide"};

    (void)state;
    for (size_t i = 0; i < COUNT(INERTS); i++) {
        const bc_index at = index_of_two("methane-number", NULL, INERTS[i], 0.05), beyond = index_of_two("methane-number", NULL, INERTS[i], 0.050001);

        assert_null(strstr(at.reason, "inerts above"));
        assert_non_null(strstr(beyond.reason, "inerts above 5 %"));
    }
}

static void what_does_not_burn_has_no_index(void **state)
{
    (void)state;
    for (size_t i = 0; i < bc_index_count(); i++) {
        const bc_index index = index_of(bc_index_at(i)->id, NATURAL, "nitrogen=90,carbon-dioxide=10");

        assert_false(index.has_value);
        assert_within(index.value, 0.0, 0.0);
        assert_outside(index, "does not burn");
    }
    assert_outside(index_of("weaver-heat", "nitrogen=100", NATURAL), "does not burn");
    /* the gross heat of water vapour is that of its condensation */
    assert_outside(index_of("mcp", NULL, "water=100"), "does not burn");
    assert_outside(index_of("wobbe-ratio", "nitrogen=98,water=2", NATURAL), "does not burn");
}

/* Fire damp with all the air it needs is no fuel gas: no method may divide by its air demand. */
static void a_gas_that_holds_its_own_air_has_no_index_of_the_air_methods(void **state)
{
    static const char *const IDS[] = {"air-index", "weaver-heat", "weaver-speed", "aga-lifting", "aga-flashback"};

    (void)state;
    for (size_t i = 0; i < COUNT(IDS); i++)
        assert_false(index_of(IDS[i], NATURAL, "methane=9,air=91").has_value);
}

static void wrong_calls_are_refused(void **state)
{
    const bc_reference here = reference_at("15/15");
    const bc_reference there = reference_at("25/0");
    const bc_subject a = subject_of(&here, NATURAL);
    const bc_subject s = subject_of(&there, RICH);
    bc_index index = {.value = 7.25};
    bc_error err;
    size_t heat = 0;

    (void)state;
    assert_ok(bc_index_find("weaver-heat", &heat, &err), &err);
    assert_refused(bc_index_find("weaver-heet", &heat, &err), &err, BC_ERR_USAGE, "weaver-heet|weaver-heat");
    assert_refused(bc_index_evaluate(bc_index_count(), &a, &a, &index, &err), &err, BC_ERR_USAGE, "no index");
    assert_refused(bc_index_evaluate(heat, NULL, &a, &index, &err), &err, BC_ERR_USAGE, "weaver-heat|two gases");
    assert_refused(bc_index_evaluate(heat, &a, &s, &index, &err), &err, BC_ERR_USAGE, "different states");
    assert_refused(bc_index_evaluate_all(&a, &s, &index, &err), &err, BC_ERR_USAGE, "different states");
    assert_within(index.value, 7.25, 0.0);
    assert_string_equal(bc_verdict_text((bc_verdict)99), "cannot judge");
}

/* Sums over a gas without oxygen: of air, of the lifting and of the yellow tip constants. */
typedef struct {
    double air, lifting, yellow;
} aga_sums;

static aga_sums aga_sums_of(const char *literal, double inert)
{
    const bc_reference reference = reference_at("60F/60F@14.73psi");
    const bc_gas gas = gas_of(literal);
    bc_aga_gas a;
    bc_error err;

    assert_ok(bc_aga_gas_of(&reference, &gas, &a, &err), &err);
    return (aga_sums){a.air, a.lifting_constant * a.relative_density, a.yellow_tip_limit * (a.air + 7.0 * inert) / 100.0};
}

static void assert_same_sums(aga_sums got, aga_sums want)
{
    assert_within(got.air, want.air, 1e-12);
    assert_within(got.lifting, want.lifting, 1e-12);
    assert_within(got.yellow, want.yellow, 1e-12);
}

/* As aga36.c tells: an inert gas without constants is nitrogen, a fuel without is the butane with the oxygen of its
 * combustion, C5H12 + 8 O2 beside C4H10 + 6.5 O2. */
static void what_the_bulletin_does_not_list_counts_as_nitrogen_or_butane(void **state)
{
    const double share = 0.03 * 8.0 / 6.5;
    const aga_sums methane = aga_sums_of("methane=100", 0.0), butane = aga_sums_of("n-butane=100", 0.0);

    (void)state;
    assert_same_sums(aga_sums_of("methane=95,helium=5", 0.05), aga_sums_of("methane=95,nitrogen=5", 0.05));
    assert_same_sums(aga_sums_of("methane=97,n-pentane=3", 0.0),
                     (aga_sums){0.97 * methane.air + share * butane.air, 0.97 * methane.lifting + share * butane.lifting,
                                0.97 * methane.yellow + share * butane.yellow});
}

/* More than half methane, and 800 to 1200 Btu/ft3: aga36.c. */
static const char *aga_outside_as_old(const char *literal)
{
    const bc_reference reference = reference_at("60F/60F@14.73psi");
    const bc_gas gas = gas_of(literal);
    bc_aga_gas a;
    bc_error err;

    assert_ok(bc_aga_gas_of(&reference, &gas, &a, &err), &err);
    return a.outside_adjustment;
}

static void the_bulletin_starts_from_a_natural_gas(void **state)
{
    (void)state;
    assert_string_equal(aga_outside_as_old("methane=50.1,ethane=29.9,nitrogen=20"), "");
    assert_non_null(strstr(aga_outside_as_old("methane=50,ethane=30,nitrogen=20"), "no natural gas"));
    assert_non_null(strstr(aga_outside_as_old("methane=78,nitrogen=22"), "800 to 1200"));
    assert_string_equal(aga_outside_as_old("methane=80.5,nitrogen=19.5"), ""); /* 816 Btu/ft3 */
    assert_string_equal(aga_outside_as_old("methane=76,ethane=24"), "");       /* 1,199 */
    assert_non_null(strstr(aga_outside_as_old("methane=70,ethane=30"), "800 to 1200"));
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(every_index_names_its_source_range_and_trust),
        cmocka_unit_test(all_seventeen_indices_are_found_by_their_id),
        cmocka_unit_test(preferable_limits_lie_within_the_acceptable_ones),
        cmocka_unit_test(a_gas_against_itself_gives_the_neutral_value_of_every_index),
        cmocka_unit_test(the_flashback_index_of_a_gas_against_itself_is_the_root_of_its_heat),
        cmocka_unit_test(an_index_does_not_depend_on_the_state_of_the_report),
        cmocka_unit_test(an_index_does_not_feel_the_moisture_of_the_metered_gas),
        cmocka_unit_test(all_indices_at_once_are_those_one_by_one),
        cmocka_unit_test(the_verdict_follows_both_limits),
        cmocka_unit_test(equal_heat_does_not_clear_a_hydrogen_blend),
        cmocka_unit_test(gases_outside_a_method_are_marked_with_their_reason),
        cmocka_unit_test(a_gas_just_inside_a_line_is_judged),
        cmocka_unit_test(the_line_itself_is_inside_of_a_method),
        cmocka_unit_test(five_per_cent_of_inerts_are_not_yet_told),
        cmocka_unit_test(what_does_not_burn_has_no_index),
        cmocka_unit_test(a_gas_that_holds_its_own_air_has_no_index_of_the_air_methods),
        cmocka_unit_test(wrong_calls_are_refused),
        cmocka_unit_test(what_the_bulletin_does_not_list_counts_as_nitrogen_or_butane),
        cmocka_unit_test(the_bulletin_starts_from_a_natural_gas),
    };

    return cmocka_run_group_tests_name("index", tests, NULL, NULL);
}
