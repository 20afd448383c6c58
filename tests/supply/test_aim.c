/* SPDX-License-Identifier: MIT */
/* test_aim.c - shares for aims, and sweeps that agree with them. */
#include "support.h"

#include "bluecone/aim.h"
#include "bluecone/composition.h"
#include "bluecone/sweep.h"

#define PARTS_MAX 4

typedef struct {
    bc_reference reference;
    bc_composition composition[PARTS_MAX];
    bc_mixer mixer;
    bc_contract aims;
    bc_aim_problem problem;
} setting;

static void open_setting(setting *s, bc_blend_basis by, const char *const gases[], size_t count)
{
    const bc_state state = bc_state_default();
    bc_blend_part parts[PARTS_MAX];
    bc_error err;

    memset(s, 0, sizeof *s);
    assert_ok(bc_reference_at(&state, &s->reference, &err), &err);
    for (size_t i = 0; i < count; i++) {
        assert_ok(bc_composition_parse(gases[i], &s->composition[i], &err), &err);
        parts[i] = (bc_blend_part){&s->composition[i].gas, NULL};
    }
    assert_ok(bc_mixer_make(&s->reference, by, parts, count, &s->mixer, &err), &err);
    assert_ok(bc_contract_start(&state, &s->aims, &err), &err);
    s->problem = (bc_aim_problem){.mixer = &s->mixer, .aims = &s->aims};
    for (size_t i = 0; i < count; i++)
        s->problem.high[i] = 1.0;
}

static void add_aim(setting *s, const char *what, const char *unit, double value)
{
    bc_error err;

    assert_ok(bc_contract_add(&s->aims, what, unit, &value, &value, &err), &err);
}

static double figure(const setting *s, size_t aim, const double share[])
{
    const bc_gas gas = bc_mixer_gas(&s->mixer, share);
    double value = 0.0;
    bc_error err;

    assert_ok(bc_limit_value(&s->aims, aim, &gas, &value, &err), &err);
    return value;
}

static const char *const RICH_LEAN[] = {"propane=95,n-butane=5", "nitrogen=78.1,oxygen=20.9,argon=1"};

static void an_aim_is_met_to_the_last_digits_on_every_basis(void **state)
{
    static const bc_blend_basis BASES[] = {BC_BY_MOLE, BC_BY_VOLUME, BC_BY_MASS};
    static setting s;
    bc_aim aim;
    bc_error err;

    (void)state;
    for (size_t b = 0; b < COUNT(BASES); b++) {
        open_setting(&s, BASES[b], RICH_LEAN, 2);
        add_aim(&s, "wobbe-gross", "kWh/m3", 13.9);
        assert_ok(bc_aim_find(&s.problem, &aim, &err), &err);
        assert_true(aim.reached);
        assert_int_equal(aim.count, 1);
        assert_within(figure(&s, 0, aim.share[0]), 13.9, 1e-11);
        assert_within(aim.share[0][0] + aim.share[0][1], 1.0, 1e-14);
    }
}

static void sweep_and_aim_agree(void **state)
{
    static setting s;
    chance dice = {31};
    bc_error err;

    (void)state;
    for (size_t k = 0; k < 50; k++) {
        const double t = 0.3 + 0.65 * chance_uniform(&dice);
        const double wanted_share[] = {t, 1.0 - t};
        bc_aim aim;
        double crossing[8];

        open_setting(&s, k % 2 ? BC_BY_MASS : BC_BY_VOLUME, RICH_LEAN, 2);
        add_aim(&s, "hhv", "", 1.0);
        const double value = figure(&s, 0, wanted_share);
        const bc_blend_line line = {&s.mixer, {0.0, 1.0}, {1.0, 0.0}};

        s.aims.limits[0].min = s.aims.limits[0].max = value;
        assert_ok(bc_aim_find(&s.problem, &aim, &err), &err);
        assert_within(aim.share[0][0], t, 1e-12);
        assert_int_equal(bc_line_crossings(&line, &s.aims, 0, value, crossing, COUNT(crossing)), 1);
        assert_within(crossing[0], aim.share[0][0], 1e-12);
    }
}

/* The Wobbe index of hydrogen in a lean gas falls and rises again: published for natural gas with a minimum at 70 to 80 %. */
static void both_solutions_are_told_where_there_are_two(void **state)
{
    static const char *const GASES[] = {"hydrogen=100", "methane=100"};
    static setting s;
    bc_aim aim;
    bc_error err;

    (void)state;
    open_setting(&s, BC_BY_MOLE, GASES, 2);
    add_aim(&s, "wobbe-gross", "MJ/m3", 45.5);
    assert_ok(bc_aim_find(&s.problem, &aim, &err), &err);
    assert_int_equal(aim.count, 2);
    assert_within(figure(&s, 0, aim.share[0]), 45.5, 1e-11);
    assert_within(figure(&s, 0, aim.share[1]), 45.5, 1e-11);
    assert_true(fabs(aim.share[0][0] - aim.share[1][0]) > 0.1);
}

