/* SPDX-License-Identifier: MIT */
/* test_workbook.c - the workbook: sheets, cells and what users' text cannot do to them; read with unzip. */
#include "output/hostile.h"

#include "output/module_internal.h"
#include "output/workbook_internal.h"

static const render_style STYLE = {0};

static char *rendered(const report *r, const render_style *style, size_t *size)
{
    char *bytes = NULL;
    bc_error err = {0};
    FILE *out = open_memstream(&bytes, size);

    assert_non_null(out);
    assert_ok(render_xlsx(r, style, out, &err), &err);
    assert_int_equal(fclose(out), 0);
    assert_true(*size > 1000 && memcmp(bytes, "PK\003\004", 4) == 0);
    return bytes;
}

/* What a command prints, ended by a NUL; the caller frees it. */
static char *printed(const char *command)
{
    char *text = NULL, buffer[4096];
    size_t size = 0, count = 0;
    FILE *out = open_memstream(&text, &size), *in = popen(command, "r");

    assert_true(out != NULL && in != NULL);
    while ((count = fread(buffer, 1, sizeof buffer, in)) > 0)
        assert_int_equal(fwrite(buffer, 1, count, out), count);
    assert_int_equal(pclose(in), 0);
    assert_int_equal(fclose(out), 0);
    return text;
}

/* Writes the workbook of a report to the scratch file. */
static void write_book(const report *r, const render_style *style)
{
    size_t size = 0;
    char *bytes = rendered(r, style, &size);

    (void)write_scratch(bytes, size);
    free(bytes);
}

/* A part of the workbook in the scratch file, whose XML must be sound. */
static char *part(const char *name)
{
    char command[256];

    (void)snprintf(command, sizeof command, "unzip -p %s '%s'", scratch_path(), name);
    char *text = printed(command);
    (void)snprintf(command, sizeof command, "unzip -p %s '%s' | xmllint --noout -", scratch_path(), name);
    free(printed(command));
    return text;
}

static size_t count_of(const char *text, const char *word)
{
    size_t count = 0;

    for (const char *at = strstr(text, word); at != NULL; at = strstr(at + 1, word))
        count++;
    return count;
}

static void assert_holds(const char *text, const char *word)
{
    if (strstr(text, word) == NULL)
        fail_msg("\"%s\" is not in: %.2000s", word, text);
}

/* Every part is sound XML, and no cell holds a formula. */
static void assert_sound(void)
{
    char command[512];

    (void)snprintf(command, sizeof command,
                   "unzip -Z1 %s | sed 's/\\[/\\\\[/' | while read -r part; do unzip -p %s \"$part\" | xmllint --noout - || echo \"$part\"; done", scratch_path(),
                   scratch_path());
    char *bad = printed(command);
    assert_string_equal(bad, "");
    free(bad);
    (void)snprintf(command, sizeof command, "unzip -p %s 'xl/worksheets/*.xml'", scratch_path());
    char *sheets = printed(command);
    assert_int_equal(count_of(sheets, "<f>"), 0);
    free(sheets);
}

static void an_empty_report_is_a_workbook_with_a_cover(void **state)
{
    report r;

    (void)state;
    report_open(&r, "0.1.0", "sheet", "");
    write_book(&r, &STYLE);
    char *book = part("xl/workbook.xml");
    assert_int_equal(count_of(book, "<sheet "), 1);
    assert_holds(book, "name=\"Report\"");
    free(book);
    assert_sound();
    report_close(&r);
}

static void there_is_a_sheet_for_each_section_table_and_chart(void **state)
{
    report r;

    (void)state;
    open_full(&r, "text", 1, true);
    write_book(&r, &STYLE);
    char *book = part("xl/workbook.xml");
    /* Leading table, section, chart, other table: one title, four names. */
    assert_int_equal(count_of(book, "<sheet "), 5);
    assert_holds(book, "name=\"text\"");
    assert_holds(book, "name=\"text 2\"");
    assert_holds(book, "name=\"text 4\"");
    free(book);
    assert_sound();
    report_close(&r);
}

static void figures_are_numbers_with_the_digits_of_the_text(void **state)
{
    report r;

    (void)state;
    open_full(&r, "text", 1, false);
    write_book(&r, &STYLE);
    char *sheet = part("xl/worksheets/sheet3.xml");
    assert_holds(sheet, "<v>37.7791</v>");
    assert_holds(sheet, "<v>0.0173</v>");
    assert_holds(sheet, "state=\"frozen\"");
    free(sheet);
    char *styles = part("xl/styles.xml");
    assert_holds(styles, "formatCode=\"0.000\"");
    free(styles);
    report_close(&r);
}

static void the_cover_tells_verdict_caution_and_checks_in_words(void **state)
{
    static const char *const WORDS[] = {"Verdict: no", "Caution", "State", "Gas", "Check: ok", "Check: FAILED", "Warning", "Uncertainty"};
    report r;

    (void)state;
    open_full(&r, "text", 1, false);
    write_book(&r, &STYLE);
    char *strings = part("xl/sharedStrings.xml");
    for (size_t i = 0; i < COUNT(WORDS); i++)
        assert_holds(strings, WORDS[i]);
    free(strings);
    write_book(&r, &(render_style){.quiet = true});
    strings = part("xl/sharedStrings.xml");
    assert_null(strstr(strings, "Warning"));
    free(strings);
    report_close(&r);
}

