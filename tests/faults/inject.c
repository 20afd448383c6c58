/* SPDX-License-Identifier: MIT */
/* inject.c - loaded in front of the C library: the n-th call of a kind fails, as the environment says.
 *
 *   FAULT=KIND:N      from the N-th call on (malloc, write, read) or that call alone fails; "": none
 *   FAULT_REPORT=FD   at the end: calls counted, calls failed, blocks of memory not given back
 *
 * Kinds are the rows of FAULTS. What the C library does inside itself (stdio on a file) is out of reach. */
#undef _FORTIFY_SOURCE /* its inline read() and the like would be what is defined here */
#define _GNU_SOURCE /* RTLD_NEXT, memfd_create */
#include <dirent.h>
#include <dlfcn.h>
#include <errno.h>
#include <fcntl.h>
#include <pthread.h>
#include <stdarg.h>
#include <stdatomic.h>
#include <stdbool.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>
#include <sys/mman.h>
#include <sys/stat.h>
#include <unistd.h>

/* Word, error number, what happens: 0 one call fails, 1 every call does something less than it was asked for. */
#define FAULTS(X)                                                                                                      \
    X(malloc, ENOMEM) X(malloc_once, ENOMEM) X(read_short, 0) X(read_eintr, EINTR) X(read_eio, EIO) X(read_end, 0)       \
    X(write_short, 0) X(write_eintr, EINTR) X(write_enospc, ENOSPC) X(write_epipe, EPIPE) X(write_eio, EIO)              \
    X(open_emfile, EMFILE) X(open_enoent, ENOENT) X(close_eio, EIO) X(rename_eio, EIO) X(fstat_eio, EIO)                 \
    X(mkstemp_enospc, ENOSPC) X(fopen_emfile, EMFILE) X(fgets_eio, EIO) X(memfd_enfile, ENFILE) X(dlopen_none, 0)        \
    X(thread_eagain, EAGAIN) X(fchmod_eperm, EPERM)

typedef enum {
#define FAULT(word, number) FAULT_##word,
    FAULTS(FAULT)
#undef FAULT
    FAULT_NONE
} fault;

static const struct {
    const char *word;
    int number;
} ROWS[] = {
#define FAULT(word, number) {#word, number},
    FAULTS(FAULT)
#undef FAULT
};

static fault asked = FAULT_NONE;
static unsigned long at;
static struct {
    atomic_ulong counted, failed;
} *shared, before; /* by the processes that the program starts, too; before begin() one by itself */
static atomic_long live;
static int report = -1;

extern void *__libc_malloc(size_t size);
extern void *__libc_calloc(size_t count, size_t size);
extern void *__libc_realloc(void *block, size_t size);
extern void *__libc_memalign(size_t alignment, size_t size);
extern void __libc_free(void *block);

__attribute__((constructor)) static void begin(void)
{
    const char *text = getenv("FAULT");
    const char *to = getenv("FAULT_REPORT");
    const char *colon = text ? strchr(text, ':') : NULL;

    shared = mmap(NULL, sizeof *shared, PROT_READ | PROT_WRITE, MAP_SHARED | MAP_ANONYMOUS, -1, 0);
    if (shared == MAP_FAILED)
        shared = &before;
    report = to ? (int)strtol(to, NULL, 10) : -1;
    for (size_t i = 0; colon && i < FAULT_NONE; i++)
        if (strlen(ROWS[i].word) == (size_t)(colon - text) && strncmp(ROWS[i].word, text, (size_t)(colon - text)) == 0) {
            at = strtoul(colon + 1, NULL, 10);
            asked = (fault)i;
        }
}

