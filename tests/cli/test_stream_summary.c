/* SPDX-License-Identifier: MIT */
/* test_stream_summary.c - a tally as a report: tables, charts, verdict. */
#include "supply/tally_cases.h"

#include "cli/stream_summary.h"

static report report_of(tally *t)
{
    report r;

    case_settle(t);
    report_open(&r, "0", "stream", "Summary of a log");
    stream_summary_report(&r, t);
    assert_true(report_ok(&r));
    return r;
}

static bool has_table(const report *r, const char *id)
{
    for (size_t i = 0; i < r->table_count; i++)
        if (strcmp(r->tables[i].id, id) == 0)
            return true;
    return false;
}

/* A table or chart that must be there; what follows fail_msg() is for the compiler. */
static const report_table *table_of(const report *r, const char *id)
{
    static const report_table NONE;

    for (size_t i = 0; i < r->table_count; i++)
        if (strcmp(r->tables[i].id, id) == 0)
            return &r->tables[i];
    fail_msg("no table %s", id);
    return &NONE;
}

static const report_chart *chart_of(const report *r, const char *id)
{
    static const report_chart NONE;

    for (size_t i = 0; i < r->chart_count; i++)
        if (strcmp(r->charts[i].id, id) == 0)
            return &r->charts[i];
    fail_msg("no chart %s", id);
    return &NONE;
}

/* The cell of a row and a column by its id. */
static const report_cell *cell_of(const report_table *t, size_t row, const char *column)
{
    for (size_t i = 0; i < t->column_count; i++)
        if (strcmp(t->columns[i].id, column) == 0)
            return &t->cells[row * t->column_count + i];
    fail_msg("%s has no column %s", t->id, column);
    return t->cells;
}

static void every_table_is_whole_and_every_number_finite(const report *r)
{
    for (size_t i = 0; i < r->table_count; i++) {
        const report_table *t = &r->tables[i];

        assert_int_equal(t->cell_count % t->column_count, 0);
        for (size_t c = 0; c < t->cell_count; c++)
            assert_true(!t->cells[c].is_number || isfinite(t->cells[c].number));
    }
    for (size_t i = 0; i < r->chart_count; i++)
        for (size_t s = 0; s < r->charts[i].series_count; s++)
            for (size_t p = 0; p < r->charts[i].series[s].point_count; p++)
                assert_true(isfinite(r->charts[i].series[s].points[p].x) && isfinite(r->charts[i].series[s].points[p].y));
}

static void a_log_under_a_contract_has_every_table_and_is_judged(void **state)
{
    static const char *const TABLES[] = {"log", "remarks", "outside", "excursions", "distribution", "extremes", "by-day", "by-day-wobbe-gross"};
    tally_case *k = case_make(71, 3000, 900.0, TALLY_DAY);
    tally *t = case_tally(k, 0, k->count);
    report r = report_of(t);
    tally_spread s;
    tally_excursions e;

    (void)state;
    every_table_is_whole_and_every_number_finite(&r);
    for (size_t i = 0; i < COUNT(TABLES); i++)
        (void)table_of(&r, TABLES[i]);
    tally_spreads(t, 1, &s);
    tally_outside(t, 0, &e);
    assert_within(cell_of(table_of(&r, "distribution"), 1, "mean")->number, s.mean, 0.0);
    assert_within(cell_of(table_of(&r, "distribution"), 1, "energy-mean")->number, s.energy_mean, 0.0);
    assert_within(cell_of(table_of(&r, "outside"), 0, "rows")->number, (double)e.broken, 0.0);
    assert_within(cell_of(table_of(&r, "outside"), 0, "energy")->number, e.broken_j / 1e9, 0.0);
    assert_int_equal(table_of(&r, "by-day")->cell_count, tally_period_count(t) * table_of(&r, "by-day")->column_count);
    assert_string_equal(cell_of(table_of(&r, "outside"), 2, "unit")->text, "");
    assert_string_equal(cell_of(table_of(&r, "outside"), 1, "limit")->text, "hydrogen");
    assert_string_equal(cell_of(table_of(&r, "outside"), 2, "limit")->text, "z, 0/0");
    assert_non_null(strstr(r.verdict, "NOT within the contract in "));
    assert_non_null(strstr(r.verdict, "; broken: wobbe-gross in "));
    assert_non_null(strstr(r.verdict, "1 limit cannot be judged in every row"));
    assert_int_equal(r.judgement, REPORT_NO);
    report_close(&r);
    tally_close(t);
    free(k);
}

