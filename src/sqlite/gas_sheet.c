/* SPDX-License-Identifier: MIT */
/* gas_sheet.c - the table function gas_sheet(): every quantity of one gas, a row each. */
#include "sqlite/functions.h"

#include "sqlite/gas_text.h"
#include "sqlite/plan.h"

#include <math.h>
#include <string.h>

enum { COLUMN_ID, COLUMN_LABEL, COLUMN_VALUE, COLUMN_UNIT, COLUMN_UNCERTAINTY, COLUMN_METHOD, COLUMN_COMPOSITION, COLUMN_STATE };

#define SCHEMA "CREATE TABLE gas_sheet(id TEXT, label TEXT, value REAL, unit TEXT, uncertainty REAL, method TEXT, composition HIDDEN, state HIDDEN)"

#define HAS_COMPOSITION 1 /* bits of the plan: which arguments there are, in this order */
#define HAS_STATE 2

typedef struct {
    sqlite3_vtab base;
    connection *connection;
} sheet;

typedef struct {
    sqlite3_vtab_cursor base;
    size_t quantity; /* of the row; bc_quantity_count() behind the last */
    sqlite3_value *argument[2];
    bc_reference reference;
    bc_spread spread;
    bc_subject subject;
    bool is_known;   /* the figure of the row was worked out: it is only where somebody asks for it */
    bc_status status;
    bc_figure figure;
} cursor;

static int fail(sqlite3_vtab *table, const bc_error *err)
{
    if (err->status == BC_ERR_MEMORY)
        return SQLITE_NOMEM;
    sqlite3_free(table->zErrMsg);
    table->zErrMsg = sqlite3_mprintf("gas_sheet: %s", err->message);
    return SQLITE_ERROR;
}

static int connect_sheet(sqlite3 *db, void *held, int count, const char *const *values, sqlite3_vtab **table, char **message)
{
    int code = sqlite3_declare_vtab(db, SCHEMA);

    (void)count;
    (void)values;
    (void)message;
    if (code == SQLITE_OK)
        code = sqlite3_vtab_config(db, SQLITE_VTAB_INNOCUOUS);
    sheet *s = code == SQLITE_OK ? sqlite3_malloc64(sizeof *s) : NULL;

    if (!s)
        return code == SQLITE_OK ? SQLITE_NOMEM : code;
    memset(s, 0, sizeof *s);
    s->connection = held; /* registered with the module, which outlives its tables */
    *table = &s->base;
    return SQLITE_OK;
}

static int disconnect_sheet(sqlite3_vtab *table)
{
    sqlite3_free(table);
    return SQLITE_OK;
}

/* Which argument a constraint gives; -1 for none. */
static int argument_of(const struct sqlite3_index_constraint *c)
{
    return c->op == SQLITE_INDEX_CONSTRAINT_EQ && c->iColumn >= COLUMN_COMPOSITION ? c->iColumn - COLUMN_COMPOSITION : -1;
}

static int find_plan(sqlite3_vtab *table, sqlite3_index_info *info)
{
    int place[2] = {-1, -1};

    (void)table;
    for (int i = 0; i < info->nConstraint; i++) {
        const int argument = argument_of(&info->aConstraint[i]);

        if (argument < 0)
            continue;
        if (!info->aConstraint[i].usable)
            return SQLITE_CONSTRAINT;
        place[argument] = i;
    }
    info->idxNum = 0;
    for (int argument = 0, next = 1; argument < 2; argument++) {
        if (place[argument] < 0)
            continue;
        info->aConstraintUsage[place[argument]].argvIndex = next++;
        info->aConstraintUsage[place[argument]].omit = 1;
        info->idxNum |= argument == 0 ? HAS_COMPOSITION : HAS_STATE;
    }
    info->estimatedRows = (sqlite3_int64)bc_quantity_count();
    info->estimatedCost = 1e4; /* rows of a plain table that take as long, about */
    return SQLITE_OK;
}

static int open_cursor(sqlite3_vtab *table, sqlite3_vtab_cursor **opened)
{
    cursor *c = sqlite3_malloc64(sizeof *c);

    (void)table;
    if (!c)
        return SQLITE_NOMEM;
    c->argument[0] = NULL;
    c->argument[1] = NULL;
    c->quantity = bc_quantity_count();
    *opened = &c->base;
    return SQLITE_OK;
}

static void drop_arguments(cursor *c)
{
    for (int i = 0; i < 2; i++) {
        sqlite3_value_free(c->argument[i]);
        c->argument[i] = NULL;
    }
}

static int close_cursor(sqlite3_vtab_cursor *closed)
{
    drop_arguments((cursor *)closed);
    sqlite3_free(closed);
    return SQLITE_OK;
}

/* They live on in the cursor, as columns that nobody sees unless asked for. */
static int keep_arguments(cursor *c, int plan_bits, sqlite3_value **values)
{
    drop_arguments(c);
    for (int i = 0, next = 0; i < 2; i++) {
        if (!(plan_bits & (i == 0 ? HAS_COMPOSITION : HAS_STATE)))
            continue;
        c->argument[i] = sqlite3_value_dup(values[next++]);
        if (!c->argument[i])
            return SQLITE_NOMEM;
    }
    return SQLITE_OK;
}

