/* SPDX-License-Identifier: MIT */
/* test_worst_explain.c - spaces that are refused or empty, limits that are idle or open, extremes searched for. */
#include "worst_cases.h"

static bc_space space;
static bc_conflict conflict;

static void assert_conflict(bc_worst *worst, const bc_conflict_part parts[], size_t count)
{
    assert_true(bc_worst_is_empty(worst));
    bc_worst_conflict(worst, &conflict);
    for (size_t i = 0; i < conflict.count; i++) {
        bool expected = false;

        for (size_t k = 0; k < count; k++)
            expected = expected || (parts[k].kind == conflict.parts[i].kind && parts[k].index == conflict.parts[i].index &&
                                    parts[k].upper == conflict.parts[i].upper);
        if (!expected)
            fail_msg("kind %d index %zu upper %d is no part of it", (int)conflict.parts[i].kind, conflict.parts[i].index,
                     conflict.parts[i].upper);
    }
    assert_int_equal(conflict.count, count);
}

static void windows_that_do_not_reach_one_conflict(void **state)
{
    static const window WINDOWS[] = {{"methane", 0, 80}, {"ethane", 0, 12}, {"nitrogen", 0, 5}};

    (void)state;
    memset(&space, 0, sizeof space);
    add_windows(&space, WINDOWS, COUNT(WINDOWS));
    bc_worst *worst = opened(&space);

    assert_conflict(worst, (const bc_conflict_part[]){{BC_PART_COMPONENT, 0, true}, {BC_PART_COMPONENT, 1, true}, {BC_PART_COMPONENT, 2, true}}, 3);
    bc_worst_close(worst);
}

static void a_group_against_its_components_conflicts(void **state)
{
    static const window WINDOWS[] = {{"methane", 60, 100}, {"ethane", 0, 12}, {"nitrogen", 3, 9}, {"carbon-dioxide", 2.5, 6}};

    (void)state;
    memset(&space, 0, sizeof space);
    add_windows(&space, WINDOWS, COUNT(WINDOWS));
    add_group(&space, (const char *const[4]){"nitrogen", "carbon-dioxide", NULL}, 0.0, 5.0);
    bc_worst *worst = opened(&space);

    assert_conflict(worst, (const bc_conflict_part[]){{BC_PART_COMPONENT, 2, false}, {BC_PART_COMPONENT, 3, false}, {BC_PART_GROUP, 0, true}}, 3);
    bc_worst_close(worst);
}

/* Heavy gas needs propane for a Wobbe index of 58, but then its density is over 0.6. */
static void two_limits_that_exclude_each_other_are_named(void **state)
{
    static const window WINDOWS[] = {{"methane", 0, 100}, {"propane", 0, 100}};

    (void)state;
    memset(&space, 0, sizeof space);
    add_windows(&space, WINDOWS, COUNT(WINDOWS));
    add_limit(&space, "hhv", "15/15", 30.0, 100.0);
    add_limit(&space, "wobbe-gross", "25/0", 58.0, HUGE_VAL);
    add_limit(&space, "relative-density", "15/15", 0.5, 0.6);
    bc_worst *worst = opened(&space);
    bc_extremes e;
    bc_limit_standing s;
    bc_reference reference;
    bc_error err;

    assert_conflict(worst, (const bc_conflict_part[]){{BC_PART_LIMIT, 1, false}, {BC_PART_LIMIT, 2, true}}, 2);
    assert_true(bc_worst_is_empty(worst));
    assert_refused(bc_worst_standing(worst, 0, &s, &err), &err, BC_ERR_INPUT, "exclude each other");
    reference_of("15/15", &reference);
    assert_refused(bc_worst_quantity(worst, quantity_of("hhv"), &reference, &e, &err), &err, BC_ERR_INPUT, "exclude each other");
    assert_refused(bc_worst_quantity(worst, quantity_of("lfl"), &reference, &e, &err), &err, BC_ERR_INPUT, "exclude each other");
    bc_worst_close(worst);
}

