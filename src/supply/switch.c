/* SPDX-License-Identifier: MIT */
/* switch.c - criteria of indices and burner into one judgement. */
#include "bluecone/oxidant.h"
#include "bluecone/switch.h"

#include "base/compiler.h"
#include "base/error_internal.h"
#include "supply/switch_internal.h"

#include <math.h>
#include <string.h>

#define SAME 1e-9 /* largest difference of mole fractions that rounding makes */

static const char *const DANGER_TEXTS[BC_DANGERS] = {
    [BC_DANGER_HEAT] = "heat input",           [BC_DANGER_CO] = "incomplete combustion", [BC_DANGER_LIFT] = "lifting",
    [BC_DANGER_FLASHBACK] = "flashback",       [BC_DANGER_YELLOW_TIP] = "yellow tips and soot",
    [BC_DANGER_KNOCK] = "knock",               [BC_DANGER_FLAME] = "flame temperature",
};

const char *bc_danger_text(bc_danger danger)
{
    const size_t i = (size_t)danger;

    return i < BC_DANGERS ? DANGER_TEXTS[i] : "";
}

#define BIT(danger) (1U << BC_DANGER_##danger)

bool bc_danger_matters(bc_danger danger, bc_burner_type type)
{
    static const unsigned MATTERS[] = {
        [BC_BURNER_ATMOSPHERIC] = BIT(HEAT) | BIT(CO) | BIT(LIFT) | BIT(FLASHBACK) | BIT(YELLOW_TIP),
        [BC_BURNER_PREMIX] = BIT(HEAT) | BIT(CO) | BIT(LIFT) | BIT(FLASHBACK),
        [BC_BURNER_NOZZLE_MIX] = BIT(HEAT) | BIT(CO) | BIT(LIFT),
        [BC_BURNER_ENGINE] = BIT(HEAT) | BIT(CO) | BIT(KNOCK),
        [BC_BURNER_TYPES] = BIT(HEAT) | BIT(CO) | BIT(LIFT) | BIT(FLASHBACK) | BIT(YELLOW_TIP),
    };
    const size_t i = (size_t)type;

    return i < BC_COUNT(MATTERS) && (MATTERS[i] >> (unsigned)danger & 1U) != 0;
}

const char *bc_switch_text(bc_switch_verdict verdict)
{
    static const char *const TEXTS[] = {
        [BC_SWITCH_TAKES] = "the burner takes the new gas",
        [BC_SWITCH_AFTER_ADJUSTMENT] = "the burner takes the new gas after adjustment",
        [BC_SWITCH_NO] = "the burner does not take the new gas",
    };
    const size_t i = (size_t)verdict;

    return TEXTS[i < BC_COUNT(TEXTS) ? i : (size_t)BC_SWITCH_NO];
}

/* 0 broken for good, 1 broken until adjusted, 2 caution, 3 kept, 4 without verdict, 5 not for this burner.
 * `adjusts`: another criterion needs the adjustment, which must not break this one. */
static int rank_of(const bc_criterion *c, bool adjusts)
{
    const bool after = c->has_adjusted && c->adjusted_verdict == BC_VERDICT_NOT_ACCEPTABLE;

    if (!c->counts)
        return 5;
    switch (c->verdict) {
    case BC_VERDICT_NOT_ACCEPTABLE:
        return c->has_adjusted && !after ? 1 : 0;
    case BC_VERDICT_CAUTION:
        return adjusts && after ? 0 : 2;
    case BC_VERDICT_OK:
        return adjusts && after ? 0 : 3;
    case BC_VERDICT_CANNOT_JUDGE:
    default:
        return 4;
    }
}

static bool has_rank(const bc_switch *s, int rank)
{
    for (size_t i = 0; i < s->count; i++)
        if (rank_of(&s->criteria[i], s->adjusts) == rank)
            return true;
    return false;
}

static bool worse(const bc_switch *s, size_t i, size_t j)
{
    const bc_criterion *a = &s->criteria[i];
    const bc_criterion *b = &s->criteria[j];
    const int ra = rank_of(a, s->adjusts);
    const int rb = rank_of(b, s->adjusts);

    return ra < rb || (ra == rb && a->outside > b->outside);
}

