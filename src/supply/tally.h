/* SPDX-License-Identifier: MIT */
/* tally.h - what a log of any length comes to, in bounded memory: means, spread, percentiles, periods, excursions.
 *
 * Rows are added in their order, then the tally is settled, then asked. A row holds until the next one. A step of more
 * than BC_LOG_GAP usual steps is a gap: the row before it, as the last row of all, holds for one usual step, and the
 * rest is not counted. A row at the time of the one before gives that one no time; where the clock goes back the row
 * before holds one usual step. Without a usual step every row weighs the same (one), and "held" counts rows.
 *
 * Tallies of consecutive parts of a log, merged in their order before any of them is settled, give what one tally of
 * all rows gives: weights are whole milliseconds, sums are compensated (tally_sum.h), and everything else that is kept
 * is a function of the set of rows or is joined at the edge of the parts. */
#ifndef TALLY_H
#define TALLY_H

#include <stdbool.h>
#include <stddef.h>
#include <stdint.h>

#include "bluecone/limits.h"
#include "bluecone/state.h"
#include "bluecone/status.h"

#define TALLY_FIGURE_MAX 64
#define TALLY_LIMIT_MAX BC_LIMIT_MAX
#define TALLY_FLAG_MAX 16
#define TALLY_PERIOD_MAX 40000 /* hours, days or months: 109 years of days */
#define TALLY_CELL_MAX 52800   /* periods times figures: the hours of a year for six figures */
#define TALLY_TREND_MAX 1000   /* steps of a trend */
#define TALLY_RUN_MAX 1000     /* excursions that are kept one by one: the longest */
#define TALLY_VALUE_MAX 1e100  /* a figure of this magnitude is none: its square times a weight must stay finite */
#define TALLY_LABEL_MAX 96

typedef enum { TALLY_WHOLE, TALLY_HOUR, TALLY_DAY, TALLY_MONTH } tally_period;

/* A figure of every row, in the unit it is printed in. */
typedef struct {
    char id[BC_LIMIT_ID_MAX], label[TALLY_LABEL_MAX], unit[BC_LIMIT_ID_MAX]; /* unit "" or "1": a plain number */
} tally_figure_name;

/* A limit of the contract; a bound that is not there has the value 0. */
typedef struct {
    char id[BC_LIMIT_ID_MAX], unit[BC_LIMIT_ID_MAX];
    char state[BC_LIMIT_ID_MAX]; /* its own reference state in short; "" when that is the one of the figures */
    bool has_min, has_max;
    double min, max;
} tally_limit_name;

/* A kind of remark on rows: "sum-off", "out of range of the method". */
typedef struct {
    char id[BC_LIMIT_ID_MAX], label[TALLY_LABEL_MAX];
} tally_flag_name;

/* What is tallied; tallies with different plans are not merged. */
typedef struct {
    size_t figure_count, limit_count, flag_count;
    tally_figure_name figures[TALLY_FIGURE_MAX];
    tally_limit_name limits[TALLY_LIMIT_MAX];
    tally_flag_name flags[TALLY_FLAG_MAX];
    double step_s;               /* the usual step; 0: not known, rows count */
    tally_period by;
    bool zoned;                  /* times are those of UTC */
    bc_state at;                 /* reference state of the figures */
    char state[160];             /* the same in one line */
    char contract[BC_NAME_MAX];  /* its name; "" without one */
} tally_plan;

/* A row with results. */
typedef struct {
    bool has_time;
    double time_s;               /* seconds since 1970-01-01 00:00 of the log's own clock */
    bool has_flow;
    double power_w;              /* gross heat a second, not negative */
    const double *values;        /* one a figure; not finite: the row has none */
    const double *limit_values;  /* one a limit; looked at where its bit of `broken` is set, finite there */
    uint64_t known, broken;      /* a bit a limit: it was judged; it was, and is broken */
} tally_row;

/* An excursion: broken rows one behind the other, no gap between. */
typedef struct {
    size_t limit;
    bool has_time;
    double from_s, until_s;      /* time of its first row; end of the time that its last row holds */
    uint64_t rows;
    double held;                 /* s, or rows */
    double worst, worst_s;       /* the value farthest outside, and when */
    double energy_j;             /* gross heat meanwhile */
    bool open_at_end;            /* the log ends in it */
} tally_run;

typedef void tally_on_run(void *data, const tally_run *run);

typedef struct tally tally;

/* Opens a tally: to be closed. BC_ERR_USAGE: a plan out of its bounds; BC_ERR_MEMORY. */
BC_MUST_USE bc_status tally_open(const tally_plan *plan, tally **t, bc_error *err);
void tally_close(tally *t); /* NULL is none */
const tally_plan *tally_plan_of(const tally *t);

