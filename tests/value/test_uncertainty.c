/* SPDX-License-Identifier: MIT */
/* test_uncertainty.c - the analytic propagation against Monte Carlo, against differences, against ISO 6976. */
#include "support.h"

#include "bluecone/composition.h"
#include "bluecone/quantity.h"
#include "gas/species_index.h"

/* The quantities that are checked, with the field of bc_value that each one is. */
static const struct {
    const char *id;
    size_t field;
} QUANTITIES[] = {
    {"hhv", offsetof(bc_value, gross_j_per_m3)},
    {"lhv", offsetof(bc_value, net_j_per_m3)},
    {"wobbe-gross", offsetof(bc_value, wobbe_gross_j_per_m3)},
    {"wobbe-net", offsetof(bc_value, wobbe_net_j_per_m3)},
    {"density", offsetof(bc_value, density_kg_per_m3)},
    {"relative-density", offsetof(bc_value, relative_density)},
    {"z", offsetof(bc_value, z)},
    {"hhv-mass", offsetof(bc_value, gross_j_per_kg)},
    {"lhv-mass", offsetof(bc_value, net_j_per_kg)},
    {"hhv-mole", offsetof(bc_value, gross_j_per_mol)},
    {"molar-mass", offsetof(bc_value, molar_mass_kg_per_mol)},
    {"hhv-ideal", offsetof(bc_value, gross_ideal_j_per_m3)},
    {"molar-volume", offsetof(bc_value, molar_volume_m3_per_mol)},
};
#define MANY COUNT(QUANTITIES)

static double field(const bc_value *v, size_t k)
{
    double value = 0.0;

    memcpy(&value, (const char *)v + QUANTITIES[k].field, sizeof value);
    return value;
}

/* An analysis as a test states it: shares and standard uncertainties in per cent; share < 0 is the rest. */
typedef struct {
    size_t species;
    double share, u;
} share_row;

typedef struct {
    const char *label;
    bc_basis basis;
    bc_closure closure;
    bool saturated; /* metered so */
    size_t count;
    share_row rows[12];
} analysis;

static const analysis PIPELINE = {
    "pipeline gas, normalised", BC_BASIS_MOLE, BC_CLOSURE_NORMALISED, false, 7,
    {{SPECIES_methane, 89.37, 0.11}, {SPECIES_ethane, 5.88, 0.05}, {SPECIES_propane, 2.31, 0.031}, {SPECIES_n_butane, 0.93, 0.017},
     {SPECIES_n_pentane, 0.21, 0.009}, {SPECIES_nitrogen, 0.33, 0.012}, {SPECIES_carbon_dioxide, 0.91, 0.019}}};
static const analysis WITH_REST = {
    "lean gas with its nitrogen by difference", BC_BASIS_MOLE, BC_CLOSURE_NORMALISED, false, 5,
    {{SPECIES_methane, 84.7, 0.19}, {SPECIES_nitrogen, -1.0, 0.0}, {SPECIES_ethane, 3.3, 0.06}, {SPECIES_hydrogen, 1.2, 0.04},
     {SPECIES_carbon_dioxide, 1.7, 0.05}}};
static const analysis BY_MASS = {
    "liquefied gas by mass", BC_BASIS_MASS, BC_CLOSURE_NORMALISED, false, 4,
    {{SPECIES_propane, 61.3, 0.35}, {SPECIES_n_butane, 21.7, 0.27}, {SPECIES_isobutane, 15.9, 0.24}, {SPECIES_propene, 1.4, 0.08}}};
static const analysis MASS_WITH_REST = {
    "refinery gas by mass, ethane by difference", BC_BASIS_MASS, BC_CLOSURE_NORMALISED, false, 4,
    {{SPECIES_methane, 47.1, 0.4}, {SPECIES_hydrogen, 6.3, 0.11}, {SPECIES_ethane, -1.0, 0.0}, {SPECIES_propane, 11.9, 0.3}}};
static const analysis BY_VOLUME = {
    "test gas by volume", BC_BASIS_VOLUME, BC_CLOSURE_NORMALISED, false, 3,
    {{SPECIES_methane, 86.7, 0.2}, {SPECIES_propane, 12.8, 0.15}, {SPECIES_nitrogen, 0.3, 0.05}}};
