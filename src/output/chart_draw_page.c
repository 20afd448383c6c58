/* SPDX-License-Identifier: MIT */
/* chart_draw_page.c - panels below each other on pages, with title and state above, caution below. */
#include "output/chart_draw_internal.h"

#include "output/text_internal.h"

#include <math.h>
#include <stdio.h>
#include <string.h>

#define PLOT_ALONE    340.0 /* heights of a plot: the only one, */
#define PLOT_OF_TWO   230.0
#define PLOT_OF_MANY  180.0
#define NAME_ROW      26.0 /* of a y axis of names */
#define PANEL_GAP     20.0
#define TITLE_HEIGHT  22.0 /* of a panel */
#define STATE_LINES   3
#define GASES_MAX     4 /* that the head of a page names */
#define GAS_LINES     2
#define VERDICT_LINES 4
#define CAUTION_LINES 4

static const chart_font TITLE = {CHART_TITLE, true, CHART_INK, 0.0};
static const chart_font STATE = {CHART_SMALL, false, CHART_PALE, 0.0};
static const chart_font CAUTION = {CHART_SMALL, false, CHART_INK, 0.0};
static const chart_font MAKER = {10.0, false, CHART_PALE, 1.0};
static const chart_font PANEL = {13.0, true, CHART_INK, 0.0};

static const double INNER = CHART_PAGE_WIDTH - 2.0 * CHART_EDGE;

/* A value beyond a fixed range stays within what Cairo can count. */
static double within_paper(double at)
{
    return fmax(-20000.0, fmin(at, 20000.0));
}

double chart_px(const chart_panel *panel, double x)
{
    return within_paper(panel->plot.left +
                        panel->plot.width * ((x - panel->x.low) / (panel->x.high - panel->x.low)));
}

/* Names are read from above, numbers rise from below. */
double chart_py(const chart_panel *panel, double y)
{
    const double from_above = panel->chart->y.name_count > 0 ? y - panel->y.low : panel->y.high - y;

    return within_paper(panel->plot.top + panel->plot.height * (from_above / (panel->y.high - panel->y.low)));
}

bool chart_inside(chart_range range, double value)
{
    const double little = 1e-9 * (range.high - range.low); /* what rounding may do on the frame */

    return value >= range.low - little && value <= range.high + little;
}

/* ---- placing ---- */

static bool share_x(const report_chart *a, const report_chart *b)
{
    return *a->x.label != '\0' && strcmp(a->x.label, b->x.label) == 0 && strcmp(a->x.unit, b->x.unit) == 0 &&
           a->x.is_time == b->x.is_time && a->x.name_count == 0 && b->x.name_count == 0;
}

static double plot_height(const report_chart *chart, size_t count)
{
    const double usual = count == 1 ? PLOT_ALONE : count == 2 ? PLOT_OF_TWO : PLOT_OF_MANY;

    return chart->y.name_count > 0 ? fmax(80.0, NAME_ROW * (double)chart->y.name_count) : usual;
}

/* Charts that share their x axis get the range that holds all of theirs. */
static void join_ranges(chart_panel *panels, size_t first, size_t end)
{
    chart_range all = panels[first].x;

    for (size_t i = first; i < end; i++) {
        all.low = fmin(all.low, panels[i].x.low);
        all.high = fmax(all.high, panels[i].x.high);
    }
    for (size_t i = first; i < end; i++)
        panels[i].x = all;
}

static void plan_ranges(chart_plan *plan)
{
    const size_t count = plan->r->chart_count;
    size_t *styles = plan->styles;

    for (size_t i = 0; i < count; i++) {
        chart_panel *panel = &plan->panels[i];
        const report_chart *chart = &plan->r->charts[i];

        panel->chart = chart;
        panel->styles = styles;
        chart_number_styles(chart, styles);
        styles += chart->series_count;
        panel->x = chart_range_of(chart, REPORT_X);
        panel->y = chart_range_of(chart, REPORT_Y);
        panel->plot.height = plot_height(chart, count);
        panel->has_title = *chart->title != '\0' && (count > 1 || plan->inset || strcmp(chart->title, plan->r->title) != 0);
        panel->has_x_labels = true;
    }
    for (size_t first = 0, end = 1; end <= count; end++) {
        if (end < count && share_x(plan->panels[first].chart, plan->panels[end].chart))
            continue;
        join_ranges(plan->panels, first, end);
        first = end;
    }
}

