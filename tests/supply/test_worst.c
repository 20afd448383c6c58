/* SPDX-License-Identifier: MIT */
/* test_worst.c - certified extremes: against random gases, vertex enumeration, grids and cases done by hand. */
#include "worst_cases.h"

#define RANDOM_GASES 100000
#define EXACT 1e-6 /* what the library promises, relative */

static bc_space space;

/* What a contract may ask; the dew point is the one that is only known to rise with a ratio. */
static const char *const ASKED[] = {"hhv",        "lhv",      "wobbe-gross",    "wobbe-net", "density",         "relative-density",  "z", "molar-mass", "hhv-mass",
                                    "lhv-mole",   "air-demand", "co2-factor-net", "co2-max",   "air-demand-mass", "wobbe-gross-ideal", "molar-volume"};

static bc_extremes extremes_of(bc_worst *worst, const char *id, const bc_reference *reference)
{
    bc_extremes e;
    bc_error err;

    assert_ok(bc_worst_quantity(worst, quantity_of(id), reference, &e, &err), &err);
    return e;
}

/* An end attains its value, its proof agrees with it and it is called exact. */
static void assert_end(const char *id, const bc_extreme *end, double sign, const bc_reference *reference)
{
    bc_subject subject;
    bc_figure figure;
    bc_error err;
    double sum = 0.0;

    for (size_t i = 0; i < BC_SPECIES_CAPACITY; i++)
        sum += end->gas.x[i];
    assert_within_at(id, sum, 1.0, 1e-9);
    assert_ok(bc_subject_make(reference, &end->gas, NULL, &subject, &err), &err);
    assert_ok(bc_quantity_evaluate(quantity_of(id), &subject, &figure, &err), &err);
    assert_within_at(id, end->value, figure.value, 1e-11 * fabs(figure.value));
    assert_true(end->exact && end->bounded);
    assert_within_at(id, end->bound, end->value, EXACT * fabs(end->value));
    assert_true(sign * (end->bound - end->value) >= 0.0);
}

static void assert_extremes(const char *id, const bc_extremes *e, const bc_reference *reference)
{
    assert_end(id, &e->min, -1.0, reference);
    assert_end(id, &e->max, 1.0, reference);
}

static struct {
    bc_ratio ratio;
    bc_extremes e;
} asked[COUNT(ASKED)];

/* A figure of a gas, which must not lie beyond the proven bounds. */
static double figure_within(size_t k, const bc_gas *gas)
{
    const bc_extremes *e = &asked[k].e;
    double value = 0.0;

    assert_int_equal(bc_ratio_evaluate(&asked[k].ratio, gas, &value, NULL), BC_OK);
    if (value > e->max.bound || value < e->min.bound)
        fail_msg("%s: %.12g is not between %.12g and %.12g", ASKED[k], value, e->min.bound, e->max.bound);
    return value;
}

static void fractions_of(const bc_gas *gas, double x[])
{
    for (size_t j = 0; j < space.component_count; j++)
        x[j] = gas->x[space.components[j].species];
}

/* The mean of all extremes, well inside. */
static void middle_of_extremes(double x[])
{
    double end[BC_SPECIES_CAPACITY];

    memset(x, 0, BC_SPECIES_CAPACITY * sizeof x[0]);
    for (size_t k = 0; k < 2 * COUNT(ASKED); k++) {
        fractions_of(k % 2 ? &asked[k / 2].e.max.gas : &asked[k / 2].e.min.gas, end);
        for (size_t j = 0; j < space.component_count; j++)
            x[j] += end[j] / (2 * COUNT(ASKED));
    }
    assert_true(space_allows(&space, x));
}

/* Gases of a random walk, most of them drawn towards one of the extremes, by 0 to 99.9999 % of the way; each
 * allowed one is compared with all figures. */
static void compare_random_gases(chance *c)
{
    double x[BC_SPECIES_CAPACITY], y[BC_SPECIES_CAPACITY], end[BC_SPECIES_CAPACITY];
    size_t allowed = 0;

    middle_of_extremes(x);
    for (size_t i = 0; allowed < RANDOM_GASES; i++) {
        const size_t k = chance_below(c, 2 * COUNT(ASKED));
        const double left = pow(10.0, -6.0 * chance_uniform(c));

        assert_true(i < 30 * RANDOM_GASES);
        (void)walk(&space, c, x);
        fractions_of(k % 2 ? &asked[k / 2].e.max.gas : &asked[k / 2].e.min.gas, end);
        for (size_t j = 0; j < space.component_count; j++)
            y[j] = i % 8 == 0 ? x[j] : left * x[j] + (1.0 - left) * end[j];
        if (!space_allows(&space, y))
            continue;
        const bc_gas gas = gas_of(&space, y);

        for (size_t q = 0; q < COUNT(ASKED); q++)
            (void)figure_within(q, &gas);
        allowed++;
    }
}

