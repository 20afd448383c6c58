/* SPDX-License-Identifier: MIT */
/* nlopt_library.c - loading NLopt: linked to the program it would cost every start of it 0.12 ms. */
#include "supply/minimise.h"
#include "supply/nlopt_library.h"

#include "base/error_internal.h"

#include <dlfcn.h>
#include <errno.h>
#include <stdlib.h>
#include <string.h>

#define NLOPT_FILE "libnlopt.so.0" /* the name that NLopt 2.x has had in its packages */

/* ISO C converts no object pointer to a function pointer; POSIX says that their bytes are the same. */
static bool find(const nlopt_library *library, const char *name, void *function, size_t size)
{
    void *symbol = dlsym(library->handle, name);

    memcpy(function, &symbol, size);
    return symbol != NULL;
}

#define FIND(library, name) find(library, "nlopt_" #name, &(library)->name, sizeof (library)->name)

static bool find_all(nlopt_library *l)
{
    return FIND(l, create) && FIND(l, destroy) && FIND(l, optimize) && FIND(l, set_min_objective) && FIND(l, set_lower_bounds)
           && FIND(l, set_upper_bounds) && FIND(l, add_inequality_mconstraint) && FIND(l, add_equality_mconstraint) && FIND(l, set_ftol_rel)
           && FIND(l, set_xtol_rel) && FIND(l, set_maxeval);
}

/* The loader ends the process when it has no memory for the thread's own data of NLopt, 2.5 kB that it asks for at the
 * first descent in a thread: what it will need must be there before. */
static bool has_room(void)
{
    void *room = malloc(65536);

    free(room);
    return room != NULL;
}

bc_status nlopt_library_open(nlopt_library **library, bc_error *err)
{
    nlopt_library *l = calloc(1, sizeof *l);

    if (!l || !has_room()) {
        free(l);
        return bc_fail(err, BC_ERR_MEMORY, "not enough memory to look for an optimum");
    }
    errno = 0;
    l->handle = dlopen(NLOPT_FILE, RTLD_NOW | RTLD_LOCAL);
    if (!l->handle || !find_all(l)) {
        const bool no_memory = !l->handle && errno == ENOMEM;

        nlopt_library_close(l);
        if (no_memory)
            return bc_fail(err, BC_ERR_MEMORY, "not enough memory to load %s, which finds optimal blends", NLOPT_FILE);
        return bc_fail(err, BC_ERR_FILE, "%s, which finds optimal blends, cannot be loaded; install it (Debian: libnlopt0)", NLOPT_FILE);
    }
    *library = l;
    return BC_OK;
}

bc_status nlopt_library_fed(const nlopt_library *library, bc_status status, bc_error *err)
{
    return library->starved ? bc_fail(err, BC_ERR_MEMORY, "not enough memory to look for an optimum") : status;
}

void nlopt_library_close(nlopt_library *library)
{
    if (library && library->handle)
        (void)dlclose(library->handle);
    free(library);
}
