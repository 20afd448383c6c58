/* SPDX-License-Identifier: MIT */
/* test_worst_cell.c - what the proofs rest on: planes on the safe side, cells without gaps, bounds when they run out. */
#include "supply/worst_internal.h"
#include "worst_cases.h"

static bc_space space;
static const char *const FIGURES[] = {"hhv", "wobbe-gross", "wobbe-net-ideal", "z", "density", "hhv-mass", "hhv-mole"};

static void term_of(bc_worst *worst, const char *id, const char *at, worst_term *term)
{
    bc_reference reference;
    bc_ratio ratio;
    bc_error err;

    reference_of(at, &reference);
    assert_ok(bc_ratio_of_quantity(quantity_of(id), &reference, &ratio, &err), &err);
    assert_ok(worst_term_of(worst, &ratio, term, &err), &err);
    assert_ok(worst_add_axes(worst, term, &err), &err);
}

static void random_fractions(const bc_worst *worst, chance *c, double x[])
{
    double sum = 0.0;

    for (size_t j = 0; j < worst->columns; j++)
        sum += x[j] = pow(chance_uniform(c), 6.0);
    for (size_t j = 0; j < worst->columns; j++)
        x[j] /= sum;
}

/* A box over all axes around some of the gases, as narrow as a millionth of the whole. */
static void random_cell(const bc_worst *worst, chance *c, double gases[8][LP_COLUMNS], worst_cell *cell)
{
    const double share = pow(10.0, -6.0 * chance_uniform(c));

    for (int k = 0; k < 8; k++) {
        random_fractions(worst, c, gases[k]);
        for (size_t j = 0; k > 0 && j < worst->columns; j++)
            gases[k][j] = (1.0 - share) * gases[0][j] + share * gases[k][j];
    }
    for (size_t a = 0; a < worst->axis_count; a++) {
        cell->lo[a] = HUGE_VAL;
        cell->hi[a] = -HUGE_VAL;
        for (int k = 0; k < 8; k++) {
            const double at = worst_sum(worst, worst->axis[a].form, gases[k]);

            cell->lo[a] = fmin(cell->lo[a], at);
            cell->hi[a] = fmax(cell->hi[a], at);
        }
        cell->touch[a] = cell->lo[a] + chance_uniform(c) * (cell->hi[a] - cell->lo[a]);
    }
}

/* Sum over the axes. No power of a sum in a figure is above one, nor does one of 1 - s^2 change faster than s. */
static double relative_width(const bc_worst *worst, const worst_cell *cell)
{
    double width = 0.0;

    for (size_t a = 0; a < worst->axis_count; a++)
        width += (cell->hi[a] - cell->lo[a]) / fabs(cell->lo[a]);
    return width;
}

static void assert_planes_enclose(bool sums_are_positive)
{
    chance c = {2};
    bc_worst *worst = opened(&space);

    for (size_t f = 0; f < COUNT(FIGURES); f++) {
        worst_term term;

        term_of(worst, FIGURES[f], "25/0", &term);
        for (int i = 0; i < 2000; i++) {
            double gases[8][LP_COLUMNS], above[LP_COLUMNS], below[LP_COLUMNS];
            worst_cell cell;

            random_cell(worst, &c, gases, &cell);
            worst_estimate(worst, &term, &cell, true, above);
            worst_estimate(worst, &term, &cell, false, below);
            for (int k = 0; k < 8; k++) {
                double raw = 0.0;

                assert_true(worst_raw(worst, &term, gases[k], &raw));
                const double phi = worst_sum(worst, term.n, gases[k]) / raw;

                assert_true(worst_sum(worst, above, gases[k]) >= phi * (1.0 - 1e-13));
                assert_true(worst_sum(worst, below, gases[k]) <= phi * (1.0 + 1e-13));
                assert_true(worst_phi_least(worst, &term, &cell) <= phi * (1.0 + 1e-13));
                if (term.p < 1.0 && sums_are_positive) /* and no farther below than the cell is wide */
                    assert_true(worst_phi_least(worst, &term, &cell) >= phi * (1.0 - relative_width(worst, &cell)));
            }
        }
    }
    bc_worst_close(worst);
}

