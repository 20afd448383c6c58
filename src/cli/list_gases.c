/* SPDX-License-Identifier: MIT */
/* list_gases.c - the bundled gases and where their figures come from. */
#include "base/error_internal.h"
#include "cli/list.h"

#include <stdio.h>
#include <stdlib.h>

/* A list in the making; a name found twice belongs to the folder searched first. */
typedef struct {
    report *r;
    size_t table;
    bc_composition *scratch;
    bc_status status;
    bc_error *err;
} listing;

static void add_gas(const char *name, const char *path, void *data)
{
    listing *l = data;

    if (l->status != BC_OK || list_has(l->r, l->table, name))
        return;
    l->status = bc_composition_read(path, l->scratch, l->err);
    if (l->status != BC_OK)
        return;
    const char *const cells[] = {name, l->scratch->name, l->scratch->family, l->scratch->origin};

    list_row(l->r, l->table, cells, BC_COUNT(cells));
}

static bc_status list_all(report *r, bc_composition *scratch, bc_error *err)
{
    static const char *const COLUMNS[] = {"gas", "name", "family", "source"};
    folders f;
    listing l = {r, report_add_table(r, "gases", "Bundled gases"), scratch, BC_OK, err};

    folders_find(&f);
    list_columns(r, l.table, COLUMNS, BC_COUNT(COLUMNS));
    for (size_t i = 0; i < f.count && l.status == BC_OK; i++) {
        const bc_status status = bc_composition_each(f.path[i], add_gas, &l, err);

        if (status != BC_OK)
            return status;
    }
    return l.status;
}

static bc_status list_one(report *r, const char *name, bc_composition *c, bc_error *err)
{
    static const char *const COLUMNS[] = {"component", "as written, %", "u (k = 1), %"};
    static const char *const BASES[] = {"mole", "volume", "mass"};
    char title[480];
    folders f;

    folders_find(&f);
    const bc_status status = bc_composition_find(name, f.path, f.count, c, err);

    if (status != BC_OK)
        return status;
    (void)snprintf(title, sizeof title, "%s (%s basis). Source: %s", c->name, BASES[c->basis], c->origin[0] ? c->origin : "not stated");
    const size_t table = report_add_table(r, "gas", title);

    list_columns(r, table, COLUMNS, BC_COUNT(COLUMNS));
    for (size_t i = 0; i < c->entry_count; i++) {
        report_add_text(r, table, c->entries[i].word);
        report_add_number(r, table, 100.0 * c->entries[i].amount, -1);
        if (c->entries[i].u > 0.0)
            report_add_number(r, table, 100.0 * c->entries[i].u, -1);
        else
            report_add_text(r, table, "not stated");
    }
    for (size_t i = 0; i < c->remark_count; i++)
        report_add_warning(r, c->remarks[i]);
    return BC_OK;
}

bc_status list_gases(report *r, const char *name, bc_error *err)
{
    bc_composition *scratch = malloc(sizeof *scratch);

    if (!scratch)
        return bc_fail(err, BC_ERR_MEMORY, "not enough memory");
    const bc_status status = name ? list_one(r, name, scratch, err) : list_all(r, scratch, err);

    free(scratch);
    return status;
}