/* A bound of a space, and what it is when there is none. */
static double *bound_of(bc_space *s, const bc_conflict_part *p, double *open)
{
    *open = p->upper ? HUGE_VAL : -HUGE_VAL;
    if (p->kind == BC_PART_GROUP)
        return p->upper ? &s->groups[p->index].max : &s->groups[p->index].min;
    if (p->kind == BC_PART_LIMIT)
        return p->upper ? &s->limits[p->index].max : &s->limits[p->index].min;
    *open = p->upper ? 1.0 : 0.0;
    return p->upper ? &s->components[p->index].max : &s->components[p->index].min;
}

/* The space with no bounds but those of the conflict, less one. */
static void only_conflict_without(size_t left_out, bc_space *bare)
{
    const size_t counts[] = {[BC_PART_COMPONENT] = space.component_count, [BC_PART_GROUP] = space.group_count, [BC_PART_LIMIT] = space.limit_count};
    double open;

    *bare = space;
    for (int kind = 0; kind < 3; kind++)
        for (size_t i = 0; i < counts[kind]; i++)
            for (int upper = 0; upper < 2; upper++) {
                const bc_conflict_part p = {(bc_part_kind)kind, i, upper == 1};
                double *bound = bound_of(bare, &p, &open);

                *bound = open;
            }
    for (size_t m = 0; m < conflict.count; m++)
        if (m != left_out)
            *bound_of(bare, &conflict.parts[m], &open) = *bound_of(&space, &conflict.parts[m], &open);
}

static void every_part_of_a_conflict_is_needed_and_no_other(void **state)
{
    static bc_space bare;

    (void)state;
    natural_gas(&space);
    add_contract(&space);
    space.limits[0].min = 58.0;
    space.limits[0].max = 60.0;
    bc_worst *worst = opened(&space);

    assert_true(bc_worst_is_empty(worst));
    bc_worst_conflict(worst, &conflict);
    bc_worst_close(worst);
    assert_true(conflict.count >= 2);
    for (size_t i = 0; i <= conflict.count; i++) {
        only_conflict_without(i, &bare);
        worst = opened(&bare);
        assert_int_equal(bc_worst_is_empty(worst), i == conflict.count);
        bc_worst_close(worst);
    }
}

static void a_space_with_gases_has_no_conflict(void **state)
{
    (void)state;
    natural_gas(&space);
    bc_worst *worst = opened(&space);

    assert_false(bc_worst_is_empty(worst));
    bc_worst_conflict(worst, &conflict);
    assert_int_equal(conflict.count, 0);
    bc_worst_close(worst);
    bc_worst_close(NULL);
}

static void an_impossible_compression_factor_conflicts_alone(void **state)
{
    static const window WINDOWS[] = {{"methane", 90, 100}, {"ethane", 0, 10}};

    (void)state;
    memset(&space, 0, sizeof space);
    add_windows(&space, WINDOWS, COUNT(WINDOWS));
    add_limit(&space, "z", "15/15", -HUGE_VAL, -0.5);
    bc_worst *worst = opened(&space);

    assert_conflict(worst, (const bc_conflict_part[]){{BC_PART_LIMIT, 0, true}}, 1);
    bc_worst_close(worst);
}

/* Water that a saturated state replaces is of no matter to its limit. */
static void fixed_water_is_no_part_of_a_saturated_conflict(void **state)
{
    static const window WINDOWS[] = {{"methane", 0, 100}, {"water", 5, 5}};
    bc_state at = bc_state_default();
    bc_reference reference;
    bc_error err;

    (void)state;
    memset(&space, 0, sizeof space);
    add_windows(&space, WINDOWS, COUNT(WINDOWS));
    at.saturated = true;
    assert_ok(bc_reference_at(&at, &reference, &err), &err);
    space.limit_count = 1;
    assert_ok(bc_ratio_of_quantity(quantity_of("hhv"), &reference, &space.limits[0].ratio, &err), &err);
    space.limits[0].min = 37.5; /* 37.78 dry, 37.14 saturated */
    space.limits[0].max = HUGE_VAL;
    bc_worst *worst = opened(&space);

    assert_conflict(worst, (const bc_conflict_part[]){{BC_PART_LIMIT, 0, false}}, 1);
    bc_worst_close(worst);
}

