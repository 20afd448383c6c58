/* SPDX-License-Identifier: MIT */
/* test_tally.c - tallies of logs: holding, moments, percentiles, periods, excursions, bounds.
 *
 * Expected values are worked out here by the definition, in long double over all rows, or are those of bluecone/log.h,
 * which keeps every row. */
#include "tally_cases.h"

#include "bluecone/log.h"
#include "supply/tally_calendar.h"
#include "supply/tally_internal.h"

#include <malloc.h>

#define HOUR 3600.0
#define FEBRUARY 1770000000.0 /* 2026-02-02 02:40 */

/* A tally of one figure, at most with a limit on it from above. */
static tally *open_one(double step_s, double max, tally_period by)
{
    tally_plan plan = {.figure_count = 1, .step_s = step_s, .by = by};
    tally *t = NULL;
    bc_error err;

    plan.limit_count = isfinite(max) ? 1 : 0;
    plan.limits[0] = (tally_limit_name){.id = "hydrogen", .unit = "mol %", .has_max = true, .max = max};
    assert_ok(tally_open(&plan, &t, &err), &err);
    return t;
}

static bc_status add_with(tally *t, double time_s, double value, double power_w, bc_error *err)
{
    const tally_plan *plan = tally_plan_of(t);
    tally_row row = {.has_time = true, .time_s = time_s, .has_flow = power_w > 0.0, .power_w = power_w, .values = &value};

    row.limit_values = &value;
    row.known = plan->limit_count;
    row.broken = plan->limit_count > 0 && value > plan->limits[0].max;
    return tally_add(t, &row, err);
}

static void add(tally *t, double time_s, double value, double power_w)
{
    bc_error err;

    assert_ok(add_with(t, time_s, value, power_w, &err), &err);
}

static void a_row_holds_until_the_next_and_a_gap_does_not_count(void **state)
{
    tally *t = open_one(HOUR, HUGE_VAL, TALLY_WHOLE);
    tally_cover cover;
    tally_spread s;

    (void)state;
    add(t, FEBRUARY, 1.25, 2e6);
    add(t, FEBRUARY + 2.5 * HOUR, 2.5, 3e6);  /* holds 4.5 h: gap, one hour */
    add(t, FEBRUARY + 7.0 * HOUR, 3.75, 0.0); /* the same time again: holds none */
    add(t, FEBRUARY + 7.0 * HOUR, 5.5, 1e6);  /* the clock goes back: one hour */
    add(t, FEBRUARY + 6.0 * HOUR, 7.0, 1e6);  /* the last: one hour */
    tally_add_refused(t, 3);
    case_settle(t);
    tally_covers(t, &cover);
    assert_int_equal(cover.rows, 5);
    assert_int_equal(cover.refused, 3);
    assert_int_equal(cover.flows, 4);
    assert_int_equal(cover.gaps, 1);
    assert_int_equal(cover.repeats, 1);
    assert_int_equal(cover.backs, 1);
    assert_within(cover.held, 5.5 * HOUR, 1e-9);
    assert_within(cover.gap_s, 3.5 * HOUR, 1e-9);
    assert_within(cover.first_s, FEBRUARY, 1e-6);
    assert_within(cover.last_s, FEBRUARY + 7.0 * HOUR, 1e-6);
    assert_within(cover.energy_j, (2.5 * 2e6 + 3e6 + 1e6 + 1e6) * HOUR, 1.0);
    tally_spreads(t, 0, &s);
    assert_within(s.mean, (2.5 * 1.25 + 2.5 + 5.5 + 7.0) / 5.5, 1e-12);
    assert_within(s.energy_mean, (5.0 * 1.25 + 3.0 * 2.5 + 5.5 + 7.0) / 10.0, 1e-12);
    assert_within(s.min, 1.25, 0.0);
    assert_within(s.max, 7.0, 0.0);
    assert_within(s.max_s, FEBRUARY + 6.0 * HOUR, 1e-6);
    tally_close(t);
}

static void without_a_usual_step_rows_count(void **state)
{
    tally *t = open_one(0.0, 10.3, TALLY_WHOLE);
    tally_row row = {.known = 1};
    static const double VALUES[] = {9.25, 11.5, 10.75, 8.5};
    tally_cover cover;
    tally_spread s;
    tally_excursions e;
    bc_error err;

    (void)state;
    for (size_t i = 0; i < COUNT(VALUES); i++) {
        row.values = row.limit_values = &VALUES[i];
        row.broken = VALUES[i] > 10.3;
        assert_ok(tally_add(t, &row, &err), &err);
    }
    case_settle(t);
    tally_covers(t, &cover);
    assert_false(cover.timed);
    assert_false(cover.has_time);
    assert_int_equal(cover.untimed, 4);
    assert_within(cover.held, 4.0, 0.0);
    tally_spreads(t, 0, &s);
    assert_within(s.mean, 10.0, 1e-12);
    assert_false(s.min_timed);
    tally_outside(t, 0, &e);
    assert_int_equal(e.runs, 1);
    assert_false(e.has_time);
    assert_within(e.longest, 2.0, 0.0);
    assert_within(e.broken_held, 2.0, 0.0);
    assert_within(e.broken_j, 0.0, 0.0); /* rows hold no time, so no heat */
    assert_within(e.worst, 11.5, 0.0);
    assert_int_equal(tally_trend_count(t), 0);
    tally_close(t);
}

/* Moments by their definition; the differences from the offset are exact (Sterbenz) or lose little. Sums of twice the
 * length of a double, 106 bits, lose the square of what the mean is to the deviation. */