/* The real function; the union keeps a pointer to data and one to a function apart, as ISO C wants. */
#define REAL(type, name)                                                                                               \
    union {                                                                                                            \
        void *data;                                                                                                    \
        type;                                                                                                          \
    } name = {.data = dlsym(RTLD_NEXT, #name)}

__attribute__((destructor)) static void tell(void)
{
    char text[80];
    const int length = snprintf(text, sizeof text, "%lu %lu %ld\n", atomic_load(&shared->counted), atomic_load(&shared->failed), atomic_load(&live));
    REAL(ssize_t (*call)(int, const void *, size_t), write);

    if (report >= 0)
        (void)!write.call(report, text, (size_t)length);
}

/* Counts a call of a kind; true when it is to fail. */
static bool is_hit(fault kind, bool onwards)
{
    if (asked != kind)
        return false;
    const unsigned long n = atomic_fetch_add(&shared->counted, 1) + 1;
    const bool hit = at > 0 && (onwards ? n >= at : n == at);

    if (hit) {
        atomic_fetch_add(&shared->failed, 1);
        errno = ROWS[kind].number;
    }
    return hit;
}

/* ---- memory ------------------------------------------------------------------------------------------------------- */

#define NLOPT_LEAST 2048 /* bytes, and most: of the data that NLopt keeps for a thread */
#define NLOPT_MOST 4096
#define SELECTION_BYTES 80 /* of the struct that libxlsxwriter 1.1 makes for the cursor of a frozen pane */

/* Where one call fails by itself, fontconfig passes over a piece of its configuration: the same picture in another font. */
static bool is_of_fonts(const void *caller)
{
    Dl_info info;

    return dladdr(caller, &info) != 0 && info.dli_fname && strstr(info.dli_fname, "libfontconfig") != NULL;
}

/* iniparser 4.1 does not look at what its first tables got: the product asks for that room beforehand, which helps
 * against a real want of memory, but not against one call that fails by itself. libxlsxwriter leaves out the cursor of a
 * pane that it has no memory for, and says nothing: no figure is lost. The loader ends the process when NLopt's data of a
 * thread find no memory; that room is asked for beforehand, too. */
static bool is_exempt(const void *caller, size_t size)
{
    Dl_info info;

    if (dladdr(caller, &info) == 0 || !info.dli_fname)
        return false;
    return strstr(info.dli_fname, "libiniparser") != NULL || (size == SELECTION_BYTES && strstr(info.dli_fname, "libxlsxwriter") != NULL)
           || (size >= NLOPT_LEAST && size <= NLOPT_MOST && strstr(info.dli_fname, "ld-linux") != NULL);
}

static bool no_memory(const void *caller, size_t size)
{
    if ((asked != FAULT_malloc && asked != FAULT_malloc_once) || is_exempt(caller, size) || (asked == FAULT_malloc_once && is_of_fonts(caller)))
        return false;
    return is_hit(FAULT_malloc, true) || is_hit(FAULT_malloc_once, false);
}

static void *count_block(void *block)
{
    atomic_fetch_add(&live, block != NULL);
    return block;
}

void *malloc(size_t size)
{
    return no_memory(__builtin_return_address(0), size) ? NULL : count_block(__libc_malloc(size));
}

/* Of the C library it would hide who asks. */
char *strdup(const char *text)
{
    const size_t size = strlen(text) + 1;
    char *copy = no_memory(__builtin_return_address(0), size) ? NULL : count_block(__libc_malloc(size));

    return copy ? memcpy(copy, text, size) : NULL;
}

void *calloc(size_t count, size_t size)
{
    return no_memory(__builtin_return_address(0), size) ? NULL : count_block(__libc_calloc(count, size));
}

void *realloc(void *block, size_t size)
{
    if (no_memory(__builtin_return_address(0), size))
        return NULL;
    void *moved = __libc_realloc(block, size);

    if (!block)
        return count_block(moved);
    if (size == 0)
        atomic_fetch_sub(&live, 1);
    return moved;
}

int posix_memalign(void **block, size_t alignment, size_t size)
{
    if (no_memory(__builtin_return_address(0), size))
        return ENOMEM;
    *block = count_block(__libc_memalign(alignment, size));
    return *block ? 0 : ENOMEM;
}

void *aligned_alloc(size_t alignment, size_t size)
{
    return no_memory(__builtin_return_address(0), size) ? NULL : count_block(__libc_memalign(alignment, size));
}

void free(void *block)
{
    atomic_fetch_sub(&live, block != NULL);
    __libc_free(block);
}

/* ---- files -------------------------------------------------------------------------------------------------------- */

ssize_t read(int fd, void *to, size_t size)
{
    REAL(ssize_t (*call)(int, void *, size_t), read);

    if ((!is_of_fonts(__builtin_return_address(0)) && is_hit(FAULT_read_eintr, false)) || is_hit(FAULT_read_eio, true))
        return -1;
    if (is_hit(FAULT_read_end, true))
        return 0;
    return read.call(fd, to, is_hit(FAULT_read_short, true) && size > 1 ? 1 + size / 1000 : size);
}

ssize_t write(int fd, const void *from, size_t size)
{
    REAL(ssize_t (*call)(int, const void *, size_t), write);

    if (is_hit(FAULT_write_eintr, false) || is_hit(FAULT_write_enospc, true) || is_hit(FAULT_write_epipe, true) || is_hit(FAULT_write_eio, true))
        return -1;
    return write.call(fd, from, is_hit(FAULT_write_short, true) && size > 1 ? 1 + size / 1000 : size);
}

int open(const char *path, int flags, ...)
{
    REAL(int (*call)(const char *, int, mode_t), open);
    va_list more;

    va_start(more, flags);
    const mode_t mode = flags & O_CREAT ? va_arg(more, mode_t) : 0;

    va_end(more);
    return is_hit(FAULT_open_emfile, false) || is_hit(FAULT_open_enoent, false) ? -1 : open.call(path, flags, mode);
}

int close(int fd)
{
    REAL(int (*call)(int), close);
    const int result = close.call(fd);

    return is_hit(FAULT_close_eio, false) ? -1 : result;
}

int rename(const char *from, const char *to)
{
    REAL(int (*call)(const char *, const char *), rename);

    return is_hit(FAULT_rename_eio, false) ? -1 : rename.call(from, to);
}

int fstat(int fd, struct stat *st)
{
    REAL(int (*call)(int, struct stat *), fstat);

    return is_hit(FAULT_fstat_eio, false) ? -1 : fstat.call(fd, st);
}

int fchmod(int fd, mode_t mode)
{
    REAL(int (*call)(int, mode_t), fchmod);

    return is_hit(FAULT_fchmod_eperm, false) ? -1 : fchmod.call(fd, mode);
}

int mkstemp(char *name)
{
    REAL(int (*call)(char *), mkstemp);

    return is_hit(FAULT_mkstemp_enospc, false) ? -1 : mkstemp.call(name);
}

int memfd_create(const char *name, unsigned flags)
{
    REAL(int (*call)(const char *, unsigned), memfd_create);

    return is_hit(FAULT_memfd_enfile, false) ? -1 : memfd_create.call(name, flags);
}

FILE *fopen(const char *path, const char *mode)
{
    REAL(FILE *(*call)(const char *, const char *), fopen);

    return is_hit(FAULT_fopen_emfile, false) ? NULL : fopen.call(path, mode);
}

char *fgets(char *to, int size, FILE *from)
{
    REAL(char *(*call)(char *, int, FILE *), fgets);

    return is_hit(FAULT_fgets_eio, true) ? NULL : fgets.call(to, size, from);
}

/* ---- all else ----------------------------------------------------------------------------------------------------- */

void *dlopen(const char *path, int flags)
{
    REAL(void *(*call)(const char *, int), dlopen);

    return is_hit(FAULT_dlopen_none, true) ? NULL : dlopen.call(path, flags);
}

int pthread_create(pthread_t *thread, const pthread_attr_t *attributes, void *(*start)(void *), void *data)
{
    REAL(int (*call)(pthread_t *, const pthread_attr_t *, void *(*)(void *), void *), pthread_create);

    return is_hit(FAULT_thread_eagain, true) ? EAGAIN : pthread_create.call(thread, attributes, start, data);
}
