/* SPDX-License-Identifier: MIT */
/* plan.c - making a plan from the arguments of a call, and seeing whether it still fits. */
#include "sqlite/plan.h"

#include "base/error_internal.h"

#include <string.h>

#define STATE_DEFAULT "15/15"

bc_status plan_text(sqlite3_value *value, const char *what, word *w, bc_error *err)
{
    if (sqlite3_value_type(value) != SQLITE_TEXT)
        return bc_fail(err, BC_ERR_INPUT, "%s is no text; write it in quotes, or CAST it AS TEXT", what);
    w->text = (const char *)sqlite3_value_text(value);
    w->length = (size_t)sqlite3_value_bytes(value);
    if (!w->text)
        return bc_fail(err, BC_ERR_MEMORY, "not enough memory for a text");
    if (memchr(w->text, '\0', w->length))
        return bc_fail(err, BC_ERR_INPUT, "%s holds a NUL character; remove it", what);
    return BC_OK;
}

static bool is_word(const word *w, const char *text, size_t length)
{
    return w->length == length && memcmp(w->text, text, length) == 0;
}

/* A name that is the same as when the plan was made has been judged then. */
static bool has_name(sqlite3_value *value, const component *c)
{
    if (sqlite3_value_type(value) != SQLITE_TEXT)
        return false;
    const word w = {(const char *)sqlite3_value_text(value), (size_t)sqlite3_value_bytes(value)};

    return w.text && is_word(&w, c->text, c->length);
}

static bool fits(const plan *p, const plan_wish *wish)
{
    if (p->component_count != wish->name_count || !is_word(&wish->quantity, p->quantity_text, p->quantity_length))
        return false;
    if (wish->state.text ? !is_word(&wish->state, p->state_text, p->state_length) : p->state_length > 0)
        return false;
    for (size_t i = 0; i < wish->name_count; i++)
        if (!has_name(wish->names[2 * i], &p->components[i]))
            return false;
    return true;
}

static bc_status check_twice(const connection *c, const size_t index[], size_t count, bc_error *err)
{
    for (size_t i = 0; i < count; i++)
        if (c->components[index[i]].same == c->components[index[count]].same)
            return bc_fail(err, BC_ERR_INPUT, "'%s' and '%s' are the same component; keep one of them", c->components[index[i]].text,
                           c->components[index[count]].text);
    return BC_OK;
}

static bc_status take_names(connection *c, plan *p, const plan_wish *wish, bc_error *err)
{
    size_t index[BC_ENTRY_MAX] = {0};
    bc_status status = BC_OK;

    connection_start_gas(c);
    for (size_t i = 0; i < wish->name_count && status == BC_OK; i++) {
        word w;

        if (sqlite3_value_type(wish->names[2 * i]) == SQLITE_NULL)
            return bc_fail(err, BC_ERR_INPUT, "the name of component %zu is NULL; write pairs of a name and a share", i + 1);
        status = plan_text(wish->names[2 * i], "the name of a component", &w, err);
        if (status == BC_OK)
            status = connection_component(c, &w, &index[i], err);
        if (status == BC_OK)
            status = check_twice(c, index, i, err);
        if (status == BC_OK)
            p->components[p->component_count++] = c->components[index[i]];
    }
    return status;
}

static bc_status take_state(connection *c, plan *p, const word *state, bc_error *err)
{
    const word usual = {STATE_DEFAULT, sizeof STATE_DEFAULT - 1};
    const bc_reference *reference = NULL;
    const bc_status status = connection_reference(c, state->text ? state : &usual, &reference, err);

    if (status != BC_OK)
        return status;
    if (state->length >= sizeof p->state_text)
        return bc_fail(err, BC_ERR_USAGE, "the reference state is too long; remove blanks");
    p->reference = *reference;
    p->state_length = state->length;
    if (state->text)
        memcpy(p->state_text, state->text, state->length);
    return BC_OK;
}

static bc_status take_quantity(plan *p, const word *quantity, bc_error *err)
{
    const bc_status status = bc_quantity_find(quantity->text, &p->quantity, err);

    if (status != BC_OK)
        return status;
    if (quantity->length >= sizeof p->quantity_text)
        return bc_fail(err, BC_ERR_USAGE, "the quantity is too long; remove blanks");
    p->quantity_length = quantity->length;
    memcpy(p->quantity_text, quantity->text, quantity->length);
    return BC_OK;
}

bc_status plan_take(connection *c, const plan_wish *wish, plan *kept, plan **taken, bc_error *err)
{
    *taken = kept;
    if (kept && fits(kept, wish))
        return BC_OK;
    if (wish->name_count > BC_ENTRY_MAX)
        return bc_fail(err, BC_ERR_USAGE, "more than %d components; join some", BC_ENTRY_MAX);
    plan *p = sqlite3_malloc64(sizeof *p + wish->name_count * sizeof p->components[0]);

    if (!p)
        return bc_fail(err, BC_ERR_MEMORY, "not enough memory for a call");
    p->component_count = 0;
    bc_status status = take_quantity(p, &wish->quantity, err);

    if (status == BC_OK)
        status = take_state(c, p, &wish->state, err);
    if (status == BC_OK)
        status = take_names(c, p, wish, err);
    if (status == BC_OK)
        *taken = p;
    else
        sqlite3_free(p);
    return status;
}
