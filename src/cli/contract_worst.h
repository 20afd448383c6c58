/* SPDX-License-Identifier: MIT */
/* contract_worst.h - the parts of the answer to --worst. */
#ifndef CONTRACT_WORST_H
#define CONTRACT_WORST_H

#include "cli/contract_report.h"

/* The space of a contract, ready to be asked, and the tables that answers go into. */
typedef struct {
    const contract_case *c;
    bc_space *space;
    bc_worst *worst;
    size_t place[BC_LIMIT_MAX]; /* of each limit in the space */
    size_t figures, gases;      /* tables */
} worst_case;

/* The caller closes in any case. */
bc_status worst_open(worst_case *w, const contract_case *c, bc_error *err);
void worst_close(worst_case *w);

/* What a figure is called. */
typedef struct {
    const char *id, *unit, *state;
} worst_figure;

void worst_tables(worst_case *w, report *r);
void worst_add(worst_case *w, report *r, const worst_figure *f, const bc_extremes *e);

/* Indices against the present supply; nothing without one. */
bc_status worst_against(worst_case *w, report *r, bc_error *err);

/* The burner on what is allowed, and its limits; *good turns false when an allowed gas breaks one. */
bc_status worst_burner(worst_case *w, report *r, bool *good, bc_error *err);

/* Which limits are idle and which are open. */
bc_status worst_standings(worst_case *w, report *r, bc_error *err);

/* Why no gas is allowed: the verdict. */
void worst_explain(const worst_case *w, report *r);

#define REGION_SLICES 64

/* The outline of what the allowed gases can reach on a plane, from slice to slice along x. A corner is where an
 * allowed gas lies, not where a bound does: nothing is drawn that cannot be delivered. */
typedef struct {
    report_point lower[REGION_SLICES + 1], upper[REGION_SLICES + 1];
    size_t count; /* 0: nothing is allowed, or untraced */
    bool untraced; /* the limits leave no room for a slice */
} region_outline;

/* Axes are the figures along x and y, no proxies. */
bc_status region_trace(const contract_case *c, const bc_ratio axes[2], region_outline *o, bc_error *err);
void region_draw(report *r, size_t chart, const region_outline *o);

#endif
