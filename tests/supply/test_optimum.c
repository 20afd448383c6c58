/* SPDX-License-Identifier: MIT */
/* test_optimum.c - optimal blends against dense search, against chance, and against each other. */
#include "support.h"

#include "bluecone/aim.h"
#include "bluecone/composition.h"
#include "bluecone/optimum.h"

#define CONTRACT BC_SOURCE_DIR "/examples/contract-marrowfen.ini"
#define PARTS_MAX 5

/* A problem with everything it points to. */
typedef struct {
    bc_reference reference;
    bc_composition composition[PARTS_MAX];
    bc_offer offer[PARTS_MAX];
    bc_mixer mixer;
    bc_contract within;
    bc_per_amount rate;
    bc_optimum_problem problem;
} setting;

static void open_setting(setting *s, bc_blend_basis by, const char *const gases[], const char *const prices[], size_t count)
{
    const bc_state state = bc_state_default();
    bc_blend_part parts[PARTS_MAX];
    bc_error err;

    memset(s, 0, sizeof *s);
    assert_ok(bc_reference_at(&state, &s->reference, &err), &err);
    for (size_t i = 0; i < count; i++) {
        assert_ok(bc_composition_parse(gases[i], &s->composition[i], &err), &err);
        assert_ok(bc_price_parse(prices[i], &s->offer[i].price, s->offer[i].currency, &err), &err);
        parts[i] = (bc_blend_part){&s->composition[i].gas, NULL};
    }
    assert_ok(bc_mixer_make(&s->reference, by, parts, count, &s->mixer, &err), &err);
    s->problem = (bc_optimum_problem){.mixer = &s->mixer, .within = &s->within, .least = BC_LEAST_COST, .offer = s->offer};
    for (size_t i = 0; i < count; i++)
        s->problem.high[i] = 1.0;
}

static void within_text(setting *s, const char *text)
{
    bc_error err;

    assert_ok(bc_contract_read(write_scratch(text, strlen(text)), &s->within, &err), &err);
}

static const char *const FIVE[] = {"methane=91.3,ethane=4.85,propane=1.7,nitrogen=0.95,carbon-dioxide=1.2", "methane=96.1,nitrogen=0.9,carbon-dioxide=2.9,oxygen=0.1",
                                   "hydrogen=99.9,nitrogen=0.1", "propane=95,n-butane=5", "nitrogen=99.5,oxygen=0.5"};
static const char *const FIVE_PRICES[] = {"34 EUR/MWh", "61 EUR/MWh", "88 EUR/MWh", "0.71 EUR/kg", "0.05 EUR/m3"};

static void the_optimum_is_never_beaten_by_ten_thousand_random_blends(void **state)
{
    static setting s;
    bc_optimum o;
    bc_error err;
    chance dice = {20260};
    size_t kept = 0;

    (void)state;
    open_setting(&s, BC_BY_MOLE, FIVE, FIVE_PRICES, 5);
    assert_ok(bc_contract_read(CONTRACT, &s.within, &err), &err);
    assert_ok(bc_optimum_find(&s.problem, &o, &err), &err);
    assert_true(o.feasible);
    assert_true(o.agreed >= 3);
    for (size_t tries = 0; kept < 10000 && tries < 2000000; tries++) {
        double share[5], sum = 0.0, breach = 0.0, objective = 0.0;

        /* half of them near the optimum, where a better one would be */
        for (size_t i = 0; i < 5; i++) {
            share[i] = -log(chance_uniform(&dice)) * (i == 0 ? 6.0 : 1.0);
            if (tries % 2)
                share[i] = o.share[i] * (0.9 + 0.2 * chance_uniform(&dice)) + 1e-3 * chance_uniform(&dice);
            sum += share[i];
        }
        for (size_t i = 0; i < 5; i++)
            share[i] /= sum;
        assert_ok(bc_optimum_breach(&s.problem, share, &breach, &err), &err);
        if (breach > 0.0)
            continue;
        assert_ok(bc_optimum_objective(&s.problem, share, &objective, &err), &err);
        if (objective < o.objective * (1.0 - 1e-8))
            fail_msg("%.9g EUR/MWh is beaten by %.9g", o.objective * 3.6e9, objective * 3.6e9);
        kept++;
    }
    assert_int_equal(kept, 10000);
}

