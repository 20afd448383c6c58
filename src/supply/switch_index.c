/* SPDX-License-Identifier: MIT */
/* switch_index.c - published indices as criteria, and what they would be once heat input and air are set back. */
#include "base/compiler.h"
#include "supply/index_internal.h"
#include "supply/switch_internal.h"

#include <math.h>
#include <string.h>

#define ROUNDING 1e-9 /* a limit met to the last bits is kept */

typedef enum { MADE_FOR_ATMOSPHERIC, MADE_FOR_ANY, MADE_FOR_INSTEAD } made_for;
typedef enum { NEUTRAL, OVER_JA, LESS_JA, PLUS_JA, AGA_LIFT, AGA_FLASH, AGA_TIP, STAYS } adjusted_form;

#define HEAT (1U << BC_DANGER_HEAT)
#define CO (1U << BC_DANGER_CO)
#define LIFT (1U << BC_DANGER_LIFT)
#define FLASHBACK (1U << BC_DANGER_FLASHBACK)
#define YELLOW_TIP (1U << BC_DANGER_YELLOW_TIP)

static const struct {
    char id[24];
    unsigned dangers;
    made_for made;
    adjusted_form form;
} ROWS[] = {
#define CRITERION(id, dangers, made, form) {id, dangers, MADE_FOR_##made, form},
#include "data/criteria.def"
};

bc_verdict judge_value(double value, const bc_index_limits *preferable, const bc_index_limits *acceptable)
{
    if (beyond(value, acceptable) > ROUNDING)
        return BC_VERDICT_NOT_ACCEPTABLE;
    return beyond(value, preferable) > ROUNDING ? BC_VERDICT_CAUTION : BC_VERDICT_OK;
}

static double over(double distance, double limit)
{
    return limit != 0.0 ? distance / fabs(limit) : distance;
}

double beyond(double value, const bc_index_limits *l)
{
    double most = 0.0;

    if (l->has_min && value < l->min)
        most = over(l->min - value, l->min);
    if (l->has_max && value > l->max)
        most = fmax(most, over(value - l->max, l->max));
    return most;
}

/* Ratios of both methods and what of Bulletin 36 does not hang on heat and air. */
typedef struct {
    double ja; /* Weaver's */
    bool has_aga;
    double aga_lift, aga_flash, aga_tip;
} pair_ratios;

static bc_status aga_of(const switch_pair *p, bc_aga_gas *old_gas, bc_aga_gas *new_gas)
{
    const bc_reference *reference = NULL;
    index_room room;
    index_case c;

    open_case(&c, p->old_gas, p->new_gas, &room);
    bc_status status = method_reference(&c, STATE_60F_30INHG, &reference, NULL);

    if (status == BC_OK)
        status = bc_aga_gas_of(reference, &p->old_gas->gas, old_gas, NULL);
    return status == BC_OK ? bc_aga_gas_of(reference, &p->new_gas->gas, new_gas, NULL) : status;
}

/* IL = K1/[JA (K2 - log10 JH)], IF = (K2/K1) sqrt(h2/1000)/JH, IY = (Y1/Y2)/JA: the formulas of Bulletin 36 in Weaver's
 * ratios; with JA = JH = 1 what is left is K1/K2, (K2/K1) sqrt(h2/1000), Y1/Y2. */
static pair_ratios ratios_of(const switch_pair *p, double weaver_air)
{
    pair_ratios r = {.ja = weaver_air};
    bc_aga_gas a;
    bc_aga_gas s;

    r.has_aga = aga_of(p, &a, &s) == BC_OK && a.lifting_constant > 0.0 && s.lifting_constant > 0.0;
    if (!r.has_aga)
        return r;
    const double jh = s.gross_j_per_m3 / a.gross_j_per_m3 * sqrt(a.relative_density / s.relative_density);

    r.aga_lift = a.lifting_constant / s.lifting_constant;
    r.aga_flash = bc_aga_compare(&a, &s).flashback * jh;
    r.aga_tip = s.yellow_tip_limit > 0.0 ? a.yellow_tip_limit / s.yellow_tip_limit : 0.0;
    return r;
}

