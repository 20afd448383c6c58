/* SPDX-License-Identifier: MIT */
/* output_file_internal.h - bytes into a file, all or none. */
#ifndef OUTPUT_FILE_INTERNAL_H
#define OUTPUT_FILE_INTERNAL_H

#include <stddef.h>

#include "bluecone/status.h"

/* Writes to a file, or to standard output when path is NULL. A regular file is replaced as a whole,
 * with the rights it had, or stays as it was; what is no regular file is written to directly.
 * BC_ERR_FILE names the path and the system's reason. */
BC_MUST_USE bc_status output_write(const char *path, const char *bytes, size_t count, bc_error *err);

#endif