static void three_parts_agree_with_a_dense_search(void **state)
{
    static const char *const GASES[] = {"propane=97,propene=3", "nitrogen=78.1,oxygen=20.9,argon=1", "methane=60.5,carbon-dioxide=39.5"};
    static const char *const PRICES[] = {"0.83 EUR/kg", "0.02 EUR/m3", "44 EUR/MWh"};
    static setting s;
    bc_optimum o;
    bc_error err;
    double best = HUGE_VAL;

    (void)state;
    open_setting(&s, BC_BY_VOLUME, GASES, PRICES, 3);
    within_text(&s, "[limit wobbe-gross]\nmin = 24.3\nmax = 25.1\nunit = MJ/m3\n[limit oxygen]\nmax = 9.1\n[limit carbon-dioxide]\nmax = 21\n"
                    "[limit relative-density]\nmin = 0.9\nmax = 1.19\n");
    assert_ok(bc_optimum_find(&s.problem, &o, &err), &err);
    assert_true(o.feasible);
    for (size_t i = 0; i <= 400; i++)
        for (size_t j = 0; i + j <= 400; j++) {
            const double share[] = {(double)i / 400.0, (double)j / 400.0, (double)(400 - i - j) / 400.0};
            double breach = 0.0, objective = 0.0;

            assert_ok(bc_optimum_breach(&s.problem, share, &breach, &err), &err);
            assert_ok(bc_optimum_objective(&s.problem, share, &objective, &err), &err);
            if (breach <= 0.0 && objective < best)
                best = objective;
        }
    assert_true(o.objective <= best);
    assert_within(o.objective / best, 1.0, 0.01); /* the grid is that coarse */
}

/* A goal with an aim: no cheaper blend that meets the aim is found by fixing one share after another. */
static void an_aim_is_met_at_the_least_cost(void **state)
{
    static const char *const GASES[] = {"methane=96,nitrogen=4", "hydrogen=100", "propane=97,propene=3"};
    static const char *const PRICES[] = {"41 EUR/MWh", "57 EUR/MWh", "0.91 EUR/kg"};
    static setting s;
    static bc_contract aims;
    bc_optimum o;
    bc_error err;
    double best = HUGE_VAL, value = 0.0;
    const double wanted = 48.9;

    (void)state;
    open_setting(&s, BC_BY_MOLE, GASES, PRICES, 3);
    within_text(&s, "[limit hydrogen]\nmax = 31\n");
    assert_ok(bc_contract_start(&(bc_state){15.0, 15.0, 101325.0, false, 2016}, &aims, &err), &err);
    assert_ok(bc_contract_add(&aims, "wobbe-gross", "MJ/m3", &wanted, &wanted, &err), &err);
    s.problem.aims = &aims;
    assert_ok(bc_optimum_find(&s.problem, &o, &err), &err);
    assert_true(o.feasible);
    const bc_gas gas = bc_mixer_gas(&s.mixer, o.share);

    assert_ok(bc_limit_value(&aims, 0, &gas, &value, &err), &err);
    assert_within(value, wanted, 1e-6);
    for (size_t i = 0; i <= 310; i++) {
        bc_aim_problem fixed = {.mixer = &s.mixer, .aims = &aims, .high = {1.0, (double)i / 1000.0, 1.0}};
        bc_aim aim;

        fixed.low[1] = fixed.high[1];
        assert_ok(bc_aim_find(&fixed, &aim, &err), &err);
        for (size_t n = 0; aim.reached && n < aim.count; n++) {
            double objective = 0.0;

            assert_ok(bc_optimum_objective(&s.problem, aim.share[n], &objective, &err), &err);
            best = fmin(best, objective);
        }
    }
    assert_true(o.objective <= best * (1.0 + 1e-7));
    assert_within(o.objective / best, 1.0, 1e-4); /* the steps are that fine */
}

/* Two parts and one binding limit: the share is where hydrogen is at its limit, the cost is linear-fractional
 * in it, and the shadow price is the derivative of that by hand. */
static void the_shadow_price_of_one_limit_is_its_derivative_by_hand(void **state)
{
    static const char *const GASES[] = {"methane=100", "hydrogen=100"};
    static const char *const PRICES[] = {"47 EUR/MWh", "31 EUR/MWh"};
    static setting s;
    bc_optimum o;
    bc_error err;

    (void)state;
    open_setting(&s, BC_BY_MOLE, GASES, PRICES, 2);
    within_text(&s, "[limit hydrogen]\nmax = 13.7\n[limit wobbe-gross]\nmin = 40\nunit = MJ/m3\n");
    assert_ok(bc_optimum_find(&s.problem, &o, &err), &err);
    const double x = 0.137;
    const double h0 = s.mixer.value[0].gross_j_per_mol, h1 = s.mixer.value[1].gross_j_per_mol;
    const double c0 = 47.0 / 3.6e9, c1 = 31.0 / 3.6e9;
    const double heat = (1.0 - x) * h0 + x * h1;

    assert_within(o.share[1], x, 1e-9);
    assert_within(o.objective, ((1.0 - x) * h0 * c0 + x * h1 * c1) / heat, 1e-8 * o.objective);
    assert_int_equal(o.binding_count, 1);
    assert_int_equal(o.binding[0].kind, BC_BOUND_MAX);
    /* d/dx of the cost: h0 h1 (c1 - c0)/heat^2, per mol % */
    assert_within(o.binding[0].shadow * 3.6e9, h0 * h1 * (c0 - c1) / (heat * heat) * 0.01 * 3.6e9, 1e-5);
}

