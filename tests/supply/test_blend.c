/* SPDX-License-Identifier: MIT */
/* test_blend.c - conservation, associativity and scatter of mixtures. */
#include "support.h"

#include "bluecone/blend.h"
#include "bluecone/composition.h"
#include "bluecone/quantity.h"
#include "gas/species_index.h"

#define CASES 300
#define PARTS 5

typedef struct {
    bc_reference reference;
    bc_gas gas[PARTS];
    bc_blend_part part[PARTS];
    bc_mixer mixer;
    double share[PARTS];
} mixture;

static const bc_blend_basis BASES[] = {BC_BY_MOLE, BC_BY_VOLUME, BC_BY_MASS, BC_BY_ENERGY};

static bc_reference reference_at(const char *text)
{
    bc_state s = bc_state_default();
    bc_reference r;
    bc_error err;

    assert_ok(bc_state_parse(text, &s, &err), &err);
    assert_ok(bc_reference_at(&s, &r, &err), &err);
    return r;
}

/* Five gases of up to seven light species, each with some methane so that all of them burn. */
static void draw(mixture *m, bc_blend_basis by, const char *state, chance *dice)
{
    bc_error err;

    m->reference = reference_at(state);
    for (size_t i = 0; i < PARTS; i++) {
        double amounts[BC_SPECIES_CAPACITY] = {0.0};

        amounts[SPECIES_methane] = 0.05 + chance_uniform(dice);
        for (size_t k = 0; k < 6; k++)
            amounts[chance_below(dice, 4) + SPECIES_methane] += chance_uniform(dice);
        amounts[SPECIES_hydrogen] += chance_uniform(dice);
        amounts[SPECIES_nitrogen] += chance_uniform(dice);
        amounts[SPECIES_carbon_dioxide] += chance_uniform(dice);
        assert_ok(bc_gas_from_amounts(amounts, &m->gas[i], &err), &err);
        m->part[i] = (bc_blend_part){&m->gas[i], NULL};
        m->share[i] = 0.01 + chance_uniform(dice);
    }
    assert_ok(bc_mixer_make(&m->reference, by, m->part, PARTS, &m->mixer, &err), &err);
}

static void moles_mass_and_heat_are_conserved_on_every_basis(void **state)
{
    chance dice = {7713};

    (void)state;
    for (size_t c = 0; c < CASES; c++) {
        mixture m;
        double mole[PARTS], sum = 0.0, mass = 0.0, heat = 0.0, carbon = 0.0;

        draw(&m, BASES[c % COUNT(BASES)], c % 2 ? "25/0" : "17.3/12.9@97.4", &dice);
        const bc_gas gas = bc_mixer_gas(&m.mixer, m.share);
        const bc_value v = bc_value_of(&m.reference, &gas);

        bc_mixer_moles(&m.mixer, m.share, mole);
        for (size_t i = 0; i < PARTS; i++) {
            sum += mole[i];
            mass += mole[i] * m.mixer.value[i].molar_mass_kg_per_mol;
            heat += mole[i] * m.mixer.value[i].gross_j_per_mol;
            carbon += mole[i] * bc_gas_atoms(&m.gas[i], BC_C);
        }
        assert_within(sum, 1.0, 1e-14);
        assert_within(v.molar_mass_kg_per_mol, mass, 1e-14 * mass);
        assert_within(v.gross_j_per_mol, heat, 1e-13 * heat);
        assert_within(bc_gas_atoms(&gas, BC_C), carbon, 1e-13 * carbon);
    }
}

