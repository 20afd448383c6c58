/* SPDX-License-Identifier: MIT */
/* test_tally_merge.c - parts of a log, summed up apart and merged, say what one tally of the whole log says. */
#include "supply/tally_internal.h"
#include "tally_cases.h"

/* Everything of `later` behind `t`, and `later` closed. */
static void merge(tally *t, tally *later)
{
    bc_error err;

    assert_ok(tally_merge(t, later, &err), &err);
    tally_close(later);
}

/* Parts at ascending rows `edges`, and what they come to together. */
static void merge_at(const tally_case *k, const tally *whole, const size_t edges[], size_t count)
{
    size_t from = 0;
    tally *t = case_open(k);

    for (size_t i = 0; i <= count; i++) {
        const size_t to = i < count ? edges[i] : k->count;

        merge(t, case_tally(k, from, to));
        from = to;
    }
    case_settle(t);
    assert_same_tally(t, whole);
    tally_close(t);
}

/* A log whose clock is put back has no edge there: its parts would overlap. */
static bool is_edge(const tally_case *k, size_t row)
{
    double latest = 0.0;
    double earliest = HUGE_VAL;

    for (size_t i = 0; i < k->count; i++) {
        latest = i < row ? fmax(latest, k->rows[i].time_s) : latest;
        earliest = i >= row ? fmin(earliest, k->rows[i].time_s) : earliest;
    }
    return earliest >= latest;
}

static void parts_split_at_every_row_merge_to_the_whole(void **state)
{
    (void)state;
    for (uint64_t start = 1; start <= 4; start++) {
        tally_case *k = case_make(start * 7919, 160, 900.0, TALLY_DAY);
        tally *whole = case_tally(k, 0, k->count);

        case_settle(whole);
        for (size_t edge = 0; edge <= k->count; edge++)
            if (is_edge(k, edge))
                merge_at(k, whole, &edge, 1);
        tally_close(whole);
        free(k);
    }
}

static void many_random_parts_merge_to_the_whole(void **state)
{
    static const struct {
        double step_s;
        tally_period by;
    } KINDS[] = {{60.0, TALLY_HOUR}, {3600.0, TALLY_MONTH}, {1.0, TALLY_WHOLE}, {0.25, TALLY_DAY}, {0.0, TALLY_DAY}, {86400.0, TALLY_MONTH}};
    chance c = {4711};

    (void)state;
    for (size_t i = 0; i < COUNT(KINDS); i++) {
        tally_case *k = case_make(31 * (i + 1), CASE_ROWS, KINDS[i].step_s, KINDS[i].by);
        tally *whole = case_tally(k, 0, k->count);
        size_t edges[400];
        size_t count = 0;

        case_settle(whole);
        for (size_t row = 0; row < k->count && count < COUNT(edges); row += chance_below(&c, 40))
            if (is_edge(k, row))
                edges[count++] = row; /* parts without a row, and with one, are among them */
        merge_at(k, whole, edges, count);
        tally_close(whole);
        free(k);
    }
}

static void merge_from_the_end(uint64_t start)
{
    tally_case *k = case_make(start, 900, 60.0, TALLY_HOUR);
    tally *whole = case_tally(k, 0, k->count);
    tally *parts[90];
    size_t from = 0;

    case_settle(whole);

    for (size_t i = 0; i < COUNT(parts); i++) {
        size_t to = i + 1 == COUNT(parts) ? k->count : 10 * (i + 1);

        while (to < k->count && !is_edge(k, to))
            to++;
        parts[i] = case_open(k); /* a part can be merged from parts, too */
        merge(parts[i], case_tally(k, from, to));
        from = to;
    }
    for (size_t i = COUNT(parts) - 1; i > 0; i--) /* a + (b + (c + ...)) */
        merge(parts[i - 1], parts[i]);
    case_settle(parts[0]);
    assert_same_tally(parts[0], whole);
    tally_close(parts[0]);
    tally_close(whole);
    free(k);
}

static void parts_can_be_merged_in_any_grouping(void **state)
{
    (void)state;
    for (uint64_t start = 99; start < 139; start++)
        merge_from_the_end(start);
}

/* Values over many octaves force coarser bins, a long log wider steps, in some parts before others. */
static void wide_values_and_long_logs_merge_to_the_whole(void **state)
{
    chance c = {2718};
    tally_plan plan = {.figure_count = 1, .step_s = 60.0};
    tally *whole = NULL;
    tally *parts[3] = {NULL, NULL, NULL};
    bc_error err;

    (void)state;
    assert_ok(tally_open(&plan, &whole, &err), &err);
    for (size_t i = 0; i < COUNT(parts); i++)
        assert_ok(tally_open(&plan, &parts[i], &err), &err);
    for (size_t i = 0; i < 60000; i++) {
        const size_t part = i < 500 ? 0 : i < 45000 ? 1 : 2;
        const double value = (chance_below(&c, 3) == 0 ? -1.0 : 1.0) * exp((part == 1 ? 9.0 : 1.0) * chance_normal(&c));
        const tally_row row = {.has_time = true, .time_s = 1.7e9 + 60.0 * (double)i, .values = &value};

        assert_ok(tally_add(whole, &row, &err), &err);
        assert_ok(tally_add(parts[part], &row, &err), &err);
    }
    merge(parts[0], parts[1]);
    merge(parts[0], parts[2]);
    case_settle(whole);
    case_settle(parts[0]);
    assert_true(tally_accuracy(whole, 0) > 1e-5);
    assert_same_tally(parts[0], whole);
    tally_close(parts[0]);
    tally_close(whole);
}

