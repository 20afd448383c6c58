/* SPDX-License-Identifier: MIT */
/* test_log.c - logs of analyses: times, holding, gaps, excursions, distributions. */
#include "support.h"

#include "bluecone/log.h"

#include <stdio.h>
#include <stdlib.h>

#define HOUR 3600.0

/* A contract on hydrogen, at most so many mol %, and a log under it. */
typedef struct {
    bc_contract *contract;
    bc_log *log;
} bench;

static bench open_bench(double hydrogen_max)
{
    const bc_state at = {.combustion_c = 25.0, .metering_c = 0.0, .metering_pa = 101325.0, .edition = 2016};
    bench b = {.contract = malloc(sizeof *b.contract)};
    bc_error err;

    assert_non_null(b.contract);
    assert_ok(bc_contract_start(&at, b.contract, &err), &err);
    assert_ok(bc_contract_add(b.contract, "hydrogen", "", NULL, &hydrogen_max, &err), &err);
    assert_ok(bc_log_open(b.contract, &b.log, &err), &err);
    return b;
}

static void close_bench(bench *b)
{
    bc_log_close(b->log);
    free(b->contract);
}

/* A row of methane with so much hydrogen, in mol %. */
static bc_log_row row_of(double hour, double hydrogen)
{
    bc_log_row row = {.time_s = hour * HOUR};
    bc_error err;
    size_t h2 = 0;
    size_t ch4 = 0;

    assert_ok(bc_species_find("hydrogen", &h2, &err), &err);
    assert_ok(bc_species_find("methane", &ch4, &err), &err);
    row.gas.x[h2] = hydrogen / 100.0;
    row.gas.x[ch4] = 1.0 - hydrogen / 100.0;
    return row;
}

static void add(const bench *b, double hour, double hydrogen)
{
    const bc_log_row row = row_of(hour, hydrogen);
    bc_error err;

    assert_ok(bc_log_add(b->log, &row, &err), &err);
}

static void settle(const bench *b)
{
    bc_error err;

    assert_ok(bc_log_settle(b->log, &err), &err);
}

static void a_row_holds_until_the_next_and_the_last_for_a_usual_step(void **state)
{
    bench b = open_bench(10.3);
    bc_log_cover cover;

    (void)state;
    add(&b, 7.0, 1.1);
    add(&b, 8.0, 1.2);
    add(&b, 10.5, 1.3); /* one hour late and a half: no gap yet */
    add(&b, 11.5, 1.4);
    settle(&b);
    bc_log_covers(b.log, &cover);
    assert_int_equal(cover.rows, 4);
    assert_int_equal(cover.gaps, 0);
    assert_within(cover.step_s, HOUR, 1e-9);
    assert_within(cover.held_s, 5.5 * HOUR, 1e-9);
    close_bench(&b);
}

static void more_than_three_usual_steps_are_a_gap_and_not_counted(void **state)
{
    bench b = open_bench(10.3);
    bc_log_cover cover;
    double time = 0.0;
    double held = 0.0;

    (void)state;
    add(&b, 1.0, 1.1);
    add(&b, 2.0, 1.2);
    add(&b, 6.5, 1.3);
    add(&b, 7.5, 1.3);
    settle(&b);
    bc_log_covers(b.log, &cover);
    assert_int_equal(cover.gaps, 1);
    assert_within(cover.gap_s, 3.5 * HOUR, 1e-9);
    assert_within(cover.held_s, 4.0 * HOUR, 1e-9);
    assert_true(bc_log_held(b.log, 1, &time, &held));
    assert_within(held, HOUR, 1e-9);
    assert_false(bc_log_held(b.log, 2, &time, &held));
    close_bench(&b);
}

static void excursions_tell_hours_runs_the_worst_and_the_longest(void **state)
{
    static const double HYDROGEN[] = {4.1, 10.9, 3.9, 11.7, 12.6, 10.4, 5.2};
    bench b = open_bench(10.3);
    bc_log_excursions e;

    (void)state;
    for (size_t i = 0; i < COUNT(HYDROGEN); i++)
        add(&b, 100.0 + (double)i, HYDROGEN[i]);
    settle(&b);
    bc_log_outside(b.log, 0, &e);
    assert_int_equal(e.judged, 7);
    assert_int_equal(e.broken, 4);
    assert_int_equal(e.runs, 2);
    assert_within(e.broken_s, 4.0 * HOUR, 1e-9);
    assert_within(e.first_s, 101.0 * HOUR, 1e-9);
    assert_within(e.last_s, 105.0 * HOUR, 1e-9);
    assert_within(e.worst, 12.6, 1e-9);
    assert_within(e.worst_s, 104.0 * HOUR, 1e-9);
    assert_within(e.longest_s, 3.0 * HOUR, 1e-9);
    assert_within(e.longest_from_s, 103.0 * HOUR, 1e-9);
    close_bench(&b);
}

