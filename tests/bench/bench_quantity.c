/* SPDX-License-Identifier: MIT */
/* bench_quantity.c - what a log of analyses asks of each row: a subject and a few quantities, one by one. */
#include "bluecone/bluecone.h"

#include <stdio.h>
#include <stdlib.h>
#include <time.h>

#define GASES 1000
#define ROUNDS 200

static const char *const ASKED[] = {"hhv", "lhv", "wobbe-gross", "wobbe-net",
                                    "density",       "relative-density", "air-demand", "methane-number",
                                    "co2-factor-net", "co2-factor-gross"};
#define COUNT (sizeof ASKED / sizeof *ASKED)

static double now_s(void)
{
    struct timespec t;

    (void)clock_gettime(CLOCK_MONOTONIC, &t);
    return (double)t.tv_sec + (double)t.tv_nsec * 1e-9;
}

/* Natural gas whose ten components each scatter by a tenth. */
static int make_gas(bc_gas *gas)
{
    static const struct {
        const char *species;
        double percent;
    } PARTS[] = {{"methane", 91.0},  {"ethane", 4.5},       {"propane", 1.0},   {"isobutane", 0.2}, {"n-butane", 0.2},
                 {"isopentane", 0.05}, {"n-pentane", 0.05}, {"n-hexane", 0.03}, {"nitrogen", 1.5},  {"carbon-dioxide", 1.2}};
    double amounts[BC_SPECIES_CAPACITY] = {0.0};

    for (size_t i = 0; i < sizeof PARTS / sizeof *PARTS; i++) {
        size_t species = 0;

        if (bc_species_find(PARTS[i].species, &species, NULL) != BC_OK)
            return 0;
        amounts[species] = PARTS[i].percent * (0.9 + 0.2 * rand() / (double)RAND_MAX);
    }
    return bc_gas_from_amounts(amounts, gas, NULL) == BC_OK;
}

int main(void)
{
    static bc_gas gases[GASES];
    const bc_state state = bc_state_default();
    bc_reference reference;
    size_t quantity[COUNT];
    double sum = 0.0;

    if (bc_reference_at(&state, &reference, NULL) != BC_OK)
        return 1;
    for (size_t k = 0; k < COUNT; k++)
        if (bc_quantity_find(ASKED[k], &quantity[k], NULL) != BC_OK)
            return 1;
    srand(1);
    for (size_t i = 0; i < GASES; i++)
        if (!make_gas(&gases[i]))
            return 1;
    const double start = now_s();

    for (size_t round = 0; round < ROUNDS; round++)
        for (size_t i = 0; i < GASES; i++) {
            bc_subject subject;

            if (bc_subject_make(&reference, &gases[i], NULL, &subject, NULL) != BC_OK)
                return 1;
            for (size_t k = 0; k < COUNT; k++) {
                double value = 0.0;

                if (bc_quantity_value(quantity[k], &subject, &value, NULL) != BC_OK)
                    return 1;
                sum += value;
            }
        }
    const double seconds = now_s() - start;

    printf("  %.2f million rows a second on one core (check sum %.9g)\n", GASES * (double)ROUNDS / seconds * 1e-6, sum);
    return 0;
}
