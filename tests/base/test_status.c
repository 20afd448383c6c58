/* SPDX-License-Identifier: MIT */
/* test_status.c - statuses and their exit codes, and the error a caller gets to see. */
#include "support.h"

#include "base/error_internal.h"

static void every_status_has_the_exit_code_of_the_manual(void **state)
{
    /* bluecone(1), EXIT STATUS: 2 usage, 3 bad input data, 4 a file or device failed */
    static const struct {
        bc_status status;
        int exit_code;
    } ROWS[] = {{BC_OK, 0},       {BC_ERR_USAGE, 2},  {BC_ERR_RANGE, 2}, {BC_ERR_INPUT, 3},
                {BC_ERR_FILE, 4}, {BC_ERR_MEMORY, 4}, {BC_ERR_SOLVER, 3}};

    (void)state;
    for (size_t i = 0; i < COUNT(ROWS); i++)
        assert_int_equal(bc_exit_code(ROWS[i].status), ROWS[i].exit_code);
    assert_int_equal(COUNT(ROWS), (size_t)BC_ERR_SOLVER + 1);
}

static void every_status_has_words_of_its_own(void **state)
{
    (void)state;
    for (int a = BC_OK; a <= BC_ERR_SOLVER; a++) {
        assert_true(strlen(bc_status_text((bc_status)a)) > 5);
        for (int b = BC_OK; b < a; b++)
            assert_string_not_equal(bc_status_text((bc_status)a), bc_status_text((bc_status)b));
    }
}

static void a_status_that_does_not_exist_is_no_success(void **state)
{
    (void)state;
    assert_int_equal(bc_exit_code((bc_status)(BC_ERR_SOLVER + 1)), 3);
    assert_non_null(bc_status_text((bc_status)77));
}

static void the_version_is_the_headers(void **state)
{
    (void)state;
    assert_string_equal(bc_version(), BC_VERSION);
}

static void an_error_keeps_file_line_and_sentence(void **state)
{
    bc_error err;

    (void)state;
    assert_int_equal(bc_fail_at(&err, BC_ERR_INPUT, "june.ini", 17, "%s = %d", "methane", 93), BC_ERR_INPUT);
    assert_int_equal(err.status, BC_ERR_INPUT);
    assert_string_equal(err.file, "june.ini");
    assert_int_equal(err.line, 17);
    assert_string_equal(err.message, "methane = 93");
    assert_int_equal(bc_fail(&err, BC_ERR_RANGE, "too hot"), BC_ERR_RANGE);
    assert_string_equal(err.file, "");
    assert_int_equal(err.line, 0);
}

static void long_texts_are_cut_and_terminated(void **state)
{
    char longer[2 * BC_MESSAGE_MAX];
    bc_error err;

    (void)state;
    memset(longer, 'y', sizeof longer);
    longer[sizeof longer - 1] = '\0';
    (void)bc_fail_at(&err, BC_ERR_FILE, longer, 3, "%s", longer);
    assert_int_equal(strlen(err.file), BC_FILE_MAX - 1);
    assert_int_equal(strlen(err.message), BC_MESSAGE_MAX - 1);
}

static void a_caller_without_an_error_gets_the_status_alone(void **state)
{
    (void)state;
    assert_int_equal(bc_fail(NULL, BC_ERR_SOLVER, "%s", "no root"), BC_ERR_SOLVER);
    assert_int_equal(bc_fail_at(NULL, BC_ERR_MEMORY, "a", 1, "%s", "full"), BC_ERR_MEMORY);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(every_status_has_the_exit_code_of_the_manual),
        cmocka_unit_test(every_status_has_words_of_its_own),
        cmocka_unit_test(a_status_that_does_not_exist_is_no_success),
        cmocka_unit_test(the_version_is_the_headers),
        cmocka_unit_test(an_error_keeps_file_line_and_sentence),
        cmocka_unit_test(long_texts_are_cut_and_terminated),
        cmocka_unit_test(a_caller_without_an_error_gets_the_status_alone),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
