/* SPDX-License-Identifier: MIT */
/* worst_part.h - ways to the extremes of a burner: spaces cut down by one more limit, slices, and the search. */
#ifndef WORST_PART_H
#define WORST_PART_H

#include "bluecone/worst_burner.h"
#include "supply/burner_ratio.h"
#include "supply/worst_internal.h"

/* Adds a limit, for as long as worst_lift() does not take it off again; w->empty tells whether a gas is left.
 * BC_ERR_SOLVER: no room for it, or neither a gas nor a proof that there is none. */
bc_status worst_impose(bc_worst *w, const bc_ratio *figure, double min, double max, bc_error *err);
void worst_lift(bc_worst *w);

/* Extremes of one form, finite. BC_ERR_RANGE also where an end has no number: the air factor of a gas that needs no
 * air. */
bc_status worst_certify(bc_worst *w, const bc_ratio *form, bc_extremes *extremes, bc_error *err);

/* True when no allowed gas brings a figure out of a window, which its extremes prove. */
bool worst_covers(double min, double max, const bc_extremes *reach);

/* A figure of a burner with a trim: `held` within the range, and outside of it `untrimmed` by a factor: that of the
 * trimmed flow, with which the figure rises, or else its inverse. */
typedef struct {
    const bc_ratio *travel, *untrimmed, *held;
    bool rises;
    double range; /* of the trim */
} trimmed_figure;

/* BC_ERR_SOLVER: nothing proven, it has to be searched for. */
bc_status worst_certify_trimmed(bc_worst *w, const trimmed_figure *figure, bc_extremes *extremes, bc_error *err);

/* A figure behind a nozzle: a form times the factor of the flow, or an inverse form over it. */
typedef struct {
    const bc_burner_case *set;
    const burner_ratios *ratios;
    const bc_ratio *form;
} nozzle_figure;

/* BC_ERR_SOLVER: not proven, it has to be searched for. */
bc_status worst_certify_nozzle(bc_worst *w, const nozzle_figure *figure, bc_extremes *extremes, bc_error *err);

/* Extremes of any figure of a burner, searched for. Errors as bc_worst_burner(). */
bc_status worst_search_burner(bc_worst *w, const bc_burner_case *set, bc_burner_figure figure, bc_extremes *extremes, bc_error *err);

#endif
