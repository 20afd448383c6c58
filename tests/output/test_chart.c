/* SPDX-License-Identifier: MIT */
/* test_chart.c - charts: what a report keeps of them, where ticks stand, and what reaches the file. */
#include "support.h"

#include "output/chart_internal.h"
#include "output/chart_scale_internal.h"
#include "output/render.h"

#include <math.h>
#include <time.h>

static const render_style STYLE = {0};

/* A report with one chart: a curve over the share of hydrogen, its limit, and the crossing. */
static size_t add_sweep(report *r)
{
    const size_t chart = report_add_chart(r, "sweep", "Hydrogen into Works supply");

    report_set_axis(r, chart, REPORT_X, "Share of hydrogen", "mol %");
    report_set_axis(r, chart, REPORT_Y, "Wobbe index, gross", "MJ/m3");
    const size_t curve = report_add_series(r, chart, REPORT_LINE, "blend <A & B>");
    for (int i = 0; i <= 37; i++)
        report_add_point(r, chart, curve, 0.81 * i, 51.23 - 0.137 * 0.81 * i);
    report_add_mark(r, chart, REPORT_MARK_Y, 7.0, 47.2, "min 47.2");
    report_add_mark(r, chart, REPORT_MARK_POINT, 29.416, 47.2, "29.4 %");
    report_add_mark(r, chart, REPORT_MARK_X, 5.0, 7.0, "today");
    return chart;
}

static int set_up(void **state)
{
    report *r = calloc(1, sizeof *r);

    if (r == NULL)
        return 1;
    report_open(r, "0.1.0", "blend", "A sweep");
    *state = r;
    return 0;
}

static int tear_down(void **state)
{
    report_close(*state);
    free(*state);
    return 0;
}

/* What a renderer writes, ended by a NUL; the caller frees it. */
typedef bc_status renderer(const report *r, const render_style *style, FILE *out, bc_error *err);

static char *rendered(renderer *render, const report *r, size_t *size)
{
    char *bytes = NULL;
    bc_error err = {0};
    FILE *out = open_memstream(&bytes, size);

    assert_non_null(out);
    assert_ok(render(r, &STYLE, out, &err), &err);
    assert_int_equal(fclose(out), 0);
    return bytes;
}

static bool can_run(const char *program)
{
    char command[96];

    (void)snprintf(command, sizeof command, "command -v %s >/dev/null", program);
    return system(command) == 0;
}

/* An XML parser has to take it, if there is one on this machine. */
static void assert_is_xml(const char *svg)
{
    char command[128];

    if (!can_run("xmllint"))
        return;
    (void)snprintf(command, sizeof command, "xmllint --noout %s", write_scratch(svg, strlen(svg)));
    assert_int_equal(system(command), 0);
}

/* Numbers that are none would stand in the paths, behind the words. */
static void assert_sound(const char *svg)
{
    const char *drawing = strstr(svg, "</desc>");

    assert_non_null(drawing);
    assert_null(strstr(drawing, "nan"));
    assert_null(strstr(drawing, "inf"));
    assert_is_xml(svg);
}

static void assert_draws(const report *r)
{
    size_t size = 0;
    char *svg = rendered(render_svg, r, &size);

    assert_sound(svg);
    free(svg);
    free(rendered(render_png, r, &size));
    assert_true(size > 1000);
    free(rendered(render_pdf, r, &size));
    assert_true(size > 1000);
}

/* ---- the model ---- */

static void what_is_added_is_copied_and_comes_back_in_order(void **state)
{
    report *r = *state;
    char label[] = "Biogas";

    assert_int_equal(add_sweep(r), 0);
    assert_int_equal(report_add_chart(r, "second", NULL), 1);
    assert_int_equal(report_add_series(r, 1, REPORT_OUTLINE, label), 0);
    assert_int_equal(report_add_series(r, 1, REPORT_POINTS, label), 1);
    label[0] = '?';
    report_add_name(r, 1, REPORT_Y, "oxygen");
    report_add_name(r, 1, REPORT_Y, "hydrogen");
    report_set_range(r, 1, REPORT_X, -3.0, 17.5);
    report_set_time(r, 1);

    assert_true(report_ok(r));
    assert_string_equal(r->charts[0].y.unit, "MJ/m3");
    assert_int_equal(r->charts[0].series[0].point_count, 38);
    assert_within(r->charts[0].series[0].points[37].x, 29.97, 1e-12);
    assert_within(r->charts[0].marks[0].x, 0.0, 0.0);
    assert_within(r->charts[0].marks[2].y, 0.0, 0.0);
    assert_string_equal(r->charts[1].title, "");
    assert_string_equal(r->charts[1].series[1].label, "Biogas");
    assert_string_equal(r->charts[1].y.names[1], "hydrogen");
    assert_true(r->charts[1].x.fixed && r->charts[1].x.is_time);
}