/* Methane to ethane: relative density 0.555 to 1.048, heat 37.8 to 66 MJ/m3. */
static void limits_are_idle_or_open_as_the_ranges_have_it(void **state)
{
    static const window WINDOWS[] = {{"methane", 0, 100}, {"ethane", 0, 100}};
    bc_limit_standing s;
    bc_error err;
    double value = 0.0;

    (void)state;
    memset(&space, 0, sizeof space);
    add_windows(&space, WINDOWS, COUNT(WINDOWS));
    add_limit(&space, "relative-density", "15/15", 0.5, 0.7);
    add_limit(&space, "hhv", "15/15", -HUGE_VAL, 50.0);
    add_limit(&space, "z", "15/15", 0.99, HUGE_VAL);
    bc_worst *worst = opened(&space);

    assert_ok(bc_worst_standing(worst, 0, &s, &err), &err);
    assert_true(s.min.stated && s.min.idle && !s.min.open && s.min.excess == 0.0);
    assert_true(s.max.stated && !s.max.idle && s.max.open);
    assert_int_equal(bc_ratio_evaluate(&space.limits[0].ratio, &s.max.gas, &value, NULL), BC_OK);
    assert_within(s.max.excess, value - 0.7, 1e-9);
    assert_within(value, 1.047, 0.002);
    /* a heat of 50 is reached at a relative density of about 0.766: kept by the other limit, not by the ranges */
    assert_ok(bc_worst_standing(worst, 1, &s, &err), &err);
    assert_true(!s.min.stated && !s.min.idle && !s.min.open);
    assert_true(s.max.stated && s.max.idle && s.max.open);
    assert_within(s.max.excess, 16.63, 0.02); /* ethane: 66.63 MJ/m3, a real gas */
    /* an inverse figure: ethane has 0.9916 */
    assert_ok(bc_worst_standing(worst, 2, &s, &err), &err);
    assert_true(s.min.stated && s.min.idle && !s.min.open && !s.max.stated);
    assert_refused(bc_worst_standing(worst, 3, &s, &err), &err, BC_ERR_USAGE, "no limit");
    bc_worst_close(worst);
}

/* A figure whose extremes are certified, asked as if nothing were known of it. */
static double unknown_figure(const bc_gas *gas, void *context)
{
    double value = 0.0;

    return bc_ratio_evaluate(context, gas, &value, NULL) == BC_OK ? value : HUGE_VAL;
}

/* By how much the ranges alone break a limit is the extreme of its figure in a space without any limit. */
static void limits_are_open_by_what_the_ranges_alone_allow(void **state)
{
    static bc_space bare;
    bc_error err;

    (void)state;
    natural_gas(&bare);
    space = bare;
    add_contract(&space);
    bc_worst *all = opened(&space), *none = opened(&bare);

    for (size_t i = 0; i < space.limit_count; i++) {
        const bc_space_limit *l = &space.limits[i];
        bc_limit_standing s;
        bc_extremes e;

        assert_ok(bc_worst_standing(all, i, &s, &err), &err);
        assert_ok(bc_worst_ratio(none, &l->ratio, &e, &err), &err);
        assert_int_equal(s.min.open, e.min.value < l->min);
        assert_int_equal(s.max.open, e.max.value > l->max);
        assert_within(s.min.excess, s.min.open ? l->min - e.min.value : 0.0, 1e-6 * fabs(l->min));
        assert_within(s.max.excess, s.max.open ? e.max.value - l->max : 0.0, 1e-6 * fabs(l->max));
    }
    bc_worst_close(all);
    bc_worst_close(none);
}

