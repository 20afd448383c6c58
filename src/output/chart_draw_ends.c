/* SPDX-License-Identifier: MIT */
/* chart_draw_ends.c - names at the right of the plot: of lines at their ends, and of limits. */
#include "output/chart_draw_internal.h"

#include <math.h>
#include <stdlib.h>

#define ROW    14.0
#define GAP    9.0 /* from the frame to the label */
#define MOST   200.0
#define AT_END 0.02 /* of the x range: lines that stop earlier have no end at the frame */
#define LINES  7    /* with more, a legend is easier to read */
#define MOVED  3.0  /* px; a label moved further needs a leader */

/* A label, and the height at which it wants to stand. */
typedef struct {
    const char *text;
    unsigned rgb;
    double wanted, y;
} end_label;

static const chart_font NAME = {CHART_SMALL, false, CHART_INK, 0.0};

static const report_point *last_point(const report_series *s)
{
    size_t count = s->point_count;

    while (count > 0 && !(chart_drawable(s->points[count - 1].x) && chart_drawable(s->points[count - 1].y)))
        count--;
    return count > 0 ? &s->points[count - 1] : NULL;
}

/* The series that ends a line: the last one of its name. */
static bool is_continued(const chart_panel *panel, size_t series)
{
    const report_chart *chart = panel->chart;

    for (size_t i = series + 1; i < chart->series_count; i++)
        if (chart->series[i].kind == REPORT_LINE && panel->styles[i] == panel->styles[series])
            return true;
    return false;
}

static bool is_line_to_label(const chart_panel *panel, size_t series)
{
    const report_series *s = &panel->chart->series[series];

    return s->kind == REPORT_LINE && *s->label != '\0' && !is_continued(panel, series);
}

bool chart_can_label_ends(chart_canvas *canvas, const chart_panel *panel)
{
    const double edge = panel->x.high - AT_END * (panel->x.high - panel->x.low);
    size_t lines = 0;

    for (size_t i = 0; i < panel->chart->series_count; i++) {
        const report_series *s = &panel->chart->series[i];
        const report_point *end = last_point(s);

        if (!is_line_to_label(panel, i))
            continue;
        if (end == NULL || end->x < edge || end->x > panel->x.high || !chart_inside(panel->y, end->y) ||
            chart_text_width(canvas, &NAME, s->label) > MOST)
            return false;
        lines++;
    }
    return lines <= LINES;
}

static size_t collect(const chart_panel *panel, end_label *labels)
{
    const report_chart *chart = panel->chart;
    size_t count = 0;

    for (size_t i = 0; panel->labels_at_ends && i < chart->series_count; i++) {
        const report_series *s = &chart->series[i];

        if (is_line_to_label(panel, i))
            labels[count++] = (end_label){s->label, chart_text_rgb(chart_style_of(panel, i).rgb),
                                          chart_py(panel, last_point(s)->y), 0.0};
    }
    for (size_t i = 0; i < chart->mark_count; i++) {
        const report_mark *mark = &chart->marks[i];

        if (mark->kind == REPORT_MARK_Y && *mark->label != '\0' && chart_inside(panel->y, mark->y))
            labels[count++] = (end_label){mark->label, 0x444444, chart_py(panel, mark->y), 0.0};
    }
    return count;
}

static int compare(const void *a, const void *b)
{
    const double wanted_a = ((const end_label *)a)->wanted, wanted_b = ((const end_label *)b)->wanted;

    return (wanted_a > wanted_b) - (wanted_a < wanted_b);
}

/* Moves labels apart by as little as can be, in the sense of least squares: without its row i the
 * height y - i*ROW must not fall from label to label, so neighbours that would are pooled at their
 * mean (Ayer et al., Ann. Math. Stat. 26 (1955) 641). */
static void spread(end_label *labels, size_t count, double low, double high)
{
    const double last = fmax(low, high - ROW * ((double)count - 1.0));

    for (size_t i = 0; i < count; i++) {
        size_t first = i;
        double mean = labels[i].wanted - ROW * (double)i;

        while (first > 0 && labels[first - 1].y > mean) {
            first--;
            mean = 0.0;
            for (size_t j = first; j <= i; j++)
                mean += (labels[j].wanted - ROW * (double)j) / (double)(i - first + 1);
        }
        for (size_t j = first; j <= i; j++)
            labels[j].y = mean;
    }
    for (size_t i = 0; i < count; i++)
        labels[i].y = fmax(low, fmin(labels[i].y, last)) + ROW * (double)i;
}

static end_label *collect_new(chart_canvas *canvas, const chart_panel *panel, size_t *count)
{
    end_label *labels = calloc(panel->chart->series_count + panel->chart->mark_count + 1, sizeof *labels);

    *count = 0;
    if (labels == NULL)
        canvas->failed = true;
    else
        *count = collect(panel, labels);
    return labels;
}

double chart_right_margin(chart_canvas *canvas, const chart_panel *panel)
{
    size_t count = 0;
    end_label *labels = collect_new(canvas, panel, &count);
    double widest = 0.0;

    for (size_t i = 0; i < count; i++)
        widest = fmax(widest, fmin(chart_text_width(canvas, &NAME, labels[i].text), MOST));
    free(labels);
    return CHART_EDGE + (count > 0 ? widest + GAP : GAP);
}

static void draw_label(chart_canvas *canvas, const end_label *label, double right)
{
    chart_font font = NAME;

    font.rgb = label->rgb;
    if (fabs(label->y - label->wanted) > MOVED) {
        chart_ink(canvas, label->rgb, 0.7);
        cairo_set_line_width(canvas->cr, 0.8);
        cairo_move_to(canvas->cr, right + 1.0, label->wanted);
        cairo_line_to(canvas->cr, right + GAP - 2.0, label->y);
        cairo_stroke(canvas->cr);
    }
    chart_text(canvas, &font, right + GAP, label->y + 0.35 * CHART_SMALL, MOST, label->text);
}

void chart_right_labels(chart_canvas *canvas, const chart_panel *panel)
{
    const chart_box *plot = &panel->plot;
    size_t count = 0;
    end_label *labels = collect_new(canvas, panel, &count);

    if (count > 0) {
        qsort(labels, count, sizeof *labels, compare);
        spread(labels, count, plot->top, plot->top + plot->height);
        for (size_t i = 0; i < count; i++)
            draw_label(canvas, &labels[i], plot->left + plot->width);
    }
    free(labels);
}
