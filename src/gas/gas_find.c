/* SPDX-License-Identifier: MIT */
/* gas_find.c - what a GAS argument means: a file, a bundled name or a literal. */
#include "base/error_internal.h"
#include "base/text.h"
#include "gas/composition_internal.h"
#include "gas/nearest.h"

#include <dirent.h>
#include <errno.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>
#include <sys/stat.h>

static bool exists(const char *path)
{
    struct stat st;

    return stat(path, &st) == 0;
}

static bool is_ini(const struct dirent *entry, size_t *stem)
{
    const size_t length = strlen(entry->d_name);

    if (length <= 4 || entry->d_name[0] == '.' || strcmp(entry->d_name + length - 4, ".ini") != 0)
        return false;
    *stem = length - 4;
    return true;
}

static int only_ini(const struct dirent *entry)
{
    size_t stem = 0;

    return is_ini(entry, &stem);
}

/* By name, not by file: "l-gas" stands before "l-gas-2" although '-' stands before '.'. */
static int by_name(const struct dirent **a, const struct dirent **b)
{
    const size_t n = strlen((*a)->d_name) - 4;
    const size_t m = strlen((*b)->d_name) - 4;
    const int order = strncmp((*a)->d_name, (*b)->d_name, n < m ? n : m);

    return order != 0 ? order : (n > m) - (n < m);
}

bc_status bc_composition_each(const char *folder, void (*visit)(const char *name, const char *path, void *data), void *data,
                              bc_error *err)
{
    struct dirent **entries = NULL;
    const int count = scandir(folder, &entries, only_ini, by_name);

    if (count < 0)
        return errno == ENOMEM ? bc_fail(err, BC_ERR_MEMORY, "not enough memory to list %s", folder) : BC_OK;
    for (int i = 0; i < count; i++) {
        char path[BC_FILE_MAX];
        char name[BC_FILE_MAX];
        size_t stem = 0;

        if (is_ini(entries[i], &stem)) {
            (void)snprintf(path, sizeof path, "%s/%s", folder, entries[i]->d_name);
            (void)snprintf(name, sizeof name, "%.*s", (int)stem, entries[i]->d_name);
            visit(name, path, data);
        }
        free(entries[i]);
    }
    free(entries);
    return BC_OK;
}

static bool ends_in_ini(const char *word)
{
    const size_t length = strlen(word);

    return length > 4 && strcmp(word + length - 4, ".ini") == 0;
}

static bc_status refuse(const char *word, const char *const folders[], size_t folder_count, bc_error *err)
{
    size_t species = 0;
    char shown[BC_WORD_MAX];

    bc_text_show(shown, sizeof shown, word);
    if (strchr(word, '/') || ends_in_ini(word))
        return bc_fail(err, BC_ERR_INPUT, "there is no file '%s'; check the path", shown);
    if (folder_count == 0) /* a program of somebody else: no environment is read here */
        return bc_fail(err, BC_ERR_INPUT, "no file '%s', and no folder of bundled gases was given; a literal is written methane=92,ethane=8", shown);
    const bc_nearest n = bc_nearest_bundled(word, folders, folder_count);

    if (n.name[0] == '\0')
        return bc_fail(err, BC_ERR_INPUT, "no file or gas '%s', and no bundled gases were found; set BLUECONE_PATH to their folder", shown);
    if (bc_species_find(word, &species, NULL) == BC_OK) /* before a name that looks alike: ethane is not butane */
        return bc_fail(err, BC_ERR_INPUT, "no file or bundled gas '%s'; the pure gas is written %s=100", shown, bc_species_id(species));
    if (!bc_nearest_helps(&n))
        return bc_fail(err, BC_ERR_INPUT, "no file or bundled gas '%s'; bluecone list gases shows the bundled ones, a literal is written methane=92,ethane=8",
                       shown);
    return bc_fail(err, BC_ERR_INPUT, "no file or bundled gas '%s'; the nearest bundled one is '%s' (bluecone list gases)", shown, n.name);
}

bc_status bc_composition_find(const char *word, const char *const folders[], size_t folder_count, bc_composition *c, bc_error *err)
{
    if (word[0] == '\0')
        return bc_fail(err, BC_ERR_INPUT, "the name of the gas is empty; give a file, a bundled name or a literal");
    if (exists(word))
        return bc_composition_read(word, c, err);
    for (size_t i = 0; i < folder_count && !strchr(word, '/') && !strchr(word, '='); i++) {
        char path[BC_FILE_MAX];
        const int length = snprintf(path, sizeof path, "%s/%s.ini", folders[i], word);

        if (length > 0 && (size_t)length < sizeof path && exists(path)) {
            const bc_status status = bc_composition_read(path, c, err);

            if (status == BC_OK && strlen(word) < sizeof c->bundled)
                memcpy(c->bundled, word, strlen(word) + 1);
            return status;
        }
    }
    if (strchr(word, '='))
        return bc_composition_parse(word, c, err);
    return refuse(word, folders, folder_count, err);
}
