/* SPDX-License-Identifier: MIT */
/* test_worst_burner.c - what allowed gases do to a burner: forms against the burner model, random gases, limit cases.
 *
 * Every comparison is with bc_burner_respond() or the flows behind it, or with a certified extreme of a quantity:
 * no value is taken from elsewhere. */
#include "worst_cases.h"

#include "bluecone/composition.h"
#include "bluecone/flammability.h"
#include "bluecone/methane_number.h"
#include "bluecone/worst_burner.h"
#include "supply/burner_internal.h"
#include "supply/burner_ratio.h"

#define RANDOM_GASES 6000 /* a burner; half of them are drawn towards an extreme */
#define EXACT 1e-6        /* what the library promises, relative */
#define ROUNDING 2e-9     /* limits hold within 1e-9 of their bounds */

static const char PRESENT[] = "methane=91.7,ethane=4.4,propane=1.1,n-butane=0.3,hydrogen=0.6,nitrogen=1.2,carbon-dioxide=0.7";

static bc_space space;

static const bc_control CONTROLS[] = {BC_CONTROL_FIXED,    BC_CONTROL_PNEUMATIC, BC_CONTROL_VOLUME,   BC_CONTROL_MASS,
                                      BC_CONTROL_TRIM_AIR, BC_CONTROL_TRIM_GAS,  BC_CONTROL_ENTRAINED};

/* A burner on the present gas; what set points to lives as long. */
typedef struct {
    bc_reference reference;
    bc_subject old_gas;
    bc_burner burner;
    bc_burner_case set;
} rig;

static void rig_set(rig *r)
{
    bc_error err;

    assert_ok(bc_burner_set(&r->burner, &r->old_gas, &r->set, &err), &err);
}

static void rig_open(rig *r, const char *at, bc_control control)
{
    bc_composition c;
    bc_error err;

    reference_of(at, &r->reference);
    assert_ok(bc_composition_parse(PRESENT, &c, &err), &err);
    assert_ok(bc_subject_make(&r->reference, &c.gas, NULL, &r->old_gas, &err), &err);
    r->burner = bc_burner_default();
    r->burner.control = control;
    r->burner.has_input = true;
    r->burner.input_w = 1.62e6;
    r->burner.lambda = 1.17;
    r->burner.primary = 0.57;
    r->burner.has_air_dew = true;
    r->burner.air_dew_k = 284.3;
    rig_set(r);
}

static burner_flows flows_of(const rig *r, const bc_gas *gas, bc_subject *subject)
{
    const bc_burner_setting found = bc_burner_setting_as_found();
    burner_flows f;
    bc_error err;

    assert_ok(bc_subject_make(&r->reference, gas, NULL, subject, &err), &err);
    assert_ok(burner_flow_of(&r->set, subject, &found, true, &f, &err), &err);
    return f;
}

static double heat_of(const rig *r, const bc_gas *gas)
{
    bc_subject s;
    const burner_flows f = flows_of(r, gas, &s);

    return f.fuel * s.value.net_j_per_mol / r->old_gas.value.net_j_per_mol;
}

static double lambda_of(const rig *r, const bc_gas *gas)
{
    bc_subject s;

    return flows_of(r, gas, &s).lambda;
}

static bc_extremes extremes_of(const rig *r, bc_worst *w, bc_burner_figure figure)
{
    bc_extremes e;
    bc_error err;

    assert_ok(bc_worst_burner(w, &r->set, figure, &e, &err), &err);
    return e;
}

static double ratio_of(const bc_ratio *ratio, const bc_gas *gas)
{
    double value = 0.0;
    bc_error err;

    assert_ok(bc_ratio_evaluate(ratio, gas, &value, &err), &err);
    return value;
}

/* The form that holds on a gas, chosen by the travel as the burner's trim chooses. */
static double by_form(const rig *r, const burner_ratios *f, const bc_gas *gas, bool lambda)
{
    const double untrimmed = ratio_of(lambda ? &f->lambda : &f->heat, gas);
    const bool moves_gas = r->burner.control == BC_CONTROL_TRIM_GAS;
    const double travel = f->trims ? ratio_of(&f->travel, gas) : 1.0;
    const double held = fmin(fmax(travel, 1.0 - r->burner.trim_range), 1.0 + r->burner.trim_range);

    if (!f->trims || (!lambda && !moves_gas))
        return untrimmed;
    if (fabs(held - travel) < 1e-12)
        return ratio_of(lambda ? &f->held_lambda : &f->held_heat, gas);
    return lambda && moves_gas ? untrimmed / held : untrimmed * held;
}