static void an_excursion_over_the_edge_is_one(void **state)
{
    tally_case *k = case_make(5, 6, 60.0, TALLY_WHOLE);
    tally_excursions e;

    (void)state;
    for (size_t i = 0; i < k->count; i++) {
        k->rows[i].time_s = 1772000000.0 + 60.0 * (double)i;
        k->rows[i].known = 7;
        k->rows[i].broken = i > 0 && i < 5 ? 2 : 0;
        k->limit_values[i][1] = i == 3 ? 8.5 : 7.25;
    }
    tally *t = case_tally(k, 0, 2);

    merge(t, case_tally(k, 2, 3));
    merge(t, case_tally(k, 3, 4));
    merge(t, case_tally(k, 4, 6));
    case_settle(t);
    tally_outside(t, 1, &e);
    assert_int_equal(e.broken, 4);
    assert_int_equal(e.runs, 1);
    assert_within(e.longest, 240.0, 1e-9);
    assert_within(e.worst, 8.5, 1e-12);
    assert_within(e.worst_s, 1772000180.0, 1e-6);
    tally_close(t);
    free(k);
}

static void parts_that_overlap_are_refused_and_stay_as_they_were(void **state)
{
    tally_case *k = case_make(17, 40, 60.0, TALLY_WHOLE);
    tally *whole = NULL;
    bc_error err;

    (void)state;
    for (size_t i = 0; i < k->count; i++)
        k->rows[i].time_s = 1772000000.0 + 60.0 * (double)i;
    whole = case_tally(k, 0, 20);
    tally *t = case_tally(k, 0, 20);
    tally *other = case_tally(k, 18, 40);

    assert_refused(tally_merge(t, other, &err), &err, BC_ERR_INPUT, "overlap|2026-02-25 06:32|2026-02-25 06:31");
    assert_refused(tally_merge(other, t, &err), &err, BC_ERR_INPUT, "overlap");
    case_settle(whole);
    case_settle(t);
    assert_same_tally(t, whole);
    tally_close(whole);
    tally_close(t);
    tally_close(other);
    free(k);
}

static void parts_of_different_plans_are_refused_with_what_differs(void **state)
{
    tally_case *k = case_make(31, 2, 60.0, TALLY_DAY);
    const tally_plan plan = case_plan(60.0, TALLY_DAY);
    tally_plan others[8];
    static const char *const WORDS[] = {"usual steps of 60 s and 30 s", "by day and by month",  "UTC",    "combustion 25 C|combustion 15 C",
                                        "the figure hydrogen",          "3 figures and 2",      "limit z", "contract|'Marrowfen works' and ''"};
    bc_error err;

    (void)state;
    for (size_t i = 0; i < COUNT(others); i++)
        others[i] = plan;
    others[0].step_s = 30.0;
    others[1].by = TALLY_MONTH;
    others[2].zoned = true;
    (void)snprintf(others[3].state, sizeof others[3].state, "combustion 15 C, metering 15 C and 101.325 kPa");
    (void)snprintf(others[4].figures[1].unit, sizeof others[4].figures[1].unit, "ppm");
    others[5].figure_count = 2;
    others[6].limits[2].min = 0.9972;
    others[7].contract[0] = '\0';
    for (size_t i = 0; i < COUNT(others); i++) {
        tally *a = NULL;
        tally *b = NULL;

        assert_ok(tally_open(&plan, &a, &err), &err);
        assert_ok(tally_open(&others[i], &b, &err), &err);
        assert_ok(tally_add(a, &k->rows[0], &err), &err);
        assert_ok(tally_add(b, &k->rows[1], &err), &err);
        assert_refused_at(WORDS[i], tally_merge(a, b, &err), &err, BC_ERR_INPUT, WORDS[i]);
        tally_close(a);
        tally_close(b);
    }
    free(k);
}

