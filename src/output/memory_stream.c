/* SPDX-License-Identifier: MIT */
/* memory_stream.c - a stream into memory. That of the C library is not used: glibc 2.36 drops what comes while it cannot
 * grow, takes what comes later, and never says so. */
#define _GNU_SOURCE /* fopencookie() */
#include "output/memory_stream_internal.h"

#include <stdint.h>
#include <stdlib.h>
#include <string.h>
#include <sys/types.h>

#define FIRST_ROOM 1024
#define BUFFER 4096

typedef struct {
    char **text;
    size_t *count;
    size_t room;
    bool failed;
    char buffer[BUFFER]; /* of the stream, so that it needs none of its own */
} memory_stream;

/* Room for so many bytes and the NUL behind them. */
static bool make_room(memory_stream *m, size_t count)
{
    size_t room = m->room;

    while (room <= count)
        room = room < SIZE_MAX / 2 ? 2 * room : SIZE_MAX;
    if (room == m->room)
        return true;
    char *text = realloc(*m->text, room);

    if (text == NULL)
        return false;
    *m->text = text;
    m->room = room;
    return true;
}

/* 0 for failure, as fopencookie() wants it. */
static ssize_t take(void *data, const char *bytes, size_t size)
{
    memory_stream *m = data;

    m->failed = m->failed || size >= SIZE_MAX - *m->count || !make_room(m, *m->count + size);
    if (m->failed)
        return 0;
    memcpy(*m->text + *m->count, bytes, size);
    *m->count += size;
    (*m->text)[*m->count] = '\0';
    return (ssize_t)size;
}

static int end(void *data)
{
    memory_stream *m = data;
    const int result = m->failed ? EOF : 0;

    free(m);
    return result;
}

FILE *bc_memory_stream_open(char **text, size_t *count)
{
    memory_stream *m = malloc(sizeof *m);

    *count = 0;
    *text = calloc(1, FIRST_ROOM);
    FILE *stream = m != NULL && *text != NULL ? fopencookie(m, "w", (cookie_io_functions_t){.write = take, .close = end}) : NULL;

    if (stream == NULL) {
        free(*text);
        *text = NULL;
        free(m);
        return NULL;
    }
    *m = (memory_stream){.text = text, .count = count, .room = FIRST_ROOM};
    (void)setvbuf(stream, m->buffer, _IOFBF, sizeof m->buffer);
    return stream;
}

bool bc_memory_stream_close(FILE *stream)
{
    const bool failed = ferror(stream) != 0;

    return fclose(stream) == 0 && !failed;
}