static void moments_are_those_of_the_definition_even_far_from_zero(void **state)
{
    static const double OFFSETS[] = {0.0, 50.0, 1e6, -3e9};
    chance c = {161};

    (void)state;
    for (size_t k = 0; k < COUNT(OFFSETS); k++) {
        tally *t = open_one(60.0, HUGE_VAL, TALLY_WHOLE);
        static double values[5000];
        long double mean = 0.0L;
        long double square = 0.0L;
        tally_spread s;

        for (size_t i = 0; i < COUNT(values); i++) {
            values[i] = OFFSETS[k] + 0.02 * chance_normal(&c);
            mean += (long double)(values[i] - OFFSETS[k]) / COUNT(values);
            add(t, FEBRUARY + 60.0 * (double)i, values[i], 0.0);
        }
        for (size_t i = 0; i < COUNT(values); i++)
            square += powl((long double)(values[i] - OFFSETS[k]) - mean, 2.0L) / COUNT(values);
        case_settle(t);
        tally_spreads(t, 0, &s);
        assert_within_at("mean", s.mean, OFFSETS[k] + (double)mean, 1e-15 * fabs(OFFSETS[k]) + 1e-17);
        assert_within_at("sd", s.sd, (double)sqrtl(square), s.sd * (1e-14 + 1e-30 * pow(OFFSETS[k] / s.sd, 2.0)));
        tally_close(t);
    }
}

static void a_figure_that_never_moves_has_no_deviation(void **state)
{
    chance c = {5};

    (void)state;
    for (size_t k = 0; k < 60; k++) {
        const double value = 50.0 * chance_uniform(&c);
        tally *t = open_one(60.0, HUGE_VAL, TALLY_WHOLE);
        tally_spread s;

        for (size_t i = 0; i < 1000; i++)
            add(t, FEBRUARY + 61.3 * (double)i, value, 1e6 + (double)i);
        case_settle(t);
        tally_spreads(t, 0, &s);
        assert_within(s.sd, 0.0, 0.0);
        assert_within(s.mean, value, 0.0);
        assert_within(s.energy_mean, value, 0.0);
        tally_close(t);
    }
}

static int ascending(const void *a, const void *b)
{
    const double x = *(const double *)a;
    const double y = *(const double *)b;

    return (x > y) - (x < y);
}

/* Percentiles of equal weights by sorting; `relative` is what the tally promises. */
static void compare_percentiles(double (*draw)(chance *), size_t rows, double promised)
{
    static const double SHARES[] = {0.001, 0.01, 0.05, 0.5, 0.95, 0.99, 0.999};
    double *values = calloc(rows, sizeof *values);
    tally *t = open_one(60.0, HUGE_VAL, TALLY_WHOLE);
    chance c = {271828};

    assert_non_null(values);
    for (size_t i = 0; i < rows; i++) {
        values[i] = draw(&c);
        add(t, FEBRUARY + 60.0 * (double)i, values[i], 0.0);
    }
    case_settle(t);
    qsort(values, rows, sizeof *values, ascending);
    assert_true(tally_accuracy(t, 0) <= promised);
    for (size_t i = 0; i < COUNT(SHARES); i++) {
        const double exact = values[(size_t)ceil(SHARES[i] * (double)rows) - 1];
        double value = 0.0;

        assert_true(tally_percentile(t, 0, SHARES[i], &value));
        assert_within(value, exact, tally_accuracy(t, 0) * fabs(exact) * (1.0 + 1e-12));
    }
    tally_close(t);
    free(values);
}

static double draw_wobbe(chance *c)
{
    return 50.3 + 0.4 * chance_normal(c);
}

static double draw_around_zero(chance *c)
{
    return chance_below(c, 7) == 0 ? 0.0 : -1.5 + 4.0 * chance_normal(c);
}

static double draw_traces(chance *c)
{
    return exp(2.0 * chance_normal(c));
}

static double draw_anything(chance *c)
{
    return (chance_below(c, 2) == 0 ? -1.0 : 1.0) * exp(40.0 * chance_normal(c));
}

/* By the definition over the sorted rows -2, 0, 3: the first at which the share asked for is reached. */
static void a_single_row_of_zero_has_its_place_and_no_row_has_none(void **state)
{
    static const double SHARES[] = {0.2, 0.5, 0.9}, WANT[] = {-2.0, 0.0, 3.0};
    tally *t = open_one(0.0, HUGE_VAL, TALLY_WHOLE);
    double value = 47.11;

    (void)state;
    assert_false(tally_percentile(t, 0, 0.5, &value));
    assert_within(value, 47.11, 0.0);
    add(t, FEBRUARY, 3.0, 0.0);
    add(t, FEBRUARY + HOUR, 0.0, 0.0);
    add(t, FEBRUARY + 2.0 * HOUR, -2.0, 0.0);
    case_settle(t);
    for (size_t i = 0; i < COUNT(SHARES); i++) {
        assert_true(tally_percentile(t, 0, SHARES[i], &value));
        assert_within(value, WANT[i], 1e-9);
    }
    tally_close(t);
}

static void little_energy_is_summed_as_exactly_as_much(void **state)
{
    tally *t = open_one(HOUR, HUGE_VAL, TALLY_WHOLE);
    tally_cover cover;

    (void)state;
    add(t, FEBRUARY, 1.25, 1.0);
    add(t, FEBRUARY + HOUR, 2.5, 0.25);
    case_settle(t);
    tally_covers(t, &cover);
    assert_within(cover.energy_j, 1.25 * HOUR, 1e-9);
    tally_close(t);
}