/* From an extreme, keeping only what is better: what a search would find beyond it. */
static void climb_from(size_t k, double sign, chance *c)
{
    const bc_extreme *end = sign > 0.0 ? &asked[k].e.max : &asked[k].e.min;
    double kept[BC_SPECIES_CAPACITY], best = end->value;

    fractions_of(&end->gas, kept);
    for (int i = 0; i < 3000; i++) {
        double x[BC_SPECIES_CAPACITY];

        memcpy(x, kept, sizeof x);
        if (!walk(&space, c, x))
            continue;
        const bc_gas gas = gas_of(&space, x);
        const double value = figure_within(k, &gas);

        if (sign * (value - best) > 0.0) {
            memcpy(kept, x, sizeof x);
            best = value;
        }
    }
}

static void no_random_gas_lies_beyond(const char *at)
{
    bc_worst *worst = opened(&space);
    chance c = {42};
    bc_reference reference;

    reference_of(at, &reference);
    for (size_t k = 0; k < COUNT(ASKED); k++) {
        asked[k].e = extremes_of(worst, ASKED[k], &reference);
        assert_extremes(ASKED[k], &asked[k].e, &reference);
        assert_int_equal(bc_ratio_of_quantity(quantity_of(ASKED[k]), &reference, &asked[k].ratio, NULL), BC_OK);
    }
    bc_worst_close(worst);
    compare_random_gases(&c);
    for (size_t k = 0; k < COUNT(ASKED); k++) {
        climb_from(k, 1.0, &c);
        climb_from(k, -1.0, &c);
    }
}

static void no_random_gas_of_the_ranges_lies_beyond(void **state)
{
    (void)state;
    natural_gas(&space);
    no_random_gas_lies_beyond("15/15");
}

static void no_random_gas_of_a_contract_lies_beyond(void **state)
{
    (void)state;
    natural_gas(&space);
    add_contract(&space);
    no_random_gas_lies_beyond("25/0");
}

/* Limits hold at what is found, however bent they are. */
static void extremes_keep_every_limit(void **state)
{
    bc_reference reference;

    (void)state;
    natural_gas(&space);
    add_contract(&space);
    bc_worst *worst = opened(&space);

    reference_of("15/15", &reference);
    for (size_t k = 0; k < COUNT(ASKED); k++) {
        const bc_extremes e = extremes_of(worst, ASKED[k], &reference);

        for (size_t i = 0; i < space.limit_count; i++)
            for (int end = 0; end < 2; end++) {
                const bc_space_limit *l = &space.limits[i];
                double value = 0.0;

                assert_int_equal(bc_ratio_evaluate(&l->ratio, end ? &e.max.gas : &e.min.gas, &value, NULL), BC_OK);
                assert_true(value >= l->min * (1.0 - 2e-9) && value <= l->max * (1.0 + 2e-9));
            }
    }
    bc_worst_close(worst);
}

/* Solves the n x n system of rows [a | b] by elimination with pivots; false when singular. */
static bool solve(double a[6][7], size_t n, double x[])
{
    for (size_t k = 0; k < n; k++) {
        size_t p = k;

        for (size_t i = k + 1; i < n; i++)
            p = fabs(a[i][k]) > fabs(a[p][k]) ? i : p;
        if (fabs(a[p][k]) < 1e-9)
            return false;
        for (size_t j = 0; j <= n; j++) {
            const double t = a[k][j];

            a[k][j] = a[p][j];
            a[p][j] = t;
        }
        for (size_t i = 0; i < n; i++) {
            const double f = i == k ? 0.0 : a[i][k] / a[k][k];

            for (size_t j = k; j <= n; j++)
                a[i][j] -= f * a[k][j];
        }
    }
    for (size_t k = 0; k < n; k++)
        x[k] = a[k][n] / a[k][k];
    return true;
}

