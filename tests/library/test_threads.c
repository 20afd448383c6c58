/* SPDX-License-Identifier: MIT */
/* test_threads.c - many threads at once, on gases of their own and on shared ones: each gets what one alone gets.
 *
 * `make thread` runs it under ThreadSanitizer, which also sees what did no harm this time. */
#include "library/exercise.h"

#include "support.h"

#include <locale.h>
#include <pthread.h>

#define THREADS 6
#define ROUNDS 2
#define EXAMPLES BC_SOURCE_DIR "/examples/"

static const char *const GASES[] = {EXAMPLES "present-supply.ini", EXAMPLES "new-supply-offer.ini", "hydrogen=57,methane=26,carbon-monoxide=7,nitrogen=10"};

/* What a thread works on with objects of its own: files, a log, a space, descents. */
typedef struct {
    double composition, contract, log, worst, optimum, aim;
} own_work;

static exercise_of subjects[COUNT(GASES)];
static exercise_row alone[COUNT(GASES)];
static own_work alone_work;

typedef struct {
    pthread_t thread;
    size_t number;
    size_t wrong_rows, wrong_work, refused; /* what it saw */
    exercise_row row;
    exercise_of own;
} worker;

static worker workers[THREADS];
static pthread_barrier_t start;

static bc_status work_log(const exercise_of *e, double *median, bc_error *err)
{
    bc_log *log = NULL;
    bc_log_distribution d = {.median = 0.0};
    bc_log_row row = {.gas = e->gas};
    bc_status status = bc_log_open(&e->contract, &log, err);

    for (int i = 0; status == BC_OK && i < 40; i++) {
        row.time_s = 900.0 * i;
        row.gas = i % 3 == 0 ? e->other : e->gas;
        status = bc_log_add(log, &row, err);
    }
    if (status == BC_OK)
        status = bc_log_settle(log, err);
    if (status == BC_OK)
        status = bc_log_distribute(log, 1, &d, err);
    bc_log_close(log);
    *median = d.median;
    return status;
}

static bc_status work_worst(const exercise_of *e, double *most, bc_error *err)
{
    const bool present[BC_SPECIES_CAPACITY] = {false};
    bc_space *space = malloc(sizeof *space);
    bc_worst *worst = NULL;
    bc_extremes x = {.max = {.value = 0.0}};
    size_t place[BC_LIMIT_MAX];

    if (!space)
        return BC_ERR_MEMORY;
    bc_status status = bc_contract_space(&e->contract, e->contract.limit_count, present, space, place, err);

    if (status == BC_OK)
        status = bc_worst_open(space, &worst, err);
    if (status == BC_OK)
        status = bc_worst_quantity(worst, 2, &e->reference, &x, err);
    bc_worst_close(worst);
    free(space);
    *most = x.max.value;
    return status;
}

/* Aims that a blend of 0.7, 0.25 and 0.05 has, so that there is something to be found. */
static bc_status set_aims(const bc_mixer *mixer, bc_contract *aims, bc_error *err)
{
    static const char *const IDS[] = {"wobbe-gross", "relative-density"};
    const double share[BC_BLEND_PARTS_MAX] = {0.7, 0.25, 0.05};
    const bc_gas gas = bc_mixer_gas(mixer, share);
    bc_status status = bc_contract_start(&mixer->reference->state, aims, err);

    for (size_t i = 0; status == BC_OK && i < COUNT(IDS); i++) {
        const double any = 1.0;
        double value = 0.0;

        status = bc_contract_add(aims, IDS[i], "", &any, &any, err);
        if (status == BC_OK)
            status = bc_limit_value(aims, i, &gas, &value, err);
        aims->limits[i].min = aims->limits[i].max = value;
    }
    return status;
}

