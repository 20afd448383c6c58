/* SPDX-License-Identifier: MIT */
/* test_apart.c - work in a process of its own: all bytes or one error, whatever becomes of it. */
#include "support.h"

#include "base/error_internal.h"
#include "output/apart_internal.h"

#include <signal.h>

/* What the work is to do: a letter for each deed. */
static bc_status act(void *data, FILE *out, bc_error *err)
{
    const char *deed = data;

    if (*deed == 'k')
        (void)raise(SIGKILL);
    if (*deed == 'x')
        _exit(3);
    if (*deed == 'm')
        (void)fputs("[ERROR][workbook.c:1842]: Memory allocation failed.\n", stderr);
    if (*deed == 'w')
        (void)fputs("Fontconfig warning: no default file\n", stderr);
    if (*deed == 'e')
        return bc_fail(err, BC_ERR_USAGE, "there is no chart in this answer");
    for (int i = 0; i < 50000; i++) /* more than a pipe holds */
        (void)fprintf(out, "%d\n", i * 7919);
    return ferror(out) ? BC_ERR_FILE : BC_OK;
}

static bc_status run(const char *deed, char **bytes, size_t *count, bc_error *err)
{
    char word[2] = {*deed, '\0'};
    FILE *out = open_memstream(bytes, count);

    assert_non_null(out);
    const int kept = hold_stderr();
    const bc_status status = apart(act, word, out, err);

    assert_stderr_silent(kept, deed);
    assert_int_equal(fclose(out), 0);
    return status;
}

static void all_bytes_of_the_work_arrive(void **state)
{
    char *bytes = NULL;
    char *same = NULL;
    size_t count = 0;
    size_t same_count = 0;
    bc_error err;
    FILE *out = open_memstream(&same, &same_count);
    char word[] = "b";

    (void)state;
    assert_ok(act(word, out, &err), &err);
    assert_int_equal(fclose(out), 0);
    assert_ok(run("b", &bytes, &count, &err), &err);
    assert_int_equal(count, same_count);
    assert_memory_equal(bytes, same, count);
    free(bytes);
    free(same);
}

static void a_warning_of_a_library_is_kept_from_standard_error(void **state)
{
    char *bytes = NULL;
    size_t count = 0;
    bc_error err;

    (void)state;
    assert_ok(run("w", &bytes, &count, &err), &err);
    assert_true(count > 65536);
    free(bytes);
}

static void an_error_of_the_work_comes_back_as_it_was(void **state)
{
    char *bytes = NULL;
    size_t count = 0;
    bc_error err;

    (void)state;
    assert_refused(run("e", &bytes, &count, &err), &err, BC_ERR_USAGE, "there is no chart");
    assert_int_equal(count, 0);
    free(bytes);
}

static void work_that_is_killed_ends_or_lacks_memory_is_one_error(void **state)
{
    static const char *const DEEDS[] = {"k", "x", "m"};

    (void)state;
    for (size_t i = 0; i < COUNT(DEEDS); i++) {
        char *bytes = NULL;
        size_t count = 0;
        bc_error err;

        assert_refused_at(DEEDS[i], run(DEEDS[i], &bytes, &count, &err), &err, BC_ERR_FILE, "cannot be drawn|memory");
        free(bytes);
    }
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(all_bytes_of_the_work_arrive),
        cmocka_unit_test(a_warning_of_a_library_is_kept_from_standard_error),
        cmocka_unit_test(an_error_of_the_work_comes_back_as_it_was),
        cmocka_unit_test(work_that_is_killed_ends_or_lacks_memory_is_one_error),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
