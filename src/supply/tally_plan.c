/* SPDX-License-Identifier: MIT */
/* tally_plan.c - whether two tallies are parts of one log's. */
#include "supply/tally_internal.h"

#include "base/text.h"

#include <stdio.h>
#include <string.h>

static bool same(double a, double b)
{
    return a >= b && a <= b;
}

static bool same_figure(const tally_figure_name *a, const tally_figure_name *b)
{
    return strcmp(a->id, b->id) == 0 && strcmp(a->label, b->label) == 0 && strcmp(a->unit, b->unit) == 0;
}

static bool same_limit(const tally_limit_name *a, const tally_limit_name *b)
{
    return strcmp(a->id, b->id) == 0 && strcmp(a->unit, b->unit) == 0 && strcmp(a->state, b->state) == 0 && a->has_min == b->has_min
           && a->has_max == b->has_max && same(a->min, b->min) && same(a->max, b->max);
}

static bool same_flag(const tally_flag_name *a, const tally_flag_name *b)
{
    return strcmp(a->id, b->id) == 0 && strcmp(a->label, b->label) == 0;
}

static bool figures_differ(const tally_plan *a, const tally_plan *b, char text[], size_t size)
{
    if (a->figure_count != b->figure_count)
        return snprintf(text, size, "%zu figures and %zu", a->figure_count, b->figure_count) > 0;
    for (size_t i = 0; i < a->figure_count; i++)
        if (!same_figure(&a->figures[i], &b->figures[i]))
            return snprintf(text, size, "the figure %s in %s and %s in %s", a->figures[i].id, a->figures[i].unit, b->figures[i].id,
                            b->figures[i].unit) > 0;
    return false;
}

static bool limits_differ(const tally_plan *a, const tally_plan *b, char text[], size_t size)
{
    if (strcmp(a->contract, b->contract) != 0)
        return snprintf(text, size, "the contracts '%.80s' and '%.80s'", a->contract, b->contract) > 0;
    if (a->limit_count != b->limit_count)
        return snprintf(text, size, "%zu limits and %zu", a->limit_count, b->limit_count) > 0;
    for (size_t i = 0; i < a->limit_count; i++)
        if (!same_limit(&a->limits[i], &b->limits[i]))
            return snprintf(text, size, "the limit %s of one and %s of the other", a->limits[i].id, b->limits[i].id) > 0;
    return false;
}

static bool flags_differ(const tally_plan *a, const tally_plan *b, char text[], size_t size)
{
    bool differ = a->flag_count != b->flag_count;

    for (size_t i = 0; i < a->flag_count && !differ; i++)
        differ = !same_flag(&a->flags[i], &b->flags[i]);
    return differ && snprintf(text, size, "the kinds of remarks on rows") > 0;
}

bool tally_plans_differ(const tally_plan *a, const tally_plan *b, char text[], size_t size)
{
    static const char *const PERIODS[] = {"nothing", "hour", "day", "month"};

    if (!same(a->step_s, b->step_s))
        return bc_text_format(text, size, "usual steps of %.10g s and %.10g s", a->step_s, b->step_s) > 0;
    if (a->by != b->by)
        return snprintf(text, size, "summed up by %s and by %s", PERIODS[a->by], PERIODS[b->by]) > 0;
    if (a->zoned != b->zoned)
        return snprintf(text, size, "times of UTC and of another clock") > 0;
    if (strcmp(a->state, b->state) != 0)
        return snprintf(text, size, "the reference states '%.80s' and '%.80s'", a->state, b->state) > 0;
    return figures_differ(a, b, text, size) || limits_differ(a, b, text, size) || flags_differ(a, b, text, size);
}