/* The proof carries over to the burner because form and model are the same figure, to rounding, at any state. */
static void forms_equal_the_burner_model(void **state)
{
    static const char *const GASES[] = {"methane=100", "methane=83,ethane=9,propane=4,nitrogen=4", "methane=78,hydrogen=22",
                                        "hydrogen=57,carbon-monoxide=7,methane=24,nitrogen=9,carbon-dioxide=2.5,oxygen=0.5", "propane=55,air=45"};
    static const char *const STATES[] = {"15/15", "25/0", "60F/60F@14.73psi"};
    rig r;

    (void)state;
    for (size_t k = 0; k < COUNT(CONTROLS) * COUNT(STATES) * BC_DOSINGS; k++) {
        burner_ratios f;
        bc_error err;

        rig_open(&r, STATES[k % COUNT(STATES)], CONTROLS[k / COUNT(STATES) % COUNT(CONTROLS)]);
        r.burner.dosing = (bc_dosing)(k / (COUNT(STATES) * COUNT(CONTROLS)));
        r.burner.trim_range = 0.04;
        r.burner.o2_basis = k % 2 ? BC_FLUE_WET : BC_FLUE_DRY;
        rig_set(&r);
        assert_ok(burner_ratios_of(&r.set, &f, &err), &err);
        for (size_t g = 0; g < COUNT(GASES); g++) {
            bc_composition c;

            assert_ok(bc_composition_parse(GASES[g], &c, &err), &err);
            const double heat = heat_of(&r, &c.gas), lambda = lambda_of(&r, &c.gas);

            assert_within_at(GASES[g], by_form(&r, &f, &c.gas, false), heat, 1e-12 * heat);
            if (r.burner.control != BC_CONTROL_ENTRAINED)
                assert_within_at(GASES[g], by_form(&r, &f, &c.gas, true), lambda, 1e-12 * lambda);
        }
    }
}

/* An end is attained on the burner itself, proven, and on the right side of its proof. */
static void assert_end(const char *what, const bc_extreme *end, double sign, double attained)
{
    assert_true(end->exact && end->bounded);
    assert_within_at(what, end->value, attained, ROUNDING * fabs(attained));
    assert_within_at(what, end->bound, end->value, EXACT * fabs(end->value));
    assert_true(sign * (end->bound - end->value) >= 0.0);
}

static void fractions_of(const bc_gas *gas, double x[])
{
    for (size_t j = 0; j < space.component_count; j++)
        x[j] = gas->x[space.components[j].species];
}

/* A random walk, every second gas drawn towards one of the ends by up to 99.99 % of the way. */
static void no_gas_lies_beyond(const rig *r, const bc_extremes *heat, const bc_extremes *lambda, chance *c)
{
    const bc_extreme *const ends[] = {&heat->min, &heat->max, &lambda->min, &lambda->max};
    double x[BC_SPECIES_CAPACITY], end[BC_SPECIES_CAPACITY], y[BC_SPECIES_CAPACITY];
    const bool has_lambda = lambda->min.exact;

    fractions_of(&heat->min.gas, x);
    for (size_t i = 0, allowed = 0; allowed < RANDOM_GASES; i++) {
        const double left = i % 2 ? 1.0 : pow(10.0, -4.0 * chance_uniform(c));

        assert_true(i < 60 * RANDOM_GASES);
        (void)walk(&space, c, x);
        fractions_of(&ends[chance_below(c, has_lambda ? 4 : 2)]->gas, end);
        for (size_t j = 0; j < space.component_count; j++)
            y[j] = left * x[j] + (1.0 - left) * end[j];
        if (!space_allows(&space, y))
            continue;
        const bc_gas gas = gas_of(&space, y);
        const double q = heat_of(r, &gas), l = lambda_of(r, &gas);

        if (q < heat->min.bound || q > heat->max.bound)
            fail_msg("%s: heat %.12g is not between %.12g and %.12g", bc_control_word(r->burner.control), q, heat->min.bound, heat->max.bound);
        if (has_lambda && (l < lambda->min.bound || l > lambda->max.bound))
            fail_msg("%s: lambda %.12g is not between %.12g and %.12g", bc_control_word(r->burner.control), l, lambda->min.bound, lambda->max.bound);
        allowed++;
    }
}

