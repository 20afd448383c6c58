/* SPDX-License-Identifier: MIT */
/* test_json.c - the JSON object: its keys, their order, and what users' text cannot do to it. */
#include <stdarg.h>
#include <stddef.h>
#include <setjmp.h>
#include <stdint.h>

#include <cmocka.h>

#include "output/render.h"

#include <jansson.h>

#include <locale.h>
#include <math.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>

static char *rendered(const report *r)
{
    char *text = NULL;
    size_t size = 0;
    FILE *out = open_memstream(&text, &size);

    assert_non_null(out);
    assert_int_equal(render_json(r, &(render_style){0}, out, NULL), BC_OK);
    assert_int_equal(fclose(out), 0);
    return text;
}

/* The report as a program reads it. */
static json_t *parsed(const report *r)
{
    char *text = rendered(r);
    json_t *object = json_loads(text, JSON_REJECT_DUPLICATES, NULL);

    free(text);
    assert_non_null(object);
    return object;
}

static void assert_keys(json_t *object, const char *wanted)
{
    char keys[256] = "";
    const char *key = NULL;
    json_t *value = NULL;

    json_object_foreach(object, key, value)
    {
        const size_t end = strlen(keys);
        snprintf(keys + end, sizeof keys - end, "%s%s", end > 0 ? " " : "", key);
    }
    assert_string_equal(keys, wanted);
}