static const analysis UNTIED = {
    "uncorrelated fractions", BC_BASIS_MOLE, BC_CLOSURE_NONE, false, 3,
    {{SPECIES_methane, 91.9, 0.13}, {SPECIES_ethane, 6.2, 0.07}, {SPECIES_carbon_dioxide, 1.9, 0.03}}};
static const analysis SATURATED = {
    "dry analysis, metered saturated", BC_BASIS_MOLE, BC_CLOSURE_NORMALISED, true, 4,
    {{SPECIES_methane, 61.7, 0.3}, {SPECIES_carbon_dioxide, 37.1, 0.28}, {SPECIES_nitrogen, 0.9, 0.05}, {SPECIES_hydrogen, 0.4, 0.02}}};
static const analysis WET_SATURATED = {
    "wet analysis, metered saturated", BC_BASIS_MOLE, BC_CLOSURE_NORMALISED, true, 3,
    {{SPECIES_methane, 59.4, 0.3}, {SPECIES_carbon_dioxide, 36.5, 0.28}, {SPECIES_water, 4.1, 0.6}}};

static const analysis *const ALL[] = {&PIPELINE, &WITH_REST, &BY_MASS, &MASS_WITH_REST, &BY_VOLUME, &UNTIED, &SATURATED, &WET_SATURATED};

static bc_reference reference_of(const analysis *a)
{
    bc_state s = bc_state_default();
    bc_reference r;
    bc_error err;

    s.saturated = a->saturated;
    s.metering_pa = 98.7e3;
    assert_ok(bc_reference_at(&s, &r, &err), &err);
    return r;
}

/* The library's way: the analysis as a literal. */
static void subject_of(const analysis *a, const bc_reference *r, bc_composition *c, bc_subject *subject)
{
    static const char *const BASES[] = {"mole:", "volume:", "mass:"};
    char literal[1024];
    size_t n = (size_t)snprintf(literal, sizeof literal, "%s", BASES[a->basis]);
    bc_error err;

    for (size_t i = 0; i < a->count; i++) {
        const share_row *row = &a->rows[i];

        if (row->share < 0.0)
            n += (size_t)snprintf(literal + n, sizeof literal - n, "%s%s=rest", i ? "," : "", bc_species_id(row->species));
        else
            n += (size_t)snprintf(literal + n, sizeof literal - n, "%s%s=%.17g~%.17g", i ? "," : "", bc_species_id(row->species), row->share, row->u);
    }
    assert_ok(bc_composition_parse(literal, c, &err), &err);
    if (a->closure != c->closure)
        assert_ok(bc_composition_close(c, a->closure, &err), &err);
    assert_ok(bc_subject_make(r, &c->gas, &c->spread, subject, &err), &err);
}

/* The test's own way from shares to the gas that is metered. Molar masses and Z of the conversion are not varied. */
static void gas_of_shares(const analysis *a, const double shares[], const bc_reference *r, bc_gas *gas)
{
    double amounts[BC_SPECIES_CAPACITY] = {0.0};
    double sum = 0.0;

    for (size_t i = 0; i < a->count; i++)
        sum += a->rows[i].share < 0.0 ? 0.0 : shares[i];
    for (size_t i = 0; i < a->count; i++) {
        const size_t s = a->rows[i].species;
        const double share = a->rows[i].share < 0.0 ? 100.0 - sum : shares[i];

        amounts[s] = share;
        if (a->basis == BC_BASIS_MASS)
            amounts[s] = share / bc_species_molar_mass_kg_per_mol(s);
        if (a->basis == BC_BASIS_VOLUME) /* 15 C; s of ISO 6976:2016 by way of the reference at 15 C */
            amounts[s] = share / (1.0 - r->factor[s] * r->factor[s]);
    }
    bc_gas dry;

    if (a->closure == BC_CLOSURE_NONE) { /* fractions of one, left as they are */
        for (size_t i = 0; i < BC_SPECIES_CAPACITY; i++)
            dry.x[i] = amounts[i] / 100.0;
        *gas = dry;
        return;
    }
    assert_int_equal(bc_gas_from_amounts(amounts, &dry, NULL), BC_OK);
    assert_int_equal(bc_gas_for_state(&dry, &r->state, gas, NULL), BC_OK);
}

