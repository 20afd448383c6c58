/* SPDX-License-Identifier: MIT */
/* memory_stream_internal.h - a stream into memory that loses nothing in silence. */
#ifndef MEMORY_STREAM_INTERNAL_H
#define MEMORY_STREAM_INTERNAL_H

#include <stdbool.h>
#include <stddef.h>
#include <stdio.h>

/* Opens a stream into *text, which is to be freed in any case, also after a failure. Text and *count are those of what was
 * written when the stream is closed. NULL without memory. */
FILE *bc_memory_stream_open(char **text, size_t *count);

/* Closes the stream. True when all that was written stands in *text, with a NUL behind it. */
bool bc_memory_stream_close(FILE *stream);

#endif