/* Hydrogen and helium have summation factors below zero: a sum over them is largest in magnitude at its lower end. */
static void planes_enclose_what_a_figure_is_divided_by(void **state)
{
    static const window LIGHT[] = {{"hydrogen", 0, 100}, {"helium", 0, 100}, {"methane", 0, 100}, {"propane", 0, 100}};

    (void)state;
    natural_gas(&space);
    assert_planes_enclose(true);
    memset(&space, 0, sizeof space);
    add_windows(&space, LIGHT, 2);
    assert_planes_enclose(false);
    memset(&space, 0, sizeof space);
    add_windows(&space, LIGHT, COUNT(LIGHT));
    assert_planes_enclose(false);
}

/* The two planes come together as the square of the width: a hundredfold of cells gains four digits. */
static void planes_close_in_with_the_square_of_the_width(void **state)
{
    chance c = {3};
    double gap[2] = {0.0, 0.0};
    worst_term term;

    (void)state;
    natural_gas(&space);
    bc_worst *worst = opened(&space);

    term_of(worst, "wobbe-gross", "25/0", &term);
    for (int narrow = 0; narrow < 2; narrow++)
        for (int i = 0; i < 200; i++) {
            double x[LP_COLUMNS], above[LP_COLUMNS], below[LP_COLUMNS];
            worst_cell cell;

            random_fractions(worst, &c, x);
            for (size_t a = 0; a < worst->axis_count; a++) {
                const double at = worst_sum(worst, worst->axis[a].form, x), width = (narrow ? 1e-3 : 1e-1) * at;

                cell.lo[a] = at - 0.3 * width;
                cell.hi[a] = at + 0.7 * width;
                cell.touch[a] = at;
            }
            worst_estimate(worst, &term, &cell, true, above);
            worst_estimate(worst, &term, &cell, false, below);
            gap[narrow] = fmax(gap[narrow], worst_sum(worst, above, x) / worst_sum(worst, below, x) - 1.0);
        }
    assert_true(gap[0] < 2e-3 && gap[1] < 3e-4 * gap[0]);
    bc_worst_close(worst);
}

static void cells_are_cut_without_a_gap(void **state)
{
    chance c = {4};
    worst_term term;

    (void)state;
    natural_gas(&space);
    bc_worst *worst = opened(&space);

    term_of(worst, "wobbe-gross", "25/0", &term);
    for (int i = 0; i < 500; i++) {
        const worst_run run = {.term = &term, .sign = 1.0};
        worst_cell whole, cell, other;
        size_t cuts = 0;

        worst_root(worst, &whole);
        whole.bound = 7.0;
        cell = whole;
        random_fractions(worst, &c, worst->cell_answer.x);
        assert_true(worst_cut(worst, &run, &cell, &other));
        for (size_t a = 0; a < worst->axis_count; a++) {
            assert_true(cell.lo[a] == whole.lo[a] && other.hi[a] == whole.hi[a]);
            if (cell.hi[a] != whole.hi[a]) {
                assert_true(cell.hi[a] == other.lo[a]);
                cuts++;
            } else {
                assert_true(other.lo[a] == whole.lo[a]);
            }
            assert_true(cell.touch[a] >= cell.lo[a] && cell.touch[a] <= cell.hi[a]);
            assert_true(other.touch[a] >= other.lo[a] && other.touch[a] <= other.hi[a]);
        }
        assert_int_equal(cuts, 1);
        assert_true(cell.bound == 7.0 && other.bound == 7.0);
    }
    bc_worst_close(worst);
}

/* However few cells are looked at, what is called a bound is one; with enough it meets the value. */
static void a_bound_holds_when_the_cells_run_out(void **state)
{
    static const size_t BUDGETS[] = {1, 2, 3, 5, 8, 20, 50, WORST_CELLS};
    worst_term term;

    (void)state;
    natural_gas(&space);
    add_limit(&space, "wobbe-gross", "25/0", 46.1, 56.5);
    bc_worst *worst = opened(&space);

    term_of(worst, "wobbe-gross", "15/15", &term);
    for (int side = 0; side < 2; side++) {
        const double sign = side ? 1.0 : -1.0;
        double bound[COUNT(BUDGETS)], best = 0.0;

        for (size_t k = 0; k < COUNT(BUDGETS); k++) {
            worst_run run = {.term = &term, .sign = sign, .found = true, .budget = BUDGETS[k]};

            memcpy(run.x, worst->inside, sizeof run.x);
            assert_true(worst_raw(worst, &term, run.x, &run.best));
            worst_explore(worst, &run);
            assert_true(run.cells <= BUDGETS[k]);
            bound[k] = run.bound;
            best = run.best;
        }
        assert_within(bound[COUNT(BUDGETS) - 1], best, 1e-6 * best);
        for (size_t k = 0; k < COUNT(BUDGETS); k++)
            assert_true(sign * (bound[k] - best) >= 0.0);
        assert_true(sign * (bound[0] - best) > 1e-6 * best);
    }
    bc_worst_close(worst);
}