static void an_axis_named_again_has_the_later_name(void **state)
{
    report *r = *state;

    add_sweep(r);
    report_set_axis(r, 0, REPORT_X, "Excess air", "%");
    assert_string_equal(r->charts[0].x.label, "Excess air");
    assert_string_equal(r->charts[0].x.unit, "%");
}

static void a_failed_report_takes_more_and_is_not_drawn(void **state)
{
    report *r = *state;
    bc_error err = {0};
    const size_t none = (size_t)-1;

    add_sweep(r);
    r->failed = true;
    report_set_axis(r, none, REPORT_X, "x", "1");
    report_set_range(r, none, REPORT_Y, 0.3, 0.7);
    report_set_time(r, none);
    report_add_name(r, none, REPORT_X, "x");
    assert_int_equal(report_add_series(r, none, REPORT_LINE, "x"), none);
    report_add_point(r, none, 0, 1.5, 2.5);
    report_add_point(r, 0, none, 1.5, 2.5);
    report_add_mark(r, none, REPORT_MARK_X, 1.5, 2.5, "x");
    assert_int_equal(render_svg(r, &STYLE, stdout, &err), BC_ERR_MEMORY);
}

/* ---- ticks and ranges ---- */

static void steps_are_one_two_or_five_times_a_power_of_ten(void **state)
{
    static const struct {
        double span;
        int wanted;
        double step;
    } CASES[] = {{37.0, 8, 5.0},      {43.0, 4, 20.0}, {1.0, 5, 0.2},    {0.0067, 6, 0.002},
                 {987654, 5, 200000}, {6.0, 6, 1.0},   {6.0001, 6, 2.0}, {3e-30, 4, 1e-30},
                 {1e99, 7, 2e98},     {0.3, 3, 0.1},   {4.999, 5, 1.0},  {1500.0, 6, 500.0}};

    (void)state;
    for (size_t i = 0; i < COUNT(CASES); i++)
        assert_within(chart_step(CASES[i].span, CASES[i].wanted), CASES[i].step, 1e-12 * CASES[i].step);
}

static void assert_ticks(double low, double high, int wanted, const char *texts)
{
    chart_tick ticks[CHART_TICKS_MAX];
    const size_t count = chart_number_ticks((chart_range){low, high}, wanted, ticks);
    char got[512] = "";

    for (size_t i = 0; i < count; i++) {
        const size_t end = strlen(got);

        (void)snprintf(got + end, sizeof got - end, "%s%s", i > 0 ? " " : "", ticks[i].text);
    }
    assert_string_equal(got, texts);
}

static void ticks_have_the_digits_that_tell_them_apart(void **state)
{
    (void)state;
    assert_ticks(0.0, 30.0, 7, "0 5 10 15 20 25 30");
    assert_ticks(0.5443, 0.7012, 5, "0.55 0.60 0.65 0.70");
    assert_ticks(-0.31, 0.13, 5,
                 "\xE2\x88\x92"
                 "0.3 \xE2\x88\x92"
                 "0.2 \xE2\x88\x92"
                 "0.1 0.0 0.1");
    assert_ticks(0.1, 0.7, 6, "0.1 0.2 0.3 0.4 0.5 0.6 0.7");
    assert_ticks(1987.0, 2311.0, 4, "2000 2100 2200 2300");
    assert_ticks(2.1e9, 5.3e9, 4, "3e+09 4e+09 5e+09");
    assert_ticks(1e-9, 7.9e-9, 4, "2e-09 4e-09 6e-09");
}

