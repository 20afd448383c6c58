/* SPDX-License-Identifier: MIT */
/* test_surroundings.c - the library in a program: it writes to no stream and minds no locale. */
#include "library/exercise.h"

#include "support.h"

#define EXAMPLES BC_SOURCE_DIR "/examples/"
#define SENTENCES 40

static exercise_of exercised;
static exercise_row plain, german;

/* Sentences that the library said, in the order in which they came. */
typedef struct {
    size_t count;
    char text[SENTENCES][BC_MESSAGE_MAX];
} said;

static void keep(said *s, const char *sentence)
{
    if (sentence[0] != '\0' && s->count < SENTENCES)
        (void)snprintf(s->text[s->count++], BC_MESSAGE_MAX, "%s", sentence);
}

static void keep_refusal(said *s, bc_status status, const bc_error *err)
{
    if (status != BC_OK)
        keep(s, err->message);
}

/* A composition that is read or refused: its remarks, or the refusal. */
static void read_text(said *s, const char *path, const char *literal)
{
    static bc_composition c;
    bc_error err;
    const bc_status status = path ? bc_composition_read(path, &c, &err) : bc_composition_parse(literal, &c, &err);

    keep_refusal(s, status, &err);
    for (size_t i = 0; status == BC_OK && i < c.remark_count; i++)
        keep(s, c.remarks[i]);
}

/* Files for each way to fail, words, and texts that hold numbers. */
static void say_all(said *s)
{
    static const char *const BAD[] = {"[components]\nmethane = 92,5\n", "[components]\nmethane = 71.37\n", "[components\nmethane\n= 3\n",
                                      "[cut c6+]\nn-hexane = 30.5\nn-octane = 69.5\n[components]\nc6+ = 1.5\nmethane = 98.5\n"};
    static bc_contract contract;
    bc_state state = {15.0, 15.0, 101559.8, false, 2016};
    bc_burner burner = bc_burner_default();
    bc_error err;
    double number = 0.0;
    char text[BC_MESSAGE_MAX];

    s->count = 0;
    read_text(s, EXAMPLES "digester-gas.ini", NULL);
    read_text(s, "/nowhere/gas.ini", NULL);
    read_text(s, "/", NULL);
    for (size_t i = 0; i < COUNT(BAD); i++)
        read_text(s, write_scratch(BAD[i], strlen(BAD[i])), NULL);
    read_text(s, NULL, "methane=92.5,ethane=17.25");
    read_text(s, NULL, "volume:methane=92.25,ethane=7.5");
    keep_refusal(s, bc_contract_read(EXAMPLES "kiln.ini", &contract, &err), &err);
    keep_refusal(s, bc_burner_read(EXAMPLES "contract-marrowfen.ini", &burner, &err), &err);
    keep_refusal(s, bc_state_parse("15/31.5", &state, &err), &err);
    keep_refusal(s, bc_thermo_enthalpy(3, 6000.5, &number, &err), &err);
    bc_state_describe(&state, text, sizeof text);
    keep(s, text);
    for (size_t i = 0; i < bc_burner_key_count(); i++) {
        bc_burner_key_text(&burner, i, text, sizeof text);
        keep(s, text);
    }
}

static void nothing_is_written_to_a_stream(void **state)
{
    static said sentences;
    bc_error err;
    char path[80];

    (void)state;
    assert_ok(exercise_load(EXAMPLES "present-supply.ini", &exercised, &err), &err);
    (void)snprintf(path, sizeof path, "%s.out", scratch_path());
    (void)fflush(stdout);
    const int kept_out = dup(STDOUT_FILENO);
    const int out = open(path, O_RDWR | O_CREAT | O_TRUNC, 0600);

    assert_true(kept_out >= 0 && out >= 0);
    (void)unlink(path);
    const int kept_err = hold_stderr();
    const bool held = dup2(out, STDOUT_FILENO) >= 0;

    exercise(&exercised, &plain);
    say_all(&sentences);
    (void)fflush(stdout);
    const bool restored = dup2(kept_out, STDOUT_FILENO) >= 0;

    assert_stderr_silent(kept_err, "library");
    assert_true(held && restored);
    assert_int_equal(lseek(out, 0, SEEK_END), 0);
    (void)close(out);
    (void)close(kept_out);
    assert_true(sentences.count >= 15 && plain.failures > 0);
}

static void a_german_locale_changes_no_number_and_no_sentence(void **state)
{
    static said in_c, in_german;
    bc_error err;
    size_t marks = 0;

    (void)state;
    assert_ok(exercise_load(EXAMPLES "new-supply-offer.ini", &exercised, &err), &err);
    exercise(&exercised, &plain);
    say_all(&in_c);
    use_german_numbers();
    assert_ok(exercise_load(EXAMPLES "new-supply-offer.ini", &exercised, &err), &err);
    exercise(&exercised, &german);
    say_all(&in_german);
    assert_int_equal(in_german.count, in_c.count);
    assert_int_equal(german.count, plain.count);
    assert_memory_equal(german.number, plain.number, plain.count * sizeof *plain.number);
    for (size_t i = 0; i < in_c.count; i++) {
        assert_string_equal(in_german.text[i], in_c.text[i]);
        for (const char *p = in_c.text[i]; p[0] != '\0' && p[1] != '\0'; p++)
            marks += *p == '.' && p[1] >= '0' && p[1] <= '9';
    }
    assert_true(marks >= 8); /* so many decimal points could have been commas */
    assert_string_equal(localeconv()->decimal_point, ","); /* and the locale is the program's still */
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(nothing_is_written_to_a_stream),
        cmocka_unit_test_teardown(a_german_locale_changes_no_number_and_no_sentence, use_c_numbers),
    };

    return cmocka_run_group_tests_name("surroundings", tests, NULL, remove_scratch);
}
