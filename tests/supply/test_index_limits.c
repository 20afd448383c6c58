/* SPDX-License-Identifier: MIT */
/* test_index_limits.c - the published limits, and the lines beyond which a method no longer judges. */
#include "supply/gases.h"

static void assert_limits(const char *label, const bc_index_limits *l, double min, double max)
{
    assert_int_equal(l->has_min, min > -99.0);
    assert_int_equal(l->has_max, max < 99.0);
    assert_within_at(label, l->min, min > -99.0 ? min : 0.0, 0.0);
    assert_within_at(label, l->max, max < 99.0 ? max : 0.0, 0.0);
}

/* -100 and 100: no limit on that side. Weaver: his own of 1951 and those of later US practice; Dutton: SI 1996/551
 * schedule 3, normal and emergency; Wobbe ratio: NGC+ white paper 2005 and JH. All but NGC+ from memory. */
static void the_limits_are_those_of_the_publications(void **state)
{
    static const struct {
        const char *id;
        double prefer_min, prefer_max, accept_min, accept_max;
    } LIMITS[] = {{"wobbe-ratio", 0.96, 1.04, 0.95, 1.05},     {"weaver-heat", 0.95, 1.05, 0.95, 1.05},   {"weaver-air", -100, 100, -100, 100},
                  {"weaver-lifting", 0.64, 100, 0.64, 100},    {"weaver-flashback", -100, 0.08, -100, 0.26}, {"weaver-incomplete", -100, 0.0, -100, 0.05},
                  {"weaver-yellow-tip", -100, 0.14, -100, 0.3}, {"weaver-speed", -100, 100, -100, 100},   {"dutton-icf", -100, 0.48, -100, 1.49},
                  {"dutton-soot", -100, 0.6, -100, 0.6},       {"gbt-cp", -100, 100, -100, 100},          {"air-index", -100, 100, -100, 100},
                  {"methane-number", -100, 100, -100, 100}};

    (void)state;
    for (size_t i = 0; i < COUNT(LIMITS); i++) {
        const bc_index index = index_of(LIMITS[i].id, NATURAL, RICH);

        assert_limits(LIMITS[i].id, &index.preferable, LIMITS[i].prefer_min, LIMITS[i].prefer_max);
        assert_limits(LIMITS[i].id, &index.acceptable, LIMITS[i].accept_min, LIMITS[i].accept_max);
    }
}

/* AGA Research Bulletin 36, from memory: by the class of the old gas. */
static void the_limits_of_bulletin_36_are_those_of_the_class(void **state)
{
    static const struct {
        const char *old_gas;
        double lifting, yellow;
    } CLASSES[] = {{RICH, 1.12, 0.7}, {"methane=100", 1.06, 0.8}, {"methane=88,nitrogen=12", 1.03, 0.9}};

    (void)state;
    for (size_t i = 0; i < COUNT(CLASSES); i++) {
        const bc_index lifting = index_of("aga-lifting", CLASSES[i].old_gas, NATURAL);
        const bc_index flashback = index_of("aga-flashback", CLASSES[i].old_gas, NATURAL);
        const bc_index yellow = index_of("aga-yellow-tip", CLASSES[i].old_gas, NATURAL);

        assert_limits("IL", &lifting.preferable, -100, 1.0);
        assert_limits("IL", &lifting.acceptable, -100, CLASSES[i].lifting);
        assert_limits("IF", &flashback.preferable, -100, 1.18);
        assert_limits("IF", &flashback.acceptable, -100, 1.2);
        assert_limits("IY", &yellow.preferable, 1.0, 100);
        assert_limits("IY", &yellow.acceptable, CLASSES[i].yellow, 100);
        assert_non_null(strstr(lifting.limits_source, "Bulletin 36"));
    }
}

/* Japanese city gas: Wobbe index MJ/m3 at 0 C and MCP. 13A from supply terms, the others from memory. The edges that
 * lie within an earlier class belong to that. */