static void order_criteria(bc_switch *s)
{
    for (size_t i = 0; i < s->count; i++) {
        size_t j = i;

        for (; j > 0 && worse(s, i, s->order[j - 1]); j--)
            s->order[j] = s->order[j - 1];
        s->order[j] = i;
        s->criteria[i].broken = rank_of(&s->criteria[i], s->adjusts) == 0;
    }
}

static void find_cover(bc_switch *s, bc_burner_type type)
{
    s->cleared = true;
    for (unsigned d = 0; d < BC_DANGERS; d++) {
        s->covered[d] = false;
        for (size_t i = 0; i < s->count; i++) {
            const bc_criterion *c = &s->criteria[i];

            s->covered[d] = s->covered[d] || (c->counts && (c->dangers >> d & 1U) && c->verdict != BC_VERDICT_CANNOT_JUDGE);
        }
        s->cleared = s->cleared && (s->covered[d] || !bc_danger_matters((bc_danger)d, type));
    }
}

static bc_switch_verdict conclude(const bc_switch *s)
{
    if (has_rank(s, 0) || (!s->cleared && !s->same_gas) || (s->same_gas && s->adjusts))
        return BC_SWITCH_NO;
    return s->adjusts ? BC_SWITCH_AFTER_ADJUSTMENT : BC_SWITCH_TAKES;
}

static bc_status respond(const switch_pair *pair, bc_switch *s, bc_error *err)
{
    bc_burner_setting found = bc_burner_setting_as_found();
    bc_status status = bc_burner_respond(&s->set, pair->old_gas, &found, &s->on_old, err);

    found.gas_k = pair->new_gas_k;
    if (status == BC_OK)
        status = bc_burner_respond(&s->set, pair->new_gas, &found, &s->on_new, err);
    if (status == BC_OK)
        status = bc_burner_restore(&s->set, pair->new_gas, pair->new_gas_k, &s->remedy, err);
    if (status != BC_OK)
        return status;
    const bc_burner_setting remedy = bc_burner_setting_of(&s->remedy, false, pair->new_gas_k);

    return bc_burner_respond(&s->set, pair->new_gas, &remedy, &s->on_adjusted, err);
}

static bool same_gas(const bc_subject *a, const bc_subject *b)
{
    double most = 0.0;

    for (size_t i = 0; i < bc_species_count(); i++)
        most = fmax(most, fabs(a->gas.x[i] - b->gas.x[i]));
    return most <= SAME;
}

static bc_status judge(switch_pair *pair, bc_switch *s, bc_error *err)
{
    bc_status status = bc_index_evaluate_all(pair->old_gas, pair->new_gas, s->indices, err);

    if (status == BC_OK && s->has_burner)
        status = respond(pair, s, err);
    if (status != BC_OK)
        return status;
    s->count = index_criteria(pair, s->indices, s->criteria);
    if (s->has_burner)
        s->count += burner_criteria(pair, &s->on_old, &s->on_new, &s->on_adjusted, s->criteria + s->count);
    s->adjusts = false;
    s->adjusts = has_rank(s, 1);
    order_criteria(s);
    find_cover(s, s->has_burner ? s->set.burner->type : BC_BURNER_TYPES);
    s->verdict = conclude(s);
    return BC_OK;
}

bc_status bc_switch_judge(const bc_subject *old_gas, const bc_subject *new_gas, const bc_burner *burner, double new_gas_k, bc_switch *result,
                          bc_error *err)
{
    bc_switch s;
    switch_pair pair = {old_gas, new_gas, NULL, new_gas_k};
    bc_status status = BC_OK;

    if (bc_index_count() > BC_INDICES_MAX)
        return bc_fail(err, BC_ERR_USAGE, "more indices than a judgement has room for");
    memset(&s, 0, sizeof s);
    s.has_burner = burner != NULL;
    s.same_gas = same_gas(old_gas, new_gas) && !(new_gas_k > 0.0);
    status = bc_fuel_check(&old_gas->gas, err);
    if (status == BC_OK && burner)
        status = bc_burner_set(burner, old_gas, &s.set, err);
    pair.set = burner ? &s.set : NULL;
    if (status == BC_OK)
        status = judge(&pair, &s, err);
    if (status == BC_OK)
        *result = s;
    return status;
}
