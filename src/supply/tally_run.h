/* SPDX-License-Identifier: MIT */
/* tally_run.h - the excursions beyond one limit, and the longest of all limits. */
#ifndef TALLY_RUN_H
#define TALLY_RUN_H

#include <stdbool.h>

#include "supply/tally.h"
#include "supply/tally_cell.h"

/* An excursion, going on or ended; without rows there is none. */
typedef struct {
    size_t limit;
    uint64_t rows, weight;
    tally_sum energy;
    int64_t from_ms, last_ms, until_ms; /* times of its first and last row; end of the time that the last one holds */
    double worst;
    int64_t worst_ms;
    bool open_at_end;
} tally_stretch;

/* A limit over all rows so far. The excursion that begins with the first row of all is kept apart, since the rows
 * before it may be in another part of the log. */
typedef struct {
    uint64_t judged, judged_weight; /* of rows that not all limits were judged in */
    tally_stretch all;              /* all broken rows as if they were one excursion */
    uint64_t runs;                  /* ended, but for the leading one */
    tally_stretch longest;          /* of those */
    tally_stretch open;
    bool open_leads;
    tally_stretch lead;             /* once it has ended */
} tally_beyond;

/* One broken row, or a stretch of them, at the end of what is there. */
void tally_stretch_join(tally_stretch *s, const tally_stretch *more, const tally_limit_name *limit);

/* Longer first, then the earlier, then the earlier limit: an order of all excursions of a log. Where a clock was put
 * back two of one limit can have the same begin; then what else they are decides, never which came first. */
bool tally_stretch_before(const tally_stretch *a, const tally_stretch *b);

/* The longest excursions: a heap with the least of them on top. */
typedef struct {
    size_t count;
    tally_stretch *kept; /* room for TALLY_RUN_MAX */
} tally_longest;

bool tally_longest_open(tally_longest *l);
void tally_longest_close(tally_longest *l);
void tally_longest_add(tally_longest *l, const tally_stretch *s);

/* By begin, then limit: nothing is added afterwards. */
void tally_longest_sort(tally_longest *l);

#endif
