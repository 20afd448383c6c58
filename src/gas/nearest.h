/* SPDX-License-Identifier: MIT */
/* nearest.h - the bundled file whose name is most like a word that names none. */
#ifndef NEAREST_H
#define NEAREST_H

#include "base/text.h"

typedef struct {
    const char *word;
    size_t unlikeness;
    char name[BC_WORD_MAX]; /* empty: no file was found at all */
} bc_nearest;

/* Folders that cannot be read end the search: the word has its own message. */
bc_nearest bc_nearest_bundled(const char *word, const char *const folders[], size_t folder_count);

/* A suggestion helps when at most a third of the word would have to change. */
bool bc_nearest_helps(const bc_nearest *n);

#endif
