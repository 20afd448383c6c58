/* SPDX-License-Identifier: MIT */
/* test_page.c - the page of HTML: its order, its words, and what users' text cannot do to it. */
#include "output/hostile.h"

#include <ctype.h>

#define DEPTH_MAX 32

static char *rendered(const report *r, const render_style *style)
{
    char *text = NULL;
    size_t size = 0;
    bc_error err = {0};
    FILE *out = open_memstream(&text, &size);

    assert_non_null(out);
    assert_ok(render_html(r, style, out, &err), &err);
    assert_int_equal(fclose(out), 0);
    assert_int_equal(strlen(text), size);
    return text;
}

static char *page_of(const report *r)
{
    return rendered(r, &(render_style){0});
}

static void assert_in_order(const char *page, const char *const words[], size_t count)
{
    const char *at = page;

    for (size_t i = 0; i < count; i++) {
        const char *found = strstr(at, words[i]);

        if (found == NULL)
            fail_msg("\"%s\" is not there, or not behind \"%s\"", words[i], i == 0 ? "" : words[i - 1]);
        at = found;
    }
}

static size_t count_of(const char *page, const char *word)
{
    size_t count = 0;

    for (const char *at = strstr(page, word); at != NULL; at = strstr(at + 1, word))
        count++;
    return count;
}

/* ---- structure ---- */

typedef struct {
    char open[DEPTH_MAX][16];
    size_t depth;
    char *skeleton; /* the names of all tags; NULL: not wanted */
} walk;

static bool is_void(const char *name)
{
    return strcmp(name, "meta") == 0 || strcmp(name, "br") == 0 || *name == '!';
}

/* The end of a tag: the first '>' outside quotes. */
static const char *tag_end(const char *at)
{
    char quote = '\0';

    for (; *at != '\0' && (quote != '\0' || *at != '>'); at++) {
        if (quote == '\0' && (*at == '"' || *at == '\''))
            quote = *at;
        else if (*at == quote)
            quote = '\0';
    }
    assert_true(*at == '>');
    return at;
}

/* A tag has no attribute that fetches or runs, whatever its values say. */
static void check_attributes(const char *tag, const char *end)
{
    char bare[200] = "";
    size_t n = 0;
    bool quoted = false;

    for (const char *c = tag; c < end && n + 1 < sizeof bare; c++) {
        quoted = quoted != (*c == '"');
        if (!quoted)
            bare[n++] = *c;
    }
    if (strstr(bare, " src=") != NULL || strstr(bare, " on") != NULL)
        fail_msg("a tag says %s", bare);
}

static void take_tag(walk *w, const char *tag, const char *end)
{
    const bool closes = tag[1] == '/';
    char name[16] = "";

    for (size_t i = 0; i + 1 < sizeof name && (isalnum((unsigned char)tag[i + 1 + closes]) || tag[i + 1 + closes] == '!'); i++)
        name[i] = tag[i + 1 + closes];
    check_attributes(tag, end);
    if (w->skeleton != NULL)
        w->skeleton += sprintf(w->skeleton, "%c%s", closes ? '/' : ' ', name);
    if (closes) {
        assert_true(w->depth > 0);
        assert_string_equal(w->open[--w->depth], name);
    } else if (!is_void(name) && end[-1] != '/') {
        assert_true(w->depth < DEPTH_MAX);
        (void)snprintf(w->open[w->depth++], sizeof w->open[0], "%s", name);
    }
}

/* Every tag that is opened is closed, in the right order; every '<' and '"' is one of ours. */
static void assert_balanced(const char *page, char *skeleton)
{
    walk w = {.skeleton = skeleton};

    for (const char *at = strchr(page, '<'); at != NULL; at = strchr(at, '<')) {
        const char *end = tag_end(at);

        take_tag(&w, at, end);
        at = end;
    }
    assert_int_equal(w.depth, 0);
}

