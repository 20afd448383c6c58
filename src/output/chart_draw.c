/* SPDX-License-Identifier: MIT */
/* chart_draw.c - the module's one function: a page of panels on the surface that the form asks for. */
#include "output/chart_internal.h"

#include "output/memory_stream_internal.h"
#include "output/chart_draw_internal.h"
#include "output/chart_draw_svg_internal.h"

#include <cairo-pdf.h>
#include <cairo-svg.h>

#include <math.h>
#include <stdlib.h>

#define PIXELS    2.0     /* of a PNG for each unit: sharp on today's screens, and in print */
#define A4_WIDTH  595.276 /* points, ISO 216: 210 mm x 297 mm */
#define A4_HEIGHT 841.89

static const double POINTS = A4_WIDTH / CHART_PAGE_WIDTH; /* of a PDF for each unit */

static cairo_status_t write_bytes(void *out, const unsigned char *bytes, unsigned count)
{
    return fwrite(bytes, 1, count, out) == count ? CAIRO_STATUS_SUCCESS : CAIRO_STATUS_WRITE_ERROR;
}

/* Letters as the font has them, not bent to pixels: all forms then have the same layout. */
static cairo_t *open_context(cairo_surface_t *surface, double scale)
{
    cairo_t *cr = cairo_create(surface);
    cairo_font_options_t *options = cairo_font_options_create();

    cairo_font_options_set_antialias(options, CAIRO_ANTIALIAS_GRAY);
    cairo_font_options_set_hint_style(options, CAIRO_HINT_STYLE_NONE);
    cairo_font_options_set_hint_metrics(options, CAIRO_HINT_METRICS_OFF);
    cairo_set_font_options(cr, options);
    cairo_font_options_destroy(options);
    cairo_scale(cr, scale, scale);
    return cr;
}

static chart_outcome outcome_of(cairo_status_t status, bool failed, chart_order *order)
{
    if (failed || status == CAIRO_STATUS_NO_MEMORY)
        return CHART_NO_MEMORY;
    if (status == CAIRO_STATUS_SUCCESS)
        return CHART_DRAWN;
    snprintf(order->why, sizeof order->why, "%s", cairo_status_to_string(status));
    return CHART_NOT_DRAWN;
}

/* What came of the drawing and of the surface that it was made on. */
static cairo_status_t close_both(cairo_t *cr, cairo_surface_t *surface)
{
    const cairo_status_t drawing = cairo_status(cr);

    cairo_destroy(cr);
    cairo_surface_finish(surface);
    const cairo_status_t writing = cairo_surface_status(surface);
    cairo_surface_destroy(surface);
    return drawing == CAIRO_STATUS_SUCCESS ? writing : drawing;
}

static cairo_status_t draw_svg(chart_canvas *canvas, const chart_plan *plan, FILE *out)
{
    char *bytes = NULL;
    size_t count = 0;
    FILE *memory = bc_memory_stream_open(&bytes, &count);

    if (memory == NULL)
        return CAIRO_STATUS_NO_MEMORY;

    cairo_surface_t *surface = cairo_svg_surface_create_for_stream(write_bytes, memory, CHART_PAGE_WIDTH,
                                                                   chart_page_height(plan, 0));
    cairo_svg_surface_set_document_unit(surface, CAIRO_SVG_UNIT_PX);
    canvas->cr = open_context(surface, 1.0);
    chart_draw_page(canvas, plan, 0);

    cairo_status_t status = close_both(canvas->cr, surface);
    if (!bc_memory_stream_close(memory))
        status = CAIRO_STATUS_NO_MEMORY;
    if (status == CAIRO_STATUS_SUCCESS && !chart_write_svg(plan->r, bytes, out))
        status = CAIRO_STATUS_NO_MEMORY;
    free(bytes);
    return status;
}

