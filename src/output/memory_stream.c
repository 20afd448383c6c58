/* SPDX-License-Identifier: MIT */
/* memory_stream.c - the end of a stream into memory. */
#include "output/memory_stream_internal.h"

bool bc_memory_stream_close(FILE *stream, char **text)
{
    const bool failed = ferror(stream) != 0;

    return fclose(stream) == 0 && !failed && *text != NULL;
}