/* Each word and figure of a plan counts, of its first and of its last row; and only these. */
static void every_field_of_a_plan_tells_plans_apart(void **state)
{
    const tally_plan plan = case_plan(60.0, TALLY_DAY);
    tally_plan other = plan;
    char text[400] = "";

    (void)state;
    assert_false(tally_plans_differ(&plan, &other, text, sizeof text));
#define DIFFERS(change, words)                                            \
    do {                                                                  \
        other = plan;                                                     \
        change;                                                           \
        assert_true(tally_plans_differ(&plan, &other, text, sizeof text)); \
        assert_non_null(strstr(text, words));                             \
    } while (0)
    for (size_t i = 0; i < plan.figure_count; i++) {
        DIFFERS(other.figures[i].id[0] = 'X', plan.figures[i].id);
        DIFFERS(other.figures[i].label[0] = 'X', plan.figures[i].id);
        DIFFERS(other.figures[i].unit[0] = 'X', plan.figures[i].unit);
    }
    for (size_t i = 0; i < plan.limit_count; i++) {
        DIFFERS(other.limits[i].id[0] = 'X', plan.limits[i].id);
        DIFFERS(other.limits[i].unit[0] = 'X', plan.limits[i].id);
        DIFFERS(other.limits[i].state[0] = 'X', plan.limits[i].id);
        DIFFERS(other.limits[i].has_min = !other.limits[i].has_min, plan.limits[i].id);
        DIFFERS(other.limits[i].has_max = !other.limits[i].has_max, plan.limits[i].id);
        DIFFERS(other.limits[i].min += 1e-9, plan.limits[i].id);
        DIFFERS(other.limits[i].max -= 1e-9, plan.limits[i].id);
    }
    for (size_t i = 0; i < plan.flag_count; i++) {
        DIFFERS(other.flags[i].id[0] = 'X', "remarks");
        DIFFERS(other.flags[i].label[0] = 'X', "remarks");
    }
    DIFFERS(other.figure_count--, "3 figures and 2");
    DIFFERS(other.limit_count--, "3 limits and 2");
    DIFFERS(other.flag_count--, "remarks");
    DIFFERS(other.flag_count++, "remarks");
    DIFFERS(other.step_s = nextafter(60.0, 0.0), "usual steps");
    DIFFERS(other.step_s = nextafter(60.0, 90.0), "usual steps");
    DIFFERS(other.by = TALLY_WHOLE, "by day and by nothing");
    DIFFERS(other.by = TALLY_HOUR, "by day and by hour");
    DIFFERS(other.by = TALLY_MONTH, "by day and by month");
    DIFFERS(other.zoned = !other.zoned, "UTC");
    DIFFERS(other.state[0] = 'X', "reference states");
    DIFFERS(other.contract[0] = 'X', "contracts");
#undef DIFFERS
    other = plan;
    other.figures[plan.figure_count].id[0] = 'X'; /* beyond the last one nothing counts */
    other.limits[plan.limit_count].id[0] = 'X';
    other.flags[plan.flag_count].id[0] = 'X';
    assert_false(tally_plans_differ(&plan, &other, text, sizeof text));
}

/* A part that is one long outage cannot know which clock the log has. */
static void a_part_without_rows_takes_the_clock_of_the_others(void **state)
{
    tally_case *k = case_make(32, 1, 60.0, TALLY_DAY);
    tally_plan plan = case_plan(60.0, TALLY_DAY);
    tally *parts[3] = {NULL};
    tally_cover cover;
    bc_error err;

    (void)state;
    assert_ok(tally_open(&plan, &parts[0], &err), &err);
    assert_ok(tally_open(&plan, &parts[2], &err), &err);
    plan.zoned = true;
    assert_ok(tally_open(&plan, &parts[1], &err), &err);
    assert_ok(tally_add(parts[1], &k->rows[0], &err), &err);
    for (size_t i = 0; i < COUNT(parts); i++)
        tally_add_refused(parts[i], 7 + i);
    merge(parts[0], parts[1]);
    merge(parts[0], parts[2]);
    assert_true(tally_plan_of(parts[0])->zoned);
    assert_ok(tally_settle(parts[0], &err), &err);
    tally_covers(parts[0], &cover);
    assert_int_equal(cover.rows, 1);
    assert_int_equal(cover.refused, 24);
    tally_close(parts[0]);
    free(k);
}

static void a_settled_tally_is_not_merged(void **state)
{
    tally_case *k = case_make(3, 4, 60.0, TALLY_WHOLE);
    tally *a = case_tally(k, 0, 2);
    tally *b = case_tally(k, 2, 4);
    bc_error err;

    (void)state;
    case_settle(a);
    assert_refused(tally_merge(a, b, &err), &err, BC_ERR_USAGE, "finished");
    tally_close(a);
    tally_close(b);
    free(k);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(parts_split_at_every_row_merge_to_the_whole),
        cmocka_unit_test(many_random_parts_merge_to_the_whole),
        cmocka_unit_test(parts_can_be_merged_in_any_grouping),
        cmocka_unit_test(wide_values_and_long_logs_merge_to_the_whole),
        cmocka_unit_test(an_excursion_over_the_edge_is_one),
        cmocka_unit_test(parts_that_overlap_are_refused_and_stay_as_they_were),
        cmocka_unit_test(every_field_of_a_plan_tells_plans_apart),
        cmocka_unit_test(parts_of_different_plans_are_refused_with_what_differs),
        cmocka_unit_test(a_part_without_rows_takes_the_clock_of_the_others),
        cmocka_unit_test(a_settled_tally_is_not_merged),
    };
    return cmocka_run_group_tests(tests, NULL, NULL);
}
