/* SPDX-License-Identifier: MIT */
/* memory_stream_internal.h - the end of a stream into memory, where the C library is quiet about what it could not keep. */
#ifndef MEMORY_STREAM_INTERNAL_H
#define MEMORY_STREAM_INTERNAL_H

#include <stdbool.h>
#include <stdio.h>

/* Closes a stream of open_memstream(). True when all that was written stands in *text, which is to be freed in any case.
 * The closing trims the memory: where that fails glibc 2.36 says nothing and leaves no text. */
bool bc_memory_stream_close(FILE *stream, char **text);

#endif
