/* SPDX-License-Identifier: MIT */
/* test_subject.c - when a gas can be made a subject. */
#include "support.h"

#include "bluecone/formation.h"
#include "bluecone/subject.h"
#include "gas/species_index.h"

/* A gas of methane with this share of n-pentadecane, a liquid in truth, metered at 0 C; its Z is that of the subject. */
static bc_status make_with(double x_heavy, const bc_reference *r, double *z, bc_error *err)
{
    bc_gas gas = {{0.0}};
    bc_subject s;
    bc_status status;

    gas.x[SPECIES_methane] = 1.0 - x_heavy;
    gas.x[SPECIES_n_pentadecane] = x_heavy;
    status = bc_subject_make(r, &gas, NULL, &s, err);
    if (status == BC_OK)
        *z = s.value.z;
    return status;
}

/* subject.h names the bound, 0.05: the last gas that is taken has just this Z. */
static void what_is_no_gas_is_refused_from_the_z_on_that_the_manual_names(void **state)
{
    const bc_state at = {.combustion_c = 15.0, .metering_c = 0.0, .metering_pa = 101325.0, .edition = 2016};
    double taken = 0.0, refused = 1.0, z = 0.0;
    bc_reference r;
    bc_error err = {.status = BC_OK};

    (void)state;
    assert_ok(bc_reference_at(&at, &r, &err), &err);
    assert_ok(make_with(0.0, &r, &z, &err), &err);
    assert_refused(make_with(1.0, &r, &z, &err), &err, BC_ERR_RANGE, "at 0 C|is no gas|ISO 6976");
    while (refused - taken > 1e-12) {
        const double x = 0.5 * (taken + refused);

        if (make_with(x, &r, &z, &err) == BC_OK)
            taken = x;
        else
            refused = x;
    }
    assert_within(z, 0.05, 1e-9);
}

/* An inert gas has no heat that could be divided: its components share a gap of nothing, and no share is not a number. */
static void an_inert_gas_has_no_gap(void **state)
{
    const bc_state at = bc_state_default();
    double share[BC_SPECIES_CAPACITY];
    bc_gas gas = {{0.0}};
    bc_reference r;
    bc_subject s;
    bc_error err;

    (void)state;
    assert_ok(bc_reference_at(&at, &r, &err), &err);
    gas.x[SPECIES_nitrogen] = 0.71;
    gas.x[SPECIES_argon] = 0.29;
    assert_ok(bc_subject_make(&r, &gas, NULL, &s, &err), &err);
    bc_gap_shares(&s, share);
    for (size_t i = 0; i < BC_SPECIES_CAPACITY; i++)
        assert_within(share[i], 0.0, 0.0);
}

/* The gap of methane is that of methane, whatever dilutes it, down to less than 1 J/mol. */
static void the_gap_of_a_trace_is_that_of_the_pure_gas(void **state)
{
    const bc_state at = bc_state_default();
    double share[BC_SPECIES_CAPACITY], pure[BC_SPECIES_CAPACITY];
    bc_reference r;
    bc_subject s;
    bc_error err;

    (void)state;
    assert_ok(bc_reference_at(&at, &r, &err), &err);
    for (int trace = 0; trace < 2; trace++) {
        bc_gas gas = {{0.0}};

        gas.x[SPECIES_methane] = trace ? 1e-7 : 1.0;
        gas.x[SPECIES_nitrogen] = 1.0 - gas.x[SPECIES_methane];
        assert_ok(bc_subject_make(&r, &gas, NULL, &s, &err), &err);
        bc_gap_shares(&s, trace ? share : pure);
    }
    assert_true(s.value.gross_j_per_mol < 1.0 && fabs(pure[SPECIES_methane]) > 1e-6);
    assert_within(share[SPECIES_methane], pure[SPECIES_methane], 1e-12);
}

/* The gap is the difference of both gross heats over that of the edition, component by component. */
static void the_shares_of_a_gap_add_up_to_it(void **state)
{
    const bc_state at = {.combustion_c = 25.0, .metering_c = 0.0, .metering_pa = 101325.0, .edition = 2016};
    double share[BC_SPECIES_CAPACITY], sum = 0.0, gross = 0.0, net = 0.0;
    bc_gas gas = {{0.0}};
    bc_reference r;
    bc_subject s;
    bc_error err;

    (void)state;
    assert_ok(bc_reference_at(&at, &r, &err), &err);
    gas.x[SPECIES_methane] = 0.6;
    gas.x[SPECIES_hydrogen] = 0.3;
    gas.x[SPECIES_n_pentadecane] = 0.001;
    gas.x[SPECIES_nitrogen] = 0.099;
    assert_ok(bc_subject_make(&r, &gas, NULL, &s, &err), &err);
    assert_ok(bc_formation_gas(&gas, 298.15, &gross, &net, &err), &err);
    bc_gap_shares(&s, share);
    for (size_t i = 0; i < BC_SPECIES_CAPACITY; i++)
        sum += share[i];
    assert_within(sum, gross / s.value.gross_j_per_mol - 1.0, 1e-12);
    assert_true(fabs(share[SPECIES_methane]) > 1e-6);
    assert_within(share[SPECIES_nitrogen] + share[SPECIES_ethane], 0.0, 0.0);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(an_inert_gas_has_no_gap),
        cmocka_unit_test(the_gap_of_a_trace_is_that_of_the_pure_gas),
        cmocka_unit_test(the_shares_of_a_gap_add_up_to_it),
        cmocka_unit_test(what_is_no_gas_is_refused_from_the_z_on_that_the_manual_names),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