static void percentiles_keep_the_accuracy_that_is_told(void **state)
{
    (void)state;
    compare_percentiles(draw_wobbe, 50000, 1e-5);
    compare_percentiles(draw_around_zero, 50000, 5e-4);
    compare_percentiles(draw_traces, 200000, 5e-4);
    compare_percentiles(draw_anything, 100000, 0.02); /* both signs, hundreds of octaves */
}

static void bars_hold_all_the_time(void **state)
{
    tally *t = open_one(60.0, HUGE_VAL, TALLY_WHOLE);
    chance c = {12};
    double held[24];
    double sum = 0.0;
    double exact[24] = {0.0};
    tally_spread s;

    (void)state;
    for (size_t i = 0; i < 20000; i++) {
        const double value = -5.0 + 10.0 * chance_uniform(&c);

        exact[(size_t)floor((value + 5.0) / 10.0 * 24.0)] += 60.0;
        add(t, FEBRUARY + 60.0 * (double)i, value, 0.0);
    }
    case_settle(t);
    tally_spreads(t, 0, &s);
    tally_bars(t, 0, -5.0, 5.0, COUNT(held), held);
    for (size_t i = 0; i < COUNT(held); i++) {
        sum += held[i];
        assert_within(held[i], exact[i], 60.0 * 15.0); /* a bin on the edge of a bar goes to both */
    }
    assert_within(sum, 20000.0 * 60.0, 1e-6);
    tally_close(t);
}

static void periods_are_days_and_months_of_the_calendar(void **state)
{
    tally *t = open_one(6.0 * HOUR, 10.0, TALLY_MONTH);
    static const char *const BEGINS[] = {"2027-12-01 00:00", "2028-01-01 00:00", "2028-02-01 00:00", "2028-03-01 00:00"};
    static const uint64_t ROWS[] = {4, 4 * 31, 4 * 29, 1}; /* 2028 is a leap year */
    double time_s = 0.0;
    bool zoned = false;
    bc_error err;

    (void)state;
    assert_ok(bc_log_time_parse("2027-12-31", &time_s, &zoned, &err), &err);
    for (size_t i = 0; i < 4 + 4 * 31 + 4 * 29 + 1; i++)
        add(t, time_s + 6.0 * HOUR * (double)i, i == 6 ? 12.0 : 9.0, 1e6);
    case_settle(t);
    assert_int_equal(tally_period_count(t), 4);
    for (size_t i = 0; i < COUNT(BEGINS); i++) {
        char text[BC_LOG_TIME_TEXT];
        tally_span span;
        tally_spread s;

        tally_period_at(t, i, &span);
        tally_period_spread(t, i, 0, &s);
        bc_log_time_text(span.from_s, text);
        assert_string_equal(text, BEGINS[i]);
        bc_log_time_text(span.until_s, text);
        assert_string_equal(text, i + 1 < COUNT(BEGINS) ? BEGINS[i + 1] : "2028-04-01 00:00");
        assert_int_equal(span.rows, ROWS[i]);
        assert_within(span.held, 6.0 * HOUR * (double)ROWS[i], 1e-6);
        assert_within(span.energy_j, 1e6 * 6.0 * HOUR * (double)ROWS[i], 1.0);
        assert_int_equal(span.outside, i == 1);
        assert_within(s.mean, i == 1 ? 9.0 + 3.0 / (double)ROWS[1] : 9.0, 1e-12);
    }
    tally_close(t);
}

/* The end of an odd hour lies within a step of 480 s. */
static void a_clock_put_back_over_the_end_of_a_period_counts_in_the_one_before(void **state)
{
    tally *t = open_one(60.0, HUGE_VAL, TALLY_HOUR);
    tally_span span;
    double time_s = 0.0;

    (void)state;
    for (; time_s < 135.0 * HOUR; time_s += 60.0)
        add(t, time_s, 1.5, 0.0);
    add(t, time_s, 1.5, 0.0);
    add(t, time_s - 60.0, 2.5, 0.0);
    add(t, time_s, 1.5, 0.0);
    case_settle(t);
    tally_trend_at(t, 0, &span);
    assert_within(fmod(span.until_s - span.from_s, 480.0), 0.0, 0.0);
    assert_int_equal(tally_period_count(t), 136);
    tally_period_at(t, 134, &span);
    assert_int_equal(span.rows, 61);
    tally_period_at(t, 135, &span);
    assert_int_equal(span.rows, 2);
    tally_close(t);
}

static void more_periods_than_are_kept_are_refused_with_a_remedy(void **state)
{
    tally *t = open_one(86400.0, HUGE_VAL, TALLY_DAY);
    bc_status status = BC_OK;
    size_t days = 0;
    bc_error err;

    (void)state;
    while (status == BC_OK && days < 50000)
        status = add_with(t, 86400.0 * (double)days++, 1.5, 0.0, &err);
    assert_refused(status, &err, BC_ERR_INPUT, "more than 40000 days|--by month");
    assert_int_equal(days, TALLY_PERIOD_MAX + 2 + 1); /* the row at hand and the hot one are not counted yet */
    tally_close(t);
}

