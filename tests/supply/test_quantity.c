/* SPDX-License-Identifier: MIT */
/* test_quantity.c - quantities by id: complete, finite, in their unit; the gap between the two heating-value routes. */
#include "support.h"

#include "bluecone/composition.h"
#include "bluecone/formation.h"
#include "bluecone/quantity.h"
#include "bluecone/units.h"
#include "gas/species_index.h"

#define BUNDLED BC_SOURCE_DIR "/compositions"

/* Every quantity of ISO 6976 and the figure of bc_value that it is, in SI. */
static const struct {
    const char *id, *si;
    size_t field;
} FIELDS[] = {
    {"hhv", "J/m3", offsetof(bc_value, gross_j_per_m3)},
    {"lhv", "J/m3", offsetof(bc_value, net_j_per_m3)},
    {"wobbe-gross", "J/m3", offsetof(bc_value, wobbe_gross_j_per_m3)},
    {"wobbe-net", "J/m3", offsetof(bc_value, wobbe_net_j_per_m3)},
    {"density", "kg/m3", offsetof(bc_value, density_kg_per_m3)},
    {"relative-density", "1", offsetof(bc_value, relative_density)},
    {"z", "1", offsetof(bc_value, z)},
    {"molar-volume", "m3/mol", offsetof(bc_value, molar_volume_m3_per_mol)},
    {"molar-mass", "kg/mol", offsetof(bc_value, molar_mass_kg_per_mol)},
    {"hhv-mole", "J/mol", offsetof(bc_value, gross_j_per_mol)},
    {"lhv-mole", "J/mol", offsetof(bc_value, net_j_per_mol)},
    {"hhv-mass", "J/kg", offsetof(bc_value, gross_j_per_kg)},
    {"lhv-mass", "J/kg", offsetof(bc_value, net_j_per_kg)},
    {"hhv-ideal", "J/m3", offsetof(bc_value, gross_ideal_j_per_m3)},
    {"lhv-ideal", "J/m3", offsetof(bc_value, net_ideal_j_per_m3)},
    {"wobbe-gross-ideal", "J/m3", offsetof(bc_value, wobbe_gross_ideal_j_per_m3)},
    {"wobbe-net-ideal", "J/m3", offsetof(bc_value, wobbe_net_ideal_j_per_m3)},
    {"density-ideal", "kg/m3", offsetof(bc_value, density_ideal_kg_per_m3)},
    {"relative-density-ideal", "1", offsetof(bc_value, relative_density_ideal)},
};

static double field(const bc_value *v, size_t offset)
{
    double value = 0.0;

    memcpy(&value, (const char *)v + offset, sizeof value);
    return value;
}

static bc_reference reference_at(const char *text)
{
    bc_state s = bc_state_default();
    bc_reference r;
    bc_error err;

    assert_ok(bc_state_parse(text, &s, &err), &err);
    assert_ok(bc_reference_at(&s, &r, &err), &err);
    return r;
}

static void make_subject(const char *literal, const bc_reference *r, bc_composition *c, bc_subject *subject)
{
    bc_error err;

    assert_ok(bc_composition_parse(literal, c, &err), &err);
    assert_ok(bc_subject_make(r, &c->gas, &c->spread, subject, &err), &err);
}

static bc_figure figure_of(const bc_subject *subject, const char *id)
{
    size_t index = 0;
    bc_figure figure;
    bc_error err;

    assert_ok(bc_quantity_find(id, &index, &err), &err);
    assert_ok(bc_quantity_evaluate(index, subject, &figure, &err), &err);
    return figure;
}

