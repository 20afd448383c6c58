/* SPDX-License-Identifier: MIT */
/* test_switch.c - the judgement: identity, dangers, adjustment, published statements, shares. */
#include "supply/gases.h"

static bc_reference reference;

static int open_reference(void **state)
{
    (void)state;
    reference = reference_at("15/15");
    return 0;
}

static bc_switch judged(const char *old_gas, const char *new_gas, const bc_burner *burner)
{
    static bc_subject a;
    static bc_subject s;
    bc_switch result;
    bc_error err;

    a = subject_of(&reference, old_gas);
    s = subject_of(&reference, new_gas);
    assert_ok(bc_switch_judge(&a, &s, burner, 0.0, &result, &err), &err);
    return result;
}

static const bc_criterion *criterion(const bc_switch *s, const char *id)
{
    for (size_t i = 0; i < s->count; i++)
        if (strcmp(s->criteria[i].id, id) == 0)
            return &s->criteria[i];
    fail_msg("there is no criterion %s", id);
    return &s->criteria[0];
}

/* Neutral values: 1 for ratios, 0 for JF, JI, JY, sqrt(h/1000) for IF (its own case below). */
static void a_gas_against_itself_has_the_neutral_value_of_every_index(void **state)
{
    static const char *const GASES[] = {NATURAL, RICH, "methane=100", "methane=86,nitrogen=14"};
    static const struct {
        const char *id;
        double neutral;
    } NEUTRAL[] = {{"wobbe-ratio", 1.0},      {"weaver-heat", 1.0},       {"weaver-lifting", 1.0}, {"weaver-flashback", 0.0},
                   {"weaver-incomplete", 0.0}, {"weaver-yellow-tip", 0.0}, {"aga-lifting", 1.0},    {"aga-yellow-tip", 1.0}};

    (void)state;
    for (size_t g = 0; g < COUNT(GASES); g++) {
        const bc_switch s = judged(GASES[g], GASES[g], NULL);

        for (size_t i = 0; i < COUNT(NEUTRAL); i++)
            assert_within_at(NEUTRAL[i].id, criterion(&s, NEUTRAL[i].id)->value, NEUTRAL[i].neutral, 1e-12);
        assert_true(s.same_gas);
        assert_int_equal(s.verdict, BC_SWITCH_TAKES);
    }
}

static void the_old_gas_is_taken_by_every_burner_whatever_it_is(void **state)
{
    static const char *const GASES[] = {NATURAL, BLEND, LPG_AIR, BLAST_FURNACE, COKE_OVEN, "hydrogen=100", "propane=100"};

    (void)state;
    for (size_t g = 0; g < COUNT(GASES); g++)
        for (int type = 0; type < (int)BC_BURNER_TYPES; type++) {
            bc_burner b = bc_burner_default();

            b.type = (bc_burner_type)type;
            const bc_switch s = judged(GASES[g], GASES[g], &b);

            assert_int_equal(s.verdict, BC_SWITCH_TAKES);
            assert_within(s.on_new.heat_ratio, 1.0, 1e-12);
        }
}

static void an_index_out_of_its_range_clears_nothing(void **state)
{
    const bc_switch s = judged("methane=100", BLEND, NULL);

    (void)state;
    assert_int_equal(criterion(&s, "weaver-incomplete")->verdict, BC_VERDICT_CANNOT_JUDGE);
    assert_int_equal(criterion(&s, "dutton-icf")->verdict, BC_VERDICT_CANNOT_JUDGE);
    assert_false(s.covered[BC_DANGER_CO]);
    assert_true(s.covered[BC_DANGER_FLASHBACK]);
    assert_false(s.cleared);
    assert_int_equal(s.verdict, BC_SWITCH_NO);
}

static void hydrogen_rich_gas_is_led_by_the_method_that_covers_it(void **state)
{
    const bc_switch s = judged(NATURAL, "hydrogen=100", NULL);
    const bc_criterion *first = &s.criteria[s.order[0]];

    (void)state;
    assert_string_equal(first->id, "mcp");
    assert_true(first->broken);
    assert_within(first->value, 282.0, 0.5);
}