/* When no period more is kept, rows of those that are there are still taken: the clock went back by a day. */
static void a_full_tally_still_takes_rows_of_its_periods(void **state)
{
    tally *t = open_one(86400.0, HUGE_VAL, TALLY_DAY);
    tally_span span;
    tally_cover cover;

    (void)state;
    for (size_t day = 0; day < TALLY_PERIOD_MAX; day++)
        add(t, 86400.0 * (double)day, 1.5, 0.0);
    add(t, 86400.0 * (TALLY_PERIOD_MAX - 2.0), 2.5, 0.0);
    add(t, 86400.0 * (TALLY_PERIOD_MAX - 1.0), 3.5, 0.0);
    case_settle(t);
    tally_covers(t, &cover);
    assert_int_equal(cover.rows, TALLY_PERIOD_MAX + 2);
    assert_int_equal(tally_period_count(t), TALLY_PERIOD_MAX);
    tally_period_at(t, TALLY_PERIOD_MAX - 2, &span);
    assert_int_equal(span.rows, 2);
    tally_close(t);
}

static void what_is_no_row_is_refused_and_changes_nothing(void **state)
{
    tally *t = open_one(60.0, HUGE_VAL, TALLY_WHOLE);
    const double value = 3.5;
    const tally_row untimed = {.values = &value};
    tally_cover cover;
    bc_error err;

    (void)state;
    add(t, FEBRUARY, 3.5, 1e6);
    assert_refused(tally_add(t, &untimed, &err), &err, BC_ERR_INPUT, "no time");
    assert_refused(add_with(t, -1.0, 3.5, 0.0, &err), &err, BC_ERR_INPUT, "1970 to 9999");
    assert_refused(add_with(t, (double)NAN, 3.5, 0.0, &err), &err, BC_ERR_INPUT, "1970 to 9999");
    assert_refused(add_with(t, FEBRUARY + 60.0, 3.5, HUGE_VAL, &err), &err, BC_ERR_INPUT, "heat");
    case_settle(t);
    tally_covers(t, &cover);
    assert_int_equal(cover.rows, 1);
    assert_within(cover.held, 60.0, 0.0);
    tally_close(t);
}

static void a_plan_out_of_bounds_is_refused(void **state)
{
    tally_plan plan = {.step_s = (double)NAN};
    tally *t = NULL;
    bc_error err;

    (void)state;
    assert_refused(tally_open(&plan, &t, &err), &err, BC_ERR_USAGE, "usual step");
    plan.step_s = 60.0;
    plan.figure_count = TALLY_FIGURE_MAX + 1;
    assert_refused(tally_open(&plan, &t, &err), &err, BC_ERR_USAGE, "64 figures");
    assert_null(t);
}

/* What comes back of excursions. */
typedef struct {
    size_t count;
    tally_run runs[CASE_ROWS];
} told;

static void keep_run(void *data, const tally_run *run)
{
    told *k = data;

    k->runs[k->count++] = *run;
}

static void excursions_are_told_when_they_end(void **state)
{
    static const double HYDROGEN[] = {4.1, 10.9, 3.9, 11.7, 12.6, 10.4, 5.2, 11.1};
    tally *t = open_one(HOUR, 10.3, TALLY_WHOLE);
    told k = {.count = 0};

    (void)state;
    tally_tell_runs(t, keep_run, &k);
    for (size_t i = 0; i < COUNT(HYDROGEN); i++)
        add(t, FEBRUARY + HOUR * (double)i, HYDROGEN[i], 2e6);
    assert_int_equal(k.count, 2);
    case_settle(t);
    assert_int_equal(k.count, 3);
    assert_within(k.runs[1].from_s, FEBRUARY + 3.0 * HOUR, 1e-6);
    assert_within(k.runs[1].until_s, FEBRUARY + 6.0 * HOUR, 1e-6);
    assert_within(k.runs[1].held, 3.0 * HOUR, 1e-6);
    assert_within(k.runs[1].worst, 12.6, 0.0);
    assert_within(k.runs[1].worst_s, FEBRUARY + 4.0 * HOUR, 1e-6);
    assert_within(k.runs[1].energy_j, 6e6 * HOUR, 1.0);
    assert_int_equal(k.runs[1].rows, 3);
    assert_false(k.runs[1].open_at_end);
    assert_true(k.runs[2].open_at_end);
    assert_int_equal(tally_run_count(t), 3);
    tally_close(t);
}

/* The rows of a random log without steps back or on the spot, as bluecone/log.h wants them. */
static void keep_forward_rows(tally_case *k)
{
    size_t kept = 0;

    for (size_t i = 0; i < k->count; i++)
        if (kept == 0 || k->rows[i].time_s > k->rows[kept - 1].time_s) {
            memcpy(k->values[kept], k->values[i], sizeof k->values[i]);
            k->rows[kept] = k->rows[i];
            k->rows[kept].values = k->values[kept];
            k->rows[kept].limit_values = k->limit_values[kept];
            kept++;
        }
    k->count = kept;
}

/* The log that keeps every row is fed with methane and hydrogen; hydrogen is the figure and its limit. */
static bc_log *log_of(tally_case *k, bc_contract *contract, double max)
{
    const bc_state at = {.combustion_c = 25.0, .metering_c = 0.0, .metering_pa = 101325.0, .edition = 2016};
    bc_log *log = NULL;
    size_t h2 = 0;
    size_t ch4 = 0;
    bc_error err;

    assert_ok(bc_contract_start(&at, contract, &err), &err);
    assert_ok(bc_contract_add(contract, "hydrogen", "", NULL, &max, &err), &err);
    assert_ok(bc_log_open(contract, &log, &err), &err);
    assert_ok(bc_species_find("hydrogen", &h2, &err), &err);
    assert_ok(bc_species_find("methane", &ch4, &err), &err);
    for (size_t i = 0; i < k->count; i++) {
        bc_log_row row = {.time_s = k->rows[i].time_s};

        row.gas.x[h2] = fmin(k->values[i][1], 60.0) / 100.0;
        row.gas.x[ch4] = 1.0 - row.gas.x[h2];
        assert_ok(bc_log_add(log, &row, &err), &err);
    }
    assert_ok(bc_log_settle(log, &err), &err);
    return log;
}

