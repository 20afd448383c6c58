/* SPDX-License-Identifier: MIT */
/* test_stream_part.c - part files: what is written reads back as it was; what is damaged is refused. */
#include "supply/tally_cases.h"

#include "cli/stream_part.h"

#include <jansson.h>

/* The part file of some rows as text, to be freed. */
static char *text_of(const tally_case *k, size_t from, size_t to, size_t *length)
{
    tally *t = case_tally(k, from, to);
    bc_error err;
    FILE *f = NULL;
    char *text = calloc(1, 4 << 20);

    assert_non_null(text);
    assert_ok(stream_part_write(t, scratch_path(), &err), &err);
    tally_close(t);
    f = fopen(scratch_path(), "rb");
    assert_non_null(f);
    *length = fread(text, 1, (4 << 20) - 1, f);
    assert_int_equal(fclose(f), 0);
    return text;
}

static tally *read_text(const char *text, size_t length)
{
    tally *t = NULL;
    bc_error err;

    assert_ok(stream_part_read(write_scratch(text, length), &t, &err), &err);
    return t;
}

static void a_part_reads_back_as_it_was_written(void **state)
{
    static const struct {
        double step_s;
        tally_period by;
    } KINDS[] = {{60.0, TALLY_HOUR}, {900.0, TALLY_DAY}, {0.0, TALLY_WHOLE}, {0.1, TALLY_MONTH}};

    (void)state;
    for (size_t i = 0; i < COUNT(KINDS); i++) {
        tally_case *k = case_make(41 * (i + 1), 2000, KINDS[i].step_s, KINDS[i].by);
        tally *whole = case_tally(k, 0, k->count);
        size_t length = 0;
        size_t again_length = 0;
        char *text = text_of(k, 0, k->count, &length);
        tally *t = read_text(text, length);
        bc_error err;

        assert_ok(stream_part_write(t, scratch_path(), &err), &err);
        FILE *f = fopen(scratch_path(), "rb");
        char *again = calloc(1, length + 2);

        assert_true(f != NULL && again != NULL);
        again_length = fread(again, 1, length + 1, f);
        assert_int_equal(fclose(f), 0);
        assert_int_equal(again_length, length);
        case_settle(whole);
        case_settle(t);
        assert_same_tally(t, whole);
        tally_close(t);
        tally_close(whole);
        free(again);
        free(text);
        free(k);
    }
}

static void merge_files(uint64_t start)
{
    tally_case *k = case_make(start, 1200, 60.0, TALLY_HOUR);
    tally *whole = NULL;
    tally *t = NULL;
    bc_error err;

    for (size_t i = 1; i < k->count; i++) /* edges anywhere: no step back */
        if (k->rows[i].time_s < k->rows[i - 1].time_s)
            for (size_t j = i; j < k->count; j++)
                k->rows[j].time_s += 60.0;
    whole = case_tally(k, 0, k->count);
    t = case_open(k);
    for (size_t from = 0; from < k->count; from += 6) {
        size_t length = 0;
        char *text = text_of(k, from, from + 6, &length);
        tally *part = read_text(text, length);

        assert_ok(tally_merge(t, part, &err), &err);
        tally_close(part);
        free(text);
    }
    case_settle(whole);
    case_settle(t);
    assert_same_tally(t, whole);
    tally_close(t);
    tally_close(whole);
    free(k);
}

static void parts_merged_from_files_are_the_whole(void **state)
{
    (void)state;
    for (uint64_t start = 23; start < 29; start++)
        merge_files(start);
}

static void a_part_with_one_row_or_none_reads_back(void **state)
{
    tally_case *k = case_make(2, 3, 60.0, TALLY_DAY);

    (void)state;
    for (size_t rows = 0; rows < 2; rows++) {
        size_t length = 0;
        char *text = text_of(k, 0, rows, &length);
        tally *whole = case_tally(k, 0, rows);
        tally *t = read_text(text, length);

        case_settle(whole);
        case_settle(t);
        assert_same_tally(t, whole);
        tally_close(whole);
        tally_close(t);
        free(text);
    }
    free(k);
}

static void a_part_cut_off_anywhere_is_refused(void **state)
{
    tally_case *k = case_make(19, 12, 900.0, TALLY_DAY);
    size_t length = 0;
    char *text = text_of(k, 0, k->count, &length);
    tally *t = NULL;

    (void)state;
    for (size_t cut = 0; cut < length - 2; cut += 1 + cut / 300) { /* behind the last brace only a line end is left */
        bc_error err;

        assert_refused(stream_part_read(write_scratch(text, cut), &t, &err), &err, BC_ERR_INPUT, "");
        assert_string_equal(err.file, scratch_path());
        assert_null(t);
    }
    free(text);
    free(k);
}