/* Nothing is fetched and nothing runs. */
static void assert_alone(const char *page)
{
    static const char *const NEVER[] = {"<script", "<link", "<iframe", "<object", "<img", "<base", "<form", "@import",
                                        "url(h", "url(\"", "url('"};

    for (size_t i = 0; i < COUNT(NEVER); i++)
        if (strstr(page, NEVER[i]) != NULL)
            fail_msg("the page holds %s", NEVER[i]);
    for (const char *at = strstr(page, "href=\""); at != NULL; at = strstr(at + 1, "href=\""))
        assert_true(at[6] == '#');
}

static void an_empty_report_is_a_whole_page(void **state)
{
    static const char *const WORDS[] = {"<!DOCTYPE html>\n<html lang=\"en\"", "<meta charset=\"utf-8\">", "default-src 'none'",
                                        "name=\"viewport\"", "<title>Sheet</title>", "<style>", "</head>", "<h1>Sheet</h1>",
                                        "<main>", "</main>", "bluecone 0.1.0, command sheet", "</html>\n"};
    report r;

    (void)state;
    report_open(&r, "0.1.0", "sheet", "Sheet");
    char *page = page_of(&r);
    assert_in_order(page, WORDS, COUNT(WORDS));
    assert_balanced(page, NULL);
    assert_alone(page);
    assert_null(strstr(page, "<section"));
    assert_null(strstr(page, "<table"));
    free(page);
    report_close(&r);
}

static void the_parts_stand_in_their_order_with_the_verdict_first(void **state)
{
    static const char *const WORDS[] = {"<h1>text: text", "Verdict: no</strong> text", "<strong>Caution</strong> text", "<dt>State</dt>",
                                        "<dt>Gas</dt>", "<nav", "<main>", "id=\"t0\"", "id=\"s0\"", "id=\"k0\"",
                                        "class=\"no\">FAILED", "id=\"w0\"", "id=\"t1\"", "id=\"c0\"", "id=\"a0\"", "<dt>Methods</dt><dd>text. ",
                                        "<dt>Uncertainty</dt>"};
    report r;

    (void)state;
    open_full(&r, "text", 1, true);
    char *page = page_of(&r);
    assert_in_order(page, WORDS, COUNT(WORDS));
    assert_balanced(page, NULL);
    assert_alone(page);
    free(page);
    report_close(&r);
}

static void tables_have_captions_and_scopes(void **state)
{
    report r;

    (void)state;
    open_full(&r, "text", 3, false);
    char *page = page_of(&r);
    assert_int_equal(count_of(page, "<table"), count_of(page, "<caption>text</caption>"));
    assert_int_equal(count_of(page, "<th "), count_of(page, "<th scope=\"col\"") + count_of(page, "<th scope=\"row\""));
    assert_int_equal(count_of(page, "<th>"), 0);
    free(page);
    report_close(&r);
}

/* ---- figures ---- */

static void a_figure_has_label_value_unit_uncertainty_and_method(void **state)
{
    static const char *const WORDS[] = {"<th scope=\"row\" data-method=\"MJ/m3\">MJ/m3 [1]</th>", "37<i class=\"f4\">.779</i>", "<td class=\"q\">MJ/m3</td>",
                                        "0<i class=\"f4\">.017</i>", "<td class=\"m\">MJ/m3</td>"};
    report r;

    (void)state;
    open_full(&r, "MJ/m3", 1, false);
    char *page = page_of(&r);
    assert_in_order(page, WORDS, COUNT(WORDS));
    free(page);
    report_close(&r);
}

static void gases_stand_side_by_side_with_their_letters(void **state)
{
    static const char *const WORDS[] = {"<dt>Gas A</dt>", "<dt>Gas C</dt>", "class=\"n\">A <span><bdi>text</bdi>", "class=\"n\">C <span>",
                                        "37<i class=\"f4\">.779</i><small>u 0<i class=\"f4\">.017</i></small>", "38<i class=\"f4\">.779</i>",
                                        "39<i class=\"f4\">.779</i>"};
    report r;

    (void)state;
    open_full(&r, "text", 3, false);
    char *page = page_of(&r);
    assert_in_order(page, WORDS, COUNT(WORDS));
    assert_balanced(page, NULL);
    free(page);
    report_close(&r);
}

