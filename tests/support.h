/* SPDX-License-Identifier: MIT */
/* support.h - what the tests share: cmocka, comparing doubles, a scratch file, a silent stderr, chance.
 *
 * Chance is a xorshift generator with a fixed start, so that every run tests the same cases. */
#ifndef SUPPORT_H
#define SUPPORT_H

#include <stdarg.h>
#include <stddef.h>
#include <setjmp.h>
#include <stdint.h>

#include <cmocka.h>

#include "bluecone/status.h"

#include <fcntl.h>
#include <locale.h>
#include <math.h>
#include <stdbool.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>
#include <sys/stat.h>
#include <unistd.h>

#define COUNT(array) (sizeof(array) / sizeof *(array))

/* Compares doubles; cmocka's own comparison goes through float. The second form names the input. */
#define assert_within(got, want, tolerance) support_within(#got, got, want, tolerance, __FILE__, __LINE__)
#define assert_within_at(label, got, want, tolerance) support_within(label, got, want, tolerance, __FILE__, __LINE__)

static inline void support_within(const char *label, double got, double want, double tolerance, const char *file, int line)
{
    if (fabs(got - want) <= tolerance)
        return;
    print_error("%s: got %.12g, want %.12g, off by %.3g, tolerance %.3g\n", label, got, want, got - want, tolerance);
    _fail(file, line);
}

/* A failure must have this status and a message that holds every word of `words`, parted by '|'. */
#define assert_refused(status, err, wanted, words) support_refused("", status, err, wanted, words, __FILE__, __LINE__)
#define assert_refused_at(label, status, err, wanted, words) support_refused(label, status, err, wanted, words, __FILE__, __LINE__)

static inline void support_refused(const char *label, bc_status status, const bc_error *err, bc_status wanted, const char *words,
                                   const char *file, int line)
{
    char list[256];
    char *p = list;

    (void)snprintf(list, sizeof list, "%s", words);
    if (status != wanted || err->status != wanted) {
        print_error("%s: status %d (%s), want %d: %s\n", label, (int)status, bc_status_text(status), (int)wanted, err->message);
        _fail(file, line);
    }
    while (p != NULL) {
        char *bar = strchr(p, '|');

        if (bar != NULL)
            *bar = '\0';
        if (strstr(err->message, p) == NULL) {
            print_error("%s: \"%s\" is not in: %s\n", label, p, err->message);
            _fail(file, line);
        }
        p = bar != NULL ? bar + 1 : NULL;
    }
}

/* A call that must succeed; what it says if it does not is printed. */
#define assert_ok(status, err) support_ok(status, err, #status, __FILE__, __LINE__)

static inline void support_ok(bc_status status, const bc_error *err, const char *call, const char *file, int line)
{
    if (status == BC_OK)
        return;
    print_error("%s: %s:%d: %s\n", call, err->file, err->line, err->message);
    _fail(file, line);
}

/* One scratch file a test program, written anew by each use; remove_scratch() is its group teardown. */
static inline const char *scratch_path(void)
{
    static char path[64];

    if (path[0] == '\0')
        (void)snprintf(path, sizeof path, "/tmp/bluecone-test-%ld.ini", (long)getpid());
    return path;
}

static inline const char *write_scratch(const char *bytes, size_t length)
{
    FILE *f = fopen(scratch_path(), "wb");

    assert_non_null(f);
    assert_int_equal(fwrite(bytes, 1, length, f), length);
    assert_int_equal(fclose(f), 0);
    return scratch_path();
}

static inline int remove_scratch(void **state)
{
    (void)state;
    (void)unlink(scratch_path());
    return 0;
}

/* Between the two calls nothing may reach stderr; the second fails the test if something did. */
static inline int hold_stderr(void)
{
    char path[80];
    const int kept = dup(STDERR_FILENO);

    (void)snprintf(path, sizeof path, "%s.err", scratch_path());
    const int file = open(path, O_RDWR | O_CREAT | O_TRUNC, 0600);

    assert_true(kept >= 0 && file >= 0);
    assert_true(dup2(file, STDERR_FILENO) >= 0);
    (void)close(file);
    (void)unlink(path);
    return kept;
}

static inline void assert_stderr_silent(int kept, const char *label)
{
    const off_t size = lseek(STDERR_FILENO, 0, SEEK_END);
    char text[200] = "";

    if (size > 0)
        (void)!pread(STDERR_FILENO, text, sizeof text - 1, 0);
    assert_true(dup2(kept, STDERR_FILENO) >= 0);
    (void)close(kept);
    if (size > 0)
        fail_msg("%s: stderr got %ld bytes: %s", label, (long)size, text);
}

/* Runs the rest of a test in a locale with a decimal comma. Where the machine has none it is made once
 * below the build folder (package locales); where that fails the test is skipped. */
static inline void use_german_numbers(void)
{
    if (setlocale(LC_ALL, "de_DE.UTF-8") != NULL)
        return;
    (void)!system("test -d " BC_BUILD_DIR "/locale/de_DE.UTF-8 || { mkdir -p " BC_BUILD_DIR
                  "/locale && localedef -i de_DE -f UTF-8 " BC_BUILD_DIR "/locale/de_DE.UTF-8; } >/dev/null 2>&1");
    (void)setenv("LOCPATH", BC_BUILD_DIR "/locale", 1);
    if (setlocale(LC_ALL, "de_DE.UTF-8") == NULL)
        skip();
}

static inline int use_c_numbers(void **state)
{
    (void)state;
    return setlocale(LC_ALL, "C") == NULL;
}

/* xorshift64*, Vigna, ACM Trans. Math. Softw. 42 (2016) 30. */
typedef struct {
    uint64_t state;
} chance;

static inline uint64_t chance_bits(chance *c)
{
    c->state ^= c->state >> 12;
    c->state ^= c->state << 25;
    c->state ^= c->state >> 27;
    return c->state * UINT64_C(2685821657736338717);
}

/* Uniform in (0, 1). */
static inline double chance_uniform(chance *c)
{
    return ((double)(chance_bits(c) >> 11) + 0.5) / 9007199254740992.0;
}

static inline size_t chance_below(chance *c, size_t n)
{
    return (size_t)(chance_uniform(c) * (double)n);
}

/* Standard normal, Box and Muller. */
static inline double chance_normal(chance *c)
{
    const double r = sqrt(-2.0 * log(chance_uniform(c)));

    return r * cos(6.283185307179586 * chance_uniform(c));
}

#endif
