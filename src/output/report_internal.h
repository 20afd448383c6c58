/* SPDX-License-Identifier: MIT */
/* report_internal.h - the memory of a report, for the functions that add to it. */
#ifndef REPORT_INTERNAL_H
#define REPORT_INTERNAL_H

#include "output/report.h"

/* Room for one more item of `size` bytes behind `count` others: the list to use from now on. NULL
 * when there is none; then the old list stays as it is and the report has failed. */
void *report_grow(report *r, void *items, size_t count, size_t size);

/* A copy of text, of "" for NULL; NULL when there is no memory, and the report has failed. */
char *report_copy(report *r, const char *text);

/* Free what an item holds, not the item. */
void report_free_gas(report_gas *gas);
void report_free_input(report_input *input);
void report_free_result(report_result *result);
void report_free_column(report_column *column);
void report_free_table(report_table *table);
void report_free_limit(report_limit *limit);
void report_free_worst(report_worst *worst);
void report_free_chart(report_chart *chart);

#endif