static void ticks_of_any_range_rise_within_it_and_differ(void **state)
{
    chance c = {4711};

    (void)state;
    for (int i = 0; i < 20000; i++) {
        const double span = pow(10.0, 200.0 * chance_uniform(&c) - 100.0);
        const double low = span * (chance_uniform(&c) - 0.5) * pow(10.0, 5.0 * chance_uniform(&c));
        const int wanted = 2 + (int)chance_below(&c, 7);
        chart_tick ticks[CHART_TICKS_MAX];
        const chart_range range = {low, low + span};
        const size_t count = chart_number_ticks(range, wanted, ticks);

        assert_true(count >= 2 && count <= (size_t)(wanted < 5 ? 6 : wanted + 1));
        for (size_t t = 0; t < count; t++) {
            assert_true(ticks[t].at > low - 1e-6 * span && ticks[t].at < range.high + 1e-6 * span);
            assert_true(t == 0 || ticks[t].at > ticks[t - 1].at);
            assert_true(t == 0 || strcmp(ticks[t].text, ticks[t - 1].text) != 0);
        }
    }
}

static void assert_times(double low, double high, int wanted, const char *texts)
{
    chart_tick ticks[CHART_TICKS_MAX];
    const size_t count = chart_time_ticks((chart_range){low, high}, wanted, ticks);
    char got[512] = "";

    for (size_t i = 0; i < count; i++) {
        const size_t end = strlen(got);

        (void)snprintf(got + end, sizeof got - end, "%s%s%s%s", i > 0 ? "|" : "", ticks[i].text,
                       *ticks[i].below != '\0' ? "/" : "", ticks[i].below);
    }
    assert_string_equal(got, texts);
}

/* 1709164800 is 2024-02-29 00:00 (date -u -d 2024-02-29 +%s). */
static void times_stand_at_full_hours_days_months_and_years(void **state)
{
    const double leap = 1709164800.0, day = 86400.0;

    (void)state;
    assert_times(leap - 7000.0, leap + 31000.0, 5, "00:00/2024-02-29|03:00|06:00");
    assert_times(leap - 1.3 * day, leap + 2.2 * day, 5, "28 Feb/2024|29 Feb|1 Mar|2 Mar");
    assert_times(leap - 40.0 * day, leap + 90.0 * day, 7, "Feb/2024|Mar|Apr|May");
    assert_times(leap - 400.0 * day, leap + 800.0 * day, 5, "2024|2025|2026");
    assert_times(-90.0, 240.0, 6, "23:59/1969-12-31|00:00/1970-01-01|00:01|00:02|00:03|00:04");
    assert_times(3e11, 5e11, 4, "3e+11|3.5e+11|4e+11|4.5e+11|5e+11");
}

static void calendar_days_are_those_of_the_c_library(void **state)
{
    static const char MONTHS[] = "JanFebMarAprMayJunJulAugSepOctNovDec";
    chance c = {815};

    (void)state;
    for (int i = 0; i < 5000; i++) {
        const double low = 4e9 * (chance_uniform(&c) - 0.4);
        chart_tick ticks[CHART_TICKS_MAX];
        const size_t count = chart_time_ticks((chart_range){low, low + 5.1 * 86400.0}, 6, ticks);

        assert_true(count >= 4 && count <= 7);
        for (size_t t = 0; t < count; t++) {
            const time_t at = (time_t)ticks[t].at;
            struct tm date;
            char text[32];

            assert_non_null(gmtime_r(&at, &date));
            (void)snprintf(text, sizeof text, "%d %.3s", date.tm_mday, MONTHS + 3 * date.tm_mon);
            assert_string_equal(ticks[t].text, text);
            (void)snprintf(text, sizeof text, "%d", date.tm_year + 1900);
            assert_true(*ticks[t].below == '\0' || strcmp(ticks[t].below, text) == 0);
            assert_int_equal(date.tm_hour + date.tm_min + date.tm_sec, 0);
        }
    }
}

static void assert_range(const report *r, report_axis_id axis, double low, double high)
{
    const chart_range range = chart_range_of(&r->charts[r->chart_count - 1], axis);

    assert_within(range.low, low, 1e-9 * (fabs(high) + fabs(low)));
    assert_within(range.high, high, 1e-9 * (fabs(high) + fabs(low)));
}

static void a_range_holds_data_and_marks_with_air_where_lines_do_not_end(void **state)
{
    report *r = *state;

    add_sweep(r);
    assert_range(r, REPORT_X, 0.0, 29.97);
    assert_range(r, REPORT_Y, 47.12411 - 0.05 * 4.10589, 51.23 + 0.05 * 4.10589);
    report_set_range(r, 0, REPORT_Y, 40.0, 60.5);
    assert_range(r, REPORT_Y, 40.0, 60.5);
}