/* A side is idle when the extreme that all other limits leave keeps it. */
static void a_limit_is_idle_by_what_the_others_leave(void **state)
{
    static bc_space others;
    bc_error err;
    size_t idle = 0;

    (void)state;
    natural_gas(&space);
    add_contract(&space);
    add_limit(&space, "hhv", "25/0", 30.0, 70.0);
    add_limit(&space, "hhv", "25/0", 30.0, 70.0); /* either is idle by the other */
    add_limit(&space, "wobbe-net", "25/0", 40.0, HUGE_VAL);
    add_limit(&space, "density", "25/0", -HUGE_VAL, 0.99);
    add_limit(&space, "wobbe-gross", "15/0", -HUGE_VAL, 53.7);
    bc_worst *all = opened(&space);

    for (size_t i = 0; i < space.limit_count; i++) {
        bc_limit_standing s;
        bc_extremes e;

        assert_ok(bc_worst_standing(all, i, &s, &err), &err);
        for (int upper = 0; upper < 2; upper++) {
            const bool stated = isfinite(upper ? space.limits[i].max : space.limits[i].min);

            assert_int_equal(upper ? s.max.stated : s.min.stated, stated);
            if (!stated)
                continue;
            others = space;
            *(upper ? &others.limits[i].max : &others.limits[i].min) = upper ? HUGE_VAL : -HUGE_VAL;
            bc_worst *left = opened(&others);

            assert_ok(bc_worst_ratio(left, &space.limits[i].ratio, &e, &err), &err);
            assert_int_equal(upper ? s.max.idle : s.min.idle,
                             upper ? e.max.value <= space.limits[i].max * (1.0 + 1e-9) : e.min.value >= space.limits[i].min * (1.0 - 1e-9));
            idle += upper ? s.max.idle : s.min.idle;
            bc_worst_close(left);
        }
    }
    assert_true(idle > 1 && idle < 2 * space.limit_count);
    bc_worst_close(all);
}

/* Small figures stand as large ones do: rounding is relative. Hydrogen sulfide in kg a cubic metre. */
static void a_limit_on_a_trace_stands_as_its_extreme_does(void **state)
{
    static const double MAX[] = {1e-6, 1e-3};
    double weight[BC_SPECIES_CAPACITY] = {0.0};
    static bc_space bare;
    bc_reference reference;
    bc_ratio sulfur;
    bc_extremes e;
    bc_error err;

    (void)state;
    natural_gas(&bare);
    reference_of("15/15", &reference);
    weight[species_of("hydrogen-sulfide")] = bc_species_molar_mass_kg_per_mol(species_of("hydrogen-sulfide"));
    assert_ok(bc_ratio_of_concentration(weight, 1.0, &reference, &sulfur, &err), &err);
    bc_worst *none = opened(&bare);

    assert_ok(bc_worst_ratio(none, &sulfur, &e, &err), &err);
    bc_worst_close(none);
    for (size_t i = 0; i < COUNT(MAX); i++) {
        bc_limit_standing s;

        space = bare;
        space.limits[space.limit_count++] = (bc_space_limit){sulfur, -HUGE_VAL, MAX[i]};
        bc_worst *worst = opened(&space);

        assert_ok(bc_worst_standing(worst, 0, &s, &err), &err);
        assert_int_equal(s.max.open, e.max.value > MAX[i]);
        assert_int_equal(s.max.idle, e.max.value <= MAX[i]);
        assert_within(s.max.excess, s.max.open ? e.max.value - MAX[i] : 0.0, 1e-6 * e.max.value);
        bc_worst_close(worst);
    }
    assert_true(e.max.value > MAX[0] && e.max.value < MAX[1]);
}

/* A limit bounds its own figure, and not one that is only like it: another heat, another temperature or pressure of
 * metering, another divisor. The second route is a search that knows no bounds. */
