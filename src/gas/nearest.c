/* SPDX-License-Identifier: MIT */
/* nearest.c - the bundled file whose name is most like a word that names none. */
#include "gas/nearest.h"

#include "bluecone/composition.h"

#include <stdio.h>
#include <string.h>

static void keep_nearest(const char *name, const char *path, void *data)
{
    bc_nearest *n = data;
    const size_t unlikeness = bc_text_unlikeness(n->word, name);

    (void)path;
    if (unlikeness < n->unlikeness && strlen(name) < sizeof n->name) {
        n->unlikeness = unlikeness;
        (void)snprintf(n->name, sizeof n->name, "%s", name);
    }
}

bc_nearest bc_nearest_bundled(const char *word, const char *const folders[], size_t folder_count)
{
    bc_nearest n = {.word = word, .unlikeness = BC_WORD_MAX, .name = ""};

    for (size_t i = 0; i < folder_count; i++)
        if (bc_composition_each(folders[i], keep_nearest, &n, NULL) != BC_OK)
            break;
    return n;
}

bool bc_nearest_helps(const bc_nearest *n)
{
    return n->name[0] != '\0' && bc_text_is_near(n->word, n->name);
}
