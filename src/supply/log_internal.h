/* SPDX-License-Identifier: MIT */
/* log_internal.h - what a log keeps of its rows. */
#ifndef LOG_INTERNAL_H
#define LOG_INTERNAL_H

#include "bluecone/log.h"

#include <stdint.h>

/* A row; a bit for each limit. */
typedef struct {
    double time_s, held_s;
    double power_w;         /* gross */
    uint64_t known, broken; /* the figure is there; it breaks the limit */
    bool has_flow;
    bool gap;               /* follows */
} log_row;

struct bc_log {
    const bc_contract *contract;
    bc_reference reference; /* of the contract's state, for the heat */
    size_t limits;
    double step_s;
    size_t count, room;
    log_row *rows;
    double *values;         /* row by row, one for each limit */
};

/* The figure of a row. */
static inline double log_value(const bc_log *log, size_t row, size_t limit)
{
    return log->values[row * log->limits + limit];
}

static inline bool log_bit(uint64_t set, size_t limit)
{
    return (set >> limit & 1U) != 0;
}

/* Days from 1970-01-01 to a day of the Gregorian calendar. */
long log_days_from(int year, int month, int day);

#endif