static void check_burner(const rig *r, chance *c)
{
    const char *word = bc_control_word(r->burner.control);
    bc_worst *w = opened(&space);
    const bc_extremes heat = extremes_of(r, w, BC_BURNER_HEAT), lambda = extremes_of(r, w, BC_BURNER_LAMBDA);

    assert_end(word, &heat.min, -1.0, heat_of(r, &heat.min.gas));
    assert_end(word, &heat.max, 1.0, heat_of(r, &heat.max.gas));
    if (r->burner.control != BC_CONTROL_ENTRAINED) {
        assert_end(word, &lambda.min, -1.0, lambda_of(r, &lambda.min.gas));
        assert_end(word, &lambda.max, 1.0, lambda_of(r, &lambda.max.gas));
    }
    no_gas_lies_beyond(r, &heat, &lambda, c);
    bc_worst_close(w);
}

static void no_random_gas_lies_beyond_an_exact_extreme(void **state)
{
    chance c = {77};
    rig r;

    (void)state;
    natural_gas(&space);
    add_contract(&space);
    for (size_t k = 0; k < COUNT(CONTROLS); k++) {
        rig_open(&r, k % 2 ? "25/0" : "15/15", CONTROLS[k]);
        check_burner(&r, &c);
    }
}

/* Ranges in which some gases leave the trim within its range and others at either end, and a range that is none. */
static void a_trim_is_certified_part_by_part(void **state)
{
    static const double RANGES[] = {0.0, 0.004, 0.02, 0.9};
    chance c = {78};
    rig r;

    (void)state;
    natural_gas(&space);
    add_contract(&space);
    for (size_t k = 0; k < COUNT(RANGES) * 2 * BC_DOSINGS; k++) {
        rig_open(&r, "15/15", k % 2 ? BC_CONTROL_TRIM_AIR : BC_CONTROL_TRIM_GAS);
        r.burner.trim_range = RANGES[k / 2 % COUNT(RANGES)];
        r.burner.dosing = (bc_dosing)(k / (2 * COUNT(RANGES)));
        rig_set(&r);
        check_burner(&r, &c);
    }
}

/* The parts matter: a space crosses both ends of the narrow range, and leaves the wide one alone. */
static void the_travel_of_a_trim_tells_whether_it_holds(void **state)
{
    rig r;

    (void)state;
    natural_gas(&space);
    add_contract(&space);
    bc_worst *w = opened(&space);

    for (int k = 0; k < 2; k++) {
        rig_open(&r, "15/15", k ? BC_CONTROL_TRIM_AIR : BC_CONTROL_TRIM_GAS);
        r.burner.trim_range = 0.02;
        rig_set(&r);
        const bc_extremes travel = extremes_of(&r, w, BC_BURNER_TRIM), loose = extremes_of(&r, w, BC_BURNER_FLUE_O2);

        assert_true(travel.min.exact && travel.min.value < 0.98 && travel.max.exact && travel.max.value > 1.02);
        assert_true(!loose.min.exact && loose.min.value < r.set.o2 && loose.max.value > r.set.o2);
        r.burner.trim_range = 0.3;
        rig_set(&r);
        const bc_extremes held = extremes_of(&r, w, BC_BURNER_FLUE_O2);

        assert_true(held.min.exact && held.max.exact);
        assert_within(held.min.value, r.set.o2, 0.0);
        assert_within(held.max.value, r.set.o2, 0.0);
        r.burner.lambda = 0.93; /* rich: the air factor is what is held */
        rig_set(&r);
        const bc_extremes rich = extremes_of(&r, w, BC_BURNER_LAMBDA), none = extremes_of(&r, w, BC_BURNER_FLUE_O2);

        assert_true(rich.min.exact && rich.max.exact && none.max.exact);
        assert_within(rich.min.value, 0.93, 0.93 * EXACT);
        assert_within(rich.max.value, 0.93, 0.93 * EXACT);
        assert_within(none.max.value, 0.0, 0.0);
    }
    bc_worst_close(w);
}

