/* SPDX-License-Identifier: MIT */
/* stream_sum.c - the rows of a stream into a tally. */
#include "cli/stream_sum.h"

#include "base/error_internal.h"
#include "cli/contract_report.h"

#include <stdio.h>
#include <stdlib.h>
#include <string.h>

static bc_status take_period(const char *text, tally_period *by, bc_error *err)
{
    static const char *const WORDS[] = {"hour", "day", "month"};
    static const tally_period PERIODS[] = {TALLY_HOUR, TALLY_DAY, TALLY_MONTH};

    *by = TALLY_WHOLE;
    for (size_t i = 0; text && i < BC_COUNT(WORDS); i++)
        if (strcmp(text, WORDS[i]) == 0)
            *by = PERIODS[i];
    if (text && *by == TALLY_WHOLE)
        return bc_fail(err, BC_ERR_USAGE, "--by %.20s: write hour, day or month", text);
    return BC_OK;
}

bc_status stream_sum_ask(stream_plan *p, tally_period *by, bc_error *err)
{
    const arguments *a = p->a;
    const bool whole = a->value[OPTION_summary] != NULL;
    const bool part = a->value[OPTION_summary_part] != NULL;

    if (whole && part)
        return bc_fail(err, BC_ERR_USAGE, "--summary is for people and --summary-part for --merge; ask for one of them");
    if (!whole && !part && (a->value[OPTION_json] || a->value[OPTION_csv]))
        return bc_fail(err, BC_ERR_USAGE, "--%s is a form of --summary; rows come out in the form of the log", a->value[OPTION_json] ? "json" : "csv");
    if (!whole && !part && a->value[OPTION_period])
        return bc_fail(err, BC_ERR_USAGE, "--by is about a summary: add --summary or --summary-part");
    if (a->value[OPTION_excursions] && !p->contract)
        return bc_fail(err, BC_ERR_USAGE, "--excursions needs the limits: add --contract FILE");
    if (a->value[OPTION_excursions] && part)
        return bc_fail(err, BC_ERR_USAGE, "--excursions is written of the whole log: ask for it with --merge");
    p->keeps = whole || part || a->value[OPTION_excursions];
    p->drops = whole || part;
    return take_period(a->value[OPTION_period], by, err);
}

bc_status stream_sum_open(stream_sum *s, const stream_plan *p, tally_period by, bc_error *err)
{
    memset(s, 0, sizeof *s);
    s->p = p;
    s->by = by;
    if (p->a->value[OPTION_summary_part] && p->has_time && !(p->step_s > 0.0))
        return bc_fail(err, BC_ERR_USAGE, "--summary-part needs --step, the usual time between two rows, so that all parts count alike");
    s->first = malloc(STREAM_SUM_FIRST * sizeof *s->first);
    return s->first ? BC_OK : bc_fail(err, BC_ERR_MEMORY, "not enough memory for a summary");
}

void stream_sum_close(stream_sum *s)
{
    tally_close(s->t);
    free(s->first);
    s->t = NULL;
    s->first = NULL;
}

/* ---- what is tallied --------------------------------------------------------------------------------------------------- */

static void name_figures(const stream_plan *p, tally_plan *plan)
{
    plan->figure_count = p->figure_count;
    for (size_t i = 0; i < p->figure_count; i++) {
        const bc_quantity *q = bc_quantity_at(p->figures[i].quantity);
        tally_figure_name *name = &plan->figures[i];

        (void)snprintf(name->id, sizeof name->id, "%s", q->id);
        (void)snprintf(name->label, sizeof name->label, "%s", q->label);
        (void)snprintf(name->unit, sizeof name->unit, "%s", p->figures[i].unit);
    }
}

static void name_limits(const stream_plan *p, tally_plan *plan)
{
    const bc_contract *c = p->contract;

    plan->limit_count = c ? c->limit_count : 0;
    for (size_t i = 0; i < plan->limit_count; i++) {
        const bc_limit *limit = &c->limits[i];
        tally_limit_name *name = &plan->limits[i];

        memcpy(name->id, limit->id, sizeof name->id);
        memcpy(name->unit, limit->unit, sizeof name->unit);
        contract_state_text(c, limit, name->state, sizeof name->state);
        name->has_min = limit->has_min;
        name->has_max = limit->has_max;
        name->min = limit->has_min ? limit->min : 0.0;
        name->max = limit->has_max ? limit->max : 0.0;
    }
    if (c)
        (void)snprintf(plan->contract, sizeof plan->contract, "%s", c->name);
}