static void a_role_stands_in_the_place_of_a_letter(void **state)
{
    static const char *const WORDS[] = {"<dt>Old gas</dt>", "<dt>Gas B</dt>", "class=\"n\">old <span><bdi>text</bdi>", "class=\"n\">B <span>"};
    report r;

    (void)state;
    open_full(&r, "text", 3, false);
    report_name_role(&r, 0, "old");
    char *page = page_of(&r);
    assert_in_order(page, WORDS, COUNT(WORDS));
    free(page);
    report_close(&r);
}

static void many_gases_are_a_page_that_lies_across(void **state)
{
    report r;

    (void)state;
    open_full(&r, "text", 64, false);
    char *page = page_of(&r);
    assert_balanced(page, NULL);
    assert_non_null(strstr(page, "class=\"box gases many\""));
    assert_non_null(strstr(page, "<dt>Gas BL</dt>"));
    assert_non_null(strstr(page, "--n:64"));
    free(page);
    report_close(&r);
}

static void digits_asked_for_are_kept_and_quiet_is_quiet(void **state)
{
    report r;

    (void)state;
    open_full(&r, "text", 1, false);
    char *page = rendered(&r, &(render_style){.digits = 3, .quiet = true});
    assert_non_null(strstr(page, "37<i class=\"f2\">.8</i>"));
    assert_null(strstr(page, "id=\"w0\""));
    assert_null(strstr(page, "[1]"));
    free(page);
    report_close(&r);
}

static void a_long_fraction_is_printed_whole_without_alignment(void **state)
{
    report r;

    (void)state;
    report_open(&r, "0.1.0", "verify", "Checks");
    const size_t table = report_add_table(&r, "t", "T");
    report_add_column(&r, table, "a", "a", "");
    report_add_column(&r, table, "b", "b", "");
    report_add_text(&r, table, "methane=1,ethane=2,propane=3,nitrogen=4");
    report_add_number(&r, table, 0.000123456789, 12);
    report_add_text(&r, table, "half a row");
    char *page = page_of(&r);
    assert_non_null(strstr(page, "<td class=\"n\">0.000123456789</td>"));
    assert_balanced(page, NULL);
    free(page);
    report_close(&r);
}

static void every_judgement_has_a_colour_and_a_word(void **state)
{
    static const struct {
        report_judgement judgement;
        const char *words;
    } CASES[] = {{REPORT_UNJUDGED, "class=\"verdict plain\"><strong>Verdict</strong> v"},
                 {REPORT_YES, "class=\"verdict yes\"><strong>Verdict: yes</strong> v"},
                 {REPORT_CARE, "class=\"verdict care\"><strong>Verdict: take care</strong> v"},
                 {REPORT_NO, "class=\"verdict no\"><strong>Verdict: no</strong> v"}};

    (void)state;
    for (size_t i = 0; i < COUNT(CASES); i++) {
        report r;

        report_open(&r, "0.1.0", "contract", "C");
        report_set_verdict(&r, "v");
        report_judge(&r, CASES[i].judgement);
        char *page = page_of(&r);
        assert_non_null(strstr(page, CASES[i].words));
        free(page);
        report_close(&r);
    }
}

static void a_failed_check_makes_a_verdict_that_nobody_judged_a_no(void **state)
{
    report r;

    (void)state;
    report_open(&r, "0.1.0", "contract", "C");
    report_add_check(&r, "a", true, "");
    assert_int_equal(report_judged(&r), REPORT_UNJUDGED);
    report_add_check(&r, "b", false, "");
    assert_int_equal(report_judged(&r), REPORT_NO);
    report_judge(&r, REPORT_CARE);
    assert_int_equal(report_judged(&r), REPORT_CARE);
    report_close(&r);
}

/* ---- hostile text ---- */

