/* SPDX-License-Identifier: MIT */
/* render.h - the forms a report can take, and where it goes.
 *
 * Every renderer writes the whole report to a stream, in English and with '.' as decimal point
 * whatever the locale. Text from users cannot carry control characters to a terminal. */
#ifndef RENDER_H
#define RENDER_H

#include <stdbool.h>
#include <stdio.h>

#include "output/report.h"

typedef enum {
    RENDER_TEXT, /* sections and tables for people */
    RENDER_JSON, /* one object, 12 significant digits */
    RENDER_CSV,  /* results, limits, tables: blocks with an empty line between */
    RENDER_BRIEF, /* one line a result; chosen by a command, never by a file's ending */
    RENDER_HTML, /* one page, charts in it, for a browser and for A4 */
    RENDER_XLSX, /* a workbook: a sheet for each section, table and chart */
    RENDER_SVG,  /* the charts alone, panel below panel, 800 px wide */
    RENDER_PNG,  /* the same at twice as many pixels */
    RENDER_PDF   /* the same at 600 points, on as many pages as keep within A4 */
} render_form;

/* How text shall look. JSON and charts heed none of this, CSV only `digits`. HTML and
 * workbook are as text, but for width and color. */
typedef struct {
    bool bare;  /* brief: the number alone */
    bool quiet; /* no warnings, no notes */
    bool color; /* text: escape sequences for titles, failures and the verdict */
    int digits; /* significant digits of every result; 0: uncertainty or the result decides */
    int width;  /* text: columns of a line; 0: 80 */
} render_style;

/* Each answers BC_OK, BC_ERR_MEMORY, or BC_ERR_FILE when the stream failed; err may be NULL. */
BC_MUST_USE bc_status render_text(const report *r, const render_style *style, FILE *out, bc_error *err);
BC_MUST_USE bc_status render_json(const report *r, const render_style *style, FILE *out, bc_error *err);
BC_MUST_USE bc_status render_csv(const report *r, const render_style *style, FILE *out, bc_error *err);

/* One line a result in the order of the results: `value unit`, behind it a tab and the name of the
 * gas where the report has several. */
BC_MUST_USE bc_status render_brief(const report *r, const render_style *style, FILE *out, bc_error *err);

/* One file of HTML 5 that fetches nothing and runs nothing. Where the module that draws is missing, a
 * note stands for the charts. */
BC_MUST_USE bc_status render_html(const report *r, const render_style *style, FILE *out, bc_error *err);

/* A workbook of Office Open XML: numbers as numbers, texts never as formulas, the same bytes in every
 * run. BC_ERR_FILE also: the module that writes it, loaded on first use, is missing or a stranger. */
BC_MUST_USE bc_status render_xlsx(const report *r, const render_style *style, FILE *out, bc_error *err);

/* The charts with title, state and caution, the same bytes in every run. BC_ERR_USAGE: the report has
 * no chart; BC_ERR_FILE also: the module that draws, loaded on first use, is missing or a stranger. */
BC_MUST_USE bc_status render_svg(const report *r, const render_style *style, FILE *out, bc_error *err);
BC_MUST_USE bc_status render_png(const report *r, const render_style *style, FILE *out, bc_error *err);
BC_MUST_USE bc_status render_pdf(const report *r, const render_style *style, FILE *out, bc_error *err);

/* Renders into a file, or to standard output when path is NULL. A regular file appears whole under
 * its name or not at all; a device or FIFO is written to as it stands. */
BC_MUST_USE bc_status render_to(const report *r, render_form form, const render_style *style,
                                const char *path, bc_error *err);

/* The form a file's ending asks for (.txt .json .csv .html .xlsx .svg .png .pdf, in any case);
 * false if it names none. */
bool render_form_of(const char *path, render_form *form);

/* True for the forms that are nothing but the charts of a report; for those that show them at all. */
bool render_form_is_chart(render_form form);
bool render_form_shows_charts(render_form form);

#endif