static void compare_with_log(const bc_log *log, const tally *t)
{
    bc_log_cover cover;
    bc_log_excursions want;
    bc_log_distribution d;
    tally_cover c;
    tally_excursions e;
    tally_spread s;
    bc_error err;
    double p = 0.0;

    bc_log_covers(log, &cover);
    tally_covers(t, &c);
    assert_int_equal(c.gaps, cover.gaps);
    assert_within(c.held, cover.held_s, 1e-6 * cover.held_s);
    assert_within(c.gap_s, cover.gap_s, 1e-6 * cover.gap_s);
    bc_log_outside(log, 0, &want);
    tally_outside(t, 0, &e);
    assert_true(want.runs > 20);
    assert_int_equal(e.judged, want.judged);
    assert_int_equal(e.broken, want.broken);
    assert_int_equal(e.runs, want.runs);
    assert_within(e.broken_held, want.broken_s, 1e-6);
    assert_within(e.first_s, want.first_s, 1e-3);
    assert_within(e.last_s, want.last_s, 1e-3);
    assert_within(e.worst, want.worst, 1e-9);
    assert_within(e.worst_s, want.worst_s, 1e-3);
    assert_within(e.longest, want.longest_s, 1e-3);
    assert_within(e.longest_from_s, want.longest_from_s, 1e-3);
    assert_ok(bc_log_distribute(log, 0, &d, &err), &err);
    tally_spreads(t, 0, &s);
    assert_within(s.mean, d.mean, 1e-10); /* plain sums there */
    assert_within(s.min, d.min, 1e-12);
    assert_within(s.max, d.max, 1e-12);
    assert_true(tally_percentile(t, 0, 0.95, &p));
    assert_within(p, d.p95, 5e-4 * d.p95);
    assert_true(tally_percentile(t, 0, 0.5, &p));
    assert_within(p, d.median, 5e-4 * d.median);
}

/* Whole seconds, so that both know the same times. */
static void a_tally_says_what_the_log_of_all_rows_says(void **state)
{
    bc_contract *contract = calloc(1, sizeof *contract);

    (void)state;
    assert_non_null(contract);
    for (uint64_t start = 1; start <= 3; start++) {
        tally_case *k = case_make(start * 5003, 1500, 60.0, TALLY_WHOLE);
        tally *t = open_one(60.0, 4.25, TALLY_WHOLE);

        keep_forward_rows(k);
        for (size_t i = 0; i < k->count; i++)
            add(t, k->rows[i].time_s, fmin(k->values[i][1], 60.0), 0.0);
        case_settle(t);
        bc_log *log = log_of(k, contract, 4.25);

        compare_with_log(log, t);
        bc_log_close(log);
        tally_close(t);
        free(k);
    }
    free(contract);
}

static void the_longest_excursions_are_kept(void **state)
{
    tally *t = open_one(60.0, 10.0, TALLY_WHOLE);
    told *k = calloc(1, sizeof *k);
    double time_s = FEBRUARY;
    chance c = {8};

    (void)state;
    assert_non_null(k);
    tally_tell_runs(t, keep_run, k);
    for (size_t i = 0; i < 3000; i++) {
        for (size_t row = chance_below(&c, 9) + 1; row > 0; row--, time_s += 60.0)
            add(t, time_s, 11.0, 0.0);
        add(t, time_s, 9.0, 0.0);
        time_s += 60.0;
    }
    case_settle(t);
    assert_int_equal(k->count, 3000);
    assert_int_equal(tally_run_count(t), TALLY_RUN_MAX);
    size_t longer[12] = {0}; /* told, by rows; the kept ones are taken off */

    for (size_t i = 0; i < k->count; i++)
        longer[k->runs[i].rows]++;
    for (size_t i = 0; i < TALLY_RUN_MAX; i++) {
        tally_run before;
        tally_run run;

        tally_run_at(t, i, &run);
        longer[run.rows]--;
        if (i > 0) {
            tally_run_at(t, i - 1, &before);
            assert_true(before.from_s < run.from_s);
        }
    }
    size_t rows = 9; /* of the longest that was not kept */
    size_t next = 0;

    while (longer[rows] == 0)
        rows--;
    for (size_t i = 0; i < TALLY_RUN_MAX; i++) {
        tally_run run;

        tally_run_at(t, i, &run);
        assert_true(run.rows >= rows);
        if (run.rows > rows)
            continue;
        while (k->runs[next].rows != rows)
            next++;
        assert_within(run.from_s, k->runs[next++].from_s, 0.0); /* of equal ones the first */
    }
    tally_close(t);
    free(k);
}

static int heavier_first(const void *a, const void *b)
{
    const uint64_t x = *(const uint64_t *)a, y = *(const uint64_t *)b;

    return (x < y) - (x > y);
}

