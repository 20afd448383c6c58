/* SPDX-License-Identifier: MIT */
/* worst_internal.h - a space made ready: its terms, axes and bounds, and the steps that work on them.
 *
 * Everything runs over columns, the components in their order. A figure N/phi of the space is a term; phi is
 * concave in the sums that it is not linear in. Each such sum is an axis. A cell is a box over the axes: in it
 * phi lies between a tangent plane and a plane through corners, and all that is left is linear. */
#ifndef WORST_INTERNAL_H
#define WORST_INTERNAL_H

#include <stdbool.h>
#include <stddef.h>

#include "bluecone/worst.h"
#include "supply/worst_lp.h"

#define WORST_AXES 32
#define WORST_STACK 1024
#define WORST_CELLS 20000        /* cells that one extreme may cost: a tenth of a second */
#define WORST_ROUNDING 1e-9      /* relative: a figure this near to a bound is on it, as for every limit */
#define WORST_TARGET 5e-7        /* relative gap at which a cell is done: half of what is called exact */
#define WORST_SMALL 1e-4         /* of the normalised figure: below it gaps are relative to this */
#define WORST_POINTS 64          /* vertices that a search knows */
#define WORST_NO_AXIS WORST_AXES

/* raw = sum n x / phi, phi = (sum d x)^p (1 - q (sum s x)^2)^r; n and d are scaled to a largest of one. */
typedef struct {
    double n[LP_COLUMNS], d[LP_COLUMNS], s[LP_COLUMNS];
    double p, r, q;
    size_t d_axis, s_axis; /* WORST_NO_AXIS: phi is linear in that sum or free of it */
    double unit;           /* figure = unit raw, or inverse: unit/raw */
    bool inverse;
} worst_term;

typedef struct {
    double form[LP_COLUMNS];
    double lo, hi; /* over the ranges and linear limits */
} worst_axis;

typedef struct {
    double lo[WORST_AXES], hi[WORST_AXES];
    double touch[WORST_AXES]; /* where tangents touch */
    double bound;             /* raw: no allowed gas of the cell is beyond; infinite at first */
} worst_cell;

/* Every bound of a space; those of limits are of the raw figure. */
typedef struct {
    double lower[LP_COLUMNS], upper[LP_COLUMNS];
    double group_lo[BC_SPACE_GROUP_MAX], group_hi[BC_SPACE_GROUP_MAX];
    double limit_lo[BC_SPACE_LIMIT_MAX], limit_hi[BC_SPACE_LIMIT_MAX];
} worst_bounds;

struct bc_worst {
    size_t columns, groups, limits;
    size_t species[LP_COLUMNS];
    double group[BC_SPACE_GROUP_MAX][LP_COLUMNS];
    worst_term term[BC_SPACE_LIMIT_MAX];
    worst_bounds bounds;
    bool keep_water; /* a limit is metered saturated: its coefficients hold the fixed fraction of water */
    size_t axis_count, limit_axes; /* those of the limits come first */
    worst_axis axis[WORST_AXES];
    bool empty;
    double inside[LP_COLUMNS]; /* an allowed composition, unless empty */
    size_t base_rows;          /* of both programs: sum, groups and linear limits */
    lp_problem cell_lp, near_lp;
    lp_answer cell_answer, near_answer;
    lp_work work;
    worst_cell stack[WORST_STACK];
    size_t point_count;        /* 0: not yet made */
    double point[WORST_POINTS][LP_COLUMNS];
};

/* A maximum (sign 1) or minimum (sign -1) in the making. */
typedef struct {
    const worst_term *term; /* NULL: any allowed composition will do */
    double sign;
    bool found;
    double best; /* raw */
    double x[LP_COLUMNS];
    double bound; /* raw */
    double stated; /* raw: what a limit on the same figure allows, infinite without one */
    size_t budget, cells; /* that may be looked at, and that were */
    size_t waiting, patience; /* cells until the next walk onto the limits is tried, and after it */
} worst_run;

/* worst_term.c */
bc_status worst_term_of(const bc_worst *w, const bc_ratio *ratio, worst_term *term, bc_error *err);
/* True when phi is a linear sum, or one. */
bool worst_is_linear(const worst_term *term);
double worst_sum(const bc_worst *w, const double form[], const double x[]);
bool worst_raw(const bc_worst *w, const worst_term *term, const double x[], double *raw);
double worst_figure(const worst_term *term, double raw);
void worst_raw_window(const worst_term *term, double min, double max, double *lo, double *hi);
/* phi at its lowest in a cell, or 0 when it is not above zero. */
double worst_phi_least(const bc_worst *w, const worst_term *term, const worst_cell *cell);

/* Coefficients of a linear form that phi does not exceed (above) or fall below in a cell. */
void worst_estimate(const bc_worst *w, const worst_term *term, const worst_cell *cell, bool above, double row[]);

/* worst_cell.c */
bc_status worst_add_axes(bc_worst *w, worst_term *term, bc_error *err);
bc_status worst_lay_base(bc_worst *w, bc_error *err);
void worst_root(const bc_worst *w, worst_cell *cell);
void worst_relax(bc_worst *w, const worst_cell *cell);
void worst_linearise(bc_worst *w, const double x[]);
/* True when every bound holds but for rounding. */
bool worst_allowed(const bc_worst *w, const double x[]);
bool worst_limit_holds(const bc_worst *w, size_t limit, const double x[]);
bool worst_correct(bc_worst *w, const double cost[], double x[]);

/* worst_bound.c: branch and bound. */
void worst_explore(bc_worst *w, worst_run *run);
/* Cuts a cell in two where the last solution lies. False when there is nothing left to cut. */
bool worst_cut(const bc_worst *w, const worst_run *run, worst_cell *cell, worst_cell *other);

/* worst.c */
bc_status worst_prepare(bc_worst *w, bc_error *err);
bc_gas worst_gas(const bc_worst *w, const double x[]);
bc_status worst_not_empty(const bc_worst *w, bc_error *err);
bc_status worst_extreme(bc_worst *w, const worst_term *term, double sign, bc_extreme *extreme, bc_error *err);

#endif