/* False where the adjustment does not reach the index. */
static bool adjust(adjusted_form form, double value, const pair_ratios *r, double *adjusted)
{
    switch (form) {
    case NEUTRAL:
        *adjusted = 1.0;
        return true;
    case OVER_JA:
        *adjusted = value / r->ja;
        return true;
    case LESS_JA:
        *adjusted = value - (r->ja - 1.0);
        return true;
    case PLUS_JA:
        *adjusted = value + 1.4 * (r->ja - 1.0);
        return true;
    case AGA_LIFT:
        *adjusted = r->aga_lift;
        return r->has_aga;
    case AGA_FLASH:
        *adjusted = r->aga_flash;
        return r->has_aga;
    case AGA_TIP:
        *adjusted = r->aga_tip;
        return r->has_aga && r->aga_tip > 0.0;
    case STAYS:
    default:
        return false;
    }
}

/* An index of dangers that this type of burner does not know says nothing of it. */
static bool concerns(unsigned dangers, bc_burner_type type)
{
    for (unsigned d = 0; d < BC_DANGERS; d++)
        if ((dangers >> d & 1U) && bc_danger_matters((bc_danger)d, type))
            return true;
    return false;
}

static bool counts_for(made_for made, unsigned dangers, const switch_pair *p)
{
    if (!p->set)
        return true;
    if (!concerns(dangers, p->set->burner->type))
        return false;
    if (made == MADE_FOR_ANY)
        return true;
    return made == MADE_FOR_ATMOSPHERIC && p->set->burner->type == BC_BURNER_ATMOSPHERIC;
}

/* A limit of one gas that the old gas breaks, too, says nothing of the change. */
static bool old_breaks(const switch_pair *p, size_t index)
{
    bc_index of_old;

    return bc_index_at(index)->kind == BC_INDEX_ALONE && bc_index_evaluate(index, NULL, p->old_gas, &of_old, NULL) == BC_OK
           && of_old.verdict == BC_VERDICT_NOT_ACCEPTABLE;
}

static bc_criterion criterion_of(const switch_pair *p, size_t row, const bc_index *i, const pair_ratios *r)
{
    const size_t index = index_of_criterion(row);
    const bc_index_row *shown = bc_index_at(index);
    bc_criterion c = {.id = shown->id, .label = shown->label, .unit = shown->unit, .source = i->limits_source, .decimals = shown->digits,
                      .counts = counts_for(ROWS[row].made, ROWS[row].dangers, p), .dangers = ROWS[row].dangers, .has_value = i->has_value, .value = i->value,
                      .preferable = i->preferable, .acceptable = i->acceptable, .verdict = i->verdict, .reason = i->reason};

    if (c.verdict == BC_VERDICT_NOT_ACCEPTABLE && old_breaks(p, index)) {
        c.verdict = BC_VERDICT_CANNOT_JUDGE;
        c.reason = "the old gas breaks this limit as well";
    }
    if (c.verdict == BC_VERDICT_CANNOT_JUDGE)
        return c;
    c.outside = beyond(c.value, &c.acceptable);
    c.has_adjusted = adjust(ROWS[row].form, c.value, r, &c.adjusted);
    c.adjusted_verdict = c.has_adjusted ? judge_value(c.adjusted, &c.preferable, &c.acceptable) : c.verdict;
    return c;
}

size_t index_criterion_count(void)
{
    return BC_COUNT(ROWS);
}

size_t index_of_criterion(size_t criterion)
{
    size_t index = 0;

    while (index < bc_index_count() && strcmp(bc_index_at(index)->id, ROWS[criterion].id) != 0)
        index++;
    return index;
}

static double weaver_air_of(const bc_index indices[])
{
    size_t index = 0;

    return bc_index_find("weaver-air", &index, NULL) == BC_OK && indices[index].has_value && indices[index].value > 0.0 ? indices[index].value : 1.0;
}

size_t index_criteria(const switch_pair *pair, const bc_index indices[], bc_criterion criteria[])
{
    const pair_ratios r = ratios_of(pair, weaver_air_of(indices));

    for (size_t i = 0; i < BC_COUNT(ROWS); i++)
        criteria[i] = criterion_of(pair, i, &indices[index_of_criterion(i)], &r);
    return BC_COUNT(ROWS);
}