/* Whatever the order in which they come, those that are kept are the first of all sorted. */
static void the_kept_excursions_are_those_of_sorting(void **state)
{
    enum { ALL = 3 * TALLY_RUN_MAX };
    static uint64_t weights[ALL], kept[TALLY_RUN_MAX];
    chance c = {1964};

    (void)state;
    for (int order = 0; order < 6; order++) {
        tally_longest l;

        assert_true(tally_longest_open(&l));
        for (size_t i = 0; i < ALL; i++) {
            weights[i] = order == 0 ? i : order == 1 ? ALL - i : chance_bits(&c);
            const tally_stretch s = {.rows = 1, .weight = weights[i], .from_ms = (int64_t)i};

            tally_longest_add(&l, &s);
        }
        assert_int_equal(l.count, TALLY_RUN_MAX);
        for (size_t i = 0; i < l.count; i++)
            kept[i] = l.kept[i].weight;
        qsort(weights, ALL, sizeof *weights, heavier_first);
        qsort(kept, TALLY_RUN_MAX, sizeof *kept, heavier_first);
        assert_memory_equal(kept, weights, sizeof kept);
        tally_longest_close(&l);
    }
}

static void a_trend_has_a_thousand_steps_at_most_and_no_excursion_is_lost(void **state)
{
    tally *t = open_one(60.0, HUGE_VAL, TALLY_WHOLE);
    double most = 0.0;
    tally_span span;
    tally_spread s;

    (void)state;
    for (size_t i = 0; i < 100000; i++)
        add(t, FEBRUARY + 60.0 * (double)i, i == 54321 ? 99.0 : 9.0 + (double)(i % 5), 0.0);
    case_settle(t);
    assert_true(tally_trend_count(t) <= TALLY_TREND_MAX && tally_trend_count(t) > TALLY_TREND_MAX / 2);
    for (size_t i = 0; i < tally_trend_count(t); i++) {
        tally_trend_at(t, i, &span);
        tally_trend_spread(t, i, 0, &s);
        assert_within(span.until_s - span.from_s, 7680.0, 0.0); /* 60 s 2^7 */
        assert_within(fmod(span.from_s, 7680.0), 0.0, 0.0);
        assert_true(span.first_s >= span.from_s && span.last_s < span.until_s);
        most = fmax(most, s.max);
    }
    assert_within(most, 99.0, 0.0);
    tally_close(t);
}

static void a_trend_of_just_a_thousand_steps_is_not_halved(void **state)
{
    (void)state;
    for (size_t more = 0; more < 2; more++) {
        tally *t = open_one(60.0, HUGE_VAL, TALLY_WHOLE);
        tally_span span;

        for (size_t i = 0; i < TALLY_TREND_MAX + more; i++)
            add(t, FEBRUARY + 60.0 * (double)i, 9.0, 0.0);
        case_settle(t);
        tally_trend_at(t, 0, &span);
        assert_within(span.until_s - span.from_s, more == 0 ? 60.0 : 120.0, 0.0);
        assert_int_equal(tally_trend_count(t), more == 0 ? TALLY_TREND_MAX : TALLY_TREND_MAX / 2 + 1);
        tally_close(t);
    }
}

static void ten_years_of_days_stay_below_sixteen_mebibytes(void **state)
{
    tally_plan plan = {.figure_count = 6, .limit_count = 20, .step_s = 1800.0, .by = TALLY_DAY};
    double values[6];
    tally *t = NULL;
    chance c = {77};
    bc_error err;

    (void)state;
    assert_ok(tally_open(&plan, &t, &err), &err);
    for (size_t i = 0; i < 3650 * 48; i++) {
        const tally_row row = {.has_time = true, .time_s = 1.5e9 + 1800.0 * (double)i, .values = values};

        for (size_t k = 0; k < COUNT(values); k++)
            values[k] = exp(3.0 * chance_normal(&c));
        assert_ok(tally_add(t, &row, &err), &err);
    }
    case_settle(t);
    assert_true(tally_period_count(t) >= 3650);
    assert_true(tally_bytes(t) < (size_t)16 << 20);
    tally_close(t);
}

/* BC_LOG_GAP usual steps are no gap, a millisecond more is one, and then the row holds one step. */
static void a_gap_begins_beyond_three_steps(void **state)
{
    (void)state;
    for (int more = 0; more < 2; more++) {
        tally *t = open_one(60.0, HUGE_VAL, TALLY_WHOLE);
        tally_cover cover;

        add(t, FEBRUARY, 1.5, 0.0);
        add(t, FEBRUARY + BC_LOG_GAP * 60.0 + 0.001 * more, 2.5, 0.0);
        case_settle(t);
        tally_covers(t, &cover);
        assert_int_equal(cover.gaps, more);
        assert_within(cover.held, more ? 120.0 : 240.0, 0.0);
        assert_within(cover.gap_s, more ? 120.001 : 0.0, 1e-9);
        tally_close(t);
    }
}

/* The years 1970 to 9999, heats that are not negative, figures below TALLY_VALUE_MAX: supply/tally.h. */
static void rows_are_taken_to_the_ends_of_what_a_tally_holds(void **state)
{
    const double latest_s = (double)TALLY_LATEST_MS / 1000.0, first = 0.0;
    tally *t = open_one(60.0, HUGE_VAL, TALLY_WHOLE);
    tally_row row = {.has_time = true, .has_flow = true, .values = &first};
    tally_spread s;
    tally_cover cover;
    bc_error err;

    (void)state;
    assert_ok(tally_add(t, &row, &err), &err); /* no time before 1970, no power below zero: zero is fine */
    assert_ok(add_with(t, latest_s, nextafter(TALLY_VALUE_MAX, 0.0), nextafter(TALLY_VALUE_MAX, 0.0), &err), &err);
    assert_refused(add_with(t, latest_s + 0.001, 1.5, 0.0, &err), &err, BC_ERR_INPUT, "1970 to 9999");
    assert_refused(add_with(t, latest_s, 1.5, TALLY_VALUE_MAX, &err), &err, BC_ERR_INPUT, "heat");
    row.power_w = -1e-9;
    assert_refused(tally_add(t, &row, &err), &err, BC_ERR_INPUT, "heat");
    add(t, latest_s - 60.0, TALLY_VALUE_MAX, 0.0); /* no figure, though a row */
    add(t, latest_s - 60.0, -TALLY_VALUE_MAX, 0.0);
    case_settle(t);
    tally_covers(t, &cover);
    tally_spreads(t, 0, &s);
    assert_int_equal(cover.rows, 4);
    assert_int_equal(s.rows, 2);
    assert_within(s.max, TALLY_VALUE_MAX, 1e-15 * TALLY_VALUE_MAX);
    assert_within(s.min, 0.0, 0.0);
    tally_close(t);
}

