/* SPDX-License-Identifier: MIT */
/* apart.c - work in a process of its own, its bytes through a pipe. */
#include "output/apart_internal.h"

#include "base/error_internal.h"
#include "output/memory_stream_internal.h"

#include <errno.h>
#include <fcntl.h>
#include <signal.h>
#include <stdbool.h>
#include <stdlib.h>
#include <string.h>
#include <sys/wait.h>
#include <unistd.h>

#define SECONDS_MAX 20  /* the largest report is drawn in two */
#define FAILED_CODE 101 /* of the child: its bytes did not all leave */

/* First in the pipe; behind it the bytes. */
typedef struct {
    bc_status status;
    bc_error err;
    size_t count; /* of the bytes */
} letter;

static bool send_all(int to, const void *from, size_t size)
{
    const char *at = from;

    while (size > 0) {
        const ssize_t n = write(to, at, size);

        if (n < 0 && errno == EINTR)
            continue;
        if (n <= 0)
            return false;
        at += n;
        size -= (size_t)n;
    }
    return true;
}

static ssize_t receive(int from, void *to, size_t size)
{
    ssize_t n = 0;

    do
        n = read(from, to, size);
    while (n < 0 && errno == EINTR);
    return n;
}

static bool receive_letter(int from, letter *l)
{
    char *at = (char *)l;
    size_t left = sizeof *l;

    while (left > 0) {
        const ssize_t n = receive(from, at, left);

        if (n <= 0)
            return false;
        at += n;
        left -= (size_t)n;
    }
    return true;
}

static bool receive_bytes(int from, size_t count, FILE *out)
{
    char block[32768];

    while (count > 0) {
        const ssize_t n = receive(from, block, count < sizeof block ? count : sizeof block);

        if (n <= 0 || fwrite(block, 1, (size_t)n, out) != (size_t)n)
            return false;
        count -= (size_t)n;
    }
    return true;
}

/* What a library says of its troubles is for nobody: the caller tells it in one line. It goes into a pipe that is never
 * waited for. */
static bool listen_to_errors(int ends[2])
{
    return pipe(ends) == 0 && fcntl(ends[0], F_SETFL, O_NONBLOCK) == 0 && fcntl(ends[1], F_SETFL, O_NONBLOCK) == 0
           && dup2(ends[1], STDERR_FILENO) >= 0;
}

/* A library may say that memory was short and go on without what it could not keep ("Memory allocation failed",
 * "out of memory"). */
static bool heard_of_memory(int from)
{
    char text[32768];
    const ssize_t n = receive(from, text, sizeof text - 1);

    text[n > 0 ? n : 0] = '\0';
    return strstr(text, "emory") != NULL;
}

/* The child; flushes nothing that is the parent's. */
static _Noreturn void work_apart(apart_work *work, void *data, int to)
{
    char *bytes = NULL;
    size_t count = 0;
    int errors[2];
    letter l;

    memset(&l, 0, sizeof l);
    (void)signal(SIGALRM, SIG_DFL);
    (void)alarm(SECONDS_MAX);
    FILE *memory = bc_memory_stream_open(&bytes, &count);

    if (memory == NULL || !listen_to_errors(errors))
        _exit(FAILED_CODE);
    l.status = work(data, memory, &l.err);
    if (!bc_memory_stream_close(memory) || heard_of_memory(errors[0]))
        _exit(FAILED_CODE);
    l.count = count;
    _exit(send_all(to, &l, sizeof l) && send_all(to, bytes, count) ? 0 : FAILED_CODE);
}

/* The child's exit code; that of a signal is above 128. */
static int end_of(pid_t child)
{
    int status = 0;

    while (waitpid(child, &status, 0) < 0)
        if (errno != EINTR)
            return FAILED_CODE;
    return WIFEXITED(status) ? WEXITSTATUS(status) : 128 + WTERMSIG(status);
}

static bc_status result_of(const letter *l, bool arrived, int code, bc_error *err)
{
    if (arrived && code == 0) {
        if (err && l->status != BC_OK)
            *err = l->err;
        return l->status;
    }
    return bc_fail(err, BC_ERR_FILE, "the report cannot be drawn: %s",
                   code == 128 + SIGALRM ? "it took more than 20 seconds" : "a library failed, as they do where memory is short");
}

bc_status apart(apart_work *work, void *data, FILE *out, bc_error *err)
{
    int ends[2];
    letter l;

    if (pipe(ends) != 0)
        return work(data, out, err);
    const pid_t child = fork();

    if (child == 0) {
        (void)close(ends[0]);
        work_apart(work, data, ends[1]);
    }
    (void)close(ends[1]);
    if (child < 0) {
        (void)close(ends[0]);
        return work(data, out, err);
    }
    const bool arrived = receive_letter(ends[0], &l) && receive_bytes(ends[0], l.count, out);

    (void)close(ends[0]); /* a child that still writes ends by it */
    return result_of(&l, arrived, end_of(child), err);
}
