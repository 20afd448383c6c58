/* SPDX-License-Identifier: MIT */
/* worst.c - opens a space of allowed compositions and asks it for the extremes of a ratio. */
#include "supply/worst_internal.h"

#include "base/error_internal.h"
#include "bluecone/quantity.h"

#include <math.h>
#include <stdlib.h>
#include <string.h>

static bc_status check_counts(const bc_space *space, bc_error *err)
{
    if (space->component_count == 0)
        return bc_fail(err, BC_ERR_USAGE, "a space of compositions needs a component");
    if (space->component_count > BC_SPECIES_CAPACITY || space->group_count > BC_SPACE_GROUP_MAX || space->limit_count > BC_SPACE_LIMIT_MAX)
        return bc_fail(err, BC_ERR_USAGE, "at most %d components, %d groups and %d limits", BC_SPECIES_CAPACITY, BC_SPACE_GROUP_MAX,
                       BC_SPACE_LIMIT_MAX);
    return BC_OK;
}

static bc_status check_component(const bc_space *space, size_t index, bc_error *err)
{
    const bc_space_component *c = &space->components[index];

    if (c->species >= bc_species_count())
        return bc_fail(err, BC_ERR_USAGE, "there is no species %zu", c->species);
    if (!(c->min >= 0.0 && c->min <= c->max && c->max <= 1.0))
        return bc_fail(err, BC_ERR_INPUT, "%s from %.6g to %.6g is no window of a mole fraction", bc_species_id(c->species), c->min, c->max);
    for (size_t i = 0; i < index; i++)
        if (space->components[i].species == c->species)
            return bc_fail(err, BC_ERR_INPUT, "%s has two windows", bc_species_id(c->species));
    return BC_OK;
}

/* Ends may be open, but not on the wrong side. */
static bool is_window(double min, double max)
{
    return min <= max && min < HUGE_VAL && max > -HUGE_VAL;
}

static bc_status check(const bc_space *space, bc_error *err)
{
    bc_status status = check_counts(space, err);

    for (size_t i = 0; status == BC_OK && i < space->component_count; i++)
        status = check_component(space, i, err);
    if (status != BC_OK)
        return status;
    for (size_t i = 0; i < space->group_count; i++)
        if (!is_window(space->groups[i].min, space->groups[i].max))
            return bc_fail(err, BC_ERR_INPUT, "group %zu: from %.6g to %.6g is no window", i + 1, space->groups[i].min, space->groups[i].max);
    for (size_t i = 0; i < space->limit_count; i++) {
        const bc_space_limit *l = &space->limits[i];

        if (!is_window(l->min, l->max))
            return bc_fail(err, BC_ERR_INPUT, "limit %zu: from %.6g to %.6g is no window", i + 1, l->min, l->max);
        if (l->ratio.proxy)
            return bc_fail(err, BC_ERR_INPUT, "limit %zu: of this quantity only extremes are known, it cannot be a limit", i + 1);
    }
    return BC_OK;
}

static void copy_ranges(const bc_space *space, bc_worst *w)
{
    w->columns = space->component_count;
    for (size_t j = 0; j < w->columns; j++) {
        w->species[j] = space->components[j].species;
        w->bounds.lower[j] = space->components[j].min;
        w->bounds.upper[j] = space->components[j].max;
    }
    w->groups = space->group_count;
    for (size_t i = 0; i < w->groups; i++) {
        for (size_t j = 0; j < w->columns; j++)
            w->group[i][j] = space->groups[i].weight[w->species[j]];
        w->bounds.group_lo[i] = space->groups[i].min;
        w->bounds.group_hi[i] = space->groups[i].max;
    }
}

static bc_status copy_limits(const bc_space *space, bc_worst *w, bc_error *err)
{
    w->limits = space->limit_count;
    for (size_t i = 0; i < w->limits; i++) {
        const bc_space_limit *l = &space->limits[i];
        const bc_status status = worst_term_of(w, &l->ratio, &w->term[i], err);

        if (status != BC_OK)
            return status;
        worst_raw_window(&w->term[i], l->min, l->max, &w->bounds.limit_lo[i], &w->bounds.limit_hi[i]);
        w->keep_water = w->keep_water || l->ratio.saturated;
    }
    return BC_OK;
}

