/* SPDX-License-Identifier: MIT */
/* json_memory.c - the memory of Jansson, watched for each thread. */
#include "cli/json_memory.h"

#include <jansson.h>
#include <stdlib.h>

static _Thread_local bool was_short;

static void *take(size_t size)
{
    void *memory = malloc(size);

    was_short = was_short || !memory;
    return memory;
}

void json_memory_watch(void)
{
    json_set_alloc_funcs(take, free);
}

bool json_memory_was_short(void)
{
    const bool so = was_short;

    was_short = false;
    return so;
}