static void mixing_in_steps_gives_the_gas_that_mixing_at_once_gives(void **state)
{
    chance dice = {99871};

    (void)state;
    for (size_t c = 0; c < CASES; c++) {
        /* volumes of real gases do not add up: the step is by mole, mass or energy */
        static const bc_blend_basis ADDITIVE[] = {BC_BY_MOLE, BC_BY_MASS, BC_BY_ENERGY};
        mixture m;
        bc_mixer two, rest;
        bc_error err;

        draw(&m, ADDITIVE[c % COUNT(ADDITIVE)], "20/15", &dice);
        const bc_gas at_once = bc_mixer_gas(&m.mixer, m.share);

        assert_ok(bc_mixer_make(&m.reference, m.mixer.by, m.part, 2, &two, &err), &err);
        const bc_gas first = bc_mixer_gas(&two, m.share);
        const bc_blend_part parts[] = {{&first, NULL}, m.part[2], m.part[3], m.part[4]};
        const double shares[] = {m.share[0] + m.share[1], m.share[2], m.share[3], m.share[4]};

        assert_ok(bc_mixer_make(&m.reference, m.mixer.by, parts, COUNT(parts), &rest, &err), &err);
        const bc_gas in_steps = bc_mixer_gas(&rest, shares);

        for (size_t j = 0; j < SPECIES_COUNT; j++)
            assert_within(in_steps.x[j], at_once.x[j], 1e-14);
    }
}

static void shares_convert_to_another_basis_and_back(void **state)
{
    chance dice = {5557};

    (void)state;
    for (size_t c = 0; c < CASES; c++) {
        mixture m;
        bc_mixer other;
        double converted[PARTS], mole[PARTS], again[PARTS];
        bc_error err;
        const bc_blend_basis to = BASES[(c + 1 + c / 4) % COUNT(BASES)];

        draw(&m, BASES[c % COUNT(BASES)], "60F/60F@14.73psi", &dice);
        bc_mixer_shares(&m.mixer, m.share, to, converted);
        assert_ok(bc_mixer_make(&m.reference, to, m.part, PARTS, &other, &err), &err);
        bc_mixer_moles(&m.mixer, m.share, mole);
        bc_mixer_moles(&other, converted, again);
        for (size_t i = 0; i < PARTS; i++)
            assert_within(again[i], mole[i], 1e-14);
    }
}

static void only_the_proportion_of_the_shares_counts(void **state)
{
    chance dice = {41};
    mixture m;
    double scaled[PARTS];

    (void)state;
    draw(&m, BC_BY_VOLUME, "15/15", &dice);
    for (size_t i = 0; i < PARTS; i++)
        scaled[i] = 37.5 * m.share[i];
    const bc_gas a = bc_mixer_gas(&m.mixer, m.share);
    const bc_gas b = bc_mixer_gas(&m.mixer, scaled);

    for (size_t j = 0; j < SPECIES_COUNT; j++)
        assert_within(b.x[j], a.x[j], 1e-15);
}

/* ISO 14912 by hand: 63.7 m3 propane (Z 0.98194) and 36.3 m3 air (Z 0.999626) at 15/15 hold
 * 63.7/0.98194 : 36.3/0.999626 moles, both Z as bluecone sheet prints them. */
static void volumes_count_as_the_real_gases_they_are_before_mixing(void **state)
{
    const bc_reference r = reference_at("15/15");
    bc_gas propane = {{0.0}};
    const bc_gas air = bc_gas_air();
    const bc_blend_part parts[] = {{&propane, NULL}, {&air, NULL}};
    const double share[] = {63.7, 36.3};
    const double moles[] = {63.7 / 0.98194, 36.3 / 0.999626};
    double mole[2];
    bc_mixer m;
    bc_error err;

    (void)state;
    propane.x[SPECIES_propane] = 1.0;
    assert_ok(bc_mixer_make(&r, BC_BY_VOLUME, parts, 2, &m, &err), &err);
    bc_mixer_moles(&m, share, mole);
    assert_within(mole[0], moles[0] / (moles[0] + moles[1]), 2e-6); /* the last digit of Z */
}

static void a_part_without_heat_has_no_share_of_energy(void **state)
{
    const bc_reference r = reference_at("15/15");
    const bc_gas air = bc_gas_air();
    const bc_blend_part parts[] = {{&air, NULL}};
    bc_mixer m;
    bc_error err = {.status = BC_OK};

    (void)state;
    assert_refused(bc_mixer_make(&r, BC_BY_ENERGY, parts, 1, &m, &err), &err, BC_ERR_RANGE, "part 1 has no heat|by mole");
    assert_refused(bc_mixer_make(&r, BC_BY_MOLE, parts, 0, &m, &err), &err, BC_ERR_USAGE, "1 to 32 parts");
}