static void the_classes_of_city_gas_have_their_edges(void **state)
{
    static const struct {
        double inside, beyond;
        const char *name;
        double mcp_min, mcp_max;
    } EDGES[] = {{52.7, 52.69, "13A", 35, 47},           {57.8, 57.81, "13A", 35, 47},           {49.2, 49.19, "12A", 34, 47},
                 {24.5, 24.49, "6A", 34, 45},            {28.2, 28.21, "6A", 34, 45},            {23.7, 23.69, "L1 (6B 6C 7C)", 42.5, 78},
                 {28.9, 28.91, "L1 (6B 6C 7C)", 42.5, 78}, {21.4, 21.39, "5C", 42, 68},          {19.0, 18.99, "L2 (5A 5AN 5B)", 29, 54},
                 {16.2, 16.19, "L3 (4A 4B 4C)", 35, 64}, {18.6, 18.61, "L3 (4A 4B 4C)", 35, 64}};

    (void)state;
    for (size_t i = 0; i < COUNT(EDGES); i++) {
        const bc_mcp_class *in = bc_mcp_class_of(EDGES[i].inside * 1e6);
        const bc_mcp_class *out = bc_mcp_class_of(EDGES[i].beyond * 1e6);

        assert_non_null(in);
        assert_string_equal(in->name, EDGES[i].name);
        assert_true(!out || strcmp(out->name, EDGES[i].name) != 0);
        assert_within_at(in->name, in->mcp_min, EDGES[i].mcp_min, 0.0);
        assert_within_at(in->name, in->mcp_max, EDGES[i].mcp_max, 0.0);
    }
    assert_within(bc_mcp_class_of(50e6)->wobbe_max_j_per_m3, 53.8e6, 1.0);
    assert_within(bc_mcp_class_of(22.8e6)->wobbe_max_j_per_m3, 24.7e6, 1.0);
    assert_within(bc_mcp_class_of(20e6)->wobbe_max_j_per_m3, 22.6e6, 1.0);
}

/* Regulations of Great Britain, in the order of the list; -1: none. */
static void the_limits_of_great_britain_are_those_of_the_regulations(void **state)
{
    static const struct {
        const char *quantity;
        double min, max;
    } LIMITS[] = {{"wobbe-gross", 46.50, 51.41}, {"wobbe-gross", 47.20, 51.41}, {"wobbe-gross", 46.50, 52.85}, {"dutton-icf", -1, 0.48},
                  {"dutton-icf", -1, 1.49},      {"dutton-soot", -1, 0.60},     {"relative-density", -1, 0.7}, {"oxygen", -1, 0.2},
                  {"oxygen", -1, 1.0},           {"oxygen", -1, 0.2},           {"hydrogen", -1, 0.1},         {"hydrogen-sulfide", -1, 5},
                  {"total-sulfur", -1, 50}};

    (void)state;
    assert_int_equal(bc_gb_limit_count(), COUNT(LIMITS));
    for (size_t i = 0; i < COUNT(LIMITS); i++) {
        const bc_gb_limit *l = bc_gb_limit_at(i);

        assert_string_equal(l->quantity, LIMITS[i].quantity);
        assert_int_equal(l->has_min, LIMITS[i].min >= 0.0);
        assert_true(l->has_max);
        assert_within_at(l->quantity, l->min, LIMITS[i].min >= 0.0 ? LIMITS[i].min : 0.0, 0.0);
        assert_within_at(l->quantity, l->max, LIMITS[i].max, 0.0);
    }
}

