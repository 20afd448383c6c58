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

/* Opens a file beside the one that is to be replaced; 0, or the reason why not. */
static int open_beside(output_stream *s, const char *path, mode_t rights)
{
    s->temporary = temporary_name(path);
    if (s->temporary == NULL)
        return ENOMEM;
    s->fd = mkstemp(s->temporary);
    if (s->fd < 0) {
        const int reason = errno;

        free(s->temporary);
        s->temporary = NULL;
        return reason;
    }
    s->target = strdup(path);
    if (s->target == NULL)
        return ENOMEM;
    return fchmod(s->fd, rights) == 0 ? 0 : errno;
}

/* Replaces the file that is there: that behind a link, not the link, and none that is protected. */
static int open_existing(output_stream *s, const char *path, mode_t mode)
{
    if (access(path, W_OK) != 0)
        return errno;

    char *real = realpath(path, NULL);
    if (real == NULL)
        return errno;
    const int reason = open_beside(s, real, mode & RIGHTS);
    free(real);
    return reason;
}

static int open_directly(output_stream *s, const char *path)
{
    s->fd = open(path, O_WRONLY | O_NOCTTY | O_CLOEXEC);
    return s->fd < 0 ? errno : 0;
}

static int open_path(output_stream *s, const char *path)
{
    struct stat there;

    if (stat(path, &there) == 0)
        return S_ISREG(there.st_mode) ? open_existing(s, path, there.st_mode) : open_directly(s, path);
    return errno == ENOENT ? open_beside(s, path, rights_of_new_file()) : errno;
}

bc_status output_open(output_stream *s, const char *path, bc_error *err)
{
    *s = (output_stream){.fd = STDOUT_FILENO, .path = path ? path : "standard output", .is_standard = path == NULL};
    if (path == NULL)
        return BC_OK;
    s->fd = -1;
    const int reason = open_path(s, path);

    if (reason == 0)
        return BC_OK;
    output_discard(s);
    return fail_with(reason, path, err);
}

bc_status output_put(output_stream *s, const char *bytes, size_t count, bc_error *err)
{
    const int reason = write_all(s->fd, bytes, count);

    return reason == 0 ? BC_OK : fail_with(reason, s->path, err);
}

bc_status output_finish(output_stream *s, bc_error *err)
{
    int reason = 0;

    if (s->is_standard)
        return BC_OK;
    /* a network file system may tell only at the closing that it is full */
    if (close(s->fd) != 0)
        reason = errno;
    s->fd = -1;
    if (reason == 0 && s->temporary != NULL && rename(s->temporary, s->target) != 0)
        reason = errno;
    if (reason == 0) {
        free(s->temporary);
        s->temporary = NULL;
    }
    output_discard(s);
    return reason == 0 ? BC_OK : fail_with(reason, s->path, err);
}

void output_discard(output_stream *s)
{
    if (s->fd >= 0 && !s->is_standard)
        (void)close(s->fd);
    s->fd = -1;
    if (s->temporary != NULL)
        (void)unlink(s->temporary);
    free(s->temporary);
    free(s->target);
    s->temporary = NULL;
    s->target = NULL;
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
    output_stream s;

    if (path == NULL)
        return write_standard_output(bytes, count, err);
    bc_status status = output_open(&s, path, err);

    if (status != BC_OK)
        return status;
    status = output_put(&s, bytes, count, err);
    if (status == BC_OK)
        return output_finish(&s, err);
    output_discard(&s);
    return status;
}
