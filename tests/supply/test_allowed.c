/* SPDX-License-Identifier: MIT */
/* test_allowed.c - the space of a contract: its forms give the figures of the limits, its extremes stand at the bounds. */
#include "support.h"

#include "bluecone/allowed.h"

static const char CONTRACT[] = "[contract]\nat = 25/0\n"
                               "[limit wobbe-gross]\nmin = 13.6\nmax = 15.2\nunit = kWh/m3\n"
                               "[limit hhv]\nmax = 1150\nunit = Btu/scf\nat = 60F/60F@14.73psi\nsaturated = yes\n"
                               "[limit relative-density]\nmax = 0.7\nat = 15/15\n"
                               "[limit inerts]\nmax = 6\n"
                               "[limit propane]\nmax = 7\nbasis = mass\n"
                               "[limit ethane]\nmax = 11\nbasis = volume\n"
                               "[limit hydrogen sulfide]\nmax = 5\nunit = mg/m3\n"
                               "[limit mcp]\nmax = 47\n"
                               "[range methane]\nmin = 77\n[range c4+]\nmax = 2.3\n";

static bc_contract *contract(void)
{
    static bc_contract c;
    bc_error err;

    assert_ok(bc_contract_read(write_scratch(CONTRACT, sizeof CONTRACT - 1), &c, &err), &err);
    return &c;
}

static bc_gas gas_of(const char *literal)
{
    static bc_composition c;
    bc_error err;

    assert_ok(bc_composition_parse(literal, &c, &err), &err);
    return c.gas;
}

static void the_form_of_a_limit_gives_its_figure(void **state)
{
    const bc_contract *c = contract();
    const bc_gas gas = gas_of("methane=81.3,ethane=7.1,propane=3.9,n-butane=1.7,nitrogen=2.9,carbon-dioxide=3.0999,hydrogen-sulfide=0.0001");

    (void)state;
    for (size_t i = 0; i < c->limit_count; i++) {
        bc_ratio ratio;
        double want = 0.0;
        double got = 0.0;
        bc_error err = {.status = BC_OK};
        const bc_status status = bc_limit_ratio(c, i, &ratio, &err);

        if (strcmp(c->limits[i].id, "mcp") == 0) {
            assert_refused(status, &err, BC_ERR_USAGE, "no ratio");
            continue;
        }
        assert_ok(status, &err);
        assert_ok(bc_limit_value(c, i, &gas, &want, &err), &err);
        assert_ok(bc_ratio_evaluate(&ratio, &gas, &got, &err), &err);
        assert_within_at(c->limits[i].id, got, want, 1e-9 * fabs(want));
    }
}

static bc_space space;
static size_t place[BC_LIMIT_MAX];

static void make_space(const bc_contract *c)
{
    bool present[BC_SPECIES_CAPACITY] = {false};
    static const char *const WORDS[] = {"n-butane", "nitrogen", "carbon-dioxide", "water"};
    bc_error err;

    for (size_t i = 0; i < COUNT(WORDS); i++) {
        size_t species = 0;

        assert_int_equal(bc_species_find(WORDS[i], &species, NULL), BC_OK);
        present[species] = true;
    }
    assert_ok(bc_contract_space(c, c->limit_count, present, &space, place, &err), &err);
}

static void ranges_become_windows_and_limits_limits(void **state)
{
    const bc_contract *c = contract();

    (void)state;
    make_space(c);
    assert_int_equal(space.component_count, 7); /* methane, ethane, propane, H2S by name; butane, nitrogen, CO2 given; no water */
    assert_int_equal(space.group_count, 1);
    assert_within(space.groups[0].max, 0.023, 1e-15);
    assert_int_equal(space.limit_count, 7);
    assert_true(place[7] == BC_NOT_IMPOSED);
    for (size_t i = 0; i < space.component_count; i++)
        if (strcmp(bc_species_id(space.components[i].species), "methane") == 0)
            assert_within(space.components[i].min, 0.77, 1e-15);
}

/* No gas of a random walk that keeps the contract lies beyond the extremes; the walk itself is judged by the contract's own
 * figures, not by the space. */
static bool keeps(const bc_contract *c, const bc_gas *gas)
{
    for (size_t i = 0; i < c->limit_count; i++) {
        double value = 0.0;

        if (place[i] == BC_NOT_IMPOSED)
            continue;
        if (bc_limit_value(c, i, gas, &value, NULL) != BC_OK || bc_limit_margin(&c->limits[i], value) < 0.0)
            return false;
    }
    for (size_t k = 0; k < c->range_count; k++) {
        double sum = 0.0;

        for (size_t i = 0; i < bc_species_count(); i++)
            sum += c->ranges[k].weight[i] * gas->x[i];
        if (sum < c->ranges[k].min || sum > c->ranges[k].max)
            return false;
    }
    return true;
}

static void no_gas_that_keeps_the_contract_lies_beyond_the_extremes(void **state)
{
    const bc_contract *c = contract();
    bc_worst *worst = NULL;
    bc_extremes e[3];
    bc_error err;
    size_t kept = 0;

    (void)state;
    make_space(c);
    assert_ok(bc_worst_open(&space, &worst, &err), &err);
    for (size_t i = 0; i < COUNT(e); i++)
        assert_ok(bc_worst_ratio(worst, &space.limits[place[i]].ratio, &e[i], &err), &err);
    srand(7);
    for (int n = 0; n < 40000; n++) {
        bc_gas gas = {{0.0}};
        double sum = 0.0;

        for (size_t k = 0; k < space.component_count; k++) {
            const double most = strcmp(bc_species_id(space.components[k].species), "methane") == 0 ? 100.0 : 3.5;

            gas.x[space.components[k].species] = strcmp(bc_species_id(space.components[k].species), "hydrogen-sulfide") == 0
                                                     ? 0.0
                                                     : most * (double)rand() / RAND_MAX;
            sum += gas.x[space.components[k].species];
        }
        for (size_t i = 0; i < bc_species_count(); i++)
            gas.x[i] /= sum;
        if (!keeps(c, &gas))
            continue;
        kept++;
        for (size_t i = 0; i < COUNT(e); i++) {
            double value = 0.0;

            assert_ok(bc_limit_value(c, i, &gas, &value, &err), &err);
            assert_true(value >= e[i].min.bound - 1e-9 && value <= e[i].max.bound + 1e-9);
        }
    }
    assert_true(kept > 1000);
    bc_worst_close(worst);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(the_form_of_a_limit_gives_its_figure),
        cmocka_unit_test(ranges_become_windows_and_limits_limits),
        cmocka_unit_test(no_gas_that_keeps_the_contract_lies_beyond_the_extremes),
    };

    return cmocka_run_group_tests_name("allowed", tests, NULL, remove_scratch);
}
