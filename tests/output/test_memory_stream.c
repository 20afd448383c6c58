/* SPDX-License-Identifier: MIT */
/* test_memory_stream.c - what is written into memory stands there; that nothing is lost without memory is tried by
 * tests/faults. */
#include "output/memory_stream_internal.h"
#include "support.h"

#include <stdlib.h>
#include <string.h>

static void nothing_written_is_an_empty_text(void **state)
{
    char *text = NULL;
    size_t count = 7;
    FILE *out = bc_memory_stream_open(&text, &count);

    (void)state;
    assert_non_null(out);
    assert_true(bc_memory_stream_close(out));
    assert_string_equal(text, "");
    assert_int_equal(count, 0);
    free(text);
}

static void bytes_of_any_kind_and_number_are_kept_with_a_nul_behind(void **state)
{
    char *text = NULL;
    size_t count = 0;
    FILE *out = bc_memory_stream_open(&text, &count);

    (void)state;
    assert_non_null(out);
    for (int i = 0; i < 100000; i++)
        assert_int_equal(fputc(i % 251, out), i % 251);
    assert_int_equal(fprintf(out, "%*s", 5000, "end"), 5000);
    assert_true(bc_memory_stream_close(out));
    assert_int_equal(count, 105000);
    for (int i = 0; i < 100000; i++)
        assert_int_equal((unsigned char)text[i], i % 251);
    assert_string_equal(text + 100000 + 4997, "end");
    free(text);
}

/* What cannot be kept, here since the count would overflow, fails the stream for good. */
static void a_loss_is_told_at_the_end_though_later_bytes_would_fit(void **state)
{
    char *text = NULL;
    size_t count = 0;
    FILE *out = bc_memory_stream_open(&text, &count);

    (void)state;
    assert_non_null(out);
    count = SIZE_MAX - 1;
    assert_true(fputs("lost", out) >= 0);
    assert_int_not_equal(fflush(out), 0);
    count = 0;
    clearerr(out);
    (void)fputs("kept", out);
    assert_false(bc_memory_stream_close(out));
    free(text);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(nothing_written_is_an_empty_text),
        cmocka_unit_test(bytes_of_any_kind_and_number_are_kept_with_a_nul_behind),
        cmocka_unit_test(a_loss_is_told_at_the_end_though_later_bytes_would_fit),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
