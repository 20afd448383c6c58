/* SPDX-License-Identifier: MIT */
/* stream_summary.h - what a tally says, as a report. */
#ifndef STREAM_SUMMARY_H
#define STREAM_SUMMARY_H

#include "output/report.h"
#include "supply/tally.h"

/* Tables, charts and, with limits, warnings and verdict of a settled tally: what it covers, remarks, distribution,
 * periods, outside of each limit, excursions. */
void stream_summary_report(report *r, const tally *t);

/* A table of the excursions one by one, in the order of their begin: what, how far, since when, how much heat. */
void stream_summary_excursions(report *r, const tally *t);

/* Its parts. */
void summary_limits(report *r, const tally *t);
void summary_periods(report *r, const tally *t);
void summary_charts(report *r, const tally *t);

/* What they share. "1" is no unit to print; weights are told in hours, or in rows without a usual step. */
typedef struct {
    const char *id, *heading, *unit;
} summary_column;

size_t summary_table(report *r, const char *id, const char *title, const summary_column columns[], size_t count);
void summary_time(report *r, size_t table, bool there, double time_s);
void summary_number(report *r, size_t table, bool there, double value); /* "-" where there is none */
const char *summary_unit(const char *unit);
double summary_held(const tally_cover *cover, double held);
const char *summary_held_unit(const tally_cover *cover);

#define SUMMARY_J_PER_GJ 1e9

#endif