/* Every line: a gas just inside and one just outside. */
static void each_line_parts_what_is_judged_from_what_is_not(void **state)
{
    static const struct {
        const char *id, *old_gas, *inside, *outside;
    } LINES[] = {
        {"weaver-flashback", NATURAL, "methane=90.05,hydrogen=9.95", "methane=89.95,hydrogen=10.05"},
        {"weaver-incomplete", NATURAL, "methane=90.05,hydrogen=5,carbon-monoxide=4.95", "methane=89.95,hydrogen=5,carbon-monoxide=5.05"},
        {"weaver-lifting", NATURAL, "methane=99.05,n-pentane=0.5,n-hexane=0.45", "methane=98.95,n-pentane=0.5,n-hexane=0.55"},
        {"weaver-heat", NATURAL, "methane=96.05,water=3.95", "methane=95.95,water=4.05"},
        {"weaver-yellow-tip", NATURAL, "propane=80,methane=15.05,oxygen=0.99,nitrogen=3.96", "propane=80,methane=14.95,oxygen=1.01,nitrogen=4.04"},
        {"weaver-yellow-tip", NATURAL, "methane=40.6,propane=20,n-butane=12,propene=8.4,air=19",
         "methane=40.4,propane=20,n-butane=12,propene=8.6,air=19"},
        {"aga-flashback", NATURAL, "methane=80.05,hydrogen=12,carbon-monoxide=7.95", "methane=79.95,hydrogen=12,carbon-monoxide=8.05"},
        {"aga-lifting", NATURAL, "methane=99.005,oxygen=0.995", "methane=98.995,oxygen=1.005"},
        {"aga-yellow-tip", NATURAL, "methane=99.005,helium=0.5,n-pentane=0.495", "methane=98.995,helium=0.5,n-pentane=0.505"},
        {"dutton-icf", NULL, "methane=99.905,hydrogen=0.095", "methane=99.895,hydrogen=0.105"},
        {"dutton-icf", NULL, "methane=99.905,carbon-monoxide=0.095", "methane=99.895,carbon-monoxide=0.105"},
        {"dutton-soot", NULL, "methane=96.05,water=3.95", "methane=95.95,water=4.05"},
        {"mcp", NULL, "methane=99.05,hydrogen-sulfide=0.95", "methane=98.95,hydrogen-sulfide=1.05"},
        {"mcp", NULL, "methane=96.05,water=3.95", "methane=95.95,water=4.05"},
        {"wobbe-ratio", NATURAL, "n-pentane=100", "n-octane=100"}, /* Z 0.95 and 0.81 */
        {"air-index", NULL, "n-pentane=100", "n-octane=100"},
        {"gbt-cp", NULL, "methane=96.05,water=3.95", "methane=95.95,water=4.05"},
        {"methane-number", NULL, "methane=99.505,hydrogen=0.495", "methane=99.495,hydrogen=0.505"},
        {"methane-number", NULL, "methane=99.505,carbon-monoxide=0.495", "methane=99.495,carbon-monoxide=0.505"},
        {"methane-number", NULL, "methane=99.05,oxygen=0.95", "methane=98.95,oxygen=1.05"},
        {"methane-number", NULL, "methane=91.05,ethane=4,nitrogen=2,carbon-dioxide=2.45,helium=0.5",
         "methane=90.95,ethane=4,nitrogen=2,carbon-dioxide=2.55,helium=0.5"},
        {"methane-number", NULL, "methane=98.92,carbon-monoxide=0.49,hydrogen=0.49,oxygen=0.1", "methane=97.92,carbon-monoxide=0.49,hydrogen=0.49,oxygen=1.1"},
        {"methane-number", NULL, "methane=96.05,water=3.95", "methane=95.95,water=4.05"},
    };

    (void)state;
    for (size_t i = 0; i < COUNT(LINES); i++) {
        const bc_index in = index_of(LINES[i].id, LINES[i].old_gas, LINES[i].inside);

        /* what is in range has no other reason than a missing limit or a caution */
        if (!in.in_range)
            print_error("%s of %s: %s\n", LINES[i].id, LINES[i].inside, in.reason);
        assert_true(in.in_range);
        assert_false(index_of(LINES[i].id, LINES[i].old_gas, LINES[i].outside).in_range);
    }
}