static bc_status work_blends(const exercise_of *e, own_work *work, bc_error *err)
{
    const bc_gas air = bc_oxidant_air();
    const bc_blend_part parts[] = {{&e->gas, NULL}, {&e->other, NULL}, {&air, NULL}};
    static const char *const PRICES[] = {"34 EUR/MWh", "0.71 EUR/kg", "0.05 EUR/m3"};
    bc_offer offers[COUNT(PRICES)];
    bc_contract *aims = malloc(sizeof *aims);
    bc_mixer mixer;
    bc_optimum optimum = {.objective = 0.0};
    bc_aim aim = {.count = 0};
    bc_status status = aims ? bc_mixer_make(&e->reference, BC_BY_MOLE, parts, 3, &mixer, err) : BC_ERR_MEMORY;
    const bc_optimum_problem problem = {.mixer = &mixer, .within = &e->contract, .high = {1.0, 1.0, 1.0}, .least = BC_LEAST_COST, .offer = offers};
    const bc_aim_problem aimed = {.mixer = &mixer, .aims = aims, .high = {1.0, 1.0, 1.0}};

    memset(offers, 0, sizeof offers);
    for (size_t i = 0; status == BC_OK && i < COUNT(PRICES); i++)
        status = bc_price_parse(PRICES[i], &offers[i].price, offers[i].currency, err);
    if (status == BC_OK)
        status = bc_optimum_find(&problem, &optimum, err);
    if (status == BC_OK)
        status = set_aims(&mixer, aims, err);
    if (status == BC_OK)
        status = bc_aim_find(&aimed, &aim, err);
    free(aims);
    work->optimum = optimum.objective;
    work->aim = aim.reached ? aim.share[0][1] : 0.0;
    return status;
}

static bc_status do_own_work(exercise_of *own, own_work *work, bc_error *err)
{
    bc_status status = exercise_load(GASES[0], own, err);

    if (status == BC_OK)
        status = work_log(own, &work->log, err);
    if (status == BC_OK)
        status = work_worst(own, &work->worst, err);
    if (status == BC_OK)
        status = work_blends(own, work, err);
    work->composition = own->gas.x[0] + own->composition.sum;
    work->contract = own->contract.limits[0].max;
    return status;
}

/* Every second thread has a decimal comma of its own, where the machine has such a locale. */
static locale_t take_locale(size_t number)
{
    const locale_t german = number % 2 ? newlocale(LC_ALL_MASK, "de_DE.UTF-8", (locale_t)0) : (locale_t)0;

    if (german != (locale_t)0)
        (void)uselocale(german);
    return german;
}

static void *run(void *data)
{
    worker *w = data;
    const locale_t german = take_locale(w->number);

    (void)pthread_barrier_wait(&start);
    for (size_t round = 0; round < ROUNDS; round++) {
        const size_t g = (w->number + round) % COUNT(GASES);
        own_work work = {0};
        bc_error err;

        exercise(&subjects[g], &w->row);
        w->wrong_rows += w->row.count != alone[g].count || memcmp(w->row.number, alone[g].number, w->row.count * sizeof *w->row.number) != 0;
        w->refused += do_own_work(&w->own, &work, &err) != BC_OK;
        w->wrong_work += memcmp(&work, &alone_work, sizeof work) != 0;
    }
    if (german != (locale_t)0) {
        (void)uselocale(LC_GLOBAL_LOCALE);
        freelocale(german);
    }
    return NULL;
}

static void threads_get_to_the_last_bit_what_one_alone_gets(void **state)
{
    bc_error err;

    (void)state;
    for (size_t g = 0; g < COUNT(GASES); g++) {
        assert_ok(exercise_load(GASES[g], &subjects[g], &err), &err);
        exercise(&subjects[g], &alone[g]);
        assert_true(alone[g].count > 2000 && alone[g].count <= EXERCISE_MAX);
    }
    assert_ok(do_own_work(&workers[0].own, &alone_work, &err), &err);
    assert_true(alone_work.worst > 0.0 && alone_work.optimum > 0.0 && alone_work.log > 0.0);
    assert_within(alone_work.aim, 0.25, 1e-6);
    assert_int_equal(pthread_barrier_init(&start, NULL, THREADS), 0);
    for (size_t i = 0; i < THREADS; i++) {
        workers[i].number = i;
        assert_int_equal(pthread_create(&workers[i].thread, NULL, run, &workers[i]), 0);
    }
    for (size_t i = 0; i < THREADS; i++)
        assert_int_equal(pthread_join(workers[i].thread, NULL), 0);
    assert_int_equal(pthread_barrier_destroy(&start), 0);
    for (size_t i = 0; i < THREADS; i++) {
        assert_int_equal(workers[i].refused, 0);
        assert_int_equal(workers[i].wrong_rows, 0);
        assert_int_equal(workers[i].wrong_work, 0);
    }
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(threads_get_to_the_last_bit_what_one_alone_gets),
    };

    return cmocka_run_group_tests_name("threads", tests, NULL, NULL);
}
