/* SPDX-License-Identifier: MIT */
/* bluecone/log.h - a log of analyses under a contract: how long, how far and for how much heat its limits were broken.
 *
 * Rows are fed one at a time in the order of time, then settled, then asked. A row holds until the next one. A step of
 * more than BC_LOG_GAP usual steps is a gap: the row before it, as the last row of all, holds for one usual step, and
 * the rest is not counted. The usual step is the median of all steps; with one row there is none and no time counts. */
#ifndef BLUECONE_LOG_H
#define BLUECONE_LOG_H

#include <stdbool.h>
#include <stddef.h>

#include "bluecone/limits.h"

#ifdef __cplusplus
extern "C" {
#endif

#define BC_LOG_GAP 3.0      /* usual steps; what is longer is a gap */
#define BC_LOG_TIME_TEXT 20 /* bytes of a time as text with the final NUL */

/* A log; opaque. One thread at a time. */
typedef struct bc_log bc_log;

/* One analysis. */
typedef struct {
    double time_s;       /* seconds since 1970-01-01 00:00 of the log's own clock */
    bc_gas gas;
    bc_per_amount flow;  /* not given: its heat is not counted */
} bc_log_row;

/* What a log covers. */
typedef struct {
    size_t rows;
    double first_s, last_s;  /* times of the first and the last row */
    double step_s;           /* the usual step; 0 with one row */
    double held_s;           /* time that counts */
    size_t gaps;
    double gap_s;            /* time that does not */
    size_t flows;            /* rows with a flow */
    double energy_j;         /* gross heat, at the combustion temperature of the contract's state */
} bc_log_cover;

/* A limit over the whole log; values in the unit of the limit. Without a broken row all after `broken` is zero. */
typedef struct {
    size_t judged;           /* rows that have the figure */
    double judged_s;         /* their time */
    size_t broken;           /* rows that break the limit */
    double broken_s;
    double broken_j;         /* gross heat that passed meanwhile */
    size_t runs;             /* excursions: broken rows one behind the other, no gap between */
    double first_s, last_s;  /* begin of the first excursion, last row of the last one */
    double worst_s, worst;   /* the row farthest outside */
    double longest_s;        /* time of the longest excursion, and when it begins */
    double longest_from_s;
} bc_log_excursions;

/* Distribution of a limited figure, each value weighted by the time it held; with one row that row. */
typedef struct {
    double min, p5, median, mean, p95, max;
    bool has_energy_mean;
    double energy_mean;      /* each value weighted by its gross heat */
} bc_log_distribution;

/* Opens a log. The contract must outlive it.
 *
 *   log   out: to be closed; untouched on failure
 *
 * BC_ERR_MEMORY; BC_ERR_RANGE and BC_ERR_USAGE as bc_reference_at(). */
BC_API BC_MUST_USE bc_status bc_log_open(const bc_contract *contract, bc_log **log, bc_error *err);

/* Closes a log; NULL is none. */
BC_API void bc_log_close(bc_log *log);

/* Adds a row and judges it by every limit; bounds belong to what is allowed.
 *
 * BC_ERR_INPUT: its time is not after that of the row before; BC_ERR_RANGE: the flow cannot be counted, or a state
 * cannot saturate the gas; BC_ERR_USAGE: an index of two gases without a present one; BC_ERR_MEMORY. The log stays as
 * it was then. A figure that the gas does not have leaves its limit unjudged in this row. */
BC_API BC_MUST_USE bc_status bc_log_add(bc_log *log, const bc_log_row *row, bc_error *err);

/* Works out how long each row holds: once, behind the last row and before any question. BC_ERR_INPUT: no row;
 * BC_ERR_MEMORY. */
BC_API BC_MUST_USE bc_status bc_log_settle(bc_log *log, bc_error *err);

/* The questions; a limit is one of the contract, 0..limit_count - 1. */
BC_API void bc_log_covers(const bc_log *log, bc_log_cover *cover);
BC_API void bc_log_outside(const bc_log *log, size_t limit, bc_log_excursions *excursions);

/* BC_ERR_RANGE: no row has the figure; BC_ERR_MEMORY. */
BC_API BC_MUST_USE bc_status bc_log_distribute(const bc_log *log, size_t limit, bc_log_distribution *d, bc_error *err);

/* Rows that break a limit, whichever, and the time they held. */
BC_API size_t bc_log_any_outside(const bc_log *log, double *held_s);

/* A row by its index, 0..rows - 1: its time and how long it holds; true when a gap follows. */
BC_API bool bc_log_held(const bc_log *log, size_t row, double *time_s, double *held_s);

/* The figure of a row; false when it has none. */
BC_API bool bc_log_value(const bc_log *log, size_t row, size_t limit, double *value);

/* Reads a time of ISO 8601: 2026-03-01T12:00, 2026-03-01 12:00:30, 2026-03-01; behind it Z or +01:00. The date may also be
 * written 2026/03/01 or 01.03.2026 (day, month, year).
 *
 *   time_s   out: seconds since 1970-01-01 00:00; with a zone those of UTC; untouched on failure
 *   zoned    out: a zone was written
 *
 * BC_ERR_INPUT: no such time. Years 1970 to 9999, proleptic Gregorian calendar; no leap seconds. */
BC_API BC_MUST_USE bc_status bc_log_time_parse(const char *text, double *time_s, bool *zoned, bc_error *err);

/* The time as text, "2026-03-01 12:00", with seconds where there are any. */
BC_API void bc_log_time_text(double time_s, char text[BC_LOG_TIME_TEXT]);

#ifdef __cplusplus
}
#endif

#endif
