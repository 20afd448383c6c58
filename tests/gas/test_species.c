/* SPDX-License-Identifier: MIT */
/* test_species.c - the species table against itself, and the words a certificate may use. */
#include "support.h"

#include "bluecone/species.h"
#include "gas/species_index.h"

#include <strings.h>

static void assert_finds(const char *word, const char *want)
{
    size_t index = 0;
    bc_error err;

    assert_ok(bc_species_find(word, &index, &err), &err);
    if (strcmp(bc_species_id(index), want) != 0)
        fail_msg("'%s' is found as %s, not %s", word, bc_species_id(index), want);
}

static void assert_finds_none(const char *word, const char *words)
{
    size_t index = 4711;
    bc_error err = {.status = BC_OK};

    assert_refused_at(word, bc_species_find(word, &index, &err), &err, BC_ERR_INPUT, words);
    assert_int_equal(index, 4711);
    assert_int_equal(bc_species_find(word, &index, NULL), BC_ERR_INPUT);
}

/* Molar masses as the two editions of ISO 6976 print them, g/mol. */
static const struct {
    size_t species;
    double mass;
} MASSES_2016[] = {
#define ISO2016_HEAT(symbol, m, h0, h15, h60f, h20, h25, u, source) {SPECIES_##symbol, m},
#include "data/iso6976_2016_heat.def"
}, MASSES_1995[] = {
#define ISO1995(symbol, m, h0, h15, h20, h25, z0, z15, z20, b0, b15, b20, source) {SPECIES_##symbol, m},
#include "data/iso6976_1995.def"
};

static void molar_masses_from_atoms_are_those_that_the_2016_table_lists(void **state)
{
    (void)state;
    assert_int_equal(COUNT(MASSES_2016), 60); /* components of the edition */
    for (size_t i = 0; i < COUNT(MASSES_2016); i++)
        assert_within_at(bc_species_id(MASSES_2016[i].species), 1e3 * bc_species_molar_mass_kg_per_mol(MASSES_2016[i].species),
                         MASSES_2016[i].mass, 0.5e-5); /* half of the last printed digit */
}

/* The 1995 edition: its atomic masses (C 12.011, S 32.066, N 14.00674) differ from those of 2016 by at most
 * 0.001 for sulfur and 0.0003 for carbon, and its masses are rounded to 0.001. */
static void molar_masses_from_atoms_are_those_of_1995_within_its_older_atomic_masses(void **state)
{
    (void)state;
    assert_int_equal(COUNT(MASSES_1995), 55);
    for (size_t i = 0; i < COUNT(MASSES_1995); i++) {
        const size_t s = MASSES_1995[i].species;
        const double older = 3e-4 * bc_species_atoms(s, BC_C) + 1e-3 * bc_species_atoms(s, BC_S) + 1e-4 * bc_species_atoms(s, BC_N);

        assert_within_at(bc_species_id(s), 1e3 * bc_species_molar_mass_kg_per_mol(s), MASSES_1995[i].mass, 0.0005 + older);
    }
}

static void atomic_masses_are_the_abridged_ones_of_iupac(void **state)
{
    /* IUPAC abridged standard atomic weights 2021 (Prohaska et al., Pure Appl. Chem. 94 (2022) 573); tolerance: their
     * last digit, or the interval of the natural variation for H, C, N, O, S */
    static const struct {
        const char *symbol;
        double mass, tolerance;
    } ROWS[] = {{"C", 12.011, 0.002},  {"H", 1.0080, 0.0002}, {"N", 14.007, 0.001},   {"O", 15.999, 0.001},
                {"S", 32.06, 0.02},    {"He", 4.0026, 0.0001}, {"Ne", 20.180, 0.001}, {"Ar", 39.95, 0.16}};

    (void)state;
    for (size_t i = 0; i < BC_ELEMENTS; i++) {
        assert_string_equal(bc_element_symbol((bc_element)i), ROWS[i].symbol);
        assert_within_at(ROWS[i].symbol, bc_element_mass_g_per_mol((bc_element)i), ROWS[i].mass, ROWS[i].tolerance);
        assert_true(bc_element_mass_u_g_per_mol((bc_element)i) > 0.0);
        assert_true(strlen(bc_element_source((bc_element)i)) > 5);
    }
}