/* Writes the face `index` of a space of n components and one group as a row: windows, then the group. */
static void face(const bc_space *s, size_t index, double row[7])
{
    const size_t n = s->component_count;

    memset(row, 0, 7 * sizeof row[0]);
    if (index < 2 * n) {
        row[index / 2] = 1.0;
        row[n] = index % 2 ? s->components[index / 2].max : s->components[index / 2].min;
        return;
    }
    for (size_t j = 0; j < n; j++)
        row[j] = s->groups[0].weight[s->components[j].species];
    row[n] = index % 2 ? s->groups[0].max : s->groups[0].min;
}

static bool nearly_allowed(const bc_space *s, const double x[])
{
    double g = 0.0;

    for (size_t j = 0; j < s->component_count; j++) {
        if (x[j] < s->components[j].min - 1e-12 || x[j] > s->components[j].max + 1e-12)
            return false;
        g += x[j] * s->groups[0].weight[s->components[j].species];
    }
    return g >= s->groups[0].min - 1e-12 && g <= s->groups[0].max + 1e-12;
}

/* Extremes over all corners: n - 1 faces met at once, and the sum. */
static void enumerate(const bc_space *s, const bc_ratio *ratio, double *min, double *max)
{
    const size_t n = s->component_count, faces = 2 * n + 2;

    *min = HUGE_VAL;
    *max = -HUGE_VAL;
    for (unsigned long set = 0; set < 1ul << faces; set++) {
        double a[6][7], x[6], value = 0.0;
        size_t count = 0;

        for (size_t f = 0; f < faces && count < n; f++)
            if (set >> f & 1)
                face(s, f, a[count++]);
        if (count != n - 1 || (unsigned)__builtin_popcountl(set) != n - 1)
            continue;
        for (size_t j = 0; j <= n; j++)
            a[n - 1][j] = 1.0;
        if (!solve(a, n, x) || !nearly_allowed(s, x))
            continue;
        const bc_gas gas = gas_of(s, x);

        assert_int_equal(bc_ratio_evaluate(ratio, &gas, &value, NULL), BC_OK);
        *min = fmin(*min, value);
        *max = fmax(*max, value);
    }
}

/* Ratios to concave sums have their maximum on a corner, and both ends when they are linear in each sum. */
static void corners_of_small_spaces_are_the_extremes(void **state)
{
    static const window WINDOWS[] = {{"methane", 50, 100}, {"ethane", 1, 15}, {"hydrogen", 0, 30}, {"nitrogen", 0.5, 9}, {"carbon-dioxide", 0, 7}};
    static const char *const LINEAR[] = {"molar-mass", "hhv-mole", "hhv-mass", "lhv-mass", "hhv-ideal", "air-demand", "air-demand-mass", "co2-factor-gross", "hydrogen-carbon-ratio"};
    bc_reference reference;

    (void)state;
    memset(&space, 0, sizeof space);
    add_windows(&space, WINDOWS, COUNT(WINDOWS));
    add_group(&space, (const char *const[4]){"nitrogen", "carbon-dioxide", NULL}, 1.7, 8.3);
    reference_of("25/15", &reference);
    bc_worst *worst = opened(&space);

    for (size_t k = 0; k < COUNT(ASKED) + COUNT(LINEAR); k++) {
        const char *id = k < COUNT(ASKED) ? ASKED[k] : LINEAR[k - COUNT(ASKED)];
        const bc_extremes e = extremes_of(worst, id, &reference);
        double min, max;
        bc_ratio ratio;

        assert_int_equal(bc_ratio_of_quantity(quantity_of(id), &reference, &ratio, NULL), BC_OK);
        enumerate(&space, &ratio, &min, &max);
        assert_extremes(id, &e, &reference);
        assert_true(e.min.value <= min * (1.0 + EXACT) && e.max.value >= max * (1.0 - EXACT));
        if (k >= COUNT(ASKED))
            assert_within_at(id, e.min.value, min, EXACT * min);
        if (!ratio.inverse)
            assert_within_at(id, e.max.value, max, EXACT * max);
        else
            assert_within_at(id, e.min.value, min, EXACT * min);
    }
    bc_worst_close(worst);
}