static bc_status make_subject(cursor *c, connection *of, bc_error *err)
{
    word composition;
    word state = {"15/15", 5};
    const bc_reference *reference = NULL;
    const bc_spread *spread = NULL;
    bc_gas gas;
    bc_status status = plan_text(c->argument[0], "the composition", &composition, err);

    if (status == BC_OK && c->argument[1])
        status = plan_text(c->argument[1], "the reference state", &state, err);
    if (status == BC_OK)
        status = connection_reference(of, &state, &reference, err);
    if (status == BC_OK)
        status = gas_from_text(of, &composition, &gas, &spread, err);
    if (status != BC_OK)
        return status;
    c->reference = *reference;
    if (spread)
        c->spread = *spread;
    return bc_subject_make(&c->reference, &gas, spread ? &c->spread : NULL, &c->subject, err);
}

static int start(sqlite3_vtab_cursor *started, int plan_bits, const char *unused, int count, sqlite3_value **values)
{
    cursor *c = (cursor *)started;
    bc_error err = {.status = BC_ERR_USAGE, .message = "a sheet needs a composition, as in gas_sheet('g20')"};

    (void)unused;
    (void)count;
    c->quantity = bc_quantity_count();
    c->is_known = false;
    if (!(plan_bits & HAS_COMPOSITION))
        return fail(started->pVtab, &err);
    if (keep_arguments(c, plan_bits, values) != SQLITE_OK)
        return SQLITE_NOMEM;
    for (int i = 0; i < 2; i++)
        if (c->argument[i] && sqlite3_value_type(c->argument[i]) == SQLITE_NULL)
            return SQLITE_OK; /* no rows of NULL */
    if (make_subject(c, ((sheet *)started->pVtab)->connection, &err) != BC_OK)
        return fail(started->pVtab, &err);
    c->quantity = 0;
    return SQLITE_OK;
}

static int go_on(sqlite3_vtab_cursor *moved)
{
    cursor *c = (cursor *)moved;

    c->quantity++;
    c->is_known = false;
    return SQLITE_OK;
}

static int is_at_end(sqlite3_vtab_cursor *asked)
{
    return ((cursor *)asked)->quantity >= bc_quantity_count();
}

/* A figure that the gas does not have is NULL. */
static void answer_figure(cursor *c, sqlite3_context *context, bool uncertainty)
{
    bc_error err;

    if (!c->is_known)
        c->status = bc_quantity_evaluate(c->quantity, &c->subject, &c->figure, &err);
    c->is_known = true;
    if (c->status == BC_ERR_MEMORY)
        sqlite3_result_error_nomem(context);
    else if (c->status == BC_OK && (!uncertainty || c->figure.has_u))
        sqlite3_result_double(context, uncertainty ? c->figure.u : c->figure.value); /* SQLite makes NULL of NaN */
}

static void answer_method(const cursor *c, sqlite3_context *context, const bc_quantity *q)
{
    char *text = strcmp(q->method, "ISO 6976") == 0 ? sqlite3_mprintf("%s:%d", q->method, c->reference.state.edition) : sqlite3_mprintf("%s", q->method);

    if (text)
        sqlite3_result_text(context, text, -1, sqlite3_free);
    else
        sqlite3_result_error_nomem(context);
}

static int answer_column(sqlite3_vtab_cursor *asked, sqlite3_context *context, int column)
{
    cursor *c = (cursor *)asked;
    const bc_quantity *q = bc_quantity_at(c->quantity);
    const char *const texts[] = {[COLUMN_ID] = q->id, [COLUMN_LABEL] = q->label, [COLUMN_UNIT] = q->unit};

    if (column == COLUMN_ID || column == COLUMN_LABEL || column == COLUMN_UNIT)
        sqlite3_result_text(context, texts[column], -1, SQLITE_TRANSIENT);
    else if (column == COLUMN_VALUE || column == COLUMN_UNCERTAINTY)
        answer_figure(c, context, column == COLUMN_UNCERTAINTY);
    else if (column == COLUMN_METHOD)
        answer_method(c, context, q);
    else if (c->argument[column - COLUMN_COMPOSITION])
        sqlite3_result_value(context, c->argument[column - COLUMN_COMPOSITION]);
    return SQLITE_OK;
}

static int answer_rowid(sqlite3_vtab_cursor *asked, sqlite3_int64 *rowid)
{
    *rowid = (sqlite3_int64)((cursor *)asked)->quantity + 1;
    return SQLITE_OK;
}

const sqlite3_module GAS_SHEET = {.xConnect = connect_sheet, .xBestIndex = find_plan, .xDisconnect = disconnect_sheet, .xOpen = open_cursor,
                                  .xClose = close_cursor, .xFilter = start, .xNext = go_on, .xEof = is_at_end, .xColumn = answer_column,
                                  .xRowid = answer_rowid};