/* Two gases with stated scatter, and the change of the blend when one source of one of them moves. */
typedef struct {
    bc_composition c[2];
    bc_mixer mixer;
} scattered;

static void open_scattered(scattered *s, const bc_reference *r, bc_blend_basis by)
{
    bc_error err;
    bc_blend_part parts[2];

    assert_ok(bc_composition_parse("methane=71.3~0.31,ethane=11.7~0.12,carbon-dioxide=17~0.2", &s->c[0], &err), &err);
    assert_ok(bc_composition_parse("hydrogen=57.1~0.4,carbon-monoxide=9.4~0.3,methane=33.5~0.25", &s->c[1], &err), &err);
    for (size_t i = 0; i < 2; i++)
        parts[i] = (bc_blend_part){&s->c[i].gas, &s->c[i].spread};
    assert_ok(bc_mixer_make(r, by, parts, 2, &s->mixer, &err), &err);
}

static void scatter_of_the_blend_is_the_slope_along_each_source_of_its_parts(void **state)
{
    static scattered s;
    static bc_spread spread;
    const bc_reference r = reference_at("25/0");
    const double share[] = {0.613, 0.387};
    const double h = 1e-4;

    (void)state;
    for (size_t b = 0; b < COUNT(BASES); b++) {
        size_t k = 0;

        open_scattered(&s, &r, BASES[b]);
        bc_mixer_spread(&s.mixer, share, &spread);
        assert_int_equal(spread.count, s.c[0].spread.count + s.c[1].spread.count);
        for (size_t i = 0; i < 2; i++)
            for (size_t own = 0; own < s.c[i].spread.count; own++, k++) {
                bc_gas moved[2] = {s.c[i].gas, s.c[i].gas};
                bc_gas blend[2];

                for (int side = 0; side < 2; side++) {
                    bc_blend_part parts[2] = {s.mixer.parts[0], s.mixer.parts[1]};
                    bc_mixer m;
                    bc_error err;

                    for (size_t j = 0; j < SPECIES_COUNT; j++)
                        moved[side].x[j] += (side == 0 ? h : -h) * s.c[i].spread.dx[own][j];
                    parts[i].gas = &moved[side];
                    assert_ok(bc_mixer_make(&r, BASES[b], parts, 2, &m, &err), &err);
                    blend[side] = bc_mixer_gas(&m, share);
                }
                for (size_t j = 0; j < SPECIES_COUNT; j++)
                    assert_within(spread.dx[k][j], (blend[0].x[j] - blend[1].x[j]) / (2.0 * h), 1e-10);
            }
    }
}

/* Ten gases of thirteen sources each do not fit into 96: their covariances do. */
static void more_sources_than_a_spread_holds_keep_their_covariances(void **state)
{
    static bc_composition c;
    static bc_spread many, few;
    const bc_reference r = reference_at("15/15");
    double share[10];
    bc_blend_part parts[10];
    bc_mixer m;
    bc_error err;

    (void)state;
    assert_ok(bc_composition_parse("methane=71~0.3,ethane=8~0.1,propane=4~0.1,n-butane=2~0.05,isobutane=1.5~0.05,n-pentane=1~0.02,"
                                   "isopentane=0.5~0.02,hydrogen=2~0.1,nitrogen=3~0.1,carbon-dioxide=4~0.1,carbon-monoxide=1~0.03,"
                                   "helium=1~0.02,argon=1~0.02", &c, &err), &err);
    for (size_t i = 0; i < COUNT(parts); i++) {
        parts[i] = (bc_blend_part){&c.gas, &c.spread};
        share[i] = 0.1;
    }
    assert_ok(bc_mixer_make(&r, BC_BY_MASS, parts, 7, &m, &err), &err);
    bc_mixer_spread(&m, share, &many);
    assert_int_equal(many.count, 91);
    assert_ok(bc_mixer_make(&r, BC_BY_MASS, parts, COUNT(parts), &m, &err), &err);
    bc_mixer_spread(&m, share, &few);
    assert_true(few.count <= 13);
    for (size_t i = 0; i < SPECIES_COUNT; i++)
        for (size_t j = 0; j < SPECIES_COUNT; j++) {
            double of_seven = 0.0, of_ten = 0.0;

            for (size_t k = 0; k < many.count; k++)
                of_seven += many.dx[k][i] * many.dx[k][j];
            for (size_t k = 0; k < few.count; k++)
                of_ten += few.dx[k][i] * few.dx[k][j];
            /* n equal parts: the blend is the part, its variance an n-th */
            assert_within(10.0 * of_ten, 7.0 * of_seven, 1e-18);
        }
}