/* Any number or word in another's place: refused, or a tally that can be merged, settled and asked. */
static void a_part_with_anything_changed_is_refused_or_can_be_asked(void **state)
{
    static const char *const OTHERS[] = {"-1", "0", "1", "1e308", "-1e139", "9223372036854775807", "null", "true", "[]", "{}", "\"x\"", "0.5"};
    tally_case *k = case_make(29, 25, 900.0, TALLY_DAY);
    size_t length = 0;
    char *text = text_of(k, 0, k->count, &length);
    char *changed = calloc(1, length + 40);
    size_t refused = 0;
    chance c = {33};

    (void)state;
    assert_non_null(changed);
    for (size_t n = 0; n < 20000; n++) {
        const size_t from = chance_below(&c, length);
        const size_t end = from + strcspn(text + from, ",]}");
        const size_t begin = from > 0 ? from - 1 : 0;
        const char *other = OTHERS[chance_below(&c, COUNT(OTHERS))];
        tally *t = NULL;
        bc_error err;

        if (strchr("[,:", text[begin]) == NULL)
            continue;
        (void)snprintf(changed, length + 40, "%.*s%s%s", (int)from, text, other, text + end);
        const bc_status status = stream_part_read(write_scratch(changed, strlen(changed)), &t, &err);

        if (status != BC_OK) {
            assert_int_equal(status, BC_ERR_INPUT);
            refused++;
            continue;
        }
        tally *into = case_open(k);

        if (tally_merge(into, t, &err) == BC_OK && tally_settle(into, &err) == BC_OK)
            for (size_t i = 0; i < CASE_FIGURES; i++)
                same_figure_of(into, into, i);
        tally_close(into);
        tally_close(t);
    }
    assert_true(refused > 500);
    free(changed);
    free(text);
    free(k);
}

static void what_is_wrong_is_told(void **state)
{
    static const struct {
        const char *from, *to, *words;
    } CASES[] = {
        {"\"tool\":\"bluecone\"", "\"tool\":\"other\"", "no summary of a part|--summary-part"},
        {"\"part\":1", "\"part\":2", "another version"},
        {"\"by\":\"day\"", "\"by\":\"week\"", "\"plan\" is damaged"},
        {"\"state\":[25.0,", "\"state\":[125.0,", "\"plan\" is damaged"},
        {"false,2016]", "false,2017]", "\"plan\" is damaged"},
        {"\"step_s\":900.0", "\"step_s\":-900.0", "\"plan\" is damaged"},
        {"\"counts\":[", "\"counts\":[-5,", "\"counts\" is damaged"},
        {"\"flagged\":[", "\"flagged\":[1,", "\"flagged\" is damaged"},
        {"\"bins\":[[16,", "\"bins\":[[17,", "\"bins\" is damaged"},
        {"\"bins\":[[16,0,", "\"bins\":[[16,1,", "\"whole\" is damaged"},
        {"\"doubled\":0", "\"doubled\":99", "\"trend\" is damaged"},
        {"{\"tool\"", "{\"tool\":1,\"tool\"", "not JSON"},
    };
    tally_case *k = case_make(57, 200, 900.0, TALLY_DAY);
    size_t length = 0;
    char *text = text_of(k, 0, k->count, &length);
    char *changed = calloc(1, length + 40);

    (void)state;
    assert_non_null(changed);
    for (size_t i = 0; i < COUNT(CASES); i++) {
        const char *at = strstr(text, CASES[i].from);
        tally *t = NULL;
        bc_error err;

        assert_non_null(at);
        (void)snprintf(changed, length + 40, "%.*s%s%s", (int)(at - text), text, CASES[i].to, at + strlen(CASES[i].from));
        assert_refused_at(CASES[i].to, stream_part_read(write_scratch(changed, strlen(changed)), &t, &err), &err, BC_ERR_INPUT, CASES[i].words);
        assert_string_equal(err.file, scratch_path());
    }
    free(changed);
    free(text);
    free(k);
}

static void a_file_that_is_not_there_is_named(void **state)
{
    tally *t = NULL;
    bc_error err;

    (void)state;
    assert_refused(stream_part_read("no-such-folder/part.json", &t, &err), &err, BC_ERR_INPUT, "");
    assert_string_equal(err.file, "no-such-folder/part.json");
}

static void numbers_are_read_and_written_without_a_locale(void **state)
{
    tally_case *k = case_make(61, 60, 900.0, TALLY_DAY);
    size_t length = 0;
    size_t german_length = 0;
    char *text = text_of(k, 0, k->count, &length);

    (void)state;
    use_german_numbers();
    char *german = text_of(k, 0, k->count, &german_length);
    tally *t = read_text(german, german_length);

    assert_string_equal(german, text);
    tally_close(t);
    free(german);
    free(text);
    free(k);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(a_part_reads_back_as_it_was_written),
        cmocka_unit_test(parts_merged_from_files_are_the_whole),
        cmocka_unit_test(a_part_with_one_row_or_none_reads_back),
        cmocka_unit_test(a_part_cut_off_anywhere_is_refused),
        cmocka_unit_test(a_part_with_anything_changed_is_refused_or_can_be_asked),
        cmocka_unit_test(what_is_wrong_is_told),
        cmocka_unit_test(a_file_that_is_not_there_is_named),
        cmocka_unit_test_teardown(numbers_are_read_and_written_without_a_locale, use_c_numbers),
    };
    return cmocka_run_group_tests(tests, NULL, remove_scratch);
}
