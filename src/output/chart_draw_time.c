/* SPDX-License-Identifier: MIT */
/* chart_draw_time.c - ticks at full hours, days, months and years of the proleptic Gregorian calendar. */
#include "output/chart_scale_internal.h"

#include <math.h>
#include <stdio.h>
#include <string.h>

#define DAY         86400.0   /* s */
#define MONTH       2629746.0 /* s, the mean one: 1/12 of 365.2425 d */
#define TIME_MAX    1e11      /* s, some three thousand years: beyond it the numbers are no times */
#define DAYS_OF_ERA 146097L   /* 400 years */
#define DAYS_BEFORE 719468L   /* from 0000-03-01 to 1970-01-01 */
#define MONDAY      4.0       /* 1970-01-05 */

typedef struct {
    long year, month, day;
} date;

static const double STEPS[] = {60.0,       120.0,   300.0,   600.0, 900.0,     1800.0,    3600.0,  7200.0,
                               3 * 3600.0, 21600.0, 43200.0, DAY,   2.0 * DAY, 7.0 * DAY, 14 * DAY};
static const long MONTHS[] = {1, 2, 3, 6, 12, 24, 60, 120, 240, 600, 1200, 6000, 12000};
static const char *const NAMES[] = {"Jan", "Feb", "Mar", "Apr", "May", "Jun",
                                    "Jul", "Aug", "Sep", "Oct", "Nov", "Dec"};

static long floor_divide(long a, long b)
{
    return a / b - (a % b < 0);
}

/* Years are taken from March to February, so that the leap day is their last; the numbers of days up
 * to a month are then (153 m + 2)/5. */
static date date_of(double seconds)
{
    const long days = (long)floor(seconds / DAY) + DAYS_BEFORE;
    const long era = floor_divide(days, DAYS_OF_ERA);
    const long of_era = days - era * DAYS_OF_ERA;
    const long year = (of_era - of_era / 1460 + of_era / 36524 - of_era / 146096) / 365;
    const long of_year = of_era - (365 * year + year / 4 - year / 100);
    const long m = (5 * of_year + 2) / 153;
    const long month = m < 10 ? m + 3 : m - 9;

    return (date){era * 400 + year + (month <= 2), month, of_year - (153 * m + 2) / 5 + 1};
}

/* The start of a month, counted from January of the year 0. */
static double start_of_month(long count)
{
    const long shifted = count - 2; /* from March on */
    const long year = floor_divide(shifted, 12);
    const long era = floor_divide(year, 400);
    const long m = shifted - year * 12;
    const long of_era = year - era * 400;
    const long days = of_era * 365 + of_era / 4 - of_era / 100 + (153 * m + 2) / 5;

    return (double)(era * DAYS_OF_ERA + days - DAYS_BEFORE) * DAY;
}

/* What a tick says, and what below it says which day or year: that is shown where it changes. */
static void write_clock(double seconds, chart_tick *tick)
{
    const date d = date_of(seconds);
    const long minutes = (long)floor((seconds - floor(seconds / DAY) * DAY) / 60.0 + 0.5);

    snprintf(tick->text, sizeof tick->text, "%02ld:%02ld", minutes / 60, minutes % 60);
    snprintf(tick->below, sizeof tick->below, "%04ld-%02ld-%02ld", d.year, d.month, d.day);
}

static void write_day(double seconds, chart_tick *tick)
{
    const date d = date_of(seconds);

    snprintf(tick->text, sizeof tick->text, "%ld %s", d.day, NAMES[d.month - 1]);
    snprintf(tick->below, sizeof tick->below, "%ld", d.year);
}

static void write_month(double seconds, chart_tick *tick)
{
    const date d = date_of(seconds);

    snprintf(tick->text, sizeof tick->text, "%s", NAMES[d.month - 1]);
    snprintf(tick->below, sizeof tick->below, "%ld", d.year);
}

static void write_year(double seconds, chart_tick *tick)
{
    snprintf(tick->text, sizeof tick->text, "%ld", date_of(seconds).year);
}

static void keep_changes(chart_tick *ticks, size_t count)
{
    for (size_t i = count; i > 1; i--)
        if (strcmp(ticks[i - 1].below, ticks[i - 2].below) == 0)
            ticks[i - 1].below[0] = '\0';
}

static size_t ticks_by_months(chart_range range, int wanted, chart_tick *ticks)
{
    const date first = date_of(range.low);
    size_t step = 0, count = 0;

    while (step + 1 < sizeof MONTHS / sizeof *MONTHS &&
           (double)MONTHS[step] * MONTH * wanted < range.high - range.low)
        step++;
    const long by = MONTHS[step];
    for (long m = floor_divide(first.year * 12 + first.month - 1, by) * by; count < CHART_TICKS_MAX;
         m += by) {
        const double at = start_of_month(m);

        if (at > range.high)
            break;
        if (at < range.low)
            continue;
        ticks[count] = (chart_tick){.at = at};
        (by < 12 ? write_month : write_year)(at, &ticks[count++]);
    }
    return count;
}

static size_t ticks_by_seconds(chart_range range, double step, chart_tick *ticks)
{
    const double origin = step > 2.0 * DAY ? MONDAY * DAY : 0.0;
    const double first = ceil((range.low - origin) / step);
    size_t count = 0;

    while (count < CHART_TICKS_MAX) {
        const double at = origin + (first + (double)count) * step;

        if (at > range.high)
            break;
        ticks[count] = (chart_tick){.at = at};
        (step < DAY ? write_clock : write_day)(at, &ticks[count++]);
    }
    return count;
}

size_t chart_time_ticks(chart_range range, int wanted, chart_tick ticks[CHART_TICKS_MAX])
{
    const size_t steps = sizeof STEPS / sizeof *STEPS;
    size_t step = 0, count = 0;

    if (fabs(range.low) > TIME_MAX || fabs(range.high) > TIME_MAX)
        return chart_number_ticks(range, wanted, ticks);
    while (step < steps && STEPS[step] * wanted < range.high - range.low)
        step++;
    count =
        step < steps ? ticks_by_seconds(range, STEPS[step], ticks) : ticks_by_months(range, wanted, ticks);
    keep_changes(ticks, count);
    return count;
}
