/* SPDX-License-Identifier: MIT */
/* file_text.c - reading a small text file whole, or saying why not. */
#include "base/file_text.h"

#include "base/error_internal.h"
#include "base/text.h"

#include <errno.h>
#include <fcntl.h>
#include <stdlib.h>
#include <string.h>
#include <sys/stat.h>
#include <unistd.h>

static bc_status fail_errno(bc_error *err, const char *path, const char *what)
{
    char reason[128];

    bc_text_of_errno(reason, sizeof reason, errno);
    return bc_fail_at(err, BC_ERR_FILE, path, 0, "%s: %s", what, reason);
}

bool bc_file_is_misnamed(int reason)
{
    return reason == ENOENT || reason == EACCES || reason == ENOTDIR || reason == ELOOP || reason == ENAMETOOLONG || reason == EISDIR;
}

/* Only a regular file has a size that can be checked and can be read again by the INI library. */
static bc_status check_kind(int fd, const char *path, size_t limit, size_t *size, bc_error *err)
{
    struct stat st;

    if (fstat(fd, &st) != 0)
        return fail_errno(err, path, "cannot be examined");
    if (S_ISDIR(st.st_mode))
        return bc_fail_at(err, BC_ERR_INPUT, path, 0, "this is a directory; name the file in it");
    if (!S_ISREG(st.st_mode))
        return bc_fail_at(err, BC_ERR_INPUT, path, 0, "this is not a regular file; save the text to a file and name that");
    if (st.st_size == 0)
        return bc_fail_at(err, BC_ERR_INPUT, path, 0, "the file is empty; bluecone-composition(5), bluecone-burner(5) and bluecone-contract(5) show what stands in one");
    if ((size_t)st.st_size > limit)
        return bc_fail_at(err, BC_ERR_INPUT, path, 0, "the file has %lld bytes, more than the %zu allowed; is it the right file?",
                          (long long)st.st_size, limit);
    *size = (size_t)st.st_size;
    return BC_OK;
}

static bc_status read_all(int fd, const char *path, char *text, size_t size, size_t *length, bc_error *err)
{
    size_t n = 0;

    while (n < size) {
        const ssize_t got = read(fd, text + n, size - n);

        if (got < 0 && errno == EINTR)
            continue;
        if (got < 0)
            return fail_errno(err, path, "cannot be read");
        if (got == 0)
            return bc_fail_at(err, BC_ERR_FILE, path, 0, "the file became shorter while it was read; start again when it is whole");
        n += (size_t)got;
    }
    text[n] = '\0';
    *length = n;
    return BC_OK;
}

static int line_of(const char *text, const char *at)
{
    int line = 1;

    for (; text < at; text++)
        line += *text == '\n';
    return line;
}

static bc_status check_encoding(const char *path, const char *text, size_t length, bc_error *err)
{
    if (length >= 3 && memcmp(text, "\xEF\xBB\xBF", 3) == 0)
        return bc_fail_at(err, BC_ERR_INPUT, path, 1, "the file starts with a byte-order mark; save it as plain UTF-8 without one");
    if (length >= 2 && (memcmp(text, "\xFF\xFE", 2) == 0 || memcmp(text, "\xFE\xFF", 2) == 0))
        return bc_fail_at(err, BC_ERR_INPUT, path, 1, "the file is UTF-16; save it as plain UTF-8 or ASCII");
    const char *nul = memchr(text, '\0', length);

    if (nul)
        return bc_fail_at(err, BC_ERR_INPUT, path, line_of(text, nul), "the line holds a NUL byte; this is not a text file");
    return BC_OK;
}

static bc_status read_open_file(int fd, const char *path, size_t limit, char **text, size_t *length, bc_error *err)
{
    size_t size = 0;
    bc_status status = check_kind(fd, path, limit, &size, err);

    if (status != BC_OK)
        return status;
    char *buffer = calloc(1, size + 1);

    if (!buffer)
        return bc_fail_at(err, BC_ERR_MEMORY, path, 0, "not enough memory to read the file");
    status = read_all(fd, path, buffer, size, length, err);
    if (status == BC_OK)
        status = check_encoding(path, buffer, *length, err);
    if (status == BC_OK)
        *text = buffer;
    else
        free(buffer);
    return status;
}

bc_status bc_file_text(const char *path, size_t limit, char **text, size_t *length, bc_error *err)
{
    /* O_NONBLOCK: opening a FIFO without a writer must not hang */
    const int fd = open(path, O_RDONLY | O_CLOEXEC | O_NONBLOCK);

    if (fd < 0) {
        if (bc_file_is_misnamed(errno)) {
            fail_errno(err, path, "cannot be opened");
            if (err)
                err->status = BC_ERR_INPUT;
            return BC_ERR_INPUT;
        }
        return fail_errno(err, path, "cannot be opened");
    }
    const bc_status status = read_open_file(fd, path, limit, text, length, err);

    (void)close(fd);
    return status;
}