/* Cells that 28 extremes of a contract take together, 518 (our own results, the same by GCC and Clang): what promises most
 * is cut first, where the planes are furthest apart, and walks onto the limits find what is to be beaten. */
static void extremes_of_a_contract_take_few_cells(void **state)
{
    static const char *const STATES[] = {"25/0", "15/15"};
    size_t cells = 0;

    (void)state;
    natural_gas(&space);
    add_contract(&space);
    bc_worst *worst = opened(&space);

    for (size_t k = 0; k < COUNT(FIGURES) * COUNT(STATES); k++) {
        worst_term term;

        term_of(worst, FIGURES[k / 2], STATES[k % 2], &term);
        for (int side = 0; side < 2; side++) {
            worst_run run = {.term = &term, .sign = side ? 1.0 : -1.0, .found = true, .budget = WORST_CELLS};

            memcpy(run.x, worst->inside, sizeof run.x);
            assert_true(worst_raw(worst, &term, run.x, &run.best));
            worst_explore(worst, &run);
            cells += run.cells;
        }
    }
    assert_in_range(cells, 28, 525);
    bc_worst_close(worst);
}

/* A search narrows a program to its region of trust, and gives it back whole. */
static void a_search_gives_the_windows_back(void **state)
{
    bc_reference reference;
    bc_extremes e;
    bc_error err;

    (void)state;
    natural_gas(&space);
    bc_worst *worst = opened(&space);

    reference_of("15/15", &reference);
    assert_ok(bc_worst_quantity(worst, quantity_of("flame-temperature-complete"), &reference, &e, &err), &err);
    assert_memory_equal(worst->near_lp.lower, worst->bounds.lower, sizeof worst->bounds.lower);
    assert_memory_equal(worst->near_lp.upper, worst->bounds.upper, sizeof worst->bounds.upper);
    bc_worst_close(worst);
}

/* A divisor without an axis, a sum of masses or heats, is nowhere below that of the pure component that has the least,
 * wherever it stands. */
static void a_linear_divisor_is_least_in_a_pure_component(void **state)
{
    static const window WINDOWS[][2] = {{{"hydrogen", 0, 100}, {"propane", 0, 100}}, {{"propane", 0, 100}, {"hydrogen", 0, 100}}};
    static const char *const IDS[] = {"hhv-mass", "co2-factor-net"};

    (void)state;
    for (size_t k = 0; k < COUNT(WINDOWS); k++)
        for (size_t i = 0; i < COUNT(IDS); i++) {
            worst_cell cell;
            worst_term term;
            bc_reference reference;
            bc_ratio ratio;
            bc_error err;

            memset(&space, 0, sizeof space);
            add_windows(&space, WINDOWS[k], 2);
            bc_worst *worst = opened(&space);

            reference_of("15/15", &reference);
            assert_ok(bc_ratio_of_quantity(quantity_of(IDS[i]), &reference, &ratio, &err), &err);
            assert_ok(worst_term_of(worst, &ratio, &term, &err), &err);
            assert_within(term.p, 1.0, 0.0);
            worst_root(worst, &cell);
            assert_within(worst_phi_least(worst, &term, &cell), fmin(term.d[0], term.d[1]), 0.0);
            assert_true(term.d[k == 0 ? 0 : 1] < 0.999); /* hydrogen has the least */
            bc_worst_close(worst);
        }
}