static void shares_of(const analysis *a, double shares[])
{
    for (size_t i = 0; i < a->count; i++)
        shares[i] = a->rows[i].share;
}

static bc_figure figure_of(const bc_subject *subject, size_t k)
{
    size_t index = 0;
    bc_figure figure;
    bc_error err;

    assert_ok(bc_quantity_find(QUANTITIES[k].id, &index, &err), &err);
    assert_ok(bc_quantity_evaluate(index, subject, &figure, &err), &err);
    return figure;
}

/* Running mean and sum of squares, Welford, Technometrics 4 (1962) 419. */
typedef struct {
    double n, mean, squares;
} moments;

static void take(moments *m, double value)
{
    const double before = value - m->mean;

    m->n += 1.0;
    m->mean += before / m->n;
    m->squares += before * (value - m->mean);
}

/* Every constant behind a gas drawn from its own normal distribution; the masses through their atoms. */
static void draw_tables(chance *c, const bc_reference *r, const bc_gas *gas, bc_reference *drawn)
{
    double atoms[BC_ELEMENTS];

    for (int k = 0; k < BC_ELEMENTS; k++)
        atoms[k] = 1e-3 * bc_element_mass_u_g_per_mol((bc_element)k) * chance_normal(c);
    drawn->vaporisation_j_per_mol = r->vaporisation_j_per_mol + r->u_vaporisation_j_per_mol * chance_normal(c);
    for (size_t i = 0; i < bc_species_count(); i++) {
        if (!(gas->x[i] > 0.0))
            continue;
        drawn->gross_j_per_mol[i] = r->gross_j_per_mol[i] + r->u_gross_j_per_mol[i] * chance_normal(c);
        drawn->net_j_per_mol[i] = drawn->gross_j_per_mol[i] - bc_species_atoms(i, BC_H) / 2.0 * drawn->vaporisation_j_per_mol;
        drawn->factor[i] = r->factor[i] + r->u_factor[i] * chance_normal(c);
        drawn->mass_kg_per_mol[i] = r->mass_kg_per_mol[i];
        for (int k = 0; k < BC_ELEMENTS; k++)
            drawn->mass_kg_per_mol[i] += bc_species_atoms(i, (bc_element)k) * atoms[k];
    }
    drawn->r_j_per_mol_k = r->r_j_per_mol_k + r->u_r_j_per_mol_k * chance_normal(c);
    drawn->air_kg_per_mol = r->air_kg_per_mol + r->u_air_kg_per_mol * chance_normal(c);
    drawn->air_z = r->air_z + r->u_air_z * chance_normal(c);
}

#define DRAWS 200000

static void draw(const analysis *a, bool composition, moments out[MANY])
{
    const bc_reference r = reference_of(a);
    double stated[12], shares[12];
    bc_reference drawn = r;
    chance c = {UINT64_C(0x9E3779B97F4A7C15)};
    bc_gas gas;

    shares_of(a, stated);
    gas_of_shares(a, stated, &r, &gas);
    for (int n = 0; n < DRAWS; n++) {
        if (composition) {
            for (size_t i = 0; i < a->count; i++)
                shares[i] = stated[i] + a->rows[i].u * chance_normal(&c);
            gas_of_shares(a, shares, &r, &gas);
        }
        draw_tables(&c, &r, &gas, &drawn);
        const bc_value v = bc_value_of(&drawn, &gas);

        for (size_t k = 0; k < MANY; k++)
            take(&out[k], field(&v, k));
    }
}

/* 1 %: six times the scatter of a standard deviation over 200 000 draws, 1/sqrt(2 x 200 000) = 0.16 %. */
static void assert_monte_carlo(const analysis *a)
{
    const bc_reference r = reference_of(a);
    moments m[MANY] = {{0.0, 0.0, 0.0}};
    bc_composition c;
    bc_subject subject;

    subject_of(a, &r, &c, &subject);
    draw(a, true, m);
    for (size_t k = 0; k < MANY; k++) {
        const bc_figure f = figure_of(&subject, k);
        const double scale = f.value / field(&subject.value, k), u = scale * sqrt(m[k].squares / (m[k].n - 1.0));
        char label[120];

        (void)snprintf(label, sizeof label, "%s, u of %s", a->label, QUANTITIES[k].id);
        assert_within_at(label, f.u, u, 0.01 * u);
        assert_within_at(label, f.value, scale * m[k].mean, 0.05 * u); /* no bias that would matter */
    }
}