static void gases_stand_side_by_side(void **state)
{
    report r;

    (void)state;
    open_full(&r, "text", 64, false);
    write_book(&r, &STYLE);
    char *strings = part("xl/sharedStrings.xml");
    assert_holds(strings, "A: text");
    assert_holds(strings, "u of BL (k = 1)");
    free(strings);
    assert_sound();
    report_close(&r);
}

static void hostile_text_makes_no_formula_and_no_bad_name(void **state)
{
    (void)state;
    for (size_t i = 0; i < COUNT(HOSTILE); i++) {
        report r;

        open_full(&r, HOSTILE[i], 2, true);
        write_book(&r, &STYLE);
        assert_sound();
        report_close(&r);
    }
}

static void a_text_that_looks_like_an_escape_is_escaped(void **state)
{
    report r;

    (void)state;
    open_full(&r, "_x0041_", 1, false);
    write_book(&r, &STYLE);
    char *strings = part("xl/sharedStrings.xml");
    assert_holds(strings, "_x005F_x0041_");
    free(strings);
    report_close(&r);
}

static void long_titles_are_cut_to_names_that_differ(void **state)
{
    report r;

    (void)state;
    report_open(&r, "0.1.0", "sheet", "Sheet");
    for (int i = 0; i < 12; i++) {
        const size_t table = report_add_table(&r, "t", i % 2 == 0 ? "\360\237\224\245\360\237\224\245\360\237\224\245\360\237\224\245\360\237\224\245"
                                                                    "\360\237\224\245\360\237\224\245\360\237\224\245 a title that is much too long"
                                                                  : "History");
        report_add_column(&r, table, "a", "a", "");
        report_add_text(&r, table, "b");
    }
    write_book(&r, &STYLE);
    char *book = part("xl/workbook.xml");
    assert_int_equal(count_of(book, "<sheet "), 13);
    assert_int_equal(count_of(book, "name=\"History\""), 0);
    assert_holds(book, "name=\"History 2\"");
    assert_holds(book, "\360\237\224\245 a title that\""); /* of "that is": names end with a word */
    assert_holds(book, "\360\237\224\245 a title that 2\"");
    free(book);
    assert_sound();
    report_close(&r);
}

static void a_text_longer_than_a_cell_is_cut(void **state)
{
    static char text[40001];
    report r;

    (void)state;
    memset(text, 'x', sizeof text - 1);
    report_open(&r, "0.1.0", "sheet", text);
    report_add_warning(&r, text);
    report_set_verdict(&r, text);
    write_book(&r, &STYLE);
    assert_sound();
    report_close(&r);
}

/* One chart of each kind and axis. */
static void every_kind_of_chart_is_native(void **state)
{
    report r;

    (void)state;
    report_open(&r, "0.1.0", "stream", "Charts");
    for (int kind = REPORT_LINE; kind <= REPORT_SPANS; kind++) {
        const size_t chart = report_add_chart(&r, "c", "Chart");
        const size_t series = report_add_series(&r, chart, (report_series_kind)kind, "series");

        report_set_axis(&r, chart, REPORT_X, "x", "");
        for (int i = 0; i < 4; i++)
            report_add_point(&r, chart, series, kind == REPORT_LINE ? 1.7e9 + 3600.0 * i : 1.3 * i, 2.0 + i % 3);
        report_add_mark(&r, chart, REPORT_MARK_Y, 0.0, 3.1, "limit");
        if (kind == REPORT_LINE)
            report_set_time(&r, chart);
        if (kind == REPORT_BARS)
            report_set_range(&r, chart, REPORT_Y, 0.0, 7.0);
    }
    const size_t bars = report_add_chart(&r, "b", "Bars along x");
    const size_t bar = report_add_series(&r, bars, REPORT_BARS, "bar");
    for (int i = 0; i < 3; i++) {
        report_add_name(&r, bars, REPORT_Y, i == 0 ? "=1+1" : "limit");
        report_add_point(&r, bars, bar, 2.5 * i, i);
    }
    (void)report_add_chart(&r, "e", "Empty");
    write_book(&r, &STYLE);
    assert_sound();
    char *line = part("xl/charts/chart1.xml");
    assert_holds(line, "<c:scatterChart>");
    free(line);
    char *across = part("xl/charts/chart7.xml");
    assert_holds(across, "<c:barDir val=\"bar\"/>");
    const char *names = strstr(across, "<c:catAx>"), *values = strstr(across, "<c:valAx>");
    assert_true(names != NULL && names < values); /* names from above, bars to the right */
    assert_true(strstr(names, "maxMin") != NULL && strstr(names, "maxMin") < values);
    assert_null(strstr(values, "maxMin"));
    free(across);
    report_close(&r);
}

