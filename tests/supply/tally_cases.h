/* SPDX-License-Identifier: MIT */
/* tally_cases.h - random logs for tallies, and whether two tallies say the same. */
#ifndef TALLY_CASES_H
#define TALLY_CASES_H

#include "support.h"

#include "supply/tally.h"

#define CASE_FIGURES 3
#define CASE_LIMITS 3
#define CASE_ROWS 4000

/* Twelve digits are printed; the sums are good for twice that, so that all but the last bit is the same. */
#define CASE_SAME 2.3e-16

/* A log in memory, and the plan that it is summed up by. */
typedef struct {
    tally_plan plan;
    size_t count;
    tally_row rows[CASE_ROWS];
    double values[CASE_ROWS][CASE_FIGURES];
    double limit_values[CASE_ROWS][CASE_LIMITS];
} tally_case;

static inline tally_plan case_plan(double step_s, tally_period by)
{
    tally_plan plan = {.figure_count = CASE_FIGURES, .limit_count = CASE_LIMITS, .flag_count = 2, .step_s = step_s, .by = by,
                       .at = {25.0, 0.0, BC_P0_PA, false, 2016}};

    plan.figures[0] = (tally_figure_name){"wobbe-gross", "Wobbe index, gross", "MJ/m3"};
    plan.figures[1] = (tally_figure_name){"hydrogen", "hydrogen", "mol %"};
    plan.figures[2] = (tally_figure_name){"dew-point", "dew point", "C"};
    plan.limits[0] = (tally_limit_name){.id = "wobbe-gross", .unit = "MJ/m3", .has_min = true, .has_max = true, .min = 49.2, .max = 51.3};
    plan.limits[1] = (tally_limit_name){.id = "hydrogen", .unit = "mol %", .has_max = true, .max = 6.1};
    plan.limits[2] = (tally_limit_name){.id = "z", .unit = "1", .state = "0/0", .has_min = true, .min = 0.9971};
    plan.flags[0] = (tally_flag_name){"sum-off", "sum of the components is off"};
    plan.flags[1] = (tally_flag_name){"air", "air in the sample"};
    bc_state_describe(&plan.at, plan.state, sizeof plan.state);
    (void)snprintf(plan.contract, sizeof plan.contract, "Marrowfen works");
    return plan;
}

/* Mostly usual steps; now and then late, a gap, the same time again, or the clock put back. */
static inline double case_step(chance *c, double step_s)
{
    const size_t kind = chance_below(c, 100);

    if (kind < 90)
        return step_s;
    if (kind < 94)
        return step_s * (1.0 + 1.9 * chance_uniform(c));
    if (kind < 97)
        return step_s * (3.5 + 40.0 * chance_uniform(c));
    return kind < 99 ? 0.0 : -step_s;
}

static inline bool outside(const tally_limit_name *limit, double value)
{
    return (limit->has_min && value < limit->min) || (limit->has_max && value > limit->max);
}

static inline void case_row(tally_case *k, size_t i, chance *c, double time_s)
{
    tally_row *row = &k->rows[i];

    *row = (tally_row){.has_time = true, .time_s = time_s, .values = k->values[i], .limit_values = k->limit_values[i]};
    row->has_flow = chance_below(c, 20) > 0;
    row->power_w = row->has_flow ? 3.7e7 * chance_uniform(c) : 0.0;
    k->values[i][0] = 50.2 + 0.6 * sin((double)i / 37.0) + 0.2 * chance_normal(c);
    k->values[i][1] = chance_below(c, 4) == 0 ? 0.0 : exp(1.2 * chance_normal(c));
    k->values[i][2] = chance_below(c, 15) == 0 ? (double)NAN : -8.0 + 9.0 * chance_normal(c);
    k->limit_values[i][0] = k->values[i][0];
    k->limit_values[i][1] = k->values[i][1];
    k->limit_values[i][2] = 0.998 + 0.0004 * chance_normal(c);
    for (size_t l = 0; l < CASE_LIMITS; l++) {
        if (l == 2 && chance_below(c, 30) == 0)
            continue; /* not judged */
        row->known |= (uint64_t)1 << l;
        row->broken |= (uint64_t)outside(&k->plan.limits[l], k->limit_values[i][l]) << l;
    }
}

