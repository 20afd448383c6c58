/* SPDX-License-Identifier: MIT */
/* test_text_report.c - the printed report: its layout, its width, and what names cannot do to it. */
#include <stdarg.h>
#include <stddef.h>
#include <setjmp.h>
#include <stdint.h>

#include <cmocka.h>

#include "output/plain_text_internal.h"
#include "output/render.h"

#include <locale.h>
#include <math.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>

static char *rendered(const report *r, render_style style)
{
    char *text = NULL;
    size_t size = 0;
    FILE *out = open_memstream(&text, &size);

    assert_non_null(out);
    assert_int_equal(render_text(r, &style, out, NULL), BC_OK);
    assert_int_equal(fclose(out), 0);
    return text;
}

static void assert_renders(const report *r, const char *wanted)
{
    char *text = rendered(r, (render_style){0});

    assert_string_equal(text, wanted);
    free(text);
}

static void assert_says(const report *r, render_style style, const char *wanted)
{
    char *text = rendered(r, style);

    if (strstr(text, wanted) == NULL)
        fail_msg("\"%s\" is not in:\n%s", wanted, text);
    free(text);
}

static void assert_is_silent_on(const report *r, render_style style, const char *unwanted)
{
    char *text = rendered(r, style);

    if (strstr(text, unwanted) != NULL)
        fail_msg("\"%s\" is in:\n%s", unwanted, text);
    free(text);
}

/* Every line fits, and none ends in a space. */
static void assert_fits(const report *r, int width)
{
    char *text = rendered(r, (render_style){.width = width});

    for (const char *line = text; *line != '\0';) {
        const size_t bytes = strcspn(line, "\n");

        if (plain_columns(line, bytes) > width || (bytes > 0 && line[bytes - 1] == ' '))
            fail_msg("a line of %d columns: \"%.*s\"", plain_columns(line, bytes), (int)bytes, line);
        line += bytes + (line[bytes] == '\n');
    }
    free(text);
}

typedef struct {
    const char *id, *label, *unit, *method, *note;
    double value, u;
} figure;

static void add(report *r, size_t section, size_t gas, figure f)
{
    char id[32], label[256], unit[32], method[64], note[128];
    const report_result result = {.id = id,
                                  .label = label,
                                  .unit = unit,
                                  .method = method,
                                  .note = f.note == NULL ? NULL : note,
                                  .section = section,
                                  .gas = gas,
                                  .value = f.value,
                                  .has_uncertainty = f.u > 0.0,
                                  .uncertainty = f.u,
                                  .digits = 6};

    snprintf(id, sizeof id, "%s", f.id);
    snprintf(label, sizeof label, "%s", f.label);
    snprintf(unit, sizeof unit, "%s", f.unit);
    snprintf(method, sizeof method, "%s", f.method);
    snprintf(note, sizeof note, "%s", f.note == NULL ? "" : f.note);
    report_add_result(r, &result);
}

#define ISO "ISO 6976:2016"

static const figure HHV = {"hhv", "Superior heating value", "MJ/m3", ISO, NULL, 39.73512, 0.0131};
static const figure MOLE = {"hhv-mole", "Molar heating value", "kJ/mol", ISO, NULL, 892.9237, 0.194};
static const figure DENSITY = {"relative-density", "Relative density", "1", ISO, NULL, 0.612345, 0.0};