/* Times count in milliseconds, the nearest. */
static void a_time_is_that_of_the_nearest_millisecond(void **state)
{
    static const double ADDED[] = {0.0, 0.0004, 0.0006, 0.0014}, WANT[] = {0.0, 0.0, 0.001, 0.001};

    (void)state;
    for (size_t i = 0; i < COUNT(ADDED); i++) {
        tally *t = open_one(60.0, HUGE_VAL, TALLY_WHOLE);
        tally_cover cover;

        add(t, 1000.0 + ADDED[i], 1.5, 0.0);
        case_settle(t);
        tally_covers(t, &cover);
        assert_within(cover.first_s, 1000.0 + WANT[i], 1e-9);
        tally_close(t);
    }
}

static bool opens(size_t figures, size_t limits, size_t flags, double step_s)
{
    static tally_plan plan;
    tally *t = NULL;
    bc_error err = {.status = BC_OK};

    plan = (tally_plan){.figure_count = figures, .limit_count = limits, .flag_count = flags, .step_s = step_s};
    const bc_status status = tally_open(&plan, &t, &err);

    assert_true(status == BC_OK || (status == BC_ERR_USAGE && err.status == status));
    tally_close(t);
    return status == BC_OK;
}

static void a_plan_is_taken_to_its_bounds(void **state)
{
    (void)state;
    assert_true(opens(0, 0, 0, 0.0));
    assert_true(opens(TALLY_FIGURE_MAX, TALLY_LIMIT_MAX, TALLY_FLAG_MAX, 60.0));
    assert_false(opens(TALLY_FIGURE_MAX + 1, 0, 0, 60.0));
    assert_false(opens(0, TALLY_LIMIT_MAX + 1, 0, 60.0));
    assert_false(opens(0, 0, TALLY_FLAG_MAX + 1, 60.0));
    assert_true(opens(1, 0, 0, 0.001)); /* a millisecond to a year and somewhat more, as the refusal says */
    assert_true(opens(1, 0, 0, 3.2e7));
    assert_false(opens(1, 0, 0, nextafter(0.001, 0.0)));
    assert_false(opens(1, 0, 0, nextafter(3.2e7, HUGE_VAL)));
    assert_false(opens(1, 0, 0, -1.0));
}

/* TALLY_CELL_MAX cells in all, TALLY_PERIOD_MAX periods at most; "the hours of a year for six figures" are 8,800. */
static void more_figures_leave_room_for_fewer_periods(void **state)
{
    static const size_t FIGURES[] = {0, 1, 2, 6, 64}, ROOM[] = {40000, 40000, 26400, 8800, 825};

    (void)state;
    for (size_t i = 0; i < COUNT(FIGURES); i++) {
        const tally_plan plan = {.figure_count = FIGURES[i], .step_s = 60.0};
        tally *t = NULL;
        bc_error err;

        assert_ok(tally_open(&plan, &t, &err), &err);
        assert_int_equal(tally_period_room(t), ROOM[i]);
        tally_close(t);
    }
}

/* What the allocator handed out is what the tally says that it takes, but for what the allocator rounds up. */
static void the_bytes_of_a_tally_are_those_of_its_blocks(void **state)
{
    tally *t = open_one(60.0, 10.0, TALLY_HOUR);
    size_t bytes = 0, blocks = 0;

    (void)state;
    for (size_t i = 0; i < 3; i++)
        add(t, FEBRUARY + HOUR * (double)(i / 2) + 60.0 * (double)i, 9.0 + (double)i, 0.0);
    case_settle(t);
    const void *const single[] = {t, t->hot, t->whole, t->bins, t->bins[0].bins, t->trend.groups, t->periods.groups, t->longest.kept};

    for (size_t i = 0; i < COUNT(single); i++, blocks++)
        bytes += malloc_usable_size((void *)(uintptr_t)single[i]);
    for (size_t i = 0; i < t->trend.count; i++, blocks++)
        bytes += malloc_usable_size(t->trend.groups[i]);
    for (size_t i = 0; i < t->periods.count; i++, blocks++)
        bytes += malloc_usable_size(t->periods.groups[i]);
    assert_true(t->trend.count == 3 && t->periods.count == 2);
    assert_true(tally_bytes(t) <= bytes);
    assert_true(bytes - tally_bytes(t) <= 16 * blocks + sizeof *t->bins); /* a block in front of no bin is never of no size */
    tally_close(t);
}

