/* SPDX-License-Identifier: MIT */
/* stream_sum.h - the rows of a stream into a tally, and what is made of it at the end. */
#ifndef STREAM_SUM_H
#define STREAM_SUM_H

#include "cli/stream.h"
#include "supply/tally.h"

#define STREAM_SUM_FIRST 64 /* rows whose steps tell the usual one, before any is counted */

/* A row that waits for the usual step to be known. */
typedef struct {
    tally_row row;
    double values[STREAM_FIGURES_MAX], limits[BC_LIMIT_MAX];
} stream_held;

typedef struct {
    const stream_plan *p;
    tally_period by;
    tally *t;                 /* NULL until the usual step is known */
    stream_held *first;
    size_t first_count;
    bool zoned;
    uint64_t flagged[STREAM_FLAGS];
    uint64_t refused;         /* rows without results, or without a time in a log that has times */
} stream_sum;

/* What the options ask for: whether rows are summed at all (p->keeps), and whether they are written (p->drops). */
bc_status stream_sum_ask(stream_plan *p, tally_period *by, bc_error *err);

bc_status stream_sum_open(stream_sum *s, const stream_plan *p, tally_period by, bc_error *err);
void stream_sum_close(stream_sum *s);

/* Opens the tally and lets in the rows that waited for the usual step; done by the others when it is time. */
bc_status stream_sum_begin(stream_sum *s, bc_error *err);

/* Adds the rows of a batch. Errors as tally_add(). */
bc_status stream_sum_add(stream_sum *s, const stream_batch *b, bc_error *err);

/* Behind the last row: the part, the note of the excursions, the report. *code: the exit code, where something was written. */
bc_status stream_sum_end(stream_sum *s, int *code, bc_error *err);

/* Merges the parts that the arguments name. The exit code. */
int stream_merge(const arguments *a);

#endif
