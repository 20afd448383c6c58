/* SPDX-License-Identifier: MIT */
/* gas_value.c - the SQL functions gas_value() and gas_value_or_null(). */
#include "sqlite/functions.h"

#include "base/error_internal.h"
#include "sqlite/gas_sum.h"
#include "sqlite/gas_text.h"
#include "sqlite/plan.h"

#include <math.h>

#define USAGE "takes a quantity, a composition and perhaps a state, or a quantity, a state and pairs of a component and its share"

/* A call taken apart. */
typedef struct {
    sqlite3_context *context;
    connection *connection;
    sqlite3_value **values;
    size_t count;
    bool has_pairs;
    bool is_null;      /* an argument is NULL, and so is the answer */
    bool row_is_bad;   /* a failure comes from the row, not from the query */
} call;

static bc_status read_text(sqlite3_value *value, const component *what, double *percent, bc_error *err)
{
    word w;
    const bc_status status = plan_text(value, "a share", &w, err);

    return status == BC_OK ? share_from_text(w.text, what->text, percent, err) : status;
}

/* NULL is a component that was not found: zero. *given counts those that are not NULL. */
static bc_status read_share(sqlite3_value *value, const component *what, double *percent, size_t *given, bc_error *err)
{
    const int type = sqlite3_value_type(value);
    bc_status status = BC_OK;

    *percent = 0.0;
    if (type == SQLITE_NULL)
        return BC_OK;
    (*given)++;
    if (type == SQLITE_BLOB)
        return bc_fail(err, BC_ERR_INPUT, "the share of '%s' is a blob; give a number", what->text);
    if (type == SQLITE_TEXT)
        status = read_text(value, what, percent, err);
    else
        *percent = sqlite3_value_double(value);
    return status == BC_OK ? share_check(*percent, what->text, err) : status;
}

/* A row without any share is no analysis: an outer join makes such rows. */
static bc_status gas_of_pairs(call *k, const plan *p, bc_gas *gas, bc_error *err)
{
    size_t given = 0;
    gas_sum sum;

    gas_sum_start(&sum);
    for (size_t i = 0; i < p->component_count; i++) {
        double percent = 0.0;
        const bc_status status = read_share(k->values[3 + 2 * i], &p->components[i], &percent, &given, err);

        if (status != BC_OK)
            return status;
        if (percent > 0.0)
            gas_sum_add(&sum, &p->components[i], percent);
    }
    k->is_null = given == 0;
    return k->is_null ? BC_OK : gas_sum_finish(&sum, gas, err);
}

static bc_status gas_of_text(call *k, bc_gas *gas, bc_error *err)
{
    const bc_spread *spread = NULL;
    word w;
    const bc_status status = plan_text(k->values[1], "the composition", &w, err);

    return status == BC_OK ? gas_from_text(k->connection, &w, gas, &spread, err) : status;
}

static bc_status evaluate(call *k, const plan *p, double *value, bc_error *err)
{
    BC_UNFILLED bc_subject subject;
    BC_UNFILLED bc_gas gas;
    bc_status status = k->has_pairs ? gas_of_pairs(k, p, &gas, err) : gas_of_text(k, &gas, err);

    if (status != BC_OK || k->is_null)
        return status;
    status = bc_subject_make(&p->reference, &gas, NULL, &subject, err);
    if (status == BC_OK)
        status = bc_quantity_value(p->quantity, &subject, value, err);
    if (status == BC_OK && !isfinite(*value))
        return bc_fail(err, BC_ERR_RANGE, "the gas has no such figure");
    return status;
}

static bc_status take_plan(call *k, plan *kept, plan **p, bc_error *err)
{
    sqlite3_value *state = k->has_pairs ? k->values[1] : k->count > 2 ? k->values[2] : NULL;
    plan_wish wish = {.state = {NULL, 0}};
    bc_status status = plan_text(k->values[0], "the quantity", &wish.quantity, err);

    if (status == BC_OK && state)
        status = plan_text(state, "the reference state", &wish.state, err);
    if (k->has_pairs) {
        wish.names = k->values + 2;
        wish.name_count = (k->count - 2) / 2;
    }
    return status == BC_OK ? plan_take(k->connection, &wish, kept, p, err) : status;
}

static bool is_null(const call *k)
{
    for (size_t i = 0; i < k->count && (i < 2 || !k->has_pairs); i++)
        if (sqlite3_value_type(k->values[i]) == SQLITE_NULL)
            return true;
    return false;
}

static bc_status answer(call *k, double *value, bc_error *err)
{
    plan *kept = sqlite3_get_auxdata(k->context, 0);
    plan *p = NULL;

    if (k->count < 2 || (k->count > 3 && k->count % 2 != 0))
        return bc_fail(err, BC_ERR_USAGE, USAGE);
    k->has_pairs = k->count > 3;
    k->is_null = is_null(k);
    if (k->is_null)
        return BC_OK;
    bc_status status = take_plan(k, kept, &p, err);

    if (status != BC_OK)
        return status;
    status = evaluate(k, p, value, err);
    k->row_is_bad = status == BC_ERR_INPUT || status == BC_ERR_RANGE || status == BC_ERR_USAGE || status == BC_ERR_SOLVER;
    if (p != kept) /* may free it at once: it is not looked at again */
        sqlite3_set_auxdata(k->context, 0, p, sqlite3_free);
    return status;
}

static void run(sqlite3_context *context, int count, sqlite3_value **values, const char *name, bool or_null)
{
    call k = {.context = context, .connection = sqlite3_user_data(context), .values = values, .count = (size_t)count};
    BC_UNFILLED bc_error err;
    double value = 0.0;
    const bc_status status = answer(&k, &value, &err);

    if (status == BC_OK && !k.is_null)
        sqlite3_result_double(context, value);
    else if (status == BC_OK || (or_null && k.row_is_bad))
        sqlite3_result_null(context);
    else
        functions_fail(context, name, &err);
}

void gas_value(sqlite3_context *context, int count, sqlite3_value **values)
{
    run(context, count, values, "gas_value", false);
}

void gas_value_or_null(sqlite3_context *context, int count, sqlite3_value **values)
{
    run(context, count, values, "gas_value_or_null", true);
}