bc_status worst_prepare(bc_worst *w, bc_error *err)
{
    worst_run run = {.term = NULL, .sign = 1.0, .budget = WORST_CELLS};
    const bc_status status = worst_lay_base(w, err);

    if (status != BC_OK || w->empty)
        return status;
    worst_explore(w, &run);
    if (!run.found && run.bound > 0.0)
        return bc_fail(err, BC_ERR_SOLVER, "no allowed composition was found, and no proof that there is none; the limits all but exclude each other");
    w->empty = !run.found;
    if (run.found)
        memcpy(w->inside, run.x, sizeof run.x);
    return BC_OK;
}

bc_status bc_worst_open(const bc_space *space, bc_worst **worst, bc_error *err)
{
    bc_status status = check(space, err);

    if (status != BC_OK)
        return status;
    bc_worst *w = calloc(1, sizeof *w);

    if (!w)
        return bc_fail(err, BC_ERR_MEMORY, "no memory for a space of compositions");
    copy_ranges(space, w);
    status = copy_limits(space, w, err);
    if (status == BC_OK)
        status = worst_prepare(w, err);
    if (status == BC_OK)
        *worst = w;
    else
        free(w);
    return status;
}

void bc_worst_close(bc_worst *worst)
{
    free(worst);
}

bool bc_worst_is_empty(const bc_worst *worst)
{
    return worst->empty;
}

bc_status worst_not_empty(const bc_worst *w, bc_error *err)
{
    return w->empty ? bc_fail(err, BC_ERR_INPUT, "no gas meets all the ranges and limits; they exclude each other") : BC_OK;
}

bc_gas worst_gas(const bc_worst *w, const double x[])
{
    bc_gas gas = {{0.0}};

    for (size_t j = 0; j < w->columns; j++)
        gas.x[w->species[j]] = x[j];
    return gas;
}

/* Exact when the gap of the raw figure is: that of the figure is the same, relatively. */
bc_status worst_extreme(bc_worst *w, const worst_term *term, double sign, bc_extreme *extreme, bc_error *err)
{
    worst_run run = {.term = term, .sign = term->inverse ? -sign : sign, .found = true, .budget = WORST_CELLS};

    memcpy(run.x, w->inside, sizeof run.x);
    if (!worst_raw(w, term, run.x, &run.best))
        return bc_fail(err, BC_ERR_RANGE, "an allowed gas has no such figure");
    worst_explore(w, &run);
    *extreme = (bc_extreme){.value = worst_figure(term, run.best), .gas = worst_gas(w, run.x)};
    extreme->bounded = isfinite(run.bound);
    extreme->bound = extreme->bounded ? worst_figure(term, run.bound) : 0.0;
    extreme->exact = fabs(run.bound - run.best) <= BC_WORST_EXACT * fmax(fabs(run.best), WORST_SMALL);
    return BC_OK;
}

/* Forgets the axes of figures asked before when those of another would not fit any more. */
static void make_room(bc_worst *w)
{
    if (w->axis_count + 2 > WORST_AXES)
        w->axis_count = w->limit_axes;
}

bc_status bc_worst_ratio(bc_worst *w, const bc_ratio *ratio, bc_extremes *extremes, bc_error *err)
{
    bc_extremes found;
    worst_term term;
    bc_status status = worst_not_empty(w, err);

    if (status == BC_OK)
        status = worst_term_of(w, ratio, &term, err);
    make_room(w);
    if (status == BC_OK)
        status = worst_add_axes(w, &term, err);
    if (status == BC_OK)
        status = worst_extreme(w, &term, -1.0, &found.min, err);
    if (status == BC_OK)
        status = worst_extreme(w, &term, 1.0, &found.max, err);
    if (status == BC_OK)
        *extremes = found;
    return status;
}
