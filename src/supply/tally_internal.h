/* SPDX-License-Identifier: MIT */
/* tally_internal.h - what a tally keeps. */
#ifndef TALLY_INTERNAL_H
#define TALLY_INTERNAL_H

#include "supply/tally.h"
#include "supply/tally_bins.h"
#include "supply/tally_groups.h"
#include "supply/tally_run.h"

#define TALLY_MS 1000.0
#define TALLY_TREND_MS INT64_C(60000) /* the narrowest step of a trend */

/* The last row added: how long it holds is not known before the next one. */
typedef struct {
    bool there;
    int64_t ms;          /* TALLY_NO_TIME: none */
    bool has_flow;
    double power_w;
    uint64_t known, broken;
    double values[TALLY_FIGURE_MAX], limit_values[TALLY_LIMIT_MAX];
} tally_pending;

struct tally {
    tally_plan plan;
    int64_t step_ms;             /* 0: not known */
    uint64_t every;              /* a bit for each limit */
    uint64_t refused, flows;
    uint64_t flagged[TALLY_FLAG_MAX];
    uint64_t gaps, gap_ms, repeats, backs, untimed;
    int64_t begin_ms;            /* of the first row */
    int64_t first_ms, last_ms;   /* earliest and latest of all rows, the pending one included */
    tally_pending pending;
    bool accounted;              /* some row is */
    tally_group *hot;            /* rows that have not been joined to the groups below; all lie within one period and */
    int64_t hot_from, hot_until; /* one step of the trend, or have no time */
    tally_group *whole;
    tally_bins *bins;            /* one a figure */
    unsigned trend_doubled;      /* a step of the trend is TALLY_TREND_MS 2^trend_doubled */
    tally_groups trend, periods;
    uint64_t all_judged, all_judged_weight; /* of rows that every limit was judged in */
    uint64_t open;               /* a bit for each limit with an excursion going on */
    tally_beyond beyond[TALLY_LIMIT_MAX];
    tally_longest longest;
    tally_on_run *on_run;
    void *on_run_data;
    bool settled;
};

/* Joins the hot rows to the groups that they belong to. */
BC_MUST_USE bc_status tally_flush(tally *t, bc_error *err);

/* Periods that are kept at most. */
size_t tally_period_room(const tally *t);

/* The period of a key; BC_ERR_INPUT: one more than are kept. */
BC_MUST_USE bc_status tally_take_period(tally *t, int64_t key, tally_group **group, bc_error *err);

/* Doubles the steps of the trend until there are no more than are kept. */
void tally_narrow_trend(tally *t);

/* The pending row's weight becomes known: the time of the next row, TALLY_NO_TIME where it has none or there is none. */
BC_MUST_USE bc_status tally_account(tally *t, int64_t next_ms, bool last, bc_error *err);

/* Adds a row's limits to the excursions; `gap` follows. */
void tally_account_limits(tally *t, const tally_share *share, bool gap);

/* An excursion is over: it is told, then kept apart when it leads, else counted. */
void tally_end_run(tally *t, size_t limit, bool at_end);
void tally_count_run(tally *t, const tally_stretch *s);
void tally_run_of(const tally *t, const tally_stretch *s, tally_run *run);

/* How the plans of two parts differ, as words; false when they do not. */
bool tally_plans_differ(const tally_plan *a, const tally_plan *b, char text[], size_t size);

#endif