static void add_result(report *r, size_t gas, double value, char *note)
{
    char id[] = "hhv", label[] = "Superior heating value", unit[] = "MJ/m3", method[] = "ISO 6976:2016";
    const report_result result = {.id = id,
                                  .label = label,
                                  .unit = unit,
                                  .method = method,
                                  .note = note,
                                  .gas = gas,
                                  .value = value,
                                  .has_uncertainty = note != NULL,
                                  .uncertainty = 0.0131};

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

static void an_empty_report_has_every_key(void **state)
{
    char *text = rendered(*state);

    assert_string_equal(text, "{\n"
                              "  \"tool\": \"bluecone\",\n"
                              "  \"version\": \"0.1.0\",\n"
                              "  \"command\": \"sheet\",\n"
                              "  \"state\": null,\n"
                              "  \"gases\": [],\n"
                              "  \"results\": [],\n"
                              "  \"tables\": [],\n"
                              "  \"checks\": [],\n"
                              "  \"warnings\": [],\n"
                              "  \"verdict\": null\n"
                              "}\n");
    free(text);
}

static void state_checks_warnings_verdict_and_caution_are_told(void **state)
{
    report *r = *state;
    char line[] = "15/15";
    const report_state at = {.present = true,
                             .combustion_c = 15.0,
                             .metering_c = 25.5,
                             .metering_kpa = 101.325,
                             .saturated = true,
                             .edition = 1995,
                             .text = line};

    report_set_state(r, &at);
    report_add_check(r, "routes", false, "they differ by 0.3 %");
    report_add_warning(r, "normalised");
    report_set_verdict(r, "no");
    report_set_caution(r, "licensed people only");

    json_t *object = parsed(r);
    json_t *told = json_object_get(object, "state");
    json_t *check = json_array_get(json_object_get(object, "checks"), 0);
    assert_keys(object, "tool version command state gases results tables checks warnings verdict caution");
    assert_keys(told, "combustion_c metering_c metering_kpa saturated edition");
    assert_true(fabs(json_real_value(json_object_get(told, "metering_kpa")) - 101.325) < 1e-12);
    assert_true(fabs(json_real_value(json_object_get(told, "metering_c")) - 25.5) < 1e-12);
    assert_true(json_is_true(json_object_get(told, "saturated")));
    assert_int_equal(json_integer_value(json_object_get(told, "edition")), 1995);
    assert_keys(check, "id ok detail");
    assert_true(json_is_false(json_object_get(check, "ok")));
    assert_string_equal(json_string_value(json_object_get(object, "verdict")), "no");
    json_decref(object);
}

static void inputs_are_told_when_they_are_identified(void **state)
{
    report *r = *state;

    report_add_input(r, "a.ini");
    report_add_input(r, "gone.ini");
    report_add_input(r, "a.ini");
    report_add_input(r, "");
    assert_int_equal(r->input_count, 2);
    report_identify_input(r, 0, "a.ini", "ba78");
    json_t *object = parsed(r);
    json_t *inputs = json_object_get(object, "inputs");

    assert_int_equal(json_array_size(inputs), 1);
    assert_keys(json_array_get(inputs, 0), "name sha256");
    assert_string_equal(json_string_value(json_object_get(json_array_get(inputs, 0), "sha256")), "ba78");
    json_decref(object);
}

static void a_composition_keeps_the_order_of_the_file(void **state)
{
    report *r = *state;
    const size_t gas = report_add_gas(r, "Works", "works.ini", 0.9987);

    report_add_fraction(r, gas, "nitrogen", 0.087);
    report_add_fraction(r, gas, "methane", 0.9);
    report_add_fraction(r, gas, "ethane", 0.013);

    json_t *object = parsed(r);
    json_t *told = json_array_get(json_object_get(object, "gases"), 0);
    assert_keys(told, "name source composition sum_before");
    assert_keys(json_object_get(told, "composition"), "nitrogen methane ethane");
    json_decref(object);
}

static void a_result_has_null_where_it_has_nothing(void **state)
{
    report *r = *state;
    char note[] = "see there";

    add_result(r, report_add_gas(r, "G20", "", 1.0), 37.7, note);
    add_result(r, REPORT_NO_GAS, 37.7, NULL);

    json_t *object = parsed(r);
    json_t *full = json_array_get(json_object_get(object, "results"), 0);
    json_t *bare = json_array_get(json_object_get(object, "results"), 1);
    assert_keys(full, "id gas value unit uncertainty method label note");
    assert_keys(bare, "id gas value unit uncertainty method label");
    assert_string_equal(json_string_value(json_object_get(full, "gas")), "G20");
    assert_true(fabs(json_real_value(json_object_get(full, "uncertainty")) - 0.0131) < 1e-15);
    assert_true(json_is_null(json_object_get(bare, "gas")));
    assert_true(json_is_null(json_object_get(bare, "uncertainty")));
    json_decref(object);
}

static void numbers_have_twelve_digits_in_every_locale(void **state)
{
    report *r = *state;

    add_result(r, REPORT_NO_GAS, 100.0 / 3.0, NULL);
    setlocale(LC_ALL, "de_DE.UTF-8"); /* where it is missing, "C" does */
    char *text = rendered(r);
    assert_non_null(strstr(text, "\"value\": 33.3333333333,\n"));
    free(text);
}

static void a_value_that_is_not_finite_is_null(void **state)
{
    report *r = *state;

    add_result(r, REPORT_NO_GAS, 37.7, NULL);
    r->results[0].value = HUGE_VAL;
    json_t *object = parsed(r);
    json_t *result = json_array_get(json_object_get(object, "results"), 0);
    assert_true(json_is_null(json_object_get(result, "value")));
    json_decref(object);
}

static void assert_name(json_t *object, size_t gas, const char *wanted)
{
    json_t *told = json_array_get(json_object_get(object, "gases"), gas);

    assert_string_equal(json_string_value(json_object_get(told, "name")), wanted);
}

static void hostile_names_are_escaped_and_broken_utf8_repaired(void **state)
{
    report *r = *state;

    report_add_gas(r, "\", \"value\": 1, \"x\": \"\\", "", 1.0);
    report_add_gas(r, "\033[2J\n", "", 1.0);
    report_add_gas(r,
                   "S\xC3\xBC"
                   "d \xC3(\xFF \xC0\xAF \xED\xA0\x80 \xF4\x90\x80\x80 \xC3",
                   "", 1.0);
    report_add_gas(r,
                   "C1 \xC2\x9B"
                   "31m",
                   "", 1.0);
    report_add_fraction(r, 0,
                        "meth\xFF"
                        "ane",
                        0.913);

    json_t *object = parsed(r);
    assert_name(object, 0, "\", \"value\": 1, \"x\": \"\\");
    assert_name(object, 1, "\033[2J\n");
    assert_name(object, 2,
                "S\xC3\xBC"
                "d ?(? ?? ??? ???? ?");
    assert_name(object, 3, "C1 ?31m");
    json_t *first = json_array_get(json_object_get(object, "gases"), 0);
    assert_keys(json_object_get(first, "composition"), "meth?ane");
    json_decref(object);
    char *text = rendered(r);
    assert_null(strchr(text, '\033'));
    free(text);
}

static void rows_of_a_table_are_all_of_one_length_and_null_where_no_figure_is(void **state)
{
    report *r = *state;
    const size_t table = report_add_table(r, "log", "Log");

    report_add_column(r, table, "time", "Time", NULL);
    report_add_column(r, table, "hhv", "Heating value", "MJ/m3");
    report_add_text(r, table, "08:00");
    report_add_number(r, table, 37.7061, 2);
    report_add_text(r, table, "09:00");
    report_add_text(r, table, "-");
    report_add_text(r, table, NULL);

    json_t *object = parsed(r);
    json_t *told = json_array_get(json_object_get(object, "tables"), 0);
    assert_keys(told, "id title columns rows");
    assert_keys(json_array_get(json_object_get(told, "columns"), 0), "id heading unit");
    char *rows = json_dumps(json_object_get(told, "rows"), JSON_COMPACT | JSON_REAL_PRECISION(6));
    assert_string_equal(rows, "[[\"08:00\",37.7061],[\"09:00\",null],[null,null]]");
    free(rows);
    json_decref(object);
}

static void a_stream_that_cannot_be_written_is_an_error(void **state)
{
    FILE *full = fopen("/dev/full", "w");

    assert_non_null(full);
    setvbuf(full, NULL, _IONBF, 0);
    assert_int_equal(render_json(*state, &(render_style){0}, full, NULL), BC_ERR_FILE);
    fclose(full);
}

#define JSON_TEST(name) cmocka_unit_test_setup_teardown(name, set_up, tear_down)

int main(void)
{
    const struct CMUnitTest tests[] = {
        JSON_TEST(an_empty_report_has_every_key),
        JSON_TEST(state_checks_warnings_verdict_and_caution_are_told),
        JSON_TEST(inputs_are_told_when_they_are_identified),
        JSON_TEST(a_composition_keeps_the_order_of_the_file),
        JSON_TEST(a_result_has_null_where_it_has_nothing),
        JSON_TEST(numbers_have_twelve_digits_in_every_locale),
        JSON_TEST(a_value_that_is_not_finite_is_null),
        JSON_TEST(hostile_names_are_escaped_and_broken_utf8_repaired),
        JSON_TEST(rows_of_a_table_are_all_of_one_length_and_null_where_no_figure_is),
        JSON_TEST(a_stream_that_cannot_be_written_is_an_error),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
