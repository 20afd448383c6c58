/* SPDX-License-Identifier: MIT */
/* bench_values.c - how many gases a second one core evaluates: HHV, LHV, Z, relative density, both Wobbe. */
#include "bluecone/bluecone.h"

#include <stdio.h>
#include <stdlib.h>
#include <time.h>

#define GASES 1000
#define ROUNDS 2000

static double now_s(void)
{
    struct timespec t;

    (void)clock_gettime(CLOCK_MONOTONIC, &t);
    return (double)t.tv_sec + (double)t.tv_nsec * 1e-9;
}

int main(void)
{
    static bc_gas gases[GASES];
    const bc_state state = bc_state_default();
    bc_reference reference;
    double sum = 0.0;

    if (bc_reference_at(&state, &reference, NULL) != BC_OK)
        return 1;
    srand(1);
    for (size_t i = 0; i < GASES; i++) {
        double amounts[BC_SPECIES_CAPACITY] = {0.0};

        for (size_t j = 0; j < 12; j++)
            amounts[(size_t)rand() % bc_species_count()] = rand() / (double)RAND_MAX;
        if (bc_gas_from_amounts(amounts, &gases[i], NULL) != BC_OK)
            return 1;
    }
    const double start = now_s();

    for (size_t round = 0; round < ROUNDS; round++)
        for (size_t i = 0; i < GASES; i++) {
            const bc_value v = bc_value_of(&reference, &gases[i]);

            sum += v.gross_j_per_m3 + v.net_j_per_m3 + v.z + v.relative_density + v.wobbe_gross_j_per_m3 + v.wobbe_net_j_per_m3;
        }
    const double seconds = now_s() - start;

    printf("  %.2f million gases a second on one core (target 2; check sum %.6g)\n", GASES * (double)ROUNDS / seconds * 1e-6, sum);
    return 0;
}