/* EN 437's G21 on a burner for G20: too much heat, carbon monoxide, soot; all of it comes back with heat and air. */
static void the_gas_of_incomplete_combustion_is_taken_after_adjustment(void **state)
{
    const bc_switch s = judged("volume:methane=100", "volume:methane=87,propane=13", NULL);

    (void)state;
    assert_true(s.adjusts);
    assert_int_equal(criterion(&s, "weaver-incomplete")->verdict, BC_VERDICT_NOT_ACCEPTABLE);
    assert_int_equal(s.verdict, BC_SWITCH_AFTER_ADJUSTMENT);
}

/* JA = JH = 1: Weaver's formulas then hold S, R and N alone, AGA's K, Y and h. Worked out by hand for the pair. */
static void adjusted_indices_are_the_formulas_with_both_ratios_at_one(void **state)
{
    const bc_switch s = judged(NATURAL, RICH, NULL);
    const bc_subject a = subject_of(&reference, NATURAL);
    const bc_subject n = subject_of(&reference, RICH);
    bc_weaver_gas wa;
    bc_weaver_gas wn;

    (void)state;
    assert_int_equal(bc_weaver_gas_of(&reference, &a.gas, &wa, NULL), BC_OK);
    assert_int_equal(bc_weaver_gas_of(&reference, &n.gas, &wn, NULL), BC_OK);
    assert_within(criterion(&s, "weaver-lifting")->adjusted, wn.speed / wa.speed, 1e-6);
    assert_within(criterion(&s, "weaver-flashback")->adjusted, wn.speed / wa.speed - 1.0, 1e-6);
    assert_within(criterion(&s, "weaver-incomplete")->adjusted, 0.366 * (1.0 - wn.ratio / wa.ratio), 1e-6);
    assert_within(criterion(&s, "weaver-yellow-tip")->adjusted, (wn.carbon_excess - wa.carbon_excess) / 110.0, 1e-6);
    assert_within(criterion(&s, "aga-lifting")->adjusted * criterion(&s, "aga-flashback")->adjusted,
                  sqrt(bc_unit_from_si(&(bc_unit){.factor = 37258.9458}, n.value.gross_j_per_m3) / 1000.0), 2e-3);
}

/* Nitrogen takes heat away, hydrogen keeps the flame fast; giving the heat back makes the flame hotter than a limit between both allows. */
static void an_adjustment_that_breaks_another_limit_is_none(void **state)
{
    bc_burner b = bc_burner_default();

    (void)state;
    b.lambda = 1.15;
    const bc_switch free = judged("methane=100", "methane=84,hydrogen=10,nitrogen=6", &b);

    assert_int_equal(free.verdict, BC_SWITCH_AFTER_ADJUSTMENT);
    b.flame = (bc_burner_limit){.has_max = true, .max = 0.5 * (free.on_new.burn.flame.t_k + free.on_adjusted.burn.flame.t_k)};
    const bc_switch s = judged("methane=100", "methane=84,hydrogen=10,nitrogen=6", &b);

    assert_int_equal(criterion(&s, "flame-temperature")->verdict, BC_VERDICT_OK);
    assert_true(criterion(&s, "flame-temperature")->broken);
    assert_int_equal(s.verdict, BC_SWITCH_NO);
    assert_string_equal(s.criteria[s.order[0]].id, "flame-temperature");
}

/* LPG with air: less heat, and giving it back breaks JI, which is only cautious as found. */
static void a_cautious_index_that_the_adjustment_breaks_counts_as_broken(void **state)
{
    const bc_switch s = judged("methane=89.19,ethane=5.95,propane=2.4,n-butane=1.2,nitrogen=0.3,carbon-dioxide=0.96", "propane=58.76,nitrogen=32.59,oxygen=8.65", NULL);
    const bc_criterion *ji = criterion(&s, "weaver-incomplete");

    (void)state;
    assert_true(s.adjusts);
    assert_int_equal(ji->verdict, BC_VERDICT_CAUTION);
    assert_int_equal(ji->adjusted_verdict, BC_VERDICT_NOT_ACCEPTABLE);
    assert_true(ji->broken);
    assert_int_equal(s.verdict, BC_SWITCH_NO);
}