static int set_up(void **state)
{
    report *r = calloc(1, sizeof *r);

    if (r == NULL)
        return 1;
    report_open(r, "0.1.0", "sheet", "Gas property sheet");
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

static const char TITLE[] =
    "Gas property sheet                                                bluecone 0.1.0\n";

/* Compares what follows the title. */
static void assert_body(const report *r, const char *wanted)
{
    char *whole = NULL;
    size_t size = 0;
    FILE *out = open_memstream(&whole, &size);

    assert_non_null(out);
    fprintf(out, "%s%s", TITLE, wanted);
    assert_int_equal(fclose(out), 0);
    assert_renders(r, whole);
    free(whole);
}

static void one_gas_has_its_figures_point_under_point_with_uncertainty(void **state)
{
    report *r = *state;
    const size_t gas = report_add_gas(r, "Works supply", "works.ini", 0.9987);
    const size_t section = report_add_section(r, "heat", "Heating values");
    char line[] = "combustion 15 C, metering 15 C at 101.325 kPa, dry";

    report_set_state(r, &(report_state){.present = true, .text = line});
    report_add_section(r, "none", "A section without results");
    add(r, section, gas, HHV);
    add(r, section, gas, MOLE);
    add(r, section, gas, DENSITY);
    assert_body(r, "\n"
                   "State:   combustion 15 C, metering 15 C at 101.325 kPa, dry\n"
                   "Gas:     Works supply\n"
                   "         works.ini\n"
                   "\n"
                   "Heating values                                                     ISO 6976:2016\n"
                   "  Superior heating value   39.735     MJ/m3   u 0.013\n"
                   "  Molar heating value     892.92      kJ/mol  u 0.19\n"
                   "  Relative density          0.612345\n"
                   "\n"
                   "u: standard uncertainty (k = 1), in the unit of its row;\n"
                   "   from input and tables, that of the method is not in it\n");
}

static void several_gases_stand_side_by_side_and_lack_what_they_lack(void **state)
{
    report *r = *state;
    const size_t a = report_add_gas(r, "Works supply, June", "Works supply, June", 1.0);
    const size_t b = report_add_gas(r, "LNG", "lng.ini", 1.0);
    const size_t section = report_add_section(r, "heat", "Heating values");

    add(r, section, a, HHV);
    add(r, section, b, HHV);
    add(r, section, b, MOLE);
    assert_body(r, "\n"
                   "Gas A:   Works supply, June\n"
                   "Gas B:   LNG\n"
                   "         lng.ini\n"
                   "\n"
                   "Heating values                                                     ISO 6976:2016\n"
                   "                                             A        B\n"
                   "                                  Works supply      LNG\n"
                   "  ----------------------  ------  ------------  -------\n"
                   "  Superior heating value  MJ/m3         39.735   39.735\n"
                   "  Molar heating value     kJ/mol         -      892.92\n");
}

static void many_gases_go_on_in_further_blocks(void **state)
{
    report *r = *state;
    const size_t section = report_add_section(r, "heat", "Heating values");

    for (size_t i = 0; i < 30; i++) {
        char name[64];

        snprintf(name, sizeof name, "Gas of supplier %zu", i);
        add(r, section, report_add_gas(r, name, "file.ini", 1.0), HHV);
        add(r, section, i, MOLE);
    }
    assert_fits(r, 80);
    assert_fits(r, 132);
    assert_says(r, (render_style){0}, "Gas AD:  Gas of supplier 29\n");
    assert_says(r, (render_style){0}, " AD\n");      /* the last block ends with the last gas */
    assert_says(r, (render_style){0}, " Gas of\n"); /* names are cut between words */
}

static void a_figure_given_twice_is_shown_twice(void **state)
{
    report *r = *state;
    const size_t a = report_add_gas(r, "A", "", 1.0), b = report_add_gas(r, "B", "", 1.0);
    const size_t section = report_add_section(r, "heat", "Heating values");
    figure other = HHV;

    other.value = 38.11;
    add(r, section, a, HHV);
    add(r, section, b, HHV);
    add(r, section, a, other);
    assert_says(r, (render_style){0},
                "Superior heating value  MJ/m3  39.735  39.735\n"
                "  Superior heating value  MJ/m3  38.110   -\n");
}

static void equal_notes_share_a_number_and_name_their_gases(void **state)
{
    report *r = *state;
    const size_t a = report_add_gas(r, "A", "", 1.0), b = report_add_gas(r, "B", "", 1.0);
    const size_t section = report_add_section(r, "heat", "Heating values");
    figure noted = HHV, noted_too = MOLE, other = DENSITY;

    noted.note = noted_too.note = "outside the range of the method";
    other.note = "of both";
    add(r, section, a, noted);
    add(r, section, b, HHV);
    add(r, section, a, noted_too);
    add(r, section, a, other);
    add(r, section, b, other);
    assert_says(r, (render_style){0}, "\n  Superior heating value [1]  MJ/m3");
    assert_says(r, (render_style){0}, "\n  Molar heating value [1]     kJ/mol");
    assert_says(r, (render_style){0}, "\n  Relative density [2]");
    assert_says(r, (render_style){0}, "\n  [1] A: outside the range of the method\n  [2] of both\n");
    assert_is_silent_on(r, (render_style){.quiet = true}, "[1]");
    assert_is_silent_on(r, (render_style){.quiet = true}, "outside");
}

static void methods_that_differ_stand_in_their_rows(void **state)
{
    report *r = *state;
    const size_t section = report_add_section(r, "heat", "Heating values");
    figure other = HHV;

    other.method = "enthalpies of formation";
    add(r, section, REPORT_NO_GAS, HHV);
    add(r, section, REPORT_NO_GAS, other);
    assert_says(r, (render_style){0},
                "\nHeating values\n"
                "  Superior heating value  39.735  MJ/m3  u 0.013  ISO 6976:2016\n"
                "  Superior heating value  39.735  MJ/m3  u 0.013  enthalpies of formation\n");
}

static void the_end_tells_checks_warnings_verdict_and_caution(void **state)
{
    report *r = *state;

    report_add_check(r, "routes", true, "both routes agree");
    report_add_check(r, "sum", false, "");
    report_add_warning(r, "The composition was normalised from 99.13 % to 100 %; this moves the "
                          "Wobbe index by 0.03 MJ/m3.");
    report_set_verdict(r, "not acceptable");
    report_set_caution(r, "licensed people only");
    assert_body(r, "\n"
                   "Checks\n"
                   "  ok      both routes agree\n"
                   "  FAILED  sum\n"
                   "\n"
                   "Warnings\n"
                   "  - The composition was normalised from 99.13 % to 100 %; this moves the Wobbe\n"
                   "    index by 0.03 MJ/m3.\n"
                   "\n"
                   "Verdict: not acceptable\n"
                   "Caution: licensed people only\n");
    assert_is_silent_on(r, (render_style){.quiet = true}, "Warnings");
    assert_says(r, (render_style){.quiet = true}, "Caution: licensed people only\n");
}

static void colour_is_used_only_when_asked_for(void **state)
{
    report *r = *state;

    report_add_check(r, "sum", false, "");
    report_set_verdict(r, "no");
    assert_is_silent_on(r, (render_style){0}, "\033");
    assert_says(r, (render_style){.color = true}, "\033[1mChecks\033[0m\n");
    assert_says(r, (render_style){.color = true}, "  \033[1;31mFAILED\033[0m  sum\n");
    assert_says(r, (render_style){.color = true}, "\033[1;31mVerdict:\033[0m \033[1;31mno\033[0m\n");
}

static size_t add_log(report *r)
{
    const size_t table = report_add_table(r, "log", "Log");

    report_add_column(r, table, "time", "Time", NULL);
    report_add_column(r, table, "hhv", "Superior heating value", "MJ/m3");
    report_add_column(r, table, "state", "State", NULL);
    report_add_text(r, table, "08:00");
    report_add_number(r, table, 37.7061, 2);
    report_add_text(r, table, "in spec");
    report_add_text(r, table, "09:00");
    report_add_number(r, table, 1137.7, -1);
    return table;
}

static void a_table_has_headings_units_and_aligned_numbers(void **state)
{
    report *r = *state;

    add_log(r);
    assert_body(r, "\n"
                   "Log\n"
                   "              Superior\n"
                   "  Time   heating value  State\n"
                   "                 MJ/m3\n"
                   "  -----  -------------  -------\n"
                   "  08:00          37.71  in spec\n"
                   "  09:00        1137.70\n");
}

static void a_wide_table_repeats_its_first_column(void **state)
{
    report *r = *state;
    const size_t table = report_add_table(r, "log", "Log");
    char id[16];

    for (int i = 0; i < 20; i++) {
        snprintf(id, sizeof id, "col-%d", i);
        report_add_column(r, table, id, id, "MJ/m3");
    }
    for (int i = 0; i < 60; i++)
        report_add_number(r, table, 1000.0 + i, 3);
    assert_fits(r, 80);
    assert_fits(r, 40);
    assert_says(r, (render_style){0}, "\n     col-0     col-8");
    assert_says(r, (render_style){0}, "\n  1040.000  1048.000");
}

static void long_words_in_cells_are_folded(void **state)
{
    report *r = *state;
    const size_t table = report_add_table(r, "sources", "Sources");
    char word[201];

    memset(word, 'w', sizeof word - 1);
    word[sizeof word - 1] = '\0';
    report_add_column(r, table, "id", "Id", NULL);
    report_add_column(r, table, "source", "Source", NULL);
    report_add_text(r, table, "methane");
    report_add_text(r, table,
                    "ISO 6976:2016, table 3: ideal molar heating values of components at "
                    "several temperatures of combustion");
    report_add_text(r, table, word);
    report_add_text(r, table, word);
    assert_fits(r, 80);
    assert_fits(r, 40);
}

static void text_of_any_length_keeps_to_the_width(void **state)
{
    report *r = *state;
    const size_t section = report_add_section(r, "heat", "Heating values");
    figure wide = HHV;
    char word[201];

    memset(word, 'w', sizeof word - 1);
    word[sizeof word - 1] = '\0';
    wide.label = word;
    wide.note = wide.method = "words that go on and on until no line holds them all, in a row";
    add(r, section, report_add_gas(r, word, word, 1.0), wide);
    add(r, section, 0, MOLE);
    report_add_warning(r, word);
    report_add_check(r, word, false, word);
    report_set_verdict(r, word);
    assert_fits(r, 80);
    assert_fits(r, 60);
    add(r, section, report_add_gas(r, word, word, 1.0), wide);
    assert_fits(r, 80);
    assert_fits(r, 60);
}

static void names_cannot_carry_control_characters_to_the_terminal(void **state)
{
    report *r = *state;

    report_add_gas(r,
                   "a\033[2Jb\rc\nd\x7F"
                   "e",
                   "\xC2\x9B"
                   "31m \xE2\x80\xAE 12",
                   1.0);
    report_add_warning(r, "\xFF\xC0\x9B");
    report_set_verdict(r, "\033]0;title\a");
    assert_body(r, "\n"
                   "Gas:     a?[2Jb?c?d?e\n"
                   "         ?31m ? 12\n"
                   "\n"
                   "Warnings\n"
                   "  - ???\n"
                   "\n"
                   "Verdict: ?]0;title?\n");
}

static void letters_beyond_ascii_take_one_column_each(void **state)
{
    report *r = *state;
    const size_t section = report_add_section(r, "heat", "Heating values");
    figure umlauts = HHV;

    umlauts.label = "\xC3\xBC\xC3\xBC\xC3\xBC";
    add(r, section, REPORT_NO_GAS, HHV);
    add(r, section, REPORT_NO_GAS, umlauts);
    assert_says(r, (render_style){0}, "\n  \xC3\xBC\xC3\xBC\xC3\xBC                     39.735");
}

static void digits_asked_for_outweigh_the_uncertainty(void **state)
{
    report *r = *state;

    add(r, report_add_section(r, "heat", "Heating values"), REPORT_NO_GAS, HHV);
    assert_says(r, (render_style){.digits = 4}, "  Superior heating value  39.74  MJ/m3  u 0.013\n");
}

static void neither_nan_nor_locale_reaches_the_page(void **state)
{
    report *r = *state;
    const size_t section = report_add_section(r, "heat", "Heating values");

    add(r, section, REPORT_NO_GAS, MOLE);
    add(r, section, REPORT_NO_GAS, DENSITY);
    r->results[1].value = nan("");
    setlocale(LC_ALL, "de_DE.UTF-8"); /* where it is missing, "C" does */
    assert_says(r, (render_style){0},
                "  Molar heating value  892.92  kJ/mol  u 0.19\n"
                "  Relative density       -\n");
}

#define TEXT_TEST(name) cmocka_unit_test_setup_teardown(name, set_up, tear_down)

int main(void)
{
    const struct CMUnitTest tests[] = {
        TEXT_TEST(one_gas_has_its_figures_point_under_point_with_uncertainty),
        TEXT_TEST(several_gases_stand_side_by_side_and_lack_what_they_lack),
        TEXT_TEST(many_gases_go_on_in_further_blocks),
        TEXT_TEST(a_figure_given_twice_is_shown_twice),
        TEXT_TEST(equal_notes_share_a_number_and_name_their_gases),
        TEXT_TEST(methods_that_differ_stand_in_their_rows),
        TEXT_TEST(the_end_tells_checks_warnings_verdict_and_caution),
        TEXT_TEST(colour_is_used_only_when_asked_for),
        TEXT_TEST(a_table_has_headings_units_and_aligned_numbers),
        TEXT_TEST(a_wide_table_repeats_its_first_column),
        TEXT_TEST(long_words_in_cells_are_folded),
        TEXT_TEST(text_of_any_length_keeps_to_the_width),
        TEXT_TEST(names_cannot_carry_control_characters_to_the_terminal),
        TEXT_TEST(letters_beyond_ascii_take_one_column_each),
        TEXT_TEST(digits_asked_for_outweigh_the_uncertainty),
        TEXT_TEST(neither_nan_nor_locale_reaches_the_page),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
