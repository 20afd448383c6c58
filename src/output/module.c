/* SPDX-License-Identifier: MIT */
/* module.c - where modules are found, and how one is opened. */
#include "output/module_internal.h"

#include "base/error_internal.h"

#include <dlfcn.h>
#include <stdio.h>
#include <string.h>
#include <unistd.h>

#define PATH_SIZE 4096 /* PATH_MAX of Linux, which POSIX does not promise */

#ifndef BC_LIB_DIR
#define BC_LIB_DIR "/usr/local/lib"
#endif

static bc_status open_module(const module_name *module, const char *path, void **function, bc_error *err)
{
    void *opened = dlopen(path, RTLD_NOW | RTLD_LOCAL);
    void *symbol = opened == NULL ? NULL : dlsym(opened, module->symbol);

    if (symbol == NULL) {
        const char *reason = dlerror();

        if (opened != NULL)
            dlclose(opened);
        return bc_fail(err, BC_ERR_FILE, "cannot load the module for %s: %.300s; install bluecone anew, with what it needs (Debian: %s)",
                       module->task, reason == NULL ? path : reason, module->needs);
    }
    *function = symbol;
    return BC_OK;
}

bc_status module_load_from(const module_name *module, const char *const folders[], size_t count,
                           void **function, bc_error *err)
{
    char path[PATH_SIZE];

    for (size_t i = 0; i < count; i++) {
        const int length = snprintf(path, sizeof path, "%s/%s", folders[i], module->file);

        if (length > 0 && (size_t)length < sizeof path && access(path, F_OK) == 0)
            return open_module(module, path, function, err);
    }
    return bc_fail(err, BC_ERR_FILE, "the module for %s, %s, is missing in %.160s: install bluecone anew",
                   module->task, module->file, count == 0 ? "every folder" : folders[count - 1]);
}

/* The folder of the running program, as a build tree has it all in one; "" when nobody knows. */
static void find_own_folder(char folder[PATH_SIZE])
{
    const ssize_t length = readlink("/proc/self/exe", folder, PATH_SIZE - 1);

    folder[length < 0 ? 0 : length] = '\0';
    char *slash = strrchr(folder, '/');
    folder[slash == NULL ? 0 : slash - folder] = '\0';
}

bc_status module_load(const module_name *module, void **function, bc_error *err)
{
    char own[PATH_SIZE];
    const char *const folders[] = {own, BC_LIB_DIR "/bluecone"};

    find_own_folder(own);
    const size_t first = *own == '\0';
    return module_load_from(module, folders + first, 2 - first, function, err);
}