static void a_range_that_would_be_empty_is_widened(void **state)
{
    report *r = *state;

    report_add_chart(r, "empty", "");
    assert_range(r, REPORT_X, 0.0, 1.0);
    report_add_series(r, 0, REPORT_LINE, "constant");
    report_add_point(r, 0, 0, 3.3, 50.7);
    report_add_point(r, 0, 0, 7.9, 50.7 + 1e-12);
    assert_range(r, REPORT_Y, 50.7 * 0.95 - 0.05 * 5.07, 50.7 * 1.05 + 0.05 * 5.07);
}

static void bars_start_at_zero_and_names_have_a_place_each(void **state)
{
    report *r = *state;

    report_add_chart(r, "bars", "");
    report_add_series(r, 0, REPORT_BARS, "hours");
    for (int i = 0; i < 4; i++)
        report_add_point(r, 0, 0, 49.1 + 0.2 * i, 13.0 + i);
    assert_range(r, REPORT_X, 49.0, 49.8);
    assert_range(r, REPORT_Y, 0.0, 16.8);
    for (int i = 0; i < 3; i++)
        report_add_name(r, 0, REPORT_Y, "limit");
    assert_range(r, REPORT_Y, -0.5, 2.5);
}

/* ---- what is refused ---- */

static void a_report_without_charts_is_refused_and_no_file_appears(void **state)
{
    static const render_form FORMS[] = {RENDER_SVG, RENDER_PNG, RENDER_PDF};

    (void)remove_scratch(NULL);
    for (size_t i = 0; i < COUNT(FORMS); i++) {
        bc_error err = {0};
        const bc_status status = render_to(*state, FORMS[i], &STYLE, scratch_path(), &err);

        assert_refused(status, &err, BC_ERR_USAGE, "no chart|'blend'|.txt, .json, .csv, .html or .xlsx");
        assert_int_equal(access(scratch_path(), F_OK), -1);
    }
}

static void endings_of_charts_are_known(void **state)
{
    static const struct {
        const char *path;
        render_form form;
    } CASES[] = {{"a/b.svg", RENDER_SVG}, {"x.PNG", RENDER_PNG}, {"x.txt.pdf", RENDER_PDF}};

    (void)state;
    for (size_t i = 0; i < COUNT(CASES); i++) {
        render_form form = RENDER_BRIEF;

        assert_true(render_form_of(CASES[i].path, &form));
        assert_int_equal(form, CASES[i].form);
    }
}

static void a_module_that_is_missing_is_named_with_its_folder(void **state)
{
    static const char *const NOWHERE[] = {"/nowhere", "/nowhere/lib/bluecone"};
    chart_draw *draw = NULL;
    bc_error err = {0};

    (void)state;
    const bc_status status = chart_load(NOWHERE, COUNT(NOWHERE), &draw, &err);
    assert_refused(status, &err, BC_ERR_FILE, "bluecone_chart.so|missing|/nowhere/lib/bluecone|install");
    assert_true(draw == NULL);
}

static void a_file_that_is_no_module_is_refused_with_the_reason(void **state)
{
    char folder[] = "/tmp/bluecone-test-XXXXXX", path[64];
    const char *const folders[] = {folder};
    chart_draw *draw = NULL;
    bc_error err = {0};

    (void)state;
    assert_non_null(mkdtemp(folder));
    (void)snprintf(path, sizeof path, "%s/%s", folder, CHART_MODULE);
    FILE *file = fopen(path, "w");
    assert_non_null(file);
    fputs("no module\n", file);
    assert_int_equal(fclose(file), 0);

    const bc_status status = chart_load(folders, 1, &draw, &err);
    assert_int_equal(remove(path), 0);
    assert_int_equal(rmdir(folder), 0);
    assert_refused(status, &err, BC_ERR_FILE, "cannot load|bluecone_chart.so|install|libcairo2");
}

static void a_module_of_another_version_touches_nothing(void **state)
{
    static const char *const FOLDERS[] = {BC_BUILD_DIR};
    chart_draw *draw = NULL;
    bc_error err = {0};

    (void)state;
    assert_ok(chart_load(FOLDERS, 1, &draw, &err), &err);
    assert_int_equal(draw(CHART_ABI + 1, NULL), CHART_OTHER_ABI);
}