static void every_quantity_of_iso_6976_is_its_own_figure_in_its_own_unit(void **state)
{
    const bc_reference r = reference_at("25/0@98.7");
    bc_composition c;
    bc_subject subject;

    (void)state;
    make_subject("methane=71.3,ethane=11.7,propane=9.1,hydrogen=4.3,carbon-dioxide=3.6", &r, &c, &subject);
    for (size_t i = 0; i < COUNT(FIELDS); i++) {
        size_t index = 0;
        bc_unit unit, si;

        assert_int_equal(bc_quantity_find(FIELDS[i].id, &index, NULL), BC_OK);
        assert_int_equal(bc_unit_parse(bc_quantity_at(index)->unit, &unit, NULL), BC_OK);
        assert_int_equal(bc_unit_parse(FIELDS[i].si, &si, NULL), BC_OK);
        assert_true(bc_unit_matches(&unit, &si));
        const double want = field(&subject.value, FIELDS[i].field);

        assert_within_at(FIELDS[i].id, bc_unit_to_si(&unit, figure_of(&subject, FIELDS[i].id).value), want, 1e-13 * want);
    }
}

static void every_quantity_is_unique_and_explains_itself(void **state)
{
    (void)state;
    assert_true(bc_quantity_count() >= COUNT(FIELDS));
    for (size_t i = 0; i < bc_quantity_count(); i++) {
        const bc_quantity *q = bc_quantity_at(i);
        bc_unit unit;

        if (strlen(q->label) < 3 || strlen(q->meaning) < 10 || strlen(q->method) < 3 || q->group[0] == '\0')
            fail_msg("%s does not explain itself", q->id);
        assert_int_equal(bc_unit_parse(q->unit, &unit, NULL), BC_OK);
        for (size_t j = 0; j < i; j++) {
            assert_string_not_equal(q->id, bc_quantity_at(j)->id);
            assert_string_not_equal(q->label, bc_quantity_at(j)->label); /* a page shows the label alone */
        }
    }
    assert_null(bc_quantity_at(bc_quantity_count()));
}

static void ids_are_found_in_any_spelling_and_unknown_ones_suggest(void **state)
{
    size_t a = 0, b = 0;
    bc_error err = {.status = BC_OK};

    (void)state;
    assert_ok(bc_quantity_find("wobbe-gross", &a, &err), &err);
    assert_ok(bc_quantity_find("Wobbe_Gross", &b, &err), &err);
    assert_int_equal(a, b);
    assert_refused(bc_quantity_find("wobe-gross", &a, &err), &err, BC_ERR_USAGE, "unknown quantity 'wobe-gross'|'wobbe-gross'|bluecone list quantities");
    assert_refused(bc_quantity_find("desnity", &a, &err), &err, BC_ERR_USAGE, "'density'");
    assert_refused(bc_quantity_find("h\x1bhv", &a, &err), &err, BC_ERR_USAGE, "'h?hv'");
    assert_refused(bc_quantity_find("", &a, &err), &err, BC_ERR_USAGE, "unknown quantity");
    assert_int_equal(a, b);
}

/* "Hi" is the net heat of EN 437 and looks most like hhv, the gross one: the table must answer, not the likeness. */
static void words_of_the_trade_lead_to_the_quantity_they_mean(void **state)
{
    static const struct {
        const char *word, *told;
    } CASES[] = {
        {"Hi", "write 'lhv'"}, {"Hu", "write 'lhv'"}, {"ncv", "write 'lhv'"}, {"PCI", "write 'lhv'"}, {"net calorific value", "write 'lhv'"},
        {"Hs", "write 'hhv'"}, {"Ho", "write 'hhv'"}, {"GCV", "write 'hhv'"}, {"PCS", "write 'hhv'"}, {"higher-heating-value", "write 'hhv'"},
        {"calorific_value", "write 'hhv' (gross) or 'lhv' (net)"}, {"WI", "write 'wobbe-gross' or 'wobbe-net'"},
        {"LEL", "write 'lfl'"}, {"specific gravity", "write 'relative-density'"}, {"Compressibility", "write 'z'"},
    };
    size_t index = 0;

    (void)state;
    for (size_t i = 0; i < sizeof CASES / sizeof *CASES; i++) {
        bc_error err = {.status = BC_OK};

        assert_refused(bc_quantity_find(CASES[i].word, &index, &err), &err, BC_ERR_USAGE, CASES[i].told);
    }
}

