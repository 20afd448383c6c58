/* SPDX-License-Identifier: MIT */
/* connection.h - what the functions of one database connection remember between two calls.
 *
 * SQLite calls the functions of a connection one after the other, whatever its threading mode, so that nothing here
 * is locked; connections share nothing. */
#ifndef CONNECTION_H
#define CONNECTION_H

#include "base/folder_list.h"
#include "bluecone/bluecone.h"

#include <stdbool.h>
#include <stddef.h>

#define COMPONENT_PARTS_MAX 16 /* species in one component; air has ten */
#define COMPONENTS_MAX 256     /* words remembered; when they are too many all are forgotten */
#define REFERENCES_MAX 4       /* states remembered */
#define STATE_WORD_MAX 64      /* bytes of a state with the final NUL */

/* A text as SQL hands it over: not NULL, terminated, no NUL within its length. */
typedef struct {
    const char *text;
    size_t length;
} word;

/* What a word for a component stands for. */
typedef struct {
    char text[BC_COMPONENT_MAX];
    size_t length;
    size_t same; /* index of the first component remembered that stands for the same; its own when it is the first */
    size_t part_count;
    struct {
        size_t species;
        double moles; /* of it in one mole of the component */
    } parts[COMPONENT_PARTS_MAX];
} component;

typedef struct {
    size_t holders;
    bc_folders folders; /* of the bundled gases */
    size_t component_count;
    component components[COMPONENTS_MAX];
    unsigned short slots[2 * COMPONENTS_MAX]; /* hash table: index of a component + 1; 0: free */
    size_t reference_count;
    struct {
        char text[STATE_WORD_MAX];
        bc_reference reference;
    } references[REFERENCES_MAX];
    bc_composition composition; /* a literal or a bundled gas while it is read */
} connection;

/* A connection with one holder; NULL without memory. */
connection *connection_open(void);

/* One holder more, and one less: the last one frees it. */
connection *connection_hold(connection *c);
void connection_release(void *c);

/* Call before the components of one gas are asked for: their indices hold until the next call. */
void connection_start_gas(connection *c);

/* The component of a word, which need not be terminated.
 *
 *   index   out: among the components remembered
 *
 * BC_ERR_INPUT: unknown, with the nearest known word; more components than a gas may have. */
BC_MUST_USE bc_status connection_component(connection *c, const word *w, size_t *index, bc_error *err);

/* The figures of a state: "15/15", "25/0 saturated", "60F/60F@14.73psi 1995".
 *
 *   reference   out: until the next call
 *
 * BC_ERR_USAGE, BC_ERR_RANGE as bc_state_parse(). */
BC_MUST_USE bc_status connection_reference(connection *c, const word *state, const bc_reference **reference, bc_error *err);

#endif
