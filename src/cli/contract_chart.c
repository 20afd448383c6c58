/* SPDX-License-Identifier: MIT */
/* contract_chart.c - margins as bars, and the plane of Wobbe index and relative density with the contract's window. */
#include "cli/contract_worst.h"

#include <math.h>
#include <stdio.h>
#include <string.h>

#define BAR_MAX 100.0     /* per cent: a margin beyond it is no more telling */
#define ELLIPSE_POINTS 72
#define PLANE_MARGIN 0.12 /* of the span: where a side without bound is drawn */

static void add_bars(report *r, const contract_case *c, size_t gas)
{
    char title[BC_NAME_MAX + 60];
    char id[40];

    (void)snprintf(id, sizeof id, "margins-%zu", gas + 1);
    (void)snprintf(title, sizeof title, "Margins of %.120s, cut at 100 %%", c->gases.each[gas].loaded.name);
    const size_t chart = report_add_chart(r, id, title);
    const size_t series = report_add_series(r, chart, REPORT_BARS, "margin");
    size_t place = 0;

    report_set_axis(r, chart, REPORT_X, "margin to the nearer bound, of the window or the bound; left of 0: outside", "%");
    report_set_axis(r, chart, REPORT_Y, "", "");
    for (size_t i = 0; i < r->limit_count; i++) {
        const report_limit *row = &r->limits[i];

        if (row->gas != gas || !row->has_percent)
            continue;
        report_add_name(r, chart, REPORT_Y, row->id);
        report_add_point(r, chart, series, fmax(-BAR_MAX, fmin(BAR_MAX, row->percent)), (double)place++);
    }
}

/* One axis of the plane: a limit's own figure where there is one, else a quantity at the contract's state. */
typedef struct {
    const bc_limit *limit; /* NULL: no limit on it */
    size_t quantity;
    double low, high;      /* of what is drawn */
} plane_axis;

static bc_status find_axis(const contract_case *c, const char *id, plane_axis *axis, bc_error *err)
{
    axis->limit = NULL;
    axis->low = HUGE_VAL;
    axis->high = -HUGE_VAL;
    for (size_t i = 0; i < c->own_limits; i++)
        if (strcmp(c->contract->limits[i].id, id) == 0)
            axis->limit = &c->contract->limits[i];
    return bc_quantity_find(id, &axis->quantity, err);
}

static bc_status value_on(const contract_case *c, const plane_axis *axis, const bc_gas *gas, double *value)
{
    bc_subject here;

    if (axis->limit)
        return bc_limit_value(c->contract, (size_t)(axis->limit - c->contract->limits), gas, value, NULL);
    const bc_status status = bc_subject_make(&c->gases.reference, gas, NULL, &here, NULL);

    return status == BC_OK ? bc_quantity_value(axis->quantity, &here, value, NULL) : status;
}

static void stretch(plane_axis *axis, double value)
{
    axis->low = fmin(axis->low, value);
    axis->high = fmax(axis->high, value);
}

/* A gas on the plane, with the covariance of its place. */
typedef struct {
    double x, y, xx, xy, yy;
    bool known; /* the covariance */
} plane_point;

static bool locate(const contract_case *c, const plane_axis axes[2], const loaded_gas *gas, plane_point *p)
{
    *p = (plane_point){.known = gas->scattered};
    if (value_on(c, &axes[0], &gas->gas, &p->x) != BC_OK || value_on(c, &axes[1], &gas->gas, &p->y) != BC_OK)
        return false;
    for (size_t k = 0; gas->scattered && k < gas->composition.spread.count; k++) {
        bc_gas moved = gas->gas;
        double x = p->x;
        double y = p->y;

        for (size_t i = 0; i < bc_species_count(); i++)
            moved.x[i] = fmax(0.0, moved.x[i] + gas->composition.spread.dx[k][i]);
        if (value_on(c, &axes[0], &moved, &x) != BC_OK || value_on(c, &axes[1], &moved, &y) != BC_OK)
            continue;
        p->xx += (x - p->x) * (x - p->x);
        p->xy += (x - p->x) * (y - p->y);
        p->yy += (y - p->y) * (y - p->y);
    }
    return true;
}

/* The ellipse that holds a share of a normal distribution in two dimensions: radius^2 = -2 ln(1 - share) in the metric of
 * the covariance, whose Cholesky factor maps the circle. */
static void add_ellipse(report *r, size_t chart, const char *label, const plane_point *p, double share)
{
    const size_t series = report_add_series(r, chart, REPORT_OUTLINE, label);
    const double radius = sqrt(-2.0 * log(1.0 - share));
    const double l11 = sqrt(p->xx);
    const double l21 = l11 > 0.0 ? p->xy / l11 : 0.0;
    const double l22 = sqrt(fmax(0.0, p->yy - l21 * l21));

    for (size_t i = 0; i <= ELLIPSE_POINTS; i++) {
        const double angle = 2.0 * acos(-1.0) * (double)i / ELLIPSE_POINTS;

        report_add_point(r, chart, series, p->x + radius * l11 * cos(angle), p->y + radius * (l21 * cos(angle) + l22 * sin(angle)));
    }
}