/* The Wobbe index of hydrogen in methane falls first and rises then: its least value lies inside. */
static void the_least_wobbe_index_of_hydrogen_in_methane_lies_inside(void **state)
{
    static const window WINDOWS[] = {{"methane", 0, 100}, {"hydrogen", 0, 100}};
    bc_reference reference;
    bc_ratio ratio;
    double least = HUGE_VAL, at = 0.0;

    (void)state;
    memset(&space, 0, sizeof space);
    add_windows(&space, WINDOWS, COUNT(WINDOWS));
    reference_of("15/15", &reference);
    bc_worst *worst = opened(&space);
    const bc_extremes e = extremes_of(worst, "wobbe-gross", &reference);

    assert_int_equal(bc_ratio_of_quantity(quantity_of("wobbe-gross"), &reference, &ratio, NULL), BC_OK);
    for (int i = 0; i <= 20000; i++) {
        const double x[] = {1.0 - i / 20000.0, i / 20000.0};
        const bc_gas gas = gas_of(&space, x);
        double value = 0.0;

        assert_int_equal(bc_ratio_evaluate(&ratio, &gas, &value, NULL), BC_OK);
        if (value < least) {
            least = value;
            at = x[1];
        }
    }
    assert_extremes("wobbe-gross", &e, &reference);
    assert_true(at > 0.5 && at < 0.95);
    assert_within(e.min.value, least, 1e-6 * least);
    assert_within(e.min.gas.x[species_of("hydrogen")], at, 0.01);
    assert_within(e.max.gas.x[species_of("methane")], 1.0, 1e-9);
    bc_worst_close(worst);
}

/* Three components and a bent limit: a grid of 500 000 gases comes near, and none is beyond. */
static void a_grid_over_three_components_agrees(void **state)
{
    static const window WINDOWS[] = {{"methane", 0, 100}, {"hydrogen", 0, 80}, {"propane", 0, 40}};
    bc_reference reference;
    bc_ratio ratio;
    double low = HUGE_VAL, high = -HUGE_VAL;

    (void)state;
    memset(&space, 0, sizeof space);
    add_windows(&space, WINDOWS, COUNT(WINDOWS));
    add_limit(&space, "wobbe-gross", "25/0", 50.0, 58.0);
    add_limit(&space, "hhv", "15/15", 30.0, 44.0);
    reference_of("15/15", &reference);
    bc_worst *worst = opened(&space);
    const bc_extremes e = extremes_of(worst, "relative-density", &reference);

    assert_int_equal(bc_ratio_of_quantity(quantity_of("relative-density"), &reference, &ratio, NULL), BC_OK);
    for (int i = 0; i <= 1000; i++)
        for (int j = 0; i + j <= 1000; j++) {
            const double x[] = {(1000 - i - j) / 1000.0, i / 1000.0, j / 1000.0};
            const bc_gas gas = gas_of(&space, x);
            double value = 0.0;

            if (!space_allows(&space, x) || bc_ratio_evaluate(&ratio, &gas, &value, NULL) != BC_OK)
                continue;
            low = fmin(low, value);
            high = fmax(high, value);
        }
    assert_extremes("relative-density", &e, &reference);
    assert_true(e.min.bound <= low && e.max.bound >= high);
    /* a step of the grid is 0.1 %, worth up to 0.0016 of relative density */
    assert_within(e.min.value, low, 0.004);
    assert_within(e.max.value, high, 0.004);
    bc_worst_close(worst);
}

static void a_single_component_is_its_own_extreme(void **state)
{
    static const window METHANE[] = {{"methane", 0, 100}};
    bc_reference reference;

    (void)state;
    memset(&space, 0, sizeof space);
    add_windows(&space, METHANE, 1);
    reference_of("15/15", &reference);
    bc_worst *worst = opened(&space);

    for (size_t k = 0; k < COUNT(ASKED); k++) {
        const bc_extremes e = extremes_of(worst, ASKED[k], &reference);

        assert_extremes(ASKED[k], &e, &reference);
        assert_within_at(ASKED[k], e.max.value, e.min.value, 1e-12 * e.min.value);
        assert_within(e.min.gas.x[species_of("methane")], 1.0, 1e-12);
    }
    bc_worst_close(worst);
}

static void fixed_components_leave_one_gas(void **state)
{
    static const window FIXED[] = {{"methane", 92.7, 92.7}, {"ethane", 4.1, 4.1}, {"nitrogen", 0, 100}, {"carbon-dioxide", 0.9, 0.9}};
    bc_reference reference;

    (void)state;
    memset(&space, 0, sizeof space);
    add_windows(&space, FIXED, COUNT(FIXED));
    reference_of("15/15", &reference);
    bc_worst *worst = opened(&space);
    const bc_extremes e = extremes_of(worst, "wobbe-gross", &reference);

    assert_extremes("wobbe-gross", &e, &reference);
    assert_within(e.max.value, e.min.value, 1e-10 * e.min.value);
    assert_within(e.min.gas.x[species_of("nitrogen")], 0.023, 1e-12);
    bc_worst_close(worst);
}