/* CO2 per heat of a gas without heat, volumes of what the summation formula makes no gas: neither has a figure. */
static void a_gas_without_a_figure_has_no_raw_one(void **state)
{
    static const window WINDOWS[] = {{"methane", 0, 100}, {"nitrogen", 0, 100}, {"n-pentadecane", 0, 100}};
    static const double METHANE[] = {1.0, 0.0, 0.0}, NITROGEN[] = {0.0, 1.0, 0.0}, HEAVY[] = {0.0, 0.0, 1.0};
    bc_reference reference;
    bc_ratio ratio;
    worst_term term;
    double raw = -7.0;
    bc_error err;

    (void)state;
    memset(&space, 0, sizeof space);
    add_windows(&space, WINDOWS, COUNT(WINDOWS));
    bc_worst *worst = opened(&space);

    reference_of("15/0", &reference);
    assert_ok(bc_ratio_of_quantity(quantity_of("co2-factor-net"), &reference, &ratio, &err), &err);
    assert_ok(worst_term_of(worst, &ratio, &term, &err), &err);
    assert_false(worst_raw(worst, &term, NITROGEN, &raw));
    assert_within(raw, -7.0, 0.0);
    assert_true(worst_raw(worst, &term, METHANE, &raw));
    assert_ok(bc_ratio_of_quantity(quantity_of("hhv"), &reference, &ratio, &err), &err);
    assert_ok(worst_term_of(worst, &ratio, &term, &err), &err);
    raw = -7.0;
    assert_false(worst_raw(worst, &term, HEAVY, &raw));
    assert_within(raw, -7.0, 0.0);
    assert_true(worst_raw(worst, &term, NITROGEN, &raw));
    bc_worst_close(worst);
}

/* What bc_space allows, asked bound by bound; a bound itself is allowed, and the sum may be off by rounding alone. */
static void a_composition_is_allowed_within_all_bounds_and_no_other(void **state)
{
    static const window WINDOWS[] = {{"methane", 50, 100}, {"ethane", 10, 30}, {"nitrogen", 0, 20}};
    static const struct {
        double x[3];
        bool allowed;
    } ROWS[] = {{{0.75, 0.25, 0.0}, true},     {{0.5, 0.3, 0.2}, true},      {{0.75, 0.1, 0.15}, true},    {{0.499, 0.301, 0.2}, false},
                {{0.91, 0.09, 0.0}, false},    {{0.76, 0.25, -0.01}, false}, {{0.6, 0.19, 0.21}, false},   {{0.75, 0.25, 0.001}, false},
                {{0.749, 0.25, 0.0}, false},   {{0.69, 0.31, 0.0}, false},   {{0.70, 0.25, 0.05}, true},   {{0.695, 0.25, 0.055}, false}};
    bc_error err;

    (void)state;
    memset(&space, 0, sizeof space);
    add_windows(&space, WINDOWS, COUNT(WINDOWS));
    bc_worst *worst = opened(&space);

    for (size_t i = 0; i < 10; i++)
        assert_int_equal(worst_allowed(worst, ROWS[i].x), ROWS[i].allowed);
    bc_worst_close(worst);
    add_group(&space, (const char *const[4]){"nitrogen", NULL}, 5.0, 100.0);
    worst = opened(&space);
    assert_false(worst_allowed(worst, ROWS[0].x));
    assert_true(worst_allowed(worst, ROWS[10].x));
    bc_worst_close(worst);
    memset(&space, 0, sizeof space);
    add_windows(&space, WINDOWS, COUNT(WINDOWS));
    add_limit(&space, "hhv-mole", "15/15", 0.0, 1e9);
    const bc_gas edge = gas_of(&space, ROWS[10].x); /* the limit is the figure of one gas, the next has less */
    double value = 0.0;

    assert_ok(bc_ratio_evaluate(&space.limits[0].ratio, &edge, &value, &err), &err);
    space.limits[0].min = value;
    worst = opened(&space);
    assert_true(worst_allowed(worst, ROWS[10].x));
    assert_true(worst_limit_holds(worst, 0, ROWS[10].x));
    assert_false(worst_allowed(worst, ROWS[11].x));
    assert_false(worst_limit_holds(worst, 0, ROWS[11].x));
    bc_worst_close(worst);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(planes_enclose_what_a_figure_is_divided_by),
        cmocka_unit_test(planes_close_in_with_the_square_of_the_width),
        cmocka_unit_test(cells_are_cut_without_a_gap),
        cmocka_unit_test(a_bound_holds_when_the_cells_run_out),
        cmocka_unit_test(a_search_gives_the_windows_back),
        cmocka_unit_test(extremes_of_a_contract_take_few_cells),
        cmocka_unit_test(a_linear_divisor_is_least_in_a_pure_component),
        cmocka_unit_test(a_gas_without_a_figure_has_no_raw_one),
        cmocka_unit_test(a_composition_is_allowed_within_all_bounds_and_no_other),
    };

    return cmocka_run_group_tests_name("supply/test_worst_cell", tests, NULL, NULL);
}
