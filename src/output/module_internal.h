/* SPDX-License-Identifier: MIT */
/* module_internal.h - modules: parts of the program whose libraries are slow to load and rarely needed. */
#ifndef MODULE_INTERNAL_H
#define MODULE_INTERNAL_H

#include <stddef.h>

#include "bluecone/status.h"

typedef struct {
    const char *file;   /* as "bluecone_chart.so" */
    const char *symbol; /* its one function */
    const char *task;   /* for messages: "the module for TASK" */
    const char *needs;  /* the Debian package of the library it is made with */
} module_name;

/* Loads the module from the first of these folders that has it; it stays loaded. *function points to
 * its function, to be copied into a pointer of the function's type. BC_ERR_FILE names the last folder,
 * or says why the module cannot be loaded. */
BC_MUST_USE bc_status module_load_from(const module_name *module, const char *const folders[], size_t count,
                                       void **function, bc_error *err);

/* The same from the folder of the running program, then from where modules are installed. */
BC_MUST_USE bc_status module_load(const module_name *module, void **function, bc_error *err);

#endif