static void a_limit_proves_nothing_of_a_figure_like_it(void **state)
{
    static const struct {
        const char *limit, *at, *figure, *other_at;
        double min, max;
    } PAIRS[] = {{"hhv", "15/15", "lhv", "15/15", 37.0, 40.0},
                 {"hhv", "15/15", "hhv", "15/0", 37.0, 40.0},
                 {"hhv", "15/15", "hhv", "15/15@91", 37.0, 40.0},
                 {"hhv", "15/15", "wobbe-gross", "15/15", 37.0, 40.0},
                 {"hhv", "15/15", "hhv-ideal", "15/15", 37.0, 40.0},
                 {"wobbe-gross", "15/15", "hhv", "15/15", 47.0, 50.0},
                 {"wobbe-gross", "15/15", "wobbe-gross-ideal", "15/15", 47.0, 50.0},
                 {"wobbe-gross", "15/15", "wobbe-net", "15/15", 47.0, 50.0},
                 {"co2-factor-gross", "15/15", "co2-factor-net", "15/15", 49.0, 52.0},
                 {"hhv-mass", "15/15", "hhv-mole", "15/15", 49.0, 53.0}};
    bc_error err;

    (void)state;
    for (size_t i = 0; i < COUNT(PAIRS); i++) {
        bc_reference reference;
        bc_ratio ratio;
        bc_extremes proven, searched;

        natural_gas(&space);
        add_limit(&space, PAIRS[i].limit, PAIRS[i].at, PAIRS[i].min, PAIRS[i].max);
        bc_worst *worst = opened(&space);

        reference_of(PAIRS[i].other_at, &reference);
        assert_ok(bc_ratio_of_quantity(quantity_of(PAIRS[i].figure), &reference, &ratio, &err), &err);
        assert_ok(bc_worst_ratio(worst, &ratio, &proven, &err), &err);
        assert_ok(bc_worst_search(worst, unknown_figure, &ratio, &searched, &err), &err);
        assert_true(proven.min.exact && proven.max.exact);
        assert_true(proven.min.value <= searched.min.value * (1.0 + 1e-6) && proven.max.value >= searched.max.value * (1.0 - 1e-6));
        assert_true(searched.min.value >= proven.min.bound * (1.0 - 1e-9) && searched.max.value <= proven.max.bound * (1.0 + 1e-9));
        assert_within_at(PAIRS[i].figure, searched.min.value, proven.min.value, 1e-3 * (proven.max.value - proven.min.value));
        assert_within_at(PAIRS[i].figure, searched.max.value, proven.max.value, 1e-3 * (proven.max.value - proven.min.value));
        bc_worst_close(worst);
    }
}

/* Ranges that let in what the summation formula makes no gas, or a gas that does not burn, have no such figure. */
static void figures_that_some_gas_lacks_are_refused(void **state)
{
    static const window HEAVY[] = {{"methane", 0, 100}, {"n-pentadecane", 0, 100}}, INERT[] = {{"methane", 0, 100}, {"nitrogen", 0, 100}};
    bc_reference reference;
    bc_extremes e;
    bc_error err;

    (void)state;
    reference_of("15/0", &reference);
    memset(&space, 0, sizeof space);
    add_windows(&space, HEAVY, COUNT(HEAVY));
    bc_worst *worst = opened(&space);

    assert_refused(bc_worst_quantity(worst, quantity_of("hhv"), &reference, &e, &err), &err, BC_ERR_RANGE, "no such figure");
    assert_ok(bc_worst_quantity(worst, quantity_of("hhv-mole"), &reference, &e, &err), &err);
    bc_worst_close(worst);
    memset(&space, 0, sizeof space);
    add_windows(&space, INERT, COUNT(INERT));
    worst = opened(&space);
    assert_refused(bc_worst_quantity(worst, quantity_of("co2-factor-net"), &reference, &e, &err), &err, BC_ERR_RANGE, "no such figure");
    bc_worst_close(worst);
}

/* What is asked in between changes nothing, to the last bit. */
static void standing_and_searching_leave_the_space_as_it_was(void **state)
{
    bc_limit_standing s;
    bc_extremes before, after;
    bc_reference reference;
    bc_error err;

    (void)state;
    natural_gas(&space);
    add_contract(&space);
    bc_worst *worst = opened(&space);

    reference_of("0/0", &reference);
    assert_ok(bc_worst_quantity(worst, quantity_of("hhv"), &reference, &before, &err), &err);
    for (size_t i = 0; i < space.limit_count; i++)
        assert_ok(bc_worst_standing(worst, i, &s, &err), &err);
    assert_ok(bc_worst_quantity(worst, quantity_of("hhv"), &reference, &after, &err), &err);
    assert_true(before.min.value == after.min.value && before.max.value == after.max.value);
    assert_ok(bc_worst_quantity(worst, quantity_of("lfl"), &reference, &after, &err), &err);
    assert_ok(bc_worst_quantity(worst, quantity_of("hhv"), &reference, &after, &err), &err);
    assert_true(before.min.value == after.min.value && before.max.value == after.max.value);
    bc_worst_close(worst);
}

