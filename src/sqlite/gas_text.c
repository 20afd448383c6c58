/* SPDX-License-Identifier: MIT */
/* gas_text.c - what a text in the place of a composition is: JSON, a literal or a bundled name. */
#include "sqlite/gas_text.h"

#include "base/error_internal.h"
#include "base/text.h"

#include <stdio.h>
#include <string.h>
#include <unistd.h>

/* A database may come from anybody: a name must not lead out of the folders of bundled gases. */
static bool is_plain_name(const word *w)
{
    static const char SIGNS[] = "abcdefghijklmnopqrstuvwxyzABCDEFGHIJKLMNOPQRSTUVWXYZ0123456789-_+";

    return w->length > 0 && w->length < BC_WORD_MAX && strspn(w->text, SIGNS) == w->length;
}

typedef struct {
    const char *word;
    size_t unlikeness;
    char name[BC_WORD_MAX];
} nearest;

static void keep_nearest(const char *name, const char *path, void *data)
{
    nearest *n = data;
    const size_t unlikeness = bc_text_unlikeness(n->word, name);

    (void)path;
    if (unlikeness < n->unlikeness) {
        n->unlikeness = unlikeness;
        (void)bc_text_copy(n->name, sizeof n->name, name, strlen(name));
    }
}

static bc_status refuse_name(const connection *c, const word *w, bc_error *err)
{
    nearest n = {.word = w->text, .unlikeness = BC_WORD_MAX};

    for (size_t i = 0; i < c->folders.count; i++)
        if (bc_composition_each(c->folders.path[i], keep_nearest, &n, NULL) != BC_OK)
            break; /* the word has its own message */
    if (n.name[0] == '\0')
        return bc_fail(err, BC_ERR_INPUT, "no gas '%s', and no bundled gases were found; set BLUECONE_PATH to their folder", w->text);
    return bc_fail(err, BC_ERR_INPUT, "no bundled gas '%s'; the nearest one is '%s' (bluecone list gases)", w->text, n.name);
}

static bc_status read_bundled(connection *c, const word *w, bc_error *err)
{
    for (size_t i = 0; i < c->folders.count; i++) {
        char path[BC_FILE_MAX];
        const int length = snprintf(path, sizeof path, "%s/%s.ini", c->folders.path[i], w->text);

        if (length > 0 && (size_t)length < sizeof path && access(path, F_OK) == 0)
            return bc_composition_read(path, &c->composition, err);
    }
    return refuse_name(c, w, err);
}

bc_status gas_from_text(connection *c, const word *w, bc_gas *gas, const bc_spread **spread, bc_error *err)
{
    bc_status status = BC_OK;

    *spread = NULL;
    if (w->length > COMPOSITION_BYTES)
        return bc_fail(err, BC_ERR_INPUT, "a text of %zu bytes is no composition; the longest has %d", w->length, COMPOSITION_BYTES);
    if (w->text[strspn(w->text, " \t\r\n")] == '{')
        return gas_from_json(c, w, gas, err);
    if (strchr(w->text, '='))
        status = bc_composition_parse(w->text, &c->composition, err);
    else if (is_plain_name(w))
        status = read_bundled(c, w, err);
    else
        return bc_fail(err, BC_ERR_INPUT, "the text is no composition; write {\"methane\": 92, \"ethane\": 8}, methane=92,ethane=8 or the name of a bundled gas");
    if (status != BC_OK)
        return status;
    *gas = c->composition.gas;
    *spread = c->composition.spread.count > 0 ? &c->composition.spread : NULL;
    return BC_OK;
}
