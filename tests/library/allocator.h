/* SPDX-License-Identifier: MIT */
/* allocator.h - malloc() and its like for a test program: counted, and failing when they are told to.
 *
 * They stand in the program and so come before those of the C library in all libraries that it loads: iniparser,
 * NLopt, the C library itself. Sanitizers have an allocator of their own: under them this one is not there. */
#ifndef ALLOCATOR_H
#define ALLOCATOR_H

#include <errno.h>
#include <stdbool.h>
#include <stddef.h>
#include <string.h>

#if defined(__SANITIZE_ADDRESS__) || defined(__SANITIZE_THREAD__)
#define ALLOCATOR_STANDS 0
#else
#define ALLOCATOR_STANDS 1
#endif

/* Only while armed anything is counted or fails. */
static struct {
    bool armed;
    long asked;       /* allocations asked for since it was armed */
    long fails_from;  /* the first one that fails; negative: none does */
    bool fails_once;  /* that one alone, else all from it on */
    long live;        /* allocations less releases since it was armed */
} allocator;

static inline void allocator_arm(long fails_from, bool fails_once)
{
    allocator.asked = 0;
    allocator.fails_from = fails_from;
    allocator.fails_once = fails_once;
    allocator.live = 0;
    allocator.armed = true;
}

static inline void allocator_disarm(void)
{
    allocator.armed = false;
}

#if ALLOCATOR_STANDS

/* The C library's own, under the names that it keeps for such programs. */
extern void *__libc_malloc(size_t size);
extern void *__libc_calloc(size_t count, size_t size);
extern void *__libc_realloc(void *memory, size_t size);
extern void __libc_free(void *memory);

/* Libraries find them only where they are visible. */
#define SEEN __attribute__((visibility("default")))
extern SEEN void *malloc(size_t size);
extern SEEN void *calloc(size_t count, size_t size);
extern SEEN void *realloc(void *memory, size_t size);
extern SEEN void free(void *memory);

static bool allocator_refuses(void)
{
    if (!allocator.armed)
        return false;
    const long k = allocator.asked++;

    if (allocator.fails_from < 0 || k < allocator.fails_from || (allocator.fails_once && k > allocator.fails_from))
        return false;
    errno = ENOMEM;
    return true;
}

static void *counted(void *memory)
{
    if (allocator.armed && memory)
        allocator.live++;
    return memory;
}

void *malloc(size_t size)
{
    return allocator_refuses() ? NULL : counted(__libc_malloc(size));
}

/* The C library's tells which library an address belongs to. */
typedef struct {
    const char *library;
    void *base;
    const char *symbol;
    void *at;
} allocator_caller;
extern int dladdr(const void *address, allocator_caller *caller);

/* The tables of a new dictionary, of 128 rows, are the one thing that iniparser 4.1 does not look at; src/base/ini.c
 * makes sure of them beforehand. */
static bool is_unchecked(size_t count, const void *address)
{
    allocator_caller caller = {NULL, NULL, NULL, NULL};

    return count == 128 && dladdr(address, &caller) != 0 && caller.library && strstr(caller.library, "libiniparser");
}

void *calloc(size_t count, size_t size)
{
    if (allocator.armed && is_unchecked(count, __builtin_return_address(0)))
        return counted(__libc_calloc(count, size));
    return allocator_refuses() ? NULL : counted(__libc_calloc(count, size));
}

void *realloc(void *memory, size_t size)
{
    if (allocator_refuses())
        return NULL;
    return memory ? __libc_realloc(memory, size) : counted(__libc_realloc(NULL, size));
}

void free(void *memory)
{
    if (allocator.armed && memory)
        allocator.live--;
    __libc_free(memory);
}

#endif

#endif
