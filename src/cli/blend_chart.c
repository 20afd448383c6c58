/* SPDX-License-Identifier: MIT */
/* blend_chart.c - a sweep as panels of a chart. */
#include "cli/blend_sweep.h"

#include <math.h>
#include <stdio.h>

#define POINTS 160 /* of a curve: smooth at the width of a page */

static void add_marks(report *r, size_t chart, const sweep_table *t, const blend_case *c, const bc_limit *limit, bool upper)
{
    const double bound = upper ? limit->max : limit->min;
    double place[BC_CROSSING_MAX];
    char label[64];
    const size_t count = bc_line_crossings(&t->line, c->within, (size_t)(limit - c->within->limits), bound, place, BC_CROSSING_MAX);

    (void)snprintf(label, sizeof label, "%s %.6g", upper ? "max" : "min", bound);
    report_add_mark(r, chart, REPORT_MARK_Y, 0.0, bound, label);
    for (size_t i = 0; i < count; i++) {
        const double share = 100.0 * sweep_share_at(t, place[i]);

        (void)snprintf(label, sizeof label, "%.4g %%", share);
        report_add_mark(r, chart, REPORT_MARK_X, share, 0.0, label);
    }
}

static size_t open_panel(report *r, const sweep_table *t, const blend_case *c, const sweep_column *column)
{
    char x[BC_NAME_MAX + 32];
    char text[BC_WORD_MAX];
    char title[SWEEP_HEADING_MAX];

    (void)snprintf(text, sizeof text, "%s", column->id);
    sweep_heading(c, column, title, sizeof title);
    (void)snprintf(x, sizeof x, "%.80s, by %s", blend_part_name(c, c->swept), bc_blend_basis_text(c->by));
    const size_t chart = report_add_chart(r, text, title);

    report_set_axis(r, chart, REPORT_X, x, "%");
    report_set_range(r, chart, REPORT_X, 100.0 * t->low, 100.0 * t->high);
    report_set_axis(r, chart, REPORT_Y, text, column->unit[0] == '1' && column->unit[1] == '\0' ? "" : column->unit);
    if (column->is_limit) {
        const bc_limit *limit = &c->within->limits[column->index];

        if (limit->has_min)
            add_marks(r, chart, t, c, limit, false);
        if (limit->has_max)
            add_marks(r, chart, t, c, limit, true);
    }
    return chart;
}

/* A panel that is being drawn. */
typedef struct {
    size_t chart, series;
    bool open; /* the curve goes on at the next point */
} panel;

/* One more point; where the gas has no figure, y is NaN, the curve has a gap. */
static void add_point(report *r, panel *p, double share, double y)
{
    if (!isfinite(y)) {
        p->open = false;
        return;
    }
    if (!p->open)
        p->series = report_add_series(r, p->chart, REPORT_LINE, "");
    p->open = true;
    report_add_point(r, p->chart, p->series, 100.0 * share, y);
}

bc_status sweep_chart(report *r, const sweep_table *t, const blend_case *c, bc_error *err)
{
    panel panels[SWEEP_COLUMNS_MAX];

    for (size_t k = 0; k < t->count; k++)
        panels[k] = (panel){.chart = open_panel(r, t, c, &t->column[k])};
    for (size_t i = 0; i <= POINTS; i++) {
        const double place = (double)i / POINTS;
        const bc_gas gas = bc_line_gas(&t->line, place);
        double row[SWEEP_COLUMNS_MAX];
        bc_subject here;
        const bc_status status = bc_subject_make(&c->parts.reference, &gas, NULL, &here, err);

        if (status != BC_OK)
            return status;
        sweep_row(t, c, &here, row);
        for (size_t k = 0; k < t->count; k++)
            add_point(r, &panels[k], sweep_share_at(t, place), row[k]);
    }
    return BC_OK;
}