static void limits_are_marked_on_the_figure_of_the_same_state_and_unit(void **state)
{
    tally_case *k = case_make(73, 3000, 900.0, TALLY_WHOLE);
    tally *t = NULL;

    (void)state;
    (void)snprintf(k->plan.limits[1].state, sizeof k->plan.limits[1].state, "0/0");
    t = case_tally(k, 0, k->count);
    report r = report_of(t);

    assert_int_equal(chart_of(&r, "trend-1")->mark_count, 2);
    assert_within(chart_of(&r, "trend-1")->marks[0].y, 49.2, 0.0);
    assert_int_equal(chart_of(&r, "trend-2")->mark_count, 0);
    assert_int_equal(chart_of(&r, "spread-1")->mark_count, 2);
    assert_false(has_table(&r, "by-day"));
    report_close(&r);
    tally_close(t);
    free(k);
}

static void a_good_log_is_within_and_one_with_refused_rows_asks_for_care(void **state)
{
    (void)state;
    for (uint64_t refused = 0; refused < 2; refused++) {
        tally_case *k = case_make(79, 1, 60.0, TALLY_WHOLE);
        tally *t = NULL;
        bc_error err;

        k->rows[0].known = 7;
        k->rows[0].broken = 0;
        t = case_open(k);
        assert_ok(tally_add(t, &k->rows[0], &err), &err);
        tally_add_refused(t, refused);
        report r = report_of(t);

        assert_int_equal(strncmp(r.verdict, "within the contract in 1 analysis, over ", 40), 0);
        assert_int_equal(r.judgement, refused > 0 ? REPORT_CARE : REPORT_YES);
        assert_false(has_table(&r, "excursions"));
        report_close(&r);
        tally_close(t);
        free(k);
    }
}

static void a_log_without_contract_step_or_rows_has_no_verdict(void **state)
{
    (void)state;
    for (size_t rows = 0; rows < 200; rows += 199) {
        tally_case *k = case_make(83, rows, 0.0, TALLY_MONTH);
        tally *t = NULL;

        k->plan.limit_count = 0;
        t = case_tally(k, 0, rows);
        report r = report_of(t);

        every_table_is_whole_and_every_number_finite(&r);
        assert_null(r.verdict);
        assert_int_equal(has_table(&r, "distribution"), rows > 0);
        report_close(&r);
        tally_close(t);
        free(k);
    }
}

static void excursions_are_listed_with_the_bound_that_they_break(void **state)
{
    tally_case *k = case_make(89, 500, 900.0, TALLY_WHOLE);
    tally *t = case_tally(k, 0, k->count);
    report r = report_of(t);
    size_t below = 0;

    (void)state;
    stream_summary_excursions(&r, t);
    const report_table *list = table_of(&r, "excursion-list");

    every_table_is_whole_and_every_number_finite(&r);
    assert_int_equal(list->cell_count / list->column_count, tally_run_count(t));
    for (size_t i = 0; i < tally_run_count(t); i++) {
        const double worst = cell_of(list, i, "worst")->number;
        const double bound = cell_of(list, i, "bound")->number;
        const bool is_min = fabs(bound - 49.2) < 1e-9 || fabs(bound - 0.9971) < 1e-9;

        below += is_min;
        assert_true(is_min ? worst < bound : worst > bound);
    }
    assert_true(below > 0 && below < tally_run_count(t));
    report_close(&r);
    tally_close(t);
    free(k);
}

static void a_trend_shows_its_band_only_where_steps_hold_several_rows(void **state)
{
    static const size_t ROWS[] = {400, 4000};

    (void)state;
    for (size_t i = 0; i < COUNT(ROWS); i++) {
        tally_case *k = case_make(97, ROWS[i], 60.0, TALLY_WHOLE);
        tally *t = NULL;
        size_t bands = 0;

        for (size_t row = 0; row < k->count; row++)
            k->rows[row].time_s = 1772000000.0 + 60.0 * (double)row + (row > 300 ? 7200.0 : 0.0);
        t = case_tally(k, 0, k->count);
        report r = report_of(t);
        const report_chart *trend = chart_of(&r, "trend-1");

        for (size_t s = 0; s < trend->series_count; s++)
            bands += trend->series[s].kind == REPORT_REGION;
        assert_int_equal(bands, i == 0 ? 0 : 2); /* the gap parts it */
        assert_int_equal(trend->series_count, i == 0 ? 2 : 4);
        report_close(&r);
        tally_close(t);
        free(k);
    }
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(a_log_under_a_contract_has_every_table_and_is_judged),
        cmocka_unit_test(limits_are_marked_on_the_figure_of_the_same_state_and_unit),
        cmocka_unit_test(a_good_log_is_within_and_one_with_refused_rows_asks_for_care),
        cmocka_unit_test(a_log_without_contract_step_or_rows_has_no_verdict),
        cmocka_unit_test(excursions_are_listed_with_the_bound_that_they_break),
        cmocka_unit_test(a_trend_shows_its_band_only_where_steps_hold_several_rows),
    };
    return cmocka_run_group_tests(tests, NULL, NULL);
}
