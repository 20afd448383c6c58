/* SPDX-License-Identifier: MIT */
/* chart_load.c - the program's side of charts: the module is loaded when one is asked for. */
#include "output/render.h"

#include "base/error_internal.h"
#include "output/chart_internal.h"
#include "output/module_internal.h"

#include <assert.h>
#include <string.h>

static const module_name MODULE = {CHART_MODULE, CHART_SYMBOL, "charts", "libcairo2"};

/* ISO C knows no cast between pointers to objects and to functions; POSIX wants them alike. */
static bc_status take(bc_status status, void *symbol, chart_draw **draw)
{
    if (status == BC_OK)
        memcpy(draw, &symbol, sizeof symbol);
    return status;
}

bc_status chart_load(const char *const folders[], size_t count, chart_draw **draw, bc_error *err)
{
    void *symbol = NULL;
    const bc_status status = module_load_from(&MODULE, folders, count, &symbol, err);

    return take(status, symbol, draw);
}

static bc_status load(chart_draw **draw, bc_error *err)
{
    void *symbol = NULL;
    const bc_status status = module_load(&MODULE, &symbol, err);

    return take(status, symbol, draw);
}

static bc_status draw_order(chart_order *order, bc_error *err)
{
    chart_draw *draw = NULL;
    const bc_status status = load(&draw, err);

    if (status != BC_OK)
        return status;
    assert(draw != NULL);
    switch (draw(CHART_ABI, order)) {
    case CHART_DRAWN:
        return ferror(order->out) ? bc_fail(err, BC_ERR_FILE, "cannot write the chart") : BC_OK;
    case CHART_OTHER_ABI:
        return bc_fail(err, BC_ERR_FILE,
                       "the module for charts, %s, belongs to another version: install bluecone anew",
                       CHART_MODULE);
    case CHART_NO_MEMORY:
        return bc_fail(err, BC_ERR_MEMORY, "no memory for the chart");
    case CHART_NOT_DRAWN:
    default:
        return bc_fail(err, BC_ERR_FILE, "cannot draw the chart: %s", order->why);
    }
}

static bc_status render(const report *r, chart_form form, FILE *out, bc_error *err)
{
    chart_order order = {.r = r, .form = form, .out = out};

    if (!report_ok(r))
        return bc_fail(err, BC_ERR_MEMORY, "no memory for the report");
    if (r->chart_count == 0)
        return bc_fail(err, BC_ERR_USAGE,
                       "there is no chart in this answer of '%.40s': write it to .txt, .json, .csv, .html or .xlsx",
                       r->command);
    return draw_order(&order, err);
}

bc_status chart_inset(const report *r, FILE *out, bc_error *err)
{
    chart_order order = {.r = r, .form = CHART_SVG, .inset = true, .out = out};

    return draw_order(&order, err);
}

bc_status render_svg(const report *r, const render_style *style, FILE *out, bc_error *err)
{
    (void)style; /* a chart has no digits, warnings or escape sequences */
    return render(r, CHART_SVG, out, err);
}

bc_status render_png(const report *r, const render_style *style, FILE *out, bc_error *err)
{
    (void)style;
    return render(r, CHART_PNG, out, err);
}

bc_status render_pdf(const report *r, const render_style *style, FILE *out, bc_error *err)
{
    (void)style;
    return render(r, CHART_PDF, out, err);
}