static void hydrogen_raises_the_burning_velocity_over_that_of_the_old_gas(void **state)
{
    bc_burner b = bc_burner_default();

    (void)state;
    b.velocity = (bc_burner_limit){true, true, 0.9, 1.1};
    const bc_switch s = judged("methane=100", BLEND, &b);
    const bc_criterion *c = criterion(&s, "burning-velocity");

    assert_within(c->value, 121.0, 2.5); /* measured ratios of 1.18 to 1.20, value from memory; rule within 5 % */
    assert_int_equal(c->verdict, BC_VERDICT_NOT_ACCEPTABLE);
    assert_true(c->broken);
}

static void the_limits_of_a_burner_take_the_place_of_the_wobbe_ratio(void **state)
{
    bc_burner b = bc_burner_default();

    (void)state;
    b.input = (bc_burner_limit){true, true, 0.80, 1.20};
    const bc_switch s = judged(NATURAL, "methane=90,nitrogen=10", &b);

    assert_false(criterion(&s, "wobbe-ratio")->counts);
    assert_false(criterion(&s, "weaver-flashback")->counts);
    assert_int_equal(criterion(&s, "heat-input")->verdict, BC_VERDICT_OK);
}

static void an_atmospheric_burner_is_judged_by_the_indices_made_for_it(void **state)
{
    bc_burner b = bc_burner_default();

    (void)state;
    b.type = BC_BURNER_ATMOSPHERIC;
    b.control = BC_CONTROL_ENTRAINED;
    const bc_switch s = judged(NATURAL, RICH, &b);

    assert_true(criterion(&s, "weaver-flashback")->counts && criterion(&s, "aga-lifting")->counts);
    assert_true(s.covered[BC_DANGER_YELLOW_TIP]);
}

static void an_engine_is_not_cleared_without_a_methane_number(void **state)
{
    bc_burner b = bc_burner_default();

    (void)state;
    b.type = BC_BURNER_ENGINE;
    assert_false(judged(NATURAL, RICH, &b).covered[BC_DANGER_KNOCK]); /* no limit is stated */
    b.methane_number = (bc_burner_limit){.has_min = true, .min = 61.0};
    assert_true(judged(NATURAL, RICH, &b).covered[BC_DANGER_KNOCK]);
    assert_false(judged(NATURAL, BLEND, &b).covered[BC_DANGER_KNOCK]); /* hydrogen is outside the routes */
}

static void a_nozzle_mixing_burner_has_nothing_to_flash_back_into(void **state)
{
    (void)state;
    assert_false(bc_danger_matters(BC_DANGER_FLASHBACK, BC_BURNER_NOZZLE_MIX));
    assert_true(bc_danger_matters(BC_DANGER_FLASHBACK, BC_BURNER_PREMIX));
    assert_true(bc_danger_matters(BC_DANGER_KNOCK, BC_BURNER_ENGINE));
    assert_true(bc_danger_matters(BC_DANGER_YELLOW_TIP, BC_BURNER_TYPES));
    assert_false(bc_danger_matters(BC_DANGER_HEAT, (bc_burner_type)47));
}

/* A statement of many publications on hydrogen in gas grids, value from memory: the Wobbe index falls with hydrogen until
 * some 70 to 80 %, then rises again. */
static void hydrogen_lowers_the_wobbe_index_until_three_quarters_and_raises_it_after(void **state)
{
    double least = 1e9;
    double share = 0.0;

    (void)state;
    for (int percent = 0; percent <= 100; percent++) {
        char literal[64];

        (void)snprintf(literal, sizeof literal, "methane=%d,hydrogen=%d", 100 - percent, percent);
        const double w = subject_of(&reference, percent == 100 ? "hydrogen=100" : literal).value.wobbe_gross_j_per_m3;

        if (w < least) {
            least = w;
            share = percent;
        }
    }
    assert_in_range((size_t)share, 70, 85);
    assert_true(least < subject_of(&reference, "hydrogen=100").value.wobbe_gross_j_per_m3);
}

static const bc_blend_criterion *along(const bc_blend_in *b, const char *id)
{
    for (size_t i = 0; i < b->count; i++)
        if (strcmp(b->criteria[i].id, id) == 0)
            return &b->criteria[i];
    fail_msg("there is no criterion %s", id);
    return &b->criteria[0];
}

static bc_blend_in blended(const char *old_gas, const char *new_gas, const bc_burner *burner)
{
    const bc_subject a = subject_of(&reference, old_gas);
    const bc_subject s = subject_of(&reference, new_gas);
    bc_blend_in b;
    bc_error err;

    assert_ok(bc_blend_in_of(&a, &s, burner, 0.0, &b, &err), &err);
    return b;
}

