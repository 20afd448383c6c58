/* SPDX-License-Identifier: MIT */
/* output_file_internal.h - bytes into a file, all or none. */
#ifndef OUTPUT_FILE_INTERNAL_H
#define OUTPUT_FILE_INTERNAL_H

#include <stdbool.h>
#include <stddef.h>

#include "bluecone/status.h"

/* Writes to a file, or to standard output when path is NULL. A regular file is replaced as a whole,
 * with the rights it had, or stays as it was; what is no regular file is written to directly.
 * BC_ERR_FILE names the path and the system's reason. */
BC_MUST_USE bc_status output_write(const char *path, const char *bytes, size_t count, bc_error *err);

/* A file being written piece by piece. A regular one is written aside: until output_finish() a reader meets the old
 * file or none. */
typedef struct {
    int fd;
    bool is_standard;  /* standard output: nothing to close */
    const char *path;  /* for messages; the caller's */
    char *temporary;   /* the file aside; NULL when written to directly */
    char *target;
} output_stream;

/* Opens a file, or standard output when path is NULL. After a failure nothing is to be closed. */
BC_MUST_USE bc_status output_open(output_stream *s, const char *path, bc_error *err);

/* Writes on. After a failure the stream is to be discarded. */
BC_MUST_USE bc_status output_put(output_stream *s, const char *bytes, size_t count, bc_error *err);

/* Puts the file in its place. The stream is closed in any case, and on failure the file is as it was. */
BC_MUST_USE bc_status output_finish(output_stream *s, bc_error *err);

/* Leaves the file as it was; nothing of what was written aside remains. Twice is once. */
void output_discard(output_stream *s);

#endif
