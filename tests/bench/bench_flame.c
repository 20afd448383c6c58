/* SPDX-License-Identifier: MIT */
/* bench_flame.c - flame temperatures per second on one core, for natural gas in air. */
#include "bluecone/flame.h"

#include <stdio.h>
#include <stdlib.h>
#include <time.h>

#define CASES   200000
#define REPEATS 5

typedef bc_status (*flame_function)(const bc_reactants *, bc_mixture *, bc_error *);

static double seconds(void)
{
    struct timespec t;

    (void)clock_gettime(CLOCK_MONOTONIC, &t);
    return (double)t.tv_sec + 1e-9 * (double)t.tv_nsec;
}

/* A natural gas of ten components, mole percent. */
static bc_gas natural_gas(void)
{
    static const struct {
        const char *id;
        double percent;
    } PARTS[] = {{"methane", 91.1},        {"ethane", 4.6},     {"propane", 1.1},   {"n-butane", 0.2},
                 {"isobutane", 0.15},      {"n-pentane", 0.05}, {"n-hexane", 0.05}, {"nitrogen", 1.35},
                 {"carbon-dioxide", 1.38}, {"helium", 0.02}};
    double amounts[BC_SPECIES_CAPACITY] = {0.0};
    bc_gas gas;

    for (size_t i = 0; i < sizeof PARTS / sizeof *PARTS; i++) {
        size_t species;

        if (bc_species_find(PARTS[i].id, &species, NULL) != BC_OK)
            exit(EXIT_FAILURE);
        amounts[species] = PARTS[i].percent;
    }
    if (bc_gas_from_amounts(amounts, &gas, NULL) != BC_OK)
        exit(EXIT_FAILURE);
    return gas;
}

/* Best rate of several runs; the air temperature differs from case to case, so nothing can be reused. */
static void measure(const char *name, flame_function flame, bc_reactants reactants)
{
    double best = 0.0, sum = 0.0;
    long iterations = 0;

    for (int repeat = 0; repeat < REPEATS; repeat++) {
        const double start = seconds();

        for (int i = 0; i < CASES; i++) {
            bc_mixture m;

            reactants.oxidant_t_k = 288.15 + 20.0 * i / CASES;
            if (flame(&reactants, &m, NULL) != BC_OK)
                exit(EXIT_FAILURE);
            sum += m.t_k;
            iterations += m.iterations;
        }
        const double rate = CASES / (seconds() - start);

        best = rate > best ? rate : best;
    }
    printf("%-34s %9.0f cases/s   mean %.2f K, %.2f iterations\n", name, best, sum / CASES / REPEATS,
           (double)iterations / CASES / REPEATS);
}

int main(void)
{
    static const struct {
        const char *name;
        double lambda;
    } MIXTURES[] = {
        {"equilibrium, lambda 1", 1.0}, {"equilibrium, lambda 1.2", 1.2}, {"equilibrium, lambda 0.7", 0.7}};
    bc_reactants r = {.fuel = natural_gas(), .oxidant = bc_gas_air(), .fuel_t_k = 288.15, .p_pa = 101325.0};

    for (size_t i = 0; i < sizeof MIXTURES / sizeof *MIXTURES; i++) {
        if (bc_oxidant_for_lambda(&r.fuel, &r.oxidant, MIXTURES[i].lambda, &r.oxidant_per_fuel, NULL) !=
            BC_OK)
            return EXIT_FAILURE;
        measure(MIXTURES[i].name, bc_flame_equilibrium, r);
    }
    if (bc_oxidant_for_lambda(&r.fuel, &r.oxidant, 1.0, &r.oxidant_per_fuel, NULL) != BC_OK)
        return EXIT_FAILURE;
    measure("complete combustion, lambda 1", bc_flame_complete, r);
    return EXIT_SUCCESS;
}
