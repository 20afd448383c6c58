/* SPDX-License-Identifier: MIT */
/* test_report_limit.c - limits of a report as JSON: sides that are not there, margins, verdicts. */
#include "support.h"

#include "output/render.h"

#include <jansson.h>

static json_t *limits_of(const report_limit limits[], size_t count)
{
    const render_style style = {.width = 80};
    char *text = NULL;
    size_t size = 0;
    report r;
    bc_error err;
    FILE *out = open_memstream(&text, &size);

    assert_non_null(out);
    report_open(&r, "0", "test", "Test");
    (void)report_add_gas(&r, "Offer", "literal", 1.0);
    for (size_t i = 0; i < count; i++)
        report_add_limit(&r, &limits[i]);
    assert_ok(render_json(&r, &style, out, &err), &err);
    assert_int_equal(fclose(out), 0);
    report_close(&r);
    json_t *root = json_loads(text, 0, NULL);

    free(text);
    assert_non_null(root);
    json_t *list = json_incref(json_object_get(root, "limits"));

    json_decref(root);
    return list;
}

static double number(const json_t *list, size_t index, const char *key)
{
    return json_real_value(json_object_get(json_array_get(list, index), key));
}

static void the_margin_is_the_room_to_the_nearer_limit(void **state)
{
    char id[] = "heat-input";
    char unit[] = "%";
    char verdict[] = "ok";
    const report_limit limits[] = {
        {.id = id, .unit = unit, .verdict = verdict, .gas = 0, .has_value = true, .has_min = true, .has_max = true, .value = 101.3, .min = 95.0, .max = 105.0},
        {.id = id, .unit = unit, .verdict = verdict, .gas = 0, .has_value = true, .has_max = true, .value = 107.5, .max = 105.0},
        {.id = id, .unit = unit, .verdict = verdict, .gas = REPORT_NO_GAS, .has_value = true, .has_min = true, .value = 93.2, .min = 95.0},
    };
    json_t *list = limits_of(limits, COUNT(limits));

    (void)state;
    assert_int_equal(json_array_size(list), 3);
    assert_within(number(list, 0, "margin"), 3.7, 1e-9);
    assert_within(number(list, 1, "margin"), -2.5, 1e-9);
    assert_within(number(list, 2, "margin"), -1.8, 1e-9);
    assert_true(json_is_null(json_object_get(json_array_get(list, 1), "min")));
    assert_true(json_is_null(json_object_get(json_array_get(list, 2), "gas")));
    assert_string_equal(json_string_value(json_object_get(json_array_get(list, 0), "gas")), "Offer");
    json_decref(list);
}

static void a_limit_without_value_or_side_has_no_margin(void **state)
{
    char id[] = "knock";
    char unit[] = "1";
    char verdict[] = "cannot judge";
    const report_limit limits[] = {
        {.id = id, .unit = unit, .verdict = verdict, .gas = 0, .has_min = true, .min = 70.0},
        {.id = id, .unit = unit, .verdict = verdict, .gas = 0, .has_value = true, .value = 71.0},
    };
    json_t *list = limits_of(limits, COUNT(limits));

    (void)state;
    for (size_t i = 0; i < COUNT(limits); i++)
        assert_true(json_is_null(json_object_get(json_array_get(list, i), "margin")));
    assert_true(json_is_null(json_object_get(json_array_get(list, 0), "value")));
    json_decref(list);
}

static void a_report_without_limits_has_no_list_of_them(void **state)
{
    (void)state;
    assert_null(limits_of(NULL, 0));
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(the_margin_is_the_room_to_the_nearer_limit),
        cmocka_unit_test(a_limit_without_value_or_side_has_no_margin),
        cmocka_unit_test(a_report_without_limits_has_no_list_of_them),
    };

    return cmocka_run_group_tests_name("limits", tests, NULL, NULL);
}
