/* SPDX-License-Identifier: MIT */
/* fuzz_equilibrium.c - a gas, an oxidant, temperatures and a pressure made of bytes: the solver closes its balances or says
 * why not. */
#include "fuzz_gas.h"

#include "bluecone/equilibrium.h"
#include "bluecone/flame.h"
#include "bluecone/thermo.h"

#define BALANCE 1e-9 /* relative, of an element */
#define TRACE 1e-13  /* of all atoms: elements so rare are left out */
#define LACK 4e-12   /* the same where combustion is complete: so little oxygen may lack */

static void check_mixture(const double element[], const bc_mixture *m, double trace)
{
    double out[BC_ELEMENTS] = {0.0};
    double all = 0.0;
    double total = 0.0;

    fuzz_require(isfinite(m->t_k) && isfinite(m->p_pa) && isfinite(m->enthalpy_j) && isfinite(m->molar_mass_kg_per_mol));
    fuzz_require(m->t_k >= BC_THERMO_T_MIN_K && m->t_k <= BC_THERMO_T_MAX_K);
    for (size_t i = 0; i < BC_PRODUCT_CAPACITY; i++) {
        fuzz_require(isfinite(m->moles[i]) && m->moles[i] >= 0.0);
        fuzz_require(i < bc_product_count() || !(m->moles[i] > 0.0));
        total += m->moles[i];
        for (int e = 0; e < BC_ELEMENTS; e++)
            out[e] += m->moles[i] * bc_thermo_atoms(bc_product_thermo(i), (bc_element)e);
    }
    fuzz_require(fabs(total - m->total_moles) <= 1e-12 * total);
    for (int e = 0; e < BC_ELEMENTS; e++)
        all += element[e];
    for (int e = 0; e < BC_ELEMENTS; e++)
        fuzz_require(fabs(out[e] - element[e]) <= BALANCE * element[e] + trace * all);
}

/* Where the method is tested there is always an answer. */
static bool is_tested(const double element[], double t_k, double p_pa)
{
    double all = 0.0;
    bool soot = element[BC_C] > element[BC_O];

    for (int e = 0; e < BC_ELEMENTS; e++)
        all += element[e];
    for (int e = 0; e < BC_ELEMENTS; e++)
        soot = soot || (element[e] > 0.0 && element[e] < 1e-9 * all);
    return !soot && element[BC_O] > 0.0 && t_k >= 250.0 && t_k <= 4500.0 && p_pa >= 5e3 && p_pa <= 1e7;
}

static void check_tp(const double element[], double t_k, double p_pa)
{
    bc_mixture m;
    bc_error err;
    const bc_status status = bc_equilibrium_tp(element, t_k, p_pa, &m, &err);

    if (fuzz_answer(status, &err)) {
        check_mixture(element, &m, TRACE);
        fuzz_require(!(m.t_k < t_k) && !(m.t_k > t_k));
    } else {
        fuzz_require(status != BC_ERR_SOLVER || !is_tested(element, t_k, p_pa));
    }
}

static void check_hp(const double element[], double h_j, double p_pa)
{
    bc_mixture m;
    bc_error err;
    const bc_status status = bc_equilibrium_hp(element, h_j, p_pa, &m, &err);

    if (fuzz_answer(status, &err))
        check_mixture(element, &m, TRACE);
}

static void take_gas(fuzz_bytes *b, bc_gas *gas)
{
    double amounts[BC_SPECIES_CAPACITY] = {0.0};
    const size_t count = 1 + fuzz_byte(b) % 8U;
    bc_error err;

    for (size_t i = 0; i < count; i++) {
        const size_t species = fuzz_byte(b) % bc_species_count();

        amounts[species] += (1.0 + fuzz_short(b)) * pow(10.0, -(fuzz_byte(b) % 12));
    }
    fuzz_require(bc_gas_from_amounts(amounts, gas, &err) == BC_OK);
}

static void check_flame(fuzz_bytes *b)
{
    bc_reactants r = {.oxidant = bc_oxidant_air()};
    double element[BC_ELEMENTS];
    double h_j = 0.0;
    bc_mixture m;
    bc_error err;

    take_gas(b, &r.fuel);
    if (fuzz_byte(b) % 2 == 1)
        take_gas(b, &r.oxidant);
    const double lambda = 25.0 * pow(fuzz_share(b), 3.0);

    r.fuel_t_k = BC_THERMO_T_MIN_K + 2000.0 * fuzz_share(b);
    r.oxidant_t_k = BC_THERMO_T_MIN_K + 2000.0 * fuzz_share(b);
    r.p_pa = BC_EQUILIBRIUM_P_MIN_PA * pow(10.0, 6.0 * fuzz_share(b));
    if (!fuzz_answer(bc_oxidant_for_lambda(&r.fuel, &r.oxidant, lambda, &r.oxidant_per_fuel, &err), &err))
        r.oxidant_per_fuel = lambda;
    if (!fuzz_answer(bc_reactants_sum(&r, element, &h_j, &err), &err))
        return;
    check_tp(element, BC_THERMO_T_MIN_K + 5800.0 * fuzz_share(b), r.p_pa);
    check_hp(element, h_j, r.p_pa);
    if (fuzz_answer(bc_flame_equilibrium(&r, &m, &err), &err))
        check_mixture(element, &m, TRACE);
    if (fuzz_answer(bc_flame_complete(&r, &m, &err), &err))
        check_mixture(element, &m, LACK);
}

/* The first byte: raw doubles, or a flame that could be. */
int LLVMFuzzerTestOneInput(const uint8_t *data, size_t size)
{
    fuzz_bytes b = {data, size};

    if (fuzz_byte(&b) % 8 != 0) {
        check_flame(&b);
        return 0;
    }
    double element[BC_ELEMENTS];

    for (int e = 0; e < BC_ELEMENTS; e++)
        element[e] = fuzz_double(&b);
    const double t_k = fuzz_double(&b);
    const double p_pa = fuzz_double(&b);

    check_tp(element, t_k, p_pa);
    check_tp(element, 1000.0, BC_P0_PA);
    check_hp(element, fuzz_double(&b), BC_P0_PA);
    return 0;
}
