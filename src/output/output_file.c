/* SPDX-License-Identifier: MIT */
/* output_file.c - a reader of the file must never meet half a report: write aside, then rename. */
#define _XOPEN_SOURCE 700 /* realpath(), which POSIX keeps in its XSI part */

#include "output/output_file_internal.h"

#include "base/error_internal.h"
#include "base/text.h"

#include <errno.h>
#include <fcntl.h>
#include <limits.h>
#include <stdbool.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>
#include <sys/stat.h>
#include <unistd.h>

#define NAME_KEPT 200  /* bytes of the file's name in that of the temporary one: NAME_MAX is 255 */
#define RIGHTS    0777 /* of a mode, the bits that are rights */

static bc_status fail_with(int reason, const char *path, bc_error *err)
{
    char text[128], name[BC_FILE_MAX];

    bc_text_show(name, sizeof name, path);
    if (strerror_r(reason, text, sizeof text) != 0)
        snprintf(text, sizeof text, "error %d", reason);
    return bc_fail(err, BC_ERR_FILE, "cannot write to %s: %s", name, text);
}

/* 0, or the reason why not all bytes were written. */
static int write_all(int fd, const char *bytes, size_t count)
{
    while (count > 0) {
        const ssize_t written = write(fd, bytes, count);

        if (written < 0 && errno == EINTR)
            continue;
        if (written <= 0)
            return written < 0 ? errno : EIO;
        bytes += written;
        count -= (size_t)written;
    }
    return 0;
}

/* Writes and closes; a network file system may tell only at the closing that it is full. */
static int write_and_close(int fd, const char *bytes, size_t count)
{
    const int reason = write_all(fd, bytes, count);

    if (close(fd) != 0 && reason == 0)
        return errno;
    return reason;
}

static int write_directly(const char *path, const char *bytes, size_t count)
{
    const int fd = open(path, O_WRONLY | O_NOCTTY | O_CLOEXEC);

    return fd < 0 ? errno : write_and_close(fd, bytes, count);
}

/* The rights that a new file gets. POSIX can tell the mask only by setting it. */
static mode_t rights_of_new_file(void)
{
    const mode_t mask = umask(0);

    umask(mask);
    return (S_IRUSR | S_IWUSR | S_IRGRP | S_IWGRP | S_IROTH | S_IWOTH) & ~mask;
}

/* The name of a temporary file beside `path`, for mkstemp(); NULL when there is no memory. */
static char *temporary_name(const char *path)
{
    const char *slash = strrchr(path, '/');
    const char *name = slash == NULL ? path : slash + 1;
    const size_t size = strlen(path) + sizeof "..XXXXXX";
    char *temporary = malloc(size);

    if (temporary != NULL && name - path <= INT_MAX)
        snprintf(temporary, size, "%.*s.%.*s.XXXXXX", (int)(name - path), path, NAME_KEPT, name);
    return temporary;
}

/* 0, or the reason why the file could not be replaced. */
static int replace(const char *path, mode_t rights, const char *bytes, size_t count)
{
    char *temporary = temporary_name(path);
    const int fd = temporary == NULL ? -1 : mkstemp(temporary);
    int reason = temporary == NULL ? ENOMEM : errno;

    if (fd >= 0) {
        reason = fchmod(fd, rights) == 0 ? 0 : errno;
        const int written = write_and_close(fd, bytes, count);
        reason = reason == 0 ? written : reason;
        if (reason == 0 && rename(temporary, path) != 0)
            reason = errno;
        if (reason != 0)
            unlink(temporary);
    }
    free(temporary);
    return reason;
}

/* Replaces the file that is there: that behind a link, not the link, and none that is protected. */
static int replace_existing(const char *path, mode_t mode, const char *bytes, size_t count)
{
    if (access(path, W_OK) != 0)
        return errno;

    char *real = realpath(path, NULL);
    if (real == NULL)
        return errno;
    const int reason = replace(real, mode & RIGHTS, bytes, count);
    free(real);
    return reason;
}

static bc_status write_standard_output(const char *bytes, size_t count, bc_error *err)
{
    errno = EIO; /* for the case that the stream failed earlier and says no more why */
    if (fwrite(bytes, 1, count, stdout) == count && fflush(stdout) == 0 && !ferror(stdout))
        return BC_OK;
    return fail_with(errno, "standard output", err);
}

bc_status output_write(const char *path, const char *bytes, size_t count, bc_error *err)
{
    struct stat there;
    int reason = 0;

    if (path == NULL)
        return write_standard_output(bytes, count, err);
    if (stat(path, &there) == 0)
        reason = S_ISREG(there.st_mode) ? replace_existing(path, there.st_mode, bytes, count)
                                        : write_directly(path, bytes, count);
    else
        reason = errno == ENOENT ? replace(path, rights_of_new_file(), bytes, count) : errno;
    return reason == 0 ? BC_OK : fail_with(reason, path, err);
}
