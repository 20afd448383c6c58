/* SPDX-License-Identifier: MIT */
/* folder_list.c - a list of folders, from search paths and from where a file is. */
#include "base/folder_list.h"

#include <stdio.h>
#include <string.h>

void bc_folders_add(bc_folders *f, const char *text, size_t length, const char *tail)
{
    if (f->count == BC_FOLDERS_MAX || length >= BC_FOLDER_BYTES)
        return;
    char *to = f->text[f->count];
    const int n = snprintf(to, BC_FOLDER_BYTES, "%.*s%s", (int)length, text, tail);

    if (n > 0 && n < BC_FOLDER_BYTES)
        f->path[f->count++] = to;
}

void bc_folders_add_path(bc_folders *f, const char *path)
{
    while (path && *path != '\0') {
        const size_t length = strcspn(path, ":");

        if (length > 0) {
            bc_folders_add(f, path, length, "");
            bc_folders_add(f, path, length, "/compositions");
        }
        path += length + (path[length] == ':');
    }
}

void bc_folders_add_above(bc_folders *f, const char *file, int levels, const char *tail)
{
    size_t length = strlen(file);

    for (; levels > 0; levels--) {
        while (length > 0 && file[length - 1] != '/')
            length--;
        if (length == 0)
            return;
        length--;
    }
    bc_folders_add(f, file, length, tail);
}
