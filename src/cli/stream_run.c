/* SPDX-License-Identifier: MIT */
/* stream_run.c - blocks out to the threads, batches back in the order of the log. */
#include "cli/stream.h"

#include "base/error_internal.h"

#include <pthread.h>
#include <signal.h>
#include <stdlib.h>
#include <string.h>

static volatile sig_atomic_t interrupted;

bool stream_interrupted(void)
{
    return interrupted != 0;
}

static void on_signal(int number)
{
    (void)number;
    interrupted = 1;
}

/* Without SA_RESTART a signal ends a read that waits, so that what was read can still be written. */
void stream_catch_signals(void)
{
    static const int NUMBERS[] = {SIGINT, SIGTERM, SIGHUP};
    struct sigaction action = {.sa_handler = on_signal};
    struct sigaction before;

    (void)sigemptyset(&action.sa_mask);
    for (size_t i = 0; i < BC_COUNT(NUMBERS); i++)
        if (sigaction(NUMBERS[i], NULL, &before) == 0 && before.sa_handler != SIG_IGN)
            (void)sigaction(NUMBERS[i], &action, NULL);
}

typedef enum { SLOT_EMPTY, SLOT_FILLED, SLOT_WORKING, SLOT_DONE } slot_state;

/* A ring of batches: filled at `head`, taken at `tail`, both by the first thread; worked at in between by all. */
typedef struct {
    const stream_plan *p;
    size_t slots;
    stream_batch *batches;
    slot_state *states;
    size_t head, tail, next; /* counted on; the slot is the remainder by slots */
    bool stops;
    pthread_mutex_t lock;
    pthread_cond_t filled, done;
} ring;

static void *work(void *data)
{
    ring *r = data;

    (void)pthread_mutex_lock(&r->lock);
    for (;;) {
        while (!r->stops && r->next == r->head)
            (void)pthread_cond_wait(&r->filled, &r->lock);
        if (r->next == r->head)
            break;
        const size_t place = r->next++ % r->slots;

        (void)pthread_mutex_unlock(&r->lock);
        stream_work(r->p, &r->batches[place]);
        (void)pthread_mutex_lock(&r->lock);
        r->states[place] = SLOT_DONE;
        (void)pthread_cond_signal(&r->done);
    }
    (void)pthread_mutex_unlock(&r->lock);
    return NULL;
}

static void hand_out(ring *r)
{
    (void)pthread_mutex_lock(&r->lock);
    r->states[r->head % r->slots] = SLOT_FILLED;
    r->head++;
    (void)pthread_cond_signal(&r->filled);
    (void)pthread_mutex_unlock(&r->lock);
}

/* True when the oldest batch is done; waits for it when asked to. */
static bool is_done(ring *r, bool wait)
{
    const size_t place = r->tail % r->slots;

    if (r->tail == r->head)
        return false;
    (void)pthread_mutex_lock(&r->lock);
    while (wait && r->states[place] != SLOT_DONE)
        (void)pthread_cond_wait(&r->done, &r->lock);
    const bool done = r->states[place] == SLOT_DONE;

    (void)pthread_mutex_unlock(&r->lock);
    return done;
}

static bc_status take_oldest(ring *r, stream_take *take, void *data, bc_error *err)
{
    const size_t place = r->tail % r->slots;
    stream_batch *b = &r->batches[place];

    r->states[place] = SLOT_EMPTY;
    r->tail++;
    if (b->status != BC_OK)
        return bc_fail(err, b->status, "not enough memory for the results of a block");
    return take(data, b, err);
}

/* A batch that is done leaves before the next block is waited for: in a pipe nobody must wait for a row that is there. */
static bc_status go_through(ring *r, stream_input *in, stream_take *take, void *data, bc_error *err)
{
    bc_status status = BC_OK;
    bool more = true;

    while (status == BC_OK && (more || r->tail != r->head)) {
        const bool full = r->head - r->tail == r->slots;

        if (is_done(r, full || !more)) {
            status = take_oldest(r, take, data, err);
            continue;
        }
        const bool idle = r->tail == r->head;
        stream_batch *b = &r->batches[r->head % r->slots];

        status = stream_input_fill(in, b->in, &b->in_length, idle, err);
        if (status == BC_OK && b->in_length > 0)
            hand_out(r);
        else if (status == BC_OK && !stream_input_over(in) && !idle)
            (void)is_done(r, true);
        more = !stream_input_over(in);
    }
    return status;
}