static void a_gap_ends_an_excursion(void **state)
{
    bench b = open_bench(10.3);
    bc_log_excursions e;

    (void)state;
    add(&b, 1.0, 11.1);
    add(&b, 2.0, 11.2);
    add(&b, 9.0, 11.3);
    add(&b, 10.0, 2.0);
    add(&b, 11.0, 2.0);
    settle(&b);
    bc_log_outside(b.log, 0, &e);
    assert_int_equal(e.runs, 2);
    assert_within(e.longest_s, 2.0 * HOUR, 1e-9);
    assert_within(e.broken_s, 3.0 * HOUR, 1e-9);
    close_bench(&b);
}

static void a_figure_on_its_bound_is_not_outside(void **state)
{
    bench b = open_bench(10.3);
    bc_log_excursions e;

    (void)state;
    add(&b, 1.0, 10.3);
    settle(&b);
    bc_log_outside(b.log, 0, &e);
    assert_int_equal(e.broken, 0);
    close_bench(&b);
}

static void one_row_alone_covers_no_time_but_is_judged(void **state)
{
    bench b = open_bench(10.3);
    bc_log_excursions e;
    bc_log_cover cover;
    bc_log_distribution d;
    bc_error err;

    (void)state;
    add(&b, 1.0, 14.7);
    settle(&b);
    bc_log_covers(b.log, &cover);
    bc_log_outside(b.log, 0, &e);
    assert_within(cover.held_s, 0.0, 1e-12);
    assert_int_equal(e.broken, 1);
    assert_ok(bc_log_distribute(b.log, 0, &d, &err), &err);
    assert_within(d.median, 14.7, 1e-9);
    close_bench(&b);
}

/* By hand: values 2, 4, 8 hold for 1, 3 and 3 usual steps. */
static void a_distribution_weighs_with_time(void **state)
{
    bench b = open_bench(10.3);
    bc_log_distribution d;
    bc_error err;

    (void)state;
    add(&b, 0.0, 2.0);
    add(&b, 1.0, 4.0);
    add(&b, 4.0, 8.0);
    add(&b, 5.0, 8.0);
    add(&b, 6.0, 8.0);
    settle(&b);
    assert_ok(bc_log_distribute(b.log, 0, &d, &err), &err);
    assert_within(d.mean, (2.0 + 3.0 * 4.0 + 3.0 * 8.0) / 7.0, 1e-9);
    assert_within(d.min, 2.0, 1e-9);
    assert_within(d.p5, 2.0, 1e-9);
    assert_within(d.median, 4.0, 1e-9);
    assert_within(d.p95, 8.0, 1e-9);
    assert_within(d.max, 8.0, 1e-9);
    assert_false(d.has_energy_mean);
    close_bench(&b);
}

/* Two rows that hold equally long: the molar flow times the molar heat weighs them. */
static void heat_weighs_a_mean_where_a_flow_is_given(void **state)
{
    bench b = open_bench(10.3);
    const double hydrogen[] = {1.7, 8.9};
    const double flow[] = {120.0, 40.0};
    bc_reference reference;
    bc_log_distribution d;
    bc_log_cover cover;
    bc_log_excursions e;
    bc_error err;
    double heat = 0.0;
    double sum = 0.0;

    (void)state;
    assert_ok(bc_reference_at(&b.contract->state, &reference, &err), &err);
    for (size_t i = 0; i < 2; i++) {
        bc_log_row row = row_of((double)i, hydrogen[i]);
        char text[40];

        (void)snprintf(text, sizeof text, "%.1f m3/h", flow[i]);
        assert_ok(bc_flow_parse(text, &row.flow, &err), &err);
        assert_ok(bc_log_add(b.log, &row, &err), &err);
        const double one = flow[i] * bc_value_of(&reference, &row.gas).gross_j_per_m3;

        heat += one;
        sum += one * hydrogen[i];
    }
    settle(&b);
    bc_log_covers(b.log, &cover);
    bc_log_outside(b.log, 0, &e);
    assert_ok(bc_log_distribute(b.log, 0, &d, &err), &err);
    assert_int_equal(cover.flows, 2);
    assert_within(cover.energy_j / heat, 1.0, 1e-12);
    assert_true(d.has_energy_mean);
    assert_within(d.energy_mean, sum / heat, 1e-9);
    assert_within(e.broken_j, 0.0, 1e-12);
    close_bench(&b);
}

static void a_row_that_does_not_go_on_in_time_is_refused_and_leaves_the_log_as_it_was(void **state)
{
    bench b = open_bench(10.3);
    const bc_log_row row = row_of(3.0, 2.2);
    bc_log_cover cover;
    bc_error err;

    (void)state;
    add(&b, 3.0, 1.1);
    assert_refused(bc_log_add(b.log, &row, &err), &err, BC_ERR_INPUT, "not after");
    settle(&b);
    bc_log_covers(b.log, &cover);
    assert_int_equal(cover.rows, 1);
    close_bench(&b);
}

