/* SPDX-License-Identifier: MIT */
/* contract_region.c - what the gases that a contract allows can reach on the plane: its outline, slice by slice. */
#include "cli/contract_worst.h"

#define SLICE_HALF 2e-4 /* of the span: half the thickness, finer than a pixel, thick enough to hold gases */

static bool place(const bc_ratio axes[2], const bc_gas *gas, report_point *p)
{
    return bc_ratio_evaluate(&axes[0], gas, &p->x, NULL) == BC_OK && bc_ratio_evaluate(&axes[1], gas, &p->y, NULL) == BC_OK;
}

/* The lowest and highest gas of a slice; a slice that lets no gas in, or none that could be found, is passed over. */
static bc_status add_slice(bc_space *space, const bc_ratio axes[2], double at, double half, region_outline *o, bc_error *err)
{
    bc_space_limit *slice = &space->limits[space->limit_count];
    bc_worst *worst = NULL;
    bc_extremes e;

    *slice = (bc_space_limit){.ratio = axes[0], .min = at - half, .max = at + half};
    space->limit_count++;
    bc_status status = bc_worst_open(space, &worst, err);

    if (status == BC_OK)
        status = bc_worst_ratio(worst, &axes[1], &e, err);
    const bool found = status == BC_OK && place(axes, &e.min.gas, &o->lower[o->count]) && place(axes, &e.max.gas, &o->upper[o->count]);

    space->limit_count--;
    bc_worst_close(worst);
    o->count += found;
    return status == BC_ERR_MEMORY || status == BC_ERR_FILE ? status : BC_OK;
}

/* Slices from one end to the other; those at the ends lie within it. */
static bc_status trace(bc_space *space, const bc_ratio axes[2], const bc_extremes *ends, region_outline *o, bc_error *err)
{
    bc_status status = BC_OK;

    const double span = ends->max.value - ends->min.value;
    const double half = SLICE_HALF * span;

    for (size_t k = 0; k <= REGION_SLICES && status == BC_OK; k++)
        status = add_slice(space, axes, ends->min.value + half + (span - 2.0 * half) * (double)k / REGION_SLICES, half, o, err);
    return status;
}

bc_status region_trace(const contract_case *c, const bc_ratio axes[2], region_outline *o, bc_error *err)
{
    worst_case w;
    bc_extremes ends;
    bc_status status = worst_open(&w, c, err);

    o->count = 0;
    o->untraced = status == BC_OK && w.space->limit_count >= BC_SPACE_LIMIT_MAX;
    if (status == BC_OK && !bc_worst_is_empty(w.worst) && !o->untraced) {
        status = bc_worst_ratio(w.worst, &axes[0], &ends, err);
        if (status == BC_OK)
            status = trace(w.space, axes, &ends, o, err);
    }
    worst_close(&w);
    return status;
}

void region_draw(report *r, size_t chart, const region_outline *o)
{
    if (o->count == 0)
        return;
    const size_t series = report_add_series(r, chart, REPORT_REGION, "reachable");

    for (size_t k = 0; k < o->count; k++)
        report_add_point(r, chart, series, o->lower[k].x, o->lower[k].y);
    for (size_t k = o->count; k-- > 0;)
        report_add_point(r, chart, series, o->upper[k].x, o->upper[k].y);
}