static bc_status go_alone(const stream_plan *p, stream_batch *b, stream_input *in, stream_take *take, void *data, bc_error *err)
{
    bc_status status = BC_OK;

    while (status == BC_OK && !stream_input_over(in)) {
        status = stream_input_fill(in, b->in, &b->in_length, true, err);
        if (status != BC_OK || b->in_length == 0)
            continue;
        stream_work(p, b);
        status = b->status == BC_OK ? take(data, b, err) : bc_fail(err, b->status, "not enough memory for the results of a block");
    }
    return status;
}

/* Signals are for the first thread, whose read they end. */
static bc_status start(ring *r, pthread_t threads[], size_t jobs, size_t *started)
{
    sigset_t all;
    sigset_t before;

    (void)sigfillset(&all);
    (void)pthread_sigmask(SIG_SETMASK, &all, &before);
    *started = 0;
    while (*started < jobs && pthread_create(&threads[*started], NULL, work, r) == 0)
        (*started)++;
    (void)pthread_sigmask(SIG_SETMASK, &before, NULL);
    return *started > 0 ? BC_OK : BC_ERR_MEMORY;
}

static void stop(ring *r, const pthread_t threads[], size_t started)
{
    (void)pthread_mutex_lock(&r->lock);
    r->stops = true;
    r->head = r->next; /* what nobody has begun is left, which only matters after a failure */
    (void)pthread_cond_broadcast(&r->filled);
    (void)pthread_mutex_unlock(&r->lock);
    for (size_t i = 0; i < started; i++)
        (void)pthread_join(threads[i], NULL);
}

static bc_status go_together(ring *r, stream_input *in, size_t jobs, stream_take *take, void *data, bc_error *err)
{
    pthread_t *threads = calloc(jobs, sizeof *threads);
    size_t started = 0;

    if (!threads || start(r, threads, jobs, &started) != BC_OK) {
        free(threads);
        return bc_fail(err, BC_ERR_MEMORY, "no thread can be started; --jobs 1 needs none");
    }
    const bc_status status = go_through(r, in, take, data, err);

    stop(r, threads, started);
    free(threads);
    return status;
}

static bool make_ring(ring *r)
{
    r->batches = calloc(r->slots, sizeof *r->batches);
    r->states = calloc(r->slots, sizeof *r->states);
    if (!r->batches || !r->states)
        return false;
    for (size_t i = 0; i < r->slots; i++) {
        r->batches[i].in = malloc(STREAM_BLOCK);
        if (!r->batches[i].in)
            return false;
    }
    return true;
}

static void drop_ring(ring *r)
{
    for (size_t i = 0; r->batches && i < r->slots; i++) {
        free(r->batches[i].in);
        free(r->batches[i].out);
        free(r->batches[i].marks);
        free(r->batches[i].figures);
        free(r->batches[i].limits);
    }
    free(r->batches);
    free(r->states);
}

bc_status stream_run(const stream_plan *p, stream_input *in, size_t jobs, stream_take *take, void *data, bc_error *err)
{
    ring r = {.p = p, .slots = jobs > 1 ? 2 * jobs + 2 : 1, .lock = PTHREAD_MUTEX_INITIALIZER, .filled = PTHREAD_COND_INITIALIZER, .done = PTHREAD_COND_INITIALIZER};
    bc_status status = BC_ERR_MEMORY;

    stream_input_share(in, r.slots);
    if (!make_ring(&r))
        status = bc_fail(err, BC_ERR_MEMORY, "not enough memory for %zu blocks of the log", r.slots);
    else if (jobs > 1)
        status = go_together(&r, in, jobs, take, data, err);
    else
        status = go_alone(p, &r.batches[0], in, take, data, err);
    drop_ring(&r);
    return status;
}