/* All plots of a page stand exactly below each other. */
static void plan_margins(chart_canvas *canvas, chart_plan *plan)
{
    double left = 0.0, right = 0.0;

    for (size_t i = 0; i < plan->r->chart_count; i++) {
        chart_panel *panel = &plan->panels[i];

        panel->labels_at_ends = chart_can_label_ends(canvas, panel);
        panel->left_width = chart_left_width(canvas, panel);
        left = fmax(left, CHART_EDGE + panel->left_width);
        right = fmax(right, chart_right_margin(canvas, panel));
    }
    for (size_t i = 0; i < plan->r->chart_count; i++) {
        plan->panels[i].plot.left = left;
        plan->panels[i].plot.width = CHART_PAGE_WIDTH - left - right;
    }
}

/* What stands above the plot of a panel. */
static double head_of(chart_canvas *canvas, const chart_panel *panel)
{
    return (panel->has_title ? TITLE_HEIGHT : 0.0) + chart_legend(canvas, panel, false, 0.0) +
           chart_mark_rows_height(canvas, panel);
}

/* Puts a panel with its top at y; answers where the next one can start. */
static double put_panel(chart_canvas *canvas, chart_panel *panel, size_t page, double y)
{
    panel->page = page;
    panel->top = y;
    panel->plot.top = y + head_of(canvas, panel);
    panel->bottom = panel->plot.top + panel->plot.height + chart_foot_height(panel);
    return panel->bottom + PANEL_GAP;
}

static void plan_panels(chart_canvas *canvas, chart_plan *plan, double most)
{
    const size_t count = plan->r->chart_count;
    double y = plan->head;
    size_t page = 0;

    for (size_t i = 0; i < count; i++) {
        chart_panel *panel = &plan->panels[i];
        const bool shares = i > 0 && share_x(panel[-1].chart, panel->chart);

        if (shares) {
            panel[-1].has_x_labels = false;
            y = put_panel(canvas, panel - 1, page, panel[-1].top);
        }
        double next = put_panel(canvas, panel, page, y);
        if (panel->bottom + plan->foot > most && i > 0 && panel[-1].page == page) {
            panel[-1].has_x_labels = true;
            (void)put_panel(canvas, panel - 1, page, panel[-1].top);
            next = put_panel(canvas, panel, ++page, plan->head);
        }
        y = next;
    }
    plan->page_count = page + 1;
}

/* ---- drawing ---- */

/* One line of the head, or a few; answers where the next begins. */
static double put_line(chart_canvas *canvas, const chart_font *font, double y, int lines, const char *lead, const char *text)
{
    const chart_box box = {CHART_EDGE, y - 4.0, INNER, 0.0};
    char line[900];

    (void)snprintf(line, sizeof line, "%.40s%s%.800s", lead, *lead != '\0' ? ": " : "", text);
    return y + chart_paragraph(canvas, font, &box, lines, line) * chart_leading(font);
}

/* A chart is sent without its report: it says what the verdict is, and tells the gases apart. */
static double draw_subject(chart_canvas *canvas, const report *r, double y)
{
    if (r->verdict != NULL)
        y = put_line(canvas, &CAUTION, y, VERDICT_LINES, "Verdict", r->verdict);
    if (r->state.present)
        y = put_line(canvas, &STATE, y, STATE_LINES, "", r->state.text);
    for (size_t i = 0; i < r->gas_count && r->gas_count > 1 && i < GASES_MAX; i++) {
        char lead[TEXT_LEAD_MAX];

        text_gas_lead(r, i, lead);
        y = put_line(canvas, &STATE, y, GAS_LINES, lead, i + 1 == GASES_MAX && r->gas_count > GASES_MAX ? "and further ones" : r->gases[i].name);
    }
    return y;
}