static void normalised_analyses_agree_with_monte_carlo(void **state)
{
    (void)state;
    assert_monte_carlo(&PIPELINE);
}

static void a_component_by_difference_agrees_with_monte_carlo(void **state)
{
    (void)state;
    assert_monte_carlo(&WITH_REST);
}

static void an_analysis_by_mass_agrees_with_monte_carlo(void **state)
{
    (void)state;
    assert_monte_carlo(&BY_MASS);
}

static void the_tables_alone_agree_with_monte_carlo(void **state)
{
    const bc_reference r = reference_of(&PIPELINE);
    moments m[MANY] = {{0.0, 0.0, 0.0}};
    bc_composition c;
    bc_subject subject;
    bc_error err;

    (void)state;
    subject_of(&PIPELINE, &r, &c, &subject);
    assert_ok(bc_subject_make(&r, &c.gas, NULL, &subject, &err), &err);
    draw(&PIPELINE, false, m);
    for (size_t k = 0; k < MANY; k++) {
        const bc_figure f = figure_of(&subject, k);
        const double u = f.value / field(&subject.value, k) * sqrt(m[k].squares / (m[k].n - 1.0));

        assert_within_at(QUANTITIES[k].id, f.u_composition, 0.0, 0.0);
        assert_within_at(QUANTITIES[k].id, f.u, f.u_tables, 1e-12 * f.u_tables);
        assert_within_at(QUANTITIES[k].id, f.u_tables, u, 0.01 * u);
    }
}

/* The constants of a reference whose uncertainty can be turned up one at a time. */
#define CONSTANTS 6
static double *constant(bc_reference *r, int which, bool u)
{
    switch (which) {
    case 0: return u ? &r->u_r_j_per_mol_k : &r->r_j_per_mol_k;
    case 1: return u ? &r->u_air_kg_per_mol : &r->air_kg_per_mol;
    case 2: return u ? &r->u_air_z : &r->air_z;
    case 3: return u ? &r->u_vaporisation_j_per_mol : &r->vaporisation_j_per_mol;
    case 4: return u ? &r->u_gross_j_per_mol[SPECIES_propane] : &r->gross_j_per_mol[SPECIES_propane];
    case 5: return u ? &r->u_factor[SPECIES_ethane] : &r->factor[SPECIES_ethane];
    default: return NULL;
    }
}

static void renew_net_heats(bc_reference *r)
{
    for (size_t i = 0; i < bc_species_count(); i++)
        r->net_j_per_mol[i] = r->gross_j_per_mol[i] - bc_species_atoms(i, BC_H) / 2.0 * r->vaporisation_j_per_mol;
}

/* Each constant is given an uncertainty of 1 %, so that none hides behind a larger one: what it adds to the
 * variance must be the slope of the figure, by central differences, times that. */
static void every_constant_enters_with_its_own_slope(void **state)
{
    (void)state;
    for (int which = 0; which < CONSTANTS; which++) {
        bc_reference r = reference_of(&PIPELINE), loud = r, up = r, down = r;
        const double step = 0.01 * *constant(&r, which, false);
        bc_composition c;
        bc_subject quiet_subject, loud_subject;

        *constant(&loud, which, true) = step;
        *constant(&up, which, false) += 0.1 * step;
        *constant(&down, which, false) -= 0.1 * step;
        renew_net_heats(&up);
        renew_net_heats(&down);
        subject_of(&PIPELINE, &r, &c, &quiet_subject);
        assert_int_equal(bc_subject_make(&loud, &c.gas, NULL, &loud_subject, NULL), BC_OK);
        *constant(&r, which, true) = 0.0;
        const bc_value vu = bc_value_of(&up, &c.gas), vd = bc_value_of(&down, &c.gas);

        for (size_t k = 0; k < MANY; k++) {
            const bc_figure f = figure_of(&loud_subject, k);
            const double before = figure_of(&quiet_subject, k).u_tables;
            const double slope = f.value / field(&loud_subject.value, k) * (field(&vu, k) - field(&vd, k)) / 0.2;
            char label[80];

            (void)snprintf(label, sizeof label, "constant %d in %s", which, QUANTITIES[k].id);
            assert_within_at(label, f.u_tables, hypot(before, slope), 1e-4 * f.u_tables);
        }
    }
}

