/* SPDX-License-Identifier: MIT */
/* test_text.c - likeness, folding, trimming and showing of words. */
#include "support.h"

#include "base/text.h"

static void edits_are_counted_as_by_hand(void **state)
{
    static const struct {
        const char *a, *b;
        size_t want;
        const char *why;
    } PAIRS[] = {
        {"kitten", "sitting", 3, "Levenshtein's usual example: two replaced, one inserted"},
        {"methane", "mehtane", 1, "neighbours swapped"},
        {"ca", "abc", 3, "optimal string alignment: no edit inside a swapped pair"},
        {"ethane", "methane", 1, "one inserted"},
        {"propane", "propene", 1, "one replaced"},
        {"wobbe", "", 5, "all removed"},
        {"", "", 0, "nothing"},
        {"flaw", "lawn", 2, "one removed, one inserted"},
        {"saturday", "sunday", 3, "two removed, one replaced"},
    };

    (void)state;
    for (size_t i = 0; i < COUNT(PAIRS); i++)
        if (bc_text_distance(PAIRS[i].a, PAIRS[i].b) != PAIRS[i].want)
            fail_msg("%s, %s: %zu edits, want %zu: %s", PAIRS[i].a, PAIRS[i].b, bc_text_distance(PAIRS[i].a, PAIRS[i].b),
                     PAIRS[i].want, PAIRS[i].why);
}

/* The definition, without a table: exponential, for words of a few letters. */
static size_t distance_by_definition(const char *a, size_t m, const char *b, size_t n)
{
    if (m == 0 || n == 0)
        return m + n;
    size_t best = distance_by_definition(a, m - 1, b, n) + 1;
    const size_t inserted = distance_by_definition(a, m, b, n - 1) + 1;
    const size_t replaced = distance_by_definition(a, m - 1, b, n - 1) + (a[m - 1] != b[n - 1]);

    best = inserted < best ? inserted : best;
    best = replaced < best ? replaced : best;
    if (m > 1 && n > 1 && a[m - 1] == b[n - 2] && a[m - 2] == b[n - 1]) {
        const size_t swapped = distance_by_definition(a, m - 2, b, n - 2) + 1;

        best = swapped < best ? swapped : best;
    }
    return best;
}

static void random_word(chance *c, char *word, size_t longest)
{
    const size_t n = chance_below(c, longest + 1);

    for (size_t i = 0; i < n; i++)
        word[i] = (char)('a' + chance_below(c, 3));
    word[n] = '\0';
}

static void distances_follow_their_definition_and_are_symmetric(void **state)
{
    chance c = {998877};

    (void)state;
    for (int i = 0; i < 3000; i++) {
        char a[8], b[8];

        random_word(&c, a, 6);
        random_word(&c, b, 6);
        const size_t want = distance_by_definition(a, strlen(a), b, strlen(b));

        if (bc_text_distance(a, b) != want || bc_text_distance(b, a) != want || bc_text_distance(a, a) != 0)
            fail_msg("'%s' and '%s': want %zu edits", a, b, want);
    }
}

static void words_over_the_limit_are_as_far_as_can_be(void **state)
{
    char longest[BC_WORD_MAX + 1], longer[BC_WORD_MAX + 2];

    (void)state;
    memset(longest, 'q', BC_WORD_MAX);
    longest[BC_WORD_MAX] = '\0';
    memset(longer, 'q', BC_WORD_MAX + 1);
    longer[BC_WORD_MAX + 1] = '\0';
    assert_int_equal(bc_text_distance(longest, longest), 0);
    assert_int_equal(bc_text_distance(longest, "q"), BC_WORD_MAX - 1);
    assert_int_equal(bc_text_distance(longest, longer), BC_WORD_MAX);
    assert_int_equal(bc_text_distance(longer, longer), BC_WORD_MAX);
}

static void case_blanks_hyphens_and_underscores_do_not_matter(void **state)
{
    (void)state;
    assert_true(bc_text_same("n-Butane", "N BUTANE"));
    assert_true(bc_text_same("carbon_dioxide", " carbon dioxide "));
    assert_true(bc_text_same("--", ""));
    assert_false(bc_text_same("butane", "butanes"));
    assert_false(bc_text_same("butanes", "butane"));
    assert_false(bc_text_same("n,butane", "nbutane"));
}

