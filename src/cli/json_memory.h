/* SPDX-License-Identifier: MIT */
/* json_memory.h - whether Jansson ran out of memory: some of its functions tell that as a mistake in the text. */
#ifndef JSON_MEMORY_H
#define JSON_MEMORY_H

#include <stdbool.h>

/* Has Jansson's memory watched: once, before its first use. */
void json_memory_watch(void);

/* Whether memory has been short in this thread since it was asked last. */
bool json_memory_was_short(void);

#endif
