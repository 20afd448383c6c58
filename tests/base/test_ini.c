/* SPDX-License-Identifier: MIT */
/* test_ini.c - the guard in front of iniparser: every hostile file gives one clear message, never a wrong value. */
#include "support.h"

#include "base/ini.h"

#include <sys/types.h>

#define GAS "[gas]\nname = Works supply\n"

/* A file that is refused: its bytes, the line to blame, what the message must say. */
typedef struct {
    const char *label, *bytes;
    size_t length; /* 0: of the text */
    int line;
    const char *words;
} hostile;

static void assert_file_refused(const char *label, const char *path, bc_status status, int line, const char *words)
{
    bc_ini *ini = NULL;
    bc_error err = {.status = BC_OK};
    const int kept = hold_stderr();
    const bc_status got = bc_ini_open(path, &ini, &err);

    assert_stderr_silent(kept, label);
    assert_refused_at(label, got, &err, status, words);
    assert_string_equal(err.file, path);
    if (err.line != line)
        fail_msg("%s: line %d is blamed, not %d: %s", label, err.line, line, err.message);
    assert_null(ini);
}

static void assert_each_refused(const hostile files[], size_t count)
{
    for (size_t i = 0; i < count; i++) {
        const size_t length = files[i].length > 0 ? files[i].length : strlen(files[i].bytes);

        assert_file_refused(files[i].label, write_scratch(files[i].bytes, length), BC_ERR_INPUT, files[i].line, files[i].words);
    }
}

static bc_ini *opened(const char *bytes)
{
    bc_ini *ini = NULL;
    bc_error err;
    const int kept = hold_stderr();
    const bc_status status = bc_ini_open(write_scratch(bytes, strlen(bytes)), &ini, &err);

    assert_stderr_silent(kept, bytes);
    assert_ok(status, &err);
    return ini;
}

static void assert_value(const bc_ini *ini, const char *section, const char *key, const char *want, int line)
{
    const bc_ini_entry *entry = bc_ini_find(ini, section, key);

    if (entry == NULL)
        fail_msg("[%s] %s is not there", section, key);
    assert_string_equal(entry->value, want);
    assert_int_equal(entry->line, line);
}

static void a_plain_file_is_read_with_the_lines_of_its_keys(void **state)
{
    (void)state;
    bc_ini *ini = opened("; a certificate\n\n[Gas]\n name = Works supply ; June\n\n[components]\nMethane\t=  91.30\n# remark\ncarbon dioxide=1.20\n"
                         "nitrogen = rest");

    assert_int_equal(bc_ini_count(ini), 4);
    assert_value(ini, "gas", "name", "Works supply", 4);
    assert_value(ini, "components", "methane", "91.30", 7);
    assert_value(ini, "components", "carbon-dioxide", "1.20", 9);
    assert_value(ini, "components", "nitrogen", "rest", 10);
    assert_string_equal(bc_ini_at(ini, 1)->key, "Methane");
    assert_null(bc_ini_find(ini, "gas", "methane"));
    bc_ini_close(ini);
}

static void line_ends_of_windows_change_nothing(void **state)
{
    (void)state;
    bc_ini *ini = opened("[gas]\r\nname = Works supply\r\n\r\n[components]  ; mole, as printed\r\nmethane = 97.2\r\nethane = 2.8\r\n");

    assert_value(ini, "gas", "name", "Works supply", 2);
    assert_value(ini, "components", "methane", "97.2", 5);
    assert_value(ini, "components", "ethane", "2.8", 6);
    bc_ini_close(ini);
}

static void values_keep_their_inner_signs_and_lose_quotes_and_remarks(void **state)
{
    (void)state;
    bc_ini *ini = opened("[gas]\nname = \"Supply; north # 2\"\nsource = 'a = b'\nfamily =\nbasis = \"\"\nunit = a = b # c\n");

    assert_value(ini, "gas", "name", "Supply; north # 2", 2);
    assert_value(ini, "gas", "source", "a = b", 3);
    assert_value(ini, "gas", "family", "", 4);
    assert_value(ini, "gas", "basis", "", 5);
    assert_value(ini, "gas", "unit", "a = b", 6);
    bc_ini_close(ini);
}

