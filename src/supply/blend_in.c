/* SPDX-License-Identifier: MIT */
/* blend_in.c - the shares of a new gas at which verdicts change, by bracketing and bisection. */
#include "bluecone/blend_in.h"

#include <string.h>

#define SHARE_RESOLUTION 1e-9

/* The way from the old gas to the new one, with room for a judgement on it. */
typedef struct {
    const bc_subject *old_gas, *new_gas;
    const bc_burner *burner;
    double new_gas_k;
    bc_switch here;
} way;

static bc_status judge_at(way *w, double share, bc_error *err)
{
    bc_gas mixed = {{0.0}};
    bc_subject subject;

    for (size_t i = 0; i < bc_species_count(); i++)
        mixed.x[i] = (1.0 - share) * w->old_gas->gas.x[i] + share * w->new_gas->gas.x[i];
    const bc_status status = bc_subject_make(w->old_gas->reference, &mixed, NULL, &subject, err);

    return status == BC_OK ? bc_switch_judge(w->old_gas, &subject, w->burner, w->new_gas_k, &w->here, err) : status;
}

/* What is asked of a judgement: does the event of a criterion hold there? */
typedef enum { EVENT_CAUTION, EVENT_BROKEN, EVENT_BLIND, EVENT_ADJUSTS, EVENT_REFUSES } event;

static bool holds(const bc_switch *s, event what, size_t criterion)
{
    const bc_verdict verdict = s->criteria[criterion].verdict;

    switch (what) {
    case EVENT_CAUTION:
        return verdict == BC_VERDICT_CAUTION || verdict == BC_VERDICT_NOT_ACCEPTABLE;
    case EVENT_BROKEN:
        return verdict == BC_VERDICT_NOT_ACCEPTABLE;
    case EVENT_BLIND:
        return verdict == BC_VERDICT_CANNOT_JUDGE;
    case EVENT_ADJUSTS:
        return s->verdict != BC_SWITCH_TAKES;
    case EVENT_REFUSES:
    default:
        return s->verdict == BC_SWITCH_NO;
    }
}

/* The event does not hold at `low` and holds at `high`. */
static bc_status bisect(way *w, event what, size_t criterion, double low, bc_crossing *crossing, bc_error *err)
{
    double high = crossing->share;

    while (high - low > SHARE_RESOLUTION) {
        const double middle = 0.5 * (low + high);
        const bc_status status = judge_at(w, middle, err);

        if (status != BC_OK)
            return status;
        if (holds(&w->here, what, criterion))
            high = middle;
        else
            low = middle;
    }
    crossing->share = high;
    return BC_OK;
}

/* Marks the events that hold for the first time at a step; bisection comes once all steps are known. */
static void note(const bc_switch *s, event what, size_t criterion, double share, bc_crossing *crossing)
{
    if (crossing->exists || !holds(s, what, criterion))
        return;
    crossing->exists = true;
    crossing->share = share;
}

static void note_step(const bc_switch *s, size_t step, bc_blend_in *b)
{
    const double share = (double)step / BC_BLEND_IN_STEPS;

    for (size_t i = 0; i < b->count; i++) {
        bc_blend_criterion *c = &b->criteria[i];

        note(s, EVENT_CAUTION, i, share, &c->caution);
        note(s, EVENT_BROKEN, i, share, &c->broken);
        note(s, EVENT_BLIND, i, share, &c->blind);
        c->has[step] = s->criteria[i].has_value;
        c->value[step] = s->criteria[i].value;
    }
    note(s, EVENT_ADJUSTS, 0, share, &b->adjusts);
    note(s, EVENT_REFUSES, 0, share, &b->refuses);
}

static void begin(const bc_switch *s, bc_blend_in *b)
{
    memset(b, 0, sizeof *b);
    b->count = s->count;
    for (size_t i = 0; i < s->count; i++) {
        const bc_criterion *c = &s->criteria[i];

        b->criteria[i].id = c->id;
        b->criteria[i].label = c->label;
        b->criteria[i].unit = c->unit;
        b->criteria[i].decimals = c->decimals;
        b->criteria[i].of_burner = c->of_burner;
        b->criteria[i].counts = c->counts;
        b->criteria[i].acceptable = c->acceptable;
    }
}

static bc_status walk(way *w, bc_blend_in *b, bc_error *err)
{
    bc_status status = judge_at(w, 0.0, err);

    if (status != BC_OK)
        return status;
    begin(&w->here, b);
    note_step(&w->here, 0, b);
    for (size_t step = 1; step <= BC_BLEND_IN_STEPS && status == BC_OK; step++) {
        status = judge_at(w, (double)step / BC_BLEND_IN_STEPS, err);
        if (status == BC_OK)
            note_step(&w->here, step, b);
    }
    return status;
}

static bc_status refine(way *w, event what, size_t criterion, bc_crossing *crossing, bc_error *err)
{
    if (!crossing->exists || !(crossing->share > 0.0))
        return BC_OK;
    return bisect(w, what, criterion, crossing->share - 1.0 / BC_BLEND_IN_STEPS, crossing, err);
}

static bc_status refine_all(way *w, bc_blend_in *b, bc_error *err)
{
    bc_status status = BC_OK;

    for (size_t i = 0; i < b->count && status == BC_OK; i++) {
        status = refine(w, EVENT_CAUTION, i, &b->criteria[i].caution, err);
        if (status == BC_OK)
            status = refine(w, EVENT_BROKEN, i, &b->criteria[i].broken, err);
        if (status == BC_OK)
            status = refine(w, EVENT_BLIND, i, &b->criteria[i].blind, err);
    }
    if (status == BC_OK)
        status = refine(w, EVENT_ADJUSTS, 0, &b->adjusts, err);
    return status == BC_OK ? refine(w, EVENT_REFUSES, 0, &b->refuses, err) : status;
}

bc_status bc_blend_in_of(const bc_subject *old_gas, const bc_subject *new_gas, const bc_burner *burner, double new_gas_k, bc_blend_in *result,
                         bc_error *err)
{
    way w = {.old_gas = old_gas, .new_gas = new_gas, .burner = burner, .new_gas_k = new_gas_k};
    bc_blend_in b;
    bc_status status = walk(&w, &b, err);

    if (status == BC_OK)
        status = refine_all(&w, &b, err);
    if (status == BC_OK)
        *result = b;
    return status;
}