/* Counts of atoms read back from the formula, which is written apart from them. */
static void count_formula(const char *formula, int atoms[BC_ELEMENTS])
{
    while (*formula != '\0') {
        size_t element = BC_ELEMENTS;
        size_t length = 0;

        for (size_t k = 0; k < BC_ELEMENTS; k++) {
            const char *symbol = bc_element_symbol((bc_element)k);

            if (strncmp(formula, symbol, strlen(symbol)) == 0 && strlen(symbol) > length) {
                element = k;
                length = strlen(symbol);
            }
        }
        assert_true(element < BC_ELEMENTS);
        char *end = NULL;
        const long n = strtol(formula + length, &end, 10);

        atoms[element] += end == formula + length ? 1 : (int)n;
        formula = end;
    }
}

static void formulas_and_atom_counts_agree(void **state)
{
    (void)state;
    for (size_t i = 0; i < bc_species_count(); i++) {
        int atoms[BC_ELEMENTS] = {0};

        count_formula(bc_species_formula(i), atoms);
        for (size_t k = 0; k < BC_ELEMENTS; k++)
            if (atoms[k] != bc_species_atoms(i, (bc_element)k))
                fail_msg("%s: formula %s has %d atoms of element %zu, the table %d", bc_species_id(i), bc_species_formula(i), atoms[k], k,
                         bc_species_atoms(i, (bc_element)k));
    }
}

/* CAS numbers end in a check digit: the digits before it weighted 1, 2, 3 ... from the right, modulo 10. */
static bool is_cas(const char *cas)
{
    int digits[12];
    int n = 0;
    int sum = 0;

    for (; *cas != '\0'; cas++)
        if (*cas >= '0' && *cas <= '9' && n < 12)
            digits[n++] = *cas - '0';
    for (int i = 0; i < n - 1; i++)
        sum += digits[i] * (n - 1 - i);
    return n > 4 && sum % 10 == digits[n - 1];
}

static void every_row_has_a_valid_cas_number_a_name_and_a_source(void **state)
{
    (void)state;
    assert_in_range(bc_species_count(), 65, BC_SPECIES_CAPACITY);
    for (size_t i = 0; i < bc_species_count(); i++) {
        if (!is_cas(bc_species_cas(i)))
            fail_msg("%s: %s is no CAS number", bc_species_id(i), bc_species_cas(i));
        assert_true(strlen(bc_species_name(i)) > 2);
        assert_true(strlen(bc_species_source(i)) > 5);
    }
}

static void ids_and_cas_numbers_are_unique(void **state)
{
    (void)state;
    for (size_t i = 0; i < bc_species_count(); i++)
        for (size_t j = 0; j < i; j++) {
            assert_string_not_equal(bc_species_id(i), bc_species_id(j));
            assert_string_not_equal(bc_species_cas(i), bc_species_cas(j));
        }
}

static void every_species_answers_to_its_id_and_its_name(void **state)
{
    (void)state;
    for (size_t i = 0; i < bc_species_count(); i++) {
        assert_finds(bc_species_id(i), bc_species_id(i));
        assert_finds(bc_species_name(i), bc_species_id(i));
    }
}

static void every_alias_finds_its_species(void **state)
{
    size_t species = 0;
    size_t n = 0;

    (void)state;
    for (const char *alias = bc_species_alias(0, &species); alias != NULL; alias = bc_species_alias(++n, &species))
        assert_finds(alias, bc_species_id(species));
    assert_in_range(n, 100, 1000);
}