/* At the share that is given the limit is met to 1e-7. */
static void a_crossing_lies_on_the_limit(void **state)
{
    const bc_blend_in b = blended("methane=100", "nitrogen=100", NULL);
    const double share = along(&b, "wobbe-ratio")->broken.share;
    char literal[80];

    (void)state;
    (void)snprintf(literal, sizeof literal, "methane=%.12f,nitrogen=%.12f", 100.0 * (1.0 - share), 100.0 * share);
    assert_within(index_of("wobbe-ratio", "methane=100", literal).value, 0.95, 1e-7);
}

static void shares_end_where_the_methods_say_they_end(void **state)
{
    const bc_blend_in b = blended("methane=100", "hydrogen=100", NULL);

    (void)state;
    assert_within(along(&b, "weaver-flashback")->blind.share, 0.10, 1e-8);
    assert_within(along(&b, "aga-flashback")->blind.share, 0.20, 1e-8);
    assert_within(b.refuses.share, 0.10, 1e-8);
    assert_true(b.adjusts.share <= b.refuses.share);
}

static void the_crossing_does_not_hang_on_which_gas_is_called_pure(void **state)
{
    const bc_blend_in pure = blended("methane=100", "hydrogen=100", NULL);
    const bc_blend_in half = blended("methane=100", "methane=37,hydrogen=63", NULL);

    (void)state;
    assert_within(along(&half, "mcp")->broken.share * 0.63, along(&pure, "mcp")->broken.share, 2e-9);
}

static void a_gas_that_breaks_nothing_has_no_crossing(void **state)
{
    const bc_blend_in b = blended(NATURAL, NATURAL, NULL);

    (void)state;
    for (size_t i = 0; i < b.count; i++)
        assert_false(b.criteria[i].broken.exists);
    assert_false(b.adjusts.exists || b.refuses.exists);
}

static void gases_of_two_states_are_refused(void **state)
{
    const bc_reference other = reference_at("25/0");
    const bc_subject a = subject_of(&reference, NATURAL);
    const bc_subject s = subject_of(&other, RICH);
    bc_switch result;
    bc_error err;

    (void)state;
    assert_refused(bc_switch_judge(&a, &s, NULL, 0.0, &result, &err), &err, BC_ERR_USAGE, "state");
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(a_gas_against_itself_has_the_neutral_value_of_every_index),
        cmocka_unit_test(the_old_gas_is_taken_by_every_burner_whatever_it_is),
        cmocka_unit_test(an_index_out_of_its_range_clears_nothing),
        cmocka_unit_test(hydrogen_rich_gas_is_led_by_the_method_that_covers_it),
        cmocka_unit_test(the_gas_of_incomplete_combustion_is_taken_after_adjustment),
        cmocka_unit_test(adjusted_indices_are_the_formulas_with_both_ratios_at_one),
        cmocka_unit_test(an_adjustment_that_breaks_another_limit_is_none),
        cmocka_unit_test(a_cautious_index_that_the_adjustment_breaks_counts_as_broken),
        cmocka_unit_test(hydrogen_raises_the_burning_velocity_over_that_of_the_old_gas),
        cmocka_unit_test(the_limits_of_a_burner_take_the_place_of_the_wobbe_ratio),
        cmocka_unit_test(an_atmospheric_burner_is_judged_by_the_indices_made_for_it),
        cmocka_unit_test(an_engine_is_not_cleared_without_a_methane_number),
        cmocka_unit_test(a_nozzle_mixing_burner_has_nothing_to_flash_back_into),
        cmocka_unit_test(hydrogen_lowers_the_wobbe_index_until_three_quarters_and_raises_it_after),
        cmocka_unit_test(a_crossing_lies_on_the_limit),
        cmocka_unit_test(shares_end_where_the_methods_say_they_end),
        cmocka_unit_test(the_crossing_does_not_hang_on_which_gas_is_called_pure),
        cmocka_unit_test(a_gas_that_breaks_nothing_has_no_crossing),
        cmocka_unit_test(gases_of_two_states_are_refused),
    };

    return cmocka_run_group_tests_name("switch", tests, open_reference, NULL);
}
