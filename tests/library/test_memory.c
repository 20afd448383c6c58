/* SPDX-License-Identifier: MIT */
/* test_memory.c - physics without any memory, and every allocation of the rest failing in turn. */
#include "library/allocator.h"
#include "library/exercise.h"

#include "support.h"

#include <dlfcn.h>

#define EXAMPLES BC_SOURCE_DIR "/examples/"
#define TEXT_BYTES 4096

static const char *const FOLDERS[] = {EXAMPLES, BC_SOURCE_DIR "/compositions"};
static const char *const SPECIFICATIONS[] = {BC_SOURCE_DIR "/compositions/specifications"};

static exercise_of exercised;
static exercise_row with_memory, without_memory;

static void needs_own_allocator(void)
{
    if (!ALLOCATOR_STANDS)
        skip();
}

static void all_physics_runs_while_no_memory_is_to_be_had(void **state)
{
    static const char *const GASES[] = {EXAMPLES "present-supply.ini", "hydrogen=57,methane=26,carbon-monoxide=7,nitrogen=10",
                                        "propane=93.1,n-butane=6.9", "nitrogen=93,carbon-dioxide=7"};
    bc_error err;

    (void)state;
    needs_own_allocator();
    for (size_t i = 0; i < COUNT(GASES); i++) {
        assert_ok(exercise_load(GASES[i], &exercised, &err), &err);
        exercise(&exercised, &with_memory);
        allocator_arm(0, false);
        exercise(&exercised, &without_memory);
        allocator_disarm();
        assert_int_equal(allocator.asked, 0);
        assert_true(with_memory.count > 2000 && with_memory.count <= EXERCISE_MAX);
        assert_true(with_memory.failures > 0); /* refusals, too, are put into words without memory */
        assert_int_equal(without_memory.count, with_memory.count);
        assert_memory_equal(without_memory.number, with_memory.number, with_memory.count * sizeof *with_memory.number);
    }
}

/* A piece of work of which allocations fail. It fills `out`, clears behind itself, and says what came of it. */
typedef struct {
    const char *name;
    bc_status (*run)(void *out, bc_error *err);
    size_t size;       /* of what it fills */
    bool untouched;    /* its outputs are promised to be as they were after a failure */
    long kept;         /* allocations that the C library keeps for this thread: what dlerror() would say */
} job;

static unsigned char before[400000], after[400000], wanted[400000];

/* One run with a failing allocation: BC_ERR_MEMORY, or the whole answer where the memory was not essential.
 * Returns false when the run asked for less memory than would have failed. */
static bool run_failing(const job *j, long k, bool once)
{
    bc_error err = {.status = BC_OK};

    memset(before, 0xA5, j->size);
    memcpy(after, before, j->size);
    const int kept = hold_stderr();

    allocator_arm(k, once);
    const bc_status status = j->run(after, &err);

    allocator_disarm();
    assert_stderr_silent(kept, j->name);
    if (allocator.live > j->kept) {
        print_error("%s: allocation %ld failed, %ld are not given back\n", j->name, k, allocator.live);
        fail();
    }
    if (allocator.asked <= k) {
        assert_int_equal(status, BC_OK);
        return false;
    }
    if (status == BC_OK) {
        assert_memory_equal(after, wanted, j->size);
        return true;
    }
    if (status != BC_ERR_MEMORY || err.status != BC_ERR_MEMORY || !strstr(err.message, "memory")) {
        print_error("%s: allocation %ld failed: status %d: %s\n", j->name, k, (int)status, err.message);
        fail();
    }
    if (j->untouched)
        assert_memory_equal(after, before, j->size);
    return true;
}

