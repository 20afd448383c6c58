/* SPDX-License-Identifier: MIT */
/* render.c - from a report to a file: rendered in memory first, so that a file is whole or not. */
#include "output/render.h"

#include "base/error_internal.h"
#include "output/limits_table_internal.h"
#include "output/memory_stream_internal.h"
#include "output/apart_internal.h"
#include "output/output_file_internal.h"

#include <stdlib.h>
#include <string.h>
#include <strings.h>

typedef bc_status renderer(const report *r, const render_style *style, FILE *out, bc_error *err);

static renderer *const RENDERERS[] = {
    [RENDER_TEXT] = render_text,   [RENDER_JSON] = render_json, [RENDER_CSV] = render_csv,
    [RENDER_BRIEF] = render_brief, [RENDER_HTML] = render_html, [RENDER_XLSX] = render_xlsx,
    [RENDER_SVG] = render_svg,     [RENDER_PNG] = render_png,   [RENDER_PDF] = render_pdf,
};

static const struct {
    const char *ending;
    render_form form;
} ENDINGS[] = {{".txt", RENDER_TEXT},  {".json", RENDER_JSON}, {".csv", RENDER_CSV}, {".html", RENDER_HTML},
               {".xlsx", RENDER_XLSX}, {".svg", RENDER_SVG},   {".png", RENDER_PNG}, {".pdf", RENDER_PDF}};

/* A report on its way to a renderer. */
typedef struct {
    const report *r;
    render_form form;
    const render_style *style;
} order;

/* A page and a workbook show the limits as a table. */
static bc_status render_with_limits(const order *o, FILE *out, bc_error *err)
{
    limits_view view;
    const bc_status status = limits_view_open(&view, o->r) ? RENDERERS[o->form](&view.shown, o->style, out, err)
                                                            : bc_fail(err, BC_ERR_MEMORY, "no memory for the report");

    limits_view_close(&view);
    return status;
}

static bc_status render_order(void *data, FILE *out, bc_error *err)
{
    const order *o = data;

    if (o->form == RENDER_HTML || o->form == RENDER_XLSX)
        return render_with_limits(o, out, err);
    return RENDERERS[o->form](o->r, o->style, out, err);
}

/* Charts and workbooks are drawn by libraries that do not bear a lack of memory. */
static bool is_drawn_by_others(const report *r, render_form form)
{
    return form == RENDER_XLSX || (r->chart_count > 0 && render_form_shows_charts(form));
}

bc_status render_to(const report *r, render_form form, const render_style *style, const char *path,
                    bc_error *err)
{
    char *bytes = NULL;
    size_t count = 0;
    FILE *memory = bc_memory_stream_open(&bytes, &count);

    if (memory == NULL)
        return bc_fail(err, BC_ERR_MEMORY, "no memory for the report");

    order o = {r, form, style};
    bc_status status = is_drawn_by_others(r, form) ? apart(render_order, &o, memory, err) : render_order(&o, memory, err);

    /* The stream is memory: nothing else can have run out. */
    if (!bc_memory_stream_close(memory))
        status = bc_fail(err, BC_ERR_MEMORY, "no memory for the report");
    if (status == BC_OK)
        status = output_write(path, bytes, count, err);
    free(bytes);
    return status;
}

bool render_form_of(const char *path, render_form *form)
{
    const char *dot = strrchr(path, '.');

    for (size_t i = 0; dot != NULL && i < sizeof ENDINGS / sizeof *ENDINGS; i++) {
        if (strcasecmp(dot, ENDINGS[i].ending) == 0) {
            *form = ENDINGS[i].form;
            return true;
        }
    }
    return false;
}

bool render_form_is_chart(render_form form)
{
    return form == RENDER_SVG || form == RENDER_PNG || form == RENDER_PDF;
}

bool render_form_shows_charts(render_form form)
{
    return render_form_is_chart(form) || form == RENDER_HTML || form == RENDER_XLSX;
}
