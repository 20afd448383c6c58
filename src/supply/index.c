/* SPDX-License-Identifier: MIT */
/* index.c - the list of indices, their evaluation and their verdict. */
#include "bluecone/index.h"

#include "base/compiler.h"
#include "base/error_internal.h"
#include "base/text.h"
#include "supply/index_internal.h"

#include <math.h>
#include <string.h>

/* A limit met to the last bits is kept: a gas against itself lies on the limit of three indices. */
#define ROUNDING 1e-9

typedef struct {
    bc_index_row shown;
    index_method *method;
} list_row;

#define NONE {false, 0.0, false, 0.0}
#define BY_CLASS NONE
#define MIN(a) {true, a, false, 0.0}
#define MAX(b) {false, 0.0, true, b}
#define BOTH(a, b) {true, a, true, b}

static const list_row ROWS[] = {
#define INDEX(id, method, kind, unit, digits, label, meaning, preferable, acceptable, limits_source, range, trust, source) \
    {{id, label, unit, meaning, range, trust, source, limits_source, kind, digits, preferable, acceptable}, method},
#include "data/indices.def"
};

size_t bc_index_count(void)
{
    return BC_COUNT(ROWS);
}

const bc_index_row *bc_index_at(size_t index)
{
    return index < BC_COUNT(ROWS) ? &ROWS[index].shown : NULL;
}

static bc_status refuse_id(const char *id, bc_error *err)
{
    const char *best = ROWS[0].shown.id;
    char shown[BC_WORD_MAX];

    for (size_t i = 0; i < BC_COUNT(ROWS); i++)
        if (bc_text_unlikeness(id, ROWS[i].shown.id) < bc_text_unlikeness(id, best))
            best = ROWS[i].shown.id;
    bc_text_show(shown, sizeof shown, id);
    return bc_fail(err, BC_ERR_USAGE, "unknown index '%s'; the nearest known one is '%s'", shown, best);
}

bc_status bc_index_find(const char *id, size_t *index, bc_error *err)
{
    for (size_t i = 0; i < BC_COUNT(ROWS); i++)
        if (bc_text_same(ROWS[i].shown.id, id)) {
            *index = i;
            return BC_OK;
        }
    return refuse_id(id, err);
}

const char *bc_verdict_text(bc_verdict verdict)
{
    static const char *const TEXTS[] = {
        [BC_VERDICT_OK] = "ok",
        [BC_VERDICT_CAUTION] = "caution",
        [BC_VERDICT_NOT_ACCEPTABLE] = "broken",
        [BC_VERDICT_CANNOT_JUDGE] = "cannot judge",
    };
    const size_t i = (size_t)verdict;

    return TEXTS[i < BC_COUNT(TEXTS) ? i : (size_t)BC_VERDICT_CANNOT_JUDGE];
}

/* Volumes and heats of two states do not compare. */
static bool same_state(const bc_subject *a, const bc_subject *b)
{
    const bc_state *s = &a->reference->state;
    const bc_state *t = &b->reference->state;

    return fabs(s->combustion_c - t->combustion_c) < 0.01 && fabs(s->metering_c - t->metering_c) < 0.01
           && fabs(s->metering_pa - t->metering_pa) < 1.0 && s->saturated == t->saturated && s->edition == t->edition;
}

static bc_status refuse_states(bc_error *err)
{
    return bc_fail(err, BC_ERR_USAGE, "the two gases refer to different states; evaluate both at one");
}

static bc_status read_index(const list_row *row, const index_case *c, reading *r, bc_error *err)
{
    if (!c->new_burns || (row->shown.kind == BC_INDEX_AGAINST && !c->old_burns)) {
        *r = reading_none("the gas does not burn");
        return BC_OK;
    }
    const bc_status status = row->method(c, r, err);

    if (status != BC_ERR_RANGE)
        return status;
    *r = reading_none("the method has no value for a gas like this");
    return BC_OK;
}

static bool within(const bc_index_limits *l, double value)
{
    return (!l->has_min || value >= l->min - ROUNDING) && (!l->has_max || value <= l->max + ROUNDING);
}

static bool has_limit(const bc_index_limits *l)
{
    return l->has_min || l->has_max;
}

/* The verdict and its reason, from value, range and limits already in place. */
static void judge(const reading *r, bc_index *i)
{
    i->reason = r->outside;
    i->verdict = BC_VERDICT_CANNOT_JUDGE;
    if (!i->in_range)
        return;
    i->reason = r->caution;
    if (!has_limit(&i->preferable) && !has_limit(&i->acceptable))
        i->reason = "no limit is published for it";
    else if (!within(&i->acceptable, i->value))
        i->verdict = BC_VERDICT_NOT_ACCEPTABLE;
    else if (!within(&i->preferable, i->value) || r->caution[0] != '\0')
        i->verdict = BC_VERDICT_CAUTION;
    else
        i->verdict = BC_VERDICT_OK;
}

bc_status index_of_case(const index_case *c, size_t index, bc_index *out, bc_error *err)
{
    const list_row *row = &ROWS[index];
    reading r;
    const bc_status status = read_index(row, c, &r, err);

    if (status != BC_OK)
        return status;
    *out = (bc_index){.has_value = r.has_value, .value = r.value, .low = r.low, .high = r.high, .in_range = r.has_value && r.outside[0] == '\0',
                      .preferable = r.own_limits ? r.preferable : row->shown.preferable,
                      .acceptable = r.own_limits ? r.acceptable : row->shown.acceptable, .source = row->shown.source,
                      .limits_source = r.own_limits ? r.limits_source : row->shown.limits_source, .trust = row->shown.trust};
    judge(&r, out);
    return BC_OK;
}

bc_status bc_index_evaluate(size_t index, const bc_subject *old_gas, const bc_subject *new_gas, bc_index *out, bc_error *err)
{
    BC_UNFILLED index_room room;
    index_case c;

    if (index >= BC_COUNT(ROWS))
        return bc_fail(err, BC_ERR_USAGE, "there is no index %zu", index);
    if (!old_gas && ROWS[index].shown.kind == BC_INDEX_AGAINST)
        return bc_fail(err, BC_ERR_USAGE, "%s compares two gases; name the one that the burner was set on", ROWS[index].shown.id);
    if (old_gas && !same_state(old_gas, new_gas))
        return refuse_states(err);
    open_case(&c, old_gas, new_gas, &room);
    return index_of_case(&c, index, out, err);
}

bc_status bc_index_evaluate_all(const bc_subject *old_gas, const bc_subject *new_gas, bc_index out[], bc_error *err)
{
    BC_UNFILLED index_room room;
    index_case c;
    bc_index all[BC_COUNT(ROWS)];

    if (!same_state(old_gas, new_gas))
        return refuse_states(err);
    open_case(&c, old_gas, new_gas, &room);
    for (size_t i = 0; i < BC_COUNT(ROWS); i++) {
        const bc_status status = index_of_case(&c, i, &all[i], err);

        if (status != BC_OK)
            return status;
    }
    memcpy(out, all, sizeof all);
    return BC_OK;
}