static void every_shadow_price_is_what_solving_again_gives(void **state)
{
    static setting s;
    bc_optimum o, moved;
    bc_error err;

    (void)state;
    open_setting(&s, BC_BY_MOLE, FIVE, FIVE_PRICES, 5);
    within_text(&s, "[limit wobbe-gross]\nmin = 47\nmax = 48.3\n[limit hhv]\nmin = 36\n[limit oxygen]\nmax = 0.04\n[limit nitrogen]\nmax = 9\n");
    assert_ok(bc_optimum_find(&s.problem, &o, &err), &err);
    assert_true(o.feasible && o.binding_count >= 1);
    for (size_t b = 0; b < o.binding_count; b++) {
        bc_limit *limit = &s.within.limits[o.binding[b].index];
        double *bound = o.binding[b].kind == BC_BOUND_MIN ? &limit->min : &limit->max;
        const double way = (o.binding[b].kind == BC_BOUND_MIN ? -1.0 : 1.0) * 1e-3 * bc_limit_scale(limit);

        *bound += way;
        assert_ok(bc_optimum_find(&s.problem, &moved, &err), &err);
        *bound -= way;
        const double expected = (o.objective - moved.objective) / fabs(way);

        assert_within(o.binding[b].shadow / (o.objective / bc_limit_scale(limit)), expected / (o.objective / bc_limit_scale(limit)), 1e-3);
    }
}

static void limits_that_exclude_each_other_are_named_with_what_would_do(void **state)
{
    static const char *const GASES[] = {"methane=95,nitrogen=5", "hydrogen=100"};
    static const char *const PRICES[] = {"40 EUR/MWh", "90 EUR/MWh"};
    static setting s;
    bc_optimum o;
    bc_error err;

    (void)state;
    open_setting(&s, BC_BY_MOLE, GASES, PRICES, 2);
    within_text(&s, "[limit nitrogen]\nmax = 4\n[limit hydrogen]\nmax = 10\n[limit wobbe-gross]\nmin = 30\n");
    assert_ok(bc_optimum_find(&s.problem, &o, &err), &err);
    assert_false(o.feasible);
    assert_int_equal(o.binding_count, 2);
    assert_int_equal(o.binding[0].index, 0);
    assert_int_equal(o.binding[1].index, 1);
    assert_true(o.binding[0].has_needed && o.binding[1].has_needed);
    assert_within(o.binding[0].needed, 4.5, 1e-6);  /* 90 % of 5 % */
    assert_within(o.binding[1].needed, 20.0, 1e-6); /* 80 % of 5 % is 4 % */
}

static void a_flow_that_there_is_not_limits_a_share(void **state)
{
    static const char *const GASES[] = {"methane=100", "methane=97,carbon-dioxide=3"};
    static const char *const PRICES[] = {"50 EUR/MWh", "20 EUR/MWh"};
    static setting s;
    bc_optimum o;
    bc_error err;

    (void)state;
    open_setting(&s, BC_BY_ENERGY, GASES, PRICES, 2);
    s.problem.within = NULL;
    assert_ok(bc_flow_parse("1.2MW", &s.offer[1].max_flow, &err), &err);
    assert_ok(bc_flow_parse("5MW", &s.rate, &err), &err);
    s.problem.rate = &s.rate;
    assert_ok(bc_optimum_find(&s.problem, &o, &err), &err);
    assert_true(o.feasible);
    assert_within(o.share[1], 0.24, 1e-7);
    assert_int_equal(o.binding_count, 1);
    assert_int_equal(o.binding[0].kind, BC_BOUND_FLOW);
    assert_within(o.binding[0].shadow * 5e6 * 3.6e9, 30.0, 1e-3); /* a watt more saves 30 EUR/MWh of a share of 1/5e6 */
}

