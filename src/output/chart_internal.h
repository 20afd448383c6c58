/* SPDX-License-Identifier: MIT */
/* chart_internal.h - what the program and the module that draws charts agree on.
 *
 * Drawing needs Cairo and fonts, which are slow to load and rarely asked for: they stand in the
 * module bluecone_chart.so, which is loaded when a chart is. The module has one function, of type
 * chart_draw and name CHART_SYMBOL. */
#ifndef CHART_INTERNAL_H
#define CHART_INTERNAL_H

#include <stdio.h>

#include "output/report.h"

/* The module reads the program's report: both must have it in the same shape. The number in front is
 * raised by hand when a change leaves the sizes as they are. */
#define CHART_ABI                                                                                            \
    (2U << 28 | (unsigned)sizeof(report) << 16 | (unsigned)sizeof(report_chart) << 4 |                       \
     (unsigned)(sizeof(report_series) + sizeof(report_mark)) / 16)

#define CHART_MODULE  "bluecone_chart.so"
#define CHART_SYMBOL  "bluecone_chart_draw"
#define CHART_WHY_MAX 160

typedef enum { CHART_SVG, CHART_PNG, CHART_PDF } chart_form;

typedef enum {
    CHART_DRAWN,
    CHART_OTHER_ABI, /* nothing was read or written */
    CHART_NO_MEMORY,
    CHART_NOT_DRAWN /* why[] says what went wrong */
} chart_outcome;

typedef struct {
    const report *r;
    chart_form form;
    bool inset; /* without title, state, caution and maker: the page around has them */
    FILE *out;
    char why[CHART_WHY_MAX];
} chart_order;

/* Writes the charts of order->r to order->out, if abi is the module's own CHART_ABI. */
typedef chart_outcome chart_draw(unsigned abi, chart_order *order);
BC_API chart_draw bluecone_chart_draw;

/* Writes the charts of r, at least one, as an SVG to be set into a page. Errors as of render_svg(). */
BC_MUST_USE bc_status chart_inset(const report *r, FILE *out, bc_error *err);

/* Finds the module in the first of these folders that has it; it stays loaded. BC_ERR_FILE names the
 * folders, or says why it cannot be loaded. */
BC_MUST_USE bc_status chart_load(const char *const folders[], size_t count, chart_draw **draw, bc_error *err);

#endif