static void utf8_passes_unchanged(void **state)
{
    (void)state;
    bc_ini *ini = opened("[gas]\nname = Gr\xC3\xBC" "nes Gas, 15\xC2\xA0\xC2\xB0" "C\n");

    assert_value(ini, "gas", "name", "Gr\xC3\xBC" "nes Gas, 15\xC2\xA0\xC2\xB0" "C", 2);
    bc_ini_close(ini);
}

static void a_repeated_key_is_refused_however_it_is_written(void **state)
{
    static const hostile FILES[] = {
        {"same", "[components]\nmethane = 91\nethane = 5\nmethane = 19\n", 0, 4, "'methane' stands here again|first on line 2|keep one"},
        {"case", "[components]\nmethane = 91\nMETHANE = 19\n", 0, 3, "'METHANE' stands here again|first on line 2"},
        {"hyphen", "[components]\nn-butane = 91\nnbutane = 19\n", 0, 3, "stands here again"},
        {"blank", "[components]\ncarbon dioxide = 91\ncarbon_dioxide = 19\n", 0, 3, "stands here again"},
    };

    (void)state;
    assert_each_refused(FILES, COUNT(FILES));
}

static void the_same_key_in_two_sections_is_two_keys(void **state)
{
    (void)state;
    bc_ini *ini = opened("[components]\nmethane = 91\n[uncertainty]\nmethane = 0.06\n");

    assert_value(ini, "components", "methane", "91", 2);
    assert_value(ini, "uncertainty", "methane", "0.06", 4);
    bc_ini_close(ini);
}

static void sections_that_are_repeated_empty_or_ill_formed_are_refused(void **state)
{
    static const hostile FILES[] = {
        {"repeated", GAS "[components]\nmethane = 91\n[GAS]\nbasis = mass\n", 0, 5, "[gas] stands here again|line 2|join them"},
        {"empty at the end", GAS "[components]\n", 0, 3, "section [components] is empty|give it keys or remove it"},
        {"empty before another", "[gas]\n[components]\nmethane = 91\n", 0, 1, "section [gas] is empty"},
        {"only remarks in it", GAS "[components]\n; nothing\n\n", 0, 3, "section [components] is empty"},
        {"text behind", GAS "[components] methane\nmethane = 91\n", 0, 3, "behind it only a remark may stand"},
        {"not closed", GAS "[components\nmethane = 91\n", 0, 3, "[name]"},
        {"no name", GAS "[]\nmethane = 91\n", 0, 3, "section name is empty"},
        {"blank name", GAS "[  ]\nmethane = 91\n", 0, 3, "section name is empty"},
        {"colon in it", GAS "[a:b]\nmethane = 91\n", 0, 3, "holds ':'"},
        {"sixty-four letters", "[aaaaaaaaaabbbbbbbbbbccccccccccddddddddddeeeeeeeeeeffffffffffgggg]\nm = 1\n", 0, 1, "too long"},
    };

    (void)state;
    assert_each_refused(FILES, COUNT(FILES));
}

static void keys_that_are_misplaced_or_ill_formed_are_refused(void **state)
{
    static const hostile FILES[] = {
        {"before a section", "methane = 91\n[gas]\nname = x\n", 0, 1, "before the first section|[burner]"},
        {"no equals sign", GAS "[components]\nmethane 91\n", 0, 4, "neither [section] nor key = value|put '='"},
        {"a colon instead", GAS "[components]\nmethane: 91\n", 0, 4, "put '='"},
        {"a colon and an equals sign", GAS "[components]\nmethane:x = 91\n", 0, 4, "cannot hold ':'"},
        {"no key", GAS "[components]\n = 91\n", 0, 4, "no key in front of '='"},
        {"sixty-four letters", GAS "aaaaaaaaaabbbbbbbbbbccccccccccddddddddddeeeeeeeeeeffffffffffgggg = 1\n", 0, 3, "longer than 63|shorten"},
    };

    (void)state;
    assert_each_refused(FILES, COUNT(FILES));
}