static void words_of_the_trade_are_understood(void **state)
{
    static const struct {
        const char *word, *id;
    } ROWS[] = {
        {"CH4", "methane"},       {"nC4", "n-butane"},        {"i-butane", "isobutane"}, {"2-Methyl Propane", "isobutane"},
        {"iC5", "isopentane"},    {"neo-C5H12", "neopentane"}, {"CO2", "carbon-dioxide"}, {"Carbon_Dioxide", "carbon-dioxide"},
        {"N2", "nitrogen"},       {"H2S", "hydrogen-sulfide"}, {"hydrogen sulphide", "hydrogen-sulfide"},
        {"ethylene", "ethene"},   {"propylene", "propene"},    {"acetylene", "ethyne"},   {"1,3-butadiene", "1-3-butadiene"},
        {"steam", "water"},       {"n-C6H14", "n-hexane"},     {"COS", "carbonyl-sulfide"}, {"methyl mercaptan", "methanethiol"},
    };

    (void)state;
    for (size_t i = 0; i < COUNT(ROWS); i++)
        assert_finds(ROWS[i].word, ROWS[i].id);
}

static void a_formula_of_several_species_names_all_of_them(void **state)
{
    static const char *const ASKED[] = {"C4H10", "c5h12", "C6H14", "C4H8", "C3H4", "C8H10", "C2H6O"};

    (void)state;
    for (size_t k = 0; k < COUNT(ASKED); k++) {
        bc_error err;
        size_t index = 0;
        size_t count = 0;

        assert_int_equal(bc_species_find(ASKED[k], &index, &err), BC_ERR_INPUT);
        assert_non_null(strstr(err.message, "formula of several species"));
        for (size_t i = 0; i < bc_species_count(); i++)
            if (strcasecmp(bc_species_formula(i), ASKED[k]) == 0) {
                count++;
                if (strstr(err.message, bc_species_id(i)) == NULL)
                    fail_msg("%s: %s is not in: %s", ASKED[k], bc_species_id(i), err.message);
            }
        assert_true(count > 1);
    }
}

static void an_unknown_word_suggests_the_nearest_one(void **state)
{
    (void)state;
    assert_finds_none("methan", "unknown component 'methan'|'methane'|bluecone list species");
    assert_finds_none("mehtane", "'methane'");
    assert_finds_none("carbondioxid", "'carbon-dioxide'");
    assert_finds_none("hydorgen", "'hydrogen'");
    assert_finds_none("wasser\x1b[0m", "unknown component 'wasser?[0m'");
}

static void no_word_and_an_endless_one_are_refused(void **state)
{
    char endless[300];

    (void)state;
    memset(endless, 'm', sizeof endless);
    endless[sizeof endless - 1] = '\0';
    assert_finds_none("", "empty or longer");
    assert_finds_none(" -_ ", "empty or longer");
    assert_finds_none(endless, "longer than 63");
}

static void an_index_beyond_the_table_is_an_empty_species(void **state)
{
    size_t species = 0;

    (void)state;
    assert_string_equal(bc_species_id(bc_species_count()), "");
    assert_string_equal(bc_species_source(SIZE_MAX), "");
    assert_int_equal(bc_species_atoms(bc_species_count(), BC_H), 0);
    assert_within(bc_species_molar_mass_kg_per_mol(bc_species_count()), 0.0, 0.0);
    assert_null(bc_species_alias(SIZE_MAX, &species));
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(molar_masses_from_atoms_are_those_that_the_2016_table_lists),
        cmocka_unit_test(molar_masses_from_atoms_are_those_of_1995_within_its_older_atomic_masses),
        cmocka_unit_test(atomic_masses_are_the_abridged_ones_of_iupac),
        cmocka_unit_test(formulas_and_atom_counts_agree),
        cmocka_unit_test(every_row_has_a_valid_cas_number_a_name_and_a_source),
        cmocka_unit_test(ids_and_cas_numbers_are_unique),
        cmocka_unit_test(every_species_answers_to_its_id_and_its_name),
        cmocka_unit_test(every_alias_finds_its_species),
        cmocka_unit_test(words_of_the_trade_are_understood),
        cmocka_unit_test(a_formula_of_several_species_names_all_of_them),
        cmocka_unit_test(an_unknown_word_suggests_the_nearest_one),
        cmocka_unit_test(no_word_and_an_endless_one_are_refused),
        cmocka_unit_test(an_index_beyond_the_table_is_an_empty_species),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
