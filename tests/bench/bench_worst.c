/* SPDX-License-Identifier: MIT */
/* bench_worst.c - the worst gas of a contract with twenty components: certified and searched extremes. */
#include "bluecone/composition.h"
#include "bluecone/quantity.h"
#include "bluecone/worst_burner.h"

#include <math.h>
#include <stdio.h>
#include <stdlib.h>
#include <time.h>

#define REPEATS 20

static bc_space space;

static double milliseconds(void)
{
    struct timespec t;

    (void)clock_gettime(CLOCK_MONOTONIC, &t);
    return 1e3 * (double)t.tv_sec + 1e-6 * (double)t.tv_nsec;
}

static void need(bc_status status, const bc_error *err)
{
    if (status == BC_OK)
        return;
    fprintf(stderr, "%s\n", err->message);
    exit(EXIT_FAILURE);
}

static size_t quantity_of(const char *id)
{
    size_t quantity = 0;
    bc_error err;

    need(bc_quantity_find(id, &quantity, &err), &err);
    return quantity;
}

static void reference_of(const char *text, bc_reference *reference)
{
    bc_state s = bc_state_default();
    bc_error err;

    need(bc_state_parse(text, &s, &err), &err);
    need(bc_reference_at(&s, reference, &err), &err);
}

/* Windows of a natural gas with hydrogen, mole percent; methane is the rest. */
static void add_ranges(void)
{
    static const struct {
        const char *id;
        double min, max;
    } WINDOWS[] = {
        {"methane", 0, 100},   {"ethane", 0, 12},      {"propane", 0, 6},          {"n-butane", 0, 1.5},    {"isobutane", 0, 1.5},
        {"n-pentane", 0, 0.4}, {"isopentane", 0, 0.4}, {"neopentane", 0, 0.1},     {"n-hexane", 0.01, 0.2}, {"n-heptane", 0, 0.1},
        {"n-octane", 0, 0.05}, {"benzene", 0, 0.05},   {"toluene", 0.003, 0.003},  {"hydrogen", 0, 10},     {"carbon-monoxide", 0, 0.5},
        {"nitrogen", 0.2, 12}, {"helium", 0, 0.5},     {"carbon-dioxide", 0, 5},   {"oxygen", 0, 0.2},      {"hydrogen-sulfide", 0, 0.0005},
    };
    bc_space_group *inerts = &space.groups[space.group_count++];
    bc_error err;

    for (size_t i = 0; i < sizeof WINDOWS / sizeof *WINDOWS; i++) {
        bc_space_component *c = &space.components[space.component_count++];

        need(bc_species_find(WINDOWS[i].id, &c->species, &err), &err);
        c->min = WINDOWS[i].min / 100.0;
        c->max = WINDOWS[i].max / 100.0;
    }
    inerts->weight[space.components[15].species] = 1.0;
    inerts->weight[space.components[17].species] = 1.0;
    inerts->min = -INFINITY;
    inerts->max = 0.13;
}

static void add_limit(const char *id, const char *at, double min, double max)
{
    bc_space_limit *l = &space.limits[space.limit_count++];
    bc_reference reference;
    bc_error err;

    reference_of(at, &reference);
    need(bc_ratio_of_quantity(quantity_of(id), &reference, &l->ratio, &err), &err);
    l->min = min;
    l->max = max;
}

/* Best time of several runs, each with a space opened anew. */
static void measure(const char *name, double target_ms, const char *const ids[], size_t count)
{
    double best = HUGE_VAL;
    size_t exact = 0;
    bc_reference reference;
    bc_error err;

    reference_of("15/15", &reference);
    for (int repeat = 0; repeat < REPEATS; repeat++) {
        const double start = milliseconds();
        bc_worst *worst = NULL;

        exact = 0;
        need(bc_worst_open(&space, &worst, &err), &err);
        for (size_t i = 0; i < count; i++) {
            bc_extremes e;

            need(bc_worst_quantity(worst, quantity_of(ids[i]), &reference, &e, &err), &err);
            exact += (size_t)e.min.exact + (size_t)e.max.exact;
        }
        bc_worst_close(worst);
        best = fmin(best, milliseconds() - start);
    }
    printf("  %-40s %8.2f ms   target %3.0f ms   %zu of %zu extremes exact\n", name, best, target_ms, exact, 2 * count);
}