static void bytes_that_are_no_text_are_refused(void **state)
{
    static const hostile FILES[] = {
        {"byte-order mark", "\xEF\xBB\xBF[gas]\nname = x\n", 0, 1, "byte-order mark|save it as plain UTF-8"},
        {"UTF-16, little end first", "\xFF\xFE[\0g\0a\0s\0]\0\n\0", 14, 1, "UTF-16|save it"},
        {"UTF-16, big end first", "\xFE\xFF\0[\0g\0a\0s\0]\0\n", 14, 1, "UTF-16|save it"},
        {"NUL", "[gas]\nname = x\nfamily = na\0tural\n", 33, 3, "NUL byte|not a text file"},
        {"NUL at the end", "[gas]\nname = x\n\0", 16, 3, "NUL byte"},
        {"escape", GAS "family = \x1b[31mred\n", 0, 3, "control character|remove it"},
        {"form feed", GAS "\f[components]\nmethane = 91\n", 0, 3, "control character"},
        {"delete", GAS "family = \x7f\n", 0, 3, "control character"},
        {"old Mac line ends", "[gas]\rname = x\r", 0, 1, "control character"},
    };

    (void)state;
    assert_each_refused(FILES, COUNT(FILES));
}

static void files_without_anything_to_read_are_refused(void **state)
{
    static const hostile FILES[] = {
        {"only remarks", "; methane = 91\n# ethane = 9\n\n", 0, 0, "no key = value line|bluecone-composition(5)"},
        {"only blanks", "  \n\t\n\n", 0, 0, "no key = value line"},
        {"only a line end", "\n", 0, 0, "no key = value line"},
    };

    (void)state;
    assert_each_refused(FILES, COUNT(FILES));
    assert_file_refused("empty", write_scratch("", 0), BC_ERR_INPUT, 0, "the file is empty|bluecone-composition(5)|bluecone-burner(5)");
}

static void a_backslash_at_the_end_of_a_line_is_refused(void **state)
{
    static const hostile FILES[] = {
        {"of a value", GAS "[components]\nmethane = 9\\\n1\n", 0, 4, "ends in a backslash|remove it"},
        {"with blanks behind", GAS "[components]\nmethane = 9\\  \n1\n", 0, 4, "ends in a backslash"},
        {"of a remark, which would swallow the next line", GAS "; C:\\lab\\\n[components]\nmethane = 91\n", 0, 3, "ends in a backslash"},
    };

    (void)state;
    assert_each_refused(FILES, COUNT(FILES));
}

static void text_behind_a_closing_quote_is_refused_and_not_cut_off(void **state)
{
    static const hostile FILES[] = {
        {"digits", GAS "[components]\nmethane = '9'1.3\n", 0, 4, "quote"},
        {"a unit", GAS "[components]\nmethane = \"91.3\" ppm\n", 0, 4, "quote"},
        {"never closed", GAS "[components]\nmethane = \"91.3\n", 0, 4, "quote"},
    };

    (void)state;
    assert_each_refused(FILES, COUNT(FILES));
}

/* A line of exactly n bytes: a key, blanks, a value. */
static size_t wide_file(char *text, size_t size, size_t n)
{
    const int used = snprintf(text, size, "[gas]\nname = ");
    const size_t head = (size_t)used;

    memset(text + head, 'n', n - strlen("name = "));
    const int tail = snprintf(text + head + n - strlen("name = "), size - head - n, "\n[components]\nmethane = 91\n");

    return head + n - strlen("name = ") + (size_t)tail;
}

static void a_line_of_a_thousand_bytes_passes_and_one_more_is_refused(void **state)
{
    char text[2000];
    bc_ini *ini = NULL;
    bc_error err;
    size_t length = wide_file(text, sizeof text, BC_INI_LINE_MAX);

    (void)state;
    assert_ok(bc_ini_open(write_scratch(text, length), &ini, &err), &err);
    assert_int_equal(strlen(bc_ini_at(ini, 0)->value), BC_INI_LINE_MAX - strlen("name = "));
    bc_ini_close(ini);
    length = wide_file(text, sizeof text, BC_INI_LINE_MAX + 1);
    assert_file_refused("1001 bytes", write_scratch(text, length), BC_ERR_INPUT, 2, "more than 1000 bytes|shorten");
}