/* Each id that the table of words names is a quantity, and no word of it is one: it would never be looked up. */
static void words_of_the_trade_name_quantities_that_there_are(void **state)
{
    static const struct {
        const char *word, *ids;
    } WORDS[] = {
#define TRADE_WORD(word, ids) {word, ids},
#include "data/trade_words.def"
    };
    size_t index = 0;

    (void)state;
    for (size_t i = 0; i < sizeof WORDS / sizeof *WORDS; i++) {
        bc_error err = {.status = BC_OK};
        char id[64];

        assert_true(bc_quantity_find(WORDS[i].word, &index, NULL) != BC_OK);
        for (const char *p = strchr(WORDS[i].ids, '\''); p; p = strchr(p + 2 + strlen(id), '\'')) {
            assert_int_equal(sscanf(p, "'%63[^']'", id), 1);
            assert_ok(bc_quantity_find(id, &index, &err), &err);
        }
    }
}

static void a_word_like_no_quantity_gets_no_suggestion(void **state)
{
    bc_error err = {.status = BC_OK};
    size_t index = 0;

    (void)state;
    assert_refused(bc_quantity_find("pipeline-h", &index, &err), &err, BC_ERR_USAGE, "unknown quantity 'pipeline-h' (bluecone list quantities)");
    assert_refused(bc_quantity_find("aga-lifting", &index, &err), &err, BC_ERR_USAGE, "compares two gases|bluecone switch");
}

static void an_index_beyond_the_list_is_refused(void **state)
{
    const bc_reference r = reference_at("15/15");
    bc_composition c;
    bc_subject subject;
    bc_figure f = {.value = 47.11};
    bc_error err = {.status = BC_OK};

    (void)state;
    make_subject("methane=100", &r, &c, &subject);
    assert_refused(bc_quantity_evaluate(bc_quantity_count(), &subject, &f, &err), &err, BC_ERR_USAGE, "no quantity");
    assert_within(f.value, 47.11, 0.0);
}

/* What a bundled gas must stand: every quantity is finite or refused with a reason, those of ISO 6976 never refused. */
static void evaluate_all(const char *name, const char *path, void *data)
{
    const bc_reference *r = data;
    bc_composition c;
    bc_subject subject;
    bc_error err;

    assert_ok(bc_composition_read(path, &c, &err), &err);
    assert_ok(bc_subject_make(r, &c.gas, &c.spread, &subject, &err), &err);
    for (size_t i = 0; i < bc_quantity_count(); i++) {
        bc_figure f;
        const bc_status status = bc_quantity_evaluate(i, &subject, &f, &err);
        const bool must = strcmp(bc_quantity_at(i)->method, "ISO 6976") == 0;

        if (status == BC_OK && isfinite(f.value) && isfinite(f.u) && f.u >= 0.0)
            continue;
        if (status != BC_ERR_RANGE || must || strlen(err.message) < 20)
            fail_msg("%s of %s: status %d, value %g, u %g", bc_quantity_at(i)->id, name, (int)status, f.value, f.u);
    }
}

static void every_quantity_of_every_bundled_gas_is_finite_or_refused_with_a_reason(void **state)
{
    static const char *const STATES[] = {"15/15", "25/0", "60F/60F@14.73psi", "37.3/17.9@93.1"};
    bc_error err;

    (void)state;
    for (size_t k = 0; k < COUNT(STATES); k++) {
        bc_reference r = reference_at(STATES[k]);

        assert_ok(bc_composition_each(BUNDLED, evaluate_all, &r, &err), &err);
    }
}

static void check_gap(const char *name, const char *path, void *data)
{
    const bc_reference *r = data;
    bc_composition c;
    bc_subject subject;
    bc_figure f;
    bc_error err;
    size_t index = 0;

    assert_ok(bc_composition_read(path, &c, &err), &err);
    assert_ok(bc_subject_make(r, &c.gas, NULL, &subject, &err), &err);
    assert_ok(bc_quantity_find("formation-gap", &index, &err), &err);
    const bc_status status = bc_quantity_evaluate(index, &subject, &f, &err);

    if (status == BC_ERR_RANGE) /* air does not burn */
        assert_true(subject.value.gross_j_per_mol < 100.0);
    else
        assert_within_at(name, f.value, 0.0, 0.2);
}

