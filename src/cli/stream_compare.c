/* SPDX-License-Identifier: MIT */
/* stream_compare.c - rules that look at a row beside those before it. They need no row behind it, so that a log can be
 * followed while it grows. */
#include "cli/stream.h"

#include <math.h>
#include <stdio.h>
#include <string.h>

#define HOUR_S 3600.0
#define DAY_S 86400.0
#define STEPS_NEEDED 3   /* before a usual step is believed */
#define FROZEN_ROWS 12   /* beyond what an analyser with a cycle of several rows repeats */
#define SPIKE 0.05       /* relative: no network changes its Wobbe index so far for one analysis alone */

static const struct {
    const char *word, *meaning;
} FLAGS[] = {
#define FLAG(name, word, meaning) {word, meaning},
#include "cli/stream_flags.def"
};

const char *stream_flag_word(size_t flag)
{
    return FLAGS[flag].word;
}

const char *stream_flag_meaning(size_t flag)
{
    return FLAGS[flag].meaning;
}

size_t stream_flags_text(uint32_t flags, char text[STREAM_FLAGS_TEXT])
{
    size_t used = 0;

    text[0] = '\0';
    for (size_t i = 0; i < STREAM_FLAGS; i++)
        if (flags >> i & 1U)
            used += (size_t)snprintf(text + used, STREAM_FLAGS_TEXT - used, "%s%s", used > 0 ? " " : "", FLAGS[i].word);
    return used;
}

static void set(stream_mark *mark, stream_flag flag)
{
    mark->flags |= (uint32_t)1 << flag;
}

/* The middle one of a few values, which are sorted by insertion. */
static double median_of(const double values[], size_t count)
{
    double sorted[STREAM_STEPS] = {0.0};

    for (size_t i = 0; i < count; i++) {
        size_t at = i;

        for (; at > 0 && sorted[at - 1] > values[i]; at--)
            sorted[at] = sorted[at - 1];
        sorted[at] = values[i];
    }
    return sorted[count / 2];
}

static bool same(double a, double b)
{
    return !(a < b) && !(a > b);
}

/* While every step is the usual one there is no median to be worked out again. */
static void learn_step(const stream_plan *p, stream_past *past, double step)
{
    const double replaced = past->step_count == STREAM_STEPS ? past->steps[past->step_next] : 0.0;

    past->steps[past->step_next] = step;
    past->step_next = (past->step_next + 1) % STREAM_STEPS;
    past->step_count += past->step_count < STREAM_STEPS;
    if (p->step_s > 0.0)
        past->step_s = p->step_s;
    else if (past->step_count >= STEPS_NEEDED && !(same(step, past->step_s) && same(replaced, past->step_s)))
        past->step_s = median_of(past->steps, past->step_count);
}

/* Clocks are changed on a Sunday between midnight and four, in spring and in autumn of either hemisphere. */
static bool is_hour_of_change(double time_s)
{
    char text[BC_LOG_TIME_TEXT];
    const double day = floor(time_s / DAY_S);

    if (fmod(day + 4.0, 7.0) > 0.5 || time_s - day * DAY_S > 4.0 * HOUR_S) /* 1970-01-01 was a Thursday */
        return false;
    bc_log_time_text(time_s, text);
    const int month = (text[5] - '0') * 10 + text[6] - '0';

    return month == 3 || month == 4 || (month >= 9 && month <= 11);
}

static bool is_saving(const stream_past *past, const stream_mark *mark, double step)
{
    const double off = step - past->step_s;

    return !mark->zoned && past->step_s > 0.0 && fabs(fabs(off) - HOUR_S) < 0.5 * fmin(past->step_s, HOUR_S)
        && is_hour_of_change(fmin(mark->time_s, past->time_s));
}

static void compare_times(const stream_plan *p, stream_past *past, stream_mark *mark)
{
    const double step = mark->time_s - past->time_s;

    if (past->has_time && past->zoned == mark->zoned) {
        if (is_saving(past, mark, step))
            set(mark, STREAM_saving);
        else if (step < 0.0)
            set(mark, STREAM_back);
        else if (!(step > 0.0))
            set(mark, STREAM_repeated);
        else if (past->step_s > 0.0 && step > BC_LOG_GAP * past->step_s)
            set(mark, STREAM_gap);
        if (step > 0.0)
            learn_step(p, past, step);
    }
    past->has_time = true;
    past->zoned = mark->zoned;
    past->time_s = mark->time_s;
}

static void compare_gases(stream_past *past, stream_mark *mark)
{
    past->alike = mark->fingerprint == past->fingerprint ? past->alike + 1 : 1;
    past->fingerprint = mark->fingerprint;
    if (past->alike >= FROZEN_ROWS)
        set(mark, STREAM_frozen);
    if (past->wobbe_count == STREAM_NEIGHBOURS && past->alike == 1) {
        const double usual = median_of(past->wobbe, STREAM_NEIGHBOURS);

        if (fabs(mark->wobbe - usual) > SPIKE * usual)
            set(mark, STREAM_spike);
    }
    past->wobbe[past->wobbe_next] = mark->wobbe;
    past->wobbe_next = (past->wobbe_next + 1) % STREAM_NEIGHBOURS;
    past->wobbe_count += past->wobbe_count < STREAM_NEIGHBOURS;
}

/* Calibration gas is no gas of the line, and says nothing about a spike. */
void stream_compare(const stream_plan *p, stream_past *past, stream_batch *b)
{
    for (size_t i = 0; i < b->count; i++) {
        stream_mark *mark = &b->marks[i];

        if (mark->has_time)
            compare_times(p, past, mark);
        if (mark->good && !(mark->flags >> STREAM_calibration & 1U))
            compare_gases(past, mark);
    }
}