/* The heat is 0 with nitrogen alone: a proof relative to nothing is one relative to the largest heat. */
static void an_extreme_of_nothing_is_exact(void **state)
{
    static const window WINDOWS[] = {{"methane", 0, 100}, {"nitrogen", 0, 100}};
    bc_reference reference;
    bc_extremes e;
    bc_error err;

    (void)state;
    memset(&space, 0, sizeof space);
    add_windows(&space, WINDOWS, COUNT(WINDOWS));
    reference_of("15/15", &reference);
    bc_worst *worst = opened(&space);

    e = extremes_of(worst, "hhv", &reference);
    assert_true(e.min.exact && e.max.exact);
    assert_within(e.min.value, 0.0, 1e-12);
    assert_within(e.max.value, 37.78, 0.01); /* methane, ISO 6976 annex */
    assert_refused(bc_worst_quantity(worst, quantity_of("co2-factor-net"), &reference, &e, &err), &err, BC_ERR_RANGE, "can be zero");
    bc_worst_close(worst);
}

/* A bound twice is an equation, and bent: the density still has a least and a greatest value on it. */
static void a_limit_of_one_value_is_kept(void **state)
{
    bc_reference reference;
    bc_ratio ratio;
    double value = 0.0;

    (void)state;
    natural_gas(&space);
    add_limit(&space, "wobbe-gross", "25/0", 51.7, 51.7);
    bc_worst *worst = opened(&space);

    reference_of("15/15", &reference);
    const bc_extremes e = extremes_of(worst, "relative-density", &reference);

    assert_extremes("relative-density", &e, &reference);
    assert_true(e.max.value > e.min.value + 0.05);
    ratio = space.limits[0].ratio;
    assert_int_equal(bc_ratio_evaluate(&ratio, &e.min.gas, &value, NULL), BC_OK);
    assert_within(value, 51.7, 51.7 * 1e-9);
    assert_int_equal(bc_ratio_evaluate(&ratio, &e.max.gas, &value, NULL), BC_OK);
    assert_within(value, 51.7, 51.7 * 1e-9);
    bc_worst_close(worst);
}

/* Figures of a state are the same whatever was asked before, and from one run to the next. */
static void answers_do_not_depend_on_what_was_asked_before(void **state)
{
    static const char *const STATES[] = {"15/15", "25/0", "0/0", "20/20", "25/20", "60F/60F", "15/1", "15/2", "15/3", "15/4", "15/5", "15/6", "15/7", "15/8",
                                         "15/9", "15/10", "15/11", "15/12", "15/13", "15/14", "15/16", "15/17", "15/18", "15/19", "15/21", "15/22",
                                         "15/23", "15/24", "15/25", "15/0.5", "15/1.5", "15/2.5", "15/3.5", "15/4.5"};

    (void)state;
    natural_gas(&space);
    add_limit(&space, "wobbe-gross", "25/0", 46.1, 56.5);
    bc_worst *worst = opened(&space);

    for (size_t k = 0; k < COUNT(STATES); k++) {
        bc_worst *fresh = opened(&space);
        bc_reference reference;

        reference_of(STATES[k], &reference);
        const bc_extremes a = extremes_of(worst, "hhv", &reference), b = extremes_of(fresh, "hhv", &reference);

        assert_extremes("hhv", &a, &reference);
        assert_within_at(STATES[k], a.min.value, b.min.value, EXACT * a.min.value);
        assert_within_at(STATES[k], a.max.value, b.max.value, EXACT * a.max.value);
        bc_worst_close(fresh);
    }
    bc_worst_close(worst);
}

/* Metered saturated, the gas takes up water: 1.7 % of its heat at 15 C. An open window of water is refused as
 * a limit and searched as a quantity. */
