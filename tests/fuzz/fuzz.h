/* SPDX-License-Identifier: MIT */
/* fuzz.h - what the fuzz targets share: the function that is called with bytes, a check that ends the program, a file made
 * of the bytes, what every answer of the library must be. */
#ifndef FUZZ_H
#define FUZZ_H

#include "bluecone/status.h"

#include <fcntl.h>
#include <math.h>
#include <stdbool.h>
#include <stddef.h>
#include <stdint.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>
#include <unistd.h>

/* Called by libFuzzer, or by replay.c for each seed; 0. */
int LLVMFuzzerTestOneInput(const uint8_t *data, size_t size);

/* An assertion that no build leaves out. */
#define fuzz_require(condition) fuzz_check(condition, #condition, __FILE__, __LINE__)

static inline void fuzz_check(bool holds, const char *what, const char *file, int line)
{
    if (holds)
        return;
    (void)fprintf(stderr, "%s:%d: does not hold: %s\n", file, line, what);
    abort();
}

/* A status is BC_OK, or the error says so too, in a sentence. */
static inline bool fuzz_answer(bc_status status, const bc_error *err)
{
    fuzz_require(status <= BC_ERR_SOLVER);
    if (status == BC_OK)
        return true;
    fuzz_require(err->status == status);
    fuzz_require(memchr(err->message, '\0', sizeof err->message) != NULL && memchr(err->file, '\0', sizeof err->file) != NULL);
    fuzz_require(strlen(err->message) > 9);
    fuzz_require(err->line >= 0);
    return false;
}

/* A file of the bytes; the next call writes it anew. The name is short and the same in every run. */
static inline const char *fuzz_file(const uint8_t *data, size_t size)
{
    static char path[32];
    static int file = -1;

    if (file < 0) {
        char name[] = "/tmp/bluecone-fuzz-XXXXXX";

        file = mkstemp(name);
        fuzz_require(file >= 0);
        (void)unlink(name);
        (void)snprintf(path, sizeof path, "/proc/self/fd/%d", file);
    }
    fuzz_require(ftruncate(file, 0) == 0);
    fuzz_require(size == 0 || pwrite(file, data, size, 0) == (ssize_t)size);
    return path;
}

/* The bytes as a text; to be freed. */
static inline char *fuzz_text(const uint8_t *data, size_t size)
{
    char *text = malloc(size + 1);

    fuzz_require(text != NULL);
    if (size > 0)
        memcpy(text, data, size);
    text[size] = '\0';
    return text;
}

/* Bytes being used up; zeros behind their end. */
typedef struct {
    const uint8_t *at;
    size_t left;
} fuzz_bytes;

static inline uint8_t fuzz_byte(fuzz_bytes *b)
{
    if (b->left == 0)
        return 0;
    b->left--;
    return *b->at++;
}

static inline uint16_t fuzz_short(fuzz_bytes *b)
{
    const unsigned high = fuzz_byte(b);

    return (uint16_t)(high << 8 | fuzz_byte(b));
}

/* Evenly from 0 to 1. */
static inline double fuzz_share(fuzz_bytes *b)
{
    return fuzz_short(b) / 65535.0;
}

/* Any double there is. */
static inline double fuzz_double(fuzz_bytes *b)
{
    uint64_t bits = 0;
    double value = 0.0;

    for (int i = 0; i < 8; i++)
        bits = bits << 8 | fuzz_byte(b);
    memcpy(&value, &bits, sizeof value);
    return value;
}

#endif
