/* SPDX-License-Identifier: MIT */
/* equilibrium_support.h - reactants from literals and by chance, potentials of the products. */
#ifndef EQUILIBRIUM_SUPPORT_H
#define EQUILIBRIUM_SUPPORT_H

#include "support.h"

#include "bluecone/composition.h"
#include "bluecone/flame.h"
#include "bluecone/thermo.h"

static inline bc_gas equilibrium_gas(const char *literal)
{
    bc_composition composition;
    bc_error err;

    assert_ok(bc_composition_parse(literal, &composition, &err), &err);
    return composition.gas;
}

/* Fuel and oxidant at one temperature each and lambda; 101.325 kPa. */
static inline bc_reactants equilibrium_reactants(const char *fuel, const char *oxidant, double lambda,
                                                 double t_k)
{
    bc_reactants r = {.fuel = equilibrium_gas(fuel),
                      .oxidant = equilibrium_gas(oxidant),
                      .fuel_t_k = t_k,
                      .oxidant_t_k = t_k,
                      .p_pa = 101325.0};
    bc_error err;

    assert_ok(bc_oxidant_for_lambda(&r.fuel, &r.oxidant, lambda, &r.oxidant_per_fuel, &err), &err);
    return r;
}

static inline bc_mixture equilibrium_flame(const bc_reactants *r)
{
    bc_mixture m = {.t_k = 0.0};
    bc_error err;

    assert_ok(bc_flame_equilibrium(r, &m, &err), &err);
    return m;
}

/* Mole fraction of a product by formula. */
static inline double equilibrium_x(const bc_mixture *m, const char *formula)
{
    for (size_t i = 0; i < bc_product_count(); i++)
        if (strcmp(bc_product_formula(i), formula) == 0)
            return m->moles[i] / m->total_moles;
    fail_msg("no product %s", formula);
    return 0.0;
}

/* G/RT at 1 bar of a product by formula, by the public functions. */
static inline double equilibrium_g_rt(const char *formula, double t_k)
{
    for (size_t i = 0; i < bc_product_count(); i++)
        if (strcmp(bc_product_formula(i), formula) == 0) {
            double h, s;

            assert_int_equal(bc_thermo_enthalpy(bc_product_thermo(i), t_k, &h, NULL), BC_OK);
            assert_int_equal(bc_thermo_entropy(bc_product_thermo(i), t_k, &s, NULL), BC_OK);
            return (h / t_k - s) / BC_THERMO_R_J_PER_MOL_K;
        }
    fail_msg("no product %s", formula);
    return 0.0;
}

/* Sum of |n_j H_j|, J: the scale at which an enthalpy can close. */
static inline double equilibrium_h_scale(const bc_mixture *m)
{
    double sum = 0.0, h = 0.0;

    for (size_t i = 0; i < bc_product_count(); i++) {
        assert_int_equal(bc_thermo_enthalpy(bc_product_thermo(i), m->t_k, &h, NULL), BC_OK);
        sum += m->moles[i] * fabs(h);
    }
    return sum;
}

/* One to six species of the table, some of them traces. */
static inline bc_gas equilibrium_random_gas(chance *c)
{
    double amounts[BC_SPECIES_CAPACITY] = {0.0};
    bc_gas gas = {{0.0}};

    for (size_t parts = 1 + chance_below(c, 6); parts > 0; parts--)
        amounts[chance_below(c, bc_species_count())] +=
            chance_uniform(c) < 0.3 ? pow(10.0, -8.0 * chance_uniform(c)) : -log(chance_uniform(c));
    assert_int_equal(bc_gas_from_amounts(amounts, &gas, NULL), BC_OK);
    return gas;
}

/* Air, oxygen or something between, a fifth of them moist. */
static inline bc_gas equilibrium_random_oxidant(chance *c)
{
    bc_gas gas = equilibrium_gas("oxygen=100");
    const bc_gas air = bc_gas_air(), water = equilibrium_gas("water=100");
    const double part = chance_uniform(c) < 0.3 ? 0.0 : chance_uniform(c) < 0.5 ? 1.0 : chance_uniform(c);
    const double moist = chance_uniform(c) < 0.2 ? 0.1 * chance_uniform(c) : 0.0;

    for (size_t i = 0; i < bc_species_count(); i++)
        gas.x[i] = (1.0 - moist) * ((1.0 - part) * gas.x[i] + part * air.x[i]) + moist * water.x[i];
    return gas;
}

/* Any fuel, 250..1500 K, 0.05..100 bar, lambda 0.3..20, a fifth exactly stoichiometric; fuels that hold more
 * oxygen than they need get up to 20 moles of oxidant. */
static inline bc_reactants equilibrium_random(chance *c)
{
    bc_reactants r = {.fuel = equilibrium_random_gas(c), .oxidant = equilibrium_random_oxidant(c)};
    const double lambda = chance_uniform(c) < 0.2 ? 1.0 : 0.3 * pow(20.0 / 0.3, chance_uniform(c));

    r.fuel_t_k = 250.0 + 1250.0 * chance_uniform(c);
    r.oxidant_t_k = chance_uniform(c) < 0.3 ? r.fuel_t_k : 250.0 + 1250.0 * chance_uniform(c);
    r.p_pa = 5.0e3 * pow(2000.0, chance_uniform(c));
    if (bc_oxidant_for_lambda(&r.fuel, &r.oxidant, lambda, &r.oxidant_per_fuel, NULL) != BC_OK)
        r.oxidant_per_fuel = 20.0 * chance_uniform(c);
    return r;
}

#endif
