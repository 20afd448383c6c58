/* SPDX-License-Identifier: MIT */
/* flame_support.h - gases from literals and comparisons that say what they compared. */
#ifndef FLAME_SUPPORT_H
#define FLAME_SUPPORT_H

#include <stdarg.h>
#include <stddef.h>
#include <setjmp.h>
#include <stdint.h>

#include <cmocka.h>

#include "base/compiler.h"
#include "bluecone/composition.h"
#include "gas/species_index.h"

#include <math.h>
#include <stdio.h>
#include <string.h>

/* Fails with value, expected, tolerance and what they belong to. */
static inline void check_within(double got, double want, double tolerance, const char *what, const char *file, int line)
{
    if (fabs(got - want) <= tolerance)
        return;
    print_error("%s: got %.12g, expected %.12g, tolerance %.3g\n", what, got, want, tolerance);
    _fail(file, line);
}

#define assert_within(got, want, tolerance, what) check_within((got), (want), (tolerance), (what), __FILE__, __LINE__)

/* A gas of a literal of bluecone/composition.h. */
static inline bc_gas gas_of(const char *literal)
{
    static const bc_gas NONE;
    bc_composition c;
    bc_error err;

    if (bc_composition_parse(literal, &c, &err) == BC_OK)
        return c.gas;
    print_error("%s: %s\n", literal, err.message);
    fail();
    return NONE;
}

/* The next of a fixed sequence of numbers in [0, 1): the same on every machine. Numerical Recipes' LCG. */
static inline double next_number(uint32_t *seed)
{
    *seed = *seed * 1664525u + 1013904223u;
    return (double)(*seed >> 8) / 16777216.0;
}

/* A gas of six species, some of them absent, from the sequence; a seventh lets it burn. */
static inline bc_gas next_gas(uint32_t *seed)
{
    double amounts[BC_SPECIES_CAPACITY] = {0.0};
    bc_gas gas = {{0.0}};

    for (int k = 0; k < 6; k++) {
        const double pick = next_number(seed);

        amounts[(size_t)(pick * SPECIES_COUNT)] = next_number(seed);
    }
    amounts[SPECIES_methane] += 0.05 + next_number(seed);
    assert_int_equal(bc_gas_from_amounts(amounts, &gas, NULL), BC_OK);
    return gas;
}

/* Every refusal carries a sentence. */
static inline void check_refused(bc_status got, bc_status want, bc_error *err, const char *file, int line)
{
    if (got != want || err->status != want || strlen(err->message) < 20) {
        print_error("status %d with '%s', expected status %d with a sentence\n", (int)got, err->message, (int)want);
        _fail(file, line);
    }
    *err = (bc_error){.status = BC_OK};
}

#define assert_refused(call, want, err) check_refused((call), (want), (err), __FILE__, __LINE__)

#endif