static void an_aim_out_of_reach_gives_the_nearest_blend(void **state)
{
    static const char *const GASES[] = {"hydrogen=100", "methane=100"};
    static setting s;
    bc_aim aim;
    bc_error err;

    (void)state;
    open_setting(&s, BC_BY_MOLE, GASES, 2);
    add_aim(&s, "wobbe-gross", "MJ/m3", 42.0);
    assert_ok(bc_aim_find(&s.problem, &aim, &err), &err);
    assert_false(aim.reached);
    assert_int_equal(aim.count, 1);
    assert_true(aim.share[0][0] > 0.70 && aim.share[0][0] < 0.85); /* the minimum */
    add_aim(&s, "hhv", "MJ/m3", 30.0);
    assert_int_equal(bc_aim_find(&s.problem, &aim, &err), BC_ERR_USAGE);
}

static void several_aims_are_met_by_as_many_free_shares_and_one(void **state)
{
    static const char *const GASES[] = {"methane=91.3,ethane=4.85,propane=1.7,nitrogen=0.95,carbon-dioxide=1.2", "hydrogen=100", "propane=97,propene=3",
                                        "nitrogen=100"};
    static setting s;
    chance dice = {8};
    bc_error err;

    (void)state;
    for (size_t k = 0; k < 40; k++) {
        double share[4], sum = 0.0, value[3];
        bc_aim aim;
        bool found = false;

        for (size_t i = 0; i < 4; i++)
            sum += share[i] = 0.02 + chance_uniform(&dice);
        for (size_t i = 0; i < 4; i++)
            share[i] /= sum;
        open_setting(&s, k % 2 ? BC_BY_VOLUME : BC_BY_MASS, GASES, 4);
        add_aim(&s, "wobbe-gross", "", 1.0);
        add_aim(&s, "relative-density", "", 1.0);
        add_aim(&s, "hydrogen", "", 1.0);
        for (size_t i = 0; i < 3; i++) {
            value[i] = figure(&s, i, share);
            s.aims.limits[i].min = s.aims.limits[i].max = value[i];
        }
        assert_ok(bc_aim_find(&s.problem, &aim, &err), &err);
        assert_true(aim.reached);
        for (size_t n = 0; n < aim.count; n++) {
            double apart = 0.0;

            for (size_t i = 0; i < 3; i++)
                assert_within(figure(&s, i, aim.share[n]) / value[i], 1.0, 1e-11);
            for (size_t i = 0; i < 4; i++)
                apart = fmax(apart, fabs(aim.share[n][i] - share[i]));
            found = found || apart < 1e-8;
        }
        assert_true(found);
    }
}

static void a_fixed_share_stays_and_several_aims_may_be_out_of_reach(void **state)
{
    static const char *const GASES[] = {"methane=100", "hydrogen=100", "propane=100", "nitrogen=100"};
    static setting s;
    bc_aim aim;
    bc_error err;

    (void)state;
    open_setting(&s, BC_BY_MOLE, GASES, 4);
    s.problem.low[3] = s.problem.high[3] = 0.037;
    add_aim(&s, "wobbe-gross", "", 47.8);
    add_aim(&s, "relative-density", "", 0.545);
    assert_ok(bc_aim_find(&s.problem, &aim, &err), &err);
    assert_true(aim.reached);
    assert_within(aim.share[0][3], 0.037, 0.0);
    s.aims.limits[0].min = s.aims.limits[0].max = 90.0;
    assert_ok(bc_aim_find(&s.problem, &aim, &err), &err);
    assert_false(aim.reached);
    assert_int_equal(aim.count, 1);
}

static void a_figure_that_no_blend_has_is_refused(void **state)
{
    static const char *const GASES[] = {"hydrogen=100", "nitrogen=100", "argon=100"};
    static setting s;
    bc_aim aim;
    bc_error err = {.status = BC_OK};

    (void)state;
    for (size_t aims = 1; aims <= 2; aims++) { /* the second, of hydrogen, is met alone */
        open_setting(&s, BC_BY_MOLE, GASES, aims + 1);
        add_aim(&s, "hydrogen-carbon-ratio", "", 4.0);
        if (aims == 2)
            add_aim(&s, "hydrogen", "", 37.0);
        assert_refused(bc_aim_find(&s.problem, &aim, &err), &err, BC_ERR_RANGE, "hydrogen-carbon-ratio");
    }
}

