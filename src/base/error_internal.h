/* SPDX-License-Identifier: MIT */
/* error_internal.h - filling the caller's bc_error in one line, where the cause is known. */
#ifndef ERROR_INTERNAL_H
#define ERROR_INTERNAL_H

#include "base/compiler.h"
#include "bluecone/status.h"

/* Fills *err (if err is not NULL) with a finished sentence and returns status. */
bc_status bc_fail(bc_error *err, bc_status status, const char *format, ...) BC_PRINTF(3, 4);

/* As bc_fail, and names the file and line to blame. */
bc_status bc_fail_at(bc_error *err, bc_status status, const char *file, int line, const char *format,
                     ...) BC_PRINTF(5, 6);

#endif