static void assert_carries_over(bc_control control, const char *id)
{
    bc_worst *w = opened(&space);
    bc_extremes of_quantity;
    bc_error err;
    rig r;

    rig_open(&r, "25/0", control);
    const bc_extremes heat = extremes_of(&r, w, BC_BURNER_HEAT);

    assert_ok(bc_worst_quantity(w, quantity_of(id), &r.reference, &of_quantity, &err), &err);
    bc_figure old;

    assert_ok(bc_quantity_evaluate(quantity_of(id), &r.old_gas, &old, &err), &err);
    assert_within_at(id, heat.min.value, of_quantity.min.value / old.value, EXACT * heat.min.value);
    assert_within_at(id, heat.max.value, of_quantity.max.value / old.value, EXACT * heat.max.value);
    bc_worst_close(w);
}

static void heat_goes_with_the_quantity_that_the_control_follows(void **state)
{
    (void)state;
    natural_gas(&space);
    add_contract(&space);
    assert_carries_over(BC_CONTROL_FIXED, "wobbe-net");
    assert_carries_over(BC_CONTROL_PNEUMATIC, "wobbe-net");
    assert_carries_over(BC_CONTROL_TRIM_AIR, "wobbe-net");
    assert_carries_over(BC_CONTROL_ENTRAINED, "wobbe-net");
    assert_carries_over(BC_CONTROL_VOLUME, "lhv");
    assert_carries_over(BC_CONTROL_MASS, "lhv-mass");
}

/* A space of the present gas alone. */
static void allow_nothing_but(const bc_gas *gas)
{
    memset(&space, 0, sizeof space);
    for (size_t i = 0; i < bc_species_count(); i++)
        if (gas->x[i] > 0.0)
            space.components[space.component_count++] = (bc_space_component){i, gas->x[i], gas->x[i]};
}

static void a_window_of_the_present_gas_gives_the_setting_back(void **state)
{
    rig r;

    (void)state;
    for (size_t k = 0; k < COUNT(CONTROLS) * 2; k++) {
        rig_open(&r, "15/15", CONTROLS[k / 2]);
        r.burner.has_pressure = k % 2; /* the nozzle, too */
        r.burner.gas_pa = 3.1e5;
        rig_set(&r);
        allow_nothing_but(&r.old_gas.gas);
        bc_worst *w = opened(&space);
        const bc_extremes heat = extremes_of(&r, w, BC_BURNER_HEAT), lambda = extremes_of(&r, w, BC_BURNER_LAMBDA);
        const bc_extremes o2 = extremes_of(&r, w, BC_BURNER_FLUE_O2), flame = extremes_of(&r, w, BC_BURNER_FLAME);
        const bc_burner_setting found = bc_burner_setting_as_found();
        bc_burner_response x;

        assert_int_equal(bc_burner_respond(&r.set, &r.old_gas, &found, &x, NULL), BC_OK);
        assert_within_at(bc_control_word(CONTROLS[k / 2]), heat.min.value * r.set.input_w, 1.62e6, 1.62e6 * ROUNDING);
        assert_within_at(bc_control_word(CONTROLS[k / 2]), heat.max.value * r.set.input_w, 1.62e6, 1.62e6 * ROUNDING);
        assert_within(lambda.min.value, 1.17, 1.17 * ROUNDING);
        assert_within(lambda.max.value, 1.17, 1.17 * ROUNDING);
        assert_within(o2.max.value, x.o2_dry, 1e-9);
        assert_within(flame.min.value, x.burn.flame.t_k, 1e-4); /* the equilibrium's own tolerance is 1e-9 of it */
        assert_within(flame.max.value, x.burn.flame.t_k, 1e-4);
        bc_worst_close(w);
    }
}

/* Against the objective of a search, which knows nothing of slices. */
static double heat_objective(const bc_gas *gas, void *context)
{
    return heat_of(context, gas);
}

/* The nozzle brings cp/cv in: no ratio of sums, but slices of heat capacity prove it; subcritical and choked, with a
 * flow that drives the heat and one that holds it back. */
