/* SPDX-License-Identifier: MIT */
/* sqlite_module.c - where SQLite enters: registers the functions with a database connection. */
#include "sqlite/functions.h"

#include "base/compiler.h"
#include "sqlite/plan.h"

#include <stdio.h>

const sqlite3_api_routines *_Atomic sqlite3_api;

#define SQLITE_OLDEST 3031000 /* SQLITE_INNOCUOUS */

void functions_fail(sqlite3_context *context, const char *name, const bc_error *err)
{
    char text[BC_MESSAGE_MAX + 32];

    if (err->status == BC_ERR_MEMORY) {
        sqlite3_result_error_nomem(context);
        return;
    }
    (void)snprintf(text, sizeof text, "%s: %s", name, err->message);
    sqlite3_result_error(context, text, -1);
}

void gas_unit(sqlite3_context *context, int count, sqlite3_value **values)
{
    size_t quantity = 0;
    bc_error err;
    word w;

    (void)count;
    if (sqlite3_value_type(values[0]) == SQLITE_NULL)
        return; /* NULL of NULL */
    bc_status status = plan_text(values[0], "the quantity", &w, &err);

    if (status == BC_OK)
        status = bc_quantity_find(w.text, &quantity, &err);
    if (status == BC_OK)
        sqlite3_result_text(context, bc_quantity_at(quantity)->unit, -1, SQLITE_TRANSIENT);
    else
        functions_fail(context, "gas_unit", &err);
}

void gas_version(sqlite3_context *context, int count, sqlite3_value **values)
{
    (void)count;
    (void)values;
    sqlite3_result_text(context, bc_version(), -1, SQLITE_TRANSIENT);
}

static int add_functions(sqlite3 *db, connection *c)
{
    static const struct {
        const char *name;
        int arguments;
        void (*function)(sqlite3_context *, int, sqlite3_value **);
    } FUNCTIONS[] = {{"gas_value", -1, gas_value}, {"gas_value_or_null", -1, gas_value_or_null}, {"gas_unit", 1, gas_unit}, {"gas_version", 0, gas_version}};
    const int flags = SQLITE_UTF8 | SQLITE_DETERMINISTIC | SQLITE_INNOCUOUS;

    for (size_t i = 0; i < BC_COUNT(FUNCTIONS); i++) {
        const int code = sqlite3_create_function_v2(db, FUNCTIONS[i].name, FUNCTIONS[i].arguments, flags, connection_hold(c),
                                                    FUNCTIONS[i].function, NULL, NULL, connection_release); /* releases on failure, too */

        if (code != SQLITE_OK)
            return code;
    }
    return sqlite3_create_module_v2(db, "gas_sheet", &GAS_SHEET, connection_hold(c), connection_release);
}

/* SQLite makes this name from that of the file: its letters without the underscore. */
BC_API int sqlite3_blueconesqlite_init(sqlite3 *db, char **message, const sqlite3_api_routines *api);

int sqlite3_blueconesqlite_init(sqlite3 *db, char **message, const sqlite3_api_routines *api)
{
    sqlite3_api = api;
    if (sqlite3_libversion_number() < SQLITE_OLDEST) {
        *message = sqlite3_mprintf("bluecone_sqlite needs SQLite 3.31 or later, not %s", sqlite3_libversion());
        return SQLITE_ERROR;
    }
    connection *c = connection_open();

    if (!c)
        return SQLITE_NOMEM;
    const int code = add_functions(db, c);

    connection_release(c);
    return code;
}
