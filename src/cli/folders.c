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

/* One more folder: text[0..length) and a tail behind it. */
static void add(folders *f, const char *text, size_t length, const char *tail)
{
    if (f->count == FOLDERS_MAX)
        return;
    char *to = f->text[f->count];
    const int n = snprintf(to, BC_FILE_MAX, "%.*s%s", (int)length, text, tail);

    if (n > 0 && n < BC_FILE_MAX)
        f->path[f->count++] = to;
}

/* Each part of $BLUECONE_PATH is a folder of compositions or holds one. */
static void add_environment(folders *f)
{
    const char *path = getenv("BLUECONE_PATH");

    while (path && *path != '\0') {
        const size_t length = strcspn(path, ":");

        if (length > 0 && length < BC_FILE_MAX) {
            add(f, path, length, "");
            add(f, path, length, "/compositions");
        }
        path += length + (path[length] == ':');
    }
}

/* The program may stand in build/VARIANT of the source tree, or in bin beside share. */
static void add_beside_program(folders *f)
{
    char program[BC_FILE_MAX];
    const ssize_t n = readlink("/proc/self/exe", program, sizeof program - 1);

    if (n <= 0)
        return;
    program[n] = '\0';
    for (int level = 0; level < 3; level++) {
        char *slash = strrchr(program, '/');

        if (!slash)
            return;
        *slash = '\0';
        if (level == 1)
            add(f, program, strlen(program), "/share/bluecone/compositions");
        if (level == 2)
            add(f, program, strlen(program), "/compositions");
    }
}

void folders_find(folders *f)
{
    f->count = 0;
    add_environment(f);
    add_beside_program(f);
    add(f, BC_DATA_DIR, strlen(BC_DATA_DIR), "/compositions");
}

void folders_of_specifications(folders *f)
{
    folders_find(f);
    for (size_t i = 0; i < f->count; i++) {
        const size_t used = strlen(f->text[i]);

        (void)snprintf(f->text[i] + used, BC_FILE_MAX - used, "/specifications");
    }
}

bc_status contract_load(const char *word, bc_contract *contract, bc_error *err)
{
    folders f;

    folders_of_specifications(&f);
    return bc_contract_find(word, f.path, f.count, contract, err);
}