static void biogenic_carbon_is_not_counted_and_the_making_is(void **state)
{
    static const char *const GASES[] = {"methane=100", "methane=97,carbon-dioxide=3"};
    static const char *const PRICES[] = {"50 EUR/MWh", "20 EUR/MWh"};
    const double share[] = {0.4, 0.6};
    static setting s;
    double co2 = 0.0;
    bc_error err;

    (void)state;
    open_setting(&s, BC_BY_ENERGY, GASES, PRICES, 2);
    s.problem.within = NULL;
    s.problem.least = BC_LEAST_CO2;
    s.offer[1].biogenic = true;
    assert_ok(bc_intensity_parse("18 kg/MWh", &s.offer[1].co2, &err), &err);
    assert_ok(bc_optimum_objective(&s.problem, share, &co2, &err), &err);
    /* 40 % of methane's 44.0095 g/mol over its heat, 60 % of 18 kg/MWh */
    assert_within(co2 * 3.6e9, 0.4 * 44.0095e-3 / s.mixer.value[0].gross_j_per_mol * 3.6e9 + 0.6 * 18.0, 1e-3);
}

/* Hydrogen and nitrogen as far as their limits let them: 75 % of moles is methane, by mass with the molar masses of
 * ISO 6976:2016 table 1. */
static void the_least_share_of_a_part_is_what_the_limits_of_the_others_leave(void **state)
{
    static const char *const GASES[] = {"hydrogen=100", "methane=100", "nitrogen=100"};
    static const char *const PRICES[] = {"0.1 EUR/m3", "0.1 EUR/m3", "0.1 EUR/m3"};
    const double methane = 0.75 * 16.04246;
    const struct {
        bc_blend_basis by;
        double want;
    } rows[] = {{BC_BY_MOLE, 0.75}, {BC_BY_MASS, methane / (methane + 0.2 * 2.01588 + 0.05 * 28.0134)}};
    static setting s;
    bc_optimum o;
    bc_error err;

    (void)state;
    for (size_t i = 0; i < COUNT(rows); i++) {
        open_setting(&s, rows[i].by, GASES, PRICES, 3);
        s.problem.least = BC_LEAST_SHARE;
        s.problem.part = 1;
        within_text(&s, "[limit hydrogen]\nmax = 20\n[limit nitrogen]\nmax = 5\n");
        assert_ok(bc_optimum_find(&s.problem, &o, &err), &err);
        assert_true(o.feasible);
        assert_within(o.share[1], rows[i].want, 1e-6);
        assert_within(o.objective, o.share[1], 1e-9);
    }
}

static void the_same_problem_gives_the_same_answer_to_the_last_bit(void **state)
{
    static setting s;
    bc_optimum a, b;
    bc_error err;

    (void)state;
    open_setting(&s, BC_BY_MOLE, FIVE, FIVE_PRICES, 5);
    assert_ok(bc_contract_read(CONTRACT, &s.within, &err), &err);
    assert_ok(bc_optimum_find(&s.problem, &a, &err), &err);
    assert_ok(bc_optimum_find(&s.problem, &b, &err), &err);
    assert_memory_equal(a.share, b.share, sizeof a.share);
}

static void what_makes_no_problem_is_refused(void **state)
{
    static setting s;
    bc_optimum o;
    bc_error err = {.status = BC_OK};

    (void)state;
    open_setting(&s, BC_BY_MOLE, FIVE, FIVE_PRICES, 3);
    s.problem.within = NULL;
    s.offer[1].price.given = false;
    assert_refused(bc_optimum_find(&s.problem, &o, &err), &err, BC_ERR_USAGE, "part 2 has no price|--price 2=");
    s.offer[1].price.given = true;
    (void)snprintf(s.offer[2].currency, sizeof s.offer[2].currency, "GBP");
    assert_refused(bc_optimum_find(&s.problem, &o, &err), &err, BC_ERR_USAGE, "in EUR and in GBP");
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(the_optimum_is_never_beaten_by_ten_thousand_random_blends),
        cmocka_unit_test(three_parts_agree_with_a_dense_search),
        cmocka_unit_test(an_aim_is_met_at_the_least_cost),
        cmocka_unit_test(the_shadow_price_of_one_limit_is_its_derivative_by_hand),
        cmocka_unit_test(every_shadow_price_is_what_solving_again_gives),
        cmocka_unit_test(limits_that_exclude_each_other_are_named_with_what_would_do),
        cmocka_unit_test(a_flow_that_there_is_not_limits_a_share),
        cmocka_unit_test(biogenic_carbon_is_not_counted_and_the_making_is),
        cmocka_unit_test(the_least_share_of_a_part_is_what_the_limits_of_the_others_leave),
        cmocka_unit_test(the_same_problem_gives_the_same_answer_to_the_last_bit),
        cmocka_unit_test(what_makes_no_problem_is_refused),
    };

    return cmocka_run_group_tests(tests, NULL, remove_scratch);
}