/* ---- what reaches the file ---- */

static void the_svg_is_xml_and_tells_every_label(void **state)
{
    static const char *const WORDS[] = {"<title>A sweep",
                                        "Hydrogen into Works supply",
                                        "Share of hydrogen",
                                        "mol %",
                                        "min 47.2",
                                        "29.4 %",
                                        "Wobbe index, gross",
                                        "blend &lt;A &amp; B&gt;",
                                        "today",
                                        "width=\"800px\""};
    size_t size = 0;

    add_sweep(*state);
    char *svg = rendered(render_svg, *state, &size);
    for (size_t i = 0; i < COUNT(WORDS); i++)
        assert_non_null(strstr(svg, WORDS[i]));
    assert_int_equal(size, strlen(svg));
    assert_sound(svg);
    free(svg);
}

static void a_form_is_the_same_bytes_each_time_and_has_no_date(void **state)
{
    static renderer *const FORMS[] = {render_svg, render_png, render_pdf};

    add_sweep(*state);
    for (size_t i = 0; i < COUNT(FORMS); i++) {
        size_t size = 0, again_size = 0;
        char *bytes = rendered(FORMS[i], *state, &size);
        char *again = rendered(FORMS[i], *state, &again_size);

        assert_int_equal(size, again_size);
        assert_memory_equal(bytes, again, size);
        for (size_t at = 0; at + 4 < size; at++)
            assert_true(memcmp(bytes + at, "Date", 4) != 0 && memcmp(bytes + at, "tIME", 4) != 0);
        free(bytes);
        free(again);
    }
}

static void the_png_is_twice_800_pixels_wide_and_the_file_is_whole(void **state)
{
    static const unsigned char HEAD[] = "\x89PNG\r\n\x1A\n\0\0\0\rIHDR\0\0\x06\x40";
    unsigned char head[sizeof HEAD - 1] = "";
    bc_error err = {0};

    add_sweep(*state);
    assert_ok(render_to(*state, RENDER_PNG, &STYLE, scratch_path(), &err), &err);
    FILE *file = fopen(scratch_path(), "rb");
    assert_non_null(file);
    assert_int_equal(fread(head, 1, sizeof head, file), sizeof head);
    fclose(file);
    assert_memory_equal(head, HEAD, sizeof head);
}

static void charts_that_fill_more_than_a_page_go_on_another(void **state)
{
    size_t size = 0;

    for (int i = 0; i < 9; i++)
        add_sweep(*state);
    char *pdf = rendered(render_pdf, *state, &size);
    assert_memory_equal(pdf, "%PDF-", 5);
    bool found = false;
    for (size_t at = 0; at + 8 < size; at++)
        found = found || memcmp(pdf + at, "/Count 3", 8) == 0;
    assert_true(found);
    free(pdf);
    assert_draws(*state);
}

static void hostile_labels_are_shown_harmless(void **state)
{
    static const char *const HOSTILE[] = {
        "\x1b[31m",
        "]]><!--",
        "</desc><script>alert(1)</script>",
        "\xff\xfe\xc3",
        "&amp;&#0;",
        "\xE2\x80\xAE",
        "%s%n%1000000d",
        "\xEF\xBF\xBE\xEF\xBF\xBF\xEF\xB7\x90\xF0\x9F\xBF\xBE\xF4\x8F\xBF\xBF",
        "\n\t\r\v",
        "  "};
    report *r = *state;
    size_t size = 0;

    for (size_t i = 0; i < COUNT(HOSTILE); i++) {
        const size_t chart = report_add_chart(r, HOSTILE[i], HOSTILE[i]);

        report_set_axis(r, chart, REPORT_X, HOSTILE[i], HOSTILE[i]);
        report_set_axis(r, chart, REPORT_Y, HOSTILE[i], HOSTILE[i]);
        for (int kind = REPORT_LINE; kind <= REPORT_SPANS; kind++)
            report_add_point(r, chart, report_add_series(r, chart, (report_series_kind)kind, HOSTILE[i]), 1.5,
                             2.5);
        for (int kind = REPORT_MARK_X; kind <= REPORT_MARK_POINT; kind++)
            report_add_mark(r, chart, (report_mark_kind)kind, 1.5, 2.5, HOSTILE[i]);
    }
    report_set_caution(r, HOSTILE[2]);
    char *svg = rendered(render_svg, r, &size);
    assert_null(strstr(svg, "<script"));
    assert_null(strchr(svg, '\x1b'));
    assert_sound(svg);
    free(svg);
    assert_draws(r);
}