/* Adjustment gases of 800 to 1200 Btu/ft3 at 60 F, 30 inHg; the classes part at 1000 and 1100 and at 10 % inert. */
static void bulletin_36_starts_from_natural_gas_of_its_range(void **state)
{
    (void)state;
    assert_true(index_of("aga-lifting", "methane=79,nitrogen=21", NATURAL).in_range);
    assert_outside(index_of("aga-lifting", "methane=78.7,nitrogen=21.3", NATURAL), "800 to 1200");
    assert_true(index_of("aga-lifting", "methane=88,propane=12", NATURAL).in_range);
    assert_outside(index_of("aga-lifting", "methane=87.7,propane=12.3", NATURAL), "800 to 1200");
    assert_true(index_of("aga-lifting", "methane=50.2,ethane=21,nitrogen=28.8", NATURAL).in_range);
    assert_outside(index_of("aga-lifting", "methane=49.8,ethane=21.4,nitrogen=28.8", NATURAL), "no natural gas");
    assert_within(index_of("aga-lifting", "methane=89.95,nitrogen=10.05", NATURAL).acceptable.max, 1.03, 0.0);
    assert_within(index_of("aga-lifting", "methane=90.05,nitrogen=9.95", NATURAL).acceptable.max, 1.06, 0.0);
    assert_within(index_of("aga-lifting", "methane=83.86,propane=5.64,nitrogen=10.5", NATURAL).acceptable.max, 1.03, 0.0);
    assert_within(index_of("aga-lifting", "methane=83.21,propane=6.29,nitrogen=10.5", NATURAL).acceptable.max, 1.06, 0.0);
    assert_within(index_of("aga-lifting", "methane=94.5,propane=5.5", NATURAL).acceptable.max, 1.06, 0.0);
    assert_within(index_of("aga-lifting", "methane=94.3,propane=5.7", NATURAL).acceptable.max, 1.12, 0.0);
    /* LPG of any C3 and C4 is told from other gas with oxygen */
    assert_outside(index_of("aga-lifting", NATURAL, "methane=25,propane=9,isobutane=9,propene=9,1-butene=9,air=39"), "LPG with air");
    assert_outside(index_of("aga-lifting", NATURAL, "methane=35,propane=8,isobutane=8,propene=8,1-butene=8,air=33"), "oxygen above 1 %");
}

/* EN 437:2021 group 2H, 45.7 to 54.7 MJ/m3, from memory. */
static void dutton_judges_natural_gas_of_group_h(void **state)
{
    (void)state;
    assert_true(index_of("dutton-icf", NULL, "methane=92.8,nitrogen=7.2").in_range);
    assert_outside(index_of("dutton-icf", NULL, "methane=92.3,nitrogen=7.7"), "45.7 to 54.7");
    assert_true(index_of("dutton-icf", NULL, "methane=87.4,propane=12.6").in_range);
    assert_outside(index_of("dutton-icf", NULL, "methane=86.4,propane=13.6"), "45.7 to 54.7");
    assert_outside(index_of("dutton-icf", NULL, "methane=33,propane=34,nitrogen=33"), "half methane");
}

/* Another pressure or edition alone makes another state. */
static void subjects_of_two_states_are_not_compared(void **state)
{
    static const struct {
        double combustion_c, metering_c, metering_pa;
        bool saturated;
        int edition;
    } STATES[] = {{25.0, 15.0, 101325.0, false, 2016}, {15.0, 0.0, 101325.0, false, 2016}, {15.0, 15.0, 100000.0, false, 2016},
                  {15.0, 15.0, 101325.0, true, 2016},  {15.0, 15.0, 101325.0, false, 1995}};
    const bc_reference here = reference_at("15/15");
    const bc_subject a = subject_of(&here, NATURAL);

    (void)state;
    for (size_t i = 0; i < COUNT(STATES); i++) {
        const bc_state other = {STATES[i].combustion_c, STATES[i].metering_c, STATES[i].metering_pa, STATES[i].saturated, STATES[i].edition};
        bc_reference there;
        bc_index index;
        bc_dutton d;
        bc_error err;

        assert_ok(bc_reference_at(&other, &there, &err), &err);
        const bc_subject s = subject_of(&there, NATURAL);

        assert_refused(bc_index_evaluate(0, &a, &s, &index, &err), &err, BC_ERR_USAGE, "different states");
        if (i < 3)
            assert_refused(bc_dutton_of(&there, &a.gas, &d, &err), &err, BC_ERR_USAGE, "15/15");
    }
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(the_limits_are_those_of_the_publications),
        cmocka_unit_test(the_limits_of_bulletin_36_are_those_of_the_class),
        cmocka_unit_test(the_classes_of_city_gas_have_their_edges),
        cmocka_unit_test(the_limits_of_great_britain_are_those_of_the_regulations),
        cmocka_unit_test(each_line_parts_what_is_judged_from_what_is_not),
        cmocka_unit_test(bulletin_36_starts_from_natural_gas_of_its_range),
        cmocka_unit_test(dutton_judges_natural_gas_of_group_h),
        cmocka_unit_test(subjects_of_two_states_are_not_compared),
    };

    return cmocka_run_group_tests_name("index limits", tests, NULL, NULL);
}