static void a_line_that_is_long_by_its_blanks_alone_is_refused_as_too_long(void **state)
{
    char text[4000] = "[components]\nmethane = 91";
    const size_t head = strlen(text);

    (void)state;
    memset(text + head, ' ', 2000);
    (void)snprintf(text + head + 2000, sizeof text - head - 2000, "\nethane = 9\n");
    assert_file_refused("blanks", write_scratch(text, strlen(text)), BC_ERR_INPUT, 2, "more than 1000 bytes|shorten");
}

static void six_hundred_keys_are_refused_and_five_hundred_and_twelve_are_read(void **state)
{
    char *text = calloc(1, 32768);
    size_t n = 0;

    (void)state;
    assert_non_null(text);
    n += (size_t)snprintf(text, 32768, "[components]\n");
    for (int i = 0; i < 600; i++)
        n += (size_t)snprintf(text + n, 32768 - n, "key%d = %d\n", i, 1000 + 7 * i);
    assert_file_refused("600 keys", write_scratch(text, n), BC_ERR_INPUT, 514, "more keys|512|right file");
    *strstr(text, "key512") = '\0';
    bc_ini *ini = opened(text);

    assert_int_equal(bc_ini_count(ini), 512);
    assert_value(ini, "components", "key511", "4577", 513);
    bc_ini_close(ini);
    free(text);
}

static void a_file_over_the_size_of_any_gas_is_refused_unread(void **state)
{
    FILE *f = fopen(scratch_path(), "wb");

    (void)state;
    assert_non_null(f);
    assert_int_equal(ftruncate(fileno(f), (off_t)5 << 30), 0); /* 5 GB, sparse */
    assert_int_equal(fclose(f), 0);
    assert_file_refused("huge", scratch_path(), BC_ERR_INPUT, 0, "5368709120 bytes|right file");
    assert_int_equal(truncate(scratch_path(), BC_INI_BYTES_MAX + 1), 0);
    assert_file_refused("one byte over", scratch_path(), BC_ERR_INPUT, 0, "262145 bytes|262144 allowed");
}

static void a_directory_a_pipe_and_a_device_are_refused_without_waiting(void **state)
{
    char fifo[80];

    (void)state;
    (void)snprintf(fifo, sizeof fifo, "%s.fifo", scratch_path());
    (void)unlink(fifo);
    assert_int_equal(mkfifo(fifo, 0600), 0);
    (void)alarm(10); /* a hang ends the test */
    assert_file_refused("pipe", fifo, BC_ERR_INPUT, 0, "not a regular file|save the text to a file");
    assert_file_refused("directory", "/tmp", BC_ERR_INPUT, 0, "directory|name the file in it");
    assert_file_refused("endless device", "/dev/zero", BC_ERR_INPUT, 0, "not a regular file");
    assert_file_refused("empty device", "/dev/null", BC_ERR_INPUT, 0, "not a regular file");
    (void)alarm(0);
    assert_int_equal(unlink(fifo), 0);
}

static void a_path_that_leads_nowhere_is_bad_input_and_says_why(void **state)
{
    char longer[6000];

    (void)state;
    assert_file_refused("missing", "/tmp/bluecone/no/such.ini", BC_ERR_INPUT, 0, "cannot be opened|No such file");
    assert_file_refused("through a file", "/dev/null/gas.ini", BC_ERR_INPUT, 0, "Not a directory");
    memset(longer, 'z', sizeof longer);
    longer[sizeof longer - 1] = '\0';
    bc_ini *ini = NULL;
    bc_error err = {.status = BC_OK};

    assert_refused(bc_ini_open(longer, &ini, &err), &err, BC_ERR_INPUT, "too long");
}

