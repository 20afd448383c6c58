/* SPDX-License-Identifier: MIT */
/* chart_draw_internal.h - what the parts of the drawing module share: paper, panels, text, styles.
 *
 * One unit is a pixel of a page 800 wide; y runs downwards. Cairo keeps the first error of a drawing
 * and does nothing more: it is asked once, at the end. */
#ifndef CHART_DRAW_INTERNAL_H
#define CHART_DRAW_INTERNAL_H

#include <cairo.h>

#include "output/chart_scale_internal.h"
#include "output/report.h"

#define CHART_PAGE_WIDTH 800.0
#define CHART_EDGE       18.0 /* free around everything */

/* Greys: of text and frame, of less important text, of the grid; the last contrasts least. */
#define CHART_INK  0x222222u
#define CHART_PALE 0x595959u
#define CHART_GRID 0xE4E4E4u

/* Sizes of text. */
#define CHART_TITLE  17.0
#define CHART_NORMAL 12.0
#define CHART_SMALL  11.0

typedef struct {
    cairo_t *cr;
    bool failed; /* an allocation failed: something is missing */
} chart_canvas;

typedef struct {
    double left, top, width, height;
} chart_box;

typedef struct {
    double size;
    bool bold;
    unsigned rgb;
    double align; /* 0: the text starts at x, 0.5: is centred there, 1: ends there */
} chart_font;

/* One chart on the page. */
typedef struct {
    const report_chart *chart;
    size_t *styles; /* of the series: equal for equal labels */
    chart_range x, y;
    chart_box plot;     /* inside the frame */
    double top, bottom; /* of all that belongs to the panel */
    double left_width;  /* of what stands left of the plot */
    size_t page;
    bool has_title;
    bool has_x_labels;   /* false where a panel below shows the same axis */
    bool labels_at_ends; /* of lines; else all series stand in the legend */
} chart_panel;

typedef struct {
    const report *r;
    chart_panel *panels; /* r->chart_count of them */
    size_t *styles;      /* as many as series in all of r's charts */
    bool inset; /* no head and foot, and no free edge above and below */
    size_t page_count;
    double head, foot; /* heights on each page */
} chart_plan;

/* ---- text: control characters and broken UTF-8 are shown as '?' ---- */
/* A copy of such a text that may be shown; NULL without memory. The caller frees it. */
char *chart_plain(const char *text);
void chart_ink(const chart_canvas *canvas, unsigned rgb, double alpha);
double chart_text_width(chart_canvas *canvas, const chart_font *font, const char *text);
/* One line on the baseline y, shortened to `room`. */
void chart_text(chart_canvas *canvas, const chart_font *font, double x, double y, double room,
                const char *text);
/* At most `most` lines, the first on the baseline y; answers how many. x as for one line. */
int chart_paragraph(chart_canvas *canvas, const chart_font *font, const chart_box *at, int most,
                    const char *text);
double chart_leading(const chart_font *font);

/* ---- panels ---- */
double chart_px(const chart_panel *panel, double x);
double chart_py(const chart_panel *panel, double y);
bool chart_inside(chart_range range, double value);

/* ---- styles: colour, dash and marker tell series apart, each alone where it must ---- */
typedef struct {
    unsigned rgb;
    size_t index;
} chart_style;
/* Gives each new label of a chart the next style. */
void chart_number_styles(const report_chart *chart, size_t *styles);
chart_style chart_style_of(const chart_panel *panel, size_t series);
/* Whether an earlier series of the chart has the same label. */
bool chart_is_repeated(const chart_panel *panel, size_t series);
/* Whether some series of that kind has this style. */
bool chart_has_kind(const chart_panel *panel, const chart_style *style, report_series_kind kind);
unsigned chart_text_rgb(unsigned rgb); /* dark enough to be read on white */
void chart_set_dash(const chart_canvas *canvas, size_t style);
void chart_marker(const chart_canvas *canvas, size_t style, double x, double y);

/* ---- parts of a panel ---- */
void chart_axes(chart_canvas *canvas, const chart_panel *panel);
double chart_left_width(chart_canvas *canvas, const chart_panel *panel); /* of all left of the plot */
double chart_foot_height(const chart_panel *panel); /* tick labels and label of the x axis */

void chart_areas(const chart_canvas *canvas, const chart_panel *panel);  /* regions and bars */
void chart_curves(const chart_canvas *canvas, const chart_panel *panel); /* all other series */
void chart_bar(const chart_canvas *canvas, const chart_style *style, const chart_box *bar);

void chart_mark_lines(chart_canvas *canvas, const chart_panel *panel);
void chart_mark_points(chart_canvas *canvas, const chart_panel *panel);
void chart_point_labels(chart_canvas *canvas, const chart_panel *panel);
/* The labels of vertical lines stand in rows above the plot. */
double chart_mark_rows_height(chart_canvas *canvas, const chart_panel *panel);

bool chart_can_label_ends(chart_canvas *canvas, const chart_panel *panel);
double chart_right_margin(chart_canvas *canvas, const chart_panel *panel);
void chart_right_labels(chart_canvas *canvas, const chart_panel *panel);
/* The legend stands above the plot and, if drawn, ends at y. Answers its height. */
double chart_legend(chart_canvas *canvas, const chart_panel *panel, bool drawn, double y);

/* ---- pages ---- */
/* Places everything; pages are no higher than `most` if a single panel is not. */
void chart_plan_pages(chart_canvas *canvas, chart_plan *plan, double most);
double chart_page_height(const chart_plan *plan, size_t page);
void chart_draw_page(chart_canvas *canvas, const chart_plan *plan, size_t page);

#endif