static void fail_each(const job *j, long least)
{
    bc_error err;
    long k = 0;

    needs_own_allocator();
    assert_true(j->size <= sizeof wanted);
    memset(wanted, 0xA5, j->size);
    assert_ok(j->run(wanted, &err), &err);
    while (run_failing(j, k, true))
        k++;
    for (long i = 0; i < k; i++)
        assert_true(run_failing(j, i, false));
    if (k < least) {
        print_error("%s: %ld allocations failed, at least %ld were meant to\n", j->name, k, least);
        fail();
    }
}

/* ---- files ---------------------------------------------------------------------------------------- */
static bc_status read_composition(void *out, bc_error *err)
{
    static bc_composition c;
    const bc_status status = bc_composition_read(EXAMPLES "present-supply.ini", &c, err);

    if (status == BC_OK)
        memcpy(out, &c.gas, sizeof c.gas);
    return status;
}

static bc_status find_composition(void *out, bc_error *err)
{
    static bc_composition c;
    const bc_status status = bc_composition_find("pipeline-h", FOLDERS, COUNT(FOLDERS), &c, err);

    if (status == BC_OK)
        memcpy(out, &c.gas, sizeof c.gas);
    return status;
}

static void add_name(const char *name, const char *path, void *data)
{
    char *names = data;

    (void)path;
    (void)strncat(names, name, TEXT_BYTES - 1 - strlen(names));
}

static bc_status list_compositions(void *out, bc_error *err)
{
    char names[TEXT_BYTES] = "";
    const bc_status status = bc_composition_each(FOLDERS[1], add_name, names, err);

    if (status == BC_OK)
        memcpy(out, names, sizeof names);
    return status;
}

static bc_status read_burner(void *out, bc_error *err)
{
    return bc_burner_read(EXAMPLES "kiln.ini", out, err);
}

static bc_status read_contract(void *out, bc_error *err)
{
    static bc_contract c;
    const bc_status status = bc_contract_read(scratch_path(), &c, err);

    if (status == BC_OK)
        memcpy(out, &c.limits, sizeof c.limits);
    return status;
}

static bc_status find_contract(void *out, bc_error *err)
{
    static bc_contract c;
    const bc_status status = bc_contract_find("en437-2h", SPECIFICATIONS, 1, &c, err);

    if (status == BC_OK)
        memcpy(out, &c.limits, sizeof c.limits);
    return status;
}

static void a_composition_file_survives_every_failing_allocation(void **state)
{
    (void)state;
    fail_each(&(job){"composition", read_composition, sizeof(bc_gas), true, 0}, 40);
}

static void a_bundled_gas_survives_every_failing_allocation(void **state)
{
    (void)state;
    fail_each(&(job){"bundled gas", find_composition, sizeof(bc_gas), true, 0}, 20);
}

static void a_folder_of_gases_survives_every_failing_allocation(void **state)
{
    (void)state;
    fail_each(&(job){"folder", list_compositions, TEXT_BYTES, true, 0}, 5);
}

static void a_burner_file_survives_every_failing_allocation(void **state)
{
    (void)state;
    fail_each(&(job){"burner", read_burner, sizeof(bc_burner), true, 0}, 30);
}

static void a_contract_and_what_it_follows_survive_every_failing_allocation(void **state)
{
    static const char FOLLOWER[] = "[contract]\nname = Follower\nfollows = " EXAMPLES "contract-marrowfen.ini\n"
                                   "[limit propane]\nmax = 7\nunit = mol %\n";

    (void)state;
    (void)write_scratch(FOLLOWER, sizeof FOLLOWER - 1);
    fail_each(&(job){"contract", read_contract, sizeof(((bc_contract *)0)->limits), true, 0}, 60);
    fail_each(&(job){"specification", find_contract, sizeof(((bc_contract *)0)->limits), true, 0}, 20);
}