/* Times are whole seconds, as most logs have them, or milliseconds. */
static inline tally_case *case_make(uint64_t start, size_t count, double step_s, tally_period by)
{
    chance c = {start};
    tally_case *k = calloc(1, sizeof *k);
    double time_s = 1772000000.0 + (double)chance_below(&c, 9000000);

    assert_non_null(k);
    k->plan = case_plan(step_s, by);
    k->count = count;
    for (size_t i = 0; i < count; i++) {
        case_row(k, i, &c, time_s);
        time_s += round(1000.0 * case_step(&c, step_s > 0.0 ? step_s : 60.0)) / 1000.0;
    }
    return k;
}

static inline tally *case_open(const tally_case *k)
{
    tally *t = NULL;
    bc_error err;

    assert_ok(tally_open(&k->plan, &t, &err), &err);
    return t;
}

static inline void case_add(const tally_case *k, tally *t, size_t from, size_t to)
{
    bc_error err;

    for (size_t i = from; i < to; i++) {
        assert_ok(tally_add(t, &k->rows[i], &err), &err);
        if (i % 50 == 7)
            tally_add_refused(t, 1);
        if (i % 80 == 11)
            tally_count_flag(t, i % 2, 1);
    }
}

static inline tally *case_tally(const tally_case *k, size_t from, size_t to)
{
    tally *t = case_open(k);

    case_add(k, t, from, to);
    return t;
}

static inline void case_settle(tally *t)
{
    bc_error err;

    assert_ok(tally_settle(t, &err), &err);
}

#define same_number(a, b) support_same(#a, a, b, __FILE__, __LINE__)

static inline void support_same(const char *label, double a, double b, const char *file, int line)
{
    support_within(label, a, b, CASE_SAME * fmax(fabs(a), fabs(b)), file, line);
}

static inline void same_spread(const tally_spread *a, const tally_spread *b)
{
    assert_int_equal(a->rows, b->rows);
    assert_int_equal(a->has_mean, b->has_mean);
    assert_int_equal(a->has_energy_mean, b->has_energy_mean);
    same_number(a->held, b->held);
    same_number(a->mean, b->mean);
    same_number(a->sd, b->sd);
    same_number(a->energy_mean, b->energy_mean);
    same_number(a->min, b->min);
    same_number(a->max, b->max);
    same_number(a->min_s, b->min_s);
    same_number(a->max_s, b->max_s);
}

static inline void same_span(const tally_span *a, const tally_span *b)
{
    same_number(a->from_s, b->from_s);
    same_number(a->until_s, b->until_s);
    same_number(a->first_s, b->first_s);
    same_number(a->last_s, b->last_s);
    assert_int_equal(a->rows, b->rows);
    assert_int_equal(a->outside, b->outside);
    same_number(a->held, b->held);
    same_number(a->outside_held, b->outside_held);
    same_number(a->energy_j, b->energy_j);
}

static inline void same_cover(const tally *a, const tally *b)
{
    tally_cover x;
    tally_cover y;

    tally_covers(a, &x);
    tally_covers(b, &y);
    assert_int_equal(x.rows, y.rows);
    assert_int_equal(x.refused, y.refused);
    assert_int_equal(x.flows, y.flows);
    assert_int_equal(x.outside, y.outside);
    assert_int_equal(x.gaps, y.gaps);
    assert_int_equal(x.repeats, y.repeats);
    assert_int_equal(x.backs, y.backs);
    assert_int_equal(x.untimed, y.untimed);
    same_number(x.first_s, y.first_s);
    same_number(x.last_s, y.last_s);
    same_number(x.held, y.held);
    same_number(x.outside_held, y.outside_held);
    same_number(x.gap_s, y.gap_s);
    same_number(x.energy_j, y.energy_j);
    for (size_t i = 0; i < tally_plan_of(a)->flag_count; i++)
        assert_int_equal(tally_flagged(a, i), tally_flagged(b, i));
}

