/* SPDX-License-Identifier: MIT */
/* test_csv.c - CSV and bare lines: quoting, formulas, hostile names. */
#include <stdarg.h>
#include <stddef.h>
#include <setjmp.h>
#include <stdint.h>

#include <cmocka.h>

#include "output/render.h"

#include "support.h"

#include <locale.h>
#include <math.h>
#include <stdio.h>
#include <stdlib.h>

typedef bc_status renderer(const report *r, const render_style *style, FILE *out, bc_error *err);

static void assert_renders(renderer *render, const report *r, render_style style, const char *wanted)
{
    char *text = NULL;
    size_t size = 0;
    FILE *out = open_memstream(&text, &size);

    assert_non_null(out);
    assert_int_equal(render(r, &style, out, NULL), BC_OK);
    assert_int_equal(fclose(out), 0);
    assert_string_equal(text, wanted);
    free(text);
}

static void add_result(report *r, size_t gas, double value, double u)
{
    char id[] = "hhv", label[] = "Superior heating value", unit[] = "MJ/m3", method[] = "ISO 6976:2016";
    const report_result result = {.id = id,
                                  .label = label,
                                  .unit = unit,
                                  .method = method,
                                  .gas = gas,
                                  .value = value,
                                  .has_uncertainty = u > 0.0,
                                  .uncertainty = u,
                                  .digits = 6};

    if (r->section_count == 0)
        report_add_section(r, "heat", "Heating values");
    report_add_result(r, &result);
}

static int set_up(void **state)
{
    report *r = calloc(1, sizeof *r);

    if (r == NULL)
        return 1;
    report_open(r, "0.1.0", "sheet", "Sheet");
    *state = r;
    return 0;
}

static int tear_down(void **state)
{
    report *r = *state;

    setlocale(LC_ALL, "C");
    report_close(r);
    free(r);
    return 0;
}

#define HEAD "id,gas,value,unit,uncertainty,method,state\n"

static void results_are_rows_with_twelve_digits(void **state)
{
    report *r = *state;
    const size_t gas = report_add_gas(r, "G20", "g20.ini", 1.0);

    add_result(r, gas, 37.7061234567891, 0.0131);
    add_result(r, REPORT_NO_GAS, -0.25, 0.0);
    assert_renders(render_csv, r, (render_style){0},
                   HEAD "hhv,G20,37.7061234568,MJ/m3,0.0131,ISO 6976:2016,\n"
                        "hhv,,-0.25,MJ/m3,,ISO 6976:2016,\n");
    assert_renders(render_csv, r, (render_style){.digits = 3},
                   HEAD "hhv,G20,37.7,MJ/m3,0.0131,ISO 6976:2016,\n"
                        "hhv,,-0.25,MJ/m3,,ISO 6976:2016,\n");
}

static void names_with_commas_quotes_and_line_feeds_are_quoted(void **state)
{
    report *r = *state;

    add_result(r, report_add_gas(r, "Works, \"June\"", "", 1.0), 37.7, 0.0);
    add_result(r, report_add_gas(r, "2\" line", "", 1.0), 37.7, 0.0);
    add_result(r, report_add_gas(r, "two\nlines", "", 1.0), 37.7, 0.0);
    assert_renders(render_csv, r, (render_style){0},
                   HEAD "hhv,\"Works, \"\"June\"\"\",37.7,MJ/m3,,ISO 6976:2016,\n"
                        "hhv,\"2\"\" line\",37.7,MJ/m3,,ISO 6976:2016,\n"
                        "hhv,\"two\nlines\",37.7,MJ/m3,,ISO 6976:2016,\n");
}

static void names_that_a_spreadsheet_would_compute_are_not_computed(void **state)
{
    static const char *const NAMES[] = {"=1+1", "+cmd|'/c calc'!A0", "-1+1", "@SUM(A1)", "\t=1"};
    report *r = *state;

    for (size_t i = 0; i < sizeof NAMES / sizeof *NAMES; i++)
        add_result(r, report_add_gas(r, NAMES[i], "", 1.0), -37.7, 0.0);
    assert_renders(render_csv, r, (render_style){0},
                   HEAD "hhv,'=1+1,-37.7,MJ/m3,,ISO 6976:2016,\n"
                        "hhv,'+cmd|'/c calc'!A0,-37.7,MJ/m3,,ISO 6976:2016,\n"
                        "hhv,'-1+1,-37.7,MJ/m3,,ISO 6976:2016,\n"
                        "hhv,'@SUM(A1),-37.7,MJ/m3,,ISO 6976:2016,\n"
                        "hhv,'\t=1,-37.7,MJ/m3,,ISO 6976:2016,\n");
}

static void control_characters_and_broken_utf8_become_question_marks(void **state)
{
    report *r = *state;

    add_result(r,
               report_add_gas(r,
                              "a\033[2Jb\rc\xC2\x9B"
                              "d\xFF"
                              "e\xC3\xBC",
                              "", 1.0),
               37.7, 0.0);
    assert_renders(render_csv, r, (render_style){0},
                   HEAD "hhv,a?[2Jb?c?d?e\xC3\xBC,37.7,MJ/m3,,ISO 6976:2016,\n");
}

static void a_value_that_is_not_finite_is_an_empty_cell(void **state)
{
    report *r = *state;

    add_result(r, REPORT_NO_GAS, 37.7, 0.1);
    r->results[0].value = nan("");
    r->results[0].uncertainty = HUGE_VAL;
    assert_renders(render_csv, r, (render_style){0}, HEAD "hhv,,,MJ/m3,,ISO 6976:2016,\n");
}