/* u2 = sum over the stated shares of (dY/dy u)2, the slopes by central differences of the test's own conversion. */
static void the_share_of_the_composition_agrees_with_central_differences_on_every_basis(void **state)
{
    (void)state;
    for (size_t n = 0; n < COUNT(ALL); n++) {
        const analysis *a = ALL[n];
        const bc_reference r = reference_of(a);
        double variance[MANY] = {0.0};
        double shares[12];
        bc_composition c;
        bc_subject subject;

        subject_of(a, &r, &c, &subject);
        for (size_t i = 0; i < a->count; i++) {
            bc_gas up, down;

            if (a->rows[i].share < 0.0)
                continue;
            const double step = 1e-3 * a->rows[i].share;

            shares_of(a, shares);
            shares[i] += step;
            gas_of_shares(a, shares, &r, &up);
            shares[i] -= 2.0 * step;
            gas_of_shares(a, shares, &r, &down);
            const bc_value vu = bc_value_of(&r, &up), vd = bc_value_of(&r, &down);

            for (size_t k = 0; k < MANY; k++)
                variance[k] += pow((field(&vu, k) - field(&vd, k)) / (2.0 * step) * a->rows[i].u, 2);
        }
        for (size_t k = 0; k < MANY; k++) {
            const bc_figure f = figure_of(&subject, k);
            const double want = f.value / field(&subject.value, k) * sqrt(variance[k]);
            char label[120];

            (void)snprintf(label, sizeof label, "%s, composition's u of %s", a->label, QUANTITIES[k].id);
            assert_within_at(label, f.u_composition, want, 1e-4 * want); /* the third derivative over a step of 0.1 % */
        }
    }
}

static void the_combined_uncertainty_is_the_root_of_both_shares(void **state)
{
    (void)state;
    for (size_t n = 0; n < COUNT(ALL); n++) {
        const bc_reference r = reference_of(ALL[n]);
        bc_composition c;
        bc_subject subject;

        subject_of(ALL[n], &r, &c, &subject);
        for (size_t k = 0; k < MANY; k++) {
            const bc_figure f = figure_of(&subject, k);

            assert_true(f.has_u);
            assert_true(f.u_composition > 0.0 && f.u_tables > 0.0);
            assert_within_at(QUANTITIES[k].id, f.u, hypot(f.u_composition, f.u_tables), 1e-12 * f.u);
        }
    }
}

/* ISO 6976:2016 annex D example 1, value from memory: u(Hc) = 0.615609 kJ/mol with the unit correlation matrix. By hand:
 * sqrt(sum (h_j u(x_j))2 + sum (x_j u(h_j))2) with the figures below. */
static void annex_d_has_the_uncertainty_of_the_standard(void **state)
{
    static const struct {
        double heat, x, u_x, u_heat;
    } ROWS[] = {{891.51, 0.933212, 0.000346, 0.19}, {1562.14, 0.025656, 0.000243, 0.51}, {2221.10, 0.015368, 0.000148, 0.51}};
    bc_composition c;
    bc_reference r;
    bc_subject subject;
    bc_error err;
    double by_hand = 0.0;
    const bc_state s = bc_state_default();

    (void)state;
    assert_ok(bc_composition_parse("methane=93.3212~0.0346,ethane=2.5656~0.0243,propane=1.5368~0.0148,nitrogen=1.035~0.0195,carbon-dioxide=1.5414~0.0111",
                                   &c, &err), &err);
    assert_ok(bc_composition_close(&c, BC_CLOSURE_NONE, &err), &err);
    assert_ok(bc_reference_at(&s, &r, &err), &err);
    assert_ok(bc_subject_make(&r, &c.gas, &c.spread, &subject, &err), &err);
    for (size_t i = 0; i < COUNT(ROWS); i++)
        by_hand += pow(ROWS[i].heat * ROWS[i].u_x, 2) + pow(ROWS[i].x * ROWS[i].u_heat, 2);
    const bc_figure f = figure_of(&subject, 9);

    assert_string_equal(QUANTITIES[9].id, "hhv-mole");
    assert_within(f.u, sqrt(by_hand), 1e-9);
    assert_within(f.u, 0.615609, 2e-6);
}