static inline void same_figure_of(const tally *a, const tally *b, size_t figure)
{
    static const double SHARES[] = {0.0, 0.01, 0.05, 0.5, 0.95, 0.99, 1.0};
    tally_spread x;
    tally_spread y;
    double bars_x[17];
    double bars_y[17];

    tally_spreads(a, figure, &x);
    tally_spreads(b, figure, &y);
    same_spread(&x, &y);
    same_number(tally_accuracy(a, figure), tally_accuracy(b, figure));
    for (size_t i = 0; i < COUNT(SHARES); i++) {
        double p = 0.0;
        double q = 0.0;

        assert_int_equal(tally_percentile(a, figure, SHARES[i], &p), tally_percentile(b, figure, SHARES[i], &q));
        same_number(p, q);
    }
    if (x.rows == 0)
        return;
    tally_bars(a, figure, x.min - 0.1, x.max + 0.1, COUNT(bars_x), bars_x);
    tally_bars(b, figure, x.min - 0.1, x.max + 0.1, COUNT(bars_y), bars_y);
    for (size_t i = 0; i < COUNT(bars_x); i++)
        same_number(bars_x[i], bars_y[i]);
}

static inline void same_groups(const tally *a, const tally *b)
{
    tally_span x;
    tally_span y;
    tally_spread s;
    tally_spread u;

    assert_int_equal(tally_period_count(a), tally_period_count(b));
    for (size_t i = 0; i < tally_period_count(a); i++) {
        tally_period_at(a, i, &x);
        tally_period_at(b, i, &y);
        same_span(&x, &y);
        for (size_t k = 0; k < tally_plan_of(a)->figure_count; k++) {
            tally_period_spread(a, i, k, &s);
            tally_period_spread(b, i, k, &u);
            same_spread(&s, &u);
        }
    }
    assert_int_equal(tally_trend_count(a), tally_trend_count(b));
    for (size_t i = 0; i < tally_trend_count(a); i++) {
        tally_trend_at(a, i, &x);
        tally_trend_at(b, i, &y);
        same_span(&x, &y);
        for (size_t k = 0; k < tally_plan_of(a)->figure_count; k++) {
            tally_trend_spread(a, i, k, &s);
            tally_trend_spread(b, i, k, &u);
            same_spread(&s, &u);
        }
    }
}

static inline void same_run(const tally_run *a, const tally_run *b)
{
    assert_int_equal(a->limit, b->limit);
    assert_int_equal(a->rows, b->rows);
    assert_int_equal(a->open_at_end, b->open_at_end);
    same_number(a->from_s, b->from_s);
    same_number(a->until_s, b->until_s);
    same_number(a->held, b->held);
    same_number(a->worst, b->worst);
    same_number(a->worst_s, b->worst_s);
    same_number(a->energy_j, b->energy_j);
}

static inline void same_limits(const tally *a, const tally *b)
{
    for (size_t i = 0; i < tally_plan_of(a)->limit_count; i++) {
        tally_excursions x;
        tally_excursions y;

        tally_outside(a, i, &x);
        tally_outside(b, i, &y);
        assert_int_equal(x.judged, y.judged);
        assert_int_equal(x.broken, y.broken);
        assert_int_equal(x.runs, y.runs);
        same_number(x.judged_held, y.judged_held);
        same_number(x.broken_held, y.broken_held);
        same_number(x.broken_j, y.broken_j);
        same_number(x.first_s, y.first_s);
        same_number(x.last_s, y.last_s);
        same_number(x.worst, y.worst);
        same_number(x.worst_s, y.worst_s);
        same_number(x.longest, y.longest);
        same_number(x.longest_from_s, y.longest_from_s);
    }
    assert_int_equal(tally_run_count(a), tally_run_count(b));
    for (size_t i = 0; i < tally_run_count(a); i++) {
        tally_run x;
        tally_run y;

        tally_run_at(a, i, &x);
        tally_run_at(b, i, &y);
        same_run(&x, &y);
    }
}

/* Both settled. */
static inline void assert_same_tally(const tally *a, const tally *b)
{
    same_cover(a, b);
    for (size_t i = 0; i < tally_plan_of(a)->figure_count; i++)
        same_figure_of(a, b, i);
    same_groups(a, b);
    same_limits(a, b);
}

#endif
