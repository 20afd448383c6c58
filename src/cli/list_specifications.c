/* SPDX-License-Identifier: MIT */
/* list_specifications.c - the bundled specifications: limits of published law and standards, with their sources. */
#include "base/error_internal.h"
#include "cli/contract_report.h"
#include "cli/list.h"

#include <stdio.h>
#include <stdlib.h>
#include <string.h>

/* A list in the making; a name found twice belongs to the folder searched first. */
typedef struct {
    report *r;
    size_t table;
    bc_contract *scratch;
    bc_status status;
    bc_error *err;
} listing;

static void add_specification(const char *name, const char *path, void *data)
{
    listing *l = data;
    bc_contract *c = l->scratch;

    (void)path;
    if (l->status != BC_OK || list_has(l->r, l->table, name))
        return;
    l->status = contract_load(name, c, l->err);
    if (l->status != BC_OK)
        return;
    const char *const cells[] = {name, c->name, c->from[0] ? c->from : "-", c->until[0] ? c->until : "-", c->origin};

    list_row(l->r, l->table, cells, BC_COUNT(cells));
}

static bc_status list_all(report *r, bc_contract *scratch, bc_error *err)
{
    static const char *const COLUMNS[] = {"specification", "name", "from", "until", "source"};
    folders f;
    listing l = {r, report_add_table(r, "specifications", "Bundled specifications; the text in force decides"), scratch, BC_OK, err};

    folders_of_specifications(&f);
    list_columns(r, l.table, COLUMNS, BC_COUNT(COLUMNS));
    for (size_t i = 0; i < f.count && l.status == BC_OK; i++) {
        const bc_status status = bc_composition_each(f.path[i], add_specification, &l, err);

        if (status != BC_OK)
            return status;
    }
    return l.status;
}

static void add_bound(report *r, size_t table, bool there, double bound)
{
    if (there)
        report_add_number(r, table, bound, -1);
    else
        report_add_text(r, table, "-");
}

static bc_status list_one(report *r, const char *name, bc_contract *c, bc_error *err)
{
    static const char *const COLUMNS[] = {"limit", "min", "max", "unit", "at", "note"};
    char title[BC_NAME_MAX + 300];
    char state[64];
    const bc_status status = contract_load(name, c, err);

    if (status != BC_OK)
        return status;
    (void)snprintf(title, sizeof title, "%s. Source: %s", c->name, c->origin[0] ? c->origin : "not stated");
    const size_t table = report_add_table(r, "specification", title);

    list_columns(r, table, COLUMNS, BC_COUNT(COLUMNS));
    for (size_t i = 0; i < c->limit_count; i++) {
        const bc_limit *limit = &c->limits[i];

        report_add_text(r, table, limit->id);
        add_bound(r, table, limit->has_min, limit->min);
        add_bound(r, table, limit->has_max, limit->max);
        report_add_text(r, table, strcmp(limit->unit, "1") == 0 ? "" : limit->unit);
        contract_state_text(c, limit, state, sizeof state);
        report_add_text(r, table, state);
        report_add_text(r, table, limit->note);
    }
    contract_warn(r, c);
    return BC_OK;
}

bc_status list_specifications(report *r, const char *name, bc_error *err)
{
    bc_contract *scratch = malloc(sizeof *scratch);

    if (!scratch)
        return bc_fail(err, BC_ERR_MEMORY, "not enough memory");
    const bc_status status = name ? list_one(r, name, scratch, err) : list_all(r, scratch, err);

    free(scratch);
    return status;
}
