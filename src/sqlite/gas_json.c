/* SPDX-License-Identifier: MIT */
/* gas_json.c - a gas from a JSON object: {"methane": 92, "ethane": 8}. */
#include "sqlite/gas_json_internal.h"

#include "base/error_internal.h"
#include "base/text.h"

#include <jansson.h>
#include <string.h>

/* Texts as a cell of CSV would be read. */
static bc_status read_member(const json_t *share, const char *name, double *percent, bc_error *err)
{
    *percent = json_number_value(share);
    if (json_is_string(share))
        return share_from_text(json_string_value(share), name, percent, err);
    if (json_is_null(share) || json_is_number(share))
        return BC_OK;
    return bc_fail(err, BC_ERR_INPUT, "the share of '%s' is no number; write it in mole per cent", name);
}

static bc_status add_member(connection *c, const char *name, const json_t *share, gas_sum *sum, json_taken *taken, bc_error *err)
{
    const word w = {name, strlen(name)};
    double percent = 0.0;
    size_t index = 0;
    bc_status status = connection_component(c, &w, &index, err);

    if (status != BC_OK)
        return status;
    if (!json_take(taken, &c->components[index]))
        return bc_fail(err, BC_ERR_INPUT, "'%s' stands for a component that is there already; keep one of them", name);
    status = read_member(share, name, &percent, err);
    if (status == BC_OK)
        status = share_check(percent, name, err);
    if (status == BC_OK)
        gas_sum_add(sum, &c->components[index], percent);
    return status;
}

static bc_status add_members(connection *c, json_t *object, gas_sum *sum, bc_error *err)
{
    bc_status status = BC_OK;
    json_taken taken = {{false}};

    if (json_object_size(object) > BC_ENTRY_MAX)
        return bc_fail(err, BC_ERR_INPUT, "more than %d components; join some", BC_ENTRY_MAX);
    connection_start_gas(c);
    for (void *i = json_object_iter(object); i && status == BC_OK; i = json_object_iter_next(object, i))
        status = add_member(c, json_object_iter_key(i), json_object_iter_value(i), sum, &taken, err);
    return status;
}

static bc_status read_any(connection *c, const word *w, gas_sum *sum, bc_error *err)
{
    json_error_t cause;
    json_t *object = json_loadb(w->text, w->length, JSON_REJECT_DUPLICATES | JSON_DECODE_INT_AS_REAL, &cause);
    char shown[2 * BC_WORD_MAX];

    if (!object) {
        bc_text_show(shown, sizeof shown, cause.text);
        return bc_fail(err, BC_ERR_INPUT, "the JSON of a composition cannot be read: %s; write it as {\"methane\": 92, \"ethane\": 8}", shown);
    }
    gas_sum_start(sum);
    const bc_status status = add_members(c, object, sum, err);

    json_decref(object);
    return status;
}

bc_status gas_from_json(connection *c, const word *w, bc_gas *gas, bc_error *err)
{
    gas_sum sum BC_UNFILLED;
    const bc_status status = gas_json_plain(c, w, &sum) ? BC_OK : read_any(c, w, &sum, err);

    return status == BC_OK ? gas_sum_finish(&sum, gas, err) : status;
}