static void no_text_changes_the_structure_of_the_page(void **state)
{
    static char harmless[100000], hostile[100000];
    report r;

    (void)state;
    open_full(&r, "harmless", 2, false);
    char *page = page_of(&r);
    assert_balanced(page, harmless);
    free(page);
    report_close(&r);
    for (size_t i = 0; i < COUNT(HOSTILE); i++) {
        if (*HOSTILE[i] == '\0')
            continue;
        open_full(&r, HOSTILE[i], 2, false);
        page = page_of(&r);
        hostile[0] = '\0';
        assert_balanced(page, hostile);
        assert_string_equal(hostile, harmless);
        assert_alone(page);
        free(page);
        report_close(&r);
    }
}

/* Valid UTF-8 without a control character but the line feeds of ours. */
static void assert_clean(const char *page)
{
    for (const char *at = page; *at != '\0'; at++)
        assert_true((unsigned char)*at >= 0x20 || *at == '\n');
    assert_null(strstr(page, "\342\200\256"));
    assert_null(strstr(page, "\342\201\247"));
    assert_null(strstr(page, "\177"));
    assert_null(strstr(page, "\302\233"));
    assert_null(strchr(page, '\300'));
    assert_null(strchr(page, '\355'));
    assert_null(strchr(page, '\377'));
    assert_null(strstr(page, "\357\277\277"));
}

static void hostile_text_is_shown_and_does_nothing_with_charts_too(void **state)
{
    (void)state;
    for (size_t i = 0; i < COUNT(HOSTILE); i++) {
        report r;

        open_full(&r, HOSTILE[i], 2, true);
        char *page = page_of(&r);
        assert_balanced(page, NULL);
        assert_clean(page);
        assert_alone(page);
        assert_null(strstr(page, "&nosuch;"));
        free(page);
        report_close(&r);
    }
}

static void names_in_other_scripts_stay_as_they_are(void **state)
{
    report r;

    (void)state;
    open_full(&r, "\330\272\330\247\330\262 \346\260\224\344\275\223 \360\237\224\245", 1, false);
    char *page = page_of(&r);
    assert_non_null(strstr(page, "<bdi>\330\272\330\247\330\262 \346\260\224\344\275\223 \360\237\224\245</bdi>"));
    free(page);
    report_close(&r);
}

/* ---- charts ---- */

/* All ids of a page are different ones. */
static void assert_ids_differ(const char *page)
{
    char id[40];

    for (const char *at = strstr(page, " id=\""); at != NULL; at = strstr(at + 1, " id=\"")) {
        (void)snprintf(id, sizeof id, "%.*s", (int)(strcspn(at + 5, "\"") + 6), at);
        assert_int_equal(count_of(page, id), 1);
    }
}

static void charts_are_drawn_into_the_page_without_meeting_each_other(void **state)
{
    report r;

    (void)state;
    open_full(&r, "text", 1, true);
    for (int i = 0; i < 4; i++)
        add_chart(&r, i == 3 ? "another axis" : "text");
    char *page = page_of(&r);
    /* Four that share an axis make two drawings, the last one a third. */
    assert_int_equal(count_of(page, "<svg "), 3);
    assert_int_equal(count_of(page, "<?xml"), 0);
    assert_int_equal(count_of(page, "<title>text; text"), 2);
    assert_ids_differ(page);
    assert_non_null(strstr(page, "href=\"#c2-"));
    assert_balanced(page, NULL);
    free(page);
    report_close(&r);
}

static void the_same_report_is_the_same_page(void **state)
{
    report r;

    (void)state;
    open_full(&r, "text", 2, true);
    char *first = page_of(&r);
    char *second = page_of(&r);
    assert_string_equal(first, second);
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
    char *page = page_of(&r);
    assert_non_null(strstr(page, "37<i class=\"f4\">.779</i>"));
    free(page);
    report_close(&r);
}

/* ---- contrast ---- */