static void add_gas(report *r, const contract_case *c, size_t chart, plane_axis axes[2], size_t gas)
{
    const loaded_gas *loaded = &c->gases.each[gas].loaded;
    plane_point p;

    if (!locate(c, axes, loaded, &p))
        return;
    const size_t series = report_add_series(r, chart, REPORT_POINTS, loaded->name);

    report_add_point(r, chart, series, p.x, p.y);
    if (p.known && p.xx > 0.0)
        add_ellipse(r, chart, loaded->name, &p, c->coverage);
    stretch(&axes[0], p.x);
    stretch(&axes[1], p.y);
}

/* The ends of the window on an axis; a side without bound ends where the drawing does. */
static void window_on(plane_axis *axis, double *low, double *high)
{
    if (axis->limit && axis->limit->has_min)
        stretch(axis, axis->limit->min);
    if (axis->limit && axis->limit->has_max)
        stretch(axis, axis->limit->max);
    const double room = PLANE_MARGIN * (axis->high > axis->low ? axis->high - axis->low : fabs(axis->high));

    axis->low -= room;
    axis->high += room;
    *low = axis->limit && axis->limit->has_min ? axis->limit->min : axis->low;
    *high = axis->limit && axis->limit->has_max ? axis->limit->max : axis->high;
}

static void add_window(report *r, size_t chart, plane_axis axes[2])
{
    double x[2];
    double y[2];

    window_on(&axes[0], &x[0], &x[1]);
    window_on(&axes[1], &y[0], &y[1]);
    report_set_range(r, chart, REPORT_X, axes[0].low, axes[0].high);
    report_set_range(r, chart, REPORT_Y, axes[1].low, axes[1].high);
    if (!axes[0].limit && !axes[1].limit)
        return;
    const size_t series = report_add_series(r, chart, REPORT_REGION, "window of the contract");

    for (size_t i = 0; i < 4; i++)
        report_add_point(r, chart, series, x[i == 1 || i == 2], y[i >= 2]);
}

static bc_status form_on(const contract_case *c, const plane_axis *axis, bc_ratio *form, bc_error *err)
{
    if (axis->limit)
        return bc_limit_ratio(c->contract, (size_t)(axis->limit - c->contract->limits), form, err);
    return bc_ratio_of_quantity(axis->quantity, &c->gases.reference, form, err);
}

/* What the allowed gases can reach, where --worst asks for it. */
static bc_status add_region(report *r, const contract_case *c, size_t chart, plane_axis axes[2], bc_error *err)
{
    bc_ratio forms[2];
    region_outline outline;

    if (!c->a->value[OPTION_worst])
        return BC_OK;
    bc_status status = form_on(c, &axes[0], &forms[0], err);

    if (status == BC_OK)
        status = form_on(c, &axes[1], &forms[1], err);
    if (status == BC_OK)
        status = region_trace(c, forms, &outline, err);
    if (status != BC_OK)
        return status;
    if (outline.untraced)
        report_add_warning(r, "No reachable region is drawn on the plane: the contract has too many limits to trace it.");
    region_draw(r, chart, &outline);
    for (size_t k = 0; k < outline.count; k++) {
        stretch(&axes[0], outline.lower[k].x);
        stretch(&axes[0], outline.upper[k].x);
        stretch(&axes[1], outline.lower[k].y);
        stretch(&axes[1], outline.upper[k].y);
    }
    return BC_OK;
}

static void label_axis(report *r, const contract_case *c, size_t chart, report_axis_id where, const plane_axis *axis)
{
    const bc_quantity *q = bc_quantity_at(axis->quantity);
    char state[64];
    char label[200];
    char unit[BC_LIMIT_ID_MAX];

    state_text(axis->limit ? &c->contract->references[axis->limit->reference].state : &c->contract->state, state, sizeof state);
    (void)snprintf(label, sizeof label, "%s, %s", q->label, state);
    (void)snprintf(unit, sizeof unit, "%s", axis->limit ? axis->limit->unit : q->unit);
    report_set_axis(r, chart, where, label, strcmp(unit, "1") == 0 ? "" : unit);
}

bc_status contract_charts(report *r, const contract_case *c, bc_error *err)
{
    plane_axis axes[2];
    bc_status status = find_axis(c, "relative-density", &axes[0], err);

    if (status == BC_OK)
        status = find_axis(c, "wobbe-gross", &axes[1], err);
    if (status != BC_OK)
        return status;
    for (size_t i = 0; i < c->judged; i++)
        add_bars(r, c, i);
    const size_t chart = report_add_chart(r, "plane", "Wobbe index and relative density, with the window of the contract");

    label_axis(r, c, chart, REPORT_X, &axes[0]);
    label_axis(r, c, chart, REPORT_Y, &axes[1]);
    for (size_t i = 0; i < c->gases.count; i++)
        add_gas(r, c, chart, axes, i);
    status = add_region(r, c, chart, axes, err);
    if (status == BC_OK && axes[0].high >= axes[0].low && axes[1].high >= axes[1].low)
        add_window(r, chart, axes);
    return status;
}