static void a_file_that_may_not_be_read_is_bad_input(void **state)
{
    (void)state;
    const bool root = geteuid() == 0; /* who may read everything */
    bc_ini *ini = NULL;
    bc_error err = {.status = BC_OK};

    assert_int_equal(chmod(write_scratch(GAS, strlen(GAS)), 0), 0);
    assert_int_equal(root ? seteuid(65534) : 0, 0);
    const bc_status status = bc_ini_open(scratch_path(), &ini, &err);

    assert_int_equal(root ? seteuid(0) : 0, 0);
    assert_int_equal(chmod(scratch_path(), 0600), 0);
    assert_refused(status, &err, BC_ERR_INPUT, "cannot be opened|Permission denied");
    assert_string_equal(err.file, scratch_path());
}

static void random_damage_never_crashes_and_never_talks(void **state)
{
    static const char WHOLE[] = "[gas]\nname = \"Works\"\nbasis = mole\n[components]\nmethane = 91.3\nethane = rest ; x\n[cut c6+]\nhexane = 1\n";
    static const char SPICE[] = "[]=;#\"'\\\n\r\t :\0\x80\xff" "9.";
    chance c = {8675309};
    const int kept = hold_stderr();
    int read = 0;

    (void)state;
    for (int i = 0; i < 3000; i++) {
        char text[sizeof WHOLE];
        bc_ini *ini = NULL;
        bc_error err = {.status = BC_OK};
        const size_t edits = 1 + chance_below(&c, 4);

        memcpy(text, WHOLE, sizeof text);
        for (size_t k = 0; k < edits; k++)
            text[chance_below(&c, sizeof text - 1)] = SPICE[chance_below(&c, sizeof SPICE - 1)];
        const bc_status status = bc_ini_open(write_scratch(text, sizeof text - 1), &ini, &err);

        if (status == BC_OK)
            read++;
        else if (status != BC_ERR_INPUT || strlen(err.message) < 20)
            fail_msg("status %d, %s", (int)status, err.message);
        bc_ini_close(ini);
    }
    assert_stderr_silent(kept, "random damage");
    assert_in_range(read, 300, 2700);
}

static void closing_nothing_is_allowed(void **state)
{
    (void)state;
    bc_ini_close(NULL);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(a_plain_file_is_read_with_the_lines_of_its_keys),
        cmocka_unit_test(line_ends_of_windows_change_nothing),
        cmocka_unit_test(values_keep_their_inner_signs_and_lose_quotes_and_remarks),
        cmocka_unit_test(utf8_passes_unchanged),
        cmocka_unit_test(a_repeated_key_is_refused_however_it_is_written),
        cmocka_unit_test(the_same_key_in_two_sections_is_two_keys),
        cmocka_unit_test(sections_that_are_repeated_empty_or_ill_formed_are_refused),
        cmocka_unit_test(keys_that_are_misplaced_or_ill_formed_are_refused),
        cmocka_unit_test(bytes_that_are_no_text_are_refused),
        cmocka_unit_test(files_without_anything_to_read_are_refused),
        cmocka_unit_test(a_backslash_at_the_end_of_a_line_is_refused),
        cmocka_unit_test(text_behind_a_closing_quote_is_refused_and_not_cut_off),
        cmocka_unit_test(a_line_of_a_thousand_bytes_passes_and_one_more_is_refused),
        cmocka_unit_test(a_line_that_is_long_by_its_blanks_alone_is_refused_as_too_long),
        cmocka_unit_test(six_hundred_keys_are_refused_and_five_hundred_and_twelve_are_read),
        cmocka_unit_test(a_file_over_the_size_of_any_gas_is_refused_unread),
        cmocka_unit_test(a_directory_a_pipe_and_a_device_are_refused_without_waiting),
        cmocka_unit_test(a_path_that_leads_nowhere_is_bad_input_and_says_why),
        cmocka_unit_test(a_file_that_may_not_be_read_is_bad_input),
        cmocka_unit_test(random_damage_never_crashes_and_never_talks),
        cmocka_unit_test(closing_nothing_is_allowed),
    };

    return cmocka_run_group_tests(tests, NULL, remove_scratch);
}