static void saturated_states_count_their_water(void **state)
{
    static const window WET[] = {{"methane", 80, 100}, {"ethane", 0, 20}, {"water", 0.1, 0.1}};
    bc_state s = bc_state_default();
    bc_worst *open_water = NULL;
    bc_reference reference;
    bc_error err;

    (void)state;
    memset(&space, 0, sizeof space);
    add_windows(&space, WET, COUNT(WET));
    s.saturated = true;
    assert_ok(bc_reference_at(&s, &reference, &err), &err);
    bc_worst *worst = opened(&space);
    bc_extremes e = extremes_of(worst, "hhv", &reference);

    assert_extremes("hhv", &e, &reference);
    assert_within(e.min.value, 37.78 * (1.0 - 0.0168), 0.1);
    bc_worst_close(worst);
    space.components[2].min = 0.0;
    worst = opened(&space);
    e = extremes_of(worst, "hhv", &reference);
    assert_true(!e.min.exact && !e.min.bounded);
    bc_worst_close(worst);
    assert_ok(bc_ratio_of_quantity(quantity_of("hhv"), &reference, &space.limits[0].ratio, &err), &err);
    space.limits[0].min = 30.0;
    space.limits[0].max = 40.0;
    space.limit_count = 1;
    assert_refused(bc_worst_open(&space, &open_water, &err), &err, BC_ERR_RANGE, "give water one fraction");
    assert_null(open_water);
    space.components[0] = space.components[2];
    space.components[0].min = space.components[0].max = 1.0;
    space.component_count = 1;
    assert_refused(bc_worst_open(&space, &open_water, &err), &err, BC_ERR_RANGE, "nothing but water");
    assert_null(open_water);
}

/* What is next to a figure is not the figure: an idle limit on a Wobbe index bounds no heat. */
static void a_limit_on_one_figure_is_no_bound_of_another(void **state)
{
    static const char *const PAIRS[][2] = {
        {"wobbe-gross-ideal", "hhv-ideal"}, {"wobbe-gross", "hhv"}, {"hhv-ideal", "wobbe-gross-ideal"}, {"wobbe-net", "wobbe-gross"}, {"density-ideal", "hhv-ideal"}};
    bc_reference reference;

    (void)state;
    reference_of("15/15", &reference);
    for (size_t k = 0; k < COUNT(PAIRS); k++) {
        natural_gas(&space);
        bc_worst *worst = opened(&space);
        const bc_extremes limited = extremes_of(worst, PAIRS[k][0], &reference);
        const bc_extremes free = extremes_of(worst, PAIRS[k][1], &reference);

        bc_worst_close(worst);
        add_limit(&space, PAIRS[k][0], "15/15", limited.min.value * 0.999, limited.max.value * 1.001);
        worst = opened(&space);
        const bc_extremes again = extremes_of(worst, PAIRS[k][1], &reference);

        assert_within_at(PAIRS[k][1], again.min.value, free.min.value, EXACT * free.min.value);
        assert_within_at(PAIRS[k][1], again.max.value, free.max.value, EXACT * free.max.value);
        bc_worst_close(worst);
    }
}

static void a_dew_point_is_certified_through_its_water(void **state)
{
    bc_reference reference;

    (void)state;
    natural_gas(&space);
    bc_worst *worst = opened(&space);

    reference_of("15/15", &reference);
    const bc_extremes e = extremes_of(worst, "flue-dew-point", &reference);

    assert_extremes("flue-dew-point", &e, &reference);
    assert_true(e.min.value > 50.0 && e.max.value > e.min.value && e.max.value < 65.0);
    bc_worst_close(worst);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(no_random_gas_of_the_ranges_lies_beyond),
        cmocka_unit_test(no_random_gas_of_a_contract_lies_beyond),
        cmocka_unit_test(extremes_keep_every_limit),
        cmocka_unit_test(corners_of_small_spaces_are_the_extremes),
        cmocka_unit_test(the_least_wobbe_index_of_hydrogen_in_methane_lies_inside),
        cmocka_unit_test(a_grid_over_three_components_agrees),
        cmocka_unit_test(a_single_component_is_its_own_extreme),
        cmocka_unit_test(fixed_components_leave_one_gas),
        cmocka_unit_test(an_extreme_of_nothing_is_exact),
        cmocka_unit_test(a_limit_of_one_value_is_kept),
        cmocka_unit_test(answers_do_not_depend_on_what_was_asked_before),
        cmocka_unit_test(saturated_states_count_their_water),
        cmocka_unit_test(a_limit_on_one_figure_is_no_bound_of_another),
        cmocka_unit_test(a_dew_point_is_certified_through_its_water),
    };

    return cmocka_run_group_tests_name("supply/test_worst", tests, NULL, NULL);
}
