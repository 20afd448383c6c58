/* SPDX-License-Identifier: MIT */
/* figures.h - figures of a command that are no quantities of the gas alone, into a report. */
#ifndef FIGURES_H
#define FIGURES_H

#include "cli/cli.h"

/* One figure as it is shown; it is printed in the first unit of --unit that fits. */
typedef struct {
    const char *id, *label;
    double value;
    const char *unit;
    int digits;
    const char *method;
} plain_figure;

void add_figures(const slot *where, const arguments *a, const plain_figure figures[], size_t count);

/* After all figures are in: every unit of --unit must have been used by one of them. */
bc_status check_units_used(const report *r, const arguments *a, bc_error *err);

#endif
