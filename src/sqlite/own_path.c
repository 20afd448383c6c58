/* SPDX-License-Identifier: MIT */
/* own_path.c - asks the loader for the file of this module. */
#define _GNU_SOURCE /* dladdr(): of POSIX since 2024 only */
#include "sqlite/own_path.h"

#include <dlfcn.h>
#include <stdlib.h>
#include <string.h>

bool own_path(char *path, size_t size)
{
    static const char here; /* any object of the module */
    Dl_info info;

    if (dladdr(&here, &info) == 0 || !info.dli_fname)
        return false;
    char *full = realpath(info.dli_fname, NULL);
    const bool fits = full && strlen(full) < size;

    if (fits)
        memcpy(path, full, strlen(full) + 1);
    free(full);
    return fits;
}
