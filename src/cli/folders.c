/* SPDX-License-Identifier: MIT */
/* folders.c - where the bundled gases and specifications are. */
#include "cli/cli.h"

#include <stdio.h>
#include <stdlib.h>
#include <string.h>
#include <unistd.h>

#ifndef BC_DATA_DIR
#define BC_DATA_DIR "/usr/local/share/bluecone"
#endif

/* The program may stand in bin beside share, or in build/VARIANT of the source tree. */
static void add_beside_program(folders *f)
{
    char program[BC_FILE_MAX];
    const ssize_t n = readlink("/proc/self/exe", program, sizeof program - 1);

    if (n <= 0)
        return;
    program[n] = '\0';
    bc_folders_add_above(f, program, 2, "/share/bluecone/compositions");
    bc_folders_add_above(f, program, 3, "/compositions");
}

void folders_find(folders *f)
{
    f->count = 0;
    bc_folders_add_path(f, getenv("BLUECONE_PATH"));
    add_beside_program(f);
    bc_folders_add(f, BC_DATA_DIR, strlen(BC_DATA_DIR), "/compositions");
}

void folders_of_specifications(folders *f)
{
    folders_find(f);
    for (size_t i = 0; i < f->count; i++) {
        const size_t used = strlen(f->text[i]);

        (void)snprintf(f->text[i] + used, BC_FOLDER_BYTES - used, "/specifications");
    }
}

bc_status contract_load(const char *word, bc_contract *contract, bc_error *err)
{
    folders f;

    folders_of_specifications(&f);
    return bc_contract_find(word, f.path, f.count, contract, err);
}