/* A page about one gas names it; chart_paragraph() cleans and folds what users wrote. */
static double draw_head(chart_canvas *canvas, const report *r)
{
    const chart_box title = {CHART_EDGE, CHART_EDGE + 14.0, INNER, 0.0};
    char text[256];

    (void)snprintf(text, sizeof text, "%.100s%s%.140s", r->title, r->gas_count == 1 ? ": " : "", r->gas_count == 1 ? r->gases[0].name : "");
    const int title_lines = chart_paragraph(canvas, &TITLE, &title, 2, text);

    return draw_subject(canvas, r, title.top + title_lines * chart_leading(&TITLE));
}

/* The caution and who drew this; `y` is the upper end. Answers the height. */
static double draw_foot(chart_canvas *canvas, const report *r, double y)
{
    char text[900];
    double height = 0.0;

    if (r->caution != NULL) {
        const chart_box caution = {CHART_EDGE, y + 16.0, INNER, 0.0};

        snprintf(text, sizeof text, "Caution: %s", r->caution);
        height +=
            8.0 + chart_leading(&CAUTION) * chart_paragraph(canvas, &CAUTION, &caution, CAUTION_LINES, text);
        cairo_set_line_width(canvas->cr, 1.0);
        chart_ink(canvas, 0xBBBBBB, 1.0);
        cairo_move_to(canvas->cr, CHART_EDGE, y);
        cairo_line_to(canvas->cr, CHART_PAGE_WIDTH - CHART_EDGE, y);
        cairo_stroke(canvas->cr);
    }
    snprintf(text, sizeof text, "bluecone %s %s", r->version, r->command);
    chart_text(canvas, &MAKER, CHART_PAGE_WIDTH - CHART_EDGE, y + height + 10.0, INNER, text);
    return height + 10.0 + CHART_EDGE - 4.0;
}

void chart_plan_pages(chart_canvas *canvas, chart_plan *plan, double most)
{
    plan->head = plan->inset ? 0.0 : draw_head(canvas, plan->r) + 8.0;
    plan->foot = plan->inset ? 0.0 : draw_foot(canvas, plan->r, 0.0);
    plan_ranges(plan);
    plan_margins(canvas, plan);
    plan_panels(canvas, plan, most);
}

static double end_of(const chart_plan *plan, size_t page)
{
    double end = 0.0;

    for (size_t i = 0; i < plan->r->chart_count; i++)
        if (plan->panels[i].page == page)
            end = plan->panels[i].bottom + PANEL_GAP / 2.0;
    return end;
}

double chart_page_height(const chart_plan *plan, size_t page)
{
    return ceil(end_of(plan, page) + plan->foot);
}

static void draw_panel(chart_canvas *canvas, const chart_panel *panel)
{
    const double rows = chart_mark_rows_height(canvas, panel);

    if (panel->has_title)
        chart_text(canvas, &PANEL, panel->plot.left, panel->top + 12.0,
                   CHART_PAGE_WIDTH - CHART_EDGE - panel->plot.left, panel->chart->title);
    chart_legend(canvas, panel, true, panel->plot.top - rows);
    chart_axes(canvas, panel);
    chart_areas(canvas, panel);
    chart_mark_lines(canvas, panel);
    chart_curves(canvas, panel);
    chart_mark_points(canvas, panel);
    chart_right_labels(canvas, panel);
}

void chart_draw_page(chart_canvas *canvas, const chart_plan *plan, size_t page)
{
    chart_ink(canvas, 0xFFFFFF, 1.0);
    cairo_paint(canvas->cr);
    if (!plan->inset)
        draw_head(canvas, plan->r);
    for (size_t i = 0; i < plan->r->chart_count; i++)
        if (plan->panels[i].page == page)
            draw_panel(canvas, &plan->panels[i]);
    if (!plan->inset)
        draw_foot(canvas, plan->r, end_of(plan, page));
}
