/* SPDX-License-Identifier: MIT */
/* book_chart_internal.h - the points of a chart on a sheet, and the native chart beside them. */
#ifndef BOOK_CHART_INTERNAL_H
#define BOOK_CHART_INTERNAL_H

#include "output/book_internal.h"

#define BOOK_CHART_HEAD 3 /* rows above the points: what, unit, series */

/* Where the points of one series stand. */
typedef struct {
    lxw_col_t x, y;
    lxw_row_t last;
} book_place;

/* A sheet of points while it is filled. */
typedef struct {
    book_sheet s;
    const report_chart *chart;
    lxw_chart *drawn;
    size_t next;  /* free column */
    bool is_bars; /* all of it: x are categories */
    int decimals_x, decimals_y;
} book_points;

/* The least and the greatest value that an axis shows. */
void book_range(const report_chart *chart, bool of_x, double *low, double *high);

/* Decimals that give the greatest value of an axis its digits. */
int book_decimals(const report_chart *chart, bool of_x);

/* Gives a series its columns; those of the same x as the one before it, at `before`, share theirs. */
book_place book_put_series(book_points *t, size_t index, book_place before);

/* The same for a series that is none of the chart's. */
book_place book_put_extra(book_points *t, const report_series *series);

#endif
