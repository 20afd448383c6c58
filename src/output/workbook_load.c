/* SPDX-License-Identifier: MIT */
/* workbook_load.c - the program's side of workbooks: the module is loaded when one is asked for. */
#include "output/render.h"

#include "base/error_internal.h"
#include "output/module_internal.h"
#include "output/workbook_internal.h"

#include <assert.h>
#include <string.h>

static const module_name MODULE = {WORKBOOK_MODULE, WORKBOOK_SYMBOL, "workbooks", "libxlsxwriter4"};

bc_status render_xlsx(const report *r, const render_style *style, FILE *out, bc_error *err)
{
    workbook_order order = {.r = r, .style = style, .out = out};
    workbook_write *write = NULL;
    void *symbol = NULL;

    if (!report_ok(r))
        return bc_fail(err, BC_ERR_MEMORY, "no memory for the report");

    const bc_status status = module_load(&MODULE, &symbol, err);
    if (status != BC_OK)
        return status;
    assert(symbol != NULL);
    /* ISO C knows no cast between pointers to objects and to functions; POSIX wants them alike. */
    memcpy(&write, &symbol, sizeof symbol);
    switch (write(WORKBOOK_ABI, &order)) {
    case WORKBOOK_WRITTEN:
        return ferror(out) ? bc_fail(err, BC_ERR_FILE, "cannot write the workbook") : BC_OK;
    case WORKBOOK_OTHER_ABI:
        return bc_fail(err, BC_ERR_FILE,
                       "the module for workbooks, %s, belongs to another version: install bluecone anew",
                       WORKBOOK_MODULE);
    case WORKBOOK_NO_MEMORY:
        return bc_fail(err, BC_ERR_MEMORY, "no memory for the workbook");
    case WORKBOOK_NOT_WRITTEN:
    default:
        return bc_fail(err, BC_ERR_FILE, "cannot write the workbook: %s", order.why);
    }
}