/* Relative luminance and contrast, WCAG 2.1. */
static double luminance(unsigned rgb)
{
    double sum = 0.0;

    for (int i = 0; i < 3; i++) {
        static const double WEIGHTS[] = {0.0722, 0.7152, 0.2126};
        const double c = (rgb >> (8 * i) & 0xFF) / 255.0;

        sum += WEIGHTS[i] * (c <= 0.03928 ? c / 12.92 : pow((c + 0.055) / 1.055, 2.4));
    }
    return sum;
}

static double contrast(unsigned a, unsigned b)
{
    const double x = luminance(a) + 0.05, y = luminance(b) + 0.05;

    return x > y ? x / y : y / x;
}

static void every_pair_of_colours_has_the_contrast_of_level_aa(void **state)
{
    static const unsigned PAIRS[][2] = {{0x1c2733, 0xffffff}, {0x1c2733, 0xf4f7fa}, {0x566472, 0xffffff}, {0x566472, 0xf4f7fa},
                                        {0x0f4c81, 0xffffff}, {0x1c2733, 0xeef4fa}, {0x1c2733, 0xe9f5ee}, {0x1c2733, 0xfdeeec},
                                        {0x1c2733, 0xfdf5e3}, {0x17603a, 0xffffff}, {0x9b1c1c, 0xffffff}, {0x7a4a00, 0xffffff}};
    report r;
    char word[8];

    (void)state;
    report_open(&r, "0.1.0", "sheet", "Sheet");
    char *page = page_of(&r);
    for (size_t i = 0; i < COUNT(PAIRS); i++) {
        if (contrast(PAIRS[i][0], PAIRS[i][1]) < 4.5)
            fail_msg("%06x on %06x has a contrast of %.2f", PAIRS[i][0], PAIRS[i][1], contrast(PAIRS[i][0], PAIRS[i][1]));
        (void)snprintf(word, sizeof word, "#%06x", PAIRS[i][0]);
        assert_non_null(strstr(page, word));
    }
    free(page);
    report_close(&r);
}

static void a_report_that_lacks_something_is_refused(void **state)
{
    report r;
    bc_error err = {0};

    (void)state;
    report_open(&r, "0.1.0", "sheet", "Sheet");
    r.failed = true;
    assert_refused(render_html(&r, &(render_style){0}, stderr, &err), &err, BC_ERR_MEMORY, "memory");
    report_close(&r);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(an_empty_report_is_a_whole_page),
        cmocka_unit_test(the_parts_stand_in_their_order_with_the_verdict_first),
        cmocka_unit_test(tables_have_captions_and_scopes),
        cmocka_unit_test(a_figure_has_label_value_unit_uncertainty_and_method),
        cmocka_unit_test(gases_stand_side_by_side_with_their_letters),
        cmocka_unit_test(a_role_stands_in_the_place_of_a_letter),
        cmocka_unit_test(many_gases_are_a_page_that_lies_across),
        cmocka_unit_test(digits_asked_for_are_kept_and_quiet_is_quiet),
        cmocka_unit_test(a_long_fraction_is_printed_whole_without_alignment),
        cmocka_unit_test(every_judgement_has_a_colour_and_a_word),
        cmocka_unit_test(a_failed_check_makes_a_verdict_that_nobody_judged_a_no),
        cmocka_unit_test(no_text_changes_the_structure_of_the_page),
        cmocka_unit_test(hostile_text_is_shown_and_does_nothing_with_charts_too),
        cmocka_unit_test(names_in_other_scripts_stay_as_they_are),
        cmocka_unit_test(charts_are_drawn_into_the_page_without_meeting_each_other),
        cmocka_unit_test(the_same_report_is_the_same_page),
        cmocka_unit_test_teardown(the_locale_does_not_matter, use_c_numbers),
        cmocka_unit_test(every_pair_of_colours_has_the_contrast_of_level_aa),
        cmocka_unit_test(a_report_that_lacks_something_is_refused),
    };

    return cmocka_run_group_tests_name("page", tests, NULL, NULL);
}