static void what_is_no_space_is_refused(void **state)
{
    bc_worst *worst = NULL;
    bc_error err;

    (void)state;
    memset(&space, 0, sizeof space);
    assert_refused(bc_worst_open(&space, &worst, &err), &err, BC_ERR_USAGE, "needs a component");
    natural_gas(&space);
    space.components[3].min = 0.02;
    assert_refused(bc_worst_open(&space, &worst, &err), &err, BC_ERR_INPUT, "n-butane|0.015");
    space.components[3].min = (double)NAN;
    assert_refused(bc_worst_open(&space, &worst, &err), &err, BC_ERR_INPUT, "no window of a mole fraction");
    natural_gas(&space);
    space.components[3].species = space.components[0].species;
    assert_refused(bc_worst_open(&space, &worst, &err), &err, BC_ERR_INPUT, "methane has two windows");
    space.components[3].species = BC_SPECIES_CAPACITY;
    assert_refused(bc_worst_open(&space, &worst, &err), &err, BC_ERR_USAGE, "no species");
    natural_gas(&space);
    space.groups[0].max = -0.1;
    assert_refused(bc_worst_open(&space, &worst, &err), &err, BC_ERR_INPUT, "group 1");
    natural_gas(&space);
    add_limit(&space, "hhv", "15/15", HUGE_VAL, HUGE_VAL);
    assert_refused(bc_worst_open(&space, &worst, &err), &err, BC_ERR_INPUT, "limit 1");
    natural_gas(&space);
    add_limit(&space, "flue-dew-point", "15/15", 50.0, 60.0);
    assert_refused(bc_worst_open(&space, &worst, &err), &err, BC_ERR_INPUT, "cannot be a limit");
    space.limit_count = BC_SPACE_LIMIT_MAX + 1;
    assert_refused(bc_worst_open(&space, &worst, &err), &err, BC_ERR_USAGE, "at most");
    assert_null(worst);
}

static void a_search_finds_what_can_be_proven(void **state)
{
    static const char *const IDS[] = {"hhv", "wobbe-gross", "wobbe-net", "density", "z", "hhv-mass", "air-demand", "co2-max", "co2-factor-net"};
    bc_reference reference;
    bc_error err;

    (void)state;
    reference_of("15/15", &reference);
    for (int limits = 0; limits < 2; limits++) {
        natural_gas(&space);
        if (limits)
            add_contract(&space);
        bc_worst *worst = opened(&space);

        for (size_t k = 0; k < COUNT(IDS); k++) {
            bc_ratio ratio;
            bc_extremes proven, searched;

            assert_ok(bc_ratio_of_quantity(quantity_of(IDS[k]), &reference, &ratio, &err), &err);
            assert_ok(bc_worst_ratio(worst, &ratio, &proven, &err), &err);
            assert_ok(bc_worst_search(worst, unknown_figure, &ratio, &searched, &err), &err);
            assert_false(searched.min.exact || searched.max.exact || searched.min.bounded || searched.max.bounded);
            assert_true(searched.min.value >= proven.min.bound && searched.max.value <= proven.max.bound);
            /* a thousandth of the width: what local searches along bent limits may leave */
            assert_within_at(IDS[k], searched.min.value, proven.min.value, 1e-3 * (proven.max.value - proven.min.value));
            assert_within_at(IDS[k], searched.max.value, proven.max.value, 1e-3 * (proven.max.value - proven.min.value));
        }
        bc_worst_close(worst);
    }
}

/* A hill inside: no corner is the highest. */
static double hill(const bc_gas *gas, void *context)
{
    const double *top = context;
    const double a = gas->x[species_of("methane")] - top[0], b = gas->x[species_of("ethane")] - top[1];

    return 7.0 - a * a - 2.0 * b * b;
}