static void two_words_are_the_same_exactly_when_they_fold_alike(void **state)
{
    static const char LETTERS[] = "aAbB-_ \t";
    chance c = {424243};

    (void)state;
    for (int i = 0; i < 20000; i++) {
        char word[2][8], folded[2][8];

        for (int k = 0; k < 2; k++) {
            const size_t n = chance_below(&c, 7);

            for (size_t j = 0; j < n; j++)
                word[k][j] = LETTERS[chance_below(&c, sizeof LETTERS - 1)];
            word[k][n] = '\0';
            assert_true(bc_text_fold(folded[k], sizeof folded[k], word[k]));
        }
        if (bc_text_same(word[0], word[1]) != (strcmp(folded[0], folded[1]) == 0))
            fail_msg("'%s' and '%s'", word[0], word[1]);
    }
}

static void folding_refuses_what_does_not_fit(void **state)
{
    char to[5];

    (void)state;
    assert_true(bc_text_fold(to, sizeof to, "C-4 h_1"));
    assert_string_equal(to, "c4h1");
    assert_false(bc_text_fold(to, sizeof to, "C4H10"));
    assert_true(bc_text_fold(to, sizeof to, "- - -"));
    assert_string_equal(to, "");
}

static void copying_trims_both_ends_and_checks_the_room(void **state)
{
    char to[6] = "kept";

    (void)state;
    assert_false(bc_text_copy(to, sizeof to, "  butane ", 9));
    assert_string_equal(to, "kept");
    assert_true(bc_text_copy(to, sizeof to, " \t butyl \r\n", 11));
    assert_string_equal(to, "butyl");
    assert_true(bc_text_copy(to, sizeof to, "methane", 4));
    assert_string_equal(to, "meth");
    assert_true(bc_text_copy(to, sizeof to, "   ", 3));
    assert_string_equal(to, "");
}

static void showing_hides_control_characters_and_ends_long_texts_in_dots(void **state)
{
    char to[10];

    (void)state;
    bc_text_show(to, sizeof to, "a\x1b[1m\x7f\n");
    assert_string_equal(to, "a?[1m??");
    bc_text_show(to, sizeof to, "ninebytes");
    assert_string_equal(to, "ninebytes");
    bc_text_show(to, sizeof to, "ten bytes!");
    assert_string_equal(to, "ten by...");
}

static void a_candidate_is_suggested_only_when_it_is_near(void **state)
{
    char hint[BC_HINT_MAX];

    (void)state;
    assert_true(bc_text_is_near("hvh", "hhv"));            /* two letters swapped */
    assert_false(bc_text_is_near("foo", "flow"));          /* two of three letters */
    assert_true(bc_text_is_near("whobbe", "wobbe-gross")); /* the beginning, and two letters */
    assert_false(bc_text_is_near("compare", "contract"));
    assert_false(bc_text_is_near("natural-gas", "water-gas")); /* four letters of eleven, the first among them */
    assert_true(bc_text_is_near("ehtane", "ethane"));
    bc_text_suggest(hint, sizeof hint, "the nearest is", "gett", "get");
    assert_string_equal(hint, "; the nearest is 'get'");
    bc_text_suggest(hint, sizeof hint, "the nearest is", "pipeline-h", "sheet");
    assert_string_equal(hint, "");
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(edits_are_counted_as_by_hand),
        cmocka_unit_test(distances_follow_their_definition_and_are_symmetric),
        cmocka_unit_test(words_over_the_limit_are_as_far_as_can_be),
        cmocka_unit_test(case_blanks_hyphens_and_underscores_do_not_matter),
        cmocka_unit_test(two_words_are_the_same_exactly_when_they_fold_alike),
        cmocka_unit_test(folding_refuses_what_does_not_fit),
        cmocka_unit_test(copying_trims_both_ends_and_checks_the_room),
        cmocka_unit_test(showing_hides_control_characters_and_ends_long_texts_in_dots),
        cmocka_unit_test(a_candidate_is_suggested_only_when_it_is_near),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