static void labels_of_any_length_are_cut_to_their_place(void **state)
{
    report *r = *state;
    char label[5001];

    memset(label, 'W', sizeof label - 1);
    label[sizeof label - 1] = '\0';
    const size_t chart = report_add_chart(r, "long", label);
    report_set_axis(r, chart, REPORT_X, label, label);
    report_set_axis(r, chart, REPORT_Y, label, label);
    for (int i = 0; i < 5; i++) {
        report_add_name(r, chart, REPORT_Y, label);
        report_add_point(r, chart, report_add_series(r, chart, REPORT_BARS, label), 2.5, i);
        report_add_mark(r, chart, REPORT_MARK_X, 0.3 * i, 0.0, label);
        report_add_mark(r, chart, REPORT_MARK_POINT, 0.3 * i, 1.0, label);
    }
    report_set_caution(r, label);
    assert_draws(r);
}

static void charts_without_points_with_one_and_with_constants_are_drawn(void **state)
{
    report *r = *state;

    report_add_chart(r, "nothing", "");
    for (int kind = REPORT_LINE; kind <= REPORT_SPANS; kind++) {
        const size_t chart = report_add_chart(r, "few", "Few points");

        report_add_series(r, chart, (report_series_kind)kind, "empty");
        report_add_point(r, chart, report_add_series(r, chart, (report_series_kind)kind, "one"), 3.1, 50.7);
        const size_t constant = report_add_series(r, chart, (report_series_kind)kind, "constant");
        for (int i = 0; i < 7; i++)
            report_add_point(r, chart, constant, 0.0, 0.0);
    }
    assert_draws(r);
}

/* The builders refuse such numbers; if one comes by another way, nothing of it is drawn. */
static void what_is_no_number_is_not_drawn(void **state)
{
    static const double BAD[] = {(double)NAN, HUGE_VAL, -HUGE_VAL, 1e308, -1e308};
    report *r = *state;

    for (int kind = REPORT_LINE; kind <= REPORT_SPANS; kind++) {
        const size_t chart = add_sweep(r);
        report_series *s = &r->charts[chart].series[0];

        s->kind = (report_series_kind)kind;
        for (size_t i = 0; i < COUNT(BAD); i++) {
            s->points[3 + 5 * i].y = BAD[i];
            s->points[4 + 6 * i].x = BAD[i];
        }
        r->charts[chart].marks[0].y = BAD[kind % 3];
        r->charts[chart].marks[1].x = BAD[kind % 3];
    }
    assert_draws(r);
}

static void extremes_of_size_are_drawn(void **state)
{
    static const double SIZES[] = {1e-99, 1e-12, 3e15, 9e99};
    report *r = *state;

    for (size_t i = 0; i < COUNT(SIZES); i++) {
        const size_t chart = report_add_chart(r, "size", "Size");
        const size_t s = report_add_series(r, chart, REPORT_LINE, "size");

        for (int p = -3; p <= 3; p++)
            report_add_point(r, chart, s, p * SIZES[i], p * p * SIZES[i]);
    }
    const size_t chart = add_sweep(r);
    report_set_range(r, chart, REPORT_X, 7.0, 7.0 + 1e-12);
    report_set_range(r, chart, REPORT_Y, 48.0, 48.1);
    assert_draws(r);
}

static void a_year_of_analyses_stays_a_small_picture(void **state)
{
    report *r = *state;
    const size_t chart = report_add_chart(r, "log", "Year");
    const size_t s = report_add_series(r, chart, REPORT_LINE, "");
    chance c = {99};
    size_t size = 0;

    report_set_time(r, chart);
    for (int i = 0; i < 105120; i++)
        report_add_point(r, chart, s, 1735689600.0 + 300.0 * i, 50.0 + chance_normal(&c));
    char *svg = rendered(render_svg, r, &size);
    assert_true(size < 500000);
    assert_sound(svg);
    free(svg);
}