/* What a gap divides is one curve still, and a bound that no point comes near is on the paper. */
static void a_curve_with_a_gap_is_one_and_its_bound_is_seen(void **state)
{
    report r;

    (void)state;
    report_open(&r, "0.1.0", "stream", "Charts");
    const size_t chart = report_add_chart(&r, "c", "Chart");
    for (int part = 0; part < 2; part++) {
        const size_t series = report_add_series(&r, chart, REPORT_LINE, "wobbe-gross");

        report_add_point(&r, chart, series, 10.0 * part, 14.4);
        report_add_point(&r, chart, series, 10.0 * part + 5.0, 14.6);
    }
    report_add_mark(&r, chart, REPORT_MARK_Y, 0.0, 21.0, "max 21");
    write_book(&r, &STYLE);
    assert_sound();
    char *drawn = part("xl/charts/chart1.xml");
    assert_holds(drawn, "<c:legendEntry><c:idx val=\"1\"/><c:delete val=\"1\"/></c:legendEntry>");
    assert_null(strstr(drawn, "<c:legendEntry><c:idx val=\"0\"/>"));
    assert_null(strstr(drawn, "D55E00")); /* the second colour */
    assert_holds(drawn, "<c:max val=\"21\"/>");
    free(drawn);
    report_close(&r);
}

static void the_same_report_is_the_same_file_without_user_or_date(void **state)
{
    size_t first_size = 0, second_size = 0;
    report r;

    (void)state;
    open_full(&r, "text", 2, true);
    char *first = rendered(&r, &STYLE, &first_size);
    assert_int_equal(setenv("TZ", "Asia/Tokyo", 1), 0);
    char *second = rendered(&r, &STYLE, &second_size);
    assert_int_equal(unsetenv("TZ"), 0);
    assert_int_equal(first_size, second_size);
    assert_memory_equal(first, second, first_size);
    (void)write_scratch(first, first_size);
    char *core = part("docProps/core.xml");
    assert_holds(core, "<dc:creator></dc:creator>");
    assert_holds(core, "1980-01-01T00:00:00Z");
    free(core);
    free(first);
    free(second);
    report_close(&r);
}

static void the_locale_does_not_matter(void **state)
{
    report r;

    (void)state;
    use_german_numbers();
    open_full(&r, "text", 1, true);
    write_book(&r, &STYLE);
    assert_string_equal(setlocale(LC_ALL, NULL), "de_DE.UTF-8");
    char *sheet = part("xl/worksheets/sheet3.xml");
    assert_holds(sheet, "<v>37.7791</v>");
    free(sheet);
    report_close(&r);
}

static void the_module_refuses_a_stranger_and_a_missing_one_is_named(void **state)
{
    static const module_name NAME = {WORKBOOK_MODULE, WORKBOOK_SYMBOL, "workbooks", "libxlsxwriter4"};
    static const char *const HERE[] = {BC_BUILD_DIR}, *const NOWHERE[] = {"/nowhere/lib/bluecone"};
    workbook_write *write = NULL;
    void *symbol = NULL;
    bc_error err = {0};

    (void)state;
    assert_refused(module_load_from(&NAME, NOWHERE, 1, &symbol, &err), &err, BC_ERR_FILE,
                   "workbooks|bluecone_workbook.so|missing|/nowhere/lib/bluecone|install");
    assert_ok(module_load_from(&NAME, HERE, 1, &symbol, &err), &err);
    memcpy(&write, &symbol, sizeof symbol);
    assert_int_equal(write(WORKBOOK_ABI + 1, NULL), WORKBOOK_OTHER_ABI);
}

static void a_report_that_lacks_something_is_refused(void **state)
{
    report r;
    bc_error err = {0};

    (void)state;
    report_open(&r, "0.1.0", "sheet", "Sheet");
    r.failed = true;
    assert_refused(render_xlsx(&r, &STYLE, stderr, &err), &err, BC_ERR_MEMORY, "memory");
    report_close(&r);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(an_empty_report_is_a_workbook_with_a_cover),
        cmocka_unit_test(there_is_a_sheet_for_each_section_table_and_chart),
        cmocka_unit_test(figures_are_numbers_with_the_digits_of_the_text),
        cmocka_unit_test(the_cover_tells_verdict_caution_and_checks_in_words),
        cmocka_unit_test(gases_stand_side_by_side),
        cmocka_unit_test(hostile_text_makes_no_formula_and_no_bad_name),
        cmocka_unit_test(a_text_that_looks_like_an_escape_is_escaped),
        cmocka_unit_test(long_titles_are_cut_to_names_that_differ),
        cmocka_unit_test(a_text_longer_than_a_cell_is_cut),
        cmocka_unit_test(every_kind_of_chart_is_native),
        cmocka_unit_test(a_curve_with_a_gap_is_one_and_its_bound_is_seen),
        cmocka_unit_test(the_same_report_is_the_same_file_without_user_or_date),
        cmocka_unit_test_teardown(the_locale_does_not_matter, use_c_numbers),
        cmocka_unit_test(the_module_refuses_a_stranger_and_a_missing_one_is_named),
        cmocka_unit_test(a_report_that_lacks_something_is_refused),
    };

    return cmocka_run_group_tests_name("workbook", tests, NULL, remove_scratch);
}