/* The values of a gas together, apart, and with their uncertainties: the same to the last bit. */
static void compare_all(const char *name, const char *path, void *data)
{
    const bc_reference *r = data;
    const size_t count = bc_quantity_count();
    bool wanted[256] = {false};
    double value[256];
    bc_composition c;
    bc_subject subject;
    bc_error err;

    assert_true(count < COUNT(wanted));
    assert_ok(bc_composition_read(path, &c, &err), &err);
    assert_ok(bc_subject_make(r, &c.gas, &c.spread, &subject, &err), &err);
    for (size_t i = 0; i < count; i++)
        wanted[i] = i % 7 != 3;
    bc_quantity_values(wanted, &subject, value);
    for (size_t i = 0; i < count; i++) {
        double alone = (double)NAN;
        bc_figure f = {.value = (double)NAN};
        const bool has = bc_quantity_value(i, &subject, &alone, &err) == BC_OK;

        if (!wanted[i] || !has)
            assert_true(isnan(value[i]));
        else
            assert_within_at(name, value[i], alone, 0.0);
        assert_int_equal(bc_quantity_evaluate(i, &subject, &f, &err) == BC_OK, has);
        assert_true(!has || (f.value >= alone && f.value <= alone));
    }
}

static void values_together_are_those_of_each_quantity_alone(void **state)
{
    static const char *const STATES[] = {"15/15", "25/0", "37.3/17.9@93.1"};
    bc_error err;

    (void)state;
    for (size_t k = 0; k < COUNT(STATES); k++) {
        bc_reference r = reference_at(STATES[k]);

        assert_ok(bc_composition_each(BUNDLED, compare_all, &r, &err), &err);
    }
}

/* What a subject keeps beside its gas, for gases with every element. */
static void a_subject_knows_its_atoms(void **state)
{
    const bc_reference r = reference_at("15/15");
    bc_composition c;
    bc_subject subject;

    (void)state;
    make_subject("methane=40,methanethiol=10,ammonia=10,carbon-dioxide=10,helium=10,neon=10,argon=10", &r, &c, &subject);
    for (int k = 0; k < BC_ELEMENTS; k++) {
        assert_within(subject.atoms[k], bc_gas_atoms(&subject.gas, (bc_element)k), 0.0);
        assert_true(subject.atoms[k] > 0.0);
    }
}

static void the_two_routes_to_the_heat_of_every_bundled_gas_agree_within_0_2_per_cent(void **state)
{
    static const char *const STATES[] = {"0/0", "15/15", "60F/60F", "20/20", "25/0"};
    bc_error err;

    (void)state;
    for (size_t k = 0; k < COUNT(STATES); k++) {
        bc_reference r = reference_at(STATES[k]);

        assert_ok(bc_composition_each(BUNDLED, check_gap, &r, &err), &err);
    }
}

static void shares_of_the_gap_add_up_to_it_and_name_the_component_to_blame(void **state)
{
    const bc_reference r = reference_at("25/0");
    double share[BC_SPECIES_CAPACITY];
    double sum = 0.0;
    size_t worst = 0;
    bc_composition c;
    bc_subject subject;

    (void)state;
    make_subject("methane=31,hydrogen=49,carbon-monoxide=11,hydrogen-cyanide=9", &r, &c, &subject);
    bc_gap_shares(&subject, share);
    for (size_t i = 0; i < BC_SPECIES_CAPACITY; i++) {
        sum += share[i];
        worst = fabs(share[i]) > fabs(share[worst]) ? i : worst;
    }
    assert_int_equal(worst, SPECIES_hydrogen_cyanide);
    assert_within(100.0 * sum, figure_of(&subject, "formation-gap").value, 1e-12);
    assert_true(fabs(figure_of(&subject, "formation-gap").value) > 0.03);
}

