/* SPDX-License-Identifier: MIT */
/* worst_cases.h - spaces of compositions that several tests ask, and random walks inside them. */
#ifndef WORST_CASES_H
#define WORST_CASES_H

#include "bluecone/quantity.h"
#include "bluecone/worst.h"
#include "support.h"

typedef struct {
    const char *species;
    double min, max; /* mole percent */
} window;

static inline size_t species_of(const char *word)
{
    size_t species = 0;

    assert_int_equal(bc_species_find(word, &species, NULL), BC_OK);
    return species;
}

static inline size_t quantity_of(const char *id)
{
    size_t quantity = 0;

    assert_int_equal(bc_quantity_find(id, &quantity, NULL), BC_OK);
    return quantity;
}

static inline void reference_of(const char *text, bc_reference *reference)
{
    bc_state s = bc_state_default();

    assert_int_equal(bc_state_parse(text, &s, NULL), BC_OK);
    assert_int_equal(bc_reference_at(&s, reference, NULL), BC_OK);
}

static inline void add_windows(bc_space *space, const window windows[], size_t count)
{
    for (size_t i = 0; i < count; i++)
        space->components[space->component_count++] =
            (bc_space_component){species_of(windows[i].species), windows[i].min / 100.0, windows[i].max / 100.0};
}

/* A group of up to four species, mole percent. */
static inline void add_group(bc_space *space, const char *const words[4], double min, double max)
{
    bc_space_group *g = &space->groups[space->group_count++];

    memset(g, 0, sizeof *g);
    for (size_t i = 0; i < 4 && words[i]; i++)
        g->weight[species_of(words[i])] = 1.0;
    g->min = min / 100.0;
    g->max = max / 100.0;
}

static inline void add_limit(bc_space *space, const char *id, const char *at, double min, double max)
{
    bc_space_limit *l = &space->limits[space->limit_count++];
    bc_reference reference;

    reference_of(at, &reference);
    assert_int_equal(bc_ratio_of_quantity(quantity_of(id), &reference, &l->ratio, NULL), BC_OK);
    l->min = min;
    l->max = max;
}

static inline bc_worst *opened(const bc_space *space)
{
    bc_worst *worst = NULL;
    bc_error err;

    assert_ok(bc_worst_open(space, &worst, &err), &err);
    return worst;
}

/* Twenty components of natural gas with hydrogen, methane as the rest. */
static inline void natural_gas(bc_space *space)
{
    static const window WINDOWS[] = {
        {"methane", 0, 100},     {"ethane", 0, 12},      {"propane", 0, 6},          {"n-butane", 0, 1.5},    {"isobutane", 0, 1.5},
        {"n-pentane", 0, 0.4},   {"isopentane", 0, 0.4}, {"neopentane", 0, 0.1},     {"n-hexane", 0.01, 0.2}, {"n-heptane", 0, 0.1},
        {"n-octane", 0, 0.05},   {"benzene", 0, 0.05},   {"toluene", 0.003, 0.003},  {"hydrogen", 0, 10},     {"carbon-monoxide", 0, 0.5},
        {"nitrogen", 0.2, 12},   {"helium", 0, 0.5},     {"carbon-dioxide", 0, 5},   {"oxygen", 0, 0.2},      {"hydrogen-sulfide", 0, 0.0005},
    };

    memset(space, 0, sizeof *space);
    add_windows(space, WINDOWS, COUNT(WINDOWS));
    add_group(space, (const char *const[4]){"nitrogen", "carbon-dioxide", "helium", NULL}, 0.5, 13.0);
}

/* Limits as supply contracts have them, at states of their own. */
static inline void add_contract(bc_space *space)
{
    add_limit(space, "wobbe-gross", "25/0", 46.1, 56.5);
    add_limit(space, "relative-density", "15/15", 0.55, 0.70);
    add_limit(space, "hhv", "15/15", 35.0, 45.0);
    add_limit(space, "wobbe-net", "15/15", 41.0, 52.0);
    add_limit(space, "z", "15/15", 0.9965, 0.9985);
}

/* Rounding that the library leaves at a bound. */
static inline bool holds(double value, double min, double max)
{
    return value >= min - 1e-9 * fabs(min) && value <= max + 1e-9 * fabs(max);
}

static inline bool space_allows(const bc_space *space, const double x[])
{
    bc_gas gas = {{0.0}};

    for (size_t j = 0; j < space->component_count; j++) {
        const bc_space_component *c = &space->components[j];

        if (x[j] < c->min - 1e-15 || x[j] > c->max + 1e-15) /* rounding of a mixture */
            return false;
        gas.x[c->species] = x[j];
    }
    for (size_t i = 0; i < space->group_count; i++) {
        double g = 0.0;

        for (size_t k = 0; k < BC_SPECIES_CAPACITY; k++)
            g += space->groups[i].weight[k] * gas.x[k];
        if (!holds(g, space->groups[i].min, space->groups[i].max))
            return false;
    }
    for (size_t i = 0; i < space->limit_count; i++) {
        double value = 0.0;

        if (bc_ratio_evaluate(&space->limits[i].ratio, &gas, &value, NULL) != BC_OK ||
            !holds(value, space->limits[i].min, space->limits[i].max))
            return false;
    }
    return true;
}

static inline bc_gas gas_of(const bc_space *space, const double x[])
{
    bc_gas gas = {{0.0}};

    for (size_t j = 0; j < space->component_count; j++)
        gas.x[space->components[j].species] = x[j];
    return gas;
}

/* Moves some of one component to another, from the whole of the narrower window down to a thousandth of it;
 * stays where that is not allowed. */
static inline bool walk(const bc_space *space, chance *c, double x[])
{
    const size_t i = chance_below(c, space->component_count), j = chance_below(c, space->component_count);
    const bc_space_component *a = &space->components[i], *b = &space->components[j];
    const double amount = pow(10.0, -3.0 * chance_uniform(c)) * fmin(a->max - a->min, b->max - b->min);
    const double kept_i = x[i], kept_j = x[j];

    if (i == j || amount == 0.0)
        return false;
    x[i] += amount;
    x[j] -= amount;
    if (space_allows(space, x))
        return true;
    x[i] = kept_i;
    x[j] = kept_j;
    return false;
}

#endif
