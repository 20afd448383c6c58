/* SPDX-License-Identifier: MIT */
/* flames.c - prints random flames and their data, for compare_flames.py to compute again with Cantera.
 *
 * Usage: flames COUNT. Lines, fields parted by blanks:
 *   species NAME KIND C H N O S He Ne Ar low a1..b2 high a1..b2   KIND: reactant or product
 *   case NUMBER fuel T oxidant T oxidant/fuel p flame T complete T (or 0)
 *   fuel|oxidant|product NUMBER NAME mole-fraction */
#include "bluecone/flame.h"
#include "bluecone/thermo.h"

#include <math.h>
#include <stdint.h>
#include <stdio.h>
#include <stdlib.h>

/* xorshift64*, Vigna, ACM Trans. Math. Softw. 42 (2016) 30; uniform in (0, 1). */
static double uniform(uint64_t *state)
{
    *state ^= *state >> 12;
    *state ^= *state << 25;
    *state ^= *state >> 27;
    return ((double)((*state * UINT64_C(2685821657736338717)) >> 11) + 0.5) / 9007199254740992.0;
}

static void print_species(const char *name, const char *kind, size_t row)
{
    printf("species %s %s", name, kind);
    for (int k = 0; k < BC_ELEMENTS; k++)
        printf(" %d", bc_thermo_atoms(row, (bc_element)k));
    for (int range = 0; range < 2; range++)
        for (int i = 0; i < 9; i++)
            printf(" %.17g", bc_thermo_coefficients(row, range)[i]);
    printf("\n");
}

static void print_gas(const char *kind, int number, const bc_gas *gas)
{
    for (size_t i = 0; i < bc_species_count(); i++)
        if (gas->x[i] > 0.0)
            printf("%s %d %s %.17g\n", kind, number, bc_species_id(i), gas->x[i]);
}

/* One to six species, the oxidant air, oxygen or between. */
static bc_reactants random_reactants(uint64_t *state)
{
    double fuel[BC_SPECIES_CAPACITY] = {0.0}, oxidant[BC_SPECIES_CAPACITY] = {0.0};
    bc_reactants r = {.fuel_t_k = 250.0 + 1250.0 * uniform(state),
                      .oxidant_t_k = 250.0 + 1250.0 * uniform(state)};
    const bc_gas air = bc_gas_air();
    const double lambda = uniform(state) < 0.2 ? 1.0 : 0.4 * pow(50.0, uniform(state));
    size_t oxygen;

    for (int parts = 1 + (int)(6.0 * uniform(state)); parts > 0; parts--)
        fuel[(size_t)(uniform(state) * (double)bc_species_count())] -= log(uniform(state));
    for (size_t i = 0; i < bc_species_count(); i++)
        oxidant[i] = air.x[i];
    if (bc_species_find("oxygen", &oxygen, NULL) != BC_OK)
        exit(EXIT_FAILURE);
    oxidant[oxygen] += uniform(state) < 0.6 ? 0.0 : 3.0 * uniform(state);
    r.p_pa = 5.0e3 * pow(2000.0, uniform(state));
    if (bc_gas_from_amounts(fuel, &r.fuel, NULL) != BC_OK ||
        bc_gas_from_amounts(oxidant, &r.oxidant, NULL) != BC_OK)
        exit(EXIT_FAILURE);
    if (bc_oxidant_for_lambda(&r.fuel, &r.oxidant, lambda, &r.oxidant_per_fuel, NULL) != BC_OK)
        r.oxidant_per_fuel = 5.0 * uniform(state);
    return r;
}

static void print_case(int number, const bc_reactants *r)
{
    bc_mixture flame, complete = {.t_k = 0.0};
    bc_error err;

    if (bc_flame_equilibrium(r, &flame, &err) != BC_OK) {
        fprintf(stderr, "flames: case %d: %s\n", number, err.message);
        exit(EXIT_FAILURE);
    }
    if (bc_flame_complete(r, &complete, &err) != BC_OK)
        complete.t_k = 0.0;
    printf("case %d %.17g %.17g %.17g %.17g %.17g %.17g\n", number, r->fuel_t_k, r->oxidant_t_k,
           r->oxidant_per_fuel, r->p_pa, flame.t_k, complete.t_k);
    print_gas("fuel", number, &r->fuel);
    print_gas("oxidant", number, &r->oxidant);
    for (size_t i = 0; i < bc_product_count(); i++)
        if (flame.moles[i] > 0.0)
            printf("product %d %s %.17g\n", number, bc_product_formula(i),
                   flame.moles[i] / flame.total_moles);
}

int main(int count, char *words[])
{
    const int cases = count > 1 ? (int)strtol(words[1], NULL, 10) : 300;
    uint64_t state = UINT64_C(0x2545F4914F6CDD1D);

    for (size_t i = 0; i < bc_species_count(); i++)
        print_species(bc_species_id(i), "reactant", i);
    for (size_t i = 0; i < bc_product_count(); i++)
        print_species(bc_product_formula(i), "product", bc_product_thermo(i));
    for (int i = 0; i < cases; i++) {
        const bc_reactants r = random_reactants(&state);

        print_case(i, &r);
    }
    return EXIT_SUCCESS;
}
