/* SPDX-License-Identifier: MIT */
/* plan.h - what the arguments of a call settle that are the same in every row: quantity, state, names of components.
 *
 * SQLite keeps a plan beside the call while its first argument is a constant. The others may change from row to row:
 * each is compared with what the plan was made from. */
#ifndef PLAN_H
#define PLAN_H

#include "sqlite/connection.h"
#include "sqlite/extension.h"

#define QUANTITY_WORD_MAX 64

typedef struct {
    char quantity_text[QUANTITY_WORD_MAX], state_text[STATE_WORD_MAX];
    size_t quantity_length, state_length; /* 0: no state was given */
    size_t quantity;
    bc_reference reference;
    size_t component_count;
    component components[];
} plan;

/* Takes a text argument.
 *
 *   what   the argument, for messages: "the quantity"
 *
 * BC_ERR_INPUT when it is no text or holds a NUL; BC_ERR_MEMORY. Not to be called with NULL of SQL. */
BC_MUST_USE bc_status plan_text(sqlite3_value *value, const char *what, word *w, bc_error *err);

/* What a call asks for. */
typedef struct {
    word quantity;
    word state;             /* without text: the default, 15/15 */
    sqlite3_value **names;  /* of components, in every second argument from here on */
    size_t name_count;      /* 0: the gas is no matter of the plan */
} plan_wish;

/* The plan of a call: the one that is kept, when it still fits, or a new one.
 *
 *   kept    NULL for none
 *   taken   out: `kept`, or a new one for the caller to keep or to free with sqlite3_free()
 *
 * BC_ERR_USAGE: unknown quantity, no state; BC_ERR_INPUT: unknown component, or twice the same; BC_ERR_MEMORY. */
BC_MUST_USE bc_status plan_take(connection *c, const plan_wish *wish, plan *kept, plan **taken, bc_error *err);

#endif