static void name_flags(tally_plan *plan)
{
    plan->flag_count = STREAM_FLAGS;
    for (size_t i = 0; i < STREAM_FLAGS; i++) {
        (void)snprintf(plan->flags[i].id, sizeof plan->flags[i].id, "%s", stream_flag_word(i));
        (void)snprintf(plan->flags[i].label, sizeof plan->flags[i].label, "%s", stream_flag_meaning(i));
    }
}

static int compare(const void *a, const void *b)
{
    const double x = *(const double *)a;
    const double y = *(const double *)b;

    return (x > y) - (x < y);
}

/* The median of the steps forward of the first rows. */
static double find_step(const stream_sum *s)
{
    double steps[STREAM_SUM_FIRST];
    size_t count = 0;

    for (size_t i = 1; i < s->first_count; i++) {
        const double step = s->first[i].row.time_s - s->first[i - 1].row.time_s;

        if (step > 0.0)
            steps[count++] = step;
    }
    if (count == 0)
        return 0.0;
    qsort(steps, count, sizeof *steps, compare);
    return steps[count / 2];
}

bc_status stream_sum_begin(stream_sum *s, bc_error *err)
{
    const stream_plan *p = s->p;
    tally_plan *plan = calloc(1, sizeof *plan);

    if (!plan)
        return bc_fail(err, BC_ERR_MEMORY, "not enough memory for a summary");
    name_figures(p, plan);
    name_limits(p, plan);
    name_flags(plan);
    plan->at = p->state;
    bc_state_describe(&p->state, plan->state, sizeof plan->state);
    plan->by = s->by;
    plan->zoned = s->zoned;
    plan->step_s = !p->has_time ? 0.0 : p->step_s > 0.0 ? p->step_s : find_step(s);
    bc_status status = tally_open(plan, &s->t, err);

    free(plan);
    for (size_t i = 0; i < s->first_count && status == BC_OK; i++) {
        s->first[i].row.values = s->first[i].values;
        s->first[i].row.limit_values = s->first[i].limits;
        status = tally_add(s->t, &s->first[i].row, err);
    }
    return status;
}

/* ---- rows ---------------------------------------------------------------------------------------------------------------- */

static bc_status hold(stream_sum *s, const tally_row *row, bc_error *err)
{
    stream_held *held = &s->first[s->first_count++];

    held->row = *row;
    memcpy(held->values, row->values, s->p->figure_count * sizeof *row->values);
    if (s->p->contract && row->limit_values)
        memcpy(held->limits, row->limit_values, s->p->contract->limit_count * sizeof *row->limit_values);
    return s->first_count == STREAM_SUM_FIRST ? stream_sum_begin(s, err) : BC_OK;
}

/* A row counts when it has results and, in a log with times, one of the log's own clock; calibration gas is no gas of the
 * line. */
static bool counts(stream_sum *s, const stream_mark *mark)
{
    if (!mark->good || (s->p->has_time && !mark->has_time))
        return false;
    if (!s->t && s->first_count == 0)
        s->zoned = mark->zoned;
    return !s->p->has_time || mark->zoned == s->zoned;
}

bc_status stream_sum_add(stream_sum *s, const stream_batch *b, bc_error *err)
{
    const stream_plan *p = s->p;
    bc_status status = BC_OK;

    for (size_t i = 0; i < b->count && status == BC_OK; i++) {
        const stream_mark *mark = &b->marks[i];
        const tally_row row = {.has_time = mark->has_time, .time_s = mark->time_s, .has_flow = mark->has_power, .power_w = mark->power_w,
                               .values = b->figures + i * p->figure_count, .limit_values = p->contract ? b->limits + i * stream_limits(p) : NULL,
                               .known = mark->known, .broken = mark->broken};

        for (size_t k = 0; mark->flags >> k; k++)
            s->flagged[k] += mark->flags >> k & 1U;
        if (mark->flags >> STREAM_calibration & 1U)
            continue;
        if (!counts(s, mark))
            s->refused++;
        else
            status = s->t ? tally_add(s->t, &row, err) : hold(s, &row, err);
    }
    return status;
}
