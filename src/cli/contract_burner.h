/* SPDX-License-Identifier: MIT */
/* contract_burner.h - figures of a burner over all allowed gases, and the limits that it has for them. */
#ifndef CONTRACT_BURNER_H
#define CONTRACT_BURNER_H

#include "bluecone/worst_burner.h"
#include "cli/contract_report.h"

/* A figure as it is shown, figure factor - offset, and what the burner may have of it, in the library's unit. */
typedef struct {
    bc_burner_figure figure;
    const char *id, *unit;
    double factor, offset;
    bc_burner_limit limit;
} burner_row;

/* How the burner's limits fare. */
typedef struct {
    size_t broken, searched, not_judged;
    char breaches[600], open[200]; /* broken and not judged ones in words */
} burner_tally;

/* The extremes in the unit that they are shown in. */
bc_extremes burner_shown(const burner_row *row, const bc_extremes *e);

/* True beyond a bound by more than the rounding that a solver leaves; sign 1 of a max. */
bool burner_beyond(double value, double bound, double sign);

bool burner_has_limit(const burner_row *row);

/* The table of limits, and a row of it; NULL: some allowed gas has no such figure. */
size_t burner_limits_table(report *r, const contract_case *c);
void burner_judge(report *r, size_t table, const burner_row *row, const bc_extremes *e, burner_tally *t);

/* The verdict, behind that on the gases if there is one; *good turns false when a limit is not kept. */
void burner_conclude(report *r, const burner_tally *t, bool *good);

#endif
