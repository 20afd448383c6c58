/* SPDX-License-Identifier: MIT */
/* blend_sweep.h - a sweep in progress, shared by its table, its limits and its chart. */
#ifndef BLEND_SWEEP_H
#define BLEND_SWEEP_H

#include "base/text.h"
#include "cli/blend_report.h"

#define SWEEP_COLUMNS_MAX 96

/* A column: a quantity at the state of the report, or a limit of --within at its own. */
typedef struct {
    bool is_limit;
    size_t index;        /* of the quantity or the limit */
    char id[BC_WORD_MAX];
    char unit[BC_WORD_MAX];
    bc_unit own, shown;  /* of a quantity */
} sweep_column;

typedef struct {
    double low, high, step; /* of the swept share, fractions of one */
    bc_blend_line line;
    size_t count;
    sweep_column column[SWEEP_COLUMNS_MAX];
    bool *wanted;           /* by quantity: whether a column shows it */
    double *figure;         /* by quantity, of the gas at hand */
    double *value;          /* point by point; NaN where the gas has no such figure */
} sweep_table;

/* The name of a column; a limit has a state of its own, which need not be that in the head of the report. */
#define SWEEP_HEADING_MAX (BC_WORD_MAX + 80)
void sweep_heading(const blend_case *c, const sweep_column *column, char *text, size_t size);

/* The points of the table: their number, their place on the line (0..1), the share there. */
size_t sweep_points(const sweep_table *t);
double sweep_place(const sweep_table *t, size_t point);
double sweep_share_at(const sweep_table *t, double place);

/* A row of the table for a gas: a value a column, NaN where it has no such figure. */
void sweep_row(const sweep_table *t, const blend_case *c, const bc_subject *gas, double row[]);

/* A panel a column, with the bounds of its limit and the shares at which they are crossed. */
bc_status sweep_chart(report *r, const sweep_table *t, const blend_case *c, bc_error *err);

/* Crossings of the limits, windows within all of them, and the verdict; false when no share is allowed. */
bool sweep_limits(report *r, const sweep_table *t, const blend_case *c);

#endif
