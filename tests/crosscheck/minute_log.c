/* SPDX-License-Identifier: MIT */
/* minute_log.c - an invented log of any length, an analysis a minute: minute_log ROWS [FIRST_ROW], CSV to standard output.
 *
 * A row depends on its number alone, so that ranges of rows are pieces of the same log. The gas is that of Marrowfen's
 * present supply, drifting over days; hydrogen from a trial of the grid breaks the contract now and then. Now and then
 * the analyser has an outage (too small a sum), stands under its limit of detection, jumps, or is silent for minutes.
 * The header stands before row 0 only. */
#include <stdint.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>

#define BEGIN_DAY 11017     /* 2000-03-01, days since 1970 */
#define MINUTES_A_DAY 1440
#define OUTAGE_EVERY 9973   /* primes, so that the kinds of trouble meet in every combination */
#define TRACE_EVERY 7919
#define JUMP_EVERY 20011
#define SILENCE_EVERY 40009
#define SILENCE_MINUTES 10
#define TRIAL_EVERY 20161   /* two weeks of minutes, odd */
#define TRIAL_MINUTES 300

static const char HEADER[] =
    "time,methane,ethane,propane,isobutane,n-butane,isopentane,n-pentane,n-hexane,nitrogen,carbon dioxide,hydrogen,oxygen,flow [m3/h]\n";

/* SplitMix64 (Steele, Lea, Flood, OOPSLA 2014): the noise of a row from its number. */
static uint64_t noise(uint64_t *state)
{
    uint64_t z = *state += UINT64_C(0x9e3779b97f4a7c15);

    z = (z ^ z >> 30) * UINT64_C(0xbf58476d1ce4e5b9);
    z = (z ^ z >> 27) * UINT64_C(0x94d049bb133111eb);
    return z ^ z >> 31;
}

static long between(uint64_t *state, long least, long most)
{
    return least + (long)(noise(state) % (uint64_t)(most - least + 1));
}

/* A slow swing between 0 and height. */
static long swing(uint64_t row, uint64_t period, long height)
{
    const uint64_t at = row % period;
    const uint64_t up = at < period / 2 ? at : period - at;

    return (long)(up * 2 * (uint64_t)height / period);
}

static char *put_digits(char *to, unsigned long value, int digits)
{
    for (int i = digits - 1; i >= 0; i--, value /= 10)
        to[i] = (char)('0' + value % 10);
    return to + digits;
}

/* Thousandths, three digits behind the point. */
static char *put_share(char *to, long thousandths)
{
    const unsigned long whole = (unsigned long)thousandths / 1000;

    *to++ = ',';
    to = put_digits(to, whole, whole > 9 ? 2 : 1);
    *to++ = '.';
    return put_digits(to, (unsigned long)thousandths % 1000, 3);
}

/* Days to a date: H. Hinnant, "chrono-compatible low-level date algorithms", civil_from_days. */
static char *put_time(char *to, uint64_t minute)
{
    const unsigned long z = (unsigned long)(minute / MINUTES_A_DAY) + BEGIN_DAY + 719468;
    const unsigned long era = z / 146097;
    const unsigned long day_of_era = z % 146097;
    const unsigned long year = (day_of_era - day_of_era / 1460 + day_of_era / 36524 - day_of_era / 146096) / 365;
    const unsigned long day_of_year = day_of_era - (365 * year + year / 4 - year / 100);
    const unsigned long shifted = (5 * day_of_year + 2) / 153;
    const unsigned long month = shifted < 10 ? shifted + 3 : shifted - 9;

    to = put_digits(to, year + era * 400 + (month <= 2), 4);
    *to++ = '-';
    to = put_digits(to, month, 2);
    *to++ = '-';
    to = put_digits(to, day_of_year - (153 * shifted + 2) / 5 + 1, 2);
    *to++ = 'T';
    to = put_digits(to, (unsigned long)(minute % MINUTES_A_DAY / 60), 2);
    *to++ = ':';
    return put_digits(to, (unsigned long)(minute % 60), 2);
}

static char *put_row(char *to, uint64_t row)
{
    uint64_t state = row;
    long shares[11] = {0, 4200 + swing(row, 5000, 900), 900 + swing(row, 7000, 300), 160, 180, 40, 30, 50,
                       1100 + swing(row, 11000, 400), 1300, row % TRIAL_EVERY < TRIAL_MINUTES ? 10500 : 2900};
    long sum = 10;

    for (size_t i = 1; i < 11; i++) {
        shares[i] += between(&state, 0, 19);
        sum += shares[i];
    }
    shares[0] = 100000 - sum + between(&state, -30, 30);
    if (row % JUMP_EVERY == JUMP_EVERY - 1) {
        shares[0] -= 12000;
        shares[8] += 12000;
    }
    if (row % OUTAGE_EVERY == OUTAGE_EVERY - 1)
        shares[0] -= 27000;

    to = put_time(to, row + row / SILENCE_EVERY * SILENCE_MINUTES);
    for (size_t i = 0; i < 11; i++)
        to = put_share(to, shares[i]);
    const char *oxygen = row % TRACE_EVERY == TRACE_EVERY - 1 ? ",<0.01," : ",0.010,";

    memcpy(to, oxygen, strlen(oxygen));
    to = put_digits(to + strlen(oxygen), (unsigned long)between(&state, 1400, 1800), 4);
    *to++ = '\n';
    return to;
}

int main(int argc, char **argv)
{
    const uint64_t rows = argc > 1 ? strtoull(argv[1], NULL, 10) : 0;
    const uint64_t first = argc > 2 ? strtoull(argv[2], NULL, 10) : 0;
    static char text[1 << 16];
    char *to = text;

    if (first == 0)
        fputs(HEADER, stdout);
    for (uint64_t row = first; row < first + rows; row++) {
        to = put_row(to, row);
        if (to > text + sizeof text - 512) {
            fwrite(text, 1, (size_t)(to - text), stdout);
            to = text;
        }
    }
    fwrite(text, 1, (size_t)(to - text), stdout);
    return fflush(stdout) == 0 ? 0 : 1;
}