static void a_decimal_comma_changes_no_tick(void **state)
{
    size_t size = 0;

    add_sweep(*state);
    char *before = rendered(render_svg, *state, &size);
    use_german_numbers();
    char *after = rendered(render_svg, *state, &size);
    assert_string_equal(before, after);
    free(before);
    free(after);
}

/* ---- JSON ---- */

static void json_has_charts_only_where_there_are_some(void **state)
{
    report *r = *state;
    size_t size = 0;

    char *without = rendered(render_json, r, &size);
    assert_null(strstr(without, "charts"));
    free(without);

    add_sweep(r);
    report_set_time(r, 0);
    report_add_name(r, 0, REPORT_Y, "low");
    static const char *const WORDS[] = {"\"charts\"",
                                        "\"id\": \"sweep\"",
                                        "\"unit\": \"mol %\"",
                                        "\"time\": true",
                                        "\"names\"",
                                        "\"kind\": \"line\"",
                                        "\"kind\": \"y\",\n          \"x\": null,\n          \"y\": 47.2",
                                        "\"label\": \"29.4 %\""};
    char *with = rendered(render_json, r, &size);
    for (size_t i = 0; i < COUNT(WORDS); i++)
        assert_non_null(strstr(with, WORDS[i]));
    free(with);
}

static void text_and_csv_are_the_same_with_charts(void **state)
{
    static renderer *const FORMS[] = {render_text, render_csv};
    report *r = *state;
    size_t size = 0;
    char *before[2];

    for (size_t i = 0; i < 2; i++)
        before[i] = rendered(FORMS[i], r, &size);
    add_sweep(r);
    for (size_t i = 0; i < 2; i++) {
        char *after = rendered(FORMS[i], r, &size);

        assert_string_equal(before[i], after);
        free(before[i]);
        free(after);
    }
}

#define REPORT_TEST(name) cmocka_unit_test_setup_teardown(name, set_up, tear_down)

int main(void)
{
    const struct CMUnitTest tests[] = {
        REPORT_TEST(what_is_added_is_copied_and_comes_back_in_order),
        REPORT_TEST(an_axis_named_again_has_the_later_name),
        REPORT_TEST(a_failed_report_takes_more_and_is_not_drawn),
        cmocka_unit_test(steps_are_one_two_or_five_times_a_power_of_ten),
        cmocka_unit_test(ticks_have_the_digits_that_tell_them_apart),
        cmocka_unit_test(ticks_of_any_range_rise_within_it_and_differ),
        cmocka_unit_test(times_stand_at_full_hours_days_months_and_years),
        cmocka_unit_test(calendar_days_are_those_of_the_c_library),
        REPORT_TEST(a_range_holds_data_and_marks_with_air_where_lines_do_not_end),
        REPORT_TEST(a_range_that_would_be_empty_is_widened),
        REPORT_TEST(bars_start_at_zero_and_names_have_a_place_each),
        REPORT_TEST(a_report_without_charts_is_refused_and_no_file_appears),
        cmocka_unit_test(endings_of_charts_are_known),
        cmocka_unit_test(a_module_that_is_missing_is_named_with_its_folder),
        cmocka_unit_test(a_file_that_is_no_module_is_refused_with_the_reason),
        cmocka_unit_test(a_module_of_another_version_touches_nothing),
        REPORT_TEST(the_svg_is_xml_and_tells_every_label),
        REPORT_TEST(a_form_is_the_same_bytes_each_time_and_has_no_date),
        REPORT_TEST(the_png_is_twice_800_pixels_wide_and_the_file_is_whole),
        REPORT_TEST(charts_that_fill_more_than_a_page_go_on_another),
        REPORT_TEST(hostile_labels_are_shown_harmless),
        REPORT_TEST(labels_of_any_length_are_cut_to_their_place),
        REPORT_TEST(charts_without_points_with_one_and_with_constants_are_drawn),
        REPORT_TEST(what_is_no_number_is_not_drawn),
        REPORT_TEST(extremes_of_size_are_drawn),
        REPORT_TEST(a_year_of_analyses_stays_a_small_picture),
        REPORT_TEST(json_has_charts_only_where_there_are_some),
        REPORT_TEST(text_and_csv_are_the_same_with_charts),
        cmocka_unit_test_setup_teardown(a_decimal_comma_changes_no_tick, set_up, tear_down),
    };
    const int failed = cmocka_run_group_tests(tests, NULL, remove_scratch);

    return failed;
}