/* ---- logs and spaces ------------------------------------------------------------------------------ */
static bc_status keep_log(void *out, bc_error *err)
{
    bc_log *log = NULL;
    bc_log_distribution d;
    bc_status status = bc_log_open(&exercised.contract, &log, err);
    bc_log_row row = {.gas = exercised.gas};

    for (int i = 0; status == BC_OK && i < 300; i++) {
        row.time_s = 900.0 * i + (i % 7);
        status = bc_log_add(log, &row, err);
    }
    if (status == BC_OK)
        status = bc_log_settle(log, err);
    if (status == BC_OK)
        status = bc_log_distribute(log, 0, &d, err);
    if (status == BC_OK)
        memcpy(out, &d.median, sizeof d.median);
    bc_log_close(log);
    return status;
}

static void a_log_survives_every_failing_allocation(void **state)
{
    bc_error err;

    (void)state;
    assert_ok(exercise_load(EXAMPLES "present-supply.ini", &exercised, &err), &err);
    fail_each(&(job){"log", keep_log, sizeof(double), true, 0}, 5);
}

static void a_log_that_could_not_grow_still_answers_for_its_rows(void **state)
{
    bc_log *log = NULL;
    bc_log_cover cover;
    bc_error err;
    size_t rows = 0;

    (void)state;
    needs_own_allocator();
    assert_ok(exercise_load(EXAMPLES "present-supply.ini", &exercised, &err), &err);
    assert_ok(bc_log_open(&exercised.contract, &log, &err), &err);
    bc_log_row row = {.gas = exercised.gas};

    allocator_arm(1, false);
    while (bc_log_add(log, &row, &err) == BC_OK && ++rows < 100000)
        row.time_s += 600.0;
    allocator_disarm();
    if (rows == 0) { /* the first row asks for more than one piece of memory: then for none of them is there room */
        assert_ok(bc_log_add(log, &row, &err), &err);
        rows = 1;
        row.time_s += 600.0;
        allocator_arm(0, false);
        while (bc_log_add(log, &row, &err) == BC_OK && ++rows < 100000)
            row.time_s += 600.0;
        allocator_disarm();
    }
    assert_int_equal(err.status, BC_ERR_MEMORY);
    assert_ok(bc_log_add(log, &row, &err), &err);
    assert_ok(bc_log_settle(log, &err), &err);
    bc_log_covers(log, &cover);
    assert_int_equal(cover.rows, rows + 1);
    bc_log_close(log);
}

static bc_status ask_worst(void *out, bc_error *err)
{
    static bc_space space;
    static const bool NOTHING_ELSE[BC_SPECIES_CAPACITY] = {false};
    size_t place[BC_LIMIT_MAX];
    bc_extremes e;
    bc_worst *worst = NULL;
    bc_status status = bc_contract_space(&exercised.contract, exercised.contract.limit_count, NOTHING_ELSE, &space, place, err);

    if (status == BC_OK)
        status = bc_worst_open(&space, &worst, err);
    if (status == BC_OK)
        status = bc_worst_quantity(worst, 0, &exercised.reference, &e, err);
    if (status == BC_OK)
        memcpy(out, &e, sizeof e);
    bc_worst_close(worst);
    return status;
}

static void a_space_survives_every_failing_allocation(void **state)
{
    bc_error err;

    (void)state;
    assert_ok(exercise_load(EXAMPLES "present-supply.ini", &exercised, &err), &err);
    fail_each(&(job){"worst", ask_worst, sizeof(bc_extremes), true, 0}, 1);
}

/* ---- blends --------------------------------------------------------------------------------------- */
static bc_mixer mixer;
static bc_gas parts[3];
static bc_offer offers[3];
static bc_contract aims;