/* Calls back whenever an excursion ends in tally_add() or tally_settle(), in the order of their ends; merged tallies
 * have tally_run_at(). */
void tally_tell_runs(tally *t, tally_on_run *on_run, void *data);

/* Adds a row. BC_ERR_INPUT: no time although there is a usual step, a time outside of the years 1970 to 9999, a heat
 * that is negative or no number (the tally stays as it was); more periods than are kept; BC_ERR_MEMORY. */
BC_MUST_USE bc_status tally_add(tally *t, const tally_row *row, bc_error *err);
void tally_add_refused(tally *t, uint64_t rows);                /* rows without results */
void tally_count_flag(tally *t, size_t flag, uint64_t rows);    /* rows with this remark */

/* Adds the later part of a log; neither is settled, `later` is only good for closing afterwards. BC_ERR_INPUT: plans
 * differ, or it begins before the end of the earlier part: both stay as they were. BC_ERR_INPUT: more periods than are
 * kept; BC_ERR_MEMORY: both are only good for closing. BC_ERR_USAGE: one is settled. */
BC_MUST_USE bc_status tally_merge(tally *into, tally *later, bc_error *err);

/* Lets the last row hold its one step: once, before the questions. Errors as tally_add(). */
BC_MUST_USE bc_status tally_settle(tally *t, bc_error *err);

/* What a tally covers. */
typedef struct {
    uint64_t rows, refused;      /* with results; without */
    uint64_t flows;              /* rows with a flow */
    uint64_t outside;            /* rows that break a limit, whichever */
    bool has_time;
    double first_s, last_s;      /* earliest and latest time; also before settling, for the order of parts */
    bool timed;                  /* there is a usual step: held is in s, else in rows */
    double held, outside_held;
    uint64_t gaps;
    double gap_s;                /* time in gaps, which does not count */
    uint64_t repeats, backs;     /* rows at the time of the one before; before it */
    uint64_t untimed;            /* rows without a time: in no period and no trend */
    double energy_j;             /* gross heat; 0 without a usual step */
} tally_cover;

void tally_covers(const tally *t, tally_cover *cover);
uint64_t tally_flagged(const tally *t, size_t flag);

/* A figure over all or over a period; weighted by time. What is not there is zero. */
typedef struct {
    uint64_t rows;               /* that have the figure */
    double held;                 /* s, or rows */
    bool has_mean;               /* its rows hold any time */
    double mean, sd;             /* of the population of moments: no n - 1 */
    bool has_energy_mean;
    double energy_mean;          /* weighted by gross heat */
    double min, max;
    bool min_timed, max_timed;
    double min_s, max_s;         /* the earliest of equal ones */
} tally_spread;

void tally_spreads(const tally *t, size_t figure, tally_spread *spread);

/* The least value that a share (0..1) of the time does not exceed; false without rows. */
bool tally_percentile(const tally *t, size_t figure, double share, double *value);

/* Greatest relative error of the percentiles of a figure. */
double tally_accuracy(const tally *t, size_t figure);

/* Time (s, or rows) by value, in `bars` equal parts of low..high; low < high. */
void tally_bars(const tally *t, size_t figure, double low, double high, size_t bars, double held[]);

/* A period, or a step of the trend. */
typedef struct {
    double from_s, until_s;      /* its ends, by the calendar */
    double first_s, last_s;      /* of its rows */
    uint64_t rows, outside;
    double held, outside_held;   /* s, or rows */
    double energy_j;
} tally_span;

size_t tally_period_count(const tally *t);
void tally_period_at(const tally *t, size_t period, tally_span *span);
void tally_period_spread(const tally *t, size_t period, size_t figure, tally_spread *spread);

size_t tally_trend_count(const tally *t);
void tally_trend_at(const tally *t, size_t step, tally_span *span);
void tally_trend_spread(const tally *t, size_t step, size_t figure, tally_spread *spread);

/* A limit over all rows. Without a broken row all after `broken` is zero. */
typedef struct {
    uint64_t judged;
    double judged_held;          /* s, or rows */
    uint64_t broken;
    double broken_held, broken_j;
    uint64_t runs;
    bool has_time;
    double first_s, last_s;      /* begin of the first excursion, last broken row */
    double worst, worst_s;
    double longest, longest_from_s; /* held by the longest excursion */
} tally_excursions;

void tally_outside(const tally *t, size_t limit, tally_excursions *e);

/* The longest excursions of all limits, TALLY_RUN_MAX at most, in the order of their begin. */
size_t tally_run_count(const tally *t);
void tally_run_at(const tally *t, size_t run, tally_run *out);

/* Bytes that a tally holds. */
size_t tally_bytes(const tally *t);

#endif