static void add_table(report *r, const char *id)
{
    const size_t table = report_add_table(r, id, "Log");

    report_add_column(r, table, "time", "Time", NULL);
    report_add_column(r, table, "hhv", "Heating value", "MJ/m3");
    report_add_text(r, table, "08:00");
    report_add_number(r, table, 37.7061, 2);
    report_add_text(r, table, "-5.2e3");
    report_add_text(r, table, NULL);
    report_add_text(r, table, "-5.2.1");
    report_add_text(r, table, "-"); /* a figure that is not there */
}

static void tables_alone_have_their_own_headings_and_an_empty_line_between(void **state)
{
    report *r = *state;

    add_table(r, "log");
    add_table(r, "log-2");
    assert_renders(render_csv, r, (render_style){0},
                   "time,hhv [MJ/m3]\n08:00,37.7061\n-5.2e3,\n'-5.2.1,\n"
                   "\n"
                   "time,hhv [MJ/m3]\n08:00,37.7061\n-5.2e3,\n'-5.2.1,\n");
}

static void tables_behind_figures_have_a_row_that_names_them(void **state)
{
    report *r = *state;

    add_result(r, REPORT_NO_GAS, 37.7, 0.0);
    add_table(r, "log");
    add_table(r, "log-2");
    assert_renders(render_csv, r, (render_style){0},
                   HEAD "hhv,,37.7,MJ/m3,,ISO 6976:2016,\n"
                        "\ntable,log,Log\ntime,hhv [MJ/m3]\n08:00,37.7061\n-5.2e3,\n'-5.2.1,\n"
                        "\ntable,log-2,Log\ntime,hhv [MJ/m3]\n08:00,37.7061\n-5.2e3,\n'-5.2.1,\n");
}

static void every_figure_has_the_state_beside_it(void **state)
{
    report *r = *state;
    char line[] = "combustion 25 C, metering 0 C";

    report_set_state(r, &(report_state){.present = true, .text = line, .brief = "25/0 saturated 1995"});
    add_result(r, REPORT_NO_GAS, 37.7, 0.0);
    assert_renders(render_csv, r, (render_style){0}, HEAD "hhv,,37.7,MJ/m3,,ISO 6976:2016,25/0 saturated 1995\n");
}

static void an_empty_report_is_the_heading_alone(void **state)
{
    assert_renders(render_csv, *state, (render_style){0}, HEAD);
}

static void a_locale_with_a_decimal_comma_changes_no_cell(void **state)
{
    report *r = *state;

    add_result(r, REPORT_NO_GAS, 37.7, 0.0131);
    use_german_numbers();
    assert_renders(render_csv, r, (render_style){0}, HEAD "hhv,,37.7,MJ/m3,0.0131,ISO 6976:2016,\n");
    assert_renders(render_brief, r, (render_style){0}, "37.700 MJ/m3\n");
}

static void bare_lines_have_value_and_unit_and_with_several_gases_the_name(void **state)
{
    report *r = *state;

    add_result(r, report_add_gas(r, "G20", "", 1.0), 37.7061, 0.0);
    assert_renders(render_brief, r, (render_style){0}, "37.7061 MJ/m3\n");
    add_result(r, report_add_gas(r, "G\03325\t", "", 1.0), 32.4912, 0.0131);
    assert_renders(render_brief, r, (render_style){0}, "37.7061 MJ/m3\tG20\n32.491 MJ/m3\tG?25?\n");
    assert_renders(render_brief, r, (render_style){.bare = true}, "37.7061\n32.491\n");
    assert_renders(render_brief, r, (render_style){.bare = true, .digits = 3}, "37.7\n32.5\n");
}

static void a_pure_number_has_no_unit_behind_it(void **state)
{
    report *r = *state;

    add_result(r, REPORT_NO_GAS, 0.6123, 0.0);
    r->results[0].unit[0] = '1';
    r->results[0].unit[1] = '\0';
    assert_renders(render_brief, r, (render_style){0}, "0.612300\n");
    assert_renders(render_csv, r, (render_style){0}, HEAD "hhv,,0.6123,1,,ISO 6976:2016,\n");
}

static void a_stream_that_cannot_be_written_is_an_error(void **state)
{
    FILE *full = fopen("/dev/full", "w");

    assert_non_null(full);
    setvbuf(full, NULL, _IONBF, 0);
    assert_int_equal(render_csv(*state, &(render_style){0}, full, NULL), BC_ERR_FILE);
    fclose(full);
}

#define CSV_TEST(name) cmocka_unit_test_setup_teardown(name, set_up, tear_down)

int main(void)
{
    const struct CMUnitTest tests[] = {
        CSV_TEST(results_are_rows_with_twelve_digits),
        CSV_TEST(names_with_commas_quotes_and_line_feeds_are_quoted),
        CSV_TEST(names_that_a_spreadsheet_would_compute_are_not_computed),
        CSV_TEST(control_characters_and_broken_utf8_become_question_marks),
        CSV_TEST(a_value_that_is_not_finite_is_an_empty_cell),
        CSV_TEST(tables_alone_have_their_own_headings_and_an_empty_line_between),
        CSV_TEST(tables_behind_figures_have_a_row_that_names_them),
        CSV_TEST(every_figure_has_the_state_beside_it),
        CSV_TEST(an_empty_report_is_the_heading_alone),
        CSV_TEST(a_locale_with_a_decimal_comma_changes_no_cell),
        CSV_TEST(bare_lines_have_value_and_unit_and_with_several_gases_the_name),
        CSV_TEST(a_pure_number_has_no_unit_behind_it),
        CSV_TEST(a_stream_that_cannot_be_written_is_an_error),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