static void mix(void)
{
    static const char *const GASES[] = {"methane=91.3,ethane=6.7,nitrogen=2", "propane=95,n-butane=5", "nitrogen=99.5,oxygen=0.5"};
    static const char *const PRICES[] = {"34 EUR/MWh", "0.71 EUR/kg", "0.05 EUR/m3"};
    static bc_composition c;
    bc_blend_part part[3];
    bc_error err;

    assert_ok(exercise_load(EXAMPLES "present-supply.ini", &exercised, &err), &err);
    for (size_t i = 0; i < 3; i++) {
        assert_ok(bc_composition_parse(GASES[i], &c, &err), &err);
        assert_ok(bc_price_parse(PRICES[i], &offers[i].price, offers[i].currency, &err), &err);
        parts[i] = c.gas;
        part[i] = (bc_blend_part){&parts[i], NULL};
    }
    assert_ok(bc_mixer_make(&exercised.reference, BC_BY_MOLE, part, 3, &mixer, &err), &err);
}

static bc_status find_optimum(void *out, bc_error *err)
{
    const bc_optimum_problem problem = {
        .mixer = &mixer, .within = &exercised.contract, .high = {1.0, 1.0, 1.0}, .least = BC_LEAST_COST, .offer = offers};

    return bc_optimum_find(&problem, out, err);
}

static bc_status find_aim(void *out, bc_error *err)
{
    const bc_aim_problem problem = {.mixer = &mixer, .aims = &aims, .high = {1.0, 1.0, 1.0}};

    return bc_aim_find(&problem, out, err);
}

/* The loader's own failures first; then, with NLopt loaded and its data of this thread in place, those of NLopt. */
static void nlopt_that_finds_no_memory_to_be_loaded_is_told(void **state)
{
    const job j = {"loading", find_optimum, sizeof(bc_optimum), true, 2};
    bc_error err;

    (void)state;
    needs_own_allocator();
    mix();
    memset(wanted, 0xA5, j.size);
    assert_ok(find_optimum(wanted, &err), &err);
    for (long k = 0; k < 6; k++)
        assert_true(run_failing(&j, k, true));
}

static void keep_nlopt_loaded(void)
{
    bc_optimum o;
    bc_error err;

    assert_non_null(dlopen("libnlopt.so.0", RTLD_NOW));
    assert_ok(find_optimum(&o, &err), &err);
}

static void an_optimum_survives_every_failing_allocation(void **state)
{
    (void)state;
    mix();
    keep_nlopt_loaded();
    fail_each(&(job){"optimum", find_optimum, sizeof(bc_optimum), true, 2}, 3);
}

static void an_aim_survives_every_failing_allocation(void **state)
{
    const double wobbe = 14.3, density = 0.66;
    bc_error err;

    (void)state;
    mix();
    keep_nlopt_loaded();
    assert_ok(bc_contract_start(&exercised.reference.state, &aims, &err), &err);
    assert_ok(bc_contract_add(&aims, "wobbe-gross", "kWh/m3", &wobbe, &wobbe, &err), &err);
    assert_ok(bc_contract_add(&aims, "relative-density", "", &density, &density, &err), &err);
    fail_each(&(job){"aim", find_aim, sizeof(bc_aim), true, 2}, 3);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(all_physics_runs_while_no_memory_is_to_be_had),
        cmocka_unit_test(a_composition_file_survives_every_failing_allocation),
        cmocka_unit_test(a_bundled_gas_survives_every_failing_allocation),
        cmocka_unit_test(a_folder_of_gases_survives_every_failing_allocation),
        cmocka_unit_test(a_burner_file_survives_every_failing_allocation),
        cmocka_unit_test(a_contract_and_what_it_follows_survive_every_failing_allocation),
        cmocka_unit_test(a_log_survives_every_failing_allocation),
        cmocka_unit_test(a_log_that_could_not_grow_still_answers_for_its_rows),
        cmocka_unit_test(a_space_survives_every_failing_allocation),
        cmocka_unit_test(nlopt_that_finds_no_memory_to_be_loaded_is_told),
        cmocka_unit_test(an_optimum_survives_every_failing_allocation),
        cmocka_unit_test(an_aim_survives_every_failing_allocation),
    };

    return cmocka_run_group_tests_name("memory", tests, NULL, remove_scratch);
}