/* A blend on the border, of two gases of three, is an aim whose solution rounding must not push below zero. */
static void no_share_of_a_solution_is_negative(void **state)
{
    static const char *const GASES[] = {"methane=91,ethane=9", "hydrogen=100", "propane=97,propene=3"};
    static setting s;
    chance dice = {77};
    bc_error err;

    (void)state;
    for (size_t k = 0; k < 30; k++) {
        double share[3] = {0.0, 0.0, 0.0};
        bool found = false;
        bc_aim aim;

        share[k % 3] = 0.1 + 0.8 * chance_uniform(&dice);
        share[(k + 1) % 3] = 1.0 - share[k % 3];
        open_setting(&s, BC_BY_MOLE, GASES, 3);
        add_aim(&s, "relative-density", "", 1.0);
        add_aim(&s, "hydrogen-carbon-ratio", "", 1.0);
        for (size_t i = 0; i < 2; i++)
            s.aims.limits[i].min = s.aims.limits[i].max = figure(&s, i, share);
        assert_ok(bc_aim_find(&s.problem, &aim, &err), &err);
        assert_true(aim.reached);
        for (size_t n = 0; n < aim.count; n++) {
            double apart = 0.0;

            for (size_t i = 0; i < 3; i++) {
                assert_true(aim.share[n][i] >= 0.0);
                apart = fmax(apart, fabs(aim.share[n][i] - share[i]));
            }
            found = found || apart < 1e-8;
        }
        assert_true(found);
    }
}

/* Shares that would have to be negative meet no aim, though Newton's method finds them. */
static void a_solution_with_a_negative_share_is_none(void **state)
{
    static const char *const GASES[] = {"methane=60,hydrogen=20,nitrogen=20", "methane=80,hydrogen=10,nitrogen=10", "methane=40,hydrogen=40,nitrogen=20"};
    static const double SHARE[] = {-0.1, 0.7, 0.4};
    static setting s;
    bc_aim aim;
    bc_error err;

    (void)state;
    open_setting(&s, BC_BY_MOLE, GASES, 3);
    add_aim(&s, "hydrogen", "", 1.0);
    add_aim(&s, "nitrogen", "", 1.0);
    for (size_t i = 0; i < 2; i++)
        s.aims.limits[i].min = s.aims.limits[i].max = figure(&s, i, SHARE);
    assert_ok(bc_aim_find(&s.problem, &aim, &err), &err);
    assert_false(aim.reached);
    assert_int_equal(aim.count, 1);
    for (size_t i = 0; i < 3; i++)
        assert_true(aim.share[0][i] >= 0.0);
}

static void a_wrong_count_of_free_shares_is_told(void **state)
{
    static const char *const GASES[] = {"methane=100", "hydrogen=100", "propane=100", "nitrogen=100"};
    static setting s;
    bc_aim aim;
    bc_error err = {.status = BC_OK};

    (void)state;
    open_setting(&s, BC_BY_MOLE, GASES, 4);
    add_aim(&s, "wobbe-gross", "", 47.8);
    assert_refused(bc_aim_find(&s.problem, &aim, &err), &err, BC_ERR_USAGE, "4 free shares can reach 3 aims, not 1");
    for (size_t i = 0; i < 4; i++)
        s.problem.low[i] = s.problem.high[i] = 0.25;
    assert_refused(bc_aim_find(&s.problem, &aim, &err), &err, BC_ERR_USAGE, "0 free shares can reach 0 aims, not 1");
}

static void windows_lie_between_the_crossings(void **state)
{
    static const char *const GASES[] = {"hydrogen=100", "methane=96,nitrogen=4"};
    static setting s;
    bc_window window[BC_WINDOW_MAX];
    double low = 43.5, high = 46.3, most = 97.0;
    double t[8];
    bc_error err;

    (void)state;
    open_setting(&s, BC_BY_MOLE, GASES, 2);
    assert_ok(bc_contract_add(&s.aims, "wobbe-gross", "MJ/m3", &low, &high, &err), &err);
    assert_ok(bc_contract_add(&s.aims, "hydrogen", "", NULL, &most, &err), &err);
    const bc_blend_line line = {&s.mixer, {0.0, 1.0}, {1.0, 0.0}};
    const size_t count = bc_line_windows(&line, &s.aims, window);

    /* falls below 46.3, below 43.5, comes back above it, meets the hydrogen limit */
    assert_int_equal(bc_line_crossings(&line, &s.aims, 0, low, t, COUNT(t)), 2);
    assert_int_equal(count, 2);
    assert_within(window[0].high, t[0], 1e-13);
    assert_within(window[1].low, t[1], 1e-13);
    assert_within(window[1].high, 0.97, 1e-12);
    assert_int_equal(bc_line_crossings(&line, &s.aims, 0, high, t, COUNT(t)), 1);
    assert_within(window[0].low, t[0], 1e-13);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(an_aim_is_met_to_the_last_digits_on_every_basis),
        cmocka_unit_test(sweep_and_aim_agree),
        cmocka_unit_test(both_solutions_are_told_where_there_are_two),
        cmocka_unit_test(an_aim_out_of_reach_gives_the_nearest_blend),
        cmocka_unit_test(several_aims_are_met_by_as_many_free_shares_and_one),
        cmocka_unit_test(a_fixed_share_stays_and_several_aims_may_be_out_of_reach),
        cmocka_unit_test(a_figure_that_no_blend_has_is_refused),
        cmocka_unit_test(no_share_of_a_solution_is_negative),
        cmocka_unit_test(a_solution_with_a_negative_share_is_none),
        cmocka_unit_test(a_wrong_count_of_free_shares_is_told),
        cmocka_unit_test(windows_lie_between_the_crossings),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
