/* SPDX-License-Identifier: MIT */
/* tally_calendar.h - the periods of a tally by the Gregorian calendar of the log's own clock. */
#ifndef TALLY_CALENDAR_H
#define TALLY_CALENDAR_H

#include <stdint.h>

#include "supply/tally.h"

#define TALLY_LATEST_MS INT64_C(253402300799999) /* end of the year 9999 */

/* Hours, days, or months since 1970. */
int64_t tally_period_key(tally_period by, int64_t ms);

/* Where a period begins; the next one begins where it ends. */
int64_t tally_period_begin_ms(tally_period by, int64_t key);

#endif
