/* SPDX-License-Identifier: MIT */
/* stream_input.c - a log from a file, a pipe or a growing file, in blocks of whole rows. */
#include "cli/stream.h"

#include "base/error_internal.h"
#include "base/file_text.h"

#include <errno.h>
#include <fcntl.h>
#include <poll.h>
#include <stdlib.h>
#include <string.h>
#include <sys/stat.h>
#include <unistd.h>

#define WAIT_MS 250 /* between two looks at a file that is followed */
#define BLOCK_LEAST ((size_t)16 << 10)
#define ROWS_LEAST 64
#define ROWS_MOST 4096
#define VERDICT_WORD 16 /* about the length of the name of a limit */
#define RESULT_REST 32  /* of the parting signs, and of what a flag or a reason takes in the mean */

static bc_status fail(const stream_input *in, int reason, bc_error *err)
{
    char text[128];

    if (strerror_r(reason, text, sizeof text) != 0)
        text[0] = '\0';
    return bc_fail_at(err, reason == EISDIR ? BC_ERR_INPUT : BC_ERR_FILE, in->p->path, 0, "the log cannot be read: %s", text);
}

bc_status stream_input_open(stream_input *in, const stream_plan *p, bc_error *err)
{
    const arguments *a = p->a;
    struct stat there;

    memset(in, 0, sizeof *in);
    in->p = p;
    in->fd = -1;
    in->is_standard = a->argument_count == 0 || strcmp(a->argument[0], "-") == 0;
    in->follows = a->value[OPTION_follow] != NULL;
    in->rest = malloc(STREAM_BLOCK);
    if (!in->rest)
        return bc_fail(err, BC_ERR_MEMORY, "not enough memory for a block of the log");
    in->fd = in->is_standard ? STDIN_FILENO : open(p->path, O_RDONLY | O_CLOEXEC | O_NOCTTY);
    if (in->fd < 0)
        return bc_file_is_misnamed(errno) ? bc_fail_at(err, BC_ERR_INPUT, p->path, 0, "the log cannot be opened; is the name right?") : fail(in, errno, err);
    in->regular = fstat(in->fd, &there) == 0 && S_ISREG(there.st_mode);
    in->size = in->regular ? (uint64_t)there.st_size : 0;
    if (in->follows && in->is_standard)
        return bc_fail(err, BC_ERR_USAGE, "--follow waits for a file to grow; standard input is followed as it is");
    return BC_OK;
}

void stream_input_close(stream_input *in)
{
    if (in->fd >= 0 && !in->is_standard)
        (void)close(in->fd);
    free(in->rest);
    in->fd = -1;
    in->rest = NULL;
}

/* A file that is shorter than what was read of it was written anew: what follows would be no continuation. */
static bc_status check_shrunk(const stream_input *in, bc_error *err)
{
    struct stat now;

    if (fstat(in->fd, &now) == 0 && (uint64_t)now.st_size < in->bytes)
        return bc_fail_at(err, BC_ERR_FILE, in->p->path, 0, "the log became shorter while it was followed; start again on the new one");
    return BC_OK;
}

/* Reads once; *got is 0 at the end, and -1 when nothing has come yet. */
static bc_status read_some(stream_input *in, char *to, size_t room, bool wait, ssize_t *got, bc_error *err)
{
    struct pollfd ready = {in->fd, POLLIN, 0};

    *got = -1;
    if (!in->regular && !wait && poll(&ready, 1, 0) == 0)
        return BC_OK;
    do
        *got = read(in->fd, to, room);
    while (*got < 0 && errno == EINTR && !stream_interrupted());
    if (*got < 0 && errno == EINTR) {
        *got = 0;
        return BC_OK;
    }
    if (*got < 0)
        return fail(in, errno, err);
    in->bytes += (uint64_t)*got;
    if (*got > 0 || !in->follows)
        return BC_OK;
    const bc_status status = check_shrunk(in, err);

    if (status == BC_OK && wait && !stream_interrupted())
        (void)poll(NULL, 0, WAIT_MS);
    *got = stream_interrupted() ? 0 : -1;
    return status;
}