static void the_formation_route_is_a_route_of_its_own(void **state)
{
    const bc_reference r = reference_at("20/15");
    bc_composition c;
    bc_subject subject;
    double gross = 0.0, net = 0.0;

    (void)state;
    make_subject("propane=63.1,n-butane=36.9", &r, &c, &subject);
    assert_int_equal(bc_formation_gas(&c.gas, 293.15, &gross, &net, NULL), BC_OK);
    assert_within(figure_of(&subject, "hhv-formation").value, gross * 1e-3, 1e-9);
    assert_within(figure_of(&subject, "lhv-formation").value, net * 1e-3, 1e-9);
    assert_true(fabs(gross - subject.value.gross_j_per_mol) > 1e-3);
}

static void gases_without_a_figure_say_so(void **state)
{
    const bc_reference r = reference_at("15/15");
    bc_composition c;
    bc_subject subject;
    bc_figure f = {.value = 47.11};
    size_t gap = 0, ratio = 0;
    bc_error err = {.status = BC_OK};

    (void)state;
    assert_int_equal(bc_quantity_find("formation-gap", &gap, NULL), BC_OK);
    assert_int_equal(bc_quantity_find("hydrogen-carbon-ratio", &ratio, NULL), BC_OK);
    make_subject("nitrogen=83,argon=17", &r, &c, &subject);
    assert_refused(bc_quantity_evaluate(gap, &subject, &f, &err), &err, BC_ERR_RANGE, "does not burn");
    make_subject("hydrogen=83,nitrogen=17", &r, &c, &subject);
    assert_refused(bc_quantity_evaluate(ratio, &subject, &f, &err), &err, BC_ERR_RANGE, "no carbon");
    assert_within(f.value, 47.11, 0.0);
    make_subject("methane=60,ethane=30,carbon-dioxide=10", &r, &c, &subject);
    assert_within(figure_of(&subject, "hydrogen-carbon-ratio").value, (4.0 * 0.6 + 6.0 * 0.3) / (0.6 + 0.6 + 0.1), 1e-14);
}

static void a_gas_that_cannot_be_saturated_makes_no_subject(void **state)
{
    bc_state s = bc_state_default();
    bc_reference r;
    bc_composition c;
    bc_subject subject;
    bc_error err = {.status = BC_OK};

    (void)state;
    s.saturated = true;
    assert_ok(bc_reference_at(&s, &r, &err), &err);
    assert_ok(bc_composition_parse("water=100", &c, &err), &err);
    assert_refused(bc_subject_make(&r, &c.gas, NULL, &subject, &err), &err, BC_ERR_INPUT, "no components");
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(every_quantity_of_iso_6976_is_its_own_figure_in_its_own_unit),
        cmocka_unit_test(every_quantity_is_unique_and_explains_itself),
        cmocka_unit_test(ids_are_found_in_any_spelling_and_unknown_ones_suggest),
        cmocka_unit_test(words_of_the_trade_lead_to_the_quantity_they_mean),
        cmocka_unit_test(words_of_the_trade_name_quantities_that_there_are),
        cmocka_unit_test(a_word_like_no_quantity_gets_no_suggestion),
        cmocka_unit_test(an_index_beyond_the_list_is_refused),
        cmocka_unit_test(every_quantity_of_every_bundled_gas_is_finite_or_refused_with_a_reason),
        cmocka_unit_test(values_together_are_those_of_each_quantity_alone),
        cmocka_unit_test(a_subject_knows_its_atoms),
        cmocka_unit_test(the_two_routes_to_the_heat_of_every_bundled_gas_agree_within_0_2_per_cent),
        cmocka_unit_test(shares_of_the_gap_add_up_to_it_and_name_the_component_to_blame),
        cmocka_unit_test(the_formation_route_is_a_route_of_its_own),
        cmocka_unit_test(gases_without_a_figure_say_so),
        cmocka_unit_test(a_gas_that_cannot_be_saturated_makes_no_subject),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