static void behind_a_nozzle_slices_of_heat_capacity_prove(void **state)
{
    static const double PRESSURES[] = {0.065e5, 0.6e5, 3.1e5};
    static const bc_control NOZZLES[] = {BC_CONTROL_FIXED, BC_CONTROL_PNEUMATIC, BC_CONTROL_TRIM_AIR, BC_CONTROL_ENTRAINED};
    chance c = {81};
    rig r;

    (void)state;
    natural_gas(&space);
    add_contract(&space);
    bc_worst *w = opened(&space);

    rig_open(&r, "15/15", BC_CONTROL_FIXED);
    const bc_extremes plain = extremes_of(&r, w, BC_BURNER_HEAT);

    for (size_t k = 0; k < COUNT(PRESSURES) * COUNT(NOZZLES); k++) {
        bc_extremes searched;

        rig_open(&r, "15/15", NOZZLES[k % COUNT(NOZZLES)]);
        r.burner.has_pressure = true;
        r.burner.gas_pa = PRESSURES[k / COUNT(NOZZLES)];
        r.burner.trim_range = 0.3;
        rig_set(&r);
        check_burner(&r, &c);
        const bc_extremes e = extremes_of(&r, w, BC_BURNER_HEAT);

        assert_int_equal(bc_worst_search(w, heat_objective, &r, &searched, NULL), BC_OK);
        assert_true(searched.min.value >= e.min.bound && searched.max.value <= e.max.bound);
        assert_true(fabs(e.max.value - plain.max.value) > 1e-5); /* the nozzle does matter */
    }
    bc_worst_close(w);
}

/* A trim that comes to its end behind a nozzle is the one case that is searched for; one that holds is proven. */
static void a_trim_behind_a_nozzle_is_proven_while_it_holds(void **state)
{
    chance c = {82};
    rig r;

    (void)state;
    natural_gas(&space);
    add_contract(&space);
    bc_worst *w = opened(&space);

    rig_open(&r, "15/15", BC_CONTROL_TRIM_GAS);
    r.burner.has_pressure = true;
    r.burner.gas_pa = 3.1e5;
    r.burner.trim_range = 0.3;
    rig_set(&r);
    check_burner(&r, &c);
    r.burner.trim_range = 0.01;
    rig_set(&r);
    const bc_extremes travel = extremes_of(&r, w, BC_BURNER_TRIM), heat = extremes_of(&r, w, BC_BURNER_HEAT);

    assert_true(travel.min.exact && travel.max.exact && travel.max.value > 1.01);
    assert_true(!heat.min.exact && !heat.max.exact && !heat.max.bounded);
    assert_within(heat.max.value, heat_of(&r, &heat.max.gas), 1e-12);

    const double reach = fmax(travel.max.value - 1.0, 1.0 - travel.min.value);

    for (int k = 0; k < 2; k++) { /* a thousandth beyond what is asked of it, and a thousandth short of it */
        r.burner.trim_range = reach * (k == 0 ? 1.001 : 0.999);
        rig_set(&r);
        const bc_extremes end = extremes_of(&r, w, BC_BURNER_HEAT);

        assert_int_equal(end.min.exact, k == 0);
        assert_int_equal(end.max.exact, k == 0);
    }
    bc_worst_close(w);
}

/* What the slices rest on, subcritical and choked. */
static void the_factor_of_a_nozzle_falls_with_the_heat_capacity_and_is_convex(void **state)
{
    rig r;

    (void)state;
    rig_open(&r, "15/15", BC_CONTROL_FIXED);
    r.burner.has_pressure = true;
    for (double gas_pa = 3.3e3; gas_pa < 4e6; gas_pa *= 1.37) {
        r.burner.gas_pa = gas_pa;
        rig_set(&r);
        for (double cp = 20.7; cp < 130.0; cp += 0.7) { /* helium to hexane, J/(mol K) */
            const double before = burner_nozzle_factor(&r.set, cp - 0.1), after = burner_nozzle_factor(&r.set, cp + 0.1);
            const double factor = burner_nozzle_factor(&r.set, cp);

            assert_true(factor < before && after < factor);
            assert_true(before + after - 2.0 * factor > -1e-14); /* rounding of the three */
        }
    }
}