static cairo_status_t draw_png(chart_canvas *canvas, const chart_plan *plan, FILE *out)
{
    cairo_surface_t *surface = cairo_image_surface_create(
        CAIRO_FORMAT_RGB24, (int)(PIXELS * CHART_PAGE_WIDTH), (int)(PIXELS * chart_page_height(plan, 0)));

    canvas->cr = open_context(surface, PIXELS);
    chart_draw_page(canvas, plan, 0);

    const cairo_status_t drawing = cairo_status(canvas->cr);
    const cairo_status_t writing = cairo_surface_write_to_png_stream(surface, write_bytes, out);
    const cairo_status_t closing = close_both(canvas->cr, surface);
    return drawing != CAIRO_STATUS_SUCCESS ? drawing : writing != CAIRO_STATUS_SUCCESS ? writing : closing;
}

/* A date would make each run's file another one. */
static void describe_pdf(chart_canvas *canvas, cairo_surface_t *surface, const report *r)
{
    char *title = chart_plain(r->title);
    char *version = chart_plain(r->version);
    char maker[80] = "";

    if (title == NULL || version == NULL) {
        canvas->failed = true;
    } else {
        snprintf(maker, sizeof maker, "bluecone %.40s", version);
        cairo_pdf_surface_set_metadata(surface, CAIRO_PDF_METADATA_TITLE, title);
        cairo_pdf_surface_set_metadata(surface, CAIRO_PDF_METADATA_CREATOR, maker);
    }
    cairo_pdf_surface_set_metadata(surface, CAIRO_PDF_METADATA_CREATE_DATE, "");
    cairo_pdf_surface_set_metadata(surface, CAIRO_PDF_METADATA_MOD_DATE, "");
    free(title);
    free(version);
}

static cairo_status_t draw_pdf(chart_canvas *canvas, const chart_plan *plan, FILE *out)
{
    cairo_surface_t *surface = cairo_pdf_surface_create_for_stream(write_bytes, out, A4_WIDTH, A4_HEIGHT);

    describe_pdf(canvas, surface, plan->r);
    canvas->cr = open_context(surface, POINTS);
    for (size_t page = 0; page < plan->page_count; page++) {
        cairo_pdf_surface_set_size(surface, A4_WIDTH, POINTS * chart_page_height(plan, page));
        chart_draw_page(canvas, plan, page);
        cairo_show_page(canvas->cr);
    }
    return close_both(canvas->cr, surface);
}

/* Texts are measured on a surface that keeps what is drawn and shows it to nobody. */
static cairo_status_t measure(chart_canvas *canvas, chart_plan *plan, chart_form form)
{
    cairo_surface_t *surface = cairo_recording_surface_create(CAIRO_CONTENT_COLOR_ALPHA, NULL);

    canvas->cr = open_context(surface, 1.0);
    chart_plan_pages(canvas, plan, form == CHART_PDF ? A4_HEIGHT / POINTS : HUGE_VAL);
    return close_both(canvas->cr, surface);
}

static bool open_plan(chart_plan *plan, const chart_order *order)
{
    const report *r = order->r;
    size_t series = 0;

    for (size_t i = 0; i < r->chart_count; i++)
        series += r->charts[i].series_count;
    *plan = (chart_plan){.r = r,
                         .inset = order->inset,
                         .panels = calloc(r->chart_count + 1, sizeof *plan->panels),
                         .styles = calloc(series + 1, sizeof *plan->styles)};
    return plan->panels != NULL && plan->styles != NULL;
}

chart_outcome bluecone_chart_draw(unsigned abi, chart_order *order)
{
    chart_canvas canvas = {0};
    chart_plan plan;
    cairo_status_t status = CAIRO_STATUS_NO_MEMORY;

    if (abi != CHART_ABI)
        return CHART_OTHER_ABI;
    if (open_plan(&plan, order))
        status = measure(&canvas, &plan, order->form);
    if (status == CAIRO_STATUS_SUCCESS)
        status = order->form == CHART_SVG   ? draw_svg(&canvas, &plan, order->out)
                 : order->form == CHART_PNG ? draw_png(&canvas, &plan, order->out)
                                            : draw_pdf(&canvas, &plan, order->out);
    free(plan.panels);
    free(plan.styles);
    return outcome_of(status, canvas.failed, order);
}