static void a_log_without_rows_cannot_be_settled(void **state)
{
    bench b = open_bench(10.3);
    bc_error err;

    (void)state;
    assert_refused(bc_log_settle(b.log, &err), &err, BC_ERR_INPUT, "no row");
    close_bench(&b);
}

static void five_thousand_rows_keep_their_figures_while_the_log_grows(void **state)
{
    bench b = open_bench(10.3);
    bc_log_cover cover;
    double value = 0.0;

    (void)state;
    for (size_t i = 0; i < 5000; i++)
        add(&b, (double)i, 1.0 + (double)(i % 7));
    settle(&b);
    bc_log_covers(b.log, &cover);
    assert_within(cover.held_s, 5000.0 * HOUR, 1e-6);
    assert_true(bc_log_value(b.log, 4321, 0, &value));
    assert_within(value, 1.0 + 4321 % 7, 1e-9);
    close_bench(&b);
}

/* Seconds by GNU date -u -d TIME +%s. */
static void times_are_read_in_the_forms_of_iso_8601(void **state)
{
    static const struct {
        const char *text;
        double time_s;
        bool zoned;
        const char *back;
    } TIMES[] = {
        {"2026-03-01T12:00", 1772366400.0, false, "2026-03-01 12:00"},
        {" 2026-03-01 12:00:30 ", 1772366430.0, false, "2026-03-01 12:00:30"},
        {"2024-02-29", 1709164800.0, false, "2024-02-29 00:00"},
        {"2026-03-01T12:00:00Z", 1772366400.0, true, "2026-03-01 12:00"},
        {"2026-03-01T12:00+01:00", 1772362800.0, true, "2026-03-01 11:00"},
        {"2026-12-31T23:30-0330", 1798772400.0, true, "2027-01-01 03:00"},
        {"1970-01-01 00:00:07.25", 7.0, false, "1970-01-01 00:00:07"},
        {"2026/03/01 12:00", 1772366400.0, false, "2026-03-01 12:00"},
        {"01.03.2026 12:00:30", 1772366430.0, false, "2026-03-01 12:00:30"},
        {"29.02.2024", 1709164800.0, false, "2024-02-29 00:00"},
    };

    (void)state;
    for (size_t i = 0; i < COUNT(TIMES); i++) {
        char text[BC_LOG_TIME_TEXT];
        bc_error err;
        double time_s = 0.0;
        bool zoned = !TIMES[i].zoned;

        assert_ok(bc_log_time_parse(TIMES[i].text, &time_s, &zoned, &err), &err);
        assert_within_at(TIMES[i].text, time_s, TIMES[i].time_s, 1e-6);
        assert_int_equal(zoned, TIMES[i].zoned);
        bc_log_time_text(time_s, text);
        assert_string_equal(text, TIMES[i].back);
    }
}

static void what_is_no_time_is_refused(void **state)
{
    static const char *const WORDS[] = {"",           "noon",       "2026-02-29", "2026-13-01",        "01/03/2026",         "2026-03-01T24:00", "2026-03-01T12",
                                        "29.02.2026", "1.3.2026",   "2026/03-01", "31.04.2026",        "00.01.2026",
                                        "2026-3-1",   "2026-03-01 12:61", "2026-03-01T12:00X", "2026-03-01T12:00+1", "1969-12-31"};

    (void)state;
    for (size_t i = 0; i < COUNT(WORDS); i++) {
        bc_error err;
        double time_s = -1.5;
        bool zoned = false;

        assert_refused_at(WORDS[i], bc_log_time_parse(WORDS[i], &time_s, &zoned, &err), &err, BC_ERR_INPUT, "no time");
        assert_within(time_s, -1.5, 0.0);
    }
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(a_row_holds_until_the_next_and_the_last_for_a_usual_step),
        cmocka_unit_test(more_than_three_usual_steps_are_a_gap_and_not_counted),
        cmocka_unit_test(excursions_tell_hours_runs_the_worst_and_the_longest),
        cmocka_unit_test(a_gap_ends_an_excursion),
        cmocka_unit_test(a_figure_on_its_bound_is_not_outside),
        cmocka_unit_test(one_row_alone_covers_no_time_but_is_judged),
        cmocka_unit_test(a_distribution_weighs_with_time),
        cmocka_unit_test(heat_weighs_a_mean_where_a_flow_is_given),
        cmocka_unit_test(a_row_that_does_not_go_on_in_time_is_refused_and_leaves_the_log_as_it_was),
        cmocka_unit_test(a_log_without_rows_cannot_be_settled),
        cmocka_unit_test(five_thousand_rows_keep_their_figures_while_the_log_grows),
        cmocka_unit_test(times_are_read_in_the_forms_of_iso_8601),
        cmocka_unit_test(what_is_no_time_is_refused),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
