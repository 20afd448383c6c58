/* SPDX-License-Identifier: MIT */
/* file_text.h - a whole small text file in memory, checked to be text. */
#ifndef FILE_TEXT_H
#define FILE_TEXT_H

#include "bluecone/status.h"

#include <stdbool.h>
#include <stddef.h>

/* Reads a regular file of at most `limit` bytes; *text is terminated and to be freed.
 * Refused: a directory, a device or pipe, a file over the limit, an empty one, a UTF-16 or UTF-8
 * byte-order mark, NUL bytes. */
BC_MUST_USE bc_status bc_file_text(const char *path, size_t limit, char **text, size_t *length, bc_error *err);

/* Whether an errno of open() speaks of the name that was given; else the system or a device failed. */
bool bc_file_is_misnamed(int reason);

#endif
