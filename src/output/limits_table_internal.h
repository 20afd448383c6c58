/* SPDX-License-Identifier: MIT */
/* limits_table_internal.h - the limits of a report as one more of its tables, for forms that have no other place for them. */
#ifndef LIMITS_TABLE_INTERNAL_H
#define LIMITS_TABLE_INTERNAL_H

#include "output/report.h"

/* A report with that table; it points into the first one, which must stay. */
typedef struct {
    report shown;
    report made;          /* holds the table */
    report_table *tables; /* those of the report and that one */
} limits_view;

/* False without memory. Without limits for people, `shown` is the report as it is. To be closed in any case. */
bool limits_view_open(limits_view *v, const report *r);
void limits_view_close(limits_view *v);

#endif