static void a_search_finds_the_top_of_a_hill_inside(void **state)
{
    static const window WINDOWS[] = {{"methane", 0, 100}, {"ethane", 0, 100}, {"nitrogen", 0, 100}};
    double top[] = {0.43, 0.29};
    bc_extremes e;
    bc_error err;

    (void)state;
    memset(&space, 0, sizeof space);
    add_windows(&space, WINDOWS, COUNT(WINDOWS));
    bc_worst *worst = opened(&space);

    assert_ok(bc_worst_search(worst, hill, top, &e, &err), &err);
    assert_within(e.max.value, 7.0, 1e-4);
    assert_within(e.min.value, 7.0 - 0.43 * 0.43 - 2.0 * 0.71 * 0.71, 1e-9);
    bc_worst_close(worst);
}

static double no_figure(const bc_gas *gas, void *context)
{
    (void)gas;
    (void)context;
    return HUGE_VAL;
}

static void a_figure_that_no_gas_has_is_refused(void **state)
{
    bc_extremes e;
    bc_error err;

    (void)state;
    natural_gas(&space);
    bc_worst *worst = opened(&space);

    assert_refused(bc_worst_search(worst, no_figure, NULL, &e, &err), &err, BC_ERR_RANGE, "none of the allowed gases");
    bc_worst_close(worst);
}

static void flame_temperatures_are_searched_and_allowed(void **state)
{
    bc_reference reference;
    bc_extremes e;
    bc_error err;

    (void)state;
    natural_gas(&space);
    add_contract(&space);
    bc_worst *worst = opened(&space);

    reference_of("15/15", &reference);
    assert_ok(bc_worst_quantity(worst, quantity_of("flame-temperature"), &reference, &e, &err), &err);
    assert_true(e.min.value > 1900.0 && e.min.value < e.max.value - 10.0 && e.max.value < 2000.0);
    for (size_t i = 0; i < space.limit_count; i++) {
        double value = 0.0;

        assert_int_equal(bc_ratio_evaluate(&space.limits[i].ratio, &e.max.gas, &value, NULL), BC_OK);
        assert_true(holds(value, space.limits[i].min, space.limits[i].max));
    }
    assert_refused(bc_worst_quantity(worst, bc_quantity_count(), &reference, &e, &err), &err, BC_ERR_USAGE, "no quantity");
    bc_worst_close(worst);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(windows_that_do_not_reach_one_conflict),
        cmocka_unit_test(a_group_against_its_components_conflicts),
        cmocka_unit_test(two_limits_that_exclude_each_other_are_named),
        cmocka_unit_test(every_part_of_a_conflict_is_needed_and_no_other),
        cmocka_unit_test(a_space_with_gases_has_no_conflict),
        cmocka_unit_test(an_impossible_compression_factor_conflicts_alone),
        cmocka_unit_test(fixed_water_is_no_part_of_a_saturated_conflict),
        cmocka_unit_test(limits_are_idle_or_open_as_the_ranges_have_it),
        cmocka_unit_test(limits_are_open_by_what_the_ranges_alone_allow),
        cmocka_unit_test(a_limit_is_idle_by_what_the_others_leave),
        cmocka_unit_test(a_limit_on_a_trace_stands_as_its_extreme_does),
        cmocka_unit_test(a_limit_proves_nothing_of_a_figure_like_it),
        cmocka_unit_test(figures_that_some_gas_lacks_are_refused),
        cmocka_unit_test(standing_and_searching_leave_the_space_as_it_was),
        cmocka_unit_test(what_is_no_space_is_refused),
        cmocka_unit_test(a_search_finds_what_can_be_proven),
        cmocka_unit_test(a_search_finds_the_top_of_a_hill_inside),
        cmocka_unit_test(a_figure_that_no_gas_has_is_refused),
        cmocka_unit_test(flame_temperatures_are_searched_and_allowed),
    };

    return cmocka_run_group_tests_name("supply/test_worst_explain", tests, NULL, NULL);
}