static void normalising_lowers_the_uncertainty_of_a_heating_value(void **state)
{
    const bc_reference r = reference_of(&PIPELINE);
    bc_composition c;
    bc_subject tied, untied;
    bc_error err;

    (void)state;
    subject_of(&PIPELINE, &r, &c, &tied);
    const double with_closure = figure_of(&tied, 0).u;

    assert_ok(bc_composition_close(&c, BC_CLOSURE_NONE, &err), &err);
    assert_ok(bc_subject_make(&r, &c.gas, &c.spread, &untied, &err), &err);
    assert_true(with_closure < 0.5 * figure_of(&untied, 0).u);
}

static void ten_times_the_scatter_is_ten_times_the_uncertainty(void **state)
{
    const bc_reference r = reference_of(&BY_MASS);
    analysis wide = BY_MASS;
    bc_composition c, d;
    bc_subject narrow_subject, wide_subject;

    (void)state;
    for (size_t i = 0; i < wide.count; i++)
        wide.rows[i].u *= 10.0;
    subject_of(&BY_MASS, &r, &c, &narrow_subject);
    subject_of(&wide, &r, &d, &wide_subject);
    for (size_t k = 0; k < MANY; k++) {
        const bc_figure n = figure_of(&narrow_subject, k), w = figure_of(&wide_subject, k);

        assert_within_at(QUANTITIES[k].id, w.u_composition / n.u_composition, 10.0, 1e-12);
        assert_within_at(QUANTITIES[k].id, w.u_tables / n.u_tables, 1.0, 1e-12);
    }
}

static void a_pure_gas_that_was_normalised_has_no_uncertainty_of_composition(void **state)
{
    const bc_reference r = reference_of(&PIPELINE);
    bc_composition c;
    bc_subject subject;
    bc_error err;

    (void)state;
    assert_ok(bc_composition_parse("methane=99.7~0.4", &c, &err), &err);
    assert_ok(bc_subject_make(&r, &c.gas, &c.spread, &subject, &err), &err);
    for (size_t k = 0; k < MANY; k++) {
        assert_within_at(QUANTITIES[k].id, figure_of(&subject, k).u_composition, 0.0, 0.0);
        assert_true(figure_of(&subject, k).u > 0.0);
    }
}

static void an_inert_gas_has_a_heat_of_nothing_without_uncertainty(void **state)
{
    const bc_reference r = reference_of(&PIPELINE);
    bc_composition c;
    bc_subject subject;
    bc_error err;

    (void)state;
    assert_ok(bc_composition_parse("nitrogen=71~0.5,carbon-dioxide=29~0.4", &c, &err), &err);
    assert_ok(bc_subject_make(&r, &c.gas, &c.spread, &subject, &err), &err);
    for (size_t k = 0; k < MANY; k++) {
        const bc_figure f = figure_of(&subject, k);

        assert_true(isfinite(f.value) && isfinite(f.u) && f.u >= 0.0);
    }
    assert_within(figure_of(&subject, 0).u, 0.0, 0.0);
    assert_true(figure_of(&subject, 4).u > 0.0);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(normalised_analyses_agree_with_monte_carlo),
        cmocka_unit_test(a_component_by_difference_agrees_with_monte_carlo),
        cmocka_unit_test(an_analysis_by_mass_agrees_with_monte_carlo),
        cmocka_unit_test(the_tables_alone_agree_with_monte_carlo),
        cmocka_unit_test(every_constant_enters_with_its_own_slope),
        cmocka_unit_test(the_share_of_the_composition_agrees_with_central_differences_on_every_basis),
        cmocka_unit_test(the_combined_uncertainty_is_the_root_of_both_shares),
        cmocka_unit_test(annex_d_has_the_uncertainty_of_the_standard),
        cmocka_unit_test(normalising_lowers_the_uncertainty_of_a_heating_value),
        cmocka_unit_test(ten_times_the_scatter_is_ten_times_the_uncertainty),
        cmocka_unit_test(a_pure_gas_that_was_normalised_has_no_uncertainty_of_composition),
        cmocka_unit_test(an_inert_gas_has_a_heat_of_nothing_without_uncertainty),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