bc_status stream_input_begin(stream_input *in, stream_plan *p, bc_error *err)
{
    bc_status status = BC_OK;

    while (status == BC_OK && !in->ended && !stream_interrupted() && in->rest_length < STREAM_BLOCK
           && !stream_has_beginning(p, in->rest, in->rest_length)) {
        ssize_t got = 0;

        status = read_some(in, in->rest + in->rest_length, STREAM_BLOCK - in->rest_length, true, &got, err);
        in->ended = got == 0;
        in->rest_length += got > 0 ? (size_t)got : 0;
    }
    return status;
}

void stream_input_skip(stream_input *in, size_t length)
{
    in->rest_length -= length;
    memmove(in->rest, in->rest + length, in->rest_length);
    in->waits = in->rest_length > 0;
}

bool stream_input_over(const stream_input *in)
{
    return !in->waits && (in->ended || stream_interrupted());
}

static size_t within(size_t value, size_t least, size_t most)
{
    return value < least ? least : value > most ? most : value;
}

/* What a row comes to beside its own text: its mark, what is kept of it, what is written behind it. */
static size_t row_bytes(const stream_plan *p)
{
    const size_t limits = p->contract ? p->contract->limit_count : 0;
    size_t bytes = sizeof(stream_mark) + limits * sizeof(double) + (p->keeps ? p->figure_count * sizeof(double) : 0);

    for (size_t i = 0; i < p->figure_count && !p->drops; i++)
        bytes += (size_t)p->digits + 6 + (p->form == STREAM_NDJSON ? strlen(p->figures[i].heading) + 4 : 0);
    return bytes + (p->drops ? 0 : limits * VERDICT_WORD + RESULT_REST);
}

/* Half of a share is for what the rows come to, half for their text, which stands in the block and in front of the results. */
void stream_input_share(stream_input *in, size_t batches)
{
    const size_t share = STREAM_MEMORY / batches;

    in->rows_max = within(share / 2 / row_bytes(in->p), ROWS_LEAST, ROWS_MOST);
    in->block_max = within(share / 4, BLOCK_LEAST, STREAM_BLOCK);
    in->block = in->block_max;
}

/* Bytes of the whole rows in a block, rows_max of them at most; *more: others may stand behind them. */
static size_t whole_rows(const stream_input *in, const char *block, size_t length, bool *more)
{
    size_t rows = 0;
    size_t at = 0;

    while (rows < in->rows_max && at < length) {
        const size_t row = stream_row_end(in->p, block + at, length - at, in->ended);

        if (row == 0)
            break;
        at += row;
        rows++;
    }
    *more = rows == in->rows_max && at < length;
    return at;
}

/* Where short rows end a block early, the next one is read no longer than that. */
static void keep_rest(stream_input *in, const char *block, size_t used, size_t filled)
{
    in->rest_length = filled - used;
    memcpy(in->rest, block + used, in->rest_length);
    in->block = within(in->waits ? used : 2 * in->block, BLOCK_LEAST, in->block_max);
}

bc_status stream_input_fill(stream_input *in, char *block, size_t *length, bool wait, bc_error *err)
{
    size_t filled = in->rest_length;

    memcpy(block, in->rest, filled);
    in->rest_length = 0;
    *length = whole_rows(in, block, filled, &in->waits);
    while (!in->ended && !stream_interrupted() && (filled < in->block || (*length == 0 && filled < STREAM_BLOCK))) {
        const size_t aim = filled < in->block ? in->block : STREAM_BLOCK;
        ssize_t got = 0;
        const bc_status status = read_some(in, block + filled, aim - filled, wait && *length == 0, &got, err);

        if (status != BC_OK)
            return status;
        if (got < 0 && (!wait || *length > 0))
            break;
        in->ended = got == 0;
        filled += got > 0 ? (size_t)got : 0;
        if (*length == 0)
            *length = whole_rows(in, block, filled, &in->waits);
    }
    *length = whole_rows(in, block, filled, &in->waits);
    if (*length == 0 && filled == STREAM_BLOCK)
        return bc_fail_at(err, BC_ERR_INPUT, in->p->path, 0, "a row is longer than %zu KiB; is it a log?", STREAM_BLOCK >> 10);
    keep_rest(in, block, *length, filled);
    return BC_OK;
}