/* A figure that never moves lies in one bar, in the first or last one where it is on the edge or beyond. */
static void a_figure_that_never_moves_fills_one_bar(void **state)
{
    static const struct {
        double value;
        size_t bar;
    } ROWS[] = {{0.0, 0}, {-3.0, 0}, {5.0, 4}, {7.0, 4}, {2.5, 2}, {2.0, 2}, {1.999, 1}};

    (void)state;
    for (size_t i = 0; i < COUNT(ROWS); i++) {
        tally *t = open_one(60.0, HUGE_VAL, TALLY_WHOLE);
        double held[5];

        for (size_t k = 0; k < 10; k++)
            add(t, FEBRUARY + 60.0 * (double)k, ROWS[i].value, 0.0);
        case_settle(t);
        tally_bars(t, 0, 0.0, 5.0, COUNT(held), held);
        for (size_t k = 0; k < COUNT(held); k++)
            assert_within(held[k], k == ROWS[i].bar ? 600.0 : 0.0, 0.0);
        tally_close(t);
    }
}

/* Values that one bin holds are spread evenly over what the figure was, from 1 to 1.00001: a bin begins with 1 and is
 * 1.5e-5 wide. The bars share it by what they overlap; those around it have nothing. */
static void a_bin_wider_than_a_bar_is_shared_evenly(void **state)
{
    tally *t = open_one(60.0, HUGE_VAL, TALLY_WHOLE);
    double held[14];

    (void)state;
    for (size_t k = 0; k < 100; k++)
        add(t, FEBRUARY + 60.0 * (double)k, k % 2 ? 1.00001 : 1.0, 0.0);
    case_settle(t);
    tally_bars(t, 0, 1.0 - 1.5e-6, 1.0 + 12.5e-6, COUNT(held), held); /* the ends lie in the middle of bars */
    for (size_t k = 0; k < COUNT(held); k++)
        assert_within(held[k], k == 1 || k == 11 ? 300.0 : k > 1 && k < 11 ? 600.0 : 0.0, 1e-3);
    tally_close(t);
}

/* An outage ends an excursion, though the limit is broken on both sides of it. */
static void an_excursion_ends_at_a_gap(void **state)
{
    tally *t = open_one(60.0, 10.0, TALLY_WHOLE);
    tally_excursions e;
    tally_run run;

    (void)state;
    for (size_t i = 0; i < 3; i++)
        add(t, FEBRUARY + 60.0 * (double)i, 11.0, 0.0);
    for (size_t i = 0; i < 2; i++)
        add(t, FEBRUARY + HOUR + 60.0 * (double)i, 12.0, 0.0);
    case_settle(t);
    tally_outside(t, 0, &e);
    assert_int_equal(e.runs, 2);
    assert_int_equal(tally_run_count(t), 2);
    tally_run_at(t, 0, &run);
    assert_int_equal(run.rows, 3);
    assert_within(run.held, 180.0, 0.0);
    assert_within(run.until_s, FEBRUARY + 180.0, 1e-6);
    tally_run_at(t, 1, &run);
    assert_int_equal(run.rows, 2);
    assert_true(run.open_at_end);
    assert_within(e.longest, 180.0, 0.0);
    assert_within(e.worst_s, FEBRUARY + HOUR, 1e-6);
    tally_close(t);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(a_row_holds_until_the_next_and_a_gap_does_not_count),
        cmocka_unit_test(without_a_usual_step_rows_count),
        cmocka_unit_test(moments_are_those_of_the_definition_even_far_from_zero),
        cmocka_unit_test(a_figure_that_never_moves_has_no_deviation),
        cmocka_unit_test(a_single_row_of_zero_has_its_place_and_no_row_has_none),
        cmocka_unit_test(little_energy_is_summed_as_exactly_as_much),
        cmocka_unit_test(percentiles_keep_the_accuracy_that_is_told),
        cmocka_unit_test(bars_hold_all_the_time),
        cmocka_unit_test(periods_are_days_and_months_of_the_calendar),
        cmocka_unit_test(a_clock_put_back_over_the_end_of_a_period_counts_in_the_one_before),
        cmocka_unit_test(more_periods_than_are_kept_are_refused_with_a_remedy),
        cmocka_unit_test(a_full_tally_still_takes_rows_of_its_periods),
        cmocka_unit_test(what_is_no_row_is_refused_and_changes_nothing),
        cmocka_unit_test(a_plan_out_of_bounds_is_refused),
        cmocka_unit_test(excursions_are_told_when_they_end),
        cmocka_unit_test(a_tally_says_what_the_log_of_all_rows_says),
        cmocka_unit_test(the_longest_excursions_are_kept),
        cmocka_unit_test(the_kept_excursions_are_those_of_sorting),
        cmocka_unit_test(a_trend_has_a_thousand_steps_at_most_and_no_excursion_is_lost),
        cmocka_unit_test(a_trend_of_just_a_thousand_steps_is_not_halved),
        cmocka_unit_test(a_gap_begins_beyond_three_steps),
        cmocka_unit_test(rows_are_taken_to_the_ends_of_what_a_tally_holds),
        cmocka_unit_test(a_time_is_that_of_the_nearest_millisecond),
        cmocka_unit_test(a_plan_is_taken_to_its_bounds),
        cmocka_unit_test(more_figures_leave_room_for_fewer_periods),
        cmocka_unit_test(the_bytes_of_a_tally_are_those_of_its_blocks),
        cmocka_unit_test(a_figure_that_never_moves_fills_one_bar),
        cmocka_unit_test(a_bin_wider_than_a_bar_is_shared_evenly),
        cmocka_unit_test(an_excursion_ends_at_a_gap),
        cmocka_unit_test(ten_years_of_days_stay_below_sixteen_mebibytes),
    };
    return cmocka_run_group_tests(tests, NULL, NULL);
}