/* Eight gases of twelve sources fill a spread of 96 to its last place: each source is kept by itself. */
static void sources_that_just_fit_are_kept_one_by_one(void **state)
{
    static bc_composition c;
    static bc_spread spread;
    const bc_reference r = reference_at("15/15");
    bc_blend_part parts[8];
    double share[8];
    bc_mixer m;
    bc_error err;

    (void)state;
    assert_ok(bc_composition_parse("methane=72~0.3,ethane=8~0.1,propane=4~0.1,n-butane=2~0.05,isobutane=1.5~0.05,n-pentane=1~0.02,"
                                   "isopentane=0.5~0.02,hydrogen=2~0.1,nitrogen=3~0.1,carbon-dioxide=4~0.1,carbon-monoxide=1~0.03,"
                                   "helium=1~0.02", &c, &err), &err);
    for (size_t i = 0; i < COUNT(parts); i++) {
        parts[i] = (bc_blend_part){&c.gas, &c.spread};
        share[i] = 1.0;
    }
    assert_ok(bc_mixer_make(&r, BC_BY_MOLE, parts, COUNT(parts), &m, &err), &err);
    bc_mixer_spread(&m, share, &spread);
    assert_int_equal(spread.count, BC_SPECIES_CAPACITY);
    for (size_t k = 0; k < spread.count; k++)
        for (size_t j = 0; j < SPECIES_COUNT; j++)
            assert_within(spread.dx[k][j], c.spread.dx[k % 12][j] / 8.0, 1e-15);
}

/* Parts without heat have no shares of energy, not shares that are no numbers. */
static void parts_without_heat_have_no_shares_of_energy(void **state)
{
    const bc_reference r = reference_at("15/15");
    bc_gas nitrogen = {{0.0}}, argon = {{0.0}};
    const bc_blend_part parts[] = {{&nitrogen, NULL}, {&argon, NULL}};
    const double share[] = {0.3, 0.7};
    double converted[2];
    bc_mixer m;
    bc_error err;

    (void)state;
    nitrogen.x[SPECIES_nitrogen] = argon.x[SPECIES_argon] = 1.0;
    assert_ok(bc_mixer_make(&r, BC_BY_MOLE, parts, 2, &m, &err), &err);
    bc_mixer_shares(&m, share, BC_BY_ENERGY, converted);
    assert_within(converted[0], 0.0, 0.0);
    assert_within(converted[1], 0.0, 0.0);
}

static void a_basis_has_its_word_and_what_is_none_has_no_word(void **state)
{
    (void)state;
    assert_string_equal(bc_blend_basis_text(BC_BY_MOLE), "mole");
    assert_string_equal(bc_blend_basis_text(BC_BY_ENERGY), "energy");
    assert_string_equal(bc_blend_basis_text((bc_blend_basis)(BC_BY_ENERGY + 1)), "");
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(moles_mass_and_heat_are_conserved_on_every_basis),
        cmocka_unit_test(mixing_in_steps_gives_the_gas_that_mixing_at_once_gives),
        cmocka_unit_test(shares_convert_to_another_basis_and_back),
        cmocka_unit_test(only_the_proportion_of_the_shares_counts),
        cmocka_unit_test(volumes_count_as_the_real_gases_they_are_before_mixing),
        cmocka_unit_test(a_part_without_heat_has_no_share_of_energy),
        cmocka_unit_test(scatter_of_the_blend_is_the_slope_along_each_source_of_its_parts),
        cmocka_unit_test(more_sources_than_a_spread_holds_keep_their_covariances),
        cmocka_unit_test(sources_that_just_fit_are_kept_one_by_one),
        cmocka_unit_test(parts_without_heat_have_no_shares_of_energy),
        cmocka_unit_test(a_basis_has_its_word_and_what_is_none_has_no_word),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
