/* SPDX-License-Identifier: MIT */
/* folder_list.h - the folders in which something is looked for, in order. */
#ifndef FOLDER_LIST_H
#define FOLDER_LIST_H

#include <stddef.h>

#define BC_FOLDERS_MAX 16
#define BC_FOLDER_BYTES 512 /* of one path with the final NUL; a longer one is left out */

typedef struct {
    size_t count;
    const char *path[BC_FOLDERS_MAX]; /* into text: a list is not copied */
    char text[BC_FOLDERS_MAX][BC_FOLDER_BYTES];
} bc_folders;

/* One more folder: text[0..length) and a tail behind it. What is too much is left out. */
void bc_folders_add(bc_folders *f, const char *text, size_t length, const char *tail);

/* The folders of a search path, parted by colons: each is a folder of compositions or holds one. NULL is none. */
void bc_folders_add_path(bc_folders *f, const char *path);

/* The folder so many levels above a file (1: its own), and a tail behind it; nothing when there are not as many. */
void bc_folders_add_above(bc_folders *f, const char *file, int levels, const char *tail);

#endif
