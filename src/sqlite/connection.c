/* SPDX-License-Identifier: MIT */
/* connection.c - the words and states that a connection remembers. */
#include "sqlite/connection.h"

#include "base/error_internal.h"
#include "base/text.h"
#include "sqlite/extension.h"
#include "sqlite/own_path.h"

#include <assert.h>
#include <stdint.h>
#include <stdlib.h>
#include <string.h>

#ifndef BC_DATA_DIR
#define BC_DATA_DIR "/usr/local/share/bluecone"
#endif

static_assert(COMPONENTS_MAX >= 2 * BC_ENTRY_MAX, "the components of one gas must fit behind those remembered");

/* The module stands in lib/bluecone or, where the machine has a folder of its own there, one deeper, both beside
 * share; or in build/VARIANT of the source tree. */
static void find_folders(bc_folders *f)
{
    char path[BC_FOLDER_BYTES];

    bc_folders_add_path(f, getenv("BLUECONE_PATH"));
    if (own_path(path, sizeof path)) {
        bc_folders_add_above(f, path, 3, "/share/bluecone/compositions");
        bc_folders_add_above(f, path, 4, "/share/bluecone/compositions");
        bc_folders_add_above(f, path, 3, "/compositions");
    }
    bc_folders_add(f, BC_DATA_DIR, strlen(BC_DATA_DIR), "/compositions");
}

connection *connection_open(void)
{
    connection *c = sqlite3_malloc64(sizeof *c);

    if (!c)
        return NULL;
    c->holders = 1;
    c->folders.count = 0;
    c->component_count = 0;
    c->reference_count = 0;
    memset(c->slots, 0, sizeof c->slots);
    find_folders(&c->folders);
    return c;
}

connection *connection_hold(connection *c)
{
    c->holders++;
    return c;
}

void connection_release(void *held)
{
    connection *c = held;

    if (--c->holders == 0)
        sqlite3_free(c);
}

void connection_start_gas(connection *c)
{
    if (c->component_count + BC_ENTRY_MAX <= COMPONENTS_MAX)
        return;
    c->component_count = 0;
    memset(c->slots, 0, sizeof c->slots);
}

/* FNV-1a, 32 bits: Fowler, Noll and Vo; RFC 9923. */
static size_t hash_of(const word *w)
{
    uint32_t hash = 2166136261U;

    for (size_t i = 0; i < w->length; i++)
        hash = (hash ^ (unsigned char)w->text[i]) * 16777619U;
    return hash % (2 * COMPONENTS_MAX);
}

/* The slot of a word, or the free one where it belongs: half of the slots are always free. */
static size_t find_slot(const connection *c, const word *w)
{
    size_t slot = hash_of(w);

    for (;; slot = (slot + 1) % (2 * COMPONENTS_MAX)) {
        const component *there = c->slots[slot] > 0 ? &c->components[c->slots[slot] - 1] : NULL;

        if (!there || (there->length == w->length && memcmp(there->text, w->text, w->length) == 0))
            return slot;
    }
}

static bool is_same(const component *a, const component *b)
{
    if (a->part_count != b->part_count)
        return false;
    for (size_t i = 0; i < a->part_count; i++)
        if (a->parts[i].species != b->parts[i].species || a->parts[i].moles < b->parts[i].moles || a->parts[i].moles > b->parts[i].moles)
            return false;
    return true;
}

static bc_status fill_component(component *to, const word *w, bc_error *err)
{
    double parts[BC_SPECIES_CAPACITY];

    memcpy(to->text, w->text, w->length);
    to->text[w->length] = '\0';
    to->length = w->length;
    const bc_status status = bc_composition_component(to->text, parts, NULL, err);

    if (status != BC_OK)
        return status;
    to->part_count = 0;
    for (size_t i = 0; i < BC_SPECIES_CAPACITY; i++) {
        if (!(parts[i] > 0.0))
            continue;
        if (to->part_count == COMPONENT_PARTS_MAX)
            return bc_fail(err, BC_ERR_INPUT, "'%s' stands for more than %d species; name them one by one", to->text, COMPONENT_PARTS_MAX);
        to->parts[to->part_count].species = i;
        to->parts[to->part_count++].moles = parts[i];
    }
    return BC_OK;
}

bc_status connection_component(connection *c, const word *w, size_t *index, bc_error *err)
{
    const size_t slot = find_slot(c, w);

    if (c->slots[slot] > 0) {
        *index = (size_t)c->slots[slot] - 1;
        return BC_OK;
    }
    if (c->component_count == COMPONENTS_MAX)
        return bc_fail(err, BC_ERR_INPUT, "more than %d components; join some", BC_ENTRY_MAX);
    if (w->length >= BC_COMPONENT_MAX)
        return bc_fail(err, BC_ERR_INPUT, "the name of a component is longer than %d characters; shorten it", BC_COMPONENT_MAX - 1);
    component *to = &c->components[c->component_count];
    const bc_status status = fill_component(to, w, err);

    if (status != BC_OK)
        return status;
    for (to->same = 0; to->same < c->component_count && !is_same(&c->components[to->same], to);)
        to->same++;
    *index = c->component_count++;
    c->slots[slot] = (unsigned short)c->component_count;
    return BC_OK;
}

/* Takes the last word off a state; NULL when it is the only one. */
static char *take_last_word(char *text)
{
    size_t length = strlen(text);

    while (length > 0 && text[length - 1] == ' ')
        text[--length] = '\0';
    char *blank = strrchr(text, ' ');

    if (!blank)
        return NULL;
    *blank = '\0';
    return blank + 1;
}

/* Behind the state proper may stand what the command line has options for: saturated, 1995, 2016. */
static bc_status read_state(const word *w, bc_state *state, bc_error *err)
{
    char text[STATE_WORD_MAX];

    *state = bc_state_default();
    if (!bc_text_copy(text, sizeof text, w->text, w->length))
        return bc_fail(err, BC_ERR_USAGE, "the reference state is too long; write it as '15/15'");
    for (char *tail = take_last_word(text); tail; tail = take_last_word(text)) {
        if (strcmp(tail, "saturated") == 0)
            state->saturated = true;
        else if (strcmp(tail, "1995") == 0 || strcmp(tail, "2016") == 0)
            state->edition = tail[0] == '1' ? 1995 : 2016;
        else {
            tail[-1] = ' '; /* "15 C/15 C" is for bc_state_parse() */
            break;
        }
    }
    return bc_state_parse(text, state, err);
}

bc_status connection_reference(connection *c, const word *state, const bc_reference **reference, bc_error *err)
{
    bc_state s;

    for (size_t i = 0; i < c->reference_count && i < REFERENCES_MAX; i++)
        if (c->references[i].text[0] != '\0' && strcmp(c->references[i].text, state->text) == 0) {
            *reference = &c->references[i].reference;
            return BC_OK;
        }
    bc_status status = read_state(state, &s, err);

    if (status != BC_OK)
        return status;
    const size_t place = c->reference_count % REFERENCES_MAX; /* the oldest goes */

    c->references[place].text[0] = '\0';
    status = bc_reference_at(&s, &c->references[place].reference, err);
    if (status != BC_OK)
        return status;
    if (state->length < STATE_WORD_MAX)
        memcpy(c->references[place].text, state->text, state->length + 1);
    c->reference_count++;
    *reference = &c->references[place].reference;
    return BC_OK;
}