/* At 3 % of the absolute pressure and below Bernoulli's equation is used, and the heat is exact. */
static void a_low_gas_pressure_is_no_nozzle(void **state)
{
    rig r;

    (void)state;
    natural_gas(&space);
    bc_worst *w = opened(&space);

    rig_open(&r, "15/15", BC_CONTROL_FIXED);
    const bc_extremes plain = extremes_of(&r, w, BC_BURNER_HEAT);

    r.burner.has_pressure = true;
    r.burner.gas_pa = 2.3e3;
    rig_set(&r);
    const bc_extremes e = extremes_of(&r, w, BC_BURNER_HEAT);

    assert_true(e.min.exact && e.max.exact);
    assert_within(e.min.value, plain.min.value, 0.0);
    assert_within(e.max.value, plain.max.value, 0.0);
    bc_worst_close(w);
}

/* What is searched for is attained, and no random gas is far beyond it. */
static void searched_figures_are_attained_by_their_gases(void **state)
{
    chance c = {79};
    rig r;

    (void)state;
    natural_gas(&space);
    add_contract(&space);
    bc_worst *w = opened(&space);

    rig_open(&r, "15/15", BC_CONTROL_ENTRAINED);
    const bc_extremes lambda = extremes_of(&r, w, BC_BURNER_LAMBDA);
    const bc_extremes o2 = extremes_of(&r, w, BC_BURNER_FLUE_O2), flame = extremes_of(&r, w, BC_BURNER_FLAME);
    const bc_burner_setting found = bc_burner_setting_as_found();
    double x[BC_SPECIES_CAPACITY];

    assert_within(lambda.max.value, lambda_of(&r, &lambda.max.gas), 1e-12);
    assert_within(lambda.min.value, lambda_of(&r, &lambda.min.gas), 1e-12);
    fractions_of(&lambda.min.gas, x);
    for (int i = 0; i < 400; i++) {
        bc_burner_response y;
        bc_subject s;

        for (int steps = 0; steps < 10; steps++)
            (void)walk(&space, &c, x);
        const bc_gas gas = i == 0 ? o2.max.gas : i == 1 ? flame.max.gas : gas_of(&space, x);

        assert_int_equal(bc_subject_make(&r.reference, &gas, NULL, &s, NULL), BC_OK);
        assert_int_equal(bc_burner_respond(&r.set, &s, &found, &y, NULL), BC_OK);
        if (i == 0)
            assert_within(o2.max.value, y.o2_dry, 1e-12);
        if (i == 1)
            assert_within(flame.max.value, y.burn.flame.t_k, 1e-6);
        assert_true(y.lambda >= lambda.min.value - 1e-6 && y.lambda <= lambda.max.value + 1e-6);
        assert_true(y.o2_dry >= o2.min.value - 1e-6 && y.o2_dry <= o2.max.value + 1e-6);
        assert_true(y.burn.flame.t_k >= flame.min.value - 0.01 && y.burn.flame.t_k <= flame.max.value + 0.01);
    }
    bc_worst_close(w);
}

/* Searched figures are told only when the method covers every gas that was asked of. */
static void a_method_that_does_not_cover_every_gas_gives_no_extreme(void **state)
{
    static const window WINDOWS[] = {{"methane", 85, 100}, {"ethane", 0, 5}, {"propane", 0, 1.5}, {"nitrogen", 0, 1}, {"hydrogen", 0, 0.4}};
    bc_extremes e;
    bc_error err;
    rig r;

    (void)state;
    memset(&space, 0, sizeof space);
    add_windows(&space, WINDOWS, COUNT(WINDOWS));
    bc_worst *w = opened(&space);

    rig_open(&r, "15/15", BC_CONTROL_FIXED);
    const bc_extremes velocity = extremes_of(&r, w, BC_BURNER_VELOCITY), knock = extremes_of(&r, w, BC_BURNER_METHANE_NUMBER);
    bc_burning_velocity v, old;
    bc_methane_number n;

    assert_int_equal(bc_burning_velocity_of(&velocity.max.gas, &v, NULL), BC_OK);
    assert_int_equal(bc_burning_velocity_of(&r.old_gas.gas, &old, NULL), BC_OK);
    assert_within(velocity.max.value, v.value_m_per_s / old.value_m_per_s, 1e-12);
    assert_int_equal(bc_methane_number_of(&knock.min.gas, &n, NULL), BC_OK);
    assert_within(knock.min.value, n.linear, 1e-9);
    assert_true(knock.min.gas.x[species_of("propane")] > 0.0149); /* what knocks most */
    assert_true(!knock.min.exact && !velocity.max.exact);
    bc_worst_close(w);
    space.components[4].max = 0.02; /* neither route of the methane number has a term for hydrogen */
    w = opened(&space);
    assert_refused(bc_worst_burner(w, &r.set, BC_BURNER_METHANE_NUMBER, &e, &err), &err, BC_ERR_RANGE, "does not cover");
    (void)extremes_of(&r, w, BC_BURNER_VELOCITY);

    bc_composition monoxide; /* an old gas outside of the mixing rule has no velocity to compare with */

    assert_int_equal(bc_composition_parse("carbon-monoxide=60,hydrogen=40", &monoxide, NULL), BC_OK);
    assert_int_equal(bc_subject_make(&r.reference, &monoxide.gas, NULL, &r.old_gas, NULL), BC_OK);
    rig_set(&r);
    assert_refused(bc_worst_burner(w, &r.set, BC_BURNER_VELOCITY, &e, &err), &err, BC_ERR_RANGE, "such a figure");
    bc_worst_close(w);
}

