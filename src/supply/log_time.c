/* SPDX-License-Identifier: MIT */
/* log_time.c - times of ISO 8601 to seconds and back, without the clock and the zones of a machine. */
#include "supply/log_internal.h"

#include "base/error_internal.h"
#include "base/text.h"

#include <stdio.h>
#include <string.h>

#define DAY_S 86400

/* Days from 1970-01-01 to a day of the Gregorian calendar; eras of 400 years start on 1 March. After H. Hinnant,
 * "chrono-Compatible Low-Level Date Algorithms", days_from_civil. */
long log_days_from(int year, int month, int day)
{
    const int y = month <= 2 ? year - 1 : year;
    const int era = y / 400;
    const int of_era = y - era * 400;
    const int of_year = (153 * (month > 2 ? month - 3 : month + 9) + 2) / 5 + day - 1;

    return (long)era * 146097 + of_era * 365L + of_era / 4 - of_era / 100 + of_year - 719468;
}

static int days_in(int year, int month)
{
    static const int DAYS[] = {31, 28, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31};
    const bool leap = (year % 4 == 0 && year % 100 != 0) || year % 400 == 0;

    return month == 2 && leap ? 29 : DAYS[month - 1];
}

/* Takes a number of so many digits; false when it is none or outside of low..high. */
static bool take(const char **p, int digits, int low, int high, int *number)
{
    int n = 0;

    for (int i = 0; i < digits; i++, (*p)++) {
        if (**p < '0' || **p > '9')
            return false;
        n = n * 10 + (**p - '0');
    }
    *number = n;
    return n >= low && n <= high;
}

static bool take_sign(const char **p, char sign)
{
    if (**p != sign)
        return false;
    (*p)++;
    return true;
}

/* 2026-03-01 of ISO 8601, 2026/03/01, or 01.03.2026: points stand behind a day and a month wherever they stand at all,
 * while 01/03/2026 is one day here and another one there. */
static bool take_date(const char **p, long *days)
{
    const bool day_first = strlen(*p) > 2 && (*p)[2] == '.';
    const char sign = day_first ? '.' : strlen(*p) > 4 && (*p)[4] == '/' ? '/' : '-';
    int year = 0;
    int month = 0;
    int day = 0;
    const bool found = day_first ? take(p, 2, 1, 31, &day) && take_sign(p, sign) && take(p, 2, 1, 12, &month) && take_sign(p, sign) && take(p, 4, 1970, 9999, &year)
                                 : take(p, 4, 1970, 9999, &year) && take_sign(p, sign) && take(p, 2, 1, 12, &month) && take_sign(p, sign) && take(p, 2, 1, 31, &day);

    if (!found || day > days_in(year, month))
        return false;
    *days = log_days_from(year, month, day);
    return true;
}

/* The clock behind a date; none is midnight. Fractions of a second are read over. */
static bool take_clock(const char **p, long *seconds)
{
    int hour = 0;
    int minute = 0;
    int second = 0;

    if (**p == '\0')
        return true;
    if (!take_sign(p, 'T') && !take_sign(p, ' '))
        return false;
    if (!take(p, 2, 0, 23, &hour) || !take_sign(p, ':') || !take(p, 2, 0, 59, &minute))
        return false;
    if (take_sign(p, ':')) {
        if (!take(p, 2, 0, 59, &second))
            return false;
        if (take_sign(p, '.'))
            *p += strspn(*p, "0123456789");
    }
    *seconds = hour * 3600L + minute * 60L + second;
    return true;
}

/* Z, +01:00, -0330 or +01 at the end. */
static bool take_zone(const char **p, long *offset, bool *zoned)
{
    const int sign = **p == '-' ? -1 : 1;
    int hours = 0;
    int minutes = 0;

    *offset = 0;
    *zoned = **p != '\0';
    if (!*zoned || take_sign(p, 'Z'))
        return **p == '\0';
    if (!take_sign(p, '+') && !take_sign(p, '-'))
        return false;
    if (!take(p, 2, 0, 14, &hours))
        return false;
    (void)take_sign(p, ':');
    if (**p != '\0' && !take(p, 2, 0, 59, &minutes))
        return false;
    *offset = sign * (hours * 3600L + minutes * 60L);
    return **p == '\0';
}

bc_status bc_log_time_parse(const char *text, double *time_s, bool *zoned, bc_error *err)
{
    char word[BC_WORD_MAX];
    char shown[40];
    const char *p = word;
    long days = 0;
    long seconds = 0;
    long offset = 0;
    bool has_zone = false;

    if (bc_text_copy(word, sizeof word, text, strlen(text)) && take_date(&p, &days) && take_clock(&p, &seconds)
        && take_zone(&p, &offset, &has_zone)) {
        *time_s = (double)(days * DAY_S + seconds - offset);
        *zoned = has_zone;
        return BC_OK;
    }
    bc_text_show(shown, sizeof shown, text);
    return bc_fail(err, BC_ERR_INPUT, "'%s' is no time; write it as 2026-03-01T12:00", shown);
}

void bc_log_time_text(double time_s, char text[BC_LOG_TIME_TEXT])
{
    const long all = (long)time_s;
    const long of_day = ((all % DAY_S) + DAY_S) % DAY_S;
    const long days = (all - of_day) / DAY_S;
    int year = 1970 + (int)(days / 366); /* not after the year looked for */
    int month = 1;

    while (days >= log_days_from(year + 1, 1, 1))
        year++;
    while (month < 12 && days >= log_days_from(year, month + 1, 1))
        month++;
    const int day = (int)(days - log_days_from(year, month, 1)) + 1;
    const int used = snprintf(text, BC_LOG_TIME_TEXT, "%04d-%02d-%02d %02d:%02d", year % 10000, month, day % 100, (int)(of_day / 3600),
                              (int)(of_day / 60 % 60));

    if (of_day % 60 != 0 && used > 0 && used < BC_LOG_TIME_TEXT)
        (void)snprintf(text + used, (size_t)(BC_LOG_TIME_TEXT - used), ":%02d", (int)(of_day % 60));
}