/* A burner of one control on a natural gas: its first five figures, as far as it has them. */
static void measure_burner(const char *name, double target_ms, bc_control control, double gas_pa)
{
    bc_burner burner = bc_burner_default();
    double best = HUGE_VAL;
    size_t exact = 0, asked = 0;
    bc_composition present;
    bc_reference reference;
    bc_burner_case set;
    bc_subject old_gas;
    bc_error err;

    reference_of("15/15", &reference);
    need(bc_composition_parse("methane=92,ethane=4.5,propane=1.2,nitrogen=1.3,carbon-dioxide=1", &present, &err), &err);
    need(bc_subject_make(&reference, &present.gas, NULL, &old_gas, &err), &err);
    burner.control = control;
    burner.trim_range = 0.01;
    burner.has_pressure = gas_pa > 0.0;
    burner.gas_pa = gas_pa;
    need(bc_burner_set(&burner, &old_gas, &set, &err), &err);
    for (int repeat = 0; repeat < REPEATS; repeat++) {
        const double start = milliseconds();
        bc_worst *worst = NULL;

        exact = asked = 0;
        need(bc_worst_open(&space, &worst, &err), &err);
        for (int figure = 0; figure <= (int)BC_BURNER_FLAME; figure++) {
            bc_extremes e;

            if (figure == BC_BURNER_TRIM && control != BC_CONTROL_TRIM_GAS)
                continue;
            need(bc_worst_burner(worst, &set, (bc_burner_figure)figure, &e, &err), &err);
            exact += (size_t)e.min.exact + (size_t)e.max.exact;
            asked += 2;
        }
        bc_worst_close(worst);
        best = fmin(best, milliseconds() - start);
    }
    printf("  %-40s %8.2f ms   target %3.0f ms   %zu of %zu extremes exact\n", name, best, target_ms, exact, asked);
}

int main(void)
{
    static const char *const EXACT[] = {"hhv", "lhv", "wobbe-gross", "wobbe-net", "density", "relative-density", "z", "hhv-mass", "lhv-mole", "air-demand",
                                        "co2-factor-net", "flue-dew-point"};
    static const char *const SEARCHED[] = {"flame-temperature", "flame-temperature-complete", "acid-dew-point", "lfl", "ufl", "burning-velocity",
                                           "flame-temperature", "flame-temperature-complete", "acid-dew-point", "lfl", "ufl", "burning-velocity"};

    add_ranges();
    measure("ranges, 12 exact quantities", 30.0, EXACT, sizeof EXACT / sizeof *EXACT);
    add_limit("wobbe-gross", "25/0", 46.1, 56.5);
    measure("one limit at another state, the same", 30.0, EXACT, sizeof EXACT / sizeof *EXACT);
    add_limit("relative-density", "15/15", 0.55, 0.70);
    add_limit("hhv", "0/0", 36.0, 47.0);
    add_limit("wobbe-net", "15/15", 41.0, 52.0);
    add_limit("z", "15/15", 0.9965, 0.9985);
    measure("five limits, the same", 30.0, EXACT, sizeof EXACT / sizeof *EXACT);
    measure("five limits, 12 searched", 500.0, SEARCHED, sizeof SEARCHED / sizeof *SEARCHED);
    measure_burner("five limits, a burner with orifice", 250.0, BC_CONTROL_FIXED, 0.0);
    measure_burner("five limits, behind a nozzle", 250.0, BC_CONTROL_FIXED, 3e5);
    measure_burner("five limits, a trim at its ends", 250.0, BC_CONTROL_TRIM_GAS, 0.0);
    return EXIT_SUCCESS;
}
