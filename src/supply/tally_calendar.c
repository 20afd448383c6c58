/* SPDX-License-Identifier: MIT */
/* tally_calendar.c - from times to periods and back. */
#include "supply/tally_calendar.h"

#include "supply/log_internal.h"

#define HOUR_MS INT64_C(3600000)
#define DAY_MS (24 * HOUR_MS)

/* Months since January 1970. The guess is at most one off: 400 years are 4800 months and 146097 days, and no month
 * begins further than two days from where months of that length would. */
static int64_t month_of(long day)
{
    int64_t month = (int64_t)day * 4800 / 146097;

    while (tally_period_begin_ms(TALLY_MONTH, month) > day * DAY_MS)
        month--;
    while (tally_period_begin_ms(TALLY_MONTH, month + 1) <= day * DAY_MS)
        month++;
    return month;
}

int64_t tally_period_key(tally_period by, int64_t ms)
{
    if (by == TALLY_MONTH)
        return month_of((long)(ms / DAY_MS));
    return ms / (by == TALLY_DAY ? DAY_MS : HOUR_MS);
}

int64_t tally_period_begin_ms(tally_period by, int64_t key)
{
    if (by == TALLY_MONTH)
        return log_days_from(1970 + (int)(key / 12), (int)(key % 12) + 1, 1) * DAY_MS;
    return key * (by == TALLY_DAY ? DAY_MS : HOUR_MS);
}
