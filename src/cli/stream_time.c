/* SPDX-License-Identifier: MIT */
/* stream_time.c - the time of a row; most rows have the date of the row before. */
#include "cli/stream_result.h"

#include <string.h>

#define DATE 10 /* 2026-03-01 */

static int two_digits(const char *text)
{
    const int tens = text[0] - '0';
    const int ones = text[1] - '0';

    return tens >= 0 && tens <= 9 && ones >= 0 && ones <= 9 ? 10 * tens + ones : -1;
}

/* "2026-03-01T12:00", "... 12:00:30", "...Z" on a date that was read already; false leaves it to the general reader. */
static bool read_clock(const stream_batch *b, stream_reading *r, const char *text, size_t length)
{
    const bool zulu = length > 0 && text[length - 1] == 'Z';
    const size_t bare = zulu ? length - 1 : length;

    if ((bare != 16 && bare != 19) || memcmp(text, b->day, DATE) != 0 || (text[DATE] != 'T' && text[DATE] != ' ') || text[13] != ':'
        || (bare == 19 && text[16] != ':'))
        return false;
    const int hour = two_digits(text + 11);
    const int minute = two_digits(text + 14);
    const int second = bare == 19 ? two_digits(text + 17) : 0;

    if (hour < 0 || hour > 23 || minute < 0 || minute > 59 || second < 0 || second > 59)
        return false;
    r->time_s = b->last_day_s + 3600.0 * hour + 60.0 * minute + second;
    r->zoned = zulu;
    return true;
}

bool stream_read_time(stream_batch *b, stream_reading *r, const char *text, size_t length)
{
    char word[2 * LOG_CELL_MAX];

    r->has_time = read_clock(b, r, text, length);
    if (r->has_time || length >= sizeof word)
        return r->has_time;
    memcpy(word, text, length);
    word[length] = '\0';
    if (bc_log_time_parse(word, &r->time_s, &r->zoned, NULL) != BC_OK)
        return false;
    r->has_time = true;
    if (length > DATE) {
        word[DATE] = '\0';
        bool zoned = false;

        if (bc_log_time_parse(word, &b->last_day_s, &zoned, NULL) == BC_OK)
            memcpy(b->day, word, DATE + 1);
    }
    return true;
}
