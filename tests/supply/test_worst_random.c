/* SPDX-License-Identifier: MIT */
/* test_worst_random.c - contracts at random: whatever their windows and limits, proofs hold and conflicts are real. */
#include "worst_cases.h"

#define CONTRACTS 250

static const char *const SPECIES[] = {"methane",  "ethane",          "propane",  "n-butane",       "isobutane", "n-pentane", "n-hexane", "n-decane", "benzene", "hydrogen",
                                      "nitrogen", "carbon-monoxide", "oxygen",   "carbon-dioxide", "water",     "ammonia",   "helium",   "argon",    "ethylene", "hydrogen-sulfide"};
static const char *const FIGURES[] = {"hhv", "lhv", "wobbe-gross", "wobbe-net", "density", "z", "molar-mass", "hhv-mass", "wobbe-gross-ideal", "air-demand", "molar-volume"};
static const char *const STATES[] = {"15/15", "25/0", "0/0", "25/20", "60F/60F"};

static bc_space space;
static double known[BC_SPECIES_CAPACITY]; /* a gas that the windows allow */

/* Windows around a random gas: narrow, open to one side or both, or none at all. */
static void random_windows(chance *c)
{
    size_t order[COUNT(SPECIES)];
    double sum = 0.0;

    memset(&space, 0, sizeof space);
    space.component_count = 2 + chance_below(c, COUNT(SPECIES) - 1);
    for (size_t i = 0; i < COUNT(SPECIES); i++) {
        const size_t k = chance_below(c, i + 1);

        order[i] = order[k];
        order[k] = i;
    }
    for (size_t j = 0; j < space.component_count; j++)
        sum += known[j] = pow(10.0, -4.0 * chance_uniform(c));
    for (size_t j = 0; j < space.component_count; j++) {
        bc_space_component *w = &space.components[j];
        const size_t kind = chance_below(c, 8);

        known[j] /= sum;
        w->species = species_of(SPECIES[order[j]]);
        w->min = kind == 0 ? known[j] : kind < 3 ? 0.0 : known[j] * chance_uniform(c);
        w->max = kind == 0 ? known[j] : kind == 1 ? 1.0 : fmin(1.0, known[j] * (1.0 + 3.0 * chance_uniform(c)));
    }
}

/* Limits that the known gas keeps, within 10 % or nearer, one of three on one side only. */
static void random_limits(chance *c)
{
    const bc_gas gas = gas_of(&space, known);

    for (size_t i = chance_below(c, 6); i > 0; i--) {
        bc_space_limit *l = &space.limits[space.limit_count];
        const size_t kind = chance_below(c, 6);
        double value = 0.0;

        add_limit(&space, FIGURES[chance_below(c, COUNT(FIGURES))], STATES[chance_below(c, COUNT(STATES))], 0.0, 0.0);
        assert_int_equal(bc_ratio_evaluate(&l->ratio, &gas, &value, NULL), BC_OK);
        if (!(value > 0.0)) { /* an inert gas has no heat to limit */
            space.limit_count--;
            continue;
        }
        l->min = kind == 0 ? -HUGE_VAL : value * (1.0 - 0.1 * pow(chance_uniform(c), 3.0));
        l->max = kind == 1 ? HUGE_VAL : value * (1.0 + 0.1 * pow(chance_uniform(c), 3.0));
    }
}

/* Gases between the known one and an extreme, moved about: none is beyond. */
static void compare(const bc_ratio *ratio, const bc_extremes *e, chance *c)
{
    for (int i = 0; i < 100; i++) {
        const bc_gas *end = i % 2 ? &e->max.gas : &e->min.gas;
        const double left = pow(10.0, -5.0 * chance_uniform(c));
        double x[BC_SPECIES_CAPACITY], value = 0.0;

        for (size_t j = 0; j < space.component_count; j++)
            x[j] = left * known[j] + (1.0 - left) * end->x[space.components[j].species];
        for (int k = 0; k < 4; k++)
            (void)walk(&space, c, x);
        if (!space_allows(&space, x))
            continue;
        const bc_gas gas = gas_of(&space, x);

        assert_int_equal(bc_ratio_evaluate(ratio, &gas, &value, NULL), BC_OK);
        if (value < e->min.bound - 1e-9 * fabs(value) || value > e->max.bound + 1e-9 * fabs(value))
            fail_msg("%.12g is not between %.12g and %.12g", value, e->min.bound, e->max.bound);
    }
}

static void random_contracts_are_proven(void **state)
{
    chance c = {31};
    size_t ends = 0, exact = 0;

    (void)state;
    for (int k = 0; k < CONTRACTS; k++) {
        bc_reference reference;
        bc_worst *worst = NULL;

        random_windows(&c);
        random_limits(&c);
        reference_of(STATES[chance_below(&c, COUNT(STATES))], &reference);
        worst = opened(&space);
        assert_false(bc_worst_is_empty(worst));
        for (size_t f = 0; f < COUNT(FIGURES); f++) {
            bc_ratio ratio;
            bc_extremes e;
            bc_error err;

            assert_ok(bc_ratio_of_quantity(quantity_of(FIGURES[f]), &reference, &ratio, &err), &err);
            assert_ok(bc_worst_ratio(worst, &ratio, &e, &err), &err);
            assert_true(e.min.bounded && e.max.bounded);
            ends += 2;
            exact += (size_t)e.min.exact + (size_t)e.max.exact;
            compare(&ratio, &e, &c);
        }
        bc_worst_close(worst);
    }
    /* where a limit and the figure all but coincide over windows from 0 to 1 the cells may run out */
    assert_true((double)exact >= 0.999 * (double)ends);
}

/* One limit moved out of what the windows reach: a conflict, and a limit in it. */
static void a_limit_out_of_reach_is_a_conflict(void **state)
{
    static bc_conflict conflict;
    chance c = {37};

    (void)state;
    for (int k = 0; k < CONTRACTS; k++) {
        bc_reference reference;
        bc_ratio ratio;
        bc_extremes e;
        bool named = false;

        random_windows(&c);
        reference_of("25/0", &reference);
        assert_int_equal(bc_ratio_of_quantity(quantity_of("density"), &reference, &ratio, NULL), BC_OK);
        bc_worst *worst = opened(&space);

        assert_int_equal(bc_worst_ratio(worst, &ratio, &e, NULL), BC_OK);
        bc_worst_close(worst);
        random_limits(&c);
        add_limit(&space, "density", "25/0", e.max.bound * 1.0001, HUGE_VAL);
        worst = opened(&space);
        assert_true(bc_worst_is_empty(worst));
        bc_worst_conflict(worst, &conflict);
        for (size_t i = 0; i < conflict.count; i++)
            named = named || conflict.parts[i].kind == BC_PART_LIMIT;
        assert_true(named && conflict.count >= 1);
        bc_worst_close(worst);
    }
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(random_contracts_are_proven),
        cmocka_unit_test(a_limit_out_of_reach_is_a_conflict),
    };

    return cmocka_run_group_tests_name("supply/test_worst_random", tests, NULL, NULL);
}