/* A state that saturates the gas: certified with one fraction of water, searched for over a window of it. */
static void a_saturated_state_counts_its_water(void **state)
{
    static const window WINDOWS[] = {{"methane", 0, 100}, {"ethane", 1, 9}, {"nitrogen", 0.3, 6}, {"water", 0.2, 0.2}};
    bc_state saturated = bc_state_default();
    bc_composition c;
    chance random = {80};
    rig r;

    (void)state;
    rig_open(&r, "15/15", BC_CONTROL_TRIM_GAS);
    saturated.saturated = true;
    r.burner.trim_range = 0.01;
    assert_int_equal(bc_reference_at(&saturated, &r.reference, NULL), BC_OK);
    assert_int_equal(bc_composition_parse(PRESENT, &c, NULL), BC_OK);
    assert_int_equal(bc_subject_make(&r.reference, &c.gas, NULL, &r.old_gas, NULL), BC_OK);
    rig_set(&r);
    memset(&space, 0, sizeof space);
    add_windows(&space, WINDOWS, COUNT(WINDOWS));
    check_burner(&r, &random);
    space.components[3].max = 0.004;
    bc_worst *w = opened(&space);
    const bc_extremes e = extremes_of(&r, w, BC_BURNER_HEAT);

    assert_true(!e.min.exact && e.min.value > 0.5 && e.max.value > e.min.value);
    bc_worst_close(w);
}

/* What was asked of a trim leaves nothing behind: its windows are no limits of the space. */
static void a_trim_leaves_the_space_as_it_was(void **state)
{
    bc_extremes before, after;
    bc_error err;
    rig r;

    (void)state;
    natural_gas(&space);
    add_contract(&space);
    bc_worst *w = opened(&space);

    rig_open(&r, "15/15", BC_CONTROL_TRIM_GAS);
    r.burner.trim_range = 0.004;
    rig_set(&r);
    assert_ok(bc_worst_quantity(w, quantity_of("hhv"), &r.reference, &before, &err), &err);
    (void)extremes_of(&r, w, BC_BURNER_HEAT);
    assert_ok(bc_worst_quantity(w, quantity_of("hhv"), &r.reference, &after, &err), &err);
    assert_memory_equal(&before, &after, sizeof before);
    bc_worst_close(w);
}

static void a_gas_that_does_not_burn_has_no_air_factor(void **state)
{
    static const window WINDOWS[] = {{"methane", 0, 100}, {"nitrogen", 0, 100}};
    bc_extremes e;
    bc_error err;
    rig r;

    (void)state;
    memset(&space, 0, sizeof space);
    add_windows(&space, WINDOWS, COUNT(WINDOWS));
    bc_worst *w = opened(&space);

    rig_open(&r, "15/15", BC_CONTROL_FIXED);
    e = extremes_of(&r, w, BC_BURNER_HEAT);
    assert_within(e.min.value, 0.0, 0.0);
    assert_refused(bc_worst_burner(w, &r.set, BC_BURNER_LAMBDA, &e, &err), &err, BC_ERR_RANGE, "does not burn");
    r.burner.has_pressure = true;
    r.burner.gas_pa = 1.4e5;
    rig_set(&r);
    assert_refused(bc_worst_burner(w, &r.set, BC_BURNER_LAMBDA, &e, &err), &err, BC_ERR_RANGE, "does not burn");
    bc_worst_close(w);
}

/* Above half of hydrogen the rule of burning velocities ends: in the new gases as in the old one. */
static void a_velocity_outside_of_its_rule_is_no_figure(void **state)
{
    static const window MUCH[] = {{"methane", 0, 100}, {"hydrogen", 40, 60}}, LITTLE[] = {{"methane", 0, 100}, {"hydrogen", 20, 40}};
    bc_composition much;
    bc_extremes e;
    bc_error err;
    rig r;

    (void)state;
    rig_open(&r, "15/15", BC_CONTROL_FIXED);
    memset(&space, 0, sizeof space);
    add_windows(&space, MUCH, COUNT(MUCH));
    bc_worst *w = opened(&space);

    assert_refused(bc_worst_burner(w, &r.set, BC_BURNER_VELOCITY, &e, &err), &err, BC_ERR_RANGE, "no such figure");
    bc_worst_close(w);
    memset(&space, 0, sizeof space);
    add_windows(&space, LITTLE, COUNT(LITTLE));
    w = opened(&space);
    (void)extremes_of(&r, w, BC_BURNER_VELOCITY);
    assert_int_equal(bc_composition_parse("hydrogen=60,methane=40", &much, NULL), BC_OK);
    assert_int_equal(bc_subject_make(&r.reference, &much.gas, NULL, &r.old_gas, NULL), BC_OK);
    rig_set(&r);
    assert_refused(bc_worst_burner(w, &r.set, BC_BURNER_VELOCITY, &e, &err), &err, BC_ERR_RANGE, "such a figure");
    bc_worst_close(w);
}

static void what_cannot_be_asked_is_refused(void **state)
{
    static const window WINDOWS[] = {{"methane", 90, 95}, {"ethane", 0, 2}};
    bc_extremes e;
    bc_error err;
    rig r;

    (void)state;
    memset(&space, 0, sizeof space);
    add_windows(&space, WINDOWS, COUNT(WINDOWS));
    bc_worst *none = opened(&space);

    rig_open(&r, "15/15", BC_CONTROL_FIXED);
    assert_refused(bc_worst_burner(none, &r.set, BC_BURNER_HEAT, &e, &err), &err, BC_ERR_INPUT, "exclude each other");
    bc_worst_close(none);
    natural_gas(&space);
    bc_worst *w = opened(&space);

    assert_refused(bc_worst_burner(w, &r.set, BC_BURNER_TRIM, &e, &err), &err, BC_ERR_USAGE, "no trim|fixed");
    assert_refused(bc_worst_burner(w, &r.set, BC_BURNER_FIGURES, &e, &err), &err, BC_ERR_USAGE, "no figure");
    bc_worst_close(w);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(forms_equal_the_burner_model),
        cmocka_unit_test(no_random_gas_lies_beyond_an_exact_extreme),
        cmocka_unit_test(a_trim_is_certified_part_by_part),
        cmocka_unit_test(the_travel_of_a_trim_tells_whether_it_holds),
        cmocka_unit_test(heat_goes_with_the_quantity_that_the_control_follows),
        cmocka_unit_test(a_window_of_the_present_gas_gives_the_setting_back),
        cmocka_unit_test(behind_a_nozzle_slices_of_heat_capacity_prove),
        cmocka_unit_test(a_trim_behind_a_nozzle_is_proven_while_it_holds),
        cmocka_unit_test(the_factor_of_a_nozzle_falls_with_the_heat_capacity_and_is_convex),
        cmocka_unit_test(a_low_gas_pressure_is_no_nozzle),
        cmocka_unit_test(searched_figures_are_attained_by_their_gases),
        cmocka_unit_test(a_method_that_does_not_cover_every_gas_gives_no_extreme),
        cmocka_unit_test(a_saturated_state_counts_its_water),
        cmocka_unit_test(a_trim_leaves_the_space_as_it_was),
        cmocka_unit_test(a_gas_that_does_not_burn_has_no_air_factor),
        cmocka_unit_test(a_velocity_outside_of_its_rule_is_no_figure),
        cmocka_unit_test(what_cannot_be_asked_is_refused),
    };

    return cmocka_run_group_tests_name("supply/test_worst_burner", tests, NULL, NULL);
}
